#include <stdint.h>

#include "plat.h"

__asm__(".section .init\n.globl _start\n_start: la sp,_stack\n call main\n call plat_exit\n.text\n");

void plat_putc(char c) { *(volatile uint8_t *)0x10000000UL = (uint8_t)c; }

void plat_exit(void)
{
    *(volatile uint32_t *)0x100000UL = 0x5555u;
    for (;;) {
    }
}
