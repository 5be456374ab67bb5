/* wah1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Warm-air heater, joinery workshop
 * Site: Old Quay Joinery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: b318e6b5696aaa536be0f12bde773165258387b28b91ac06c88802479138f8e6
 *
 * Replaces:
 * - fan_disc: snap disc on the exchanger, starts the fan once it is warm
 * - exchanger_stat: second disc, holds the exchanger down
 *
 * Stays hard-wired, and must:
 * - exchanger_limit: rod limit across the exchanger, manual reset, in the burner's safety chain
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
 * Open findings: 1 limit_nuisance (act, exchanger_limit/exchanger_hot); 2 restarts_by_itself (act,
 * fan); 3 proving_switch_not_checked_open (act, room_calls); 4 welded_output (act, fan); 5
 * earth_fault_bypasses_limit (act, wah1); 6 probe_out_of_pocket (act, exchanger_stat); 7
 * moisture_direction (act, exchanger_probe); 8 damp_dust_washdown (act, wah1); 9 limit_error_budget
 * (act, exchanger_stat); 10 limit_error_budget (act, fan_disc); 11 contact_life (act, burner_call);
 * 12 mercury_asbestos_refrigerant (act, exchanger_stat); 13 mercury_asbestos_refrigerant (act,
 * fan_disc); 14 approval_lapses (act, wah1); 15 heating_and_cooling_overlap (act, exchanger_stat).
 * Not judged, for want of a figure: 2; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "wah1.h"

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

static void compare_out(const struct wah1_out *got, const struct wah1_out *wanted)
{
    compare("burner_call", (long)got->burner_call, (long)wanted->burner_call);
    compare("fan", (long)got->fan, (long)wanted->fan);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct wah1 *got, const struct wah1 *wanted)
{
    compare("exchanger_probe_good_for",
            (long)got->exchanger_probe_good_for,
            (long)wanted->exchanger_probe_good_for);
    compare("exchanger_probe_state",
            (long)got->exchanger_probe_state,
            (long)wanted->exchanger_probe_state);
    compare("exchanger_probe_state_for",
            (long)got->exchanger_probe_state_for,
            (long)wanted->exchanger_probe_state_for);
    compare("exchanger_probe_last",
            (long)got->exchanger_probe_last,
            (long)wanted->exchanger_probe_last);
    compare("exchanger_probe_before",
            (long)got->exchanger_probe_before,
            (long)wanted->exchanger_probe_before);
    compare("fan_disc", (long)got->fan_disc, (long)wanted->fan_disc);
    compare("exchanger_stat", (long)got->exchanger_stat, (long)wanted->exchanger_stat);
    compare("burner_call", (long)got->burner_call, (long)wanted->burner_call);
    compare("burner_call_effect_from",
            (long)got->burner_call_effect_from,
            (long)wanted->burner_call_effect_from);
    compare("burner_call_effect_for",
            (long)got->burner_call_effect_for,
            (long)wanted->burner_call_effect_for);
    compare("burner_call_no_effect",
            (long)got->burner_call_no_effect,
            (long)wanted->burner_call_no_effect);
    compare("run_on", (long)got->run_on, (long)wanted->run_on);
    compare("run_on_for", (long)got->run_on_for, (long)wanted->run_on_for);
    compare("fan", (long)got->fan, (long)wanted->fan);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct wah1_in in;
    struct wah1_out out;
    struct wah1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, false, 369u}, {false, true, 0u}, {1u, 0u, 1u, 369u, 0u, 1u, 0u, 0u, 0u, 0u, false,
     1u, 1u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {2u, 0u, 2u, 369u, 369u, 1u, 0u, 0u, 369u, 0u,
     false, 1u, 2u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {3u, 0u, 3u, 369u, 369u, 1u, 0u, 0u, 369u, 0u,
     false, 1u, 3u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {4u, 1u, 0u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 4u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {5u, 1u, 1u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 5u, 1u}},
    {11u, {false, false, 369u}, {false, true, 0u}, {16u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 16u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {17u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 17u, 1u}},
    {23u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 40u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 1u, 41u, 1u}},
    {1398u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u,
     0u, false, 1u, 1439u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 0u, 0u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 0u, 1u, 1u}},
    {1439u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u,
     0u, false, 0u, 1440u, 1u}},
    {1u, {false, false, 369u}, {false, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     false, 0u, 1440u, 1u}},
    {1u, {true, false, 369u}, {true, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 1u, 369u, 0u,
     false, 2u, 0u, 1u}},
    /* vector 2 */
    {3u, {true, false, 369u}, {false, true, 0u}, {3u, 0u, 3u, 369u, 369u, 1u, 0u, 0u, 369u, 0u,
     false, 1u, 3u, 1u}},
    {1u, {true, false, 369u}, {true, true, 0u}, {4u, 1u, 0u, 369u, 369u, 1u, 1u, 1u, 369u, 0u,
     false, 2u, 0u, 1u}},
    {1u, {true, false, 369u}, {true, true, 0u}, {5u, 1u, 1u, 369u, 369u, 1u, 1u, 1u, 369u, 1u,
     false, 2u, 1u, 1u}},
    {629u, {true, false, 369u}, {true, true, 0u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 1u, 369u, 630u,
     false, 2u, 630u, 1u}},
    {1u, {true, false, 369u}, {false, true, 2u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 631u,
     true, 1u, 0u, 1u}},
    {1u, {true, false, 369u}, {false, true, 2u}, {40u, 1u, 12u, 369u, 369u, 1u, 1u, 0u, 369u, 0u,
     true, 1u, 1u, 1u}},
    {1u, {false, false, 0u}, {false, true, 2u}, {0u, 2u, 0u, 369u, 369u, 1u, 1u, 0u, 369u, 0u, true,
     1u, 2u, 1u}},
    /* vector 3 */
    {11u, {false, false, 0u}, {false, true, 0u}, {0u, 0u, 11u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false,
     1u, 11u, 1u}},
    {1u, {false, false, 0u}, {false, true, 1u}, {0u, 3u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u,
     12u, 1u}},
    {1u, {false, false, 0u}, {false, true, 1u}, {0u, 3u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u,
     13u, 1u}},
    {1u, {false, false, 292u}, {false, true, 1u}, {0u, 3u, 2u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false,
     1u, 14u, 1u}},
    {1u, {false, false, 293u}, {false, true, 1u}, {1u, 3u, 3u, 293u, 0u, 1u, 0u, 0u, 0u, 0u, false,
     1u, 15u, 1u}},
    /* vector 4 */
    {4u, {false, false, 293u}, {false, true, 0u}, {4u, 1u, 0u, 293u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 1u, 4u, 1u}},
    {1u, {false, false, 293u}, {false, true, 0u}, {5u, 1u, 1u, 293u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 1u, 5u, 1u}},
    {1434u, {false, false, 293u}, {false, true, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u,
     0u, false, 1u, 1439u, 1u}},
    {1u, {false, false, 293u}, {false, false, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 0u, 0u, 0u}},
    {1u, {false, false, 293u}, {false, false, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 0u, 1u, 0u}},
    /* vector 5 */
    {4u, {false, false, 347u}, {false, true, 0u}, {4u, 1u, 0u, 347u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 1u, 4u, 1u}},
    /* vector 6 */
    {4u, {false, false, 348u}, {false, true, 0u}, {4u, 1u, 0u, 348u, 348u, 1u, 1u, 0u, 348u, 0u,
     false, 1u, 4u, 1u}},
    /* vector 7 */
    {4u, {false, false, 370u}, {false, true, 0u}, {4u, 1u, 0u, 370u, 370u, 1u, 1u, 0u, 370u, 0u,
     false, 1u, 4u, 1u}},
    /* vector 8 */
    {4u, {false, false, 371u}, {false, true, 0u}, {4u, 1u, 0u, 371u, 371u, 1u, 0u, 0u, 371u, 0u,
     false, 1u, 4u, 1u}},
    {1u, {false, false, 479u}, {false, true, 0u}, {5u, 1u, 1u, 479u, 371u, 1u, 0u, 0u, 371u, 0u,
     false, 1u, 5u, 1u}},
    {1u, {false, false, 480u}, {false, true, 0u}, {0u, 2u, 0u, 479u, 371u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 6u, 1u}},
    {1u, {false, false, 294u}, {false, true, 0u}, {1u, 2u, 1u, 294u, 479u, 1u, 0u, 0u, 371u, 0u,
     false, 1u, 7u, 1u}},
    {1u, {false, false, 294u}, {false, true, 0u}, {2u, 2u, 2u, 294u, 294u, 1u, 0u, 0u, 294u, 0u,
     false, 1u, 8u, 1u}},
    {1u, {false, false, 294u}, {false, true, 0u}, {3u, 2u, 3u, 294u, 294u, 1u, 0u, 0u, 294u, 0u,
     false, 1u, 9u, 1u}},
    {1u, {false, false, 294u}, {false, true, 0u}, {4u, 1u, 0u, 294u, 294u, 0u, 1u, 0u, 294u, 0u,
     false, 1u, 10u, 1u}},
    {2u, {false, false, 381u}, {false, true, 0u}, {6u, 1u, 2u, 381u, 381u, 1u, 1u, 0u, 381u, 0u,
     false, 1u, 12u, 1u}},
    {1u, {false, false, 348u}, {false, true, 0u}, {7u, 1u, 3u, 348u, 381u, 1u, 1u, 0u, 381u, 0u,
     false, 1u, 13u, 1u}},
    {1u, {false, false, 376u}, {false, true, 0u}, {8u, 1u, 4u, 376u, 348u, 1u, 1u, 0u, 376u, 0u,
     false, 1u, 14u, 1u}},
    {1u, {true, true, 347u}, {true, true, 0u}, {9u, 1u, 5u, 347u, 376u, 1u, 1u, 1u, 348u, 0u, false,
     2u, 0u, 1u}},
    {1u, {true, true, 347u}, {true, false, 0u}, {10u, 1u, 6u, 347u, 347u, 0u, 1u, 1u, 347u, 1u,
     false, 2u, 1u, 0u}},
    {1u, {false, false, 479u}, {false, true, 0u}, {11u, 1u, 7u, 479u, 347u, 0u, 1u, 0u, 347u, 2u,
     false, 1u, 0u, 1u}},
    {1u, {false, false, 479u}, {false, true, 0u}, {12u, 1u, 8u, 479u, 479u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 1u, 1u}},
    {1u, {true, true, 479u}, {false, true, 0u}, {13u, 1u, 9u, 479u, 479u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 2u, 1u}},
    {2u, {false, false, 480u}, {false, true, 0u}, {0u, 2u, 1u, 479u, 479u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 4u, 1u}},
    {1u, {false, false, 479u}, {false, true, 0u}, {1u, 2u, 2u, 479u, 479u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 5u, 1u}},
    {1u, {false, false, 294u}, {false, true, 0u}, {2u, 2u, 3u, 294u, 479u, 1u, 0u, 0u, 479u, 0u,
     false, 1u, 6u, 1u}},
    {1u, {false, false, 370u}, {false, true, 0u}, {3u, 2u, 4u, 370u, 294u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 7u, 1u}},
    {1u, {false, false, 292u}, {false, true, 0u}, {0u, 2u, 5u, 370u, 294u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 8u, 1u}},
    {2u, {true, false, 292u}, {false, true, 0u}, {0u, 2u, 7u, 370u, 294u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 10u, 1u}},
    {1u, {true, false, 292u}, {false, true, 1u}, {0u, 3u, 0u, 370u, 294u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 11u, 1u}},
    {39u, {false, true, 361u}, {false, true, 1u}, {39u, 3u, 12u, 361u, 361u, 1u, 0u, 0u, 361u, 0u,
     false, 1u, 50u, 1u}},
    {1u, {false, true, 361u}, {false, true, 0u}, {40u, 1u, 0u, 361u, 361u, 1u, 1u, 0u, 361u, 0u,
     false, 1u, 51u, 1u}},
    {2u, {true, true, 370u}, {true, true, 0u}, {40u, 1u, 2u, 370u, 370u, 1u, 1u, 1u, 370u, 0u,
     false, 2u, 1u, 1u}},
    {1u, {false, false, 347u}, {false, true, 0u}, {40u, 1u, 3u, 347u, 370u, 1u, 1u, 0u, 370u, 1u,
     false, 1u, 0u, 1u}},
    {1u, {false, true, 347u}, {false, true, 0u}, {40u, 1u, 4u, 347u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 1u, 1u, 1u}},
    {1u, {false, true, 348u}, {false, true, 0u}, {40u, 1u, 5u, 348u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 1u, 2u, 1u}},
    {1u, {false, true, 65535u}, {false, true, 0u}, {0u, 2u, 0u, 348u, 347u, 0u, 1u, 0u, 348u, 0u,
     false, 1u, 3u, 1u}},
    {1436u, {false, false, 293u}, {false, true, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u,
     0u, false, 1u, 1439u, 1u}},
    {1446u, {false, false, 293u}, {false, false, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u,
     0u, false, 0u, 1440u, 0u}},
    {1u, {false, false, 347u}, {false, false, 0u}, {40u, 1u, 12u, 347u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 0u, 1440u, 0u}},
    {1u, {false, true, 347u}, {false, false, 0u}, {40u, 1u, 12u, 347u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 0u, 1440u, 0u}},
    {1u, {false, true, 348u}, {false, false, 0u}, {40u, 1u, 12u, 348u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 0u, 1440u, 0u}},
    {1u, {false, true, 65535u}, {false, false, 0u}, {0u, 2u, 0u, 348u, 347u, 0u, 1u, 0u, 348u, 0u,
     false, 0u, 1440u, 0u}},
    {7u, {false, true, 65535u}, {false, false, 0u}, {0u, 2u, 7u, 348u, 347u, 0u, 1u, 0u, 348u, 0u,
     false, 0u, 1440u, 0u}},
    {1u, {false, true, 65535u}, {false, true, 1u}, {0u, 3u, 0u, 348u, 347u, 1u, 0u, 0u, 348u, 0u,
     false, 0u, 1440u, 1u}},
    /* vector 9 */
    {5u, {false, false, 348u}, {false, true, 0u}, {5u, 1u, 1u, 348u, 348u, 1u, 1u, 0u, 348u, 0u,
     false, 1u, 5u, 1u}},
    {2u, {false, false, 353u}, {false, true, 0u}, {7u, 1u, 3u, 353u, 353u, 1u, 1u, 0u, 353u, 0u,
     false, 1u, 7u, 1u}},
    {2u, {true, false, 357u}, {true, true, 0u}, {9u, 1u, 5u, 357u, 357u, 1u, 1u, 1u, 353u, 1u,
     false, 2u, 1u, 1u}},
    {1u, {true, false, 292u}, {true, true, 0u}, {0u, 2u, 0u, 357u, 357u, 1u, 1u, 1u, 353u, 2u,
     false, 2u, 2u, 1u}},
    {3u, {true, false, 339u}, {true, true, 0u}, {3u, 2u, 3u, 339u, 339u, 1u, 1u, 1u, 339u, 5u,
     false, 2u, 5u, 1u}},
    {1u, {true, false, 359u}, {true, false, 0u}, {4u, 1u, 0u, 359u, 339u, 0u, 1u, 1u, 339u, 6u,
     false, 2u, 6u, 0u}},
    {1u, {true, false, 65535u}, {true, false, 0u}, {0u, 2u, 0u, 359u, 339u, 0u, 1u, 1u, 359u, 0u,
     false, 2u, 7u, 0u}},
    {2u, {false, false, 382u}, {false, true, 0u}, {2u, 2u, 2u, 382u, 382u, 1u, 0u, 0u, 382u, 0u,
     false, 1u, 1u, 1u}},
    {1u, {true, true, 370u}, {false, true, 0u}, {3u, 2u, 3u, 370u, 382u, 1u, 0u, 0u, 382u, 0u,
     false, 1u, 2u, 1u}},
    {2u, {true, true, 370u}, {true, true, 0u}, {5u, 1u, 1u, 370u, 370u, 1u, 1u, 1u, 370u, 1u, false,
     2u, 1u, 1u}},
    {2u, {true, true, 369u}, {true, true, 0u}, {7u, 1u, 3u, 369u, 369u, 1u, 1u, 1u, 369u, 3u, false,
     2u, 3u, 1u}},
    {1u, {true, false, 339u}, {true, true, 0u}, {8u, 1u, 4u, 339u, 369u, 1u, 1u, 1u, 369u, 4u,
     false, 2u, 4u, 1u}},
    {2u, {true, false, 339u}, {true, false, 0u}, {10u, 1u, 6u, 339u, 339u, 0u, 1u, 1u, 339u, 6u,
     false, 2u, 6u, 0u}},
    {1u, {true, false, 359u}, {true, false, 0u}, {11u, 1u, 7u, 359u, 339u, 0u, 1u, 1u, 339u, 7u,
     false, 2u, 7u, 0u}},
    {1u, {true, false, 65535u}, {true, false, 0u}, {0u, 2u, 0u, 359u, 339u, 0u, 1u, 1u, 359u, 0u,
     false, 2u, 8u, 0u}},
    {1u, {true, false, 360u}, {true, false, 0u}, {1u, 2u, 1u, 360u, 359u, 0u, 1u, 1u, 359u, 1u,
     false, 2u, 9u, 0u}},
    {1u, {true, false, 360u}, {true, true, 0u}, {2u, 2u, 2u, 360u, 360u, 1u, 1u, 1u, 359u, 2u,
     false, 2u, 10u, 1u}},
    {2u, {false, false, 480u}, {false, true, 0u}, {0u, 2u, 4u, 360u, 360u, 1u, 1u, 0u, 360u, 0u,
     false, 1u, 1u, 1u}},
    {1u, {true, false, 480u}, {false, true, 0u}, {0u, 2u, 5u, 360u, 360u, 1u, 1u, 0u, 360u, 0u,
     false, 1u, 2u, 1u}},
    {2u, {true, false, 370u}, {false, true, 0u}, {2u, 2u, 7u, 370u, 370u, 1u, 1u, 0u, 370u, 0u,
     false, 1u, 4u, 1u}},
    {2u, {true, false, 370u}, {false, true, 1u}, {4u, 3u, 1u, 370u, 370u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 6u, 1u}},
    {1u, {true, false, 369u}, {false, true, 1u}, {5u, 3u, 2u, 369u, 370u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 7u, 1u}},
    {1u, {true, false, 292u}, {false, true, 1u}, {0u, 3u, 3u, 369u, 370u, 1u, 0u, 0u, 369u, 0u,
     false, 1u, 8u, 1u}},
    {1u, {true, false, 371u}, {false, true, 1u}, {1u, 3u, 4u, 371u, 369u, 1u, 0u, 0u, 370u, 0u,
     false, 1u, 9u, 1u}},
    {38u, {false, false, 293u}, {false, true, 1u}, {39u, 3u, 12u, 293u, 293u, 1u, 0u, 0u, 293u, 0u,
     false, 1u, 47u, 1u}},
    {26u, {false, false, 293u}, {false, true, 0u}, {40u, 1u, 12u, 293u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 1u, 73u, 1u}},
    {1u, {false, false, 347u}, {false, true, 0u}, {40u, 1u, 12u, 347u, 293u, 0u, 1u, 0u, 293u, 0u,
     false, 1u, 74u, 1u}},
    {1u, {false, true, 347u}, {false, true, 0u}, {40u, 1u, 12u, 347u, 347u, 0u, 1u, 0u, 347u, 0u,
     false, 1u, 75u, 1u}},
    {1u, {true, true, 347u}, {true, false, 0u}, {40u, 1u, 12u, 347u, 347u, 0u, 1u, 1u, 347u, 0u,
     false, 2u, 0u, 0u}},
    {1u, {true, true, 293u}, {true, false, 0u}, {40u, 1u, 12u, 293u, 347u, 0u, 1u, 1u, 347u, 1u,
     false, 2u, 1u, 0u}},
    {3u, {true, true, 347u}, {true, false, 0u}, {40u, 1u, 12u, 347u, 347u, 0u, 1u, 1u, 347u, 4u,
     false, 2u, 4u, 0u}},
    {1u, {true, true, 383u}, {true, false, 0u}, {40u, 1u, 12u, 383u, 347u, 0u, 1u, 1u, 347u, 5u,
     false, 2u, 5u, 0u}},
    {1u, {true, true, 352u}, {true, false, 0u}, {40u, 1u, 12u, 352u, 383u, 0u, 1u, 1u, 352u, 0u,
     false, 2u, 6u, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct wah1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 15u, false, {0u}},
    {15u, 22u, false, {0u}},
    {22u, 27u, false, {0u}},
    {27u, 32u, false, {0u}},
    {32u, 33u, false, {0u}},
    {33u, 34u, false, {0u}},
    {34u, 35u, false, {0u}},
    {35u, 72u, false, {0u}},
    {72u, 105u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct wah1 m;
    struct wah1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    wah1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            wah1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct wah1 fresh =
    {0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 0u, 1u};

static void start_and_compare(const char *what, const struct wah1_remembered *r,
                              const struct wah1 *wanted)
{
    struct wah1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    wah1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct wah1 m;
    struct wah1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", wah1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", wah1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct wah1 m;
    struct wah1_in in;
    struct wah1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct wah1 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 1u};

        doing = "exchanger_probe_state upset";
        wah1_start(&m, NULL);
        m.exchanger_probe_state = 4u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 1u};

        doing = "exchanger_probe_state upset";
        wah1_start(&m, NULL);
        m.exchanger_probe_state = 255u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "fan_disc upset";
        wah1_start(&m, NULL);
        m.fan_disc = 2u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "fan_disc upset";
        wah1_start(&m, NULL);
        m.fan_disc = 255u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "exchanger_stat upset";
        wah1_start(&m, NULL);
        m.exchanger_stat = 2u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "exchanger_stat upset";
        wah1_start(&m, NULL);
        m.exchanger_stat = 255u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "burner_call upset";
        wah1_start(&m, NULL);
        m.burner_call = 2u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "burner_call upset";
        wah1_start(&m, NULL);
        m.burner_call = 255u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 0u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "run_on upset";
        wah1_start(&m, NULL);
        m.run_on = 3u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 0u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "run_on upset";
        wah1_start(&m, NULL);
        m.run_on = 255u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "fan upset";
        wah1_start(&m, NULL);
        m.fan = 2u;
        wah1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct wah1 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, false, 1u, 1u, 1u};
        static const struct wah1_out wanted =
           {false, true, 0u};

        doing = "fan upset";
        wah1_start(&m, NULL);
        m.fan = 255u;
        wah1_step(&m, &in, &out);
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
