#ifndef STRING_H
#define STRING_H
#include <stddef.h>
void *memset(void *at, int with, size_t size);
void *memcpy(void *to, const void *from, size_t size);
#endif
