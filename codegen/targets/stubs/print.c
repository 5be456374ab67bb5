/* printf for %s, %ld, %lu: what <id>_check.c prints with. */
#include <stdarg.h>
#include <stdio.h>

#include "plat.h"

static void number(unsigned long v)
{
    char digits[12];
    int n = 0;

    do {
        digits[n++] = (char)('0' + (int)(v % 10ul));
        v /= 10ul;
    } while (v > 0ul);
    while (n > 0) {
        plat_putc(digits[--n]);
    }
}

int printf(const char *format, ...)
{
    va_list args;

    va_start(args, format);
    for (; *format != '\0'; format++) {
        if (*format != '%') {
            plat_putc(*format);
            continue;
        }
        format++;
        if (*format == 's') {
            const char *s = va_arg(args, const char *);

            while (*s != '\0') {
                plat_putc(*s++);
            }
            continue;
        }
        format++; /* l */
        if (*format == 'u') {
            number(va_arg(args, unsigned long));
        } else {
            long v = va_arg(args, long);

            if (v < 0l) {
                plat_putc('-');
                v = -v;
            }
            number((unsigned long)v);
        }
    }
    va_end(args);
    return 0;
}
