/* room4.c: control program
 *
 * Equipment: Room control, caretaker's flat
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: d3cb2df54b043c85a55b36ae17d55a520d1b44a8f6e6363d94d5ab1013700b13
 *
 * Replaces:
 * - room_stat: room control with a mercury bottle, in the hall
 *
 * Stays hard-wired, and must:
 * - boiler_limit: limit of the boiler, part of its burner control
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
 * Open findings: 1 earth_fault_bypasses_limit (act, room4); 2 contact_life (act, boiler); 3
 * mercury_asbestos_refrigerant (act, room_stat); 4 approval_lapses (act, room4); 5
 * probe_sees_the_room (act, room_stat); 6 danger_not_judged (act, cold_flat). Not judged, for want
 * of a figure: 1; risks.md says which.
 */
#include "room4.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -20 degC (electronics.sensors[0].valid, line 96):
 * thermistor (beta)
 */
#define ROOM4_ROOM_PROBE_HIGHEST 3628u
/* counts: lowest believable count, about 60 degC (electronics.sensors[0].valid, line 96):
 * thermistor (beta)
 */
#define ROOM4_ROOM_PROBE_LOWEST 940u
/* steps: not good for 10 s (electronics.sensors[0].fault_after, line 97): 10 s / 1 s a step,
 * rounded up
 */
#define ROOM4_ROOM_PROBE_FAULT_AFTER 10u
/* steps: good samples in a row that end a doubt (electronics.sensors[0].fault_after, line 97): half
 * of ROOM_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so many are found
 */
#define ROOM4_ROOM_PROBE_GOOD_RUN 5u
/* steps: good for 30 s (electronics.sensors[0].clear_after, line 98): 30 s / 1 s a step, rounded up
 */
#define ROOM4_ROOM_PROBE_CLEAR_AFTER 30u
/* steps: time to prove itself after a start (electronics.sensors[0].fault_after, line 97):
 * ROOM_PROBE_FAULT_AFTER + ROOM_PROBE_GOOD_RUN
 */
#define ROOM4_ROOM_PROBE_PROVE_WITHIN 15u
/* counts: 18.87 degC (controls[0].match, line 61): the sheet has make 19 degC and break 20 degC;
 * match cycle_rate: differential +0.265 K about the same middle, so that the rate is the old one;
 * 18.8674 degC is 2294.557 counts by thermistor (beta); rounded up: at least 2294, which changes at
 * 18.8811 degC; one count is 0.0246 K
 */
#define ROOM4_ROOM_STAT_MAKE 2294u
/* counts: 20.13 degC (controls[0].match, line 61): the sheet has make 19 degC and break 20 degC;
 * match cycle_rate: differential +0.265 K about the same middle, so that the rate is the old one;
 * 20.1326 degC is 2243.201 counts by thermistor (beta); rounded to the nearest edge of a count: at
 * most 2242, which changes at 20.1376 degC; one count is 0.0247 K; moved by -1 counts, so that the
 * differential is not below the one asked for: 2241, which changes at 20.1622 degC
 */
#define ROOM4_ROOM_STAT_BREAK 2241u
/* counts: below: wiper, track or wire broken (controls[0].dial, line 57): a track of 20 % too much,
 * and a third of the way to the rail
 */
#define ROOM4_ROOM_STAT_DIAL_LOWEST 115u
/* counts: above: wiper, track or wire broken (controls[0].dial, line 57): a track of 20 % too much,
 * and a third of the way to the rail
 */
#define ROOM4_ROOM_STAT_DIAL_HIGHEST 3980u
/* steps: no setting for 2 s (assumed: common practice): 2 s / 1 s a step, rounded up */
#define ROOM4_ROOM_STAT_DIAL_FAULT_AFTER 2u
/* : the warmth is kept so many times finer (controls[0].anticipator.lag, line 60): so that it comes
 * within 0.35 steps of its end
 */
#define ROOM4_ROOM_STAT_HEAT_SCALE 1024
/* 0.01 K / 1024: 1.2 K in the end (controls[0].anticipator.rise, line 60): rise in steps of the
 * reading × ROOM_STAT_HEAT_SCALE
 */
#define ROOM4_ROOM_STAT_HEAT INT32_C(122880)
/* steps: lag 6 min (controls[0].anticipator.lag, line 60): 1 / (1 − exp(−1 s / 6 min)), rounded */
#define ROOM4_ROOM_STAT_HEAT_LAG 361
/* 0.01 K: 20 degC (controls[0].set_point, line 53): in steps of the reading */
#define ROOM4_ROOM_STAT_SET_POINT 2000u
/* 0.01 K: 1.13 K below the set point (controls[0].set_point, line 53): differential as on the sheet
 */
