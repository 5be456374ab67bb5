/* shop6.c: control program
 *
 * Equipment: Air unit, shop 6
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 32f7d1ef79301c6ede0455790c8aceb65249c467c20e6eea1a29094717386ee2
 *
 * Replaces:
 * - stage_one: sequence control, first contact
 * - stage_two: sequence control, second contact
 * - cool_stage: sequence control, third contact
 *
 * Stays hard-wired, and must:
 * - duct_limit: capillary limit across the duct heater, manual reset
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
 * Open findings: 1 restarts_by_itself (act, cooling); 2 restarts_by_itself (act, supply_fan); 3
 * safe_on_but_rests_off (act, supply_fan); 4 proving_switch_not_checked_open (act, occupied); 5
 * welded_output (act, cooling); 6 welded_output (act, supply_fan); 7 earth_fault_bypasses_limit
 * (act, shop6); 8 moisture_direction (act, room_probe); 9 contact_life (act, heat_one); 10
 * mercury_asbestos_refrigerant (act, cool_stage); 11 mercury_asbestos_refrigerant (act, stage_one);
 * 12 mercury_asbestos_refrigerant (act, stage_two); 13 approval_lapses (act, shop6); 14
 * load_effect_unknown (act, supply_fan); 15 output_doubtful (act, supply_fan). Not judged, for want
 * of a figure: 3; risks.md says which.
 */
#include "shop6.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -30 degC (electronics.sensors[0].valid, line 167):
 * thermistor (beta)
 */
#define SHOP6_ROOM_PROBE_HIGHEST 3814u
/* counts: lowest believable count, about 70 degC (electronics.sensors[0].valid, line 167):
 * thermistor (beta)
 */
#define SHOP6_ROOM_PROBE_LOWEST 740u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define SHOP6_ROOM_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of ROOM_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define SHOP6_ROOM_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define SHOP6_ROOM_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): ROOM_PROBE_FAULT_AFTER + ROOM_PROBE_GOOD_RUN
 */
#define SHOP6_ROOM_PROBE_PROVE_WITHIN 8u
/* counts: 19 degC (controls[0].makes_at, line 97): 19 degC is 2289.167 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at least 2289, which changes at 19.0041 degC; one count
 * is 0.0246 K; moved by 1 counts, so that the differential is not below the one asked for: 2290,
 * which changes at 18.9795 degC
 */
#define SHOP6_STAGE_ONE_MAKE 2290u
/* counts: 20 degC (controls[0].breaks_at, line 98): 20 degC is 2248.575 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at most 2248, which changes at 19.9895 degC; one
 * count is 0.0247 K
 */
#define SHOP6_STAGE_ONE_BREAK 2248u
/* counts: 17.5 degC (controls[1].makes_at, line 111): 17.5 degC is 2350.204 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 2350, which changes at 17.5050 degC; one
 * count is 0.0246 K; moved by 1 counts, so that the differential is not below the one asked for:
 * 2351, which changes at 17.4805 degC
 */
#define SHOP6_STAGE_TWO_MAKE 2351u
/* counts: 19 degC (controls[1].breaks_at, line 112): 19 degC is 2289.167 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at most 2288, which changes at 19.0041 degC; one
 * count is 0.0246 K
 */
#define SHOP6_STAGE_TWO_BREAK 2288u
/* counts: 24 degC (controls[2].makes_at, line 124): 24 degC is 2087.697 counts by thermistor
 * (beta); rounded down: at most 2087, which changes at 23.9924 degC; one count is 0.0251 K
 */
#define SHOP6_COOL_STAGE_MAKE 2087u
/* counts: 22.5 degC (controls[2].breaks_at, line 125): 22.5 degC is 2147.681 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 2148, which changes at 22.4920 degC; one
 * count is 0.0249 K
 */
