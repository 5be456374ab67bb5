/* genset1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Standby engine 1, coolant circuit
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: bcf8b9ec5ac6bc7c71efdeb2099586f05b6a7d4fa187b281a257f1b0da95d2f1
 *
 * Replaces:
 * - wax_valve: wax element in the coolant outlet
 *
 * Stays hard-wired, and must:
 * - overheat_switch: snap disc in the cylinder head, stops the engine
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
 * Open findings: 1 danger_without_barrier (act, overheat/radiator_valve); 2 trips_dead_no_more
 * (act, wax_valve); 3 earth_fault_bypasses_limit (act, genset1); 4 moisture_direction (act,
 * outlet_probe); 5 damp_dust_washdown (act, genset1); 6 self_powered_lost (act, wax_valve); 7
 * mercury_asbestos_refrigerant (act, wax_valve); 8 approval_lapses (act, genset1). Not judged, for
 * want of a figure: 3; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "genset1.h"

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

static void compare_out(const struct genset1_out *got, const struct genset1_out *wanted)
{
    compare("radiator_valve", (long)got->radiator_valve, (long)wanted->radiator_valve);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct genset1 *got, const struct genset1 *wanted)
{
    compare("outlet_probe_good_for",
            (long)got->outlet_probe_good_for,
            (long)wanted->outlet_probe_good_for);
    compare("outlet_probe_state", (long)got->outlet_probe_state, (long)wanted->outlet_probe_state);
    compare("outlet_probe_state_for",
            (long)got->outlet_probe_state_for,
            (long)wanted->outlet_probe_state_for);
    compare("outlet_probe_last", (long)got->outlet_probe_last, (long)wanted->outlet_probe_last);
    compare("outlet_probe_before",
            (long)got->outlet_probe_before,
            (long)wanted->outlet_probe_before);
    compare("wax_valve_permille", (long)got->wax_valve_permille, (long)wanted->wax_valve_permille);
    compare("radiator_valve_position",
            (long)got->radiator_valve_position,
            (long)wanted->radiator_valve_position);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct genset1_in in;
    struct genset1_out out;
    struct genset1 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, 2032u}, {1000u, 0u}, {1u, 0u, 1u, 2032u, 0u, 0u, 1000u}},
    {1u, {false, 2032u}, {1000u, 0u}, {2u, 0u, 2u, 2032u, 2032u, 0u, 1000u}},
    {7u, {false, 2032u}, {1000u, 0u}, {9u, 0u, 9u, 2032u, 2032u, 0u, 1000u}},
    {1u, {false, 2032u}, {998u, 0u}, {10u, 1u, 0u, 2032u, 2032u, 310u, 998u}},
    {1u, {false, 2032u}, {996u, 0u}, {11u, 1u, 1u, 2032u, 2032u, 310u, 996u}},
    {1u, {false, 2032u}, {994u, 0u}, {12u, 1u, 2u, 2032u, 2032u, 310u, 994u}},
    {1u, {false, 2032u}, {992u, 0u}, {13u, 1u, 3u, 2032u, 2032u, 310u, 992u}},
    {1u, {false, 2032u}, {990u, 0u}, {14u, 1u, 4u, 2032u, 2032u, 310u, 990u}},
    {1u, {false, 2032u}, {988u, 0u}, {15u, 1u, 5u, 2032u, 2032u, 310u, 988u}},
    {1u, {false, 2032u}, {986u, 0u}, {16u, 1u, 6u, 2032u, 2032u, 310u, 986u}},
    {1u, {false, 2032u}, {984u, 0u}, {17u, 1u, 7u, 2032u, 2032u, 310u, 984u}},
    {1u, {false, 2032u}, {982u, 0u}, {18u, 1u, 8u, 2032u, 2032u, 310u, 982u}},
    {1u, {false, 2032u}, {980u, 0u}, {19u, 1u, 9u, 2032u, 2032u, 310u, 980u}},
    {1u, {false, 2032u}, {978u, 0u}, {20u, 1u, 10u, 2032u, 2032u, 310u, 978u}},
    {1u, {false, 2032u}, {976u, 0u}, {21u, 1u, 11u, 2032u, 2032u, 310u, 976u}},
    {1u, {false, 2032u}, {974u, 0u}, {22u, 1u, 12u, 2032u, 2032u, 310u, 974u}},
    {1u, {false, 2032u}, {972u, 0u}, {23u, 1u, 13u, 2032u, 2032u, 310u, 972u}},
    {1u, {false, 2032u}, {970u, 0u}, {24u, 1u, 14u, 2032u, 2032u, 310u, 970u}},
    {1u, {false, 2032u}, {968u, 0u}, {25u, 1u, 15u, 2032u, 2032u, 310u, 968u}},
    {1u, {false, 2032u}, {966u, 0u}, {26u, 1u, 16u, 2032u, 2032u, 310u, 966u}},
    {1u, {false, 2032u}, {964u, 0u}, {27u, 1u, 17u, 2032u, 2032u, 310u, 964u}},
    {1u, {false, 2032u}, {962u, 0u}, {28u, 1u, 18u, 2032u, 2032u, 310u, 962u}},
    {1u, {false, 2032u}, {960u, 0u}, {29u, 1u, 19u, 2032u, 2032u, 310u, 960u}},
    {1u, {false, 2032u}, {958u, 0u}, {30u, 1u, 20u, 2032u, 2032u, 310u, 958u}},
    {1u, {false, 2032u}, {956u, 0u}, {31u, 1u, 21u, 2032u, 2032u, 310u, 956u}},
    {1u, {false, 2032u}, {954u, 0u}, {32u, 1u, 22u, 2032u, 2032u, 310u, 954u}},
    {1u, {false, 2032u}, {952u, 0u}, {33u, 1u, 23u, 2032u, 2032u, 310u, 952u}},
    {1u, {false, 2032u}, {950u, 0u}, {34u, 1u, 24u, 2032u, 2032u, 310u, 950u}},
    {1u, {false, 2032u}, {948u, 0u}, {35u, 1u, 25u, 2032u, 2032u, 310u, 948u}},
    {1u, {false, 2032u}, {946u, 0u}, {36u, 1u, 26u, 2032u, 2032u, 310u, 946u}},
    {1u, {false, 2032u}, {944u, 0u}, {37u, 1u, 27u, 2032u, 2032u, 310u, 944u}},
    {1u, {false, 2032u}, {942u, 0u}, {38u, 1u, 28u, 2032u, 2032u, 310u, 942u}},
    {1u, {false, 2032u}, {940u, 0u}, {39u, 1u, 29u, 2032u, 2032u, 310u, 940u}},
    {1u, {false, 2032u}, {938u, 0u}, {40u, 1u, 30u, 2032u, 2032u, 310u, 938u}},
    {1u, {false, 2032u}, {936u, 0u}, {41u, 1u, 30u, 2032u, 2032u, 310u, 936u}},
    {1u, {false, 2032u}, {934u, 0u}, {42u, 1u, 30u, 2032u, 2032u, 310u, 934u}},
    {1u, {false, 2032u}, {932u, 0u}, {43u, 1u, 30u, 2032u, 2032u, 310u, 932u}},
    {1u, {false, 2032u}, {930u, 0u}, {44u, 1u, 30u, 2032u, 2032u, 310u, 930u}},
    {1u, {false, 2032u}, {928u, 0u}, {45u, 1u, 30u, 2032u, 2032u, 310u, 928u}},
    {1u, {false, 2032u}, {926u, 0u}, {46u, 1u, 30u, 2032u, 2032u, 310u, 926u}},
    {1u, {false, 2032u}, {924u, 0u}, {47u, 1u, 30u, 2032u, 2032u, 310u, 924u}},
    {1u, {false, 2032u}, {922u, 0u}, {48u, 1u, 30u, 2032u, 2032u, 310u, 922u}},
    {1u, {false, 2032u}, {920u, 0u}, {49u, 1u, 30u, 2032u, 2032u, 310u, 920u}},
    {1u, {false, 2032u}, {918u, 0u}, {50u, 1u, 30u, 2032u, 2032u, 310u, 918u}},
    {1u, {false, 2032u}, {916u, 0u}, {51u, 1u, 30u, 2032u, 2032u, 310u, 916u}},
    {1u, {false, 2032u}, {914u, 0u}, {52u, 1u, 30u, 2032u, 2032u, 310u, 914u}},
    {1u, {false, 2032u}, {912u, 0u}, {53u, 1u, 30u, 2032u, 2032u, 310u, 912u}},
    {1u, {false, 2032u}, {910u, 0u}, {54u, 1u, 30u, 2032u, 2032u, 310u, 910u}},
    {1u, {false, 2032u}, {908u, 0u}, {55u, 1u, 30u, 2032u, 2032u, 310u, 908u}},
    {1u, {false, 2032u}, {906u, 0u}, {56u, 1u, 30u, 2032u, 2032u, 310u, 906u}},
    {1u, {false, 2032u}, {904u, 0u}, {57u, 1u, 30u, 2032u, 2032u, 310u, 904u}},
    {1u, {false, 2032u}, {902u, 0u}, {58u, 1u, 30u, 2032u, 2032u, 310u, 902u}},
    {1u, {false, 2032u}, {900u, 0u}, {59u, 1u, 30u, 2032u, 2032u, 310u, 900u}},
    {1u, {false, 2032u}, {898u, 0u}, {60u, 1u, 30u, 2032u, 2032u, 310u, 898u}},
    {1u, {false, 2032u}, {896u, 0u}, {61u, 1u, 30u, 2032u, 2032u, 310u, 896u}},
    {1u, {false, 2032u}, {894u, 0u}, {62u, 1u, 30u, 2032u, 2032u, 310u, 894u}},
    {1u, {false, 2032u}, {892u, 0u}, {63u, 1u, 30u, 2032u, 2032u, 310u, 892u}},
    {1u, {false, 2032u}, {890u, 0u}, {64u, 1u, 30u, 2032u, 2032u, 310u, 890u}},
    {1u, {false, 2032u}, {888u, 0u}, {65u, 1u, 30u, 2032u, 2032u, 310u, 888u}},
    {1u, {false, 2032u}, {886u, 0u}, {66u, 1u, 30u, 2032u, 2032u, 310u, 886u}},
    {1u, {false, 2032u}, {884u, 0u}, {67u, 1u, 30u, 2032u, 2032u, 310u, 884u}},
    {1u, {false, 2032u}, {882u, 0u}, {68u, 1u, 30u, 2032u, 2032u, 310u, 882u}},
    {1u, {false, 2032u}, {880u, 0u}, {69u, 1u, 30u, 2032u, 2032u, 310u, 880u}},
    {1u, {false, 2032u}, {878u, 0u}, {70u, 1u, 30u, 2032u, 2032u, 310u, 878u}},
    {1u, {false, 2032u}, {876u, 0u}, {71u, 1u, 30u, 2032u, 2032u, 310u, 876u}},
    {1u, {false, 2032u}, {874u, 0u}, {72u, 1u, 30u, 2032u, 2032u, 310u, 874u}},
    {1u, {false, 2032u}, {872u, 0u}, {73u, 1u, 30u, 2032u, 2032u, 310u, 872u}},
    {1u, {false, 2032u}, {870u, 0u}, {74u, 1u, 30u, 2032u, 2032u, 310u, 870u}},
    {1u, {false, 2032u}, {868u, 0u}, {75u, 1u, 30u, 2032u, 2032u, 310u, 868u}},
    {1u, {false, 2032u}, {866u, 0u}, {76u, 1u, 30u, 2032u, 2032u, 310u, 866u}},
    {1u, {false, 2032u}, {864u, 0u}, {77u, 1u, 30u, 2032u, 2032u, 310u, 864u}},
    {1u, {false, 2032u}, {862u, 0u}, {78u, 1u, 30u, 2032u, 2032u, 310u, 862u}},
    {1u, {false, 2032u}, {860u, 0u}, {79u, 1u, 30u, 2032u, 2032u, 310u, 860u}},
    {1u, {false, 2032u}, {858u, 0u}, {80u, 1u, 30u, 2032u, 2032u, 310u, 858u}},
    {1u, {false, 2032u}, {856u, 0u}, {81u, 1u, 30u, 2032u, 2032u, 310u, 856u}},
    {1u, {false, 2032u}, {854u, 0u}, {82u, 1u, 30u, 2032u, 2032u, 310u, 854u}},
    {1u, {false, 2032u}, {852u, 0u}, {83u, 1u, 30u, 2032u, 2032u, 310u, 852u}},
    {1u, {false, 2032u}, {850u, 0u}, {84u, 1u, 30u, 2032u, 2032u, 310u, 850u}},
    {1u, {false, 2032u}, {848u, 0u}, {85u, 1u, 30u, 2032u, 2032u, 310u, 848u}},
    {1u, {false, 2032u}, {846u, 0u}, {86u, 1u, 30u, 2032u, 2032u, 310u, 846u}},
    {1u, {false, 2032u}, {844u, 0u}, {87u, 1u, 30u, 2032u, 2032u, 310u, 844u}},
    {1u, {false, 2032u}, {842u, 0u}, {88u, 1u, 30u, 2032u, 2032u, 310u, 842u}},
    {1u, {false, 2032u}, {840u, 0u}, {89u, 1u, 30u, 2032u, 2032u, 310u, 840u}},
    {1u, {false, 2032u}, {838u, 0u}, {90u, 1u, 30u, 2032u, 2032u, 310u, 838u}},
    {1u, {false, 2032u}, {836u, 0u}, {91u, 1u, 30u, 2032u, 2032u, 310u, 836u}},
    {1u, {false, 2032u}, {834u, 0u}, {92u, 1u, 30u, 2032u, 2032u, 310u, 834u}},
    {1u, {false, 2032u}, {832u, 0u}, {93u, 1u, 30u, 2032u, 2032u, 310u, 832u}},
    {1u, {false, 2032u}, {830u, 0u}, {94u, 1u, 30u, 2032u, 2032u, 310u, 830u}},
    {1u, {false, 2032u}, {828u, 0u}, {95u, 1u, 30u, 2032u, 2032u, 310u, 828u}},
    {1u, {false, 2032u}, {826u, 0u}, {96u, 1u, 30u, 2032u, 2032u, 310u, 826u}},
    {1u, {false, 2032u}, {824u, 0u}, {97u, 1u, 30u, 2032u, 2032u, 310u, 824u}},
    {1u, {false, 2032u}, {822u, 0u}, {98u, 1u, 30u, 2032u, 2032u, 310u, 822u}},
    {1u, {false, 2032u}, {820u, 0u}, {99u, 1u, 30u, 2032u, 2032u, 310u, 820u}},
    {1u, {false, 2032u}, {818u, 0u}, {100u, 1u, 30u, 2032u, 2032u, 310u, 818u}},
    {1u, {false, 2032u}, {816u, 0u}, {100u, 1u, 30u, 2032u, 2032u, 310u, 816u}},
    {1u, {false, 0u}, {814u, 0u}, {0u, 2u, 0u, 2032u, 2032u, 310u, 814u}},
    /* vector 2 */
    {1u, {false, 0u}, {1000u, 0u}, {0u, 0u, 1u, 0u, 0u, 0u, 1000u}},
    {28u, {false, 0u}, {1000u, 0u}, {0u, 0u, 29u, 0u, 0u, 0u, 1000u}},
    {1u, {false, 0u}, {1000u, 1u}, {0u, 3u, 0u, 0u, 0u, 0u, 1000u}},
    {1u, {false, 0u}, {1000u, 1u}, {0u, 3u, 1u, 0u, 0u, 0u, 1000u}},
    {1u, {false, 802u}, {1000u, 1u}, {0u, 3u, 2u, 0u, 0u, 0u, 1000u}},
    {1u, {false, 803u}, {1000u, 1u}, {1u, 3u, 3u, 803u, 0u, 0u, 1000u}},
    /* vector 3 */
    {10u, {false, 803u}, {1000u, 0u}, {10u, 1u, 0u, 803u, 803u, 1000u, 1000u}},
    /* vector 4 */
    {9u, {false, 1811u}, {1000u, 0u}, {9u, 0u, 9u, 1811u, 1811u, 0u, 1000u}},
    {1u, {false, 1811u}, {998u, 0u}, {10u, 1u, 0u, 1811u, 1811u, 913u, 998u}},
    {1u, {false, 1811u}, {996u, 0u}, {11u, 1u, 1u, 1811u, 1811u, 913u, 996u}},
    /* vector 5 */
    {9u, {false, 1837u}, {1000u, 0u}, {9u, 0u, 9u, 1837u, 1837u, 0u, 1000u}},
    {1u, {false, 1837u}, {998u, 0u}, {10u, 1u, 0u, 1837u, 1837u, 841u, 998u}},
    {1u, {false, 1837u}, {996u, 0u}, {11u, 1u, 1u, 1837u, 1837u, 841u, 996u}},
    {1u, {false, 1837u}, {994u, 0u}, {12u, 1u, 2u, 1837u, 1837u, 841u, 994u}},
    {1u, {false, 1837u}, {992u, 0u}, {13u, 1u, 3u, 1837u, 1837u, 841u, 992u}},
    {1u, {false, 1837u}, {990u, 0u}, {14u, 1u, 4u, 1837u, 1837u, 841u, 990u}},
    {1u, {false, 1837u}, {988u, 0u}, {15u, 1u, 5u, 1837u, 1837u, 841u, 988u}},
    {1u, {false, 1837u}, {986u, 0u}, {16u, 1u, 6u, 1837u, 1837u, 841u, 986u}},
    {1u, {false, 2149u}, {984u, 0u}, {17u, 1u, 7u, 2149u, 1837u, 841u, 984u}},
    {1u, {false, 2149u}, {982u, 0u}, {18u, 1u, 8u, 2149u, 2149u, 167u, 982u}},
    /* vector 6 */
    {9u, {false, 2150u}, {1000u, 0u}, {9u, 0u, 9u, 2150u, 2150u, 0u, 1000u}},
    {1u, {false, 2150u}, {998u, 0u}, {10u, 1u, 0u, 2150u, 2150u, 0u, 998u}},
    {1u, {false, 2150u}, {996u, 0u}, {11u, 1u, 1u, 2150u, 2150u, 0u, 996u}},
    {1u, {false, 2150u}, {994u, 0u}, {12u, 1u, 2u, 2150u, 2150u, 0u, 994u}},
    {1u, {false, 2150u}, {992u, 0u}, {13u, 1u, 3u, 2150u, 2150u, 0u, 992u}},
    {1u, {false, 2150u}, {990u, 0u}, {14u, 1u, 4u, 2150u, 2150u, 0u, 990u}},
    {1u, {false, 2150u}, {988u, 0u}, {15u, 1u, 5u, 2150u, 2150u, 0u, 988u}},
    {1u, {false, 2150u}, {986u, 0u}, {16u, 1u, 6u, 2150u, 2150u, 0u, 986u}},
    {1u, {false, 2150u}, {984u, 0u}, {17u, 1u, 7u, 2150u, 2150u, 0u, 984u}},
    {1u, {false, 2181u}, {982u, 0u}, {18u, 1u, 8u, 2181u, 2150u, 0u, 982u}},
    {1u, {false, 2181u}, {980u, 0u}, {19u, 1u, 9u, 2181u, 2181u, 0u, 980u}},
    {1u, {false, 4081u}, {978u, 0u}, {20u, 1u, 10u, 4081u, 2181u, 0u, 978u}},
    {1u, {false, 4082u}, {976u, 0u}, {0u, 2u, 0u, 4081u, 2181u, 0u, 976u}},
    {1u, {true, 2244u}, {974u, 0u}, {1u, 2u, 1u, 2244u, 4081u, 0u, 974u}},
    {1u, {true, 2244u}, {972u, 0u}, {2u, 2u, 2u, 2244u, 2244u, 0u, 972u}},
    {1u, {true, 2032u}, {970u, 0u}, {3u, 2u, 3u, 2032u, 2244u, 0u, 970u}},
    {1u, {true, 2032u}, {968u, 0u}, {4u, 2u, 4u, 2032u, 2032u, 0u, 968u}},
    {1u, {true, 2032u}, {966u, 0u}, {5u, 2u, 5u, 2032u, 2032u, 0u, 966u}},
    {1u, {true, 2032u}, {964u, 0u}, {6u, 2u, 6u, 2032u, 2032u, 0u, 964u}},
    {1u, {true, 2032u}, {962u, 0u}, {7u, 2u, 7u, 2032u, 2032u, 0u, 962u}},
    {1u, {true, 2032u}, {960u, 0u}, {8u, 2u, 8u, 2032u, 2032u, 0u, 960u}},
    {1u, {true, 2032u}, {958u, 0u}, {9u, 2u, 9u, 2032u, 2032u, 0u, 958u}},
    {1u, {true, 2032u}, {956u, 0u}, {10u, 1u, 0u, 2032u, 2032u, 310u, 956u}},
    {1u, {true, 2032u}, {954u, 0u}, {11u, 1u, 1u, 2032u, 2032u, 310u, 954u}},
    {1u, {true, 2032u}, {952u, 0u}, {12u, 1u, 2u, 2032u, 2032u, 310u, 952u}},
    {1u, {true, 2150u}, {950u, 0u}, {13u, 1u, 3u, 2150u, 2032u, 310u, 950u}},
    {1u, {true, 2150u}, {948u, 0u}, {14u, 1u, 4u, 2150u, 2150u, 164u, 948u}},
    {1u, {true, 2150u}, {946u, 0u}, {15u, 1u, 5u, 2150u, 2150u, 164u, 946u}},
    {1u, {true, 2150u}, {944u, 0u}, {16u, 1u, 6u, 2150u, 2150u, 164u, 944u}},
    {1u, {true, 1779u}, {942u, 0u}, {17u, 1u, 7u, 1779u, 2150u, 164u, 942u}},
    {1u, {true, 2244u}, {940u, 0u}, {18u, 1u, 8u, 2244u, 1779u, 164u, 940u}},
    {1u, {false, 0u}, {938u, 0u}, {0u, 2u, 0u, 2244u, 1779u, 164u, 938u}},
    {1u, {false, 0u}, {936u, 0u}, {0u, 2u, 1u, 2244u, 1779u, 164u, 936u}},
    {1u, {false, 0u}, {934u, 0u}, {0u, 2u, 2u, 2244u, 1779u, 164u, 934u}},
    {1u, {false, 0u}, {932u, 0u}, {0u, 2u, 3u, 2244u, 1779u, 164u, 932u}},
    {1u, {false, 0u}, {930u, 0u}, {0u, 2u, 4u, 2244u, 1779u, 164u, 930u}},
    {1u, {false, 0u}, {928u, 0u}, {0u, 2u, 5u, 2244u, 1779u, 164u, 928u}},
    {1u, {false, 0u}, {926u, 0u}, {0u, 2u, 6u, 2244u, 1779u, 164u, 926u}},
    {1u, {false, 0u}, {924u, 0u}, {0u, 2u, 7u, 2244u, 1779u, 164u, 924u}},
    {1u, {false, 0u}, {922u, 0u}, {0u, 2u, 8u, 2244u, 1779u, 164u, 922u}},
    {1u, {false, 0u}, {920u, 0u}, {0u, 2u, 9u, 2244u, 1779u, 164u, 920u}},
    {1u, {false, 0u}, {918u, 0u}, {0u, 2u, 10u, 2244u, 1779u, 164u, 918u}},
    {1u, {false, 0u}, {916u, 0u}, {0u, 2u, 11u, 2244u, 1779u, 164u, 916u}},
    {1u, {false, 0u}, {914u, 0u}, {0u, 2u, 12u, 2244u, 1779u, 164u, 914u}},
    {1u, {false, 0u}, {912u, 0u}, {0u, 2u, 13u, 2244u, 1779u, 164u, 912u}},
    {1u, {false, 0u}, {910u, 0u}, {0u, 2u, 14u, 2244u, 1779u, 164u, 910u}},
    {1u, {false, 0u}, {908u, 0u}, {0u, 2u, 15u, 2244u, 1779u, 164u, 908u}},
    {1u, {false, 0u}, {906u, 0u}, {0u, 2u, 16u, 2244u, 1779u, 164u, 906u}},
    {1u, {false, 0u}, {904u, 0u}, {0u, 2u, 17u, 2244u, 1779u, 164u, 904u}},
    {1u, {false, 0u}, {902u, 0u}, {0u, 2u, 18u, 2244u, 1779u, 164u, 902u}},
    {1u, {false, 0u}, {900u, 0u}, {0u, 2u, 19u, 2244u, 1779u, 164u, 900u}},
    {1u, {false, 0u}, {1000u, 1u}, {0u, 3u, 0u, 2244u, 1779u, 164u, 1000u}},
    {11u, {false, 0u}, {1000u, 1u}, {0u, 3u, 11u, 2244u, 1779u, 164u, 1000u}},
    {99u, {false, 2181u}, {1000u, 1u}, {99u, 3u, 30u, 2181u, 2181u, 164u, 1000u}},
    {1u, {false, 1779u}, {998u, 0u}, {100u, 1u, 0u, 1779u, 2181u, 0u, 998u}},
    {1u, {true, 1779u}, {1000u, 0u}, {100u, 1u, 1u, 1779u, 1779u, 1000u, 1000u}},
    {1u, {true, 2148u}, {1000u, 0u}, {100u, 1u, 2u, 2148u, 1779u, 1000u, 1000u}},
    {1u, {false, 2148u}, {998u, 0u}, {100u, 1u, 3u, 2148u, 2148u, 170u, 998u}},
    {1u, {false, 1751u}, {996u, 0u}, {100u, 1u, 4u, 1751u, 2148u, 170u, 996u}},
    {1u, {false, 1751u}, {998u, 0u}, {100u, 1u, 5u, 1751u, 1751u, 1000u, 998u}},
    {1u, {false, 1955u}, {1000u, 0u}, {100u, 1u, 6u, 1955u, 1751u, 1000u, 1000u}},
    {1u, {false, 1954u}, {998u, 0u}, {100u, 1u, 7u, 1954u, 1955u, 682u, 998u}},
    {1u, {false, 2210u}, {996u, 0u}, {100u, 1u, 8u, 2210u, 1954u, 678u, 996u}},
    {1u, {false, 2209u}, {994u, 0u}, {100u, 1u, 9u, 2209u, 2210u, 0u, 994u}},
    {1u, {true, 1955u}, {992u, 0u}, {100u, 1u, 10u, 1955u, 2209u, 0u, 992u}},
    {1u, {true, 1954u}, {990u, 0u}, {100u, 1u, 11u, 1954u, 1955u, 512u, 990u}},
    {1u, {true, 1954u}, {988u, 0u}, {100u, 1u, 12u, 1954u, 1954u, 516u, 988u}},
    {1u, {true, 1781u}, {986u, 0u}, {100u, 1u, 13u, 1781u, 1954u, 516u, 986u}},
    {1u, {true, 1781u}, {988u, 0u}, {100u, 1u, 14u, 1781u, 1781u, 1000u, 988u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct genset1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 96u, false, {0u}},
    {96u, 102u, false, {0u}},
    {102u, 103u, false, {0u}},
    {103u, 106u, false, {0u}},
    {106u, 116u, false, {0u}},
    {116u, 185u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct genset1 m;
    struct genset1_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    genset1_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            genset1_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct genset1 fresh =
    {0u, 0u, 0u, 0u, 0u, 0u, 1000u};

static void start_and_compare(const char *what, const struct genset1_remembered *r,
                              const struct genset1 *wanted)
{
    struct genset1 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    genset1_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct genset1 m;
    struct genset1_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", genset1_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", genset1_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct genset1 m;
    struct genset1_in in;
    struct genset1_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct genset1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 1000u};
        static const struct genset1_out wanted =
           {1000u, 1u};

        doing = "outlet_probe_state upset";
        genset1_start(&m, NULL);
        m.outlet_probe_state = 4u;
        genset1_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct genset1 after =
           {0u, 3u, 0u, 0u, 0u, 0u, 1000u};
        static const struct genset1_out wanted =
           {1000u, 1u};

        doing = "outlet_probe_state upset";
        genset1_start(&m, NULL);
        m.outlet_probe_state = 255u;
        genset1_step(&m, &in, &out);
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
