/* floor2_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Floor heating, hall 2, mixing valve
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 89a969e7b30031b226d184e39ac05c100976b9f76056120571832deaef0e8bfd
 *
 * Replaces:
 * - self_acting: self-acting mixing valve, bulb in the flow
 *
 * Stays hard-wired, and must:
 * - floor_limit: contact stat strapped to the flow, shuts a valve of its own
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
 * Open findings: 1 danger_without_barrier (act, screed/mixer); 2 trips_dead_no_more (act,
 * self_acting); 3 proving_switch_not_checked_open (act, pump_runs); 4 ssr_shorts_on (act, mixer); 5
 * earth_fault_bypasses_limit (act, floor2); 6 moisture_direction (act, flow_probe); 7
 * self_powered_lost (act, self_acting); 8 mercury_asbestos_refrigerant (act, self_acting); 9
 * approval_lapses (act, floor2); 10 limit_trips_late (act, floor_limit/screed). Not judged, for
 * want of a figure: 4; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "floor2.h"

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

static void compare_out(const struct floor2_out *got, const struct floor2_out *wanted)
{
    compare("mixer", (long)got->mixer, (long)wanted->mixer);
    compare("mixer_opens", (long)got->mixer_opens, (long)wanted->mixer_opens);
    compare("mixer_closes", (long)got->mixer_closes, (long)wanted->mixer_closes);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct floor2 *got, const struct floor2 *wanted)
{
    compare("flow_probe_good_for",
            (long)got->flow_probe_good_for,
            (long)wanted->flow_probe_good_for);
    compare("flow_probe_state", (long)got->flow_probe_state, (long)wanted->flow_probe_state);
    compare("flow_probe_state_for",
            (long)got->flow_probe_state_for,
            (long)wanted->flow_probe_state_for);
    compare("flow_probe_last", (long)got->flow_probe_last, (long)wanted->flow_probe_last);
    compare("flow_probe_before", (long)got->flow_probe_before, (long)wanted->flow_probe_before);
    compare("self_acting_at", (long)got->self_acting_at, (long)wanted->self_acting_at);
    compare("self_acting_sum", (long)got->self_acting_sum, (long)wanted->self_acting_sum);
    compare("self_acting_permille",
            (long)got->self_acting_permille,
            (long)wanted->self_acting_permille);
    compare("mixer_position", (long)got->mixer_position, (long)wanted->mixer_position);
    compare("mixer_awake_for", (long)got->mixer_awake_for, (long)wanted->mixer_awake_for);
    compare("mixer_stem", (long)got->mixer_stem, (long)wanted->mixer_stem);
    compare("mixer_move", (long)got->mixer_move, (long)wanted->mixer_move);
    compare("mixer_end_for", (long)got->mixer_end_for, (long)wanted->mixer_end_for);
    verdict();
}

/* Inputs held for so many steps; the outputs after each odd and each even step of them; the state
 * after the last.
 */