#define ROOM4_ROOM_STAT_MAKE_BELOW_MARK 113
/* 0.01 K: 0.13 K above the set point (controls[0].set_point, line 53): differential as on the sheet
 */
#define ROOM4_ROOM_STAT_BREAK_ABOVE_MARK 13
/* steps: an effect is expected within 1 h 59 min (process.settles_on, line 19): 3 times the slowest
 * expected answer: 3 h × ln((2.87 K + 0.62 K)/2.87 K) = 35 min 19 s, and 4 min 30 s of dead time
 * and lag; 1 h 59 min / 1 s a step, rounded up
 */
#define ROOM4_BOILER_EFFECT_WITHIN 7167u
/* counts: 0.62 K towards the set point (process.settles_on, line 19): 0.5 of the differential */
#define ROOM4_BOILER_EFFECT 24

/* These do not compile where an assumption of this file does not hold. */
typedef char room4_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char room4_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char room4_room_room_probe_good_for[(ROOM4_ROOM_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char room4_room_room_probe_state_for[(ROOM4_ROOM_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char room4_room_3[(ROOM4_ROOM_STAT_DIAL_FAULT_AFTER <= 255u) ? 1 : -1];
typedef char room4_room_boiler_effect_for[(ROOM4_BOILER_EFFECT_WITHIN <= 65535u) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (ROOM4_FLASH) and how an entry is read
 * (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef ROOM4_FLASH
#define ROOM4_FLASH
#endif
#ifndef ROOM4_READ_U16
#define ROOM4_READ_U16(entry) (entry)
#endif

/* temperature of room_probe (0.01 K): thermistor (beta), counts 1848 to 2901: 3 pieces (proved to
 * be the fewest), 16 bytes, worst error 0.0249 K at count 2058 of 0.05 K allowed, in steps of 0.01
 * K; equal spacing needs 5 pieces, 12 bytes, worst 0.0407 K; straight between the points, the end
 * values beyond them
 */
static const uint16_t room4_room_probe_temperature_x[4] ROOM4_FLASH = {
    1848u, 2058u, 2689u, 2901u
};
static const uint16_t room4_room_probe_temperature_y[4] ROOM4_FLASH = {
    3013u, 2471u, 912u, 369u
};

static uint16_t room4_room_probe_temperature(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= ROOM4_READ_U16(room4_room_probe_temperature_x[0])) {
        return ROOM4_READ_U16(room4_room_probe_temperature_y[0]);
    }
    if (x >= ROOM4_READ_U16(room4_room_probe_temperature_x[3])) {
        return ROOM4_READ_U16(room4_room_probe_temperature_y[3]);
    }
    while (x > ROOM4_READ_U16(room4_room_probe_temperature_x[i])) {
        i++;
    }
    x0 = (int32_t)ROOM4_READ_U16(room4_room_probe_temperature_x[i - 1u]);
    y0 = (int32_t)ROOM4_READ_U16(room4_room_probe_temperature_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)ROOM4_READ_U16(room4_room_probe_temperature_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)ROOM4_READ_U16(room4_room_probe_temperature_x[i]) - x0)));
}

/* set point of dial of room control with a mercury bottle, in the hall (0.01 K): linear between the
 * stops [8 degC, 28 degC]; straight between the points, the end values beyond them
 */
static const uint16_t room4_room_stat_dial_marks_x[2] ROOM4_FLASH = {
    205u, 3890u
};
static const uint16_t room4_room_stat_dial_marks_y[2] ROOM4_FLASH = {
    800u, 2800u
};

static uint16_t room4_room_stat_dial_marks(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= ROOM4_READ_U16(room4_room_stat_dial_marks_x[0])) {
        return ROOM4_READ_U16(room4_room_stat_dial_marks_y[0]);
    }
    if (x >= ROOM4_READ_U16(room4_room_stat_dial_marks_x[1])) {
        return ROOM4_READ_U16(room4_room_stat_dial_marks_y[1]);
    }
    while (x > ROOM4_READ_U16(room4_room_stat_dial_marks_x[i])) {
        i++;
    }
    x0 = (int32_t)ROOM4_READ_U16(room4_room_stat_dial_marks_x[i - 1u]);
    y0 = (int32_t)ROOM4_READ_U16(room4_room_stat_dial_marks_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)ROOM4_READ_U16(room4_room_stat_dial_marks_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)ROOM4_READ_U16(room4_room_stat_dial_marks_x[i]) - x0)));
}

/* x, held between low and high */
static uint16_t room4_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* y, moved towards x by the n-th part of the way */
static int32_t room4_toward_i32(int32_t y, int32_t x, int32_t n)
{
    return y + ((x - y) / n);
}

