/* shop6_port.h: what the board must provide
 *
 * Equipment: Air unit, shop 6
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 32f7d1ef79301c6ede0455790c8aceb65249c467c20e6eea1a29094717386ee2
 *
 * Replaces:
 * - stage_one: sequence control, first contact
 * - stage_two: sequence control, second contact
 * - cool_stage: sequence control, third contact
 *
 * Stays hard-wired, and must:
 * - duct_limit: capillary limit across the duct heater, manual reset
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
 * Open findings: 1 restarts_by_itself (act, cooling); 2 restarts_by_itself (act, supply_fan); 3
 * safe_on_but_rests_off (act, supply_fan); 4 proving_switch_not_checked_open (act, occupied); 5
 * welded_output (act, cooling); 6 welded_output (act, supply_fan); 7 earth_fault_bypasses_limit
 * (act, shop6); 8 moisture_direction (act, room_probe); 9 contact_life (act, heat_one); 10
 * mercury_asbestos_refrigerant (act, cool_stage); 11 mercury_asbestos_refrigerant (act, stage_one);
 * 12 mercury_asbestos_refrigerant (act, stage_two); 13 approval_lapses (act, shop6); 14
 * load_effect_unknown (act, supply_fan); 15 output_doubtful (act, supply_fan). Not judged, for want
 * of a figure: 3; risks.md says which.
 */
#ifndef SHOP6_PORT_H
#define SHOP6_PORT_H

#include "shop6.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t shop6_port_wait(void);

/* air flow switch behind the fan */
bool shop6_port_read_airflow(void);

/* time switch of the shop */
bool shop6_port_read_occupied(void);

/* return air grille, where the old bulb was, raw counts, as the converter gives them */
uint16_t shop6_port_read_room_probe(void);

/* read-back contact of 6 kW duct heater, first stage, through its contactor */
bool shop6_port_read_heat_one_seen(void);

/* read-back contact of 6 kW duct heater, second stage, through its contactor */
bool shop6_port_read_heat_two_seen(void);

/* Drives the coil or gate of 6 kW duct heater, first stage, through its contactor: true puts
 * current into it.
 */
void shop6_port_drive_heat_one(bool current);

/* Drives the coil or gate of 6 kW duct heater, second stage, through its contactor: true puts
 * current into it.
 */
void shop6_port_drive_heat_two(bool current);

/* Drives the coil or gate of compressor of the cooling coil, through its contactor: true puts
 * current into it.
 */
void shop6_port_drive_cooling(bool current);

/* Drives the coil or gate of supply fan: true puts current into it. */
void shop6_port_drive_supply_fan(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in shop6.h. */
void shop6_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool shop6_port_recall(struct shop6_remembered *r);
void shop6_port_keep(const struct shop6_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void shop6_port_alive(void);

#endif
