/* hob3_port.h: what the board must provide
 *
 * Equipment: Hob plate 3, canteen
 * Site: Mill Row Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 4ca60f51ff403cb3194aafe54d396d8a600e99162d805a4ec674f3aeba5f530b
 *
 * Replaces:
 * - regulator: energy regulator behind the knob
 *
 * Stays hard-wired, and must:
 * - plate_limit: rod limiter in the plate
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
 * Open findings: 1 earth_fault_bypasses_limit (act, hob3); 2 watchdog_inside (act, hob3); 3
 * enclosure_too_hot_cold (act, hob3); 4 damp_dust_washdown (act, hob3); 5 model_beyond_evidence
 * (act, hob3); 6 approval_lapses (act, hob3); 7 overshoot_not_determined (act,
 * plate_limit/fat_fire). Not judged, for want of a figure: 3; risks.md says which.
 */
#ifndef HOB3_PORT_H
#define HOB3_PORT_H

#include "hob3.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t hob3_port_wait(void);

/* dial of energy regulator behind the knob, raw counts, as the converter gives them */
uint16_t hob3_port_read_regulator_dial(void);

/* Drives the coil or gate of 1.8 kW cast plate: true puts current into it. */
void hob3_port_drive_plate(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in hob3.h. */
void hob3_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool hob3_port_recall(struct hob3_remembered *r);
void hob3_port_keep(const struct hob3_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void hob3_port_alive(void);

#endif
