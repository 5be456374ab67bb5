/* prover2.h: control program, what a caller needs
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
#ifndef PROVER2_H
#define PROVER2_H

#include <stdbool.h>
#include <stdint.h>

#define PROVER2_STEP_MS 250u /* ms from one call of prover2_step to the next */

/* Bits of fault in struct prover2_out; 0 means none. */
#define PROVER2_FAULT_CABINET_PROBE 0x0001u /* thermistor bead in the air stream: not believed */
/* 1.2 kW heating mat: on for long without effect on cabinet_probe */
#define PROVER2_FAULT_HEATER_NO_EFFECT 0x0002u

/* thermistor bead in the air stream: is it believed? */
enum prover2_cabinet_probe_state {
    PROVER2_CABINET_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    PROVER2_CABINET_PROBE_STATE_GOOD = 1, /* believed */
    PROVER2_CABINET_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    PROVER2_CABINET_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* snap disc behind the back panel */
enum prover2_cabinet_stat {
    PROVER2_CABINET_STAT_OPEN = 0, /* contact open */
    PROVER2_CABINET_STAT_MADE = 1 /* contact made */
};

/* 1.2 kW heating mat */
enum prover2_heater {
    PROVER2_HEATER_OFF = 0, /* off */
    PROVER2_HEATER_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct prover2_in {
    uint16_t cabinet_probe; /* thermistor bead in the air stream, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: prover2_port.c does the rest.
 */
struct prover2_out {
    bool heater; /* 1.2 kW heating mat; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct prover2_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct prover2 {
    uint8_t cabinet_probe_good_for; /* good samples in a row */
    /* enum prover2_cabinet_probe_state: thermistor bead in the air stream: is it believed? */
    uint8_t cabinet_probe_state;
    uint8_t cabinet_probe_state_for; /* steps in this state */
    uint16_t cabinet_probe_last; /* thermistor bead in the air stream: last believable sample */
    /* thermistor bead in the air stream: the believable sample before that */
    uint16_t cabinet_probe_before;
    uint32_t cabinet_stat_smoothed; /* reading behind a lag of 56.4 s, in parts of a count */
    uint8_t cabinet_stat; /* enum prover2_cabinet_stat: snap disc behind the back panel */
    uint8_t heater; /* enum prover2_heater: 1.2 kW heating mat */
    uint16_t heater_effect_from; /* reading furthest back since heater came on */
    uint16_t heater_effect_for; /* steps on without an effect */
    bool heater_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void prover2_start(struct prover2 *m, const struct prover2_remembered *r);

/* Once every PROVER2_STEP_MS. The times of the program are counts of these calls. */
void prover2_step(struct prover2 *m, const struct prover2_in *in, struct prover2_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool prover2_remember(const struct prover2 *m, struct prover2_remembered *r);

#endif
