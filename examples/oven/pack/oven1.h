/* oven1.h: control program, what a caller needs
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
#ifndef OVEN1_H
#define OVEN1_H

#include <stdbool.h>
#include <stdint.h>

#define OVEN1_STEP_MS 500u /* ms from one call of oven1_step to the next */

/* Bits of fault in struct oven1_out; 0 means none. */
/* sheathed thermocouple beside the old bulb: not believed */
#define OVEN1_FAULT_CHAMBER_PROBE 0x0001u
/* 12 kW of top and bottom elements through a contactor: the contact did not open */
#define OVEN1_FAULT_ELEMENTS_WELDED 0x0002u
/* 12 kW of top and bottom elements through a contactor: the contact did not make */
#define OVEN1_FAULT_ELEMENTS_NOT_MADE 0x0004u
/* 12 kW of top and bottom elements through a contactor: on for long without effect on chamber_probe
 */
#define OVEN1_FAULT_ELEMENTS_NO_EFFECT 0x0008u

/* sheathed thermocouple beside the old bulb: is it believed? */
enum oven1_chamber_probe_state {
    OVEN1_CHAMBER_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    OVEN1_CHAMBER_PROBE_STATE_GOOD = 1, /* believed */
    OVEN1_CHAMBER_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    OVEN1_CHAMBER_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* capillary stat with its bulb in the crown of the chamber */
enum oven1_chamber_stat {
    OVEN1_CHAMBER_STAT_OPEN = 0, /* contact open */
    OVEN1_CHAMBER_STAT_MADE = 1 /* contact made */
};

/* 12 kW of top and bottom elements through a contactor */
enum oven1_elements {
    OVEN1_ELEMENTS_OFF = 0, /* off */
    OVEN1_ELEMENTS_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct oven1_in {
    bool door_shut; /* door switch */
    uint16_t chamber_probe; /* sheathed thermocouple beside the old bulb, raw counts */
    /* read-back contact of 12 kW of top and bottom elements through a contactor */
    bool elements_seen;
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: oven1_port.c does the rest.
 */
struct oven1_out {
    bool elements; /* 12 kW of top and bottom elements through a contactor; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct oven1_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct oven1 {
    uint8_t chamber_probe_good_for; /* good samples in a row */
    /* enum oven1_chamber_probe_state: sheathed thermocouple beside the old bulb: is it believed? */
    uint8_t chamber_probe_state;
    uint8_t chamber_probe_state_for; /* steps in this state */
    /* sheathed thermocouple beside the old bulb: last believable sample */
    uint16_t chamber_probe_last;
    /* sheathed thermocouple beside the old bulb: the believable sample before that */
    uint16_t chamber_probe_before;
    /* enum oven1_chamber_stat: capillary stat with its bulb in the crown of the chamber */
    uint8_t chamber_stat;
    /* enum oven1_elements: 12 kW of top and bottom elements through a contactor */
    uint8_t elements;
    uint8_t elements_apart_for; /* steps that contact and command have differed */
    bool elements_welded; /* the contact did not open when told to */
    uint16_t elements_effect_from; /* reading furthest back since elements came on */
    uint16_t elements_effect_for; /* steps on without an effect */
    bool elements_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void oven1_start(struct oven1 *m, const struct oven1_remembered *r);

/* Once every OVEN1_STEP_MS. The times of the program are counts of these calls. */
void oven1_step(struct oven1 *m, const struct oven1_in *in, struct oven1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool oven1_remember(const struct oven1 *m, struct oven1_remembered *r);

#endif
