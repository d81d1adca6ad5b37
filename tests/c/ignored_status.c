/* Must not compile where ignored results are errors. */
#include "fieldstop.h"

int main(void)
{
    uint32_t value = 0;
    fieldstop_plate_scale_fx(1000000, &value);
    return (int)value;
}