#define SHOP6_COOL_STAGE_BREAK 2148u
/* steps: on for at least 60 s (controls[0].min_on, line 102): 60 s / 500 ms a step, rounded up */
#define SHOP6_HEAT_ONE_MIN_ON 120u
/* steps: off for at least 60 s (controls[0].min_off, line 103): 60 s / 500 ms a step, rounded up */
#define SHOP6_HEAT_ONE_MIN_OFF 120u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 500 ms a step, rounded up
 */
#define SHOP6_HEAT_ONE_CONTACT_SETTLES 2u
/* steps: an effect is expected within 18 min 21 s (process.settles_on, line 19): 3 times the
 * slowest expected answer: 50 min × ln((6 K + 0.49 K)/6 K) = 3 min 57 s, and 2 min 10 s of dead
 * time and lag; 18 min 21 s / 500 ms a step, rounded up
 */
#define SHOP6_HEAT_ONE_EFFECT_WITHIN 2203u
/* counts: 0.49 K towards the set point (process.settles_on, line 19): 0.5 of the differential */
#define SHOP6_HEAT_ONE_EFFECT 20
/* steps: runs for 4 min (timers[0].lasts, line 43): 4 min / 500 ms a step, rounded up */
#define SHOP6_SECOND_WAITS_LASTS 480u
/* steps: runs for 3 min (timers[1].lasts, line 44): 3 min / 500 ms a step, rounded up */
#define SHOP6_RUN_ON_LASTS 360u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 500 ms a step, rounded up
 */
#define SHOP6_HEAT_TWO_CONTACT_SETTLES 2u
/* steps: on for at least 3 min (controls[2].min_on, line 129): 3 min / 500 ms a step, rounded up */
#define SHOP6_COOLING_MIN_ON 360u
/* steps: off for at least 5 min (controls[2].min_off, line 130): 5 min / 500 ms a step, rounded up
 */
#define SHOP6_COOLING_MIN_OFF 600u

