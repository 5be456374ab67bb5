#include <avr/interrupt.h>
#include <avr/io.h>
#include <avr/sleep.h>

#include "plat.h"

void plat_putc(char c)
{
    UCSR0B = (uint8_t)(1u << TXEN0);
    while ((UCSR0A & (1u << UDRE0)) == 0u) {
    }
    UDR0 = (uint8_t)c;
}

/* Asleep with interrupts off: the simulator ends. */
void plat_exit(void)
{
    unsigned int wait;

    for (wait = 0u; wait < 60000u; wait++) { /* the last character leaves */
        __asm__ volatile("nop");
    }
    cli();
    sleep_enable();
    sleep_cpu();
    for (;;) {
    }
}
