/* shop6_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Air unit, shop 6
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 32f7d1ef79301c6ede0455790c8aceb65249c467c20e6eea1a29094717386ee2
 *
 * Replaces:
 * - stage_one: sequence control, first contact
 * - stage_two: sequence control, second contact
 * - cool_stage: sequence control, third contact
 *
 * Stays hard-wired, and must:
 * - duct_limit: capillary limit across the duct heater, manual reset
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
 * Open findings: 1 restarts_by_itself (act, cooling); 2 restarts_by_itself (act, supply_fan); 3
 * safe_on_but_rests_off (act, supply_fan); 4 proving_switch_not_checked_open (act, occupied); 5
 * welded_output (act, cooling); 6 welded_output (act, supply_fan); 7 earth_fault_bypasses_limit
 * (act, shop6); 8 moisture_direction (act, room_probe); 9 contact_life (act, heat_one); 10
 * mercury_asbestos_refrigerant (act, cool_stage); 11 mercury_asbestos_refrigerant (act, stage_one);
 * 12 mercury_asbestos_refrigerant (act, stage_two); 13 approval_lapses (act, shop6); 14
 * load_effect_unknown (act, supply_fan); 15 output_doubtful (act, supply_fan). Not judged, for want
 * of a figure: 3; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "shop6.h"

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

static void compare_out(const struct shop6_out *got, const struct shop6_out *wanted)
{
    compare("heat_one", (long)got->heat_one, (long)wanted->heat_one);
    compare("heat_two", (long)got->heat_two, (long)wanted->heat_two);
    compare("cooling", (long)got->cooling, (long)wanted->cooling);
    compare("supply_fan", (long)got->supply_fan, (long)wanted->supply_fan);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct shop6 *got, const struct shop6 *wanted)
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
    compare("stage_one", (long)got->stage_one, (long)wanted->stage_one);
    compare("stage_two", (long)got->stage_two, (long)wanted->stage_two);
    compare("cool_stage", (long)got->cool_stage, (long)wanted->cool_stage);
    compare("heat_one", (long)got->heat_one, (long)wanted->heat_one);
    compare("heat_one_for", (long)got->heat_one_for, (long)wanted->heat_one_for);
    compare("heat_one_airflow_seen_off",
            (long)got->heat_one_airflow_seen_off,
            (long)wanted->heat_one_airflow_seen_off);
    compare("heat_one_apart_for", (long)got->heat_one_apart_for, (long)wanted->heat_one_apart_for);
    compare("heat_one_welded", (long)got->heat_one_welded, (long)wanted->heat_one_welded);
    compare("heat_one_effect_from",
            (long)got->heat_one_effect_from,
            (long)wanted->heat_one_effect_from);
    compare("heat_one_effect_for",
            (long)got->heat_one_effect_for,
            (long)wanted->heat_one_effect_for);
    compare("heat_one_no_effect", (long)got->heat_one_no_effect, (long)wanted->heat_one_no_effect);
    compare("second_waits", (long)got->second_waits, (long)wanted->second_waits);
    compare("second_waits_for", (long)got->second_waits_for, (long)wanted->second_waits_for);
    compare("run_on", (long)got->run_on, (long)wanted->run_on);
    compare("run_on_for", (long)got->run_on_for, (long)wanted->run_on_for);
    compare("heat_two", (long)got->heat_two, (long)wanted->heat_two);
    compare("heat_two_airflow_seen_off",
            (long)got->heat_two_airflow_seen_off,
            (long)wanted->heat_two_airflow_seen_off);
    compare("heat_two_apart_for", (long)got->heat_two_apart_for, (long)wanted->heat_two_apart_for);
    compare("heat_two_welded", (long)got->heat_two_welded, (long)wanted->heat_two_welded);
    compare("cooling", (long)got->cooling, (long)wanted->cooling);
    compare("cooling_for", (long)got->cooling_for, (long)wanted->cooling_for);
    compare("cooling_airflow_seen_off",
            (long)got->cooling_airflow_seen_off,
            (long)wanted->cooling_airflow_seen_off);
    compare("supply_fan", (long)got->supply_fan, (long)wanted->supply_fan);
    compare("supply_fan_airflow_seen_off",
            (long)got->supply_fan_airflow_seen_off,
            (long)wanted->supply_fan_airflow_seen_off);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct shop6_in in;
    struct shop6_out out;
    struct shop6 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2249u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2249u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {3u, 0u, 3u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2249u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 4u, true, 0u, false, 2249u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 5u, true, 0u, false, 2249u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    {7u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {12u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 12u, true, 0u, false, 2249u, 0u, false, 1u, 12u, 1u, 12u, 0u, true, 0u,
     false, 0u, 12u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {13u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 13u, true, 0u, false, 2249u, 0u, false, 1u, 13u, 1u, 13u, 0u, true, 0u,
     false, 0u, 13u, true, 1u, true}},
    {7u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 20u, true, 0u, false, 2249u, 0u, false, 1u, 20u, 1u, 20u, 0u, true, 0u,
     false, 0u, 20u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 21u, true, 0u, false, 2249u, 0u, false, 1u, 21u, 1u, 21u, 0u, true, 0u,
     false, 0u, 21u, true, 1u, true}},
    {99u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 120u, 1u, 120u, 0u, true,
     0u, false, 0u, 120u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u, true,
     0u, false, 0u, 121u, true, 1u, true}},
    {238u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 359u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 360u, 0u, 0u, 0u, true, 0u,
     false, 0u, 360u, true, 0u, true}},
    /* vector 2 */
    {1u, {true, false, 2249u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2249u,
     0u, 0u, 0u, 0u, 0u, 1u, false, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, false, 0u, false,
     0u, 1u, false, 1u, false}},
    {359u, {false, true, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 360u, 0u, 0u, 0u, true, 0u,
     false, 0u, 360u, true, 1u, true}},
    {1u, {false, false, 0u, false, false}, {false, false, false, true, 0u}, {0u, 2u, 0u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 361u, 0u, 1u, 0u, true, 0u,
     false, 0u, 361u, true, 1u, true}},
    /* vector 3 */
    {7u, {false, false, 0u, false, false}, {false, false, false, true, 0u}, {0u, 0u, 7u, 0u, 0u, 0u,
     0u, 0u, 0u, 7u, true, 0u, false, 0u, 0u, false, 1u, 7u, 1u, 7u, 0u, true, 0u, false, 0u, 7u,
     true, 1u, true}},
    {1u, {false, false, 0u, false, false}, {false, false, false, true, 1u}, {0u, 3u, 0u, 0u, 0u, 0u,
     0u, 0u, 0u, 8u, true, 0u, false, 0u, 0u, false, 1u, 8u, 1u, 8u, 0u, true, 0u, false, 0u, 8u,
     true, 1u, true}},
    {1u, {false, false, 0u, false, false}, {false, false, false, true, 1u}, {0u, 3u, 1u, 0u, 0u, 0u,
     0u, 0u, 0u, 9u, true, 0u, false, 0u, 0u, false, 1u, 9u, 1u, 9u, 0u, true, 0u, false, 0u, 9u,
     true, 1u, true}},
    {1u, {false, false, 739u, false, false}, {false, false, false, true, 1u}, {0u, 3u, 2u, 0u, 0u,
     0u, 0u, 0u, 0u, 10u, true, 0u, false, 0u, 0u, false, 1u, 10u, 1u, 10u, 0u, true, 0u, false, 0u,
     10u, true, 1u, true}},
    {1u, {false, false, 740u, false, false}, {false, false, false, true, 1u}, {1u, 3u, 3u, 740u, 0u,
     0u, 0u, 0u, 0u, 11u, true, 0u, false, 0u, 0u, false, 1u, 11u, 1u, 11u, 0u, true, 0u, false, 0u,
     11u, true, 1u, true}},
    /* vector 4 */
    {4u, {false, false, 740u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 740u,
     740u, 0u, 0u, 1u, 0u, 4u, true, 0u, false, 740u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 740u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 740u,
     740u, 0u, 0u, 1u, 0u, 5u, true, 0u, false, 740u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    /* vector 5 */
    {4u, {false, false, 2087u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2087u,
     2087u, 0u, 0u, 1u, 0u, 4u, true, 0u, false, 2087u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    /* vector 6 */
    {4u, {false, false, 2088u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2088u,
     2088u, 0u, 0u, 0u, 0u, 4u, true, 0u, false, 2088u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {2u, {false, false, 2289u, false, false}, {false, false, false, true, 0u}, {6u, 1u, 2u, 2289u,
     2289u, 0u, 0u, 0u, 0u, 6u, true, 0u, false, 2289u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    /* vector 7 */
    {2u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     2290u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {2u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2290u,
     2290u, 1u, 0u, 0u, 0u, 4u, true, 0u, false, 2290u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2290u,
     2290u, 1u, 0u, 0u, 0u, 5u, true, 0u, false, 2290u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    /* vector 8 */
    {4u, {false, false, 2291u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2291u,
     2291u, 1u, 0u, 0u, 0u, 4u, true, 0u, false, 2291u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {2u, {false, false, 2350u, false, false}, {false, false, false, true, 0u}, {6u, 1u, 2u, 2350u,
     2350u, 1u, 0u, 0u, 0u, 6u, true, 0u, false, 2350u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    /* vector 9 */
    {2u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2351u,
     2351u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2351u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {2u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 4u, true, 0u, false, 2351u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 5u, true, 0u, false, 2351u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    /* vector 10 */
    {4u, {false, false, 2352u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 4u, true, 0u, false, 2352u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 3814u,
     2352u, 1u, 1u, 0u, 0u, 5u, true, 0u, false, 2352u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    {1u, {false, false, 3815u, false, false}, {false, false, false, true, 0u}, {0u, 2u, 0u, 3814u,
     2352u, 1u, 1u, 0u, 0u, 6u, true, 0u, false, 3814u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    {1u, {false, false, 2249u, true, false}, {false, false, false, true, 0u}, {1u, 2u, 1u, 2249u,
     3814u, 1u, 1u, 0u, 0u, 7u, true, 1u, false, 2352u, 0u, false, 1u, 7u, 1u, 7u, 0u, true, 0u,
     false, 0u, 7u, true, 1u, true}},
    /* vector 11 */
    {1u, {false, false, 2249u, true, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2249u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 1u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2249u, true, false}, {false, false, false, true, 2u}, {2u, 0u, 2u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 2u, true, 2u, true, 2249u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {1u, {false, false, 2249u, true, false}, {false, false, false, true, 2u}, {3u, 0u, 3u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 3u, true, 2u, true, 2249u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2249u, false, true}, {false, false, false, true, 2u}, {4u, 1u, 0u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 4u, true, 0u, true, 2249u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 1u,
     false, 0u, 4u, true, 1u, true}},
    /* vector 12 */
    {1u, {false, false, 2249u, false, true}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2249u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 1u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2249u, false, true}, {false, false, false, true, 16u}, {2u, 0u, 2u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2249u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 2u,
     true, 0u, 2u, true, 1u, true}},
    {1u, {false, false, 2249u, false, true}, {false, false, false, true, 16u}, {3u, 0u, 3u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2249u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 2u,
     true, 0u, 3u, true, 1u, true}},
    {356u, {false, false, 2350u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     2350u, 2350u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2350u, 0u, false, 1u, 359u, 1u, 359u, 0u,
     true, 0u, true, 0u, 359u, true, 1u, true}},
    {2u, {false, false, 2350u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2350u, 2350u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2350u, 0u, false, 1u, 361u, 0u, 1u, 0u,
     true, 0u, true, 0u, 361u, true, 0u, true}},
    {2u, {false, false, 2329u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2329u, 2329u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2329u, 0u, false, 1u, 363u, 0u, 3u, 0u,
     true, 0u, true, 0u, 363u, true, 0u, true}},
    {1u, {true, true, 0u, false, false}, {false, false, false, true, 16u}, {0u, 2u, 0u, 2329u,
     2329u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2329u, 0u, false, 1u, 364u, 0u, 4u, 0u, true, 0u,
     true, 0u, 364u, true, 1u, true}},
    {1u, {true, true, 0u, false, false}, {false, false, false, true, 16u}, {0u, 2u, 1u, 2329u,
     2329u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2329u, 0u, false, 1u, 365u, 0u, 5u, 0u, true, 0u,
     true, 0u, 365u, true, 1u, false}},
    {1u, {false, false, 2148u, false, true}, {false, false, false, true, 16u}, {1u, 2u, 2u, 2148u,
     2329u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2329u, 0u, false, 1u, 366u, 0u, 6u, 0u, true, 1u,
     true, 0u, 366u, true, 1u, true}},
    {1u, {false, false, 2249u, false, true}, {false, false, false, true, 16u}, {2u, 2u, 3u, 2249u,
     2148u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 367u, 0u, 7u, 0u, true, 2u,
     true, 0u, 367u, true, 1u, true}},
    {1u, {false, false, 2287u, false, false}, {false, false, false, true, 17u}, {3u, 3u, 0u, 2287u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 368u, 0u, 8u, 0u, true, 0u,
     true, 0u, 368u, true, 1u, true}},
    {16u, {false, false, 2287u, false, false}, {false, false, false, true, 17u}, {19u, 3u, 8u,
     2287u, 2287u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2287u, 0u, false, 1u, 384u, 0u, 24u, 0u,
     true, 0u, true, 0u, 384u, true, 1u, true}},
    {1u, {false, false, 2287u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 0u,
     2287u, 2287u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2287u, 0u, false, 1u, 385u, 0u, 25u, 0u,
     true, 0u, true, 0u, 385u, true, 0u, true}},
    {46u, {false, false, 2287u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2287u, 2287u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2287u, 0u, false, 1u, 431u, 0u, 71u, 0u,
     true, 0u, true, 0u, 431u, true, 0u, true}},
    {2u, {false, false, 2087u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2087u, 2087u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 433u, 0u, 73u, 0u,
     true, 0u, true, 0u, 433u, true, 0u, true}},
    {2u, {false, false, 2351u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2351u, 2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 435u, 0u, 75u, 0u,
     true, 0u, true, 0u, 435u, true, 0u, true}},
    {2u, {false, false, 2087u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2087u, 2087u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 437u, 0u, 77u, 0u,
     true, 0u, true, 0u, 437u, true, 0u, true}},
    {1u, {false, false, 2065u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2065u, 2087u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 438u, 0u, 78u, 0u,
     true, 0u, true, 0u, 438u, true, 0u, true}},
    {1u, {false, false, 2291u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2291u, 2065u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 439u, 0u, 79u, 0u,
     true, 0u, true, 0u, 439u, true, 0u, true}},
    {1u, {false, false, 3815u, false, false}, {false, false, false, false, 16u}, {0u, 2u, 0u, 2291u,
     2065u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 440u, 0u, 80u, 0u, true,
     0u, true, 0u, 440u, true, 0u, true}},
    {1u, {false, false, 2087u, false, false}, {false, false, false, false, 16u}, {1u, 2u, 1u, 2087u,
     2291u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 441u, 0u, 81u, 0u, true,
     0u, true, 0u, 441u, true, 0u, true}},
    {2u, {false, false, 2087u, false, false}, {false, false, false, false, 16u}, {3u, 2u, 3u, 2087u,
     2087u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 443u, 0u, 83u, 0u, true,
     0u, true, 0u, 443u, true, 0u, true}},
    {1u, {false, false, 2288u, false, false}, {false, false, false, false, 16u}, {4u, 1u, 0u, 2288u,
     2087u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 2087u, 0u, false, 1u, 444u, 0u, 84u, 0u, true,
     0u, true, 0u, 444u, true, 0u, true}},
    {1u, {false, false, 2148u, false, false}, {false, false, false, false, 16u}, {5u, 1u, 1u, 2148u,
     2288u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2148u, 0u, false, 1u, 445u, 0u, 85u, 0u, true,
     0u, true, 0u, 445u, true, 0u, true}},
    {34u, {false, false, 2249u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 479u, 0u, 119u, 0u,
     true, 0u, true, 0u, 479u, true, 0u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 2u, 0u, 0u, 120u, 0u, true, 1u,
     true, 0u, 480u, true, 0u, true}},
    {1u, {true, false, 2230u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 0u, 0u, 0u, 121u, 0u, true, 2u,
     true, 0u, 481u, true, 0u, true}},
    {1u, {true, false, 2247u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2247u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 0u, 1u, 0u, 122u, 0u, true, 2u,
     true, 0u, 482u, true, 0u, true}},
    {1u, {true, true, 740u, true, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 740u,
     2247u, 0u, 0u, 0u, 0u, 120u, true, 1u, false, 2230u, 0u, false, 0u, 2u, 0u, 123u, 0u, true, 0u,
     true, 0u, 483u, true, 1u, true}},
    {1u, {true, true, 740u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 740u, 0u, false, 0u, 3u, 0u, 124u, 0u, true, 0u,
     true, 0u, 484u, true, 1u, false}},
    {1u, {false, false, 65535u, false, false}, {false, false, false, true, 18u}, {0u, 2u, 0u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 4u, 0u, 125u, 0u, true, 0u,
     true, 0u, 485u, true, 1u, true}},
    /* vector 13 */
    {119u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2351u, 2351u, 1u, 1u, 0u, 0u, 119u, true, 0u, false, 2351u, 0u, false, 1u, 119u, 1u, 119u, 0u,
     true, 0u, false, 0u, 119u, true, 1u, true}},
    {1u, {false, false, 2351u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 120u, 1u, 120u, 0u, true,
     1u, false, 0u, 120u, true, 1u, true}},
    {2u, {false, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     2u, true, 0u, 122u, true, 1u, true}},
    {1u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 123u, 1u, 123u, 0u, true,
     2u, true, 0u, 123u, true, 1u, false}},
    {1u, {true, false, 2331u, true, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2331u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 1u, false, 2351u, 0u, false, 1u, 124u, 1u, 124u, 0u, true,
     0u, true, 0u, 124u, true, 1u, false}},
    {235u, {true, false, 2331u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2331u,
     2331u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 2331u, 0u, false, 1u, 359u, 1u, 359u, 0u, true,
     0u, true, 0u, 359u, true, 1u, false}},
    {2u, {true, false, 2331u, true, false}, {false, false, false, false, 18u}, {20u, 1u, 8u, 2331u,
     2331u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 2331u, 0u, false, 1u, 361u, 0u, 1u, 0u, true, 0u,
     true, 0u, 361u, true, 0u, false}},
    {8u, {false, false, 740u, false, false}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 1u, 369u, 0u, 9u, 0u, true, 0u,
     true, 0u, 369u, true, 0u, true}},
    {4u, {false, false, 65535u, false, false}, {false, false, false, false, 18u}, {0u, 2u, 3u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 1u, 373u, 0u, 13u, 0u, true, 0u,
     true, 0u, 373u, true, 0u, true}},
    {1u, {false, false, 65535u, false, false}, {false, false, false, true, 19u}, {0u, 3u, 0u, 740u,
     740u, 0u, 0u, 0u, 0u, 120u, true, 0u, true, 740u, 0u, false, 1u, 374u, 0u, 14u, 0u, true, 0u,
     true, 0u, 374u, true, 1u, true}},
    {19u, {false, false, 2352u, false, false}, {false, false, false, true, 19u}, {19u, 3u, 8u,
     2352u, 2352u, 0u, 0u, 0u, 0u, 120u, true, 0u, true, 2352u, 0u, false, 1u, 393u, 0u, 33u, 0u,
     true, 0u, true, 0u, 393u, true, 1u, true}},
    {45u, {false, false, 2352u, false, false}, {false, false, false, false, 18u}, {20u, 1u, 8u,
     2352u, 2352u, 1u, 1u, 0u, 0u, 120u, true, 0u, true, 2352u, 0u, false, 1u, 438u, 0u, 78u, 0u,
     true, 0u, true, 0u, 438u, true, 0u, true}},
    {3u, {false, false, 739u, false, false}, {false, false, false, false, 18u}, {0u, 2u, 2u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 120u, true, 0u, true, 2352u, 0u, false, 1u, 441u, 0u, 81u, 0u, true, 0u,
     true, 0u, 441u, true, 0u, true}},
    {1u, {false, true, 739u, false, true}, {false, false, false, true, 18u}, {0u, 2u, 3u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 120u, true, 0u, true, 2352u, 0u, false, 1u, 442u, 0u, 82u, 0u, true, 1u,
     true, 0u, 442u, true, 1u, true}},
    {1u, {false, true, 739u, false, true}, {false, false, false, true, 19u}, {0u, 3u, 0u, 2352u,
     2352u, 0u, 0u, 0u, 0u, 120u, true, 0u, true, 2352u, 0u, false, 1u, 443u, 0u, 83u, 0u, true, 2u,
     true, 0u, 443u, true, 1u, true}},
    /* vector 14 */
    {1u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2351u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {2u, {false, false, 2373u, false, false}, {false, false, false, true, 0u}, {3u, 0u, 3u, 2373u,
     2373u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2373u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2353u,
     2373u, 1u, 1u, 0u, 0u, 4u, true, 0u, false, 2373u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 2374u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2374u,
     2353u, 1u, 1u, 0u, 0u, 5u, true, 0u, false, 2373u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, true, 0u}, {6u, 1u, 2u, 2353u,
     2374u, 1u, 1u, 0u, 0u, 6u, true, 0u, false, 2353u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {7u, 1u, 3u, 3814u,
     2353u, 1u, 1u, 0u, 0u, 7u, true, 0u, false, 2374u, 0u, false, 1u, 7u, 1u, 7u, 0u, true, 0u,
     false, 0u, 7u, true, 1u, true}},
    {114u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2290u, 2290u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2290u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {2u, {false, false, 2291u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 123u, 1u, 123u, 0u, true,
     0u, false, 0u, 123u, true, 1u, true}},
    {1u, {false, false, 2292u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2292u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 124u, 1u, 124u, 0u, true,
     0u, false, 0u, 124u, true, 1u, true}},
    {1u, {false, true, 2292u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2292u,
     2292u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2292u, 0u, false, 1u, 125u, 1u, 125u, 0u, true,
     0u, false, 0u, 125u, true, 1u, true}},
    {1u, {false, false, 2289u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2289u,
     2292u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2292u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     0u, false, 0u, 126u, true, 1u, true}},
    {1u, {false, false, 3815u, false, false}, {false, false, false, true, 0u}, {0u, 2u, 0u, 2289u,
     2292u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2289u, 0u, false, 1u, 127u, 1u, 127u, 0u, true,
     0u, false, 0u, 127u, true, 1u, true}},
    {232u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2351u, 2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 359u, true, 1u, true}},
    {128u, {false, false, 2351u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     2351u, 2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 0u, 6u, 0u, 127u, 0u,
     true, 0u, false, 0u, 487u, true, 0u, true}},
    {2u, {false, false, 2373u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2373u,
     2373u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 0u, 8u, 0u, 129u, 0u, true, 0u,
     false, 0u, 489u, true, 0u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2353u,
     2373u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 0u, 9u, 0u, 130u, 0u, true, 0u,
     false, 0u, 490u, true, 0u, true}},
    {1u, {false, false, 2374u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2374u,
     2353u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 0u, 10u, 0u, 131u, 0u, true,
     0u, false, 0u, 491u, true, 0u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2353u,
     2374u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2353u, 0u, false, 0u, 11u, 0u, 132u, 0u, true,
     0u, false, 0u, 492u, true, 0u, true}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 3814u,
     2353u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2374u, 0u, false, 0u, 12u, 0u, 133u, 0u, true,
     0u, false, 0u, 493u, true, 0u, true}},
    {107u, {false, false, 2290u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     2290u, 2290u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2290u, 0u, false, 0u, 119u, 0u, 240u, 0u,
     true, 0u, false, 0u, 600u, true, 0u, true}},
    {1u, {false, false, 740u, true, true}, {false, false, false, false, 0u}, {20u, 1u, 8u, 740u,
     2290u, 1u, 1u, 0u, 0u, 120u, true, 1u, false, 2290u, 0u, false, 0u, 120u, 0u, 241u, 0u, true,
     1u, false, 0u, 600u, true, 0u, true}},
    {119u, {false, false, 740u, true, true}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 740u, 0u, false, 0u, 239u, 0u, 360u, 0u, true, 2u,
     true, 0u, 600u, true, 0u, true}},
    {1u, {false, false, 740u, true, true}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 740u, 0u, false, 0u, 240u, 0u, 360u, 0u, true, 2u,
     true, 0u, 600u, true, 0u, true}},
    {240u, {false, false, 740u, true, true}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 2u,
     true, 0u, 600u, true, 0u, true}},
    {1u, {false, false, 740u, true, true}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 2u,
     true, 0u, 600u, true, 0u, true}},
    /* vector 15 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     1u, false, 0u, 122u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     2u, true, 0u, 126u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 130u, 1u, 130u, 0u, true,
     2u, true, 0u, 130u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 0u, true, 0u, false, 2351u, 0u, false, 1u, 131u, 2u, 0u, 0u, true, 0u,
     true, 0u, 131u, true, 1u, false}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 3814u,
     2351u, 1u, 1u, 0u, 0u, 0u, true, 1u, false, 2351u, 1u, false, 1u, 132u, 1u, 0u, 0u, true, 0u,
     true, 0u, 132u, true, 1u, true}},
    {358u, {false, false, 3814u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     3814u, 3814u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3814u, 0u, false, 0u, 9u, 1u, 358u, 0u,
     true, 0u, true, 0u, 490u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2290u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3814u, 0u, false, 0u, 10u, 1u, 359u, 0u, true,
     0u, true, 0u, 491u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2249u, 2290u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2290u, 0u, false, 0u, 11u, 0u, 0u, 0u,
     true, 0u, true, 0u, 492u, true, 0u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2230u,
     2249u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 0u, 12u, 0u, 1u, 0u, true, 1u,
     true, 0u, 493u, true, 0u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 0u, 16u, 0u, 5u, 0u, true, 2u,
     true, 0u, 497u, true, 0u, true}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 0u, 20u, 0u, 9u, 0u, true, 2u,
     true, 0u, 501u, true, 0u, true}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 0u, true, 0u, false, 2351u, 0u, false, 1u, 0u, 2u, 0u, 0u, true, 0u,
     true, 0u, 502u, true, 1u, true}},
    {1u, {false, true, 2248u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2248u,
     2351u, 1u, 1u, 0u, 0u, 0u, true, 1u, false, 2351u, 1u, false, 1u, 1u, 1u, 0u, 0u, true, 0u,
     true, 0u, 503u, true, 1u, true}},
    {1u, {false, true, 2248u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2248u,
     2248u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 2248u, 0u, false, 1u, 2u, 1u, 1u, 0u, true, 0u,
     true, 0u, 504u, true, 1u, true}},
    {1u, {false, true, 2248u, true, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2248u,
     2248u, 0u, 0u, 0u, 0u, 2u, true, 1u, false, 2248u, 0u, false, 1u, 3u, 1u, 2u, 0u, true, 0u,
     true, 0u, 505u, true, 1u, true}},
    {108u, {false, true, 2248u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2248u,
     2248u, 0u, 0u, 0u, 0u, 110u, true, 2u, true, 2248u, 0u, false, 1u, 111u, 1u, 110u, 0u, true,
     0u, true, 0u, 600u, true, 1u, true}},
    {1u, {false, true, 740u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 740u,
     2248u, 0u, 0u, 0u, 0u, 111u, true, 2u, true, 2248u, 0u, false, 1u, 112u, 1u, 111u, 0u, true,
     0u, true, 0u, 600u, true, 1u, true}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2086u,
     740u, 0u, 0u, 1u, 0u, 112u, true, 2u, true, 2086u, 0u, false, 1u, 113u, 1u, 112u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, true}},
    {1u, {true, false, 2351u, false, true}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2351u,
     2086u, 0u, 0u, 1u, 0u, 113u, true, 0u, true, 2086u, 0u, false, 1u, 114u, 1u, 113u, 0u, true,
     1u, true, 0u, 600u, true, 1u, false}},
    {3u, {true, false, 2351u, false, true}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 116u, true, 0u, true, 2351u, 0u, false, 1u, 117u, 1u, 116u, 0u, true,
     2u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 117u, true, 0u, true, 2351u, 0u, false, 1u, 118u, 1u, 117u, 0u, true,
     0u, true, 0u, 600u, true, 1u, false}},
    {1u, {false, true, 2248u, false, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2248u,
     2351u, 1u, 1u, 0u, 0u, 118u, true, 0u, true, 2351u, 0u, false, 1u, 119u, 1u, 118u, 0u, true,
     0u, true, 0u, 600u, true, 1u, true}},
    {1u, {false, true, 2288u, false, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2288u,
     2248u, 1u, 0u, 0u, 0u, 119u, true, 0u, true, 2288u, 0u, false, 1u, 120u, 1u, 119u, 0u, true,
     0u, true, 0u, 600u, true, 1u, true}},
    /* vector 16 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     1u, false, 0u, 122u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     2u, true, 0u, 126u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 130u, 1u, 130u, 0u, true,
     2u, true, 0u, 130u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 132u, 2u, 1u, 0u, true, 0u,
     true, 0u, 132u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 2u, false, 2u, false, 2351u, 2u, false, 1u, 133u, 2u, 2u, 0u, true, 0u,
     true, 0u, 133u, true, 1u, false}},
    {1u, {true, false, 2351u, false, false}, {false, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 0u, false, 2u, false, 2351u, 3u, false, 1u, 134u, 1u, 0u, 0u, true, 0u,
     true, 0u, 134u, true, 1u, false}},
    /* vector 17 */
    {359u, {false, false, 740u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 740u, 0u, false, 1u, 359u, 1u, 359u, 0u, true, 0u,
     false, 0u, 359u, true, 1u, true}},
    {1u, {false, false, 65535u, false, false}, {false, false, false, true, 0u}, {0u, 2u, 0u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 740u, 0u, false, 1u, 360u, 0u, 0u, 0u, true, 0u,
     false, 0u, 360u, true, 1u, true}},
    {1u, {false, false, 739u, false, false}, {false, false, false, true, 0u}, {0u, 2u, 1u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, false, 740u, 0u, false, 1u, 361u, 0u, 1u, 0u, true, 0u,
     false, 0u, 361u, true, 1u, true}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 0u}, {1u, 2u, 2u, 2086u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 1u, false, 740u, 0u, false, 1u, 362u, 0u, 2u, 0u, true, 0u,
     false, 0u, 362u, true, 1u, true}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {2u, 2u, 3u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 1u, 363u, 0u, 3u, 0u, true, 0u,
     false, 0u, 363u, true, 1u, true}},
    {17u, {false, true, 2086u, true, false}, {false, false, false, true, 3u}, {19u, 3u, 8u, 2086u,
     2086u, 0u, 0u, 0u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 1u, 380u, 0u, 20u, 0u, true, 0u,
     false, 0u, 380u, true, 1u, true}},
    {104u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 3u, 0u, 124u, 0u, true, 0u,
     false, 0u, 484u, true, 1u, true}},
    {115u, {true, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 118u, 0u, 239u, 0u, true,
     0u, false, 0u, 599u, true, 1u, false}},
    {1u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 119u, 0u, 240u, 0u, true,
     0u, false, 1u, 0u, true, 1u, false}},
    {1u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 120u, 0u, 241u, 0u, true,
     0u, false, 1u, 1u, false, 1u, false}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 121u, 0u, 242u, 0u, true,
     0u, false, 0u, 0u, true, 1u, true}},
    /* vector 18 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     1u, false, 0u, 122u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     2u, true, 0u, 126u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 130u, 1u, 130u, 0u, true,
     2u, true, 0u, 130u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 132u, 2u, 1u, 0u, true, 0u,
     true, 0u, 132u, true, 1u, false}},
    {4u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 5u, false, 2u, false, 2351u, 5u, false, 1u, 136u, 2u, 5u, 0u, true, 0u,
     true, 0u, 136u, true, 1u, false}},
    {1u, {true, true, 3813u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 3813u,
     2351u, 1u, 1u, 0u, 1u, 6u, false, 2u, false, 2351u, 6u, false, 1u, 137u, 2u, 6u, 0u, true, 0u,
     true, 0u, 137u, true, 1u, false}},
    {1u, {false, true, 3813u, false, false}, {false, false, false, true, 20u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 0u, 0u, true, 2u, false, 3813u, 7u, false, 1u, 138u, 1u, 0u, 0u, true, 0u,
     true, 0u, 138u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     2249u, 2249u, 1u, 0u, 0u, 0u, 119u, true, 0u, false, 2249u, 0u, false, 1u, 257u, 1u, 119u, 0u,
     true, 0u, true, 0u, 257u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2249u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 258u, 1u, 120u, 0u, true,
     1u, true, 0u, 258u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 262u, 1u, 124u, 0u, true,
     2u, true, 0u, 262u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 266u, 1u, 128u, 0u, true,
     2u, true, 0u, 266u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 268u, 2u, 1u, 0u, true, 0u,
     true, 0u, 268u, true, 1u, false}},
    {1u, {true, false, 2332u, true, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2332u,
     2351u, 1u, 1u, 0u, 0u, 0u, false, 0u, false, 2351u, 2u, false, 1u, 269u, 1u, 0u, 0u, true, 0u,
     true, 0u, 269u, true, 1u, false}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     2249u, 2249u, 1u, 0u, 0u, 0u, 119u, true, 0u, false, 2249u, 0u, false, 1u, 388u, 1u, 119u, 0u,
     true, 0u, true, 0u, 388u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2249u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 389u, 1u, 120u, 0u, true,
     1u, true, 0u, 389u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 393u, 1u, 124u, 0u, true,
     2u, true, 0u, 393u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 397u, 1u, 128u, 0u, true,
     2u, true, 0u, 397u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 399u, 2u, 1u, 0u, true, 0u,
     true, 0u, 399u, true, 1u, false}},
    {4u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 5u, false, 2u, false, 2351u, 5u, false, 1u, 403u, 2u, 5u, 0u, true, 0u,
     true, 0u, 403u, true, 1u, false}},
    {1u, {true, true, 65535u, false, false}, {true, false, false, true, 20u}, {0u, 2u, 0u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 6u, false, 2u, false, 2351u, 6u, false, 1u, 404u, 2u, 6u, 0u, true, 0u,
     true, 0u, 404u, true, 1u, false}},
    {3u, {true, true, 65535u, false, false}, {true, false, false, true, 20u}, {0u, 2u, 3u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 9u, false, 2u, false, 2351u, 9u, false, 1u, 407u, 2u, 9u, 0u, true, 0u,
     true, 0u, 407u, true, 1u, false}},
    {1u, {true, true, 65535u, false, false}, {false, false, false, true, 21u}, {0u, 3u, 0u, 2351u,
     2351u, 0u, 0u, 0u, 0u, 0u, false, 2u, false, 2351u, 10u, false, 1u, 408u, 1u, 0u, 0u, true, 0u,
     true, 0u, 408u, true, 1u, false}},
    {8u, {false, false, 2290u, false, false}, {false, false, false, true, 17u}, {8u, 3u, 8u, 2290u,
     2290u, 0u, 0u, 0u, 0u, 8u, true, 0u, false, 2290u, 0u, false, 1u, 416u, 1u, 8u, 0u, true, 0u,
     true, 0u, 416u, true, 1u, true}},
    {2u, {false, false, 2291u, false, false}, {false, false, false, true, 17u}, {10u, 3u, 8u, 2291u,
     2291u, 0u, 0u, 0u, 0u, 10u, true, 0u, false, 2291u, 0u, false, 1u, 418u, 1u, 10u, 0u, true, 0u,
     true, 0u, 418u, true, 1u, true}},
    {1u, {false, false, 2292u, false, false}, {false, false, false, true, 17u}, {11u, 3u, 8u, 2292u,
     2291u, 0u, 0u, 0u, 0u, 11u, true, 0u, false, 2291u, 0u, false, 1u, 419u, 1u, 11u, 0u, true, 0u,
     true, 0u, 419u, true, 1u, true}},
    {2u, {false, true, 2292u, false, false}, {false, false, false, true, 17u}, {13u, 3u, 8u, 2292u,
     2292u, 0u, 0u, 0u, 0u, 13u, true, 0u, false, 2292u, 0u, false, 1u, 421u, 1u, 13u, 0u, true, 0u,
     true, 0u, 421u, true, 1u, true}},
    {3u, {false, true, 2292u, false, true}, {false, false, false, true, 17u}, {16u, 3u, 8u, 2292u,
     2292u, 0u, 0u, 0u, 0u, 16u, true, 0u, false, 2292u, 0u, false, 1u, 424u, 1u, 16u, 0u, true, 2u,
     true, 0u, 424u, true, 1u, true}},
    {1u, {true, true, 2292u, false, true}, {false, false, false, true, 17u}, {17u, 3u, 8u, 2292u,
     2292u, 0u, 0u, 0u, 0u, 17u, true, 0u, false, 2292u, 0u, false, 1u, 425u, 1u, 17u, 0u, true, 2u,
     true, 0u, 425u, true, 1u, false}},
    {1u, {false, true, 2292u, false, true}, {false, false, false, true, 17u}, {18u, 3u, 8u, 2292u,
     2292u, 0u, 0u, 0u, 0u, 18u, true, 0u, false, 2292u, 0u, false, 1u, 426u, 1u, 18u, 0u, true, 2u,
     true, 0u, 426u, true, 1u, true}},
    {1u, {true, true, 2292u, false, true}, {false, false, false, true, 17u}, {19u, 3u, 8u, 2292u,
     2292u, 0u, 0u, 0u, 0u, 19u, true, 0u, false, 2292u, 0u, false, 1u, 427u, 1u, 19u, 0u, true, 2u,
     true, 0u, 427u, true, 1u, false}},
    {1u, {true, true, 2292u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 0u, 2292u,
     2292u, 1u, 0u, 0u, 0u, 20u, true, 0u, false, 2292u, 0u, false, 1u, 428u, 1u, 20u, 0u, true, 2u,
     true, 0u, 428u, true, 1u, false}},
    /* vector 19 */
    {359u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2351u, 2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 359u, true, 1u, true}},
    {1u, {false, false, 2351u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 360u, 0u, 0u, 0u, true, 0u,
     false, 0u, 360u, true, 0u, true}},
    {2u, {false, false, 2373u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2373u,
     2373u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 1u, 362u, 0u, 2u, 0u, true, 0u,
     false, 0u, 362u, true, 0u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2353u,
     2373u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 1u, 363u, 0u, 3u, 0u, true, 0u,
     false, 0u, 363u, true, 0u, true}},
    {1u, {false, false, 2374u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2374u,
     2353u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2373u, 0u, false, 1u, 364u, 0u, 4u, 0u, true, 0u,
     false, 0u, 364u, true, 0u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2353u,
     2374u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2353u, 0u, false, 1u, 365u, 0u, 5u, 0u, true, 0u,
     false, 0u, 365u, true, 0u, true}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 3814u,
     2353u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2374u, 0u, false, 1u, 366u, 0u, 6u, 0u, true, 0u,
     false, 0u, 366u, true, 0u, true}},
    {114u, {false, false, 2290u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     2290u, 2290u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2290u, 0u, false, 2u, 0u, 0u, 120u, 0u,
     true, 0u, false, 0u, 480u, true, 0u, true}},
    {6u, {false, false, 2291u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 0u, 5u, 0u, 126u, 0u, true, 0u,
     false, 0u, 486u, true, 0u, true}},
    {1u, {true, false, 2291u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 0u, 6u, 0u, 127u, 0u, true, 0u,
     false, 0u, 487u, true, 0u, true}},
    {1u, {false, false, 2291u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 0u, 7u, 0u, 128u, 0u, true, 0u,
     false, 0u, 488u, true, 0u, true}},
    {1u, {true, false, 2291u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 0u, 8u, 0u, 129u, 0u, true, 0u,
     false, 0u, 489u, true, 0u, true}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2086u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 1u, false, 2291u, 0u, false, 0u, 9u, 0u, 130u, 0u, true, 0u,
     false, 0u, 490u, true, 1u, true}},
    {109u, {true, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 118u, 0u, 239u, 0u, true,
     0u, false, 0u, 599u, true, 1u, false}},
    {7u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 125u, 0u, 246u, 0u, true,
     0u, false, 1u, 6u, false, 1u, false}},
    {1u, {true, false, 2086u, true, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 126u, 0u, 247u, 0u, true,
     0u, false, 0u, 0u, false, 0u, false}},
    {1u, {true, true, 3814u, true, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 3814u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 127u, 0u, 248u, 0u, true,
     0u, false, 0u, 1u, false, 0u, false}},
    {1u, {true, true, 3814u, true, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 128u, 0u, 249u, 0u, true,
     0u, false, 0u, 2u, false, 0u, false}},
    {359u, {false, false, 740u, false, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     false, 0u, 361u, true, 0u, true}},
    {1u, {false, false, 65535u, false, false}, {false, false, false, false, 2u}, {0u, 2u, 0u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     false, 0u, 362u, true, 0u, true}},
    {1u, {false, false, 739u, false, false}, {false, false, false, false, 2u}, {0u, 2u, 1u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     false, 0u, 363u, true, 0u, true}},
    {2u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {2u, 2u, 3u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 0u, 365u, true, 1u, true}},
    {17u, {false, true, 2086u, true, false}, {false, false, false, true, 3u}, {19u, 3u, 8u, 2086u,
     2086u, 0u, 0u, 0u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 0u, 382u, true, 1u, true}},
    {104u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 0u, 486u, true, 1u, true}},
    {113u, {true, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 0u, 599u, true, 1u, false}},
    {3u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 1u, 2u, false, 1u, false}},
    {2u, {true, true, 3814u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, false, 1u, 4u, false, 1u, false}},
    {1u, {true, true, 0u, true, true}, {false, false, true, true, 2u}, {0u, 2u, 0u, 3814u, 3814u,
     1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 1u,
     false, 1u, 5u, false, 1u, false}},
    {355u, {true, true, 741u, true, true}, {false, false, true, true, 18u}, {20u, 1u, 8u, 741u,
     741u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 741u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 2u,
     true, 1u, 360u, false, 1u, false}},
    {2u, {false, false, 740u, false, false}, {false, false, false, false, 18u}, {20u, 1u, 8u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     true, 0u, 1u, true, 0u, true}},
    {357u, {false, false, 740u, false, false}, {false, false, false, false, 18u}, {20u, 1u, 8u,
     740u, 740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u,
     true, 0u, true, 0u, 358u, true, 0u, true}},
    {1u, {false, false, 65535u, false, false}, {false, false, false, false, 18u}, {0u, 2u, 0u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     true, 0u, 359u, true, 0u, true}},
    {1u, {false, false, 739u, false, false}, {false, false, false, false, 18u}, {0u, 2u, 1u, 740u,
     740u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 740u, 0u, false, 0u, 480u, 0u, 360u, 0u, true, 0u,
     true, 0u, 360u, true, 0u, true}},
    {2u, {false, true, 2086u, true, false}, {false, false, false, true, 18u}, {2u, 2u, 3u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 0u, 362u, true, 1u, true}},
    {17u, {false, true, 2086u, true, false}, {false, false, false, true, 19u}, {19u, 3u, 8u, 2086u,
     2086u, 0u, 0u, 0u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 0u, 379u, true, 1u, true}},
    {104u, {false, true, 2086u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 0u, 483u, true, 1u, true}},
    {116u, {true, true, 2086u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 0u, 599u, true, 1u, false}},
    {360u, {true, true, 3814u, true, false}, {false, false, true, true, 18u}, {20u, 1u, 8u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 1u, 359u, false, 1u, false}},
    {1u, {true, true, 3814u, true, false}, {false, false, false, true, 18u}, {20u, 1u, 8u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 360u, 0u, true,
     0u, true, 0u, 0u, false, 1u, false}},
    /* vector 20 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     1u, false, 0u, 122u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     2u, true, 0u, 126u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 130u, 1u, 130u, 0u, true,
     2u, true, 0u, 130u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 132u, 2u, 1u, 0u, true, 0u,
     true, 0u, 132u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 3u, false, 2u, false, 2351u, 3u, false, 1u, 134u, 2u, 3u, 0u, true, 0u,
     true, 0u, 134u, true, 1u, false}},
    {117u, {true, true, 2351u, true, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 2351u, 120u, false, 1u, 251u, 2u, 120u, 0u,
     true, 0u, true, 0u, 251u, true, 1u, false}},
    {2u, {true, true, 2370u, true, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2370u,
     2370u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 2370u, 122u, false, 1u, 253u, 2u, 122u, 0u,
     true, 0u, true, 0u, 253u, true, 1u, false}},
    {2u, {true, true, 2351u, true, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 2370u, 124u, false, 1u, 255u, 2u, 124u, 0u,
     true, 0u, true, 0u, 255u, true, 1u, false}},
    {1u, {true, true, 2088u, true, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2088u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 2370u, 125u, false, 1u, 256u, 2u, 125u, 0u,
     true, 0u, true, 0u, 256u, true, 1u, false}},
    {1u, {true, true, 2088u, true, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2088u,
     2088u, 0u, 0u, 0u, 0u, 0u, false, 0u, false, 2088u, 0u, false, 1u, 257u, 1u, 0u, 0u, true, 0u,
     true, 0u, 257u, true, 1u, false}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2290u,
     2088u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 2088u, 0u, false, 1u, 258u, 1u, 1u, 0u, true, 0u,
     true, 0u, 258u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 377u, 1u, 120u, 0u,
     true, 0u, true, 0u, 377u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 378u, 1u, 121u, 0u, true,
     1u, true, 0u, 378u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 382u, 1u, 125u, 0u, true,
     2u, true, 0u, 382u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 386u, 1u, 129u, 0u, true,
     2u, true, 0u, 386u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 388u, 2u, 1u, 0u, true, 0u,
     true, 0u, 388u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 3u, false, 2u, false, 2351u, 3u, false, 1u, 390u, 2u, 3u, 0u, true, 0u,
     true, 0u, 390u, true, 1u, false}},
    {2u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2350u, 1u, 1u, 0u, 1u, 5u, false, 2u, false, 2351u, 5u, false, 1u, 392u, 2u, 5u, 0u, true, 0u,
     true, 0u, 392u, true, 1u, false}},
    {2u, {true, true, 740u, true, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 740u, 740u,
     0u, 0u, 1u, 1u, 7u, false, 0u, false, 740u, 0u, false, 1u, 394u, 2u, 7u, 0u, true, 0u, true,
     0u, 394u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     740u, 0u, 0u, 1u, 1u, 8u, false, 1u, false, 740u, 1u, false, 1u, 395u, 2u, 8u, 0u, true, 0u,
     true, 0u, 395u, true, 1u, false}},
    {85u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 93u, false, 2u, false, 2351u, 86u, false, 2u, 0u, 2u, 93u, 0u, true, 0u,
     true, 0u, 480u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 94u, false, 2u, false, 2351u, 87u, false, 2u, 1u, 2u, 94u, 0u, true, 0u,
     true, 0u, 481u, true, 1u, false}},
    {117u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2350u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2351u, 204u, false, 2u, 118u, 2u, 211u, 0u,
     true, 0u, true, 0u, 598u, true, 1u, false}},
    {1998u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2351u, 2202u, false, 2u, 480u, 2u, 360u, 0u,
     true, 0u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {false, false, false, true, 28u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 0u, false, 2u, false, 2351u, 2203u, true, 0u, 0u, 1u, 0u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    /* vector 21 */
    {359u, {true, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 120u, false, 0u, false, 2249u, 0u, false, 1u, 359u, 1u, 359u, 0u, false,
     0u, false, 0u, 359u, false, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, false, 0u, false, 2351u, 0u, false, 1u, 361u, 0u, 1u, 0u, false,
     0u, false, 0u, 361u, false, 1u, false}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2249u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 362u, 0u, 2u, 0u, true, 0u,
     false, 0u, 362u, true, 0u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 363u, 0u, 3u, 0u, true, 1u,
     false, 0u, 363u, true, 0u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 367u, 0u, 7u, 0u, true, 2u,
     true, 0u, 367u, true, 0u, true}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 371u, 0u, 11u, 0u, true,
     2u, true, 0u, 371u, true, 0u, true}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 373u, 2u, 1u, 0u, true, 0u,
     true, 0u, 373u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 3u, false, 2u, false, 2351u, 3u, false, 1u, 375u, 2u, 3u, 0u, true, 0u,
     true, 0u, 375u, true, 1u, false}},
    {1u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2351u, 1u, 1u, 0u, 1u, 4u, false, 2u, false, 2351u, 4u, false, 1u, 376u, 2u, 4u, 0u, true, 0u,
     true, 0u, 376u, true, 1u, false}},
    {1u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2350u, 1u, 1u, 0u, 1u, 5u, false, 2u, false, 2351u, 5u, false, 1u, 377u, 2u, 5u, 0u, true, 0u,
     true, 0u, 377u, true, 1u, false}},
    {2u, {true, true, 2352u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 1u, 7u, false, 2u, false, 2352u, 7u, false, 1u, 379u, 2u, 7u, 0u, true, 0u,
     true, 0u, 379u, true, 1u, false}},
    /* vector 22 */
    {8u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {8u, 1u, 4u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 8u, true, 0u, false, 3814u, 0u, false, 1u, 8u, 1u, 8u, 0u, true, 0u,
     false, 0u, 8u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {9u, 1u, 5u, 2290u,
     3814u, 1u, 1u, 0u, 0u, 9u, true, 0u, false, 3814u, 0u, false, 1u, 9u, 1u, 9u, 0u, true, 0u,
     false, 0u, 9u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {10u, 1u, 6u, 2249u,
     2290u, 1u, 1u, 0u, 0u, 10u, true, 0u, false, 2290u, 0u, false, 1u, 10u, 1u, 10u, 0u, true, 0u,
     false, 0u, 10u, true, 1u, true}},
    {1u, {false, false, 2310u, false, false}, {false, false, false, true, 0u}, {11u, 1u, 7u, 2310u,
     2249u, 1u, 1u, 0u, 0u, 11u, true, 0u, false, 2290u, 0u, false, 1u, 11u, 1u, 11u, 0u, true, 0u,
     false, 0u, 11u, true, 1u, true}},
    {348u, {true, false, 2310u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2310u,
     2310u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2310u, 0u, false, 1u, 359u, 1u, 359u, 0u, true,
     0u, false, 0u, 359u, true, 1u, false}},
    {134u, {true, false, 2310u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     2310u, 2310u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2310u, 0u, false, 0u, 12u, 0u, 133u, 0u,
     true, 0u, false, 0u, 493u, true, 0u, false}},
    {1u, {true, true, 2310u, false, false}, {true, false, false, false, 0u}, {20u, 1u, 8u, 2310u,
     2310u, 1u, 1u, 0u, 1u, 0u, true, 0u, false, 2310u, 0u, false, 1u, 0u, 2u, 0u, 0u, true, 0u,
     false, 0u, 494u, true, 0u, false}},
    {2u, {false, true, 2086u, true, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 1u, true, 1u, false, 2086u, 0u, false, 1u, 2u, 1u, 1u, 0u, true, 0u,
     false, 0u, 496u, true, 1u, true}},
    {6u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 7u, true, 2u, true, 2086u, 0u, false, 1u, 8u, 1u, 7u, 0u, true, 0u,
     false, 0u, 502u, true, 1u, true}},
    {479u, {false, true, 2088u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2088u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2088u, 0u, false, 0u, 6u, 0u, 126u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, true}},
    {1u, {false, true, 0u, false, true}, {false, false, false, true, 2u}, {0u, 2u, 0u, 2088u, 2088u,
     0u, 0u, 1u, 0u, 120u, true, 0u, true, 2088u, 0u, false, 0u, 7u, 0u, 127u, 0u, true, 1u, false,
     0u, 600u, true, 1u, true}},
    {1u, {false, true, 0u, false, true}, {false, false, false, true, 18u}, {0u, 2u, 1u, 2088u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 2088u, 0u, false, 0u, 8u, 0u, 128u, 0u, true, 2u,
     true, 0u, 600u, true, 1u, true}},
    {1u, {true, true, 3814u, false, false}, {false, false, false, true, 18u}, {1u, 2u, 2u, 3814u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 0u, true, 2088u, 0u, false, 0u, 9u, 0u, 129u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {1u, {true, false, 3814u, false, false}, {false, false, false, true, 18u}, {2u, 2u, 3u, 3814u,
     3814u, 0u, 0u, 0u, 0u, 120u, true, 0u, true, 3814u, 0u, false, 0u, 10u, 0u, 130u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    /* vector 23 */
    {2u, {false, false, 2086u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2086u,
     2086u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2086u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {1u, {false, false, 2066u, true, false}, {false, false, false, true, 0u}, {3u, 0u, 3u, 2066u,
     2086u, 0u, 0u, 0u, 0u, 3u, true, 1u, false, 2086u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2066u, true, false}, {false, false, false, true, 2u}, {4u, 1u, 0u, 2066u,
     2066u, 0u, 0u, 1u, 0u, 4u, true, 2u, true, 2066u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {2u, {false, false, 2147u, true, false}, {false, false, false, true, 2u}, {6u, 1u, 2u, 2147u,
     2147u, 0u, 0u, 1u, 0u, 6u, true, 2u, true, 2147u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    /* vector 24 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {119u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 1u, 122u, 1u, 122u, 0u, true,
     1u, false, 0u, 122u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 1u, 126u, 1u, 126u, 0u, true,
     2u, true, 0u, 126u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 1u, 130u, 1u, 130u, 0u, true,
     2u, true, 0u, 130u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 132u, 2u, 1u, 0u, true, 0u,
     true, 0u, 132u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 3u, false, 2u, false, 2351u, 3u, false, 1u, 134u, 2u, 3u, 0u, true, 0u,
     true, 0u, 134u, true, 1u, false}},
    {2u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2350u, 1u, 1u, 0u, 1u, 5u, false, 2u, false, 2351u, 5u, false, 1u, 136u, 2u, 5u, 0u, true, 0u,
     true, 0u, 136u, true, 1u, false}},
    {3u, {true, true, 2148u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2148u,
     2148u, 0u, 0u, 0u, 1u, 8u, false, 2u, false, 2148u, 1u, false, 1u, 139u, 2u, 8u, 0u, true, 0u,
     true, 0u, 139u, true, 1u, false}},
    {2u, {true, true, 2128u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2128u,
     2128u, 0u, 0u, 0u, 1u, 10u, false, 2u, false, 2128u, 0u, false, 1u, 141u, 2u, 10u, 0u, true,
     0u, true, 0u, 141u, true, 1u, false}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 20u}, {20u, 1u, 8u, 2249u,
     2128u, 0u, 0u, 0u, 0u, 0u, true, 2u, false, 2128u, 1u, false, 1u, 142u, 1u, 0u, 0u, true, 0u,
     true, 0u, 142u, true, 1u, true}},
    {3u, {false, false, 2249u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2249u, 0u, false, 1u, 145u, 1u, 3u, 0u, true, 0u,
     true, 0u, 145u, true, 1u, true}},
    {1u, {false, false, 2248u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2248u,
     2249u, 0u, 0u, 0u, 0u, 4u, true, 0u, false, 2249u, 0u, false, 1u, 146u, 1u, 4u, 0u, true, 0u,
     true, 0u, 146u, true, 1u, true}},
    {1u, {false, false, 2269u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2269u,
     2248u, 0u, 0u, 0u, 0u, 5u, true, 0u, false, 2249u, 0u, false, 1u, 147u, 1u, 5u, 0u, true, 0u,
     true, 0u, 147u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2249u,
     2269u, 0u, 0u, 0u, 0u, 6u, true, 0u, false, 2249u, 0u, false, 1u, 148u, 1u, 6u, 0u, true, 0u,
     true, 0u, 148u, true, 1u, true}},
    {1u, {false, false, 2310u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2310u,
     2249u, 0u, 0u, 0u, 0u, 7u, true, 0u, false, 2269u, 0u, false, 1u, 149u, 1u, 7u, 0u, true, 0u,
     true, 0u, 149u, true, 1u, true}},
    {1u, {true, false, 2310u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2310u,
     2310u, 1u, 0u, 0u, 0u, 8u, true, 0u, false, 2310u, 0u, false, 1u, 150u, 1u, 8u, 0u, true, 0u,
     true, 0u, 150u, true, 1u, false}},
    {1u, {true, true, 2310u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2310u,
     2310u, 1u, 0u, 0u, 0u, 9u, true, 0u, false, 2310u, 0u, false, 1u, 151u, 1u, 9u, 0u, true, 0u,
     true, 0u, 151u, true, 1u, false}},
    {110u, {true, true, 2288u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 119u, true, 0u, false, 2288u, 0u, false, 1u, 261u, 1u, 119u, 0u, true,
     0u, true, 0u, 261u, true, 1u, false}},
    {2u, {true, true, 2288u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 1u, 1u, false, 1u, false, 2288u, 1u, false, 1u, 263u, 2u, 1u, 0u, true, 0u,
     true, 0u, 263u, true, 1u, false}},
    {7u, {true, true, 2288u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 1u, 8u, false, 2u, false, 2288u, 8u, false, 1u, 270u, 2u, 8u, 0u, true, 0u,
     true, 0u, 270u, true, 1u, false}},
    {1u, {true, false, 2288u, false, false}, {false, false, false, true, 20u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 0u, false, 2u, false, 2288u, 9u, false, 1u, 271u, 1u, 0u, 0u, true, 0u,
     true, 0u, 271u, true, 1u, false}},
    {359u, {true, false, 2288u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u,
     2288u, 2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 149u, 1u, 359u, 0u,
     true, 0u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, false, 2288u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 150u, 0u, 0u, 0u, true,
     0u, true, 0u, 600u, true, 0u, false}},
    {1u, {true, true, 2288u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 151u, 0u, 1u, 0u, true,
     0u, true, 0u, 600u, true, 0u, false}},
    {1u, {false, true, 2289u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2289u,
     2288u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2288u, 0u, false, 0u, 152u, 0u, 2u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, true}},
    {4u, {false, false, 2289u, false, false}, {false, false, false, false, 16u}, {20u, 1u, 8u,
     2289u, 2289u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2289u, 0u, false, 0u, 156u, 0u, 6u, 0u,
     true, 0u, true, 0u, 600u, true, 0u, true}},
    {1u, {false, true, 2289u, false, false}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2289u,
     2289u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2289u, 0u, false, 0u, 157u, 0u, 7u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, true}},
    {1u, {true, true, 2289u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2289u,
     2289u, 1u, 0u, 0u, 1u, 0u, true, 0u, false, 2289u, 0u, false, 1u, 0u, 2u, 0u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 740u, false, true}, {true, false, false, true, 16u}, {20u, 1u, 8u, 740u,
     2289u, 1u, 0u, 0u, 1u, 1u, false, 1u, false, 2289u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 1u,
     true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 740u, false, true}, {true, false, false, true, 20u}, {20u, 1u, 8u, 740u, 740u,
     0u, 0u, 1u, 1u, 2u, false, 2u, false, 740u, 0u, false, 1u, 2u, 2u, 2u, 0u, true, 2u, true, 0u,
     600u, true, 1u, false}},
    /* vector 25 */
    {1u, {false, false, 2351u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 2351u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {2u, {false, false, 2373u, false, false}, {false, false, false, true, 0u}, {3u, 0u, 3u, 2373u,
     2373u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2373u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2353u,
     2373u, 1u, 1u, 0u, 0u, 4u, true, 0u, false, 2373u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {false, false, 2374u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2374u,
     2353u, 1u, 1u, 0u, 0u, 5u, true, 0u, false, 2373u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, true}},
    {1u, {false, false, 2353u, false, false}, {false, false, false, true, 0u}, {6u, 1u, 2u, 2353u,
     2374u, 1u, 1u, 0u, 0u, 6u, true, 0u, false, 2353u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, true}},
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {7u, 1u, 3u, 3814u,
     2353u, 1u, 1u, 0u, 0u, 7u, true, 0u, false, 2374u, 0u, false, 1u, 7u, 1u, 7u, 0u, true, 0u,
     false, 0u, 7u, true, 1u, true}},
    {114u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2290u, 2290u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2290u, 0u, false, 1u, 121u, 1u, 121u, 0u,
     true, 0u, false, 0u, 121u, true, 1u, true}},
    {6u, {false, false, 2291u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 127u, 1u, 127u, 0u, true,
     0u, false, 0u, 127u, true, 1u, true}},
    {1u, {true, false, 2291u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 128u, 1u, 128u, 0u, true,
     0u, false, 0u, 128u, true, 1u, false}},
    {1u, {false, false, 2291u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 129u, 1u, 129u, 0u, true,
     0u, false, 0u, 129u, true, 1u, true}},
    {2u, {true, false, 2291u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2291u, 0u, false, 1u, 131u, 1u, 131u, 0u, true,
     0u, false, 0u, 131u, true, 1u, false}},
    {2u, {true, true, 2291u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2291u, 1u, false, 1u, 133u, 2u, 1u, 0u, true, 0u,
     false, 0u, 133u, true, 1u, false}},
    {346u, {true, true, 2291u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2291u, 347u, false, 1u, 479u, 2u, 347u, 0u,
     true, 0u, false, 0u, 479u, true, 1u, false}},
    {1u, {true, true, 2291u, false, false}, {true, true, false, true, 4u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2291u, 348u, false, 2u, 0u, 2u, 348u, 1u, true,
     0u, false, 0u, 480u, true, 1u, false}},
    {1u, {false, false, 2291u, false, false}, {false, false, false, true, 4u}, {20u, 1u, 8u, 2291u,
     2291u, 1u, 1u, 0u, 0u, 0u, true, 2u, false, 2291u, 349u, false, 0u, 0u, 1u, 0u, 0u, true, 1u,
     false, 0u, 481u, true, 1u, true}},
    {359u, {false, false, 3813u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, true}},
    {124u, {false, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 480u, 0u, 123u, 0u,
     true, 0u, false, 0u, 600u, true, 0u, true}},
    {1u, {true, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 480u, 0u, 124u, 0u, true,
     0u, false, 0u, 600u, true, 0u, true}},
    {2u, {true, true, 3813u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 3813u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {3u, {true, true, 3813u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 4u, false, 2u, false, 3813u, 4u, false, 1u, 4u, 2u, 4u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {475u, {true, true, 3813u, true, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 479u, false, 1u, 479u, 2u, 360u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 3813u, true, false}, {true, true, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 481u, false, 2u, 1u, 2u, 360u, 1u, false,
     1u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 740u, true, false}, {true, true, false, true, 32u}, {20u, 1u, 8u, 740u, 3813u,
     1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 482u, false, 2u, 2u, 2u, 360u, 1u, false, 2u,
     false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 3813u, true, false}, {true, true, false, true, 32u}, {20u, 1u, 8u, 3813u,
     740u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 483u, false, 2u, 3u, 2u, 360u, 1u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 3832u, true, false}, {true, true, false, true, 32u}, {0u, 2u, 0u, 3813u, 740u,
     1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 484u, false, 2u, 4u, 2u, 360u, 1u, false, 2u,
     false, 0u, 600u, true, 1u, false}},
    {3u, {true, true, 3832u, true, false}, {true, true, false, true, 32u}, {0u, 2u, 3u, 3813u, 740u,
     1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 487u, false, 2u, 7u, 2u, 360u, 1u, false, 2u,
     false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 3832u, true, false}, {false, false, false, true, 33u}, {0u, 3u, 0u, 3813u,
     740u, 0u, 0u, 0u, 0u, 0u, false, 0u, false, 3813u, 488u, false, 0u, 0u, 1u, 0u, 0u, false, 2u,
     false, 0u, 600u, true, 1u, false}},
    {19u, {false, false, 3813u, false, false}, {false, false, false, true, 1u}, {19u, 3u, 8u, 3813u,
     3813u, 0u, 0u, 0u, 0u, 19u, true, 0u, false, 3813u, 0u, false, 0u, 19u, 1u, 19u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, true}},
    {340u, {false, false, 3813u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, true}},
    {124u, {false, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 480u, 0u, 123u, 0u,
     true, 0u, false, 0u, 600u, true, 0u, true}},
    {1u, {true, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 480u, 0u, 124u, 0u, true,
     0u, false, 0u, 600u, true, 0u, true}},
    {2u, {true, true, 3813u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 3813u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {3u, {true, true, 3813u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 4u, false, 2u, false, 3813u, 4u, false, 1u, 4u, 2u, 4u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {475u, {true, true, 3813u, true, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 479u, false, 1u, 479u, 2u, 360u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 3813u, true, false}, {true, true, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 481u, false, 2u, 1u, 2u, 360u, 1u, false,
     1u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 3813u, true, false}, {true, true, false, true, 32u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 482u, false, 2u, 2u, 2u, 360u, 1u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {4u, {true, true, 3832u, true, false}, {true, true, false, true, 32u}, {0u, 2u, 3u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 486u, false, 2u, 6u, 2u, 360u, 1u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {1u, {false, true, 3794u, true, true}, {false, false, false, true, 1u}, {1u, 3u, 0u, 3794u,
     3813u, 0u, 0u, 0u, 0u, 0u, true, 0u, false, 3813u, 487u, false, 0u, 0u, 1u, 0u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, true}},
    {1u, {true, true, 2086u, true, false}, {false, false, false, true, 1u}, {2u, 3u, 1u, 2086u,
     3794u, 0u, 0u, 0u, 0u, 1u, true, 1u, false, 3794u, 0u, false, 0u, 1u, 1u, 1u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {17u, {true, true, 2086u, true, false}, {false, false, false, true, 3u}, {19u, 3u, 8u, 2086u,
     2086u, 0u, 0u, 0u, 0u, 18u, true, 2u, true, 2086u, 0u, false, 0u, 18u, 1u, 18u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, false}},
    {46u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 64u, true, 2u, true, 2086u, 0u, false, 0u, 64u, 1u, 64u, 0u, true, 0u,
     false, 1u, 45u, false, 1u, false}},
    {1u, {true, false, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 65u, true, 2u, true, 2086u, 0u, false, 0u, 65u, 1u, 65u, 0u, true, 0u,
     false, 0u, 0u, false, 1u, false}},
    {294u, {true, false, 2088u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2088u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2088u, 0u, false, 0u, 359u, 1u, 359u, 0u, true,
     0u, false, 0u, 294u, false, 1u, false}},
    {306u, {true, false, 2088u, true, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 2088u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2088u, 0u, false, 0u, 480u, 0u, 305u, 0u, true,
     0u, false, 0u, 600u, false, 0u, false}},
    {1u, {true, true, 2088u, true, false}, {false, false, false, false, 2u}, {20u, 1u, 8u, 2088u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2088u, 0u, false, 0u, 480u, 0u, 306u, 0u, true,
     0u, false, 0u, 600u, false, 0u, false}},
    {1u, {false, true, 2086u, true, false}, {false, false, false, true, 2u}, {20u, 1u, 8u, 2086u,
     2088u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2088u, 0u, false, 0u, 480u, 0u, 307u, 0u, true,
     0u, false, 0u, 600u, true, 1u, true}},
    {1u, {true, true, 2086u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, true, 2u, true, 2086u, 0u, false, 0u, 480u, 0u, 308u, 0u, true,
     0u, false, 1u, 0u, true, 1u, false}},
    {3u, {true, true, 3814u, true, false}, {false, false, true, true, 2u}, {20u, 1u, 8u, 3814u,
     3814u, 1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 311u, 0u, true,
     0u, false, 1u, 3u, false, 1u, false}},
    {4u, {true, true, 739u, true, false}, {false, false, true, true, 2u}, {0u, 2u, 3u, 3814u, 3814u,
     1u, 1u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 315u, 0u, true, 0u,
     false, 1u, 7u, false, 1u, false}},
    {1u, {true, true, 739u, true, false}, {false, false, false, true, 3u}, {0u, 3u, 0u, 3814u,
     3814u, 0u, 0u, 0u, 0u, 120u, true, 2u, true, 3814u, 0u, false, 0u, 480u, 0u, 316u, 0u, true,
     0u, false, 0u, 0u, false, 1u, false}},
    /* vector 26 */
    {1u, {false, false, 3814u, false, false}, {false, false, false, true, 0u}, {1u, 0u, 1u, 3814u,
     0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u, 0u, true, 0u, false,
     0u, 1u, true, 1u, true}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 0u}, {2u, 0u, 2u, 2290u,
     3814u, 0u, 0u, 0u, 0u, 2u, true, 0u, false, 2290u, 0u, false, 1u, 2u, 1u, 2u, 0u, true, 0u,
     false, 0u, 2u, true, 1u, true}},
    {1u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {3u, 0u, 3u, 2249u,
     2290u, 0u, 0u, 0u, 0u, 3u, true, 0u, false, 2290u, 0u, false, 1u, 3u, 1u, 3u, 0u, true, 0u,
     false, 0u, 3u, true, 1u, true}},
    {1u, {false, false, 2310u, false, false}, {false, false, false, true, 0u}, {4u, 1u, 0u, 2310u,
     2249u, 1u, 0u, 0u, 0u, 4u, true, 0u, false, 2290u, 0u, false, 1u, 4u, 1u, 4u, 0u, true, 0u,
     false, 0u, 4u, true, 1u, true}},
    {1u, {true, false, 2310u, false, false}, {false, false, false, true, 0u}, {5u, 1u, 1u, 2310u,
     2310u, 1u, 0u, 0u, 0u, 5u, true, 0u, false, 2310u, 0u, false, 1u, 5u, 1u, 5u, 0u, true, 0u,
     false, 0u, 5u, true, 1u, false}},
    {1u, {true, true, 2310u, false, false}, {false, false, false, true, 0u}, {6u, 1u, 2u, 2310u,
     2310u, 1u, 0u, 0u, 0u, 6u, true, 0u, false, 2310u, 0u, false, 1u, 6u, 1u, 6u, 0u, true, 0u,
     false, 0u, 6u, true, 1u, false}},
    {113u, {true, true, 2288u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 119u, true, 0u, false, 2288u, 0u, false, 1u, 119u, 1u, 119u, 0u, true,
     0u, false, 0u, 119u, true, 1u, false}},
    {2u, {true, true, 2288u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 1u, 1u, false, 1u, false, 2288u, 1u, false, 1u, 121u, 2u, 1u, 0u, true, 0u,
     false, 0u, 121u, true, 1u, false}},
    {4u, {true, true, 2288u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 1u, 5u, false, 2u, false, 2288u, 5u, false, 1u, 125u, 2u, 5u, 0u, true, 0u,
     false, 0u, 125u, true, 1u, false}},
    {1u, {true, false, 2288u, false, false}, {false, false, false, true, 4u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 0u, false, 2u, false, 2288u, 6u, false, 1u, 126u, 1u, 0u, 0u, true, 0u,
     false, 0u, 126u, true, 1u, false}},
    {359u, {true, false, 2288u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 4u, 1u, 359u, 0u, true,
     0u, false, 0u, 485u, true, 1u, false}},
    {1u, {true, false, 2288u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 5u, 0u, 0u, 0u, true, 0u,
     false, 0u, 486u, true, 0u, false}},
    {1u, {true, true, 2288u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2288u,
     2288u, 1u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 6u, 0u, 1u, 0u, true, 0u,
     false, 0u, 487u, true, 0u, false}},
    {1u, {false, true, 2289u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2289u,
     2288u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2288u, 0u, false, 0u, 7u, 0u, 2u, 0u, true, 0u,
     false, 0u, 488u, true, 1u, true}},
    {4u, {false, false, 2289u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 2289u,
     2289u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2289u, 0u, false, 0u, 11u, 0u, 6u, 0u, true, 0u,
     false, 0u, 492u, true, 0u, true}},
    {1u, {false, true, 2289u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2289u,
     2289u, 1u, 0u, 0u, 0u, 120u, true, 0u, false, 2289u, 0u, false, 0u, 12u, 0u, 7u, 0u, true, 0u,
     false, 0u, 493u, true, 1u, true}},
    {1u, {true, true, 2289u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 2289u,
     2289u, 1u, 0u, 0u, 1u, 0u, true, 0u, false, 2289u, 0u, false, 1u, 0u, 2u, 0u, 0u, true, 0u,
     false, 0u, 494u, true, 1u, false}},
    {1u, {true, true, 0u, false, false}, {true, false, false, true, 0u}, {0u, 2u, 0u, 2289u, 2289u,
     1u, 0u, 0u, 1u, 1u, false, 1u, false, 2289u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 0u, false,
     0u, 495u, true, 1u, false}},
    {5u, {true, true, 2087u, false, false}, {true, false, false, true, 4u}, {5u, 1u, 1u, 2087u,
     2087u, 0u, 0u, 1u, 1u, 6u, false, 2u, false, 2087u, 3u, false, 1u, 6u, 2u, 6u, 0u, true, 0u,
     false, 0u, 500u, true, 1u, false}},
    {113u, {true, true, 2107u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 2107u,
     2107u, 0u, 0u, 1u, 1u, 119u, false, 2u, false, 2107u, 116u, false, 1u, 119u, 2u, 119u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2086u, false, true}, {false, false, true, true, 4u}, {20u, 1u, 8u, 2086u,
     2107u, 0u, 0u, 1u, 0u, 0u, false, 2u, false, 2107u, 117u, false, 1u, 120u, 1u, 0u, 0u, true,
     1u, false, 1u, 0u, true, 1u, false}},
    {356u, {true, true, 2086u, false, true}, {false, false, true, true, 16u}, {20u, 1u, 8u, 2086u,
     2086u, 0u, 0u, 1u, 0u, 120u, false, 0u, false, 2086u, 0u, false, 1u, 476u, 1u, 356u, 0u, true,
     2u, true, 1u, 356u, false, 1u, false}},
    {2u, {true, true, 2085u, false, true}, {false, false, true, true, 16u}, {20u, 1u, 8u, 2085u,
     2085u, 0u, 0u, 1u, 0u, 120u, false, 0u, false, 2085u, 0u, false, 1u, 478u, 1u, 358u, 0u, true,
     2u, true, 1u, 358u, false, 1u, false}},
    {2u, {true, true, 2087u, false, true}, {false, false, true, true, 16u}, {20u, 1u, 8u, 2087u,
     2087u, 0u, 0u, 1u, 0u, 120u, false, 0u, false, 2087u, 0u, false, 2u, 0u, 0u, 0u, 0u, true, 2u,
     true, 1u, 360u, false, 1u, false}},
    {1u, {true, true, 2288u, false, true}, {false, false, true, true, 16u}, {20u, 1u, 8u, 2288u,
     2087u, 0u, 0u, 1u, 0u, 120u, false, 0u, false, 2087u, 0u, false, 0u, 0u, 0u, 1u, 0u, true, 2u,
     true, 1u, 361u, false, 1u, false}},
    {1u, {true, true, 2288u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2288u,
     2288u, 0u, 0u, 0u, 0u, 120u, false, 0u, false, 2288u, 0u, false, 0u, 1u, 0u, 2u, 0u, true, 2u,
     true, 0u, 0u, false, 1u, false}},
    /* vector 27 */
    {359u, {false, false, 3813u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 1u, 359u, 1u, 359u, 0u,
     true, 0u, false, 0u, 359u, true, 1u, true}},
    {124u, {false, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u,
     3813u, 3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 2u, 0u, 123u, 0u,
     true, 0u, false, 0u, 483u, true, 0u, true}},
    {1u, {true, false, 3813u, false, false}, {false, false, false, false, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 3813u, 0u, false, 0u, 3u, 0u, 124u, 0u, true, 0u,
     false, 0u, 484u, true, 0u, true}},
    {2u, {true, true, 3813u, false, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 3813u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 0u,
     false, 0u, 486u, true, 1u, false}},
    {3u, {true, true, 3813u, false, false}, {true, false, false, true, 4u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 4u, false, 2u, false, 3813u, 4u, false, 1u, 4u, 2u, 4u, 0u, true, 0u,
     false, 0u, 489u, true, 1u, false}},
    {475u, {true, true, 3813u, true, false}, {true, false, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 479u, false, 1u, 479u, 2u, 360u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 3813u, true, false}, {true, true, false, true, 0u}, {20u, 1u, 8u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 481u, false, 2u, 1u, 2u, 360u, 1u, false,
     1u, false, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 3815u, true, false}, {true, true, false, true, 32u}, {0u, 2u, 1u, 3813u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 483u, false, 2u, 3u, 2u, 360u, 1u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2249u, true, false}, {true, true, false, true, 32u}, {1u, 2u, 2u, 2249u,
     3813u, 1u, 1u, 0u, 1u, 120u, false, 0u, false, 3813u, 484u, false, 2u, 4u, 2u, 360u, 1u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2249u, true, false}, {true, false, false, true, 32u}, {2u, 2u, 3u, 2249u,
     2249u, 1u, 0u, 0u, 1u, 120u, false, 0u, false, 2249u, 0u, false, 2u, 5u, 2u, 360u, 0u, false,
     2u, false, 0u, 600u, true, 1u, false}},
    {1u, {false, false, 2290u, false, false}, {false, false, false, true, 1u}, {3u, 3u, 0u, 2290u,
     2249u, 0u, 0u, 0u, 0u, 0u, true, 1u, false, 2249u, 1u, false, 0u, 0u, 1u, 0u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, true}},
    {16u, {false, false, 2249u, false, false}, {false, false, false, true, 1u}, {19u, 3u, 8u, 2249u,
     2249u, 0u, 0u, 0u, 0u, 16u, true, 0u, false, 2249u, 0u, false, 0u, 16u, 1u, 16u, 0u, true, 0u,
     false, 0u, 600u, true, 1u, true}},
    {103u, {false, false, 2249u, false, false}, {false, false, false, true, 0u}, {20u, 1u, 8u,
     2249u, 2249u, 0u, 0u, 0u, 0u, 119u, true, 0u, false, 2249u, 0u, false, 0u, 119u, 1u, 119u, 0u,
     true, 0u, false, 0u, 600u, true, 1u, true}},
    {1u, {false, false, 2230u, false, true}, {false, false, false, true, 0u}, {20u, 1u, 8u, 2230u,
     2249u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2249u, 0u, false, 0u, 120u, 1u, 120u, 0u, true,
     1u, false, 0u, 600u, true, 1u, true}},
    {4u, {true, false, 2230u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2230u,
     2230u, 0u, 0u, 0u, 0u, 120u, true, 0u, false, 2230u, 0u, false, 0u, 124u, 1u, 124u, 0u, true,
     2u, true, 0u, 600u, true, 1u, false}},
    {4u, {true, false, 2351u, false, true}, {false, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2351u, 0u, false, 0u, 128u, 1u, 128u, 0u, true,
     2u, true, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 16u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 1u, false, 1u, false, 2351u, 1u, false, 1u, 1u, 2u, 1u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {2u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 3u, false, 2u, false, 2351u, 3u, false, 1u, 3u, 2u, 3u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {117u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2350u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2351u, 120u, false, 1u, 120u, 2u, 120u, 0u,
     true, 0u, true, 0u, 600u, true, 1u, false}},
    {361u, {true, true, 2351u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2351u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2351u, 481u, false, 2u, 1u, 2u, 360u, 0u, true,
     0u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2350u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2350u,
     2351u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2351u, 482u, false, 2u, 2u, 2u, 360u, 0u, true,
     0u, true, 0u, 600u, true, 1u, false}},
    {1720u, {true, true, 2352u, false, false}, {true, false, false, true, 20u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 1u, 120u, false, 2u, false, 2352u, 2202u, false, 2u, 480u, 2u, 360u, 0u,
     true, 0u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2352u, false, false}, {false, false, false, true, 28u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 0u, false, 2u, false, 2352u, 2203u, true, 0u, 0u, 1u, 0u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {3u, {true, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 3u, false, 0u, false, 2352u, 0u, true, 0u, 3u, 1u, 3u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {1u, {false, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 4u, true, 0u, false, 2352u, 0u, true, 0u, 4u, 1u, 4u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, true}},
    {1u, {true, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 5u, true, 0u, false, 2352u, 0u, true, 0u, 5u, 1u, 5u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {1u, {false, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 6u, true, 0u, false, 2352u, 0u, true, 0u, 6u, 1u, 6u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, true}},
    {2u, {true, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 8u, true, 0u, false, 2352u, 0u, true, 0u, 8u, 1u, 8u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
    {351u, {true, false, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u,
     2352u, 2352u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2352u, 0u, true, 0u, 359u, 1u, 359u, 0u,
     true, 0u, true, 0u, 600u, true, 1u, false}},
    {1u, {true, true, 2352u, false, false}, {false, false, false, true, 24u}, {20u, 1u, 8u, 2352u,
     2352u, 1u, 1u, 0u, 0u, 120u, true, 0u, false, 2352u, 0u, true, 0u, 360u, 0u, 0u, 0u, true, 0u,
     true, 0u, 600u, true, 1u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct shop6_remembered record;
};

static const struct vector vectors[] = {
    {0u, 13u, false, {0u}},
    {13u, 16u, false, {0u}},
    {16u, 21u, false, {0u}},
    {21u, 23u, false, {0u}},
    {23u, 24u, false, {0u}},
    {24u, 26u, false, {0u}},
    {26u, 29u, false, {0u}},
    {29u, 31u, false, {0u}},
    {31u, 34u, false, {0u}},
    {34u, 38u, false, {0u}},
    {38u, 42u, false, {0u}},
    {42u, 73u, false, {0u}},
    {73u, 88u, false, {0u}},
    {88u, 113u, false, {0u}},
    {113u, 139u, false, {0u}},
    {139u, 148u, false, {0u}},
    {148u, 159u, false, {0u}},
    {159u, 193u, false, {0u}},
    {193u, 232u, false, {0u}},
    {232u, 260u, false, {0u}},
    {260u, 271u, false, {0u}},
    {271u, 285u, false, {0u}},
    {285u, 289u, false, {0u}},
    {289u, 321u, false, {0u}},
    {321u, 371u, false, {0u}},
    {371u, 397u, false, {0u}},
    {397u, 427u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct shop6 m;
    struct shop6_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    shop6_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            shop6_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct shop6 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, false, 0u, 0u, false, 1u, 0u, 1u, 0u, 0u,
     false, 0u, false, 0u, 0u, false, 1u, false};

static void start_and_compare(const char *what, const struct shop6_remembered *r,
                              const struct shop6 *wanted)
{
    struct shop6 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    shop6_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct shop6 m;
    struct shop6_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", shop6_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", shop6_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct shop6 m;
    struct shop6_in in;
    struct shop6_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct shop6 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 1u};

        doing = "room_probe_state upset";
        shop6_start(&m, NULL);
        m.room_probe_state = 4u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 1u};

        doing = "room_probe_state upset";
        shop6_start(&m, NULL);
        m.room_probe_state = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "stage_one upset";
        shop6_start(&m, NULL);
        m.stage_one = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "stage_one upset";
        shop6_start(&m, NULL);
        m.stage_one = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "stage_two upset";
        shop6_start(&m, NULL);
        m.stage_two = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "stage_two upset";
        shop6_start(&m, NULL);
        m.stage_two = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "cool_stage upset";
        shop6_start(&m, NULL);
        m.cool_stage = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "cool_stage upset";
        shop6_start(&m, NULL);
        m.cool_stage = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "heat_one upset";
        shop6_start(&m, NULL);
        m.heat_one = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "heat_one upset";
        shop6_start(&m, NULL);
        m.heat_one = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 0u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "second_waits upset";
        shop6_start(&m, NULL);
        m.second_waits = 3u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 0u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "second_waits upset";
        shop6_start(&m, NULL);
        m.second_waits = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 0u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "run_on upset";
        shop6_start(&m, NULL);
        m.run_on = 3u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 0u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "run_on upset";
        shop6_start(&m, NULL);
        m.run_on = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "heat_two upset";
        shop6_start(&m, NULL);
        m.heat_two = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "heat_two upset";
        shop6_start(&m, NULL);
        m.heat_two = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 0u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "cooling upset";
        shop6_start(&m, NULL);
        m.cooling = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 0u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "cooling upset";
        shop6_start(&m, NULL);
        m.cooling = 255u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "supply_fan upset";
        shop6_start(&m, NULL);
        m.supply_fan = 2u;
        shop6_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct shop6 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, true, 0u, false, 0u, 0u, false, 1u, 1u, 1u, 1u,
     0u, true, 0u, false, 0u, 1u, true, 1u, true};
        static const struct shop6_out wanted =
           {false, false, false, true, 0u};

        doing = "supply_fan upset";
        shop6_start(&m, NULL);
        m.supply_fan = 255u;
        shop6_step(&m, &in, &out);
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
