/* hob3.c: control program
 *
 * Equipment: Hob plate 3, canteen
 * Site: Mill Row Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 4ca60f51ff403cb3194aafe54d396d8a600e99162d805a4ec674f3aeba5f530b
 *
 * Replaces:
 * - regulator: energy regulator behind the knob
 *
 * Stays hard-wired, and must:
 * - plate_limit: rod limiter in the plate
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
 * Open findings: 1 earth_fault_bypasses_limit (act, hob3); 2 watchdog_inside (act, hob3); 3
 * enclosure_too_hot_cold (act, hob3); 4 damp_dust_washdown (act, hob3); 5 model_beyond_evidence
 * (act, hob3); 6 approval_lapses (act, hob3); 7 overshoot_not_determined (act,
 * plate_limit/fat_fire). Not judged, for want of a figure: 3; risks.md says which.
 */
#include "hob3.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* steps: 40 s from make to make (controls[0].period, line 42): 40 s / 100 ms a step, rounded */
#define HOB3_REGULATOR_PERIOD 400
/* counts: below: wiper, track or wire broken (controls[0].dial_shares, line 43): a track of 20 %
 * too much, and a third of the way to the rail
 */
#define HOB3_REGULATOR_DIAL_LOWEST 28u
/* counts: above: wiper, track or wire broken (controls[0].dial_shares, line 43): a track of 20 %
 * too much, and a third of the way to the rail
 */
#define HOB3_REGULATOR_DIAL_HIGHEST 995u
/* steps: no setting for 2 s (assumed: common practice): 2 s / 100 ms a step, rounded up */
#define HOB3_REGULATOR_DIAL_FAULT_AFTER 20u
/* steps: shortest pulse 1 s (assumed for controls[0].min_on: the old part had none): min_pulse of
 * the output, or min_on
 */
#define HOB3_REGULATOR_LEAST_PULSE 10u
/* steps: longest pulse that leaves room for a pause (assumed for controls[0].min_on: the old part
 * had none): REGULATOR_PERIOD - REGULATOR_LEAST_PULSE
 */
#define HOB3_REGULATOR_LONGEST_PULSE 390u
/* steps: last step of a period (controls[0].period, line 42): REGULATOR_PERIOD - 1 */
#define HOB3_REGULATOR_LAST_STEP 399u

