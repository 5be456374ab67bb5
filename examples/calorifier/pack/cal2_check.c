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
 */
/* The recorded inputs visit every state and make every transition. */
#include "cal2.h"

#include <stdio.h>
#include <string.h>

/* Inputs held for so many steps; the outputs after each odd and each even step of them; the state
 * after the last.
 */
struct row {
    uint32_t steps;
    struct cal2_in in;
    struct cal2_out odd;
    struct cal2_out even;
    struct cal2 after;
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
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1972u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {2u, 0u, 2u, 1972u, 1972u, 0u, 0u, 2u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {3u, 0u, 3u, 1972u, 1972u, 0u, 0u, 3u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 1972u, 1972u, 0u, 0u, 4u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1972u, 1972u, 0u, 0u, 5u, 0u, false, 1972u, 0u, false}},
    {11u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {16u, 1u, 12u, 1972u, 1972u, 0u, 0u, 16u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {17u, 1u, 12u, 1972u, 1972u, 0u, 0u, 17u, 0u, false, 1972u, 0u, false}},
    {23u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 40u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 41u, 0u, false, 1972u, 0u, false}},
    {199u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u, false, 1972u, 0u, false}},
    {1u, {true, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 0u, 0u, 240u, 0u, false, 1972u, 0u, false}},
    {1u, {false, false, 0u, false}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 1972u, 1972u, 0u, 0u, 240u, 0u, false, 1972u, 0u, false}},
    /* vector 2 */
    {11u, {false, false, 0u, false}, {false, 0u}, {false, 0u},
     {0u, 0u, 11u, 0u, 0u, 0u, 0u, 11u, 0u, false, 0u, 0u, false}},
    {1u, {false, false, 0u, false}, {false, 1u}, {false, 1u},
     {0u, 3u, 0u, 0u, 0u, 0u, 0u, 12u, 0u, false, 0u, 0u, false}},
    {1u, {false, false, 0u, false}, {false, 1u}, {false, 1u},
     {0u, 3u, 1u, 0u, 0u, 0u, 0u, 13u, 0u, false, 0u, 0u, false}},
    {1u, {false, false, 226u, false}, {false, 1u}, {false, 1u},
     {0u, 3u, 2u, 0u, 0u, 0u, 0u, 14u, 0u, false, 0u, 0u, false}},
    {1u, {false, false, 227u, false}, {false, 1u}, {false, 1u},
     {1u, 3u, 3u, 227u, 0u, 0u, 0u, 15u, 0u, false, 0u, 0u, false}},
    {2u, {false, false, 1973u, false}, {false, 1u}, {false, 1u},
     {3u, 3u, 5u, 1973u, 1973u, 0u, 0u, 17u, 0u, false, 1973u, 0u, false}},
    /* vector 3 */
    {2u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {2u, 0u, 2u, 1973u, 1973u, 0u, 0u, 2u, 0u, false, 1973u, 0u, false}},
    {2u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 1973u, 1973u, 1u, 0u, 4u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u, false, 1973u, 0u, false}},
    {235u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    /* vector 4 */
    {4u, {false, false, 1974u, false}, {false, 0u}, {false, 0u},
     {4u, 1u, 0u, 1974u, 1974u, 1u, 0u, 4u, 0u, false, 1974u, 0u, false}},
    {1u, {false, false, 4085u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 4085u, 1974u, 1u, 0u, 5u, 0u, false, 1974u, 0u, false}},
    {1u, {false, false, 4086u, false}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 4085u, 1974u, 1u, 0u, 6u, 0u, false, 4085u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 0u}, {false, 0u},
     {1u, 2u, 1u, 1972u, 4085u, 1u, 0u, 7u, 1u, false, 1974u, 0u, false}},
    /* vector 5 */
    {1u, {false, false, 1972u, true}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1972u, 0u, 0u, 0u, 1u, 1u, false, 0u, 0u, false}},
    {2u, {false, false, 1972u, true}, {false, 0u}, {false, 0u},
     {3u, 0u, 3u, 1972u, 1972u, 0u, 0u, 3u, 3u, false, 1972u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 2u}, {false, 2u},
     {4u, 1u, 0u, 1972u, 1972u, 0u, 0u, 4u, 4u, true, 1972u, 0u, false}},
    {1u, {false, false, 1972u, true}, {false, 2u}, {false, 2u},
     {5u, 1u, 1u, 1972u, 1972u, 0u, 0u, 5u, 4u, true, 1972u, 0u, false}},
    {2u, {true, false, 1864u, true}, {false, 2u}, {false, 2u},
     {7u, 1u, 3u, 1864u, 1864u, 0u, 0u, 7u, 4u, true, 1864u, 0u, false}},
    /* vector 6 */
    {241u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 0u, 0u, false, 1865u, 0u, false}},
    {1u, {false, false, 65535u, false}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 1865u, 1865u, 1u, 0u, 0u, 1u, false, 1865u, 1u, false}},
    {7u, {false, false, 65535u, false}, {false, 0u}, {false, 0u},
     {0u, 2u, 7u, 1865u, 1865u, 1u, 0u, 7u, 0u, false, 1865u, 0u, false}},
    {1u, {false, false, 65535u, false}, {false, 1u}, {false, 1u},
     {0u, 3u, 0u, 1865u, 1865u, 0u, 0u, 8u, 0u, false, 1865u, 0u, false}},
    {5u, {false, true, 1750u, false}, {false, 1u}, {false, 1u},
     {5u, 3u, 5u, 1750u, 1750u, 0u, 0u, 13u, 0u, false, 1750u, 0u, false}},
    {1u, {false, true, 1749u, false}, {false, 1u}, {false, 1u},
     {6u, 3u, 6u, 1749u, 1750u, 0u, 0u, 14u, 0u, false, 1750u, 0u, false}},
    {1u, {false, true, 65535u, true}, {false, 1u}, {false, 1u},
     {0u, 3u, 7u, 1749u, 1750u, 0u, 0u, 15u, 1u, false, 1749u, 0u, false}},
    {1u, {false, false, 1973u, false}, {false, 1u}, {false, 1u},
     {1u, 3u, 8u, 1973u, 1749u, 0u, 0u, 16u, 0u, false, 1750u, 0u, false}},
    {38u, {false, false, 1973u, false}, {false, 1u}, {false, 1u},
     {39u, 3u, 12u, 1973u, 1973u, 0u, 0u, 54u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 0u, 1973u, 1973u, 1u, 0u, 55u, 0u, false, 1973u, 0u, false}},
    {24u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 79u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 83u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 84u, 0u, false, 1973u, 0u, false}},
    {2u, {false, false, 1748u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1748u, 1748u, 0u, 0u, 86u, 0u, false, 1748u, 0u, false}},
    {2u, {true, false, 65535u, true}, {false, 0u}, {false, 0u},
     {0u, 2u, 1u, 1748u, 1748u, 0u, 0u, 88u, 2u, false, 1748u, 0u, false}},
    {1u, {true, false, 4085u, true}, {false, 0u}, {false, 0u},
     {1u, 2u, 2u, 4085u, 1748u, 0u, 0u, 89u, 3u, false, 1748u, 0u, false}},
    {1u, {false, false, 4084u, true}, {false, 2u}, {false, 2u},
     {2u, 2u, 3u, 4084u, 4085u, 0u, 0u, 90u, 4u, true, 4084u, 0u, false}},
    {1u, {false, false, 4085u, false}, {false, 2u}, {false, 2u},
     {3u, 2u, 4u, 4085u, 4084u, 0u, 0u, 91u, 0u, true, 4085u, 0u, false}},
    {1u, {false, false, 4085u, true}, {false, 2u}, {false, 2u},
     {4u, 1u, 0u, 4085u, 4085u, 1u, 0u, 92u, 1u, true, 4085u, 0u, false}},
    {234u, {false, false, 4084u, true}, {false, 2u}, {false, 2u},
     {40u, 1u, 12u, 4084u, 4084u, 1u, 0u, 240u, 4u, true, 4084u, 0u, false}},
    {1u, {true, false, 4084u, true}, {false, 2u}, {false, 2u},
     {40u, 1u, 12u, 4084u, 4084u, 1u, 0u, 240u, 4u, true, 4084u, 0u, false}},
    /* vector 7 */
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1973u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {6u, 1u, 2u, 1865u, 1973u, 1u, 0u, 6u, 0u, false, 1973u, 0u, false}},
    {1u, {true, false, 1865u, false}, {false, 0u}, {false, 0u},
     {7u, 1u, 3u, 1865u, 1865u, 1u, 0u, 7u, 0u, false, 1865u, 0u, false}},
    {241u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {2u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 1u, 1u, false, 1865u, 1u, false}},
    {2u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 3u, 3u, false, 1865u, 3u, false}},
    {1u, {true, false, 0u, false}, {true, 4u}, {true, 4u},
     {0u, 2u, 0u, 1865u, 1865u, 1u, 1u, 4u, 4u, false, 1865u, 4u, false}},
    {2u, {true, false, 227u, false}, {true, 4u}, {true, 4u},
     {2u, 2u, 2u, 227u, 227u, 0u, 1u, 6u, 4u, false, 227u, 0u, false}},
    {1u, {false, true, 227u, true}, {false, 0u}, {false, 0u},
     {3u, 2u, 3u, 227u, 227u, 0u, 0u, 0u, 0u, false, 227u, 0u, false}},
    {241u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {2u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 1u, 1u, false, 1865u, 1u, false}},
    {2u, {true, false, 226u, false}, {true, 0u}, {true, 0u},
     {0u, 2u, 1u, 1865u, 1865u, 1u, 1u, 3u, 3u, false, 1865u, 3u, false}},
    {1u, {true, false, 227u, false}, {true, 4u}, {true, 4u},
     {1u, 2u, 2u, 227u, 1865u, 1u, 1u, 4u, 4u, false, 1865u, 4u, false}},
    {1u, {true, true, 227u, false}, {true, 4u}, {true, 4u},
     {2u, 2u, 3u, 227u, 227u, 0u, 1u, 5u, 4u, false, 227u, 0u, false}},
    {2u, {true, true, 1748u, false}, {true, 4u}, {true, 4u},
     {4u, 1u, 0u, 1748u, 1748u, 0u, 1u, 7u, 4u, false, 1748u, 0u, false}},
    {112u, {true, false, 227u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 227u, 227u, 0u, 1u, 119u, 4u, false, 227u, 110u, false}},
    {1u, {true, false, 227u, false}, {false, 4u}, {false, 4u},
     {40u, 1u, 12u, 227u, 227u, 0u, 0u, 0u, 4u, false, 227u, 111u, false}},
    {4u, {false, false, 4084u, true}, {false, 2u}, {false, 2u},
     {40u, 1u, 12u, 4084u, 4084u, 1u, 0u, 4u, 4u, true, 4084u, 0u, false}},
    {2u, {true, false, 1749u, false}, {false, 2u}, {false, 2u},
     {40u, 1u, 12u, 1749u, 1749u, 0u, 0u, 6u, 0u, true, 1749u, 0u, false}},
    /* vector 8 */
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1973u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {6u, 1u, 2u, 1865u, 1973u, 1u, 0u, 6u, 0u, false, 1973u, 0u, false}},
    {1u, {true, false, 1865u, false}, {false, 0u}, {false, 0u},
     {7u, 1u, 3u, 1865u, 1865u, 1u, 0u, 7u, 0u, false, 1865u, 0u, false}},
    {5u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {12u, 1u, 8u, 1972u, 1972u, 1u, 0u, 12u, 0u, false, 1972u, 0u, false}},
    {227u, {true, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 1u, 0u, 239u, 0u, false, 1972u, 0u, false}},
    {1u, {true, false, 1972u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 1u, 1u, 0u, 0u, false, 1972u, 0u, false}},
    {3u, {true, false, 65535u, false}, {true, 0u}, {true, 0u},
     {0u, 2u, 2u, 1972u, 1972u, 1u, 1u, 3u, 3u, false, 1972u, 3u, false}},
    {5u, {true, false, 65535u, false}, {true, 4u}, {true, 4u},
     {0u, 2u, 7u, 1972u, 1972u, 1u, 1u, 8u, 4u, false, 1972u, 8u, false}},
    {1u, {true, false, 65535u, false}, {false, 5u}, {false, 5u},
     {0u, 3u, 0u, 1972u, 1972u, 0u, 0u, 0u, 4u, false, 1972u, 9u, false}},
    {39u, {false, false, 1973u, false}, {false, 1u}, {false, 1u},
     {39u, 3u, 12u, 1973u, 1973u, 0u, 0u, 39u, 0u, false, 1973u, 0u, false}},
    {25u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 64u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 68u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 69u, 0u, false, 1973u, 0u, false}},
    {2u, {true, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 71u, 0u, false, 1865u, 0u, false}},
    {1u, {true, false, 0u, false}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 1865u, 1865u, 1u, 0u, 72u, 0u, false, 1865u, 0u, false}},
    {2u, {true, false, 1750u, false}, {false, 0u}, {false, 0u},
     {2u, 2u, 2u, 1750u, 1750u, 1u, 0u, 74u, 0u, false, 1750u, 0u, false}},
    {241u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 3u, 3u, false, 1865u, 3u, false}},
    {1u, {true, false, 1865u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 4u, 4u, false, 1865u, 4u, false}},
    {1u, {true, false, 4086u, false}, {true, 4u}, {true, 4u},
     {0u, 2u, 0u, 1865u, 1865u, 1u, 1u, 5u, 4u, false, 1865u, 5u, false}},
    {2u, {true, false, 1866u, false}, {true, 4u}, {true, 4u},
     {2u, 2u, 2u, 1866u, 1866u, 1u, 1u, 7u, 4u, false, 1866u, 7u, false}},
    {1u, {false, false, 4084u, false}, {false, 4u}, {false, 4u},
     {3u, 2u, 3u, 4084u, 1866u, 1u, 0u, 0u, 4u, false, 1866u, 8u, false}},
    {240u, {false, false, 4084u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 4084u, 4084u, 1u, 0u, 240u, 0u, false, 4084u, 0u, false}},
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 4084u, 1u, 0u, 240u, 0u, false, 4084u, 0u, false}},
    {1u, {false, false, 0u, true}, {false, 0u}, {false, 0u},
     {0u, 2u, 0u, 1973u, 4084u, 1u, 0u, 240u, 1u, false, 1973u, 0u, false}},
    {1u, {true, false, 0u, true}, {false, 0u}, {false, 0u},
     {0u, 2u, 1u, 1973u, 4084u, 1u, 0u, 240u, 2u, false, 1973u, 0u, false}},
    {3u, {true, false, 1972u, false}, {false, 0u}, {false, 0u},
     {3u, 2u, 4u, 1972u, 1972u, 1u, 0u, 240u, 0u, false, 1972u, 0u, false}},
    {4u, {true, false, 1972u, false}, {true, 0u}, {true, 0u},
     {7u, 1u, 3u, 1972u, 1972u, 1u, 1u, 3u, 3u, false, 1972u, 3u, false}},
    {1u, {true, false, 1972u, false}, {true, 4u}, {true, 4u},
     {8u, 1u, 4u, 1972u, 1972u, 1u, 1u, 4u, 4u, false, 1972u, 4u, false}},
    {2u, {true, false, 1865u, false}, {true, 4u}, {true, 4u},
     {10u, 1u, 6u, 1865u, 1865u, 1u, 1u, 6u, 4u, false, 1865u, 0u, false}},
    {2u, {true, true, 1972u, false}, {true, 4u}, {true, 4u},
     {12u, 1u, 8u, 1972u, 1972u, 1u, 1u, 8u, 4u, false, 1972u, 0u, false}},
    {1u, {true, true, 4084u, false}, {true, 4u}, {true, 4u},
     {13u, 1u, 9u, 4084u, 1972u, 1u, 1u, 9u, 4u, false, 1972u, 0u, false}},
    {111u, {true, true, 1973u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 1u, 120u, 4u, false, 1973u, 0u, false}},
    {8u, {true, false, 4085u, true}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 4085u, 4085u, 1u, 1u, 128u, 0u, false, 4085u, 8u, false}},
    {2u, {true, false, 4084u, true}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 4084u, 4084u, 1u, 1u, 130u, 0u, false, 4085u, 10u, false}},
    {3u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 133u, 3u, false, 1865u, 1u, false}},
    {6103u, {true, false, 1865u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 240u, 4u, false, 1865u, 6104u, false}},
    {1u, {true, false, 1865u, false}, {false, 12u}, {false, 12u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 0u, 4u, false, 1865u, 6105u, true}},
    /* vector 9 */
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1973u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {6u, 1u, 2u, 1865u, 1973u, 1u, 0u, 6u, 0u, false, 1973u, 0u, false}},
    {1u, {true, false, 1865u, false}, {false, 0u}, {false, 0u},
     {7u, 1u, 3u, 1865u, 1865u, 1u, 0u, 7u, 0u, false, 1865u, 0u, false}},
    {5u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {12u, 1u, 8u, 1972u, 1972u, 1u, 0u, 12u, 0u, false, 1972u, 0u, false}},
    {227u, {true, false, 1972u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 1u, 0u, 239u, 0u, false, 1972u, 0u, false}},
    {4u, {true, false, 1972u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1972u, 1972u, 1u, 1u, 3u, 3u, false, 1972u, 3u, false}},
    {9u, {true, false, 1972u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1972u, 1972u, 1u, 1u, 12u, 4u, false, 1972u, 12u, false}},
    {115u, {true, false, 1974u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1974u, 1974u, 1u, 1u, 127u, 4u, false, 1974u, 127u, false}},
    {1u, {true, false, 1748u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1748u, 1974u, 1u, 1u, 128u, 4u, false, 1974u, 128u, false}},
    {1u, {true, false, 1748u, false}, {false, 4u}, {false, 4u},
     {40u, 1u, 12u, 1748u, 1748u, 0u, 0u, 0u, 4u, false, 1748u, 0u, false}},
    {241u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1973u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1865u, 1973u, 1u, 0u, 240u, 0u, false, 1973u, 0u, false}},
    {4u, {true, false, 1865u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 3u, 3u, false, 1865u, 3u, false}},
    {6101u, {true, false, 1865u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 1u, 240u, 4u, false, 1865u, 6104u, false}},
    {1u, {true, false, 1865u, false}, {false, 12u}, {false, 12u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 0u, 4u, false, 1865u, 6105u, true}},
    {1u, {true, false, 1865u, false}, {false, 8u}, {false, 8u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 1u, 0u, false, 1865u, 0u, true}},
    {241u, {false, false, 1865u, false}, {false, 8u}, {false, 8u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 240u, 0u, false, 1865u, 0u, true}},
    {1u, {true, false, 1865u, false}, {false, 8u}, {false, 8u},
     {40u, 1u, 12u, 1865u, 1865u, 1u, 0u, 240u, 0u, false, 1865u, 0u, true}},
    /* vector 10 */
    {1u, {false, false, 1973u, false}, {false, 0u}, {false, 0u},
     {1u, 0u, 1u, 1973u, 0u, 0u, 0u, 1u, 0u, false, 0u, 0u, false}},
    {4u, {false, true, 1973u, false}, {false, 0u}, {false, 0u},
     {5u, 1u, 1u, 1973u, 1973u, 1u, 0u, 5u, 0u, false, 1973u, 0u, false}},
    {1u, {false, false, 1865u, false}, {false, 0u}, {false, 0u},
     {6u, 1u, 2u, 1865u, 1973u, 1u, 0u, 6u, 0u, false, 1973u, 0u, false}},
    {1u, {true, false, 1865u, false}, {false, 0u}, {false, 0u},
     {7u, 1u, 3u, 1865u, 1865u, 1u, 0u, 7u, 0u, false, 1865u, 0u, false}},
    {5u, {false, false, 1972u, false}, {false, 0u}, {false, 0u},
     {12u, 1u, 8u, 1972u, 1972u, 1u, 0u, 12u, 0u, false, 1972u, 0u, false}},
    {1u, {true, false, 1972u, false}, {false, 0u}, {false, 0u},
     {13u, 1u, 9u, 1972u, 1972u, 1u, 0u, 13u, 0u, false, 1972u, 0u, false}},
    {115u, {true, false, 1974u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1974u, 1974u, 1u, 0u, 128u, 0u, false, 1974u, 0u, false}},
    {3u, {true, false, 1866u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1866u, 1866u, 1u, 0u, 131u, 0u, false, 1866u, 0u, false}},
    {108u, {true, true, 1866u, false}, {false, 0u}, {false, 0u},
     {40u, 1u, 12u, 1866u, 1866u, 1u, 0u, 239u, 0u, false, 1866u, 0u, false}},
    {4u, {true, true, 1866u, false}, {true, 0u}, {true, 0u},
     {40u, 1u, 12u, 1866u, 1866u, 1u, 1u, 3u, 3u, false, 1866u, 0u, false}},
    {7u, {true, true, 1866u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1866u, 1866u, 1u, 1u, 10u, 4u, false, 1866u, 0u, false}},
    {1u, {true, true, 1758u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1758u, 1866u, 1u, 1u, 11u, 4u, false, 1866u, 0u, false}},
    {1u, {true, true, 1760u, false}, {true, 4u}, {true, 4u},
     {40u, 1u, 12u, 1760u, 1758u, 1u, 1u, 12u, 4u, false, 1866u, 0u, false}},
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
    {27u, 32u, false, {0u}},
    {32u, 56u, false, {0u}},
    {56u, 80u, false, {0u}},
    {80u, 121u, false, {0u}},
    {121u, 141u, false, {0u}},
    {141u, 154u, false, {0u}},
};

