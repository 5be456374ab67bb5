/* ext5.c: control program
 *
 * Equipment: Extract fan 5, press room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 54d9ac13d9eb912fbd316f24f482063aa393d6dff5a3975ab977bd52380134f8
 *
 * Replaces:
 * - room_stat: room stat by the presses
 *
 * Stays hard-wired, and must:
 * - protector: motor protector in the winding, resets by itself
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
 * Open findings: 1 restarts_by_itself (act, fan); 2 earth_fault_bypasses_limit (act, ext5); 3
 * moisture_direction (act, room_probe); 4 damp_dust_washdown (act, ext5); 5 approval_lapses (act,
 * ext5); 6 limit_threshold_unknown (act, protector). Not judged, for want of a figure: 2; risks.md
 * says which.
 */
#include "ext5.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -54.9 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define EXT5_ROOM_PROBE_HIGHEST 4036u
/* counts: lowest believable count, about 150.1 degC (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): thermistor (beta)
 */
#define EXT5_ROOM_PROBE_LOWEST 131u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 250 ms a step, rounded up
 */
#define EXT5_ROOM_PROBE_FAULT_AFTER 8u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of ROOM_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define EXT5_ROOM_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 250 ms a step, rounded up
 */
#define EXT5_ROOM_PROBE_CLEAR_AFTER 40u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): ROOM_PROBE_FAULT_AFTER + ROOM_PROBE_GOOD_RUN
 */
#define EXT5_ROOM_PROBE_PROVE_WITHIN 12u
/* counts: highest believable count, about 39.86 A (assumed for electronics.sensors[1].valid: the
 * range of its kind, short of both rails): current input
 */
#define EXT5_LINE_CURRENT_HIGHEST 4081u
/* steps: not good for 2 s (assumed for electronics.sensors[1].fault_after: common practice): 2 s /
 * 250 ms a step, rounded up
 */
#define EXT5_LINE_CURRENT_FAULT_AFTER 8u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[1].fault_after:
 * common practice): half of LINE_CURRENT_FAULT_AFTER, at least 4: bad samples oftener than one in
 * so many are found
 */
#define EXT5_LINE_CURRENT_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[1].clear_after: common practice): 10 s /
 * 250 ms a step, rounded up
 */
#define EXT5_LINE_CURRENT_CLEAR_AFTER 40u
/* steps: time to prove itself after a start (assumed for electronics.sensors[1].fault_after: common
 * practice): LINE_CURRENT_FAULT_AFTER + LINE_CURRENT_GOOD_RUN
 */
#define EXT5_LINE_CURRENT_PROVE_WITHIN 12u
/* counts: 26 degC (controls[0].makes_at, line 48): 26 degC is 2008.568 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at most 2008, which changes at 25.9890 degC; one count is
 * 0.0255 K; moved by -1 counts, so that the differential is not below the one asked for: 2007,
 * which changes at 26.0145 degC
 */
#define EXT5_ROOM_STAT_MAKE 2007u
/* counts: 24 degC (controls[0].breaks_at, line 49): 24 degC is 2087.697 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 2088, which changes at 23.9924 degC; one
 * count is 0.0251 K
 */
#define EXT5_ROOM_STAT_BREAK 2088u
/* counts: rated current 4 A (controls[1].rated_current, line 65): 4 degC is 409.600 counts by
 * current input; rounded to the nearest edge of a count: at least 410, which changes at 4.0039
 * degC; one count is 0.00977 K
 */
#define EXT5_PROTECTOR_RATED 410
/* : the heat is kept so many times finer (controls[1].trips_after, line 66): so that it stays
 * within 4.3 permille of its end
 */
#define EXT5_PROTECTOR_HEAT_SCALE 128
/* steps: time constant 2 min 19 s (controls[1].trips_after, line 66): 2 min 19 s, the shortest that
 * the trip times give
 */
#define EXT5_PROTECTOR_HEAT_LAG 557
/* permille, finer: 90 % of the heat that trips it (assumed: common practice): ×
 * PROTECTOR_HEAT_SCALE
 */
#define EXT5_PROTECTOR_WARNS_AT UINT32_C(115200)
/* steps: on for at least 2 min (controls[0].min_on, line 53): 2 min / 250 ms a step, rounded up */
#define EXT5_FAN_MIN_ON 480u
/* steps: off for at least 2 min (controls[0].min_off, line 54): 2 min / 250 ms a step, rounded up
 */
