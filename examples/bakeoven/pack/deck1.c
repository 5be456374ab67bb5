/* deck1.c: control program
 *
 * Equipment: Deck oven 1
 * Site: Mill Row Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 88dee7d788eea2cc77b8bc3610c497045922544a8fada194fb9a90d0fe5ee7a2
 *
 * Replaces:
 * - oven_stat: capillary stat with a knob, bulb in the roof of the chamber
 *
 * Stays hard-wired, and must:
 * - oven_limit: capillary limit, opens the contactor in front of the switch
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
 * Open findings: 1 limit_nuisance (act, oven_limit/fire); 2 ssr_shorts_on (act, elements); 3
 * earth_fault_bypasses_limit (act, deck1); 4 moisture_direction (act, roof_probe); 5
 * damp_dust_washdown (act, deck1); 6 limit_error_budget (act, oven_stat); 7
 * mercury_asbestos_refrigerant (act, oven_stat); 8 approval_lapses (act, deck1); 9 flicker (act,
 * elements).
 */
#include "deck1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 420 degC (electronics.sensors[0].valid, line 100):
 * platinum (IEC 60751)
 */
#define DECK1_ROOF_PROBE_HIGHEST 3940u
/* counts: lowest believable count, about -20.1 degC (electronics.sensors[0].valid, line 100):
 * platinum (IEC 60751)
 */
#define DECK1_ROOF_PROBE_LOWEST 1429u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 100 ms a step, rounded up
 */
#define DECK1_ROOF_PROBE_FAULT_AFTER 20u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of ROOF_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define DECK1_ROOF_PROBE_GOOD_RUN 10u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 100 ms a step, rounded up
 */
#define DECK1_ROOF_PROBE_CLEAR_AFTER 100u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): ROOF_PROBE_FAULT_AFTER + ROOF_PROBE_GOOD_RUN
 */
#define DECK1_ROOF_PROBE_PROVE_WITHIN 30u
/* steps: a new output every 4 s (controls[0].want, line 63): 4 s / 100 ms a step */
#define DECK1_OVEN_STAT_SAMPLE 40
/* steps: last step of a sample (controls[0].want, line 63): OVEN_STAT_SAMPLE - 1 */
#define DECK1_OVEN_STAT_LAST_STEP 39u
/* counts: below: wiper, track or wire broken (controls[0].dial, line 60): a track of 20 % too much,
 * and a third of the way to the rail
 */
#define DECK1_OVEN_STAT_DIAL_LOWEST 115u
/* counts: above: wiper, track or wire broken (controls[0].dial, line 60): a track of 20 % too much,
 * and a third of the way to the rail
 */
#define DECK1_OVEN_STAT_DIAL_HIGHEST 3980u
/* steps: no setting for 2 s (assumed: common practice): 2 s / 100 ms a step, rounded up */
#define DECK1_OVEN_STAT_DIAL_FAULT_AFTER 20u
/* 0.1 K: 250 degC (controls[0].set_point, line 56): in steps of the reading */
#define DECK1_OVEN_STAT_SET_POINT 2500u
/* 0.1 K: deviation beyond which the output is all or none (controls[0].want, line 63): four times
 * the band, 1 / 0.04411 /K, or the whole range
 */
#define DECK1_OVEN_STAT_CLIP 907
/* : proportional: 4.411 permille for 0.1 K (controls[0].want, line 63): SIMC PI: gain 0.04411 /K;
 * +0.06 % off as a fraction
 */
#define DECK1_OVEN_STAT_P_MUL 565
/* : proportional: 4.411 permille for 0.1 K (controls[0].want, line 63): SIMC PI: gain 0.04411 /K;
 * +0.06 % off as a fraction
 */
#define DECK1_OVEN_STAT_P_DIV 128
/* : integral: divisor (controls[0].want, line 63): SIMC PI: integral time 7 min; -0.05 % off as a
 * fraction
 */
#define DECK1_OVEN_STAT_I_DIV 1024
#define DECK1_OVEN_STAT_MOST 1000 /* permille: all (controls[0].want, line 63): the whole output */
/* : integral: factor of the deviation in each sample (controls[0].want, line 63): SIMC PI: integral
 * time 7 min
 */
#define DECK1_OVEN_STAT_I_MUL 43
/* steps: shortest pulse 200 ms (controls[0].want, line 63): min_pulse of the output, or the minimum
 * times of the control
 */
