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
 */
#include "coldroom3.h"

#include <stdio.h>
#include <string.h>

/* Inputs held for so many steps; the outputs after each odd and each even step of them; the state
 * after the last.
 */
struct row {
    uint32_t steps;
    struct coldroom3_in in;
    struct coldroom3_out odd;
    struct coldroom3_out even;
    struct coldroom3 after;
};

static unsigned long passed;
static unsigned long failed;

static void verdict(bool good, const char *what, unsigned long vector, unsigned long row, unsigned long step)
{
    if (good) {
        passed++;
        return;
    }
    failed++;
    if (failed <= 20ul) {
        (void)printf("vector %lu row %lu step %lu: %s differs\n", vector, row, step, what);
    }
}

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 2u, 0u, 0u, 0u, 0u, 2u, 0u, 0u, 0u, 1u, 2u, 0u, 0u, 2u, 0u, 0u, false, 0u, 1u}},
    {5u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 7u, 0u, 0u, 0u, 0u, 7u, 0u, 0u, 0u, 1u, 7u, 0u, 0u, 7u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {1u, 3u, 0u, 489u, 0u, 1u, 3u, 0u, 3762u, 0u, 0u, 1u, 8u, 0u, 0u, 8u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {2u, 3u, 1u, 489u, 489u, 2u, 3u, 1u, 3762u, 3762u, 0u, 1u, 9u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    /* vector 2 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 7u, 489u, 489u, 3u, 0u, 7u, 3762u, 3762u, 0u, 1u, 7u, 0u, 0u, 7u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3761u}, {false, false, true, 0u}, {false, false, true, 0u},
     {4u, 1u, 0u, 2087u, 489u, 4u, 1u, 0u, 3761u, 3762u, 1u, 1u, 8u, 0u, 0u, 8u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 3761u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 2087u, 489u, 5u, 1u, 1u, 3761u, 3761u, 1u, 1u, 9u, 0u, 0u, 9u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 67u, 3763u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 1u, 2087u, 489u, 0u, 2u, 0u, 3761u, 3761u, 1u, 1u, 10u, 0u, 0u, 10u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 2u, 489u, 2087u, 1u, 2u, 1u, 3762u, 3761u, 1u, 1u, 11u, 0u, 0u, 11u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 67u, 3763u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 489u, 2087u, 0u, 2u, 2u, 3762u, 3761u, 1u, 1u, 12u, 0u, 0u, 12u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 0u, 489u, 2087u, 0u, 2u, 3u, 3762u, 3761u, 0u, 1u, 13u, 0u, 0u, 13u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 1u, 489u, 2087u, 0u, 3u, 0u, 3762u, 3761u, 0u, 1u, 14u, 0u, 0u, 14u, 489u, 0u, false, 0u, 1u}},
    {7u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 7u, 3762u, 3761u, 0u, 1u, 21u, 0u, 0u, 21u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 22u, 0u, 0u, 22u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 23u, 0u, 0u, 23u, 489u, 0u, false, 0u, 1u}},
    {577u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 600u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 601u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {42598u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 43199u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 0u, 1u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 70u, 487u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 1u, 1u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {3598u, {true, 0u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 3599u, 1u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 0u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 489u, 2087u, 0u, 3u, 8u, 3762u, 3761u, 0u, 1u, 3600u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    /* vector 3 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 3u, 0u, 0u, 0u, 0u, 3u, 0u, 0u, 0u, 1u, 3u, 0u, 0u, 3u, 0u, 0u, false, 0u, 1u}},
    {3u, {true, 0u, 1u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 6u, 0u, 0u, 0u, 0u, 6u, 0u, 0u, 0u, 1u, 6u, 0u, 0u, 6u, 0u, 0u, false, 0u, 1u}},
    {1u, {true, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 7u, 0u, 0u, 0u, 0u, 7u, 0u, 0u, 0u, 1u, 7u, 0u, 0u, 7u, 0u, 0u, false, 0u, 1u}},
    {43194u, {true, 0u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 0u, 0u, 0u, 3u, 8u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 600u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 3763u, 0u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 0u, 0u, 0u, 3u, 8u, 0u, 0u, 0u, 1u, 2u, 0u, 0u, 600u, 0u, 0u, false, 0u, 1u}},
    /* vector 4 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {5u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {5u, 1u, 1u, 489u, 489u, 5u, 1u, 1u, 3762u, 3762u, 1u, 1u, 9u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 2227u, 489u, 6u, 1u, 2u, 3762u, 3762u, 1u, 1u, 10u, 0u, 0u, 10u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {7u, 1u, 3u, 2227u, 2227u, 7u, 1u, 3u, 3762u, 3762u, 0u, 0u, 11u, 0u, 0u, 11u, 2227u, 0u, false, 0u, 0u}},
    {1u, {false, 489u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {8u, 1u, 4u, 489u, 2227u, 8u, 1u, 4u, 1953u, 3762u, 0u, 0u, 12u, 0u, 0u, 12u, 2227u, 0u, false, 0u, 0u}},
    {1u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {9u, 1u, 5u, 489u, 489u, 9u, 1u, 5u, 1953u, 1953u, 1u, 1u, 13u, 0u, 0u, 13u, 489u, 0u, false, 0u, 1u}},
    {11u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 24u, 0u, 0u, 24u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 25u, 0u, 0u, 25u, 489u, 0u, false, 0u, 1u}},
    {575u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 600u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {42599u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 43199u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 1953u}, {false, true, true, 0u}, {false, true, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 0u, 1u, 0u, 600u, 489u, 0u, false, 1u, 1u}},
    {1u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 1u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 3763u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 489u, 489u, 20u, 1u, 8u, 3762u, 1953u, 1u, 1u, 2u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {2u, {true, 556u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 2u, 2u, 556u, 556u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4u, 0u, 0u, 600u, 556u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 2u, 3u, 489u, 556u, 20u, 1u, 8u, 3762u, 1952u, 1u, 1u, 5u, 0u, 0u, 600u, 556u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {4u, 1u, 0u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 6u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 8u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {4u, {false, 3763u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 12u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {43187u, {false, 3763u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 43199u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {2u, {false, 3763u, 3762u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 1u, 1u, 0u, 600u, 489u, 0u, false, 1u, 1u}},
    /* vector 5 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {5u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {5u, 1u, 1u, 489u, 489u, 5u, 1u, 1u, 3762u, 3762u, 1u, 1u, 9u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 2227u, 489u, 6u, 1u, 2u, 3762u, 3762u, 1u, 1u, 10u, 0u, 0u, 10u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {7u, 1u, 3u, 2227u, 2227u, 7u, 1u, 3u, 3762u, 3762u, 0u, 0u, 11u, 0u, 0u, 11u, 2227u, 0u, false, 0u, 0u}},
    {2u, {false, 2158u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {9u, 1u, 5u, 2158u, 2158u, 9u, 1u, 5u, 3762u, 3762u, 0u, 0u, 13u, 0u, 0u, 13u, 2158u, 0u, false, 0u, 0u}},
    {2u, {false, 1999u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {11u, 1u, 7u, 1999u, 1999u, 11u, 1u, 7u, 3762u, 3762u, 1u, 0u, 15u, 0u, 0u, 15u, 1999u, 0u, false, 0u, 0u}},
    {1u, {true, 489u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {12u, 1u, 8u, 489u, 1999u, 12u, 1u, 8u, 3762u, 3762u, 1u, 0u, 16u, 0u, 0u, 16u, 1999u, 0u, false, 0u, 0u}},
    {1u, {false, 2159u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {13u, 1u, 8u, 2159u, 489u, 13u, 1u, 8u, 3762u, 3762u, 1u, 0u, 17u, 0u, 0u, 17u, 1999u, 0u, false, 0u, 0u}},
    {2u, {false, 2227u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {15u, 1u, 8u, 2227u, 2227u, 15u, 1u, 8u, 3762u, 3762u, 0u, 0u, 19u, 0u, 0u, 19u, 2227u, 0u, false, 0u, 0u}},
    {589u, {false, 2158u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2158u, 2158u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 608u, 0u, 0u, 600u, 2158u, 0u, false, 0u, 0u}},
    {2u, {false, 2089u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 610u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {true, 2089u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 611u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {42588u, {false, 2158u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2158u, 2158u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 43199u, 0u, 0u, 600u, 2158u, 0u, false, 0u, 0u}},
    {603u, {false, 2158u, 3762u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2158u, 2158u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 602u, 1u, 0u, 600u, 2158u, 0u, false, 1u, 0u}},
    {2u, {false, 2157u, 3762u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2157u, 2157u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 604u, 1u, 0u, 600u, 2157u, 0u, false, 1u, 0u}},
    {1u, {false, 3763u, 3762u}, {false, true, true, 0u}, {false, true, true, 0u},
     {0u, 2u, 0u, 2157u, 2157u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 605u, 1u, 0u, 600u, 2157u, 0u, false, 1u, 1u}},
    {1u, {false, 1999u, 488u}, {false, true, true, 0u}, {false, true, true, 0u},
     {1u, 2u, 1u, 1999u, 2157u, 20u, 1u, 8u, 488u, 3762u, 0u, 0u, 606u, 1u, 0u, 600u, 2157u, 0u, false, 1u, 1u}},
    {2u, {false, 3763u, 3762u}, {false, true, true, 0u}, {false, true, true, 0u},
     {0u, 2u, 3u, 1999u, 2157u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 608u, 1u, 0u, 600u, 1999u, 0u, false, 1u, 1u}},
    {1u, {false, 3763u, 3762u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 0u, 1999u, 2157u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 609u, 1u, 0u, 600u, 1999u, 0u, false, 1u, 1u}},
    {19u, {false, 560u, 3762u}, {false, true, true, 1u}, {false, true, true, 1u},
     {19u, 3u, 8u, 560u, 560u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 628u, 1u, 0u, 600u, 560u, 0u, false, 1u, 1u}},
    {1u, {false, 560u, 3762u}, {false, true, true, 0u}, {false, true, true, 0u},
     {20u, 1u, 0u, 560u, 560u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 629u, 1u, 0u, 600u, 560u, 0u, false, 1u, 1u}},
    /* vector 6 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 6u, 489u, 489u, 2u, 0u, 6u, 3762u, 3762u, 0u, 1u, 6u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {593u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 600u, 0u, 1u, 0u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 601u, 0u, 1u, 1u, 489u, 1u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 602u, 0u, 1u, 2u, 489u, 2u, false, 0u, 1u}},
    {238u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 840u, 0u, 1u, 240u, 489u, 240u, false, 0u, 1u}},
    {6880u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 7720u, 0u, 1u, 600u, 489u, 7120u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 7721u, 0u, 0u, 0u, 489u, 7121u, true, 0u, 1u}},
    {1u, {true, 3761u, 3762u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 3761u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 7722u, 0u, 0u, 1u, 489u, 0u, true, 0u, 1u}},
    {1u, {true, 3761u, 3762u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 3761u, 3761u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 7723u, 0u, 0u, 2u, 3761u, 0u, true, 0u, 0u}},
    /* vector 7 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 6u, 489u, 489u, 2u, 0u, 6u, 3762u, 3762u, 0u, 1u, 6u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {593u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {243u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 842u, 0u, 1u, 242u, 489u, 242u, false, 0u, 1u}},
    {1u, {true, 3761u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 3761u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 843u, 0u, 1u, 243u, 489u, 243u, false, 0u, 1u}},
    {1u, {true, 3761u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 3761u, 3761u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 844u, 0u, 0u, 0u, 3761u, 0u, false, 0u, 0u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 2u, 3761u, 3761u, 0u, 2u, 2u, 3762u, 3762u, 0u, 0u, 847u, 0u, 0u, 3u, 3761u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 3u, 489u, 3761u, 1u, 2u, 3u, 3762u, 3762u, 0u, 0u, 848u, 0u, 0u, 4u, 3761u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {2u, 3u, 0u, 489u, 489u, 2u, 3u, 0u, 3762u, 3762u, 0u, 1u, 849u, 0u, 0u, 5u, 489u, 0u, false, 0u, 1u}},
    {17u, {true, 489u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {19u, 3u, 8u, 489u, 489u, 19u, 3u, 8u, 3762u, 3762u, 0u, 1u, 866u, 0u, 0u, 22u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 0u, 489u, 489u, 20u, 1u, 0u, 3762u, 3762u, 1u, 1u, 867u, 0u, 0u, 23u, 489u, 0u, false, 0u, 1u}},
    {576u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 1443u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {7121u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 8564u, 0u, 1u, 600u, 489u, 7120u, false, 0u, 1u}},
    {601u, {true, 558u, 3762u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 558u, 558u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 9165u, 0u, 0u, 600u, 558u, 0u, true, 0u, 1u}},
    /* vector 8 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 6u, 489u, 489u, 2u, 0u, 6u, 3762u, 3762u, 0u, 1u, 6u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {593u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {2u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 601u, 0u, 1u, 1u, 489u, 1u, false, 0u, 1u}},
    {4u, {true, 419u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {0u, 2u, 3u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 605u, 0u, 1u, 5u, 489u, 5u, false, 0u, 1u}},
    {1u, {true, 419u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 0u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 606u, 0u, 0u, 0u, 489u, 6u, false, 0u, 1u}},
    {1u, {true, 3762u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {1u, 3u, 1u, 3762u, 489u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 607u, 0u, 0u, 1u, 489u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 4u, 3762u, 489u, 0u, 2u, 2u, 3762u, 3762u, 0u, 1u, 610u, 0u, 0u, 4u, 3762u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {1u, 3u, 5u, 489u, 3762u, 1u, 2u, 3u, 3762u, 3762u, 0u, 1u, 611u, 0u, 0u, 5u, 489u, 0u, false, 0u, 1u}},
    {4u, {false, 489u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {5u, 3u, 8u, 489u, 489u, 5u, 3u, 3u, 3762u, 3762u, 0u, 1u, 615u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    {2u, {false, 2227u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {7u, 3u, 8u, 2227u, 2227u, 7u, 3u, 5u, 3762u, 3762u, 0u, 1u, 617u, 0u, 0u, 11u, 2227u, 0u, false, 0u, 1u}},
    {2u, {false, 2158u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {9u, 3u, 8u, 2158u, 2158u, 9u, 3u, 7u, 3762u, 3762u, 0u, 1u, 619u, 0u, 0u, 13u, 2158u, 0u, false, 0u, 1u}},
    {2u, {false, 1999u, 3762u}, {false, false, true, 3u}, {false, false, true, 3u},
     {11u, 3u, 8u, 1999u, 1999u, 11u, 3u, 8u, 3762u, 3762u, 0u, 1u, 621u, 0u, 0u, 15u, 1999u, 0u, false, 0u, 1u}},
    {5u, {false, 1999u, 65535u}, {false, false, true, 3u}, {false, false, true, 3u},
     {16u, 3u, 8u, 1999u, 1999u, 0u, 3u, 8u, 3762u, 3762u, 0u, 1u, 626u, 0u, 0u, 20u, 1999u, 0u, false, 0u, 1u}},
    {3u, {false, 1999u, 3763u}, {false, false, true, 3u}, {false, false, true, 3u},
     {19u, 3u, 8u, 1999u, 1999u, 0u, 3u, 8u, 3762u, 3762u, 0u, 1u, 629u, 0u, 0u, 23u, 1999u, 0u, false, 0u, 1u}},
    {577u, {false, 1999u, 3763u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 3u, 8u, 3762u, 3762u, 1u, 1u, 1206u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 1999u, 3763u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 3u, 8u, 3762u, 3762u, 1u, 1u, 1207u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 2044u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 2044u, 1999u, 1u, 3u, 8u, 3762u, 3762u, 1u, 1u, 1208u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 2044u, 3762u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2044u, 2044u, 2u, 3u, 8u, 3762u, 3762u, 1u, 0u, 1209u, 0u, 0u, 600u, 2044u, 0u, false, 0u, 0u}},
    {1u, {true, 489u, 3762u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 489u, 2044u, 3u, 3u, 8u, 3762u, 3762u, 1u, 0u, 1210u, 0u, 0u, 600u, 2044u, 0u, false, 0u, 0u}},
    {16u, {true, 489u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 19u, 3u, 8u, 3762u, 3762u, 1u, 1u, 1226u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {817u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 2043u, 0u, 1u, 600u, 489u, 816u, false, 0u, 1u}},
    {1u, {true, 557u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 557u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 2044u, 0u, 1u, 600u, 489u, 817u, false, 0u, 1u}},
    {1u, {true, 3762u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 3762u, 557u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 2045u, 0u, 1u, 600u, 489u, 818u, false, 0u, 1u}},
    {1u, {false, 488u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 488u, 3762u, 20u, 1u, 8u, 1953u, 3762u, 1u, 1u, 2046u, 0u, 0u, 0u, 489u, 819u, false, 0u, 1u}},
    {4u, {false, 3763u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 488u, 3762u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 2050u, 0u, 0u, 4u, 488u, 0u, false, 0u, 1u}},
    {41149u, {false, 3763u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 8u, 488u, 3762u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 43199u, 0u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    {2040u, {false, 3763u, 3762u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 8u, 488u, 3762u, 20u, 1u, 8u, 3762u, 3762u, 0u, 1u, 2039u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {4u, {true, 3763u, 3763u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 8u, 488u, 3762u, 0u, 2u, 3u, 3762u, 3762u, 0u, 1u, 2043u, 1u, 0u, 600u, 488u, 0u, false, 1u, 1u}},
    {1u, {true, 3763u, 488u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 488u, 3762u, 1u, 3u, 0u, 488u, 3762u, 0u, 1u, 2044u, 1u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    {1u, {true, 3763u, 488u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 488u, 3762u, 2u, 3u, 1u, 488u, 488u, 0u, 1u, 2045u, 0u, 0u, 600u, 488u, 0u, false, 0u, 1u}},
    /* vector 9 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 0u, 5u, 489u, 0u, 1u, 0u, 5u, 3762u, 0u, 0u, 1u, 5u, 0u, 0u, 5u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 0u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 7u, 489u, 0u, 3u, 0u, 7u, 3762u, 3762u, 0u, 1u, 7u, 0u, 0u, 7u, 489u, 0u, false, 0u, 1u}},
    {2u, {false, 0u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 1u, 489u, 0u, 5u, 1u, 1u, 3762u, 3762u, 0u, 1u, 9u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    {5u, {false, 2228u, 3762u}, {false, false, true, 1u}, {false, false, true, 1u},
     {5u, 3u, 6u, 2228u, 2228u, 10u, 1u, 6u, 3762u, 3762u, 0u, 1u, 14u, 0u, 0u, 14u, 2228u, 0u, false, 0u, 1u}},
    {2u, {true, 2228u, 1954u}, {false, false, true, 1u}, {false, false, true, 1u},
     {7u, 3u, 8u, 2228u, 2228u, 12u, 1u, 8u, 1954u, 1954u, 0u, 1u, 16u, 0u, 0u, 16u, 2228u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 65535u}, {false, false, true, 1u}, {false, false, true, 1u},
     {8u, 3u, 8u, 2088u, 2228u, 0u, 2u, 0u, 1954u, 1954u, 0u, 1u, 17u, 0u, 0u, 17u, 2228u, 0u, false, 0u, 1u}},
    {3u, {false, 2088u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {11u, 3u, 8u, 2088u, 2088u, 3u, 2u, 3u, 1953u, 1953u, 0u, 1u, 20u, 0u, 0u, 20u, 2088u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {12u, 3u, 8u, 2088u, 2088u, 4u, 1u, 0u, 1953u, 1953u, 0u, 1u, 21u, 0u, 0u, 21u, 2088u, 0u, false, 0u, 1u}},
    {7u, {false, 2088u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 2088u, 2088u, 11u, 1u, 7u, 1953u, 1953u, 0u, 1u, 28u, 0u, 0u, 28u, 2088u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 0u, 2088u, 2088u, 12u, 1u, 8u, 1953u, 1953u, 1u, 0u, 29u, 0u, 0u, 29u, 2088u, 0u, false, 0u, 0u}},
    {1u, {true, 489u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 1u, 489u, 2088u, 13u, 1u, 8u, 3762u, 1953u, 1u, 0u, 30u, 0u, 0u, 30u, 2088u, 0u, false, 0u, 0u}},
    {569u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {25u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 624u, 0u, 1u, 24u, 489u, 24u, false, 0u, 1u}},
    {1u, {false, 419u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 625u, 0u, 0u, 0u, 489u, 25u, false, 0u, 1u}},
    {3u, {false, 3763u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 489u, 489u, 20u, 1u, 8u, 1954u, 1954u, 1u, 1u, 628u, 0u, 0u, 3u, 489u, 0u, false, 0u, 1u}},
    {42571u, {false, 3763u, 1954u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 8u, 489u, 489u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 43199u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {2u, {false, 3763u, 1954u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 8u, 489u, 489u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 1u, 1u, 0u, 600u, 489u, 0u, false, 1u, 1u}},
    /* vector 10 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 2u, 0u, 0u, 0u, 0u, 2u, 0u, 0u, 0u, 1u, 2u, 0u, 0u, 2u, 0u, 0u, false, 0u, 1u}},
    {4u, {false, 2043u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {4u, 1u, 0u, 2043u, 2043u, 0u, 0u, 6u, 0u, 0u, 1u, 1u, 6u, 0u, 0u, 6u, 2043u, 0u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {5u, 1u, 1u, 489u, 2043u, 1u, 0u, 7u, 3762u, 0u, 1u, 1u, 7u, 0u, 0u, 7u, 2043u, 0u, false, 0u, 1u}},
    {18u, {true, 489u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 19u, 3u, 8u, 3762u, 3762u, 1u, 1u, 25u, 0u, 0u, 25u, 489u, 0u, false, 0u, 1u}},
    {574u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {241u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 840u, 0u, 1u, 240u, 489u, 240u, false, 0u, 1u}},
    {2u, {true, 558u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 558u, 558u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 842u, 0u, 1u, 242u, 558u, 0u, false, 0u, 1u}},
    {1u, {true, 2226u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2226u, 558u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 843u, 0u, 1u, 243u, 558u, 1u, false, 0u, 1u}},
    {1u, {true, 2226u, 3762u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 844u, 0u, 1u, 244u, 2226u, 0u, false, 0u, 0u}},
    {1u, {false, 490u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 490u, 2226u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 845u, 0u, 0u, 0u, 2226u, 1u, false, 0u, 0u}},
    {42354u, {false, 490u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 490u, 490u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 43199u, 0u, 0u, 600u, 490u, 0u, false, 0u, 1u}},
    {837u, {false, 490u, 3762u}, {false, true, true, 0u}, {false, true, true, 0u},
     {20u, 1u, 8u, 490u, 490u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 836u, 1u, 0u, 600u, 490u, 0u, false, 1u, 1u}},
    {1u, {true, 2227u, 3762u}, {false, true, true, 0u}, {false, true, true, 0u},
     {20u, 1u, 8u, 2227u, 490u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 837u, 1u, 0u, 600u, 490u, 0u, false, 1u, 1u}},
    /* vector 11 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 6u, 489u, 489u, 2u, 0u, 6u, 3762u, 3762u, 0u, 1u, 6u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {593u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {243u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 842u, 0u, 1u, 242u, 489u, 242u, false, 0u, 1u}},
    {4u, {true, 489u, 3763u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 0u, 2u, 3u, 3762u, 3762u, 1u, 1u, 846u, 0u, 1u, 246u, 489u, 246u, false, 0u, 1u}},
    {1u, {true, 489u, 3763u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 0u, 3u, 0u, 3762u, 3762u, 1u, 1u, 847u, 0u, 0u, 0u, 489u, 247u, false, 0u, 1u}},
    {1u, {false, 2158u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 2158u, 489u, 1u, 3u, 1u, 3762u, 3762u, 1u, 1u, 848u, 0u, 0u, 1u, 489u, 0u, false, 0u, 1u}},
    {18u, {false, 2158u, 3762u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2158u, 2158u, 19u, 3u, 8u, 3762u, 3762u, 1u, 0u, 866u, 0u, 0u, 19u, 2158u, 0u, false, 0u, 0u}},
    {570u, {false, 2158u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2158u, 2158u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 1436u, 0u, 0u, 589u, 2158u, 0u, false, 0u, 0u}},
    {1u, {false, 1998u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 1998u, 2158u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 1437u, 0u, 0u, 590u, 2158u, 0u, false, 0u, 0u}},
    {1u, {false, 1998u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1998u, 1998u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 1438u, 0u, 0u, 591u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 2088u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 2088u, 1998u, 20u, 1u, 8u, 1953u, 3762u, 1u, 1u, 1439u, 0u, 0u, 592u, 1998u, 0u, false, 0u, 1u}},
    {7u, {true, 2088u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 1446u, 0u, 0u, 599u, 2088u, 0u, false, 0u, 0u}},
    {811u, {true, 2088u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 2257u, 0u, 1u, 600u, 2088u, 810u, false, 0u, 0u}},
    {2u, {true, 1999u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 2259u, 0u, 1u, 600u, 1999u, 812u, false, 0u, 0u}},
    {820u, {true, 2088u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 3079u, 0u, 1u, 600u, 2088u, 818u, false, 0u, 0u}},
    {2u, {true, 2087u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 3081u, 0u, 1u, 600u, 2087u, 820u, false, 0u, 0u}},
    {1u, {true, 489u, 3762u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 489u, 2087u, 20u, 1u, 8u, 3762u, 1953u, 1u, 0u, 3082u, 0u, 1u, 600u, 2087u, 821u, false, 0u, 0u}},
    {6299u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 9381u, 0u, 1u, 600u, 489u, 7120u, false, 0u, 1u}},
    {1u, {true, 489u, 3762u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 9382u, 0u, 0u, 0u, 489u, 7121u, true, 0u, 1u}},
    {1u, {true, 2089u, 3762u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 2089u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 9383u, 0u, 0u, 1u, 489u, 0u, true, 0u, 1u}},
    {3u, {true, 2089u, 3762u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 9386u, 0u, 0u, 4u, 2089u, 0u, true, 0u, 0u}},
    {1u, {true, 2088u, 3762u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 2088u, 2089u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 9387u, 0u, 0u, 5u, 2089u, 0u, true, 0u, 0u}},
    {1u, {true, 3762u, 3762u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 3762u, 2088u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 9388u, 0u, 0u, 6u, 2089u, 0u, true, 0u, 0u}},
    /* vector 12 */
    {1u, {false, 0u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 4u, 0u, 0u, 0u, 0u, 4u, 0u, 0u, 0u, 1u, 4u, 0u, 0u, 4u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 6u, 489u, 489u, 2u, 0u, 6u, 3762u, 3762u, 0u, 1u, 6u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {593u, {true, 489u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {2u, {true, 489u, 3762u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 3762u, 3762u, 1u, 1u, 601u, 0u, 1u, 1u, 489u, 1u, false, 0u, 1u}},
    {1u, {true, 3762u, 3761u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 3762u, 489u, 20u, 1u, 8u, 3761u, 3762u, 1u, 1u, 602u, 0u, 1u, 2u, 489u, 2u, false, 0u, 1u}},
    {1u, {true, 3762u, 3761u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 3762u, 3762u, 20u, 1u, 8u, 3761u, 3761u, 0u, 0u, 603u, 0u, 1u, 3u, 3762u, 0u, false, 0u, 0u}},
    {236u, {true, 3762u, 3761u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 3762u, 3762u, 20u, 1u, 8u, 3761u, 3761u, 0u, 0u, 839u, 0u, 1u, 239u, 3762u, 236u, false, 0u, 0u}},
    {1u, {true, 3762u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 3762u, 3762u, 20u, 1u, 8u, 3761u, 3761u, 0u, 0u, 840u, 0u, 0u, 0u, 3762u, 237u, false, 0u, 0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct coldroom3_remembered record;
};

static const struct vector vectors[] = {
    {0u, 5u, false, {0u}},
    {5u, 25u, false, {0u}},
    {25u, 31u, false, {0u}},
    {31u, 52u, false, {0u}},
    {52u, 74u, false, {0u}},
    {74u, 86u, false, {0u}},
    {86u, 101u, false, {0u}},
    {101u, 133u, false, {0u}},
    {133u, 152u, false, {0u}},
    {152u, 166u, false, {0u}},
    {166u, 191u, false, {0u}},
    {191u, 200u, false, {0u}},
};

static bool same_out(const struct coldroom3_out *a, const struct coldroom3_out *b)
{
    return (a->compressor == b->compressor) &&
           (a->defrost_heater == b->defrost_heater) &&
           (a->warm_alarm == b->warm_alarm) &&
           (a->fault == b->fault);
}

static bool same_state(const struct coldroom3 *a, const struct coldroom3 *b)
{
    return (a->room_probe_good_for == b->room_probe_good_for) &&
           (a->room_probe_state == b->room_probe_state) &&
           (a->room_probe_state_for == b->room_probe_state_for) &&
           (a->room_probe_last == b->room_probe_last) &&
           (a->room_probe_before == b->room_probe_before) &&
           (a->coil_probe_good_for == b->coil_probe_good_for) &&
           (a->coil_probe_state == b->coil_probe_state) &&
           (a->coil_probe_state_for == b->coil_probe_state_for) &&
           (a->coil_probe_last == b->coil_probe_last) &&
           (a->coil_probe_before == b->coil_probe_before) &&
           (a->room_stat == b->room_stat) &&
           (a->warm_stat == b->warm_stat) &&
           (a->defrost_at == b->defrost_at) &&
           (a->defrost == b->defrost) &&
           (a->compressor == b->compressor) &&
           (a->compressor_for == b->compressor_for) &&
           (a->compressor_effect_from == b->compressor_effect_from) &&
           (a->compressor_effect_for == b->compressor_effect_for) &&
           (a->compressor_no_effect == b->compressor_no_effect) &&
           (a->defrost_heater == b->defrost_heater) &&
           (a->warm_alarm == b->warm_alarm);
}

static void run(const struct vector *v, unsigned long number)
{
    struct coldroom3 m;
    struct coldroom3_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    coldroom3_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        for (n = 0u; n < rows[i].steps; n++) {
            coldroom3_step(&m, &rows[i].in, &out);
            verdict(same_out(&out, ((n & 1u) == 0u) ? &rows[i].odd : &rows[i].even), "output", number, (unsigned long)(i - v->first), (unsigned long)n);
        }
        verdict(same_state(&m, &rows[i].after), "state", number, (unsigned long)(i - v->first), (unsigned long)n);
    }
}

static const struct coldroom3 first = {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 1u};

static void records(void)
{
    struct coldroom3 fresh;
    struct coldroom3 m;
    struct coldroom3_remembered r;

    (void)memset(&m, 0x5A, sizeof m);
    (void)memset(&fresh, 0xA5, sizeof fresh);
    coldroom3_start(&fresh, NULL);
    verdict(same_state(&fresh, &first), "start without a record", 0ul, 0ul, 0ul);

    (void)memset(&r, 0x00, sizeof r);
    coldroom3_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with a blank record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0xFF, sizeof r);
    coldroom3_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with an erased record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0, sizeof r);
    verdict(coldroom3_remember(&fresh, &r), "a new record to write", 0ul, 0ul, 0ul);
    verdict(!coldroom3_remember(&fresh, &r), "no record to write", 0ul, 0ul, 0ul);
}

static void upset(void)
{
    struct coldroom3 m;
    struct coldroom3_in in;
    struct coldroom3_out out;

    (void)memset(&in, 0, sizeof in);
    coldroom3_start(&m, NULL);
    m.room_probe_state = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.room_probe_state == (uint8_t)COLDROOM3_ROOM_PROBE_STATE_FAULTY, "room_probe_state after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.coil_probe_state = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.coil_probe_state == (uint8_t)COLDROOM3_COIL_PROBE_STATE_FAULTY, "coil_probe_state after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.room_stat = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.room_stat == (uint8_t)COLDROOM3_ROOM_STAT_OPEN, "room_stat after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.warm_stat = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.warm_stat == (uint8_t)COLDROOM3_WARM_STAT_MADE, "warm_stat after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.defrost = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.defrost == (uint8_t)COLDROOM3_DEFROST_IDLE, "defrost after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.compressor = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.compressor == (uint8_t)COLDROOM3_COMPRESSOR_OFF, "compressor after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.defrost_heater = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.defrost_heater == (uint8_t)COLDROOM3_DEFROST_HEATER_OFF, "defrost_heater after an upset", 0ul, 0ul, 0ul);
    coldroom3_start(&m, NULL);
    m.warm_alarm = 255u;
    coldroom3_step(&m, &in, &out);
    verdict(m.warm_alarm == (uint8_t)COLDROOM3_WARM_ALARM_ON, "warm_alarm after an upset", 0ul, 0ul, 0ul);
    (void)m;
    (void)in;
    (void)out;
}

int main(void)
{
    unsigned long i;

    for (i = 0ul; i < (unsigned long)(sizeof vectors / sizeof vectors[0]); i++) {
        run(&vectors[i], i + 1ul);
    }
    records();
    upset();
    (void)printf("%lu passed, %lu failed\n", passed, failed);
    return (failed == 0ul) ? 0 : 1;
}
