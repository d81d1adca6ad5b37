/* Arguments from a tiny generator that runs alike everywhere. */
#include <stdint.h>

static uint32_t state = 2463534242u;

static uint32_t next(void)
{
    state ^= state << 13;
    state ^= state >> 17;
    state ^= state << 5;
    return state;
}

/* Half from the usual telescope, half over the whole type by size, with the edges. */
static uint32_t draw(uint16_t i, uint32_t lowest, uint32_t highest, uint32_t least, uint32_t most)
{
    uint32_t x = next();

    if ((i & 1u) == 0u) {
        return lowest + x % (highest - lowest + 1u);
    }
    switch (x & 15u) {
    case 0: return least;
    case 1: return most;
    case 2: return most + 1u;
    case 3: return 0u;
    case 4: return 1u;
    case 5: return most - (next() >> (next() & 31u));
    default: return next() >> (next() & 31u);
    }
}

#define DRAW(lowest, highest, least, most) a[n++] = draw(i, lowest, highest, least, most);