static bool same_out(const struct cal2_out *a, const struct cal2_out *b)
{
    return (a->heater == b->heater) &&
           (a->fault == b->fault);
}

static bool same_state(const struct cal2 *a, const struct cal2 *b)
{
    return (a->tank_probe_good_for == b->tank_probe_good_for) &&
           (a->tank_probe_state == b->tank_probe_state) &&
           (a->tank_probe_state_for == b->tank_probe_state_for) &&
           (a->tank_probe_last == b->tank_probe_last) &&
           (a->tank_probe_before == b->tank_probe_before) &&
           (a->tank_stat == b->tank_stat) &&
           (a->heater == b->heater) &&
           (a->heater_for == b->heater_for) &&
           (a->heater_apart_for == b->heater_apart_for) &&
           (a->heater_welded == b->heater_welded) &&
           (a->heater_effect_from == b->heater_effect_from) &&
           (a->heater_effect_for == b->heater_effect_for) &&
           (a->heater_no_effect == b->heater_no_effect);
}

static void run(const struct vector *v, unsigned long number)
{
    struct cal2 m;
    struct cal2_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    cal2_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        for (n = 0u; n < rows[i].steps; n++) {
            cal2_step(&m, &rows[i].in, &out);
            verdict(same_out(&out, ((n & 1u) == 0u) ? &rows[i].odd : &rows[i].even), "output", number, (unsigned long)(i - v->first), (unsigned long)n);
        }
        verdict(same_state(&m, &rows[i].after), "state", number, (unsigned long)(i - v->first), (unsigned long)n);
    }
}

