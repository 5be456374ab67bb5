/* frost7.c: control program
 *
 * Equipment: Trace heating, fire-water line 7
 * Site: North Yard
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9ff22083946199f7a373bb91fa9f7e5e0217856b9845d445052e08402ec051f5
 *
 * Replaces:
 * - line_stat: capillary stat strapped to the line
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
 * Open findings: 1 danger_without_barrier (act, freezing/tape); 2 frost_load_safe_on (act, tape); 3
 * welded_output (act, tape); 4 probe_out_of_pocket (act, line_stat); 5 moisture_direction (act,
 * line_probe); 6 insulation_of_new_probe (act, line_probe); 7 contact_life (act, tape); 8
 * mercury_asbestos_refrigerant (act, line_stat); 9 approval_lapses (act, frost7). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#include "frost7.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 80 degC (electronics.sensors[0].valid, line 75):
 * thermistor (beta)
 */
#define FROST7_LINE_PROBE_HIGHEST 3808u
/* counts: lowest believable count, about -40 degC (electronics.sensors[0].valid, line 75):
 * thermistor (beta)
 */
#define FROST7_LINE_PROBE_LOWEST 333u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define FROST7_LINE_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of LINE_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define FROST7_LINE_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define FROST7_LINE_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): LINE_PROBE_FAULT_AFTER + LINE_PROBE_GOOD_RUN
 */
#define FROST7_LINE_PROBE_PROVE_WITHIN 8u
/* counts: 5 degC (controls[0].makes_at, line 51): 5 degC is 2007.099 counts by thermistor (beta);
 * rounded up: at most 2007, which changes at 5.0198 degC; one count is 0.022 K
 */
#define FROST7_LINE_STAT_MAKE 2007u
/* counts: 8 degC (controls[0].breaks_at, line 52): 8 degC is 2141.964 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at least 2142, which changes at 8.0008 degC; one count is
 * 0.0225 K; moved by 1 counts, so that the differential is not below the one asked for: 2143, which
 * changes at 8.0233 degC
 */
#define FROST7_LINE_STAT_BREAK 2143u
/* steps: off for at least 60 s (controls[0].min_off, line 56): 60 s / 500 ms a step, rounded up */
#define FROST7_TAPE_MIN_OFF 120u
/* steps: an effect is expected within 45 min 19 s (process.worst.settles_on, line 23): 3 times the
 * slowest expected answer: 2 h × ln((14 K + 1.49 K)/14 K) = 12 min 6 s, and 3 min of dead time and
 * lag; 45 min 19 s / 500 ms a step, rounded up
 */
#define FROST7_TAPE_EFFECT_WITHIN 5439u
/* counts: 1.49 K towards the set point (process.worst.settles_on, line 23): 0.5 of the differential
 */
#define FROST7_TAPE_EFFECT 66

