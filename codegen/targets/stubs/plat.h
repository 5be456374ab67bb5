/* What a run on bare metal needs of a target. */
#ifndef PLAT_H
#define PLAT_H
void plat_putc(char c);
void plat_exit(void);
#endif
