/* cal2_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Calorifier 2, east plant room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 2ab43e817eac8807b18bdd14c38c5efd2bd324b5d3f4009e33bafa75cbb44596
 *
 * Replaces:
 * - tank_stat: rod immersion stat in the top boss
 *
 * Stays hard-wired, and must:
 * - high_limit: capillary limit in the same boss, manual reset
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
 * Open findings: 2 proving_switch_not_checked_open (act, flow_proven); 3 earth_fault_bypasses_limit
 * (act, cal2); 4 insulation_of_new_probe (act, tank_probe); 5 contact_life (act, heater); 6
 * scald_and_storage (act, tank_stat); 7 model_beyond_evidence (act, cal2); 8
 * mercury_asbestos_refrigerant (act, tank_stat); 9 approval_lapses (act, cal2). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "cal2.h"

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

static void compare_out(const struct cal2_out *got, const struct cal2_out *wanted)
{
    compare("heater", (long)got->heater, (long)wanted->heater);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct cal2 *got, const struct cal2 *wanted)
{
    compare("tank_probe_good_for",
            (long)got->tank_probe_good_for,
            (long)wanted->tank_probe_good_for);
    compare("tank_probe_state", (long)got->tank_probe_state, (long)wanted->tank_probe_state);
    compare("tank_probe_state_for",
            (long)got->tank_probe_state_for,
            (long)wanted->tank_probe_state_for);
    compare("tank_probe_last", (long)got->tank_probe_last, (long)wanted->tank_probe_last);
    compare("tank_probe_before", (long)got->tank_probe_before, (long)wanted->tank_probe_before);
    compare("tank_stat", (long)got->tank_stat, (long)wanted->tank_stat);
    compare("heater", (long)got->heater, (long)wanted->heater);
    compare("heater_for", (long)got->heater_for, (long)wanted->heater_for);
    compare("heater_apart_for", (long)got->heater_apart_for, (long)wanted->heater_apart_for);
    compare("heater_welded", (long)got->heater_welded, (long)wanted->heater_welded);
    compare("heater_effect_from", (long)got->heater_effect_from, (long)wanted->heater_effect_from);
    compare("heater_effect_for", (long)got->heater_effect_for, (long)wanted->heater_effect_for);
    compare("heater_no_effect", (long)got->heater_no_effect, (long)wanted->heater_no_effect);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct cal2_in in;
    struct cal2_out out;
    struct cal2 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, false, 1972u, false}, {false, 0u}, {1u, 0u, 1u, 1972u, 0u, 0u, 0u, 1u, 0u, false,
     0u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {2u, 0u, 2u, 1972u, 1972u, 0u, 0u, 2u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {3u, 0u, 3u, 1972u, 1972u, 0u, 0u, 3u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {4u, 1u, 0u, 1972u, 1972u, 0u, 0u, 4u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {5u, 1u, 1u, 1972u, 1972u, 0u, 0u, 5u, 0u,
     false, 1972u, 0u, false}},
    {11u, {false, false, 1972u, false}, {false, 0u}, {16u, 1u, 12u, 1972u, 1972u, 0u, 0u, 16u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {17u, 1u, 12u, 1972u, 1972u, 0u, 0u, 17u, 0u,
     false, 1972u, 0u, false}},
    {23u, {false, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 40u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 41u, 0u,
     false, 1972u, 0u, false}},
    {199u, {false, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u,
     false, 1972u, 0u, false}},
    {1u, {true, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 0u, false}, {false, 0u}, {0u, 2u, 0u, 1972u, 1972u, 0u, 0u, 240u, 0u, false,
     1972u, 0u, false}},
    /* vector 2 */
    {11u, {false, false, 0u, false}, {false, 0u}, {0u, 0u, 11u, 0u, 0u, 0u, 0u, 11u, 0u, false, 0u,
     0u, false}},
    {1u, {false, false, 0u, false}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 0u, 0u, 12u, 0u, false, 0u,
     0u, false}},
    {1u, {false, false, 0u, false}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 0u, 0u, 13u, 0u, false, 0u,
     0u, false}},
    {1u, {false, false, 226u, false}, {false, 1u}, {0u, 3u, 2u, 0u, 0u, 0u, 0u, 14u, 0u, false, 0u,
     0u, false}},
    {1u, {false, false, 227u, false}, {false, 1u}, {1u, 3u, 3u, 227u, 0u, 0u, 0u, 15u, 0u, false,
     0u, 0u, false}},
    {2u, {false, false, 1973u, false}, {false, 1u}, {3u, 3u, 5u, 1973u, 1973u, 0u, 0u, 17u, 0u,
     false, 1973u, 0u, false}},
    /* vector 3 */
    {2u, {false, false, 1973u, false}, {false, 0u}, {2u, 0u, 2u, 1973u, 1973u, 0u, 0u, 2u, 0u,
     false, 1973u, 0u, false}},
    {2u, {false, false, 1973u, false}, {false, 0u}, {4u, 1u, 0u, 1973u, 1973u, 1u, 0u, 4u, 0u,
     false, 1973u, 0u, false}},
    {1u, {false, false, 1973u, false}, {false, 0u}, {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {235u, {false, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u,
     false, 1973u, 0u, false}},
    /* vector 4 */
    {4u, {false, false, 1974u, false}, {false, 0u}, {4u, 1u, 0u, 1974u, 1974u, 1u, 0u, 4u, 0u,
     false, 1974u, 0u, false}},
    {1u, {false, false, 4081u, false}, {false, 0u}, {5u, 1u, 1u, 4081u, 1974u, 1u, 0u, 5u, 0u,
     false, 1974u, 0u, false}},
    {1u, {false, false, 4082u, false}, {false, 0u}, {0u, 2u, 0u, 4081u, 1974u, 1u, 0u, 6u, 0u,
     false, 4081u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 0u}, {1u, 2u, 1u, 1972u, 4081u, 1u, 0u, 7u, 1u, false,
     1974u, 0u, false}},
    /* vector 5 */
    {1u, {false, false, 1972u, true}, {false, 0u}, {1u, 0u, 1u, 1972u, 0u, 0u, 0u, 1u, 1u, false,
     0u, 0u, false}},
    {2u, {false, false, 1972u, true}, {false, 0u}, {3u, 0u, 3u, 1972u, 1972u, 0u, 0u, 3u, 3u, false,
     1972u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 2u}, {4u, 1u, 0u, 1972u, 1972u, 0u, 0u, 4u, 4u, true,
     1972u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 2u}, {5u, 1u, 1u, 1972u, 1972u, 0u, 0u, 5u, 4u, true,
     1972u, 0u, false}},
    {1u, {false, false, 2079u, false}, {false, 2u}, {6u, 1u, 2u, 2079u, 1972u, 0u, 0u, 6u, 0u, true,
     1972u, 0u, false}},
    {1u, {false, false, 4082u, false}, {false, 2u}, {0u, 2u, 0u, 2079u, 1972u, 0u, 0u, 7u, 0u, true,
     2079u, 0u, false}},
    {1u, {true, false, 1973u, false}, {false, 2u}, {1u, 2u, 1u, 1973u, 2079u, 0u, 0u, 8u, 0u, true,
     1973u, 0u, false}},
    {1u, {true, false, 1973u, false}, {false, 2u}, {2u, 2u, 2u, 1973u, 1973u, 0u, 0u, 9u, 0u, true,
     1973u, 0u, false}},
    {1u, {true, false, 1973u, false}, {false, 2u}, {3u, 2u, 3u, 1973u, 1973u, 0u, 0u, 10u, 0u, true,
     1973u, 0u, false}},
    {1u, {true, false, 1972u, false}, {false, 2u}, {4u, 1u, 0u, 1972u, 1973u, 1u, 0u, 11u, 0u, true,
     1973u, 0u, false}},
    {1u, {true, false, 1973u, false}, {false, 2u}, {5u, 1u, 1u, 1973u, 1972u, 1u, 0u, 12u, 0u, true,
     1973u, 0u, false}},
    /* vector 6 */
    {5u, {false, false, 1972u, false}, {false, 0u}, {5u, 1u, 1u, 1972u, 1972u, 0u, 0u, 5u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 2079u, false}, {false, 0u}, {6u, 1u, 2u, 2079u, 1972u, 0u, 0u, 6u, 0u,
     false, 1972u, 0u, false}},
    {1u, {false, false, 4082u, false}, {false, 0u}, {0u, 2u, 0u, 2079u, 1972u, 0u, 0u, 7u, 0u,
     false, 2079u, 0u, false}},
    {3u, {true, false, 2187u, false}, {false, 0u}, {3u, 2u, 3u, 2187u, 2187u, 0u, 0u, 10u, 0u,
     false, 2187u, 0u, false}},
    {1u, {true, false, 227u, false}, {false, 0u}, {4u, 1u, 0u, 227u, 2187u, 1u, 0u, 11u, 0u, false,
     2187u, 0u, false}},
    {1u, {true, false, 227u, false}, {false, 0u}, {5u, 1u, 1u, 227u, 227u, 0u, 0u, 12u, 0u, false,
     227u, 0u, false}},
    {240u, {false, false, 4080u, false}, {false, 0u}, {40u, 1u, 12u, 4080u, 4080u, 1u, 0u, 240u, 0u,
     false, 4080u, 0u, false}},
    {1u, {false, true, 65535u, false}, {false, 0u}, {0u, 2u, 0u, 4080u, 4080u, 1u, 0u, 240u, 0u,
     false, 4080u, 0u, false}},
    {1u, {true, true, 65535u, false}, {false, 0u}, {0u, 2u, 1u, 4080u, 4080u, 1u, 0u, 240u, 0u,
     false, 4080u, 0u, false}},
    {3u, {true, false, 226u, true}, {false, 0u}, {0u, 2u, 4u, 4080u, 4080u, 1u, 0u, 240u, 3u, false,
     4080u, 0u, false}},
    {3u, {true, false, 226u, true}, {false, 2u}, {0u, 2u, 7u, 4080u, 4080u, 1u, 0u, 240u, 4u, true,
     4080u, 0u, false}},
    {1u, {true, true, 226u, true}, {false, 3u}, {0u, 3u, 0u, 4080u, 4080u, 0u, 0u, 240u, 4u, true,
     4080u, 0u, false}},
    {39u, {true, true, 4080u, true}, {false, 3u}, {39u, 3u, 12u, 4080u, 4080u, 0u, 0u, 240u, 4u,
     true, 4080u, 0u, false}},
    {1u, {true, true, 1750u, false}, {false, 2u}, {40u, 1u, 0u, 1750u, 4080u, 1u, 0u, 240u, 0u,
     true, 4080u, 0u, false}},
    {1u, {true, true, 1750u, false}, {false, 2u}, {40u, 1u, 1u, 1750u, 1750u, 1u, 0u, 240u, 0u,
     true, 1750u, 0u, false}},
    /* vector 7 */
    {5u, {false, false, 1973u, false}, {false, 0u}, {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {1u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1973u, 1u, 1u, 0u, 0u,
     false, 1973u, 0u, false}},
    {1u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 1u, 1u,
     false, 1750u, 0u, false}},
    {1u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 2u, 2u,
     false, 1750u, 1u, false}},
    {1u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 3u, 3u,
     false, 1750u, 2u, false}},
    {1u, {true, false, 1750u, false}, {true, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 4u, 4u,
     false, 1750u, 3u, false}},
    {1u, {false, false, 1750u, false}, {false, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 0u, 0u, 4u,
     false, 1750u, 4u, false}},
    {5u, {false, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {3u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 2u, 2u,
     false, 1750u, 1u, false}},
    {1u, {false, true, 1750u, true}, {false, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 0u, 0u, 0u,
     false, 1750u, 1u, false}},
    {5u, {false, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {3u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 2u, 2u,
     false, 1750u, 1u, false}},
    {1u, {true, false, 228u, false}, {true, 0u}, {40u, 1u, 12u, 228u, 1750u, 1u, 1u, 3u, 3u, false,
     1750u, 2u, false}},
    {1u, {true, false, 65535u, false}, {true, 4u}, {0u, 2u, 0u, 228u, 1750u, 0u, 1u, 4u, 4u, false,
     228u, 0u, false}},
    {1u, {true, false, 1858u, false}, {true, 4u}, {1u, 2u, 1u, 1858u, 228u, 0u, 1u, 5u, 4u, false,
     1750u, 1u, false}},
    {115u, {true, false, 1973u, false}, {true, 4u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 1u, 120u, 4u,
     false, 1973u, 116u, false}},
    {5u, {true, false, 1750u, false}, {true, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 125u, 4u,
     false, 1750u, 3u, false}},
    {6101u, {true, false, 1750u, true}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 240u, 0u,
     false, 1750u, 6104u, false}},
    {1u, {true, false, 1750u, true}, {false, 8u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 0u, 0u, 0u,
     false, 1750u, 6105u, true}},
    /* vector 8 */
    {5u, {false, false, 1973u, false}, {false, 0u}, {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {3u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 2u, 2u,
     false, 1750u, 1u, false}},
    {1u, {true, false, 228u, false}, {true, 0u}, {40u, 1u, 12u, 228u, 1750u, 1u, 1u, 3u, 3u, false,
     1750u, 2u, false}},
    {1u, {true, false, 1972u, false}, {true, 4u}, {40u, 1u, 12u, 1972u, 228u, 1u, 1u, 4u, 4u, false,
     1750u, 3u, false}},
    {1u, {true, false, 0u, false}, {true, 4u}, {0u, 2u, 0u, 1972u, 228u, 1u, 1u, 5u, 4u, false,
     1972u, 4u, false}},
    {1u, {true, false, 227u, false}, {true, 4u}, {1u, 2u, 1u, 227u, 1972u, 0u, 1u, 6u, 4u, false,
     228u, 0u, false}},
    {1u, {false, false, 227u, false}, {false, 4u}, {2u, 2u, 2u, 227u, 227u, 0u, 0u, 0u, 4u, false,
     228u, 1u, false}},
    {5u, {false, false, 1973u, false}, {false, 0u}, {7u, 1u, 3u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {3u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 2u, 2u,
     false, 1750u, 1u, false}},
    {1u, {true, false, 228u, false}, {true, 0u}, {40u, 1u, 12u, 228u, 1750u, 1u, 1u, 3u, 3u, false,
     1750u, 2u, false}},
    {1u, {true, false, 1972u, false}, {true, 4u}, {40u, 1u, 12u, 1972u, 228u, 1u, 1u, 4u, 4u, false,
     1750u, 3u, false}},
    {1u, {true, false, 0u, false}, {true, 4u}, {0u, 2u, 0u, 1972u, 228u, 1u, 1u, 5u, 4u, false,
     1972u, 4u, false}},
    {114u, {true, false, 227u, false}, {true, 4u}, {40u, 1u, 12u, 227u, 227u, 0u, 1u, 119u, 4u,
     false, 228u, 113u, false}},
    {1u, {true, false, 227u, false}, {false, 4u}, {40u, 1u, 12u, 227u, 227u, 0u, 0u, 0u, 4u, false,
     228u, 114u, false}},
    {8u, {true, false, 4081u, true}, {false, 2u}, {40u, 1u, 12u, 4081u, 4081u, 1u, 0u, 8u, 4u, true,
     4081u, 0u, false}},
    {1u, {true, false, 4080u, true}, {false, 2u}, {40u, 1u, 12u, 4080u, 4081u, 1u, 0u, 9u, 4u, true,
     4081u, 0u, false}},
    {1u, {true, false, 4188u, true}, {false, 2u}, {0u, 2u, 0u, 4080u, 4081u, 1u, 0u, 10u, 4u, true,
     4080u, 0u, false}},
    /* vector 9 */
    {5u, {false, false, 1973u, false}, {false, 0u}, {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {4u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 3u, 3u,
     false, 1750u, 2u, false}},
    {1u, {true, false, 1750u, false}, {true, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 4u, 4u,
     false, 1750u, 3u, false}},
    {116u, {true, false, 1973u, false}, {true, 4u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 1u, 120u, 4u,
     false, 1973u, 119u, false}},
    {1u, {true, false, 1748u, false}, {true, 4u}, {40u, 1u, 12u, 1748u, 1973u, 1u, 1u, 121u, 4u,
     false, 1973u, 120u, false}},
    {1u, {true, false, 1748u, false}, {false, 4u}, {40u, 1u, 12u, 1748u, 1748u, 0u, 0u, 0u, 4u,
     false, 1748u, 0u, false}},
    {8u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 8u, 0u,
     false, 1973u, 0u, false}},
    {1u, {true, false, 1750u, false}, {false, 0u}, {40u, 1u, 12u, 1750u, 1973u, 1u, 0u, 9u, 0u,
     false, 1973u, 0u, false}},
    {1u, {false, false, 1750u, false}, {false, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 0u, 10u, 0u,
     false, 1750u, 0u, false}},
    {2u, {false, false, 1749u, false}, {false, 0u}, {40u, 1u, 12u, 1749u, 1749u, 0u, 0u, 12u, 0u,
     false, 1749u, 0u, false}},
    {227u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {4u, {true, false, 1973u, false}, {true, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 1u, 3u, 3u,
     false, 1973u, 3u, false}},
    {3u, {true, false, 1973u, false}, {true, 4u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 1u, 6u, 4u,
     false, 1973u, 6u, false}},
    {3u, {true, false, 1750u, false}, {true, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 9u, 4u,
     false, 1750u, 1u, false}},
    {1u, {true, false, 228u, false}, {true, 4u}, {40u, 1u, 12u, 228u, 1750u, 1u, 1u, 10u, 4u, false,
     1750u, 2u, false}},
    {1u, {true, false, 1972u, false}, {true, 4u}, {40u, 1u, 12u, 1972u, 228u, 1u, 1u, 11u, 4u,
     false, 1750u, 3u, false}},
    {118u, {true, false, 1974u, false}, {true, 4u}, {40u, 1u, 12u, 1974u, 1974u, 1u, 1u, 129u, 4u,
     false, 1974u, 121u, false}},
    {5983u, {true, false, 2083u, false}, {true, 4u}, {40u, 1u, 12u, 2083u, 2083u, 1u, 1u, 240u, 4u,
     false, 2083u, 6104u, false}},
    {1u, {true, false, 2083u, false}, {false, 12u}, {40u, 1u, 12u, 2083u, 2083u, 1u, 0u, 0u, 4u,
     false, 2083u, 6105u, true}},
    {240u, {true, false, 2083u, false}, {false, 8u}, {40u, 1u, 12u, 2083u, 2083u, 1u, 0u, 240u, 0u,
     false, 2083u, 0u, true}},
    /* vector 10 */
    {5u, {false, false, 1973u, false}, {false, 0u}, {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u,
     false, 1973u, 0u, false}},
    {234u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 239u, 0u,
     false, 1973u, 0u, false}},
    {4u, {true, false, 1750u, false}, {true, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 3u, 3u,
     false, 1750u, 2u, false}},
    {2u, {true, true, 4082u, false}, {true, 4u}, {0u, 2u, 1u, 1750u, 1750u, 1u, 1u, 5u, 4u, false,
     1750u, 2u, false}},
    {4u, {true, true, 4082u, true}, {true, 0u}, {0u, 2u, 5u, 1750u, 1750u, 1u, 1u, 9u, 0u, false,
     1750u, 2u, false}},
    {1u, {true, false, 4082u, true}, {true, 0u}, {0u, 2u, 6u, 1750u, 1750u, 1u, 1u, 10u, 0u, false,
     1750u, 3u, false}},
    {1u, {true, false, 4081u, true}, {true, 0u}, {1u, 2u, 7u, 4081u, 1750u, 1u, 1u, 11u, 0u, false,
     1750u, 4u, false}},
    {1u, {true, false, 4081u, true}, {false, 1u}, {2u, 3u, 0u, 4081u, 4081u, 0u, 0u, 0u, 0u, false,
     4081u, 5u, false}},
    {37u, {true, false, 1973u, false}, {false, 1u}, {39u, 3u, 12u, 1973u, 1973u, 0u, 0u, 37u, 0u,
     false, 1973u, 0u, false}},
    {197u, {true, false, 1973u, false}, {false, 0u}, {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 234u, 0u,
     false, 1973u, 0u, false}},
    {3u, {true, false, 1750u, false}, {false, 0u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 0u, 237u, 0u,
     false, 1750u, 0u, false}},
    {1u, {true, false, 228u, false}, {false, 0u}, {40u, 1u, 12u, 228u, 1750u, 1u, 0u, 238u, 0u,
     false, 1750u, 0u, false}},
    {1u, {true, false, 1972u, false}, {false, 0u}, {40u, 1u, 12u, 1972u, 228u, 1u, 0u, 239u, 0u,
     false, 1750u, 0u, false}},
    {1u, {true, false, 1974u, false}, {true, 0u}, {40u, 1u, 12u, 1974u, 1972u, 1u, 1u, 0u, 0u,
     false, 1972u, 0u, false}},
    {3u, {true, false, 2083u, false}, {true, 0u}, {40u, 1u, 12u, 2083u, 2083u, 1u, 1u, 3u, 3u,
     false, 2083u, 3u, false}},
    {1u, {true, false, 1976u, false}, {true, 4u}, {40u, 1u, 12u, 1976u, 2083u, 1u, 1u, 4u, 4u,
     false, 2083u, 4u, false}},
    {1u, {true, false, 228u, false}, {true, 4u}, {40u, 1u, 12u, 228u, 1976u, 1u, 1u, 5u, 4u, false,
     1976u, 0u, false}},
    {4u, {true, false, 2083u, false}, {true, 4u}, {40u, 1u, 12u, 2083u, 2083u, 1u, 1u, 9u, 4u,
     false, 2083u, 4u, false}},
    {1u, {true, false, 2084u, false}, {true, 4u}, {40u, 1u, 12u, 2084u, 2083u, 1u, 1u, 10u, 4u,
     false, 2083u, 5u, false}},
    {1u, {true, false, 2191u, false}, {true, 4u}, {40u, 1u, 12u, 2191u, 2084u, 1u, 1u, 11u, 4u,
     false, 2084u, 6u, false}},
    {3u, {true, true, 1750u, false}, {true, 4u}, {40u, 1u, 12u, 1750u, 1750u, 1u, 1u, 14u, 4u,
     false, 1750u, 0u, false}},
    {2u, {true, true, 1644u, false}, {true, 4u}, {40u, 1u, 12u, 1644u, 1644u, 0u, 1u, 16u, 4u,
     false, 1750u, 0u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct cal2_remembered record;
};

static const struct vector vectors[] = {
    {0u, 13u, false, {0u}},
    {13u, 19u, false, {0u}},
    {19u, 23u, false, {0u}},
    {23u, 27u, false, {0u}},
    {27u, 38u, false, {0u}},
    {38u, 53u, false, {0u}},
    {53u, 75u, false, {0u}},
    {75u, 94u, false, {0u}},
    {94u, 115u, false, {0u}},
    {115u, 137u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct cal2 m;
    struct cal2_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    cal2_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            cal2_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct cal2 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};

static void start_and_compare(const char *what, const struct cal2_remembered *r,
                              const struct cal2 *wanted)
{
    struct cal2 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    cal2_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct cal2 m;
    struct cal2_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", cal2_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", cal2_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct cal2 m;
    struct cal2_in in;
    struct cal2_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct cal2 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 1u};

        doing = "tank_probe_state upset";
        cal2_start(&m, NULL);
        m.tank_probe_state = 4u;
        cal2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct cal2 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 1u};

        doing = "tank_probe_state upset";
        cal2_start(&m, NULL);
        m.tank_probe_state = 255u;
        cal2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct cal2 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 0u};

        doing = "tank_stat upset";
        cal2_start(&m, NULL);
        m.tank_stat = 2u;
        cal2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct cal2 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 0u};

        doing = "tank_stat upset";
        cal2_start(&m, NULL);
        m.tank_stat = 255u;
        cal2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct cal2 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 0u};

        doing = "heater upset";
        cal2_start(&m, NULL);
        m.heater = 2u;
        cal2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct cal2 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};
        static const struct cal2_out wanted =
           {false, 0u};

        doing = "heater upset";
        cal2_start(&m, NULL);
        m.heater = 255u;
        cal2_step(&m, &in, &out);
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
