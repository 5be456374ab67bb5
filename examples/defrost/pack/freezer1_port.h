/* freezer1_port.h: what the board must provide
 *
 * Equipment: Freezer room 1
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 1f8c58c041d92eadc6dae97188ff3a72f4678da398d9ac747ea86898351923fb
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - fan_delay: disc on the coil, holds the fans back while the coil is warm
 *
 * Stays hard-wired, and must:
 * - heater_disc: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, thaw/coil_fan); 2 danger_without_barrier (act,
 * thaw/compressor); 3 danger_without_barrier (act, thaw/defrost_heater); 4 restarts_by_itself (act,
 * coil_fan); 5 restarts_by_itself (act, compressor); 6 fan_stopped_on_fault (act, coil_fan); 7
 * welded_output (act, coil_fan); 8 welded_output (act, compressor); 9 earth_fault_bypasses_limit
 * (act, freezer1); 10 probe_out_of_pocket (act, fan_delay); 11 moisture_direction (act,
 * room_probe); 12 mercury_asbestos_refrigerant (act, fan_delay); 13 mercury_asbestos_refrigerant
 * (act, room_stat); 14 approval_lapses (act, freezer1); 15 limit_trips_late (act,
 * heater_disc/thaw); 16 heat_flow_not_proved (act, coil_fan). Not judged, for want of a figure: 3;
 * risks.md says which.
 */
#ifndef FREEZER1_PORT_H
#define FREEZER1_PORT_H

#include "freezer1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t freezer1_port_wait(void);

/* high-pressure switch of the compressor, healthy when closed */
bool freezer1_port_read_hp_switch(void);

/* return air, raw counts, as the converter gives them */
uint16_t freezer1_port_read_room_probe(void);

/* on the coil, at the last row, where the old discs were, raw counts, as the converter gives them
 */
uint16_t freezer1_port_read_coil_probe(void);

/* Drives the coil or gate of 1.8 kW defrost heater in coil and tray: true puts current into it. */
void freezer1_port_drive_defrost_heater(bool current);

/* Drives the coil or gate of 3 kW compressor through its contactor: true puts current into it. */
void freezer1_port_drive_compressor(bool current);

/* Drives the coil or gate of two fans on the coil: true puts current into it. */
void freezer1_port_drive_coil_fan(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in freezer1.h. */
void freezer1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 3 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 */
bool freezer1_port_recall(struct freezer1_remembered *r);
void freezer1_port_keep(const struct freezer1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void freezer1_port_alive(void);

#endif
