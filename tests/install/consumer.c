/* A program of somebody who has installed the library. */
#include <fieldstop.h>
#include <inttypes.h>
#include <stdio.h>

int main(void)
{
    uint32_t magnification = 0;
    fieldstop_status status = fieldstop_magnification_fx(1130000, 13000, &magnification);

    printf("status %u, %" PRIu32 " in Q16.16\n", (unsigned)status, magnification);
    return status != 0 || magnification != 5696591;
}
