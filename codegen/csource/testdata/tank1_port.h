/* tank1_port.h: what the board must provide
 *
 * Equipment: Tank 1, laundry
 * Site: Harbour Lane
 * Printed by makebreak 0.0.0 from sheet.yaml
 * Sheet SHA-256: 0123456789abcdef
 *
 * Replaces:
 * - tank_stat: rod stat
 * - high_limit: capillary limit, manual reset
 *
 * Stays hard-wired, and must:
 * - second_limit: in a pocket of its own, cuts the contactor
 *
 * Independent hardware limits stay in place, hard-wired.
 */
#ifndef TANK1_PORT_H
#define TANK1_PORT_H

#include "tank1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t tank1_port_wait(void);

/* thermistor in the pocket of the old stat, raw counts (12 bits), as the converter gives them */
uint16_t tank1_port_read_tank_probe(void);

/* reset button of the limit, true while pressed */
bool tank1_port_read_high_limit_reset(void);

/* Drives the coil or gate of 9 kW immersion heater: true puts current into it. */
void tank1_port_drive_heater(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in tank1.h. */
void tank1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 3 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 */
bool tank1_port_recall(struct tank1_remembered *r);
void tank1_port_keep(const struct tank1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void tank1_port_alive(void);

#endif
