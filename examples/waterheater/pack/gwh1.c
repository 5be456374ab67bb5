/* gwh1.c: control program
 *
 * Equipment: Gas water heater, boat house
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 52a2fa594aacaa95bd253c6298389f618d93b844be1d85baca786c2236c28846
 *
 * Stays hard-wired, and must:
 * - tank_stat: rod stat of the appliance's own valve
 * - flame_guard: thermocouple flame supervision of the pilot
 * - cutoff: energy cut-off in the tank, one shot, opens the thermocouple's loop
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
 * Open findings: 1 earth_fault_bypasses_limit (act, gwh1); 2 overshoot_not_determined (act,
 * cutoff/boiling). Not judged, for want of a figure: 1; risks.md says which.
 */
#include "gwh1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 49.82 mV (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): millivolt input
 */
#define GWH1_COUPLE_HIGHEST 4081u
/* steps: not good for 10 s (electronics.sensors[0].fault_after, line 104): 10 s / 1 s a step,
 * rounded up
 */
#define GWH1_COUPLE_FAULT_AFTER 10u
/* steps: good samples in a row that end a doubt (electronics.sensors[0].fault_after, line 104):
 * half of COUPLE_FAULT_AFTER, at least 4: bad samples oftener than one in so many are found
 */
#define GWH1_COUPLE_GOOD_RUN 5u
/* steps: good for 10 s (electronics.sensors[0].clear_after, line 104): 10 s / 1 s a step, rounded
 * up
 */
#define GWH1_COUPLE_CLEAR_AFTER 10u
/* steps: time to prove itself after a start (electronics.sensors[0].fault_after, line 104):
 * COUPLE_FAULT_AFTER + COUPLE_GOOD_RUN
 */
#define GWH1_COUPLE_PROVE_WITHIN 15u
/* counts: 8 mV: it holds (controls[1].holds_from, line 71): 0.008 degC is 655.360 counts by
 * millivolt input; rounded to the nearest edge of a count: at least 655, which changes at 0.0080
 * degC; one count is 1.22e-05 K
 */
#define GWH1_FLAME_GUARD_HOLDS 655u
/* counts: 3 mV: it lets go (controls[1].releases_at, line 72): 0.003 degC is 245.760 counts by
 * millivolt input; rounded to the nearest edge of a count: at most 245, which changes at 0.0030
 * degC; one count is 1.22e-05 K
 */
#define GWH1_FLAME_GUARD_RELEASES 245u
/* counts: 5.5 mV: midway between the two (controls[1].holds_from, line 71): 0.0055 degC is 450.560
 * counts by millivolt input; rounded to the nearest edge of a count: at most 450, which changes at
 * 0.0055 degC; one count is 1.22e-05 K
 */
#define GWH1_FLAME_GUARD_WEAK 450u
/* steps: judged after 100 s (controls[1].holds_within, line 73): 100 s / 1 s a step, rounded up */
#define GWH1_FLAME_GUARD_SETTLED_AFTER 100u
/* steps: weak for 60 s (assumed: common practice: a draught passes): 60 s / 1 s a step, rounded up
 */
#define GWH1_FLAME_GUARD_WEAK_FOR 60u
/* steps: a day is 1 d (assumed: a day): 1 d / 1 s a step, rounded up */
#define GWH1_FLAME_GUARD_DAY UINT32_C(86400)
/* days: to be proved every 12 months (controls[1].prove_every, line 81): in days, at most ten years
 */
#define GWH1_FLAME_GUARD_PROVE_AFTER 365u

