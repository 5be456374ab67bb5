/* wah1_port.h: what the board must provide
 *
 * Equipment: Warm-air heater, joinery workshop
 * Site: Old Quay Joinery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: b318e6b5696aaa536be0f12bde773165258387b28b91ac06c88802479138f8e6
 *
 * Replaces:
 * - fan_disc: snap disc on the exchanger, starts the fan once it is warm
 * - exchanger_stat: second disc, holds the exchanger down
 *
 * Stays hard-wired, and must:
 * - exchanger_limit: rod limit across the exchanger, manual reset, in the burner's safety chain
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
 * Open findings: 1 limit_nuisance (act, exchanger_limit/exchanger_hot); 2 restarts_by_itself (act,
 * fan); 3 proving_switch_not_checked_open (act, room_calls); 4 welded_output (act, fan); 5
 * earth_fault_bypasses_limit (act, wah1); 6 probe_out_of_pocket (act, exchanger_stat); 7
 * moisture_direction (act, exchanger_probe); 8 damp_dust_washdown (act, wah1); 9 limit_error_budget
 * (act, exchanger_stat); 10 limit_error_budget (act, fan_disc); 11 contact_life (act, burner_call);
 * 12 mercury_asbestos_refrigerant (act, exchanger_stat); 13 mercury_asbestos_refrigerant (act,
 * fan_disc); 14 approval_lapses (act, wah1); 15 heating_and_cooling_overlap (act, exchanger_stat).
 * Not judged, for want of a figure: 2; risks.md says which.
 */
#ifndef WAH1_PORT_H
#define WAH1_PORT_H

#include "wah1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t wah1_port_wait(void);

/* room thermostat, stays as it is */
bool wah1_port_read_room_calls(void);

/* differential pressure switch over the fan */
bool wah1_port_read_air_proven(void);

/* platinum film probe clamped beside the old disc, raw counts, as the converter gives them */
uint16_t wah1_port_read_exchanger_probe(void);

/* Drives the coil or gate of call to the approved automatic burner control: true puts current into
 * it.
 */
void wah1_port_drive_burner_call(bool current);

/* Drives the coil or gate of 0.75 kW fan through its contactor: true puts current into it. */
void wah1_port_drive_fan(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in wah1.h. */
void wah1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool wah1_port_recall(struct wah1_remembered *r);
void wah1_port_keep(const struct wah1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void wah1_port_alive(void);

#endif
