/* hlt1.c: control program
 *
 * Equipment: Hot-liquor tank 1, brewhouse
 * Site: Quayside Brewery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 578850f718fbb5826141e839c71ef53b44ecfcb9f5166c7575dad1c350269f46
 *
 * Replaces:
 * - liquor_stat: capillary stat, its bulb in the pocket half way up
 *
 * Stays hard-wired, and must:
 * - tank_limit: capillary limit in a pocket of its own, manual reset
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
 * Open findings: 1 earth_fault_bypasses_limit (act, hlt1); 2 probe_out_of_pocket (act,
 * liquor_stat); 3 damp_dust_washdown (act, hlt1); 4 contact_life (act, elements); 5
 * scald_and_storage (act, liquor_stat); 6 model_beyond_evidence (act, hlt1); 7
 * mercury_asbestos_refrigerant (act, liquor_stat); 8 approval_lapses (act, hlt1); 9
 * overshoot_not_determined (act, tank_limit/boiling). Not judged, for want of a figure: 1; risks.md
 * says which.
 */
#include "hlt1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -50.6 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define HLT1_LIQUOR_PROBE_HIGHEST 4081u
/* counts: lowest believable count, about 150.1 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define HLT1_LIQUOR_PROBE_LOWEST 227u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define HLT1_LIQUOR_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of LIQUOR_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in
 * so many are found
 */
#define HLT1_LIQUOR_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define HLT1_LIQUOR_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): LIQUOR_PROBE_FAULT_AFTER + LIQUOR_PROBE_GOOD_RUN
 */
#define HLT1_LIQUOR_PROBE_PROVE_WITHIN 8u
/* counts: 54.98 degC (controls[0].match, line 51): the sheet has make 55 degC and break 61 degC;
 * match swing: thresholds at which the new probe stands as the old control switches: the medium
 * does exactly what it did; 54.9757 degC is 1935.570 counts by thermistor (beta); rounded to the
 * nearest edge of a count: at least 1936, which changes at 54.9643 degC; one count is 0.0265 K
 */
#define HLT1_LIQUOR_STAT_MAKE 1936u
/* counts: 61.41 degC (controls[0].match, line 51): the sheet has make 55 degC and break 61 degC;
 * match swing: thresholds at which the new probe stands as the old control switches: the medium
 * does exactly what it did; 61.4096 degC is 1700.179 counts by thermistor (beta); rounded to the
 * nearest edge of a count: at most 1699, which changes at 61.4147 degC; one count is 0.0283 K
 */
#define HLT1_LIQUOR_STAT_BREAK 1699u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 500 ms a step, rounded up
 */
#define HLT1_ELEMENTS_CONTACT_SETTLES 2u
/* steps: an effect is expected within 13 min 28 s (process.log): 3 times the slowest expected
 * answer: 21 d 14 h × ln((23882.19 K + 3.2 K)/23882.19 K) = 4 min 10 s, and 19.6 s of dead time and
 * lag; 13 min 28 s / 500 ms a step, rounded up
 */
#define HLT1_ELEMENTS_EFFECT_WITHIN 1617u
/* counts: 3.2 K towards the set point (process.log): 0.5 of the differential */
#define HLT1_ELEMENTS_EFFECT 113

