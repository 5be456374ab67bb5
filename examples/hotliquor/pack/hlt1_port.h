/* hlt1_port.h: what the board must provide
 *
 * Equipment: Hot-liquor tank 1, brewhouse
 * Site: Quayside Brewery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 578850f718fbb5826141e839c71ef53b44ecfcb9f5166c7575dad1c350269f46
 *
 * Replaces:
 * - liquor_stat: capillary stat, its bulb in the pocket half way up
 *
 * Stays hard-wired, and must:
 * - tank_limit: capillary limit in a pocket of its own, manual reset
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
 * Open findings: 1 earth_fault_bypasses_limit (act, hlt1); 2 probe_out_of_pocket (act,
 * liquor_stat); 3 damp_dust_washdown (act, hlt1); 4 contact_life (act, elements); 5
 * scald_and_storage (act, liquor_stat); 6 model_beyond_evidence (act, hlt1); 7
 * mercury_asbestos_refrigerant (act, liquor_stat); 8 approval_lapses (act, hlt1); 9
 * overshoot_not_determined (act, tank_limit/boiling). Not judged, for want of a figure: 1; risks.md
 * says which.
 */
#ifndef HLT1_PORT_H
#define HLT1_PORT_H

#include "hlt1.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t hlt1_port_wait(void);

/* thermistor in the pocket of the old bulb, raw counts, as the converter gives them */
uint16_t hlt1_port_read_liquor_probe(void);

/* read-back contact of 12 kW of immersion elements through a contactor */
bool hlt1_port_read_elements_seen(void);

/* Drives the coil or gate of 12 kW of immersion elements through a contactor: true puts current
 * into it.
 */
void hlt1_port_drive_elements(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in hlt1.h. */
void hlt1_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool hlt1_port_recall(struct hlt1_remembered *r);
void hlt1_port_keep(const struct hlt1_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void hlt1_port_alive(void);

#endif