/* These do not compile where an assumption of this file does not hold. */
typedef char hob3_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char hob3_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char hob3_room_regulator_dial_lost_for[(HOB3_REGULATOR_DIAL_FAULT_AFTER <= 255u) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (HOB3_FLASH) and how an entry is read
 * (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef HOB3_FLASH
#define HOB3_FLASH
#endif
#ifndef HOB3_READ_U16
#define HOB3_READ_U16(entry) (entry)
#endif

/* share of the period by the dial (permille): straight between the marks of [[1, 8 %], [2, 16 %],
 * [3, 30 %], [4, 50 %], [5, 72 %], [6, 100 %]]; straight between the points, the end values beyond
 * them
 */
static const uint16_t hob3_regulator_shares_x[7] HOB3_FLASH = {
    51u, 205u, 358u, 512u, 665u, 819u, 972u
};
static const uint16_t hob3_regulator_shares_y[7] HOB3_FLASH = {
    0u, 80u, 160u, 300u, 500u, 720u, 1000u
};

static uint16_t hob3_regulator_shares(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= HOB3_READ_U16(hob3_regulator_shares_x[0])) {
        return HOB3_READ_U16(hob3_regulator_shares_y[0]);
    }
    if (x >= HOB3_READ_U16(hob3_regulator_shares_x[6])) {
        return HOB3_READ_U16(hob3_regulator_shares_y[6]);
    }
    while (x > HOB3_READ_U16(hob3_regulator_shares_x[i])) {
        i++;
    }
    x0 = (int32_t)HOB3_READ_U16(hob3_regulator_shares_x[i - 1u]);
    y0 = (int32_t)HOB3_READ_U16(hob3_regulator_shares_y[i - 1u]);
    return (uint16_t)(
            y0 +
            ((((int32_t)HOB3_READ_U16(hob3_regulator_shares_y[i]) - y0) * ((int32_t)x - x0)) /
             ((int32_t)HOB3_READ_U16(hob3_regulator_shares_x[i]) - x0)));
}

/* 1.8 kW cast plate */
static void hob3_plate(struct hob3 *m, bool plate_wanted)
{
    switch ((enum hob3_plate)m->plate) {
    case HOB3_PLATE_OFF:
        if (plate_wanted) {
            /* called for */
            m->plate = (uint8_t)HOB3_PLATE_ON;
        }
        break;
    case HOB3_PLATE_ON:
        if (!plate_wanted) {
            /* no longer called for */
            m->plate = (uint8_t)HOB3_PLATE_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->plate = (uint8_t)HOB3_PLATE_OFF;
        break;
    }
}

void hob3_start(struct hob3 *m, const struct hob3_remembered *r)
{
    m->regulator_dial_lost_for = 20u;
    m->regulator_at = 399u;
    m->plate = (uint8_t)HOB3_PLATE_OFF;
    (void)r; /* nothing of this program survives a power cut */
}

bool hob3_remember(const struct hob3 *m, struct hob3_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void hob3_step(struct hob3 *m, const struct hob3_in *in, struct hob3_out *out)
{
    /* energy regulator behind the knob: something that it switches is called for */
    const bool regulator_called = true;
    /* dial of energy regulator behind the knob: this sample is no setting */
    const bool regulator_dial_bad = (in->regulator_dial < HOB3_REGULATOR_DIAL_LOWEST) ||
        (in->regulator_dial > HOB3_REGULATOR_DIAL_HIGHEST);

    if (!regulator_dial_bad) {
        /* a setting ends the doubt */
        m->regulator_dial_lost_for = 0u;
    } else if (m->regulator_dial_lost_for < HOB3_REGULATOR_DIAL_FAULT_AFTER) {
        m->regulator_dial_lost_for++;
    } else {
        /* stays */
    }

    /* dial of energy regulator behind the knob: is believed */
    const bool regulator_dial_believed = m->regulator_dial_lost_for <
        HOB3_REGULATOR_DIAL_FAULT_AFTER;
    /* share of the period that is on */
    const uint16_t regulator_share = (uint16_t)((regulator_dial_believed && !regulator_dial_bad)
                                                ? hob3_regulator_shares(in->regulator_dial) : 0u);
    /* steps on for this share */
    const uint16_t regulator_steps_on = (uint16_t)(
            ((int32_t)regulator_share * (int32_t)HOB3_REGULATOR_PERIOD) / INT32_C(1000));
    /* steps of this period that are on */
    const uint16_t regulator_on_now = (uint16_t)(
            (regulator_steps_on < HOB3_REGULATOR_LEAST_PULSE)
            ? 0
            : ((regulator_steps_on > HOB3_REGULATOR_LONGEST_PULSE)
               ? HOB3_REGULATOR_PERIOD : (int16_t)regulator_steps_on));

    /* stands ready to begin on while it is off or nothing is called for */
    m->regulator_at = (uint16_t)(
            (!regulator_called || (regulator_on_now == 0u))
            ? (int16_t)HOB3_REGULATOR_LAST_STEP
            : ((m->regulator_at >= HOB3_REGULATOR_LAST_STEP) ? 0 : ((int16_t)m->regulator_at + 1)));

    /* energy regulator behind the knob: it is in its on time */
    const bool regulator_lit = m->regulator_at < regulator_on_now;
    /* the old wiring calls for it */
    const bool plate_wanted = regulator_lit;

    hob3_plate(m, plate_wanted);
    out->plate = m->plate == HOB3_PLATE_ON;

    uint16_t fault = 0u;

    if (!regulator_dial_believed) {
        fault = (uint16_t)(fault | HOB3_FAULT_REGULATOR_DIAL);
    }
    out->fault = fault;
}
