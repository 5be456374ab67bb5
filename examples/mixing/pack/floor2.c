/* floor2.c: control program
 *
 * Equipment: Floor heating, hall 2, mixing valve
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 89a969e7b30031b226d184e39ac05c100976b9f76056120571832deaef0e8bfd
 *
 * Replaces:
 * - self_acting: self-acting mixing valve, bulb in the flow
 *
 * Stays hard-wired, and must:
 * - floor_limit: contact stat strapped to the flow, shuts a valve of its own
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
 * Open findings: 1 danger_without_barrier (act, screed/mixer); 2 trips_dead_no_more (act,
 * self_acting); 3 proving_switch_not_checked_open (act, pump_runs); 4 ssr_shorts_on (act, mixer); 5
 * earth_fault_bypasses_limit (act, floor2); 6 moisture_direction (act, flow_probe); 7
 * self_powered_lost (act, self_acting); 8 mercury_asbestos_refrigerant (act, self_acting); 9
 * approval_lapses (act, floor2); 10 limit_trips_late (act, floor_limit/screed). Not judged, for
 * want of a figure: 4; risks.md says which.
 */
#include "floor2.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 109.9 degC (electronics.sensors[0].valid, line 101):
 * platinum (IEC 60751)
 */
#define FLOOR2_FLOW_PROBE_HIGHEST 1608u
/* counts: lowest believable count, about -30 degC (electronics.sensors[0].valid, line 101):
 * platinum (IEC 60751)
 */
#define FLOOR2_FLOW_PROBE_LOWEST 1172u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 200 ms a step, rounded up
 */
#define FLOOR2_FLOW_PROBE_FAULT_AFTER 10u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of FLOW_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define FLOOR2_FLOW_PROBE_GOOD_RUN 5u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 200 ms a step, rounded up
 */
#define FLOOR2_FLOW_PROBE_CLEAR_AFTER 50u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): FLOW_PROBE_FAULT_AFTER + FLOW_PROBE_GOOD_RUN
 */
#define FLOOR2_FLOW_PROBE_PROVE_WITHIN 15u
/* steps: a new output every 2.4 s (controls[0].want, line 67): 2.4 s / 200 ms a step */
#define FLOOR2_SELF_ACTING_SAMPLE 12u
/* steps: last step of a sample (controls[0].want, line 67): SELF_ACTING_SAMPLE - 1 */
#define FLOOR2_SELF_ACTING_LAST_STEP 11u
/* 0.01 K: 42 degC (controls[0].set_point, line 59): in steps of the reading */
#define FLOOR2_SELF_ACTING_SET_POINT 4200
/* 0.01 K: deviation beyond which the output is all or none (controls[0].want, line 67): four times
 * the band, 1 / 0.09018 /K, or the whole range
 */
#define FLOOR2_SELF_ACTING_CLIP 2763
/* : proportional: 0.9018 permille for 0.01 K (controls[0].want, line 67): SIMC PI: gain 0.09018 /K;
 * +0.06 % off as a fraction
 */
#define FLOOR2_SELF_ACTING_P_MUL 231
/* : proportional: 0.9018 permille for 0.01 K (controls[0].want, line 67): SIMC PI: gain 0.09018 /K;
 * +0.06 % off as a fraction
 */
#define FLOOR2_SELF_ACTING_P_DIV 256
/* : integral: divisor (controls[0].want, line 67): SIMC PI: integral time 4 min 6 s; -0.10 % off as
 * a fraction
 */
#define FLOOR2_SELF_ACTING_I_DIV 1024
/* permille: all (controls[0].want, line 67): the whole output */
#define FLOOR2_SELF_ACTING_MOST 1000
/* : integral: factor of the deviation in each sample (controls[0].want, line 67): SIMC PI: integral
 * time 4 min 6 s
 */
#define FLOOR2_SELF_ACTING_I_MUL 9
#define FLOOR2_MIXER_SAFE 0 /* permille: closed (loads[0].safe_state, line 46): its safe state */
/* permille: most in one step (loads[0].actuator.travel, line 50): 1000 × 200 ms / 2 min of travel,
 * rounded up
 */
#define FLOOR2_MIXER_SLEW 2
/* steps: from shut to full open in 2 min (loads[0].actuator.travel, line 50): 2 min / 200 ms a
 * step, rounded up
 */
#define FLOOR2_MIXER_TRAVEL 600u
/* steps: driven beyond an end for 24 s (loads[0].actuator.travel, line 50): 24 s / 200 ms a step,
 * rounded up
 */
#define FLOOR2_MIXER_BEYOND 120u
/* steps: after a start it runs to its safe end for this long (loads[0].actuator.travel, line 50):
 * MIXER_TRAVEL + MIXER_BEYOND
 */
