/* genset1.h: control program, what a caller needs
 *
 * Equipment: Standby engine 1, coolant circuit
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: bcf8b9ec5ac6bc7c71efdeb2099586f05b6a7d4fa187b281a257f1b0da95d2f1
 *
 * Replaces:
 * - wax_valve: wax element in the coolant outlet
 *
 * Stays hard-wired, and must:
 * - overheat_switch: snap disc in the cylinder head, stops the engine
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
 * Open findings: 1 danger_without_barrier (act, overheat/radiator_valve); 2 trips_dead_no_more
 * (act, wax_valve); 3 earth_fault_bypasses_limit (act, genset1); 4 moisture_direction (act,
 * outlet_probe); 5 damp_dust_washdown (act, genset1); 6 self_powered_lost (act, wax_valve); 7
 * mercury_asbestos_refrigerant (act, wax_valve); 8 approval_lapses (act, genset1). Not judged, for
 * want of a figure: 3; risks.md says which.
 */
#ifndef GENSET1_H
#define GENSET1_H

#include <stdbool.h>
#include <stdint.h>

#define GENSET1_STEP_MS 100u /* ms from one call of genset1_step to the next */

/* Bits of fault in struct genset1_out; 0 means none. */
/* screwed into the old housing, in the coolant outlet: not believed */
#define GENSET1_FAULT_OUTLET_PROBE 0x0001u

/* screwed into the old housing, in the coolant outlet: is it believed? */
enum genset1_outlet_probe_state {
    GENSET1_OUTLET_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    GENSET1_OUTLET_PROBE_STATE_GOOD = 1, /* believed */
    GENSET1_OUTLET_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    GENSET1_OUTLET_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* What the board hands over at every step. */
struct genset1_in {
    bool overheat_open; /* auxiliary contact of the stop relay */
    uint16_t outlet_probe; /* screwed into the old housing, in the coolant outlet, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: genset1_port.c does the rest.
 */
struct genset1_out {
    uint16_t radiator_valve; /* three-way valve to the radiator with a spring-return actuator */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct genset1_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct genset1 {
    uint8_t outlet_probe_good_for; /* good samples in a row */
    /* enum genset1_outlet_probe_state: screwed into the old housing, in the coolant outlet: is it
     * believed?
     */
    uint8_t outlet_probe_state;
    uint8_t outlet_probe_state_for; /* steps in this state */
    /* screwed into the old housing, in the coolant outlet: last believable sample */
    uint16_t outlet_probe_last;
    /* screwed into the old housing, in the coolant outlet: the believable sample before that */
    uint16_t outlet_probe_before;
    uint16_t wax_valve_permille; /* wax element in the coolant outlet: opening */
    /* three-way valve to the radiator with a spring-return actuator: position */
    uint16_t radiator_valve_position;
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void genset1_start(struct genset1 *m, const struct genset1_remembered *r);

/* Once every GENSET1_STEP_MS. The times of the program are counts of these calls. */
void genset1_step(struct genset1 *m, const struct genset1_in *in, struct genset1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool genset1_remember(const struct genset1 *m, struct genset1_remembered *r);

#endif