/* These do not compile where an assumption of this file does not hold. */
typedef char shop6_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char shop6_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char shop6_room_room_probe_good_for[(SHOP6_ROOM_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char shop6_room_room_probe_state_for[(SHOP6_ROOM_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char shop6_room_heat_one_apart_for[(SHOP6_HEAT_ONE_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char shop6_room_heat_one_effect_for[(SHOP6_HEAT_ONE_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char shop6_room_heat_one_for[(SHOP6_HEAT_ONE_MIN_ON <= 255u) ? 1 : -1];
typedef char shop6_room_second_waits_for[(SHOP6_SECOND_WAITS_LASTS <= 65535u) ? 1 : -1];
typedef char shop6_room_run_on_for[(SHOP6_RUN_ON_LASTS <= 65535u) ? 1 : -1];
typedef char shop6_room_heat_two_apart_for[(SHOP6_HEAT_TWO_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char shop6_room_cooling_for[(SHOP6_COOLING_MIN_OFF <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t shop6_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* return air grille, where the old bulb was: is it believed? */
static void shop6_room_probe_state(struct shop6 *m, bool room_probe_bad)
{
    if (m->room_probe_state_for < SHOP6_ROOM_PROBE_PROVE_WITHIN) {
        m->room_probe_state_for++;
    }
    switch ((enum shop6_room_probe_state)m->room_probe_state) {
    case SHOP6_ROOM_PROBE_STATE_PROVING:
        if (m->room_probe_good_for >= SHOP6_ROOM_PROBE_GOOD_RUN) {
            /* proved itself */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= SHOP6_ROOM_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case SHOP6_ROOM_PROBE_STATE_GOOD:
        if (room_probe_bad) {
            /* a bad sample */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_SUSPECT;
            m->room_probe_state_for = 0u;
        }
        break;
    case SHOP6_ROOM_PROBE_STATE_SUSPECT:
        if (m->room_probe_good_for >= SHOP6_ROOM_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= SHOP6_ROOM_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case SHOP6_ROOM_PROBE_STATE_FAULTY:
        if (m->room_probe_good_for >= SHOP6_ROOM_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_FAULTY;
        m->room_probe_state_for = 0u;
        break;
    }
}

/* sequence control, first contact */
static void shop6_stage_one(struct shop6 *m, uint16_t room_probe_counts)
{
    switch ((enum shop6_stage_one)m->stage_one) {
    case SHOP6_STAGE_ONE_OPEN:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts >= SHOP6_STAGE_ONE_MAKE)) {
            /* temperature has reached the make */
            m->stage_one = (uint8_t)SHOP6_STAGE_ONE_MADE;
        }
        break;
    case SHOP6_STAGE_ONE_MADE:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts <= SHOP6_STAGE_ONE_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->stage_one = (uint8_t)SHOP6_STAGE_ONE_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->stage_one = (uint8_t)SHOP6_STAGE_ONE_OPEN;
        break;
    }
}

/* sequence control, second contact */
static void shop6_stage_two(struct shop6 *m, uint16_t room_probe_counts)
{
    switch ((enum shop6_stage_two)m->stage_two) {
    case SHOP6_STAGE_TWO_OPEN:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts >= SHOP6_STAGE_TWO_MAKE)) {
            /* temperature has reached the make */
            m->stage_two = (uint8_t)SHOP6_STAGE_TWO_MADE;
        }
        break;
    case SHOP6_STAGE_TWO_MADE:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts <= SHOP6_STAGE_TWO_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->stage_two = (uint8_t)SHOP6_STAGE_TWO_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->stage_two = (uint8_t)SHOP6_STAGE_TWO_OPEN;
        break;
    }
}

/* sequence control, third contact */
static void shop6_cool_stage(struct shop6 *m, uint16_t room_probe_counts)
{
    switch ((enum shop6_cool_stage)m->cool_stage) {
    case SHOP6_COOL_STAGE_OPEN:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts <= SHOP6_COOL_STAGE_MAKE)) {
            /* temperature has reached the make */
            m->cool_stage = (uint8_t)SHOP6_COOL_STAGE_MADE;
        }
        break;
    case SHOP6_COOL_STAGE_MADE:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts >= SHOP6_COOL_STAGE_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->cool_stage = (uint8_t)SHOP6_COOL_STAGE_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->cool_stage = (uint8_t)SHOP6_COOL_STAGE_OPEN;
        break;
    }
}

/* 6 kW duct heater, first stage, through its contactor */
static void shop6_heat_one(struct shop6 *m, const struct shop6_in *in, bool heat_one_wanted)
{
    if (m->heat_one_for < SHOP6_HEAT_ONE_MIN_ON) {
        m->heat_one_for++;
    }
    switch ((enum shop6_heat_one)m->heat_one) {
    case SHOP6_HEAT_ONE_OFF:
        if (heat_one_wanted &&
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            !(m->heat_one_no_effect || m->heat_one_welded) &&
            m->heat_one_airflow_seen_off &&
            (m->heat_one_for >= SHOP6_HEAT_ONE_MIN_OFF)) {
            /* called for */
            m->heat_one = (uint8_t)SHOP6_HEAT_ONE_ON;
            m->heat_one_for = 0u;
        }
        break;
    case SHOP6_HEAT_ONE_ON:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) ||
            m->heat_one_no_effect ||
            m->heat_one_welded) {
            /* its safe state is off, before any minimum on time */
            m->heat_one = (uint8_t)SHOP6_HEAT_ONE_OFF;
            m->heat_one_for = 0u;
        } else if (!(in->airflow && in->occupied)) {
            /* something other than its operating contact has opened the circuit */
            m->heat_one = (uint8_t)SHOP6_HEAT_ONE_OFF;
            m->heat_one_for = 0u;
        } else if (!heat_one_wanted && (m->heat_one_for >= SHOP6_HEAT_ONE_MIN_ON)) {
            /* no longer called for */
            m->heat_one = (uint8_t)SHOP6_HEAT_ONE_OFF;
            m->heat_one_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->heat_one = (uint8_t)SHOP6_HEAT_ONE_OFF;
        m->heat_one_for = 0u;
        break;
    }
}

/* the second stage waits for the first */
static void shop6_second_waits(struct shop6 *m, const struct shop6_out *out)
{
    if (m->second_waits_for < SHOP6_SECOND_WAITS_LASTS) {
        m->second_waits_for++;
    }
    switch ((enum shop6_second_waits)m->second_waits) {
    case SHOP6_SECOND_WAITS_IDLE:
        if (out->heat_one) {
            /* its cause came on */
            m->second_waits = (uint8_t)SHOP6_SECOND_WAITS_RUNNING;
            m->second_waits_for = 0u;
        }
        break;
    case SHOP6_SECOND_WAITS_RUNNING:
        if (m->second_waits_for >= SHOP6_SECOND_WAITS_LASTS) {
            /* has run its time */
            m->second_waits = (uint8_t)SHOP6_SECOND_WAITS_DONE;
            m->second_waits_for = 0u;
        }
        break;
    case SHOP6_SECOND_WAITS_DONE:
        if (!out->heat_one) {
            /* its cause went off */
            m->second_waits = (uint8_t)SHOP6_SECOND_WAITS_IDLE;
            m->second_waits_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->second_waits = (uint8_t)SHOP6_SECOND_WAITS_RUNNING;
        m->second_waits_for = 0u;
        break;
    }
}

/* the fan runs on */
static void shop6_run_on(struct shop6 *m, const struct shop6_out *out)
{
    if (m->run_on_for < SHOP6_RUN_ON_LASTS) {
        m->run_on_for++;
    }
    switch ((enum shop6_run_on)m->run_on) {
    case SHOP6_RUN_ON_IDLE:
        if (out->heat_one) {
            /* its cause came on */
            m->run_on = (uint8_t)SHOP6_RUN_ON_ARMED;
            m->run_on_for = 0u;
        }
        break;
    case SHOP6_RUN_ON_RUNNING:
        if (out->heat_one) {
            /* its cause came on again */
            m->run_on = (uint8_t)SHOP6_RUN_ON_ARMED;
            m->run_on_for = 0u;
        } else if (m->run_on_for >= SHOP6_RUN_ON_LASTS) {
            /* has run its time */
            m->run_on = (uint8_t)SHOP6_RUN_ON_IDLE;
            m->run_on_for = 0u;
        } else {
            /* stays */
        }
        break;
    case SHOP6_RUN_ON_ARMED:
        if (!out->heat_one) {
            /* its cause went off */
            m->run_on = (uint8_t)SHOP6_RUN_ON_RUNNING;
            m->run_on_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->run_on = (uint8_t)SHOP6_RUN_ON_RUNNING;
        m->run_on_for = 0u;
        break;
    }
}

/* 6 kW duct heater, second stage, through its contactor */
static void shop6_heat_two(struct shop6 *m, bool heat_two_wanted)
{
    switch ((enum shop6_heat_two)m->heat_two) {
    case SHOP6_HEAT_TWO_OFF:
        if (heat_two_wanted &&
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            !m->heat_two_welded &&
            m->heat_two_airflow_seen_off) {
            /* called for */
            m->heat_two = (uint8_t)SHOP6_HEAT_TWO_ON;
        }
        break;
    case SHOP6_HEAT_TWO_ON:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) ||
            m->heat_two_welded) {
            /* its safe state is off, before any minimum on time */
            m->heat_two = (uint8_t)SHOP6_HEAT_TWO_OFF;
        } else if (!heat_two_wanted) {
            /* no longer called for */
            m->heat_two = (uint8_t)SHOP6_HEAT_TWO_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->heat_two = (uint8_t)SHOP6_HEAT_TWO_OFF;
        break;
    }
}

/* compressor of the cooling coil, through its contactor */
static void shop6_cooling(struct shop6 *m,
                          const struct shop6_in *in,
                          const struct shop6_out *out,
                          bool cooling_wanted)
{
    if (m->cooling_for < SHOP6_COOLING_MIN_OFF) {
        m->cooling_for++;
    }
    switch ((enum shop6_cooling)m->cooling) {
    case SHOP6_COOLING_OFF:
        if (cooling_wanted &&
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD) &&
            m->cooling_airflow_seen_off &&
            (m->cooling_for >= SHOP6_COOLING_MIN_OFF)) {
            /* called for */
            m->cooling = (uint8_t)SHOP6_COOLING_ON;
            m->cooling_for = 0u;
        }
        break;
    case SHOP6_COOLING_ON:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY)) {
            /* its safe state is off, before any minimum on time */
            m->cooling = (uint8_t)SHOP6_COOLING_OFF;
            m->cooling_for = 0u;
        } else if (!(in->airflow && in->occupied && !out->heat_one)) {
            /* something other than its operating contact has opened the circuit */
            m->cooling = (uint8_t)SHOP6_COOLING_OFF;
            m->cooling_for = 0u;
        } else if (!cooling_wanted && (m->cooling_for >= SHOP6_COOLING_MIN_ON)) {
            /* no longer called for */
            m->cooling = (uint8_t)SHOP6_COOLING_OFF;
            m->cooling_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->cooling = (uint8_t)SHOP6_COOLING_OFF;
        m->cooling_for = 0u;
        break;
    }
}

/* supply fan */
static void shop6_supply_fan(struct shop6 *m, bool supply_fan_wanted)
{
    switch ((enum shop6_supply_fan)m->supply_fan) {
    case SHOP6_SUPPLY_FAN_OFF:
        if ((m->room_probe_state == SHOP6_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY)) {
            /* its safe state is on */
            m->supply_fan = (uint8_t)SHOP6_SUPPLY_FAN_ON;
        } else if (supply_fan_wanted && m->supply_fan_airflow_seen_off) {
            /* called for */
            m->supply_fan = (uint8_t)SHOP6_SUPPLY_FAN_ON;
        } else {
            /* stays */
        }
        break;
    case SHOP6_SUPPLY_FAN_ON:
        if (!supply_fan_wanted && (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_GOOD)) {
            /* no longer called for */
            m->supply_fan = (uint8_t)SHOP6_SUPPLY_FAN_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->supply_fan = (uint8_t)SHOP6_SUPPLY_FAN_ON;
        break;
    }
}

void shop6_start(struct shop6 *m, const struct shop6_remembered *r)
{
    m->room_probe_good_for = 0u;
    m->room_probe_state = (uint8_t)SHOP6_ROOM_PROBE_STATE_PROVING;
    m->room_probe_state_for = 0u;
    m->room_probe_last = 0u;
    m->room_probe_before = 0u;
    m->stage_one = (uint8_t)SHOP6_STAGE_ONE_OPEN;
    m->stage_two = (uint8_t)SHOP6_STAGE_TWO_OPEN;
    m->cool_stage = (uint8_t)SHOP6_COOL_STAGE_OPEN;
    m->heat_one = (uint8_t)SHOP6_HEAT_ONE_OFF;
    m->heat_one_for = 0u;
    m->heat_one_airflow_seen_off = false;
    m->heat_one_apart_for = 0u;
    m->heat_one_welded = false;
    m->heat_one_effect_from = 0u;
    m->heat_one_effect_for = 0u;
    m->heat_one_no_effect = false;
    m->second_waits = (uint8_t)SHOP6_SECOND_WAITS_RUNNING;
    m->second_waits_for = 0u;
    m->run_on = (uint8_t)SHOP6_RUN_ON_RUNNING;
    m->run_on_for = 0u;
    m->heat_two = (uint8_t)SHOP6_HEAT_TWO_OFF;
    m->heat_two_airflow_seen_off = false;
    m->heat_two_apart_for = 0u;
    m->heat_two_welded = false;
    m->cooling = (uint8_t)SHOP6_COOLING_OFF;
    m->cooling_for = 0u;
    m->cooling_airflow_seen_off = false;
    m->supply_fan = (uint8_t)SHOP6_SUPPLY_FAN_ON;
    m->supply_fan_airflow_seen_off = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool shop6_remember(const struct shop6 *m, struct shop6_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void shop6_step(struct shop6 *m, const struct shop6_in *in, struct shop6_out *out)
{
    /* return air grille, where the old bulb was: this sample cannot be believed */
    const bool room_probe_bad = (in->room_probe < SHOP6_ROOM_PROBE_LOWEST) ||
        (in->room_probe > SHOP6_ROOM_PROBE_HIGHEST);

    if (room_probe_bad) {
        /* a bad sample starts the count again */
        m->room_probe_good_for = 0u;
    } else if (m->room_probe_good_for < SHOP6_ROOM_PROBE_CLEAR_AFTER) {
        m->room_probe_good_for++;
    } else {
        /* stays */
    }

    shop6_room_probe_state(m, room_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t room_probe_now = (uint16_t)(room_probe_bad
                                               ? m->room_probe_last : in->room_probe);
    /* the smaller of the two before */
    const uint16_t room_probe_less = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_last : m->room_probe_before);
    /* the larger of the two before */
    const uint16_t room_probe_more = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_before : m->room_probe_last);
    /* return air grille, where the old bulb was: median of three believable samples */
    const uint16_t room_probe_counts = shop6_clamp_u16(room_probe_now,
                                                       room_probe_less,
                                                       room_probe_more);

    if (!room_probe_bad) {
        m->room_probe_before = m->room_probe_last;
    }

    m->room_probe_last = room_probe_now;
    shop6_stage_one(m, room_probe_counts);

    /* sequence control, first contact: its contact is made */
    const bool stage_one_contact = m->stage_one == SHOP6_STAGE_ONE_MADE;

    shop6_stage_two(m, room_probe_counts);

    /* sequence control, second contact: its contact is made */
    const bool stage_two_contact = m->stage_two == SHOP6_STAGE_TWO_MADE;

    shop6_cool_stage(m, room_probe_counts);

    /* sequence control, third contact: its contact is made */
    const bool cool_stage_contact = m->cool_stage == SHOP6_COOL_STAGE_MADE;
    /* the old wiring calls for it */
    const bool heat_one_wanted = stage_one_contact && in->airflow && in->occupied;

    /* a signal that never goes off proves nothing */
    m->heat_one_airflow_seen_off = !in->airflow ||
        (m->heat_one_airflow_seen_off && (m->heat_one == SHOP6_HEAT_ONE_OFF));

    if ((in->heat_one_seen && (m->heat_one == SHOP6_HEAT_ONE_ON)) ||
        (!in->heat_one_seen && (m->heat_one != SHOP6_HEAT_ONE_ON))) {
        m->heat_one_apart_for = 0u;
    } else if (m->heat_one_apart_for < SHOP6_HEAT_ONE_CONTACT_SETTLES) {
        m->heat_one_apart_for++;
    } else {
        /* stays */
    }

    if ((m->heat_one_apart_for >= SHOP6_HEAT_ONE_CONTACT_SETTLES) && in->heat_one_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->heat_one_welded = true;
    }

    /* the temperature has moved as it should */
    const bool heat_one_effect_seen = ((int32_t)m->heat_one_effect_from -
                                       (int32_t)room_probe_counts) >=
        (int32_t)SHOP6_HEAT_ONE_EFFECT;

    if ((m->heat_one != SHOP6_HEAT_ONE_ON) || heat_one_effect_seen) {
        m->heat_one_effect_for = 0u;
    } else if (m->heat_one_effect_for < SHOP6_HEAT_ONE_EFFECT_WITHIN) {
        m->heat_one_effect_for++;
    } else {
        /* stays */
    }

    if ((m->heat_one != SHOP6_HEAT_ONE_ON) ||
        heat_one_effect_seen ||
        (room_probe_counts > m->heat_one_effect_from)) {
        m->heat_one_effect_from = room_probe_counts;
    }

    if (m->heat_one_effect_for >= SHOP6_HEAT_ONE_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->heat_one_no_effect = true;
    }

    shop6_heat_one(m, in, heat_one_wanted);
    out->heat_one = m->heat_one == SHOP6_HEAT_ONE_ON;
    shop6_second_waits(m, out);
    shop6_run_on(m, out);

    /* the old wiring calls for it */
    const bool heat_two_wanted = stage_two_contact &&
        out->heat_one &&
        (m->second_waits != SHOP6_SECOND_WAITS_RUNNING) &&
        in->airflow;

    /* a signal that never goes off proves nothing */
    m->heat_two_airflow_seen_off = !in->airflow ||
        (m->heat_two_airflow_seen_off && (m->heat_two == SHOP6_HEAT_TWO_OFF));

    if ((in->heat_two_seen && (m->heat_two == SHOP6_HEAT_TWO_ON)) ||
        (!in->heat_two_seen && (m->heat_two != SHOP6_HEAT_TWO_ON))) {
        m->heat_two_apart_for = 0u;
    } else if (m->heat_two_apart_for < SHOP6_HEAT_TWO_CONTACT_SETTLES) {
        m->heat_two_apart_for++;
    } else {
        /* stays */
    }

    if ((m->heat_two_apart_for >= SHOP6_HEAT_TWO_CONTACT_SETTLES) && in->heat_two_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->heat_two_welded = true;
    }

    shop6_heat_two(m, heat_two_wanted);
    out->heat_two = m->heat_two == SHOP6_HEAT_TWO_ON;

    /* the old wiring calls for it */
    const bool cooling_wanted = cool_stage_contact && in->airflow && in->occupied && !out->heat_one;

    /* a signal that never goes off proves nothing */
    m->cooling_airflow_seen_off = !in->airflow ||
        (m->cooling_airflow_seen_off && (m->cooling == SHOP6_COOLING_OFF));

    shop6_cooling(m, in, out, cooling_wanted);
    out->cooling = m->cooling == SHOP6_COOLING_ON;

    /* the old wiring calls for it */
    const bool supply_fan_wanted = in->occupied ||
        out->heat_one ||
        (m->run_on == SHOP6_RUN_ON_RUNNING);

    /* a signal that never goes off proves nothing */
    m->supply_fan_airflow_seen_off = !in->airflow ||
        (m->supply_fan_airflow_seen_off && (m->supply_fan == SHOP6_SUPPLY_FAN_OFF));

    shop6_supply_fan(m, supply_fan_wanted);
    out->supply_fan = m->supply_fan == SHOP6_SUPPLY_FAN_ON;

    uint16_t fault = 0u;

    if (m->room_probe_state == SHOP6_ROOM_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | SHOP6_FAULT_ROOM_PROBE);
    }
    if (m->heat_one_welded) {
        fault = (uint16_t)(fault | SHOP6_FAULT_HEAT_ONE_WELDED);
    }
    if ((m->heat_one_apart_for >= SHOP6_HEAT_ONE_CONTACT_SETTLES) && !in->heat_one_seen) {
        fault = (uint16_t)(fault | SHOP6_FAULT_HEAT_ONE_NOT_MADE);
    }
    if (m->heat_one_no_effect) {
        fault = (uint16_t)(fault | SHOP6_FAULT_HEAT_ONE_NO_EFFECT);
    }
    if (m->heat_two_welded) {
        fault = (uint16_t)(fault | SHOP6_FAULT_HEAT_TWO_WELDED);
    }
    if ((m->heat_two_apart_for >= SHOP6_HEAT_TWO_CONTACT_SETTLES) && !in->heat_two_seen) {
        fault = (uint16_t)(fault | SHOP6_FAULT_HEAT_TWO_NOT_MADE);
    }
    out->fault = fault;
}
