#include "readouts.h"
