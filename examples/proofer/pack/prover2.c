/* prover2.c: control program
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
#include "prover2.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -48.1 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define PROVER2_CABINET_PROBE_HIGHEST 1015u
/* counts: lowest believable count, about 150.7 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define PROVER2_CABINET_PROBE_LOWEST 31u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 250 ms a step, rounded up
 */
#define PROVER2_CABINET_PROBE_FAULT_AFTER 8u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of CABINET_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in
 * so many are found
 */
#define PROVER2_CABINET_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 250 ms a step, rounded up
 */
#define PROVER2_CABINET_PROBE_CLEAR_AFTER 40u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): CABINET_PROBE_FAULT_AFTER + CABINET_PROBE_GOOD_RUN
 */
#define PROVER2_CABINET_PROBE_PROVE_WITHIN 12u
/* steps: software lag 56.4 s (controls[0].match, line 51): first-order lag in the program: each
 * step of 250 ms goes 1/226 of the way to 2048 times the reading, which is 56.4 s (-0.1 % of what
 * was solved for); it comes to within 0.11 counts of a constant reading
 */
#define PROVER2_CABINET_STAT_LAG 226
/* parts a count: as fine as the lag keeps a reading (controls[0].match, line 51): the smallest
 * power of two with which (226 − 1)/2048 counts is no more than the error allowed
 */
#define PROVER2_CABINET_STAT_COUNT 2048
/* 1/2048 counts: 36 degC (controls[0].makes_at, line 45): the sheet has make 36 degC and break 38
 * degC; match cycle_rate: a threshold would be at 38.99 degC, above the highest allowed, 38 degC;
 * thresholds as they were, with a software lag instead; 36 degC is 513.700 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 514, which changes at 35.9716 degC; one
 * count is 0.0945 K; moved by 1 counts, so that the differential is not below the one asked for:
 * 515, which changes at 35.8772 degC; its edge, half a count on, in parts: 1053696
 */
#define PROVER2_CABINET_STAT_MAKE UINT32_C(1053696)
/* 1/2048 counts: 38 degC (controls[0].breaks_at, line 46): the sheet has make 36 degC and break 38
 * degC; match cycle_rate: a threshold would be at 38.99 degC, above the highest allowed, 38 degC;
 * thresholds as they were, with a software lag instead; 38 degC is 492.684 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at most 492, which changes at 37.9697 degC; one
 * count is 0.0959 K; its edge, half a count on, in parts: 1008640
 */
#define PROVER2_CABINET_STAT_BREAK UINT32_C(1008640)
/* steps: an effect is expected within 3 min 4 s (controls[0].observed.on): 3 times the slowest
 * expected answer: 1 d 12 h × ln((3279.52 K + 0.96 K)/3279.52 K) = 38.4 s, and 23.1 s of dead time
 * and lag; 3 min 4 s / 250 ms a step, rounded up
 */
#define PROVER2_HEATER_EFFECT_WITHIN 738u
/* counts: 0.96 K towards the set point (controls[0].observed.on): 0.5 of the differential */
#define PROVER2_HEATER_EFFECT 10

