/* ext5_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Extract fan 5, press room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 54d9ac13d9eb912fbd316f24f482063aa393d6dff5a3975ab977bd52380134f8
 *
 * Replaces:
 * - room_stat: room stat by the presses
 *
 * Stays hard-wired, and must:
 * - protector: motor protector in the winding, resets by itself
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
 * Open findings: 1 restarts_by_itself (act, fan); 2 earth_fault_bypasses_limit (act, ext5); 3
 * moisture_direction (act, room_probe); 4 damp_dust_washdown (act, ext5); 5 approval_lapses (act,
 * ext5); 6 limit_threshold_unknown (act, protector). Not judged, for want of a figure: 2; risks.md
 * says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "ext5.h"

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

static void compare_out(const struct ext5_out *got, const struct ext5_out *wanted)
{
    compare("fan", (long)got->fan, (long)wanted->fan);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct ext5 *got, const struct ext5 *wanted)
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
    compare("line_current_good_for",
            (long)got->line_current_good_for,
            (long)wanted->line_current_good_for);
    compare("line_current_state", (long)got->line_current_state, (long)wanted->line_current_state);
    compare("line_current_state_for",
            (long)got->line_current_state_for,
            (long)wanted->line_current_state_for);
    compare("line_current_last", (long)got->line_current_last, (long)wanted->line_current_last);
    compare("line_current_before",
            (long)got->line_current_before,
            (long)wanted->line_current_before);
    compare("room_stat", (long)got->room_stat, (long)wanted->room_stat);
    compare("protector_heat", (long)got->protector_heat, (long)wanted->protector_heat);
    compare("fan", (long)got->fan, (long)wanted->fan);
    compare("fan_for", (long)got->fan_for, (long)wanted->fan_for);
    compare("fan_apart_for", (long)got->fan_apart_for, (long)wanted->fan_apart_for);
    compare("fan_welded", (long)got->fan_welded, (long)wanted->fan_welded);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct ext5_in in;
    struct ext5_out out;
    struct ext5 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 3279u, 0u,
     0u, 0u, 0u, 1u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {2u, 0u, 2u, 2087u, 2087u, 2u, 0u, 2u, 3279u,
     3279u, 0u, 0u, 0u, 2u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 3279u,
     3279u, 0u, 0u, 0u, 3u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 3279u,
     3279u, 0u, 14696u, 0u, 4u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {5u, 1u, 1u, 2087u, 2087u, 5u, 1u, 1u, 3279u,
     3279u, 0u, 29365u, 0u, 5u, 0u, false}},
    {5u, {false, 2087u, 3279u, false}, {false, 0u}, {10u, 1u, 6u, 2087u, 2087u, 10u, 1u, 6u, 3279u,
     3279u, 0u, UINT32_C(102318), 0u, 10u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 4u}, {11u, 1u, 7u, 2087u, 2087u, 11u, 1u, 7u, 3279u,
     3279u, 0u, UINT32_C(116830), 0u, 11u, 0u, false}},
    {5u, {false, 2087u, 3279u, false}, {false, 4u}, {16u, 1u, 12u, 2087u, 2087u, 16u, 1u, 12u,
     3279u, 3279u, 0u, UINT32_C(189000), 0u, 16u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 4u}, {17u, 1u, 12u, 2087u, 2087u, 17u, 1u, 12u,
     3279u, 3279u, 0u, UINT32_C(203357), 0u, 17u, 0u, false}},
    {23u, {false, 2087u, 3279u, false}, {false, 4u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     3279u, 3279u, 0u, UINT32_C(526539), 0u, 40u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 4u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     3279u, 3279u, 0u, UINT32_C(540290), 0u, 41u, 0u, false}},
    {1u, {false, 0u, 3279u, false}, {false, 4u}, {0u, 2u, 0u, 2087u, 2087u, 40u, 1u, 12u, 3279u,
     3279u, 0u, UINT32_C(554016), 0u, 42u, 0u, false}},
    /* vector 2 */
    {1u, {false, 0u, 3279u, false}, {false, 0u}, {0u, 0u, 1u, 0u, 0u, 1u, 0u, 1u, 3279u, 0u, 0u, 0u,
     0u, 1u, 0u, false}},
    {9u, {false, 0u, 3279u, false}, {false, 0u}, {0u, 0u, 10u, 0u, 0u, 10u, 1u, 6u, 3279u, 3279u,
     0u, UINT32_C(102318), 0u, 10u, 0u, false}},
    {1u, {false, 0u, 3279u, false}, {false, 4u}, {0u, 0u, 11u, 0u, 0u, 11u, 1u, 7u, 3279u, 3279u,
     0u, UINT32_C(116830), 0u, 11u, 0u, false}},
    {1u, {false, 0u, 3279u, false}, {false, 5u}, {0u, 3u, 0u, 0u, 0u, 12u, 1u, 8u, 3279u, 3279u, 0u,
     UINT32_C(131316), 0u, 12u, 0u, false}},
    {1u, {false, 0u, 3279u, false}, {false, 5u}, {0u, 3u, 1u, 0u, 0u, 13u, 1u, 9u, 3279u, 3279u, 0u,
     UINT32_C(145776), 0u, 13u, 0u, false}},
    {1u, {false, 130u, 3279u, false}, {false, 5u}, {0u, 3u, 2u, 0u, 0u, 14u, 1u, 10u, 3279u, 3279u,
     0u, UINT32_C(160210), 0u, 14u, 0u, false}},
    {1u, {false, 131u, 3279u, false}, {false, 5u}, {1u, 3u, 3u, 131u, 0u, 15u, 1u, 11u, 3279u,
     3279u, 0u, UINT32_C(174618), 0u, 15u, 0u, false}},
    /* vector 3 */
    {4u, {false, 131u, 3279u, false}, {false, 0u}, {4u, 1u, 0u, 131u, 131u, 4u, 1u, 0u, 3279u,
     3279u, 1u, 14696u, 0u, 4u, 0u, false}},
    {1u, {false, 131u, 3279u, false}, {false, 0u}, {5u, 1u, 1u, 131u, 131u, 5u, 1u, 1u, 3279u,
     3279u, 1u, 29365u, 0u, 5u, 0u, false}},
    /* vector 4 */
    {4u, {false, 2007u, 3279u, false}, {false, 0u}, {4u, 1u, 0u, 2007u, 2007u, 4u, 1u, 0u, 3279u,
     3279u, 1u, 14696u, 0u, 4u, 0u, false}},
    /* vector 5 */
    {4u, {false, 2008u, 3279u, false}, {false, 0u}, {4u, 1u, 0u, 2008u, 2008u, 4u, 1u, 0u, 3279u,
     3279u, 0u, 14696u, 0u, 4u, 0u, false}},
    {1u, {false, 4036u, 3279u, false}, {false, 0u}, {5u, 1u, 1u, 4036u, 2008u, 5u, 1u, 1u, 3279u,
     3279u, 0u, 29365u, 0u, 5u, 0u, false}},
    {1u, {false, 4037u, 3279u, false}, {false, 0u}, {0u, 2u, 0u, 4036u, 2008u, 6u, 1u, 2u, 3279u,
     3279u, 0u, 44008u, 0u, 6u, 0u, false}},
    {1u, {false, 2087u, 0u, false}, {false, 0u}, {1u, 2u, 1u, 2087u, 4036u, 7u, 1u, 3u, 0u, 3279u,
     0u, 58625u, 0u, 7u, 0u, false}},
    {1u, {false, 2087u, 0u, false}, {false, 0u}, {2u, 2u, 2u, 2087u, 2087u, 8u, 1u, 4u, 0u, 0u, 0u,
     58520u, 0u, 8u, 0u, false}},
    {1u, {false, 2087u, 0u, false}, {false, 0u}, {3u, 2u, 3u, 2087u, 2087u, 9u, 1u, 5u, 0u, 0u, 0u,
     58415u, 0u, 9u, 0u, false}},
    {1u, {false, 2087u, 0u, false}, {false, 0u}, {4u, 1u, 0u, 2087u, 2087u, 10u, 1u, 6u, 0u, 0u, 0u,
     58311u, 0u, 10u, 0u, false}},
    {470u, {false, 2087u, 0u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u, 0u,
     0u, 0u, 25217u, 0u, 480u, 0u, false}},
    {1u, {false, 2087u, 0u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u, 0u, 0u,
     0u, 25172u, 0u, 480u, 0u, false}},
    {1u, {false, 2087u, 3280u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     3280u, 0u, 0u, 25127u, 0u, 480u, 0u, false}},
    {1u, {false, 2087u, 3280u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     3280u, 3280u, 0u, 39789u, 0u, 480u, 0u, false}},
    {1u, {false, 2087u, 4081u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     4081u, 3280u, 0u, 54424u, 0u, 480u, 0u, false}},
    {1u, {false, 2087u, 4082u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 0u, 2u, 0u, 4081u,
     3280u, 0u, 54424u, 0u, 480u, 0u, false}},
    /* vector 6 */
    {1u, {false, 2087u, 4082u, false}, {false, 0u}, {1u, 0u, 1u, 2087u, 0u, 0u, 0u, 1u, 0u, 0u, 0u,
     0u, 0u, 1u, 0u, false}},
    {10u, {false, 2087u, 4082u, false}, {false, 0u}, {11u, 1u, 7u, 2087u, 2087u, 0u, 0u, 11u, 0u,
     0u, 0u, 0u, 0u, 11u, 0u, false}},
    {1u, {false, 2087u, 4082u, false}, {false, 2u}, {12u, 1u, 8u, 2087u, 2087u, 0u, 3u, 0u, 0u, 0u,
     0u, 0u, 0u, 12u, 0u, false}},
    {1u, {false, 2087u, 4082u, false}, {false, 2u}, {13u, 1u, 9u, 2087u, 2087u, 0u, 3u, 1u, 0u, 0u,
     0u, 0u, 0u, 13u, 0u, false}},
    {1u, {false, 2087u, 3279u, true}, {false, 2u}, {14u, 1u, 10u, 2087u, 2087u, 1u, 3u, 2u, 3279u,
     0u, 0u, 0u, 0u, 14u, 1u, false}},
    /* vector 7 */
    {1u, {false, 2087u, 3279u, true}, {false, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 3279u, 0u,
     0u, 0u, 0u, 1u, 1u, false}},
    {2u, {false, 2087u, 3279u, true}, {false, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 3279u,
     3279u, 0u, 0u, 0u, 3u, 3u, false}},
    {1u, {false, 2087u, 3279u, true}, {false, 8u}, {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 3279u,
     3279u, 0u, 14696u, 0u, 4u, 4u, true}},
    {1u, {false, 2087u, 3279u, true}, {false, 8u}, {5u, 1u, 1u, 2087u, 2087u, 5u, 1u, 1u, 3279u,
     3279u, 0u, 29365u, 0u, 5u, 4u, true}},
    {1u, {true, 2008u, 4082u, false}, {false, 8u}, {6u, 1u, 2u, 2008u, 2087u, 0u, 2u, 0u, 3279u,
     3279u, 0u, 29365u, 0u, 6u, 0u, true}},
    {1u, {true, 2008u, 3278u, false}, {false, 8u}, {7u, 1u, 3u, 2008u, 2008u, 1u, 2u, 1u, 3278u,
     3279u, 0u, 29365u, 0u, 7u, 0u, true}},
    {1u, {false, 2006u, 3279u, false}, {false, 8u}, {8u, 1u, 4u, 2006u, 2008u, 2u, 2u, 2u, 3279u,
     3278u, 0u, 29365u, 0u, 8u, 0u, true}},
    {1u, {false, 2006u, 3279u, false}, {false, 8u}, {9u, 1u, 5u, 2006u, 2006u, 3u, 2u, 3u, 3279u,
     3279u, 1u, 29365u, 0u, 9u, 0u, true}},
    {1u, {false, 2006u, 3279u, false}, {false, 8u}, {10u, 1u, 6u, 2006u, 2006u, 4u, 1u, 0u, 3279u,
     3279u, 1u, 44008u, 0u, 10u, 0u, true}},
    {2u, {false, 2006u, 3279u, false}, {false, 8u}, {12u, 1u, 8u, 2006u, 2006u, 6u, 1u, 2u, 3279u,
     3279u, 1u, UINT32_C(73216), 0u, 12u, 0u, true}},
    {1u, {false, 65535u, 3279u, false}, {false, 8u}, {0u, 2u, 0u, 2006u, 2006u, 7u, 1u, 3u, 3279u,
     3279u, 1u, UINT32_C(87780), 0u, 13u, 0u, true}},
    {1u, {false, 2087u, 3279u, true}, {false, 8u}, {1u, 2u, 1u, 2087u, 2006u, 8u, 1u, 4u, 3279u,
     3279u, 1u, UINT32_C(102318), 0u, 14u, 1u, true}},
    {1u, {false, 2087u, 3279u, true}, {false, 12u}, {2u, 2u, 2u, 2087u, 2087u, 9u, 1u, 5u, 3279u,
     3279u, 1u, UINT32_C(116830), 0u, 15u, 2u, true}},
    {1u, {false, 2089u, 3279u, true}, {false, 12u}, {3u, 2u, 3u, 2089u, 2087u, 10u, 1u, 6u, 3279u,
     3279u, 1u, UINT32_C(131316), 0u, 16u, 3u, true}},
    {1u, {false, 2089u, 3279u, true}, {false, 12u}, {4u, 1u, 0u, 2089u, 2089u, 11u, 1u, 7u, 3279u,
     3279u, 0u, UINT32_C(145776), 0u, 17u, 4u, true}},
    /* vector 8 */
    {481u, {false, 2087u, 1u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u, 1u,
     1u, 0u, 0u, 0u, 480u, 0u, false}},
    {3u, {false, 2087u, 4080u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     4080u, 4080u, 0u, 29387u, 0u, 480u, 0u, false}},
    {2u, {false, 2088u, 4080u, false}, {false, 0u}, {40u, 1u, 12u, 2088u, 2088u, 40u, 1u, 12u,
     4080u, 4080u, 0u, 58669u, 0u, 480u, 0u, false}},
    {1u, {false, 2007u, 65535u, true}, {false, 0u}, {40u, 1u, 12u, 2007u, 2088u, 0u, 2u, 0u, 4080u,
     4080u, 0u, 58669u, 0u, 480u, 1u, false}},
    {1u, {false, 2007u, 1u, true}, {true, 0u}, {40u, 1u, 12u, 2007u, 2007u, 1u, 2u, 1u, 1u, 4080u,
     1u, 58669u, 1u, 0u, 2u, false}},
    /* vector 9 */
    {1u, {false, 2087u, 1u, false}, {false, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 1u, 0u, 0u, 0u,
     0u, 1u, 0u, false}},
    {5u, {false, 2087u, 4080u, false}, {false, 0u}, {6u, 1u, 2u, 2087u, 2087u, 6u, 1u, 2u, 4080u,
     4080u, 0u, 44041u, 0u, 6u, 0u, false}},
    {1u, {false, 130u, 4080u, false}, {false, 0u}, {0u, 2u, 0u, 2087u, 2087u, 7u, 1u, 3u, 4080u,
     4080u, 0u, 58669u, 0u, 7u, 0u, false}},
    {1u, {false, 2006u, 4080u, false}, {false, 0u}, {1u, 2u, 1u, 2006u, 2087u, 8u, 1u, 4u, 4080u,
     4080u, 0u, UINT32_C(73271), 0u, 8u, 0u, false}},
    {1u, {false, 132u, 4080u, false}, {false, 0u}, {2u, 2u, 2u, 132u, 2006u, 9u, 1u, 5u, 4080u,
     4080u, 0u, UINT32_C(87846), 0u, 9u, 0u, false}},
    {1u, {false, 2006u, 3279u, false}, {false, 0u}, {3u, 2u, 3u, 2006u, 132u, 10u, 1u, 6u, 3279u,
     4080u, 0u, UINT32_C(102395), 0u, 10u, 0u, false}},
    {4u, {false, 2006u, 3279u, false}, {false, 4u}, {7u, 1u, 3u, 2006u, 2006u, 14u, 1u, 10u, 3279u,
     3279u, 1u, UINT32_C(160287), 0u, 14u, 0u, false}},
    {1u, {false, 65535u, 3279u, false}, {false, 4u}, {0u, 2u, 0u, 2006u, 2006u, 15u, 1u, 11u, 3279u,
     3279u, 1u, UINT32_C(174695), 0u, 15u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 4u}, {1u, 2u, 1u, 2087u, 2006u, 16u, 1u, 12u, 3279u,
     3279u, 1u, UINT32_C(189077), 0u, 16u, 0u, false}},
    {2u, {false, 2087u, 3279u, true}, {false, 4u}, {3u, 2u, 3u, 2087u, 2087u, 18u, 1u, 12u, 3279u,
     3279u, 1u, UINT32_C(217764), 0u, 18u, 2u, false}},
    {1u, {true, 2087u, 3279u, true}, {false, 4u}, {4u, 1u, 0u, 2087u, 2087u, 19u, 1u, 12u, 3279u,
     3279u, 1u, UINT32_C(232069), 0u, 19u, 3u, false}},
    {2u, {true, 2088u, 3279u, true}, {false, 12u}, {6u, 1u, 2u, 2088u, 2088u, 21u, 1u, 12u, 3279u,
     3279u, 0u, UINT32_C(260602), 0u, 21u, 4u, true}},
    {400u, {false, 131u, 3279u, false}, {false, 12u}, {40u, 1u, 12u, 131u, 131u, 40u, 1u, 12u,
     3279u, 3279u, 1u, UINT32_C(4323360), 0u, 421u, 0u, true}},
    {59u, {false, 131u, 3279u, true}, {false, 12u}, {40u, 1u, 12u, 131u, 131u, 40u, 1u, 12u, 3279u,
     3279u, 1u, UINT32_C(4711870), 0u, 480u, 4u, true}},
    {8u, {true, 2086u, 65535u, true}, {false, 12u}, {40u, 1u, 12u, 2086u, 2086u, 0u, 2u, 7u, 3279u,
     3279u, 1u, UINT32_C(4711870), 0u, 480u, 4u, true}},
    {1u, {true, 65535u, 65535u, true}, {false, 14u}, {0u, 2u, 0u, 2086u, 2086u, 0u, 3u, 0u, 3279u,
     3279u, 1u, UINT32_C(4711870), 0u, 480u, 4u, true}},
    /* vector 10 */
    {1u, {false, 2087u, 3279u, true}, {false, 0u}, {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 3279u, 0u,
     0u, 0u, 0u, 1u, 1u, false}},
    {2u, {false, 2087u, 4082u, true}, {false, 0u}, {3u, 0u, 3u, 2087u, 2087u, 0u, 0u, 3u, 3279u, 0u,
     0u, 0u, 0u, 3u, 3u, false}},
    {1u, {false, 2088u, 0u, false}, {false, 0u}, {4u, 1u, 0u, 2088u, 2087u, 1u, 0u, 4u, 0u, 3279u,
     0u, 0u, 0u, 4u, 0u, false}},
    {1u, {false, 2008u, 0u, false}, {false, 0u}, {5u, 1u, 1u, 2008u, 2088u, 2u, 0u, 5u, 0u, 0u, 0u,
     0u, 0u, 5u, 0u, false}},
    {1u, {false, 2008u, 0u, true}, {false, 0u}, {6u, 1u, 2u, 2008u, 2008u, 3u, 0u, 6u, 0u, 0u, 0u,
     0u, 0u, 6u, 1u, false}},
    {1u, {true, 2008u, 0u, true}, {false, 0u}, {7u, 1u, 3u, 2008u, 2008u, 4u, 1u, 0u, 0u, 0u, 0u,
     0u, 0u, 7u, 2u, false}},
    {1u, {true, 2007u, 0u, true}, {false, 0u}, {8u, 1u, 4u, 2007u, 2008u, 5u, 1u, 1u, 0u, 0u, 0u,
     0u, 0u, 8u, 3u, false}},
    {1u, {true, 2007u, 0u, true}, {false, 8u}, {9u, 1u, 5u, 2007u, 2007u, 6u, 1u, 2u, 0u, 0u, 1u,
     0u, 0u, 9u, 4u, true}},
    /* vector 11 */
    {11u, {false, 2087u, 65535u, false}, {false, 0u}, {11u, 1u, 7u, 2087u, 2087u, 0u, 0u, 11u, 0u,
     0u, 0u, 0u, 0u, 11u, 0u, false}},
    {468u, {false, 2087u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2087u, 2087u, 0u, 3u, 12u, 0u,
     0u, 0u, 0u, 0u, 479u, 0u, false}},
    {1u, {false, 2007u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2007u, 2087u, 0u, 3u, 12u, 0u,
     0u, 0u, 0u, 0u, 480u, 0u, false}},
    {2u, {false, 2007u, 65535u, false}, {true, 2u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 0u,
     0u, 1u, 0u, 1u, 1u, 1u, false}},
    {2u, {false, 2007u, 65535u, false}, {true, 2u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 0u,
     0u, 1u, 0u, 1u, 3u, 3u, false}},
    {1u, {false, 2007u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 0u,
     0u, 1u, 0u, 1u, 4u, 4u, false}},
    {1u, {false, 131u, 65535u, true}, {true, 2u}, {40u, 1u, 12u, 131u, 2007u, 0u, 3u, 12u, 0u, 0u,
     1u, 0u, 1u, 5u, 0u, false}},
    {1u, {true, 131u, 65535u, true}, {false, 2u}, {40u, 1u, 12u, 131u, 131u, 0u, 3u, 12u, 0u, 0u,
     1u, 0u, 0u, 0u, 0u, false}},
    /* vector 12 */
    {2u, {false, 2087u, 3061u, false}, {false, 0u}, {2u, 0u, 2u, 2087u, 2087u, 2u, 0u, 2u, 3061u,
     3061u, 0u, 0u, 0u, 2u, 0u, false}},
    {1u, {true, 2087u, 3061u, false}, {false, 0u}, {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 3061u,
     3061u, 0u, 0u, 0u, 3u, 0u, false}},
    {1u, {true, 2087u, 2551u, false}, {false, 0u}, {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 2551u,
     3061u, 0u, 12805u, 0u, 4u, 0u, false}},
    {1u, {true, 2088u, 3062u, false}, {false, 0u}, {5u, 1u, 1u, 2088u, 2087u, 5u, 1u, 1u, 3062u,
     2551u, 0u, 25587u, 0u, 5u, 0u, false}},
    {6u, {false, 0u, 3279u, false}, {false, 0u}, {0u, 2u, 5u, 2088u, 2087u, 11u, 1u, 7u, 3279u,
     3279u, 0u, UINT32_C(111229), 0u, 11u, 0u, false}},
    {2u, {false, 0u, 3279u, false}, {false, 4u}, {0u, 2u, 7u, 2088u, 2087u, 13u, 1u, 9u, 3279u,
     3279u, 0u, UINT32_C(140195), 0u, 13u, 0u, false}},
    {1u, {false, 1u, 3279u, false}, {false, 5u}, {0u, 3u, 0u, 2088u, 2087u, 14u, 1u, 10u, 3279u,
     3279u, 0u, UINT32_C(154639), 0u, 14u, 0u, false}},
    {1u, {false, 1u, 65535u, true}, {false, 5u}, {0u, 3u, 1u, 2088u, 2087u, 0u, 2u, 0u, 3279u,
     3279u, 0u, UINT32_C(154639), 0u, 15u, 1u, false}},
    {1u, {false, 2087u, 65535u, true}, {false, 5u}, {1u, 3u, 2u, 2087u, 2088u, 0u, 2u, 1u, 3279u,
     3279u, 0u, UINT32_C(154639), 0u, 16u, 2u, false}},
    {1u, {true, 2087u, 65535u, true}, {false, 5u}, {2u, 3u, 3u, 2087u, 2087u, 0u, 2u, 2u, 3279u,
     3279u, 0u, UINT32_C(154639), 0u, 17u, 3u, false}},
    {3u, {true, 2086u, 65535u, true}, {false, 13u}, {5u, 3u, 6u, 2086u, 2086u, 0u, 2u, 5u, 3279u,
     3279u, 0u, UINT32_C(154639), 0u, 20u, 4u, true}},
    {2u, {true, 2086u, 3278u, true}, {false, 13u}, {7u, 3u, 8u, 2086u, 2086u, 2u, 2u, 7u, 3278u,
     3278u, 0u, UINT32_C(154639), 0u, 22u, 4u, true}},
    {4u, {true, 2086u, 510u, true}, {false, 15u}, {11u, 3u, 12u, 2086u, 2086u, 6u, 3u, 3u, 510u,
     510u, 0u, UINT32_C(154639), 0u, 26u, 4u, true}},
    {1u, {true, 2086u, 4082u, true}, {false, 15u}, {12u, 3u, 12u, 2086u, 2086u, 0u, 3u, 4u, 510u,
     510u, 0u, UINT32_C(154639), 0u, 27u, 4u, true}},
    {1u, {true, 2086u, 3571u, true}, {false, 15u}, {13u, 3u, 12u, 2086u, 2086u, 1u, 3u, 5u, 3571u,
     510u, 0u, UINT32_C(154639), 0u, 28u, 4u, true}},
    {2u, {true, 2086u, 510u, true}, {false, 15u}, {15u, 3u, 12u, 2086u, 2086u, 3u, 3u, 7u, 510u,
     510u, 0u, UINT32_C(154639), 0u, 30u, 4u, true}},
    {24u, {true, 2008u, 0u, true}, {false, 15u}, {39u, 3u, 12u, 2008u, 2008u, 27u, 3u, 12u, 0u, 0u,
     0u, UINT32_C(154639), 0u, 54u, 4u, true}},
    {1u, {true, 2008u, 0u, true}, {false, 14u}, {40u, 1u, 0u, 2008u, 2008u, 28u, 3u, 12u, 0u, 0u,
     0u, UINT32_C(154639), 0u, 55u, 4u, true}},
    {11u, {true, 2008u, 0u, true}, {false, 14u}, {40u, 1u, 11u, 2008u, 2008u, 39u, 3u, 12u, 0u, 0u,
     0u, UINT32_C(154639), 0u, 66u, 4u, true}},
    {1u, {true, 2008u, 0u, true}, {false, 12u}, {40u, 1u, 12u, 2008u, 2008u, 40u, 1u, 0u, 0u, 0u,
     0u, UINT32_C(154362), 0u, 67u, 4u, true}},
    {1u, {false, 2087u, 4080u, true}, {false, 12u}, {40u, 1u, 12u, 2087u, 2008u, 40u, 1u, 1u, 4080u,
     0u, 0u, UINT32_C(154085), 0u, 68u, 4u, true}},
    {1u, {false, 2087u, 3061u, true}, {false, 12u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 2u, 3061u,
     4080u, 0u, UINT32_C(166614), 0u, 69u, 4u, true}},
    /* vector 13 */
    {11u, {false, 2087u, 65535u, false}, {false, 0u}, {11u, 1u, 7u, 2087u, 2087u, 0u, 0u, 11u, 0u,
     0u, 0u, 0u, 0u, 11u, 0u, false}},
    {468u, {false, 2087u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2087u, 2087u, 0u, 3u, 12u, 0u,
     0u, 0u, 0u, 0u, 479u, 0u, false}},
    {1u, {false, 2007u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2007u, 2087u, 0u, 3u, 12u, 0u,
     0u, 0u, 0u, 0u, 480u, 0u, false}},
    {4u, {false, 2007u, 65535u, false}, {true, 2u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 0u,
     0u, 1u, 0u, 1u, 3u, 3u, false}},
    {1u, {false, 2007u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 0u,
     0u, 1u, 0u, 1u, 4u, 4u, false}},
    {2u, {false, 4035u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 4035u, 4035u, 0u, 3u, 12u, 0u,
     0u, 0u, 0u, 1u, 6u, 4u, false}},
    {1u, {true, 2006u, 1u, false}, {false, 18u}, {40u, 1u, 12u, 2006u, 4035u, 1u, 3u, 12u, 1u, 0u,
     0u, 0u, 0u, 0u, 4u, false}},
    {38u, {true, 2006u, 1u, false}, {false, 2u}, {40u, 1u, 12u, 2006u, 2006u, 39u, 3u, 12u, 1u, 1u,
     1u, 0u, 0u, 38u, 0u, false}},
    {441u, {true, 2006u, 1u, false}, {false, 0u}, {40u, 1u, 12u, 2006u, 2006u, 40u, 1u, 12u, 1u, 1u,
     1u, 0u, 0u, 479u, 0u, false}},
    {1u, {true, 132u, 1u, false}, {false, 0u}, {40u, 1u, 12u, 132u, 2006u, 40u, 1u, 12u, 1u, 1u, 1u,
     0u, 0u, 480u, 0u, false}},
    {1u, {false, 2086u, 1u, false}, {true, 0u}, {40u, 1u, 12u, 2086u, 132u, 40u, 1u, 12u, 1u, 1u,
     1u, 0u, 1u, 0u, 0u, false}},
    {1u, {false, 65535u, 1u, false}, {true, 0u}, {0u, 2u, 0u, 2086u, 132u, 40u, 1u, 12u, 1u, 1u, 1u,
     0u, 1u, 1u, 1u, false}},
    {1u, {false, 4035u, 0u, false}, {true, 0u}, {1u, 2u, 1u, 4035u, 2086u, 40u, 1u, 12u, 0u, 1u, 1u,
     0u, 1u, 2u, 2u, false}},
    {1u, {false, 2006u, 0u, false}, {true, 0u}, {2u, 2u, 2u, 2006u, 4035u, 40u, 1u, 12u, 0u, 0u, 1u,
     0u, 1u, 3u, 3u, false}},
    {6u, {false, 2007u, 65535u, false}, {true, 16u}, {8u, 1u, 4u, 2007u, 2007u, 0u, 2u, 5u, 0u, 0u,
     1u, 0u, 1u, 9u, 4u, false}},
    {2u, {false, 2087u, 65535u, false}, {true, 16u}, {10u, 1u, 6u, 2087u, 2087u, 0u, 2u, 7u, 0u, 0u,
     1u, 0u, 1u, 11u, 4u, false}},
    {1u, {false, 2087u, 65535u, false}, {true, 18u}, {11u, 1u, 7u, 2087u, 2087u, 0u, 3u, 0u, 0u, 0u,
     1u, 0u, 1u, 12u, 4u, false}},
    {1u, {false, 2086u, 1u, false}, {true, 18u}, {12u, 1u, 8u, 2086u, 2087u, 1u, 3u, 1u, 1u, 0u, 1u,
     0u, 1u, 13u, 4u, false}},
    {1u, {false, 65535u, 1u, false}, {true, 18u}, {0u, 2u, 0u, 2086u, 2087u, 2u, 3u, 2u, 1u, 1u, 1u,
     0u, 1u, 14u, 4u, false}},
    {1u, {false, 65535u, 0u, false}, {true, 18u}, {0u, 2u, 1u, 2086u, 2087u, 3u, 3u, 3u, 0u, 1u, 1u,
     0u, 1u, 15u, 4u, false}},
    {1u, {false, 4035u, 0u, false}, {true, 18u}, {1u, 2u, 2u, 4035u, 2086u, 4u, 3u, 4u, 0u, 0u, 1u,
     0u, 1u, 16u, 4u, false}},
    {5u, {false, 2006u, 0u, false}, {true, 18u}, {6u, 1u, 2u, 2006u, 2006u, 9u, 3u, 9u, 0u, 0u, 1u,
     0u, 1u, 21u, 4u, false}},
    {30u, {false, 2089u, 0u, false}, {true, 18u}, {36u, 1u, 12u, 2089u, 2089u, 39u, 3u, 12u, 0u, 0u,
     0u, 0u, 1u, 51u, 4u, false}},
    {428u, {false, 2089u, 0u, false}, {true, 16u}, {40u, 1u, 12u, 2089u, 2089u, 40u, 1u, 12u, 0u,
     0u, 0u, 0u, 1u, 479u, 4u, false}},
    {1u, {false, 2089u, 0u, false}, {false, 16u}, {40u, 1u, 12u, 2089u, 2089u, 40u, 1u, 12u, 0u, 0u,
     0u, 0u, 0u, 0u, 4u, false}},
    {4u, {false, 2087u, 3279u, false}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u,
     3279u, 3279u, 0u, 44008u, 0u, 4u, 0u, false}},
    {2u, {false, 2087u, 3278u, true}, {false, 0u}, {40u, 1u, 12u, 2087u, 2087u, 40u, 1u, 12u, 3278u,
     3278u, 0u, UINT32_C(73208), 0u, 6u, 2u, false}},
    {1u, {true, 2007u, 0u, true}, {false, 0u}, {40u, 1u, 12u, 2007u, 2087u, 40u, 1u, 12u, 0u, 3278u,
     0u, UINT32_C(87765), 0u, 7u, 3u, false}},
    {3u, {true, 2007u, 0u, true}, {false, 8u}, {40u, 1u, 12u, 2007u, 2007u, 40u, 1u, 12u, 0u, 0u,
     1u, UINT32_C(87294), 0u, 10u, 4u, true}},
    {8u, {true, 0u, 0u, true}, {false, 8u}, {0u, 2u, 7u, 2007u, 2007u, 40u, 1u, 12u, 0u, 0u, 1u,
     UINT32_C(86052), 0u, 18u, 4u, true}},
    {1u, {true, 130u, 0u, true}, {false, 9u}, {0u, 3u, 0u, 2007u, 2007u, 40u, 1u, 12u, 0u, 0u, 0u,
     UINT32_C(85898), 0u, 19u, 4u, true}},
    {1u, {true, 2088u, 2041u, false}, {false, 9u}, {1u, 3u, 1u, 2088u, 2007u, 40u, 1u, 12u, 2041u,
     0u, 0u, UINT32_C(85744), 0u, 20u, 0u, true}},
    {1u, {true, 2088u, 2040u, false}, {false, 9u}, {2u, 3u, 2u, 2088u, 2088u, 40u, 1u, 12u, 2040u,
     2041u, 0u, UINT32_C(91277), 0u, 21u, 0u, true}},
    {1u, {false, 2088u, 4081u, false}, {false, 9u}, {3u, 3u, 3u, 2088u, 2088u, 40u, 1u, 12u, 4081u,
     2040u, 0u, UINT32_C(96807), 0u, 22u, 0u, true}},
    /* vector 14 */
    {5u, {false, 2006u, 3279u, false}, {false, 0u}, {5u, 1u, 1u, 2006u, 2006u, 5u, 1u, 1u, 3279u,
     3279u, 1u, 29365u, 0u, 5u, 0u, false}},
    {1u, {false, 65535u, 3279u, false}, {false, 0u}, {0u, 2u, 0u, 2006u, 2006u, 6u, 1u, 2u, 3279u,
     3279u, 1u, 44008u, 0u, 6u, 0u, false}},
    {1u, {false, 2087u, 3279u, false}, {false, 0u}, {1u, 2u, 1u, 2087u, 2006u, 7u, 1u, 3u, 3279u,
     3279u, 1u, 58625u, 0u, 7u, 0u, false}},
    {1u, {false, 2087u, 3279u, true}, {false, 0u}, {2u, 2u, 2u, 2087u, 2087u, 8u, 1u, 4u, 3279u,
     3279u, 1u, UINT32_C(73216), 0u, 8u, 1u, false}},
    {2u, {false, 2086u, 3279u, true}, {false, 0u}, {4u, 1u, 0u, 2086u, 2086u, 10u, 1u, 6u, 3279u,
     3279u, 1u, UINT32_C(102318), 0u, 10u, 3u, false}},
    {8u, {false, 2086u, 65535u, false}, {false, 0u}, {12u, 1u, 8u, 2086u, 2086u, 0u, 2u, 7u, 3279u,
     3279u, 1u, UINT32_C(102318), 0u, 18u, 0u, false}},
    {461u, {false, 2086u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2086u, 2086u, 0u, 3u, 12u,
     3279u, 3279u, 1u, UINT32_C(102318), 0u, 479u, 0u, false}},
    {4u, {false, 2007u, 65535u, false}, {true, 2u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 3279u,
     3279u, 1u, UINT32_C(102318), 1u, 3u, 3u, false}},
    {477u, {false, 2007u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u,
     3279u, 3279u, 1u, UINT32_C(102318), 1u, 480u, 4u, false}},
    {8u, {false, 65535u, 3061u, true}, {true, 2u}, {0u, 2u, 7u, 2007u, 2007u, 8u, 3u, 12u, 3061u,
     3061u, 1u, UINT32_C(102318), 1u, 480u, 0u, false}},
    {1u, {false, 65535u, 3061u, true}, {false, 3u}, {0u, 3u, 0u, 2007u, 2007u, 9u, 3u, 12u, 3061u,
     3061u, 0u, UINT32_C(102318), 0u, 0u, 0u, false}},
    {39u, {false, 2087u, 65535u, false}, {false, 3u}, {39u, 3u, 12u, 2087u, 2087u, 0u, 3u, 12u,
     3061u, 3061u, 0u, UINT32_C(102318), 0u, 39u, 0u, false}},
    {440u, {false, 2087u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2087u, 2087u, 0u, 3u, 12u,
     3061u, 3061u, 0u, UINT32_C(102318), 0u, 479u, 0u, false}},
    {1u, {false, 2007u, 65535u, false}, {false, 2u}, {40u, 1u, 12u, 2007u, 2087u, 0u, 3u, 12u,
     3061u, 3061u, 0u, UINT32_C(102318), 0u, 480u, 0u, false}},
    {4u, {false, 2007u, 65535u, false}, {true, 2u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u, 3061u,
     3061u, 1u, UINT32_C(102318), 1u, 3u, 3u, false}},
    {1u, {false, 2007u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 2007u, 2007u, 0u, 3u, 12u,
     3061u, 3061u, 1u, UINT32_C(102318), 1u, 4u, 4u, false}},
    {4u, {false, 4035u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 4035u, 4035u, 0u, 3u, 12u,
     3061u, 3061u, 0u, UINT32_C(102318), 1u, 8u, 4u, false}},
    {1u, {false, 132u, 65535u, false}, {true, 18u}, {40u, 1u, 12u, 132u, 4035u, 0u, 3u, 12u, 3061u,
     3061u, 0u, UINT32_C(102318), 1u, 9u, 4u, false}},
    {1u, {false, 132u, 65535u, true}, {true, 2u}, {40u, 1u, 12u, 132u, 132u, 0u, 3u, 12u, 3061u,
     3061u, 1u, UINT32_C(102318), 1u, 10u, 0u, false}},
    {2u, {false, 132u, 3279u, true}, {true, 2u}, {40u, 1u, 12u, 132u, 132u, 2u, 3u, 12u, 3279u,
     3279u, 1u, UINT32_C(102318), 1u, 12u, 0u, false}},
    {3u, {false, 2089u, 3279u, true}, {true, 2u}, {40u, 1u, 12u, 2089u, 2089u, 5u, 3u, 12u, 3279u,
     3279u, 0u, UINT32_C(102318), 1u, 15u, 0u, false}},
    {1u, {false, 65535u, 3279u, true}, {true, 2u}, {0u, 2u, 0u, 2089u, 2089u, 6u, 3u, 12u, 3279u,
     3279u, 0u, UINT32_C(102318), 1u, 16u, 0u, false}},
    {7u, {false, 65535u, 3061u, true}, {true, 2u}, {0u, 2u, 7u, 2089u, 2089u, 13u, 3u, 12u, 3061u,
     3061u, 0u, UINT32_C(102318), 1u, 23u, 0u, false}},
    {1u, {false, 65535u, 3061u, true}, {false, 3u}, {0u, 3u, 0u, 2089u, 2089u, 14u, 3u, 12u, 3061u,
     3061u, 0u, UINT32_C(102318), 0u, 0u, 0u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct ext5_remembered record;
};

static const struct vector vectors[] = {
    {0u, 12u, false, {0u}},
    {12u, 19u, false, {0u}},
    {19u, 21u, false, {0u}},
    {21u, 22u, false, {0u}},
    {22u, 35u, false, {0u}},
    {35u, 40u, false, {0u}},
    {40u, 55u, false, {0u}},
    {55u, 60u, false, {0u}},
    {60u, 76u, false, {0u}},
    {76u, 84u, false, {0u}},
    {84u, 92u, false, {0u}},
    {92u, 114u, false, {0u}},
    {114u, 148u, false, {0u}},
    {148u, 172u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct ext5 m;
    struct ext5_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    ext5_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            ext5_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct ext5 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false};

static void start_and_compare(const char *what, const struct ext5_remembered *r,
                              const struct ext5 *wanted)
{
    struct ext5 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    ext5_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct ext5 m;
    struct ext5_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", ext5_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", ext5_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct ext5 m;
    struct ext5_in in;
    struct ext5_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct ext5 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 1u};

        doing = "room_probe_state upset";
        ext5_start(&m, NULL);
        m.room_probe_state = 4u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 3u, 0u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 1u};

        doing = "room_probe_state upset";
        ext5_start(&m, NULL);
        m.room_probe_state = 255u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 2u};

        doing = "line_current_state upset";
        ext5_start(&m, NULL);
        m.line_current_state = 4u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 3u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 2u};

        doing = "line_current_state upset";
        ext5_start(&m, NULL);
        m.line_current_state = 255u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 0u};

        doing = "room_stat upset";
        ext5_start(&m, NULL);
        m.room_stat = 2u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, false};
        static const struct ext5_out wanted =
           {false, 0u};

        doing = "room_stat upset";
        ext5_start(&m, NULL);
        m.room_stat = 255u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct ext5_out wanted =
           {false, 0u};

        doing = "fan upset";
        ext5_start(&m, NULL);
        m.fan = 2u;
        ext5_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct ext5 after =
           {0u, 0u, 1u, 0u, 0u, 1u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false};
        static const struct ext5_out wanted =
           {false, 0u};

        doing = "fan upset";
        ext5_start(&m, NULL);
        m.fan = 255u;
        ext5_step(&m, &in, &out);
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
