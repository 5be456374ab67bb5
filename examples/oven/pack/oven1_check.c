/* oven1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Deck oven 1, bakehouse
 * Site: Corner Street Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: c5309404c721b975be15425c058db2a2b60c8cf3ec5c5c6afa6a43656858588b
 *
 * Replaces:
 * - chamber_stat: capillary stat with its bulb in the crown of the chamber
 *
 * Stays hard-wired, and must:
 * - chamber_limit: second capillary in the flue corner, manual reset
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
 * Open findings: 1 kept_limit_fails_as_cold (act, chamber_limit); 2 proving_switch_not_checked_open
 * (act, door_shut); 3 earth_fault_bypasses_limit (act, oven1); 4 thermocouple_reversed_or_shorted
 * (act, chamber_probe); 5 damp_dust_washdown (act, oven1); 6 contact_life (act, elements); 7
 * mercury_asbestos_refrigerant (act, chamber_stat); 8 approval_lapses (act, oven1). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "oven1.h"

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

static void compare_out(const struct oven1_out *got, const struct oven1_out *wanted)
{
    compare("elements", (long)got->elements, (long)wanted->elements);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct oven1 *got, const struct oven1 *wanted)
{
    compare("chamber_probe_good_for",
            (long)got->chamber_probe_good_for,
            (long)wanted->chamber_probe_good_for);
    compare("chamber_probe_state",
            (long)got->chamber_probe_state,
            (long)wanted->chamber_probe_state);
    compare("chamber_probe_state_for",
            (long)got->chamber_probe_state_for,
            (long)wanted->chamber_probe_state_for);
    compare("chamber_probe_last", (long)got->chamber_probe_last, (long)wanted->chamber_probe_last);
    compare("chamber_probe_before",
            (long)got->chamber_probe_before,
            (long)wanted->chamber_probe_before);
    compare("chamber_stat", (long)got->chamber_stat, (long)wanted->chamber_stat);
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
    struct oven1_in in;
    struct oven1_out out;
    struct oven1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 937u, false}, {false, 0u}, {1u, 0u, 1u, 937u, 0u, 0u, 0u, 0u, false, 0u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {2u, 0u, 2u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {3u, 0u, 3u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {4u, 1u, 0u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {5u, 1u, 1u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {9u, {false, 937u, false}, {false, 0u}, {14u, 1u, 10u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {15u, 1u, 10u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {5u, {false, 937u, false}, {false, 0u}, {20u, 1u, 10u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 0u}, {20u, 1u, 10u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {true, 937u, false}, {false, 0u}, {20u, 1u, 10u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 0u}, {0u, 2u, 0u, 937u, 937u, 0u, 0u, 0u, false, 937u, 0u,
     false}},
    /* vector 2 */
    {9u, {false, 0u, false}, {false, 0u}, {0u, 0u, 9u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {false, 0u, false}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {false, 0u, false}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {false, 247u, false}, {false, 1u}, {0u, 3u, 2u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false}},
    {1u, {false, 248u, false}, {false, 1u}, {1u, 3u, 3u, 248u, 0u, 0u, 0u, 0u, false, 0u, 0u,
     false}},
    /* vector 3 */
    {4u, {false, 248u, false}, {false, 0u}, {4u, 1u, 0u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {false, 248u, false}, {false, 0u}, {5u, 1u, 1u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    /* vector 4 */
    {4u, {false, 895u, false}, {false, 0u}, {4u, 1u, 0u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    /* vector 5 */
    {4u, {false, 896u, false}, {false, 0u}, {4u, 1u, 0u, 896u, 896u, 0u, 0u, 0u, false, 896u, 0u,
     false}},
    {1u, {false, 1729u, false}, {false, 0u}, {5u, 1u, 1u, 1729u, 896u, 0u, 0u, 0u, false, 896u, 0u,
     false}},
    {1u, {false, 1730u, false}, {false, 0u}, {0u, 2u, 0u, 1729u, 896u, 0u, 0u, 0u, false, 1729u, 0u,
     false}},
    {1u, {false, 937u, true}, {false, 0u}, {1u, 2u, 1u, 937u, 1729u, 0u, 0u, 1u, false, 937u, 0u,
     false}},
    /* vector 6 */
    {1u, {false, 937u, true}, {false, 0u}, {1u, 0u, 1u, 937u, 0u, 0u, 0u, 1u, false, 0u, 0u,
     false}},
    {1u, {false, 937u, true}, {false, 2u}, {2u, 0u, 2u, 937u, 937u, 0u, 0u, 2u, true, 937u, 0u,
     false}},
    {1u, {false, 937u, true}, {false, 2u}, {3u, 0u, 3u, 937u, 937u, 0u, 0u, 2u, true, 937u, 0u,
     false}},
    {1u, {false, 894u, false}, {false, 2u}, {4u, 1u, 0u, 894u, 937u, 0u, 0u, 0u, true, 937u, 0u,
     false}},
    {1u, {false, 894u, false}, {false, 2u}, {5u, 1u, 1u, 894u, 894u, 1u, 0u, 0u, true, 894u, 0u,
     false}},
    {1u, {false, 937u, false}, {false, 2u}, {6u, 1u, 2u, 937u, 894u, 1u, 0u, 0u, true, 894u, 0u,
     false}},
    {1u, {false, 895u, false}, {false, 2u}, {7u, 1u, 3u, 895u, 937u, 1u, 0u, 0u, true, 895u, 0u,
     false}},
    {1u, {true, 914u, false}, {false, 2u}, {8u, 1u, 4u, 914u, 895u, 1u, 0u, 0u, true, 914u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 2u}, {0u, 2u, 0u, 914u, 895u, 1u, 0u, 0u, true, 914u, 0u,
     false}},
    {3u, {false, 895u, false}, {false, 2u}, {3u, 2u, 3u, 895u, 895u, 1u, 0u, 0u, true, 895u, 0u,
     false}},
    {1u, {false, 895u, false}, {false, 2u}, {4u, 1u, 0u, 895u, 895u, 1u, 0u, 0u, true, 895u, 0u,
     false}},
    {1u, {false, 895u, false}, {false, 2u}, {5u, 1u, 1u, 895u, 895u, 1u, 0u, 0u, true, 895u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 2u}, {0u, 2u, 0u, 895u, 895u, 1u, 0u, 0u, true, 895u, 0u,
     false}},
    {2u, {false, 894u, false}, {false, 2u}, {2u, 2u, 2u, 894u, 894u, 1u, 0u, 0u, true, 894u, 0u,
     false}},
    /* vector 7 */
    {5u, {false, 895u, false}, {false, 0u}, {5u, 1u, 1u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 0u}, {0u, 2u, 0u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {false, 894u, false}, {false, 0u}, {2u, 2u, 2u, 894u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 914u, false}, {false, 0u}, {3u, 2u, 3u, 914u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 895u, false}, {false, 0u}, {4u, 1u, 0u, 895u, 914u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {false, 873u, false}, {false, 0u}, {6u, 1u, 2u, 873u, 873u, 1u, 0u, 0u, false, 873u, 0u,
     false}},
    {1u, {true, 873u, false}, {true, 0u}, {7u, 1u, 3u, 873u, 873u, 1u, 1u, 0u, false, 873u, 0u,
     false}},
    {1u, {true, 873u, false}, {true, 0u}, {8u, 1u, 4u, 873u, 873u, 1u, 1u, 1u, false, 873u, 1u,
     false}},
    {1u, {true, 248u, false}, {true, 4u}, {9u, 1u, 5u, 248u, 873u, 1u, 1u, 2u, false, 873u, 2u,
     false}},
    {1u, {false, 248u, false}, {false, 4u}, {10u, 1u, 6u, 248u, 248u, 1u, 0u, 2u, false, 248u, 3u,
     false}},
    {5u, {false, 895u, false}, {false, 0u}, {15u, 1u, 10u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 0u}, {0u, 2u, 0u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {false, 894u, false}, {false, 0u}, {2u, 2u, 2u, 894u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 914u, false}, {false, 0u}, {3u, 2u, 3u, 914u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 247u, false}, {false, 0u}, {0u, 2u, 4u, 914u, 894u, 1u, 0u, 0u, false, 914u, 0u,
     false}},
    {1u, {false, 247u, true}, {false, 0u}, {0u, 2u, 5u, 914u, 894u, 1u, 0u, 1u, false, 914u, 0u,
     false}},
    {1u, {false, 247u, true}, {false, 3u}, {0u, 3u, 0u, 914u, 894u, 0u, 0u, 2u, true, 914u, 0u,
     false}},
    /* vector 8 */
    {22u, {false, 248u, false}, {false, 0u}, {20u, 1u, 10u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {true, 65535u, false}, {false, 0u}, {0u, 2u, 0u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {false, 247u, true}, {false, 0u}, {0u, 2u, 1u, 248u, 248u, 1u, 0u, 1u, false, 248u, 0u,
     false}},
    {4u, {false, 247u, true}, {false, 2u}, {0u, 2u, 5u, 248u, 248u, 1u, 0u, 2u, true, 248u, 0u,
     false}},
    {2u, {false, 247u, true}, {false, 3u}, {0u, 3u, 1u, 248u, 248u, 0u, 0u, 2u, true, 248u, 0u,
     false}},
    {19u, {false, 873u, true}, {false, 3u}, {19u, 3u, 10u, 873u, 873u, 0u, 0u, 2u, true, 873u, 0u,
     false}},
    {1u, {false, 873u, true}, {false, 2u}, {20u, 1u, 0u, 873u, 873u, 1u, 0u, 2u, true, 873u, 0u,
     false}},
    /* vector 9 */
    {22u, {false, 248u, false}, {false, 0u}, {20u, 1u, 10u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {true, 65535u, false}, {false, 0u}, {0u, 2u, 0u, 248u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {true, 266u, false}, {false, 0u}, {1u, 2u, 1u, 266u, 248u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {true, 895u, false}, {false, 0u}, {2u, 2u, 2u, 895u, 266u, 1u, 0u, 0u, false, 266u, 0u,
     false}},
    {1u, {true, 286u, false}, {false, 0u}, {3u, 2u, 3u, 286u, 895u, 1u, 0u, 0u, false, 286u, 0u,
     false}},
    {1u, {true, 248u, false}, {true, 0u}, {4u, 1u, 0u, 248u, 286u, 1u, 1u, 0u, false, 286u, 0u,
     false}},
    {1u, {true, 896u, false}, {true, 0u}, {5u, 1u, 1u, 896u, 248u, 1u, 1u, 1u, false, 286u, 1u,
     false}},
    {1u, {true, 896u, false}, {true, 4u}, {6u, 1u, 2u, 896u, 896u, 1u, 1u, 2u, false, 896u, 0u,
     false}},
    {1u, {false, 937u, true}, {false, 0u}, {7u, 1u, 3u, 937u, 896u, 1u, 0u, 0u, false, 896u, 1u,
     false}},
    {1u, {false, 957u, true}, {false, 0u}, {8u, 1u, 4u, 957u, 937u, 1u, 0u, 1u, false, 937u, 0u,
     false}},
    {1u, {false, 958u, true}, {false, 2u}, {9u, 1u, 5u, 958u, 957u, 0u, 0u, 2u, true, 957u, 0u,
     false}},
    /* vector 10 */
    {5u, {false, 895u, false}, {false, 0u}, {5u, 1u, 1u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {1u, {false, 0u, false}, {false, 0u}, {0u, 2u, 0u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {false, 894u, false}, {false, 0u}, {2u, 2u, 2u, 894u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 914u, false}, {false, 0u}, {3u, 2u, 3u, 914u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {1u, {false, 895u, false}, {false, 0u}, {4u, 1u, 0u, 895u, 914u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {false, 873u, false}, {false, 0u}, {6u, 1u, 2u, 873u, 873u, 1u, 0u, 0u, false, 873u, 0u,
     false}},
    {2u, {true, 873u, false}, {true, 0u}, {8u, 1u, 4u, 873u, 873u, 1u, 1u, 1u, false, 873u, 1u,
     false}},
    {1u, {true, 248u, false}, {true, 4u}, {9u, 1u, 5u, 248u, 873u, 1u, 1u, 2u, false, 873u, 2u,
     false}},
    {1u, {true, 892u, false}, {true, 4u}, {10u, 1u, 6u, 892u, 248u, 1u, 1u, 2u, false, 873u, 3u,
     false}},
    {1u, {true, 247u, false}, {true, 4u}, {0u, 2u, 0u, 892u, 248u, 1u, 1u, 2u, false, 873u, 4u,
     false}},
    {954u, {true, 876u, false}, {true, 4u}, {20u, 1u, 10u, 876u, 876u, 1u, 1u, 2u, false, 873u,
     958u, false}},
    {1u, {true, 876u, false}, {false, 12u}, {20u, 1u, 10u, 876u, 876u, 1u, 0u, 2u, false, 873u,
     959u, true}},
    {1u, {true, 876u, false}, {false, 8u}, {20u, 1u, 10u, 876u, 876u, 1u, 0u, 0u, false, 876u, 0u,
     true}},
    {2u, {false, 938u, false}, {false, 8u}, {20u, 1u, 10u, 938u, 938u, 0u, 0u, 0u, false, 938u, 0u,
     true}},
    {1u, {false, 249u, false}, {false, 8u}, {20u, 1u, 10u, 249u, 938u, 0u, 0u, 0u, false, 938u, 0u,
     true}},
    {1u, {false, 1748u, false}, {false, 8u}, {0u, 2u, 0u, 249u, 938u, 0u, 0u, 0u, false, 249u, 0u,
     true}},
    /* vector 11 */
    {4u, {false, 895u, false}, {false, 0u}, {4u, 1u, 0u, 895u, 895u, 1u, 0u, 0u, false, 895u, 0u,
     false}},
    {2u, {true, 894u, false}, {true, 0u}, {6u, 1u, 2u, 894u, 894u, 1u, 1u, 1u, false, 894u, 1u,
     false}},
    {1u, {false, 249u, false}, {false, 4u}, {7u, 1u, 3u, 249u, 894u, 1u, 0u, 2u, false, 894u, 2u,
     false}},
    {1u, {false, 248u, false}, {false, 0u}, {8u, 1u, 4u, 248u, 249u, 1u, 0u, 0u, false, 249u, 0u,
     false}},
    {1u, {false, 231u, false}, {false, 0u}, {0u, 2u, 0u, 248u, 249u, 1u, 0u, 0u, false, 248u, 0u,
     false}},
    {1u, {false, 896u, false}, {false, 0u}, {1u, 2u, 1u, 896u, 248u, 1u, 0u, 0u, false, 249u, 0u,
     false}},
    {2u, {true, 894u, false}, {false, 0u}, {3u, 2u, 3u, 894u, 894u, 1u, 0u, 0u, false, 894u, 0u,
     false}},
    {2u, {true, 894u, false}, {true, 0u}, {5u, 1u, 1u, 894u, 894u, 1u, 1u, 1u, false, 894u, 1u,
     false}},
    {2u, {true, 894u, false}, {true, 4u}, {7u, 1u, 3u, 894u, 894u, 1u, 1u, 2u, false, 894u, 3u,
     false}},
    {2u, {true, 914u, true}, {true, 0u}, {9u, 1u, 5u, 914u, 914u, 1u, 1u, 0u, false, 914u, 0u,
     false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct oven1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 11u, false, {0u}},
    {11u, 16u, false, {0u}},
    {16u, 18u, false, {0u}},
    {18u, 19u, false, {0u}},
    {19u, 23u, false, {0u}},
    {23u, 37u, false, {0u}},
    {37u, 54u, false, {0u}},
    {54u, 61u, false, {0u}},
    {61u, 72u, false, {0u}},
    {72u, 88u, false, {0u}},
    {88u, 98u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct oven1 m;
    struct oven1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    oven1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            oven1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct oven1 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};

static void start_and_compare(const char *what, const struct oven1_remembered *r,
                              const struct oven1 *wanted)
{
    struct oven1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    oven1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct oven1 m;
    struct oven1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", oven1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", oven1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct oven1 m;
    struct oven1_in in;
    struct oven1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct oven1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 1u};

        doing = "chamber_probe_state upset";
        oven1_start(&m, NULL);
        m.chamber_probe_state = 4u;
        oven1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct oven1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 1u};

        doing = "chamber_probe_state upset";
        oven1_start(&m, NULL);
        m.chamber_probe_state = 255u;
        oven1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct oven1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 0u};

        doing = "chamber_stat upset";
        oven1_start(&m, NULL);
        m.chamber_stat = 2u;
        oven1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct oven1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 0u};

        doing = "chamber_stat upset";
        oven1_start(&m, NULL);
        m.chamber_stat = 255u;
        oven1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct oven1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 0u};

        doing = "elements upset";
        oven1_start(&m, NULL);
        m.elements = 2u;
        oven1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct oven1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct oven1_out wanted =
           {false, 0u};

        doing = "elements upset";
        oven1_start(&m, NULL);
        m.elements = 255u;
        oven1_step(&m, &in, &out);
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
