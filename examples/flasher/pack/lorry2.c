/* lorry2.c: control program
 *
 * Equipment: Direction indicators, works lorry 2
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9b57bd1b3ccf44e7bb4451caf8de9eeb2e1e5406a9c8380d4f38058c2a8bb2be
 *
 * Replaces:
 * - flasher: thermal flasher behind the panel
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
 * Open findings: 1 danger_without_barrier (act, unseen_turn/left_lamps); 2 damp_dust_washdown (act,
 * lorry2); 3 approval_lapses (act, lorry2); 4 output_doubtful (act, left_lamps); 5 output_doubtful
 * (act, right_lamps). Not judged, for want of a figure: 4; risks.md says which.
 */
#include "lorry2.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about 9.92 A (assumed for electronics.sensors[0].valid: the
 * range of its kind, short of both rails): current input
 */
#define LORRY2_SHUNT_HIGHEST 1015u
/* steps: not good for 1 s (electronics.sensors[0].fault_after, line 75): 1 s / 20 ms a step,
 * rounded up
 */
#define LORRY2_SHUNT_FAULT_AFTER 50u
/* steps: good samples in a row that end a doubt (electronics.sensors[0].fault_after, line 75): half
 * of SHUNT_FAULT_AFTER, at least 4: bad samples oftener than one in so many are found
 */
#define LORRY2_SHUNT_GOOD_RUN 25u
/* steps: good for 1 s (electronics.sensors[0].clear_after, line 75): 1 s / 20 ms a step, rounded up
 */
#define LORRY2_SHUNT_CLEAR_AFTER 50u
/* steps: time to prove itself after a start (electronics.sensors[0].fault_after, line 75):
 * SHUNT_FAULT_AFTER + SHUNT_GOOD_RUN
 */
#define LORRY2_SHUNT_PROVE_WITHIN 75u
/* steps: 666.7 ms from make to make (controls[0].rate, line 61): 666.7 ms / 20 ms a step, rounded
 */
#define LORRY2_FLASHER_PERIOD 33u
/* steps: 50 % on (controls[0].on_share, line 62): 50 % of 33 steps, rounded */
#define LORRY2_FLASHER_ON 17
/* steps: last step of a period (controls[0].rate, line 61): FLASHER_PERIOD - 1 */
#define LORRY2_FLASHER_LAST_STEP 32
/* steps: from make to make with a lamp out (controls[0].lamps.out_rate, line 65): 333.3 ms / 20 ms
 * a step, rounded
 */
#define LORRY2_FLASHER_OUT_PERIOD 17u
/* steps: last step of a period with a lamp out (controls[0].lamps.out_rate, line 65):
 * FLASHER_OUT_PERIOD - 1
 */
#define LORRY2_FLASHER_OUT_LAST_STEP 16
/* steps: 50 % on (controls[0].lamps.out_rate, line 65): 50 % of 17 steps, rounded */
#define LORRY2_FLASHER_OUT_ON 9
/* counts: 2.29 A (controls[0].lamps, line 65): 2 lamps of 21 W at 13 V: 2.65 to 3.84 A from 11 to
 * 15 V, lamps ± 10 %; with one out 1.33 to 1.92 A (filament current ∝ V^0.55, common practice)
 */
#define LORRY2_FLASHER_LAMPS 233u

