/* frost7_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Trace heating, fire-water line 7
 * Site: North Yard
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9ff22083946199f7a373bb91fa9f7e5e0217856b9845d445052e08402ec051f5
 *
 * Replaces:
 * - line_stat: capillary stat strapped to the line
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
 * Open findings: 1 danger_without_barrier (act, freezing/tape); 2 frost_load_safe_on (act, tape); 3
 * welded_output (act, tape); 4 probe_out_of_pocket (act, line_stat); 5 moisture_direction (act,
 * line_probe); 6 insulation_of_new_probe (act, line_probe); 7 mercury_asbestos_refrigerant (act,
 * line_stat); 8 approval_lapses (act, frost7).
 */
/* The recorded inputs visit every state and make every transition. */
#include "frost7.h"

#include <stdio.h>
#include <string.h>

/* Inputs held for so many steps; the outputs after each odd and each even step of them; the state
 * after the last.
 */
struct row {
    uint32_t steps;
    struct frost7_in in;
    struct frost7_out odd;
    struct frost7_out even;
    struct frost7 after;
};

static unsigned long passed;
static unsigned long failed;

static void verdict(bool good, const char *what, unsigned long vector, unsigned long row, unsigned long step)
{
    if (good) {
        passed++;
        return;
    }
    failed++;
    if (failed <= 20ul) {
        (void)printf("vector %lu row %lu step %lu: %s differs\n", vector, row, step, what);
    }
}

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u}, {true, 0u}, {true, 0u},
     {0u, 0u, 1u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {6u, {0u}, {true, 0u}, {true, 0u},
     {0u, 0u, 7u, 0u, 0u, 1u, 1u, 7u, 0u, 7u, false}},
    {1u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 0u, 0u, 0u, 1u, 1u, 8u, 0u, 8u, false}},
    {1u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 1u, 0u, 0u, 1u, 1u, 9u, 0u, 9u, false}},
    {7u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 16u, 0u, 16u, false}},
    {1u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 17u, 0u, 17u, false}},
    {103u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 120u, false}},
    {1u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 121u, false}},
    {5317u, {0u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5438u, false}},
    {1u, {0u}, {true, 3u}, {true, 3u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {0u}, {true, 3u}, {true, 3u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {332u}, {true, 3u}, {true, 3u},
     {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {333u}, {true, 3u}, {true, 3u},
     {1u, 3u, 8u, 333u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    /* vector 2 */
    {1u, {333u}, {true, 0u}, {true, 0u},
     {1u, 0u, 1u, 333u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {1u, {333u}, {true, 0u}, {true, 0u},
     {2u, 0u, 2u, 333u, 333u, 1u, 1u, 2u, 333u, 0u, false}},
    {1u, {333u}, {true, 0u}, {true, 0u},
     {3u, 0u, 3u, 333u, 333u, 1u, 1u, 3u, 333u, 1u, false}},
    {1u, {333u}, {true, 0u}, {true, 0u},
     {4u, 1u, 0u, 333u, 333u, 1u, 1u, 4u, 333u, 2u, false}},
    {1u, {333u}, {true, 0u}, {true, 0u},
     {5u, 1u, 1u, 333u, 333u, 1u, 1u, 5u, 333u, 3u, false}},
    {15u, {333u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 333u, 333u, 1u, 1u, 20u, 333u, 18u, false}},
    {1u, {333u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 333u, 333u, 1u, 1u, 21u, 333u, 19u, false}},
    {1u, {334u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 334u, 333u, 1u, 1u, 22u, 333u, 20u, false}},
    {1u, {2142u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 2142u, 334u, 1u, 1u, 23u, 333u, 21u, false}},
    {1u, {2142u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 2142u, 2142u, 1u, 1u, 24u, 2142u, 0u, false}},
    /* vector 3 */
    {2u, {2143u}, {true, 0u}, {true, 0u},
     {2u, 0u, 2u, 2143u, 2143u, 1u, 1u, 2u, 2143u, 0u, false}},
    {1u, {2143u}, {true, 0u}, {true, 0u},
     {3u, 0u, 3u, 2143u, 2143u, 1u, 1u, 3u, 2143u, 1u, false}},
    {1u, {2143u}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 2143u, 2143u, 0u, 0u, 0u, 2143u, 2u, false}},
    {1u, {2143u}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 2143u, 2143u, 0u, 0u, 1u, 2143u, 0u, false}},
    {119u, {2143u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 2143u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    /* vector 4 */
    {3u, {2144u}, {true, 0u}, {true, 0u},
     {3u, 0u, 3u, 2144u, 2144u, 1u, 1u, 3u, 2144u, 1u, false}},
    {1u, {2144u}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 2144u, 2144u, 0u, 0u, 0u, 2144u, 2u, false}},
    {1u, {3808u}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 3808u, 2144u, 0u, 0u, 1u, 2144u, 0u, false}},
    {1u, {3809u}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 3808u, 2144u, 0u, 0u, 2u, 3808u, 0u, false}},
    {1u, {270u}, {false, 0u}, {false, 0u},
     {0u, 2u, 1u, 3808u, 2144u, 0u, 0u, 3u, 3808u, 0u, false}},
    {2u, {270u}, {false, 0u}, {false, 0u},
     {0u, 2u, 3u, 3808u, 2144u, 0u, 0u, 5u, 3808u, 0u, false}},
    {1u, {270u}, {true, 1u}, {true, 1u},
     {0u, 3u, 0u, 3808u, 2144u, 1u, 1u, 0u, 3808u, 0u, false}},
    {1u, {334u}, {true, 1u}, {true, 1u},
     {1u, 3u, 1u, 334u, 3808u, 1u, 1u, 1u, 2144u, 1u, false}},
    {1u, {270u}, {true, 1u}, {true, 1u},
     {0u, 3u, 2u, 334u, 3808u, 1u, 1u, 2u, 334u, 2u, false}},
    {4u, {270u}, {true, 1u}, {true, 1u},
     {0u, 3u, 6u, 334u, 3808u, 1u, 1u, 6u, 334u, 6u, false}},
    {9u, {3809u}, {true, 1u}, {true, 1u},
     {0u, 3u, 8u, 334u, 3808u, 1u, 1u, 15u, 334u, 15u, false}},
    {1u, {399u}, {true, 1u}, {true, 1u},
     {1u, 3u, 8u, 399u, 334u, 1u, 1u, 16u, 334u, 16u, false}},
    {8u, {2143u}, {true, 1u}, {true, 1u},
     {9u, 3u, 8u, 2143u, 2143u, 1u, 1u, 24u, 2143u, 6u, false}},
    {1u, {2142u}, {true, 1u}, {true, 1u},
     {10u, 3u, 8u, 2142u, 2143u, 1u, 1u, 25u, 2143u, 7u, false}},
    {1u, {2008u}, {true, 1u}, {true, 1u},
     {11u, 3u, 8u, 2008u, 2142u, 1u, 1u, 26u, 2142u, 8u, false}},
    {1u, {2143u}, {true, 1u}, {true, 1u},
     {12u, 3u, 8u, 2143u, 2008u, 1u, 1u, 27u, 2142u, 9u, false}},
    {7u, {2143u}, {true, 1u}, {true, 1u},
     {19u, 3u, 8u, 2143u, 2143u, 1u, 1u, 34u, 2142u, 16u, false}},
    {1u, {2142u}, {false, 0u}, {false, 0u},
     {20u, 1u, 0u, 2142u, 2143u, 0u, 0u, 0u, 2142u, 17u, false}},
    {1u, {2008u}, {false, 0u}, {false, 0u},
     {20u, 1u, 1u, 2008u, 2142u, 0u, 0u, 1u, 2142u, 0u, false}},
    {1u, {333u}, {false, 0u}, {false, 0u},
     {20u, 1u, 2u, 333u, 2008u, 0u, 0u, 2u, 2008u, 0u, false}},
    {1u, {334u}, {false, 0u}, {false, 0u},
     {20u, 1u, 3u, 334u, 333u, 1u, 0u, 3u, 334u, 0u, false}},
    {125u, {2143u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 2143u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    {1u, {2142u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 2142u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    {1u, {2008u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 2008u, 2142u, 0u, 0u, 120u, 2142u, 0u, false}},
    {1u, {333u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 333u, 2008u, 0u, 0u, 120u, 2008u, 0u, false}},
    {1u, {334u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 334u, 333u, 1u, 1u, 0u, 334u, 0u, false}},
    {5438u, {333u}, {true, 0u}, {true, 0u},
     {20u, 1u, 8u, 333u, 333u, 1u, 1u, 120u, 333u, 5438u, false}},
    {4u, {333u}, {true, 2u}, {true, 2u},
     {20u, 1u, 8u, 333u, 333u, 1u, 1u, 120u, 333u, 5439u, true}},
    {2u, {2144u}, {true, 2u}, {true, 2u},
     {20u, 1u, 8u, 2144u, 2144u, 0u, 1u, 120u, 2144u, 0u, true}},
    {1u, {3809u}, {true, 2u}, {true, 2u},
     {0u, 2u, 0u, 2144u, 2144u, 0u, 1u, 120u, 2144u, 1u, true}},
    {1u, {2079u}, {true, 2u}, {true, 2u},
     {1u, 2u, 1u, 2079u, 2144u, 0u, 1u, 120u, 2144u, 2u, true}},
    {1u, {333u}, {true, 2u}, {true, 2u},
     {2u, 2u, 2u, 333u, 2079u, 0u, 1u, 120u, 2079u, 3u, true}},
    {1u, {2142u}, {true, 2u}, {true, 2u},
     {3u, 2u, 3u, 2142u, 333u, 0u, 1u, 120u, 2079u, 4u, true}},
    {1u, {3807u}, {true, 2u}, {true, 2u},
     {4u, 1u, 0u, 3807u, 2142u, 0u, 1u, 120u, 2079u, 5u, true}},
    {1u, {333u}, {true, 2u}, {true, 2u},
     {5u, 1u, 1u, 333u, 3807u, 0u, 1u, 120u, 2079u, 6u, true}},
    {1u, {3809u}, {true, 2u}, {true, 2u},
     {0u, 2u, 0u, 333u, 3807u, 1u, 1u, 120u, 333u, 7u, true}},
    {1u, {399u}, {true, 2u}, {true, 2u},
     {1u, 2u, 1u, 399u, 333u, 1u, 1u, 120u, 399u, 0u, true}},
    /* vector 5 */
    {1u, {3807u}, {true, 0u}, {true, 0u},
     {1u, 0u, 1u, 3807u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {2u, {3808u}, {true, 0u}, {true, 0u},
     {3u, 0u, 3u, 3808u, 3808u, 1u, 1u, 3u, 3807u, 1u, false}},
    {2u, {3808u}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 3808u, 3808u, 0u, 0u, 1u, 3808u, 0u, false}},
    {2u, {2007u}, {false, 0u}, {false, 0u},
     {7u, 1u, 3u, 2007u, 2007u, 1u, 0u, 3u, 2007u, 0u, false}},
    {1u, {3807u}, {false, 0u}, {false, 0u},
     {8u, 1u, 4u, 3807u, 2007u, 1u, 0u, 4u, 2007u, 0u, false}},
    {1u, {3809u}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 3807u, 2007u, 1u, 0u, 5u, 3807u, 0u, false}},
    {4u, {2143u}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 2143u, 2143u, 0u, 0u, 9u, 2143u, 0u, false}},
    {1u, {2142u}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 2142u, 2143u, 0u, 0u, 10u, 2143u, 0u, false}},
    {1u, {2211u}, {false, 0u}, {false, 0u},
     {6u, 1u, 2u, 2211u, 2142u, 0u, 0u, 11u, 2143u, 0u, false}},
    {108u, {333u}, {false, 0u}, {false, 0u},
     {20u, 1u, 8u, 333u, 333u, 1u, 0u, 119u, 333u, 0u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct frost7_remembered record;
};

static const struct vector vectors[] = {
    {0u, 13u, false, {0u}},
    {13u, 23u, false, {0u}},
    {23u, 28u, false, {0u}},
    {28u, 65u, false, {0u}},
    {65u, 75u, false, {0u}},
};

static bool same_out(const struct frost7_out *a, const struct frost7_out *b)
{
    return (a->tape == b->tape) &&
           (a->fault == b->fault);
}

static bool same_state(const struct frost7 *a, const struct frost7 *b)
{
    return (a->line_probe_good_for == b->line_probe_good_for) &&
           (a->line_probe_state == b->line_probe_state) &&
           (a->line_probe_state_for == b->line_probe_state_for) &&
           (a->line_probe_last == b->line_probe_last) &&
           (a->line_probe_before == b->line_probe_before) &&
           (a->line_stat == b->line_stat) &&
           (a->tape == b->tape) &&
           (a->tape_for == b->tape_for) &&
           (a->tape_effect_from == b->tape_effect_from) &&
           (a->tape_effect_for == b->tape_effect_for) &&
           (a->tape_no_effect == b->tape_no_effect);
}

static void run(const struct vector *v, unsigned long number)
{
    struct frost7 m;
    struct frost7_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    frost7_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        for (n = 0u; n < rows[i].steps; n++) {
            frost7_step(&m, &rows[i].in, &out);
            verdict(same_out(&out, ((n & 1u) == 0u) ? &rows[i].odd : &rows[i].even), "output", number, (unsigned long)(i - v->first), (unsigned long)n);
        }
        verdict(same_state(&m, &rows[i].after), "state", number, (unsigned long)(i - v->first), (unsigned long)n);
    }
}

static const struct frost7 first = {0u, 0u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, false};

static void records(void)
{
    struct frost7 fresh;
    struct frost7 m;
    struct frost7_remembered r;

    (void)memset(&m, 0x5A, sizeof m);
    (void)memset(&fresh, 0xA5, sizeof fresh);
    frost7_start(&fresh, NULL);
    verdict(same_state(&fresh, &first), "start without a record", 0ul, 0ul, 0ul);

    (void)memset(&r, 0x00, sizeof r);
    frost7_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with a blank record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0xFF, sizeof r);
    frost7_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with an erased record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0, sizeof r);
    verdict(frost7_remember(&fresh, &r), "a new record to write", 0ul, 0ul, 0ul);
    verdict(!frost7_remember(&fresh, &r), "no record to write", 0ul, 0ul, 0ul);
}

static void upset(void)
{
    struct frost7 m;
    struct frost7_in in;
    struct frost7_out out;

    (void)memset(&in, 0, sizeof in);
    frost7_start(&m, NULL);
    m.line_probe_state = 255u;
    frost7_step(&m, &in, &out);
    verdict(m.line_probe_state == (uint8_t)FROST7_LINE_PROBE_STATE_FAULTY, "line_probe_state after an upset", 0ul, 0ul, 0ul);
    frost7_start(&m, NULL);
    m.line_stat = 255u;
    frost7_step(&m, &in, &out);
    verdict(m.line_stat == (uint8_t)FROST7_LINE_STAT_MADE, "line_stat after an upset", 0ul, 0ul, 0ul);
    frost7_start(&m, NULL);
    m.tape = 255u;
    frost7_step(&m, &in, &out);
    verdict(m.tape == (uint8_t)FROST7_TAPE_ON, "tape after an upset", 0ul, 0ul, 0ul);
    (void)m;
    (void)in;
    (void)out;
}

int main(void)
{
    unsigned long i;

    for (i = 0ul; i < (unsigned long)(sizeof vectors / sizeof vectors[0]); i++) {
        run(&vectors[i], i + 1ul);
    }
    records();
    upset();
    (void)printf("%lu passed, %lu failed\n", passed, failed);
    return (failed == 0ul) ? 0 : 1;
}
