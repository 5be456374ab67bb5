/* cal2.c: control program
 *
 * Equipment: Calorifier 2, east plant room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 2ab43e817eac8807b18bdd14c38c5efd2bd324b5d3f4009e33bafa75cbb44596
 *
 * Replaces:
 * - tank_stat: rod immersion stat in the top boss
 *
 * Stays hard-wired, and must:
 * - high_limit: capillary limit in the same boss, manual reset
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
 * Open findings: 2 proving_switch_not_checked_open (act, flow_proven); 3 earth_fault_bypasses_limit
 * (act, cal2); 4 insulation_of_new_probe (act, tank_probe); 5 contact_life (act, heater); 6
 * scald_and_storage (act, tank_stat); 7 model_beyond_evidence (act, cal2); 8
 * mercury_asbestos_refrigerant (act, tank_stat); 9 approval_lapses (act, cal2). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#include "cal2.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -50.6 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define CAL2_TANK_PROBE_HIGHEST 4081u
/* counts: lowest believable count, about 150.1 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define CAL2_TANK_PROBE_LOWEST 227u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 250 ms a step, rounded up
 */
#define CAL2_TANK_PROBE_FAULT_AFTER 8u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of TANK_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define CAL2_TANK_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 250 ms a step, rounded up
 */
#define CAL2_TANK_PROBE_CLEAR_AFTER 40u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): TANK_PROBE_FAULT_AFTER + TANK_PROBE_GOOD_RUN
 */
#define CAL2_TANK_PROBE_PROVE_WITHIN 12u
/* counts: 54 degC (controls[0].set_point, line 62): 54 degC is 1972.506 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 1973, which changes at 53.9870 degC; one
 * count is 0.0263 K
 */
#define CAL2_TANK_STAT_MAKE 1973u
/* counts: 60 degC (controls[0].set_point, line 62): 60 degC is 1750.402 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at most 1749, which changes at 60.0112 degC; one
 * count is 0.0278 K
 */
#define CAL2_TANK_STAT_BREAK 1749u
/* steps: on for at least 30 s (controls[0].min_on, line 69): 30 s / 250 ms a step, rounded up */
#define CAL2_HEATER_MIN_ON 120u
/* steps: off for at least 60 s (controls[0].min_off, line 70): 60 s / 250 ms a step, rounded up */
#define CAL2_HEATER_MIN_OFF 240u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 250 ms a step, rounded up
 */
#define CAL2_HEATER_CONTACT_SETTLES 4u
/* steps: an effect is expected within 25 min 26 s (process.settles_on, line 19): 3 times the
 * slowest expected answer: 3 h 30 min × ln((80 K + 2.98 K)/80 K) = 7 min 41 s, and 48 s of dead
 * time and lag; 25 min 26 s / 250 ms a step, rounded up
 */
#define CAL2_HEATER_EFFECT_WITHIN 6105u
/* counts: 2.98 K towards the set point (process.settles_on, line 19): 0.5 of the differential */
#define CAL2_HEATER_EFFECT 107