struct row {
    uint32_t steps;
    struct floor2_in in;
    struct floor2_out out;
    struct floor2_out even;
    struct floor2 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 0u, 1u, 1415u, 0u, 11u,
     0u, 0u, 0u, 1u, 0u, 0u, 1u}},
    {1u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {2u, 0u, 2u, 1415u, 1415u,
     11u, 0u, 0u, 0u, 2u, 0u, 0u, 2u}},
    {2u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {4u, 0u, 4u, 1415u, 1415u,
     11u, 0u, 0u, 0u, 4u, 0u, 0u, 4u}},
    {1u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1415u, 1415u,
     0u, 207u, 20u, 0u, 5u, 0u, 0u, 5u}},
    {1u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {6u, 1u, 1u, 1415u, 1415u,
     1u, 207u, 20u, 0u, 6u, 0u, 0u, 6u}},
    {10u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {16u, 1u, 11u, 1415u, 1415u,
     11u, 207u, 20u, 0u, 16u, 0u, 0u, 16u}},
    {1u, {true, 1415u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {17u, 1u, 12u, 1415u, 1415u,
     0u, 414u, 20u, 2u, 17u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {18u, 1u, 13u, 1415u, 1415u,
     1u, 414u, 20u, 4u, 18u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {19u, 1u, 14u, 1415u, 1415u,
     2u, 414u, 20u, 6u, 19u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {20u, 1u, 15u, 1415u, 1415u,
     3u, 414u, 20u, 8u, 20u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {21u, 1u, 15u, 1415u, 1415u,
     4u, 414u, 20u, 10u, 21u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {22u, 1u, 15u, 1415u, 1415u,
     5u, 414u, 20u, 12u, 22u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {23u, 1u, 15u, 1415u, 1415u,
     6u, 414u, 20u, 14u, 23u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {16u, false, true, 0u}, {16u, false, true, 0u}, {24u, 1u, 15u, 1415u, 1415u,
     7u, 414u, 20u, 16u, 24u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {18u, false, true, 0u}, {18u, false, true, 0u}, {25u, 1u, 15u, 1415u, 1415u,
     8u, 414u, 20u, 18u, 25u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {20u, false, true, 0u}, {20u, false, true, 0u}, {26u, 1u, 15u, 1415u, 1415u,
     9u, 414u, 20u, 20u, 26u, 0u, 1u, 0u}},
    {1u, {true, 1415u}, {20u, false, true, 0u}, {20u, false, true, 0u}, {27u, 1u, 15u, 1415u, 1415u,
     10u, 414u, 20u, 20u, 27u, 0u, 1u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 0u, 1415u, 1415u, 11u,
     414u, 20u, 0u, 28u, 0u, 0u, 1u}},
    /* vector 2 */
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 0u, 1u, 0u, 0u, 11u, 0u,
     0u, 0u, 1u, 0u, 0u, 1u}},
    {13u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 0u, 14u, 0u, 0u, 11u, 0u,
     0u, 0u, 14u, 0u, 0u, 14u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 0u, 0u, 0u, 11u, 0u,
     0u, 0u, 15u, 0u, 0u, 15u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 1u, 0u, 0u, 11u, 0u,
     0u, 0u, 16u, 0u, 0u, 16u}},
    {104u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 15u, 0u, 0u, 11u, 0u,
     0u, 0u, 120u, 0u, 0u, 120u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 15u, 0u, 0u, 11u, 0u,
     0u, 0u, 121u, 0u, 0u, 120u}},
    {598u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 15u, 0u, 0u, 11u, 0u,
     0u, 0u, 719u, 0u, 0u, 120u}},
    {1u, {false, 0u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {0u, 3u, 15u, 0u, 0u, 11u, 0u,
     0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 0u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {0u, 3u, 15u, 0u, 0u, 11u, 0u,
     0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1171u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {0u, 3u, 15u, 0u, 0u, 11u,
     0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1172u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {1u, 3u, 15u, 1172u, 0u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    /* vector 3 */
    {5u, {false, 1172u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1172u, 1172u,
     0u, 0u, 1000u, 0u, 5u, 0u, 0u, 5u}},
    /* vector 4 */
    {5u, {false, 1390u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1390u, 1390u,
     0u, 7524u, 754u, 0u, 5u, 0u, 0u, 5u}},
    {12u, {false, 1414u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {17u, 1u, 12u, 1414u, 1414u,
     0u, 8028u, 57u, 0u, 17u, 0u, 0u, 17u}},
    {12u, {false, 1499u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {29u, 1u, 15u, 1499u, 1499u,
     0u, 8028u, 0u, 0u, 29u, 0u, 0u, 29u}},
    {1u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {30u, 1u, 15u, 1608u, 1499u,
     1u, 8028u, 0u, 0u, 30u, 0u, 0u, 30u}},
    {1u, {false, 1609u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 0u, 1608u, 1499u,
     2u, 8028u, 0u, 0u, 31u, 0u, 0u, 31u}},
    {1u, {false, 1280u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 1u, 1280u, 1608u,
     3u, 8028u, 0u, 0u, 32u, 0u, 0u, 32u}},
    {1u, {false, 1280u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {2u, 2u, 2u, 1280u, 1280u,
     4u, 8028u, 0u, 0u, 33u, 0u, 0u, 33u}},
    {7u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1280u, 1280u,
     11u, 8028u, 0u, 0u, 40u, 0u, 0u, 40u}},
    {1u, {false, 1171u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 0u, 1280u, 1280u,
     11u, 0u, 0u, 0u, 41u, 0u, 0u, 41u}},
    {8u, {false, 1171u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 8u, 1280u, 1280u,
     11u, 0u, 0u, 0u, 49u, 0u, 0u, 49u}},
    {49u, {false, 1225u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1225u, 1225u,
     11u, 0u, 0u, 0u, 98u, 0u, 0u, 98u}},
    {1u, {false, 1225u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 0u, 1225u, 1225u,
     0u, 0u, 1000u, 0u, 99u, 0u, 0u, 99u}},
    {1u, {false, 1225u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 1u, 1225u, 1225u,
     1u, 0u, 1000u, 0u, 100u, 0u, 0u, 100u}},
    /* vector 5 */
    {2u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {2u, 0u, 2u, 1415u, 1415u,
     11u, 0u, 0u, 0u, 2u, 0u, 0u, 2u}},
    {1u, {false, 1173u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {3u, 0u, 3u, 1173u, 1415u,
     11u, 0u, 0u, 0u, 3u, 0u, 0u, 3u}},
    {2u, {true, 1416u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1416u, 1416u, 0u,
     0u, 0u, 0u, 5u, 0u, 0u, 5u}},
    {7u, {false, 1415u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {12u, 1u, 7u, 1415u, 1415u,
     7u, 0u, 0u, 0u, 12u, 0u, 0u, 12u}},
    {10u, {false, 1609u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1415u, 1415u,
     5u, 207u, 20u, 0u, 22u, 0u, 0u, 22u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 0u, 1415u, 1415u, 11u,
     0u, 0u, 0u, 23u, 0u, 0u, 23u}},
    {49u, {true, 1414u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1414u, 1414u,
     11u, 0u, 0u, 0u, 72u, 0u, 0u, 72u}},
    {1u, {true, 1414u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {50u, 1u, 0u, 1414u, 1414u,
     0u, 504u, 50u, 2u, 73u, 0u, 0u, 0u}},
    {1u, {true, 1414u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {50u, 1u, 1u, 1414u, 1414u,
     1u, 504u, 50u, 4u, 74u, 0u, 0u, 0u}},
    {1u, {true, 65535u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {0u, 2u, 0u, 1414u, 1414u,
     2u, 504u, 50u, 6u, 75u, 0u, 0u, 0u}},
    {1u, {true, 1444u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {1u, 2u, 1u, 1444u, 1414u, 3u,
     504u, 50u, 8u, 76u, 0u, 0u, 0u}},
    {1u, {true, 1444u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {2u, 2u, 2u, 1444u, 1444u,
     4u, 504u, 50u, 10u, 77u, 0u, 0u, 0u}},
    {1u, {true, 1444u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {3u, 2u, 3u, 1444u, 1444u,
     5u, 504u, 50u, 12u, 78u, 0u, 0u, 0u}},
    {1u, {true, 1444u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {4u, 2u, 4u, 1444u, 1444u,
     6u, 504u, 50u, 14u, 79u, 0u, 0u, 0u}},
    {1u, {false, 1444u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1444u, 1444u,
     7u, 504u, 50u, 0u, 80u, 0u, 0u, 1u}},
    {1u, {true, 1390u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {6u, 1u, 1u, 1390u, 1444u, 8u,
     504u, 50u, 2u, 81u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {0u, 2u, 0u, 1390u, 1444u, 9u,
     504u, 50u, 4u, 82u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {0u, 2u, 1u, 1390u, 1444u,
     10u, 504u, 50u, 6u, 83u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {0u, 2u, 2u, 1390u, 1444u,
     11u, 504u, 50u, 8u, 84u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {0u, 2u, 3u, 1390u, 1444u,
     0u, 8028u, 754u, 10u, 85u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {0u, 2u, 4u, 1390u, 1444u,
     1u, 8028u, 754u, 12u, 86u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {0u, 2u, 5u, 1390u, 1444u,
     2u, 8028u, 754u, 14u, 87u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {16u, false, true, 0u}, {16u, false, true, 0u}, {0u, 2u, 6u, 1390u, 1444u,
     3u, 8028u, 754u, 16u, 88u, 0u, 0u, 0u}},
    {1u, {true, 1609u}, {18u, false, true, 0u}, {18u, false, true, 0u}, {0u, 2u, 7u, 1390u, 1444u,
     4u, 8028u, 754u, 18u, 89u, 0u, 0u, 0u}},
    {1u, {true, 1414u}, {20u, false, true, 0u}, {20u, false, true, 0u}, {1u, 2u, 8u, 1414u, 1390u,
     5u, 8028u, 754u, 20u, 90u, 0u, 1u, 0u}},
    {1u, {true, 1414u}, {22u, false, true, 0u}, {22u, false, true, 0u}, {2u, 2u, 9u, 1414u, 1414u,
     6u, 8028u, 754u, 22u, 91u, 0u, 1u, 0u}},
    {1u, {true, 1414u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {3u, 3u, 0u, 1414u, 1414u,
     11u, 0u, 0u, 0u, 92u, 0u, 0u, 1u}},
    {46u, {true, 1414u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1414u, 1414u,
     11u, 0u, 0u, 0u, 138u, 0u, 0u, 47u}},
    {1u, {true, 1414u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {50u, 1u, 0u, 1414u, 1414u,
     0u, 504u, 50u, 2u, 139u, 0u, 0u, 0u}},
    {1u, {true, 1414u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {50u, 1u, 1u, 1414u, 1414u,
     1u, 504u, 50u, 4u, 140u, 0u, 0u, 0u}},
    {1u, {true, 65535u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {0u, 2u, 0u, 1414u, 1414u,
     2u, 504u, 50u, 6u, 141u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {1u, 2u, 1u, 1415u, 1414u, 3u,
     504u, 50u, 8u, 142u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {2u, 2u, 2u, 1415u, 1415u,
     4u, 504u, 50u, 10u, 143u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {3u, 2u, 3u, 1415u, 1415u,
     5u, 504u, 50u, 12u, 144u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {4u, 2u, 4u, 1415u, 1415u,
     6u, 504u, 50u, 14u, 145u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {16u, false, true, 0u}, {16u, false, true, 0u}, {5u, 1u, 0u, 1415u, 1415u,
     7u, 504u, 50u, 16u, 146u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {18u, false, true, 0u}, {18u, false, true, 0u}, {6u, 1u, 1u, 1415u, 1415u,
     8u, 504u, 50u, 18u, 147u, 0u, 0u, 0u}},
    {1u, {true, 1172u}, {20u, false, true, 0u}, {20u, false, true, 0u}, {7u, 1u, 2u, 1172u, 1415u,
     9u, 504u, 50u, 20u, 148u, 0u, 1u, 0u}},
    {1u, {true, 65535u}, {22u, false, true, 0u}, {22u, false, true, 0u}, {0u, 2u, 0u, 1172u, 1415u,
     10u, 504u, 50u, 22u, 149u, 0u, 1u, 0u}},
    {1u, {true, 65535u}, {24u, false, true, 0u}, {24u, false, true, 0u}, {0u, 2u, 1u, 1172u, 1415u,
     11u, 504u, 50u, 24u, 150u, 0u, 1u, 0u}},
    {1u, {true, 1607u}, {22u, false, true, 0u}, {22u, false, true, 0u}, {1u, 2u, 2u, 1607u, 1172u,
     0u, 711u, 20u, 22u, 151u, 0u, 1u, 0u}},
    {7u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1607u, 1172u,
     7u, 711u, 20u, 0u, 158u, 0u, 0u, 7u}},
    {561u, {false, 1171u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 15u, 1607u, 1172u,
     11u, 0u, 0u, 0u, 719u, 0u, 0u, 120u}},
    {153u, {false, 1171u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {0u, 3u, 15u, 1607u,
     1172u, 11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1499u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {1u, 3u, 15u, 1499u, 1607u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 0u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {0u, 3u, 15u, 1499u, 1607u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1373u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {1u, 3u, 15u, 1373u, 1499u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {48u, {true, 1373u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {49u, 3u, 15u, 1373u,
     1373u, 11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {true, 1373u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {50u, 1u, 0u, 1373u, 1373u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {false, 1374u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 1u, 1374u, 1373u,
     1u, 0u, 1000u, 0u, 720u, 0u, 0u, 1u}},
    {1u, {true, 1415u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {50u, 1u, 2u, 1415u, 1374u,
     2u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {50u, 1u, 3u, 1415u, 1415u,
     3u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {50u, 1u, 4u, 1415u, 1415u,
     4u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {50u, 1u, 5u, 1415u, 1415u,
     5u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {50u, 1u, 6u, 1415u,
     1415u, 6u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {50u, 1u, 7u, 1415u,
     1415u, 7u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {50u, 1u, 8u, 1415u,
     1415u, 8u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {50u, 1u, 9u, 1415u,
     1415u, 9u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {50u, 1u, 10u, 1415u,
     1415u, 10u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1415u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 11u, 1415u, 1415u,
     11u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1415u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 12u, 1415u, 1415u,
     0u, 207u, 20u, 20u, 720u, 1u, 1u, 0u}},
    {4u, {true, 1415u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 15u, 1415u, 1415u,
     4u, 207u, 20u, 20u, 720u, 5u, 1u, 0u}},
    {2u, {true, 1608u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 15u, 1608u, 1608u,
     6u, 207u, 20u, 20u, 720u, 7u, 1u, 0u}},
    {4u, {true, 1459u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 15u, 1459u, 1459u,
     10u, 207u, 20u, 20u, 720u, 11u, 1u, 0u}},
    {1u, {false, 0u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {0u, 2u, 0u, 1459u, 1459u,
     11u, 207u, 20u, 0u, 720u, 12u, 0u, 0u}},
    {1u, {false, 1172u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 1u, 1172u, 1459u,
     0u, 207u, 0u, 0u, 720u, 12u, 2u, 0u}},
    {1u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1172u, 1459u,
     1u, 207u, 0u, 0u, 720u, 11u, 2u, 0u}},
    {7u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1172u, 1459u,
     8u, 207u, 0u, 0u, 720u, 4u, 2u, 0u}},
    {1u, {false, 1499u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {1u, 3u, 0u, 1499u, 1172u,
     11u, 0u, 0u, 0u, 720u, 3u, 2u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 1u, 1499u, 1172u, 11u,
     0u, 0u, 0u, 720u, 2u, 2u, 0u}},
    {1u, {false, 1373u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {1u, 3u, 2u, 1373u, 1499u,
     11u, 0u, 0u, 0u, 720u, 1u, 2u, 0u}},
    {1u, {true, 1373u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {2u, 3u, 3u, 1373u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 1u}},
    {47u, {true, 1373u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1373u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 48u}},
    {1u, {true, 1373u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {50u, 1u, 0u, 1373u, 1373u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {50u, 1u, 1u, 1373u, 1373u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {50u, 1u, 2u, 1373u, 1373u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {50u, 1u, 3u, 1373u, 1373u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {50u, 1u, 4u, 1373u,
     1373u, 4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {50u, 1u, 5u, 1373u,
     1373u, 5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {50u, 1u, 6u, 1373u,
     1373u, 6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {50u, 1u, 7u, 1373u,
     1373u, 7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {50u, 1u, 8u, 1373u,
     1373u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 9u, 1373u, 1373u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1373u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {50u, 1u, 10u, 1373u, 1373u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {false, 1173u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {50u, 1u, 11u, 1173u,
     1373u, 11u, 0u, 1000u, 0u, 720u, 2u, 0u, 0u}},
    {1u, {false, 1457u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 12u, 1457u, 1173u,
     0u, 0u, 1000u, 0u, 720u, 2u, 2u, 0u}},
    {10u, {false, 173u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1457u, 1173u,
     10u, 0u, 1000u, 0u, 720u, 0u, 0u, 9u}},
    {110u, {false, 173u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 15u, 1457u, 1173u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 119u}},
    {1u, {false, 1373u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {1u, 3u, 15u, 1373u, 1457u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {48u, {true, 1373u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {49u, 3u, 15u, 1373u,
     1373u, 11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {true, 1373u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {50u, 1u, 0u, 1373u, 1373u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {50u, 1u, 1u, 1373u, 1373u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {50u, 1u, 2u, 1373u, 1373u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {50u, 1u, 3u, 1373u, 1373u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {50u, 1u, 4u, 1373u,
     1373u, 4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {50u, 1u, 5u, 1373u,
     1373u, 5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {50u, 1u, 6u, 1373u,
     1373u, 6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {50u, 1u, 7u, 1373u,
     1373u, 7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {50u, 1u, 8u, 1373u,
     1373u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1373u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {50u, 1u, 9u, 1373u, 1373u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1373u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {50u, 1u, 10u, 1373u, 1373u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {false, 1173u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {50u, 1u, 11u, 1173u,
     1373u, 11u, 0u, 1000u, 0u, 720u, 2u, 0u, 0u}},
    {1u, {false, 1457u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 12u, 1457u, 1173u,
     0u, 0u, 1000u, 0u, 720u, 2u, 2u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 0u, 1457u, 1173u, 1u,
     0u, 1000u, 0u, 720u, 1u, 2u, 0u}},
    {1u, {true, 0u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {0u, 2u, 1u, 1457u, 1173u, 2u,
     0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1444u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {1u, 2u, 2u, 1444u, 1457u,
     3u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1499u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {2u, 2u, 3u, 1499u, 1444u,
     4u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1499u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {3u, 2u, 4u, 1499u, 1499u,
     5u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1499u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {4u, 2u, 5u, 1499u, 1499u,
     6u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1499u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {5u, 1u, 0u, 1499u, 1499u,
     7u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {6u, 1u, 1u, 1225u, 1499u,
     8u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {7u, 1u, 2u, 1225u, 1225u,
     9u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {8u, 1u, 3u, 1225u, 1225u,
     10u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {9u, 1u, 4u, 1225u, 1225u,
     11u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {false, 1607u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {10u, 1u, 5u, 1607u, 1225u,
     0u, 0u, 1000u, 0u, 720u, 1u, 0u, 0u}},
    {1u, {false, 1607u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {11u, 1u, 6u, 1607u, 1607u,
     1u, 0u, 1000u, 0u, 720u, 1u, 2u, 0u}},
    {1u, {true, 1225u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {12u, 1u, 7u, 1225u, 1607u,
     2u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {13u, 1u, 8u, 1225u, 1225u,
     3u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {14u, 1u, 9u, 1225u, 1225u,
     4u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {15u, 1u, 10u, 1280u, 1225u,
     5u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {16u, 1u, 11u, 1280u,
     1280u, 6u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {17u, 1u, 12u, 1280u,
     1280u, 7u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {18u, 1u, 13u, 1280u,
     1280u, 8u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {19u, 1u, 14u, 1280u,
     1280u, 9u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {20u, 1u, 15u, 1280u,
     1280u, 10u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {21u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1280u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {22u, 1u, 15u, 1280u, 1280u,
     0u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {true, 1280u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {23u, 1u, 15u, 1280u, 1280u,
     1u, 0u, 1000u, 24u, 720u, 2u, 1u, 0u}},
    {1u, {true, 1280u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {24u, 1u, 15u, 1280u, 1280u,
     2u, 0u, 1000u, 26u, 720u, 3u, 1u, 0u}},
    {1u, {true, 1280u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {25u, 1u, 15u, 1280u, 1280u,
     3u, 0u, 1000u, 28u, 720u, 4u, 1u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {26u, 1u, 15u, 1280u, 1280u,
     4u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {27u, 1u, 15u, 1280u, 1280u,
     5u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1280u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {28u, 1u, 15u, 1280u, 1280u,
     6u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1280u}, {36u, true, false, 0u}, {36u, true, false, 0u}, {29u, 1u, 15u, 1280u, 1280u,
     7u, 0u, 1000u, 36u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1280u}, {38u, true, false, 0u}, {38u, true, false, 0u}, {30u, 1u, 15u, 1280u, 1280u,
     8u, 0u, 1000u, 38u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1280u}, {40u, true, false, 0u}, {40u, true, false, 0u}, {31u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 40u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1280u}, {42u, true, false, 0u}, {42u, true, false, 0u}, {32u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 42u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1280u}, {44u, true, false, 0u}, {44u, true, false, 0u}, {33u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 44u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1280u}, {46u, true, false, 0u}, {46u, true, false, 0u}, {34u, 1u, 15u, 1280u, 1280u,
     0u, 0u, 1000u, 46u, 720u, 13u, 1u, 0u}},
    {1u, {true, 1280u}, {48u, true, false, 0u}, {48u, true, false, 0u}, {35u, 1u, 15u, 1280u, 1280u,
     1u, 0u, 1000u, 48u, 720u, 14u, 1u, 0u}},
    {1u, {false, 1280u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {36u, 1u, 15u, 1280u,
     1280u, 2u, 0u, 1000u, 0u, 720u, 15u, 0u, 0u}},
    {1u, {true, 1280u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {37u, 1u, 15u, 1280u, 1280u,
     3u, 0u, 1000u, 2u, 720u, 15u, 2u, 0u}},
    {1u, {true, 1444u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {38u, 1u, 15u, 1444u, 1280u,
     4u, 0u, 1000u, 4u, 720u, 14u, 2u, 0u}},
    {1u, {true, 1444u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {39u, 1u, 15u, 1444u, 1444u,
     5u, 0u, 1000u, 6u, 720u, 13u, 2u, 0u}},
    {1u, {true, 1444u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {40u, 1u, 15u, 1444u, 1444u,
     6u, 0u, 1000u, 8u, 720u, 12u, 2u, 0u}},
    {1u, {true, 1459u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {41u, 1u, 15u, 1459u, 1444u,
     7u, 0u, 1000u, 10u, 720u, 11u, 2u, 0u}},
    {1u, {true, 1171u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {0u, 2u, 0u, 1459u, 1444u,
     8u, 0u, 1000u, 12u, 720u, 10u, 2u, 0u}},
    {1u, {true, 1171u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {0u, 2u, 1u, 1459u, 1444u,
     9u, 0u, 1000u, 14u, 720u, 9u, 2u, 0u}},
    {3u, {true, 1171u}, {16u, false, false, 0u}, {18u, false, false, 0u}, {0u, 2u, 4u, 1459u, 1444u,
     0u, 0u, 0u, 16u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {0u, 2u, 5u, 1459u, 1444u,
     1u, 0u, 0u, 14u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {0u, 2u, 6u, 1459u, 1444u,
     2u, 0u, 0u, 12u, 720u, 8u, 0u, 0u}},
    {1u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 7u, 1459u, 1444u,
     3u, 0u, 0u, 0u, 720u, 8u, 2u, 0u}},
    {1u, {false, 1499u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 8u, 1499u, 1459u,
     4u, 0u, 0u, 0u, 720u, 7u, 2u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1499u, 1459u, 5u,
     0u, 0u, 0u, 720u, 6u, 2u, 0u}},
    {49u, {false, 1608u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1608u, 1608u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 44u}},
    {13u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 12u, 1608u, 1608u,
     0u, 0u, 0u, 0u, 720u, 0u, 0u, 57u}},
    {3u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1373u, 1373u,
     3u, 0u, 0u, 0u, 720u, 0u, 0u, 60u}},
    {1u, {false, 1335u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1335u, 1373u,
     4u, 0u, 0u, 0u, 720u, 0u, 0u, 61u}},
    {3u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1335u, 1373u, 7u,
     0u, 0u, 0u, 720u, 0u, 0u, 64u}},
    {1u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 3u, 1373u, 1335u,
     8u, 0u, 0u, 0u, 720u, 0u, 0u, 65u}},
    {2u, {false, 65535u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1373u, 1335u,
     10u, 0u, 0u, 0u, 720u, 0u, 0u, 67u}},
    {1u, {false, 1225u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 6u, 1225u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 68u}},
    {1u, {true, 1225u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {2u, 2u, 7u, 1225u, 1225u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {3u, 2u, 8u, 1225u, 1225u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {4u, 2u, 9u, 1225u, 1225u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {5u, 1u, 0u, 1280u, 1225u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {6u, 1u, 1u, 1280u, 1280u,
     4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {7u, 1u, 2u, 1280u, 1280u,
     5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {8u, 1u, 3u, 1280u, 1280u,
     6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {9u, 1u, 4u, 1280u, 1280u,
     7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {10u, 1u, 5u, 1280u,
     1280u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {11u, 1u, 6u, 1280u, 1280u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1280u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {12u, 1u, 7u, 1280u, 1280u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {true, 1280u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {13u, 1u, 8u, 1280u, 1280u,
     11u, 0u, 1000u, 24u, 720u, 2u, 1u, 0u}},
    {1u, {true, 1280u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {14u, 1u, 9u, 1280u, 1280u,
     0u, 0u, 1000u, 26u, 720u, 3u, 1u, 0u}},
    {1u, {true, 1280u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {15u, 1u, 10u, 1280u, 1280u,
     1u, 0u, 1000u, 28u, 720u, 4u, 1u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {16u, 1u, 11u, 1280u, 1280u,
     2u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {17u, 1u, 12u, 1280u, 1280u,
     3u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1280u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {18u, 1u, 13u, 1280u, 1280u,
     4u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1280u}, {36u, true, false, 0u}, {36u, true, false, 0u}, {19u, 1u, 14u, 1280u, 1280u,
     5u, 0u, 1000u, 36u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1280u}, {38u, true, false, 0u}, {38u, true, false, 0u}, {20u, 1u, 15u, 1280u, 1280u,
     6u, 0u, 1000u, 38u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1280u}, {40u, true, false, 0u}, {40u, true, false, 0u}, {21u, 1u, 15u, 1280u, 1280u,
     7u, 0u, 1000u, 40u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1280u}, {42u, true, false, 0u}, {42u, true, false, 0u}, {22u, 1u, 15u, 1280u, 1280u,
     8u, 0u, 1000u, 42u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1280u}, {44u, true, false, 0u}, {44u, true, false, 0u}, {23u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 44u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1280u}, {46u, true, false, 0u}, {46u, true, false, 0u}, {24u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 46u, 720u, 13u, 1u, 0u}},
    {1u, {true, 1280u}, {48u, true, false, 0u}, {48u, true, false, 0u}, {25u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 48u, 720u, 14u, 1u, 0u}},
    {1u, {false, 1280u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {26u, 1u, 15u, 1280u,
     1280u, 0u, 0u, 1000u, 0u, 720u, 15u, 0u, 0u}},
    {1u, {true, 1280u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {27u, 1u, 15u, 1280u, 1280u,
     1u, 0u, 1000u, 2u, 720u, 15u, 2u, 0u}},
    {1u, {true, 1414u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {28u, 1u, 15u, 1414u, 1280u,
     2u, 0u, 1000u, 4u, 720u, 14u, 2u, 0u}},
    {1u, {true, 1414u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {29u, 1u, 15u, 1414u, 1414u,
     3u, 0u, 1000u, 6u, 720u, 13u, 2u, 0u}},
    {1u, {true, 1414u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {30u, 1u, 15u, 1414u, 1414u,
     4u, 0u, 1000u, 8u, 720u, 12u, 2u, 0u}},
    {1u, {true, 1414u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {31u, 1u, 15u, 1414u, 1414u,
     5u, 0u, 1000u, 10u, 720u, 11u, 2u, 0u}},
    {1u, {true, 1414u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {32u, 1u, 15u, 1414u, 1414u,
     6u, 0u, 1000u, 12u, 720u, 10u, 2u, 0u}},
    {1u, {true, 1414u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {33u, 1u, 15u, 1414u, 1414u,
     7u, 0u, 1000u, 14u, 720u, 9u, 2u, 0u}},
    {1u, {true, 1414u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {34u, 1u, 15u, 1414u,
     1414u, 8u, 0u, 1000u, 16u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {35u, 1u, 15u, 1444u,
     1414u, 9u, 0u, 1000u, 18u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {36u, 1u, 15u, 1444u,
     1444u, 10u, 0u, 1000u, 20u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {22u, false, false, 0u}, {22u, false, false, 0u}, {37u, 1u, 15u, 1444u,
     1444u, 11u, 0u, 1000u, 22u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1459u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {38u, 1u, 15u, 1459u,
     1444u, 0u, 0u, 0u, 20u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {0u, 2u, 0u, 1459u, 1444u,
     1u, 0u, 0u, 18u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {0u, 2u, 1u, 1459u, 1444u,
     2u, 0u, 0u, 16u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {0u, 2u, 2u, 1459u, 1444u,
     3u, 0u, 0u, 14u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {1u, 2u, 3u, 1444u, 1459u,
     4u, 0u, 0u, 12u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {2u, 2u, 4u, 1444u, 1444u,
     5u, 0u, 0u, 10u, 720u, 8u, 0u, 0u}},
    {1u, {true, 12u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {0u, 2u, 5u, 1444u, 1444u, 6u,
     0u, 0u, 8u, 720u, 8u, 0u, 0u}},
    {1u, {true, 12u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {0u, 2u, 6u, 1444u, 1444u, 7u,
     0u, 0u, 6u, 720u, 8u, 0u, 0u}},
    {1u, {true, 12u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {0u, 2u, 7u, 1444u, 1444u, 8u,
     0u, 0u, 4u, 720u, 8u, 0u, 0u}},
    {1u, {true, 12u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {0u, 2u, 8u, 1444u, 1444u, 9u,
     0u, 0u, 2u, 720u, 8u, 0u, 0u}},
    {1u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1444u, 1444u,
     10u, 0u, 0u, 0u, 720u, 8u, 2u, 0u}},
    {1u, {false, 1499u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {1u, 3u, 0u, 1499u, 1444u,
     11u, 0u, 0u, 0u, 720u, 7u, 2u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {0u, 3u, 1u, 1499u, 1444u, 11u,
     0u, 0u, 0u, 720u, 6u, 2u, 0u}},
    {49u, {false, 1608u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1608u, 1608u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 44u}},
    {13u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 12u, 1608u, 1608u,
     0u, 0u, 0u, 0u, 720u, 0u, 0u, 57u}},
    {3u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1373u, 1373u,
     3u, 0u, 0u, 0u, 720u, 0u, 0u, 60u}},
    {1u, {false, 1335u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1335u, 1373u,
     4u, 0u, 0u, 0u, 720u, 0u, 0u, 61u}},
    {3u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1335u, 1373u, 7u,
     0u, 0u, 0u, 720u, 0u, 0u, 64u}},
    {1u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 3u, 1373u, 1335u,
     8u, 0u, 0u, 0u, 720u, 0u, 0u, 65u}},
    {2u, {false, 65535u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1373u, 1335u,
     10u, 0u, 0u, 0u, 720u, 0u, 0u, 67u}},
    {1u, {false, 1225u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 6u, 1225u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 68u}},
    {1u, {true, 1225u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {2u, 2u, 7u, 1225u, 1225u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {3u, 2u, 8u, 1225u, 1225u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {4u, 2u, 9u, 1225u, 1225u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {5u, 1u, 0u, 1280u, 1225u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {6u, 1u, 1u, 1280u, 1280u,
     4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {7u, 1u, 2u, 1280u, 1280u,
     5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {8u, 1u, 3u, 1280u, 1280u,
     6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {9u, 1u, 4u, 1280u, 1280u,
     7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {10u, 1u, 5u, 1280u,
     1280u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {11u, 1u, 6u, 1280u, 1280u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1280u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {12u, 1u, 7u, 1280u, 1280u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {true, 1280u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {13u, 1u, 8u, 1280u, 1280u,
     11u, 0u, 1000u, 24u, 720u, 2u, 1u, 0u}},
    {1u, {true, 1280u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {14u, 1u, 9u, 1280u, 1280u,
     0u, 0u, 1000u, 26u, 720u, 3u, 1u, 0u}},
    {1u, {true, 1280u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {15u, 1u, 10u, 1280u, 1280u,
     1u, 0u, 1000u, 28u, 720u, 4u, 1u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {16u, 1u, 11u, 1280u, 1280u,
     2u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {17u, 1u, 12u, 1280u, 1280u,
     3u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1280u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {18u, 1u, 13u, 1280u, 1280u,
     4u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1280u}, {36u, true, false, 0u}, {36u, true, false, 0u}, {19u, 1u, 14u, 1280u, 1280u,
     5u, 0u, 1000u, 36u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1280u}, {38u, true, false, 0u}, {38u, true, false, 0u}, {20u, 1u, 15u, 1280u, 1280u,
     6u, 0u, 1000u, 38u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1280u}, {40u, true, false, 0u}, {40u, true, false, 0u}, {21u, 1u, 15u, 1280u, 1280u,
     7u, 0u, 1000u, 40u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1280u}, {42u, true, false, 0u}, {42u, true, false, 0u}, {22u, 1u, 15u, 1280u, 1280u,
     8u, 0u, 1000u, 42u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1280u}, {44u, true, false, 0u}, {44u, true, false, 0u}, {23u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 44u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1280u}, {46u, true, false, 0u}, {46u, true, false, 0u}, {24u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 46u, 720u, 13u, 1u, 0u}},
    {1u, {true, 1280u}, {48u, true, false, 0u}, {48u, true, false, 0u}, {25u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 48u, 720u, 14u, 1u, 0u}},
    {1u, {false, 1280u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {26u, 1u, 15u, 1280u,
     1280u, 0u, 0u, 1000u, 0u, 720u, 15u, 0u, 0u}},
    {1u, {true, 1280u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {27u, 1u, 15u, 1280u, 1280u,
     1u, 0u, 1000u, 2u, 720u, 15u, 2u, 0u}},
    {1u, {true, 1414u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {28u, 1u, 15u, 1414u, 1280u,
     2u, 0u, 1000u, 4u, 720u, 14u, 2u, 0u}},
    {1u, {true, 1414u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {29u, 1u, 15u, 1414u, 1414u,
     3u, 0u, 1000u, 6u, 720u, 13u, 2u, 0u}},
    {1u, {true, 1414u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {30u, 1u, 15u, 1414u, 1414u,
     4u, 0u, 1000u, 8u, 720u, 12u, 2u, 0u}},
    {1u, {true, 1414u}, {10u, false, true, 0u}, {10u, false, true, 0u}, {31u, 1u, 15u, 1414u, 1414u,
     5u, 0u, 1000u, 10u, 720u, 11u, 2u, 0u}},
    {1u, {true, 1414u}, {12u, false, true, 0u}, {12u, false, true, 0u}, {32u, 1u, 15u, 1414u, 1414u,
     6u, 0u, 1000u, 12u, 720u, 10u, 2u, 0u}},
    {1u, {true, 1414u}, {14u, false, true, 0u}, {14u, false, true, 0u}, {33u, 1u, 15u, 1414u, 1414u,
     7u, 0u, 1000u, 14u, 720u, 9u, 2u, 0u}},
    {1u, {true, 1414u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {34u, 1u, 15u, 1414u,
     1414u, 8u, 0u, 1000u, 16u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {35u, 1u, 15u, 1444u,
     1414u, 9u, 0u, 1000u, 18u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {36u, 1u, 15u, 1444u,
     1444u, 10u, 0u, 1000u, 20u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {22u, false, false, 0u}, {22u, false, false, 0u}, {37u, 1u, 15u, 1444u,
     1444u, 11u, 0u, 1000u, 22u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1459u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {38u, 1u, 15u, 1459u,
     1444u, 0u, 0u, 0u, 20u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {0u, 2u, 0u, 1459u, 1444u,
     1u, 0u, 0u, 18u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {0u, 2u, 1u, 1459u, 1444u,
     2u, 0u, 0u, 16u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1171u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {0u, 2u, 2u, 1459u, 1444u,
     3u, 0u, 0u, 14u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {1u, 2u, 3u, 1444u, 1459u,
     4u, 0u, 0u, 12u, 720u, 8u, 0u, 0u}},
    {1u, {true, 1444u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {2u, 2u, 4u, 1444u, 1444u,
     5u, 0u, 0u, 10u, 720u, 8u, 0u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1444u, 1444u, 6u,
     0u, 0u, 0u, 720u, 8u, 2u, 0u}},
    {1u, {true, 1173u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 6u, 1173u, 1444u, 7u,
     0u, 0u, 0u, 720u, 7u, 2u, 0u}},
    {3u, {true, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {4u, 2u, 9u, 1608u, 1608u,
     10u, 0u, 0u, 0u, 720u, 4u, 2u, 0u}},
    {1u, {true, 1335u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1335u, 1608u,
     11u, 0u, 0u, 0u, 720u, 3u, 2u, 0u}},
    {1u, {true, 1335u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {6u, 1u, 1u, 1335u, 1335u, 0u,
     0u, 1000u, 2u, 720u, 2u, 2u, 0u}},
    {1u, {true, 1335u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {7u, 1u, 2u, 1335u, 1335u,
     1u, 0u, 1000u, 4u, 720u, 1u, 0u, 0u}},
    {1u, {true, 65535u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {0u, 2u, 0u, 1335u, 1335u,
     2u, 0u, 1000u, 6u, 720u, 1u, 0u, 0u}},
    {1u, {true, 1335u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {1u, 2u, 1u, 1335u, 1335u,
     3u, 0u, 1000u, 8u, 720u, 1u, 0u, 0u}},
    {1u, {true, 1457u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {2u, 2u, 2u, 1457u, 1335u,
     4u, 0u, 1000u, 10u, 720u, 1u, 0u, 0u}},
    {1u, {true, 1554u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {3u, 2u, 3u, 1554u, 1457u,
     5u, 0u, 1000u, 12u, 720u, 1u, 0u, 0u}},
    {1u, {true, 1554u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {4u, 2u, 4u, 1554u, 1554u,
     6u, 0u, 1000u, 14u, 720u, 1u, 0u, 0u}},
    {1u, {true, 1459u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {5u, 1u, 0u, 1459u, 1554u,
     7u, 0u, 1000u, 16u, 720u, 1u, 0u, 0u}},
    {1u, {true, 0u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {0u, 2u, 0u, 1459u, 1554u,
     8u, 0u, 1000u, 18u, 720u, 1u, 0u, 0u}},
    {1u, {true, 0u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {0u, 2u, 1u, 1459u, 1554u,
     9u, 0u, 1000u, 20u, 720u, 1u, 0u, 0u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1459u, 1554u, 10u,
     0u, 1000u, 0u, 720u, 1u, 2u, 0u}},
    {62u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1608u, 1608u,
     0u, 0u, 0u, 0u, 720u, 0u, 0u, 62u}},
    {3u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1373u, 1373u,
     3u, 0u, 0u, 0u, 720u, 0u, 0u, 65u}},
    {1u, {false, 1335u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1335u, 1373u,
     4u, 0u, 0u, 0u, 720u, 0u, 0u, 66u}},
    {3u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1335u, 1373u, 7u,
     0u, 0u, 0u, 720u, 0u, 0u, 69u}},
    {1u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 3u, 1373u, 1335u,
     8u, 0u, 0u, 0u, 720u, 0u, 0u, 70u}},
    {2u, {false, 65535u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1373u, 1335u,
     10u, 0u, 0u, 0u, 720u, 0u, 0u, 72u}},
    {1u, {false, 1225u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 6u, 1225u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 73u}},
    {1u, {true, 1225u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {2u, 2u, 7u, 1225u, 1225u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {3u, 2u, 8u, 1225u, 1225u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {4u, 2u, 9u, 1225u, 1225u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {5u, 1u, 0u, 1280u, 1225u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {6u, 1u, 1u, 1280u, 1280u,
     4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {7u, 1u, 2u, 1280u, 1280u,
     5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {8u, 1u, 3u, 1280u, 1280u,
     6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {9u, 1u, 4u, 1280u, 1280u,
     7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {10u, 1u, 5u, 1280u,
     1280u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {11u, 1u, 6u, 1280u, 1280u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1280u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {12u, 1u, 7u, 1280u, 1280u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {true, 1280u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {13u, 1u, 8u, 1280u, 1280u,
     11u, 0u, 1000u, 24u, 720u, 2u, 1u, 0u}},
    {1u, {true, 1280u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {14u, 1u, 9u, 1280u, 1280u,
     0u, 0u, 1000u, 26u, 720u, 3u, 1u, 0u}},
    {1u, {true, 1280u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {15u, 1u, 10u, 1280u, 1280u,
     1u, 0u, 1000u, 28u, 720u, 4u, 1u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {16u, 1u, 11u, 1280u, 1280u,
     2u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {17u, 1u, 12u, 1280u, 1280u,
     3u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1280u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {18u, 1u, 13u, 1280u, 1280u,
     4u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1280u}, {36u, true, false, 0u}, {36u, true, false, 0u}, {19u, 1u, 14u, 1280u, 1280u,
     5u, 0u, 1000u, 36u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1280u}, {38u, true, false, 0u}, {38u, true, false, 0u}, {20u, 1u, 15u, 1280u, 1280u,
     6u, 0u, 1000u, 38u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1280u}, {40u, true, false, 0u}, {40u, true, false, 0u}, {21u, 1u, 15u, 1280u, 1280u,
     7u, 0u, 1000u, 40u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1280u}, {42u, true, false, 0u}, {42u, true, false, 0u}, {22u, 1u, 15u, 1280u, 1280u,
     8u, 0u, 1000u, 42u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1280u}, {44u, true, false, 0u}, {44u, true, false, 0u}, {23u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 44u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1280u}, {46u, true, false, 0u}, {46u, true, false, 0u}, {24u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 46u, 720u, 13u, 1u, 0u}},
    {1u, {true, 1280u}, {48u, true, false, 0u}, {48u, true, false, 0u}, {25u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 48u, 720u, 14u, 1u, 0u}},
    {1u, {false, 1280u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {26u, 1u, 15u, 1280u,
     1280u, 0u, 0u, 1000u, 0u, 720u, 15u, 0u, 0u}},
    {5u, {false, 1280u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {31u, 1u, 15u, 1280u, 1280u,
     5u, 0u, 1000u, 0u, 720u, 11u, 2u, 0u}},
    {1u, {false, 1281u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {32u, 1u, 15u, 1281u, 1280u,
     6u, 0u, 1000u, 0u, 720u, 10u, 2u, 0u}},
    {1u, {true, 1499u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {33u, 1u, 15u, 1499u, 1281u,
     7u, 0u, 1000u, 2u, 720u, 9u, 2u, 0u}},
    {1u, {true, 1280u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {34u, 1u, 15u, 1280u, 1499u,
     8u, 0u, 1000u, 4u, 720u, 8u, 2u, 0u}},
    {1u, {true, 1280u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {35u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 6u, 720u, 7u, 2u, 0u}},
    {1u, {true, 1372u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {36u, 1u, 15u, 1372u, 1280u,
     10u, 0u, 1000u, 8u, 720u, 6u, 2u, 0u}},
    {1u, {true, 1372u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {37u, 1u, 15u, 1372u,
     1372u, 11u, 0u, 1000u, 10u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {38u, 1u, 15u, 1372u,
     1372u, 0u, 0u, 1000u, 12u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {39u, 1u, 15u, 1372u,
     1372u, 1u, 0u, 1000u, 14u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {40u, 1u, 15u, 1372u,
     1372u, 2u, 0u, 1000u, 16u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {41u, 1u, 15u, 1372u,
     1372u, 3u, 0u, 1000u, 18u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {42u, 1u, 15u, 1372u,
     1372u, 4u, 0u, 1000u, 20u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {22u, false, false, 0u}, {22u, false, false, 0u}, {43u, 1u, 15u, 1372u,
     1372u, 5u, 0u, 1000u, 22u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {24u, false, false, 0u}, {24u, false, false, 0u}, {44u, 1u, 15u, 1372u,
     1372u, 6u, 0u, 1000u, 24u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {26u, false, false, 0u}, {26u, false, false, 0u}, {45u, 1u, 15u, 1372u,
     1372u, 7u, 0u, 1000u, 26u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {28u, false, false, 0u}, {28u, false, false, 0u}, {46u, 1u, 15u, 1372u,
     1372u, 8u, 0u, 1000u, 28u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1607u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {47u, 1u, 15u, 1607u, 1372u,
     9u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {false, 1173u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {48u, 1u, 15u, 1173u,
     1607u, 10u, 0u, 1000u, 0u, 720u, 6u, 0u, 0u}},
    {1u, {true, 1416u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {49u, 1u, 15u, 1416u, 1173u,
     11u, 0u, 1000u, 2u, 720u, 6u, 0u, 0u}},
    {1u, {true, 1373u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {50u, 1u, 15u, 1373u, 1416u,
     0u, 0u, 1000u, 4u, 720u, 6u, 0u, 0u}},
    {8u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 7u, 1373u, 1416u,
     8u, 0u, 1000u, 0u, 720u, 0u, 0u, 2u}},
    {1u, {false, 1499u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 8u, 1499u, 1373u,
     9u, 0u, 1000u, 0u, 720u, 0u, 0u, 3u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 9u, 1499u, 1373u, 10u,
     0u, 1000u, 0u, 720u, 0u, 0u, 4u}},
    {49u, {false, 1608u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {49u, 3u, 15u, 1608u, 1608u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 53u}},
    {13u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 12u, 1608u, 1608u,
     0u, 0u, 0u, 0u, 720u, 0u, 0u, 66u}},
    {3u, {false, 1373u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1373u, 1373u,
     3u, 0u, 0u, 0u, 720u, 0u, 0u, 69u}},
    {1u, {false, 1335u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {50u, 1u, 15u, 1335u, 1373u,
     4u, 0u, 0u, 0u, 720u, 0u, 0u, 70u}},
    {6u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1335u, 1373u, 10u,
     0u, 0u, 0u, 720u, 0u, 0u, 76u}},
    {5u, {false, 1390u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {5u, 1u, 0u, 1390u, 1390u,
     3u, 7524u, 754u, 0u, 720u, 0u, 0u, 81u}},
    {2u, {false, 1444u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {7u, 1u, 2u, 1444u, 1444u,
     5u, 7524u, 754u, 0u, 720u, 0u, 0u, 83u}},
    {2u, {false, 1173u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {9u, 1u, 4u, 1173u, 1173u,
     7u, 7524u, 754u, 0u, 720u, 0u, 0u, 85u}},
    {1u, {false, 1754u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 0u, 1173u, 1173u,
     8u, 7524u, 754u, 0u, 720u, 0u, 0u, 86u}},
    {1u, {false, 1416u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 1u, 1416u, 1173u,
     9u, 7524u, 754u, 0u, 720u, 0u, 0u, 87u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 2u, 1416u, 1173u, 10u,
     7524u, 754u, 0u, 720u, 0u, 0u, 88u}},
    {2u, {false, 3u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 4u, 1416u, 1173u, 0u,
     7524u, 0u, 0u, 720u, 0u, 0u, 90u}},
    {1u, {false, 1171u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 5u, 1416u, 1173u,
     1u, 7524u, 0u, 0u, 720u, 0u, 0u, 91u}},
    {1u, {false, 1499u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {1u, 2u, 6u, 1499u, 1416u,
     2u, 7524u, 0u, 0u, 720u, 0u, 0u, 92u}},
    {1u, {false, 0u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {0u, 2u, 7u, 1499u, 1416u, 3u,
     7524u, 0u, 0u, 720u, 0u, 0u, 93u}},
    {2u, {false, 1608u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {2u, 2u, 9u, 1608u, 1608u,
     5u, 7524u, 0u, 0u, 720u, 0u, 0u, 95u}},
    {24u, {false, 1608u}, {0u, false, true, 1u}, {0u, false, true, 1u}, {26u, 3u, 15u, 1608u, 1608u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 119u}},
    {23u, {false, 1608u}, {0u, false, false, 1u}, {0u, false, false, 1u}, {49u, 3u, 15u, 1608u,
     1608u, 11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {13u, {false, 1608u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {50u, 1u, 12u, 1608u,
     1608u, 0u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {3u, {false, 1373u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {50u, 1u, 15u, 1373u,
     1373u, 3u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1335u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {50u, 1u, 15u, 1335u,
     1373u, 4u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {3u, {false, 0u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {0u, 2u, 2u, 1335u, 1373u, 7u,
     0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1373u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {1u, 2u, 3u, 1373u, 1335u,
     8u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {2u, {false, 65535u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {0u, 2u, 5u, 1373u, 1335u,
     10u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {false, 1225u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {1u, 2u, 6u, 1225u, 1373u,
     11u, 0u, 0u, 0u, 720u, 0u, 0u, 120u}},
    {1u, {true, 1225u}, {2u, false, false, 0u}, {2u, false, false, 0u}, {2u, 2u, 7u, 1225u, 1225u,
     0u, 0u, 1000u, 2u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {3u, 2u, 8u, 1225u, 1225u,
     1u, 0u, 1000u, 4u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {4u, 2u, 9u, 1225u, 1225u,
     2u, 0u, 1000u, 6u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {5u, 1u, 0u, 1280u, 1225u,
     3u, 0u, 1000u, 8u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {6u, 1u, 1u, 1280u, 1280u,
     4u, 0u, 1000u, 10u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {7u, 1u, 2u, 1280u, 1280u,
     5u, 0u, 1000u, 12u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {8u, 1u, 3u, 1280u, 1280u,
     6u, 0u, 1000u, 14u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {9u, 1u, 4u, 1280u, 1280u,
     7u, 0u, 1000u, 16u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {10u, 1u, 5u, 1280u,
     1280u, 8u, 0u, 1000u, 18u, 720u, 0u, 0u, 0u}},
    {1u, {true, 1280u}, {20u, true, false, 0u}, {20u, true, false, 0u}, {11u, 1u, 6u, 1280u, 1280u,
     9u, 0u, 1000u, 20u, 720u, 0u, 1u, 0u}},
    {1u, {true, 1280u}, {22u, true, false, 0u}, {22u, true, false, 0u}, {12u, 1u, 7u, 1280u, 1280u,
     10u, 0u, 1000u, 22u, 720u, 1u, 1u, 0u}},
    {1u, {true, 1280u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {13u, 1u, 8u, 1280u, 1280u,
     11u, 0u, 1000u, 24u, 720u, 2u, 1u, 0u}},
    {1u, {true, 1280u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {14u, 1u, 9u, 1280u, 1280u,
     0u, 0u, 1000u, 26u, 720u, 3u, 1u, 0u}},
    {1u, {true, 1280u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {15u, 1u, 10u, 1280u, 1280u,
     1u, 0u, 1000u, 28u, 720u, 4u, 1u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {16u, 1u, 11u, 1280u, 1280u,
     2u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {17u, 1u, 12u, 1280u, 1280u,
     3u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1280u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {18u, 1u, 13u, 1280u, 1280u,
     4u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1280u}, {36u, true, false, 0u}, {36u, true, false, 0u}, {19u, 1u, 14u, 1280u, 1280u,
     5u, 0u, 1000u, 36u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1280u}, {38u, true, false, 0u}, {38u, true, false, 0u}, {20u, 1u, 15u, 1280u, 1280u,
     6u, 0u, 1000u, 38u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1280u}, {40u, true, false, 0u}, {40u, true, false, 0u}, {21u, 1u, 15u, 1280u, 1280u,
     7u, 0u, 1000u, 40u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1280u}, {42u, true, false, 0u}, {42u, true, false, 0u}, {22u, 1u, 15u, 1280u, 1280u,
     8u, 0u, 1000u, 42u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1280u}, {44u, true, false, 0u}, {44u, true, false, 0u}, {23u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 44u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1280u}, {46u, true, false, 0u}, {46u, true, false, 0u}, {24u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 46u, 720u, 13u, 1u, 0u}},
    {1u, {true, 1280u}, {48u, true, false, 0u}, {48u, true, false, 0u}, {25u, 1u, 15u, 1280u, 1280u,
     11u, 0u, 1000u, 48u, 720u, 14u, 1u, 0u}},
    {1u, {false, 1280u}, {0u, false, false, 0u}, {0u, false, false, 0u}, {26u, 1u, 15u, 1280u,
     1280u, 0u, 0u, 1000u, 0u, 720u, 15u, 0u, 0u}},
    {5u, {false, 1280u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {31u, 1u, 15u, 1280u, 1280u,
     5u, 0u, 1000u, 0u, 720u, 11u, 2u, 0u}},
    {1u, {false, 1281u}, {0u, false, true, 0u}, {0u, false, true, 0u}, {32u, 1u, 15u, 1281u, 1280u,
     6u, 0u, 1000u, 0u, 720u, 10u, 2u, 0u}},
    {1u, {true, 1499u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {33u, 1u, 15u, 1499u, 1281u,
     7u, 0u, 1000u, 2u, 720u, 9u, 2u, 0u}},
    {1u, {true, 1280u}, {4u, false, true, 0u}, {4u, false, true, 0u}, {34u, 1u, 15u, 1280u, 1499u,
     8u, 0u, 1000u, 4u, 720u, 8u, 2u, 0u}},
    {1u, {true, 1280u}, {6u, false, true, 0u}, {6u, false, true, 0u}, {35u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 6u, 720u, 7u, 2u, 0u}},
    {1u, {true, 1372u}, {8u, false, true, 0u}, {8u, false, true, 0u}, {36u, 1u, 15u, 1372u, 1280u,
     10u, 0u, 1000u, 8u, 720u, 6u, 2u, 0u}},
    {1u, {true, 1372u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {37u, 1u, 15u, 1372u,
     1372u, 11u, 0u, 1000u, 10u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {38u, 1u, 15u, 1372u,
     1372u, 0u, 0u, 1000u, 12u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {39u, 1u, 15u, 1372u,
     1372u, 1u, 0u, 1000u, 14u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {40u, 1u, 15u, 1372u,
     1372u, 2u, 0u, 1000u, 16u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {41u, 1u, 15u, 1372u,
     1372u, 3u, 0u, 1000u, 18u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1372u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {42u, 1u, 15u, 1372u,
     1372u, 4u, 0u, 1000u, 20u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1280u}, {22u, false, false, 0u}, {22u, false, false, 0u}, {43u, 1u, 15u, 1280u,
     1372u, 5u, 0u, 1000u, 22u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1280u}, {24u, false, false, 0u}, {24u, false, false, 0u}, {44u, 1u, 15u, 1280u,
     1280u, 6u, 0u, 1000u, 24u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1280u}, {26u, false, false, 0u}, {26u, false, false, 0u}, {45u, 1u, 15u, 1280u,
     1280u, 7u, 0u, 1000u, 26u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1280u}, {28u, false, false, 0u}, {28u, false, false, 0u}, {46u, 1u, 15u, 1280u,
     1280u, 8u, 0u, 1000u, 28u, 720u, 5u, 0u, 0u}},
    {1u, {true, 1280u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {47u, 1u, 15u, 1280u, 1280u,
     9u, 0u, 1000u, 30u, 720u, 5u, 1u, 0u}},
    {1u, {true, 1280u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {48u, 1u, 15u, 1280u, 1280u,
     10u, 0u, 1000u, 32u, 720u, 6u, 1u, 0u}},
    {1u, {true, 1554u}, {34u, true, false, 0u}, {34u, true, false, 0u}, {49u, 1u, 15u, 1554u, 1280u,
     11u, 0u, 1000u, 34u, 720u, 7u, 1u, 0u}},
    {1u, {true, 1554u}, {32u, true, false, 0u}, {32u, true, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     0u, 0u, 0u, 32u, 720u, 8u, 1u, 0u}},
    {1u, {true, 1554u}, {30u, true, false, 0u}, {30u, true, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     1u, 0u, 0u, 30u, 720u, 9u, 1u, 0u}},
    {1u, {true, 1554u}, {28u, true, false, 0u}, {28u, true, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     2u, 0u, 0u, 28u, 720u, 10u, 1u, 0u}},
    {1u, {true, 1554u}, {26u, true, false, 0u}, {26u, true, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     3u, 0u, 0u, 26u, 720u, 11u, 1u, 0u}},
    {1u, {true, 1554u}, {24u, true, false, 0u}, {24u, true, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     4u, 0u, 0u, 24u, 720u, 12u, 1u, 0u}},
    {1u, {true, 1554u}, {22u, false, false, 0u}, {22u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 5u, 0u, 0u, 22u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {20u, false, false, 0u}, {20u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 6u, 0u, 0u, 20u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {18u, false, false, 0u}, {18u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 7u, 0u, 0u, 18u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {16u, false, false, 0u}, {16u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 8u, 0u, 0u, 16u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {14u, false, false, 0u}, {14u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 9u, 0u, 0u, 14u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {12u, false, false, 0u}, {12u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 10u, 0u, 0u, 12u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {10u, false, false, 0u}, {10u, false, false, 0u}, {50u, 1u, 15u, 1554u,
     1554u, 11u, 0u, 0u, 10u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1554u}, {8u, false, false, 0u}, {8u, false, false, 0u}, {50u, 1u, 15u, 1554u, 1554u,
     0u, 0u, 0u, 8u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1225u}, {6u, false, false, 0u}, {6u, false, false, 0u}, {50u, 1u, 15u, 1225u, 1554u,
     1u, 0u, 0u, 6u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1225u}, {4u, false, false, 0u}, {4u, false, false, 0u}, {50u, 1u, 15u, 1225u, 1225u,
     2u, 0u, 0u, 4u, 720u, 13u, 0u, 0u}},
    {1u, {true, 1213u}, {2u, false, true, 0u}, {2u, false, true, 0u}, {50u, 1u, 15u, 1213u, 1225u,
     3u, 0u, 0u, 2u, 720u, 13u, 2u, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct floor2_remembered record;
};

static const struct vector vectors[] = {
    {0u, 18u, false, {0u}},
    {18u, 29u, false, {0u}},
    {29u, 30u, false, {0u}},
    {30u, 43u, false, {0u}},
    {43u, 459u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct floor2 m;
    struct floor2_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    floor2_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            floor2_step(&m, &rows[i].in, &out);
            compare_out(&out, ((n & 1u) == 0u) ? &rows[i].out : &rows[i].even);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct floor2 fresh =
    {0u, 0u, 0u, 0u, 0u, 11u, 0u, 0u, 0u, 0u, 0u, 0u, 0u};

static void start_and_compare(const char *what, const struct floor2_remembered *r,
                              const struct floor2 *wanted)
{
    struct floor2 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    floor2_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct floor2 m;
    struct floor2_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", floor2_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", floor2_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct floor2 m;
    struct floor2_in in;
    struct floor2_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct floor2 after =
           {0u, 3u, 0u, 0u, 0u, 11u, 0u, 0u, 0u, 1u, 0u, 0u, 1u};
        static const struct floor2_out wanted =
           {0u, false, true, 1u};

        doing = "flow_probe_state upset";
        floor2_start(&m, NULL);
        m.flow_probe_state = 4u;
        floor2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct floor2 after =
           {0u, 3u, 0u, 0u, 0u, 11u, 0u, 0u, 0u, 1u, 0u, 0u, 1u};
        static const struct floor2_out wanted =
           {0u, false, true, 1u};

        doing = "flow_probe_state upset";
        floor2_start(&m, NULL);
        m.flow_probe_state = 255u;
        floor2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct floor2 after =
           {0u, 0u, 1u, 0u, 0u, 11u, 0u, 0u, 0u, 1u, 0u, 0u, 1u};
        static const struct floor2_out wanted =
           {0u, false, true, 0u};

        doing = "mixer_move upset";
        floor2_start(&m, NULL);
        m.mixer_move = 3u;
        floor2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct floor2 after =
           {0u, 0u, 1u, 0u, 0u, 11u, 0u, 0u, 0u, 1u, 0u, 0u, 1u};
        static const struct floor2_out wanted =
           {0u, false, true, 0u};

        doing = "mixer_move upset";
        floor2_start(&m, NULL);
        m.mixer_move = 255u;
        floor2_step(&m, &in, &out);
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
