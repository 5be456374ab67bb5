/* frost7_port.h: what the board must provide
 *
 * Equipment: Trace heating, fire-water line 7
 * Site: North Yard
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9ff22083946199f7a373bb91fa9f7e5e0217856b9845d445052e08402ec051f5
 *
 * Replaces:
 * - line_stat: capillary stat strapped to the line
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
 * Open findings: 1 danger_without_barrier (act, freezing/tape); 2 frost_load_safe_on (act, tape); 3
 * welded_output (act, tape); 4 probe_out_of_pocket (act, line_stat); 5 moisture_direction (act,
 * line_probe); 6 insulation_of_new_probe (act, line_probe); 7 contact_life (act, tape); 8
 * mercury_asbestos_refrigerant (act, line_stat); 9 approval_lapses (act, frost7). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#ifndef FROST7_PORT_H
#define FROST7_PORT_H

#include "frost7.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t frost7_port_wait(void);

/* strapped to the line under the lagging, raw counts, as the converter gives them */
uint16_t frost7_port_read_line_probe(void);

/* Drives the coil or gate of self-limiting trace heating tape, 900 W, through a contactor whose
 * coil opens it: true puts current into it.
 */
void frost7_port_drive_tape(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in frost7.h. */
void frost7_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool frost7_port_recall(struct frost7_remembered *r);
void frost7_port_keep(const struct frost7_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void frost7_port_alive(void);

#endif
