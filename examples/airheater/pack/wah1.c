/* wah1.c: control program
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
#include "wah1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 249 degC (electronics.sensors[0].valid, line 123):
 * platinum (IEC 60751)
 */
#define WAH1_EXCHANGER_PROBE_HIGHEST 479u
/* counts: lowest believable count, about -29.6 degC (electronics.sensors[0].valid, line 123):
 * platinum (IEC 60751)
 */
#define WAH1_EXCHANGER_PROBE_LOWEST 293u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 250 ms a step, rounded up
 */
#define WAH1_EXCHANGER_PROBE_FAULT_AFTER 8u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of EXCHANGER_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one
 * in so many are found
 */
#define WAH1_EXCHANGER_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 250 ms a step, rounded up
 */
#define WAH1_EXCHANGER_PROBE_CLEAR_AFTER 40u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): EXCHANGER_PROBE_FAULT_AFTER + EXCHANGER_PROBE_GOOD_RUN
 */
#define WAH1_EXCHANGER_PROBE_PROVE_WITHIN 12u
/* counts: 50 degC (controls[0].makes_at, line 74): 50 degC is 360.235 counts by platinum (IEC
 * 60751); rounded down: at least 360, which changes at 49.6883 degC; one count is 1.33 K
 */
#define WAH1_FAN_DISC_MAKE 360u
/* counts: 35 degC (controls[0].breaks_at, line 75): 35 degC is 348.717 counts by platinum (IEC
 * 60751); rounded to the nearest edge of a count: at most 348, which changes at 35.3616 degC; one
 * count is 1.28 K; moved by -1 counts, so that the differential is not below the one asked for:
 * 347, which changes at 34.0852 degC
 */
#define WAH1_FAN_DISC_BREAK 347u
/* counts: 65 degC (controls[1].makes_at, line 86): 65 degC is 371.317 counts by platinum (IEC
 * 60751); rounded to the nearest edge of a count: at most 370, which changes at 64.5628 degC; one
 * count is 1.38 K
 */
#define WAH1_EXCHANGER_STAT_MAKE 370u
/* counts: 80 degC (controls[1].breaks_at, line 85): 80 degC is 381.988 counts by platinum (IEC
 * 60751); rounded to the nearest edge of a count: at least 382, which changes at 80.0174 degC; one
 * count is 1.43 K
 */
#define WAH1_EXCHANGER_STAT_BREAK 382u
/* steps: an effect is expected within 2 min 38 s (process.settles_on, line 19): 3 times the slowest
 * expected answer: 6 min × ln((90 K + 7.16 K)/90 K) = 27.6 s, and 25 s of dead time and lag; 2 min
 * 38 s / 250 ms a step, rounded up
 */
#define WAH1_BURNER_CALL_EFFECT_WITHIN 631u
/* counts: 7.16 K towards the set point (process.settles_on, line 19): 0.5 of the differential */
#define WAH1_BURNER_CALL_EFFECT 5
/* steps: runs for 6 min (timers[0].lasts, line 36): 6 min / 250 ms a step, rounded up */
#define WAH1_RUN_ON_LASTS 1440u

