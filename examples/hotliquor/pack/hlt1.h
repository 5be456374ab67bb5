/* hlt1.h: control program, what a caller needs
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
#ifndef HLT1_H
#define HLT1_H

#include <stdbool.h>
#include <stdint.h>

#define HLT1_STEP_MS 500u /* ms from one call of hlt1_step to the next */

/* Bits of fault in struct hlt1_out; 0 means none. */
#define HLT1_FAULT_LIQUOR_PROBE 0x0001u /* thermistor in the pocket of the old bulb: not believed */
/* 12 kW of immersion elements through a contactor: the contact did not open */
#define HLT1_FAULT_ELEMENTS_WELDED 0x0002u
/* 12 kW of immersion elements through a contactor: the contact did not make */
#define HLT1_FAULT_ELEMENTS_NOT_MADE 0x0004u
/* 12 kW of immersion elements through a contactor: on for long without effect on liquor_probe */
#define HLT1_FAULT_ELEMENTS_NO_EFFECT 0x0008u

/* thermistor in the pocket of the old bulb: is it believed? */
enum hlt1_liquor_probe_state {
    HLT1_LIQUOR_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    HLT1_LIQUOR_PROBE_STATE_GOOD = 1, /* believed */
    HLT1_LIQUOR_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    HLT1_LIQUOR_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* capillary stat, its bulb in the pocket half way up */
enum hlt1_liquor_stat {
    HLT1_LIQUOR_STAT_OPEN = 0, /* contact open */
    HLT1_LIQUOR_STAT_MADE = 1 /* contact made */
};

/* 12 kW of immersion elements through a contactor */
enum hlt1_elements {
    HLT1_ELEMENTS_OFF = 0, /* off */
    HLT1_ELEMENTS_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct hlt1_in {
    uint16_t liquor_probe; /* thermistor in the pocket of the old bulb, raw counts */
    bool elements_seen; /* read-back contact of 12 kW of immersion elements through a contactor */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: hlt1_port.c does the rest.
 */
struct hlt1_out {
    bool elements; /* 12 kW of immersion elements through a contactor; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct hlt1_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct hlt1 {
    uint8_t liquor_probe_good_for; /* good samples in a row */
    /* enum hlt1_liquor_probe_state: thermistor in the pocket of the old bulb: is it believed? */
    uint8_t liquor_probe_state;
    uint8_t liquor_probe_state_for; /* steps in this state */
    /* thermistor in the pocket of the old bulb: last believable sample */
    uint16_t liquor_probe_last;
    /* thermistor in the pocket of the old bulb: the believable sample before that */
    uint16_t liquor_probe_before;
    /* enum hlt1_liquor_stat: capillary stat, its bulb in the pocket half way up */
    uint8_t liquor_stat;
    uint8_t elements; /* enum hlt1_elements: 12 kW of immersion elements through a contactor */
    uint8_t elements_apart_for; /* steps that contact and command have differed */
    bool elements_welded; /* the contact did not open when told to */
    uint16_t elements_effect_from; /* reading furthest back since elements came on */
    uint16_t elements_effect_for; /* steps on without an effect */
    bool elements_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void hlt1_start(struct hlt1 *m, const struct hlt1_remembered *r);

/* Once every HLT1_STEP_MS. The times of the program are counts of these calls. */
void hlt1_step(struct hlt1 *m, const struct hlt1_in *in, struct hlt1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool hlt1_remember(const struct hlt1 *m, struct hlt1_remembered *r);

#endif
