/* genset1.c: control program
 *
 * Equipment: Standby engine 1, coolant circuit
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: bcf8b9ec5ac6bc7c71efdeb2099586f05b6a7d4fa187b281a257f1b0da95d2f1
 *
 * Replaces:
 * - wax_valve: wax element in the coolant outlet
 *
 * Stays hard-wired, and must:
 * - overheat_switch: snap disc in the cylinder head, stops the engine
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
 * Open findings: 1 danger_without_barrier (act, overheat/radiator_valve); 2 trips_dead_no_more
 * (act, wax_valve); 3 earth_fault_bypasses_limit (act, genset1); 4 moisture_direction (act,
 * outlet_probe); 5 damp_dust_washdown (act, genset1); 6 self_powered_lost (act, wax_valve); 7
 * mercury_asbestos_refrigerant (act, wax_valve); 8 approval_lapses (act, genset1). Not judged, for
 * want of a figure: 3; risks.md says which.
 */
#include "genset1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -34.7 degC (electronics.sensors[0].valid, line 110):
 * thermistor (beta)
 */
#define GENSET1_OUTLET_PROBE_HIGHEST 4081u
/* counts: lowest believable count, about 140 degC (electronics.sensors[0].valid, line 110):
 * thermistor (beta)
 */
#define GENSET1_OUTLET_PROBE_LOWEST 803u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 100 ms a step, rounded up
 */
#define GENSET1_OUTLET_PROBE_FAULT_AFTER 20u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of OUTLET_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in
 * so many are found
 */
#define GENSET1_OUTLET_PROBE_GOOD_RUN 10u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 100 ms a step, rounded up
 */
#define GENSET1_OUTLET_PROBE_CLEAR_AFTER 100u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): OUTLET_PROBE_FAULT_AFTER + OUTLET_PROBE_GOOD_RUN
 */
#define GENSET1_OUTLET_PROBE_PROVE_WITHIN 30u
/* 0.01 K: 83 degC: below, it is shut (controls[0].starts_at, line 67): in steps of the reading */
#define GENSET1_WAX_VALVE_BAND_FROM 8300
/* 0.01 K: 95 degC: above, it is fully open (controls[0].full_at, line 68): in steps of the reading
 */
#define GENSET1_WAX_VALVE_BAND_TO 9500u
/* 0.01 K: 12 K (controls[0].full_at, line 68): WAX_VALVE_BAND_TO - WAX_VALVE_BAND_FROM */
#define GENSET1_WAX_VALVE_BAND 1200
/* permille: half of the hysteresis of 2 K (controls[0].hysteresis, line 69): 1000 × hysteresis / 2
 * / band
 */
#define GENSET1_WAX_VALVE_PLAY 83
/* permille: open (loads[0].safe_state, line 45): its safe state */
#define GENSET1_RADIATOR_VALVE_SAFE 1000
/* permille: most in one step (loads[0].actuator.travel, line 48): 1000 × 100 ms / 60 s of travel,
 * rounded up
 */
#define GENSET1_RADIATOR_VALVE_SLEW 2