/* These do not compile where an assumption of this file does not hold. */
typedef char wah1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char wah1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char wah1_room_1[(WAH1_EXCHANGER_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char wah1_room_2[(WAH1_EXCHANGER_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char wah1_room_burner_call_effect_for[(WAH1_BURNER_CALL_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char wah1_room_run_on_for[(WAH1_RUN_ON_LASTS <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t wah1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* platinum film probe clamped beside the old disc: is it believed? */
static void wah1_exchanger_probe_state(struct wah1 *m, bool exchanger_probe_bad)
{
    if (m->exchanger_probe_state_for < WAH1_EXCHANGER_PROBE_PROVE_WITHIN) {
        m->exchanger_probe_state_for++;
    }
    switch ((enum wah1_exchanger_probe_state)m->exchanger_probe_state) {
    case WAH1_EXCHANGER_PROBE_STATE_PROVING:
        if (m->exchanger_probe_good_for >= WAH1_EXCHANGER_PROBE_GOOD_RUN) {
            /* proved itself */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_GOOD;
            m->exchanger_probe_state_for = 0u;
        } else if (m->exchanger_probe_state_for >= WAH1_EXCHANGER_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_FAULTY;
            m->exchanger_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case WAH1_EXCHANGER_PROBE_STATE_GOOD:
        if (exchanger_probe_bad) {
            /* a bad sample */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_SUSPECT;
            m->exchanger_probe_state_for = 0u;
        }
        break;
    case WAH1_EXCHANGER_PROBE_STATE_SUSPECT:
        if (m->exchanger_probe_good_for >= WAH1_EXCHANGER_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_GOOD;
            m->exchanger_probe_state_for = 0u;
        } else if (m->exchanger_probe_state_for >= WAH1_EXCHANGER_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_FAULTY;
            m->exchanger_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case WAH1_EXCHANGER_PROBE_STATE_FAULTY:
        if (m->exchanger_probe_good_for >= WAH1_EXCHANGER_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_GOOD;
            m->exchanger_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_FAULTY;
        m->exchanger_probe_state_for = 0u;
        break;
    }
}

/* snap disc on the exchanger, starts the fan once it is warm */
static void wah1_fan_disc(struct wah1 *m, uint16_t exchanger_probe_counts)
{
    switch ((enum wah1_fan_disc)m->fan_disc) {
    case WAH1_FAN_DISC_OPEN:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_PROVING) ||
            (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_FAULTY) ||
            (exchanger_probe_counts >= WAH1_FAN_DISC_MAKE)) {
            /* temperature has reached the make, or the probe is not to be believed */
            m->fan_disc = (uint8_t)WAH1_FAN_DISC_MADE;
        }
        break;
    case WAH1_FAN_DISC_MADE:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_GOOD) &&
            (exchanger_probe_counts <= WAH1_FAN_DISC_BREAK)) {
            /* temperature has reached the break */
            m->fan_disc = (uint8_t)WAH1_FAN_DISC_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->fan_disc = (uint8_t)WAH1_FAN_DISC_MADE;
        break;
    }
}

/* second disc, holds the exchanger down */
static void wah1_exchanger_stat(struct wah1 *m, uint16_t exchanger_probe_counts)
{
    switch ((enum wah1_exchanger_stat)m->exchanger_stat) {
    case WAH1_EXCHANGER_STAT_OPEN:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_GOOD) &&
            (exchanger_probe_counts <= WAH1_EXCHANGER_STAT_MAKE)) {
            /* temperature has reached the make */
            m->exchanger_stat = (uint8_t)WAH1_EXCHANGER_STAT_MADE;
        }
        break;
    case WAH1_EXCHANGER_STAT_MADE:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_PROVING) ||
            (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_FAULTY) ||
            (exchanger_probe_counts >= WAH1_EXCHANGER_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->exchanger_stat = (uint8_t)WAH1_EXCHANGER_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->exchanger_stat = (uint8_t)WAH1_EXCHANGER_STAT_OPEN;
        break;
    }
}

/* call to the approved automatic burner control */
static void wah1_burner_call(struct wah1 *m, bool burner_call_wanted)
{
    switch ((enum wah1_burner_call)m->burner_call) {
    case WAH1_BURNER_CALL_OFF:
        if (burner_call_wanted &&
            (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_GOOD) &&
            !m->burner_call_no_effect) {
            /* called for */
            m->burner_call = (uint8_t)WAH1_BURNER_CALL_ON;
        }
        break;
    case WAH1_BURNER_CALL_ON:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_PROVING) ||
            (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_FAULTY) ||
            m->burner_call_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->burner_call = (uint8_t)WAH1_BURNER_CALL_OFF;
        } else if (!burner_call_wanted) {
            /* no longer called for */
            m->burner_call = (uint8_t)WAH1_BURNER_CALL_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->burner_call = (uint8_t)WAH1_BURNER_CALL_OFF;
        break;
    }
}

/* the fan cools the exchanger after the burner */
static void wah1_run_on(struct wah1 *m, const struct wah1_out *out)
{
    if (m->run_on_for < WAH1_RUN_ON_LASTS) {
        m->run_on_for++;
    }
    switch ((enum wah1_run_on)m->run_on) {
    case WAH1_RUN_ON_IDLE:
        if (out->burner_call) {
            /* its cause came on */
            m->run_on = (uint8_t)WAH1_RUN_ON_ARMED;
            m->run_on_for = 0u;
        }
        break;
    case WAH1_RUN_ON_RUNNING:
        if (out->burner_call) {
            /* its cause came on again */
            m->run_on = (uint8_t)WAH1_RUN_ON_ARMED;
            m->run_on_for = 0u;
        } else if (m->run_on_for >= WAH1_RUN_ON_LASTS) {
            /* has run its time */
            m->run_on = (uint8_t)WAH1_RUN_ON_IDLE;
            m->run_on_for = 0u;
        } else {
            /* stays */
        }
        break;
    case WAH1_RUN_ON_ARMED:
        if (!out->burner_call) {
            /* its cause went off */
            m->run_on = (uint8_t)WAH1_RUN_ON_RUNNING;
            m->run_on_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->run_on = (uint8_t)WAH1_RUN_ON_RUNNING;
        m->run_on_for = 0u;
        break;
    }
}

/* 0.75 kW fan through its contactor */
static void wah1_fan(struct wah1 *m, bool fan_wanted)
{
    switch ((enum wah1_fan)m->fan) {
    case WAH1_FAN_OFF:
        if ((m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_PROVING) ||
            (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_FAULTY)) {
            /* its safe state is on */
            m->fan = (uint8_t)WAH1_FAN_ON;
        } else if (fan_wanted) {
            /* called for */
            m->fan = (uint8_t)WAH1_FAN_ON;
        } else {
            /* stays */
        }
        break;
    case WAH1_FAN_ON:
        if (!fan_wanted && (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_GOOD)) {
            /* no longer called for */
            m->fan = (uint8_t)WAH1_FAN_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->fan = (uint8_t)WAH1_FAN_ON;
        break;
    }
}

void wah1_start(struct wah1 *m, const struct wah1_remembered *r)
{
    m->exchanger_probe_good_for = 0u;
    m->exchanger_probe_state = (uint8_t)WAH1_EXCHANGER_PROBE_STATE_PROVING;
    m->exchanger_probe_state_for = 0u;
    m->exchanger_probe_last = 0u;
    m->exchanger_probe_before = 0u;
    m->fan_disc = (uint8_t)WAH1_FAN_DISC_MADE;
    m->exchanger_stat = (uint8_t)WAH1_EXCHANGER_STAT_OPEN;
    m->burner_call = (uint8_t)WAH1_BURNER_CALL_OFF;
    m->burner_call_effect_from = 0u;
    m->burner_call_effect_for = 0u;
    m->burner_call_no_effect = false;
    m->run_on = (uint8_t)WAH1_RUN_ON_RUNNING;
    m->run_on_for = 0u;
    m->fan = (uint8_t)WAH1_FAN_ON;
    (void)r; /* nothing of this program survives a power cut */
}

bool wah1_remember(const struct wah1 *m, struct wah1_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void wah1_step(struct wah1 *m, const struct wah1_in *in, struct wah1_out *out)
{
    /* platinum film probe clamped beside the old disc: this sample cannot be believed */
    const bool exchanger_probe_bad = (in->exchanger_probe < WAH1_EXCHANGER_PROBE_LOWEST) ||
        (in->exchanger_probe > WAH1_EXCHANGER_PROBE_HIGHEST);

    if (exchanger_probe_bad) {
        /* a bad sample starts the count again */
        m->exchanger_probe_good_for = 0u;
    } else if (m->exchanger_probe_good_for < WAH1_EXCHANGER_PROBE_CLEAR_AFTER) {
        m->exchanger_probe_good_for++;
    } else {
        /* stays */
    }

    wah1_exchanger_probe_state(m, exchanger_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t exchanger_probe_now = (uint16_t)(exchanger_probe_bad
                                                    ? m->exchanger_probe_last
                                                    : in->exchanger_probe);
    /* the smaller of the two before */
    const uint16_t exchanger_probe_less = (uint16_t)(
            (m->exchanger_probe_last < m->exchanger_probe_before)
            ? m->exchanger_probe_last : m->exchanger_probe_before);
    /* the larger of the two before */
    const uint16_t exchanger_probe_more = (uint16_t)(
            (m->exchanger_probe_last < m->exchanger_probe_before)
            ? m->exchanger_probe_before : m->exchanger_probe_last);
    /* platinum film probe clamped beside the old disc: median of three believable samples */
    const uint16_t exchanger_probe_counts = wah1_clamp_u16(exchanger_probe_now,
                                                           exchanger_probe_less,
                                                           exchanger_probe_more);

    if (!exchanger_probe_bad) {
        m->exchanger_probe_before = m->exchanger_probe_last;
    }

    m->exchanger_probe_last = exchanger_probe_now;
    wah1_fan_disc(m, exchanger_probe_counts);

    /* snap disc on the exchanger, starts the fan once it is warm: its contact is made */
    const bool fan_disc_contact = m->fan_disc == WAH1_FAN_DISC_MADE;

    wah1_exchanger_stat(m, exchanger_probe_counts);

    /* second disc, holds the exchanger down: its contact is made */
    const bool exchanger_stat_contact = m->exchanger_stat == WAH1_EXCHANGER_STAT_MADE;
    /* the old wiring calls for it */
    const bool burner_call_wanted = in->room_calls && exchanger_stat_contact;
    /* the temperature has moved as it should */
    const bool burner_call_effect_seen = ((int32_t)exchanger_probe_counts -
                                          (int32_t)m->burner_call_effect_from) >=
        (int32_t)WAH1_BURNER_CALL_EFFECT;

    if ((m->burner_call != WAH1_BURNER_CALL_ON) || burner_call_effect_seen) {
        m->burner_call_effect_for = 0u;
    } else if (m->burner_call_effect_for < WAH1_BURNER_CALL_EFFECT_WITHIN) {
        m->burner_call_effect_for++;
    } else {
        /* stays */
    }

    if ((m->burner_call != WAH1_BURNER_CALL_ON) ||
        burner_call_effect_seen ||
        (exchanger_probe_counts < m->burner_call_effect_from)) {
        m->burner_call_effect_from = exchanger_probe_counts;
    }

    if (m->burner_call_effect_for >= WAH1_BURNER_CALL_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->burner_call_no_effect = true;
    }

    wah1_burner_call(m, burner_call_wanted);
    out->burner_call = m->burner_call == WAH1_BURNER_CALL_ON;
    wah1_run_on(m, out);

    /* the old wiring calls for it */
    const bool fan_wanted = fan_disc_contact || (m->run_on == WAH1_RUN_ON_RUNNING);

    wah1_fan(m, fan_wanted);
    out->fan = m->fan == WAH1_FAN_ON;

    uint16_t fault = 0u;

    if (m->exchanger_probe_state == WAH1_EXCHANGER_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | WAH1_FAULT_EXCHANGER_PROBE);
    }
    if (m->burner_call_no_effect) {
        fault = (uint16_t)(fault | WAH1_FAULT_BURNER_CALL_NO_EFFECT);
    }
    out->fault = fault;
}
