/* coldroom3_check.c: recorded inputs through the program; runs on any host
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
/* Transitions that the recorded inputs do not make; no way to them was found:
 * - warm_alarm: off to on (its safe state is on)
 */
#include "coldroom3.h"

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

static void compare_out(const struct coldroom3_out *got, const struct coldroom3_out *wanted)
{
    compare("compressor", (long)got->compressor, (long)wanted->compressor);
    compare("defrost_heater", (long)got->defrost_heater, (long)wanted->defrost_heater);
    compare("warm_alarm", (long)got->warm_alarm, (long)wanted->warm_alarm);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct coldroom3 *got, const struct coldroom3 *wanted)
{
    compare("room_probe_good_for",
            (long)got->room_probe_good_for,
            (long)wanted->room_probe_good_for);
    compare("room_probe_state", (long)got->room_probe_state, (long)wanted->room_probe_state);
    compare("room_probe_state_for",
            (long)got->room_probe_state_for,
            (long)wanted->room_probe_state_for);
    compare("room_probe_last", (long)got->room_probe_last, (long)wanted->room_probe_last);
    compare("room_probe_before", (long)got->room_probe_before, (long)wanted->room_probe_before);
    compare("coil_probe_good_for",
            (long)got->coil_probe_good_for,
            (long)wanted->coil_probe_good_for);
    compare("coil_probe_state", (long)got->coil_probe_state, (long)wanted->coil_probe_state);
    compare("coil_probe_state_for",
            (long)got->coil_probe_state_for,
            (long)wanted->coil_probe_state_for);
    compare("coil_probe_last", (long)got->coil_probe_last, (long)wanted->coil_probe_last);
    compare("coil_probe_before", (long)got->coil_probe_before, (long)wanted->coil_probe_before);
    compare("room_stat", (long)got->room_stat, (long)wanted->room_stat);
    compare("warm_stat", (long)got->warm_stat, (long)wanted->warm_stat);
    compare("defrost_at", (long)got->defrost_at, (long)wanted->defrost_at);
    compare("defrost", (long)got->defrost, (long)wanted->defrost);
    compare("compressor", (long)got->compressor, (long)wanted->compressor);
    compare("compressor_for", (long)got->compressor_for, (long)wanted->compressor_for);
    compare("compressor_effect_from",
            (long)got->compressor_effect_from,
            (long)wanted->compressor_effect_from);
    compare("compressor_effect_for",
            (long)got->compressor_effect_for,
            (long)wanted->compressor_effect_for);
    compare("compressor_no_effect",
            (long)got->compressor_no_effect,
            (long)wanted->compressor_no_effect);
    compare("defrost_heater", (long)got->defrost_heater, (long)wanted->defrost_heater);
    compare("warm_alarm", (long)got->warm_alarm, (long)wanted->warm_alarm);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct coldroom3_in in;
    struct coldroom3_out out;
    struct coldroom3 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 1953u,
     0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {2u, 0u, 2u, 2087u, 2087u, 2u, 0u, 2u,
     1953u, 1953u, 0u, 1u, 2u, 0u, 0u, 2u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u,
     1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {5u, 1u, 1u, 2087u, 2087u, 5u, 1u, 1u,
     1953u, 1953u, 1u, 0u, 5u, 0u, 0u, 5u, 2087u, 0u, false, 0u, 0u}},
    {7u, {false, 2087u, 1953u}, {false, false, false, 0u}, {12u, 1u, 8u, 2087u, 2087u, 12u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 12u, 0u, 0u, 12u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {13u, 1u, 8u, 2087u, 2087u, 13u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 13u, 0u, 0u, 13u, 2087u, 0u, false, 0u, 0u}},
    {7u, {false, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 20u, 0u, 0u, 20u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 21u, 0u, 0u, 21u, 2087u, 0u, false, 0u, 0u}},
    {579u, {false, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1953u, 1953u, 1u, 0u, 600u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 601u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {42598u, {false, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1953u, 1953u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 0u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 1u, 0u, 1u, 0u, 2087u, 0u, false, 0u, 0u}},
    /* vector 2 */
    {3u, {true, 2087u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {true, 2087u, 1953u}, {false, false, false, 0u}, {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u,
     1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {595u, {true, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 599u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {2u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 601u, 0u, 1u, 1u, 2087u, 1u, false, 0u, 0u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 0u}, {0u, 2u, 0u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 602u, 0u, 0u, 0u, 2087u, 2u, false, 0u, 1u}},
    /* vector 3 */
    {7u, {false, 0u, 1953u}, {false, false, true, 0u}, {0u, 0u, 7u, 0u, 0u, 7u, 1u, 3u, 1953u,
     1953u, 0u, 1u, 7u, 0u, 0u, 7u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 1u}, {0u, 3u, 0u, 0u, 0u, 8u, 1u, 4u, 1953u,
     1953u, 0u, 1u, 8u, 0u, 0u, 8u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 1u}, {0u, 3u, 1u, 0u, 0u, 9u, 1u, 5u, 1953u,
     1953u, 0u, 1u, 9u, 0u, 0u, 9u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 487u, 1953u}, {false, false, true, 1u}, {0u, 3u, 2u, 0u, 0u, 10u, 1u, 6u, 1953u,
     1953u, 0u, 1u, 10u, 0u, 0u, 10u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 488u, 1953u}, {false, false, true, 1u}, {1u, 3u, 3u, 488u, 0u, 11u, 1u, 7u, 1953u,
     1953u, 0u, 1u, 11u, 0u, 0u, 11u, 0u, 0u, false, 0u, 1u}},
    /* vector 4 */
    {4u, {false, 488u, 1953u}, {false, false, true, 0u}, {4u, 1u, 0u, 488u, 488u, 4u, 1u, 0u, 1953u,
     1953u, 1u, 1u, 4u, 0u, 0u, 4u, 488u, 0u, false, 0u, 1u}},
    {2u, {false, 2043u, 1953u}, {false, false, true, 0u}, {6u, 1u, 2u, 2043u, 2043u, 6u, 1u, 2u,
     1953u, 1953u, 1u, 1u, 6u, 0u, 0u, 6u, 2043u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, true, 0u}, {7u, 1u, 3u, 2044u, 2043u, 7u, 1u, 3u,
     1953u, 1953u, 1u, 1u, 7u, 0u, 0u, 7u, 2043u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, false, 0u}, {8u, 1u, 4u, 2044u, 2044u, 8u, 1u, 4u,
     1953u, 1953u, 1u, 0u, 8u, 0u, 0u, 8u, 2044u, 0u, false, 0u, 0u}},
    /* vector 5 */
    {3u, {false, 2088u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2088u, 2088u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2088u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 1953u}, {false, false, false, 0u}, {4u, 1u, 0u, 2088u, 2088u, 4u, 1u, 0u,
     1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2088u, 0u, false, 0u, 0u}},
    /* vector 6 */
    {3u, {false, 2089u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2089u, 2089u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2089u, 0u, false, 0u, 1u}},
    {1u, {false, 2089u, 1953u}, {false, false, false, 0u}, {4u, 1u, 0u, 2089u, 2089u, 4u, 1u, 0u,
     1953u, 1953u, 0u, 0u, 4u, 0u, 0u, 4u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 3762u, 1953u}, {false, false, false, 0u}, {5u, 1u, 1u, 3762u, 2089u, 5u, 1u, 1u,
     1953u, 1953u, 0u, 0u, 5u, 0u, 0u, 5u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 3763u, 1953u}, {false, false, true, 0u}, {0u, 2u, 0u, 3762u, 2089u, 6u, 1u, 2u,
     1953u, 1953u, 0u, 0u, 6u, 0u, 0u, 6u, 3762u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 0u}, {false, false, true, 0u}, {1u, 2u, 1u, 2087u, 3762u, 0u, 2u, 0u, 1953u,
     1953u, 0u, 0u, 7u, 0u, 0u, 7u, 2089u, 0u, false, 0u, 1u}},
    /* vector 7 */
    {1u, {false, 2087u, 0u}, {false, false, true, 0u}, {1u, 0u, 1u, 2087u, 0u, 0u, 0u, 1u, 0u, 0u,
     0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 0u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 0u, 0u, 3u, 0u,
     0u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {4u, {false, 2087u, 0u}, {false, false, false, 0u}, {7u, 1u, 3u, 2087u, 2087u, 0u, 0u, 7u, 0u,
     0u, 1u, 0u, 7u, 0u, 0u, 7u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 0u}, {false, false, false, 2u}, {8u, 1u, 4u, 2087u, 2087u, 0u, 3u, 0u, 0u,
     0u, 1u, 0u, 8u, 0u, 0u, 8u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 0u}, {false, false, false, 2u}, {9u, 1u, 5u, 2087u, 2087u, 0u, 3u, 1u, 0u,
     0u, 1u, 0u, 9u, 0u, 0u, 9u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 487u}, {false, false, false, 2u}, {10u, 1u, 6u, 2087u, 2087u, 0u, 3u, 2u,
     0u, 0u, 1u, 0u, 10u, 0u, 0u, 10u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 488u}, {false, false, false, 2u}, {11u, 1u, 7u, 2087u, 2087u, 1u, 3u, 3u,
     488u, 0u, 1u, 0u, 11u, 0u, 0u, 11u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 3762u}, {false, false, false, 2u}, {12u, 1u, 8u, 2087u, 2087u, 2u, 3u, 4u,
     3762u, 488u, 1u, 0u, 12u, 0u, 0u, 12u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 3763u}, {false, false, false, 2u}, {13u, 1u, 8u, 2087u, 2087u, 0u, 3u, 5u,
     3762u, 488u, 1u, 0u, 13u, 0u, 0u, 13u, 2087u, 0u, false, 0u, 0u}},
    {2u, {true, 0u, 1953u}, {false, false, true, 2u}, {0u, 2u, 1u, 2087u, 2087u, 2u, 3u, 7u, 1953u,
     1953u, 1u, 0u, 15u, 0u, 0u, 15u, 2087u, 0u, false, 0u, 1u}},
    {2u, {true, 0u, 1953u}, {false, false, true, 2u}, {0u, 2u, 3u, 2087u, 2087u, 4u, 3u, 8u, 1953u,
     1953u, 1u, 0u, 17u, 0u, 0u, 17u, 2087u, 0u, false, 0u, 1u}},
    {1u, {true, 0u, 1953u}, {false, false, true, 3u}, {0u, 3u, 0u, 2087u, 2087u, 5u, 3u, 8u, 1953u,
     1953u, 0u, 1u, 18u, 0u, 0u, 18u, 2087u, 0u, false, 0u, 1u}},
    {2u, {false, 2018u, 1952u}, {false, false, true, 3u}, {2u, 3u, 2u, 2018u, 2018u, 7u, 3u, 8u,
     1952u, 1952u, 0u, 1u, 20u, 0u, 0u, 20u, 2018u, 0u, false, 0u, 1u}},
    /* vector 8 */
    {3u, {false, 2087u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2018u, 1953u}, {false, false, false, 0u}, {4u, 1u, 0u, 2018u, 2087u, 4u, 1u, 0u,
     1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2018u, 1952u}, {false, false, false, 0u}, {5u, 1u, 1u, 2018u, 2018u, 5u, 1u, 1u,
     1952u, 1953u, 1u, 0u, 5u, 0u, 0u, 5u, 2018u, 0u, false, 0u, 0u}},
    {1u, {false, 1999u, 1952u}, {false, false, false, 0u}, {6u, 1u, 2u, 1999u, 2018u, 6u, 1u, 2u,
     1952u, 1952u, 1u, 0u, 6u, 0u, 0u, 6u, 2018u, 0u, false, 0u, 0u}},
    {1u, {true, 3763u, 1953u}, {false, false, true, 0u}, {0u, 2u, 0u, 1999u, 2018u, 7u, 1u, 3u,
     1953u, 1952u, 1u, 0u, 7u, 0u, 0u, 7u, 1999u, 0u, false, 0u, 1u}},
    {2u, {false, 1997u, 65535u}, {false, false, true, 0u}, {2u, 2u, 2u, 1997u, 1997u, 0u, 2u, 1u,
     1953u, 1952u, 1u, 1u, 9u, 0u, 0u, 9u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 65535u}, {false, false, true, 0u}, {3u, 2u, 3u, 2044u, 1997u, 0u, 2u, 2u,
     1953u, 1952u, 1u, 1u, 10u, 0u, 0u, 10u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 65535u}, {false, false, false, 0u}, {4u, 1u, 0u, 2044u, 2044u, 0u, 2u, 3u,
     1953u, 1952u, 1u, 0u, 11u, 0u, 0u, 11u, 2044u, 0u, false, 0u, 0u}},
    {1u, {true, 2043u, 65535u}, {false, false, false, 2u}, {5u, 1u, 1u, 2043u, 2044u, 0u, 3u, 0u,
     1953u, 1952u, 1u, 0u, 12u, 0u, 0u, 12u, 2044u, 0u, false, 0u, 0u}},
    {1u, {true, 2043u, 65535u}, {false, false, false, 2u}, {6u, 1u, 2u, 2043u, 2043u, 0u, 3u, 1u,
     1953u, 1952u, 1u, 0u, 13u, 0u, 0u, 13u, 2043u, 0u, false, 0u, 0u}},
    {1u, {false, 488u, 3762u}, {false, false, false, 2u}, {7u, 1u, 3u, 488u, 2043u, 1u, 3u, 2u,
     3762u, 1953u, 1u, 0u, 14u, 0u, 0u, 14u, 2043u, 0u, false, 0u, 0u}},
    {1u, {false, 3763u, 488u}, {false, false, true, 2u}, {0u, 2u, 0u, 488u, 2043u, 2u, 3u, 3u, 488u,
     3762u, 1u, 1u, 15u, 0u, 0u, 15u, 488u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 488u}, {false, false, true, 2u}, {1u, 2u, 1u, 3762u, 488u, 3u, 3u, 4u, 488u,
     488u, 1u, 1u, 16u, 0u, 0u, 16u, 2043u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 488u}, {false, false, true, 2u}, {2u, 2u, 2u, 3762u, 3762u, 4u, 3u, 5u,
     488u, 488u, 0u, 1u, 17u, 0u, 0u, 17u, 3762u, 0u, false, 0u, 1u}},
    {1u, {false, 3763u, 65535u}, {false, false, true, 2u}, {0u, 2u, 3u, 3762u, 3762u, 0u, 3u, 6u,
     488u, 488u, 0u, 1u, 18u, 0u, 0u, 18u, 3762u, 0u, false, 0u, 1u}},
    {2u, {false, 1997u, 65535u}, {false, false, true, 3u}, {2u, 3u, 1u, 1997u, 1997u, 0u, 3u, 8u,
     488u, 488u, 0u, 1u, 20u, 0u, 0u, 20u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 65535u}, {false, false, true, 3u}, {3u, 3u, 2u, 2044u, 1997u, 0u, 3u, 8u,
     488u, 488u, 0u, 1u, 21u, 0u, 0u, 21u, 1997u, 0u, false, 0u, 1u}},
    {16u, {true, 2043u, 65535u}, {false, false, true, 3u}, {19u, 3u, 8u, 2043u, 2043u, 0u, 3u, 8u,
     488u, 488u, 0u, 1u, 37u, 0u, 0u, 37u, 2043u, 0u, false, 0u, 1u}},
    {1u, {true, 2043u, 65535u}, {false, false, true, 2u}, {20u, 1u, 0u, 2043u, 2043u, 0u, 3u, 8u,
     488u, 488u, 1u, 1u, 38u, 0u, 0u, 38u, 2043u, 0u, false, 0u, 1u}},
    {562u, {true, 2043u, 65535u}, {false, false, true, 2u}, {20u, 1u, 8u, 2043u, 2043u, 0u, 3u, 8u,
     488u, 488u, 1u, 1u, 600u, 0u, 0u, 600u, 2043u, 0u, false, 0u, 1u}},
    /* vector 9 */
    {7u, {false, 3763u, 1953u}, {false, false, true, 0u}, {0u, 0u, 7u, 0u, 0u, 7u, 1u, 3u, 1953u,
     1953u, 0u, 1u, 7u, 0u, 0u, 7u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 3763u, 1953u}, {false, false, true, 1u}, {0u, 3u, 2u, 0u, 0u, 10u, 1u, 6u, 1953u,
     1953u, 0u, 1u, 10u, 0u, 0u, 10u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 3763u, 65535u}, {false, false, true, 1u}, {0u, 3u, 3u, 0u, 0u, 0u, 2u, 0u, 1953u,
     1953u, 0u, 1u, 11u, 0u, 0u, 11u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 1997u, 65535u}, {false, false, true, 1u}, {1u, 3u, 4u, 1997u, 0u, 0u, 2u, 1u,
     1953u, 1953u, 0u, 1u, 12u, 0u, 0u, 12u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 1997u, 3762u}, {false, false, true, 1u}, {2u, 3u, 5u, 1997u, 1997u, 1u, 2u, 2u,
     3762u, 1953u, 0u, 1u, 13u, 0u, 0u, 13u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3762u}, {false, false, true, 1u}, {3u, 3u, 6u, 2087u, 1997u, 2u, 2u, 3u,
     3762u, 3762u, 0u, 1u, 14u, 0u, 0u, 14u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1927u, 3762u}, {false, false, true, 3u}, {4u, 3u, 7u, 1927u, 2087u, 3u, 3u, 0u,
     3762u, 3762u, 0u, 1u, 15u, 0u, 0u, 15u, 1997u, 0u, false, 0u, 1u}},
    {15u, {false, 1997u, 1953u}, {false, false, true, 3u}, {19u, 3u, 8u, 1997u, 1997u, 18u, 3u, 8u,
     1953u, 1953u, 0u, 1u, 30u, 0u, 0u, 30u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1997u, 1953u}, {false, false, true, 2u}, {20u, 1u, 0u, 1997u, 1997u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 1u, 31u, 0u, 0u, 31u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1997u, 1953u}, {false, false, true, 0u}, {20u, 1u, 1u, 1997u, 1997u, 20u, 1u, 0u,
     1953u, 1953u, 1u, 1u, 32u, 0u, 0u, 32u, 1997u, 0u, false, 0u, 1u}},
    {4079u, {false, 1997u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1997u, 1997u, 20u, 1u,
     8u, 1953u, 1953u, 1u, 1u, 4111u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1998u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1997u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 4112u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1998u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 2u, 0u,
     1953u, 1953u, 1u, 1u, 4113u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 1930u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1930u, 1998u, 0u, 2u, 1u,
     1953u, 1953u, 1u, 1u, 4114u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {2u, {false, 1997u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1997u, 1997u, 2u, 2u, 3u,
     1953u, 1953u, 1u, 1u, 4116u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {17u, {false, 1997u, 1953u}, {false, false, true, 2u}, {20u, 1u, 8u, 1997u, 1997u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 1u, 4133u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {45u, {false, 1997u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 4178u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1998u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1997u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 4179u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1998u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 2u, 0u,
     1953u, 1953u, 1u, 1u, 4180u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {4u, {false, 1998u, 1952u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 4u, 1u, 0u,
     1952u, 1952u, 1u, 1u, 4184u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {4u, {false, 1998u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 2u, 3u,
     1952u, 1952u, 1u, 1u, 4188u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {39012u, {false, 1998u, 487u}, {false, false, true, 2u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 3u, 8u,
     1952u, 1952u, 1u, 1u, 0u, 1u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 1952u}, {false, false, true, 2u}, {20u, 1u, 8u, 2088u, 1998u, 1u, 3u, 8u,
     1952u, 1952u, 1u, 1u, 1u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {18u, {true, 2087u, 1953u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 0u, 19u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {241u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 260u, 0u, 1u, 240u, 2087u, 240u, false, 0u, 0u}},
    {2u, {true, 2045u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2045u, 2045u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 262u, 0u, 1u, 242u, 2045u, 242u, false, 0u, 0u}},
    {2u, {true, 2089u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 264u, 0u, 1u, 244u, 2045u, 244u, false, 0u, 0u}},
    {1u, {false, 1998u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 1998u, 2089u, 0u, 2u, 0u,
     1953u, 1953u, 1u, 0u, 265u, 0u, 0u, 0u, 2045u, 245u, false, 0u, 0u}},
    {1u, {false, 1998u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 2u, 1u,
     1953u, 1953u, 1u, 1u, 266u, 0u, 0u, 1u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 2087u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 2087u, 1998u, 1u, 2u, 2u,
     1953u, 1953u, 1u, 1u, 267u, 0u, 0u, 2u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 2u, 2u, 3u,
     1953u, 1953u, 1u, 0u, 268u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 0u}},
    {17u, {true, 2087u, 1953u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 0u, 285u, 0u, 0u, 20u, 2087u, 0u, false, 0u, 0u}},
    {579u, {true, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 864u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {241u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 1105u, 0u, 1u, 240u, 2087u, 240u, false, 0u, 0u}},
    {3u, {true, 2045u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2045u, 2045u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 1108u, 0u, 1u, 243u, 2045u, 243u, false, 0u, 0u}},
    {1u, {true, 65535u, 1953u}, {true, false, true, 0u}, {0u, 2u, 0u, 2045u, 2045u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 1109u, 0u, 1u, 244u, 2045u, 244u, false, 0u, 1u}},
    {3u, {false, 2087u, 1954u}, {false, false, true, 0u}, {3u, 2u, 3u, 2087u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 1112u, 0u, 0u, 2u, 2087u, 0u, false, 0u, 1u}},
    {42087u, {false, 2087u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1954u, 1954u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {2u, {false, 2087u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 1u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 2087u, 1952u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1954u, 1u, 0u, 2u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 2087u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 3u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {43196u, {false, 2087u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1954u, 1954u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {5u, {false, 2087u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 4u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 488u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 488u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 5u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {3594u, {false, 488u, 1954u}, {false, true, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 3599u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {1u, {false, 488u, 1954u}, {false, false, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 3600u, 0u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 488u}, {false, false, true, 0u}, {20u, 1u, 8u, 2227u, 488u, 20u, 1u, 8u,
     488u, 1954u, 1u, 1u, 3601u, 0u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    {1u, {false, 2295u, 488u}, {false, false, false, 0u}, {20u, 1u, 8u, 2295u, 2227u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 3602u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 2157u, 488u}, {false, false, false, 0u}, {20u, 1u, 8u, 2157u, 2295u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 3603u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {false, 1998u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 1998u, 2157u, 20u, 1u, 8u,
     1953u, 488u, 0u, 0u, 3604u, 0u, 0u, 600u, 2157u, 0u, false, 0u, 0u}},
    {7u, {false, 1998u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 3611u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 0u}, {0u, 2u, 0u, 1998u, 1998u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 3612u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {2u, {false, 0u, 1954u}, {false, false, true, 0u}, {0u, 2u, 2u, 1998u, 1998u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 3614u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 0u, 1954u}, {false, false, true, 0u}, {0u, 2u, 3u, 1998u, 1998u, 20u, 1u, 8u, 1954u,
     1954u, 1u, 1u, 3615u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {19u, {true, 2044u, 489u}, {false, false, true, 1u}, {19u, 3u, 8u, 2044u, 2044u, 20u, 1u, 8u,
     489u, 489u, 0u, 1u, 3634u, 0u, 0u, 600u, 2044u, 0u, false, 0u, 1u}},
    {45u, {true, 2044u, 489u}, {true, false, false, 0u}, {20u, 1u, 8u, 2044u, 2044u, 20u, 1u, 8u,
     489u, 489u, 1u, 0u, 3679u, 0u, 1u, 44u, 2044u, 44u, false, 0u, 0u}},
    {2u, {true, 3763u, 488u}, {true, false, true, 0u}, {0u, 2u, 1u, 2044u, 2044u, 20u, 1u, 8u, 488u,
     488u, 1u, 0u, 3681u, 0u, 1u, 46u, 2044u, 46u, false, 0u, 1u}},
    {1u, {true, 3763u, 487u}, {true, false, true, 0u}, {0u, 2u, 2u, 2044u, 2044u, 0u, 2u, 0u, 488u,
     488u, 1u, 0u, 3682u, 0u, 1u, 47u, 2044u, 47u, false, 0u, 1u}},
    {1u, {true, 2019u, 487u}, {true, false, true, 0u}, {1u, 2u, 3u, 2019u, 2044u, 0u, 2u, 1u, 488u,
     488u, 1u, 0u, 3683u, 0u, 1u, 48u, 2044u, 48u, false, 0u, 1u}},
    {1u, {true, 2019u, 487u}, {false, false, true, 1u}, {2u, 3u, 0u, 2019u, 2019u, 0u, 2u, 2u, 488u,
     488u, 0u, 1u, 3684u, 0u, 0u, 0u, 2019u, 49u, false, 0u, 1u}},
    {1u, {false, 2087u, 1954u}, {false, false, true, 1u}, {3u, 3u, 1u, 2087u, 2019u, 1u, 2u, 3u,
     1954u, 488u, 0u, 1u, 3685u, 0u, 0u, 1u, 2019u, 0u, false, 0u, 1u}},
    {16u, {false, 2087u, 1954u}, {false, false, true, 3u}, {19u, 3u, 8u, 2087u, 2087u, 17u, 3u, 8u,
     1954u, 1954u, 0u, 1u, 3701u, 0u, 0u, 17u, 2087u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 1954u}, {false, false, false, 2u}, {20u, 1u, 1u, 2087u, 2087u, 19u, 3u, 8u,
     1954u, 1954u, 1u, 0u, 3703u, 0u, 0u, 19u, 2087u, 0u, false, 0u, 0u}},
    {4077u, {false, 2087u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1954u, 1954u, 1u, 0u, 7780u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {3u, {false, 2087u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 7783u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {true, 2087u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 7784u, 0u, 1u, 0u, 2087u, 0u, false, 0u, 0u}},
    {2u, {true, 2088u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 7786u, 0u, 1u, 2u, 2087u, 2u, false, 0u, 0u}},
    {1u, {true, 2019u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2019u, 2088u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 7787u, 0u, 1u, 3u, 2087u, 3u, false, 0u, 0u}},
    {1u, {true, 2019u, 3762u}, {true, false, false, 0u}, {20u, 1u, 8u, 2019u, 2019u, 20u, 1u, 8u,
     3762u, 1952u, 1u, 0u, 7788u, 0u, 1u, 4u, 2019u, 4u, false, 0u, 0u}},
    {4u, {true, 2019u, 487u}, {true, false, false, 0u}, {20u, 1u, 8u, 2019u, 2019u, 0u, 2u, 3u,
     3762u, 1952u, 1u, 0u, 7792u, 0u, 1u, 8u, 2019u, 8u, false, 0u, 0u}},
    {1u, {true, 2019u, 487u}, {false, false, false, 2u}, {20u, 1u, 8u, 2019u, 2019u, 0u, 3u, 0u,
     3762u, 1952u, 1u, 0u, 7793u, 0u, 0u, 0u, 2019u, 9u, false, 0u, 0u}},
    {19u, {true, 2087u, 1953u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 0u, 7812u, 0u, 0u, 19u, 2087u, 0u, false, 0u, 0u}},
    {580u, {true, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 8392u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {240u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 8632u, 0u, 1u, 239u, 2087u, 239u, false, 0u, 0u}},
    {1u, {true, 2045u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2045u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 8633u, 0u, 1u, 240u, 2087u, 240u, false, 0u, 0u}},
    {6880u, {true, 2113u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2113u, 2113u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 15513u, 0u, 1u, 600u, 2087u, 7120u, false, 0u, 0u}},
    {1u, {true, 2113u, 1953u}, {false, false, false, 4u}, {20u, 1u, 8u, 2113u, 2113u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 15514u, 0u, 0u, 0u, 2087u, 7121u, true, 0u, 0u}},
    {2u, {true, 2226u, 487u}, {false, false, false, 4u}, {20u, 1u, 8u, 2226u, 2226u, 0u, 2u, 1u,
     1953u, 1953u, 1u, 0u, 15516u, 0u, 0u, 2u, 2226u, 0u, true, 0u, 0u}},
    /* vector 10 */
    {3u, {true, 2087u, 1953u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u,
     1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {596u, {true, 2087u, 1953u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 599u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {240u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 839u, 0u, 1u, 239u, 2087u, 239u, false, 0u, 0u}},
    {2u, {true, 2226u, 487u}, {true, false, false, 0u}, {20u, 1u, 8u, 2226u, 2226u, 0u, 2u, 1u,
     1953u, 1953u, 1u, 0u, 841u, 0u, 1u, 241u, 2226u, 0u, false, 0u, 0u}},
    {1u, {false, 2045u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2045u, 2226u, 1u, 2u, 2u,
     489u, 1953u, 1u, 0u, 842u, 0u, 0u, 0u, 2226u, 1u, false, 0u, 0u}},
    {1u, {false, 65535u, 1953u}, {false, false, true, 0u}, {0u, 2u, 0u, 2045u, 2226u, 2u, 2u, 3u,
     1953u, 489u, 1u, 0u, 843u, 0u, 0u, 1u, 2045u, 0u, false, 0u, 1u}},
    {3u, {false, 65535u, 1953u}, {false, false, true, 2u}, {0u, 2u, 3u, 2045u, 2226u, 5u, 3u, 2u,
     1953u, 1953u, 1u, 0u, 846u, 0u, 0u, 4u, 2045u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, true, 3u}, {1u, 3u, 0u, 2044u, 2045u, 6u, 3u, 3u,
     1953u, 1953u, 0u, 1u, 847u, 0u, 0u, 5u, 2045u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 1953u}, {false, false, true, 3u}, {2u, 3u, 1u, 3762u, 2044u, 7u, 3u, 4u,
     1953u, 1953u, 0u, 1u, 848u, 0u, 0u, 6u, 2045u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 3u}, {0u, 3u, 2u, 3762u, 2044u, 8u, 3u, 5u, 1953u,
     1953u, 0u, 1u, 849u, 0u, 0u, 7u, 3762u, 0u, false, 0u, 1u}},
    {1u, {false, 2154u, 1954u}, {false, false, true, 3u}, {1u, 3u, 3u, 2154u, 3762u, 9u, 3u, 6u,
     1954u, 1953u, 0u, 1u, 850u, 0u, 0u, 8u, 2154u, 0u, false, 0u, 1u}},
    {4u, {false, 2154u, 487u}, {false, false, true, 3u}, {5u, 3u, 7u, 2154u, 2154u, 0u, 3u, 8u,
     1954u, 1953u, 0u, 1u, 854u, 0u, 0u, 12u, 2154u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 487u}, {false, false, true, 3u}, {6u, 3u, 8u, 489u, 2154u, 0u, 3u, 8u, 1954u,
     1953u, 0u, 1u, 855u, 0u, 0u, 13u, 2154u, 0u, false, 0u, 1u}},
    {4u, {false, 1999u, 487u}, {false, false, true, 3u}, {10u, 3u, 8u, 1999u, 1999u, 0u, 3u, 8u,
     1954u, 1953u, 0u, 1u, 859u, 0u, 0u, 17u, 1999u, 0u, false, 0u, 1u}},
    {9u, {false, 1999u, 3763u}, {false, false, true, 3u}, {19u, 3u, 8u, 1999u, 1999u, 0u, 3u, 8u,
     1954u, 1953u, 0u, 1u, 868u, 0u, 0u, 26u, 1999u, 0u, false, 0u, 1u}},
    {42333u, {false, 1999u, 3763u}, {false, false, true, 2u}, {20u, 1u, 8u, 1999u, 1999u, 0u, 3u,
     8u, 1954u, 1953u, 1u, 1u, 1u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1954u}, {false, false, true, 2u}, {20u, 1u, 8u, 2087u, 1999u, 1u, 3u, 8u,
     1954u, 1954u, 1u, 1u, 2u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {18u, {false, 2087u, 1954u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u,
     1954u, 1954u, 1u, 0u, 20u, 1u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {45u, {false, 2087u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 65u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 488u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 488u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 66u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {6u, {false, 488u, 1954u}, {false, true, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 72u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {1u, {false, 488u, 488u}, {false, true, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u, 488u,
     1954u, 1u, 1u, 73u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {1u, {false, 488u, 488u}, {false, false, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u, 488u,
     488u, 1u, 1u, 74u, 0u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    {1u, {true, 2045u, 488u}, {true, false, true, 0u}, {20u, 1u, 8u, 2045u, 488u, 20u, 1u, 8u, 488u,
     488u, 1u, 1u, 75u, 0u, 1u, 0u, 488u, 0u, false, 0u, 1u}},
    {2u, {true, 2227u, 488u}, {true, false, false, 0u}, {20u, 1u, 8u, 2227u, 2227u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 77u, 0u, 1u, 2u, 2227u, 0u, false, 0u, 0u}},
    {237u, {true, 2227u, 488u}, {true, false, false, 0u}, {20u, 1u, 8u, 2227u, 2227u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 314u, 0u, 1u, 239u, 2227u, 237u, false, 0u, 0u}},
    {1u, {true, 2227u, 488u}, {false, false, false, 0u}, {20u, 1u, 8u, 2227u, 2227u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 315u, 0u, 0u, 0u, 2227u, 238u, false, 0u, 0u}},
    /* vector 11 */
    {43199u, {false, 1997u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1997u, 1997u, 20u, 1u,
     8u, 1953u, 1953u, 1u, 1u, 43199u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {1u, {false, 1998u, 1953u}, {false, true, true, 0u}, {20u, 1u, 8u, 1998u, 1997u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 0u, 1u, 0u, 600u, 1997u, 0u, false, 1u, 1u}},
    {1u, {false, 1998u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 0u, 2u, 0u,
     1953u, 1953u, 1u, 1u, 1u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {3u, {true, 1930u, 487u}, {false, false, true, 0u}, {20u, 1u, 8u, 1930u, 1930u, 0u, 2u, 3u,
     1953u, 1953u, 1u, 1u, 4u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {2u, {true, 1930u, 487u}, {false, false, true, 2u}, {20u, 1u, 8u, 1930u, 1930u, 0u, 3u, 1u,
     1953u, 1953u, 1u, 1u, 6u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {4u, {false, 1930u, 487u}, {false, false, true, 2u}, {20u, 1u, 8u, 1930u, 1930u, 0u, 3u, 5u,
     1953u, 1953u, 1u, 1u, 10u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {1u, {true, 1930u, 489u}, {false, false, true, 2u}, {20u, 1u, 8u, 1930u, 1930u, 1u, 3u, 6u,
     489u, 1953u, 1u, 1u, 11u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {18u, {false, 1930u, 489u}, {false, false, true, 2u}, {20u, 1u, 8u, 1930u, 1930u, 19u, 3u, 8u,
     489u, 489u, 1u, 1u, 29u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {43170u, {false, 1930u, 489u}, {false, false, true, 0u}, {20u, 1u, 8u, 1930u, 1930u, 20u, 1u,
     8u, 489u, 489u, 1u, 1u, 43199u, 0u, 0u, 600u, 1930u, 0u, false, 0u, 1u}},
    {1u, {true, 1930u, 3762u}, {false, true, true, 0u}, {20u, 1u, 8u, 1930u, 1930u, 20u, 1u, 8u,
     3762u, 489u, 1u, 1u, 0u, 1u, 0u, 600u, 1930u, 0u, false, 1u, 1u}},
    {1u, {true, 3761u, 3763u}, {false, true, true, 0u}, {20u, 1u, 8u, 3761u, 1930u, 0u, 2u, 0u,
     3762u, 489u, 1u, 1u, 1u, 1u, 0u, 600u, 1930u, 0u, false, 1u, 1u}},
    {1u, {false, 1999u, 488u}, {false, false, true, 0u}, {20u, 1u, 8u, 1999u, 3761u, 1u, 2u, 1u,
     488u, 3762u, 1u, 1u, 2u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {17u, {false, 1999u, 488u}, {false, false, true, 0u}, {20u, 1u, 8u, 1999u, 1999u, 18u, 1u, 8u,
     488u, 488u, 1u, 1u, 19u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {20u, 1u, 8u, 1999u, 1999u, 19u, 1u, 8u,
     1953u, 488u, 1u, 1u, 20u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 1999u, 1954u}, {false, false, true, 0u}, {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u,
     1954u, 1953u, 1u, 1u, 21u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {2u, {true, 1999u, 1954u}, {true, false, true, 0u}, {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 23u, 0u, 1u, 1u, 1999u, 1u, false, 0u, 1u}},
    {1u, {true, 2067u, 1954u}, {true, false, true, 0u}, {20u, 1u, 8u, 2067u, 1999u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 24u, 0u, 1u, 2u, 1999u, 2u, false, 0u, 1u}},
    {1u, {false, 2067u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2067u, 2067u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 25u, 0u, 0u, 0u, 1999u, 3u, false, 0u, 0u}},
    {43174u, {false, 2087u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1954u, 1954u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {27u, {false, 2087u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 26u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 488u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 488u, 2087u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 27u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {6u, {false, 488u, 1954u}, {false, true, true, 0u}, {20u, 1u, 8u, 488u, 488u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 33u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {1u, {false, 2044u, 1954u}, {false, true, true, 0u}, {20u, 1u, 8u, 2044u, 488u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 1u, 34u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {2u, {false, 2044u, 1954u}, {false, true, false, 0u}, {20u, 1u, 8u, 2044u, 2044u, 20u, 1u, 8u,
     1954u, 1954u, 1u, 0u, 36u, 1u, 0u, 600u, 2044u, 0u, false, 1u, 0u}},
    {4u, {false, 2044u, 487u}, {false, true, false, 0u}, {20u, 1u, 8u, 2044u, 2044u, 0u, 2u, 3u,
     1954u, 1954u, 1u, 0u, 40u, 1u, 0u, 600u, 2044u, 0u, false, 1u, 0u}},
    {1u, {false, 2044u, 487u}, {false, false, false, 2u}, {20u, 1u, 8u, 2044u, 2044u, 0u, 3u, 0u,
     1954u, 1954u, 1u, 0u, 41u, 1u, 0u, 600u, 2044u, 0u, false, 0u, 0u}},
    {2u, {true, 2087u, 1953u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 2u, 3u, 2u,
     1953u, 1953u, 1u, 0u, 43u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {17u, {true, 2087u, 1953u}, {false, false, false, 2u}, {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u,
     1953u, 1953u, 1u, 0u, 60u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {820u, {true, 2087u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 880u, 0u, 1u, 600u, 2087u, 819u, false, 0u, 0u}},
    {3u, {true, 2044u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 2044u, 2044u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 883u, 0u, 1u, 600u, 2044u, 822u, false, 0u, 0u}},
    {1u, {true, 488u, 1953u}, {true, false, false, 0u}, {20u, 1u, 8u, 488u, 2044u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 0u, 884u, 0u, 1u, 600u, 2044u, 823u, false, 0u, 0u}},
    {6297u, {true, 1998u, 1953u}, {true, false, true, 0u}, {20u, 1u, 8u, 1998u, 1998u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 7181u, 0u, 1u, 600u, 1998u, 7120u, false, 0u, 1u}},
    {601u, {true, 1998u, 1953u}, {false, false, true, 4u}, {20u, 1u, 8u, 1998u, 1998u, 20u, 1u, 8u,
     1953u, 1953u, 1u, 1u, 7782u, 0u, 0u, 600u, 1998u, 0u, true, 0u, 1u}},
    /* vector 12 */
    {3u, {false, 2087u, 1954u}, {false, false, true, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u,
     1954u, 1954u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {4093u, {false, 2087u, 1954u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u,
     8u, 1954u, 1954u, 1u, 0u, 4096u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {3u, {false, 2087u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 4099u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {true, 2087u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 4100u, 0u, 1u, 0u, 2087u, 0u, false, 0u, 0u}},
    {3u, {true, 2088u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 4103u, 0u, 1u, 3u, 2087u, 3u, false, 0u, 0u}},
    {1u, {true, 3761u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 3761u, 2088u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 4104u, 0u, 1u, 4u, 2087u, 4u, false, 0u, 0u}},
    {1u, {true, 2226u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2226u, 3761u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 4105u, 0u, 1u, 5u, 2226u, 0u, false, 0u, 0u}},
    {1u, {true, 0u, 1952u}, {true, false, true, 0u}, {0u, 2u, 0u, 2226u, 3761u, 20u, 1u, 8u, 1952u,
     1952u, 1u, 0u, 4106u, 0u, 1u, 6u, 2226u, 1u, false, 0u, 1u}},
    {1u, {true, 2295u, 1952u}, {true, false, true, 0u}, {1u, 2u, 1u, 2295u, 2226u, 20u, 1u, 8u,
     1952u, 1952u, 0u, 0u, 4107u, 0u, 1u, 7u, 2295u, 0u, false, 0u, 1u}},
    {2u, {true, 2043u, 0u}, {true, false, true, 0u}, {3u, 2u, 3u, 2043u, 2043u, 0u, 2u, 1u, 1952u,
     1952u, 0u, 0u, 4109u, 0u, 1u, 9u, 2043u, 2u, false, 0u, 1u}},
    {2u, {false, 2158u, 1952u}, {false, false, false, 0u}, {5u, 1u, 1u, 2158u, 2158u, 2u, 2u, 3u,
     1952u, 1952u, 1u, 0u, 4111u, 0u, 0u, 1u, 2158u, 0u, false, 0u, 0u}},
    {17u, {false, 2158u, 1952u}, {false, false, false, 2u}, {20u, 1u, 8u, 2158u, 2158u, 19u, 3u, 8u,
     1952u, 1952u, 1u, 0u, 4128u, 0u, 0u, 18u, 2158u, 0u, false, 0u, 0u}},
    {4077u, {false, 2158u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 2158u, 2158u, 20u, 1u,
     8u, 1952u, 1952u, 1u, 0u, 8205u, 0u, 0u, 600u, 2158u, 0u, false, 0u, 0u}},
    {1u, {false, 1999u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 1999u, 2158u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 8206u, 0u, 0u, 600u, 2158u, 0u, false, 0u, 0u}},
    {243u, {true, 2066u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2066u, 2066u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 8449u, 0u, 1u, 242u, 2066u, 242u, false, 0u, 0u}},
    {1u, {true, 3762u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 3762u, 2066u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 8450u, 0u, 1u, 243u, 2066u, 243u, false, 0u, 0u}},
    {1u, {true, 2043u, 1952u}, {true, false, false, 0u}, {20u, 1u, 8u, 2043u, 3762u, 20u, 1u, 8u,
     1952u, 1952u, 1u, 0u, 8451u, 0u, 1u, 244u, 2066u, 244u, false, 0u, 0u}},
    {1u, {true, 3762u, 1952u}, {false, false, false, 0u}, {20u, 1u, 8u, 3762u, 2043u, 20u, 1u, 8u,
     1952u, 1952u, 0u, 0u, 8452u, 0u, 0u, 0u, 3762u, 0u, false, 0u, 0u}},
    /* vector 13 */
    {1u, {false, 2087u, 488u}, {false, false, true, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 488u,
     0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 2226u, 488u}, {false, false, true, 0u}, {3u, 0u, 3u, 2226u, 2226u, 3u, 0u, 3u,
     488u, 488u, 0u, 1u, 3u, 0u, 0u, 3u, 2226u, 0u, false, 0u, 1u}},
    {1u, {false, 2226u, 488u}, {false, false, false, 0u}, {4u, 1u, 0u, 2226u, 2226u, 4u, 1u, 0u,
     488u, 488u, 0u, 0u, 4u, 0u, 0u, 4u, 2226u, 0u, false, 0u, 0u}},
    {1u, {false, 2227u, 488u}, {false, false, false, 0u}, {5u, 1u, 1u, 2227u, 2226u, 5u, 1u, 1u,
     488u, 488u, 0u, 0u, 5u, 0u, 0u, 5u, 2226u, 0u, false, 0u, 0u}},
    {1u, {false, 2295u, 488u}, {false, false, false, 0u}, {6u, 1u, 2u, 2295u, 2227u, 6u, 1u, 2u,
     488u, 488u, 0u, 0u, 6u, 0u, 0u, 6u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 2157u, 488u}, {false, false, false, 0u}, {7u, 1u, 3u, 2157u, 2295u, 7u, 1u, 3u,
     488u, 488u, 0u, 0u, 7u, 0u, 0u, 7u, 2227u, 0u, false, 0u, 0u}},
    {43192u, {true, 2227u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2227u, 2227u, 20u, 1u,
     8u, 489u, 489u, 0u, 0u, 43199u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 2227u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 2227u, 2227u, 0u, 2u, 0u,
     489u, 489u, 0u, 0u, 0u, 1u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {false, 0u, 1954u}, {false, false, true, 0u}, {0u, 2u, 0u, 2227u, 2227u, 1u, 2u, 1u, 1954u,
     489u, 0u, 0u, 1u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 1u}},
    {3u, {true, 2019u, 1952u}, {false, false, true, 0u}, {3u, 2u, 3u, 2019u, 2019u, 4u, 1u, 0u,
     1952u, 1952u, 0u, 0u, 4u, 0u, 0u, 600u, 2019u, 0u, false, 0u, 1u}},
    {1u, {true, 2019u, 1952u}, {true, false, false, 0u}, {4u, 1u, 0u, 2019u, 2019u, 5u, 1u, 1u,
     1952u, 1952u, 1u, 0u, 5u, 0u, 1u, 0u, 2019u, 0u, false, 0u, 0u}},
    {2u, {true, 2018u, 1952u}, {true, false, false, 0u}, {6u, 1u, 2u, 2018u, 2018u, 7u, 1u, 3u,
     1952u, 1952u, 1u, 0u, 7u, 0u, 1u, 2u, 2018u, 2u, false, 0u, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct coldroom3_remembered record;
};

static const struct vector vectors[] = {
    {0u, 14u, false, {0u}},
    {14u, 19u, false, {0u}},
    {19u, 24u, false, {0u}},
    {24u, 28u, false, {0u}},
    {28u, 30u, false, {0u}},
    {30u, 35u, false, {0u}},
    {35u, 48u, false, {0u}},
    {48u, 68u, false, {0u}},
    {68u, 146u, false, {0u}},
    {146u, 173u, false, {0u}},
    {173u, 206u, false, {0u}},
    {206u, 224u, false, {0u}},
    {224u, 236u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct coldroom3 m;
    struct coldroom3_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    coldroom3_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            coldroom3_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct coldroom3 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 1u};

static void start_and_compare(const char *what, const struct coldroom3_remembered *r,
                              const struct coldroom3 *wanted)
{
    struct coldroom3 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    coldroom3_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct coldroom3 m;
    struct coldroom3_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", coldroom3_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", coldroom3_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct coldroom3 m;
    struct coldroom3_in in;
    struct coldroom3_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct coldroom3 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 1u};

        doing = "room_probe_state upset";
        coldroom3_start(&m, NULL);
        m.room_probe_state = 4u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 1u};

        doing = "room_probe_state upset";
        coldroom3_start(&m, NULL);
        m.room_probe_state = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 3u, 0u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 2u};

        doing = "coil_probe_state upset";
        coldroom3_start(&m, NULL);
        m.coil_probe_state = 4u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 3u, 0u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 2u};

        doing = "coil_probe_state upset";
        coldroom3_start(&m, NULL);
        m.coil_probe_state = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "room_stat upset";
        coldroom3_start(&m, NULL);
        m.room_stat = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "room_stat upset";
        coldroom3_start(&m, NULL);
        m.room_stat = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "warm_stat upset";
        coldroom3_start(&m, NULL);
        m.warm_stat = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "warm_stat upset";
        coldroom3_start(&m, NULL);
        m.warm_stat = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "defrost upset";
        coldroom3_start(&m, NULL);
        m.defrost = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "defrost upset";
        coldroom3_start(&m, NULL);
        m.defrost = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "compressor upset";
        coldroom3_start(&m, NULL);
        m.compressor = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 0u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "compressor upset";
        coldroom3_start(&m, NULL);
        m.compressor = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "defrost_heater upset";
        coldroom3_start(&m, NULL);
        m.defrost_heater = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "defrost_heater upset";
        coldroom3_start(&m, NULL);
        m.defrost_heater = 255u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "warm_alarm upset";
        coldroom3_start(&m, NULL);
        m.warm_alarm = 2u;
        coldroom3_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct coldroom3 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u};
        static const struct coldroom3_out wanted =
           {false, false, true, 0u};

        doing = "warm_alarm upset";
        coldroom3_start(&m, NULL);
        m.warm_alarm = 255u;
        coldroom3_step(&m, &in, &out);
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
