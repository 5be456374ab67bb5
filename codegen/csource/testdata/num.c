/* num.c: control program
 *
 * Equipment:
 * Printed by makebreak from
 * Sheet SHA-256:
 *
 */
#include "num.h"

#include <stddef.h>

/* Constants. What the program below can reach was worked out for these values: after a change in
 * the plant, change the sheet and print the program anew.
 */
#define NUM_LONG UINT32_C(70000) /* steps: more than 16 bits (test) */
#define NUM_COLD (-250) /* 0.1 degC: -25 degC (test) */
#define NUM_WARM 600 /* 0.1 degC: 60 degC (test) */
#define NUM_GAIN 31 /* 1: 31 (test) */

/* These do not compile where an assumption of this file does not hold. */
typedef char num_int_has_16_bits[(((unsigned)-1) >= 0xFFFFu) ? 1 : -1];
typedef char num_division_cuts_off_towards_zero[(((-7) / 2) == -3) ? 1 : -1];

/* Tables. A board that keeps constants in a memory of their own says on the compiler's command
 * line, or in a header that it includes, where a table goes (NUM_FLASH) and how an entry is read
 * (the others, by its type). Elsewhere they are ordinary constants.
 */
#ifndef NUM_FLASH
#define NUM_FLASH
#endif
#ifndef NUM_READ_U16
#define NUM_READ_U16(entry) (entry)
#endif
#ifndef NUM_READ_I16
#define NUM_READ_I16(entry) (entry)
#endif
#ifndef NUM_READ_I32
#define NUM_READ_I32(entry) (entry)
#endif

/* counts to tenths of a degree (0.1 degC): thermistor; straight between the points, the end values
 * beyond them
 */
static const uint16_t num_curve_x[5] NUM_FLASH = {
    80u, 400u, 1200u, 2900u, 4020u
};
static const int16_t num_curve_y[5] NUM_FLASH = {
    1501, 851, 462, 63, -439
};

static int16_t num_curve(uint16_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= NUM_READ_U16(num_curve_x[0])) {
        return NUM_READ_I16(num_curve_y[0]);
    }
    if (x >= NUM_READ_U16(num_curve_x[4])) {
        return NUM_READ_I16(num_curve_y[4]);
    }
    while (x > NUM_READ_U16(num_curve_x[i])) {
        i++;
    }
    x0 = (int32_t)NUM_READ_U16(num_curve_x[i - 1u]);
    y0 = (int32_t)NUM_READ_I16(num_curve_y[i - 1u]);
    return (int16_t)(
            y0 +
            ((((int32_t)NUM_READ_I16(num_curve_y[i]) - y0) * ((int32_t)x - x0)) /
             ((int32_t)NUM_READ_U16(num_curve_x[i]) - x0)));
}

/* tenths to power; straight between the points, the end values beyond them */
static const int32_t num_wide_x[3] NUM_FLASH = {
    (-INT32_C(40000)), INT32_C(0), INT32_C(40000)
};
static const uint16_t num_wide_y[3] NUM_FLASH = {
    0u, 50000u, 35000u
};

static uint16_t num_wide(int32_t x)
{
    uint8_t i = 1u;
    int32_t x0;
    int32_t y0;

    if (x <= (int32_t)NUM_READ_I32(num_wide_x[0])) {
        return NUM_READ_U16(num_wide_y[0]);
    }
    if (x >= (int32_t)NUM_READ_I32(num_wide_x[2])) {
        return NUM_READ_U16(num_wide_y[2]);
    }
    while (x > (int32_t)NUM_READ_I32(num_wide_x[i])) {
        i++;
    }
    x0 = (int32_t)NUM_READ_I32(num_wide_x[i - 1u]);
    y0 = (int32_t)NUM_READ_U16(num_wide_y[i - 1u]);
    return (uint16_t)(
            y0 +
            ((((int32_t)NUM_READ_U16(num_wide_y[i]) - y0) * (x - x0)) /
             ((int32_t)NUM_READ_I32(num_wide_x[i]) - x0)));
}

/* x, held between low and high */
static uint16_t num_clamp_u16(uint16_t x, uint16_t low, uint16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int16_t num_clamp_i16(int16_t x, int16_t low, int16_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* x, held between low and high */
static int32_t num_clamp_i32(int32_t x, int32_t low, int32_t high)
{
    if (x < low) {
        return low;
    }
    return (x > high) ? high : x;
}

/* y, moved towards x by the n-th part of the way */
static int32_t num_toward_i32(int32_t y, int32_t x, int32_t n)
{
    return y + ((x - y) / n);
}

/* Check word of a record. It starts from a number that belongs to records of this program alone; no
 * blank record has it.
 */
static uint16_t num_check_word(const struct num_remembered *r)
{
    uint16_t word = 61841u;

    word = (uint16_t)(((word * 31u) + ((uint32_t)r->small & UINT32_C(0xFFFF))) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + (uint16_t)((uint32_t)r->large >> 16)) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + (uint16_t)((uint32_t)r->large & UINT32_C(0xFFFF))) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + ((uint32_t)r->middle & UINT32_C(0xFFFF))) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + (uint16_t)((uint32_t)r->deep >> 16)) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + (uint16_t)((uint32_t)r->deep & UINT32_C(0xFFFF))) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + r->steady) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + r->flag) & 0xFFFFu);
    word = (uint16_t)(((word * 31u) + r->mode) & 0xFFFFu);
    return word;
}

