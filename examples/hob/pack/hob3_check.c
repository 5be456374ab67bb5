/* hob3_check.c: recorded inputs through the program; runs on any host
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
/* The recorded inputs visit every state and make every transition. */
#include "hob3.h"

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

static void compare_out(const struct hob3_out *got, const struct hob3_out *wanted)
{
    compare("plate", (long)got->plate, (long)wanted->plate);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct hob3 *got, const struct hob3 *wanted)
{
    compare("regulator_dial_lost_for",
            (long)got->regulator_dial_lost_for,
            (long)wanted->regulator_dial_lost_for);
    compare("regulator_at", (long)got->regulator_at, (long)wanted->regulator_at);
    compare("plate", (long)got->plate, (long)wanted->plate);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct hob3_in in;
    struct hob3_out out;
    struct hob3 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u}, {false, 1u}, {20u, 399u, 0u}},
    {1u, {27u}, {false, 1u}, {20u, 399u, 0u}},
    {1u, {28u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {29u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {57u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {96u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {98u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {99u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {100u}, {true, 0u}, {0u, 0u, 1u}},
    /* vector 2 */
    {1u, {100u}, {true, 0u}, {0u, 0u, 1u}},
    {1u, {100u}, {true, 0u}, {0u, 1u, 1u}},
    {8u, {100u}, {true, 0u}, {0u, 9u, 1u}},
    {1u, {100u}, {false, 0u}, {0u, 10u, 0u}},
    {389u, {100u}, {false, 0u}, {0u, 399u, 0u}},
    {1u, {105u}, {true, 0u}, {0u, 0u, 1u}},
    {198u, {664u}, {true, 0u}, {0u, 198u, 1u}},
    {1u, {664u}, {false, 0u}, {0u, 199u, 0u}},
    {88u, {819u}, {true, 0u}, {0u, 287u, 1u}},
    {100u, {957u}, {true, 0u}, {0u, 387u, 1u}},
    {1u, {957u}, {false, 0u}, {0u, 388u, 0u}},
    {1u, {959u}, {true, 0u}, {0u, 389u, 1u}},
    {1u, {959u}, {false, 0u}, {0u, 390u, 0u}},
    {1u, {960u}, {true, 0u}, {0u, 391u, 1u}},
    {1u, {995u}, {true, 0u}, {0u, 392u, 1u}},
    {1u, {996u}, {false, 0u}, {1u, 399u, 0u}},
    {18u, {996u}, {false, 0u}, {19u, 399u, 0u}},
    {400u, {995u}, {true, 0u}, {0u, 399u, 1u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct hob3_remembered record;
};

static const struct vector vectors[] = {
    {0u, 9u, false, {0u}},
    {9u, 27u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct hob3 m;
    struct hob3_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    hob3_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            hob3_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct hob3 fresh =
    {20u, 399u, 0u};

static void start_and_compare(const char *what, const struct hob3_remembered *r,
                              const struct hob3 *wanted)
{
    struct hob3 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    hob3_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct hob3 m;
    struct hob3_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", hob3_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", hob3_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct hob3 m;
    struct hob3_in in;
    struct hob3_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct hob3 after =
           {20u, 399u, 0u};
        static const struct hob3_out wanted =
           {false, 1u};

        doing = "plate upset";
        hob3_start(&m, NULL);
        m.plate = 2u;
        hob3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hob3 after =
           {20u, 399u, 0u};
        static const struct hob3_out wanted =
           {false, 1u};

        doing = "plate upset";
        hob3_start(&m, NULL);
        m.plate = 255u;
        hob3_step(&m, &in, &out);
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
