/* coldroom3_port.h: what the board must provide
 *
 * Equipment: Cold room 3, dispatch
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 7ef342085c70459e6cb29baab250da8c6628f10255a6c73c759f4bacb45db0bc
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - warm_stat: second vapour-bulb control, rings at the gatehouse
 *
 * Stays hard-wired, and must:
 * - defrost_limit: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, spoilage/compressor); 2 danger_without_barrier
 * (act, spoilage/defrost_heater); 3 restarts_by_itself (act, compressor); 4 welded_output (act,
 * compressor); 5 welded_output (act, warm_alarm); 6 earth_fault_bypasses_limit (act, coldroom3); 7
 * moisture_direction (act, room_probe); 8 damp_dust_washdown (act, coldroom3); 9
 * mercury_asbestos_refrigerant (act, room_stat); 10 mercury_asbestos_refrigerant (act, warm_stat);
 * 11 approval_lapses (act, coldroom3); 12 limit_trips_late (act, defrost_limit/spoilage). Not
 * judged, for want of a figure: 3; risks.md says which.
 */
#ifndef COLDROOM3_PORT_H
#define COLDROOM3_PORT_H

#include "coldroom3.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t coldroom3_port_wait(void);

/* high-pressure switch of the compressor, healthy when closed */
bool coldroom3_port_read_hp_switch(void);

/* return air, raw counts, as the converter gives them */
uint16_t coldroom3_port_read_room_probe(void);

/* on the coil, at the last row, raw counts, as the converter gives them */
uint16_t coldroom3_port_read_coil_probe(void);

/* Drives the coil or gate of 2.2 kW compressor through its contactor: true puts current into it. */
void coldroom3_port_drive_compressor(bool current);

/* Drives the coil or gate of 1.2 kW defrost heater in the coil: true puts current into it. */
void coldroom3_port_drive_defrost_heater(bool current);

/* Drives the coil or gate of sounder at the gatehouse: true puts current into it. */
void coldroom3_port_drive_warm_alarm(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in coldroom3.h. */
void coldroom3_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool coldroom3_port_recall(struct coldroom3_remembered *r);
void coldroom3_port_keep(const struct coldroom3_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void coldroom3_port_alive(void);

#endif
