/* gwh1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Gas water heater, boat house
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 52a2fa594aacaa95bd253c6298389f618d93b844be1d85baca786c2236c28846
 *
 * Stays hard-wired, and must:
 * - tank_stat: rod stat of the appliance's own valve
 * - flame_guard: thermocouple flame supervision of the pilot
 * - cutoff: energy cut-off in the tank, one shot, opens the thermocouple's loop
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
 * Open findings: 1 earth_fault_bypasses_limit (act, gwh1); 2 overshoot_not_determined (act,
 * cutoff/boiling). Not judged, for want of a figure: 1; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "gwh1.h"

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

static void compare_out(const struct gwh1_out *got, const struct gwh1_out *wanted)
{
    compare("flame_guard_days", (long)got->flame_guard_days, (long)wanted->flame_guard_days);
    compare("cutoff_trips", (long)got->cutoff_trips, (long)wanted->cutoff_trips);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct gwh1 *got, const struct gwh1 *wanted)
{
    compare("couple_good_for", (long)got->couple_good_for, (long)wanted->couple_good_for);
    compare("couple_state", (long)got->couple_state, (long)wanted->couple_state);
    compare("couple_state_for", (long)got->couple_state_for, (long)wanted->couple_state_for);
    compare("couple_last", (long)got->couple_last, (long)wanted->couple_last);
    compare("couple_before", (long)got->couple_before, (long)wanted->couple_before);
    compare("flame_guard_flame", (long)got->flame_guard_flame, (long)wanted->flame_guard_flame);
    compare("flame_guard_flame_for",
            (long)got->flame_guard_flame_for,
            (long)wanted->flame_guard_flame_for);
    compare("flame_guard_weak_time",
            (long)got->flame_guard_weak_time,
            (long)wanted->flame_guard_weak_time);
    compare("flame_guard_was_lit",
            (long)got->flame_guard_was_lit,
            (long)wanted->flame_guard_was_lit);
    compare("flame_guard_day_at", (long)got->flame_guard_day_at, (long)wanted->flame_guard_day_at);
    compare("flame_guard_days_gone",
            (long)got->flame_guard_days_gone,
            (long)wanted->flame_guard_days_gone);
    compare("cutoff_was_tripped", (long)got->cutoff_was_tripped, (long)wanted->cutoff_was_tripped);
    compare("cutoff_trips_seen", (long)got->cutoff_trips_seen, (long)wanted->cutoff_trips_seen);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct gwh1_in in;
    struct gwh1_out out;
    struct gwh1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {1u, 0u, 1u, 654u, 0u, 0u, 1u, 0u, false, 1u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {2u, 0u, 2u, 654u, 654u, 0u, 2u, 0u, false, 2u, 0u,
     false, 0u}},
    {2u, {false, false, 654u}, {0u, 0u, 4u}, {4u, 0u, 4u, 654u, 654u, 0u, 4u, 0u, false, 4u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {5u, 1u, 0u, 654u, 654u, 0u, 5u, 0u, false, 5u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {6u, 1u, 1u, 654u, 654u, 0u, 6u, 0u, false, 6u, 0u,
     false, 0u}},
    {4u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 5u, 654u, 654u, 0u, 10u, 0u, false, 10u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 6u, 654u, 654u, 0u, 11u, 0u, false, 11u, 0u,
     false, 0u}},
    {9u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 20u, 0u, false, 20u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 21u, 0u, false, 21u, 0u,
     false, 0u}},
    {79u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u, false, 100u,
     0u, false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u, false, 101u,
     0u, false, 0u}},
    {UINT32_C(86299), {false, false, 654u}, {0u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u,
     false, UINT32_C(86400), 0u, false, 0u}},
    {1u, {false, false, 654u}, {1u, 0u, 4u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u, false, 0u, 1u,
     false, 0u}},
    {1u, {true, false, 654u}, {1u, 1u, 20u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u, false, 1u, 1u,
     true, 1u}},
    {1u, {true, false, 654u}, {1u, 1u, 20u}, {10u, 1u, 15u, 654u, 654u, 0u, 100u, 0u, false, 2u, 1u,
     true, 1u}},
    /* vector 2 */
    {1u, {true, false, 654u}, {0u, 0u, 20u}, {1u, 0u, 1u, 654u, 0u, 0u, 1u, 0u, false, 1u, 0u, true,
     0u}},
    {2u, {false, false, 0u}, {0u, 0u, 4u}, {3u, 0u, 3u, 0u, 0u, 0u, 3u, 0u, false, 3u, 0u, false,
     0u}},
    {2u, {false, false, 0u}, {0u, 0u, 4u}, {5u, 1u, 0u, 0u, 0u, 0u, 5u, 0u, false, 5u, 0u, false,
     0u}},
    /* vector 3 */
    {2u, {false, false, 655u}, {0u, 0u, 4u}, {2u, 0u, 2u, 655u, 655u, 0u, 2u, 0u, false, 2u, 0u,
     false, 0u}},
    {2u, {false, false, 655u}, {0u, 0u, 4u}, {4u, 0u, 4u, 655u, 655u, 0u, 4u, 0u, false, 4u, 0u,
     false, 0u}},
    {1u, {false, false, 655u}, {0u, 0u, 0u}, {5u, 1u, 0u, 655u, 655u, 1u, 0u, 0u, true, 5u, 0u,
     false, 0u}},
    {1u, {false, false, 655u}, {0u, 0u, 0u}, {6u, 1u, 1u, 655u, 655u, 1u, 1u, 0u, true, 6u, 0u,
     false, 0u}},
    {98u, {false, false, 655u}, {0u, 0u, 0u}, {10u, 1u, 15u, 655u, 655u, 1u, 99u, 0u, true, 104u,
     0u, false, 0u}},
    {1u, {false, false, 655u}, {0u, 0u, 0u}, {10u, 1u, 15u, 655u, 655u, 2u, 0u, 0u, true, 105u, 0u,
     false, 0u}},
    {1u, {false, false, 655u}, {0u, 0u, 0u}, {10u, 1u, 15u, 655u, 655u, 2u, 1u, 0u, true, 106u, 0u,
     false, 0u}},
    /* vector 4 */
    {4u, {false, false, 656u}, {0u, 0u, 4u}, {4u, 0u, 4u, 656u, 656u, 0u, 4u, 0u, false, 4u, 0u,
     false, 0u}},
    {1u, {false, false, 656u}, {0u, 0u, 0u}, {5u, 1u, 0u, 656u, 656u, 1u, 0u, 0u, true, 5u, 0u,
     false, 0u}},
    {1u, {false, false, 4081u}, {0u, 0u, 0u}, {6u, 1u, 1u, 4081u, 656u, 1u, 1u, 0u, true, 6u, 0u,
     false, 0u}},
    {1u, {false, false, 4082u}, {0u, 0u, 0u}, {0u, 2u, 0u, 4081u, 656u, 1u, 2u, 0u, true, 7u, 0u,
     false, 0u}},
    /* vector 5 */
    {1u, {false, false, 4082u}, {0u, 0u, 4u}, {0u, 0u, 1u, 0u, 0u, 0u, 1u, 0u, false, 1u, 0u, false,
     0u}},
    {13u, {false, false, 4082u}, {0u, 0u, 4u}, {0u, 0u, 14u, 0u, 0u, 0u, 14u, 0u, false, 14u, 0u,
     false, 0u}},
    {1u, {false, false, 4082u}, {0u, 0u, 5u}, {0u, 3u, 0u, 0u, 0u, 0u, 15u, 0u, false, 15u, 0u,
     false, 0u}},
    {1u, {false, false, 4082u}, {0u, 0u, 5u}, {0u, 3u, 1u, 0u, 0u, 0u, 16u, 0u, false, 16u, 0u,
     false, 0u}},
    {8u, {false, true, 654u}, {0u, 0u, 5u}, {8u, 3u, 9u, 654u, 654u, 0u, 24u, 0u, false, 24u, 0u,
     false, 0u}},
    {1u, {false, false, 654u}, {0u, 0u, 5u}, {9u, 3u, 10u, 654u, 654u, 0u, 25u, 0u, false, 25u, 0u,
     false, 0u}},
    {1u, {false, false, 4080u}, {0u, 0u, 4u}, {10u, 1u, 0u, 4080u, 654u, 0u, 26u, 0u, false, 26u,
     0u, false, 0u}},
    {1u, {false, true, 4080u}, {0u, 0u, 0u}, {10u, 1u, 1u, 4080u, 4080u, 1u, 0u, 0u, true, 27u, 0u,
     false, 0u}},
    {2u, {false, false, 4082u}, {0u, 0u, 0u}, {0u, 2u, 1u, 4080u, 4080u, 1u, 2u, 0u, true, 29u, 0u,
     false, 0u}},
    {8u, {false, false, 4082u}, {0u, 0u, 0u}, {0u, 2u, 9u, 4080u, 4080u, 1u, 10u, 0u, true, 37u, 0u,
     false, 0u}},
    {1u, {false, true, 653u}, {0u, 0u, 1u}, {1u, 3u, 0u, 653u, 4080u, 1u, 11u, 0u, true, 38u, 0u,
     false, 0u}},
    /* vector 6 */
    {5u, {false, false, 654u}, {0u, 0u, 4u}, {5u, 1u, 0u, 654u, 654u, 0u, 5u, 0u, false, 5u, 0u,
     false, 0u}},
    {2u, {false, false, 4082u}, {0u, 0u, 4u}, {0u, 2u, 1u, 654u, 654u, 0u, 7u, 0u, false, 7u, 0u,
     false, 0u}},
    {1u, {true, false, 655u}, {0u, 1u, 20u}, {1u, 2u, 2u, 655u, 654u, 0u, 8u, 0u, false, 8u, 0u,
     true, 1u}},
    {1u, {true, true, 655u}, {0u, 1u, 20u}, {2u, 2u, 3u, 655u, 655u, 0u, 9u, 0u, false, 9u, 0u,
     true, 1u}},
    {2u, {true, true, 655u}, {0u, 1u, 20u}, {4u, 2u, 5u, 655u, 655u, 0u, 11u, 0u, false, 11u, 0u,
     true, 1u}},
    {1u, {true, true, 655u}, {0u, 1u, 16u}, {5u, 1u, 0u, 655u, 655u, 1u, 0u, 0u, true, 12u, 0u,
     true, 1u}},
    {2u, {true, true, 246u}, {0u, 1u, 16u}, {7u, 1u, 2u, 246u, 246u, 1u, 2u, 0u, true, 14u, 0u,
     true, 1u}},
    {1u, {true, true, 245u}, {0u, 1u, 16u}, {8u, 1u, 3u, 245u, 246u, 1u, 3u, 0u, true, 15u, 0u,
     true, 1u}},
    {1u, {true, true, 245u}, {0u, 1u, 20u}, {9u, 1u, 4u, 245u, 245u, 0u, 0u, 0u, false, 0u, 0u,
     true, 1u}},
    {1u, {true, false, 655u}, {0u, 1u, 20u}, {10u, 1u, 5u, 655u, 245u, 0u, 1u, 0u, false, 1u, 0u,
     true, 1u}},
    {102u, {true, false, 655u}, {0u, 1u, 16u}, {10u, 1u, 15u, 655u, 655u, 2u, 1u, 0u, true, 103u,
     0u, true, 1u}},
    {1u, {true, false, 656u}, {0u, 1u, 16u}, {10u, 1u, 15u, 656u, 655u, 2u, 2u, 0u, true, 104u, 0u,
     true, 1u}},
    {1u, {true, true, 246u}, {0u, 1u, 16u}, {10u, 1u, 15u, 246u, 656u, 2u, 3u, 0u, true, 105u, 0u,
     true, 1u}},
    {1u, {true, true, 245u}, {0u, 1u, 16u}, {10u, 1u, 15u, 245u, 246u, 2u, 4u, 1u, true, 106u, 0u,
     true, 1u}},
    {1u, {false, false, 65535u}, {0u, 1u, 0u}, {0u, 2u, 0u, 245u, 246u, 2u, 5u, 0u, true, 107u, 0u,
     false, 1u}},
    {4u, {false, false, 0u}, {0u, 1u, 0u}, {4u, 2u, 4u, 0u, 0u, 2u, 9u, 0u, true, 111u, 0u, false,
     1u}},
    {1u, {false, false, 0u}, {0u, 1u, 4u}, {5u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false,
     1u}},
    {1u, {false, false, 655u}, {0u, 1u, 4u}, {6u, 1u, 1u, 655u, 0u, 0u, 1u, 0u, false, 1u, 0u,
     false, 1u}},
    {5u, {false, false, 655u}, {0u, 1u, 0u}, {10u, 1u, 6u, 655u, 655u, 1u, 4u, 0u, true, 6u, 0u,
     false, 1u}},
    {3u, {false, false, 451u}, {0u, 1u, 0u}, {10u, 1u, 9u, 451u, 451u, 1u, 7u, 0u, true, 9u, 0u,
     false, 1u}},
    {1u, {false, false, 449u}, {0u, 1u, 0u}, {10u, 1u, 10u, 449u, 451u, 1u, 8u, 0u, true, 10u, 0u,
     false, 1u}},
    {1u, {false, false, 4082u}, {0u, 1u, 0u}, {0u, 2u, 0u, 449u, 451u, 1u, 9u, 0u, true, 11u, 0u,
     false, 1u}},
    {9u, {false, false, 65535u}, {0u, 1u, 0u}, {0u, 2u, 9u, 449u, 451u, 1u, 18u, 0u, true, 20u, 0u,
     false, 1u}},
    {87u, {false, false, 65535u}, {0u, 1u, 1u}, {0u, 3u, 15u, 449u, 451u, 2u, 5u, 0u, true, 107u,
     0u, false, 1u}},
    {1u, {false, false, 450u}, {0u, 1u, 1u}, {1u, 3u, 15u, 450u, 449u, 2u, 6u, 0u, true, 108u, 0u,
     false, 1u}},
    {1u, {false, false, 0u}, {0u, 1u, 1u}, {2u, 3u, 15u, 0u, 450u, 2u, 7u, 0u, true, 109u, 0u,
     false, 1u}},
    {1u, {false, false, 245u}, {0u, 1u, 1u}, {3u, 3u, 15u, 245u, 0u, 2u, 8u, 0u, true, 110u, 0u,
     false, 1u}},
    {6u, {false, false, 451u}, {0u, 1u, 1u}, {9u, 3u, 15u, 451u, 451u, 2u, 14u, 0u, true, 116u, 0u,
     false, 1u}},
    {1u, {false, false, 451u}, {0u, 1u, 0u}, {10u, 1u, 0u, 451u, 451u, 2u, 15u, 0u, true, 117u, 0u,
     false, 1u}},
    {2u, {true, true, 450u}, {0u, 2u, 16u}, {10u, 1u, 2u, 450u, 450u, 2u, 17u, 1u, true, 119u, 0u,
     true, 2u}},
    {1u, {true, true, 245u}, {0u, 2u, 16u}, {10u, 1u, 3u, 245u, 450u, 2u, 18u, 2u, true, 120u, 0u,
     true, 2u}},
    {1u, {true, true, 655u}, {0u, 2u, 16u}, {10u, 1u, 4u, 655u, 245u, 2u, 19u, 3u, true, 121u, 0u,
     true, 2u}},
    /* vector 7 */
    {4u, {false, false, 655u}, {0u, 0u, 4u}, {4u, 0u, 4u, 655u, 655u, 0u, 4u, 0u, false, 4u, 0u,
     false, 0u}},
    {2u, {false, false, 655u}, {0u, 0u, 0u}, {6u, 1u, 1u, 655u, 655u, 1u, 1u, 0u, true, 6u, 0u,
     false, 0u}},
    {3u, {false, false, 451u}, {0u, 0u, 0u}, {9u, 1u, 4u, 451u, 451u, 1u, 4u, 0u, true, 9u, 0u,
     false, 0u}},
    {1u, {false, false, 449u}, {0u, 0u, 0u}, {10u, 1u, 5u, 449u, 451u, 1u, 5u, 0u, true, 10u, 0u,
     false, 0u}},
    {1u, {false, false, 4082u}, {0u, 0u, 0u}, {0u, 2u, 0u, 449u, 451u, 1u, 6u, 0u, true, 11u, 0u,
     false, 0u}},
    {9u, {false, false, 65535u}, {0u, 0u, 0u}, {0u, 2u, 9u, 449u, 451u, 1u, 15u, 0u, true, 20u, 0u,
     false, 0u}},
    {1u, {false, false, 65535u}, {0u, 0u, 1u}, {0u, 3u, 0u, 449u, 451u, 1u, 16u, 0u, true, 21u, 0u,
     false, 0u}},
    {2u, {false, false, 655u}, {0u, 0u, 1u}, {2u, 3u, 2u, 655u, 655u, 1u, 18u, 0u, true, 23u, 0u,
     false, 0u}},
    {1u, {false, false, 4080u}, {0u, 0u, 1u}, {3u, 3u, 3u, 4080u, 655u, 1u, 19u, 0u, true, 24u, 0u,
     false, 0u}},
    {1u, {false, false, 244u}, {0u, 0u, 1u}, {4u, 3u, 4u, 244u, 4080u, 1u, 20u, 0u, true, 25u, 0u,
     false, 0u}},
    {1u, {false, false, 245u}, {0u, 0u, 1u}, {5u, 3u, 5u, 245u, 244u, 1u, 21u, 0u, true, 26u, 0u,
     false, 0u}},
    {4u, {false, true, 4081u}, {0u, 0u, 1u}, {9u, 3u, 9u, 4081u, 4081u, 1u, 25u, 0u, true, 30u, 0u,
     false, 0u}},
    {98u, {false, true, 4081u}, {0u, 0u, 0u}, {10u, 1u, 15u, 4081u, 4081u, 2u, 23u, 0u, true, 128u,
     0u, false, 0u}},
    {1u, {false, true, 65535u}, {0u, 0u, 0u}, {0u, 2u, 0u, 4081u, 4081u, 2u, 24u, 0u, true, 129u,
     0u, false, 0u}},
    {5u, {false, true, 4081u}, {0u, 0u, 0u}, {5u, 1u, 0u, 4081u, 4081u, 2u, 29u, 0u, true, 134u, 0u,
     false, 0u}},
    {1u, {false, true, 656u}, {0u, 0u, 0u}, {6u, 1u, 1u, 656u, 4081u, 2u, 30u, 0u, true, 135u, 0u,
     false, 0u}},
    {1u, {false, true, 245u}, {0u, 0u, 0u}, {7u, 1u, 2u, 245u, 656u, 2u, 31u, 0u, true, 136u, 0u,
     false, 0u}},
    {1u, {false, false, 245u}, {0u, 0u, 4u}, {8u, 1u, 3u, 245u, 245u, 0u, 0u, 0u, false, 0u, 0u,
     false, 0u}},
    {1u, {true, true, 655u}, {0u, 1u, 20u}, {9u, 1u, 4u, 655u, 245u, 0u, 1u, 0u, false, 1u, 0u,
     true, 1u}},
    {1u, {true, true, 244u}, {0u, 1u, 20u}, {10u, 1u, 5u, 244u, 655u, 0u, 2u, 0u, false, 2u, 0u,
     true, 1u}},
    {7u, {true, false, 655u}, {0u, 1u, 16u}, {10u, 1u, 12u, 655u, 655u, 1u, 6u, 0u, true, 9u, 0u,
     true, 1u}},
    {1u, {true, false, 244u}, {0u, 1u, 16u}, {10u, 1u, 13u, 244u, 655u, 1u, 7u, 0u, true, 10u, 0u,
     true, 1u}},
    {1u, {false, false, 244u}, {0u, 1u, 4u}, {10u, 1u, 14u, 244u, 244u, 0u, 0u, 0u, false, 0u, 0u,
     false, 1u}},
    {3u, {false, false, 450u}, {0u, 1u, 4u}, {10u, 1u, 15u, 450u, 450u, 0u, 3u, 0u, false, 3u, 0u,
     false, 1u}},
    {1u, {false, false, 655u}, {0u, 1u, 4u}, {10u, 1u, 15u, 655u, 450u, 0u, 4u, 0u, false, 4u, 0u,
     false, 1u}},
    {1u, {true, false, 656u}, {0u, 2u, 16u}, {10u, 1u, 15u, 656u, 655u, 1u, 0u, 0u, true, 5u, 0u,
     true, 2u}},
    {3u, {true, false, 450u}, {0u, 2u, 16u}, {10u, 1u, 15u, 450u, 450u, 1u, 3u, 0u, true, 8u, 0u,
     true, 2u}},
    {1u, {false, false, 450u}, {0u, 2u, 0u}, {10u, 1u, 15u, 450u, 450u, 1u, 4u, 0u, true, 9u, 0u,
     false, 2u}},
    {154u, {false, true, 450u}, {0u, 2u, 0u}, {10u, 1u, 15u, 450u, 450u, 2u, 58u, 59u, true, 163u,
     0u, false, 2u}},
    {1u, {false, true, 450u}, {0u, 2u, 2u}, {10u, 1u, 15u, 450u, 450u, 2u, 59u, 60u, true, 164u, 0u,
     false, 2u}},
    {1u, {false, true, 450u}, {0u, 2u, 2u}, {10u, 1u, 15u, 450u, 450u, 2u, 60u, 60u, true, 165u, 0u,
     false, 2u}},
    {1u, {true, true, 656u}, {0u, 3u, 18u}, {10u, 1u, 15u, 656u, 450u, 2u, 61u, 60u, true, 166u, 0u,
     true, 3u}},
    {UINT32_C(86234), {true, true, 656u}, {0u, 3u, 16u}, {10u, 1u, 15u, 656u, 656u, 2u, 100u, 0u,
     true, UINT32_C(86400), 0u, true, 3u}},
    {59u, {true, true, 656u}, {1u, 3u, 16u}, {10u, 1u, 15u, 656u, 656u, 2u, 100u, 0u, true, 58u, 1u,
     true, 3u}},
    {1u, {true, true, 245u}, {1u, 3u, 16u}, {10u, 1u, 15u, 245u, 656u, 2u, 100u, 0u, true, 59u, 1u,
     true, 3u}},
    {1u, {true, true, 245u}, {0u, 3u, 20u}, {10u, 1u, 15u, 245u, 245u, 0u, 0u, 0u, false, 0u, 0u,
     true, 3u}},
    {1u, {false, false, 4080u}, {0u, 3u, 4u}, {10u, 1u, 15u, 4080u, 245u, 0u, 1u, 0u, false, 1u, 0u,
     false, 3u}},
    {5u, {false, false, 4080u}, {0u, 3u, 0u}, {10u, 1u, 15u, 4080u, 4080u, 1u, 4u, 0u, true, 6u, 0u,
     false, 3u}},
    {3u, {false, false, 4082u}, {0u, 3u, 0u}, {0u, 2u, 2u, 4080u, 4080u, 1u, 7u, 0u, true, 9u, 0u,
     false, 3u}},
    {7u, {false, true, 4082u}, {0u, 3u, 0u}, {0u, 2u, 9u, 4080u, 4080u, 1u, 14u, 0u, true, 16u, 0u,
     false, 3u}},
    {5u, {false, true, 4082u}, {0u, 3u, 1u}, {0u, 3u, 4u, 4080u, 4080u, 1u, 19u, 0u, true, 21u, 0u,
     false, 3u}},
    {9u, {false, true, 449u}, {0u, 3u, 1u}, {9u, 3u, 13u, 449u, 449u, 1u, 28u, 0u, true, 30u, 0u,
     false, 3u}},
    {2u, {false, true, 449u}, {0u, 3u, 0u}, {10u, 1u, 1u, 449u, 449u, 1u, 30u, 0u, true, 32u, 0u,
     false, 3u}},
    {1u, {false, true, 4082u}, {0u, 3u, 0u}, {0u, 2u, 0u, 449u, 449u, 1u, 31u, 0u, true, 33u, 0u,
     false, 3u}},
    {1u, {false, true, 246u}, {0u, 3u, 0u}, {1u, 2u, 1u, 246u, 449u, 1u, 32u, 0u, true, 34u, 0u,
     false, 3u}},
    {2u, {false, false, 0u}, {0u, 3u, 0u}, {3u, 2u, 3u, 0u, 0u, 1u, 34u, 0u, true, 36u, 0u, false,
     3u}},
    /* vector 8 */
    {1u, {false, false, 654u}, {0u, 0u, 4u}, {1u, 0u, 1u, 654u, 0u, 0u, 1u, 0u, false, 1u, 0u,
     false, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct gwh1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 15u, false, {0u, 0u, 0u}},
    {15u, 18u, false, {0u, 0u, 0u}},
    {18u, 25u, false, {0u, 0u, 0u}},
    {25u, 29u, false, {0u, 0u, 0u}},
    {29u, 40u, false, {0u, 0u, 0u}},
    {40u, 72u, false, {0u, 0u, 0u}},
    {72u, 118u, false, {0u, 0u, 0u}},
    {118u, 119u, true, {0u, 0u, 21337u}},
};

