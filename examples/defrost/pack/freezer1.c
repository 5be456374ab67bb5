/* freezer1.c: control program
 *
 * Equipment: Freezer room 1
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 1f8c58c041d92eadc6dae97188ff3a72f4678da398d9ac747ea86898351923fb
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - fan_delay: disc on the coil, holds the fans back while the coil is warm
 *
 * Stays hard-wired, and must:
 * - heater_disc: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, thaw/coil_fan); 2 danger_without_barrier (act,
 * thaw/compressor); 3 danger_without_barrier (act, thaw/defrost_heater); 4 restarts_by_itself (act,
 * coil_fan); 5 restarts_by_itself (act, compressor); 6 fan_stopped_on_fault (act, coil_fan); 7
 * welded_output (act, coil_fan); 8 welded_output (act, compressor); 9 earth_fault_bypasses_limit
 * (act, freezer1); 10 probe_out_of_pocket (act, fan_delay); 11 moisture_direction (act,
 * room_probe); 12 mercury_asbestos_refrigerant (act, fan_delay); 13 mercury_asbestos_refrigerant
 * (act, room_stat); 14 approval_lapses (act, freezer1); 15 limit_trips_late (act,
 * heater_disc/thaw); 16 heat_flow_not_proved (act, coil_fan). Not judged, for want of a figure: 3;
 * risks.md says which.
 */
#include "freezer1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -45 degC (electronics.sensors[0].valid, line 144):
 * thermistor (beta)
 */
#define FREEZER1_ROOM_PROBE_HIGHEST 3602u
/* counts: lowest believable count, about 40 degC (electronics.sensors[0].valid, line 144):
 * thermistor (beta)
 */
#define FREEZER1_ROOM_PROBE_LOWEST 447u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define FREEZER1_ROOM_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of ROOM_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define FREEZER1_ROOM_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define FREEZER1_ROOM_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): ROOM_PROBE_FAULT_AFTER + ROOM_PROBE_GOOD_RUN
 */
#define FREEZER1_ROOM_PROBE_PROVE_WITHIN 8u
/* counts: highest believable count, about -45 degC (electronics.sensors[1].valid, line 157):
 * thermistor (beta)
 */
#define FREEZER1_COIL_PROBE_HIGHEST 3849u
/* counts: lowest believable count, about 60 degC (electronics.sensors[1].valid, line 157):
 * thermistor (beta)
 */
#define FREEZER1_COIL_PROBE_LOWEST 488u
/* steps: not good for 2 s (assumed for electronics.sensors[1].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define FREEZER1_COIL_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[1].fault_after:
 * common practice): half of COIL_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define FREEZER1_COIL_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[1].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define FREEZER1_COIL_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[1].fault_after: common
 * practice): COIL_PROBE_FAULT_AFTER + COIL_PROBE_GOOD_RUN
 */
#define FREEZER1_COIL_PROBE_PROVE_WITHIN 8u
/* counts: -18 degC (controls[0].makes_at, line 93): -18 degC is 2446.376 counts by thermistor
 * (beta); rounded down: at most 2446, which changes at -18.0120 degC; one count is 0.0192 K
 */
#define FREEZER1_ROOM_STAT_MAKE 2446u
/* counts: -21 degC (controls[0].breaks_at, line 94): -21 degC is 2601.441 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 2601, which changes at -20.9914 degC;
 * one count is 0.0195 K; moved by 1 counts, so that the differential is not below the one asked
 * for: 2602, which changes at -21.0109 degC; moved by 1 counts, so that the differential is not
 * below the one asked for: 2603, which changes at -21.0304 degC
 */
#define FREEZER1_ROOM_STAT_BREAK 2603u
/* counts: -8 degC (controls[1].makes_at, line 107): -8 degC is 2686.891 counts by thermistor
 * (beta); rounded to the nearest edge of a count: at least 2687, which changes at -8.0024 degC; one
 * count is 0.0221 K
 */
#define FREEZER1_FAN_DELAY_MAKE 2687u
/* counts: 2 degC (controls[1].breaks_at, line 108): 2 degC is 2226.333 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at most 2225, which changes at 2.0072 degC; one count is
 * 0.0217 K
 */
