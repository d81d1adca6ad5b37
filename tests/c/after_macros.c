/* The header after the macros of embedded cores. */
#include "embedded_macros.h"

#include "fieldstop.h"

int main(void)
{
    return (int)(fieldstop_version() - (uint32_t)FIELDSTOP_VERSION);
}
