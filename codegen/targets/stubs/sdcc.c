#include "plat.h"

#if defined(__SDCC_z80)
static __sfr __at(0xFF) simulator;
#elif defined(__SDCC_mcs51)
static volatile __xdata __at(0xFFFF) unsigned char simulator;
#else
static volatile __at(0xFFFF) unsigned char simulator;
#endif

void plat_putc(char c)
{
    simulator = 'p';
    simulator = (unsigned char)c;
}

void plat_exit(void)
{
    simulator = 's';
    for (;;) {
    }
}
