/* Runs an AVR image: prints the bytes written to GPIOR1 and ends when 3 is written to GPIOR0. */
#include <simavr/sim_avr.h>
#include <simavr/sim_elf.h>
#include <simavr/sim_io.h>
#include <stdarg.h>
#include <stdio.h>

static int ended = 0;

static void print(struct avr_t *avr, avr_io_addr_t address, uint8_t value, void *parameter)
{
    (void)avr, (void)address, (void)parameter;
    putchar(value);
}

static void end(struct avr_t *avr, avr_io_addr_t address, uint8_t value, void *parameter)
{
    (void)avr, (void)address, (void)parameter;
    ended = value == 3;
}

/* The simulator tells much of itself. */
static void tell(avr_t *avr, const int level, const char *format, va_list values)
{
    (void)avr;
    if (level <= LOG_ERROR) {
        vfprintf(stderr, format, values);
    }
}

int main(int count, char **arguments)
{
    elf_firmware_t image = {0};
    avr_t *avr;

    avr_global_logger_set(tell);
    if (count != 3 || elf_read_firmware(arguments[2], &image) != 0
        || (avr = avr_make_mcu_by_name(arguments[1])) == NULL) {
        fprintf(stderr, "usage: simulator PART IMAGE\n");
        return 2;
    }
    avr_init(avr);
    image.frequency = 16000000;
    avr_load_firmware(avr, &image);
    avr_register_io_write(avr, 0x3E, end, NULL);
    avr_register_io_write(avr, 0x4A, print, NULL);
    while (!ended) {
        int state = avr_run(avr);

        if (state == cpu_Done || state == cpu_Crashed) {
            fprintf(stderr, "simulator: the part stopped in state %d\n", state);
            return 1;
        }
    }
    return 0;
}
