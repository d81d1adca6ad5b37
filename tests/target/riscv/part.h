/* The emulator's RISC-V board: a serial port, and a word that ends it. No C library, so what the compiler asks for. */
#include <stddef.h>

void *memcpy(void *to, const void *from, size_t count);
void *memcpy(void *to, const void *from, size_t count)
{
    size_t i;

    for (i = 0; i < count; i++) {
        ((volatile uint8_t *)to)[i] = ((const uint8_t *)from)[i];
    }
    return to;
}

void *memset(void *to, int value, size_t count);
void *memset(void *to, int value, size_t count)
{
    size_t i;

    for (i = 0; i < count; i++) {
        ((volatile uint8_t *)to)[i] = (uint8_t)value;
    }
    return to;
}

#define STORED(text) (text)
#define READ_CHAR(at) (*(at))

static void part_put(char c)
{
    *(volatile uint8_t *)0x10000000 = (uint8_t)c;
}

static int part_end(void)
{
    *(volatile uint32_t *)0x100000 = 0x5555;
    return 0;
}
