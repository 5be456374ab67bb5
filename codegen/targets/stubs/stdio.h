/* Just enough for <id>_check.c on bare metal. */
#ifndef STDIO_H
#define STDIO_H
int printf(const char *format, ...);
#endif
