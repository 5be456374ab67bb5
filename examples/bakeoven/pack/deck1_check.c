/* deck1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Deck oven 1
 * Site: Mill Row Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 88dee7d788eea2cc77b8bc3610c497045922544a8fada194fb9a90d0fe5ee7a2
 *
 * Replaces:
 * - oven_stat: capillary stat with a knob, bulb in the roof of the chamber
 *
 * Stays hard-wired, and must:
 * - oven_limit: capillary limit, opens the contactor in front of the switch
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
 * Open findings: 1 limit_nuisance (act, oven_limit/fire); 2 ssr_shorts_on (act, elements); 3
 * earth_fault_bypasses_limit (act, deck1); 4 moisture_direction (act, roof_probe); 5
 * damp_dust_washdown (act, deck1); 6 limit_error_budget (act, oven_stat); 7
 * mercury_asbestos_refrigerant (act, oven_stat); 8 approval_lapses (act, deck1); 9 flicker (act,
 * elements).
 */
/* The recorded inputs visit every state and make every transition. */
#include "deck1.h"

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

static void compare_out(const struct deck1_out *got, const struct deck1_out *wanted)
{
    compare("elements", (long)got->elements, (long)wanted->elements);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct deck1 *got, const struct deck1 *wanted)
{
    compare("roof_probe_good_for",
            (long)got->roof_probe_good_for,
            (long)wanted->roof_probe_good_for);
    compare("roof_probe_state", (long)got->roof_probe_state, (long)wanted->roof_probe_state);
    compare("roof_probe_state_for",
            (long)got->roof_probe_state_for,
            (long)wanted->roof_probe_state_for);
    compare("roof_probe_last", (long)got->roof_probe_last, (long)wanted->roof_probe_last);
    compare("roof_probe_before", (long)got->roof_probe_before, (long)wanted->roof_probe_before);
    compare("oven_stat_at", (long)got->oven_stat_at, (long)wanted->oven_stat_at);
    compare("oven_stat_dial_lost_for",
            (long)got->oven_stat_dial_lost_for,
            (long)wanted->oven_stat_dial_lost_for);
    compare("oven_stat_set_point",
            (long)got->oven_stat_set_point,
            (long)wanted->oven_stat_set_point);
    compare("oven_stat_sum", (long)got->oven_stat_sum, (long)wanted->oven_stat_sum);
    compare("oven_stat_permille", (long)got->oven_stat_permille, (long)wanted->oven_stat_permille);
    compare("oven_stat_on_for", (long)got->oven_stat_on_for, (long)wanted->oven_stat_on_for);
    compare("elements", (long)got->elements, (long)wanted->elements);
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
    struct deck1_in in;
    struct deck1_out out;
    struct deck1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 2763u, 2047u}, {false, 0u}, {1u, 0u, 1u, 2763u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u,
     0u, 0u, false}},
    {1u, {false, 2763u, 2047u}, {false, 0u}, {2u, 0u, 2u, 2763u, 2763u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {7u, {false, 2763u, 2047u}, {false, 0u}, {9u, 0u, 9u, 2763u, 2763u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 2047u}, {true, 0u}, {10u, 1u, 0u, 2763u, 2763u, 0u, 0u, 2099u, 1720u, 176u,
     7u, 1u, 2763u, 0u, false}},
    {1u, {false, 2763u, 2047u}, {true, 0u}, {11u, 1u, 1u, 2763u, 2763u, 1u, 0u, 2099u, 1720u, 176u,
     7u, 1u, 2763u, 1u, false}},
    {5u, {false, 2763u, 2047u}, {true, 0u}, {16u, 1u, 6u, 2763u, 2763u, 6u, 0u, 2099u, 1720u, 176u,
     7u, 1u, 2763u, 6u, false}},
    {1u, {false, 2763u, 2047u}, {false, 0u}, {17u, 1u, 7u, 2763u, 2763u, 7u, 0u, 2099u, 1720u, 176u,
     7u, 0u, 2763u, 7u, false}},
    /* vector 2 */
    {9u, {true, 2763u, 2047u}, {false, 0u}, {9u, 0u, 9u, 2763u, 2763u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {true, 2763u, 2047u}, {true, 0u}, {11u, 1u, 1u, 2763u, 2763u, 1u, 0u, 2099u, 1720u, 176u,
     7u, 1u, 2763u, 0u, false}},
    {1u, {false, 0u, 2047u}, {true, 0u}, {0u, 2u, 0u, 2763u, 2763u, 2u, 0u, 2099u, 1720u, 176u, 7u,
     1u, 2763u, 1u, false}},
    /* vector 3 */
    {29u, {false, 0u, 2047u}, {false, 0u}, {0u, 0u, 29u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u, 0u,
     0u, false}},
    {1u, {false, 0u, 2047u}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u, 0u,
     0u, false}},
    {1u, {false, 0u, 2047u}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u, 0u,
     0u, false}},
    {29u, {false, 0u, 2047u}, {false, 1u}, {0u, 3u, 30u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u, 0u,
     0u, false}},
    {1u, {false, 0u, 2047u}, {false, 1u}, {0u, 3u, 30u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u, 0u,
     0u, false}},
    {1u, {false, 1428u, 2047u}, {false, 1u}, {0u, 3u, 30u, 0u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u, 0u,
     0u, 0u, false}},
    {1u, {false, 1429u, 2047u}, {false, 1u}, {1u, 3u, 30u, 1429u, 0u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 0u, 0u, false}},
    /* vector 4 */
    {9u, {false, 1429u, 2047u}, {false, 0u}, {9u, 0u, 9u, 1429u, 1429u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 1429u, 0u, false}},
    {1u, {false, 1429u, 2047u}, {true, 0u}, {10u, 1u, 0u, 1429u, 1429u, 0u, 0u, 2099u, 0u, 1000u,
     40u, 1u, 1429u, 0u, false}},
    {39u, {false, 1429u, 2047u}, {true, 0u}, {49u, 1u, 30u, 1429u, 1429u, 39u, 0u, 2099u, 0u, 1000u,
     40u, 1u, 1429u, 39u, false}},
    /* vector 5 */
    {10u, {false, 2998u, 2047u}, {false, 0u}, {10u, 1u, 0u, 2998u, 2998u, 0u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2998u, 0u, false}},
    {1u, {false, 2998u, 2047u}, {false, 0u}, {11u, 1u, 1u, 2998u, 2998u, 1u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2998u, 0u, false}},
    {1u, {false, 3940u, 2047u}, {false, 0u}, {12u, 1u, 2u, 3940u, 2998u, 2u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2998u, 0u, false}},
    {1u, {false, 3941u, 2047u}, {false, 0u}, {0u, 2u, 0u, 3940u, 2998u, 3u, 0u, 2099u, 0u, 0u, 0u,
     0u, 3940u, 0u, false}},
    {1u, {false, 2763u, 0u}, {false, 0u}, {1u, 2u, 1u, 2763u, 3940u, 4u, 1u, 2099u, 0u, 0u, 0u, 0u,
     2998u, 0u, false}},
    /* vector 6 */
    {1u, {false, 2763u, 0u}, {false, 2u}, {1u, 0u, 1u, 2763u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u,
     0u, 0u, false}},
    {1u, {false, 2763u, 114u}, {false, 2u}, {2u, 0u, 2u, 2763u, 2763u, 39u, 20u, 2500u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 115u}, {false, 0u}, {3u, 0u, 3u, 2763u, 2763u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 3014u}, {false, 0u}, {4u, 0u, 4u, 2763u, 2763u, 39u, 0u, 2572u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 3980u}, {false, 0u}, {5u, 0u, 5u, 2763u, 2763u, 39u, 0u, 3000u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 3981u}, {false, 0u}, {6u, 0u, 6u, 2763u, 2763u, 39u, 1u, 3000u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {false, 1763u, 3979u}, {false, 0u}, {8u, 0u, 8u, 1763u, 1763u, 39u, 0u, 3000u, 0u, 0u, 0u,
     0u, 1763u, 0u, false}},
    {1u, {false, 2763u, 2530u}, {false, 0u}, {9u, 0u, 9u, 2763u, 1763u, 39u, 0u, 2335u, 0u, 0u, 0u,
     0u, 1763u, 0u, false}},
    {50u, {false, 2763u, 2530u}, {true, 0u}, {59u, 1u, 30u, 2763u, 2763u, 9u, 0u, 2335u, 0u, 1000u,
     40u, 1u, 2763u, 49u, false}},
    {1u, {false, 3444u, 1564u}, {true, 0u}, {60u, 1u, 30u, 3444u, 2763u, 10u, 0u, 1863u, 0u, 1000u,
     40u, 1u, 2763u, 50u, false}},
    {1u, {false, 1763u, 1564u}, {true, 0u}, {61u, 1u, 30u, 1763u, 3444u, 11u, 0u, 1863u, 0u, 1000u,
     40u, 1u, 2763u, 51u, false}},
    {1u, {false, 1763u, 3979u}, {true, 0u}, {62u, 1u, 30u, 1763u, 1763u, 12u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 1763u, 52u, false}},
    {2u, {false, 3446u, 114u}, {true, 0u}, {64u, 1u, 30u, 3446u, 3446u, 14u, 2u, 3000u, 0u, 1000u,
     40u, 1u, 3446u, 0u, false}},
    {17u, {false, 3446u, 114u}, {true, 0u}, {81u, 1u, 30u, 3446u, 3446u, 31u, 19u, 3000u, 0u, 1000u,
     40u, 1u, 3446u, 17u, false}},
    {8u, {false, 1428u, 2047u}, {true, 0u}, {0u, 2u, 7u, 3446u, 3446u, 39u, 0u, 2099u, 0u, 1000u,
     40u, 1u, 3446u, 25u, false}},
    {12u, {false, 1428u, 2047u}, {false, 0u}, {0u, 2u, 19u, 3446u, 3446u, 11u, 0u, 2099u, 0u, 0u,
     0u, 0u, 3446u, 0u, false}},
    {1u, {false, 1428u, 2047u}, {false, 1u}, {0u, 3u, 0u, 3446u, 3446u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 3446u, 0u, false}},
    {10u, {false, 1428u, 2047u}, {false, 1u}, {0u, 3u, 10u, 3446u, 3446u, 39u, 0u, 2099u, 0u, 0u,
     0u, 0u, 3446u, 0u, false}},
    {2u, {false, 2762u, 2047u}, {false, 1u}, {2u, 3u, 12u, 2762u, 2762u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2762u, 0u, false}},
    {1u, {true, 2762u, 2047u}, {false, 1u}, {3u, 3u, 13u, 2762u, 2762u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2762u, 0u, false}},
    {1u, {false, 3446u, 3981u}, {false, 1u}, {4u, 3u, 14u, 3446u, 2762u, 39u, 1u, 2099u, 0u, 0u, 0u,
     0u, 2762u, 0u, false}},
    {18u, {false, 3446u, 114u}, {false, 1u}, {22u, 3u, 30u, 3446u, 3446u, 39u, 19u, 2099u, 0u, 0u,
     0u, 0u, 3446u, 0u, false}},
    {77u, {false, 3446u, 114u}, {false, 3u}, {99u, 3u, 30u, 3446u, 3446u, 39u, 20u, 2099u, 0u, 0u,
     0u, 0u, 3446u, 0u, false}},
    {1u, {false, 3446u, 114u}, {false, 2u}, {100u, 1u, 0u, 3446u, 3446u, 0u, 20u, 2099u, 0u, 0u, 0u,
     0u, 3446u, 0u, false}},
    {1u, {false, 3446u, 114u}, {false, 2u}, {100u, 1u, 1u, 3446u, 3446u, 1u, 20u, 2099u, 0u, 0u, 0u,
     0u, 3446u, 0u, false}},
    {38u, {false, 2763u, 3980u}, {false, 0u}, {100u, 1u, 30u, 2763u, 2763u, 39u, 0u, 3000u, 0u, 0u,
     0u, 0u, 2763u, 0u, false}},
    {12u, {false, 2763u, 3980u}, {true, 0u}, {100u, 1u, 30u, 2763u, 2763u, 11u, 0u, 3000u, 0u,
     1000u, 40u, 1u, 2763u, 11u, false}},
    {1u, {false, 1964u, 3980u}, {true, 0u}, {100u, 1u, 30u, 1964u, 2763u, 12u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 2763u, 12u, false}},
    {1u, {false, 965u, 3980u}, {true, 0u}, {0u, 2u, 0u, 1964u, 2763u, 13u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 1964u, 13u, false}},
    {1u, {true, 965u, 3980u}, {true, 0u}, {0u, 2u, 1u, 1964u, 2763u, 14u, 0u, 3000u, 0u, 1000u, 40u,
     1u, 1964u, 13u, false}},
    {2u, {false, 3941u, 3980u}, {true, 0u}, {0u, 2u, 3u, 1964u, 2763u, 16u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 1964u, 15u, false}},
    {1u, {false, 2098u, 977u}, {true, 0u}, {1u, 2u, 4u, 2098u, 1964u, 17u, 0u, 1577u, 0u, 1000u,
     40u, 1u, 2098u, 0u, false}},
    {1u, {false, 2056u, 3980u}, {true, 0u}, {2u, 2u, 5u, 2056u, 2098u, 18u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 2056u, 1u, false}},
    {4u, {false, 2056u, 3497u}, {true, 0u}, {6u, 2u, 9u, 2056u, 2056u, 22u, 0u, 2808u, 0u, 1000u,
     40u, 1u, 2056u, 5u, false}},
    {1u, {false, 3626u, 3497u}, {true, 0u}, {7u, 2u, 10u, 3626u, 2056u, 23u, 0u, 2808u, 0u, 1000u,
     40u, 1u, 2056u, 6u, false}},
    {1u, {false, 2370u, 0u}, {true, 0u}, {8u, 2u, 11u, 2370u, 3626u, 24u, 1u, 2808u, 0u, 1000u, 40u,
     1u, 2370u, 0u, false}},
    {1u, {true, 2370u, 0u}, {true, 0u}, {9u, 2u, 12u, 2370u, 2370u, 25u, 2u, 2808u, 0u, 1000u, 40u,
     1u, 2370u, 0u, false}},
    {1u, {true, 2370u, 0u}, {true, 0u}, {10u, 1u, 0u, 2370u, 2370u, 26u, 3u, 2808u, 0u, 1000u, 40u,
     1u, 2370u, 0u, false}},
    {18u, {true, 1063u, 3980u}, {true, 0u}, {0u, 2u, 17u, 2370u, 2370u, 4u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 2370u, 0u, false}},
    {2u, {true, 1063u, 597u}, {true, 0u}, {0u, 2u, 19u, 2370u, 2370u, 6u, 0u, 1391u, 0u, 1000u, 40u,
     1u, 2370u, 0u, false}},
    {1u, {true, 1063u, 597u}, {false, 1u}, {0u, 3u, 0u, 2370u, 2370u, 39u, 0u, 1391u, 0u, 0u, 0u,
     0u, 2370u, 0u, false}},
    {11u, {false, 2763u, 3014u}, {false, 1u}, {11u, 3u, 11u, 2763u, 2763u, 39u, 0u, 2572u, 0u, 0u,
     0u, 0u, 2763u, 0u, false}},
    {1u, {false, 2762u, 3014u}, {false, 1u}, {12u, 3u, 12u, 2762u, 2763u, 39u, 0u, 2572u, 0u, 0u,
     0u, 0u, 2763u, 0u, false}},
    {1u, {false, 3444u, 3890u}, {false, 1u}, {13u, 3u, 13u, 3444u, 2762u, 39u, 0u, 3000u, 0u, 0u,
     0u, 0u, 2763u, 0u, false}},
    /* vector 7 */
    {9u, {false, 2763u, 3014u}, {false, 0u}, {9u, 0u, 9u, 2763u, 2763u, 39u, 0u, 2572u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {false, 2763u, 3014u}, {true, 0u}, {11u, 1u, 1u, 2763u, 2763u, 1u, 0u, 2572u, 0u, 1000u,
     40u, 1u, 2763u, 1u, false}},
    {1u, {false, 2762u, 3014u}, {true, 0u}, {12u, 1u, 2u, 2762u, 2763u, 2u, 0u, 2572u, 0u, 1000u,
     40u, 1u, 2763u, 2u, false}},
    {1u, {false, 3444u, 3890u}, {true, 0u}, {13u, 1u, 3u, 3444u, 2762u, 3u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 2763u, 3u, false}},
    {1u, {false, 2684u, 3890u}, {true, 0u}, {14u, 1u, 4u, 2684u, 3444u, 4u, 0u, 3000u, 0u, 1000u,
     40u, 1u, 2762u, 4u, false}},
    {19u, {false, 1012u, 0u}, {true, 0u}, {0u, 2u, 18u, 2684u, 3444u, 23u, 19u, 3000u, 0u, 1000u,
     40u, 1u, 2684u, 23u, false}},
    {1u, {false, 1012u, 0u}, {true, 2u}, {0u, 2u, 19u, 2684u, 3444u, 24u, 20u, 3000u, 0u, 1000u,
     40u, 1u, 2684u, 24u, false}},
    {32u, {false, 1012u, 0u}, {false, 3u}, {0u, 3u, 30u, 2684u, 3444u, 39u, 20u, 3000u, 0u, 0u, 0u,
     0u, 2684u, 0u, false}},
    {2u, {false, 3446u, 0u}, {false, 3u}, {2u, 3u, 30u, 3446u, 3446u, 39u, 20u, 3000u, 0u, 0u, 0u,
     0u, 3446u, 0u, false}},
    {1u, {false, 3445u, 0u}, {false, 3u}, {3u, 3u, 30u, 3445u, 3446u, 39u, 20u, 3000u, 0u, 0u, 0u,
     0u, 3446u, 0u, false}},
    {1u, {false, 2684u, 205u}, {false, 1u}, {4u, 3u, 30u, 2684u, 3445u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 3445u, 0u, false}},
    /* vector 8 */
    {2u, {false, 2763u, 1080u}, {false, 0u}, {2u, 0u, 2u, 2763u, 2763u, 39u, 0u, 1627u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {false, 2763u, 206u}, {false, 0u}, {4u, 0u, 4u, 2763u, 2763u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {true, 2763u, 206u}, {false, 0u}, {6u, 0u, 6u, 2763u, 2763u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 3890u}, {false, 0u}, {7u, 0u, 7u, 2763u, 2763u, 39u, 0u, 3000u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 0u}, {false, 0u}, {8u, 0u, 8u, 2763u, 2763u, 39u, 1u, 3000u, 0u, 0u, 0u, 0u,
     2763u, 0u, false}},
    {1u, {false, 1429u, 0u}, {false, 0u}, {9u, 0u, 9u, 1429u, 2763u, 39u, 2u, 3000u, 0u, 0u, 0u, 0u,
     2763u, 0u, false}},
    {2u, {false, 2764u, 0u}, {true, 0u}, {11u, 1u, 1u, 2764u, 2764u, 1u, 4u, 3000u, 0u, 1000u, 40u,
     1u, 2763u, 1u, false}},
    {7u, {false, 2763u, 597u}, {true, 0u}, {18u, 1u, 8u, 2763u, 2763u, 8u, 0u, 1391u, 0u, 1000u,
     40u, 1u, 2763u, 8u, false}},
    {19u, {true, 2763u, 65535u}, {true, 0u}, {37u, 1u, 27u, 2763u, 2763u, 27u, 19u, 1391u, 0u,
     1000u, 40u, 1u, 2763u, 8u, false}},
    {13u, {true, 2763u, 65535u}, {true, 2u}, {50u, 1u, 30u, 2763u, 2763u, 0u, 20u, 1391u, 0u, 1000u,
     40u, 1u, 2763u, 8u, false}},
    {2u, {false, 2762u, 3889u}, {true, 0u}, {52u, 1u, 30u, 2762u, 2762u, 2u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 10u, false}},
    {4u, {false, 65535u, 3889u}, {true, 0u}, {0u, 2u, 3u, 2762u, 2762u, 6u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 14u, false}},
    {1u, {false, 2998u, 3889u}, {true, 0u}, {1u, 2u, 4u, 2998u, 2762u, 7u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 15u, false}},
    {3u, {false, 2684u, 1963u}, {true, 0u}, {4u, 2u, 7u, 2684u, 2684u, 10u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2684u, 18u, false}},
    {3u, {true, 2684u, 1963u}, {true, 0u}, {7u, 2u, 10u, 2684u, 2684u, 13u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2684u, 18u, false}},
    {2u, {true, 2763u, 1963u}, {true, 0u}, {9u, 2u, 12u, 2763u, 2763u, 15u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {1u, {true, 65535u, 1963u}, {true, 0u}, {0u, 2u, 13u, 2763u, 2763u, 16u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {1u, {true, 1430u, 1963u}, {true, 0u}, {1u, 2u, 14u, 1430u, 2763u, 17u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {3u, {false, 2763u, 1963u}, {true, 0u}, {4u, 2u, 17u, 2763u, 2763u, 20u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 3u, false}},
    {2u, {false, 2763u, 1962u}, {true, 0u}, {6u, 2u, 19u, 2763u, 2763u, 22u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 5u, false}},
    {93u, {false, 2763u, 1962u}, {false, 1u}, {99u, 3u, 30u, 2763u, 2763u, 39u, 0u, 2058u, 0u, 0u,
     0u, 0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 1962u}, {false, 0u}, {100u, 1u, 0u, 2763u, 2763u, 0u, 0u, 2058u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {39u, {false, 2056u, 1962u}, {false, 0u}, {100u, 1u, 30u, 2056u, 2056u, 39u, 0u, 2058u, 0u, 0u,
     0u, 0u, 2056u, 0u, false}},
    {1u, {false, 0u, 1962u}, {false, 0u}, {0u, 2u, 0u, 2056u, 2056u, 0u, 0u, 2058u, 0u, 1000u, 40u,
     0u, 2056u, 0u, false}},
    {2u, {false, 2763u, 1080u}, {false, 0u}, {2u, 2u, 2u, 2763u, 2763u, 2u, 0u, 1627u, 0u, 1000u,
     40u, 0u, 2763u, 0u, false}},
    {2u, {false, 2763u, 206u}, {false, 0u}, {4u, 2u, 4u, 2763u, 2763u, 4u, 0u, 1200u, 0u, 1000u,
     40u, 0u, 2763u, 0u, false}},
    {2u, {true, 2763u, 206u}, {false, 0u}, {6u, 2u, 6u, 2763u, 2763u, 6u, 0u, 1200u, 0u, 1000u, 40u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 3890u}, {false, 0u}, {7u, 2u, 7u, 2763u, 2763u, 7u, 0u, 3000u, 0u, 1000u,
     40u, 0u, 2763u, 0u, false}},
    {1u, {false, 2763u, 0u}, {false, 0u}, {8u, 2u, 8u, 2763u, 2763u, 8u, 1u, 3000u, 0u, 1000u, 40u,
     0u, 2763u, 0u, false}},
    {1u, {false, 2762u, 3889u}, {false, 0u}, {9u, 2u, 9u, 2762u, 2763u, 9u, 0u, 2999u, 0u, 1000u,
     40u, 0u, 2763u, 0u, false}},
    {1u, {false, 2762u, 3889u}, {true, 0u}, {10u, 1u, 0u, 2762u, 2762u, 10u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 0u, false}},
    {4u, {false, 65535u, 3889u}, {true, 0u}, {0u, 2u, 3u, 2762u, 2762u, 14u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 4u, false}},
    {1u, {false, 2998u, 3889u}, {true, 0u}, {1u, 2u, 4u, 2998u, 2762u, 15u, 0u, 2999u, 0u, 1000u,
     40u, 1u, 2762u, 5u, false}},
    {3u, {false, 2684u, 1963u}, {true, 0u}, {4u, 2u, 7u, 2684u, 2684u, 18u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2684u, 8u, false}},
    {3u, {true, 2684u, 1963u}, {true, 0u}, {7u, 2u, 10u, 2684u, 2684u, 21u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2684u, 8u, false}},
    {2u, {true, 2763u, 1963u}, {true, 0u}, {9u, 2u, 12u, 2763u, 2763u, 23u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {1u, {true, 65535u, 1963u}, {true, 0u}, {0u, 2u, 13u, 2763u, 2763u, 24u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {1u, {true, 1430u, 1963u}, {true, 0u}, {1u, 2u, 14u, 1430u, 2763u, 25u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {3u, {false, 2763u, 1963u}, {true, 0u}, {4u, 2u, 17u, 2763u, 2763u, 28u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 3u, false}},
    {1u, {false, 3445u, 1963u}, {true, 0u}, {5u, 2u, 18u, 3445u, 2763u, 29u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 2763u, 4u, false}},
    {1u, {false, 3478u, 1963u}, {true, 0u}, {6u, 2u, 19u, 3478u, 3445u, 30u, 0u, 2058u, 0u, 1000u,
     40u, 1u, 3445u, 0u, false}},
    {1u, {false, 3478u, 3981u}, {false, 1u}, {7u, 3u, 0u, 3478u, 3478u, 39u, 1u, 2058u, 0u, 0u, 0u,
     0u, 3478u, 0u, false}},
    /* vector 9 */
    {9u, {true, 2763u, 2047u}, {false, 0u}, {9u, 0u, 9u, 2763u, 2763u, 39u, 0u, 2099u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {true, 2763u, 2047u}, {true, 0u}, {10u, 1u, 0u, 2763u, 2763u, 0u, 0u, 2099u, 1720u, 176u,
     7u, 1u, 2763u, 0u, false}},
    {6u, {true, 2763u, 3497u}, {true, 0u}, {16u, 1u, 6u, 2763u, 2763u, 6u, 0u, 2808u, 1720u, 176u,
     7u, 1u, 2763u, 0u, false}},
    {33u, {true, 2763u, 3497u}, {false, 0u}, {49u, 1u, 30u, 2763u, 2763u, 39u, 0u, 2808u, 1720u,
     176u, 7u, 0u, 2763u, 0u, false}},
    {1u, {true, 2763u, 3497u}, {true, 0u}, {50u, 1u, 30u, 2763u, 2763u, 0u, 0u, 2808u, 1720u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {1u, {true, 2763u, 205u}, {true, 0u}, {51u, 1u, 30u, 2763u, 2763u, 1u, 0u, 1200u, 1720u, 1000u,
     40u, 1u, 2763u, 0u, false}},
    {38u, {true, 3444u, 204u}, {true, 0u}, {89u, 1u, 30u, 3444u, 3444u, 39u, 0u, 1200u, 1720u,
     1000u, 40u, 1u, 3444u, 0u, false}},
    {1u, {true, 3444u, 204u}, {false, 0u}, {90u, 1u, 30u, 3444u, 3444u, 0u, 0u, 1200u, 1720u, 0u,
     0u, 0u, 3444u, 0u, false}},
    {39u, {false, 2998u, 3014u}, {false, 0u}, {100u, 1u, 30u, 2998u, 2998u, 39u, 0u, 2572u, 1720u,
     0u, 0u, 0u, 2998u, 0u, false}},
    {1u, {false, 0u, 3014u}, {false, 0u}, {0u, 2u, 0u, 2998u, 2998u, 0u, 0u, 2572u, 5719u, 411u,
     16u, 0u, 2998u, 0u, false}},
    {3u, {false, 1430u, 116u}, {false, 0u}, {3u, 2u, 3u, 1430u, 1430u, 3u, 0u, 1200u, 5719u, 411u,
     16u, 0u, 1430u, 0u, false}},
    {4u, {false, 1430u, 3891u}, {false, 0u}, {7u, 2u, 7u, 1430u, 1430u, 7u, 0u, 3000u, 5719u, 411u,
     16u, 0u, 1430u, 0u, false}},
    {1u, {false, 2684u, 3891u}, {false, 0u}, {8u, 2u, 8u, 2684u, 1430u, 8u, 0u, 3000u, 5719u, 411u,
     16u, 0u, 1430u, 0u, false}},
    {1u, {true, 2684u, 3891u}, {false, 0u}, {9u, 2u, 9u, 2684u, 2684u, 9u, 0u, 3000u, 5719u, 411u,
     16u, 0u, 2684u, 0u, false}},
    {1u, {true, 2684u, 3891u}, {true, 0u}, {10u, 1u, 0u, 2684u, 2684u, 10u, 0u, 3000u, 5719u, 411u,
     16u, 1u, 2684u, 0u, false}},
    {1u, {true, 2620u, 3891u}, {true, 0u}, {11u, 1u, 1u, 2620u, 2684u, 11u, 0u, 3000u, 5719u, 411u,
     16u, 1u, 2684u, 0u, false}},
    {2u, {true, 2716u, 0u}, {true, 0u}, {13u, 1u, 3u, 2716u, 2716u, 13u, 2u, 3000u, 5719u, 411u,
     16u, 1u, 2684u, 0u, false}},
    {2u, {false, 2370u, 0u}, {true, 0u}, {15u, 1u, 5u, 2370u, 2370u, 15u, 4u, 3000u, 5719u, 411u,
     16u, 1u, 2370u, 2u, false}},
    {24u, {false, 2370u, 3891u}, {false, 0u}, {39u, 1u, 29u, 2370u, 2370u, 39u, 0u, 3000u, 5719u,
     411u, 16u, 0u, 2370u, 0u, false}},
    {38u, {false, 2370u, 3891u}, {true, 0u}, {77u, 1u, 30u, 2370u, 2370u, 37u, 0u, 3000u, 5719u,
     1000u, 40u, 1u, 2370u, 37u, false}},
    {39u, {false, 2370u, 1001u}, {true, 0u}, {100u, 1u, 30u, 2370u, 2370u, 36u, 0u, 1588u, 14620u,
     918u, 37u, 1u, 2370u, 76u, false}},
    {1u, {false, 2370u, 1001u}, {false, 0u}, {100u, 1u, 30u, 2370u, 2370u, 37u, 0u, 1588u, 14620u,
     918u, 37u, 0u, 2370u, 77u, false}},
    {1u, {true, 2370u, 1001u}, {false, 0u}, {100u, 1u, 30u, 2370u, 2370u, 38u, 0u, 1588u, 14620u,
     918u, 37u, 0u, 2370u, 0u, false}},
    {37u, {true, 2370u, 116u}, {false, 0u}, {100u, 1u, 30u, 2370u, 2370u, 35u, 0u, 1200u, 14620u,
     0u, 0u, 0u, 2370u, 0u, false}},
    {1u, {true, 38u, 3981u}, {false, 0u}, {0u, 2u, 0u, 2370u, 2370u, 36u, 1u, 1200u, 14620u, 0u, 0u,
     0u, 2370u, 0u, false}},
    {1u, {true, 16889u, 3981u}, {false, 0u}, {0u, 2u, 1u, 2370u, 2370u, 37u, 2u, 1200u, 14620u, 0u,
     0u, 0u, 2370u, 0u, false}},
    {3u, {true, 16889u, 597u}, {false, 0u}, {0u, 2u, 4u, 2370u, 2370u, 0u, 0u, 1391u, 15050u, 58u,
     2u, 0u, 2370u, 0u, false}},
    {2u, {false, 2762u, 3889u}, {false, 0u}, {2u, 2u, 6u, 2762u, 2762u, 2u, 0u, 2999u, 15050u, 58u,
     2u, 0u, 2762u, 0u, false}},
    {4u, {false, 65535u, 3889u}, {false, 0u}, {0u, 2u, 10u, 2762u, 2762u, 6u, 0u, 2999u, 15050u,
     58u, 2u, 0u, 2762u, 0u, false}},
    {1u, {false, 2998u, 3889u}, {false, 0u}, {1u, 2u, 11u, 2998u, 2762u, 7u, 0u, 2999u, 15050u, 58u,
     2u, 0u, 2762u, 0u, false}},
    {3u, {false, 2684u, 1963u}, {false, 0u}, {4u, 2u, 14u, 2684u, 2684u, 10u, 0u, 2058u, 15050u,
     58u, 2u, 0u, 2684u, 0u, false}},
    {3u, {true, 2684u, 1963u}, {false, 0u}, {7u, 2u, 17u, 2684u, 2684u, 13u, 0u, 2058u, 15050u, 58u,
     2u, 0u, 2684u, 0u, false}},
    {2u, {true, 2763u, 1963u}, {false, 0u}, {9u, 2u, 19u, 2763u, 2763u, 15u, 0u, 2058u, 15050u, 58u,
     2u, 0u, 2763u, 0u, false}},
    {1u, {true, 65535u, 1963u}, {false, 1u}, {0u, 3u, 0u, 2763u, 2763u, 39u, 0u, 2058u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {true, 1430u, 1963u}, {false, 1u}, {1u, 3u, 1u, 1430u, 2763u, 39u, 0u, 2058u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {3u, {false, 2763u, 1963u}, {false, 1u}, {4u, 3u, 4u, 2763u, 2763u, 39u, 0u, 2058u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {4u, {false, 2763u, 1962u}, {false, 1u}, {8u, 3u, 8u, 2763u, 2763u, 39u, 0u, 2058u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {3u, {false, 2998u, 1962u}, {false, 1u}, {11u, 3u, 11u, 2998u, 2998u, 39u, 0u, 2058u, 0u, 0u,
     0u, 0u, 2998u, 0u, false}},
    {1u, {false, 2684u, 1962u}, {false, 1u}, {12u, 3u, 12u, 2684u, 2998u, 39u, 0u, 2058u, 0u, 0u,
     0u, 0u, 2998u, 0u, false}},
    {87u, {false, 2762u, 1962u}, {false, 1u}, {99u, 3u, 30u, 2762u, 2762u, 39u, 0u, 2058u, 0u, 0u,
     0u, 0u, 2762u, 0u, false}},
    {1u, {true, 2764u, 1962u}, {false, 0u}, {100u, 1u, 0u, 2764u, 2762u, 0u, 0u, 2058u, 43u, 4u, 0u,
     0u, 2762u, 0u, false}},
    {39u, {true, 2763u, 1962u}, {false, 0u}, {100u, 1u, 30u, 2763u, 2763u, 39u, 0u, 2058u, 43u, 4u,
     0u, 0u, 2763u, 0u, false}},
    {1u, {true, 15u, 1962u}, {false, 0u}, {0u, 2u, 0u, 2763u, 2763u, 0u, 0u, 2058u, 43u, 0u, 0u, 0u,
     2763u, 0u, false}},
    /* vector 10 */
    {2u, {false, 2763u, 1080u}, {false, 0u}, {2u, 0u, 2u, 2763u, 2763u, 39u, 0u, 1627u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {2u, {false, 2763u, 206u}, {false, 0u}, {4u, 0u, 4u, 2763u, 2763u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 936u, 114u}, {false, 0u}, {0u, 0u, 5u, 2763u, 2763u, 39u, 1u, 1200u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 936u, 3891u}, {false, 0u}, {0u, 0u, 6u, 2763u, 2763u, 39u, 0u, 3000u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {false, 1762u, 3891u}, {false, 0u}, {1u, 0u, 7u, 1762u, 2763u, 39u, 0u, 3000u, 0u, 0u, 0u,
     0u, 2763u, 0u, false}},
    {1u, {true, 1762u, 205u}, {false, 0u}, {2u, 0u, 8u, 1762u, 1762u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 1762u, 0u, false}},
    {1u, {true, 2100u, 205u}, {false, 0u}, {3u, 0u, 9u, 2100u, 1762u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 1762u, 0u, false}},
    {6u, {false, 2138u, 205u}, {false, 0u}, {9u, 0u, 15u, 2138u, 2138u, 39u, 0u, 1200u, 0u, 0u, 0u,
     0u, 2138u, 0u, false}},
    {1u, {false, 2138u, 205u}, {true, 0u}, {10u, 1u, 0u, 2138u, 2138u, 0u, 0u, 1200u, 9417u, 966u,
     40u, 1u, 2138u, 0u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct deck1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 7u, false, {0u}},
    {7u, 10u, false, {0u}},
    {10u, 17u, false, {0u}},
    {17u, 20u, false, {0u}},
    {20u, 25u, false, {0u}},
    {25u, 69u, false, {0u}},
    {69u, 80u, false, {0u}},
    {80u, 122u, false, {0u}},
    {122u, 165u, false, {0u}},
    {165u, 174u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct deck1 m;
    struct deck1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    deck1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            deck1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct deck1 fresh =
    {0u, 0u, 0u, 0u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u, 0u, 0u, false};

static void start_and_compare(const char *what, const struct deck1_remembered *r,
                              const struct deck1 *wanted)
{
    struct deck1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    deck1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct deck1 m;
    struct deck1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", deck1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", deck1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct deck1 m;
    struct deck1_in in;
    struct deck1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct deck1 after =
           {0u, 3u, 0u, 0u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct deck1_out wanted =
           {false, 3u};

        doing = "roof_probe_state upset";
        deck1_start(&m, NULL);
        m.roof_probe_state = 4u;
        deck1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct deck1 after =
           {0u, 3u, 0u, 0u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct deck1_out wanted =
           {false, 3u};

        doing = "roof_probe_state upset";
        deck1_start(&m, NULL);
        m.roof_probe_state = 255u;
        deck1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct deck1 after =
           {0u, 0u, 1u, 0u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct deck1_out wanted =
           {false, 2u};

        doing = "elements upset";
        deck1_start(&m, NULL);
        m.elements = 2u;
        deck1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct deck1 after =
           {0u, 0u, 1u, 0u, 0u, 39u, 20u, 2500u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct deck1_out wanted =
           {false, 2u};

        doing = "elements upset";
        deck1_start(&m, NULL);
        m.elements = 255u;
        deck1_step(&m, &in, &out);
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