#define FLOOR2_MIXER_LEARN 720u
/* steps: a shorter move is not begun (loads[0].actuator.travel, line 50): MIXER_TRAVEL / 50 */
#define FLOOR2_MIXER_DEAD 12

/* These do not compile where an assumption of this file does not hold. */
typedef char floor2_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char floor2_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char floor2_room_flow_probe_good_for[(FLOOR2_FLOW_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char floor2_room_flow_probe_state_for[(FLOOR2_FLOW_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char floor2_room_mixer_awake_for[(FLOOR2_MIXER_LEARN <= 65535u) ? 1 : -1];
typedef char floor2_room_mixer_end_for[(FLOOR2_MIXER_BEYOND <= 255u) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (FLOOR2_FLASH) and how an entry is read
 * (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef FLOOR2_FLASH
#define FLOOR2_FLASH
#endif
#ifndef FLOOR2_READ_U16
#define FLOOR2_READ_U16(entry) (entry)
#endif

/* temperature of flow_probe (0.01 K): platinum (IEC 60751), counts 1373 to 1458: 1 piece (proved to
 * be the fewest), 8 bytes, worst error 0.125 K at count 1415 of 0.163 K allowed, in steps of 0.01
 * K; equal spacing needs 2 pieces, 6 bytes, worst 0.0619 K; straight between the points, the end
 * values beyond them
 */
static const uint16_t floor2_flow_probe_temperature_x[2] FLOOR2_FLASH = {
    1373u, 1458u
};
static const uint16_t floor2_flow_probe_temperature_y[2] FLOOR2_FLASH = {
    2812u, 5575u
};

static uint16_t floor2_flow_probe_temperature(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= FLOOR2_READ_U16(floor2_flow_probe_temperature_x[0])) {
        return FLOOR2_READ_U16(floor2_flow_probe_temperature_y[0]);
    }
    if (x >= FLOOR2_READ_U16(floor2_flow_probe_temperature_x[1])) {
        return FLOOR2_READ_U16(floor2_flow_probe_temperature_y[1]);
    }
    while (x > FLOOR2_READ_U16(floor2_flow_probe_temperature_x[i])) {
        i++;
    }
    x0 = (int32_t)FLOOR2_READ_U16(floor2_flow_probe_temperature_x[i - 1u]);
    y0 = (int32_t)FLOOR2_READ_U16(floor2_flow_probe_temperature_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)FLOOR2_READ_U16(floor2_flow_probe_temperature_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)FLOOR2_READ_U16(floor2_flow_probe_temperature_x[i]) - x0)));
}

/* x, held between low and high */
static uint16_t floor2_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t floor2_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int32_t floor2_clamp_i32(int32_t x, int32_t low, int32_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* immersion probe in the pocket of the old bulb: is it believed? */
static void floor2_flow_probe_state(struct floor2 *m, bool flow_probe_bad)
{
    if (m->flow_probe_state_for < FLOOR2_FLOW_PROBE_PROVE_WITHIN) {
        m->flow_probe_state_for++;
    }
    switch ((enum floor2_flow_probe_state)m->flow_probe_state) {
    case FLOOR2_FLOW_PROBE_STATE_PROVING:
        if (m->flow_probe_good_for >= FLOOR2_FLOW_PROBE_GOOD_RUN) {
            /* proved itself */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_GOOD;
            m->flow_probe_state_for = 0u;
        } else if (m->flow_probe_state_for >= FLOOR2_FLOW_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_FAULTY;
            m->flow_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FLOOR2_FLOW_PROBE_STATE_GOOD:
        if (flow_probe_bad) {
            /* a bad sample */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_SUSPECT;
            m->flow_probe_state_for = 0u;
        }
        break;
    case FLOOR2_FLOW_PROBE_STATE_SUSPECT:
        if (m->flow_probe_good_for >= FLOOR2_FLOW_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_GOOD;
            m->flow_probe_state_for = 0u;
        } else if (m->flow_probe_state_for >= FLOOR2_FLOW_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_FAULTY;
            m->flow_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FLOOR2_FLOW_PROBE_STATE_FAULTY:
        if (m->flow_probe_good_for >= FLOOR2_FLOW_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_GOOD;
            m->flow_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_FAULTY;
        m->flow_probe_state_for = 0u;
        break;
    }
}

/* three-way mixing valve with its three-point actuator: which way it runs */
static void floor2_mixer_move(struct floor2 *m, int16_t mixer_way, uint16_t mixer_stem_wanted)
{
    switch ((enum floor2_mixer_move)m->mixer_move) {
    case FLOOR2_MIXER_MOVE_RESTS:
        if ((mixer_way >= FLOOR2_MIXER_DEAD) ||
            ((mixer_stem_wanted >= FLOOR2_MIXER_TRAVEL) && (mixer_way > 0))) {
            /* it has to open */
            m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_OPENS;
        } else if ((mixer_way <= (-12)) || ((mixer_stem_wanted == 0u) && (mixer_way < 0))) {
            /* it has to close */
            m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_CLOSES;
        } else {
            /* stays */
        }
        break;
    case FLOOR2_MIXER_MOVE_OPENS:
        if (mixer_way <= 0) {
            /* there, or beyond */
            m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_RESTS;
        }
        break;
    case FLOOR2_MIXER_MOVE_CLOSES:
        if (mixer_way >= 0) {
            /* there, or beyond */
            m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_RESTS;
        }
        break;
    default: /* not a state: memory was upset */
        m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_RESTS;
        break;
    }
}

void floor2_start(struct floor2 *m, const struct floor2_remembered *r)
{
    m->flow_probe_good_for = 0u;
    m->flow_probe_state = (uint8_t)FLOOR2_FLOW_PROBE_STATE_PROVING;
    m->flow_probe_state_for = 0u;
    m->flow_probe_last = 0u;
    m->flow_probe_before = 0u;
    m->self_acting_at = 11u;
    m->self_acting_sum = 0u;
    m->self_acting_permille = 0u;
    m->mixer_position = 0u;
    m->mixer_awake_for = 0u;
    m->mixer_stem = 0u;
    m->mixer_move = (uint8_t)FLOOR2_MIXER_MOVE_RESTS;
    m->mixer_end_for = 0u;
    (void)r; /* nothing of this program survives a power cut */
}

bool floor2_remember(const struct floor2 *m, struct floor2_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void floor2_step(struct floor2 *m, const struct floor2_in *in, struct floor2_out *out)
{
    /* immersion probe in the pocket of the old bulb: this sample cannot be believed */
    const bool flow_probe_bad = (in->flow_probe < FLOOR2_FLOW_PROBE_LOWEST) ||
        (in->flow_probe > FLOOR2_FLOW_PROBE_HIGHEST);

    if (flow_probe_bad) {
        /* a bad sample starts the count again */
        m->flow_probe_good_for = 0u;
    } else if (m->flow_probe_good_for < FLOOR2_FLOW_PROBE_CLEAR_AFTER) {
        m->flow_probe_good_for++;
    } else {
        /* stays */
    }

    floor2_flow_probe_state(m, flow_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t flow_probe_now = (uint16_t)(flow_probe_bad
                                               ? m->flow_probe_last : in->flow_probe);
    /* the smaller of the two before */
    const uint16_t flow_probe_less = (uint16_t)((m->flow_probe_last < m->flow_probe_before)
                                                ? m->flow_probe_last : m->flow_probe_before);
    /* the larger of the two before */
    const uint16_t flow_probe_more = (uint16_t)((m->flow_probe_last < m->flow_probe_before)
                                                ? m->flow_probe_before : m->flow_probe_last);
    /* immersion probe in the pocket of the old bulb: median of three believable samples */
    const uint16_t flow_probe_counts = floor2_clamp_u16(flow_probe_now,
                                                        flow_probe_less,
                                                        flow_probe_more);

    if (!flow_probe_bad) {
        m->flow_probe_before = m->flow_probe_last;
    }

    m->flow_probe_last = flow_probe_now;

    /* temperature of flow_probe in steps of 0.01 K */
    const uint16_t flow_probe_reading = floor2_flow_probe_temperature(flow_probe_counts);

    m->self_acting_at = (uint8_t)(
            ((m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_PROVING) ||
             (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_FAULTY))
            ? (int16_t)FLOOR2_SELF_ACTING_LAST_STEP
            : ((m->self_acting_at >= FLOOR2_SELF_ACTING_LAST_STEP) ? 0 : (m->self_acting_at + 1)));

    /* self-acting mixing valve, bulb in the flow: its probe is believed */
    const bool self_acting_running = !(
            (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_PROVING) ||
            (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_FAULTY));
    /* self-acting mixing valve, bulb in the flow: a new output is due */
    const bool self_acting_due = self_acting_running && (m->self_acting_at == 0u);
    /* deviation, positive where more output is wanted */
    const int16_t self_acting_deviation = floor2_clamp_i16(
            (int16_t)(FLOOR2_SELF_ACTING_SET_POINT - (int16_t)flow_probe_reading),
            -2763,
            FLOOR2_SELF_ACTING_CLIP);
    /* output, where one is due, before it is held between none and all */
    const int16_t self_acting_unheld = (int16_t)(
            self_acting_due
            ? (
                    (((int32_t)self_acting_deviation * (int32_t)FLOOR2_SELF_ACTING_P_MUL) /
                     (int32_t)FLOOR2_SELF_ACTING_P_DIV) +
                    ((int32_t)m->self_acting_sum / (int32_t)FLOOR2_SELF_ACTING_I_DIV))
            : INT32_C(0));
    /* the output is held, and the deviation pushes it on */
    const bool self_acting_pushes_on = ((self_acting_unheld > FLOOR2_SELF_ACTING_MOST) &&
                                        (self_acting_deviation > 0)) ||
        ((self_acting_unheld < 0) && (self_acting_deviation < 0));

    if (!self_acting_running || (self_acting_due && !self_acting_pushes_on)) {
        /* not while the output is held and the deviation pushes it on; emptied while the probe is
         * not believed
         */
        m->self_acting_sum = (uint32_t)(
                self_acting_running
                ? floor2_clamp_i32(
                        (int32_t)m->self_acting_sum +
                        ((int32_t)self_acting_deviation * (int32_t)FLOOR2_SELF_ACTING_I_MUL),
                        INT32_C(0),
                        INT32_C(1024000))
                : INT32_C(0));
    }

    if (!self_acting_running || self_acting_due) {
        /* none while the probe is not believed */
        m->self_acting_permille = (uint16_t)(
                self_acting_running
                ? floor2_clamp_i16(self_acting_unheld, 0, FLOOR2_SELF_ACTING_MOST) : 0);
    }

    /* it has to be in its safe position */
    const bool mixer_stopped = (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_PROVING) ||
        (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_FAULTY) ||
        !in->pump_runs;

    /* its safe position, or after its control no faster than the actuator follows */
    m->mixer_position = (uint16_t)(
            mixer_stopped
            ? FLOOR2_MIXER_SAFE
            : floor2_clamp_i16(
                    floor2_clamp_i16((int16_t)m->self_acting_permille,
                                     (int16_t)((int16_t)m->mixer_position - FLOOR2_MIXER_SLEW),
                                     (int16_t)((int16_t)m->mixer_position + FLOOR2_MIXER_SLEW)),
                    0,
                    1000));

    out->mixer = m->mixer_position;

    if (m->mixer_awake_for < FLOOR2_MIXER_LEARN) {
        m->mixer_awake_for++;
    }

    /* its safe end has been found */
    const bool mixer_learned = m->mixer_awake_for >= FLOOR2_MIXER_LEARN;

    /* counted from the running time */
    m->mixer_stem = (uint16_t)(
            mixer_learned
            ? floor2_clamp_i16(
                    (int16_t)(
                            (int16_t)m->mixer_stem +
                            ((m->mixer_move == FLOOR2_MIXER_MOVE_OPENS)
                             ? 1 : ((m->mixer_move == FLOOR2_MIXER_MOVE_CLOSES) ? (-1) : 0))),
                    0,
                    (int16_t)FLOOR2_MIXER_TRAVEL)
            : 0);

    /* steps that the stem should stand open */
    const uint16_t mixer_stem_wanted = (uint16_t)(
            ((int32_t)m->mixer_position * (int32_t)FLOOR2_MIXER_TRAVEL) / INT32_C(1000));
    /* steps still to go, open positive */
    const int16_t mixer_way = (int16_t)((int16_t)mixer_stem_wanted - (int16_t)m->mixer_stem);

    if (!(
            ((mixer_stem_wanted == 0u) && (m->mixer_stem == 0u)) ||
            ((mixer_stem_wanted >= FLOOR2_MIXER_TRAVEL) &&
             (m->mixer_stem >= FLOOR2_MIXER_TRAVEL)))) {
        /* at neither end */
        m->mixer_end_for = 0u;
    } else if (m->mixer_end_for < FLOOR2_MIXER_BEYOND) {
        m->mixer_end_for++;
    } else {
        /* stays */
    }

    floor2_mixer_move(m, mixer_way, mixer_stem_wanted);
    out->mixer_opens = mixer_learned &&
        (
            (m->mixer_move == FLOOR2_MIXER_MOVE_OPENS) ||
            ((mixer_stem_wanted >= FLOOR2_MIXER_TRAVEL) &&
             (m->mixer_stem >= FLOOR2_MIXER_TRAVEL) &&
             (m->mixer_end_for < FLOOR2_MIXER_BEYOND)));
    out->mixer_closes = !mixer_learned ||
        (
            mixer_learned &&
            (
                    (m->mixer_move == FLOOR2_MIXER_MOVE_CLOSES) ||
                    ((mixer_stem_wanted == 0u) &&
                     (m->mixer_stem == 0u) &&
                     (m->mixer_end_for < FLOOR2_MIXER_BEYOND))));

    uint16_t fault = 0u;

    if (m->flow_probe_state == FLOOR2_FLOW_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | FLOOR2_FAULT_FLOW_PROBE);
    }
    out->fault = fault;
}
