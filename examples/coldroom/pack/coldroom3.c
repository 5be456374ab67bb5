/* coldroom3.c: control program
 *
 * Equipment: Cold room 3, dispatch
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 7ef342085c70459e6cb29baab250da8c6628f10255a6c73c759f4bacb45db0bc
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - warm_stat: second vapour-bulb control, rings at the gatehouse
 *
 * Stays hard-wired, and must:
 * - defrost_limit: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, spoilage/compressor); 2 danger_without_barrier
 * (act, spoilage/defrost_heater); 3 restarts_by_itself (act, compressor); 4 welded_output (act,
 * compressor); 5 welded_output (act, warm_alarm); 6 earth_fault_bypasses_limit (act, coldroom3); 7
 * moisture_direction (act, room_probe); 8 damp_dust_washdown (act, coldroom3); 9
 * mercury_asbestos_refrigerant (act, room_stat); 10 mercury_asbestos_refrigerant (act, warm_stat);
 * 11 approval_lapses (act, coldroom3); 12 limit_trips_late (act, defrost_limit/spoilage). Not
 * judged, for want of a figure: 3; risks.md says which.
 */
#include "coldroom3.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: highest believable count, about -40 degC (electronics.sensors[0].valid, line 133):
 * thermistor (beta)
 */
#define COLDROOM3_ROOM_PROBE_HIGHEST 3762u
/* counts: lowest believable count, about 60 degC (electronics.sensors[0].valid, line 133):
 * thermistor (beta)
 */
#define COLDROOM3_ROOM_PROBE_LOWEST 488u
/* steps: not good for 2 s (assumed for electronics.sensors[0].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define COLDROOM3_ROOM_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[0].fault_after:
 * common practice): half of ROOM_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define COLDROOM3_ROOM_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[0].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define COLDROOM3_ROOM_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[0].fault_after: common
 * practice): ROOM_PROBE_FAULT_AFTER + ROOM_PROBE_GOOD_RUN
 */
#define COLDROOM3_ROOM_PROBE_PROVE_WITHIN 8u
/* counts: highest believable count, about -40 degC (electronics.sensors[1].valid, line 145):
 * thermistor (beta)
 */
#define COLDROOM3_COIL_PROBE_HIGHEST 3762u
/* counts: lowest believable count, about 60 degC (electronics.sensors[1].valid, line 145):
 * thermistor (beta)
 */
#define COLDROOM3_COIL_PROBE_LOWEST 488u
/* steps: not good for 2 s (assumed for electronics.sensors[1].fault_after: common practice): 2 s /
 * 500 ms a step, rounded up
 */
#define COLDROOM3_COIL_PROBE_FAULT_AFTER 4u
/* steps: good samples in a row that end a doubt (assumed for electronics.sensors[1].fault_after:
 * common practice): half of COIL_PROBE_FAULT_AFTER, at least 4: bad samples oftener than one in so
 * many are found
 */
#define COLDROOM3_COIL_PROBE_GOOD_RUN 4u
/* steps: good for 10 s (assumed for electronics.sensors[1].clear_after: common practice): 10 s /
 * 500 ms a step, rounded up
 */
#define COLDROOM3_COIL_PROBE_CLEAR_AFTER 20u
/* steps: time to prove itself after a start (assumed for electronics.sensors[1].fault_after: common
 * practice): COIL_PROBE_FAULT_AFTER + COIL_PROBE_GOOD_RUN
 */
#define COLDROOM3_COIL_PROBE_PROVE_WITHIN 8u
/* counts: 5 degC (controls[0].makes_at, line 83): 5 degC is 2088.901 counts by thermistor (beta);
 * rounded down: at most 2088, which changes at 4.9978 degC; one count is 0.022 K
 */
#define COLDROOM3_ROOM_STAT_MAKE 2088u
/* counts: 2 degC (controls[0].breaks_at, line 84): 2 degC is 2226.333 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at least 2226, which changes at 2.0072 degC; one count is
 * 0.0217 K; moved by 1 counts, so that the differential is not below the one asked for: 2227, which
 * changes at 1.9855 degC
 */
