/* An AVR in a simulator that prints what is written to one register and ends at another. */
#include <avr/io.h>
#include <avr/pgmspace.h>

#define STORED(text) PSTR(text)
#define READ_CHAR(at) ((char)pgm_read_byte(at))

static void part_put(char c)
{
    GPIOR1 = (uint8_t)c;
}

static int part_end(void)
{
    GPIOR0 = 3;
    return 0;
}
