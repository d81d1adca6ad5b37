/* What happens where the value of a result without one is taken: OWN_STOP, the program's own end, or else a trap. */
#ifdef OWN_STOP
#include <stdlib.h>
#define FIELDSTOP_STOP() ::exit(3)
#endif
#include "fieldstop.hpp"

int main()
{
    using namespace fieldstop::literals;
    const fieldstop::q16 none = fieldstop::magnification_fx(1130000_um, 0_um).value();
    return static_cast<int>(none.count() & 1u);
}
