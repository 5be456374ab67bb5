/* wah1.h: control program, what a caller needs
 *
 * Equipment: Warm-air heater, joinery workshop
 * Site: Old Quay Joinery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: b318e6b5696aaa536be0f12bde773165258387b28b91ac06c88802479138f8e6
 *
 * Replaces:
 * - fan_disc: snap disc on the exchanger, starts the fan once it is warm
 * - exchanger_stat: second disc, holds the exchanger down
 *
 * Stays hard-wired, and must:
 * - exchanger_limit: rod limit across the exchanger, manual reset, in the burner's safety chain
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
 * Open findings: 1 limit_nuisance (act, exchanger_limit/exchanger_hot); 2 restarts_by_itself (act,
 * fan); 3 proving_switch_not_checked_open (act, room_calls); 4 welded_output (act, fan); 5
 * earth_fault_bypasses_limit (act, wah1); 6 probe_out_of_pocket (act, exchanger_stat); 7
 * moisture_direction (act, exchanger_probe); 8 damp_dust_washdown (act, wah1); 9 limit_error_budget
 * (act, exchanger_stat); 10 limit_error_budget (act, fan_disc); 11 contact_life (act, burner_call);
 * 12 mercury_asbestos_refrigerant (act, exchanger_stat); 13 mercury_asbestos_refrigerant (act,
 * fan_disc); 14 approval_lapses (act, wah1); 15 heating_and_cooling_overlap (act, exchanger_stat).
 * Not judged, for want of a figure: 2; risks.md says which.
 */
#ifndef WAH1_H
#define WAH1_H

#include <stdbool.h>
#include <stdint.h>

#define WAH1_STEP_MS 250u /* ms from one call of wah1_step to the next */

/* Bits of fault in struct wah1_out; 0 means none. */
/* platinum film probe clamped beside the old disc: not believed */
#define WAH1_FAULT_EXCHANGER_PROBE 0x0001u
/* call to the approved automatic burner control: on for long without effect on exchanger_probe */
#define WAH1_FAULT_BURNER_CALL_NO_EFFECT 0x0002u

/* platinum film probe clamped beside the old disc: is it believed? */
enum wah1_exchanger_probe_state {
    WAH1_EXCHANGER_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    WAH1_EXCHANGER_PROBE_STATE_GOOD = 1, /* believed */
    WAH1_EXCHANGER_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    WAH1_EXCHANGER_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* snap disc on the exchanger, starts the fan once it is warm */
enum wah1_fan_disc {
    WAH1_FAN_DISC_OPEN = 0, /* contact open */
    WAH1_FAN_DISC_MADE = 1 /* contact made */
};

/* second disc, holds the exchanger down */
enum wah1_exchanger_stat {
    WAH1_EXCHANGER_STAT_OPEN = 0, /* contact open */
    WAH1_EXCHANGER_STAT_MADE = 1 /* contact made */
};

/* call to the approved automatic burner control */
enum wah1_burner_call {
    WAH1_BURNER_CALL_OFF = 0, /* off */
    WAH1_BURNER_CALL_ON = 1 /* on */
};

/* the fan cools the exchanger after the burner */
enum wah1_run_on {
    WAH1_RUN_ON_IDLE = 0, /* nothing to do */
    WAH1_RUN_ON_RUNNING = 1, /* running */
    WAH1_RUN_ON_ARMED = 2 /* its cause is on */
};

/* 0.75 kW fan through its contactor */
enum wah1_fan {
    WAH1_FAN_OFF = 0, /* off */
    WAH1_FAN_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct wah1_in {
    bool room_calls; /* room thermostat, stays as it is */
    bool air_proven; /* differential pressure switch over the fan */
    uint16_t exchanger_probe; /* platinum film probe clamped beside the old disc, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: wah1_port.c does the rest.
 */
struct wah1_out {
    bool burner_call; /* call to the approved automatic burner control; rests off, safe off */
    bool fan; /* 0.75 kW fan through its contactor; rests on, safe on */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct wah1_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct wah1 {
    uint8_t exchanger_probe_good_for; /* good samples in a row */
    /* enum wah1_exchanger_probe_state: platinum film probe clamped beside the old disc: is it
     * believed?
     */
    uint8_t exchanger_probe_state;
    uint8_t exchanger_probe_state_for; /* steps in this state */
    /* platinum film probe clamped beside the old disc: last believable sample */
    uint16_t exchanger_probe_last;
    /* platinum film probe clamped beside the old disc: the believable sample before that */
    uint16_t exchanger_probe_before;
    /* enum wah1_fan_disc: snap disc on the exchanger, starts the fan once it is warm */
    uint8_t fan_disc;
    uint8_t exchanger_stat; /* enum wah1_exchanger_stat: second disc, holds the exchanger down */
    uint8_t burner_call; /* enum wah1_burner_call: call to the approved automatic burner control */
    uint16_t burner_call_effect_from; /* reading furthest back since burner_call came on */
    uint16_t burner_call_effect_for; /* steps on without an effect */
    bool burner_call_no_effect; /* was on for long without an effect */
    uint8_t run_on; /* enum wah1_run_on: the fan cools the exchanger after the burner */
    uint16_t run_on_for; /* steps in this state */
    uint8_t fan; /* enum wah1_fan: 0.75 kW fan through its contactor */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void wah1_start(struct wah1 *m, const struct wah1_remembered *r);

/* Once every WAH1_STEP_MS. The times of the program are counts of these calls. */
void wah1_step(struct wah1 *m, const struct wah1_in *in, struct wah1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool wah1_remember(const struct wah1 *m, struct wah1_remembered *r);

#endif
