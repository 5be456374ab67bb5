/* prover2_port.h: what the board must provide
 *
 * Equipment: Proving cabinet 2, bakehouse
 * Site: Corner Street Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 7623973e50583a795a5345b85802ca57bccc8dfe797083b1f42b0105bf0a05bb
 *
 * Replaces:
 * - cabinet_stat: snap disc behind the back panel
 *
 * Stays hard-wired, and must:
 * - cabinet_limit: second snap disc on the same panel, manual reset
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
 * Open findings: 1 limit_nuisance (act, cabinet_limit/overheating); 2 earth_fault_bypasses_limit
 * (act, prover2); 3 probe_out_of_pocket (act, cabinet_stat); 4 limit_error_budget (act,
 * cabinet_stat); 5 contact_life (act, heater); 6 model_beyond_evidence (act, prover2); 7
 * mercury_asbestos_refrigerant (act, cabinet_stat); 8 approval_lapses (act, prover2); 9
 * overshoot_not_determined (act, cabinet_limit/overheating). Not judged, for want of a figure: 1;
 * risks.md says which.
 */
#ifndef PROVER2_PORT_H
#define PROVER2_PORT_H

#include "prover2.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t prover2_port_wait(void);

/* thermistor bead in the air stream, raw counts, as the converter gives them */
uint16_t prover2_port_read_cabinet_probe(void);

/* Drives the coil or gate of 1.2 kW heating mat: true puts current into it. */
void prover2_port_drive_heater(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in prover2.h. */
void prover2_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool prover2_port_recall(struct prover2_remembered *r);
void prover2_port_keep(const struct prover2_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void prover2_port_alive(void);

#endif