#define FREEZER1_FAN_DELAY_BREAK 2225u
/* steps: runs for 25 min (timers[0].lasts, line 44): 25 min / 500 ms a step, rounded up */
#define FREEZER1_DEFROST_LASTS 3000u
/* steps: once in 8 h (timers[0].every, line 43): 8 h / 500 ms a step, rounded up */
#define FREEZER1_DEFROST_EVERY 57600u
/* steps: last step of a period (timers[0].every, line 43): DEFROST_EVERY - 1 */
#define FREEZER1_DEFROST_LAST_STEP 57599u
/* steps: how finely the place is kept over a power cut (timers[0].after_power_cut, line 46):
 * DEFROST_EVERY / 16, at least 1
 */
#define FREEZER1_DEFROST_PART 3600
/* counts: 12 degC (timers[0].ends_on, line 45): 12 degC is 1780.016 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at most 1779, which changes at 12.0004 degC; one count is
 * 0.0235 K
 */
#define FREEZER1_COIL_PROBE_LIMIT 1779u
/* steps: runs for 3 min (timers[1].lasts, line 50): 3 min / 500 ms a step, rounded up */
#define FREEZER1_DRIP_LASTS 360u
/* steps: on for at least 3 min (controls[0].min_on, line 98): 3 min / 500 ms a step, rounded up */
#define FREEZER1_COMPRESSOR_MIN_ON 360u
/* steps: off for at least 6 min (controls[0].min_off, line 99): 6 min / 500 ms a step, rounded up
 */
#define FREEZER1_COMPRESSOR_MIN_OFF 720u
/* steps: an effect is expected within 3 h 59 min (process.worst.settles_on, line 24): 3 times the
 * slowest expected answer: 5 h × ln((5 K + 1.48 K)/5 K) = 1 h 17 min, and 2 min of dead time and
 * lag; 3 h 59 min / 500 ms a step, rounded up
 */
#define FREEZER1_COMPRESSOR_EFFECT_WITHIN 28756u
/* counts: 1.48 K towards the set point (process.worst.settles_on, line 24): 0.5 of the differential
 */
#define FREEZER1_COMPRESSOR_EFFECT 76