/* These do not compile where an assumption of this file does not hold. */
typedef char hlt1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char hlt1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char hlt1_room_liquor_probe_good_for[(HLT1_LIQUOR_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char hlt1_room_liquor_probe_state_for[(HLT1_LIQUOR_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char hlt1_room_elements_apart_for[(HLT1_ELEMENTS_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char hlt1_room_elements_effect_for[(HLT1_ELEMENTS_EFFECT_WITHIN <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t hlt1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* thermistor in the pocket of the old bulb: is it believed? */
static void hlt1_liquor_probe_state(struct hlt1 *m, bool liquor_probe_bad)
{
    if (m->liquor_probe_state_for < HLT1_LIQUOR_PROBE_PROVE_WITHIN) {
        m->liquor_probe_state_for++;
    }
    switch ((enum hlt1_liquor_probe_state)m->liquor_probe_state) {
    case HLT1_LIQUOR_PROBE_STATE_PROVING:
        if (m->liquor_probe_good_for >= HLT1_LIQUOR_PROBE_GOOD_RUN) {
            /* proved itself */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_GOOD;
            m->liquor_probe_state_for = 0u;
        } else if (m->liquor_probe_state_for >= HLT1_LIQUOR_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_FAULTY;
            m->liquor_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case HLT1_LIQUOR_PROBE_STATE_GOOD:
        if (liquor_probe_bad) {
            /* a bad sample */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_SUSPECT;
            m->liquor_probe_state_for = 0u;
        }
        break;
    case HLT1_LIQUOR_PROBE_STATE_SUSPECT:
        if (m->liquor_probe_good_for >= HLT1_LIQUOR_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_GOOD;
            m->liquor_probe_state_for = 0u;
        } else if (m->liquor_probe_state_for >= HLT1_LIQUOR_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_FAULTY;
            m->liquor_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case HLT1_LIQUOR_PROBE_STATE_FAULTY:
        if (m->liquor_probe_good_for >= HLT1_LIQUOR_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_GOOD;
            m->liquor_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_FAULTY;
        m->liquor_probe_state_for = 0u;
        break;
    }
}

/* capillary stat, its bulb in the pocket half way up */
static void hlt1_liquor_stat(struct hlt1 *m, uint16_t liquor_probe_counts)
{
    switch ((enum hlt1_liquor_stat)m->liquor_stat) {
    case HLT1_LIQUOR_STAT_OPEN:
        if ((m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_GOOD) &&
            (liquor_probe_counts >= HLT1_LIQUOR_STAT_MAKE)) {
            /* temperature has reached the make */
            m->liquor_stat = (uint8_t)HLT1_LIQUOR_STAT_MADE;
        }
        break;
    case HLT1_LIQUOR_STAT_MADE:
        if ((m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_PROVING) ||
            (m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_FAULTY) ||
            (liquor_probe_counts <= HLT1_LIQUOR_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->liquor_stat = (uint8_t)HLT1_LIQUOR_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->liquor_stat = (uint8_t)HLT1_LIQUOR_STAT_OPEN;
        break;
    }
}

/* 12 kW of immersion elements through a contactor */
static void hlt1_elements(struct hlt1 *m, bool elements_wanted)
{
    switch ((enum hlt1_elements)m->elements) {
    case HLT1_ELEMENTS_OFF:
        if (elements_wanted &&
            (m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_GOOD) &&
            !(m->elements_no_effect || m->elements_welded)) {
            /* called for */
            m->elements = (uint8_t)HLT1_ELEMENTS_ON;
        }
        break;
    case HLT1_ELEMENTS_ON:
        if ((m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_PROVING) ||
            (m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_FAULTY) ||
            m->elements_no_effect ||
            m->elements_welded) {
            /* its safe state is off, before any minimum on time */
            m->elements = (uint8_t)HLT1_ELEMENTS_OFF;
        } else if (!elements_wanted) {
            /* no longer called for */
            m->elements = (uint8_t)HLT1_ELEMENTS_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->elements = (uint8_t)HLT1_ELEMENTS_OFF;
        break;
    }
}

void hlt1_start(struct hlt1 *m, const struct hlt1_remembered *r)
{
    m->liquor_probe_good_for = 0u;
    m->liquor_probe_state = (uint8_t)HLT1_LIQUOR_PROBE_STATE_PROVING;
    m->liquor_probe_state_for = 0u;
    m->liquor_probe_last = 0u;
    m->liquor_probe_before = 0u;
    m->liquor_stat = (uint8_t)HLT1_LIQUOR_STAT_OPEN;
    m->elements = (uint8_t)HLT1_ELEMENTS_OFF;
    m->elements_apart_for = 0u;
    m->elements_welded = false;
    m->elements_effect_from = 0u;
    m->elements_effect_for = 0u;
    m->elements_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool hlt1_remember(const struct hlt1 *m, struct hlt1_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void hlt1_step(struct hlt1 *m, const struct hlt1_in *in, struct hlt1_out *out)
{
    /* thermistor in the pocket of the old bulb: this sample cannot be believed */
    const bool liquor_probe_bad = (in->liquor_probe < HLT1_LIQUOR_PROBE_LOWEST) ||
        (in->liquor_probe > HLT1_LIQUOR_PROBE_HIGHEST);

    if (liquor_probe_bad) {
        /* a bad sample starts the count again */
        m->liquor_probe_good_for = 0u;
    } else if (m->liquor_probe_good_for < HLT1_LIQUOR_PROBE_CLEAR_AFTER) {
        m->liquor_probe_good_for++;
    } else {
        /* stays */
    }

    hlt1_liquor_probe_state(m, liquor_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t liquor_probe_now = (uint16_t)(liquor_probe_bad
                                                 ? m->liquor_probe_last : in->liquor_probe);
    /* the smaller of the two before */
    const uint16_t liquor_probe_less = (uint16_t)(
            (m->liquor_probe_last < m->liquor_probe_before)
            ? m->liquor_probe_last : m->liquor_probe_before);
    /* the larger of the two before */
    const uint16_t liquor_probe_more = (uint16_t)(
            (m->liquor_probe_last < m->liquor_probe_before)
            ? m->liquor_probe_before : m->liquor_probe_last);
    /* thermistor in the pocket of the old bulb: median of three believable samples */
    const uint16_t liquor_probe_counts = hlt1_clamp_u16(liquor_probe_now,
                                                        liquor_probe_less,
                                                        liquor_probe_more);

    if (!liquor_probe_bad) {
        m->liquor_probe_before = m->liquor_probe_last;
    }

    m->liquor_probe_last = liquor_probe_now;
    hlt1_liquor_stat(m, liquor_probe_counts);

    /* capillary stat, its bulb in the pocket half way up: its contact is made */
    const bool liquor_stat_contact = m->liquor_stat == HLT1_LIQUOR_STAT_MADE;
    /* the old wiring calls for it */
    const bool elements_wanted = liquor_stat_contact;

    if ((in->elements_seen && (m->elements == HLT1_ELEMENTS_ON)) ||
        (!in->elements_seen && (m->elements != HLT1_ELEMENTS_ON))) {
        m->elements_apart_for = 0u;
    } else if (m->elements_apart_for < HLT1_ELEMENTS_CONTACT_SETTLES) {
        m->elements_apart_for++;
    } else {
        /* stays */
    }

    if ((m->elements_apart_for >= HLT1_ELEMENTS_CONTACT_SETTLES) && in->elements_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->elements_welded = true;
    }

    /* the temperature has moved as it should */
    const bool elements_effect_seen = ((int32_t)m->elements_effect_from -
                                       (int32_t)liquor_probe_counts) >=
        (int32_t)HLT1_ELEMENTS_EFFECT;

    if ((m->elements != HLT1_ELEMENTS_ON) || elements_effect_seen) {
        m->elements_effect_for = 0u;
    } else if (m->elements_effect_for < HLT1_ELEMENTS_EFFECT_WITHIN) {
        m->elements_effect_for++;
    } else {
        /* stays */
    }

    if ((m->elements != HLT1_ELEMENTS_ON) ||
        elements_effect_seen ||
        (liquor_probe_counts > m->elements_effect_from)) {
        m->elements_effect_from = liquor_probe_counts;
    }

    if (m->elements_effect_for >= HLT1_ELEMENTS_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->elements_no_effect = true;
    }

    hlt1_elements(m, elements_wanted);
    out->elements = m->elements == HLT1_ELEMENTS_ON;

    uint16_t fault = 0u;

    if (m->liquor_probe_state == HLT1_LIQUOR_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | HLT1_FAULT_LIQUOR_PROBE);
    }
    if (m->elements_welded) {
        fault = (uint16_t)(fault | HLT1_FAULT_ELEMENTS_WELDED);
    }
    if ((m->elements_apart_for >= HLT1_ELEMENTS_CONTACT_SETTLES) && !in->elements_seen) {
        fault = (uint16_t)(fault | HLT1_FAULT_ELEMENTS_NOT_MADE);
    }
    if (m->elements_no_effect) {
        fault = (uint16_t)(fault | HLT1_FAULT_ELEMENTS_NO_EFFECT);
    }
    out->fault = fault;
}
