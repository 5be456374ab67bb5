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
/* Transitions that the recorded inputs do not make; no way to them was found:
 * - warm_alarm: off to on (its safe state is on)
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
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 1953u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {2u, 0u, 2u, 2087u, 2087u, 2u, 0u, 2u, 1953u, 1953u, 0u, 1u, 2u, 0u, 0u, 2u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {5u, 1u, 1u, 2087u, 2087u, 5u, 1u, 1u, 1953u, 1953u, 1u, 0u, 5u, 0u, 0u, 5u, 2087u, 0u, false, 0u, 0u}},
    {7u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {12u, 1u, 8u, 2087u, 2087u, 12u, 1u, 8u, 1953u, 1953u, 1u, 0u, 12u, 0u, 0u, 12u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {13u, 1u, 8u, 2087u, 2087u, 13u, 1u, 8u, 1953u, 1953u, 1u, 0u, 13u, 0u, 0u, 13u, 2087u, 0u, false, 0u, 0u}},
    {7u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 20u, 0u, 0u, 20u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 21u, 0u, 0u, 21u, 2087u, 0u, false, 0u, 0u}},
    {579u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 600u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 601u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {42598u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1953u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 0u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {true, 2087u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 1u, 0u, 1u, 0u, 2087u, 0u, false, 0u, 0u}},
    /* vector 2 */
    {3u, {true, 2087u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {true, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {595u, {true, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 599u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {2u, {true, 2087u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 601u, 0u, 1u, 1u, 2087u, 1u, false, 0u, 0u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 602u, 0u, 0u, 0u, 2087u, 2u, false, 0u, 1u}},
    /* vector 3 */
    {7u, {false, 0u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 0u, 7u, 0u, 0u, 7u, 1u, 3u, 1953u, 1953u, 0u, 1u, 7u, 0u, 0u, 7u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 0u, 0u, 0u, 8u, 1u, 4u, 1953u, 1953u, 0u, 1u, 8u, 0u, 0u, 8u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 1u, 0u, 0u, 9u, 1u, 5u, 1953u, 1953u, 0u, 1u, 9u, 0u, 0u, 9u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 487u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 2u, 0u, 0u, 10u, 1u, 6u, 1953u, 1953u, 0u, 1u, 10u, 0u, 0u, 10u, 0u, 0u, false, 0u, 1u}},
    {1u, {false, 488u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {1u, 3u, 3u, 488u, 0u, 11u, 1u, 7u, 1953u, 1953u, 0u, 1u, 11u, 0u, 0u, 11u, 0u, 0u, false, 0u, 1u}},
    /* vector 4 */
    {4u, {false, 488u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {4u, 1u, 0u, 488u, 488u, 4u, 1u, 0u, 1953u, 1953u, 1u, 1u, 4u, 0u, 0u, 4u, 488u, 0u, false, 0u, 1u}},
    {2u, {false, 2043u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 2043u, 2043u, 6u, 1u, 2u, 1953u, 1953u, 1u, 1u, 6u, 0u, 0u, 6u, 2043u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {7u, 1u, 3u, 2044u, 2043u, 7u, 1u, 3u, 1953u, 1953u, 1u, 1u, 7u, 0u, 0u, 7u, 2043u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {8u, 1u, 4u, 2044u, 2044u, 8u, 1u, 4u, 1953u, 1953u, 1u, 0u, 8u, 0u, 0u, 8u, 2044u, 0u, false, 0u, 0u}},
    /* vector 5 */
    {3u, {false, 2088u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2088u, 2088u, 3u, 0u, 3u, 1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2088u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2088u, 2088u, 4u, 1u, 0u, 1953u, 1953u, 1u, 0u, 4u, 0u, 0u, 4u, 2088u, 0u, false, 0u, 0u}},
    /* vector 6 */
    {3u, {false, 2089u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2089u, 2089u, 3u, 0u, 3u, 1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 3u, 2089u, 0u, false, 0u, 1u}},
    {1u, {false, 2089u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2089u, 2089u, 4u, 1u, 0u, 1953u, 1953u, 0u, 0u, 4u, 0u, 0u, 4u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 3762u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {5u, 1u, 1u, 3762u, 2089u, 5u, 1u, 1u, 1953u, 1953u, 0u, 0u, 5u, 0u, 0u, 5u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 3763u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 3762u, 2089u, 6u, 1u, 2u, 1953u, 1953u, 0u, 0u, 6u, 0u, 0u, 6u, 3762u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 2087u, 3762u, 0u, 2u, 0u, 1953u, 1953u, 0u, 0u, 7u, 0u, 0u, 7u, 2089u, 0u, false, 0u, 1u}},
    /* vector 7 */
    {1u, {false, 2087u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 0u, 1u, 2087u, 0u, 0u, 0u, 1u, 0u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 0u, 0u, 3u, 0u, 0u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {4u, {false, 2087u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {7u, 1u, 3u, 2087u, 2087u, 0u, 0u, 7u, 0u, 0u, 1u, 0u, 7u, 0u, 0u, 7u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {8u, 1u, 4u, 2087u, 2087u, 0u, 3u, 0u, 0u, 0u, 1u, 0u, 8u, 0u, 0u, 8u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {9u, 1u, 5u, 2087u, 2087u, 0u, 3u, 1u, 0u, 0u, 1u, 0u, 9u, 0u, 0u, 9u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 487u}, {false, false, false, 2u}, {false, false, false, 2u},
     {10u, 1u, 6u, 2087u, 2087u, 0u, 3u, 2u, 0u, 0u, 1u, 0u, 10u, 0u, 0u, 10u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 488u}, {false, false, false, 2u}, {false, false, false, 2u},
     {11u, 1u, 7u, 2087u, 2087u, 1u, 3u, 3u, 488u, 0u, 1u, 0u, 11u, 0u, 0u, 11u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 3762u}, {false, false, false, 2u}, {false, false, false, 2u},
     {12u, 1u, 8u, 2087u, 2087u, 2u, 3u, 4u, 3762u, 488u, 1u, 0u, 12u, 0u, 0u, 12u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 3763u}, {false, false, false, 2u}, {false, false, false, 2u},
     {13u, 1u, 8u, 2087u, 2087u, 0u, 3u, 5u, 3762u, 488u, 1u, 0u, 13u, 0u, 0u, 13u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 1928u, 1953u}, {false, false, false, 2u}, {false, false, false, 2u},
     {14u, 1u, 8u, 1928u, 2087u, 1u, 3u, 6u, 1953u, 3762u, 1u, 0u, 14u, 0u, 0u, 14u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 1928u, 1953u}, {false, false, true, 2u}, {false, false, true, 2u},
     {15u, 1u, 8u, 1928u, 1928u, 2u, 3u, 7u, 1953u, 1953u, 1u, 1u, 15u, 0u, 0u, 15u, 1928u, 0u, false, 0u, 1u}},
    /* vector 8 */
    {3u, {false, 2087u, 3761u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 3761u, 3761u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {43196u, {false, 2087u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2157u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2157u, 2087u, 0u, 2u, 0u, 3761u, 3761u, 1u, 0u, 0u, 1u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2157u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2157u, 2157u, 0u, 2u, 1u, 3761u, 3761u, 1u, 0u, 1u, 1u, 0u, 600u, 2157u, 0u, false, 0u, 0u}},
    {2u, {false, 2157u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2157u, 2157u, 0u, 2u, 3u, 3761u, 3761u, 1u, 0u, 3u, 1u, 0u, 600u, 2157u, 0u, false, 0u, 0u}},
    {1u, {false, 1999u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 2157u, 0u, 3u, 0u, 3761u, 3761u, 1u, 0u, 4u, 1u, 0u, 600u, 2157u, 0u, false, 0u, 0u}},
    {1u, {false, 1999u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 3u, 1u, 3761u, 3761u, 1u, 0u, 5u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {1u, {true, 487u, 1952u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 0u, 1999u, 1999u, 1u, 3u, 2u, 1952u, 3761u, 1u, 0u, 6u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 487u, 1952u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 1u, 1999u, 1999u, 2u, 3u, 3u, 1952u, 1952u, 1u, 0u, 7u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {2u, {false, 3761u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {2u, 2u, 3u, 3761u, 3761u, 4u, 3u, 5u, 3762u, 3762u, 0u, 0u, 9u, 0u, 0u, 600u, 3761u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3761u}, {false, false, true, 3u}, {false, false, true, 3u},
     {3u, 3u, 0u, 2087u, 3761u, 5u, 3u, 6u, 3761u, 3762u, 0u, 1u, 10u, 0u, 0u, 600u, 3761u, 0u, false, 0u, 1u}},
    {14u, {false, 2087u, 3761u}, {false, false, true, 3u}, {false, false, true, 3u},
     {17u, 3u, 8u, 2087u, 2087u, 19u, 3u, 8u, 3761u, 3761u, 0u, 1u, 24u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3761u}, {false, false, true, 1u}, {false, false, true, 1u},
     {18u, 3u, 8u, 2087u, 2087u, 20u, 1u, 0u, 3761u, 3761u, 0u, 1u, 25u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3761u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 2087u, 2087u, 20u, 1u, 1u, 3761u, 3761u, 0u, 1u, 26u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 0u, 2087u, 2087u, 20u, 1u, 2u, 3761u, 3761u, 1u, 0u, 27u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {43172u, {false, 2087u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {2u, {false, 2087u, 3761u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 1u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {7u, {false, 2087u, 3761u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 8u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 2157u, 0u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2157u, 2087u, 0u, 2u, 0u, 3761u, 3761u, 1u, 0u, 9u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {3u, {false, 2157u, 0u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2157u, 2157u, 0u, 2u, 3u, 3761u, 3761u, 1u, 0u, 12u, 1u, 0u, 600u, 2157u, 0u, false, 1u, 0u}},
    {1u, {false, 1999u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 2157u, 0u, 3u, 0u, 3761u, 3761u, 1u, 0u, 13u, 1u, 0u, 600u, 2157u, 0u, false, 0u, 0u}},
    {1u, {false, 1999u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 3u, 1u, 3761u, 3761u, 1u, 0u, 14u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {2u, {false, 1999u, 1954u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 2u, 3u, 3u, 1954u, 1954u, 1u, 0u, 16u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {1u, {false, 489u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 489u, 1999u, 0u, 3u, 4u, 1954u, 1954u, 1u, 0u, 17u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {3582u, {false, 489u, 0u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 0u, 3u, 8u, 1954u, 1954u, 1u, 1u, 3599u, 1u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 489u, 0u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 0u, 3u, 8u, 1954u, 1954u, 1u, 1u, 3600u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 487u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 2227u, 489u, 0u, 3u, 8u, 1954u, 1954u, 1u, 1u, 3601u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 2227u, 487u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2227u, 2227u, 0u, 3u, 8u, 1954u, 1954u, 0u, 0u, 3602u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 1997u, 1953u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1997u, 2227u, 1u, 3u, 8u, 1953u, 1954u, 0u, 0u, 3603u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 1997u, 1953u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1997u, 1997u, 2u, 3u, 8u, 1953u, 1953u, 1u, 1u, 3604u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {17u, {true, 1997u, 1953u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1997u, 1997u, 19u, 3u, 8u, 1953u, 1953u, 1u, 1u, 3621u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {241u, {true, 1997u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3862u, 0u, 1u, 240u, 1997u, 240u, false, 0u, 1u}},
    {1u, {true, 488u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 488u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3863u, 0u, 1u, 241u, 1997u, 241u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 488u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3864u, 0u, 0u, 0u, 1997u, 242u, false, 0u, 1u}},
    {1u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3865u, 0u, 0u, 1u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 488u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 488u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3866u, 0u, 0u, 2u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 488u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 3867u, 0u, 0u, 3u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 3761u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 3761u, 1999u, 20u, 1u, 8u, 1954u, 1953u, 1u, 1u, 3868u, 0u, 0u, 4u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 3761u, 1999u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 3869u, 0u, 0u, 5u, 3761u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 2087u, 3761u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 3870u, 0u, 0u, 6u, 2087u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 2u, 3u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 3872u, 0u, 0u, 8u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 1954u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 3873u, 0u, 0u, 9u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 487u, 487u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 2087u, 2087u, 0u, 2u, 0u, 1954u, 1954u, 1u, 0u, 3874u, 0u, 0u, 10u, 2087u, 0u, false, 0u, 1u}},
    {3u, {false, 487u, 3761u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 2087u, 2087u, 3u, 2u, 3u, 3761u, 3761u, 1u, 0u, 3877u, 0u, 0u, 13u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 487u, 3761u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 0u, 2087u, 2087u, 4u, 1u, 0u, 3761u, 3761u, 0u, 1u, 3878u, 0u, 0u, 14u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 487u}, {false, false, true, 1u}, {false, false, true, 1u},
     {1u, 3u, 1u, 3762u, 2087u, 0u, 2u, 0u, 3761u, 3761u, 0u, 1u, 3879u, 0u, 0u, 15u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 3761u, 487u}, {false, false, true, 1u}, {false, false, true, 1u},
     {2u, 3u, 2u, 3761u, 3762u, 0u, 2u, 1u, 3761u, 3761u, 0u, 1u, 3880u, 0u, 0u, 16u, 3761u, 0u, false, 0u, 1u}},
    {1u, {true, 3761u, 3761u}, {false, false, true, 1u}, {false, false, true, 1u},
     {3u, 3u, 3u, 3761u, 3761u, 1u, 2u, 2u, 3761u, 3761u, 0u, 1u, 3881u, 0u, 0u, 17u, 3761u, 0u, false, 0u, 1u}},
    /* vector 9 */
    {3u, {false, 2087u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 3762u, 3762u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {43196u, {false, 2087u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 3762u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 0u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {true, 3761u, 3762u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 3761u, 2087u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 1u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 1998u, 1952u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 1998u, 3761u, 20u, 1u, 8u, 1952u, 3762u, 1u, 0u, 2u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {1u, {false, 1998u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1998u, 1998u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 3u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {true, 2020u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 2020u, 1998u, 0u, 2u, 0u, 1952u, 1952u, 1u, 1u, 4u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {false, 2088u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 2088u, 2020u, 1u, 2u, 1u, 3762u, 1952u, 1u, 1u, 5u, 0u, 0u, 600u, 2020u, 0u, false, 0u, 1u}},
    {3u, {false, 2088u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 4u, 1u, 0u, 3762u, 3762u, 1u, 0u, 8u, 0u, 0u, 600u, 2088u, 0u, false, 0u, 0u}},
    {1u, {true, 2088u, 3762u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 5u, 1u, 1u, 3762u, 3762u, 1u, 0u, 9u, 0u, 1u, 0u, 2088u, 0u, false, 0u, 0u}},
    {1u, {true, 2088u, 65535u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 0u, 2u, 0u, 3762u, 3762u, 1u, 0u, 10u, 0u, 1u, 1u, 2088u, 1u, false, 0u, 0u}},
    {1u, {true, 489u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 489u, 2088u, 1u, 2u, 1u, 1953u, 3762u, 1u, 0u, 11u, 0u, 1u, 2u, 2088u, 2u, false, 0u, 0u}},
    {1u, {true, 489u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 2u, 2u, 2u, 1953u, 1953u, 1u, 1u, 12u, 0u, 1u, 3u, 489u, 3u, false, 0u, 1u}},
    {6u, {true, 489u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 8u, 1u, 4u, 1953u, 1953u, 1u, 1u, 18u, 0u, 1u, 9u, 489u, 9u, false, 0u, 1u}},
    {1u, {true, 2044u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2044u, 489u, 9u, 1u, 5u, 1953u, 1953u, 1u, 1u, 19u, 0u, 1u, 10u, 489u, 10u, false, 0u, 1u}},
    {1u, {true, 0u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {0u, 2u, 0u, 2044u, 489u, 10u, 1u, 6u, 1953u, 1953u, 1u, 1u, 20u, 0u, 1u, 11u, 2044u, 0u, false, 0u, 1u}},
    {7120u, {true, 1997u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 7140u, 0u, 1u, 600u, 1997u, 7120u, false, 0u, 1u}},
    {1u, {true, 1997u, 1953u}, {false, false, true, 4u}, {false, false, true, 4u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 7141u, 0u, 0u, 0u, 1997u, 7121u, true, 0u, 1u}},
    /* vector 10 */
    {1u, {false, 2087u, 3761u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 0u, 1u, 2087u, 0u, 1u, 0u, 1u, 3761u, 0u, 0u, 1u, 1u, 0u, 0u, 1u, 0u, 0u, false, 0u, 1u}},
    {2u, {false, 2157u, 0u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2157u, 2157u, 0u, 0u, 3u, 3761u, 0u, 0u, 1u, 3u, 0u, 0u, 3u, 2157u, 0u, false, 0u, 1u}},
    {2u, {false, 2157u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {5u, 1u, 1u, 2157u, 2157u, 0u, 0u, 5u, 3761u, 0u, 0u, 0u, 5u, 0u, 0u, 5u, 2157u, 0u, false, 0u, 0u}},
    {2u, {false, 1999u, 0u}, {false, false, false, 0u}, {false, false, false, 0u},
     {7u, 1u, 3u, 1999u, 1999u, 0u, 0u, 7u, 3761u, 0u, 1u, 0u, 7u, 0u, 0u, 7u, 1999u, 0u, false, 0u, 0u}},
    {1u, {false, 489u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {8u, 1u, 4u, 489u, 1999u, 0u, 3u, 0u, 3761u, 0u, 1u, 0u, 8u, 0u, 0u, 8u, 1999u, 0u, false, 0u, 0u}},
    {19u, {false, 489u, 489u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 19u, 3u, 8u, 489u, 489u, 1u, 1u, 27u, 0u, 0u, 27u, 489u, 0u, false, 0u, 1u}},
    {4077u, {false, 489u, 489u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 489u, 489u, 1u, 1u, 4104u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {3u, {false, 420u, 489u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 2u, 489u, 489u, 20u, 1u, 8u, 489u, 489u, 1u, 1u, 4107u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 420u, 489u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 489u, 489u, 20u, 1u, 8u, 489u, 489u, 1u, 1u, 4108u, 0u, 0u, 600u, 489u, 0u, false, 0u, 1u}},
    {19u, {false, 2087u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 0u, 1u, 4127u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {45u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 4172u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {3u, {true, 2087u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 4175u, 0u, 1u, 2u, 2087u, 2u, false, 0u, 0u}},
    {1u, {true, 488u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 488u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 4176u, 0u, 1u, 3u, 2087u, 3u, false, 0u, 0u}},
    {4u, {true, 2018u, 0u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2018u, 2018u, 0u, 2u, 3u, 1953u, 1953u, 1u, 0u, 4180u, 0u, 1u, 7u, 2018u, 7u, false, 0u, 0u}},
    {1u, {true, 2018u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2018u, 2018u, 0u, 3u, 0u, 1953u, 1953u, 1u, 0u, 4181u, 0u, 0u, 0u, 2018u, 8u, false, 0u, 0u}},
    {19u, {false, 2087u, 1953u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2087u, 2087u, 19u, 3u, 8u, 1953u, 1953u, 1u, 0u, 4200u, 0u, 0u, 19u, 2087u, 0u, false, 0u, 0u}},
    {580u, {false, 2087u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 4780u, 0u, 0u, 599u, 2087u, 0u, false, 0u, 0u}},
    {240u, {true, 2087u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5020u, 0u, 1u, 239u, 2087u, 239u, false, 0u, 0u}},
    {1u, {true, 2087u, 489u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 489u, 1953u, 1u, 0u, 5021u, 0u, 1u, 240u, 2087u, 240u, false, 0u, 0u}},
    {1u, {true, 2228u, 489u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2228u, 2087u, 20u, 1u, 8u, 489u, 489u, 1u, 0u, 5022u, 0u, 1u, 241u, 2087u, 241u, false, 0u, 0u}},
    {1u, {true, 2228u, 489u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2228u, 2228u, 20u, 1u, 8u, 489u, 489u, 0u, 0u, 5023u, 0u, 0u, 0u, 2228u, 0u, false, 0u, 0u}},
    {1u, {true, 489u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 489u, 2228u, 20u, 1u, 8u, 1953u, 489u, 0u, 0u, 5024u, 0u, 0u, 1u, 2228u, 0u, false, 0u, 0u}},
    {7u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5031u, 0u, 0u, 8u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 2226u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 2226u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5032u, 0u, 0u, 9u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 2226u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5033u, 0u, 0u, 10u, 2226u, 0u, false, 0u, 0u}},
    {1u, {true, 1997u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 1997u, 2226u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5034u, 0u, 0u, 11u, 2226u, 0u, false, 0u, 0u}},
    {588u, {true, 1997u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5622u, 0u, 0u, 599u, 1997u, 0u, false, 0u, 1u}},
    {246u, {true, 1997u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5868u, 0u, 1u, 245u, 1997u, 245u, false, 0u, 1u}},
    {1u, {true, 2068u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2068u, 1997u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5869u, 0u, 1u, 246u, 1997u, 246u, false, 0u, 1u}},
    {1u, {true, 2068u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2068u, 2068u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5870u, 0u, 1u, 247u, 2068u, 0u, false, 0u, 0u}},
    {1u, {true, 2139u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2139u, 2068u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5871u, 0u, 1u, 248u, 2068u, 1u, false, 0u, 0u}},
    {1u, {true, 2069u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2069u, 2139u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5872u, 0u, 1u, 249u, 2068u, 2u, false, 0u, 0u}},
    {1u, {false, 489u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 489u, 2069u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 5873u, 0u, 0u, 0u, 2068u, 3u, false, 0u, 0u}},
    {3u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5876u, 0u, 0u, 3u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5877u, 0u, 0u, 4u, 489u, 0u, false, 0u, 1u}},
    {1u, {true, 488u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 488u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5878u, 0u, 0u, 5u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 488u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 5879u, 0u, 0u, 6u, 489u, 0u, false, 0u, 1u}},
    {1u, {false, 0u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 1999u, 488u, 20u, 1u, 8u, 1954u, 1953u, 1u, 1u, 5880u, 0u, 0u, 7u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 3761u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 3761u, 1999u, 20u, 1u, 8u, 1954u, 1954u, 1u, 1u, 5881u, 0u, 0u, 8u, 1999u, 0u, false, 0u, 1u}},
    {5u, {false, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 5886u, 0u, 0u, 13u, 1999u, 0u, false, 0u, 1u}},
    {3u, {true, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {9u, 1u, 5u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 5889u, 0u, 0u, 16u, 1999u, 0u, false, 0u, 1u}},
    {583u, {true, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 6472u, 0u, 0u, 599u, 1999u, 0u, false, 0u, 1u}},
    {6u, {true, 1999u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 6478u, 0u, 1u, 5u, 1999u, 5u, false, 0u, 1u}},
    {1u, {true, 1999u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1953u, 1u, 1u, 6479u, 0u, 1u, 6u, 1999u, 6u, false, 0u, 1u}},
    {1u, {true, 1999u, 487u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 2u, 0u, 1952u, 1953u, 1u, 1u, 6480u, 0u, 1u, 7u, 1999u, 7u, false, 0u, 1u}},
    {1u, {true, 3761u, 487u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 3761u, 1999u, 0u, 2u, 1u, 1952u, 1953u, 1u, 1u, 6481u, 0u, 1u, 8u, 1999u, 8u, false, 0u, 1u}},
    {1u, {true, 3761u, 487u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 3761u, 3761u, 0u, 2u, 2u, 1952u, 1953u, 0u, 0u, 6482u, 0u, 1u, 9u, 3761u, 0u, false, 0u, 0u}},
    {1u, {true, 489u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 489u, 3761u, 1u, 2u, 3u, 1953u, 1952u, 0u, 0u, 6483u, 0u, 1u, 10u, 3761u, 1u, false, 0u, 0u}},
    {18u, {true, 489u, 1953u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 489u, 489u, 19u, 3u, 8u, 1953u, 1953u, 1u, 1u, 6501u, 0u, 0u, 17u, 489u, 0u, false, 0u, 1u}},
    {582u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 7083u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {236u, {true, 489u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 7319u, 0u, 1u, 235u, 489u, 235u, false, 0u, 1u}},
    {1u, {true, 2226u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2226u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 7320u, 0u, 1u, 236u, 489u, 236u, false, 0u, 1u}},
    {7121u, {true, 2226u, 1953u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 14441u, 0u, 1u, 600u, 2226u, 7120u, false, 0u, 0u}},
    {2u, {true, 2226u, 1953u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1953u, 1953u, 1u, 0u, 14443u, 0u, 0u, 1u, 2226u, 0u, true, 0u, 0u}},
    {598u, {true, 2226u, 1952u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 15041u, 0u, 0u, 599u, 2226u, 0u, true, 0u, 0u}},
    {1u, {true, 2226u, 3762u}, {false, false, false, 4u}, {false, false, false, 4u},
     {20u, 1u, 8u, 2226u, 2226u, 20u, 1u, 8u, 3762u, 1952u, 1u, 0u, 15042u, 0u, 0u, 600u, 2226u, 0u, true, 0u, 0u}},
    /* vector 11 */
    {3u, {false, 2087u, 488u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 0u, 3u, 2087u, 2087u, 3u, 0u, 3u, 488u, 488u, 0u, 1u, 3u, 0u, 0u, 3u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 2087u, 488u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2087u, 2087u, 4u, 1u, 0u, 488u, 488u, 1u, 0u, 4u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 0u}},
    {4096u, {false, 2017u, 488u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2017u, 2017u, 20u, 1u, 8u, 488u, 488u, 1u, 0u, 4100u, 0u, 0u, 600u, 2017u, 0u, false, 0u, 0u}},
    {1u, {true, 1997u, 488u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 1997u, 2017u, 20u, 1u, 8u, 488u, 488u, 1u, 0u, 4101u, 0u, 1u, 0u, 2017u, 0u, false, 0u, 0u}},
    {4u, {true, 487u, 488u}, {true, false, true, 0u}, {true, false, true, 0u},
     {0u, 2u, 3u, 1997u, 2017u, 20u, 1u, 8u, 488u, 488u, 1u, 1u, 4105u, 0u, 1u, 4u, 1997u, 4u, false, 0u, 1u}},
    {1u, {true, 487u, 488u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 0u, 1997u, 2017u, 20u, 1u, 8u, 488u, 488u, 0u, 1u, 4106u, 0u, 0u, 0u, 1997u, 5u, false, 0u, 1u}},
    {19u, {false, 1999u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 0u, 1u, 4125u, 0u, 0u, 19u, 1999u, 0u, false, 0u, 1u}},
    {493u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 4618u, 0u, 0u, 512u, 1999u, 0u, false, 0u, 1u}},
    {87u, {true, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4705u, 0u, 0u, 599u, 1999u, 0u, false, 0u, 1u}},
    {153u, {true, 1999u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4858u, 0u, 1u, 152u, 1999u, 152u, false, 0u, 1u}},
    {1u, {true, 2068u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2068u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4859u, 0u, 1u, 153u, 1999u, 153u, false, 0u, 1u}},
    {1u, {true, 2068u, 1952u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2068u, 2068u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 4860u, 0u, 1u, 154u, 2068u, 0u, false, 0u, 0u}},
    {1u, {true, 1997u, 1952u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 1997u, 2068u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 4861u, 0u, 1u, 155u, 2068u, 1u, false, 0u, 0u}},
    {21u, {true, 1997u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4882u, 0u, 1u, 176u, 1997u, 22u, false, 0u, 1u}},
    {1u, {true, 2088u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2088u, 1997u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 4883u, 0u, 1u, 177u, 1997u, 23u, false, 0u, 1u}},
    {1u, {true, 2088u, 65535u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 0u, 2u, 0u, 1952u, 1952u, 1u, 0u, 4884u, 0u, 1u, 178u, 2088u, 0u, false, 0u, 0u}},
    {2u, {true, 2087u, 65535u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 0u, 2u, 2u, 1952u, 1952u, 1u, 0u, 4886u, 0u, 1u, 180u, 2087u, 2u, false, 0u, 0u}},
    /* vector 12 */
    {4u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {4u, 1u, 0u, 489u, 489u, 4u, 1u, 0u, 1953u, 1953u, 1u, 1u, 4u, 0u, 0u, 4u, 489u, 0u, false, 0u, 1u}},
    {595u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 599u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {243u, {true, 489u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 842u, 0u, 1u, 242u, 489u, 242u, false, 0u, 1u}},
    {1u, {true, 488u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 488u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 843u, 0u, 1u, 243u, 489u, 243u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 488u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 844u, 0u, 0u, 0u, 489u, 244u, false, 0u, 1u}},
    {1u, {false, 0u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 1999u, 488u, 20u, 1u, 8u, 1954u, 1953u, 1u, 1u, 845u, 0u, 0u, 1u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 3761u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 3761u, 1999u, 20u, 1u, 8u, 1954u, 1954u, 1u, 1u, 846u, 0u, 0u, 2u, 1999u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 2u, 3u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 1u, 848u, 0u, 0u, 4u, 2087u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 1954u}, {false, false, false, 0u}, {false, false, false, 0u},
     {5u, 1u, 1u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 850u, 0u, 0u, 6u, 2087u, 0u, false, 0u, 0u}},
    {4u, {true, 2087u, 1954u}, {false, false, false, 0u}, {false, false, false, 0u},
     {9u, 1u, 5u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 854u, 0u, 0u, 10u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 2087u, 1954u}, {false, false, false, 0u}, {false, false, false, 0u},
     {10u, 1u, 6u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 855u, 0u, 0u, 11u, 2087u, 0u, false, 0u, 0u}},
    {1u, {false, 65535u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 856u, 0u, 0u, 12u, 2087u, 0u, false, 0u, 1u}},
    {3u, {true, 65535u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 3u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 1u, 0u, 859u, 0u, 0u, 15u, 2087u, 0u, false, 0u, 1u}},
    {42340u, {true, 65535u, 1954u}, {false, false, true, 1u}, {false, false, true, 1u},
     {0u, 3u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {1u, {false, 65535u, 1954u}, {false, true, true, 1u}, {false, true, true, 1u},
     {0u, 3u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 0u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 1u}},
    {1u, {false, 2226u, 1954u}, {false, true, true, 1u}, {false, true, true, 1u},
     {1u, 3u, 8u, 2226u, 2087u, 20u, 1u, 8u, 1954u, 1954u, 0u, 1u, 1u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 1u}},
    {1u, {false, 2226u, 1953u}, {false, true, true, 1u}, {false, true, true, 1u},
     {2u, 3u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1953u, 1954u, 0u, 1u, 2u, 1u, 0u, 600u, 2226u, 0u, false, 1u, 1u}},
    {1u, {false, 2226u, 1953u}, {false, false, true, 1u}, {false, false, true, 1u},
     {3u, 3u, 8u, 2226u, 2226u, 20u, 1u, 8u, 1953u, 1953u, 0u, 1u, 3u, 0u, 0u, 600u, 2226u, 0u, false, 0u, 1u}},
    {16u, {false, 2087u, 3761u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 0u, 1u, 19u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {43180u, {false, 2087u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 43199u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {3u, {false, 2087u, 3761u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 3761u, 3761u, 1u, 0u, 2u, 1u, 0u, 600u, 2087u, 0u, false, 1u, 0u}},
    {4u, {false, 2157u, 0u}, {false, true, false, 0u}, {false, true, false, 0u},
     {20u, 1u, 8u, 2157u, 2157u, 0u, 2u, 3u, 3761u, 3761u, 1u, 0u, 6u, 1u, 0u, 600u, 2157u, 0u, false, 1u, 0u}},
    {4u, {false, 1999u, 0u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 1999u, 1999u, 0u, 3u, 3u, 3761u, 3761u, 1u, 0u, 10u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {3u, {false, 65535u, 0u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 2u, 1999u, 1999u, 0u, 3u, 6u, 3761u, 3761u, 1u, 0u, 13u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 65535u, 489u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 3u, 1999u, 1999u, 1u, 3u, 7u, 489u, 3761u, 1u, 0u, 14u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 65535u, 1954u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 0u, 1999u, 1999u, 2u, 3u, 8u, 1954u, 489u, 0u, 1u, 15u, 1u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {17u, {false, 2087u, 1952u}, {false, false, true, 3u}, {false, false, true, 3u},
     {17u, 3u, 8u, 2087u, 2087u, 19u, 3u, 8u, 1952u, 1952u, 0u, 1u, 32u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {2u, {false, 2087u, 1952u}, {false, false, true, 1u}, {false, false, true, 1u},
     {19u, 3u, 8u, 2087u, 2087u, 20u, 1u, 1u, 1952u, 1952u, 0u, 1u, 34u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 1u}},
    {45u, {false, 2087u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 79u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {2u, {false, 2089u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 81u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 2021u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2021u, 2089u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 82u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {false, 487u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 2021u, 2089u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 83u, 0u, 0u, 600u, 2021u, 0u, false, 0u, 1u}},
    {3u, {false, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 2u, 3u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 86u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 1999u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 87u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {1u, {false, 1998u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {5u, 1u, 1u, 1998u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 88u, 0u, 0u, 600u, 1999u, 0u, false, 0u, 0u}},
    {1u, {false, 1998u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 1998u, 1998u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 89u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {7u, 1u, 3u, 3762u, 1998u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 90u, 0u, 0u, 600u, 1998u, 0u, false, 0u, 1u}},
    {1u, {false, 3762u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {8u, 1u, 4u, 3762u, 3762u, 20u, 1u, 8u, 1952u, 1952u, 0u, 0u, 91u, 0u, 0u, 600u, 3762u, 0u, false, 0u, 0u}},
    {1u, {false, 3694u, 1952u}, {false, false, false, 0u}, {false, false, false, 0u},
     {9u, 1u, 5u, 3694u, 3762u, 20u, 1u, 8u, 1952u, 1952u, 0u, 0u, 92u, 0u, 0u, 600u, 3762u, 0u, false, 0u, 0u}},
    {1u, {false, 65535u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 3694u, 3762u, 20u, 1u, 8u, 1953u, 1952u, 0u, 0u, 93u, 0u, 0u, 600u, 3694u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 2044u, 3694u, 20u, 1u, 8u, 1953u, 1953u, 0u, 0u, 94u, 0u, 0u, 600u, 3694u, 0u, false, 0u, 1u}},
    {2u, {false, 2044u, 3762u}, {false, false, true, 0u}, {false, false, true, 0u},
     {3u, 2u, 3u, 2044u, 2044u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 96u, 0u, 0u, 600u, 2044u, 0u, false, 0u, 1u}},
    {1u, {false, 2044u, 3761u}, {false, false, false, 0u}, {false, false, false, 0u},
     {4u, 1u, 0u, 2044u, 2044u, 20u, 1u, 8u, 3761u, 3762u, 1u, 0u, 97u, 0u, 0u, 600u, 2044u, 0u, false, 0u, 0u}},
    {4u, {true, 2044u, 3762u}, {true, false, false, 0u}, {true, false, false, 0u},
     {8u, 1u, 4u, 2044u, 2044u, 20u, 1u, 8u, 3762u, 3762u, 1u, 0u, 101u, 0u, 1u, 3u, 2044u, 3u, false, 0u, 0u}},
    {236u, {true, 3762u, 3762u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 3762u, 3762u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 337u, 0u, 1u, 239u, 3762u, 234u, false, 0u, 0u}},
    {1u, {true, 3762u, 3762u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 3762u, 3762u, 20u, 1u, 8u, 3762u, 3762u, 0u, 0u, 338u, 0u, 0u, 0u, 3762u, 235u, false, 0u, 0u}},
    {1u, {false, 489u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 489u, 3762u, 20u, 1u, 8u, 1953u, 3762u, 0u, 0u, 339u, 0u, 0u, 1u, 3762u, 0u, false, 0u, 0u}},
    {3u, {false, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 342u, 0u, 0u, 4u, 489u, 0u, false, 0u, 1u}},
    {595u, {true, 489u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 937u, 0u, 0u, 599u, 489u, 0u, false, 0u, 1u}},
    {243u, {true, 489u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 489u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 1180u, 0u, 1u, 242u, 489u, 242u, false, 0u, 1u}},
    {1u, {true, 488u, 1953u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 488u, 489u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 1181u, 0u, 1u, 243u, 489u, 243u, false, 0u, 1u}},
    {1u, {false, 1999u, 1953u}, {false, false, true, 0u}, {false, false, true, 0u},
     {20u, 1u, 8u, 1999u, 488u, 20u, 1u, 8u, 1953u, 1953u, 1u, 1u, 1182u, 0u, 0u, 0u, 489u, 244u, false, 0u, 1u}},
    {1u, {false, 0u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {0u, 2u, 0u, 1999u, 488u, 20u, 1u, 8u, 1954u, 1953u, 1u, 1u, 1183u, 0u, 0u, 1u, 1999u, 0u, false, 0u, 1u}},
    {1u, {false, 3761u, 1954u}, {false, false, true, 0u}, {false, false, true, 0u},
     {1u, 2u, 1u, 3761u, 1999u, 20u, 1u, 8u, 1954u, 1954u, 1u, 1u, 1184u, 0u, 0u, 2u, 1999u, 0u, false, 0u, 1u}},
    {5u, {false, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {6u, 1u, 2u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 1189u, 0u, 0u, 7u, 1999u, 0u, false, 0u, 1u}},
    {4u, {true, 1999u, 1952u}, {false, false, true, 0u}, {false, false, true, 0u},
     {10u, 1u, 6u, 1999u, 1999u, 20u, 1u, 8u, 1952u, 1952u, 1u, 1u, 1193u, 0u, 0u, 11u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 1998u, 1951u}, {false, false, true, 0u}, {false, false, true, 0u},
     {11u, 1u, 7u, 1998u, 1999u, 20u, 1u, 8u, 1951u, 1952u, 1u, 1u, 1194u, 0u, 0u, 12u, 1999u, 0u, false, 0u, 1u}},
    {1u, {true, 2088u, 487u}, {false, false, true, 0u}, {false, false, true, 0u},
     {12u, 1u, 8u, 2088u, 1998u, 0u, 2u, 0u, 1951u, 1952u, 1u, 1u, 1195u, 0u, 0u, 13u, 1999u, 0u, false, 0u, 1u}},
    {3u, {true, 1997u, 487u}, {false, false, true, 0u}, {false, false, true, 0u},
     {15u, 1u, 8u, 1997u, 1997u, 0u, 2u, 3u, 1951u, 1952u, 1u, 1u, 1198u, 0u, 0u, 16u, 1997u, 0u, false, 0u, 1u}},
    {583u, {true, 1997u, 487u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1997u, 1997u, 0u, 3u, 8u, 1951u, 1952u, 1u, 1u, 1781u, 0u, 0u, 599u, 1997u, 0u, false, 0u, 1u}},
    {19u, {true, 1997u, 1952u}, {false, false, true, 2u}, {false, false, true, 2u},
     {20u, 1u, 8u, 1997u, 1997u, 19u, 3u, 8u, 1952u, 1952u, 1u, 1u, 1800u, 0u, 0u, 600u, 1997u, 0u, false, 0u, 1u}},
    {3u, {true, 1997u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 1997u, 1997u, 20u, 1u, 2u, 1952u, 1952u, 1u, 1u, 1803u, 0u, 1u, 2u, 1997u, 2u, false, 0u, 1u}},
    {1u, {true, 2088u, 1952u}, {true, false, true, 0u}, {true, false, true, 0u},
     {20u, 1u, 8u, 2088u, 1997u, 20u, 1u, 3u, 1952u, 1952u, 1u, 1u, 1804u, 0u, 1u, 3u, 1997u, 3u, false, 0u, 1u}},
    {239u, {true, 2088u, 1952u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 20u, 1u, 8u, 1952u, 1952u, 1u, 0u, 2043u, 0u, 1u, 242u, 2088u, 238u, false, 0u, 0u}},
    {1u, {true, 2088u, 65535u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2088u, 0u, 2u, 0u, 1952u, 1952u, 1u, 0u, 2044u, 0u, 1u, 243u, 2088u, 239u, false, 0u, 0u}},
    {3u, {true, 2087u, 65535u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2087u, 2087u, 0u, 2u, 3u, 1952u, 1952u, 1u, 0u, 2047u, 0u, 1u, 246u, 2087u, 242u, false, 0u, 0u}},
    {601u, {true, 2087u, 65535u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2087u, 2087u, 0u, 3u, 8u, 1952u, 1952u, 1u, 0u, 2648u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {true, 2227u, 65535u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2227u, 2087u, 0u, 3u, 8u, 1952u, 1952u, 1u, 0u, 2649u, 0u, 0u, 600u, 2087u, 0u, false, 0u, 0u}},
    {1u, {true, 2227u, 1954u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2227u, 2227u, 1u, 3u, 8u, 1954u, 1952u, 0u, 0u, 2650u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {true, 2227u, 488u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2227u, 2227u, 2u, 3u, 8u, 488u, 1954u, 0u, 0u, 2651u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {40550u, {true, 2227u, 3763u}, {false, false, false, 2u}, {false, false, false, 2u},
     {20u, 1u, 8u, 2227u, 2227u, 0u, 3u, 8u, 488u, 1954u, 0u, 0u, 1u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 0u}},
    {1u, {false, 65535u, 3762u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 0u, 2227u, 2227u, 1u, 3u, 8u, 3762u, 488u, 0u, 0u, 2u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 1u}},
    {3u, {false, 65535u, 487u}, {false, false, true, 2u}, {false, false, true, 2u},
     {0u, 2u, 3u, 2227u, 2227u, 0u, 3u, 8u, 3762u, 488u, 0u, 0u, 5u, 0u, 0u, 600u, 2227u, 0u, false, 0u, 1u}},
    {43196u, {false, 65535u, 487u}, {false, false, true, 3u}, {false, false, true, 3u},
     {0u, 3u, 8u, 2227u, 2227u, 0u, 3u, 8u, 3762u, 488u, 0u, 1u, 1u, 1u, 0u, 600u, 2227u, 0u, false, 0u, 1u}},
    {19u, {true, 2089u, 1953u}, {false, false, true, 3u}, {false, false, true, 3u},
     {19u, 3u, 8u, 2089u, 2089u, 19u, 3u, 8u, 1953u, 1953u, 0u, 1u, 20u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 1u}},
    {45u, {true, 2089u, 1953u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 1953u, 1953u, 0u, 0u, 65u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {true, 2089u, 488u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2089u, 2089u, 20u, 1u, 8u, 488u, 1953u, 0u, 0u, 66u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {true, 2044u, 488u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2044u, 2089u, 20u, 1u, 8u, 488u, 488u, 0u, 0u, 67u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {true, 2226u, 489u}, {false, false, false, 0u}, {false, false, false, 0u},
     {20u, 1u, 8u, 2226u, 2044u, 20u, 1u, 8u, 489u, 488u, 0u, 0u, 68u, 0u, 0u, 600u, 2089u, 0u, false, 0u, 0u}},
    {1u, {true, 2088u, 489u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2088u, 2226u, 20u, 1u, 8u, 489u, 489u, 1u, 0u, 69u, 0u, 1u, 0u, 2088u, 0u, false, 0u, 0u}},
    {1u, {true, 2156u, 488u}, {true, false, false, 0u}, {true, false, false, 0u},
     {20u, 1u, 8u, 2156u, 2088u, 20u, 1u, 8u, 488u, 489u, 1u, 0u, 70u, 0u, 1u, 1u, 2088u, 1u, false, 0u, 0u}},
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
    {35u, 46u, false, {0u}},
    {46u, 94u, false, {0u}},
    {94u, 112u, false, {0u}},
    {112u, 168u, false, {0u}},
    {168u, 185u, false, {0u}},
    {185u, 266u, false, {0u}},
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