#define COLDROOM3_ROOM_STAT_BREAK 2227u
/* counts: 7 degC (controls[1].makes_at, line 97): 7 degC is 1998.637 counts by thermistor (beta);
 * rounded down: at most 1998, which changes at 6.9919 degC; one count is 0.0223 K
 */
#define COLDROOM3_WARM_STAT_MAKE 1998u
/* counts: 6 degC (controls[1].breaks_at, line 98): 6 degC is 2043.605 counts by thermistor (beta);
 * rounded down: at least 2044, which changes at 5.9913 degC; one count is 0.0222 K
 */
#define COLDROOM3_WARM_STAT_BREAK 2044u
/* steps: runs for 30 min (timers[0].lasts, line 43): 30 min / 500 ms a step, rounded up */
#define COLDROOM3_DEFROST_LASTS 3600u
/* steps: once in 6 h (timers[0].every, line 42): 6 h / 500 ms a step, rounded up */
#define COLDROOM3_DEFROST_EVERY 43200u
/* steps: last step of a period (timers[0].every, line 42): DEFROST_EVERY - 1 */
#define COLDROOM3_DEFROST_LAST_STEP 43199u
/* counts: 8 degC (timers[0].ends_on, line 44): 8 degC is 1954.036 counts by thermistor (beta);
 * rounded to the nearest edge of a count: at most 1953, which changes at 8.0008 degC; one count is
 * 0.0225 K
 */
#define COLDROOM3_COIL_PROBE_LIMIT 1953u
/* steps: on for at least 2 min (controls[0].min_on, line 88): 2 min / 500 ms a step, rounded up */
#define COLDROOM3_COMPRESSOR_MIN_ON 240u
/* steps: off for at least 5 min (controls[0].min_off, line 89): 5 min / 500 ms a step, rounded up
 */
#define COLDROOM3_COMPRESSOR_MIN_OFF 600u
/* steps: an effect is expected within 59 min 20 s (process.worst.settles_on, line 23): 3 times the
 * slowest expected answer: 3 h × ln((14 K + 1.5 K)/14 K) = 18 min 17 s, and 90 s of dead time and
 * lag; 59 min 20 s / 500 ms a step, rounded up
 */
#define COLDROOM3_COMPRESSOR_EFFECT_WITHIN 7121u
/* counts: 1.5 K towards the set point (process.worst.settles_on, line 23): 0.5 of the differential
 */
#define COLDROOM3_COMPRESSOR_EFFECT 69

