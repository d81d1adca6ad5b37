/* Macros that the cores of embedded boards define before anything of ours is read, each with a body that breaks any
   identifier of that name; tests/header.rs reads the list too. Their names are facts; the bodies are ours. */
#ifndef EMBEDDED_MACROS_H
#define EMBEDDED_MACROS_H

#include <stddef.h>
#include <stdint.h>

#define min(a, b) ((a) < (b) ? @ : @)
#define max(a, b) ((a) > (b) ? @ : @)
#define abs(x) ((x) > 0 ? @ : @)
#define round(x) @
#define radians(x) @
#define degrees(x) @
#define sq(x) @
#define constrain(x, low, high) @
#define bit(b) @
#define bitRead(value, b) @
#define bitSet(value, b) @
#define bitClear(value, b) @
#define bitToggle(value, b) @
#define bitWrite(value, b, x) @
#define lowByte(w) @
#define highByte(w) @
#define interrupts() @
#define noInterrupts() @
#define clockCyclesPerMicrosecond() @
#define _BV(b) @
#define F(text) @
#define PI @
#define HALF_PI @
#define TWO_PI @
#define DEG_TO_RAD @
#define RAD_TO_DEG @
#define EULER @
#define B0 @
#define B1 @
#define B00000000 @
#define HIGH @
#define LOW @
#define INPUT @
#define OUTPUT @
#define INPUT_PULLUP @
#define CHANGE @
#define FALLING @
#define RISING @
#define DEFAULT @
#define INTERNAL @
#define EXTERNAL @
#define SERIAL @
#define DISPLAY @
#define LSBFIRST @
#define MSBFIRST @
#define near @
#define far @
#define small @
#define huge @
#define interface @
#define ERROR @
#define OK @
#define SUCCESS @
#define NULL_PTR @
#define TRUE @
#define FALSE @
#define I @
#define J @
#define A0 @
#define A1 @
#define SS @
#define SDA @
#define SCL @
#define R0 @
#define R1 @
#define E0 @
#define E1 @
#define U @
#define L @
#define word @
#define byte @
#define boolean @
#define uint @
#define SET @
#define RESET @
#define ENABLE @
#define DISABLE @
#define READ_BIT(value, b) @
#define MIN(a, b) @
#define MAX(a, b) @
#define UNUSED(x) @
#define ARRAY_SIZE(x) @
#define assert_param(x) @
#define __I @
#define __O @
#define __IO @
#define isnan(x) @
#define isinf(x) @
#define delay(x) @
#define sun @
#define unix @
#define linux @


#endif