/* These do not compile where an assumption of this file does not hold. */
typedef char freezer1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char freezer1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char freezer1_room_room_probe_good_for[(FREEZER1_ROOM_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char freezer1_room_2[(FREEZER1_ROOM_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char freezer1_room_coil_probe_good_for[(FREEZER1_COIL_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char freezer1_room_4[(FREEZER1_COIL_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char freezer1_room_drip_for[(FREEZER1_DRIP_LASTS <= 65535u) ? 1 : -1];
typedef char freezer1_room_6[(FREEZER1_COMPRESSOR_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char freezer1_room_compressor_for[(FREEZER1_COMPRESSOR_MIN_OFF <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t freezer1_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* Check word of a record. It starts from a number that belongs to records of this program alone; no
 * blank record has it.
 */
static uint16_t freezer1_check_word(const struct freezer1_remembered *r)
{
    uint16_t word = 21041u;

    word = (uint16_t)(((word * 31u) + r->defrost_place) & 0xFFFFu);
    return word;
}

/* return air: is it believed? */
static void freezer1_room_probe_state(struct freezer1 *m, bool room_probe_bad)
{
    if (m->room_probe_state_for < FREEZER1_ROOM_PROBE_PROVE_WITHIN) {
        m->room_probe_state_for++;
    }
    switch ((enum freezer1_room_probe_state)m->room_probe_state) {
    case FREEZER1_ROOM_PROBE_STATE_PROVING:
        if (m->room_probe_good_for >= FREEZER1_ROOM_PROBE_GOOD_RUN) {
            /* proved itself */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= FREEZER1_ROOM_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FREEZER1_ROOM_PROBE_STATE_GOOD:
        if (room_probe_bad) {
            /* a bad sample */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_SUSPECT;
            m->room_probe_state_for = 0u;
        }
        break;
    case FREEZER1_ROOM_PROBE_STATE_SUSPECT:
        if (m->room_probe_good_for >= FREEZER1_ROOM_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= FREEZER1_ROOM_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FREEZER1_ROOM_PROBE_STATE_FAULTY:
        if (m->room_probe_good_for >= FREEZER1_ROOM_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_FAULTY;
        m->room_probe_state_for = 0u;
        break;
    }
}

/* on the coil, at the last row, where the old discs were: is it believed? */
static void freezer1_coil_probe_state(struct freezer1 *m, bool coil_probe_bad)
{
    if (m->coil_probe_state_for < FREEZER1_COIL_PROBE_PROVE_WITHIN) {
        m->coil_probe_state_for++;
    }
    switch ((enum freezer1_coil_probe_state)m->coil_probe_state) {
    case FREEZER1_COIL_PROBE_STATE_PROVING:
        if (m->coil_probe_good_for >= FREEZER1_COIL_PROBE_GOOD_RUN) {
            /* proved itself */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        } else if (m->coil_probe_state_for >= FREEZER1_COIL_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_FAULTY;
            m->coil_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FREEZER1_COIL_PROBE_STATE_GOOD:
        if (coil_probe_bad) {
            /* a bad sample */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_SUSPECT;
            m->coil_probe_state_for = 0u;
        }
        break;
    case FREEZER1_COIL_PROBE_STATE_SUSPECT:
        if (m->coil_probe_good_for >= FREEZER1_COIL_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        } else if (m->coil_probe_state_for >= FREEZER1_COIL_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_FAULTY;
            m->coil_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FREEZER1_COIL_PROBE_STATE_FAULTY:
        if (m->coil_probe_good_for >= FREEZER1_COIL_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_FAULTY;
        m->coil_probe_state_for = 0u;
        break;
    }
}

/* vapour-bulb control in the return air */
static void freezer1_room_stat(struct freezer1 *m, uint16_t room_probe_counts)
{
    switch ((enum freezer1_room_stat)m->room_stat) {
    case FREEZER1_ROOM_STAT_OPEN:
        if ((m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts <= FREEZER1_ROOM_STAT_MAKE)) {
            /* temperature has reached the make */
            m->room_stat = (uint8_t)FREEZER1_ROOM_STAT_MADE;
        }
        break;
    case FREEZER1_ROOM_STAT_MADE:
        if ((m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts >= FREEZER1_ROOM_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->room_stat = (uint8_t)FREEZER1_ROOM_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_stat = (uint8_t)FREEZER1_ROOM_STAT_OPEN;
        break;
    }
}

/* disc on the coil, holds the fans back while the coil is warm */
static void freezer1_fan_delay(struct freezer1 *m, uint16_t coil_probe_counts)
{
    switch ((enum freezer1_fan_delay)m->fan_delay) {
    case FREEZER1_FAN_DELAY_OPEN:
        if ((m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_GOOD) &&
            (coil_probe_counts >= FREEZER1_FAN_DELAY_MAKE)) {
            /* temperature has reached the make */
            m->fan_delay = (uint8_t)FREEZER1_FAN_DELAY_MADE;
        }
        break;
    case FREEZER1_FAN_DELAY_MADE:
        if ((m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_FAULTY) ||
            (coil_probe_counts <= FREEZER1_FAN_DELAY_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->fan_delay = (uint8_t)FREEZER1_FAN_DELAY_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->fan_delay = (uint8_t)FREEZER1_FAN_DELAY_OPEN;
        break;
    }
}

/* defrost, at most 25 min */
static void freezer1_defrost(struct freezer1 *m, uint16_t coil_probe_counts)
{
    switch ((enum freezer1_defrost)m->defrost) {
    case FREEZER1_DEFROST_IDLE:
        if ((m->defrost_at == 0u) ||
            (!m->defrost_awake && (m->defrost_at < FREEZER1_DEFROST_LASTS))) {
            /* its time has come */
            m->defrost = (uint8_t)FREEZER1_DEFROST_RUNNING;
        }
        break;
    case FREEZER1_DEFROST_RUNNING:
        if ((m->defrost_at >= FREEZER1_DEFROST_LASTS) ||
            (coil_probe_counts <= FREEZER1_COIL_PROBE_LIMIT)) {
            /* has run its time, or was ended */
            m->defrost = (uint8_t)FREEZER1_DEFROST_IDLE;
        }
        break;
    default: /* not a state: memory was upset */
        m->defrost = (uint8_t)FREEZER1_DEFROST_IDLE;
        break;
    }
}

/* 1.8 kW defrost heater in coil and tray */
static void freezer1_defrost_heater(struct freezer1 *m, bool defrost_heater_wanted)
{
    switch ((enum freezer1_defrost_heater)m->defrost_heater) {
    case FREEZER1_DEFROST_HEATER_OFF:
        if (defrost_heater_wanted && (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_GOOD)) {
            /* called for */
            m->defrost_heater = (uint8_t)FREEZER1_DEFROST_HEATER_ON;
        }
        break;
    case FREEZER1_DEFROST_HEATER_ON:
        if ((m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_FAULTY)) {
            /* its safe state is off, before any minimum on time */
            m->defrost_heater = (uint8_t)FREEZER1_DEFROST_HEATER_OFF;
        } else if (!defrost_heater_wanted) {
            /* no longer called for */
            m->defrost_heater = (uint8_t)FREEZER1_DEFROST_HEATER_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->defrost_heater = (uint8_t)FREEZER1_DEFROST_HEATER_OFF;
        break;
    }
}

/* drip time */
static void freezer1_drip(struct freezer1 *m, const struct freezer1_out *out)
{
    if (m->drip_for < FREEZER1_DRIP_LASTS) {
        m->drip_for++;
    }
    switch ((enum freezer1_drip)m->drip) {
    case FREEZER1_DRIP_IDLE:
        if (out->defrost_heater) {
            /* its cause came on */
            m->drip = (uint8_t)FREEZER1_DRIP_ARMED;
            m->drip_for = 0u;
        }
        break;
    case FREEZER1_DRIP_RUNNING:
        if (out->defrost_heater) {
            /* its cause came on again */
            m->drip = (uint8_t)FREEZER1_DRIP_ARMED;
            m->drip_for = 0u;
        } else if (m->drip_for >= FREEZER1_DRIP_LASTS) {
            /* has run its time */
            m->drip = (uint8_t)FREEZER1_DRIP_IDLE;
            m->drip_for = 0u;
        } else {
            /* stays */
        }
        break;
    case FREEZER1_DRIP_ARMED:
        if (!out->defrost_heater) {
            /* its cause went off */
            m->drip = (uint8_t)FREEZER1_DRIP_RUNNING;
            m->drip_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->drip = (uint8_t)FREEZER1_DRIP_IDLE;
        m->drip_for = 0u;
        break;
    }
}

/* 3 kW compressor through its contactor */
static void freezer1_compressor(struct freezer1 *m,
                                const struct freezer1_in *in,
                                bool compressor_wanted)
{
    if (m->compressor_for < FREEZER1_COMPRESSOR_MIN_OFF) {
        m->compressor_for++;
    }
    switch ((enum freezer1_compressor)m->compressor) {
    case FREEZER1_COMPRESSOR_OFF:
        if (compressor_wanted &&
            (m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_GOOD) &&
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_GOOD) &&
            !m->compressor_no_effect &&
            (m->compressor_for >= FREEZER1_COMPRESSOR_MIN_OFF)) {
            /* called for */
            m->compressor = (uint8_t)FREEZER1_COMPRESSOR_ON;
            m->compressor_for = 0u;
        }
        break;
    case FREEZER1_COMPRESSOR_ON:
        if ((m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_FAULTY) ||
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_FAULTY) ||
            m->compressor_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->compressor = (uint8_t)FREEZER1_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else if (!(in->hp_switch &&
                     (m->defrost != FREEZER1_DEFROST_RUNNING) &&
                     (m->drip != FREEZER1_DRIP_RUNNING))) {
            /* something other than its operating contact has opened the circuit */
            m->compressor = (uint8_t)FREEZER1_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else if (!compressor_wanted && (m->compressor_for >= FREEZER1_COMPRESSOR_MIN_ON)) {
            /* no longer called for */
            m->compressor = (uint8_t)FREEZER1_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->compressor = (uint8_t)FREEZER1_COMPRESSOR_OFF;
        m->compressor_for = 0u;
        break;
    }
}

/* two fans on the coil */
static void freezer1_coil_fan(struct freezer1 *m, bool coil_fan_wanted)
{
    switch ((enum freezer1_coil_fan)m->coil_fan) {
    case FREEZER1_COIL_FAN_OFF:
        if (coil_fan_wanted && (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_GOOD)) {
            /* called for */
            m->coil_fan = (uint8_t)FREEZER1_COIL_FAN_ON;
        }
        break;
    case FREEZER1_COIL_FAN_ON:
        if ((m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_FAULTY)) {
            /* its safe state is off, before any minimum on time */
            m->coil_fan = (uint8_t)FREEZER1_COIL_FAN_OFF;
        } else if (!coil_fan_wanted) {
            /* no longer called for */
            m->coil_fan = (uint8_t)FREEZER1_COIL_FAN_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->coil_fan = (uint8_t)FREEZER1_COIL_FAN_OFF;
        break;
    }
}

void freezer1_start(struct freezer1 *m, const struct freezer1_remembered *r)
{
    m->room_probe_good_for = 0u;
    m->room_probe_state = (uint8_t)FREEZER1_ROOM_PROBE_STATE_PROVING;
    m->room_probe_state_for = 0u;
    m->room_probe_last = 0u;
    m->room_probe_before = 0u;
    m->coil_probe_good_for = 0u;
    m->coil_probe_state = (uint8_t)FREEZER1_COIL_PROBE_STATE_PROVING;
    m->coil_probe_state_for = 0u;
    m->coil_probe_last = 0u;
    m->coil_probe_before = 0u;
    m->room_stat = (uint8_t)FREEZER1_ROOM_STAT_OPEN;
    m->fan_delay = (uint8_t)FREEZER1_FAN_DELAY_OPEN;
    m->defrost_at = 0u;
    m->defrost_place = 1u;
    m->defrost_awake = false;
    m->defrost = (uint8_t)FREEZER1_DEFROST_IDLE;
    m->defrost_heater = (uint8_t)FREEZER1_DEFROST_HEATER_OFF;
    m->drip = (uint8_t)FREEZER1_DRIP_IDLE;
    m->drip_for = 0u;
    m->compressor = (uint8_t)FREEZER1_COMPRESSOR_OFF;
    m->compressor_for = 0u;
    m->compressor_effect_from = 0u;
    m->compressor_effect_for = 0u;
    m->compressor_no_effect = false;
    m->coil_fan = (uint8_t)FREEZER1_COIL_FAN_OFF;

    if ((r != NULL) && (r->check == freezer1_check_word(r)) && (r->defrost_place <= 16u)) {
        m->defrost_place = r->defrost_place;
    }
}

bool freezer1_remember(const struct freezer1 *m, struct freezer1_remembered *r)
{
    struct freezer1_remembered now;
    bool changed;

    now.defrost_place = m->defrost_place;
    now.check = freezer1_check_word(&now);
    changed = (now.defrost_place != r->defrost_place) || (now.check != r->check);
    *r = now;
    return changed;
}

void freezer1_step(struct freezer1 *m, const struct freezer1_in *in, struct freezer1_out *out)
{
    /* return air: this sample cannot be believed */
    const bool room_probe_bad = (in->room_probe < FREEZER1_ROOM_PROBE_LOWEST) ||
        (in->room_probe > FREEZER1_ROOM_PROBE_HIGHEST);

    if (room_probe_bad) {
        /* a bad sample starts the count again */
        m->room_probe_good_for = 0u;
    } else if (m->room_probe_good_for < FREEZER1_ROOM_PROBE_CLEAR_AFTER) {
        m->room_probe_good_for++;
    } else {
        /* stays */
    }

    freezer1_room_probe_state(m, room_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t room_probe_now = (uint16_t)(room_probe_bad
                                               ? m->room_probe_last : in->room_probe);
    /* the smaller of the two before */
    const uint16_t room_probe_less = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_last : m->room_probe_before);
    /* the larger of the two before */
    const uint16_t room_probe_more = (uint16_t)((m->room_probe_last < m->room_probe_before)
                                                ? m->room_probe_before : m->room_probe_last);
    /* return air: median of three believable samples */
    const uint16_t room_probe_counts = freezer1_clamp_u16(room_probe_now,
                                                          room_probe_less,
                                                          room_probe_more);

    if (!room_probe_bad) {
        m->room_probe_before = m->room_probe_last;
    }

    m->room_probe_last = room_probe_now;

    /* on the coil, at the last row, where the old discs were: this sample cannot be believed */
    const bool coil_probe_bad = (in->coil_probe < FREEZER1_COIL_PROBE_LOWEST) ||
        (in->coil_probe > FREEZER1_COIL_PROBE_HIGHEST);

    if (coil_probe_bad) {
        /* a bad sample starts the count again */
        m->coil_probe_good_for = 0u;
    } else if (m->coil_probe_good_for < FREEZER1_COIL_PROBE_CLEAR_AFTER) {
        m->coil_probe_good_for++;
    } else {
        /* stays */
    }

    freezer1_coil_probe_state(m, coil_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t coil_probe_now = (uint16_t)(coil_probe_bad
                                               ? m->coil_probe_last : in->coil_probe);
    /* the smaller of the two before */
    const uint16_t coil_probe_less = (uint16_t)((m->coil_probe_last < m->coil_probe_before)
                                                ? m->coil_probe_last : m->coil_probe_before);
    /* the larger of the two before */
    const uint16_t coil_probe_more = (uint16_t)((m->coil_probe_last < m->coil_probe_before)
                                                ? m->coil_probe_before : m->coil_probe_last);
    /* on the coil, at the last row, where the old discs were: median of three believable samples */
    const uint16_t coil_probe_counts = freezer1_clamp_u16(coil_probe_now,
                                                          coil_probe_less,
                                                          coil_probe_more);

    if (!coil_probe_bad) {
        m->coil_probe_before = m->coil_probe_last;
    }

    m->coil_probe_last = coil_probe_now;
    freezer1_room_stat(m, room_probe_counts);

    /* vapour-bulb control in the return air: its contact is made */
    const bool room_stat_contact = m->room_stat == FREEZER1_ROOM_STAT_MADE;

    freezer1_fan_delay(m, coil_probe_counts);

    /* disc on the coil, holds the fans back while the coil is warm: its contact is made */
    const bool fan_delay_contact = m->fan_delay == FREEZER1_FAN_DELAY_MADE;

    m->defrost_at = (uint16_t)(
            m->defrost_awake
            ? ((m->defrost_at >= FREEZER1_DEFROST_LAST_STEP)
               ? INT32_C(0) : ((int32_t)m->defrost_at + INT32_C(1)))
            : ((int32_t)m->defrost_place * (int32_t)FREEZER1_DEFROST_PART));
    freezer1_defrost(m, coil_probe_counts);
    m->defrost_place = (uint8_t)((int32_t)m->defrost_at / (int32_t)FREEZER1_DEFROST_PART);
    m->defrost_awake = true;

    /* the old wiring calls for it */
    const bool defrost_heater_wanted = m->defrost == FREEZER1_DEFROST_RUNNING;

    freezer1_defrost_heater(m, defrost_heater_wanted);
    out->defrost_heater = m->defrost_heater == FREEZER1_DEFROST_HEATER_ON;
    freezer1_drip(m, out);

    /* the old wiring calls for it */
    const bool compressor_wanted = room_stat_contact &&
        in->hp_switch &&
        (m->defrost != FREEZER1_DEFROST_RUNNING) &&
        (m->drip != FREEZER1_DRIP_RUNNING);
    /* the temperature has moved as it should */
    const bool compressor_effect_seen = ((int32_t)room_probe_counts -
                                         (int32_t)m->compressor_effect_from) >=
        (int32_t)FREEZER1_COMPRESSOR_EFFECT;

    if ((m->compressor != FREEZER1_COMPRESSOR_ON) || compressor_effect_seen) {
        m->compressor_effect_for = 0u;
    } else if (m->compressor_effect_for < FREEZER1_COMPRESSOR_EFFECT_WITHIN) {
        m->compressor_effect_for++;
    } else {
        /* stays */
    }

    if ((m->compressor != FREEZER1_COMPRESSOR_ON) ||
        compressor_effect_seen ||
        (room_probe_counts < m->compressor_effect_from)) {
        m->compressor_effect_from = room_probe_counts;
    }

    if (m->compressor_effect_for >= FREEZER1_COMPRESSOR_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->compressor_no_effect = true;
    }

    freezer1_compressor(m, in, compressor_wanted);
    out->compressor = m->compressor == FREEZER1_COMPRESSOR_ON;

    /* the old wiring calls for it */
    const bool coil_fan_wanted = fan_delay_contact &&
        (m->defrost != FREEZER1_DEFROST_RUNNING) &&
        (m->drip != FREEZER1_DRIP_RUNNING);

    freezer1_coil_fan(m, coil_fan_wanted);
    out->coil_fan = m->coil_fan == FREEZER1_COIL_FAN_ON;

    uint16_t fault = 0u;

    if (m->room_probe_state == FREEZER1_ROOM_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | FREEZER1_FAULT_ROOM_PROBE);
    }
    if (m->coil_probe_state == FREEZER1_COIL_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | FREEZER1_FAULT_COIL_PROBE);
    }
    if (m->compressor_no_effect) {
        fault = (uint16_t)(fault | FREEZER1_FAULT_COMPRESSOR_NO_EFFECT);
    }
    out->fault = fault;
}
