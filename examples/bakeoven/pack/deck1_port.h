/* deck1_port.h: what the board must provide
 *
 * Equipment: Deck oven 1
 * Site: Mill Row Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 88dee7d788eea2cc77b8bc3610c497045922544a8fada194fb9a90d0fe5ee7a2
 *
 * Replaces:
 * - oven_stat: capillary stat with a knob, bulb in the roof of the chamber
 *
 * Stays hard-wired, and must:
 * - oven_limit: capillary limit, opens the contactor in front of the switch
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
 * Open findings: 1 limit_nuisance (act, oven_limit/fire); 2 ssr_shorts_on (act, elements); 3
 * earth_fault_bypasses_limit (act, deck1); 4 moisture_direction (act, roof_probe); 5
 * damp_dust_washdown (act, deck1); 6 limit_error_budget (act, oven_stat); 7
 * mercury_asbestos_refrigerant (act, oven_stat); 8 approval_lapses (act, deck1); 9 flicker (act,
 * elements).
 */
#ifndef DECK1_PORT_H
#define DECK1_PORT_H

#include "deck1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t deck1_port_wait(void);

/* auxiliary contact of the limit's contactor */
bool deck1_port_read_limit_open(void);

/* sheathed probe in the clips of the old bulb, raw counts, as the converter gives them */
uint16_t deck1_port_read_roof_probe(void);

/* dial of capillary stat with a knob, bulb in the roof of the chamber, raw counts, as the converter
 * gives them
 */
uint16_t deck1_port_read_oven_stat_dial(void);

/* Drives the coil or gate of 3.2 kW elements of the upper deck: true puts current into it. */
void deck1_port_drive_elements(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in deck1.h. */
void deck1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool deck1_port_recall(struct deck1_remembered *r);
void deck1_port_keep(const struct deck1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void deck1_port_alive(void);

#endif
