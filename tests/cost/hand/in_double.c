#define IN_DOUBLE
#include "readouts.h"
