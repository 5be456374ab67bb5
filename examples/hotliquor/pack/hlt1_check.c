/* hlt1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Hot-liquor tank 1, brewhouse
 * Site: Quayside Brewery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 578850f718fbb5826141e839c71ef53b44ecfcb9f5166c7575dad1c350269f46
 *
 * Replaces:
 * - liquor_stat: capillary stat, its bulb in the pocket half way up
 *
 * Stays hard-wired, and must:
 * - tank_limit: capillary limit in a pocket of its own, manual reset
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
 * Open findings: 1 earth_fault_bypasses_limit (act, hlt1); 2 probe_out_of_pocket (act,
 * liquor_stat); 3 damp_dust_washdown (act, hlt1); 4 contact_life (act, elements); 5
 * scald_and_storage (act, liquor_stat); 6 model_beyond_evidence (act, hlt1); 7
 * mercury_asbestos_refrigerant (act, liquor_stat); 8 approval_lapses (act, hlt1); 9
 * overshoot_not_determined (act, tank_limit/boiling). Not judged, for want of a figure: 1; risks.md
 * says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "hlt1.h"

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

static void compare_out(const struct hlt1_out *got, const struct hlt1_out *wanted)
{
    compare("elements", (long)got->elements, (long)wanted->elements);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct hlt1 *got, const struct hlt1 *wanted)
{
    compare("liquor_probe_good_for",
            (long)got->liquor_probe_good_for,
            (long)wanted->liquor_probe_good_for);
    compare("liquor_probe_state", (long)got->liquor_probe_state, (long)wanted->liquor_probe_state);
    compare("liquor_probe_state_for",
            (long)got->liquor_probe_state_for,
            (long)wanted->liquor_probe_state_for);
    compare("liquor_probe_last", (long)got->liquor_probe_last, (long)wanted->liquor_probe_last);
    compare("liquor_probe_before",
            (long)got->liquor_probe_before,
            (long)wanted->liquor_probe_before);
    compare("liquor_stat", (long)got->liquor_stat, (long)wanted->liquor_stat);
    compare("elements", (long)got->elements, (long)wanted->elements);
    compare("elements_apart_for", (long)got->elements_apart_for, (long)wanted->elements_apart_for);
    compare("elements_welded", (long)got->elements_welded, (long)wanted->elements_welded);
    compare("elements_effect_from",
            (long)got->elements_effect_from,
            (long)wanted->elements_effect_from);
    compare("elements_effect_for",
            (long)got->elements_effect_for,
            (long)wanted->elements_effect_for);
    compare("elements_no_effect", (long)got->elements_no_effect, (long)wanted->elements_no_effect);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct hlt1_in in;
    struct hlt1_out out;
    struct hlt1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u, false}, {false, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {6u, {0u, false}, {false, 0u}, {0u, 0u, 7u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {0u, false}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {0u, false}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {7u, {0u, false}, {false, 1u}, {0u, 3u, 8u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {0u, false}, {false, 1u}, {0u, 3u, 8u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {226u, false}, {false, 1u}, {0u, 3u, 8u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {227u, false}, {false, 1u}, {1u, 3u, 8u, 227u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    /* vector 2 */
    {1u, {227u, false}, {false, 0u}, {1u, 0u, 1u, 227u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {227u, false}, {false, 0u}, {2u, 0u, 2u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {1u, {227u, false}, {false, 0u}, {3u, 0u, 3u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {1u, {227u, false}, {false, 0u}, {4u, 1u, 0u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {1u, {227u, false}, {false, 0u}, {5u, 1u, 1u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {15u, {227u, false}, {false, 0u}, {20u, 1u, 8u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u,
     false}},
    {1u, {227u, false}, {false, 0u}, {20u, 1u, 8u, 227u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {1u, {228u, false}, {false, 0u}, {20u, 1u, 8u, 228u, 227u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {2u, {1935u, false}, {false, 0u}, {20u, 1u, 8u, 1935u, 1935u, 0u, 0u, 0u, false, 1935u, 0u,
     false}},
    /* vector 3 */
    {2u, {1936u, false}, {false, 0u}, {2u, 0u, 2u, 1936u, 1936u, 0u, 0u, 0u, false, 1936u, 0u,
     false}},
    {1u, {1936u, false}, {false, 0u}, {3u, 0u, 3u, 1936u, 1936u, 0u, 0u, 0u, false, 1936u, 0u,
     false}},
    {1u, {1936u, false}, {true, 0u}, {4u, 1u, 0u, 1936u, 1936u, 1u, 1u, 0u, false, 1936u, 0u,
     false}},
    {1u, {1936u, false}, {true, 0u}, {5u, 1u, 1u, 1936u, 1936u, 1u, 1u, 1u, false, 1936u, 1u,
     false}},
    {1u, {1936u, false}, {true, 4u}, {6u, 1u, 2u, 1936u, 1936u, 1u, 1u, 2u, false, 1936u, 2u,
     false}},
    {1u, {1936u, false}, {true, 4u}, {7u, 1u, 3u, 1936u, 1936u, 1u, 1u, 2u, false, 1936u, 3u,
     false}},
    {1613u, {1936u, false}, {true, 4u}, {20u, 1u, 8u, 1936u, 1936u, 1u, 1u, 2u, false, 1936u, 1616u,
     false}},
    {1u, {1936u, false}, {false, 12u}, {20u, 1u, 8u, 1936u, 1936u, 1u, 0u, 2u, false, 1936u, 1617u,
     true}},
    {1u, {1936u, false}, {false, 8u}, {20u, 1u, 8u, 1936u, 1936u, 1u, 0u, 0u, false, 1936u, 0u,
     true}},
    /* vector 4 */
    {3u, {1937u, false}, {false, 0u}, {3u, 0u, 3u, 1937u, 1937u, 0u, 0u, 0u, false, 1937u, 0u,
     false}},
    {1u, {1937u, false}, {true, 0u}, {4u, 1u, 0u, 1937u, 1937u, 1u, 1u, 0u, false, 1937u, 0u,
     false}},
    {1u, {4081u, false}, {true, 0u}, {5u, 1u, 1u, 4081u, 1937u, 1u, 1u, 1u, false, 1937u, 1u,
     false}},
    {1u, {4082u, false}, {true, 4u}, {0u, 2u, 0u, 4081u, 1937u, 1u, 1u, 2u, false, 4081u, 2u,
     false}},
    /* vector 5 */
    {1u, {1935u, true}, {false, 0u}, {1u, 0u, 1u, 1935u, 0u, 0u, 0u, 1u, false, 0u, 0u, false}},
    {1u, {1935u, true}, {false, 2u}, {2u, 0u, 2u, 1935u, 1935u, 0u, 0u, 2u, true, 1935u, 0u,
     false}},
    {1u, {1698u, true}, {false, 2u}, {3u, 0u, 3u, 1698u, 1935u, 0u, 0u, 2u, true, 1935u, 0u,
     false}},
    {1u, {1698u, true}, {false, 2u}, {4u, 1u, 0u, 1698u, 1698u, 0u, 0u, 2u, true, 1698u, 0u,
     false}},
    {2u, {4082u, true}, {false, 2u}, {0u, 2u, 1u, 1698u, 1698u, 0u, 0u, 2u, true, 1698u, 0u,
     false}},
    {2u, {4082u, true}, {false, 2u}, {0u, 2u, 3u, 1698u, 1698u, 0u, 0u, 2u, true, 1698u, 0u,
     false}},
    {1u, {4082u, true}, {false, 3u}, {0u, 3u, 0u, 1698u, 1698u, 0u, 0u, 2u, true, 1698u, 0u,
     false}},
    {1u, {228u, true}, {false, 3u}, {1u, 3u, 1u, 228u, 1698u, 0u, 0u, 2u, true, 1698u, 0u, false}},
    {1u, {1698u, true}, {false, 3u}, {2u, 3u, 2u, 1698u, 228u, 0u, 0u, 2u, true, 1698u, 0u, false}},
    {17u, {4081u, true}, {false, 3u}, {19u, 3u, 8u, 4081u, 4081u, 0u, 0u, 2u, true, 4081u, 0u,
     false}},
    {1u, {4081u, true}, {false, 2u}, {20u, 1u, 0u, 4081u, 4081u, 1u, 0u, 2u, true, 4081u, 0u,
     false}},
    {2u, {228u, true}, {false, 2u}, {20u, 1u, 2u, 228u, 228u, 0u, 0u, 2u, true, 228u, 0u, false}},
    {5u, {1936u, false}, {false, 2u}, {20u, 1u, 7u, 1936u, 1936u, 1u, 0u, 0u, true, 1936u, 0u,
     false}},
    {2u, {1700u, false}, {false, 2u}, {20u, 1u, 8u, 1700u, 1700u, 1u, 0u, 0u, true, 1700u, 0u,
     false}},
    /* vector 6 */
    {3u, {1936u, false}, {false, 0u}, {3u, 0u, 3u, 1936u, 1936u, 0u, 0u, 0u, false, 1936u, 0u,
     false}},
    {2u, {1936u, false}, {true, 0u}, {5u, 1u, 1u, 1936u, 1936u, 1u, 1u, 1u, false, 1936u, 1u,
     false}},
    {2u, {1700u, false}, {true, 4u}, {7u, 1u, 3u, 1700u, 1700u, 1u, 1u, 2u, false, 1700u, 0u,
     false}},
    {1u, {4080u, true}, {true, 0u}, {8u, 1u, 4u, 4080u, 1700u, 1u, 1u, 0u, false, 1700u, 1u,
     false}},
    {1u, {227u, true}, {true, 0u}, {9u, 1u, 5u, 227u, 4080u, 1u, 1u, 0u, false, 1700u, 2u, false}},
    {1u, {116u, true}, {false, 0u}, {0u, 2u, 0u, 227u, 4080u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {1u, {116u, true}, {false, 0u}, {0u, 2u, 1u, 227u, 4080u, 0u, 0u, 1u, false, 227u, 0u, false}},
    {1u, {1937u, true}, {false, 2u}, {1u, 2u, 2u, 1937u, 227u, 0u, 0u, 2u, true, 1937u, 0u, false}},
    /* vector 7 */
    {3u, {1937u, false}, {false, 0u}, {3u, 0u, 3u, 1937u, 1937u, 0u, 0u, 0u, false, 1937u, 0u,
     false}},
    {2u, {1937u, false}, {true, 0u}, {5u, 1u, 1u, 1937u, 1937u, 1u, 1u, 1u, false, 1937u, 1u,
     false}},
    {5u, {1937u, false}, {true, 4u}, {10u, 1u, 6u, 1937u, 1937u, 1u, 1u, 2u, false, 1937u, 6u,
     false}},
    {1u, {1935u, false}, {true, 4u}, {11u, 1u, 7u, 1935u, 1937u, 1u, 1u, 2u, false, 1937u, 7u,
     false}},
    {1u, {228u, false}, {true, 4u}, {12u, 1u, 8u, 228u, 1935u, 1u, 1u, 2u, false, 1937u, 8u,
     false}},
    {1u, {1825u, false}, {true, 4u}, {13u, 1u, 8u, 1825u, 228u, 1u, 1u, 2u, false, 1937u, 9u,
     false}},
    {1u, {4081u, false}, {true, 4u}, {14u, 1u, 8u, 4081u, 1825u, 1u, 1u, 2u, false, 1937u, 10u,
     false}},
    {2u, {4080u, true}, {true, 0u}, {16u, 1u, 8u, 4080u, 4080u, 1u, 1u, 0u, false, 4080u, 12u,
     false}},
    {2u, {65535u, true}, {true, 0u}, {0u, 2u, 1u, 4080u, 4080u, 1u, 1u, 0u, false, 4080u, 14u,
     false}},
    {1u, {3745u, true}, {true, 0u}, {1u, 2u, 2u, 3745u, 4080u, 1u, 1u, 0u, false, 4080u, 15u,
     false}},
    {1u, {3634u, true}, {true, 0u}, {2u, 2u, 3u, 3634u, 3745u, 1u, 1u, 0u, false, 3745u, 0u,
     false}},
    {1u, {3634u, true}, {false, 1u}, {3u, 3u, 0u, 3634u, 3634u, 0u, 0u, 0u, false, 3745u, 1u,
     false}},
    {1u, {1937u, true}, {false, 1u}, {4u, 3u, 1u, 1937u, 3634u, 0u, 0u, 1u, false, 3634u, 0u,
     false}},
    {15u, {1937u, true}, {false, 3u}, {19u, 3u, 8u, 1937u, 1937u, 0u, 0u, 2u, true, 1937u, 0u,
     false}},
    {12u, {1937u, true}, {false, 2u}, {20u, 1u, 8u, 1937u, 1937u, 1u, 0u, 2u, true, 1937u, 0u,
     false}},
    {1u, {226u, false}, {false, 2u}, {0u, 2u, 0u, 1937u, 1937u, 1u, 0u, 0u, true, 1937u, 0u,
     false}},
    {1u, {227u, false}, {false, 2u}, {1u, 2u, 1u, 227u, 1937u, 1u, 0u, 0u, true, 1937u, 0u, false}},
    {1u, {1699u, false}, {false, 2u}, {2u, 2u, 2u, 1699u, 227u, 0u, 0u, 0u, true, 1699u, 0u,
     false}},
    {2u, {1936u, false}, {false, 2u}, {4u, 1u, 0u, 1936u, 1936u, 1u, 0u, 0u, true, 1936u, 0u,
     false}},
    /* vector 8 */
    {3u, {4080u, false}, {false, 0u}, {3u, 0u, 3u, 4080u, 4080u, 0u, 0u, 0u, false, 4080u, 0u,
     false}},
    {2u, {4080u, false}, {true, 0u}, {5u, 1u, 1u, 4080u, 4080u, 1u, 1u, 1u, false, 4080u, 1u,
     false}},
    {1u, {4080u, false}, {true, 4u}, {6u, 1u, 2u, 4080u, 4080u, 1u, 1u, 2u, false, 4080u, 2u,
     false}},
    {4u, {1935u, false}, {true, 4u}, {10u, 1u, 6u, 1935u, 1935u, 1u, 1u, 2u, false, 1935u, 2u,
     false}},
    {1u, {65535u, false}, {true, 4u}, {0u, 2u, 0u, 1935u, 1935u, 1u, 1u, 2u, false, 1935u, 3u,
     false}},
    {3u, {4080u, false}, {true, 4u}, {3u, 2u, 3u, 4080u, 4080u, 1u, 1u, 2u, false, 4080u, 6u,
     false}},
    {2u, {4081u, false}, {true, 4u}, {5u, 1u, 1u, 4081u, 4081u, 1u, 1u, 2u, false, 4081u, 8u,
     false}},
    {5u, {1936u, false}, {true, 4u}, {10u, 1u, 6u, 1936u, 1936u, 1u, 1u, 2u, false, 1936u, 3u,
     false}},
    {1u, {0u, false}, {true, 4u}, {0u, 2u, 0u, 1936u, 1936u, 1u, 1u, 2u, false, 1936u, 4u, false}},
    {2u, {1823u, false}, {true, 4u}, {2u, 2u, 2u, 1823u, 1823u, 1u, 1u, 2u, false, 1823u, 0u,
     false}},
    {1u, {1699u, true}, {true, 0u}, {3u, 2u, 3u, 1699u, 1823u, 1u, 1u, 0u, false, 1823u, 1u,
     false}},
    {2u, {1699u, true}, {false, 0u}, {5u, 1u, 1u, 1699u, 1699u, 0u, 0u, 1u, false, 1699u, 0u,
     false}},
    {1u, {1699u, true}, {false, 2u}, {6u, 1u, 2u, 1699u, 1699u, 0u, 0u, 2u, true, 1699u, 0u,
     false}},
    {1u, {1698u, true}, {false, 2u}, {7u, 1u, 3u, 1698u, 1699u, 0u, 0u, 2u, true, 1699u, 0u,
     false}},
    {1u, {1935u, true}, {false, 2u}, {8u, 1u, 4u, 1935u, 1698u, 0u, 0u, 2u, true, 1699u, 0u,
     false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct hlt1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 8u, false, {0u}},
    {8u, 17u, false, {0u}},
    {17u, 26u, false, {0u}},
    {26u, 30u, false, {0u}},
    {30u, 44u, false, {0u}},
    {44u, 52u, false, {0u}},
    {52u, 71u, false, {0u}},
    {71u, 86u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct hlt1 m;
    struct hlt1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    hlt1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            hlt1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct hlt1 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};

static void start_and_compare(const char *what, const struct hlt1_remembered *r,
                              const struct hlt1 *wanted)
{
    struct hlt1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    hlt1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct hlt1 m;
    struct hlt1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", hlt1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", hlt1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct hlt1 m;
    struct hlt1_in in;
    struct hlt1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct hlt1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 1u};

        doing = "liquor_probe_state upset";
        hlt1_start(&m, NULL);
        m.liquor_probe_state = 4u;
        hlt1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hlt1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 1u};

        doing = "liquor_probe_state upset";
        hlt1_start(&m, NULL);
        m.liquor_probe_state = 255u;
        hlt1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hlt1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 0u};

        doing = "liquor_stat upset";
        hlt1_start(&m, NULL);
        m.liquor_stat = 2u;
        hlt1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hlt1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 0u};

        doing = "liquor_stat upset";
        hlt1_start(&m, NULL);
        m.liquor_stat = 255u;
        hlt1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hlt1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 0u};

        doing = "elements upset";
        hlt1_start(&m, NULL);
        m.elements = 2u;
        hlt1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct hlt1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct hlt1_out wanted =
           {false, 0u};

        doing = "elements upset";
        hlt1_start(&m, NULL);
        m.elements = 255u;
        hlt1_step(&m, &in, &out);
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
