/* hob3.h: control program, what a caller needs
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
#ifndef HOB3_H
#define HOB3_H

#include <stdbool.h>
#include <stdint.h>

#define HOB3_STEP_MS 100u /* ms from one call of hob3_step to the next */

/* Bits of fault in struct hob3_out; 0 means none. */
/* dial of energy regulator behind the knob: wiper, track or wire broken; it stays off */
#define HOB3_FAULT_REGULATOR_DIAL 0x0001u

/* 1.8 kW cast plate */
enum hob3_plate {
    HOB3_PLATE_OFF = 0, /* off */
    HOB3_PLATE_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct hob3_in {
    uint16_t regulator_dial; /* dial of energy regulator behind the knob, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: hob3_port.c does the rest.
 */
struct hob3_out {
    bool plate; /* 1.8 kW cast plate; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct hob3_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct hob3 {
    uint8_t regulator_dial_lost_for; /* steps since the dial was last believed */
    uint16_t regulator_at; /* energy regulator behind the knob: steps since it made */
    uint8_t plate; /* enum hob3_plate: 1.8 kW cast plate */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void hob3_start(struct hob3 *m, const struct hob3_remembered *r);

/* Once every HOB3_STEP_MS. The times of the program are counts of these calls. */
void hob3_step(struct hob3 *m, const struct hob3_in *in, struct hob3_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool hob3_remember(const struct hob3 *m, struct hob3_remembered *r);

#endif
