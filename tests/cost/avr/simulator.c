/*
 * Runs an image for an ATmega328P and counts cycles. Writes to GPIOR0: 1 begins to count, 2 ends, 3 ends the program, 4
 * prints the median and the worst of the counts so far and forgets them, 5 gives the last count to the program in GPIOR1
 * and GPIOR2. Bytes written to GPIOR1 are printed.
 */
#include <simavr/sim_avr.h>
#include <simavr/sim_elf.h>
#include <simavr/sim_io.h>
#include <stdarg.h>
#include <stdio.h>
#include <stdlib.h>

enum { GPIOR0 = 0x3E, GPIOR1 = 0x4A, GPIOR2 = 0x4B, MOST = 4096 };

static avr_cycle_count_t begun;
static unsigned counts[MOST], count;
static int ended;

static int ascending(const void *a, const void *b)
{
    unsigned x = *(const unsigned *)a, y = *(const unsigned *)b;
    return (x > y) - (x < y);
}

static void order(struct avr_t *avr, avr_io_addr_t address, uint8_t value, void *parameter)
{
    (void)address, (void)parameter;
    switch (value) {
    case 1:
        begun = avr->cycle;
        break;
    case 2:
        if (count < MOST) {
            counts[count++] = (unsigned)(avr->cycle - begun);
        }
        break;
    case 4:
        qsort(counts, count, sizeof counts[0], ascending);
        printf(" %6u %6u", counts[count / 2], counts[count - 1]);
        count = 0;
        break;
    case 5:
        count--;
        avr->data[GPIOR1] = (uint8_t)counts[count];
        avr->data[GPIOR2] = (uint8_t)(counts[count] >> 8);
        break;
    default:
        ended = value;
    }
}

static void print(struct avr_t *avr, avr_io_addr_t address, uint8_t value, void *parameter)
{
    (void)avr, (void)address, (void)parameter;
    putchar(value);
}

/* The simulator tells much of itself. */
static void tell(avr_t *avr, const int level, const char *format, va_list values)
{
    (void)avr;
    if (level <= LOG_ERROR) {
        vfprintf(stderr, format, values);
    }
}

int main(int argument_count, char **arguments)
{
    elf_firmware_t image = {0};
    avr_t *avr = avr_make_mcu_by_name("atmega328p");

    avr_global_logger_set(tell);
    if (argument_count != 2 || elf_read_firmware(arguments[1], &image) != 0 || avr == NULL) {
        fprintf(stderr, "usage: simulator IMAGE\n");
        return 2;
    }
    avr_init(avr);
    image.frequency = 16000000;
    avr_load_firmware(avr, &image);
    avr_register_io_write(avr, GPIOR0, order, NULL);
    avr_register_io_write(avr, GPIOR1, print, NULL);
    while (!ended) {
        int state = avr_run(avr);

        if (state == cpu_Done || state == cpu_Crashed) {
            fprintf(stderr, "simulator: the part stopped in state %d\n", state);
            return 1;
        }
    }
    return ended == 3 ? 0 : 1;
}
