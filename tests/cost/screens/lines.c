#include "screen.h"

char screen_lines[4][20] __attribute__((aligned(4)));
#ifndef __AVR__
char lines_of_strings[4][21];
#endif
