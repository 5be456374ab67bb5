/* deck1.h: control program, what a caller needs
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
#ifndef DECK1_H
#define DECK1_H

#include <stdbool.h>
#include <stdint.h>

#define DECK1_STEP_MS 100u /* ms from one call of deck1_step to the next */

/* Bits of fault in struct deck1_out; 0 means none. */
/* sheathed probe in the clips of the old bulb: not believed */
#define DECK1_FAULT_ROOF_PROBE 0x0001u
/* dial of capillary stat with a knob, bulb in the roof of the chamber: wiper, track or wire broken;
 * the set point of the sheet holds
 */
#define DECK1_FAULT_OVEN_STAT_DIAL 0x0002u
/* 3.2 kW elements of the upper deck: on for long without effect on roof_probe */
#define DECK1_FAULT_ELEMENTS_NO_EFFECT 0x0004u

/* sheathed probe in the clips of the old bulb: is it believed? */
enum deck1_roof_probe_state {
    DECK1_ROOF_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    DECK1_ROOF_PROBE_STATE_GOOD = 1, /* believed */
    DECK1_ROOF_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    DECK1_ROOF_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* 3.2 kW elements of the upper deck */
enum deck1_elements {
    DECK1_ELEMENTS_OFF = 0, /* off */
    DECK1_ELEMENTS_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct deck1_in {
    bool limit_open; /* auxiliary contact of the limit's contactor */
    uint16_t roof_probe; /* sheathed probe in the clips of the old bulb, raw counts */
    /* dial of capillary stat with a knob, bulb in the roof of the chamber, raw counts */
    uint16_t oven_stat_dial;
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: deck1_port.c does the rest.
 */
struct deck1_out {
    bool elements; /* 3.2 kW elements of the upper deck; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct deck1_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct deck1 {
    uint8_t roof_probe_good_for; /* good samples in a row */
    /* enum deck1_roof_probe_state: sheathed probe in the clips of the old bulb: is it believed? */
    uint8_t roof_probe_state;
    uint8_t roof_probe_state_for; /* steps in this state */
    /* sheathed probe in the clips of the old bulb: last believable sample */
    uint16_t roof_probe_last;
    /* sheathed probe in the clips of the old bulb: the believable sample before that */
    uint16_t roof_probe_before;
    /* capillary stat with a knob, bulb in the roof of the chamber: steps since its last output */
    uint8_t oven_stat_at;
    uint8_t oven_stat_dial_lost_for; /* steps since the dial was last believed */
    uint16_t oven_stat_set_point; /* set point by the dial, in steps of 0.1 K */
    /* capillary stat with a knob, bulb in the roof of the chamber: integral */
    uint32_t oven_stat_sum;
    /* capillary stat with a knob, bulb in the roof of the chamber: output */
    uint16_t oven_stat_permille;
    uint8_t oven_stat_on_for; /* steps of this window that are on */
    uint8_t elements; /* enum deck1_elements: 3.2 kW elements of the upper deck */
    uint16_t elements_effect_from; /* reading furthest back since elements came on */
    uint16_t elements_effect_for; /* steps on without an effect */
    bool elements_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void deck1_start(struct deck1 *m, const struct deck1_remembered *r);

/* Once every DECK1_STEP_MS. The times of the program are counts of these calls. */
void deck1_step(struct deck1 *m, const struct deck1_in *in, struct deck1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool deck1_remember(const struct deck1 *m, struct deck1_remembered *r);

#endif
