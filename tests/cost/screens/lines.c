#include "screen.h"

char screen_lines[4][20] __attribute__((aligned(4)));