/* These do not compile where an assumption of this file does not hold. */
typedef char prover2_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char prover2_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char prover2_room_1[(PROVER2_CABINET_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char prover2_room_2[(PROVER2_CABINET_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char prover2_room_heater_effect_for[(PROVER2_HEATER_EFFECT_WITHIN <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t prover2_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* y, moved towards x by the n-th part of the way */
static int32_t prover2_toward_i32(int32_t y, int32_t x, int32_t n)
{
    return y + ((x - y) / n);
}

/* thermistor bead in the air stream: is it believed? */
static void prover2_cabinet_probe_state(struct prover2 *m, bool cabinet_probe_bad)
{
    if (m->cabinet_probe_state_for < PROVER2_CABINET_PROBE_PROVE_WITHIN) {
        m->cabinet_probe_state_for++;
    }
    switch ((enum prover2_cabinet_probe_state)m->cabinet_probe_state) {
    case PROVER2_CABINET_PROBE_STATE_PROVING:
        if (m->cabinet_probe_good_for >= PROVER2_CABINET_PROBE_GOOD_RUN) {
            /* proved itself */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_GOOD;
            m->cabinet_probe_state_for = 0u;
        } else if (m->cabinet_probe_state_for >= PROVER2_CABINET_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_FAULTY;
            m->cabinet_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case PROVER2_CABINET_PROBE_STATE_GOOD:
        if (cabinet_probe_bad) {
            /* a bad sample */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_SUSPECT;
            m->cabinet_probe_state_for = 0u;
        }
        break;
    case PROVER2_CABINET_PROBE_STATE_SUSPECT:
        if (m->cabinet_probe_good_for >= PROVER2_CABINET_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_GOOD;
            m->cabinet_probe_state_for = 0u;
        } else if (m->cabinet_probe_state_for >= PROVER2_CABINET_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_FAULTY;
            m->cabinet_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case PROVER2_CABINET_PROBE_STATE_FAULTY:
        if (m->cabinet_probe_good_for >= PROVER2_CABINET_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_GOOD;
            m->cabinet_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_FAULTY;
        m->cabinet_probe_state_for = 0u;
        break;
    }
}

/* snap disc behind the back panel */
static void prover2_cabinet_stat(struct prover2 *m)
{
    switch ((enum prover2_cabinet_stat)m->cabinet_stat) {
    case PROVER2_CABINET_STAT_OPEN:
        if ((m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_GOOD) &&
            (m->cabinet_stat_smoothed >= PROVER2_CABINET_STAT_MAKE)) {
            /* temperature has reached the make */
            m->cabinet_stat = (uint8_t)PROVER2_CABINET_STAT_MADE;
        }
        break;
    case PROVER2_CABINET_STAT_MADE:
        if ((m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_PROVING) ||
            (m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_FAULTY) ||
            (m->cabinet_stat_smoothed <= PROVER2_CABINET_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->cabinet_stat = (uint8_t)PROVER2_CABINET_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->cabinet_stat = (uint8_t)PROVER2_CABINET_STAT_OPEN;
        break;
    }
}

/* 1.2 kW heating mat */
static void prover2_heater(struct prover2 *m, bool heater_wanted)
{
    switch ((enum prover2_heater)m->heater) {
    case PROVER2_HEATER_OFF:
        if (heater_wanted &&
            (m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_GOOD) &&
            !m->heater_no_effect) {
            /* called for */
            m->heater = (uint8_t)PROVER2_HEATER_ON;
        }
        break;
    case PROVER2_HEATER_ON:
        if ((m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_PROVING) ||
            (m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_FAULTY) ||
            m->heater_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->heater = (uint8_t)PROVER2_HEATER_OFF;
        } else if (!heater_wanted) {
            /* no longer called for */
            m->heater = (uint8_t)PROVER2_HEATER_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->heater = (uint8_t)PROVER2_HEATER_OFF;
        break;
    }
}

void prover2_start(struct prover2 *m, const struct prover2_remembered *r)
{
    m->cabinet_probe_good_for = 0u;
    m->cabinet_probe_state = (uint8_t)PROVER2_CABINET_PROBE_STATE_PROVING;
    m->cabinet_probe_state_for = 0u;
    m->cabinet_probe_last = 0u;
    m->cabinet_probe_before = 0u;
    m->cabinet_stat_smoothed = 63488u;
    m->cabinet_stat = (uint8_t)PROVER2_CABINET_STAT_OPEN;
    m->heater = (uint8_t)PROVER2_HEATER_OFF;
    m->heater_effect_from = 0u;
    m->heater_effect_for = 0u;
    m->heater_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool prover2_remember(const struct prover2 *m, struct prover2_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void prover2_step(struct prover2 *m, const struct prover2_in *in, struct prover2_out *out)
{
    /* thermistor bead in the air stream: this sample cannot be believed */
    const bool cabinet_probe_bad = (in->cabinet_probe < PROVER2_CABINET_PROBE_LOWEST) ||
        (in->cabinet_probe > PROVER2_CABINET_PROBE_HIGHEST);

    if (cabinet_probe_bad) {
        /* a bad sample starts the count again */
        m->cabinet_probe_good_for = 0u;
    } else if (m->cabinet_probe_good_for < PROVER2_CABINET_PROBE_CLEAR_AFTER) {
        m->cabinet_probe_good_for++;
    } else {
        /* stays */
    }

    prover2_cabinet_probe_state(m, cabinet_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t cabinet_probe_now = (uint16_t)(cabinet_probe_bad
                                                  ? m->cabinet_probe_last : in->cabinet_probe);
    /* the smaller of the two before */
    const uint16_t cabinet_probe_less = (uint16_t)(
            (m->cabinet_probe_last < m->cabinet_probe_before)
            ? m->cabinet_probe_last : m->cabinet_probe_before);
    /* the larger of the two before */
    const uint16_t cabinet_probe_more = (uint16_t)(
            (m->cabinet_probe_last < m->cabinet_probe_before)
            ? m->cabinet_probe_before : m->cabinet_probe_last);
    /* thermistor bead in the air stream: median of three believable samples */
    const uint16_t cabinet_probe_counts = prover2_clamp_u16(cabinet_probe_now,
                                                            cabinet_probe_less,
                                                            cabinet_probe_more);

    if (!cabinet_probe_bad) {
        m->cabinet_probe_before = m->cabinet_probe_last;
    }

    m->cabinet_probe_last = cabinet_probe_now;

    /* reading in parts of a count */
    const uint32_t cabinet_stat_parts = (uint32_t)(
            (int32_t)prover2_clamp_u16(cabinet_probe_counts,
                                       PROVER2_CABINET_PROBE_LOWEST,
                                       PROVER2_CABINET_PROBE_HIGHEST) *
            (int32_t)PROVER2_CABINET_STAT_COUNT);

    /* a lag as the old element had one */
    m->cabinet_stat_smoothed = (uint32_t)(
            ((m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_PROVING) ||
             (m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_FAULTY))
            ? (int32_t)cabinet_stat_parts
            : prover2_toward_i32((int32_t)m->cabinet_stat_smoothed,
                                 (int32_t)cabinet_stat_parts,
                                 (int32_t)PROVER2_CABINET_STAT_LAG));

    prover2_cabinet_stat(m);

    /* snap disc behind the back panel: its contact is made */
    const bool cabinet_stat_contact = m->cabinet_stat == PROVER2_CABINET_STAT_MADE;
    /* the old wiring calls for it */
    const bool heater_wanted = cabinet_stat_contact;
    /* the temperature has moved as it should */
    const bool heater_effect_seen = ((int32_t)m->heater_effect_from -
                                     (int32_t)cabinet_probe_counts) >=
        (int32_t)PROVER2_HEATER_EFFECT;

    if ((m->heater != PROVER2_HEATER_ON) || heater_effect_seen) {
        m->heater_effect_for = 0u;
    } else if (m->heater_effect_for < PROVER2_HEATER_EFFECT_WITHIN) {
        m->heater_effect_for++;
    } else {
        /* stays */
    }

    if ((m->heater != PROVER2_HEATER_ON) ||
        heater_effect_seen ||
        (cabinet_probe_counts > m->heater_effect_from)) {
        m->heater_effect_from = cabinet_probe_counts;
    }

    if (m->heater_effect_for >= PROVER2_HEATER_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->heater_no_effect = true;
    }

    prover2_heater(m, heater_wanted);
    out->heater = m->heater == PROVER2_HEATER_ON;

    uint16_t fault = 0u;

    if (m->cabinet_probe_state == PROVER2_CABINET_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | PROVER2_FAULT_CABINET_PROBE);
    }
    if (m->heater_no_effect) {
        fault = (uint16_t)(fault | PROVER2_FAULT_HEATER_NO_EFFECT);
    }
    out->fault = fault;
}