static const struct cal2 first = {0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, 0u, false, 0u, 0u, false};

static void records(void)
{
    struct cal2 fresh;
    struct cal2 m;
    struct cal2_remembered r;

    (void)memset(&m, 0x5A, sizeof m);
    (void)memset(&fresh, 0xA5, sizeof fresh);
    cal2_start(&fresh, NULL);
    verdict(same_state(&fresh, &first), "start without a record", 0ul, 0ul, 0ul);

    (void)memset(&r, 0x00, sizeof r);
    cal2_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with a blank record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0xFF, sizeof r);
    cal2_start(&m, &r);
    verdict(same_state(&m, &fresh), "start with an erased record", 0ul, 0ul, 0ul);
    (void)memset(&r, 0, sizeof r);
    verdict(cal2_remember(&fresh, &r), "a new record to write", 0ul, 0ul, 0ul);
    verdict(!cal2_remember(&fresh, &r), "no record to write", 0ul, 0ul, 0ul);
}

static void upset(void)
{
    struct cal2 m;
    struct cal2_in in;
    struct cal2_out out;

    (void)memset(&in, 0, sizeof in);
    cal2_start(&m, NULL);
    m.tank_probe_state = 255u;
    cal2_step(&m, &in, &out);
    verdict(m.tank_probe_state == (uint8_t)CAL2_TANK_PROBE_STATE_FAULTY, "tank_probe_state after an upset", 0ul, 0ul, 0ul);
    cal2_start(&m, NULL);
    m.tank_stat = 255u;
    cal2_step(&m, &in, &out);
    verdict(m.tank_stat == (uint8_t)CAL2_TANK_STAT_OPEN, "tank_stat after an upset", 0ul, 0ul, 0ul);
    cal2_start(&m, NULL);
    m.heater = 255u;
    cal2_step(&m, &in, &out);
    verdict(m.heater == (uint8_t)CAL2_HEATER_OFF, "heater after an upset", 0ul, 0ul, 0ul);
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
