/* gwh1_port.h: what the board must provide
 *
 * Equipment: Gas water heater, boat house
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 52a2fa594aacaa95bd253c6298389f618d93b844be1d85baca786c2236c28846
 *
 * Stays hard-wired, and must:
 * - tank_stat: rod stat of the appliance's own valve
 * - flame_guard: thermocouple flame supervision of the pilot
 * - cutoff: energy cut-off in the tank, one shot, opens the thermocouple's loop
 *
 * This helps to plan; it decides nothing. Local codes, the equipment's listing or approval, and a
 * licensed person decide.
 * Independent hardware limits stay in place, hard-wired, and are tested before anything else is
 * touched.
 * Isolate, lock off and prove dead before working on the equipment.
 * The C is a skeleton to start from. It has not been certified for any purpose; no claim of
 * compliance is made for it.
 * Software cannot see what it has no input for. A finding of grade stop is ended only by changing
 * the design.
 * Open findings: 1 earth_fault_bypasses_limit (act, gwh1); 2 overshoot_not_determined (act,
 * cutoff/boiling). Not judged, for want of a figure: 1; risks.md says which.
 */
#ifndef GWH1_PORT_H
#define GWH1_PORT_H

#include "gwh1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t gwh1_port_wait(void);

/* spare contact of the energy cut-off */
bool gwh1_port_read_cutoff_open(void);

/* pilot seen by the fitter's lamp at the sight glass */
bool gwh1_port_read_pilot_lit(void);

/* across the thermocouple with an amplifier of high input resistance, raw counts, as the converter
 * gives them
 */
uint16_t gwh1_port_read_couple(void);

/* Sets thermocouple flame supervision of the pilot: days since it was last seen to act, from 0 to
 * 3660.
 */
void gwh1_port_drive_flame_guard_days(uint16_t value);

/* Sets energy cut-off in the tank, one shot, opens the thermocouple's loop: trips seen, from 0 to
 * 60000.
 */
void gwh1_port_drive_cutoff_trips(uint16_t value);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in gwh1.h. */
void gwh1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 6 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 */
bool gwh1_port_recall(struct gwh1_remembered *r);
void gwh1_port_keep(const struct gwh1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void gwh1_port_alive(void);

#endif
