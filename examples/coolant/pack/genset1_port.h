/* genset1_port.h: what the board must provide
 *
 * Equipment: Standby engine 1, coolant circuit
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: bcf8b9ec5ac6bc7c71efdeb2099586f05b6a7d4fa187b281a257f1b0da95d2f1
 *
 * Replaces:
 * - wax_valve: wax element in the coolant outlet
 *
 * Stays hard-wired, and must:
 * - overheat_switch: snap disc in the cylinder head, stops the engine
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
 * Open findings: 1 danger_without_barrier (act, overheat/radiator_valve); 2 trips_dead_no_more
 * (act, wax_valve); 3 earth_fault_bypasses_limit (act, genset1); 4 moisture_direction (act,
 * outlet_probe); 5 damp_dust_washdown (act, genset1); 6 self_powered_lost (act, wax_valve); 7
 * mercury_asbestos_refrigerant (act, wax_valve); 8 approval_lapses (act, genset1). Not judged, for
 * want of a figure: 3; risks.md says which.
 */
#ifndef GENSET1_PORT_H
#define GENSET1_PORT_H

#include "genset1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t genset1_port_wait(void);

/* auxiliary contact of the stop relay */
bool genset1_port_read_overheat_open(void);

/* screwed into the old housing, in the coolant outlet, raw counts, as the converter gives them */
uint16_t genset1_port_read_outlet_probe(void);

/* Sets three-way valve to the radiator with a spring-return actuator, from 0 to 1000. */
void genset1_port_drive_radiator_valve(uint16_t value);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in genset1.h. */
void genset1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool genset1_port_recall(struct genset1_remembered *r);
void genset1_port_keep(const struct genset1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void genset1_port_alive(void);

#endif
