/* cal2_port.h: what the board must provide
 *
 * Equipment: Calorifier 2, east plant room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 2ab43e817eac8807b18bdd14c38c5efd2bd324b5d3f4009e33bafa75cbb44596
 *
 * Replaces:
 * - tank_stat: rod immersion stat in the top boss
 *
 * Stays hard-wired, and must:
 * - high_limit: capillary limit in the same boss, manual reset
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
 * Open findings: 2 proving_switch_not_checked_open (act, flow_proven); 3 earth_fault_bypasses_limit
 * (act, cal2); 4 insulation_of_new_probe (act, tank_probe); 5 contact_life (act, heater); 6
 * scald_and_storage (act, tank_stat); 7 model_beyond_evidence (act, cal2); 8
 * mercury_asbestos_refrigerant (act, tank_stat); 9 approval_lapses (act, cal2). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#ifndef CAL2_PORT_H
#define CAL2_PORT_H

#include "cal2.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t cal2_port_wait(void);

/* flow switch on the primary pump */
bool cal2_port_read_flow_proven(void);

/* auxiliary contact of the limit's own contactor */
bool cal2_port_read_limit_open(void);

/* thermistor in the pocket of the old rod stat, raw counts, as the converter gives them */
uint16_t cal2_port_read_tank_probe(void);

/* read-back contact of 9 kW immersion heater through its contactor */
bool cal2_port_read_heater_seen(void);

/* Drives the coil or gate of 9 kW immersion heater through its contactor: true puts current into
 * it.
 */
void cal2_port_drive_heater(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in cal2.h. */
void cal2_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool cal2_port_recall(struct cal2_remembered *r);
void cal2_port_keep(const struct cal2_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void cal2_port_alive(void);

#endif
