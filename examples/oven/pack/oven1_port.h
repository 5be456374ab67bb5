/* oven1_port.h: what the board must provide
 *
 * Equipment: Deck oven 1, bakehouse
 * Site: Corner Street Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: c5309404c721b975be15425c058db2a2b60c8cf3ec5c5c6afa6a43656858588b
 *
 * Replaces:
 * - chamber_stat: capillary stat with its bulb in the crown of the chamber
 *
 * Stays hard-wired, and must:
 * - chamber_limit: second capillary in the flue corner, manual reset
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
 * Open findings: 1 kept_limit_fails_as_cold (act, chamber_limit); 2 proving_switch_not_checked_open
 * (act, door_shut); 3 earth_fault_bypasses_limit (act, oven1); 4 thermocouple_reversed_or_shorted
 * (act, chamber_probe); 5 damp_dust_washdown (act, oven1); 6 contact_life (act, elements); 7
 * mercury_asbestos_refrigerant (act, chamber_stat); 8 approval_lapses (act, oven1). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#ifndef OVEN1_PORT_H
#define OVEN1_PORT_H

#include "oven1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t oven1_port_wait(void);

/* door switch */
bool oven1_port_read_door_shut(void);

/* sheathed thermocouple beside the old bulb, raw counts, as the converter gives them */
uint16_t oven1_port_read_chamber_probe(void);

/* read-back contact of 12 kW of top and bottom elements through a contactor */
bool oven1_port_read_elements_seen(void);

/* Drives the coil or gate of 12 kW of top and bottom elements through a contactor: true puts
 * current into it.
 */
void oven1_port_drive_elements(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in oven1.h. */
void oven1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool oven1_port_recall(struct oven1_remembered *r);
void oven1_port_keep(const struct oven1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void oven1_port_alive(void);

#endif