#define DECK1_OVEN_STAT_LEAST_PULSE 2u
/* steps: longest pulse that leaves room for a shortest pause (controls[0].want, line 63):
 * OVEN_STAT_SAMPLE - OVEN_STAT_LEAST_PULSE
 */
#define DECK1_OVEN_STAT_LONGEST_PULSE 38u
/* steps: an effect is expected within 6 min 26 s (process.settles_on, line 19): 3 times the slowest
 * expected answer: 35 min × ln((180 K + 5.97 K)/180 K) = 68.5 s, and 60 s of dead time and lag; 6
 * min 26 s / 100 ms a step, rounded up
 */
#define DECK1_ELEMENTS_EFFECT_WITHIN 3857u
/* counts: 5.97 K towards the set point (process.settles_on, line 19): 0.5 of the differential */
#define DECK1_ELEMENTS_EFFECT 33

/* These do not compile where an assumption of this file does not hold. */
typedef char deck1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char deck1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char deck1_room_roof_probe_good_for[(DECK1_ROOF_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char deck1_room_roof_probe_state_for[(DECK1_ROOF_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char deck1_room_3[(DECK1_OVEN_STAT_DIAL_FAULT_AFTER <= 255u) ? 1 : -1];
typedef char deck1_room_elements_effect_for[(DECK1_ELEMENTS_EFFECT_WITHIN <= 65535u) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (DECK1_FLASH) and how an entry is read
 * (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef DECK1_FLASH
#define DECK1_FLASH
#endif
#ifndef DECK1_READ_U16
#define DECK1_READ_U16(entry) (entry)
#endif

/* temperature of roof_probe (0.1 K): platinum (IEC 60751), counts 2099 to 3445: 2 pieces (proved to
 * be the fewest), 12 bytes, worst error 0.336 K at count 3092 of 0.5 K allowed, in steps of 0.1 K;
 * equal spacing needs 3 pieces, 8 bytes, worst 0.264 K; straight between the points, the end values
 * beyond them
 */
static const uint16_t deck1_roof_probe_temperature_x[3] DECK1_FLASH = {
    2099u, 2763u, 3445u
};
static const uint16_t deck1_roof_probe_temperature_y[3] DECK1_FLASH = {
    914u, 2059u, 3280u
};

static uint16_t deck1_roof_probe_temperature(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= DECK1_READ_U16(deck1_roof_probe_temperature_x[0])) {
        return DECK1_READ_U16(deck1_roof_probe_temperature_y[0]);
    }
    if (x >= DECK1_READ_U16(deck1_roof_probe_temperature_x[2])) {
        return DECK1_READ_U16(deck1_roof_probe_temperature_y[2]);
    }
    while (x > DECK1_READ_U16(deck1_roof_probe_temperature_x[i])) {
        i++;
    }
    x0 = (int32_t)DECK1_READ_U16(deck1_roof_probe_temperature_x[i - 1u]);
    y0 = (int32_t)DECK1_READ_U16(deck1_roof_probe_temperature_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)DECK1_READ_U16(deck1_roof_probe_temperature_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)DECK1_READ_U16(deck1_roof_probe_temperature_x[i]) - x0)));
}

/* set point of dial of capillary stat with a knob, bulb in the roof of the chamber (0.1 K): linear
 * between the stops [120 degC, 300 degC]; straight between the points, the end values beyond them
 */
static const uint16_t deck1_oven_stat_dial_marks_x[2] DECK1_FLASH = {
    205u, 3890u
};
static const uint16_t deck1_oven_stat_dial_marks_y[2] DECK1_FLASH = {
    1200u, 3000u
};

static uint16_t deck1_oven_stat_dial_marks(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= DECK1_READ_U16(deck1_oven_stat_dial_marks_x[0])) {
        return DECK1_READ_U16(deck1_oven_stat_dial_marks_y[0]);
    }
    if (x >= DECK1_READ_U16(deck1_oven_stat_dial_marks_x[1])) {
        return DECK1_READ_U16(deck1_oven_stat_dial_marks_y[1]);
    }
    while (x > DECK1_READ_U16(deck1_oven_stat_dial_marks_x[i])) {
        i++;
    }
    x0 = (int32_t)DECK1_READ_U16(deck1_oven_stat_dial_marks_x[i - 1u]);
    y0 = (int32_t)DECK1_READ_U16(deck1_oven_stat_dial_marks_y[i - 1u]);
    return (uint16_t)(
            y0 +
            (
                    (((int32_t)DECK1_READ_U16(deck1_oven_stat_dial_marks_y[i]) - y0) *
                     ((int32_t)x - x0)) /
                    ((int32_t)DECK1_READ_U16(deck1_oven_stat_dial_marks_x[i]) - x0)));
}

/* x, held between low and high */
static uint16_t deck1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t deck1_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int32_t deck1_clamp_i32(int32_t x, int32_t low, int32_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* sheathed probe in the clips of the old bulb: is it believed? */
static void deck1_roof_probe_state(struct deck1 *m, bool roof_probe_bad)
{
    if (m->roof_probe_state_for < DECK1_ROOF_PROBE_PROVE_WITHIN) {
        m->roof_probe_state_for++;
    }
    switch ((enum deck1_roof_probe_state)m->roof_probe_state) {
    case DECK1_ROOF_PROBE_STATE_PROVING:
        if (m->roof_probe_good_for >= DECK1_ROOF_PROBE_GOOD_RUN) {
            /* proved itself */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_GOOD;
            m->roof_probe_state_for = 0u;
        } else if (m->roof_probe_state_for >= DECK1_ROOF_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_FAULTY;
            m->roof_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case DECK1_ROOF_PROBE_STATE_GOOD:
        if (roof_probe_bad) {
            /* a bad sample */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_SUSPECT;
            m->roof_probe_state_for = 0u;
        }
        break;
    case DECK1_ROOF_PROBE_STATE_SUSPECT:
        if (m->roof_probe_good_for >= DECK1_ROOF_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_GOOD;
            m->roof_probe_state_for = 0u;
        } else if (m->roof_probe_state_for >= DECK1_ROOF_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_FAULTY;
            m->roof_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case DECK1_ROOF_PROBE_STATE_FAULTY:
        if (m->roof_probe_good_for >= DECK1_ROOF_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_GOOD;
            m->roof_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_FAULTY;
        m->roof_probe_state_for = 0u;
        break;
    }
}

/* 3.2 kW elements of the upper deck */
static void deck1_elements(struct deck1 *m, bool elements_wanted)
{
    switch ((enum deck1_elements)m->elements) {
    case DECK1_ELEMENTS_OFF:
        if (elements_wanted &&
            (m->roof_probe_state == DECK1_ROOF_PROBE_STATE_GOOD) &&
            !m->elements_no_effect) {
            /* called for */
            m->elements = (uint8_t)DECK1_ELEMENTS_ON;
        }
        break;
    case DECK1_ELEMENTS_ON:
        if ((m->roof_probe_state == DECK1_ROOF_PROBE_STATE_PROVING) ||
            (m->roof_probe_state == DECK1_ROOF_PROBE_STATE_FAULTY) ||
            m->elements_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->elements = (uint8_t)DECK1_ELEMENTS_OFF;
        } else if (!elements_wanted) {
            /* no longer called for */
            m->elements = (uint8_t)DECK1_ELEMENTS_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->elements = (uint8_t)DECK1_ELEMENTS_OFF;
        break;
    }
}

void deck1_start(struct deck1 *m, const struct deck1_remembered *r)
{
    m->roof_probe_good_for = 0u;
    m->roof_probe_state = (uint8_t)DECK1_ROOF_PROBE_STATE_PROVING;
    m->roof_probe_state_for = 0u;
    m->roof_probe_last = 0u;
    m->roof_probe_before = 0u;
    m->oven_stat_at = 39u;
    m->oven_stat_dial_lost_for = 20u;
    m->oven_stat_set_point = 2500u;
    m->oven_stat_sum = 0u;
    m->oven_stat_permille = 0u;
    m->oven_stat_on_for = 0u;
    m->elements = (uint8_t)DECK1_ELEMENTS_OFF;
    m->elements_effect_from = 0u;
    m->elements_effect_for = 0u;
    m->elements_no_effect = false;
    (void)r; /* nothing of this program survives a power cut */
}

bool deck1_remember(const struct deck1 *m, struct deck1_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void deck1_step(struct deck1 *m, const struct deck1_in *in, struct deck1_out *out)
{
    /* sheathed probe in the clips of the old bulb: this sample cannot be believed */
    const bool roof_probe_bad = (in->roof_probe < DECK1_ROOF_PROBE_LOWEST) ||
        (in->roof_probe > DECK1_ROOF_PROBE_HIGHEST);

    if (roof_probe_bad) {
        /* a bad sample starts the count again */
        m->roof_probe_good_for = 0u;
    } else if (m->roof_probe_good_for < DECK1_ROOF_PROBE_CLEAR_AFTER) {
        m->roof_probe_good_for++;
    } else {
        /* stays */
    }

    deck1_roof_probe_state(m, roof_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t roof_probe_now = (uint16_t)(roof_probe_bad
                                               ? m->roof_probe_last : in->roof_probe);
    /* the smaller of the two before */
    const uint16_t roof_probe_less = (uint16_t)((m->roof_probe_last < m->roof_probe_before)
                                                ? m->roof_probe_last : m->roof_probe_before);
    /* the larger of the two before */
    const uint16_t roof_probe_more = (uint16_t)((m->roof_probe_last < m->roof_probe_before)
                                                ? m->roof_probe_before : m->roof_probe_last);
    /* sheathed probe in the clips of the old bulb: median of three believable samples */
    const uint16_t roof_probe_counts = deck1_clamp_u16(roof_probe_now,
                                                       roof_probe_less,
                                                       roof_probe_more);

    if (!roof_probe_bad) {
        m->roof_probe_before = m->roof_probe_last;
    }

    m->roof_probe_last = roof_probe_now;

    /* temperature of roof_probe in steps of 0.1 K */
    const uint16_t roof_probe_reading = deck1_roof_probe_temperature(roof_probe_counts);

    m->oven_stat_at = (uint8_t)(
            ((m->roof_probe_state == DECK1_ROOF_PROBE_STATE_PROVING) ||
             (m->roof_probe_state == DECK1_ROOF_PROBE_STATE_FAULTY))
            ? (int16_t)DECK1_OVEN_STAT_LAST_STEP
            : ((m->oven_stat_at >= DECK1_OVEN_STAT_LAST_STEP) ? 0 : (m->oven_stat_at + 1)));

    /* capillary stat with a knob, bulb in the roof of the chamber: its probe is believed */
    const bool oven_stat_running = !((m->roof_probe_state == DECK1_ROOF_PROBE_STATE_PROVING) ||
                                     (m->roof_probe_state == DECK1_ROOF_PROBE_STATE_FAULTY));
    /* capillary stat with a knob, bulb in the roof of the chamber: a new output is due */
    const bool oven_stat_due = oven_stat_running && (m->oven_stat_at == 0u);
    /* dial of capillary stat with a knob, bulb in the roof of the chamber: this sample is no
     * setting
     */
    const bool oven_stat_dial_bad = (in->oven_stat_dial < DECK1_OVEN_STAT_DIAL_LOWEST) ||
        (in->oven_stat_dial > DECK1_OVEN_STAT_DIAL_HIGHEST);

    if (!oven_stat_dial_bad) {
        /* a setting ends the doubt */
        m->oven_stat_dial_lost_for = 0u;
    } else if (m->oven_stat_dial_lost_for < DECK1_OVEN_STAT_DIAL_FAULT_AFTER) {
        m->oven_stat_dial_lost_for++;
    } else {
        /* stays */
    }

    /* dial of capillary stat with a knob, bulb in the roof of the chamber: is believed */
    const bool oven_stat_dial_believed = m->oven_stat_dial_lost_for <
        DECK1_OVEN_STAT_DIAL_FAULT_AFTER;

    if (!oven_stat_dial_bad) {
        /* the stops hold beyond them */
        m->oven_stat_set_point = deck1_oven_stat_dial_marks(in->oven_stat_dial);
    }

    /* set point by the dial or, without it, by the sheet */
    const uint16_t oven_stat_wanted = (uint16_t)(oven_stat_dial_believed
                                                 ? m->oven_stat_set_point
                                                 : DECK1_OVEN_STAT_SET_POINT);
    /* deviation, positive where more output is wanted */
    const int16_t oven_stat_deviation = deck1_clamp_i16(
            (int16_t)((int16_t)oven_stat_wanted - (int16_t)roof_probe_reading),
            -907,
            DECK1_OVEN_STAT_CLIP);
    /* output, where one is due, before it is held between none and all */
    const int16_t oven_stat_unheld = (int16_t)(
            oven_stat_due
            ? (
                    (((int32_t)oven_stat_deviation * (int32_t)DECK1_OVEN_STAT_P_MUL) /
                     (int32_t)DECK1_OVEN_STAT_P_DIV) +
                    ((int32_t)m->oven_stat_sum / (int32_t)DECK1_OVEN_STAT_I_DIV))
            : INT32_C(0));
    /* the output is held, and the deviation pushes it on */
    const bool oven_stat_pushes_on = ((oven_stat_unheld > DECK1_OVEN_STAT_MOST) &&
                                      (oven_stat_deviation > 0)) ||
        ((oven_stat_unheld < 0) && (oven_stat_deviation < 0));

    if (!oven_stat_running || (oven_stat_due && !oven_stat_pushes_on)) {
        /* not while the output is held and the deviation pushes it on; emptied while the probe is
         * not believed
         */
        m->oven_stat_sum = (uint32_t)(
                oven_stat_running
                ? deck1_clamp_i32(
                        (int32_t)m->oven_stat_sum +
                        ((int32_t)oven_stat_deviation * (int32_t)DECK1_OVEN_STAT_I_MUL),
                        INT32_C(0),
                        INT32_C(1024000))
                : INT32_C(0));
    }

    if (!oven_stat_running || oven_stat_due) {
        /* none while the probe is not believed */
        m->oven_stat_permille = (uint16_t)(
                oven_stat_running ? deck1_clamp_i16(oven_stat_unheld, 0, DECK1_OVEN_STAT_MOST) : 0);
    }

    /* steps of the window for this output */
    const uint8_t oven_stat_steps_on = (uint8_t)(
            oven_stat_due
            ? (
                    (((int32_t)m->oven_stat_permille * (int32_t)DECK1_OVEN_STAT_SAMPLE) +
                     INT32_C(500)) /
                    INT32_C(1000))
            : INT32_C(0));

    if (!oven_stat_running || oven_stat_due) {
        m->oven_stat_on_for = (uint8_t)(
                oven_stat_running
                ? (
                        (oven_stat_steps_on < DECK1_OVEN_STAT_LEAST_PULSE)
                        ? 0
                        : ((oven_stat_steps_on > DECK1_OVEN_STAT_LONGEST_PULSE)
                           ? DECK1_OVEN_STAT_SAMPLE : oven_stat_steps_on))
                : 0);
    }

    /* capillary stat with a knob, bulb in the roof of the chamber: its contact is made */
    const bool oven_stat_contact = m->oven_stat_at < m->oven_stat_on_for;
    /* the old wiring calls for it */
    const bool elements_wanted = oven_stat_contact;
    /* the temperature has moved as it should */
    const bool elements_effect_seen = ((int32_t)roof_probe_counts -
                                       (int32_t)m->elements_effect_from) >=
        (int32_t)DECK1_ELEMENTS_EFFECT;

    if ((m->elements != DECK1_ELEMENTS_ON) || elements_effect_seen) {
        m->elements_effect_for = 0u;
    } else if (!in->limit_open && (m->elements_effect_for < DECK1_ELEMENTS_EFFECT_WITHIN)) {
        m->elements_effect_for++;
    } else {
        /* stays */
    }

    if ((m->elements != DECK1_ELEMENTS_ON) ||
        elements_effect_seen ||
        (roof_probe_counts < m->elements_effect_from)) {
        m->elements_effect_from = roof_probe_counts;
    }

    if (m->elements_effect_for >= DECK1_ELEMENTS_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->elements_no_effect = true;
    }

    deck1_elements(m, elements_wanted);
    out->elements = m->elements == DECK1_ELEMENTS_ON;

    uint16_t fault = 0u;

    if (m->roof_probe_state == DECK1_ROOF_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | DECK1_FAULT_ROOF_PROBE);
    }
    if (!oven_stat_dial_believed) {
        fault = (uint16_t)(fault | DECK1_FAULT_OVEN_STAT_DIAL);
    }
    if (m->elements_no_effect) {
        fault = (uint16_t)(fault | DECK1_FAULT_ELEMENTS_NO_EFFECT);
    }
    out->fault = fault;
}