#define EXT5_FAN_MIN_OFF 480u
/* steps: a contact follows within 1 s (assumed: common practice: a contact settles well within
 * this): 1 s / 250 ms a step, rounded up
 */
#define EXT5_FAN_CONTACT_SETTLES 4u

/* These do not compile where an assumption of this file does not hold. */
typedef char ext5_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char ext5_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char ext5_room_room_probe_good_for[(EXT5_ROOM_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char ext5_room_room_probe_state_for[(EXT5_ROOM_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char ext5_room_line_current_good_for[(EXT5_LINE_CURRENT_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char ext5_room_line_current_state_for[(EXT5_LINE_CURRENT_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char ext5_room_fan_apart_for[(EXT5_FAN_CONTACT_SETTLES <= 255u) ? 1 : -1];
typedef char ext5_room_fan_for[(EXT5_FAN_MIN_ON <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t ext5_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int32_t ext5_clamp_i32(int32_t x, int32_t low, int32_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* y, moved towards x by the n-th part of the way */
static int32_t ext5_toward_i32(int32_t y, int32_t x, int32_t n)
{
    return y + ((x - y) / n);
}

/* on the wall by the old stat: is it believed? */
static void ext5_room_probe_state(struct ext5 *m, bool room_probe_bad)
{
    if (m->room_probe_state_for < EXT5_ROOM_PROBE_PROVE_WITHIN) {
        m->room_probe_state_for++;
    }
    switch ((enum ext5_room_probe_state)m->room_probe_state) {
    case EXT5_ROOM_PROBE_STATE_PROVING:
        if (m->room_probe_good_for >= EXT5_ROOM_PROBE_GOOD_RUN) {
            /* proved itself */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= EXT5_ROOM_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case EXT5_ROOM_PROBE_STATE_GOOD:
        if (room_probe_bad) {
            /* a bad sample */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_SUSPECT;
            m->room_probe_state_for = 0u;
        }
        break;
    case EXT5_ROOM_PROBE_STATE_SUSPECT:
        if (m->room_probe_good_for >= EXT5_ROOM_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= EXT5_ROOM_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case EXT5_ROOM_PROBE_STATE_FAULTY:
        if (m->room_probe_good_for >= EXT5_ROOM_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_FAULTY;
        m->room_probe_state_for = 0u;
        break;
    }
}

/* current transformer in one phase with a rectifier: is it believed? */
static void ext5_line_current_state(struct ext5 *m, bool line_current_bad)
{
    if (m->line_current_state_for < EXT5_LINE_CURRENT_PROVE_WITHIN) {
        m->line_current_state_for++;
    }
    switch ((enum ext5_line_current_state)m->line_current_state) {
    case EXT5_LINE_CURRENT_STATE_PROVING:
        if (m->line_current_good_for >= EXT5_LINE_CURRENT_GOOD_RUN) {
            /* proved itself */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_GOOD;
            m->line_current_state_for = 0u;
        } else if (m->line_current_state_for >= EXT5_LINE_CURRENT_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_FAULTY;
            m->line_current_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case EXT5_LINE_CURRENT_STATE_GOOD:
        if (line_current_bad) {
            /* a bad sample */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_SUSPECT;
            m->line_current_state_for = 0u;
        }
        break;
    case EXT5_LINE_CURRENT_STATE_SUSPECT:
        if (m->line_current_good_for >= EXT5_LINE_CURRENT_GOOD_RUN) {
            /* a run of good samples */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_GOOD;
            m->line_current_state_for = 0u;
        } else if (m->line_current_state_for >= EXT5_LINE_CURRENT_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_FAULTY;
            m->line_current_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case EXT5_LINE_CURRENT_STATE_FAULTY:
        if (m->line_current_good_for >= EXT5_LINE_CURRENT_CLEAR_AFTER) {
            /* good for long enough */
            m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_GOOD;
            m->line_current_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_FAULTY;
        m->line_current_state_for = 0u;
        break;
    }
}

/* room stat by the presses */
static void ext5_room_stat(struct ext5 *m, uint16_t room_probe_counts)
{
    switch ((enum ext5_room_stat)m->room_stat) {
    case EXT5_ROOM_STAT_OPEN:
        if ((m->room_probe_state == EXT5_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts <= EXT5_ROOM_STAT_MAKE)) {
            /* temperature has reached the make */
            m->room_stat = (uint8_t)EXT5_ROOM_STAT_MADE;
        }
        break;
    case EXT5_ROOM_STAT_MADE:
        if ((m->room_probe_state == EXT5_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == EXT5_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts >= EXT5_ROOM_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->room_stat = (uint8_t)EXT5_ROOM_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_stat = (uint8_t)EXT5_ROOM_STAT_OPEN;
        break;
    }
}

/* 0.55 kW extract fan, switched by the board */
static void ext5_fan(struct ext5 *m, const struct ext5_in *in, bool fan_wanted)
{
    if (m->fan_for < EXT5_FAN_MIN_ON) {
        m->fan_for++;
    }
    switch ((enum ext5_fan)m->fan) {
    case EXT5_FAN_OFF:
        if (fan_wanted &&
            (m->room_probe_state == EXT5_ROOM_PROBE_STATE_GOOD) &&
            !m->fan_welded &&
            (m->fan_for >= EXT5_FAN_MIN_OFF)) {
            /* called for */
            m->fan = (uint8_t)EXT5_FAN_ON;
            m->fan_for = 0u;
        }
        break;
    case EXT5_FAN_ON:
        if ((m->room_probe_state == EXT5_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == EXT5_ROOM_PROBE_STATE_FAULTY) ||
            m->fan_welded) {
            /* its safe state is off, before any minimum on time */
            m->fan = (uint8_t)EXT5_FAN_OFF;
            m->fan_for = 0u;
        } else if (in->guard_open) {
            /* something other than its operating contact has opened the circuit */
            m->fan = (uint8_t)EXT5_FAN_OFF;
            m->fan_for = 0u;
        } else if (!fan_wanted && (m->fan_for >= EXT5_FAN_MIN_ON)) {
            /* no longer called for */
            m->fan = (uint8_t)EXT5_FAN_OFF;
            m->fan_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->fan = (uint8_t)EXT5_FAN_OFF;
        m->fan_for = 0u;
        break;
    }
}

void ext5_start(struct ext5 *m, const struct ext5_remembered *r)
{
    m->room_probe_good_for = 0u;
    m->room_probe_state = (uint8_t)EXT5_ROOM_PROBE_STATE_PROVING;
    m->room_probe_state_for = 0u;
    m->room_probe_last = 0u;
    m->room_probe_before = 0u;
    m->line_current_good_for = 0u;
    m->line_current_state = (uint8_t)EXT5_LINE_CURRENT_STATE_PROVING;
    m->line_current_state_for = 0u;
    m->line_current_last = 0u;
    m->line_current_before = 0u;
    m->room_stat = (uint8_t)EXT5_ROOM_STAT_OPEN;
    m->protector_heat = 0u;
    m->fan = (uint8_t)EXT5_FAN_OFF;
    m->fan_for = 0u;
    m->fan_apart_for = 0u;
    m->fan_welded = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool ext5_remember(const struct ext5 *m, struct ext5_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void ext5_step(struct ext5 *m, const struct ext5_in *in, struct ext5_out *out)
{
    /* on the wall by the old stat: this sample cannot be believed */
    const bool room_probe_bad = (in->room_probe < EXT5_ROOM_PROBE_LOWEST) ||
        (in->room_probe > EXT5_ROOM_PROBE_HIGHEST);

    if (room_probe_bad) {
        /* a bad sample starts the count again */
        m->room_probe_good_for = 0u;
    } else if (m->room_probe_good_for < EXT5_ROOM_PROBE_CLEAR_AFTER) {
        m->room_probe_good_for++;
    } else {
        /* stays */
    }

    ext5_room_probe_state(m, room_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t room_probe_now = (uint16_t)(room_probe_bad
                                               ? m->room_probe_last : in->room_probe);
    /* the smaller of the two before */
    const uint16_t room_probe_less = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_last : m->room_probe_before);
    /* the larger of the two before */
    const uint16_t room_probe_more = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_before : m->room_probe_last);
    /* on the wall by the old stat: median of three believable samples */
    const uint16_t room_probe_counts = ext5_clamp_u16(room_probe_now,
                                                      room_probe_less,
                                                      room_probe_more);

    if (!room_probe_bad) {
        m->room_probe_before = m->room_probe_last;
    }

    m->room_probe_last = room_probe_now;

    /* current transformer in one phase with a rectifier: this sample cannot be believed */
    const bool line_current_bad = in->line_current > EXT5_LINE_CURRENT_HIGHEST;

    if (line_current_bad) {
        /* a bad sample starts the count again */
        m->line_current_good_for = 0u;
    } else if (m->line_current_good_for < EXT5_LINE_CURRENT_CLEAR_AFTER) {
        m->line_current_good_for++;
    } else {
        /* stays */
    }

    ext5_line_current_state(m, line_current_bad);

    /* this sample, or the last believable one */
    const uint16_t line_current_now = (uint16_t)(line_current_bad
                                                 ? m->line_current_last : in->line_current);
    /* the smaller of the two before */
    const uint16_t line_current_less = (uint16_t)(
            (m->line_current_last < m->line_current_before)
            ? m->line_current_last : m->line_current_before);
    /* the larger of the two before */
    const uint16_t line_current_more = (uint16_t)(
            (m->line_current_last < m->line_current_before)
            ? m->line_current_before : m->line_current_last);
    /* current transformer in one phase with a rectifier: median of three believable samples */
    const uint16_t line_current_counts = ext5_clamp_u16(line_current_now,
                                                        line_current_less,
                                                        line_current_more);

    if (!line_current_bad) {
        m->line_current_before = m->line_current_last;
    }

    m->line_current_last = line_current_now;
    ext5_room_stat(m, room_probe_counts);

    /* room stat by the presses: its contact is made */
    const bool room_stat_contact = m->room_stat == EXT5_ROOM_STAT_MADE;
    /* current in permille of the rated one */
    const uint16_t protector_load = (uint16_t)ext5_clamp_i32(
            ((int32_t)ext5_clamp_u16(line_current_counts, 0u, 3280u) * INT32_C(1000)) /
            (int32_t)EXT5_PROTECTOR_RATED,
            INT32_C(0),
            INT32_C(8000));
    /* square of that, in permille */
    const uint16_t protector_heating = (uint16_t)(
            ((int32_t)protector_load * (int32_t)protector_load) / INT32_C(1000));

    if (m->line_current_state == EXT5_LINE_CURRENT_STATE_GOOD) {
        /* heats with the square of the current and cools as the protector does; stands while the
         * current is not believed
         */
        m->protector_heat = (uint32_t)ext5_toward_i32(
                (int32_t)m->protector_heat,
                (int32_t)protector_heating * (int32_t)EXT5_PROTECTOR_HEAT_SCALE,
                (int32_t)EXT5_PROTECTOR_HEAT_LAG);
    }

    /* motor protector in the winding, resets by itself: is about to act */
    const bool protector_hot = m->protector_heat >= EXT5_PROTECTOR_WARNS_AT;
    /* the old wiring calls for it */
    const bool fan_wanted = room_stat_contact && !in->guard_open;

    if ((in->fan_seen && (m->fan == EXT5_FAN_ON)) || (!in->fan_seen && (m->fan != EXT5_FAN_ON))) {
        m->fan_apart_for = 0u;
    } else if (m->fan_apart_for < EXT5_FAN_CONTACT_SETTLES) {
        m->fan_apart_for++;
    } else {
        /* stays */
    }

    if ((m->fan_apart_for >= EXT5_FAN_CONTACT_SETTLES) && in->fan_seen) {
        /* seen made although told to open; stays until the next start, for it must be looked at */
        m->fan_welded = true;
    }

    ext5_fan(m, in, fan_wanted);
    out->fan = m->fan == EXT5_FAN_ON;

    uint16_t fault = 0u;

    if (m->room_probe_state == EXT5_ROOM_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | EXT5_FAULT_ROOM_PROBE);
    }
    if (m->line_current_state == EXT5_LINE_CURRENT_STATE_FAULTY) {
        fault = (uint16_t)(fault | EXT5_FAULT_LINE_CURRENT);
    }
    if (protector_hot) {
        fault = (uint16_t)(fault | EXT5_FAULT_PROTECTOR_HOT);
    }
    if (m->fan_welded) {
        fault = (uint16_t)(fault | EXT5_FAULT_FAN_WELDED);
    }
    if ((m->fan_apart_for >= EXT5_FAN_CONTACT_SETTLES) && !in->fan_seen) {
        fault = (uint16_t)(fault | EXT5_FAULT_FAN_NOT_MADE);
    }
    out->fault = fault;
}