/* These do not compile where an assumption of this file does not hold. */
typedef char frost7_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char frost7_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char frost7_room_line_probe_good_for[(FROST7_LINE_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char frost7_room_line_probe_state_for[(FROST7_LINE_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char frost7_room_tape_effect_for[(FROST7_TAPE_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char frost7_room_tape_for[(FROST7_TAPE_MIN_OFF <= 255u) ? 1 : -1];

/* x, held between low and high */
static uint16_t frost7_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* strapped to the line under the lagging: is it believed? */
static void frost7_line_probe_state(struct frost7 *m, bool line_probe_bad)
{
    if (m->line_probe_state_for < FROST7_LINE_PROBE_PROVE_WITHIN) {
        m->line_probe_state_for++;
    }
    switch ((enum frost7_line_probe_state)m->line_probe_state) {
    case FROST7_LINE_PROBE_STATE_PROVING:
        if (m->line_probe_good_for >= FROST7_LINE_PROBE_GOOD_RUN) {
            /* proved itself */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_GOOD;
            m->line_probe_state_for = 0u;
        } else if (m->line_probe_state_for >= FROST7_LINE_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_FAULTY;
            m->line_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FROST7_LINE_PROBE_STATE_GOOD:
        if (line_probe_bad) {
            /* a bad sample */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_SUSPECT;
            m->line_probe_state_for = 0u;
        }
        break;
    case FROST7_LINE_PROBE_STATE_SUSPECT:
        if (m->line_probe_good_for >= FROST7_LINE_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_GOOD;
            m->line_probe_state_for = 0u;
        } else if (m->line_probe_state_for >= FROST7_LINE_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_FAULTY;
            m->line_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FROST7_LINE_PROBE_STATE_FAULTY:
        if (m->line_probe_good_for >= FROST7_LINE_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_GOOD;
            m->line_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_FAULTY;
        m->line_probe_state_for = 0u;
        break;
    }
}

/* capillary stat strapped to the line */
static void frost7_line_stat(struct frost7 *m, uint16_t line_probe_counts)
{
    switch ((enum frost7_line_stat)m->line_stat) {
    case FROST7_LINE_STAT_OPEN:
        if ((m->line_probe_state == FROST7_LINE_PROBE_STATE_PROVING) ||
            (m->line_probe_state == FROST7_LINE_PROBE_STATE_FAULTY) ||
            (line_probe_counts <= FROST7_LINE_STAT_MAKE)) {
            /* temperature has reached the make, or the probe is not to be believed */
            m->line_stat = (uint8_t)FROST7_LINE_STAT_MADE;
        }
        break;
    case FROST7_LINE_STAT_MADE:
        if ((m->line_probe_state == FROST7_LINE_PROBE_STATE_GOOD) &&
            (line_probe_counts >= FROST7_LINE_STAT_BREAK)) {
            /* temperature has reached the break */
            m->line_stat = (uint8_t)FROST7_LINE_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->line_stat = (uint8_t)FROST7_LINE_STAT_MADE;
        break;
    }
}

/* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it */
static void frost7_tape(struct frost7 *m, bool tape_wanted)
{
    if (m->tape_for < FROST7_TAPE_MIN_OFF) {
        m->tape_for++;
    }
    switch ((enum frost7_tape)m->tape) {
    case FROST7_TAPE_OFF:
        if ((m->line_probe_state == FROST7_LINE_PROBE_STATE_PROVING) ||
            (m->line_probe_state == FROST7_LINE_PROBE_STATE_FAULTY) ||
            m->tape_no_effect) {
            /* its safe state is on */
            m->tape = (uint8_t)FROST7_TAPE_ON;
            m->tape_for = 0u;
        } else if (tape_wanted && (m->tape_for >= FROST7_TAPE_MIN_OFF)) {
            /* called for */
            m->tape = (uint8_t)FROST7_TAPE_ON;
            m->tape_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FROST7_TAPE_ON:
        if (!tape_wanted &&
            (m->line_probe_state == FROST7_LINE_PROBE_STATE_GOOD) &&
            !m->tape_no_effect) {
            /* no longer called for */
            m->tape = (uint8_t)FROST7_TAPE_OFF;
            m->tape_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->tape = (uint8_t)FROST7_TAPE_ON;
        m->tape_for = 0u;
        break;
    }
}

void frost7_start(struct frost7 *m, const struct frost7_remembered *r)
{
    m->line_probe_good_for = 0u;
    m->line_probe_state = (uint8_t)FROST7_LINE_PROBE_STATE_PROVING;
    m->line_probe_state_for = 0u;
    m->line_probe_last = 0u;
    m->line_probe_before = 0u;
    m->line_stat = (uint8_t)FROST7_LINE_STAT_MADE;
    m->tape = (uint8_t)FROST7_TAPE_ON;
    m->tape_for = 0u;
    m->tape_effect_from = 0u;
    m->tape_effect_for = 0u;
    m->tape_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool frost7_remember(const struct frost7 *m, struct frost7_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void frost7_step(struct frost7 *m, const struct frost7_in *in, struct frost7_out *out)
{
    /* strapped to the line under the lagging: this sample cannot be believed */
    const bool line_probe_bad = (in->line_probe < FROST7_LINE_PROBE_LOWEST) ||
        (in->line_probe > FROST7_LINE_PROBE_HIGHEST);

    if (line_probe_bad) {
        /* a bad sample starts the count again */
        m->line_probe_good_for = 0u;
    } else if (m->line_probe_good_for < FROST7_LINE_PROBE_CLEAR_AFTER) {
        m->line_probe_good_for++;
    } else {
        /* stays */
    }

    frost7_line_probe_state(m, line_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t line_probe_now = (uint16_t)(line_probe_bad
                                               ? m->line_probe_last : in->line_probe);
    /* the smaller of the two before */
    const uint16_t line_probe_less = (uint16_t)((m->line_probe_last < m->line_probe_before)
                                                ? m->line_probe_last : m->line_probe_before);
    /* the larger of the two before */
    const uint16_t line_probe_more = (uint16_t)((m->line_probe_last < m->line_probe_before)
                                                ? m->line_probe_before : m->line_probe_last);
    /* strapped to the line under the lagging: median of three believable samples */
    const uint16_t line_probe_counts = frost7_clamp_u16(line_probe_now,
                                                        line_probe_less,
                                                        line_probe_more);

    if (!line_probe_bad) {
        m->line_probe_before = m->line_probe_last;
    }

    m->line_probe_last = line_probe_now;
    frost7_line_stat(m, line_probe_counts);

    /* capillary stat strapped to the line: its contact is made */
    const bool line_stat_contact = m->line_stat == FROST7_LINE_STAT_MADE;
    /* the old wiring calls for it */
    const bool tape_wanted = line_stat_contact;
    /* the temperature has moved as it should */
    const bool tape_effect_seen = ((int32_t)line_probe_counts - (int32_t)m->tape_effect_from) >=
        (int32_t)FROST7_TAPE_EFFECT;

    if ((m->tape != FROST7_TAPE_ON) || tape_effect_seen) {
        m->tape_effect_for = 0u;
    } else if (m->tape_effect_for < FROST7_TAPE_EFFECT_WITHIN) {
        m->tape_effect_for++;
    } else {
        /* stays */
    }

    if ((m->tape != FROST7_TAPE_ON) ||
        tape_effect_seen ||
        (line_probe_counts < m->tape_effect_from)) {
        m->tape_effect_from = line_probe_counts;
    }

    if (m->tape_effect_for >= FROST7_TAPE_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->tape_no_effect = true;
    }

    frost7_tape(m, tape_wanted);
    out->tape = m->tape == FROST7_TAPE_ON;

    uint16_t fault = 0u;

    if (m->line_probe_state == FROST7_LINE_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | FROST7_FAULT_LINE_PROBE);
    }
    if (m->tape_no_effect) {
        fault = (uint16_t)(fault | FROST7_FAULT_TAPE_NO_EFFECT);
    }
    out->fault = fault;
}