/* at the height of the old control, in moving air, away from the board: is it believed? */
static void room4_room_probe_state(struct room4 *m, bool room_probe_bad)
{
    if (m->room_probe_state_for < ROOM4_ROOM_PROBE_PROVE_WITHIN) {
        m->room_probe_state_for++;
    }
    switch ((enum room4_room_probe_state)m->room_probe_state) {
    case ROOM4_ROOM_PROBE_STATE_PROVING:
        if (m->room_probe_good_for >= ROOM4_ROOM_PROBE_GOOD_RUN) {
            /* proved itself */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= ROOM4_ROOM_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case ROOM4_ROOM_PROBE_STATE_GOOD:
        if (room_probe_bad) {
            /* a bad sample */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_SUSPECT;
            m->room_probe_state_for = 0u;
        }
        break;
    case ROOM4_ROOM_PROBE_STATE_SUSPECT:
        if (m->room_probe_good_for >= ROOM4_ROOM_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= ROOM4_ROOM_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case ROOM4_ROOM_PROBE_STATE_FAULTY:
        if (m->room_probe_good_for >= ROOM4_ROOM_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_FAULTY;
        m->room_probe_state_for = 0u;
        break;
    }
}

/* room control with a mercury bottle, in the hall */
static void room4_room_stat(struct room4 *m,
                            bool room_stat_make_reached,
                            bool room_stat_break_reached)
{
    switch ((enum room4_room_stat)m->room_stat) {
    case ROOM4_ROOM_STAT_OPEN:
        if ((m->room_probe_state == ROOM4_ROOM_PROBE_STATE_GOOD) && room_stat_make_reached) {
            /* temperature has reached the make */
            m->room_stat = (uint8_t)ROOM4_ROOM_STAT_MADE;
        }
        break;
    case ROOM4_ROOM_STAT_MADE:
        if ((m->room_probe_state == ROOM4_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == ROOM4_ROOM_PROBE_STATE_FAULTY) ||
            room_stat_break_reached) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->room_stat = (uint8_t)ROOM4_ROOM_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_stat = (uint8_t)ROOM4_ROOM_STAT_OPEN;
        break;
    }
}

/* call for heat to the boiler's own burner control */
static void room4_boiler(struct room4 *m, bool boiler_wanted)
{
    switch ((enum room4_boiler)m->boiler) {
    case ROOM4_BOILER_OFF:
        if (boiler_wanted &&
            (m->room_probe_state == ROOM4_ROOM_PROBE_STATE_GOOD) &&
            !m->boiler_no_effect) {
            /* called for */
            m->boiler = (uint8_t)ROOM4_BOILER_ON;
        }
        break;
    case ROOM4_BOILER_ON:
        if ((m->room_probe_state == ROOM4_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == ROOM4_ROOM_PROBE_STATE_FAULTY) ||
            m->boiler_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->boiler = (uint8_t)ROOM4_BOILER_OFF;
        } else if (!boiler_wanted) {
            /* no longer called for */
            m->boiler = (uint8_t)ROOM4_BOILER_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->boiler = (uint8_t)ROOM4_BOILER_OFF;
        break;
    }
}

void room4_start(struct room4 *m, const struct room4_remembered *r)
{
    m->room_probe_good_for = 0u;
    m->room_probe_state = (uint8_t)ROOM4_ROOM_PROBE_STATE_PROVING;
    m->room_probe_state_for = 0u;
    m->room_probe_last = 0u;
    m->room_probe_before = 0u;
    m->room_stat = (uint8_t)ROOM4_ROOM_STAT_OPEN;
    m->room_stat_dial_lost_for = 2u;
    m->room_stat_set_point = 2000u;
    m->room_stat_warmth = 0u;
    m->boiler = (uint8_t)ROOM4_BOILER_OFF;
    m->boiler_effect_from = 0u;
    m->boiler_effect_for = 0u;
    m->boiler_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool room4_remember(const struct room4 *m, struct room4_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void room4_step(struct room4 *m, const struct room4_in *in, struct room4_out *out)
{
    /* at the height of the old control, in moving air, away from the board: this sample cannot be
     * believed
     */
    const bool room_probe_bad = (in->room_probe < ROOM4_ROOM_PROBE_LOWEST) ||
        (in->room_probe > ROOM4_ROOM_PROBE_HIGHEST);

    if (room_probe_bad) {
        /* a bad sample starts the count again */
        m->room_probe_good_for = 0u;
    } else if (m->room_probe_good_for < ROOM4_ROOM_PROBE_CLEAR_AFTER) {
        m->room_probe_good_for++;
    } else {
        /* stays */
    }

    room4_room_probe_state(m, room_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t room_probe_now = (uint16_t)(room_probe_bad
                                               ? m->room_probe_last : in->room_probe);
    /* the smaller of the two before */
    const uint16_t room_probe_less = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_last : m->room_probe_before);
    /* the larger of the two before */
    const uint16_t room_probe_more = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_before : m->room_probe_last);
    /* at the height of the old control, in moving air, away from the board: median of three
     * believable samples
     */
    const uint16_t room_probe_counts = room4_clamp_u16(room_probe_now,
                                                       room_probe_less,
                                                       room_probe_more);

    if (!room_probe_bad) {
        m->room_probe_before = m->room_probe_last;
    }

    m->room_probe_last = room_probe_now;

    /* temperature of room_probe in steps of 0.01 K */
    const uint16_t room_probe_reading = room4_room_probe_temperature(room_probe_counts);
    /* dial of room control with a mercury bottle, in the hall: this sample is no setting */
    const bool room_stat_dial_bad = (in->room_stat_dial < ROOM4_ROOM_STAT_DIAL_LOWEST) ||
        (in->room_stat_dial > ROOM4_ROOM_STAT_DIAL_HIGHEST);

    if (!room_stat_dial_bad) {
        /* a setting ends the doubt */
        m->room_stat_dial_lost_for = 0u;
    } else if (m->room_stat_dial_lost_for < ROOM4_ROOM_STAT_DIAL_FAULT_AFTER) {
        m->room_stat_dial_lost_for++;
    } else {
        /* stays */
    }

    /* dial of room control with a mercury bottle, in the hall: is believed */
    const bool room_stat_dial_believed = m->room_stat_dial_lost_for <
        ROOM4_ROOM_STAT_DIAL_FAULT_AFTER;

    if (!room_stat_dial_bad) {
        /* the stops hold beyond them */
        m->room_stat_set_point = room4_room_stat_dial_marks(in->room_stat_dial);
    }

    /* warms and cools as the heater in the old part did */
    m->room_stat_warmth = (uint32_t)room4_toward_i32(
            (int32_t)m->room_stat_warmth,
            (m->room_stat == ROOM4_ROOM_STAT_MADE) ? ROOM4_ROOM_STAT_HEAT : INT32_C(0),
            (int32_t)ROOM4_ROOM_STAT_HEAT_LAG);

    /* the reading with what the anticipator adds */
    const uint16_t room_stat_warm_reading = (uint16_t)(
            (int32_t)room_probe_reading +
            ((int32_t)m->room_stat_warmth / (int32_t)ROOM4_ROOM_STAT_HEAT_SCALE));
    /* set point by the dial or, without it, by the sheet */
    const uint16_t room_stat_wanted = (uint16_t)(room_stat_dial_believed
                                                 ? m->room_stat_set_point
                                                 : ROOM4_ROOM_STAT_SET_POINT);
    /* the temperature is at or beyond the make */
    const bool room_stat_make_reached = (int16_t)room_stat_warm_reading <=
        ((int16_t)room_stat_wanted - ROOM4_ROOM_STAT_MAKE_BELOW_MARK);
    /* the temperature is at or beyond the break */
    const bool room_stat_break_reached = (int16_t)room_stat_warm_reading >=
        ((int16_t)room_stat_wanted + ROOM4_ROOM_STAT_BREAK_ABOVE_MARK);

    room4_room_stat(m, room_stat_make_reached, room_stat_break_reached);

    /* room control with a mercury bottle, in the hall: its contact is made */
    const bool room_stat_contact = m->room_stat == ROOM4_ROOM_STAT_MADE;
    /* the old wiring calls for it */
    const bool boiler_wanted = room_stat_contact;
    /* the temperature has moved as it should */
    const bool boiler_effect_seen = ((int32_t)m->boiler_effect_from - (int32_t)room_probe_counts) >=
        (int32_t)ROOM4_BOILER_EFFECT;

    if ((m->boiler != ROOM4_BOILER_ON) || boiler_effect_seen) {
        m->boiler_effect_for = 0u;
    } else if (m->boiler_effect_for < ROOM4_BOILER_EFFECT_WITHIN) {
        m->boiler_effect_for++;
    } else {
        /* stays */
    }

    if ((m->boiler != ROOM4_BOILER_ON) ||
        boiler_effect_seen ||
        (room_probe_counts > m->boiler_effect_from)) {
        m->boiler_effect_from = room_probe_counts;
    }

    if (m->boiler_effect_for >= ROOM4_BOILER_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->boiler_no_effect = true;
    }

    room4_boiler(m, boiler_wanted);
    out->boiler = m->boiler == ROOM4_BOILER_ON;

    uint16_t fault = 0u;

    if (m->room_probe_state == ROOM4_ROOM_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | ROOM4_FAULT_ROOM_PROBE);
    }
    if (!room_stat_dial_believed) {
        fault = (uint16_t)(fault | ROOM4_FAULT_ROOM_STAT_DIAL);
    }
    if (m->boiler_no_effect) {
        fault = (uint16_t)(fault | ROOM4_FAULT_BOILER_NO_EFFECT);
    }
    out->fault = fault;
}
