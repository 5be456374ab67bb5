/* freezer1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Freezer room 1
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 1f8c58c041d92eadc6dae97188ff3a72f4678da398d9ac747ea86898351923fb
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - fan_delay: disc on the coil, holds the fans back while the coil is warm
 *
 * Stays hard-wired, and must:
 * - heater_disc: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, thaw/coil_fan); 2 danger_without_barrier (act,
 * thaw/compressor); 3 danger_without_barrier (act, thaw/defrost_heater); 4 restarts_by_itself (act,
 * coil_fan); 5 restarts_by_itself (act, compressor); 6 fan_stopped_on_fault (act, coil_fan); 7
 * welded_output (act, coil_fan); 8 welded_output (act, compressor); 9 earth_fault_bypasses_limit
 * (act, freezer1); 10 probe_out_of_pocket (act, fan_delay); 11 moisture_direction (act,
 * room_probe); 12 mercury_asbestos_refrigerant (act, fan_delay); 13 mercury_asbestos_refrigerant
 * (act, room_stat); 14 approval_lapses (act, freezer1); 15 limit_trips_late (act,
 * heater_disc/thaw); 16 heat_flow_not_proved (act, coil_fan). Not judged, for want of a figure: 3;
 * risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "freezer1.h"

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

static void compare_out(const struct freezer1_out *got, const struct freezer1_out *wanted)
{
    compare("defrost_heater", (long)got->defrost_heater, (long)wanted->defrost_heater);
    compare("compressor", (long)got->compressor, (long)wanted->compressor);
    compare("coil_fan", (long)got->coil_fan, (long)wanted->coil_fan);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct freezer1 *got, const struct freezer1 *wanted)
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
    compare("fan_delay", (long)got->fan_delay, (long)wanted->fan_delay);
    compare("defrost_at", (long)got->defrost_at, (long)wanted->defrost_at);
    compare("defrost_place", (long)got->defrost_place, (long)wanted->defrost_place);
    compare("defrost_awake", (long)got->defrost_awake, (long)wanted->defrost_awake);
    compare("defrost", (long)got->defrost, (long)wanted->defrost);
    compare("defrost_heater", (long)got->defrost_heater, (long)wanted->defrost_heater);
    compare("drip", (long)got->drip, (long)wanted->drip);
    compare("drip_for", (long)got->drip_for, (long)wanted->drip_for);
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
    compare("coil_fan", (long)got->coil_fan, (long)wanted->coil_fan);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct freezer1_in in;
    struct freezer1_out out;
    struct freezer1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {1u, 0u, 1u, 2602u, 0u, 1u, 0u, 1u,
     2225u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 2u, 0u, 2u,
     2225u, 2225u, 0u, 0u, 3601u, 1u, true, 0u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2225u, 2225u, 0u, 0u, 3602u, 1u, true, 0u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {4u, 1u, 0u, 2602u, 2602u, 4u, 1u, 0u,
     2225u, 2225u, 0u, 0u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {5u, 1u, 1u, 2602u, 2602u, 5u, 1u, 1u,
     2225u, 2225u, 0u, 0u, 3604u, 1u, true, 0u, 0u, 0u, 5u, 0u, 5u, 2602u, 0u, false, 0u}},
    {7u, {false, 2602u, 2225u}, {false, false, false, 0u}, {12u, 1u, 8u, 2602u, 2602u, 12u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3611u, 1u, true, 0u, 0u, 0u, 12u, 0u, 12u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {13u, 1u, 8u, 2602u, 2602u, 13u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3612u, 1u, true, 0u, 0u, 0u, 13u, 0u, 13u, 2602u, 0u, false, 0u}},
    {7u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3619u, 1u, true, 0u, 0u, 0u, 20u, 0u, 20u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3620u, 1u, true, 0u, 0u, 0u, 21u, 0u, 21u, 2602u, 0u, false, 0u}},
    {339u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2225u, 2225u, 0u, 0u, 3959u, 1u, true, 0u, 0u, 0u, 360u, 0u, 360u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3960u, 1u, true, 0u, 0u, 0u, 360u, 0u, 361u, 2602u, 0u, false, 0u}},
    {359u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2225u, 2225u, 0u, 0u, 4319u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 4320u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {2879u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2225u, 2225u, 0u, 0u, 7199u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 7200u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {50399u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2225u, 2225u, 0u, 0u, 57599u, 15u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false,
     0u}},
    {1u, {false, 2602u, 2225u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 0u, 0u, true, 1u, 1u, 2u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    /* vector 2 */
    {720u, {true, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 4319u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 0u, 2225u}, {false, false, false, 0u}, {0u, 2u, 0u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 4320u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    /* vector 3 */
    {7u, {false, 0u, 2225u}, {false, false, false, 0u}, {0u, 0u, 7u, 0u, 0u, 7u, 1u, 3u, 2225u,
     2225u, 0u, 0u, 3606u, 1u, true, 0u, 0u, 0u, 7u, 0u, 7u, 0u, 0u, false, 0u}},
    {1u, {false, 0u, 2225u}, {false, false, false, 1u}, {0u, 3u, 0u, 0u, 0u, 8u, 1u, 4u, 2225u,
     2225u, 0u, 0u, 3607u, 1u, true, 0u, 0u, 0u, 8u, 0u, 8u, 0u, 0u, false, 0u}},
    {1u, {false, 0u, 2225u}, {false, false, false, 1u}, {0u, 3u, 1u, 0u, 0u, 9u, 1u, 5u, 2225u,
     2225u, 0u, 0u, 3608u, 1u, true, 0u, 0u, 0u, 9u, 0u, 9u, 0u, 0u, false, 0u}},
    {1u, {false, 446u, 2225u}, {false, false, false, 1u}, {0u, 3u, 2u, 0u, 0u, 10u, 1u, 6u, 2225u,
     2225u, 0u, 0u, 3609u, 1u, true, 0u, 0u, 0u, 10u, 0u, 10u, 0u, 0u, false, 0u}},
    {1u, {false, 447u, 2225u}, {false, false, false, 1u}, {1u, 3u, 3u, 447u, 0u, 11u, 1u, 7u, 2225u,
     2225u, 0u, 0u, 3610u, 1u, true, 0u, 0u, 0u, 11u, 0u, 11u, 0u, 0u, false, 0u}},
    /* vector 4 */
    {4u, {false, 447u, 2225u}, {false, false, false, 0u}, {4u, 1u, 0u, 447u, 447u, 4u, 1u, 0u,
     2225u, 2225u, 1u, 0u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 447u, 0u, false, 0u}},
    {1u, {false, 447u, 2225u}, {false, false, false, 0u}, {5u, 1u, 1u, 447u, 447u, 5u, 1u, 1u,
     2225u, 2225u, 1u, 0u, 3604u, 1u, true, 0u, 0u, 0u, 5u, 0u, 5u, 447u, 0u, false, 0u}},
    {715u, {false, 447u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 447u, 447u, 20u, 1u, 8u,
     2225u, 2225u, 1u, 0u, 4319u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 447u, 0u, false, 0u}},
    /* vector 5 */
    {4u, {false, 2446u, 2225u}, {false, false, false, 0u}, {4u, 1u, 0u, 2446u, 2446u, 4u, 1u, 0u,
     2225u, 2225u, 1u, 0u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2446u, 0u, false, 0u}},
    /* vector 6 */
    {4u, {false, 2447u, 2225u}, {false, false, false, 0u}, {4u, 1u, 0u, 2447u, 2447u, 4u, 1u, 0u,
     2225u, 2225u, 0u, 0u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2447u, 0u, false, 0u}},
    {1u, {false, 3602u, 2225u}, {false, false, false, 0u}, {5u, 1u, 1u, 3602u, 2447u, 5u, 1u, 1u,
     2225u, 2225u, 0u, 0u, 3604u, 1u, true, 0u, 0u, 0u, 5u, 0u, 5u, 2447u, 0u, false, 0u}},
    {1u, {false, 3603u, 2225u}, {false, false, false, 0u}, {0u, 2u, 0u, 3602u, 2447u, 6u, 1u, 2u,
     2225u, 2225u, 0u, 0u, 3605u, 1u, true, 0u, 0u, 0u, 6u, 0u, 6u, 3602u, 0u, false, 0u}},
    {1u, {false, 2602u, 0u}, {false, false, false, 0u}, {1u, 2u, 1u, 2602u, 3602u, 0u, 2u, 0u,
     2225u, 2225u, 0u, 0u, 3606u, 1u, true, 0u, 0u, 0u, 7u, 0u, 7u, 2602u, 0u, false, 0u}},
    /* vector 7 */
    {1u, {false, 2602u, 0u}, {false, false, false, 0u}, {1u, 0u, 1u, 2602u, 0u, 0u, 0u, 1u, 0u, 0u,
     0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    {6u, {false, 2602u, 0u}, {false, false, false, 0u}, {7u, 1u, 3u, 2602u, 2602u, 0u, 0u, 7u, 0u,
     0u, 0u, 0u, 3606u, 1u, true, 0u, 0u, 0u, 7u, 0u, 7u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 0u}, {false, false, false, 2u}, {8u, 1u, 4u, 2602u, 2602u, 0u, 3u, 0u, 0u,
     0u, 0u, 0u, 3607u, 1u, true, 0u, 0u, 0u, 8u, 0u, 8u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 0u}, {false, false, false, 2u}, {9u, 1u, 5u, 2602u, 2602u, 0u, 3u, 1u, 0u,
     0u, 0u, 0u, 3608u, 1u, true, 0u, 0u, 0u, 9u, 0u, 9u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 487u}, {false, false, false, 2u}, {10u, 1u, 6u, 2602u, 2602u, 0u, 3u, 2u,
     0u, 0u, 0u, 0u, 3609u, 1u, true, 0u, 0u, 0u, 10u, 0u, 10u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 488u}, {false, false, false, 2u}, {11u, 1u, 7u, 2602u, 2602u, 1u, 3u, 3u,
     488u, 0u, 0u, 0u, 3610u, 1u, true, 0u, 0u, 0u, 11u, 0u, 11u, 2602u, 0u, false, 0u}},
    /* vector 8 */
    {4u, {false, 2602u, 2686u}, {false, false, false, 0u}, {4u, 1u, 0u, 2602u, 2602u, 4u, 1u, 0u,
     2686u, 2686u, 0u, 0u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2602u, 0u, false, 0u}},
    /* vector 9 */
    {2u, {false, 2602u, 2687u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 2u, 0u, 2u,
     2687u, 2687u, 0u, 0u, 3601u, 1u, true, 0u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2687u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2687u, 2687u, 0u, 0u, 3602u, 1u, true, 0u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2687u}, {false, false, true, 0u}, {4u, 1u, 0u, 2602u, 2602u, 4u, 1u, 0u,
     2687u, 2687u, 0u, 1u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2602u, 0u, false, 1u}},
    {1u, {false, 2602u, 2687u}, {false, false, true, 0u}, {5u, 1u, 1u, 2602u, 2602u, 5u, 1u, 1u,
     2687u, 2687u, 0u, 1u, 3604u, 1u, true, 0u, 0u, 0u, 5u, 0u, 5u, 2602u, 0u, false, 1u}},
    {53995u, {false, 2602u, 2687u}, {false, false, true, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2687u, 2687u, 0u, 1u, 57599u, 15u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false,
     1u}},
    {1u, {false, 2602u, 2687u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2687u, 2687u, 0u, 1u, 0u, 0u, true, 1u, 1u, 2u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    /* vector 10 */
    {3u, {false, 2602u, 2688u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2688u, 2688u, 0u, 0u, 3602u, 1u, true, 0u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2688u}, {false, false, true, 0u}, {4u, 1u, 0u, 2602u, 2602u, 4u, 1u, 0u,
     2688u, 2688u, 0u, 1u, 3603u, 1u, true, 0u, 0u, 0u, 4u, 0u, 4u, 2602u, 0u, false, 1u}},
    {1u, {false, 2602u, 3849u}, {false, false, true, 0u}, {5u, 1u, 1u, 2602u, 2602u, 5u, 1u, 1u,
     3849u, 2688u, 0u, 1u, 3604u, 1u, true, 0u, 0u, 0u, 5u, 0u, 5u, 2602u, 0u, false, 1u}},
    {1u, {false, 2602u, 3850u}, {false, false, true, 0u}, {6u, 1u, 2u, 2602u, 2602u, 0u, 2u, 0u,
     3849u, 2688u, 0u, 1u, 3605u, 1u, true, 0u, 0u, 0u, 6u, 0u, 6u, 2602u, 0u, false, 1u}},
    /* vector 11 */
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {1u, 0u, 1u, 2602u, 0u, 1u, 0u, 1u,
     2225u, 0u, 0u, 0u, 0u, 0u, true, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 2u, 0u, 2u,
     2225u, 2225u, 0u, 0u, 1u, 0u, true, 1u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2225u, 2225u, 0u, 0u, 2u, 0u, true, 1u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {2u, {false, 2602u, 2225u}, {true, false, false, 0u}, {5u, 1u, 1u, 2602u, 2602u, 5u, 1u, 1u,
     2225u, 2225u, 0u, 0u, 4u, 0u, true, 1u, 1u, 2u, 1u, 0u, 5u, 2602u, 0u, false, 0u}},
    {2995u, {false, 2602u, 2225u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2225u, 2225u, 0u, 0u, 2999u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 3000u, 0u, true, 0u, 0u, 1u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    /* vector 12 */
    {2u, {false, 2602u, 0u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 0u, 0u, 2u, 0u,
     0u, 0u, 0u, 1u, 0u, true, 0u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 0u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 0u, 0u, 3u, 0u,
     0u, 0u, 0u, 2u, 0u, true, 0u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    /* vector 13 */
    {2u, {false, 2602u, 1779u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 2u, 0u, 2u,
     1779u, 1779u, 0u, 0u, 1u, 0u, true, 0u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    /* vector 14 */
    {2u, {false, 2602u, 1780u}, {false, false, false, 0u}, {2u, 0u, 2u, 2602u, 2602u, 2u, 0u, 2u,
     1780u, 1780u, 0u, 0u, 1u, 0u, true, 1u, 0u, 0u, 2u, 0u, 2u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2687u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2687u, 1780u, 0u, 0u, 2u, 0u, true, 1u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {2997u, {false, 2602u, 2687u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 2687u, 2687u, 0u, 1u, 2999u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 2687u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2687u, 2687u, 0u, 1u, 3000u, 0u, true, 0u, 0u, 1u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 447u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 447u, 2602u, 20u, 1u, 8u,
     2225u, 2687u, 0u, 1u, 3001u, 0u, true, 0u, 0u, 1u, 1u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 447u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 447u, 447u, 20u, 1u, 8u,
     2225u, 2225u, 1u, 0u, 3002u, 0u, true, 0u, 0u, 1u, 2u, 0u, 720u, 447u, 0u, false, 0u}},
    {1u, {false, 65535u, 65535u}, {false, false, false, 0u}, {0u, 2u, 0u, 447u, 447u, 0u, 2u, 0u,
     2225u, 2225u, 1u, 0u, 3003u, 0u, true, 0u, 0u, 1u, 3u, 0u, 720u, 447u, 0u, false, 0u}},
    {1u, {false, 65535u, 65535u}, {false, false, false, 0u}, {0u, 2u, 1u, 447u, 447u, 0u, 2u, 1u,
     2225u, 2225u, 1u, 0u, 3004u, 0u, true, 0u, 0u, 1u, 4u, 0u, 720u, 447u, 0u, false, 0u}},
    {2u, {false, 65535u, 65535u}, {false, false, false, 0u}, {0u, 2u, 3u, 447u, 447u, 0u, 2u, 3u,
     2225u, 2225u, 1u, 0u, 3006u, 0u, true, 0u, 0u, 1u, 6u, 0u, 720u, 447u, 0u, false, 0u}},
    {1u, {false, 65535u, 65535u}, {false, false, false, 3u}, {0u, 3u, 0u, 447u, 447u, 0u, 3u, 0u,
     2225u, 2225u, 0u, 0u, 3007u, 0u, true, 0u, 0u, 1u, 7u, 0u, 720u, 447u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 3u}, {1u, 3u, 1u, 2602u, 447u, 0u, 3u, 1u,
     2225u, 2225u, 0u, 0u, 3008u, 0u, true, 0u, 0u, 1u, 8u, 0u, 720u, 447u, 0u, false, 0u}},
    {2u, {false, 65535u, 65535u}, {false, false, false, 3u}, {0u, 3u, 3u, 2602u, 447u, 0u, 3u, 3u,
     2225u, 2225u, 0u, 0u, 3010u, 0u, true, 0u, 0u, 1u, 10u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 65535u, 2224u}, {false, false, false, 3u}, {0u, 3u, 4u, 2602u, 447u, 1u, 3u, 4u,
     2224u, 2225u, 0u, 0u, 3011u, 0u, true, 0u, 0u, 1u, 11u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {true, 2525u, 1779u}, {false, false, false, 3u}, {1u, 3u, 5u, 2525u, 2602u, 2u, 3u, 5u,
     1779u, 2224u, 0u, 0u, 3012u, 0u, true, 0u, 0u, 1u, 12u, 0u, 720u, 2525u, 0u, false, 0u}},
    {1u, {true, 0u, 1779u}, {false, false, false, 3u}, {0u, 3u, 6u, 2525u, 2602u, 3u, 3u, 6u, 1779u,
     1779u, 0u, 0u, 3013u, 0u, true, 0u, 0u, 1u, 13u, 0u, 720u, 2525u, 0u, false, 0u}},
    {1u, {true, 2599u, 1779u}, {false, false, false, 3u}, {1u, 3u, 7u, 2599u, 2525u, 4u, 3u, 7u,
     1779u, 1779u, 0u, 0u, 3014u, 0u, true, 0u, 0u, 1u, 14u, 0u, 720u, 2599u, 0u, false, 0u}},
    {15u, {true, 2599u, 1779u}, {false, false, false, 3u}, {16u, 3u, 8u, 2599u, 2599u, 19u, 3u, 8u,
     1779u, 1779u, 0u, 0u, 3029u, 0u, true, 0u, 0u, 1u, 29u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 1779u}, {false, false, false, 1u}, {17u, 3u, 8u, 2599u, 2599u, 20u, 1u, 0u,
     1779u, 1779u, 0u, 0u, 3030u, 0u, true, 0u, 0u, 1u, 30u, 0u, 720u, 2599u, 0u, false, 0u}},
    {2u, {true, 2599u, 1779u}, {false, false, false, 1u}, {19u, 3u, 8u, 2599u, 2599u, 20u, 1u, 2u,
     1779u, 1779u, 0u, 0u, 3032u, 0u, true, 0u, 0u, 1u, 32u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 1779u}, {false, false, false, 0u}, {20u, 1u, 0u, 2599u, 2599u, 20u, 1u, 3u,
     1779u, 1779u, 0u, 0u, 3033u, 0u, true, 0u, 0u, 1u, 33u, 0u, 720u, 2599u, 0u, false, 0u}},
    {3u, {false, 2680u, 65535u}, {false, false, false, 0u}, {20u, 1u, 3u, 2680u, 2680u, 0u, 2u, 2u,
     1779u, 1779u, 0u, 0u, 3036u, 0u, true, 0u, 0u, 1u, 36u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2679u, 65535u}, {false, false, false, 0u}, {20u, 1u, 4u, 2679u, 2680u, 0u, 2u, 3u,
     1779u, 1779u, 0u, 0u, 3037u, 0u, true, 0u, 0u, 1u, 37u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 5u, 2602u, 2679u, 0u, 3u, 0u,
     1779u, 1779u, 0u, 0u, 3038u, 0u, true, 0u, 0u, 1u, 38u, 0u, 720u, 2679u, 0u, false, 0u}},
    {19u, {true, 2599u, 1779u}, {false, false, false, 2u}, {20u, 1u, 8u, 2599u, 2599u, 19u, 3u, 8u,
     1779u, 1779u, 0u, 0u, 3057u, 0u, true, 0u, 0u, 1u, 57u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 1779u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 20u, 1u, 0u,
     1779u, 1779u, 0u, 0u, 3058u, 0u, true, 0u, 0u, 1u, 58u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2599u, 1779u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 20u, 1u, 1u,
     1779u, 1779u, 0u, 0u, 3059u, 0u, true, 0u, 0u, 1u, 59u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 0u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 0u, 2u, 0u,
     1779u, 1779u, 0u, 0u, 3060u, 0u, true, 0u, 0u, 1u, 60u, 0u, 720u, 2599u, 0u, false, 0u}},
    {3u, {false, 2599u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 3u, 2u, 3u,
     489u, 489u, 0u, 0u, 3063u, 0u, true, 0u, 0u, 1u, 63u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2599u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 4u, 1u, 0u,
     489u, 489u, 0u, 0u, 3064u, 0u, true, 0u, 0u, 1u, 64u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2523u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2599u, 0u, 2u, 0u,
     489u, 489u, 0u, 0u, 3065u, 0u, true, 0u, 0u, 1u, 65u, 0u, 720u, 2599u, 0u, false, 0u}},
    {2u, {false, 2523u, 2687u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2523u, 2u, 2u, 2u,
     2687u, 2687u, 0u, 0u, 3067u, 0u, true, 0u, 0u, 1u, 67u, 0u, 720u, 2523u, 0u, false, 0u}},
    {2u, {false, 2599u, 2686u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 4u, 1u, 0u,
     2686u, 2686u, 0u, 0u, 3069u, 0u, true, 0u, 0u, 1u, 69u, 0u, 720u, 2599u, 0u, false, 0u}},
    {4u, {false, 2602u, 65535u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 2u, 3u,
     2686u, 2686u, 0u, 0u, 3073u, 0u, true, 0u, 0u, 1u, 73u, 0u, 720u, 2602u, 0u, false, 0u}},
    {286u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u,
     8u, 2686u, 2686u, 0u, 0u, 3359u, 0u, true, 0u, 0u, 1u, 359u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 3360u, 0u, true, 0u, 0u, 0u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    {428u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u,
     8u, 2686u, 2686u, 0u, 0u, 3788u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {4u, {false, 65535u, 65535u}, {false, false, false, 2u}, {0u, 2u, 3u, 2602u, 2602u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 3792u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {2277u, {false, 65535u, 65535u}, {false, false, false, 3u}, {0u, 3u, 8u, 2602u, 2602u, 0u, 3u,
     8u, 2686u, 2686u, 0u, 0u, 6069u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2603u, 65535u}, {false, false, false, 3u}, {1u, 3u, 8u, 2603u, 2602u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6070u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2524u, 65535u}, {false, false, false, 3u}, {2u, 3u, 8u, 2524u, 2603u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6071u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {3u, {false, 2680u, 65535u}, {false, false, false, 3u}, {5u, 3u, 8u, 2680u, 2680u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6074u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2679u, 65535u}, {false, false, false, 3u}, {6u, 3u, 8u, 2679u, 2680u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6075u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 3u}, {7u, 3u, 8u, 2602u, 2679u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6076u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2679u, 0u, false, 0u}},
    {12u, {false, 448u, 65535u}, {false, false, false, 3u}, {19u, 3u, 8u, 448u, 448u, 0u, 3u, 8u,
     2686u, 2686u, 0u, 0u, 6088u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {52u, {false, 448u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 448u, 448u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6140u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 448u, 448u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6141u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 449u, 448u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6142u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {true, 449u, 65535u}, {false, false, false, 2u}, {2u, 2u, 2u, 449u, 449u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6143u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 65535u}, {false, false, false, 2u}, {3u, 2u, 3u, 449u, 449u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6144u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 2445u, 65535u}, {false, false, false, 2u}, {4u, 1u, 0u, 2445u, 449u, 0u, 3u, 8u,
     2686u, 2686u, 1u, 0u, 6145u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    /* vector 15 */
    {2u, {false, 2446u, 2225u}, {false, false, false, 0u}, {2u, 0u, 2u, 2446u, 2446u, 2u, 0u, 2u,
     2225u, 2225u, 0u, 0u, 1u, 0u, true, 1u, 0u, 0u, 2u, 0u, 2u, 2446u, 0u, false, 0u}},
    {5u, {false, 2446u, 65535u}, {false, false, false, 0u}, {7u, 1u, 3u, 2446u, 2446u, 0u, 0u, 7u,
     2225u, 2225u, 1u, 0u, 6u, 0u, true, 1u, 0u, 0u, 7u, 0u, 7u, 2446u, 0u, false, 0u}},
    {1u, {false, 2446u, 2224u}, {false, false, false, 2u}, {8u, 1u, 4u, 2446u, 2446u, 1u, 3u, 0u,
     2224u, 2225u, 1u, 0u, 7u, 0u, true, 1u, 0u, 0u, 8u, 0u, 8u, 2446u, 0u, false, 0u}},
    {18u, {false, 2445u, 2224u}, {false, false, false, 2u}, {20u, 1u, 8u, 2445u, 2445u, 19u, 3u, 8u,
     2224u, 2224u, 1u, 0u, 25u, 0u, true, 1u, 0u, 0u, 26u, 0u, 26u, 2445u, 0u, false, 0u}},
    {694u, {false, 2445u, 2224u}, {true, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     2224u, 2224u, 1u, 0u, 719u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2445u, 0u, false, 0u}},
    {1u, {true, 2447u, 2226u}, {true, false, false, 0u}, {20u, 1u, 8u, 2447u, 2445u, 20u, 1u, 8u,
     2226u, 2224u, 1u, 0u, 720u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2445u, 0u, false, 0u}},
    {1u, {true, 3602u, 487u}, {true, false, false, 0u}, {20u, 1u, 8u, 3602u, 2447u, 0u, 2u, 0u,
     2226u, 2224u, 1u, 0u, 721u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2447u, 0u, false, 0u}},
    {1u, {true, 3601u, 2224u}, {true, false, false, 0u}, {20u, 1u, 8u, 3601u, 3602u, 1u, 2u, 1u,
     2224u, 2226u, 0u, 0u, 722u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 3601u, 0u, false, 0u}},
    {8u, {false, 2602u, 2687u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 9u, 1u, 5u,
     2687u, 2687u, 0u, 1u, 730u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 1779u}, {true, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 10u, 1u, 6u,
     1779u, 2687u, 0u, 1u, 731u, 0u, true, 1u, 1u, 2u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 1779u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 11u, 1u, 7u,
     1779u, 1779u, 0u, 0u, 732u, 0u, true, 0u, 0u, 1u, 0u, 0u, 720u, 2602u, 0u, false, 0u}},
    {2u, {true, 448u, 2224u}, {false, false, false, 0u}, {20u, 1u, 8u, 448u, 448u, 13u, 1u, 8u,
     2224u, 2224u, 1u, 0u, 734u, 0u, true, 0u, 0u, 1u, 2u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 2445u, 2688u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 448u, 14u, 1u, 8u,
     2688u, 2224u, 1u, 0u, 735u, 0u, true, 0u, 0u, 1u, 3u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 2446u, 2688u}, {false, false, false, 0u}, {20u, 1u, 8u, 2446u, 2445u, 15u, 1u, 8u,
     2688u, 2688u, 1u, 1u, 736u, 0u, true, 0u, 0u, 1u, 4u, 0u, 720u, 2445u, 0u, false, 0u}},
    {1u, {true, 2446u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 2446u, 2446u, 0u, 2u, 0u,
     2688u, 2688u, 1u, 1u, 737u, 0u, true, 0u, 0u, 1u, 5u, 0u, 720u, 2446u, 0u, false, 0u}},
    {3u, {true, 2604u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 2604u, 2604u, 0u, 2u, 3u,
     2688u, 2688u, 0u, 1u, 740u, 0u, true, 0u, 0u, 1u, 8u, 0u, 720u, 2604u, 0u, false, 0u}},
    {1u, {true, 2604u, 487u}, {false, false, false, 2u}, {20u, 1u, 8u, 2604u, 2604u, 0u, 3u, 0u,
     2688u, 2688u, 0u, 0u, 741u, 0u, true, 0u, 0u, 1u, 9u, 0u, 720u, 2604u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2604u, 0u, 3u, 1u,
     2688u, 2688u, 0u, 0u, 742u, 0u, true, 0u, 0u, 1u, 10u, 0u, 720u, 2604u, 0u, false, 0u}},
    {512u, {false, 448u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 448u, 448u, 0u, 3u, 8u,
     2688u, 2688u, 1u, 0u, 1254u, 0u, true, 0u, 0u, 0u, 162u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 448u, 448u, 0u, 3u, 8u,
     2688u, 2688u, 1u, 0u, 1255u, 0u, true, 0u, 0u, 0u, 163u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 449u, 448u, 0u, 3u, 8u,
     2688u, 2688u, 1u, 0u, 1256u, 0u, true, 0u, 0u, 0u, 164u, 0u, 720u, 448u, 0u, false, 0u}},
    {2u, {true, 449u, 65535u}, {false, false, false, 2u}, {3u, 2u, 3u, 449u, 449u, 0u, 3u, 8u,
     2688u, 2688u, 1u, 0u, 1258u, 0u, true, 0u, 0u, 0u, 166u, 0u, 720u, 449u, 0u, false, 0u}},
    {19u, {true, 449u, 1780u}, {false, false, false, 2u}, {20u, 1u, 8u, 449u, 449u, 19u, 3u, 8u,
     1780u, 1780u, 1u, 0u, 1277u, 0u, true, 0u, 0u, 0u, 185u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 1780u}, {false, true, false, 0u}, {20u, 1u, 8u, 449u, 449u, 20u, 1u, 0u,
     1780u, 1780u, 1u, 0u, 1278u, 0u, true, 0u, 0u, 0u, 186u, 1u, 0u, 449u, 0u, false, 0u}},
    {1u, {true, 65535u, 1780u}, {false, true, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 1u,
     1780u, 1780u, 1u, 0u, 1279u, 0u, true, 0u, 0u, 0u, 187u, 1u, 1u, 449u, 1u, false, 0u}},
    {2u, {true, 2445u, 1780u}, {false, true, false, 0u}, {2u, 2u, 2u, 2445u, 2445u, 20u, 1u, 3u,
     1780u, 1780u, 1u, 0u, 1281u, 0u, true, 0u, 0u, 0u, 189u, 1u, 3u, 2445u, 0u, false, 0u}},
    {2u, {true, 2602u, 1780u}, {false, true, false, 0u}, {4u, 1u, 0u, 2602u, 2602u, 20u, 1u, 5u,
     1780u, 1780u, 1u, 0u, 1283u, 0u, true, 0u, 0u, 0u, 191u, 1u, 5u, 2602u, 0u, false, 0u}},
    {1u, {true, 2602u, 3850u}, {false, true, false, 0u}, {5u, 1u, 1u, 2602u, 2602u, 0u, 2u, 0u,
     1780u, 1780u, 1u, 0u, 1284u, 0u, true, 0u, 0u, 0u, 192u, 1u, 6u, 2602u, 1u, false, 0u}},
    {1u, {false, 447u, 1780u}, {false, false, false, 0u}, {6u, 1u, 2u, 447u, 2602u, 1u, 2u, 1u,
     1780u, 1780u, 1u, 0u, 1285u, 0u, true, 0u, 0u, 0u, 193u, 0u, 0u, 2602u, 2u, false, 0u}},
    {2u, {true, 448u, 3848u}, {false, false, false, 0u}, {8u, 1u, 4u, 448u, 448u, 3u, 2u, 3u, 3848u,
     3848u, 1u, 0u, 1287u, 0u, true, 0u, 0u, 0u, 195u, 0u, 2u, 448u, 0u, false, 0u}},
    {1u, {true, 448u, 3848u}, {false, false, true, 0u}, {9u, 1u, 5u, 448u, 448u, 4u, 1u, 0u, 3848u,
     3848u, 1u, 1u, 1288u, 0u, true, 0u, 0u, 0u, 196u, 0u, 3u, 448u, 0u, false, 1u}},
    {1u, {false, 2602u, 65535u}, {false, false, true, 0u}, {10u, 1u, 6u, 2602u, 448u, 0u, 2u, 0u,
     3848u, 3848u, 1u, 1u, 1289u, 0u, true, 0u, 0u, 0u, 197u, 0u, 4u, 448u, 0u, false, 1u}},
    {3u, {false, 448u, 65535u}, {false, false, true, 0u}, {13u, 1u, 8u, 448u, 448u, 0u, 2u, 3u,
     3848u, 3848u, 1u, 1u, 1292u, 0u, true, 0u, 0u, 0u, 200u, 0u, 7u, 448u, 0u, false, 1u}},
    {1u, {false, 448u, 65535u}, {false, false, false, 2u}, {14u, 1u, 8u, 448u, 448u, 0u, 3u, 0u,
     3848u, 3848u, 1u, 0u, 1293u, 0u, true, 0u, 0u, 0u, 201u, 0u, 8u, 448u, 0u, false, 0u}},
    {4092u, {false, 448u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 448u, 448u, 0u, 3u, 8u,
     3848u, 3848u, 1u, 0u, 5385u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 448u, 448u, 0u, 3u, 8u,
     3848u, 3848u, 1u, 0u, 5386u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 449u, 448u, 0u, 3u, 8u,
     3848u, 3848u, 1u, 0u, 5387u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {2u, {true, 449u, 65535u}, {false, false, false, 2u}, {3u, 2u, 3u, 449u, 449u, 0u, 3u, 8u,
     3848u, 3848u, 1u, 0u, 5389u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {19u, {true, 449u, 1780u}, {false, false, false, 2u}, {20u, 1u, 8u, 449u, 449u, 19u, 3u, 8u,
     1780u, 1780u, 1u, 0u, 5408u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 1780u}, {false, true, false, 0u}, {20u, 1u, 8u, 449u, 449u, 20u, 1u, 0u,
     1780u, 1780u, 1u, 0u, 5409u, 1u, true, 0u, 0u, 0u, 360u, 1u, 0u, 449u, 0u, false, 0u}},
    {1u, {true, 65535u, 1780u}, {false, true, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 1u,
     1780u, 1780u, 1u, 0u, 5410u, 1u, true, 0u, 0u, 0u, 360u, 1u, 1u, 449u, 1u, false, 0u}},
    {3u, {true, 446u, 1780u}, {false, true, false, 0u}, {0u, 2u, 3u, 449u, 449u, 20u, 1u, 4u, 1780u,
     1780u, 1u, 0u, 5413u, 1u, true, 0u, 0u, 0u, 360u, 1u, 4u, 449u, 4u, false, 0u}},
    {1u, {true, 446u, 1780u}, {false, false, false, 1u}, {0u, 3u, 0u, 449u, 449u, 20u, 1u, 5u,
     1780u, 1780u, 0u, 0u, 5414u, 1u, true, 0u, 0u, 0u, 360u, 0u, 0u, 449u, 5u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 1u}, {1u, 3u, 1u, 2602u, 449u, 0u, 2u, 0u,
     1780u, 1780u, 0u, 0u, 5415u, 1u, true, 0u, 0u, 0u, 360u, 0u, 1u, 449u, 0u, false, 0u}},
    {3u, {false, 65535u, 65535u}, {false, false, false, 1u}, {0u, 3u, 4u, 2602u, 449u, 0u, 2u, 3u,
     1780u, 1780u, 0u, 0u, 5418u, 1u, true, 0u, 0u, 0u, 360u, 0u, 4u, 2602u, 0u, false, 0u}},
    {2278u, {false, 65535u, 65535u}, {false, false, false, 3u}, {0u, 3u, 8u, 2602u, 449u, 0u, 3u,
     8u, 1780u, 1780u, 0u, 0u, 7696u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2603u, 65535u}, {false, false, false, 3u}, {1u, 3u, 8u, 2603u, 2602u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7697u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2524u, 65535u}, {false, false, false, 3u}, {2u, 3u, 8u, 2524u, 2603u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7698u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {3u, {false, 2680u, 65535u}, {false, false, false, 3u}, {5u, 3u, 8u, 2680u, 2680u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7701u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2679u, 65535u}, {false, false, false, 3u}, {6u, 3u, 8u, 2679u, 2680u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7702u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 3u}, {7u, 3u, 8u, 2602u, 2679u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7703u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2679u, 0u, false, 0u}},
    {1u, {false, 448u, 65535u}, {false, false, false, 3u}, {8u, 3u, 8u, 448u, 2602u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7704u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 3u}, {0u, 3u, 8u, 448u, 2602u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7705u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 3u}, {1u, 3u, 8u, 449u, 448u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7706u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {2u, {true, 449u, 65535u}, {false, false, false, 3u}, {3u, 3u, 8u, 449u, 449u, 0u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7708u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {16u, {true, 449u, 1780u}, {false, false, false, 3u}, {19u, 3u, 8u, 449u, 449u, 16u, 3u, 8u,
     1780u, 1780u, 0u, 0u, 7724u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {3u, {true, 449u, 1780u}, {false, false, false, 2u}, {20u, 1u, 2u, 449u, 449u, 19u, 3u, 8u,
     1780u, 1780u, 1u, 0u, 7727u, 2u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 1780u}, {false, true, false, 0u}, {20u, 1u, 3u, 449u, 449u, 20u, 1u, 0u,
     1780u, 1780u, 1u, 0u, 7728u, 2u, true, 0u, 0u, 0u, 360u, 1u, 0u, 449u, 0u, false, 0u}},
    {1u, {true, 65535u, 1780u}, {false, true, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 1u,
     1780u, 1780u, 1u, 0u, 7729u, 2u, true, 0u, 0u, 0u, 360u, 1u, 1u, 449u, 1u, false, 0u}},
    {3u, {true, 2445u, 1780u}, {false, true, false, 0u}, {3u, 2u, 3u, 2445u, 2445u, 20u, 1u, 4u,
     1780u, 1780u, 1u, 0u, 7732u, 2u, true, 0u, 0u, 0u, 360u, 1u, 4u, 2445u, 1u, false, 0u}},
    {1u, {true, 2602u, 1780u}, {false, true, false, 0u}, {4u, 1u, 0u, 2602u, 2445u, 20u, 1u, 5u,
     1780u, 1780u, 1u, 0u, 7733u, 2u, true, 0u, 0u, 0u, 360u, 1u, 5u, 2445u, 2u, false, 0u}},
    {1u, {true, 2367u, 1780u}, {false, true, false, 0u}, {5u, 1u, 1u, 2367u, 2602u, 20u, 1u, 6u,
     1780u, 1780u, 1u, 0u, 7734u, 2u, true, 0u, 0u, 0u, 360u, 1u, 6u, 2445u, 3u, false, 0u}},
    {1u, {true, 2526u, 1780u}, {false, true, false, 0u}, {6u, 1u, 2u, 2526u, 2367u, 20u, 1u, 7u,
     1780u, 1780u, 1u, 0u, 7735u, 2u, true, 0u, 0u, 0u, 360u, 1u, 7u, 2526u, 0u, false, 0u}},
    {1u, {true, 2526u, 3848u}, {false, true, false, 0u}, {7u, 1u, 3u, 2526u, 2526u, 20u, 1u, 8u,
     3848u, 1780u, 1u, 0u, 7736u, 2u, true, 0u, 0u, 0u, 360u, 1u, 8u, 2526u, 1u, false, 0u}},
    {2u, {true, 3602u, 3848u}, {false, true, true, 0u}, {9u, 1u, 5u, 3602u, 3602u, 20u, 1u, 8u,
     3848u, 3848u, 0u, 1u, 7738u, 2u, true, 0u, 0u, 0u, 360u, 1u, 10u, 3602u, 0u, false, 1u}},
    {1u, {true, 2445u, 1780u}, {false, true, true, 0u}, {10u, 1u, 6u, 2445u, 3602u, 20u, 1u, 8u,
     1780u, 3848u, 0u, 1u, 7739u, 2u, true, 0u, 0u, 0u, 360u, 1u, 11u, 3602u, 1u, false, 1u}},
    {1u, {true, 2445u, 1780u}, {false, true, false, 0u}, {11u, 1u, 7u, 2445u, 2445u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 7740u, 2u, true, 0u, 0u, 0u, 360u, 1u, 12u, 2445u, 2u, false, 0u}},
    {1u, {true, 2445u, 1780u}, {false, true, false, 0u}, {12u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 7741u, 2u, true, 0u, 0u, 0u, 360u, 1u, 13u, 2445u, 3u, false, 0u}},
    {1u, {true, 2446u, 1780u}, {false, true, false, 0u}, {13u, 1u, 8u, 2446u, 2445u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 7742u, 2u, true, 0u, 0u, 0u, 360u, 1u, 14u, 2445u, 4u, false, 0u}},
    {1u, {true, 2602u, 1780u}, {false, true, false, 0u}, {14u, 1u, 8u, 2602u, 2446u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 7743u, 2u, true, 0u, 0u, 0u, 360u, 1u, 15u, 2445u, 5u, false, 0u}},
    {345u, {true, 2602u, 1779u}, {false, true, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     1779u, 1779u, 1u, 0u, 8088u, 2u, true, 0u, 0u, 0u, 360u, 1u, 360u, 2602u, 344u, false, 0u}},
    {4u, {true, 2602u, 3850u}, {false, true, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 2u, 3u,
     1779u, 1779u, 1u, 0u, 8092u, 2u, true, 0u, 0u, 0u, 360u, 1u, 364u, 2602u, 348u, false, 0u}},
    {1u, {true, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u, 0u,
     1779u, 1779u, 1u, 0u, 8093u, 2u, true, 0u, 0u, 0u, 360u, 0u, 0u, 2602u, 349u, false, 0u}},
    {1u, {false, 2679u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2679u, 2602u, 0u, 3u, 1u,
     1779u, 1779u, 1u, 0u, 8094u, 2u, true, 0u, 0u, 0u, 360u, 0u, 1u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2679u, 0u, 3u, 2u,
     1779u, 1779u, 1u, 0u, 8095u, 2u, true, 0u, 0u, 0u, 360u, 0u, 2u, 2602u, 0u, false, 0u}},
    {4096u, {false, 448u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 448u, 448u, 0u, 3u, 8u,
     1779u, 1779u, 1u, 0u, 12191u, 3u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 448u, 448u, 0u, 3u, 8u,
     1779u, 1779u, 1u, 0u, 12192u, 3u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 449u, 448u, 0u, 3u, 8u,
     1779u, 1779u, 1u, 0u, 12193u, 3u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {2u, {true, 449u, 65535u}, {false, false, false, 2u}, {3u, 2u, 3u, 449u, 449u, 0u, 3u, 8u,
     1779u, 1779u, 1u, 0u, 12195u, 3u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {19u, {true, 449u, 1780u}, {false, false, false, 2u}, {20u, 1u, 8u, 449u, 449u, 19u, 3u, 8u,
     1780u, 1780u, 1u, 0u, 12214u, 3u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 1780u}, {false, true, false, 0u}, {20u, 1u, 8u, 449u, 449u, 20u, 1u, 0u,
     1780u, 1780u, 1u, 0u, 12215u, 3u, true, 0u, 0u, 0u, 360u, 1u, 0u, 449u, 0u, false, 0u}},
    {1u, {true, 65535u, 1780u}, {false, true, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 1u,
     1780u, 1780u, 1u, 0u, 12216u, 3u, true, 0u, 0u, 0u, 360u, 1u, 1u, 449u, 1u, false, 0u}},
    {3u, {true, 2445u, 1780u}, {false, true, false, 0u}, {3u, 2u, 3u, 2445u, 2445u, 20u, 1u, 4u,
     1780u, 1780u, 1u, 0u, 12219u, 3u, true, 0u, 0u, 0u, 360u, 1u, 4u, 2445u, 1u, false, 0u}},
    {1u, {true, 2446u, 1780u}, {false, true, false, 0u}, {4u, 1u, 0u, 2446u, 2445u, 20u, 1u, 5u,
     1780u, 1780u, 1u, 0u, 12220u, 3u, true, 0u, 0u, 0u, 360u, 1u, 5u, 2445u, 2u, false, 0u}},
    {1u, {true, 2602u, 1780u}, {false, true, false, 0u}, {5u, 1u, 1u, 2602u, 2446u, 20u, 1u, 6u,
     1780u, 1780u, 1u, 0u, 12221u, 3u, true, 0u, 0u, 0u, 360u, 1u, 6u, 2445u, 3u, false, 0u}},
    {28756u, {true, 2602u, 1779u}, {false, true, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 1779u, 1779u, 1u, 0u, 40977u, 11u, true, 0u, 0u, 0u, 360u, 1u, 720u, 2602u, 28755u, false,
     0u}},
    {1u, {true, 2602u, 1779u}, {false, false, false, 4u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     1779u, 1779u, 1u, 0u, 40978u, 11u, true, 0u, 0u, 0u, 360u, 0u, 0u, 2602u, 28756u, true, 0u}},
    {1u, {false, 2602u, 3849u}, {false, false, false, 4u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     3849u, 1779u, 1u, 0u, 40979u, 11u, true, 0u, 0u, 0u, 360u, 0u, 1u, 2602u, 0u, true, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 4u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     2225u, 3849u, 1u, 0u, 40980u, 11u, true, 0u, 0u, 0u, 360u, 0u, 2u, 2602u, 0u, true, 0u}},
    {1u, {false, 2602u, 3848u}, {false, false, true, 4u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u, 8u,
     3848u, 2225u, 1u, 1u, 40981u, 11u, true, 0u, 0u, 0u, 360u, 0u, 3u, 2602u, 0u, true, 1u}},
    {1u, {true, 2603u, 2685u}, {false, false, true, 4u}, {20u, 1u, 8u, 2603u, 2602u, 20u, 1u, 8u,
     2685u, 3848u, 1u, 1u, 40982u, 11u, true, 0u, 0u, 0u, 360u, 0u, 4u, 2602u, 0u, true, 1u}},
    {1u, {true, 2602u, 2685u}, {false, false, true, 4u}, {20u, 1u, 8u, 2602u, 2603u, 20u, 1u, 8u,
     2685u, 2685u, 1u, 1u, 40983u, 11u, true, 0u, 0u, 0u, 360u, 0u, 5u, 2602u, 0u, true, 1u}},
    {1u, {false, 3601u, 2685u}, {false, false, true, 4u}, {20u, 1u, 8u, 3601u, 2602u, 20u, 1u, 8u,
     2685u, 2685u, 0u, 1u, 40984u, 11u, true, 0u, 0u, 0u, 360u, 0u, 6u, 2603u, 0u, true, 1u}},
    /* vector 16 */
    {3000u, {false, 2602u, 488u}, {false, false, false, 0u}, {20u, 1u, 8u, 2602u, 2602u, 20u, 1u,
     8u, 488u, 488u, 0u, 0u, 2999u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {true, 448u, 488u}, {false, false, false, 0u}, {20u, 1u, 8u, 448u, 2602u, 20u, 1u, 8u,
     488u, 488u, 0u, 0u, 3000u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {361u, {true, 448u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 448u, 448u, 20u, 1u, 8u,
     488u, 488u, 1u, 0u, 3361u, 0u, true, 0u, 0u, 0u, 360u, 1u, 360u, 448u, 360u, false, 0u}},
    {1u, {true, 2604u, 2688u}, {false, true, false, 0u}, {20u, 1u, 8u, 2604u, 448u, 20u, 1u, 8u,
     2688u, 488u, 1u, 0u, 3362u, 0u, true, 0u, 0u, 0u, 360u, 1u, 361u, 448u, 361u, false, 0u}},
    {1u, {true, 2604u, 2688u}, {false, false, true, 0u}, {20u, 1u, 8u, 2604u, 2604u, 20u, 1u, 8u,
     2688u, 2688u, 0u, 1u, 3363u, 0u, true, 0u, 0u, 0u, 360u, 0u, 0u, 2604u, 0u, false, 1u}},
    {1u, {false, 2599u, 1779u}, {false, false, true, 0u}, {20u, 1u, 8u, 2599u, 2604u, 20u, 1u, 8u,
     1779u, 2688u, 0u, 1u, 3364u, 0u, true, 0u, 0u, 0u, 360u, 0u, 1u, 2604u, 0u, false, 1u}},
    {1u, {true, 2599u, 0u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 0u, 2u, 0u,
     1779u, 2688u, 0u, 0u, 3365u, 0u, true, 0u, 0u, 0u, 360u, 0u, 2u, 2599u, 0u, false, 0u}},
    {4u, {false, 2599u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 4u, 1u, 0u,
     489u, 489u, 0u, 0u, 3369u, 0u, true, 0u, 0u, 0u, 360u, 0u, 6u, 2599u, 0u, false, 0u}},
    {2253u, {false, 2523u, 489u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2523u, 20u, 1u,
     8u, 489u, 489u, 0u, 0u, 5622u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2523u, 0u, false, 0u}},
    {1u, {false, 2523u, 487u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2523u, 0u, 2u, 0u,
     489u, 489u, 0u, 0u, 5623u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2523u, 0u, false, 0u}},
    {2u, {false, 2523u, 2687u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2523u, 2u, 2u, 2u,
     2687u, 2687u, 0u, 0u, 5625u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2523u, 0u, false, 0u}},
    {1u, {false, 2523u, 2686u}, {false, false, false, 0u}, {20u, 1u, 8u, 2523u, 2523u, 3u, 2u, 3u,
     2686u, 2687u, 0u, 0u, 5626u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2523u, 0u, false, 0u}},
    {1u, {false, 2599u, 2686u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2523u, 4u, 1u, 0u,
     2686u, 2686u, 0u, 0u, 5627u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2523u, 0u, false, 0u}},
    {1u, {false, 2599u, 65535u}, {false, false, false, 0u}, {20u, 1u, 8u, 2599u, 2599u, 0u, 2u, 0u,
     2686u, 2686u, 0u, 0u, 5628u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2676u, 65535u}, {false, false, false, 0u}, {20u, 1u, 8u, 2676u, 2599u, 0u, 2u, 1u,
     2686u, 2686u, 0u, 0u, 5629u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2445u, 65535u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2676u, 0u, 2u, 2u,
     2686u, 2686u, 0u, 0u, 5630u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2445u, 65535u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 0u, 2u, 3u,
     2686u, 2686u, 1u, 0u, 5631u, 1u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2445u, 0u, false, 0u}},
    /* vector 17 */
    {3u, {false, 2602u, 2225u}, {false, false, false, 0u}, {3u, 0u, 3u, 2602u, 2602u, 3u, 0u, 3u,
     2225u, 2225u, 0u, 0u, 2u, 0u, true, 1u, 0u, 0u, 3u, 0u, 3u, 2602u, 0u, false, 0u}},
    {5u, {false, 2602u, 2225u}, {true, false, false, 0u}, {8u, 1u, 4u, 2602u, 2602u, 8u, 1u, 4u,
     2225u, 2225u, 0u, 0u, 7u, 0u, true, 1u, 1u, 2u, 4u, 0u, 8u, 2602u, 0u, false, 0u}},
    {1u, {false, 2602u, 0u}, {true, false, false, 0u}, {9u, 1u, 5u, 2602u, 2602u, 0u, 2u, 0u, 2225u,
     2225u, 0u, 0u, 8u, 0u, true, 1u, 1u, 2u, 5u, 0u, 9u, 2602u, 0u, false, 0u}},
    {1u, {false, 65535u, 1780u}, {true, false, false, 0u}, {0u, 2u, 0u, 2602u, 2602u, 1u, 2u, 1u,
     1780u, 2225u, 0u, 0u, 9u, 0u, true, 1u, 1u, 2u, 6u, 0u, 10u, 2602u, 0u, false, 0u}},
    {1u, {false, 447u, 487u}, {true, false, false, 0u}, {1u, 2u, 1u, 447u, 2602u, 0u, 2u, 2u, 1780u,
     2225u, 0u, 0u, 10u, 0u, true, 1u, 1u, 2u, 7u, 0u, 11u, 2602u, 0u, false, 0u}},
    {1u, {false, 371u, 487u}, {true, false, false, 0u}, {0u, 2u, 2u, 447u, 2602u, 0u, 2u, 3u, 1780u,
     2225u, 0u, 0u, 11u, 0u, true, 1u, 1u, 2u, 8u, 0u, 12u, 447u, 0u, false, 0u}},
    {1u, {false, 2602u, 2225u}, {false, false, false, 2u}, {1u, 2u, 3u, 2602u, 447u, 1u, 3u, 0u,
     2225u, 1780u, 0u, 0u, 12u, 0u, true, 1u, 0u, 1u, 0u, 0u, 13u, 2602u, 0u, false, 0u}},
    {7u, {false, 2602u, 2225u}, {false, false, false, 3u}, {8u, 3u, 6u, 2602u, 2602u, 8u, 3u, 7u,
     2225u, 2225u, 0u, 0u, 19u, 0u, true, 1u, 0u, 1u, 7u, 0u, 20u, 2602u, 0u, false, 0u}},
    {5u, {false, 65535u, 2225u}, {false, false, false, 3u}, {0u, 3u, 8u, 2602u, 2602u, 13u, 3u, 8u,
     2225u, 2225u, 0u, 0u, 24u, 0u, true, 1u, 0u, 1u, 12u, 0u, 25u, 2602u, 0u, false, 0u}},
    {1u, {true, 65535u, 3849u}, {false, false, false, 3u}, {0u, 3u, 8u, 2602u, 2602u, 14u, 3u, 8u,
     3849u, 2225u, 0u, 0u, 25u, 0u, true, 1u, 0u, 1u, 13u, 0u, 26u, 2602u, 0u, false, 0u}},
    {1u, {false, 2603u, 3849u}, {false, false, false, 3u}, {1u, 3u, 8u, 2603u, 2602u, 15u, 3u, 8u,
     3849u, 3849u, 0u, 0u, 26u, 0u, true, 1u, 0u, 1u, 14u, 0u, 27u, 2602u, 0u, false, 0u}},
    {1u, {true, 2603u, 3849u}, {false, false, false, 3u}, {2u, 3u, 8u, 2603u, 2603u, 16u, 3u, 8u,
     3849u, 3849u, 0u, 0u, 27u, 0u, true, 1u, 0u, 1u, 15u, 0u, 28u, 2603u, 0u, false, 0u}},
    {3u, {true, 2603u, 3848u}, {false, false, false, 3u}, {5u, 3u, 8u, 2603u, 2603u, 19u, 3u, 8u,
     3848u, 3848u, 0u, 0u, 30u, 0u, true, 1u, 0u, 1u, 18u, 0u, 31u, 2603u, 0u, false, 0u}},
    {1u, {true, 2603u, 3848u}, {true, false, false, 1u}, {6u, 3u, 8u, 2603u, 2603u, 20u, 1u, 0u,
     3848u, 3848u, 0u, 1u, 31u, 0u, true, 1u, 1u, 2u, 0u, 0u, 32u, 2603u, 0u, false, 0u}},
    {1u, {true, 2603u, 2226u}, {true, false, false, 1u}, {7u, 3u, 8u, 2603u, 2603u, 20u, 1u, 1u,
     2226u, 3848u, 0u, 1u, 32u, 0u, true, 1u, 1u, 2u, 1u, 0u, 33u, 2603u, 0u, false, 0u}},
    {1u, {true, 2446u, 2226u}, {true, false, false, 1u}, {8u, 3u, 8u, 2446u, 2603u, 20u, 1u, 2u,
     2226u, 2226u, 0u, 1u, 33u, 0u, true, 1u, 1u, 2u, 2u, 0u, 34u, 2603u, 0u, false, 0u}},
    /* vector 18 */
    {1u, {false, 2602u, 3850u}, {false, false, false, 0u}, {1u, 0u, 1u, 2602u, 0u, 0u, 0u, 1u, 0u,
     0u, 0u, 0u, 0u, 0u, true, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    {2u, {false, 2679u, 3850u}, {false, false, false, 0u}, {3u, 0u, 3u, 2679u, 2679u, 0u, 0u, 3u,
     0u, 0u, 0u, 0u, 2u, 0u, true, 0u, 0u, 0u, 3u, 0u, 3u, 2679u, 0u, false, 0u}},
    {2u, {false, 2679u, 2226u}, {false, false, false, 0u}, {5u, 1u, 1u, 2679u, 2679u, 2u, 0u, 5u,
     2226u, 2226u, 0u, 0u, 4u, 0u, true, 0u, 0u, 0u, 5u, 0u, 5u, 2679u, 0u, false, 0u}},
    {1u, {true, 448u, 2226u}, {false, false, false, 0u}, {6u, 1u, 2u, 448u, 2679u, 3u, 0u, 6u,
     2226u, 2226u, 0u, 0u, 5u, 0u, true, 0u, 0u, 0u, 6u, 0u, 6u, 2679u, 0u, false, 0u}},
    {713u, {true, 448u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 448u, 448u, 20u, 1u, 8u,
     2225u, 2225u, 1u, 0u, 718u, 0u, true, 0u, 0u, 0u, 360u, 0u, 719u, 448u, 0u, false, 0u}},
    {2u, {true, 523u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 523u, 523u, 20u, 1u, 8u, 488u,
     488u, 1u, 0u, 720u, 0u, true, 0u, 0u, 0u, 360u, 1u, 1u, 448u, 1u, false, 0u}},
    {3u, {true, 598u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 598u, 598u, 20u, 1u, 8u, 488u,
     488u, 1u, 0u, 723u, 0u, true, 0u, 0u, 0u, 360u, 1u, 4u, 598u, 1u, false, 0u}},
    {1u, {true, 674u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 674u, 598u, 20u, 1u, 8u, 488u,
     488u, 1u, 0u, 724u, 0u, true, 0u, 0u, 0u, 360u, 1u, 5u, 598u, 2u, false, 0u}},
    {1u, {true, 2447u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 2447u, 674u, 20u, 1u, 8u,
     488u, 488u, 1u, 0u, 725u, 0u, true, 0u, 0u, 0u, 360u, 1u, 6u, 674u, 0u, false, 0u}},
    {721u, {false, 449u, 1780u}, {false, false, false, 0u}, {20u, 1u, 8u, 449u, 449u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 1446u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 446u, 1780u}, {false, false, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 8u,
     1780u, 1780u, 1u, 0u, 1447u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {3u, {true, 448u, 488u}, {false, false, false, 0u}, {3u, 2u, 3u, 448u, 448u, 20u, 1u, 8u, 488u,
     488u, 1u, 0u, 1450u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {28756u, {true, 448u, 488u}, {false, true, false, 0u}, {20u, 1u, 8u, 448u, 448u, 20u, 1u, 8u,
     488u, 488u, 1u, 0u, 30206u, 8u, true, 0u, 0u, 0u, 360u, 1u, 720u, 448u, 28755u, false, 0u}},
    {721u, {true, 448u, 488u}, {false, false, false, 4u}, {20u, 1u, 8u, 448u, 448u, 20u, 1u, 8u,
     488u, 488u, 1u, 0u, 30927u, 8u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, true, 0u}},
    /* vector 19 */
    {7u, {false, 2602u, 65535u}, {false, false, false, 0u}, {7u, 1u, 3u, 2602u, 2602u, 0u, 0u, 7u,
     0u, 0u, 0u, 0u, 6u, 0u, true, 0u, 0u, 0u, 7u, 0u, 7u, 2602u, 0u, false, 0u}},
    {712u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u,
     8u, 0u, 0u, 0u, 0u, 718u, 0u, true, 0u, 0u, 0u, 360u, 0u, 719u, 2602u, 0u, false, 0u}},
    {1u, {false, 65535u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 2602u, 2602u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 719u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2603u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 2603u, 2602u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 720u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 2524u, 65535u}, {false, false, false, 2u}, {2u, 2u, 2u, 2524u, 2603u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 721u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {3u, {false, 2680u, 65535u}, {false, false, false, 2u}, {5u, 1u, 1u, 2680u, 2680u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 724u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2679u, 65535u}, {false, false, false, 2u}, {6u, 1u, 2u, 2679u, 2680u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 725u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2680u, 0u, false, 0u}},
    {1u, {false, 2602u, 65535u}, {false, false, false, 2u}, {7u, 1u, 3u, 2602u, 2679u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 726u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2679u, 0u, false, 0u}},
    {1u, {false, 448u, 65535u}, {false, false, false, 2u}, {8u, 1u, 4u, 448u, 2602u, 0u, 3u, 8u, 0u,
     0u, 0u, 0u, 727u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 446u, 65535u}, {false, false, false, 2u}, {0u, 2u, 0u, 448u, 2602u, 0u, 3u, 8u, 0u,
     0u, 0u, 0u, 728u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 448u, 0u, false, 0u}},
    {1u, {false, 449u, 65535u}, {false, false, false, 2u}, {1u, 2u, 1u, 449u, 448u, 0u, 3u, 8u, 0u,
     0u, 0u, 0u, 729u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {2u, {true, 449u, 65535u}, {false, false, false, 2u}, {3u, 2u, 3u, 449u, 449u, 0u, 3u, 8u, 0u,
     0u, 0u, 0u, 731u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {19u, {true, 449u, 1780u}, {false, false, false, 2u}, {20u, 1u, 8u, 449u, 449u, 19u, 3u, 8u,
     1780u, 1780u, 1u, 0u, 750u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 449u, 0u, false, 0u}},
    {1u, {true, 449u, 1780u}, {false, true, false, 0u}, {20u, 1u, 8u, 449u, 449u, 20u, 1u, 0u,
     1780u, 1780u, 1u, 0u, 751u, 0u, true, 0u, 0u, 0u, 360u, 1u, 0u, 449u, 0u, false, 0u}},
    {1u, {true, 65535u, 1780u}, {false, true, false, 0u}, {0u, 2u, 0u, 449u, 449u, 20u, 1u, 1u,
     1780u, 1780u, 1u, 0u, 752u, 0u, true, 0u, 0u, 0u, 360u, 1u, 1u, 449u, 1u, false, 0u}},
    {3u, {true, 2445u, 1780u}, {false, true, false, 0u}, {3u, 2u, 3u, 2445u, 2445u, 20u, 1u, 4u,
     1780u, 1780u, 1u, 0u, 755u, 0u, true, 0u, 0u, 0u, 360u, 1u, 4u, 2445u, 1u, false, 0u}},
    {3u, {false, 2445u, 1780u}, {false, false, false, 0u}, {6u, 1u, 2u, 2445u, 2445u, 20u, 1u, 7u,
     1780u, 1780u, 1u, 0u, 758u, 0u, true, 0u, 0u, 0u, 360u, 0u, 2u, 2445u, 0u, false, 0u}},
    {512u, {false, 2445u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u,
     8u, 2225u, 2225u, 1u, 0u, 1270u, 0u, true, 0u, 0u, 0u, 360u, 0u, 514u, 2445u, 0u, false, 0u}},
    {1u, {false, 2445u, 2224u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     2224u, 2225u, 1u, 0u, 1271u, 0u, true, 0u, 0u, 0u, 360u, 0u, 515u, 2445u, 0u, false, 0u}},
    {1u, {true, 2445u, 2223u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     2223u, 2224u, 1u, 0u, 1272u, 0u, true, 0u, 0u, 0u, 360u, 0u, 516u, 2445u, 0u, false, 0u}},
    {1u, {true, 2445u, 3848u}, {false, false, false, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     3848u, 2223u, 1u, 0u, 1273u, 0u, true, 0u, 0u, 0u, 360u, 0u, 517u, 2445u, 0u, false, 0u}},
    {202u, {true, 2445u, 3848u}, {false, false, true, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     3848u, 3848u, 1u, 1u, 1475u, 0u, true, 0u, 0u, 0u, 360u, 0u, 719u, 2445u, 0u, false, 1u}},
    {157u, {true, 2445u, 3848u}, {false, true, true, 0u}, {20u, 1u, 8u, 2445u, 2445u, 20u, 1u, 8u,
     3848u, 3848u, 1u, 1u, 1632u, 0u, true, 0u, 0u, 0u, 360u, 1u, 156u, 2445u, 156u, false, 1u}},
    {2u, {true, 2444u, 3848u}, {false, true, true, 0u}, {20u, 1u, 8u, 2444u, 2444u, 20u, 1u, 8u,
     3848u, 3848u, 1u, 1u, 1634u, 0u, true, 0u, 0u, 0u, 360u, 1u, 158u, 2444u, 158u, false, 1u}},
    {1u, {true, 2603u, 2225u}, {false, true, true, 0u}, {20u, 1u, 8u, 2603u, 2444u, 20u, 1u, 8u,
     2225u, 3848u, 1u, 1u, 1635u, 0u, true, 0u, 0u, 0u, 360u, 1u, 159u, 2444u, 159u, false, 1u}},
    {200u, {true, 2603u, 2225u}, {false, true, false, 0u}, {20u, 1u, 8u, 2603u, 2603u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 1835u, 0u, true, 0u, 0u, 0u, 360u, 1u, 359u, 2603u, 199u, false, 0u}},
    {1u, {true, 2679u, 2225u}, {false, false, false, 0u}, {20u, 1u, 8u, 2679u, 2603u, 20u, 1u, 8u,
     2225u, 2225u, 0u, 0u, 1836u, 0u, true, 0u, 0u, 0u, 360u, 0u, 0u, 2603u, 200u, false, 0u}},
    /* vector 20 */
    {7u, {false, 2602u, 65535u}, {false, false, false, 0u}, {7u, 1u, 3u, 2602u, 2602u, 0u, 0u, 7u,
     0u, 0u, 0u, 0u, 6u, 0u, true, 0u, 0u, 0u, 7u, 0u, 7u, 2602u, 0u, false, 0u}},
    {712u, {false, 2602u, 65535u}, {false, false, false, 2u}, {20u, 1u, 8u, 2602u, 2602u, 0u, 3u,
     8u, 0u, 0u, 0u, 0u, 718u, 0u, true, 0u, 0u, 0u, 360u, 0u, 719u, 2602u, 0u, false, 0u}},
    {2u, {false, 65535u, 65535u}, {false, false, false, 2u}, {0u, 2u, 1u, 2602u, 2602u, 0u, 3u, 8u,
     0u, 0u, 0u, 0u, 720u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {false, 65535u, 2224u}, {false, false, false, 2u}, {0u, 2u, 2u, 2602u, 2602u, 1u, 3u, 8u,
     2224u, 0u, 0u, 0u, 721u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {true, 2525u, 1779u}, {false, false, false, 2u}, {1u, 2u, 3u, 2525u, 2602u, 2u, 3u, 8u,
     1779u, 2224u, 0u, 0u, 722u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2602u, 0u, false, 0u}},
    {1u, {true, 0u, 1779u}, {false, false, false, 3u}, {0u, 3u, 0u, 2525u, 2602u, 3u, 3u, 8u, 1779u,
     1779u, 0u, 0u, 723u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2525u, 0u, false, 0u}},
    {16u, {true, 2599u, 1779u}, {false, false, false, 3u}, {16u, 3u, 8u, 2599u, 2599u, 19u, 3u, 8u,
     1779u, 1779u, 0u, 0u, 739u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {3u, {true, 2599u, 1779u}, {false, false, false, 1u}, {19u, 3u, 8u, 2599u, 2599u, 20u, 1u, 2u,
     1779u, 1779u, 0u, 0u, 742u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 1779u}, {false, false, false, 0u}, {20u, 1u, 0u, 2599u, 2599u, 20u, 1u, 3u,
     1779u, 1779u, 0u, 0u, 743u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2599u, 1779u}, {false, false, false, 0u}, {20u, 1u, 1u, 2599u, 2599u, 20u, 1u, 4u,
     1779u, 1779u, 0u, 0u, 744u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {true, 2599u, 0u}, {false, false, false, 0u}, {20u, 1u, 2u, 2599u, 2599u, 0u, 2u, 0u,
     1779u, 1779u, 0u, 0u, 745u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {3u, {false, 2599u, 489u}, {false, false, false, 0u}, {20u, 1u, 5u, 2599u, 2599u, 3u, 2u, 3u,
     489u, 489u, 0u, 0u, 748u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {1u, {false, 2599u, 2688u}, {false, false, false, 0u}, {20u, 1u, 6u, 2599u, 2599u, 4u, 1u, 0u,
     2688u, 489u, 0u, 0u, 749u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2599u, 0u, false, 0u}},
    {2252u, {false, 2604u, 2688u}, {false, false, true, 0u}, {20u, 1u, 8u, 2604u, 2604u, 20u, 1u,
     8u, 2688u, 2688u, 0u, 1u, 3001u, 0u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2604u, 0u, false, 1u}},
    {54598u, {false, 2605u, 2688u}, {false, false, true, 0u}, {20u, 1u, 8u, 2605u, 2605u, 20u, 1u,
     8u, 2688u, 2688u, 0u, 1u, 57599u, 15u, true, 0u, 0u, 0u, 360u, 0u, 720u, 2605u, 0u, false,
     1u}},
    {1u, {false, 2447u, 0u}, {false, false, false, 0u}, {20u, 1u, 8u, 2447u, 2605u, 0u, 2u, 0u,
     2688u, 2688u, 0u, 1u, 0u, 0u, true, 1u, 0u, 0u, 360u, 0u, 720u, 2605u, 0u, false, 0u}},
    /* vector 21 */
    {1u, {false, 2602u, 2225u}, {false, false, false, 0u}, {1u, 0u, 1u, 2602u, 0u, 1u, 0u, 1u,
     2225u, 0u, 0u, 0u, 0u, 0u, true, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    /* vector 22 */
    {1u, {false, 0u, 0u}, {false, false, false, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u,
     0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    /* vector 23 */
    {1u, {false, 0u, 0u}, {false, false, false, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u,
     0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
    /* vector 24 */
    {1u, {false, 0u, 0u}, {false, false, false, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u,
     0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, false, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct freezer1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 17u, false, {0u, 0u}},
    {17u, 19u, false, {0u, 0u}},
    {19u, 24u, false, {0u, 0u}},
    {24u, 27u, false, {0u, 0u}},
    {27u, 28u, false, {0u, 0u}},
    {28u, 32u, false, {0u, 0u}},
    {32u, 38u, false, {0u, 0u}},
    {38u, 39u, false, {0u, 0u}},
    {39u, 45u, false, {0u, 0u}},
    {45u, 49u, false, {0u, 0u}},
    {49u, 55u, true, {0u, 62447u}},
    {55u, 57u, true, {0u, 62447u}},
    {57u, 58u, true, {0u, 62447u}},
    {58u, 108u, true, {0u, 62447u}},
    {108u, 201u, true, {0u, 62447u}},
    {201u, 218u, true, {0u, 62447u}},
    {218u, 234u, true, {0u, 62447u}},
    {234u, 248u, true, {0u, 62447u}},
    {248u, 275u, true, {0u, 62447u}},
    {275u, 291u, true, {0u, 62447u}},
    {291u, 292u, true, {0u, 62447u}},
    {292u, 293u, true, {0u, 62446u}},
    {293u, 294u, true, {0u, 0u}},
    {294u, 295u, true, {17u, 62464u}},
};

static void run(const struct vector *v)
{
    struct freezer1 m;
    struct freezer1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    freezer1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            freezer1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct freezer1 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, false, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u,
     false, 0u};

static void start_and_compare(const char *what, const struct freezer1_remembered *r,
                              const struct freezer1 *wanted)
{
    struct freezer1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    freezer1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct freezer1 m;
    struct freezer1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);
    {
        static const struct freezer1_remembered good =
           {0u, 62447u};
        static const struct freezer1 after =
           {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, 0u, 0u, 0u, 0u,
     0u, 0u, false, 0u};

        start_and_compare("start with a good record", &good, &after);
        r = good;
        r.check++;
        start_and_compare("start with a wrong check word", &r, &fresh);
        r = good;
        r.defrost_place = 1u; /* a flipped bit */
        start_and_compare("start with a flipped bit", &r, &fresh);
        r = good;
        r.defrost_place = 17u; /* out of its range, under a good check word */
        r.check = 62464u;
        start_and_compare("start with a value out of range", &r, &fresh);
        m = after;
        r = good;
        m.defrost_place = 1u;
        doing = "record";
        compare("defrost_place changed", freezer1_remember(&m, &r) ? 1l : 0l, 1l);
        verdict();
        compare("check word", (long)r.check, 62448l);
        verdict();
    }

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", freezer1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", freezer1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct freezer1 m;
    struct freezer1_in in;
    struct freezer1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct freezer1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 1u};

        doing = "room_probe_state upset";
        freezer1_start(&m, NULL);
        m.room_probe_state = 4u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 1u};

        doing = "room_probe_state upset";
        freezer1_start(&m, NULL);
        m.room_probe_state = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 3u, 0u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 2u};

        doing = "coil_probe_state upset";
        freezer1_start(&m, NULL);
        m.coil_probe_state = 4u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 3u, 0u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 2u};

        doing = "coil_probe_state upset";
        freezer1_start(&m, NULL);
        m.coil_probe_state = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "room_stat upset";
        freezer1_start(&m, NULL);
        m.room_stat = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "room_stat upset";
        freezer1_start(&m, NULL);
        m.room_stat = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "fan_delay upset";
        freezer1_start(&m, NULL);
        m.fan_delay = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "fan_delay upset";
        freezer1_start(&m, NULL);
        m.fan_delay = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "defrost upset";
        freezer1_start(&m, NULL);
        m.defrost = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "defrost upset";
        freezer1_start(&m, NULL);
        m.defrost = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "defrost_heater upset";
        freezer1_start(&m, NULL);
        m.defrost_heater = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "defrost_heater upset";
        freezer1_start(&m, NULL);
        m.defrost_heater = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 0u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "drip upset";
        freezer1_start(&m, NULL);
        m.drip = 3u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 0u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "drip upset";
        freezer1_start(&m, NULL);
        m.drip = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 0u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "compressor upset";
        freezer1_start(&m, NULL);
        m.compressor = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 0u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "compressor upset";
        freezer1_start(&m, NULL);
        m.compressor = 255u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "coil_fan upset";
        freezer1_start(&m, NULL);
        m.coil_fan = 2u;
        freezer1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct freezer1 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 3600u, 1u, true, 0u, 0u, 0u, 1u, 0u, 1u,
     0u, 0u, false, 0u};
        static const struct freezer1_out wanted =
           {false, false, false, 0u};

        doing = "coil_fan upset";
        freezer1_start(&m, NULL);
        m.coil_fan = 255u;
        freezer1_step(&m, &in, &out);
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