/* These do not compile where an assumption of this file does not hold. */
typedef char genset1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char genset1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char genset1_room_1[(GENSET1_OUTLET_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char genset1_room_2[(GENSET1_OUTLET_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (GENSET1_FLASH) and how an entry is
 * read (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef GENSET1_FLASH
#define GENSET1_FLASH
#endif
#ifndef GENSET1_READ_U16
#define GENSET1_READ_U16(entry) (entry)
#endif

/* temperature of outlet_probe (0.01 K): thermistor (beta), counts 1751 to 2245: 2 pieces (proved to
 * be the fewest), 12 bytes, worst error 0.0312 K at count 2106 of 0.05 K allowed, in steps of 0.01
 * K; equal spacing needs 3 pieces, 8 bytes, worst 0.0414 K; straight between the points, the end
 * values beyond them
 */
static const uint16_t genset1_outlet_probe_temperature_x[3] GENSET1_FLASH = {
    1751u, 1955u, 2245u
};
static const uint16_t genset1_outlet_probe_temperature_y[3] GENSET1_FLASH = {
    9696u, 9015u, 8097u
};

static uint16_t genset1_outlet_probe_temperature(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= GENSET1_READ_U16(genset1_outlet_probe_temperature_x[0])) {
        return GENSET1_READ_U16(genset1_outlet_probe_temperature_y[0]);
    }
    if (x >= GENSET1_READ_U16(genset1_outlet_probe_temperature_x[2])) {
        return GENSET1_READ_U16(genset1_outlet_probe_temperature_y[2]);
    }
    while (x > GENSET1_READ_U16(genset1_outlet_probe_temperature_x[i])) {
        i++;
    }
    x0 = (int32_t)GENSET1_READ_U16(genset1_outlet_probe_temperature_x[i - 1u]);
    y0 = (int32_t)GENSET1_READ_U16(genset1_outlet_probe_temperature_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)GENSET1_READ_U16(genset1_outlet_probe_temperature_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)GENSET1_READ_U16(genset1_outlet_probe_temperature_x[i]) - x0)));
}

/* x, held between low and high */
static uint16_t genset1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t genset1_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* screwed into the old housing, in the coolant outlet: is it believed? */
static void genset1_outlet_probe_state(struct genset1 *m, bool outlet_probe_bad)
{
    if (m->outlet_probe_state_for < GENSET1_OUTLET_PROBE_PROVE_WITHIN) {
        m->outlet_probe_state_for++;
    }
    switch ((enum genset1_outlet_probe_state)m->outlet_probe_state) {
    case GENSET1_OUTLET_PROBE_STATE_PROVING:
        if (m->outlet_probe_good_for >= GENSET1_OUTLET_PROBE_GOOD_RUN) {
            /* proved itself */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_GOOD;
            m->outlet_probe_state_for = 0u;
        } else if (m->outlet_probe_state_for >= GENSET1_OUTLET_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_FAULTY;
            m->outlet_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case GENSET1_OUTLET_PROBE_STATE_GOOD:
        if (outlet_probe_bad) {
            /* a bad sample */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_SUSPECT;
            m->outlet_probe_state_for = 0u;
        }
        break;
    case GENSET1_OUTLET_PROBE_STATE_SUSPECT:
        if (m->outlet_probe_good_for >= GENSET1_OUTLET_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_GOOD;
            m->outlet_probe_state_for = 0u;
        } else if (m->outlet_probe_state_for >= GENSET1_OUTLET_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_FAULTY;
            m->outlet_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case GENSET1_OUTLET_PROBE_STATE_FAULTY:
        if (m->outlet_probe_good_for >= GENSET1_OUTLET_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_GOOD;
            m->outlet_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_FAULTY;
        m->outlet_probe_state_for = 0u;
        break;
    }
}

void genset1_start(struct genset1 *m, const struct genset1_remembered *r)
{
    m->outlet_probe_good_for = 0u;
    m->outlet_probe_state = (uint8_t)GENSET1_OUTLET_PROBE_STATE_PROVING;
    m->outlet_probe_state_for = 0u;
    m->outlet_probe_last = 0u;
    m->outlet_probe_before = 0u;
    m->wax_valve_permille = 0u;
    m->radiator_valve_position = 1000u;
    (void)r; /* nothing of this program survives a power cut */
}

bool genset1_remember(const struct genset1 *m, struct genset1_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void genset1_step(struct genset1 *m, const struct genset1_in *in, struct genset1_out *out)
{
    /* screwed into the old housing, in the coolant outlet: this sample cannot be believed */
    const bool outlet_probe_bad = (in->outlet_probe < GENSET1_OUTLET_PROBE_LOWEST) ||
        (in->outlet_probe > GENSET1_OUTLET_PROBE_HIGHEST);

    if (outlet_probe_bad) {
        /* a bad sample starts the count again */
        m->outlet_probe_good_for = 0u;
    } else if (m->outlet_probe_good_for < GENSET1_OUTLET_PROBE_CLEAR_AFTER) {
        m->outlet_probe_good_for++;
    } else {
        /* stays */
    }

    genset1_outlet_probe_state(m, outlet_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t outlet_probe_now = (uint16_t)(outlet_probe_bad
                                                 ? m->outlet_probe_last : in->outlet_probe);
    /* the smaller of the two before */
    const uint16_t outlet_probe_less = (uint16_t)(
            (m->outlet_probe_last < m->outlet_probe_before)
            ? m->outlet_probe_last : m->outlet_probe_before);
    /* the larger of the two before */
    const uint16_t outlet_probe_more = (uint16_t)(
            (m->outlet_probe_last < m->outlet_probe_before)
            ? m->outlet_probe_before : m->outlet_probe_last);
    /* screwed into the old housing, in the coolant outlet: median of three believable samples */
    const uint16_t outlet_probe_counts = genset1_clamp_u16(outlet_probe_now,
                                                           outlet_probe_less,
                                                           outlet_probe_more);

    if (!outlet_probe_bad) {
        m->outlet_probe_before = m->outlet_probe_last;
    }

    m->outlet_probe_last = outlet_probe_now;

    /* temperature of outlet_probe in steps of 0.01 K */
    const uint16_t outlet_probe_reading = genset1_outlet_probe_temperature(outlet_probe_counts);
    /* how far the reading is past where it is shut */
    const int16_t wax_valve_past_shut = (int16_t)((int16_t)outlet_probe_reading -
                                                  GENSET1_WAX_VALVE_BAND_FROM);
    /* the same, within the band */
    const uint16_t wax_valve_into_band = (uint16_t)genset1_clamp_i16(wax_valve_past_shut,
            0,
            GENSET1_WAX_VALVE_BAND);
    /* opening for this reading */
    const uint16_t wax_valve_demand = (uint16_t)(((int32_t)wax_valve_into_band * INT32_C(1000)) /
                                                 (int32_t)GENSET1_WAX_VALVE_BAND);
    /* the play's lower end */
    const int16_t wax_valve_least = (int16_t)((int16_t)wax_valve_demand - GENSET1_WAX_VALVE_PLAY);
    /* the play's upper end */
    const uint16_t wax_valve_most = (uint16_t)((int16_t)wax_valve_demand + GENSET1_WAX_VALVE_PLAY);
    /* where the play leaves it */
    const int16_t wax_valve_held = genset1_clamp_i16((int16_t)m->wax_valve_permille,
                                                     wax_valve_least,
                                                     (int16_t)wax_valve_most);

    if (m->outlet_probe_state == GENSET1_OUTLET_PROBE_STATE_GOOD) {
        /* stays where it is while the probe is in doubt */
        m->wax_valve_permille = (uint16_t)(
                (wax_valve_demand == 0u)
                ? 0
                : ((wax_valve_demand == 1000u)
                   ? 1000 : genset1_clamp_i16(wax_valve_held, 0, 1000)));
    }

    /* it has to be in its safe position */
    const bool radiator_valve_stopped = (m->outlet_probe_state ==
                                         GENSET1_OUTLET_PROBE_STATE_PROVING) ||
        (m->outlet_probe_state == GENSET1_OUTLET_PROBE_STATE_FAULTY);

    /* its safe position, or after its control no faster than the actuator follows */
    m->radiator_valve_position = (uint16_t)(
            radiator_valve_stopped
            ? GENSET1_RADIATOR_VALVE_SAFE
            : genset1_clamp_i16(
                    genset1_clamp_i16(
                            (int16_t)m->wax_valve_permille,
                            (int16_t)((int16_t)m->radiator_valve_position -
                                      GENSET1_RADIATOR_VALVE_SLEW),
                            (int16_t)((int16_t)m->radiator_valve_position +
                                      GENSET1_RADIATOR_VALVE_SLEW)),
                    0,
                    1000));

    out->radiator_valve = m->radiator_valve_position;

    uint16_t fault = 0u;

    if (m->outlet_probe_state == GENSET1_OUTLET_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | GENSET1_FAULT_OUTLET_PROBE);
    }
    out->fault = fault;
}
