#include <stdint.h>

#include "plat.h"

extern uint32_t _sidata, _sdata, _edata, _sbss, _ebss, _estack;
int main(void);
void reset_handler(void);

static int semihost(int op, const void *arg)
{
    register int r0 __asm__("r0") = op;
    register const void *r1 __asm__("r1") = arg;

    __asm__ volatile("bkpt 0xAB" : "+r"(r0) : "r"(r1) : "memory");
    return r0;
}

void plat_putc(char c) { (void)semihost(0x03, &c); }

void plat_exit(void)
{
    (void)semihost(0x18, (const void *)0x20026u);
    for (;;) {
    }
}

void reset_handler(void)
{
    const uint32_t *s = &_sidata;
    uint32_t *d;

    for (d = &_sdata; d < &_edata;) {
        *d++ = *s++;
    }
    for (d = &_sbss; d < &_ebss;) {
        *d++ = 0u;
    }
    (void)main();
    plat_exit();
}

__attribute__((section(".vectors"), used)) static void (*const vectors[16])(void) = {
    (void (*)(void))&_estack, reset_handler, plat_exit, plat_exit, plat_exit, plat_exit, plat_exit,
};
