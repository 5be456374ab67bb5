/* tank1.c: control program
 *
 * Equipment: Tank 1, laundry
 * Site: Harbour Lane
 * Printed by makebreak 0.0.0 from sheet.yaml
 * Sheet SHA-256: 0123456789abcdef
 *
 * Replaces:
 * - tank_stat: rod stat
 * - high_limit: capillary limit, manual reset
 *
 * Stays hard-wired, and must:
 * - second_limit: in a pocket of its own, cuts the contactor
 *
 * Independent hardware limits stay in place, hard-wired.
 */
#include "tank1.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
/* counts: about 150 degC, a short beyond it (electronics.sensors[0].valid) */
#define TANK1_PROBE_LOWEST 81u
/* counts: about -44 degC, a broken wire beyond it (electronics.sensors[0].valid) */
#define TANK1_PROBE_HIGHEST 4019u
/* steps: 500 ms (assumed for electronics.sensors[0].fault_after: common practice): 500 ms / 250 ms
 */
#define TANK1_PROBE_SETTLED 2u
#define TANK1_HIGH_LIMIT_BREAK 404u /* counts: 85 degC (controls[1].set_point) */
#define TANK1_HIGH_LIMIT_REARM 609u /* counts: 70 degC (controls[1].reset_below) */
#define TANK1_TANK_STAT_MAKE 894u /* counts: 58.5 degC (controls[0].set_point) */
#define TANK1_TANK_STAT_BREAK 806u /* counts: 61.5 degC (controls[0].set_point) */
#define TANK1_HEATER_MIN_ON 120u /* steps: 30 s (controls[0].min_on): 30 s / 250 ms */
#define TANK1_HEATER_MIN_OFF 240u /* steps: 60 s (controls[0].min_off): 60 s / 250 ms */

/* These do not compile where an assumption of this file does not hold. */
typedef char tank1_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char tank1_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];
typedef char tank1_room_probe_since[(TANK1_PROBE_SETTLED <= 255u) ? 1 : -1];
typedef char tank1_room_heater_for[(TANK1_HEATER_MIN_OFF <= 255u) ? 1 : -1];

/* Check word of a record. It starts from a number that belongs to records of this program alone; no
 * blank record has it.
 */
static uint16_t tank1_check_word(const struct tank1_remembered *r)
{
    uint16_t word = 44921u;

    word = (uint16_t)(((word * 31u) + r->high_limit) & 0xFFFFu);
    return word;
}

/* capillary limit: latched cut-out */
static void tank1_high_limit(struct tank1 *m, const struct tank1_in *in, bool probe_bad)
{
    switch ((enum tank1_high_limit)m->high_limit) {
    case TANK1_HIGH_LIMIT_CLOSED:
        if (!probe_bad && (in->tank_probe <= TANK1_HIGH_LIMIT_BREAK)) {
            /* too hot */
            m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_TRIPPED;
        }
        break;
    case TANK1_HIGH_LIMIT_TRIPPED:
        if (in->high_limit_reset &&
            !m->reset_before &&
            !probe_bad &&
            m->probe_good &&
            (in->tank_probe >= TANK1_HIGH_LIMIT_REARM)) {
            /* button newly pressed, and cool enough */
            m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_CLOSED;
        }
        break;
    default: /* not a state: memory was upset */
        m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_TRIPPED;
        break;
    }
}

/* 9 kW immersion heater */
static void tank1_heater(struct tank1 *m, const struct tank1_in *in)
{
    if (m->heater_for < TANK1_HEATER_MIN_OFF) {
        m->heater_for++;
    }
    switch ((enum tank1_heater)m->heater) {
    case TANK1_HEATER_OFF:
        if ((m->high_limit == TANK1_HIGH_LIMIT_CLOSED) &&
            m->probe_good &&
            (in->tank_probe >= TANK1_TANK_STAT_MAKE) &&
            (m->heater_for >= TANK1_HEATER_MIN_OFF)) {
            /* cold */
            m->heater = (uint8_t)TANK1_HEATER_ON;
            m->heater_for = 0u;
        }
        break;
    case TANK1_HEATER_ON:
        if ((m->high_limit == TANK1_HIGH_LIMIT_TRIPPED) || !m->probe_good) {
            /* safety comes before the minimum on time */
            m->heater = (uint8_t)TANK1_HEATER_OFF;
            m->heater_for = 0u;
        } else if ((in->tank_probe <= TANK1_TANK_STAT_BREAK) &&
                   (m->heater_for >= TANK1_HEATER_MIN_ON)) {
            /* warm */
            m->heater = (uint8_t)TANK1_HEATER_OFF;
            m->heater_for = 0u;
        } else {
            /* stays */
        }
        break;
    default: /* not a state: memory was upset */
        m->heater = (uint8_t)TANK1_HEATER_OFF;
        m->heater_for = 0u;
        break;
    }
}

void tank1_start(struct tank1 *m, const struct tank1_remembered *r)
{
    m->probe_good = false;
    m->probe_since = 0u;
    m->high_limit = (uint8_t)TANK1_HIGH_LIMIT_TRIPPED;
    m->reset_before = true;
    m->heater = (uint8_t)TANK1_HEATER_OFF;
    m->heater_for = 0u;

    if ((r != NULL) && (r->check == tank1_check_word(r)) && (r->high_limit <= 1u)) {
        m->high_limit = r->high_limit;
    }
}

bool tank1_remember(const struct tank1 *m, struct tank1_remembered *r)
{
    struct tank1_remembered now;
    bool changed;

    now.high_limit = m->high_limit;
    now.check = tank1_check_word(&now);
    changed = (now.high_limit != r->high_limit) || (now.check != r->check);
    *r = now;
    return changed;
}

void tank1_step(struct tank1 *m, const struct tank1_in *in, struct tank1_out *out)
{
    /* this sample cannot be believed */
    const bool probe_bad = (in->tank_probe < TANK1_PROBE_LOWEST) ||
        (in->tank_probe > TANK1_PROBE_HIGHEST);

    if (probe_bad != m->probe_good) {
        /* as it was */
        m->probe_since = 0u;
    } else if (m->probe_since < TANK1_PROBE_SETTLED) {
        m->probe_since++;
    } else {
        /* stays */
    }

    if (m->probe_since >= TANK1_PROBE_SETTLED) {
        /* has been so for long enough */
        m->probe_good = !probe_bad;
    }

    tank1_high_limit(m, in, probe_bad);
    m->reset_before = in->high_limit_reset;
    tank1_heater(m, in);
    out->heater = m->heater == TANK1_HEATER_ON;

    uint16_t fault = 0u;

    if (!m->probe_good) {
        fault = (uint16_t)(fault | TANK1_FAULT_TANK_PROBE);
    }
    if (m->high_limit == TANK1_HIGH_LIMIT_TRIPPED) {
        fault = (uint16_t)(fault | TANK1_FAULT_HIGH_LIMIT);
    }
    out->fault = fault;
}
