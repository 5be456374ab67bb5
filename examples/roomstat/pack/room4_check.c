/* room4_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Room control, caretaker's flat
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: d3cb2df54b043c85a55b36ae17d55a520d1b44a8f6e6363d94d5ab1013700b13
 *
 * Replaces:
 * - room_stat: room control with a mercury bottle, in the hall
 *
 * Stays hard-wired, and must:
 * - boiler_limit: limit of the boiler, part of its burner control
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
 * Open findings: 1 earth_fault_bypasses_limit (act, room4); 2 contact_life (act, boiler); 3
 * mercury_asbestos_refrigerant (act, room_stat); 4 approval_lapses (act, room4); 5
 * probe_sees_the_room (act, room_stat); 6 danger_not_judged (act, cold_flat). Not judged, for want
 * of a figure: 1; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "room4.h"

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

static void compare_out(const struct room4_out *got, const struct room4_out *wanted)
{
    compare("boiler", (long)got->boiler, (long)wanted->boiler);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct room4 *got, const struct room4 *wanted)
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
    compare("room_stat", (long)got->room_stat, (long)wanted->room_stat);
    compare("room_stat_dial_lost_for",
            (long)got->room_stat_dial_lost_for,
            (long)wanted->room_stat_dial_lost_for);
    compare("room_stat_set_point",
            (long)got->room_stat_set_point,
            (long)wanted->room_stat_set_point);
    compare("room_stat_warmth", (long)got->room_stat_warmth, (long)wanted->room_stat_warmth);
    compare("boiler", (long)got->boiler, (long)wanted->boiler);
    compare("boiler_effect_from", (long)got->boiler_effect_from, (long)wanted->boiler_effect_from);
    compare("boiler_effect_for", (long)got->boiler_effect_for, (long)wanted->boiler_effect_for);
    compare("boiler_no_effect", (long)got->boiler_no_effect, (long)wanted->boiler_no_effect);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct room4_in in;
    struct room4_out out;
    struct room4 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u, 2047u}, {false, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {13u, {0u, 2047u}, {false, 0u}, {0u, 0u, 14u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u, 2047u}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u, 2047u}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {14u, {0u, 2047u}, {false, 1u}, {0u, 3u, 15u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u, 2047u}, {false, 1u}, {0u, 3u, 15u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {939u, 2047u}, {false, 1u}, {0u, 3u, 15u, 0u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {940u, 2047u}, {false, 1u}, {1u, 3u, 15u, 940u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    /* vector 2 */
    {1u, {940u, 2047u}, {false, 0u}, {1u, 0u, 1u, 940u, 0u, 0u, 0u, 1799u, 0u, 0u, 0u, 0u, false}},
    {1u, {940u, 2047u}, {false, 0u}, {2u, 0u, 2u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {2u, {940u, 2047u}, {false, 0u}, {4u, 0u, 4u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {1u, {940u, 2047u}, {false, 0u}, {5u, 1u, 0u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {1u, {940u, 2047u}, {false, 0u}, {6u, 1u, 1u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {24u, {940u, 2047u}, {false, 0u}, {30u, 1u, 15u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {1u, {940u, 2047u}, {false, 0u}, {30u, 1u, 15u, 940u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {1u, {941u, 2047u}, {false, 0u}, {30u, 1u, 15u, 941u, 940u, 0u, 0u, 1799u, 0u, 0u, 940u, 0u,
     false}},
    {1u, {2620u, 2047u}, {false, 0u}, {30u, 1u, 15u, 2620u, 941u, 0u, 0u, 1799u, 0u, 0u, 941u, 0u,
     false}},
    {1u, {2620u, 2047u}, {true, 0u}, {30u, 1u, 15u, 2620u, 2620u, 1u, 0u, 1799u, 0u, 1u, 2620u, 0u,
     false}},
    /* vector 3 */
    {2u, {2620u, 2047u}, {false, 0u}, {2u, 0u, 2u, 2620u, 2620u, 0u, 0u, 1799u, 0u, 0u, 2620u, 0u,
     false}},
    {2u, {2620u, 2047u}, {false, 0u}, {4u, 0u, 4u, 2620u, 2620u, 0u, 0u, 1799u, 0u, 0u, 2620u, 0u,
     false}},
    {2u, {2620u, 2047u}, {true, 0u}, {6u, 1u, 1u, 2620u, 2620u, 1u, 0u, 1799u, 340u, 1u, 2620u, 1u,
     false}},
    {275u, {2620u, 2047u}, {true, 0u}, {30u, 1u, 15u, 2620u, 2620u, 1u, 0u, 1799u, UINT32_C(65640),
     1u, 2620u, 276u, false}},
    {1u, {3628u, 2047u}, {true, 0u}, {30u, 1u, 15u, 3628u, 2620u, 1u, 0u, 1799u, UINT32_C(65798),
     1u, 2620u, 277u, false}},
    {1u, {3629u, 2047u}, {true, 0u}, {0u, 2u, 0u, 3628u, 2620u, 1u, 0u, 1799u, UINT32_C(65956), 1u,
     3628u, 278u, false}},
    {1u, {2284u, 0u}, {true, 0u}, {1u, 2u, 1u, 2284u, 3628u, 1u, 1u, 1799u, UINT32_C(66113), 1u,
     2620u, 0u, false}},
    {1u, {2284u, 0u}, {true, 2u}, {2u, 2u, 2u, 2284u, 2284u, 1u, 2u, 1799u, UINT32_C(66270), 1u,
     2284u, 0u, false}},
    {1u, {2284u, 0u}, {true, 2u}, {3u, 2u, 3u, 2284u, 2284u, 1u, 2u, 1799u, UINT32_C(66426), 1u,
     2284u, 1u, false}},
    /* vector 4 */
    {1u, {2284u, 0u}, {false, 2u}, {1u, 0u, 1u, 2284u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false}},
    {4u, {2284u, 0u}, {false, 2u}, {5u, 1u, 0u, 2284u, 2284u, 0u, 2u, 2000u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2284u, 114u}, {false, 2u}, {6u, 1u, 1u, 2284u, 2284u, 0u, 2u, 2000u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2284u, 115u}, {false, 0u}, {7u, 1u, 2u, 2284u, 2284u, 0u, 0u, 800u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2284u, 3014u}, {true, 0u}, {8u, 1u, 3u, 2284u, 2284u, 1u, 0u, 2324u, 0u, 1u, 2284u, 0u,
     false}},
    {1u, {2284u, 3889u}, {true, 0u}, {9u, 1u, 4u, 2284u, 2284u, 1u, 0u, 2799u, 340u, 1u, 2284u, 1u,
     false}},
    {1u, {2284u, 3980u}, {true, 0u}, {10u, 1u, 5u, 2284u, 2284u, 1u, 0u, 2800u, 679u, 1u, 2284u, 2u,
     false}},
    {1u, {2284u, 3981u}, {true, 0u}, {11u, 1u, 6u, 2284u, 2284u, 1u, 1u, 2800u, 1017u, 1u, 2284u,
     3u, false}},
    /* vector 5 */
    {31u, {2284u, 0u}, {false, 2u}, {30u, 1u, 15u, 2284u, 2284u, 0u, 2u, 2000u, 0u, 0u, 2284u, 0u,
     false}},
    {2u, {2283u, 0u}, {false, 2u}, {30u, 1u, 15u, 2283u, 2283u, 0u, 2u, 2000u, 0u, 0u, 2283u, 0u,
     false}},
    {10u, {0u, 2047u}, {false, 0u}, {0u, 2u, 9u, 2283u, 2283u, 0u, 0u, 1799u, 0u, 0u, 2283u, 0u,
     false}},
    {1u, {0u, 2047u}, {false, 1u}, {0u, 3u, 0u, 2283u, 2283u, 0u, 0u, 1799u, 0u, 0u, 2283u, 0u,
     false}},
    {5u, {0u, 2047u}, {false, 1u}, {0u, 3u, 5u, 2283u, 2283u, 0u, 0u, 1799u, 0u, 0u, 2283u, 0u,
     false}},
    {29u, {2059u, 2047u}, {false, 1u}, {29u, 3u, 15u, 2059u, 2059u, 0u, 0u, 1799u, 0u, 0u, 2059u,
     0u, false}},
    {1u, {2059u, 2047u}, {false, 0u}, {30u, 1u, 0u, 2059u, 2059u, 0u, 0u, 1799u, 0u, 0u, 2059u, 0u,
     false}},
    {6u, {2284u, 205u}, {false, 0u}, {30u, 1u, 6u, 2284u, 2284u, 0u, 0u, 800u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2059u, 205u}, {false, 0u}, {30u, 1u, 7u, 2059u, 2284u, 0u, 0u, 800u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2309u, 205u}, {false, 0u}, {30u, 1u, 8u, 2309u, 2059u, 0u, 0u, 800u, 0u, 0u, 2284u, 0u,
     false}},
    {1u, {2688u, 0u}, {false, 0u}, {30u, 1u, 9u, 2688u, 2309u, 0u, 1u, 800u, 0u, 0u, 2309u, 0u,
     false}},
    {3u, {2688u, 0u}, {true, 2u}, {30u, 1u, 12u, 2688u, 2688u, 1u, 2u, 800u, 679u, 1u, 2688u, 2u,
     false}},
    {2u, {2687u, 0u}, {true, 2u}, {30u, 1u, 14u, 2687u, 2687u, 1u, 2u, 800u, 1354u, 1u, 2688u, 4u,
     false}},
    {1u, {3628u, 205u}, {false, 0u}, {30u, 1u, 15u, 3628u, 2687u, 0u, 0u, 800u, 1690u, 0u, 2688u,
     5u, false}},
    {1u, {65535u, 205u}, {false, 0u}, {0u, 2u, 0u, 3628u, 2687u, 0u, 0u, 800u, 1686u, 0u, 3628u, 0u,
     false}},
    {4u, {1611u, 3980u}, {false, 0u}, {4u, 2u, 4u, 1611u, 1611u, 0u, 0u, 2800u, 1670u, 0u, 1611u,
     0u, false}},
    {1u, {1275u, 0u}, {false, 0u}, {5u, 1u, 0u, 1275u, 1611u, 0u, 1u, 2800u, 1666u, 0u, 1611u, 0u,
     false}},
    {1u, {2284u, 3979u}, {false, 0u}, {6u, 1u, 1u, 2284u, 1275u, 0u, 0u, 2800u, 1662u, 0u, 1611u,
     0u, false}},
    {4u, {2284u, 3979u}, {true, 0u}, {10u, 1u, 5u, 2284u, 2284u, 1u, 0u, 2800u, 2660u, 1u, 2284u,
     3u, false}},
    {1u, {2260u, 3981u}, {true, 0u}, {11u, 1u, 6u, 2260u, 2284u, 1u, 1u, 2800u, 2993u, 1u, 2284u,
     4u, false}},
    {1u, {2260u, 3981u}, {true, 2u}, {12u, 1u, 7u, 2260u, 2260u, 1u, 2u, 2800u, 3325u, 1u, 2260u,
     0u, false}},
    {39u, {2260u, 3981u}, {true, 2u}, {30u, 1u, 15u, 2260u, 2260u, 1u, 2u, 2800u, 15566u, 1u, 2260u,
     39u, false}},
    {98u, {2260u, 3981u}, {true, 2u}, {30u, 1u, 15u, 2260u, 2260u, 1u, 2u, 2800u, 41064u, 1u, 2260u,
     137u, false}},
    {1u, {2309u, 65535u}, {true, 2u}, {30u, 1u, 15u, 2309u, 2260u, 1u, 2u, 2800u, 41290u, 1u, 2260u,
     138u, false}},
    {10u, {65535u, 65535u}, {true, 2u}, {0u, 2u, 9u, 2309u, 2260u, 1u, 2u, 2800u, 43518u, 1u, 2309u,
     148u, false}},
    {1u, {2902u, 3014u}, {false, 1u}, {1u, 3u, 0u, 2902u, 2309u, 0u, 0u, 2324u, 43737u, 0u, 2309u,
     149u, false}},
    {28u, {2284u, 2530u}, {false, 1u}, {29u, 3u, 15u, 2284u, 2284u, 0u, 0u, 2061u, 40482u, 0u,
     2284u, 0u, false}},
    {18u, {2284u, 2530u}, {false, 0u}, {30u, 1u, 15u, 2284u, 2284u, 0u, 0u, 2061u, 38520u, 0u,
     2284u, 0u, false}},
    {15u, {2284u, 2530u}, {false, 0u}, {30u, 1u, 15u, 2284u, 2284u, 0u, 0u, 2061u, 36958u, 0u,
     2284u, 0u, false}},
    {3u, {2284u, 2530u}, {true, 0u}, {30u, 1u, 15u, 2284u, 2284u, 1u, 0u, 2061u, 37331u, 1u, 2284u,
     2u, false}},
    {1u, {2261u, 2530u}, {true, 0u}, {30u, 1u, 15u, 2261u, 2284u, 1u, 0u, 2061u, 37567u, 1u, 2284u,
     3u, false}},
    {1u, {65535u, 2530u}, {true, 0u}, {0u, 2u, 0u, 2261u, 2284u, 1u, 0u, 2061u, 37803u, 1u, 2284u,
     4u, false}},
    {1u, {941u, 3979u}, {true, 0u}, {1u, 2u, 1u, 941u, 2261u, 1u, 0u, 2800u, 38038u, 1u, 2284u, 5u,
     false}},
    {16u, {941u, 597u}, {false, 0u}, {17u, 1u, 12u, 941u, 941u, 0u, 0u, 1012u, 36720u, 0u, 941u, 0u,
     false}},
    {1u, {2688u, 0u}, {false, 0u}, {18u, 1u, 13u, 2688u, 941u, 0u, 1u, 1012u, 36619u, 0u, 941u, 0u,
     false}},
    {3u, {2688u, 0u}, {true, 2u}, {21u, 1u, 15u, 2688u, 2688u, 1u, 2u, 1012u, 36995u, 1u, 2688u, 2u,
     false}},
    {3u, {2687u, 0u}, {true, 2u}, {24u, 1u, 15u, 2687u, 2687u, 1u, 2u, 1012u, 37705u, 1u, 2688u, 5u,
     false}},
    {1u, {2712u, 0u}, {true, 2u}, {25u, 1u, 15u, 2712u, 2687u, 1u, 2u, 1012u, 37940u, 1u, 2688u, 6u,
     false}},
    {1u, {2689u, 0u}, {true, 2u}, {26u, 1u, 15u, 2689u, 2712u, 1u, 2u, 1012u, 38175u, 1u, 2689u, 7u,
     false}},
    {107u, {2620u, 65535u}, {true, 2u}, {30u, 1u, 15u, 2620u, 2620u, 1u, 2u, 1012u, 59880u, 1u,
     2620u, 105u, false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct room4_remembered record;
};

static const struct vector vectors[] = {
    {0u, 8u, false, {0u}},
    {8u, 18u, false, {0u}},
    {18u, 27u, false, {0u}},
    {27u, 35u, false, {0u}},
    {35u, 75u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct room4 m;
    struct room4_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    room4_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            room4_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct room4 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};

static void start_and_compare(const char *what, const struct room4_remembered *r,
                              const struct room4 *wanted)
{
    struct room4 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    room4_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct room4 m;
    struct room4_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", room4_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", room4_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct room4 m;
    struct room4_in in;
    struct room4_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct room4 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 3u};

        doing = "room_probe_state upset";
        room4_start(&m, NULL);
        m.room_probe_state = 4u;
        room4_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct room4 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 3u};

        doing = "room_probe_state upset";
        room4_start(&m, NULL);
        m.room_probe_state = 255u;
        room4_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct room4 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 2u};

        doing = "room_stat upset";
        room4_start(&m, NULL);
        m.room_stat = 2u;
        room4_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct room4 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 2u};

        doing = "room_stat upset";
        room4_start(&m, NULL);
        m.room_stat = 255u;
        room4_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct room4 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 2u};

        doing = "boiler upset";
        room4_start(&m, NULL);
        m.boiler = 2u;
        room4_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct room4 after =
           {0u, 0u, 1u, 0u, 0u, 0u, 2u, 2000u, 0u, 0u, 0u, 0u, false};
        static const struct room4_out wanted =
           {false, 2u};

        doing = "boiler upset";
        room4_start(&m, NULL);
        m.boiler = 255u;
        room4_step(&m, &in, &out);
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
