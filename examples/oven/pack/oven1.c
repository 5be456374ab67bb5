/* oven1.c: control program
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
#include "oven1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 482.3 degC (electronics.sensors[0].valid, line 94): type
 * K (IEC 60584-1)
 */
#define OVEN1_CHAMBER_PROBE_HIGHEST 1729u
/* counts: lowest believable count, about 0.1 degC (electronics.sensors[0].valid, line 94): type K
 * (IEC 60584-1)
 */
#define OVEN1_CHAMBER_PROBE_LOWEST 248u
/* steps: not good for 3 s (electronics.sensors[0].fault_after, line 95): 3 s / 500 ms a step,
 * rounded up
 */
#define OVEN1_CHAMBER_PROBE_FAULT_AFTER 6u
/* steps: good samples in a row that end a doubt (electronics.sensors[0].fault_after, line 95): half
 * of CHAMBER_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so many are found
 */
#define OVEN1_CHAMBER_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define OVEN1_CHAMBER_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (electronics.sensors[0].fault_after, line 95):
 * CHAMBER_PROBE_FAULT_AFTER + CHAMBER_PROBE_GOOD_RUN
 */
#define OVEN1_CHAMBER_PROBE_PROVE_WITHIN 10u
/* counts: 214.17 degC (controls[0].set_point, line 54): 214.167 degC is 896.575 counts by type K
 * (IEC 60584-1); rounded to the nearest edge of a count: at most 896, which changes at 214.3090
 * degC; one count is 0.335 K; moved by -1 counts, so that the differential is not below the one
 * asked for: 895, which changes at 213.9743 degC
 */
#define OVEN1_CHAMBER_STAT_MAKE 895u
/* counts: 228.06 degC (controls[0].set_point, line 54): 228.056 degC is 938.175 counts by type K
 * (IEC 60584-1); rounded to the nearest edge of a count: at least 938, which changes at 227.9971
 * degC; one count is 0.333 K
 */
#define OVEN1_CHAMBER_STAT_BREAK 938u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 500 ms a step, rounded up
 */
#define OVEN1_ELEMENTS_CONTACT_SETTLES 2u
/* steps: an effect is expected within 7 min 59 s (process.settles_on, line 18): 3 times the slowest
 * expected answer: 50 min × ln((170.83 K + 6.66 K)/170.83 K) = 114.7 s, and 45 s of dead time and
 * lag; 7 min 59 s / 500 ms a step, rounded up
 */
#define OVEN1_ELEMENTS_EFFECT_WITHIN 959u
/* counts: 6.66 K towards the set point (process.settles_on, line 18): 0.5 of the differential */
#define OVEN1_ELEMENTS_EFFECT 20