/* These do not compile where an assumption of this file does not hold. */
typedef char cal2_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char cal2_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char cal2_room_tank_probe_good_for[(CAL2_TANK_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char cal2_room_tank_probe_state_for[(CAL2_TANK_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char cal2_room_heater_apart_for[(CAL2_HEATER_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char cal2_room_heater_effect_for[(CAL2_HEATER_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char cal2_room_heater_for[(CAL2_HEATER_MIN_OFF <= 255u) ? 1 : -1];

/* x, held between low and high */
static uint16_t cal2_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* thermistor in the pocket of the old rod stat: is it believed? */
static void cal2_tank_probe_state(struct cal2 *m, bool tank_probe_bad)
{
    if (m->tank_probe_state_for < CAL2_TANK_PROBE_PROVE_WITHIN) {
        m->tank_probe_state_for++;
    }
    switch ((enum cal2_tank_probe_state)m->tank_probe_state) {
    case CAL2_TANK_PROBE_STATE_PROVING:
        if (m->tank_probe_good_for >= CAL2_TANK_PROBE_GOOD_RUN) {
            /* proved itself */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_GOOD;
            m->tank_probe_state_for = 0u;
        } else if (m->tank_probe_state_for >= CAL2_TANK_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_FAULTY;
            m->tank_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case CAL2_TANK_PROBE_STATE_GOOD:
        if (tank_probe_bad) {
            /* a bad sample */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_SUSPECT;
            m->tank_probe_state_for = 0u;
        }
        break;
    case CAL2_TANK_PROBE_STATE_SUSPECT:
        if (m->tank_probe_good_for >= CAL2_TANK_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_GOOD;
            m->tank_probe_state_for = 0u;
        } else if (m->tank_probe_state_for >= CAL2_TANK_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_FAULTY;
            m->tank_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case CAL2_TANK_PROBE_STATE_FAULTY:
        if (m->tank_probe_good_for >= CAL2_TANK_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_GOOD;
            m->tank_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_FAULTY;
        m->tank_probe_state_for = 0u;
        break;
    }
}

/* rod immersion stat in the top boss */
static void cal2_tank_stat(struct cal2 *m, uint16_t tank_probe_counts)
{
    switch ((enum cal2_tank_stat)m->tank_stat) {
    case CAL2_TANK_STAT_OPEN:
        if ((m->tank_probe_state == CAL2_TANK_PROBE_STATE_GOOD) &&
            (tank_probe_counts >= CAL2_TANK_STAT_MAKE)) {
            /* temperature has reached the make */
            m->tank_stat = (uint8_t)CAL2_TANK_STAT_MADE;
        }
        break;
    case CAL2_TANK_STAT_MADE:
        if ((m->tank_probe_state == CAL2_TANK_PROBE_STATE_PROVING) ||
            (m->tank_probe_state == CAL2_TANK_PROBE_STATE_FAULTY) ||
            (tank_probe_counts <= CAL2_TANK_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->tank_stat = (uint8_t)CAL2_TANK_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->tank_stat = (uint8_t)CAL2_TANK_STAT_OPEN;
        break;
    }
}

/* 9 kW immersion heater through its contactor */
static void cal2_heater(struct cal2 *m, const struct cal2_in *in, bool heater_wanted)
{
    if (m->heater_for < CAL2_HEATER_MIN_OFF) {
        m->heater_for++;
    }
    switch ((enum cal2_heater)m->heater) {
    case CAL2_HEATER_OFF:
        if (heater_wanted &&
            (m->tank_probe_state == CAL2_TANK_PROBE_STATE_GOOD) &&
            !(m->heater_no_effect || m->heater_welded) &&
            (m->heater_for >= CAL2_HEATER_MIN_OFF)) {
            /* called for */
            m->heater = (uint8_t)CAL2_HEATER_ON;
            m->heater_for = 0u;
        }
        break;
    case CAL2_HEATER_ON:
        if ((m->tank_probe_state == CAL2_TANK_PROBE_STATE_PROVING) ||
            (m->tank_probe_state == CAL2_TANK_PROBE_STATE_FAULTY) ||
            m->heater_no_effect ||
            m->heater_welded) {
            /* its safe state is off, before any minimum on time */
            m->heater = (uint8_t)CAL2_HEATER_OFF;
            m->heater_for = 0u;
        } else if (!in->flow_proven) {
            /* something other than its operating contact has opened the circuit */
            m->heater = (uint8_t)CAL2_HEATER_OFF;
            m->heater_for = 0u;
        } else if (!heater_wanted && (m->heater_for >= CAL2_HEATER_MIN_ON)) {
            /* no longer called for */
            m->heater = (uint8_t)CAL2_HEATER_OFF;
            m->heater_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->heater = (uint8_t)CAL2_HEATER_OFF;
        m->heater_for = 0u;
        break;
    }
}

void cal2_start(struct cal2 *m, const struct cal2_remembered *r)
{
    m->tank_probe_good_for = 0u;
    m->tank_probe_state = (uint8_t)CAL2_TANK_PROBE_STATE_PROVING;
    m->tank_probe_state_for = 0u;
    m->tank_probe_last = 0u;
    m->tank_probe_before = 0u;
    m->tank_stat = (uint8_t)CAL2_TANK_STAT_OPEN;
    m->heater = (uint8_t)CAL2_HEATER_OFF;
    m->heater_for = 0u;
    m->heater_apart_for = 0u;
    m->heater_welded = false;
    m->heater_effect_from = 0u;
    m->heater_effect_for = 0u;
    m->heater_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool cal2_remember(const struct cal2 *m, struct cal2_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void cal2_step(struct cal2 *m, const struct cal2_in *in, struct cal2_out *out)
{
    /* thermistor in the pocket of the old rod stat: this sample cannot be believed */
    const bool tank_probe_bad = (in->tank_probe < CAL2_TANK_PROBE_LOWEST) ||
        (in->tank_probe > CAL2_TANK_PROBE_HIGHEST);

    if (tank_probe_bad) {
        /* a bad sample starts the count again */
        m->tank_probe_good_for = 0u;
    } else if (m->tank_probe_good_for < CAL2_TANK_PROBE_CLEAR_AFTER) {
        m->tank_probe_good_for++;
    } else {
        /* stays */
    }

    cal2_tank_probe_state(m, tank_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t tank_probe_now = (uint16_t)(tank_probe_bad
                                               ? m->tank_probe_last : in->tank_probe);
    /* the smaller of the two before */
    const uint16_t tank_probe_less = (uint16_t)((m->tank_probe_last < m->tank_probe_before)
                                                ? m->tank_probe_last : m->tank_probe_before);
    /* the larger of the two before */
    const uint16_t tank_probe_more = (uint16_t)((m->tank_probe_last < m->tank_probe_before)
                                                ? m->tank_probe_before : m->tank_probe_last);
    /* thermistor in the pocket of the old rod stat: median of three believable samples */
    const uint16_t tank_probe_counts = cal2_clamp_u16(tank_probe_now,
                                                      tank_probe_less,
                                                      tank_probe_more);

    if (!tank_probe_bad) {
        m->tank_probe_before = m->tank_probe_last;
    }

    m->tank_probe_last = tank_probe_now;
    cal2_tank_stat(m, tank_probe_counts);

    /* rod immersion stat in the top boss: its contact is made */
    const bool tank_stat_contact = m->tank_stat == CAL2_TANK_STAT_MADE;
    /* the old wiring calls for it */
    const bool heater_wanted = tank_stat_contact && in->flow_proven;

    if ((in->heater_seen && (m->heater == CAL2_HEATER_ON)) ||
        (!in->heater_seen && (m->heater != CAL2_HEATER_ON))) {
        m->heater_apart_for = 0u;
    } else if (m->heater_apart_for < CAL2_HEATER_CONTACT_SETTLES) {
        m->heater_apart_for++;
    } else {
        /* stays */
    }

    if ((m->heater_apart_for >= CAL2_HEATER_CONTACT_SETTLES) && in->heater_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->heater_welded = true;
    }

    /* the temperature has moved as it should */
    const bool heater_effect_seen = ((int32_t)m->heater_effect_from - (int32_t)tank_probe_counts) >=
        (int32_t)CAL2_HEATER_EFFECT;

    if ((m->heater != CAL2_HEATER_ON) || heater_effect_seen) {
        m->heater_effect_for = 0u;
    } else if (!in->limit_open && (m->heater_effect_for < CAL2_HEATER_EFFECT_WITHIN)) {
        m->heater_effect_for++;
    } else {
        /* stays */
    }

    if ((m->heater != CAL2_HEATER_ON) ||
        heater_effect_seen ||
        (tank_probe_counts > m->heater_effect_from)) {
        m->heater_effect_from = tank_probe_counts;
    }

    if (m->heater_effect_for >= CAL2_HEATER_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->heater_no_effect = true;
    }

    cal2_heater(m, in, heater_wanted);
    out->heater = m->heater == CAL2_HEATER_ON;

    uint16_t fault = 0u;

    if (m->tank_probe_state == CAL2_TANK_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | CAL2_FAULT_TANK_PROBE);
    }
    if (m->heater_welded) {
        fault = (uint16_t)(fault | CAL2_FAULT_HEATER_WELDED);
    }
    if ((m->heater_apart_for >= CAL2_HEATER_CONTACT_SETTLES) && !in->heater_seen) {
        fault = (uint16_t)(fault | CAL2_FAULT_HEATER_NOT_MADE);
    }
    if (m->heater_no_effect) {
        fault = (uint16_t)(fault | CAL2_FAULT_HEATER_NO_EFFECT);
    }
    out->fault = fault;
}
