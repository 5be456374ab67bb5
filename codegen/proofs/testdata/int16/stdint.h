/* Fixed widths for a model checker that takes an int of 16 bits: its --16 has no header of its own.
 * int16_t and int32_t are what AVR's and MSP430's headers make them.
 */
#ifndef INT16_STDINT_H
#define INT16_STDINT_H

typedef signed char int8_t;
typedef unsigned char uint8_t;
typedef int int16_t;
typedef unsigned int uint16_t;
typedef long int32_t;
typedef unsigned long uint32_t;

#define INT32_C(x) x##L
#define UINT32_C(x) x##UL

#endif
