/* What a compiler may call although nobody wrote it. */
#include <stddef.h>

void *memset(void *at, int with, size_t size);
void *memcpy(void *to, const void *from, size_t size);

void *memset(void *at, int with, size_t size)
{
    volatile unsigned char *p = at;

    while (size > 0u) {
        *p++ = (unsigned char)with;
        size--;
    }
    return at;
}

void *memcpy(void *to, const void *from, size_t size)
{
    volatile unsigned char *p = to;
    const unsigned char *q = from;

    while (size > 0u) {
        *p++ = *q++;
        size--;
    }
    return to;
}