/* These do not compile where an assumption of this file does not hold. */
typedef char lorry2_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char lorry2_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char lorry2_room_shunt_good_for[(LORRY2_SHUNT_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char lorry2_room_shunt_state_for[(LORRY2_SHUNT_PROVE_WITHIN <= 255u) ? 1 : -1];

/* x, held between low and high */
static uint16_t lorry2_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t lorry2_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* shunt in the common feed with its amplifier: is it believed? */
static void lorry2_shunt_state(struct lorry2 *m, bool shunt_bad)
{
    if (m->shunt_state_for < LORRY2_SHUNT_PROVE_WITHIN) {
        m->shunt_state_for++;
    }
    switch ((enum lorry2_shunt_state)m->shunt_state) {
    case LORRY2_SHUNT_STATE_PROVING:
        if (m->shunt_good_for >= LORRY2_SHUNT_GOOD_RUN) {
            /* proved itself */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_GOOD;
            m->shunt_state_for = 0u;
        } else if (m->shunt_state_for >= LORRY2_SHUNT_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_FAULTY;
            m->shunt_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case LORRY2_SHUNT_STATE_GOOD:
        if (shunt_bad) {
            /* a bad sample */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_SUSPECT;
            m->shunt_state_for = 0u;
        }
        break;
    case LORRY2_SHUNT_STATE_SUSPECT:
        if (m->shunt_good_for >= LORRY2_SHUNT_GOOD_RUN) {
            /* a run of good samples */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_GOOD;
            m->shunt_state_for = 0u;
        } else if (m->shunt_state_for >= LORRY2_SHUNT_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_FAULTY;
            m->shunt_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case LORRY2_SHUNT_STATE_FAULTY:
        if (m->shunt_good_for >= LORRY2_SHUNT_CLEAR_AFTER) {
            /* good for long enough */
            m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_GOOD;
            m->shunt_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_FAULTY;
        m->shunt_state_for = 0u;
        break;
    }
}

/* left lamps, front and rear */
static void lorry2_left_lamps(struct lorry2 *m, bool left_lamps_wanted)
{
    switch ((enum lorry2_left_lamps)m->left_lamps) {
    case LORRY2_LEFT_LAMPS_OFF:
        if (left_lamps_wanted) {
            /* called for */
            m->left_lamps = (uint8_t)LORRY2_LEFT_LAMPS_ON;
        }
        break;
    case LORRY2_LEFT_LAMPS_ON:
        if (!left_lamps_wanted) {
            /* no longer called for */
            m->left_lamps = (uint8_t)LORRY2_LEFT_LAMPS_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->left_lamps = (uint8_t)LORRY2_LEFT_LAMPS_OFF;
        break;
    }
}

/* right lamps, front and rear */
static void lorry2_right_lamps(struct lorry2 *m, bool right_lamps_wanted)
{
    switch ((enum lorry2_right_lamps)m->right_lamps) {
    case LORRY2_RIGHT_LAMPS_OFF:
        if (right_lamps_wanted) {
            /* called for */
            m->right_lamps = (uint8_t)LORRY2_RIGHT_LAMPS_ON;
        }
        break;
    case LORRY2_RIGHT_LAMPS_ON:
        if (!right_lamps_wanted) {
            /* no longer called for */
            m->right_lamps = (uint8_t)LORRY2_RIGHT_LAMPS_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->right_lamps = (uint8_t)LORRY2_RIGHT_LAMPS_OFF;
        break;
    }
}

void lorry2_start(struct lorry2 *m, const struct lorry2_remembered *r)
{
    m->shunt_good_for = 0u;
    m->shunt_state = (uint8_t)LORRY2_SHUNT_STATE_PROVING;
    m->shunt_state_for = 0u;
    m->shunt_last = 0u;
    m->shunt_before = 0u;
    m->flasher_lamp_out = false;
    m->flasher_at = 32u;
    m->flasher_dim = false;
    m->left_lamps = (uint8_t)LORRY2_LEFT_LAMPS_OFF;
    m->right_lamps = (uint8_t)LORRY2_RIGHT_LAMPS_OFF;
    (void)r; /* nothing of this program survives a power cut */
}

bool lorry2_remember(const struct lorry2 *m, struct lorry2_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void lorry2_step(struct lorry2 *m, const struct lorry2_in *in, struct lorry2_out *out)
{
    /* shunt in the common feed with its amplifier: this sample cannot be believed */
    const bool shunt_bad = in->shunt > LORRY2_SHUNT_HIGHEST;

    if (shunt_bad) {
        /* a bad sample starts the count again */
        m->shunt_good_for = 0u;
    } else if (m->shunt_good_for < LORRY2_SHUNT_CLEAR_AFTER) {
        m->shunt_good_for++;
    } else {
        /* stays */
    }

    lorry2_shunt_state(m, shunt_bad);

    /* this sample, or the last believable one */
    const uint16_t shunt_now = (uint16_t)(shunt_bad ? m->shunt_last : in->shunt);
    /* the smaller of the two before */
    const uint16_t shunt_less = (uint16_t)((m->shunt_last < m->shunt_before)
                                           ? m->shunt_last : m->shunt_before);
    /* the larger of the two before */
    const uint16_t shunt_more = (uint16_t)((m->shunt_last < m->shunt_before)
                                           ? m->shunt_before : m->shunt_last);
    /* shunt in the common feed with its amplifier: median of three believable samples */
    const uint16_t shunt_counts = lorry2_clamp_u16(shunt_now, shunt_less, shunt_more);

    if (!shunt_bad) {
        m->shunt_before = m->shunt_last;
    }

    m->shunt_last = shunt_now;

    /* thermal flasher behind the panel: something that it switches is called for */
    const bool flasher_called = in->stalk_left || in->stalk_right;

    /* stands ready to begin lit while nothing is called for */
    m->flasher_at = (uint8_t)(
            flasher_called
            ? (
                    (
                            m->flasher_at >=
                            (m->flasher_lamp_out
                             ? LORRY2_FLASHER_OUT_LAST_STEP : LORRY2_FLASHER_LAST_STEP))
                    ? 0 : lorry2_clamp_i16((int16_t)(m->flasher_at + 1), 0, 32))
            : LORRY2_FLASHER_LAST_STEP);

    if (!flasher_called || (m->flasher_at == 0u)) {
        /* counts from the next flash on; forgotten when nothing is called for */
        m->flasher_lamp_out = flasher_called && m->flasher_dim;
    }

    /* thermal flasher behind the panel: it is in its on time */
    const bool flasher_lit = m->flasher_at <
        (m->flasher_lamp_out ? LORRY2_FLASHER_OUT_ON : LORRY2_FLASHER_ON);

    if (
            !flasher_called ||
            (
                    flasher_called &&
                    ((m->flasher_at + 1) ==
                     (m->flasher_lamp_out ? LORRY2_FLASHER_OUT_ON : LORRY2_FLASHER_ON)) &&
                    (m->shunt_state == LORRY2_SHUNT_STATE_GOOD))) {
        /* looked at in the last lit step of a flash */
        m->flasher_dim = flasher_called && (shunt_counts <= LORRY2_FLASHER_LAMPS);
    }

    /* the old wiring calls for it */
    const bool left_lamps_wanted = flasher_lit && in->stalk_left;

    lorry2_left_lamps(m, left_lamps_wanted);
    out->left_lamps = m->left_lamps == LORRY2_LEFT_LAMPS_ON;

    /* the old wiring calls for it */
    const bool right_lamps_wanted = flasher_lit && in->stalk_right;

    lorry2_right_lamps(m, right_lamps_wanted);
    out->right_lamps = m->right_lamps == LORRY2_RIGHT_LAMPS_ON;

    uint16_t fault = 0u;

    if (m->shunt_state == LORRY2_SHUNT_STATE_FAULTY) {
        fault = (uint16_t)(fault | LORRY2_FAULT_SHUNT);
    }
    if (m->flasher_lamp_out) {
        fault = (uint16_t)(fault | LORRY2_FAULT_FLASHER_LAMP_OUT);
    }
    out->fault = fault;
}
