/* floor2_port.h: what the board must provide
 *
 * Equipment: Floor heating, hall 2, mixing valve
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 89a969e7b30031b226d184e39ac05c100976b9f76056120571832deaef0e8bfd
 *
 * Replaces:
 * - self_acting: self-acting mixing valve, bulb in the flow
 *
 * Stays hard-wired, and must:
 * - floor_limit: contact stat strapped to the flow, shuts a valve of its own
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
 * Open findings: 1 danger_without_barrier (act, screed/mixer); 2 trips_dead_no_more (act,
 * self_acting); 3 proving_switch_not_checked_open (act, pump_runs); 4 ssr_shorts_on (act, mixer); 5
 * earth_fault_bypasses_limit (act, floor2); 6 moisture_direction (act, flow_probe); 7
 * self_powered_lost (act, self_acting); 8 mercury_asbestos_refrigerant (act, self_acting); 9
 * approval_lapses (act, floor2); 10 limit_trips_late (act, floor_limit/screed). Not judged, for
 * want of a figure: 4; risks.md says which.
 */
#ifndef FLOOR2_PORT_H
#define FLOOR2_PORT_H

#include "floor2.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t floor2_port_wait(void);

/* auxiliary contact of the circulation pump */
bool floor2_port_read_pump_runs(void);

/* immersion probe in the pocket of the old bulb, raw counts, as the converter gives them */
uint16_t floor2_port_read_flow_probe(void);

/* Sets three-way mixing valve with its three-point actuator, from 0 to 1000. */
void floor2_port_drive_mixer(uint16_t value);

/* Drives the coil or gate of three-way mixing valve with its three-point actuator: run open: true
 * puts current into it.
 */
void floor2_port_drive_mixer_opens(bool current);

/* Drives the coil or gate of three-way mixing valve with its three-point actuator: run shut: true
 * puts current into it.
 */
void floor2_port_drive_mixer_closes(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in floor2.h. */
void floor2_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool floor2_port_recall(struct floor2_remembered *r);
void floor2_port_keep(const struct floor2_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void floor2_port_alive(void);

#endif
