/* A desktop. */
#include <stdio.h>

#define STORED(text) (text)
#define READ_CHAR(at) (*(at))
#define part_put(c) ((void)putchar(c))
#define part_end() 0
