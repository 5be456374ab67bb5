/* ext5_port.h: what the board must provide
 *
 * Equipment: Extract fan 5, press room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 54d9ac13d9eb912fbd316f24f482063aa393d6dff5a3975ab977bd52380134f8
 *
 * Replaces:
 * - room_stat: room stat by the presses
 *
 * Stays hard-wired, and must:
 * - protector: motor protector in the winding, resets by itself
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
 * Open findings: 1 restarts_by_itself (act, fan); 2 earth_fault_bypasses_limit (act, ext5); 3
 * moisture_direction (act, room_probe); 4 damp_dust_washdown (act, ext5); 5 approval_lapses (act,
 * ext5); 6 limit_threshold_unknown (act, protector). Not judged, for want of a figure: 2; risks.md
 * says which.
 */
#ifndef EXT5_PORT_H
#define EXT5_PORT_H

#include "ext5.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t ext5_port_wait(void);

/* switch on the inspection cover */
bool ext5_port_read_guard_open(void);

/* on the wall by the old stat, raw counts, as the converter gives them */
uint16_t ext5_port_read_room_probe(void);

/* current transformer in one phase with a rectifier, raw counts, as the converter gives them */
uint16_t ext5_port_read_line_current(void);

/* read-back contact of 0.55 kW extract fan, switched by the board */
bool ext5_port_read_fan_seen(void);

/* Drives the coil or gate of 0.55 kW extract fan, switched by the board: true puts current into it.
 */
void ext5_port_drive_fan(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in ext5.h. */
void ext5_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool ext5_port_recall(struct ext5_remembered *r);
void ext5_port_keep(const struct ext5_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void ext5_port_alive(void);

#endif