/* These do not compile where an assumption of this file does not hold. */
typedef char oven1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char oven1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char oven1_room_chamber_probe_good_for[(OVEN1_CHAMBER_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char oven1_room_2[(OVEN1_CHAMBER_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char oven1_room_elements_apart_for[(OVEN1_ELEMENTS_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char oven1_room_elements_effect_for[(OVEN1_ELEMENTS_EFFECT_WITHIN <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t oven1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* sheathed thermocouple beside the old bulb: is it believed? */
static void oven1_chamber_probe_state(struct oven1 *m, bool chamber_probe_bad)
{
    if (m->chamber_probe_state_for < OVEN1_CHAMBER_PROBE_PROVE_WITHIN) {
        m->chamber_probe_state_for++;
    }
    switch ((enum oven1_chamber_probe_state)m->chamber_probe_state) {
    case OVEN1_CHAMBER_PROBE_STATE_PROVING:
        if (m->chamber_probe_good_for >= OVEN1_CHAMBER_PROBE_GOOD_RUN) {
            /* proved itself */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_GOOD;
            m->chamber_probe_state_for = 0u;
        } else if (m->chamber_probe_state_for >= OVEN1_CHAMBER_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_FAULTY;
            m->chamber_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case OVEN1_CHAMBER_PROBE_STATE_GOOD:
        if (chamber_probe_bad) {
            /* a bad sample */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_SUSPECT;
            m->chamber_probe_state_for = 0u;
        }
        break;
    case OVEN1_CHAMBER_PROBE_STATE_SUSPECT:
        if (m->chamber_probe_good_for >= OVEN1_CHAMBER_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_GOOD;
            m->chamber_probe_state_for = 0u;
        } else if (m->chamber_probe_state_for >= OVEN1_CHAMBER_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_FAULTY;
            m->chamber_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case OVEN1_CHAMBER_PROBE_STATE_FAULTY:
        if (m->chamber_probe_good_for >= OVEN1_CHAMBER_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_GOOD;
            m->chamber_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_FAULTY;
        m->chamber_probe_state_for = 0u;
        break;
    }
}

/* capillary stat with its bulb in the crown of the chamber */
static void oven1_chamber_stat(struct oven1 *m, uint16_t chamber_probe_counts)
{
    switch ((enum oven1_chamber_stat)m->chamber_stat) {
    case OVEN1_CHAMBER_STAT_OPEN:
        if ((m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_GOOD) &&
            (chamber_probe_counts <= OVEN1_CHAMBER_STAT_MAKE)) {
            /* temperature has reached the make */
            m->chamber_stat = (uint8_t)OVEN1_CHAMBER_STAT_MADE;
        }
        break;
    case OVEN1_CHAMBER_STAT_MADE:
        if ((m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_PROVING) ||
            (m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_FAULTY) ||
            (chamber_probe_counts >= OVEN1_CHAMBER_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->chamber_stat = (uint8_t)OVEN1_CHAMBER_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->chamber_stat = (uint8_t)OVEN1_CHAMBER_STAT_OPEN;
        break;
    }
}

/* 12 kW of top and bottom elements through a contactor */
static void oven1_elements(struct oven1 *m, bool elements_wanted)
{
    switch ((enum oven1_elements)m->elements) {
    case OVEN1_ELEMENTS_OFF:
        if (elements_wanted &&
            (m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_GOOD) &&
            !(m->elements_no_effect || m->elements_welded)) {
            /* called for */
            m->elements = (uint8_t)OVEN1_ELEMENTS_ON;
        }
        break;
    case OVEN1_ELEMENTS_ON:
        if ((m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_PROVING) ||
            (m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_FAULTY) ||
            m->elements_no_effect ||
            m->elements_welded) {
            /* its safe state is off, before any minimum on time */
            m->elements = (uint8_t)OVEN1_ELEMENTS_OFF;
        } else if (!elements_wanted) {
            /* no longer called for */
            m->elements = (uint8_t)OVEN1_ELEMENTS_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->elements = (uint8_t)OVEN1_ELEMENTS_OFF;
        break;
    }
}

void oven1_start(struct oven1 *m, const struct oven1_remembered *r)
{
    m->chamber_probe_good_for = 0u;
    m->chamber_probe_state = (uint8_t)OVEN1_CHAMBER_PROBE_STATE_PROVING;
    m->chamber_probe_state_for = 0u;
    m->chamber_probe_last = 0u;
    m->chamber_probe_before = 0u;
    m->chamber_stat = (uint8_t)OVEN1_CHAMBER_STAT_OPEN;
    m->elements = (uint8_t)OVEN1_ELEMENTS_OFF;
    m->elements_apart_for = 0u;
    m->elements_welded = false;
    m->elements_effect_from = 0u;
    m->elements_effect_for = 0u;
    m->elements_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool oven1_remember(const struct oven1 *m, struct oven1_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void oven1_step(struct oven1 *m, const struct oven1_in *in, struct oven1_out *out)
{
    /* sheathed thermocouple beside the old bulb: this sample cannot be believed */
    const bool chamber_probe_bad = (in->chamber_probe < OVEN1_CHAMBER_PROBE_LOWEST) ||
        (in->chamber_probe > OVEN1_CHAMBER_PROBE_HIGHEST);

    if (chamber_probe_bad) {
        /* a bad sample starts the count again */
        m->chamber_probe_good_for = 0u;
    } else if (m->chamber_probe_good_for < OVEN1_CHAMBER_PROBE_CLEAR_AFTER) {
        m->chamber_probe_good_for++;
    } else {
        /* stays */
    }

    oven1_chamber_probe_state(m, chamber_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t chamber_probe_now = (uint16_t)(chamber_probe_bad
                                                  ? m->chamber_probe_last : in->chamber_probe);
    /* the smaller of the two before */
    const uint16_t chamber_probe_less = (uint16_t)(
            (m->chamber_probe_last < m->chamber_probe_before)
            ? m->chamber_probe_last : m->chamber_probe_before);
    /* the larger of the two before */
    const uint16_t chamber_probe_more = (uint16_t)(
            (m->chamber_probe_last < m->chamber_probe_before)
            ? m->chamber_probe_before : m->chamber_probe_last);
    /* sheathed thermocouple beside the old bulb: median of three believable samples */
    const uint16_t chamber_probe_counts = oven1_clamp_u16(chamber_probe_now,
                                                          chamber_probe_less,
                                                          chamber_probe_more);

    if (!chamber_probe_bad) {
        m->chamber_probe_before = m->chamber_probe_last;
    }

    m->chamber_probe_last = chamber_probe_now;
    oven1_chamber_stat(m, chamber_probe_counts);

    /* capillary stat with its bulb in the crown of the chamber: its contact is made */
    const bool chamber_stat_contact = m->chamber_stat == OVEN1_CHAMBER_STAT_MADE;
    /* the old wiring calls for it */
    const bool elements_wanted = chamber_stat_contact && in->door_shut;

    if ((in->elements_seen && (m->elements == OVEN1_ELEMENTS_ON)) ||
        (!in->elements_seen && (m->elements != OVEN1_ELEMENTS_ON))) {
        m->elements_apart_for = 0u;
    } else if (m->elements_apart_for < OVEN1_ELEMENTS_CONTACT_SETTLES) {
        m->elements_apart_for++;
    } else {
        /* stays */
    }

    if ((m->elements_apart_for >= OVEN1_ELEMENTS_CONTACT_SETTLES) && in->elements_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->elements_welded = true;
    }

    /* the temperature has moved as it should */
    const bool elements_effect_seen = ((int32_t)chamber_probe_counts -
                                       (int32_t)m->elements_effect_from) >=
        (int32_t)OVEN1_ELEMENTS_EFFECT;

    if ((m->elements != OVEN1_ELEMENTS_ON) || elements_effect_seen) {
        m->elements_effect_for = 0u;
    } else if (m->elements_effect_for < OVEN1_ELEMENTS_EFFECT_WITHIN) {
        m->elements_effect_for++;
    } else {
        /* stays */
    }

    if ((m->elements != OVEN1_ELEMENTS_ON) ||
        elements_effect_seen ||
        (chamber_probe_counts < m->elements_effect_from)) {
        m->elements_effect_from = chamber_probe_counts;
    }

    if (m->elements_effect_for >= OVEN1_ELEMENTS_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->elements_no_effect = true;
    }

    oven1_elements(m, elements_wanted);
    out->elements = m->elements == OVEN1_ELEMENTS_ON;

    uint16_t fault = 0u;

    if (m->chamber_probe_state == OVEN1_CHAMBER_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | OVEN1_FAULT_CHAMBER_PROBE);
    }
    if (m->elements_welded) {
        fault = (uint16_t)(fault | OVEN1_FAULT_ELEMENTS_WELDED);
    }
    if ((m->elements_apart_for >= OVEN1_ELEMENTS_CONTACT_SETTLES) && !in->elements_seen) {
        fault = (uint16_t)(fault | OVEN1_FAULT_ELEMENTS_NOT_MADE);
    }
    if (m->elements_no_effect) {
        fault = (uint16_t)(fault | OVEN1_FAULT_ELEMENTS_NO_EFFECT);
    }
    out->fault = fault;
}
