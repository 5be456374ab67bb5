/* floor2.h: control program, what a caller needs
 *
 * Equipment: Floor heating, hall 2, mixing valve
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 89a969e7b30031b226d184e39ac05c100976b9f76056120571832deaef0e8bfd
 *
 * Replaces:
 * - self_acting: self-acting mixing valve, bulb in the flow
 *
 * Stays hard-wired, and must:
 * - floor_limit: contact stat strapped to the flow, shuts a valve of its own
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
 * Open findings: 1 danger_without_barrier (act, screed/mixer); 2 trips_dead_no_more (act,
 * self_acting); 3 proving_switch_not_checked_open (act, pump_runs); 4 ssr_shorts_on (act, mixer); 5
 * earth_fault_bypasses_limit (act, floor2); 6 moisture_direction (act, flow_probe); 7
 * self_powered_lost (act, self_acting); 8 mercury_asbestos_refrigerant (act, self_acting); 9
 * approval_lapses (act, floor2); 10 limit_trips_late (act, floor_limit/screed). Not judged, for
 * want of a figure: 4; risks.md says which.
 */
#ifndef FLOOR2_H
#define FLOOR2_H

#include <stdbool.h>
#include <stdint.h>

#define FLOOR2_STEP_MS 200u /* ms from one call of floor2_step to the next */

/* Bits of fault in struct floor2_out; 0 means none. */
/* immersion probe in the pocket of the old bulb: not believed */
#define FLOOR2_FAULT_FLOW_PROBE 0x0001u

/* immersion probe in the pocket of the old bulb: is it believed? */
enum floor2_flow_probe_state {
    FLOOR2_FLOW_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    FLOOR2_FLOW_PROBE_STATE_GOOD = 1, /* believed */
    FLOOR2_FLOW_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    FLOOR2_FLOW_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* three-way mixing valve with its three-point actuator: which way it runs */
enum floor2_mixer_move {
    FLOOR2_MIXER_MOVE_RESTS = 0, /* stands */
    FLOOR2_MIXER_MOVE_OPENS = 1, /* runs open */
    FLOOR2_MIXER_MOVE_CLOSES = 2 /* runs shut */
};

/* What the board hands over at every step. */
struct floor2_in {
    bool pump_runs; /* auxiliary contact of the circulation pump */
    uint16_t flow_probe; /* immersion probe in the pocket of the old bulb, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: floor2_port.c does the rest.
 */
struct floor2_out {
    uint16_t mixer; /* three-way mixing valve with its three-point actuator */
    bool mixer_opens; /* three-way mixing valve with its three-point actuator: run open */
    bool mixer_closes; /* three-way mixing valve with its three-point actuator: run shut */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct floor2_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct floor2 {
    uint8_t flow_probe_good_for; /* good samples in a row */
    /* enum floor2_flow_probe_state: immersion probe in the pocket of the old bulb: is it believed?
     */
    uint8_t flow_probe_state;
    uint8_t flow_probe_state_for; /* steps in this state */
    /* immersion probe in the pocket of the old bulb: last believable sample */
    uint16_t flow_probe_last;
    /* immersion probe in the pocket of the old bulb: the believable sample before that */
    uint16_t flow_probe_before;
    /* self-acting mixing valve, bulb in the flow: steps since its last output */
    uint8_t self_acting_at;
    uint32_t self_acting_sum; /* self-acting mixing valve, bulb in the flow: integral */
    uint16_t self_acting_permille; /* self-acting mixing valve, bulb in the flow: output */
    uint16_t mixer_position; /* three-way mixing valve with its three-point actuator: position */
    uint16_t mixer_awake_for; /* steps since the start */
    uint16_t mixer_stem; /* steps that the stem stands open, as counted */
    /* enum floor2_mixer_move: three-way mixing valve with its three-point actuator: which way it
     * runs
     */
    uint8_t mixer_move;
    uint8_t mixer_end_for; /* steps at an end */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void floor2_start(struct floor2 *m, const struct floor2_remembered *r);

/* Once every FLOOR2_STEP_MS. The times of the program are counts of these calls. */
void floor2_step(struct floor2 *m, const struct floor2_in *in, struct floor2_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool floor2_remember(const struct floor2 *m, struct floor2_remembered *r);

#endif
