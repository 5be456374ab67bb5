/* room4_port.h: what the board must provide
 *
 * Equipment: Room control, caretaker's flat
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: d3cb2df54b043c85a55b36ae17d55a520d1b44a8f6e6363d94d5ab1013700b13
 *
 * Replaces:
 * - room_stat: room control with a mercury bottle, in the hall
 *
 * Stays hard-wired, and must:
 * - boiler_limit: limit of the boiler, part of its burner control
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
 * Open findings: 1 earth_fault_bypasses_limit (act, room4); 2 contact_life (act, boiler); 3
 * mercury_asbestos_refrigerant (act, room_stat); 4 approval_lapses (act, room4); 5
 * probe_sees_the_room (act, room_stat); 6 danger_not_judged (act, cold_flat). Not judged, for want
 * of a figure: 1; risks.md says which.
 */
#ifndef ROOM4_PORT_H
#define ROOM4_PORT_H

#include "room4.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t room4_port_wait(void);

/* at the height of the old control, in moving air, away from the board, raw counts, as the
 * converter gives them
 */
uint16_t room4_port_read_room_probe(void);

/* dial of room control with a mercury bottle, in the hall, raw counts, as the converter gives them
 */
uint16_t room4_port_read_room_stat_dial(void);

/* Drives the coil or gate of call for heat to the boiler's own burner control: true puts current
 * into it.
 */
void room4_port_drive_boiler(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in room4.h. */
void room4_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool room4_port_recall(struct room4_remembered *r);
void room4_port_keep(const struct room4_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void room4_port_alive(void);

#endif
