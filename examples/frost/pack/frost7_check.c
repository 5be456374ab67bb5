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
 * line_probe); 6 insulation_of_new_probe (act, line_probe); 7 contact_life (act, tape); 8
 * mercury_asbestos_refrigerant (act, line_stat); 9 approval_lapses (act, frost7). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "frost7.h"

#include <stdio.h>
#include <string.h>

/* What has been compared, and where the comparison stands. */
static unsigned long passed;
static unsigned long failed;
static const char *doing = "";
static unsigned long vector_now;
static unsigned long row_now;
static unsigned long step_now;

#define MOST_SHOWN 20ul

static bool bad;

static void compare(const char *what, long got, long wanted)
{
    if (got == wanted) {
        return;
    }
    bad = true;
    if (failed < MOST_SHOWN) {
        (void)printf("%s, vector %lu row %lu step %lu: %s is %ld, wanted %ld\n", doing, vector_now,
                     row_now, step_now, what, got, wanted);
    }
}

static void verdict(void)
{
    if (bad) {
        failed++;
    } else {
        passed++;
    }
    bad = false;
}

static void compare_out(const struct frost7_out *got, const struct frost7_out *wanted)
{
    compare("tape", (long)got->tape, (long)wanted->tape);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct frost7 *got, const struct frost7 *wanted)
{
    compare("line_probe_good_for",
            (long)got->line_probe_good_for,
            (long)wanted->line_probe_good_for);
    compare("line_probe_state", (long)got->line_probe_state, (long)wanted->line_probe_state);
    compare("line_probe_state_for",
            (long)got->line_probe_state_for,
            (long)wanted->line_probe_state_for);
    compare("line_probe_last", (long)got->line_probe_last, (long)wanted->line_probe_last);
    compare("line_probe_before", (long)got->line_probe_before, (long)wanted->line_probe_before);
    compare("line_stat", (long)got->line_stat, (long)wanted->line_stat);
    compare("tape", (long)got->tape, (long)wanted->tape);
    compare("tape_for", (long)got->tape_for, (long)wanted->tape_for);
    compare("tape_effect_from", (long)got->tape_effect_from, (long)wanted->tape_effect_from);
    compare("tape_effect_for", (long)got->tape_effect_for, (long)wanted->tape_effect_for);
    compare("tape_no_effect", (long)got->tape_no_effect, (long)wanted->tape_no_effect);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct frost7_in in;
    struct frost7_out out;
    struct frost7 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u}, {true, 0u}, {0u, 0u, 1u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {6u, {0u}, {true, 0u}, {0u, 0u, 7u, 0u, 0u, 1u, 1u, 7u, 0u, 7u, false}},
    {1u, {0u}, {true, 1u}, {0u, 3u, 0u, 0u, 0u, 1u, 1u, 8u, 0u, 8u, false}},
    {1u, {0u}, {true, 1u}, {0u, 3u, 1u, 0u, 0u, 1u, 1u, 9u, 0u, 9u, false}},
    {7u, {0u}, {true, 1u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 16u, 0u, 16u, false}},
    {1u, {0u}, {true, 1u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 17u, 0u, 17u, false}},
    {103u, {0u}, {true, 1u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 120u, false}},
    {1u, {0u}, {true, 1u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 121u, false}},
    {5317u, {0u}, {true, 1u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5438u, false}},
    {1u, {0u}, {true, 3u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {0u}, {true, 3u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {332u}, {true, 3u}, {0u, 3u, 8u, 0u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    {1u, {333u}, {true, 3u}, {1u, 3u, 8u, 333u, 0u, 1u, 1u, 120u, 0u, 5439u, true}},
    /* vector 2 */
    {1u, {333u}, {true, 0u}, {1u, 0u, 1u, 333u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {1u, {333u}, {true, 0u}, {2u, 0u, 2u, 333u, 333u, 1u, 1u, 2u, 333u, 0u, false}},
    {1u, {333u}, {true, 0u}, {3u, 0u, 3u, 333u, 333u, 1u, 1u, 3u, 333u, 1u, false}},
    {1u, {333u}, {true, 0u}, {4u, 1u, 0u, 333u, 333u, 1u, 1u, 4u, 333u, 2u, false}},
    {1u, {333u}, {true, 0u}, {5u, 1u, 1u, 333u, 333u, 1u, 1u, 5u, 333u, 3u, false}},
    {15u, {333u}, {true, 0u}, {20u, 1u, 8u, 333u, 333u, 1u, 1u, 20u, 333u, 18u, false}},
    {1u, {333u}, {true, 0u}, {20u, 1u, 8u, 333u, 333u, 1u, 1u, 21u, 333u, 19u, false}},
    {1u, {334u}, {true, 0u}, {20u, 1u, 8u, 334u, 333u, 1u, 1u, 22u, 333u, 20u, false}},
    {1u, {2142u}, {true, 0u}, {20u, 1u, 8u, 2142u, 334u, 1u, 1u, 23u, 333u, 21u, false}},
    {1u, {2142u}, {true, 0u}, {20u, 1u, 8u, 2142u, 2142u, 1u, 1u, 24u, 2142u, 0u, false}},
    /* vector 3 */
    {2u, {2143u}, {true, 0u}, {2u, 0u, 2u, 2143u, 2143u, 1u, 1u, 2u, 2143u, 0u, false}},
    {1u, {2143u}, {true, 0u}, {3u, 0u, 3u, 2143u, 2143u, 1u, 1u, 3u, 2143u, 1u, false}},
    {1u, {2143u}, {false, 0u}, {4u, 1u, 0u, 2143u, 2143u, 0u, 0u, 0u, 2143u, 2u, false}},
    {1u, {2143u}, {false, 0u}, {5u, 1u, 1u, 2143u, 2143u, 0u, 0u, 1u, 2143u, 0u, false}},
    {119u, {2143u}, {false, 0u}, {20u, 1u, 8u, 2143u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    /* vector 4 */
    {3u, {2144u}, {true, 0u}, {3u, 0u, 3u, 2144u, 2144u, 1u, 1u, 3u, 2144u, 1u, false}},
    {1u, {2144u}, {false, 0u}, {4u, 1u, 0u, 2144u, 2144u, 0u, 0u, 0u, 2144u, 2u, false}},
    {1u, {3808u}, {false, 0u}, {5u, 1u, 1u, 3808u, 2144u, 0u, 0u, 1u, 2144u, 0u, false}},
    {1u, {3809u}, {false, 0u}, {0u, 2u, 0u, 3808u, 2144u, 0u, 0u, 2u, 3808u, 0u, false}},
    {1u, {270u}, {false, 0u}, {0u, 2u, 1u, 3808u, 2144u, 0u, 0u, 3u, 3808u, 0u, false}},
    {2u, {270u}, {false, 0u}, {0u, 2u, 3u, 3808u, 2144u, 0u, 0u, 5u, 3808u, 0u, false}},
    {1u, {270u}, {true, 1u}, {0u, 3u, 0u, 3808u, 2144u, 1u, 1u, 0u, 3808u, 0u, false}},
    {1u, {334u}, {true, 1u}, {1u, 3u, 1u, 334u, 3808u, 1u, 1u, 1u, 2144u, 1u, false}},
    {1u, {270u}, {true, 1u}, {0u, 3u, 2u, 334u, 3808u, 1u, 1u, 2u, 334u, 2u, false}},
    {4u, {270u}, {true, 1u}, {0u, 3u, 6u, 334u, 3808u, 1u, 1u, 6u, 334u, 6u, false}},
    {9u, {3809u}, {true, 1u}, {0u, 3u, 8u, 334u, 3808u, 1u, 1u, 15u, 334u, 15u, false}},
    {1u, {399u}, {true, 1u}, {1u, 3u, 8u, 399u, 334u, 1u, 1u, 16u, 334u, 16u, false}},
    {8u, {2143u}, {true, 1u}, {9u, 3u, 8u, 2143u, 2143u, 1u, 1u, 24u, 2143u, 6u, false}},
    {1u, {2142u}, {true, 1u}, {10u, 3u, 8u, 2142u, 2143u, 1u, 1u, 25u, 2143u, 7u, false}},
    {1u, {2008u}, {true, 1u}, {11u, 3u, 8u, 2008u, 2142u, 1u, 1u, 26u, 2142u, 8u, false}},
    {1u, {2143u}, {true, 1u}, {12u, 3u, 8u, 2143u, 2008u, 1u, 1u, 27u, 2142u, 9u, false}},
    {7u, {2143u}, {true, 1u}, {19u, 3u, 8u, 2143u, 2143u, 1u, 1u, 34u, 2142u, 16u, false}},
    {1u, {2142u}, {false, 0u}, {20u, 1u, 0u, 2142u, 2143u, 0u, 0u, 0u, 2142u, 17u, false}},
    {1u, {2008u}, {false, 0u}, {20u, 1u, 1u, 2008u, 2142u, 0u, 0u, 1u, 2142u, 0u, false}},
    {1u, {333u}, {false, 0u}, {20u, 1u, 2u, 333u, 2008u, 0u, 0u, 2u, 2008u, 0u, false}},
    {1u, {334u}, {false, 0u}, {20u, 1u, 3u, 334u, 333u, 1u, 0u, 3u, 334u, 0u, false}},
    {125u, {2143u}, {false, 0u}, {20u, 1u, 8u, 2143u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    {1u, {2142u}, {false, 0u}, {20u, 1u, 8u, 2142u, 2143u, 0u, 0u, 120u, 2143u, 0u, false}},
    {1u, {2008u}, {false, 0u}, {20u, 1u, 8u, 2008u, 2142u, 0u, 0u, 120u, 2142u, 0u, false}},
    {1u, {333u}, {false, 0u}, {20u, 1u, 8u, 333u, 2008u, 0u, 0u, 120u, 2008u, 0u, false}},
    {1u, {334u}, {true, 0u}, {20u, 1u, 8u, 334u, 333u, 1u, 1u, 0u, 334u, 0u, false}},
    {5438u, {333u}, {true, 0u}, {20u, 1u, 8u, 333u, 333u, 1u, 1u, 120u, 333u, 5438u, false}},
    {4u, {333u}, {true, 2u}, {20u, 1u, 8u, 333u, 333u, 1u, 1u, 120u, 333u, 5439u, true}},
    {2u, {2144u}, {true, 2u}, {20u, 1u, 8u, 2144u, 2144u, 0u, 1u, 120u, 2144u, 0u, true}},
    {1u, {3809u}, {true, 2u}, {0u, 2u, 0u, 2144u, 2144u, 0u, 1u, 120u, 2144u, 1u, true}},
    {1u, {2079u}, {true, 2u}, {1u, 2u, 1u, 2079u, 2144u, 0u, 1u, 120u, 2144u, 2u, true}},
    {1u, {333u}, {true, 2u}, {2u, 2u, 2u, 333u, 2079u, 0u, 1u, 120u, 2079u, 3u, true}},
    {1u, {2142u}, {true, 2u}, {3u, 2u, 3u, 2142u, 333u, 0u, 1u, 120u, 2079u, 4u, true}},
    {1u, {3807u}, {true, 2u}, {4u, 1u, 0u, 3807u, 2142u, 0u, 1u, 120u, 2079u, 5u, true}},
    {1u, {333u}, {true, 2u}, {5u, 1u, 1u, 333u, 3807u, 0u, 1u, 120u, 2079u, 6u, true}},
    {1u, {3809u}, {true, 2u}, {0u, 2u, 0u, 333u, 3807u, 1u, 1u, 120u, 333u, 7u, true}},
    {1u, {399u}, {true, 2u}, {1u, 2u, 1u, 399u, 333u, 1u, 1u, 120u, 399u, 0u, true}},
    /* vector 5 */
    {1u, {3807u}, {true, 0u}, {1u, 0u, 1u, 3807u, 0u, 1u, 1u, 1u, 0u, 1u, false}},
    {2u, {3808u}, {true, 0u}, {3u, 0u, 3u, 3808u, 3808u, 1u, 1u, 3u, 3807u, 1u, false}},
    {2u, {3808u}, {false, 0u}, {5u, 1u, 1u, 3808u, 3808u, 0u, 0u, 1u, 3808u, 0u, false}},
    {2u, {2007u}, {false, 0u}, {7u, 1u, 3u, 2007u, 2007u, 1u, 0u, 3u, 2007u, 0u, false}},
    {1u, {3807u}, {false, 0u}, {8u, 1u, 4u, 3807u, 2007u, 1u, 0u, 4u, 2007u, 0u, false}},
    {1u, {3809u}, {false, 0u}, {0u, 2u, 0u, 3807u, 2007u, 1u, 0u, 5u, 3807u, 0u, false}},
    {4u, {2143u}, {false, 0u}, {4u, 1u, 0u, 2143u, 2143u, 0u, 0u, 9u, 2143u, 0u, false}},
    {1u, {2142u}, {false, 0u}, {5u, 1u, 1u, 2142u, 2143u, 0u, 0u, 10u, 2143u, 0u, false}},
    {1u, {2211u}, {false, 0u}, {6u, 1u, 2u, 2211u, 2142u, 0u, 0u, 11u, 2143u, 0u, false}},
    {108u, {333u}, {false, 0u}, {20u, 1u, 8u, 333u, 333u, 1u, 0u, 119u, 333u, 0u, false}},
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

static void run(const struct vector *v)
{
    struct frost7 m;
    struct frost7_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    frost7_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            frost7_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct frost7 fresh =
    {0u, 0u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, false};

static void start_and_compare(const char *what, const struct frost7_remembered *r,
                              const struct frost7 *wanted)
{
    struct frost7 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    frost7_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct frost7 m;
    struct frost7_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", frost7_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", frost7_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct frost7 m;
    struct frost7_in in;
    struct frost7_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct frost7 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false};
        static const struct frost7_out wanted =
           {true, 1u};

        doing = "line_probe_state upset";
        frost7_start(&m, NULL);
        m.line_probe_state = 4u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct frost7 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false};
        static const struct frost7_out wanted =
           {true, 1u};

        doing = "line_probe_state upset";
        frost7_start(&m, NULL);
        m.line_probe_state = 255u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct frost7 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false};
        static const struct frost7_out wanted =
           {true, 0u};

        doing = "line_stat upset";
        frost7_start(&m, NULL);
        m.line_stat = 2u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct frost7 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 1u, 1u, 0u, 1u, false};
        static const struct frost7_out wanted =
           {true, 0u};

        doing = "line_stat upset";
        frost7_start(&m, NULL);
        m.line_stat = 255u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct frost7 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, false};
        static const struct frost7_out wanted =
           {true, 0u};

        doing = "tape upset";
        frost7_start(&m, NULL);
        m.tape = 2u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct frost7 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, false};
        static const struct frost7_out wanted =
           {true, 0u};

        doing = "tape upset";
        frost7_start(&m, NULL);
        m.tape = 255u;
        frost7_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
}

int main(void)
{
    uint32_t i;

    doing = "recorded inputs";
    for (i = 0u; i < (uint32_t)(sizeof vectors / sizeof vectors[0]); i++) {
        vector_now = (unsigned long)i + 1ul;
        run(&vectors[i]);
    }
    vector_now = 0ul;
    row_now = 0ul;
    step_now = 0ul;
    records();
    upset();
    (void)printf("%lu passed, %lu failed\n", passed, failed);
    return (failed == 0ul) ? 0 : 1;
}
