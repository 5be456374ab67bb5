/* lorry2_port.h: what the board must provide
 *
 * Equipment: Direction indicators, works lorry 2
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9b57bd1b3ccf44e7bb4451caf8de9eeb2e1e5406a9c8380d4f38058c2a8bb2be
 *
 * Replaces:
 * - flasher: thermal flasher behind the panel
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
 * Open findings: 1 danger_without_barrier (act, unseen_turn/left_lamps); 2 damp_dust_washdown (act,
 * lorry2); 3 approval_lapses (act, lorry2); 4 output_doubtful (act, left_lamps); 5 output_doubtful
 * (act, right_lamps). Not judged, for want of a figure: 4; risks.md says which.
 */
#ifndef LORRY2_PORT_H
#define LORRY2_PORT_H

#include "lorry2.h"

/* Time. Returns once the next step is due, with the number of steps that have become due since the
 * last return: 1 when all is well, more when steps were missed, 0 when there is no clock.
 */
uint16_t lorry2_port_wait(void);

/* indicator stalk, left */
bool lorry2_port_read_stalk_left(void);

/* indicator stalk, right */
bool lorry2_port_read_stalk_right(void);

/* shunt in the common feed with its amplifier, raw counts, as the converter gives them */
uint16_t lorry2_port_read_shunt(void);

/* Drives the coil or gate of left lamps, front and rear: true puts current into it. */
void lorry2_port_drive_left_lamps(bool current);

/* Drives the coil or gate of right lamps, front and rear: true puts current into it. */
void lorry2_port_drive_right_lamps(bool current);

/* Shows the faults to somebody: a lamp, a display, a bus. Bits are named in lorry2.h. */
void lorry2_port_show(uint16_t fault);

/* The memory that survives a power cut, for a record of 2 bytes (sizeof, where the compiler leaves
 * gaps). Reading returns false where there is none or it cannot be read. A write that is torn is
 * found by the check word and comes up tripped; keep two copies in turn to avoid that.
 * This program has nothing to remember: both may do nothing.
 */
bool lorry2_port_recall(struct lorry2_remembered *r);
void lorry2_port_keep(const struct lorry2_remembered *r);

/* Tells the watchdog that a step has been done. Call it nowhere else: not from an interrupt, not
 * from a waiting loop.
 */
void lorry2_port_alive(void);

#endif