/* which way it goes */
static void num_mode(struct num *m, uint8_t next, int16_t temperature)
{
    switch ((enum num_mode)m->mode) {
    case NUM_MODE_LOW:
        if (next == NUM_MODE_HIGH) {
            /* asked for high */
            m->mode = (uint8_t)NUM_MODE_HIGH;
        }
        break;
    case NUM_MODE_MIDDLE:
        if (next != m->mode) {
            /* asked for something else */
            m->mode = (uint8_t)NUM_MODE_LOW;
        }
        break;
    case NUM_MODE_HIGH:
        if (((int32_t)temperature * (int32_t)temperature) >= INT32_C(90000)) {
            /* warm enough */
            m->mode = (uint8_t)NUM_MODE_MIDDLE;
        } else {
            /* at any rate */
            m->mode = (uint8_t)NUM_MODE_MIDDLE;
        }
        break;
    default: /* not a state: memory was upset */
        m->mode = (uint8_t)NUM_MODE_MIDDLE;
        break;
    }
}

void num_start(struct num *m, const struct num_remembered *r)
{
    m->small = 0;
    m->large = 0u;
    m->middle = 0;
    m->deep = INT32_C(0);
    m->steady = 0u;
    m->flag = false;
    m->mode = (uint8_t)NUM_MODE_MIDDLE;
    m->since = 0u;

    if ((r != NULL) &&
        (r->check == num_check_word(r)) &&
        (r->small >= -100) &&
        (r->small <= 100) &&
        (r->large <= UINT32_C(1000000)) &&
        (r->middle >= -30000) &&
        (r->middle <= 30000) &&
        (r->deep >= (-INT32_C(2000000000))) &&
        (r->deep <= INT32_C(2000000000)) &&
        (r->flag <= 1u) &&
        (r->mode <= 2u)) {
        m->small = r->small;
        m->large = r->large;
        m->middle = r->middle;
        m->deep = r->deep;
        m->steady = r->steady;
        m->flag = (r->flag != 0u);
        m->mode = r->mode;
    }
}

bool num_remember(const struct num *m, struct num_remembered *r)
{
    struct num_remembered now;
    bool changed;

    now.small = m->small;
    now.large = m->large;
    now.middle = m->middle;
    now.deep = m->deep;
    now.steady = m->steady;
    now.flag = (uint8_t)(m->flag ? 1u : 0u);
    now.mode = m->mode;
    now.check = num_check_word(&now);
    changed = (now.small != r->small) ||
        (now.large != r->large) ||
        (now.middle != r->middle) ||
        (now.deep != r->deep) ||
        (now.steady != r->steady) ||
        (now.flag != r->flag) ||
        (now.mode != r->mode) ||
        (now.check != r->check);
    *r = now;
    return changed;
}

void num_step(struct num *m, const struct num_in *in, struct num_out *out)
{
    /* number temperature */
    const int16_t temperature = num_curve(in->count);
    /* number power */
    const uint16_t power = num_wide((int32_t)in->degrees + (int32_t)temperature);
    /* number narrow_sum */
    const int16_t narrow_sum = (int16_t)((num_clamp_i16(in->degrees, -100, 100) * NUM_GAIN) +
                                         temperature);

    m->small = (int8_t)num_clamp_i16((int16_t)(m->small + (in->up ? 3 : (-2))), -100, 100);

    if (in->up != in->down) {
        m->large = (uint32_t)(
                ((int32_t)in->count * (int32_t)num_clamp_u16(in->other, 1u, 30000u)) /
                INT32_C(2000));
    }

    m->middle = (int16_t)num_toward_i32((int32_t)m->middle,
                                        (int32_t)num_clamp_i16(in->degrees, -30000, 30000),
                                        INT32_C(7));
    m->deep = ((int32_t)in->degrees * INT32_C(60000)) - (int32_t)power;
    m->steady = num_clamp_u16(in->count, m->steady, in->other);

    if ((in->degrees > NUM_WARM) || (narrow_sum < NUM_COLD)) {
        m->flag = !m->flag;
    }

    if (in->up && in->down) {
        /* both at once */
        m->since = 0u;
    } else if (!(m->flag || (m->small < (-90))) && (m->since < NUM_LONG)) {
        m->since++;
    } else {
        /* stays */
    }

    /* where it would go */
    const uint8_t next = (uint8_t)((m->small >= 50)
                                   ? (uint8_t)NUM_MODE_HIGH
                                   : (uint8_t)(in->down ? (uint8_t)NUM_MODE_LOW : m->mode));

    num_mode(m, next, temperature);
    out->valve = (uint16_t)num_clamp_i32((int32_t)power / INT32_C(40), INT32_C(0), INT32_C(1000));
    out->offset = (int16_t)(m->small / 2);
    out->direction = m->mode;

    uint16_t alarms = 0u;

    if (m->large > UINT32_C(500000)) {
        alarms = (uint16_t)(alarms | NUM_ALARMS_FAR);
    }
    if ((m->middle < m->small) == m->flag) {
        alarms = (uint16_t)(alarms | NUM_ALARMS_ODD);
    }
    if (num_toward_i32(m->deep, (int32_t)power, INT32_C(3)) < (-INT32_C(1000000))) {
        alarms = (uint16_t)(alarms | NUM_ALARMS_DEEP);
    }
    if (m->since >= NUM_LONG) {
        alarms = (uint16_t)(alarms | NUM_ALARMS_LATE);
    }
    out->alarms = alarms;
}