static void run(const struct vector *v)
{
    struct gwh1 m;
    struct gwh1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    gwh1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            gwh1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct gwh1 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, true, 0u};

static void start_and_compare(const char *what, const struct gwh1_remembered *r,
                              const struct gwh1 *wanted)
{
    struct gwh1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    gwh1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct gwh1 m;
    struct gwh1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);
    {
        static const struct gwh1_remembered good =
           {3660u, 60000u, 63725u};
        static const struct gwh1 after =
           {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 3660u, true, 60000u};

        start_and_compare("start with a good record", &good, &after);
        r = good;
        r.check++;
        start_and_compare("start with a wrong check word", &r, &fresh);
        r = good;
        r.flame_guard_days_gone = 3661u; /* a flipped bit */
        start_and_compare("start with a flipped bit", &r, &fresh);
        r = good;
        r.flame_guard_days_gone = 3661u; /* out of its range, under a good check word */
        r.check = 63756u;
        start_and_compare("start with a value out of range", &r, &fresh);
        m = after;
        r = good;
        m.flame_guard_days_gone = 0u;
        doing = "record";
        compare("flame_guard_days_gone changed", gwh1_remember(&m, &r) ? 1l : 0l, 1l);
        verdict();
        compare("check word", (long)r.check, 15801l);
        verdict();
        r = good;
        r.cutoff_trips_seen = 60001u; /* a flipped bit */
        start_and_compare("start with a flipped bit", &r, &fresh);
        r = good;
        r.cutoff_trips_seen = 60001u; /* out of its range, under a good check word */
        r.check = 63726u;
        start_and_compare("start with a value out of range", &r, &fresh);
        m = after;
        r = good;
        m.cutoff_trips_seen = 0u;
        doing = "record";
        compare("cutoff_trips_seen changed", gwh1_remember(&m, &r) ? 1l : 0l, 1l);
        verdict();
        compare("check word", (long)r.check, 3725l);
        verdict();
    }

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", gwh1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", gwh1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct gwh1 m;
    struct gwh1_in in;
    struct gwh1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct gwh1 after =
           {1u, 3u, 0u, 0u, 0u, 0u, 1u, 0u, false, 1u, 0u, false, 0u};
        static const struct gwh1_out wanted =
           {0u, 0u, 5u};

        doing = "couple_state upset";
        gwh1_start(&m, NULL);
        m.couple_state = 4u;
        gwh1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct gwh1 after =
           {1u, 3u, 0u, 0u, 0u, 0u, 1u, 0u, false, 1u, 0u, false, 0u};
        static const struct gwh1_out wanted =
           {0u, 0u, 5u};

        doing = "couple_state upset";
        gwh1_start(&m, NULL);
        m.couple_state = 255u;
        gwh1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct gwh1 after =
           {1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 1u, 0u, false, 0u};
        static const struct gwh1_out wanted =
           {0u, 0u, 4u};

        doing = "flame_guard_flame upset";
        gwh1_start(&m, NULL);
        m.flame_guard_flame = 3u;
        gwh1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct gwh1 after =
           {1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, false, 1u, 0u, false, 0u};
        static const struct gwh1_out wanted =
           {0u, 0u, 4u};

        doing = "flame_guard_flame upset";
        gwh1_start(&m, NULL);
        m.flame_guard_flame = 255u;
        gwh1_step(&m, &in, &out);
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