/* These do not compile where an assumption of this file does not hold. */
typedef char gwh1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char gwh1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char gwh1_room_couple_good_for[(GWH1_COUPLE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char gwh1_room_couple_state_for[(GWH1_COUPLE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char gwh1_room_flame_guard_flame_for[(GWH1_FLAME_GUARD_SETTLED_AFTER <= 255u) ? 1 : -1];
typedef char gwh1_room_flame_guard_weak_time[(GWH1_FLAME_GUARD_WEAK_FOR <= 255u) ? 1 : -1];

/* x, held between low and high */
static uint16_t gwh1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t gwh1_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int32_t gwh1_clamp_i32(int32_t x, int32_t low, int32_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* Check word of a record. It starts from a number that belongs to records of this program alone; no
 * blank record has it.
 */
static uint16_t gwh1_check_word(const struct gwh1_remembered *r)
{
    uint16_t word = 21913u;

    word = (uint16_t)(((word * 31u) + r->flame_guard_days_gone) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + r->cutoff_trips_seen) & 0xFFFFu);
    return word;
}

/* across the thermocouple with an amplifier of high input resistance: is it believed? */
static void gwh1_couple_state(struct gwh1 *m, bool couple_bad)
{
    if (m->couple_state_for < GWH1_COUPLE_PROVE_WITHIN) {
        m->couple_state_for++;
    }
    switch ((enum gwh1_couple_state)m->couple_state) {
    case GWH1_COUPLE_STATE_PROVING:
        if (m->couple_good_for >= GWH1_COUPLE_GOOD_RUN) {
            /* proved itself */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_GOOD;
            m->couple_state_for = 0u;
        } else if (m->couple_state_for >= GWH1_COUPLE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_FAULTY;
            m->couple_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case GWH1_COUPLE_STATE_GOOD:
        if (couple_bad) {
            /* a bad sample */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_SUSPECT;
            m->couple_state_for = 0u;
        }
        break;
    case GWH1_COUPLE_STATE_SUSPECT:
        if (m->couple_good_for >= GWH1_COUPLE_GOOD_RUN) {
            /* a run of good samples */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_GOOD;
            m->couple_state_for = 0u;
        } else if (m->couple_state_for >= GWH1_COUPLE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_FAULTY;
            m->couple_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case GWH1_COUPLE_STATE_FAULTY:
        if (m->couple_good_for >= GWH1_COUPLE_CLEAR_AFTER) {
            /* good for long enough */
            m->couple_state = (uint8_t)GWH1_COUPLE_STATE_GOOD;
            m->couple_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->couple_state = (uint8_t)GWH1_COUPLE_STATE_FAULTY;
        m->couple_state_for = 0u;
        break;
    }
}

/* thermocouple flame supervision of the pilot: the flame by its voltage */
static void gwh1_flame_guard_flame(struct gwh1 *m, uint16_t couple_counts)
{
    if (m->flame_guard_flame_for < GWH1_FLAME_GUARD_SETTLED_AFTER) {
        m->flame_guard_flame_for++;
    }
    switch ((enum gwh1_flame_guard_flame)m->flame_guard_flame) {
    case GWH1_FLAME_GUARD_FLAME_OUT:
        if ((m->couple_state == GWH1_COUPLE_STATE_GOOD) &&
            (couple_counts >= GWH1_FLAME_GUARD_HOLDS)) {
            /* the voltage holds the valve */
            m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_WARMING;
            m->flame_guard_flame_for = 0u;
        }
        break;
    case GWH1_FLAME_GUARD_FLAME_WARMING:
        if ((m->couple_state == GWH1_COUPLE_STATE_GOOD) &&
            (couple_counts <= GWH1_FLAME_GUARD_RELEASES)) {
            /* the valve lets go */
            m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_OUT;
            m->flame_guard_flame_for = 0u;
        } else if (m->flame_guard_flame_for >= GWH1_FLAME_GUARD_SETTLED_AFTER) {
            /* has burnt long enough */
            m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_SETTLED;
            m->flame_guard_flame_for = 0u;
        } else {
            /* stays */
        }
        break;
    case GWH1_FLAME_GUARD_FLAME_SETTLED:
        if ((m->couple_state == GWH1_COUPLE_STATE_GOOD) &&
            (couple_counts <= GWH1_FLAME_GUARD_RELEASES)) {
            /* the valve lets go */
            m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_OUT;
            m->flame_guard_flame_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_OUT;
        m->flame_guard_flame_for = 0u;
        break;
    }
}

void gwh1_start(struct gwh1 *m, const struct gwh1_remembered *r)
{
    m->couple_good_for = 0u;
    m->couple_state = (uint8_t)GWH1_COUPLE_STATE_PROVING;
    m->couple_state_for = 0u;
    m->couple_last = 0u;
    m->couple_before = 0u;
    m->flame_guard_flame = (uint8_t)GWH1_FLAME_GUARD_FLAME_OUT;
    m->flame_guard_flame_for = 0u;
    m->flame_guard_weak_time = 0u;
    m->flame_guard_was_lit = false;
    m->flame_guard_day_at = 0u;
    m->flame_guard_days_gone = 0u;
    m->cutoff_was_tripped = true;
    m->cutoff_trips_seen = 0u;

    if ((r != NULL) &&
        (r->check == gwh1_check_word(r)) &&
        (r->flame_guard_days_gone <= 3660u) &&
        (r->cutoff_trips_seen <= 60000u)) {
        m->flame_guard_days_gone = r->flame_guard_days_gone;
        m->cutoff_trips_seen = r->cutoff_trips_seen;
    }
}

bool gwh1_remember(const struct gwh1 *m, struct gwh1_remembered *r)
{
    struct gwh1_remembered now;
    bool changed;

    now.flame_guard_days_gone = m->flame_guard_days_gone;
    now.cutoff_trips_seen = m->cutoff_trips_seen;
    now.check = gwh1_check_word(&now);
    changed = (now.flame_guard_days_gone != r->flame_guard_days_gone) ||
        (now.cutoff_trips_seen != r->cutoff_trips_seen) ||
        (now.check != r->check);
    *r = now;
    return changed;
}

void gwh1_step(struct gwh1 *m, const struct gwh1_in *in, struct gwh1_out *out)
{
    /* across the thermocouple with an amplifier of high input resistance: this sample cannot be
     * believed
     */
    const bool couple_bad = in->couple > GWH1_COUPLE_HIGHEST;

    if (couple_bad) {
        /* a bad sample starts the count again */
        m->couple_good_for = 0u;
    } else if (m->couple_good_for < GWH1_COUPLE_CLEAR_AFTER) {
        m->couple_good_for++;
    } else {
        /* stays */
    }

    gwh1_couple_state(m, couple_bad);

    /* this sample, or the last believable one */
    const uint16_t couple_now = (uint16_t)(couple_bad ? m->couple_last : in->couple);
    /* the smaller of the two before */
    const uint16_t couple_less = (uint16_t)((m->couple_last < m->couple_before)
                                            ? m->couple_last : m->couple_before);
    /* the larger of the two before */
    const uint16_t couple_more = (uint16_t)((m->couple_last < m->couple_before)
                                            ? m->couple_before : m->couple_last);
    /* across the thermocouple with an amplifier of high input resistance: median of three
     * believable samples
     */
    const uint16_t couple_counts = gwh1_clamp_u16(couple_now, couple_less, couple_more);

    if (!couple_bad) {
        m->couple_before = m->couple_last;
    }

    m->couple_last = couple_now;
    gwh1_flame_guard_flame(m, couple_counts);

    if (!((m->flame_guard_flame == GWH1_FLAME_GUARD_FLAME_SETTLED) &&
          (m->couple_state == GWH1_COUPLE_STATE_GOOD) &&
          (couple_counts <= GWH1_FLAME_GUARD_WEAK))) {
        m->flame_guard_weak_time = 0u;
    } else if (m->flame_guard_weak_time < GWH1_FLAME_GUARD_WEAK_FOR) {
        m->flame_guard_weak_time++;
    } else {
        /* stays */
    }

    /* thermocouple flame supervision of the pilot: little voltage from a settled flame */
    const bool flame_guard_weak_couple = m->flame_guard_weak_time >= GWH1_FLAME_GUARD_WEAK_FOR;
    /* thermocouple flame supervision of the pilot: the flame goes out */
    const bool flame_guard_goes_out = m->flame_guard_was_lit &&
        (m->flame_guard_flame == GWH1_FLAME_GUARD_FLAME_OUT);

    m->flame_guard_was_lit = m->flame_guard_flame != GWH1_FLAME_GUARD_FLAME_OUT;

    /* a day is over */
    const bool flame_guard_day_over = m->flame_guard_day_at >= GWH1_FLAME_GUARD_DAY;
    /* thermocouple flame supervision of the pilot: is seen to act */
    const bool flame_guard_acted = flame_guard_goes_out;

    if (flame_guard_day_over || flame_guard_acted) {
        /* the next day */
        m->flame_guard_day_at = 0u;
    } else if (m->flame_guard_day_at < GWH1_FLAME_GUARD_DAY) {
        m->flame_guard_day_at++;
    } else {
        /* stays */
    }

    if (flame_guard_acted || flame_guard_day_over) {
        /* from nothing when it acts */
        m->flame_guard_days_gone = (uint16_t)(
                flame_guard_acted
                ? 0 : gwh1_clamp_i16((int16_t)((int16_t)m->flame_guard_days_gone + 1), 0, 3660));
    }

    out->flame_guard_days = m->flame_guard_days_gone;

    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: is seen to trip */
    const bool cutoff_trips_now = in->cutoff_open && !m->cutoff_was_tripped;

    m->cutoff_was_tripped = in->cutoff_open;

    if (cutoff_trips_now && (m->cutoff_trips_seen < 60000u)) {
        /* one more; the count stops at its end */
        m->cutoff_trips_seen = (uint16_t)gwh1_clamp_i32(
                (int32_t)m->cutoff_trips_seen + INT32_C(1), INT32_C(0), INT32_C(60000));
    }

    out->cutoff_trips = m->cutoff_trips_seen;

    uint16_t fault = 0u;

    if (m->couple_state == GWH1_COUPLE_STATE_FAULTY) {
        fault = (uint16_t)(fault | GWH1_FAULT_COUPLE);
    }
    if (flame_guard_weak_couple) {
        fault = (uint16_t)(fault | GWH1_FAULT_FLAME_GUARD_WEAK);
    }
    if (m->flame_guard_flame == GWH1_FLAME_GUARD_FLAME_OUT) {
        fault = (uint16_t)(fault | GWH1_FAULT_FLAME_GUARD_FLAME_OUT);
    }
    if (m->flame_guard_days_gone >= GWH1_FLAME_GUARD_PROVE_AFTER) {
        fault = (uint16_t)(fault | GWH1_FAULT_FLAME_GUARD_PROOF_DUE);
    }
    if (in->cutoff_open) {
        fault = (uint16_t)(fault | GWH1_FAULT_CUTOFF_TRIPPED);
    }
    out->fault = fault;
}