/* These do not compile where an assumption of this file does not hold. */
typedef char coldroom3_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char coldroom3_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char coldroom3_room_1[(COLDROOM3_ROOM_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char coldroom3_room_2[(COLDROOM3_ROOM_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char coldroom3_room_3[(COLDROOM3_COIL_PROBE_CLEAR_AFTER <= 255u) ? 1 : -1];
typedef char coldroom3_room_4[(COLDROOM3_COIL_PROBE_PROVE_WITHIN <= 255u) ? 1 : -1];
typedef char coldroom3_room_5[(COLDROOM3_COMPRESSOR_EFFECT_WITHIN <= 65535u) ? 1 : -1];
typedef char coldroom3_room_compressor_for[(COLDROOM3_COMPRESSOR_MIN_OFF <= 65535u) ? 1 : -1];

/* x, held between low and high */
static uint16_t coldroom3_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* return air: is it believed? */
static void coldroom3_room_probe_state(struct coldroom3 *m, bool room_probe_bad)
{
    if (m->room_probe_state_for < COLDROOM3_ROOM_PROBE_PROVE_WITHIN) {
        m->room_probe_state_for++;
    }
    switch ((enum coldroom3_room_probe_state)m->room_probe_state) {
    case COLDROOM3_ROOM_PROBE_STATE_PROVING:
        if (m->room_probe_good_for >= COLDROOM3_ROOM_PROBE_GOOD_RUN) {
            /* proved itself */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= COLDROOM3_ROOM_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case COLDROOM3_ROOM_PROBE_STATE_GOOD:
        if (room_probe_bad) {
            /* a bad sample */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_SUSPECT;
            m->room_probe_state_for = 0u;
        }
        break;
    case COLDROOM3_ROOM_PROBE_STATE_SUSPECT:
        if (m->room_probe_good_for >= COLDROOM3_ROOM_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        } else if (m->room_probe_state_for >= COLDROOM3_ROOM_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_FAULTY;
            m->room_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case COLDROOM3_ROOM_PROBE_STATE_FAULTY:
        if (m->room_probe_good_for >= COLDROOM3_ROOM_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_GOOD;
            m->room_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_FAULTY;
        m->room_probe_state_for = 0u;
        break;
    }
}

/* on the coil, at the last row: is it believed? */
static void coldroom3_coil_probe_state(struct coldroom3 *m, bool coil_probe_bad)
{
    if (m->coil_probe_state_for < COLDROOM3_COIL_PROBE_PROVE_WITHIN) {
        m->coil_probe_state_for++;
    }
    switch ((enum coldroom3_coil_probe_state)m->coil_probe_state) {
    case COLDROOM3_COIL_PROBE_STATE_PROVING:
        if (m->coil_probe_good_for >= COLDROOM3_COIL_PROBE_GOOD_RUN) {
            /* proved itself */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        } else if (m->coil_probe_state_for >= COLDROOM3_COIL_PROBE_PROVE_WITHIN) {
            /* did not prove itself in time */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_FAULTY;
            m->coil_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case COLDROOM3_COIL_PROBE_STATE_GOOD:
        if (coil_probe_bad) {
            /* a bad sample */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_SUSPECT;
            m->coil_probe_state_for = 0u;
        }
        break;
    case COLDROOM3_COIL_PROBE_STATE_SUSPECT:
        if (m->coil_probe_good_for >= COLDROOM3_COIL_PROBE_GOOD_RUN) {
            /* a run of good samples */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        } else if (m->coil_probe_state_for >= COLDROOM3_COIL_PROBE_FAULT_AFTER) {
            /* not good for too long, in whatever mixture */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_FAULTY;
            m->coil_probe_state_for = 0u;
        } else {
            /* stays */
        }
        break;
    case COLDROOM3_COIL_PROBE_STATE_FAULTY:
        if (m->coil_probe_good_for >= COLDROOM3_COIL_PROBE_CLEAR_AFTER) {
            /* good for long enough */
            m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_GOOD;
            m->coil_probe_state_for = 0u;
        }
        break;
    default: /* not a state: memory was upset */
        m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_FAULTY;
        m->coil_probe_state_for = 0u;
        break;
    }
}

/* vapour-bulb control in the return air */
static void coldroom3_room_stat(struct coldroom3 *m, uint16_t room_probe_counts)
{
    switch ((enum coldroom3_room_stat)m->room_stat) {
    case COLDROOM3_ROOM_STAT_OPEN:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts <= COLDROOM3_ROOM_STAT_MAKE)) {
            /* temperature has reached the make */
            m->room_stat = (uint8_t)COLDROOM3_ROOM_STAT_MADE;
        }
        break;
    case COLDROOM3_ROOM_STAT_MADE:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts >= COLDROOM3_ROOM_STAT_BREAK)) {
            /* temperature has reached the break, or the probe is not to be believed */
            m->room_stat = (uint8_t)COLDROOM3_ROOM_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->room_stat = (uint8_t)COLDROOM3_ROOM_STAT_OPEN;
        break;
    }
}

/* second vapour-bulb control, rings at the gatehouse */
static void coldroom3_warm_stat(struct coldroom3 *m, uint16_t room_probe_counts)
{
    switch ((enum coldroom3_warm_stat)m->warm_stat) {
    case COLDROOM3_WARM_STAT_OPEN:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_FAULTY) ||
            (room_probe_counts <= COLDROOM3_WARM_STAT_MAKE)) {
            /* temperature has reached the make, or the probe is not to be believed */
            m->warm_stat = (uint8_t)COLDROOM3_WARM_STAT_MADE;
        }
        break;
    case COLDROOM3_WARM_STAT_MADE:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_GOOD) &&
            (room_probe_counts >= COLDROOM3_WARM_STAT_BREAK)) {
            /* temperature has reached the break */
            m->warm_stat = (uint8_t)COLDROOM3_WARM_STAT_OPEN;
        }
        break;
    default: /* not a state: memory was upset */
        m->warm_stat = (uint8_t)COLDROOM3_WARM_STAT_MADE;
        break;
    }
}

/* defrost clock */
static void coldroom3_defrost(struct coldroom3 *m, uint16_t coil_probe_counts)
{
    switch ((enum coldroom3_defrost)m->defrost) {
    case COLDROOM3_DEFROST_IDLE:
        if (m->defrost_at == 0u) {
            /* its time has come */
            m->defrost = (uint8_t)COLDROOM3_DEFROST_RUNNING;
        }
        break;
    case COLDROOM3_DEFROST_RUNNING:
        if ((m->defrost_at >= COLDROOM3_DEFROST_LASTS) ||
            (coil_probe_counts <= COLDROOM3_COIL_PROBE_LIMIT)) {
            /* has run its time, or was ended */
            m->defrost = (uint8_t)COLDROOM3_DEFROST_IDLE;
        }
        break;
    default: /* not a state: memory was upset */
        m->defrost = (uint8_t)COLDROOM3_DEFROST_IDLE;
        break;
    }
}

/* 2.2 kW compressor through its contactor */
static void coldroom3_compressor(struct coldroom3 *m,
                                 const struct coldroom3_in *in,
                                 bool compressor_wanted)
{
    if (m->compressor_for < COLDROOM3_COMPRESSOR_MIN_OFF) {
        m->compressor_for++;
    }
    switch ((enum coldroom3_compressor)m->compressor) {
    case COLDROOM3_COMPRESSOR_OFF:
        if (compressor_wanted &&
            (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_GOOD) &&
            (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_GOOD) &&
            !m->compressor_no_effect &&
            (m->compressor_for >= COLDROOM3_COMPRESSOR_MIN_OFF)) {
            /* called for */
            m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_ON;
            m->compressor_for = 0u;
        }
        break;
    case COLDROOM3_COMPRESSOR_ON:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_FAULTY) ||
            (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_FAULTY) ||
            m->compressor_no_effect) {
            /* its safe state is off, before any minimum on time */
            m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else if (!(in->hp_switch && (m->defrost != COLDROOM3_DEFROST_RUNNING))) {
            /* something other than its operating contact has opened the circuit */
            m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else if (!compressor_wanted && (m->compressor_for >= COLDROOM3_COMPRESSOR_MIN_ON)) {
            /* no longer called for */
            m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_OFF;
            m->compressor_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_OFF;
        m->compressor_for = 0u;
        break;
    }
}

/* 1.2 kW defrost heater in the coil */
static void coldroom3_defrost_heater(struct coldroom3 *m, bool defrost_heater_wanted)
{
    switch ((enum coldroom3_defrost_heater)m->defrost_heater) {
    case COLDROOM3_DEFROST_HEATER_OFF:
        if (defrost_heater_wanted && (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_GOOD)) {
            /* called for */
            m->defrost_heater = (uint8_t)COLDROOM3_DEFROST_HEATER_ON;
        }
        break;
    case COLDROOM3_DEFROST_HEATER_ON:
        if ((m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_PROVING) ||
            (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_FAULTY)) {
            /* its safe state is off, before any minimum on time */
            m->defrost_heater = (uint8_t)COLDROOM3_DEFROST_HEATER_OFF;
        } else if (!defrost_heater_wanted) {
            /* no longer called for */
            m->defrost_heater = (uint8_t)COLDROOM3_DEFROST_HEATER_OFF;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->defrost_heater = (uint8_t)COLDROOM3_DEFROST_HEATER_OFF;
        break;
    }
}

/* sounder at the gatehouse */
static void coldroom3_warm_alarm(struct coldroom3 *m, bool warm_alarm_wanted)
{
    switch ((enum coldroom3_warm_alarm)m->warm_alarm) {
    case COLDROOM3_WARM_ALARM_OFF:
        if ((m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_PROVING) ||
            (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_FAULTY)) {
            /* its safe state is on */
            m->warm_alarm = (uint8_t)COLDROOM3_WARM_ALARM_ON;
        } else if (warm_alarm_wanted) {
            /* called for */
            m->warm_alarm = (uint8_t)COLDROOM3_WARM_ALARM_ON;
        } else {
            /* stays */
        }
        break;
    case COLDROOM3_WARM_ALARM_ON:
        if (!warm_alarm_wanted && (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_GOOD)) {
            /* no longer called for */
            m->warm_alarm = (uint8_t)COLDROOM3_WARM_ALARM_OFF;
        }
        break;
    default: /* not a state: memory was upset */
        m->warm_alarm = (uint8_t)COLDROOM3_WARM_ALARM_ON;
        break;
    }
}

void coldroom3_start(struct coldroom3 *m, const struct coldroom3_remembered *r)
{
    m->room_probe_good_for = 0u;
    m->room_probe_state = (uint8_t)COLDROOM3_ROOM_PROBE_STATE_PROVING;
    m->room_probe_state_for = 0u;
    m->room_probe_last = 0u;
    m->room_probe_before = 0u;
    m->coil_probe_good_for = 0u;
    m->coil_probe_state = (uint8_t)COLDROOM3_COIL_PROBE_STATE_PROVING;
    m->coil_probe_state_for = 0u;
    m->coil_probe_last = 0u;
    m->coil_probe_before = 0u;
    m->room_stat = (uint8_t)COLDROOM3_ROOM_STAT_OPEN;
    m->warm_stat = (uint8_t)COLDROOM3_WARM_STAT_MADE;
    m->defrost_at = 0u;
    m->defrost = (uint8_t)COLDROOM3_DEFROST_IDLE;
    m->compressor = (uint8_t)COLDROOM3_COMPRESSOR_OFF;
    m->compressor_for = 0u;
    m->compressor_effect_from = 0u;
    m->compressor_effect_for = 0u;
    m->compressor_no_effect = false;
    m->defrost_heater = (uint8_t)COLDROOM3_DEFROST_HEATER_OFF;
    m->warm_alarm = (uint8_t)COLDROOM3_WARM_ALARM_ON;
    (void)r; /* nothing of this program survives a power cut */
}

bool coldroom3_remember(const struct coldroom3 *m, struct coldroom3_remembered *r)
{
    const bool changed = r->check != 23131u;

    (void)m; /* nothing of this program survives a power cut */
    r->check = 23131u;
    return changed;
}

void coldroom3_step(struct coldroom3 *m, const struct coldroom3_in *in, struct coldroom3_out *out)
{
    /* return air: this sample cannot be believed */
    const bool room_probe_bad = (in->room_probe < COLDROOM3_ROOM_PROBE_LOWEST) ||
        (in->room_probe > COLDROOM3_ROOM_PROBE_HIGHEST);

    if (room_probe_bad) {
        /* a bad sample starts the count again */
        m->room_probe_good_for = 0u;
    } else if (m->room_probe_good_for < COLDROOM3_ROOM_PROBE_CLEAR_AFTER) {
        m->room_probe_good_for++;
    } else {
        /* stays */
    }

    coldroom3_room_probe_state(m, room_probe_bad);

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
    const uint16_t room_probe_counts = coldroom3_clamp_u16(room_probe_now,
                                                           room_probe_less,
                                                           room_probe_more);

    if (!room_probe_bad) {
        m->room_probe_before = m->room_probe_last;
    }

    m->room_probe_last = room_probe_now;

    /* on the coil, at the last row: this sample cannot be believed */
    const bool coil_probe_bad = (in->coil_probe < COLDROOM3_COIL_PROBE_LOWEST) ||
        (in->coil_probe > COLDROOM3_COIL_PROBE_HIGHEST);

    if (coil_probe_bad) {
        /* a bad sample starts the count again */
        m->coil_probe_good_for = 0u;
    } else if (m->coil_probe_good_for < COLDROOM3_COIL_PROBE_CLEAR_AFTER) {
        m->coil_probe_good_for++;
    } else {
        /* stays */
    }

    coldroom3_coil_probe_state(m, coil_probe_bad);

    /* this sample, or the last believable one */
    const uint16_t coil_probe_now = (uint16_t)(coil_probe_bad
                                               ? m->coil_probe_last : in->coil_probe);
    /* the smaller of the two before */
    const uint16_t coil_probe_less = (uint16_t)((m->coil_probe_last < m->coil_probe_before)
                                                ? m->coil_probe_last : m->coil_probe_before);
    /* the larger of the two before */
    const uint16_t coil_probe_more = (uint16_t)((m->coil_probe_last < m->coil_probe_before)
                                                ? m->coil_probe_before : m->coil_probe_last);
    /* on the coil, at the last row: median of three believable samples */
    const uint16_t coil_probe_counts = coldroom3_clamp_u16(coil_probe_now,
                                                           coil_probe_less,
                                                           coil_probe_more);

    if (!coil_probe_bad) {
        m->coil_probe_before = m->coil_probe_last;
    }

    m->coil_probe_last = coil_probe_now;
    coldroom3_room_stat(m, room_probe_counts);

    /* vapour-bulb control in the return air: its contact is made */
    const bool room_stat_contact = m->room_stat == COLDROOM3_ROOM_STAT_MADE;

    coldroom3_warm_stat(m, room_probe_counts);

    /* second vapour-bulb control, rings at the gatehouse: its contact is made */
    const bool warm_stat_contact = (m->warm_stat == COLDROOM3_WARM_STAT_MADE) ||
        (m->room_probe_state != COLDROOM3_ROOM_PROBE_STATE_GOOD);

    m->defrost_at = (uint16_t)((m->defrost_at >= COLDROOM3_DEFROST_LAST_STEP)
                               ? INT32_C(0) : ((int32_t)m->defrost_at + INT32_C(1)));
    coldroom3_defrost(m, coil_probe_counts);

    /* the old wiring calls for it */
    const bool compressor_wanted = room_stat_contact &&
        in->hp_switch &&
        (m->defrost != COLDROOM3_DEFROST_RUNNING);
    /* the temperature has moved as it should */
    const bool compressor_effect_seen = ((int32_t)room_probe_counts -
                                         (int32_t)m->compressor_effect_from) >=
        (int32_t)COLDROOM3_COMPRESSOR_EFFECT;

    if ((m->compressor != COLDROOM3_COMPRESSOR_ON) || compressor_effect_seen) {
        m->compressor_effect_for = 0u;
    } else if (m->compressor_effect_for < COLDROOM3_COMPRESSOR_EFFECT_WITHIN) {
        m->compressor_effect_for++;
    } else {
        /* stays */
    }

    if ((m->compressor != COLDROOM3_COMPRESSOR_ON) ||
        compressor_effect_seen ||
        (room_probe_counts < m->compressor_effect_from)) {
        m->compressor_effect_from = room_probe_counts;
    }

    if (m->compressor_effect_for >= COLDROOM3_COMPRESSOR_EFFECT_WITHIN) {
        /* on, and nothing follows: is the probe in its pocket? */
        m->compressor_no_effect = true;
    }

    coldroom3_compressor(m, in, compressor_wanted);
    out->compressor = m->compressor == COLDROOM3_COMPRESSOR_ON;

    /* the old wiring calls for it */
    const bool defrost_heater_wanted = m->defrost == COLDROOM3_DEFROST_RUNNING;

    coldroom3_defrost_heater(m, defrost_heater_wanted);
    out->defrost_heater = m->defrost_heater == COLDROOM3_DEFROST_HEATER_ON;

    /* the old wiring calls for it */
    const bool warm_alarm_wanted = warm_stat_contact;

    coldroom3_warm_alarm(m, warm_alarm_wanted);
    out->warm_alarm = m->warm_alarm == COLDROOM3_WARM_ALARM_ON;

    uint16_t fault = 0u;

    if (m->room_probe_state == COLDROOM3_ROOM_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | COLDROOM3_FAULT_ROOM_PROBE);
    }
    if (m->coil_probe_state == COLDROOM3_COIL_PROBE_STATE_FAULTY) {
        fault = (uint16_t)(fault | COLDROOM3_FAULT_COIL_PROBE);
    }
    if (m->compressor_no_effect) {
        fault = (uint16_t)(fault | COLDROOM3_FAULT_COMPRESSOR_NO_EFFECT);
    }
    out->fault = fault;
}
