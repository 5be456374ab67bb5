/* genset1_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Standby engine 1, coolant circuit
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: e411cde8741198e425c7ae361d5585aa2d4b1a62c21c3fae06d1c0f4492bbb37
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
    {1u, {false, 2045u}, {1000u, 0u}, {1u, 0u, 1u, 2045u, 0u, 0u, 1000u}},
    {1u, {false, 2045u}, {1000u, 0u}, {2u, 0u, 2u, 2045u, 2045u, 0u, 1000u}},
    {7u, {false, 2045u}, {1000u, 0u}, {9u, 0u, 9u, 2045u, 2045u, 0u, 1000u}},
    {1u, {false, 2045u}, {998u, 0u}, {10u, 1u, 0u, 2045u, 2045u, 558u, 998u}},
    {1u, {false, 2045u}, {996u, 0u}, {11u, 1u, 1u, 2045u, 2045u, 558u, 996u}},
    {1u, {false, 2045u}, {994u, 0u}, {12u, 1u, 2u, 2045u, 2045u, 558u, 994u}},
    {1u, {false, 2045u}, {992u, 0u}, {13u, 1u, 3u, 2045u, 2045u, 558u, 992u}},
    {1u, {false, 2045u}, {990u, 0u}, {14u, 1u, 4u, 2045u, 2045u, 558u, 990u}},
    {1u, {false, 2045u}, {988u, 0u}, {15u, 1u, 5u, 2045u, 2045u, 558u, 988u}},
    {1u, {false, 2045u}, {986u, 0u}, {16u, 1u, 6u, 2045u, 2045u, 558u, 986u}},
    {1u, {false, 2045u}, {984u, 0u}, {17u, 1u, 7u, 2045u, 2045u, 558u, 984u}},
    {1u, {false, 2045u}, {982u, 0u}, {18u, 1u, 8u, 2045u, 2045u, 558u, 982u}},
    {1u, {false, 2045u}, {980u, 0u}, {19u, 1u, 9u, 2045u, 2045u, 558u, 980u}},
    {1u, {false, 2045u}, {978u, 0u}, {20u, 1u, 10u, 2045u, 2045u, 558u, 978u}},
    {1u, {false, 2045u}, {976u, 0u}, {21u, 1u, 11u, 2045u, 2045u, 558u, 976u}},
    {1u, {false, 2045u}, {974u, 0u}, {22u, 1u, 12u, 2045u, 2045u, 558u, 974u}},
    {1u, {false, 2045u}, {972u, 0u}, {23u, 1u, 13u, 2045u, 2045u, 558u, 972u}},
    {1u, {false, 2045u}, {970u, 0u}, {24u, 1u, 14u, 2045u, 2045u, 558u, 970u}},
    {1u, {false, 2045u}, {968u, 0u}, {25u, 1u, 15u, 2045u, 2045u, 558u, 968u}},
    {1u, {false, 2045u}, {966u, 0u}, {26u, 1u, 16u, 2045u, 2045u, 558u, 966u}},
    {1u, {false, 2045u}, {964u, 0u}, {27u, 1u, 17u, 2045u, 2045u, 558u, 964u}},
    {1u, {false, 2045u}, {962u, 0u}, {28u, 1u, 18u, 2045u, 2045u, 558u, 962u}},
    {1u, {false, 2045u}, {960u, 0u}, {29u, 1u, 19u, 2045u, 2045u, 558u, 960u}},
    {1u, {false, 2045u}, {958u, 0u}, {30u, 1u, 20u, 2045u, 2045u, 558u, 958u}},
    {1u, {false, 2045u}, {956u, 0u}, {31u, 1u, 21u, 2045u, 2045u, 558u, 956u}},
    {1u, {false, 2045u}, {954u, 0u}, {32u, 1u, 22u, 2045u, 2045u, 558u, 954u}},
    {1u, {false, 2045u}, {952u, 0u}, {33u, 1u, 23u, 2045u, 2045u, 558u, 952u}},
    {1u, {false, 2045u}, {950u, 0u}, {34u, 1u, 24u, 2045u, 2045u, 558u, 950u}},
    {1u, {false, 2045u}, {948u, 0u}, {35u, 1u, 25u, 2045u, 2045u, 558u, 948u}},
    {1u, {false, 2045u}, {946u, 0u}, {36u, 1u, 26u, 2045u, 2045u, 558u, 946u}},
    {1u, {false, 2045u}, {944u, 0u}, {37u, 1u, 27u, 2045u, 2045u, 558u, 944u}},
    {1u, {false, 2045u}, {942u, 0u}, {38u, 1u, 28u, 2045u, 2045u, 558u, 942u}},
    {1u, {false, 2045u}, {940u, 0u}, {39u, 1u, 29u, 2045u, 2045u, 558u, 940u}},
    {1u, {false, 2045u}, {938u, 0u}, {40u, 1u, 30u, 2045u, 2045u, 558u, 938u}},
    {1u, {false, 2045u}, {936u, 0u}, {41u, 1u, 30u, 2045u, 2045u, 558u, 936u}},
    {1u, {false, 2045u}, {934u, 0u}, {42u, 1u, 30u, 2045u, 2045u, 558u, 934u}},
    {1u, {false, 2045u}, {932u, 0u}, {43u, 1u, 30u, 2045u, 2045u, 558u, 932u}},
    {1u, {false, 2045u}, {930u, 0u}, {44u, 1u, 30u, 2045u, 2045u, 558u, 930u}},
    {1u, {false, 2045u}, {928u, 0u}, {45u, 1u, 30u, 2045u, 2045u, 558u, 928u}},
    {1u, {false, 2045u}, {926u, 0u}, {46u, 1u, 30u, 2045u, 2045u, 558u, 926u}},
    {1u, {false, 2045u}, {924u, 0u}, {47u, 1u, 30u, 2045u, 2045u, 558u, 924u}},
    {1u, {false, 2045u}, {922u, 0u}, {48u, 1u, 30u, 2045u, 2045u, 558u, 922u}},
    {1u, {false, 2045u}, {920u, 0u}, {49u, 1u, 30u, 2045u, 2045u, 558u, 920u}},
    {1u, {false, 2045u}, {918u, 0u}, {50u, 1u, 30u, 2045u, 2045u, 558u, 918u}},
    {1u, {false, 2045u}, {916u, 0u}, {51u, 1u, 30u, 2045u, 2045u, 558u, 916u}},
    {1u, {false, 2045u}, {914u, 0u}, {52u, 1u, 30u, 2045u, 2045u, 558u, 914u}},
    {1u, {false, 2045u}, {912u, 0u}, {53u, 1u, 30u, 2045u, 2045u, 558u, 912u}},
    {1u, {false, 2045u}, {910u, 0u}, {54u, 1u, 30u, 2045u, 2045u, 558u, 910u}},
    {1u, {false, 2045u}, {908u, 0u}, {55u, 1u, 30u, 2045u, 2045u, 558u, 908u}},
    {1u, {false, 2045u}, {906u, 0u}, {56u, 1u, 30u, 2045u, 2045u, 558u, 906u}},
    {1u, {false, 2045u}, {904u, 0u}, {57u, 1u, 30u, 2045u, 2045u, 558u, 904u}},
    {1u, {false, 2045u}, {902u, 0u}, {58u, 1u, 30u, 2045u, 2045u, 558u, 902u}},
    {1u, {false, 2045u}, {900u, 0u}, {59u, 1u, 30u, 2045u, 2045u, 558u, 900u}},
    {1u, {false, 2045u}, {898u, 0u}, {60u, 1u, 30u, 2045u, 2045u, 558u, 898u}},
    {1u, {false, 2045u}, {896u, 0u}, {61u, 1u, 30u, 2045u, 2045u, 558u, 896u}},
    {1u, {false, 2045u}, {894u, 0u}, {62u, 1u, 30u, 2045u, 2045u, 558u, 894u}},
    {1u, {false, 2045u}, {892u, 0u}, {63u, 1u, 30u, 2045u, 2045u, 558u, 892u}},
    {1u, {false, 2045u}, {890u, 0u}, {64u, 1u, 30u, 2045u, 2045u, 558u, 890u}},
    {1u, {false, 2045u}, {888u, 0u}, {65u, 1u, 30u, 2045u, 2045u, 558u, 888u}},
    {1u, {false, 2045u}, {886u, 0u}, {66u, 1u, 30u, 2045u, 2045u, 558u, 886u}},
    {1u, {false, 2045u}, {884u, 0u}, {67u, 1u, 30u, 2045u, 2045u, 558u, 884u}},
    {1u, {false, 2045u}, {882u, 0u}, {68u, 1u, 30u, 2045u, 2045u, 558u, 882u}},
    {1u, {false, 2045u}, {880u, 0u}, {69u, 1u, 30u, 2045u, 2045u, 558u, 880u}},
    {1u, {false, 2045u}, {878u, 0u}, {70u, 1u, 30u, 2045u, 2045u, 558u, 878u}},
    {1u, {false, 2045u}, {876u, 0u}, {71u, 1u, 30u, 2045u, 2045u, 558u, 876u}},
    {1u, {false, 2045u}, {874u, 0u}, {72u, 1u, 30u, 2045u, 2045u, 558u, 874u}},
    {1u, {false, 2045u}, {872u, 0u}, {73u, 1u, 30u, 2045u, 2045u, 558u, 872u}},
    {1u, {false, 2045u}, {870u, 0u}, {74u, 1u, 30u, 2045u, 2045u, 558u, 870u}},
    {1u, {false, 2045u}, {868u, 0u}, {75u, 1u, 30u, 2045u, 2045u, 558u, 868u}},
    {1u, {false, 2045u}, {866u, 0u}, {76u, 1u, 30u, 2045u, 2045u, 558u, 866u}},
    {1u, {false, 2045u}, {864u, 0u}, {77u, 1u, 30u, 2045u, 2045u, 558u, 864u}},
    {1u, {false, 2045u}, {862u, 0u}, {78u, 1u, 30u, 2045u, 2045u, 558u, 862u}},
    {1u, {false, 2045u}, {860u, 0u}, {79u, 1u, 30u, 2045u, 2045u, 558u, 860u}},
    {1u, {false, 2045u}, {858u, 0u}, {80u, 1u, 30u, 2045u, 2045u, 558u, 858u}},
    {1u, {false, 2045u}, {856u, 0u}, {81u, 1u, 30u, 2045u, 2045u, 558u, 856u}},
    {1u, {false, 2045u}, {854u, 0u}, {82u, 1u, 30u, 2045u, 2045u, 558u, 854u}},
    {1u, {false, 2045u}, {852u, 0u}, {83u, 1u, 30u, 2045u, 2045u, 558u, 852u}},
    {1u, {false, 2045u}, {850u, 0u}, {84u, 1u, 30u, 2045u, 2045u, 558u, 850u}},
    {1u, {false, 2045u}, {848u, 0u}, {85u, 1u, 30u, 2045u, 2045u, 558u, 848u}},
    {1u, {false, 2045u}, {846u, 0u}, {86u, 1u, 30u, 2045u, 2045u, 558u, 846u}},
    {1u, {false, 2045u}, {844u, 0u}, {87u, 1u, 30u, 2045u, 2045u, 558u, 844u}},
    {1u, {false, 2045u}, {842u, 0u}, {88u, 1u, 30u, 2045u, 2045u, 558u, 842u}},
    {1u, {false, 2045u}, {840u, 0u}, {89u, 1u, 30u, 2045u, 2045u, 558u, 840u}},
    {1u, {false, 2045u}, {838u, 0u}, {90u, 1u, 30u, 2045u, 2045u, 558u, 838u}},
    {1u, {false, 2045u}, {836u, 0u}, {91u, 1u, 30u, 2045u, 2045u, 558u, 836u}},
    {1u, {false, 2045u}, {834u, 0u}, {92u, 1u, 30u, 2045u, 2045u, 558u, 834u}},
    {1u, {false, 2045u}, {832u, 0u}, {93u, 1u, 30u, 2045u, 2045u, 558u, 832u}},
    {1u, {false, 2045u}, {830u, 0u}, {94u, 1u, 30u, 2045u, 2045u, 558u, 830u}},
    {1u, {false, 2045u}, {828u, 0u}, {95u, 1u, 30u, 2045u, 2045u, 558u, 828u}},
    {1u, {false, 2045u}, {826u, 0u}, {96u, 1u, 30u, 2045u, 2045u, 558u, 826u}},
    {1u, {false, 2045u}, {824u, 0u}, {97u, 1u, 30u, 2045u, 2045u, 558u, 824u}},
    {1u, {false, 2045u}, {822u, 0u}, {98u, 1u, 30u, 2045u, 2045u, 558u, 822u}},
    {1u, {false, 2045u}, {820u, 0u}, {99u, 1u, 30u, 2045u, 2045u, 558u, 820u}},
    {1u, {false, 2045u}, {818u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 818u}},
    {1u, {false, 2045u}, {816u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 816u}},
    {1u, {true, 2045u}, {814u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 814u}},
    {1u, {true, 2045u}, {812u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 812u}},
    {1u, {true, 2045u}, {810u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 810u}},
    {1u, {true, 2045u}, {808u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 808u}},
    {1u, {true, 2045u}, {806u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 806u}},
    {1u, {true, 2045u}, {804u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 804u}},
    {1u, {true, 2045u}, {802u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 802u}},
    {1u, {true, 2045u}, {800u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 800u}},
    {1u, {true, 2045u}, {798u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 798u}},
    {1u, {true, 2045u}, {796u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 796u}},
    {1u, {true, 2045u}, {794u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 794u}},
    {1u, {true, 2045u}, {792u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 792u}},
    {1u, {true, 2045u}, {790u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 790u}},
    {1u, {true, 2045u}, {788u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 788u}},
    {1u, {true, 2045u}, {786u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 786u}},
    {1u, {true, 2045u}, {784u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 784u}},
    {1u, {true, 2045u}, {782u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 782u}},
    {1u, {true, 2045u}, {780u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 780u}},
    {1u, {true, 2045u}, {778u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 778u}},
    {1u, {true, 2045u}, {776u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 776u}},
    {1u, {true, 2045u}, {774u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 774u}},
    {1u, {true, 2045u}, {772u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 772u}},
    {1u, {true, 2045u}, {770u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 770u}},
    {1u, {true, 2045u}, {768u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 768u}},
    {1u, {true, 2045u}, {766u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 766u}},
    {1u, {true, 2045u}, {764u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 764u}},
    {1u, {true, 2045u}, {762u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 762u}},
    {1u, {true, 2045u}, {760u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 760u}},
    {1u, {true, 2045u}, {758u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 758u}},
    {1u, {true, 2045u}, {756u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 756u}},
    {1u, {true, 2045u}, {754u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 754u}},
    {1u, {true, 2045u}, {752u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 752u}},
    {1u, {true, 2045u}, {750u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 750u}},
    {1u, {true, 2045u}, {748u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 748u}},
    {1u, {true, 2045u}, {746u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 746u}},
    {1u, {true, 2045u}, {744u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 744u}},
    {1u, {true, 2045u}, {742u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 742u}},
    {1u, {true, 2045u}, {740u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 740u}},
    {1u, {true, 2045u}, {738u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 738u}},
    {1u, {true, 2045u}, {736u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 736u}},
    {1u, {true, 2045u}, {734u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 734u}},
    {1u, {true, 2045u}, {732u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 732u}},
    {1u, {true, 2045u}, {730u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 730u}},
    {1u, {true, 2045u}, {728u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 728u}},
    {1u, {true, 2045u}, {726u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 726u}},
    {1u, {true, 2045u}, {724u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 724u}},
    {1u, {true, 2045u}, {722u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 722u}},
    {1u, {true, 2045u}, {720u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 720u}},
    {1u, {true, 2045u}, {718u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 718u}},
    {1u, {true, 2045u}, {716u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 716u}},
    {1u, {true, 2045u}, {714u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 714u}},
    {1u, {true, 2045u}, {712u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 712u}},
    {1u, {true, 2045u}, {710u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 710u}},
    {1u, {true, 2045u}, {708u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 708u}},
    {1u, {true, 2045u}, {706u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 706u}},
    {1u, {true, 2045u}, {704u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 704u}},
    {1u, {true, 2045u}, {702u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 702u}},
    {1u, {true, 2045u}, {700u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 700u}},
    {1u, {true, 2045u}, {698u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 698u}},
    {1u, {true, 2045u}, {696u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 696u}},
    {1u, {true, 2045u}, {694u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 694u}},
    {1u, {true, 2045u}, {692u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 692u}},
    {1u, {true, 2045u}, {690u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 690u}},
    {1u, {true, 2045u}, {688u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 688u}},
    {1u, {true, 2045u}, {686u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 686u}},
    {1u, {true, 2045u}, {684u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 684u}},
    {1u, {true, 2045u}, {682u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 682u}},
    {1u, {true, 2045u}, {680u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 680u}},
    {1u, {true, 2045u}, {678u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 678u}},
    {1u, {true, 2045u}, {676u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 676u}},
    {1u, {true, 2045u}, {674u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 674u}},
    {1u, {true, 2045u}, {672u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 672u}},
    {1u, {true, 2045u}, {670u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 670u}},
    {1u, {true, 2045u}, {668u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 668u}},
    {1u, {true, 2045u}, {666u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 666u}},
    {1u, {true, 2045u}, {664u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 664u}},
    {1u, {true, 2045u}, {662u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 662u}},
    {1u, {true, 2045u}, {660u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 660u}},
    {1u, {true, 2045u}, {658u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 658u}},
    {1u, {true, 2045u}, {656u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 656u}},
    {1u, {true, 2045u}, {654u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 654u}},
    {1u, {true, 2045u}, {652u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 652u}},
    {1u, {true, 2045u}, {650u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 650u}},
    {1u, {true, 2045u}, {648u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 648u}},
    {1u, {true, 2045u}, {646u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 646u}},
    {1u, {true, 2045u}, {644u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 644u}},
    {1u, {true, 2045u}, {642u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 642u}},
    {1u, {true, 2045u}, {640u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 640u}},
    {1u, {true, 2045u}, {638u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 638u}},
    {1u, {true, 2045u}, {636u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 636u}},
    {1u, {true, 2045u}, {634u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 634u}},
    {1u, {true, 2045u}, {632u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 632u}},
    {1u, {true, 2045u}, {630u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 630u}},
    {1u, {true, 2045u}, {628u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 628u}},
    {1u, {true, 2045u}, {626u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 626u}},
    {1u, {true, 2045u}, {624u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 624u}},
    {1u, {true, 2045u}, {622u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 622u}},
    {1u, {true, 2045u}, {620u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 620u}},
    {1u, {true, 2045u}, {618u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 618u}},
    {1u, {true, 2045u}, {616u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 616u}},
    {1u, {true, 2045u}, {614u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 614u}},
    {1u, {true, 2045u}, {612u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 612u}},
    {1u, {true, 2045u}, {610u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 610u}},
    {1u, {true, 2045u}, {608u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 608u}},
    {1u, {true, 2045u}, {606u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 606u}},
    {1u, {true, 2045u}, {604u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 604u}},
    {1u, {true, 2045u}, {602u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 602u}},
    {1u, {true, 2045u}, {600u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 600u}},
    {1u, {true, 2045u}, {598u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 598u}},
    {1u, {true, 2045u}, {596u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 596u}},
    {1u, {true, 2045u}, {594u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 594u}},
    {1u, {true, 2045u}, {592u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 592u}},
    {1u, {true, 2045u}, {590u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 590u}},
    {1u, {true, 2045u}, {588u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 588u}},
    {1u, {true, 2045u}, {586u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 586u}},
    {1u, {true, 2045u}, {584u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 584u}},
    {1u, {true, 2045u}, {582u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 582u}},
    {1u, {true, 2045u}, {580u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 580u}},
    {1u, {true, 2045u}, {578u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 578u}},
    {1u, {true, 2045u}, {576u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 576u}},
    {1u, {true, 2045u}, {574u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 574u}},
    {1u, {true, 2045u}, {572u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 572u}},
    {1u, {true, 2045u}, {570u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 570u}},
    {1u, {true, 2045u}, {568u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 568u}},
    {1u, {true, 2045u}, {566u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 566u}},
    {1u, {true, 2045u}, {564u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 564u}},
    {1u, {true, 2045u}, {562u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 562u}},
    {1u, {true, 2045u}, {560u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 560u}},
    {2u, {true, 2045u}, {558u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 558u}},
    {1u, {false, 0u}, {558u, 0u}, {0u, 2u, 0u, 2045u, 2045u, 558u, 558u}},
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
    {9u, {false, 1900u}, {1000u, 0u}, {9u, 0u, 9u, 1900u, 1900u, 0u, 1000u}},
    {1u, {false, 1900u}, {998u, 0u}, {10u, 1u, 0u, 1900u, 1900u, 922u, 998u}},
    /* vector 5 */
    {9u, {false, 1928u}, {1000u, 0u}, {9u, 0u, 9u, 1928u, 1928u, 0u, 1000u}},
    {1u, {false, 1928u}, {998u, 0u}, {10u, 1u, 0u, 1928u, 1928u, 852u, 998u}},
    {1u, {false, 2274u}, {996u, 0u}, {11u, 1u, 1u, 2274u, 1928u, 852u, 996u}},
    {1u, {false, 2274u}, {994u, 0u}, {12u, 1u, 2u, 2274u, 2274u, 162u, 994u}},
    /* vector 6 */
    {9u, {false, 2278u}, {1000u, 0u}, {9u, 0u, 9u, 2278u, 2278u, 0u, 1000u}},
    {1u, {false, 2278u}, {998u, 0u}, {10u, 1u, 0u, 2278u, 2278u, 0u, 998u}},
    {1u, {false, 2278u}, {996u, 0u}, {11u, 1u, 1u, 2278u, 2278u, 0u, 996u}},
    {1u, {false, 2278u}, {994u, 0u}, {12u, 1u, 2u, 2278u, 2278u, 0u, 994u}},
    {1u, {false, 2278u}, {992u, 0u}, {13u, 1u, 3u, 2278u, 2278u, 0u, 992u}},
    {1u, {false, 2310u}, {990u, 0u}, {14u, 1u, 4u, 2310u, 2278u, 0u, 990u}},
    {1u, {false, 2310u}, {988u, 0u}, {15u, 1u, 5u, 2310u, 2310u, 0u, 988u}},
    {1u, {false, 4081u}, {986u, 0u}, {16u, 1u, 6u, 4081u, 2310u, 0u, 986u}},
    {1u, {false, 4082u}, {984u, 0u}, {0u, 2u, 0u, 4081u, 2310u, 0u, 984u}},
    {1u, {false, 2043u}, {982u, 0u}, {1u, 2u, 1u, 2043u, 4081u, 0u, 982u}},
    {1u, {false, 2043u}, {980u, 0u}, {2u, 2u, 2u, 2043u, 2043u, 0u, 980u}},
    {1u, {false, 2375u}, {978u, 0u}, {3u, 2u, 3u, 2375u, 2043u, 0u, 978u}},
    {1u, {false, 2375u}, {976u, 0u}, {4u, 2u, 4u, 2375u, 2375u, 0u, 976u}},
    {1u, {false, 2375u}, {974u, 0u}, {5u, 2u, 5u, 2375u, 2375u, 0u, 974u}},
    {1u, {false, 2375u}, {972u, 0u}, {6u, 2u, 6u, 2375u, 2375u, 0u, 972u}},
    {1u, {false, 2375u}, {970u, 0u}, {7u, 2u, 7u, 2375u, 2375u, 0u, 970u}},
    {1u, {false, 2375u}, {968u, 0u}, {8u, 2u, 8u, 2375u, 2375u, 0u, 968u}},
    {1u, {false, 2375u}, {966u, 0u}, {9u, 2u, 9u, 2375u, 2375u, 0u, 966u}},
    {1u, {false, 2375u}, {964u, 0u}, {10u, 1u, 0u, 2375u, 2375u, 0u, 964u}},
    {1u, {false, 2375u}, {962u, 0u}, {11u, 1u, 1u, 2375u, 2375u, 0u, 962u}},
    {1u, {false, 2375u}, {960u, 0u}, {12u, 1u, 2u, 2375u, 2375u, 0u, 960u}},
    {1u, {false, 999u}, {958u, 0u}, {13u, 1u, 3u, 999u, 2375u, 0u, 958u}},
    {1u, {false, 2043u}, {956u, 0u}, {14u, 1u, 4u, 2043u, 999u, 563u, 956u}},
    {1u, {false, 1212u}, {958u, 0u}, {15u, 1u, 5u, 1212u, 2043u, 1000u, 958u}},
    {1u, {false, 2339u}, {956u, 0u}, {16u, 1u, 6u, 2339u, 1212u, 717u, 956u}},
    {1u, {false, 2339u}, {954u, 0u}, {17u, 1u, 7u, 2339u, 2339u, 0u, 954u}},
    {1u, {false, 1840u}, {952u, 0u}, {18u, 1u, 8u, 1840u, 2339u, 0u, 952u}},
    {1u, {false, 1840u}, {954u, 0u}, {19u, 1u, 9u, 1840u, 1840u, 1000u, 954u}},
    {1u, {false, 1840u}, {956u, 0u}, {20u, 1u, 10u, 1840u, 1840u, 1000u, 956u}},
    {1u, {false, 1840u}, {958u, 0u}, {21u, 1u, 11u, 1840u, 1840u, 1000u, 958u}},
    {1u, {false, 1840u}, {960u, 0u}, {22u, 1u, 12u, 1840u, 1840u, 1000u, 960u}},
    {1u, {false, 1840u}, {962u, 0u}, {23u, 1u, 13u, 1840u, 1840u, 1000u, 962u}},
    {1u, {false, 1840u}, {964u, 0u}, {24u, 1u, 14u, 1840u, 1840u, 1000u, 964u}},
    {1u, {false, 1840u}, {966u, 0u}, {25u, 1u, 15u, 1840u, 1840u, 1000u, 966u}},
    {1u, {false, 1840u}, {968u, 0u}, {26u, 1u, 16u, 1840u, 1840u, 1000u, 968u}},
    {1u, {false, 1840u}, {970u, 0u}, {27u, 1u, 17u, 1840u, 1840u, 1000u, 970u}},
    {1u, {false, 1840u}, {972u, 0u}, {28u, 1u, 18u, 1840u, 1840u, 1000u, 972u}},
    {1u, {false, 1899u}, {974u, 0u}, {29u, 1u, 19u, 1899u, 1840u, 1000u, 974u}},
    {1u, {true, 802u}, {976u, 0u}, {0u, 2u, 0u, 1899u, 1840u, 1000u, 976u}},
    {1u, {true, 802u}, {978u, 0u}, {0u, 2u, 1u, 1899u, 1840u, 1000u, 978u}},
    {1u, {false, 1929u}, {980u, 0u}, {1u, 2u, 2u, 1929u, 1899u, 1000u, 980u}},
    {1u, {true, 1929u}, {982u, 0u}, {2u, 2u, 3u, 1929u, 1929u, 1000u, 982u}},
    {1u, {true, 1929u}, {984u, 0u}, {3u, 2u, 4u, 1929u, 1929u, 1000u, 984u}},
    {1u, {true, 1929u}, {986u, 0u}, {4u, 2u, 5u, 1929u, 1929u, 1000u, 986u}},
    {1u, {true, 1929u}, {988u, 0u}, {5u, 2u, 6u, 1929u, 1929u, 1000u, 988u}},
    {1u, {true, 1929u}, {990u, 0u}, {6u, 2u, 7u, 1929u, 1929u, 1000u, 990u}},
    {1u, {true, 1929u}, {992u, 0u}, {7u, 2u, 8u, 1929u, 1929u, 1000u, 992u}},
    {1u, {true, 1929u}, {994u, 0u}, {8u, 2u, 9u, 1929u, 1929u, 1000u, 994u}},
    {1u, {true, 1929u}, {996u, 0u}, {9u, 2u, 10u, 1929u, 1929u, 1000u, 996u}},
    {1u, {true, 1929u}, {998u, 0u}, {10u, 1u, 0u, 1929u, 1929u, 1000u, 998u}},
    {20u, {false, 4082u}, {1000u, 0u}, {0u, 2u, 19u, 1929u, 1929u, 1000u, 1000u}},
    {1u, {false, 4082u}, {1000u, 1u}, {0u, 3u, 0u, 1929u, 1929u, 1000u, 1000u}},
    {99u, {false, 2373u}, {1000u, 1u}, {99u, 3u, 30u, 2373u, 2373u, 1000u, 1000u}},
    {1u, {false, 2373u}, {998u, 0u}, {100u, 1u, 0u, 2373u, 2373u, 0u, 998u}},
    {1u, {false, 2045u}, {996u, 0u}, {100u, 1u, 1u, 2045u, 2373u, 0u, 996u}},
    {1u, {false, 2045u}, {994u, 0u}, {100u, 1u, 2u, 2045u, 2045u, 558u, 994u}},
    {1u, {false, 2045u}, {992u, 0u}, {100u, 1u, 3u, 2045u, 2045u, 558u, 992u}},
    {1u, {false, 2045u}, {990u, 0u}, {100u, 1u, 4u, 2045u, 2045u, 558u, 990u}},
    {1u, {false, 2045u}, {988u, 0u}, {100u, 1u, 5u, 2045u, 2045u, 558u, 988u}},
    {1u, {false, 2045u}, {986u, 0u}, {100u, 1u, 6u, 2045u, 2045u, 558u, 986u}},
    {1u, {false, 2045u}, {984u, 0u}, {100u, 1u, 7u, 2045u, 2045u, 558u, 984u}},
    {1u, {false, 2045u}, {982u, 0u}, {100u, 1u, 8u, 2045u, 2045u, 558u, 982u}},
    {1u, {false, 2045u}, {980u, 0u}, {100u, 1u, 9u, 2045u, 2045u, 558u, 980u}},
    {1u, {false, 2045u}, {978u, 0u}, {100u, 1u, 10u, 2045u, 2045u, 558u, 978u}},
    {1u, {false, 2045u}, {976u, 0u}, {100u, 1u, 11u, 2045u, 2045u, 558u, 976u}},
    {1u, {false, 2045u}, {974u, 0u}, {100u, 1u, 12u, 2045u, 2045u, 558u, 974u}},
    {1u, {false, 2045u}, {972u, 0u}, {100u, 1u, 13u, 2045u, 2045u, 558u, 972u}},
    {1u, {false, 2045u}, {970u, 0u}, {100u, 1u, 14u, 2045u, 2045u, 558u, 970u}},
    {1u, {false, 2045u}, {968u, 0u}, {100u, 1u, 15u, 2045u, 2045u, 558u, 968u}},
    {1u, {false, 2045u}, {966u, 0u}, {100u, 1u, 16u, 2045u, 2045u, 558u, 966u}},
    {1u, {false, 2045u}, {964u, 0u}, {100u, 1u, 17u, 2045u, 2045u, 558u, 964u}},
    {1u, {false, 2045u}, {962u, 0u}, {100u, 1u, 18u, 2045u, 2045u, 558u, 962u}},
    {1u, {false, 2045u}, {960u, 0u}, {100u, 1u, 19u, 2045u, 2045u, 558u, 960u}},
    {1u, {false, 2045u}, {958u, 0u}, {100u, 1u, 20u, 2045u, 2045u, 558u, 958u}},
    {1u, {false, 2045u}, {956u, 0u}, {100u, 1u, 21u, 2045u, 2045u, 558u, 956u}},
    {1u, {false, 2045u}, {954u, 0u}, {100u, 1u, 22u, 2045u, 2045u, 558u, 954u}},
    {1u, {false, 2045u}, {952u, 0u}, {100u, 1u, 23u, 2045u, 2045u, 558u, 952u}},
    {1u, {false, 2045u}, {950u, 0u}, {100u, 1u, 24u, 2045u, 2045u, 558u, 950u}},
    {1u, {false, 2045u}, {948u, 0u}, {100u, 1u, 25u, 2045u, 2045u, 558u, 948u}},
    {1u, {false, 2045u}, {946u, 0u}, {100u, 1u, 26u, 2045u, 2045u, 558u, 946u}},
    {1u, {false, 2045u}, {944u, 0u}, {100u, 1u, 27u, 2045u, 2045u, 558u, 944u}},
    {1u, {false, 2045u}, {942u, 0u}, {100u, 1u, 28u, 2045u, 2045u, 558u, 942u}},
    {1u, {false, 2045u}, {940u, 0u}, {100u, 1u, 29u, 2045u, 2045u, 558u, 940u}},
    {1u, {false, 2045u}, {938u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 938u}},
    {1u, {false, 2045u}, {936u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 936u}},
    {1u, {false, 2045u}, {934u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 934u}},
    {1u, {false, 2045u}, {932u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 932u}},
    {1u, {false, 2045u}, {930u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 930u}},
    {1u, {false, 2045u}, {928u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 928u}},
    {1u, {false, 2045u}, {926u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 926u}},
    {1u, {false, 2045u}, {924u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 924u}},
    {1u, {false, 2045u}, {922u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 922u}},
    {1u, {false, 2045u}, {920u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 920u}},
    {1u, {false, 2045u}, {918u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 918u}},
    {1u, {false, 2045u}, {916u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 916u}},
    {1u, {false, 2045u}, {914u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 914u}},
    {1u, {false, 2045u}, {912u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 912u}},
    {1u, {false, 2045u}, {910u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 910u}},
    {1u, {false, 2045u}, {908u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 908u}},
    {1u, {false, 2045u}, {906u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 906u}},
    {1u, {false, 2045u}, {904u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 904u}},
    {1u, {false, 2045u}, {902u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 902u}},
    {1u, {false, 2045u}, {900u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 900u}},
    {1u, {false, 2045u}, {898u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 898u}},
    {1u, {false, 2045u}, {896u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 896u}},
    {1u, {false, 2045u}, {894u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 894u}},
    {1u, {false, 2045u}, {892u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 892u}},
    {1u, {false, 2045u}, {890u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 890u}},
    {1u, {false, 2045u}, {888u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 888u}},
    {1u, {false, 2045u}, {886u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 886u}},
    {1u, {false, 2045u}, {884u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 884u}},
    {1u, {false, 2045u}, {882u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 882u}},
    {1u, {false, 2045u}, {880u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 880u}},
    {1u, {false, 2045u}, {878u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 878u}},
    {1u, {false, 2045u}, {876u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 876u}},
    {1u, {false, 2045u}, {874u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 874u}},
    {1u, {false, 2045u}, {872u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 872u}},
    {1u, {false, 2045u}, {870u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 870u}},
    {1u, {false, 2045u}, {868u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 868u}},
    {1u, {false, 2045u}, {866u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 866u}},
    {1u, {false, 2045u}, {864u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 864u}},
    {1u, {false, 2045u}, {862u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 862u}},
    {1u, {false, 2045u}, {860u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 860u}},
    {1u, {false, 2045u}, {858u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 858u}},
    {1u, {false, 2045u}, {856u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 856u}},
    {1u, {false, 2045u}, {854u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 854u}},
    {1u, {false, 2045u}, {852u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 852u}},
    {1u, {false, 2045u}, {850u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 850u}},
    {1u, {false, 2045u}, {848u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 848u}},
    {1u, {false, 2045u}, {846u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 846u}},
    {1u, {false, 2045u}, {844u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 844u}},
    {1u, {false, 2045u}, {842u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 842u}},
    {1u, {false, 2045u}, {840u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 840u}},
    {1u, {false, 2045u}, {838u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 838u}},
    {1u, {false, 2045u}, {836u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 836u}},
    {1u, {false, 2045u}, {834u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 834u}},
    {1u, {false, 2045u}, {832u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 832u}},
    {1u, {false, 2045u}, {830u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 830u}},
    {1u, {false, 2045u}, {828u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 828u}},
    {1u, {false, 2045u}, {826u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 826u}},
    {1u, {false, 2045u}, {824u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 824u}},
    {1u, {false, 2045u}, {822u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 822u}},
    {1u, {false, 2045u}, {820u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 820u}},
    {1u, {false, 2045u}, {818u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 818u}},
    {1u, {false, 2045u}, {816u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 816u}},
    {1u, {false, 2045u}, {814u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 814u}},
    {1u, {false, 2045u}, {812u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 812u}},
    {1u, {false, 2045u}, {810u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 810u}},
    {1u, {false, 2045u}, {808u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 808u}},
    {1u, {false, 2045u}, {806u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 806u}},
    {1u, {false, 2045u}, {804u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 804u}},
    {1u, {false, 2045u}, {802u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 802u}},
    {1u, {false, 2045u}, {800u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 800u}},
    {1u, {false, 2045u}, {798u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 798u}},
    {1u, {false, 2045u}, {796u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 796u}},
    {1u, {false, 2045u}, {794u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 794u}},
    {1u, {false, 2045u}, {792u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 792u}},
    {1u, {false, 2045u}, {790u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 790u}},
    {1u, {false, 2045u}, {788u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 788u}},
    {1u, {false, 2045u}, {786u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 786u}},
    {1u, {false, 2045u}, {784u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 784u}},
    {1u, {false, 2045u}, {782u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 782u}},
    {1u, {false, 2045u}, {780u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 780u}},
    {1u, {false, 2045u}, {778u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 778u}},
    {1u, {false, 2045u}, {776u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 776u}},
    {1u, {false, 2045u}, {774u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 774u}},
    {1u, {false, 2045u}, {772u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 772u}},
    {1u, {false, 2045u}, {770u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 770u}},
    {1u, {false, 2045u}, {768u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 768u}},
    {1u, {false, 2045u}, {766u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 766u}},
    {1u, {false, 2045u}, {764u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 764u}},
    {1u, {false, 2045u}, {762u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 762u}},
    {1u, {false, 2045u}, {760u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 760u}},
    {1u, {false, 2045u}, {758u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 758u}},
    {1u, {false, 2045u}, {756u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 756u}},
    {1u, {false, 2045u}, {754u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 754u}},
    {1u, {false, 2045u}, {752u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 752u}},
    {1u, {false, 2045u}, {750u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 750u}},
    {1u, {false, 2045u}, {748u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 748u}},
    {1u, {false, 2045u}, {746u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 746u}},
    {1u, {false, 2045u}, {744u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 744u}},
    {1u, {false, 2045u}, {742u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 742u}},
    {1u, {false, 2045u}, {740u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 740u}},
    {1u, {false, 2045u}, {738u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 738u}},
    {1u, {false, 2045u}, {736u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 736u}},
    {1u, {false, 2045u}, {734u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 734u}},
    {1u, {false, 2045u}, {732u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 732u}},
    {1u, {false, 2045u}, {730u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 730u}},
    {1u, {false, 2045u}, {728u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 728u}},
    {1u, {false, 2045u}, {726u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 726u}},
    {1u, {false, 2045u}, {724u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 724u}},
    {1u, {false, 2045u}, {722u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 722u}},
    {1u, {false, 2045u}, {720u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 720u}},
    {1u, {false, 2045u}, {718u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 718u}},
    {1u, {false, 2045u}, {716u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 716u}},
    {1u, {false, 2045u}, {714u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 714u}},
    {1u, {false, 2045u}, {712u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 712u}},
    {1u, {false, 2045u}, {710u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 710u}},
    {1u, {false, 2045u}, {708u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 708u}},
    {1u, {false, 2045u}, {706u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 706u}},
    {1u, {false, 2045u}, {704u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 704u}},
    {1u, {false, 2045u}, {702u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 702u}},
    {1u, {false, 2045u}, {700u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 700u}},
    {1u, {false, 2045u}, {698u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 698u}},
    {1u, {false, 2045u}, {696u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 696u}},
    {1u, {false, 2045u}, {694u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 694u}},
    {1u, {false, 2045u}, {692u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 692u}},
    {1u, {false, 2045u}, {690u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 690u}},
    {1u, {false, 2045u}, {688u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 688u}},
    {1u, {false, 2045u}, {686u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 686u}},
    {1u, {false, 2045u}, {684u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 684u}},
    {1u, {false, 2045u}, {682u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 682u}},
    {1u, {false, 2045u}, {680u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 680u}},
    {1u, {false, 2045u}, {678u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 678u}},
    {1u, {false, 2045u}, {676u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 676u}},
    {1u, {false, 2045u}, {674u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 674u}},
    {1u, {false, 2045u}, {672u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 672u}},
    {1u, {false, 2045u}, {670u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 670u}},
    {1u, {false, 2045u}, {668u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 668u}},
    {1u, {false, 2045u}, {666u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 666u}},
    {1u, {false, 2045u}, {664u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 664u}},
    {1u, {false, 2045u}, {662u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 662u}},
    {1u, {false, 2045u}, {660u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 660u}},
    {1u, {false, 2045u}, {658u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 658u}},
    {1u, {false, 2045u}, {656u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 656u}},
    {1u, {false, 2045u}, {654u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 654u}},
    {1u, {false, 2045u}, {652u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 652u}},
    {1u, {false, 2045u}, {650u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 650u}},
    {1u, {false, 2045u}, {648u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 648u}},
    {1u, {false, 2045u}, {646u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 646u}},
    {1u, {false, 2045u}, {644u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 644u}},
    {1u, {false, 2045u}, {642u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 642u}},
    {1u, {false, 2045u}, {640u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 640u}},
    {1u, {false, 2045u}, {638u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 638u}},
    {1u, {false, 2045u}, {636u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 636u}},
    {1u, {false, 2045u}, {634u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 634u}},
    {1u, {false, 2045u}, {632u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 632u}},
    {1u, {false, 2045u}, {630u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 630u}},
    {1u, {false, 2045u}, {628u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 628u}},
    {1u, {false, 2045u}, {626u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 626u}},
    {1u, {false, 2045u}, {624u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 624u}},
    {1u, {false, 2045u}, {622u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 622u}},
    {1u, {false, 2045u}, {620u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 620u}},
    {1u, {false, 2045u}, {618u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 618u}},
    {1u, {false, 2045u}, {616u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 616u}},
    {1u, {false, 2045u}, {614u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 614u}},
    {1u, {false, 2045u}, {612u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 612u}},
    {1u, {false, 2045u}, {610u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 610u}},
    {1u, {false, 2045u}, {608u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 608u}},
    {1u, {false, 2045u}, {606u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 606u}},
    {1u, {false, 2045u}, {604u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 604u}},
    {1u, {false, 2045u}, {602u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 602u}},
    {1u, {false, 2045u}, {600u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 600u}},
    {1u, {false, 2045u}, {598u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 598u}},
    {1u, {false, 2045u}, {596u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 596u}},
    {1u, {false, 2045u}, {594u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 594u}},
    {1u, {false, 2045u}, {592u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 592u}},
    {1u, {false, 2045u}, {590u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 590u}},
    {1u, {false, 2045u}, {588u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 588u}},
    {1u, {false, 2045u}, {586u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 586u}},
    {1u, {false, 2045u}, {584u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 584u}},
    {1u, {false, 2045u}, {582u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 582u}},
    {1u, {false, 2045u}, {580u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 580u}},
    {1u, {false, 2045u}, {578u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 578u}},
    {1u, {false, 2045u}, {576u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 576u}},
    {1u, {false, 2045u}, {574u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 574u}},
    {1u, {false, 2045u}, {572u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 572u}},
    {1u, {false, 2045u}, {570u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 570u}},
    {1u, {false, 2045u}, {568u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 568u}},
    {1u, {false, 2045u}, {566u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 566u}},
    {1u, {false, 2045u}, {564u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 564u}},
    {1u, {false, 2045u}, {562u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 562u}},
    {1u, {false, 2045u}, {560u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 560u}},
    {12u, {false, 2045u}, {558u, 0u}, {100u, 1u, 30u, 2045u, 2045u, 558u, 558u}},
    {1u, {false, 2852u}, {558u, 0u}, {100u, 1u, 30u, 2852u, 2045u, 558u, 558u}},
    {1u, {false, 2852u}, {556u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 556u}},
    {1u, {false, 2852u}, {554u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 554u}},
    {1u, {false, 2852u}, {552u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 552u}},
    {1u, {false, 2852u}, {550u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 550u}},
    {1u, {false, 2852u}, {548u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 548u}},
    {1u, {false, 2852u}, {546u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 546u}},
    {1u, {false, 2852u}, {544u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 544u}},
    {1u, {false, 2852u}, {542u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 542u}},
    {1u, {false, 2852u}, {540u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 540u}},
    {1u, {false, 2852u}, {538u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 538u}},
    {1u, {false, 2852u}, {536u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 536u}},
    {1u, {false, 2852u}, {534u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 534u}},
    {1u, {false, 2852u}, {532u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 532u}},
    {1u, {false, 2852u}, {530u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 530u}},
    {1u, {false, 2852u}, {528u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 528u}},
    {1u, {false, 2852u}, {526u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 526u}},
    {1u, {false, 2852u}, {524u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 524u}},
    {1u, {false, 2852u}, {522u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 522u}},
    {1u, {false, 2852u}, {520u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 520u}},
    {1u, {false, 2852u}, {518u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 518u}},
    {1u, {false, 2852u}, {516u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 516u}},
    {1u, {false, 2852u}, {514u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 514u}},
    {1u, {false, 2852u}, {512u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 512u}},
    {1u, {false, 2852u}, {510u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 510u}},
    {1u, {false, 2852u}, {508u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 508u}},
    {1u, {false, 2852u}, {506u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 506u}},
    {1u, {false, 2852u}, {504u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 504u}},
    {1u, {false, 2852u}, {502u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 502u}},
    {1u, {false, 2852u}, {500u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 500u}},
    {1u, {false, 2852u}, {498u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 498u}},
    {1u, {false, 2852u}, {496u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 496u}},
    {1u, {false, 2852u}, {494u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 494u}},
    {1u, {false, 2852u}, {492u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 492u}},
    {1u, {false, 2852u}, {490u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 490u}},
    {1u, {false, 2852u}, {488u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 488u}},
    {1u, {false, 2852u}, {486u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 486u}},
    {1u, {false, 2852u}, {484u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 484u}},
    {1u, {false, 2852u}, {482u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 482u}},
    {1u, {false, 2852u}, {480u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 480u}},
    {1u, {false, 2852u}, {478u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 478u}},
    {1u, {false, 2852u}, {476u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 476u}},
    {1u, {false, 2852u}, {474u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 474u}},
    {1u, {false, 2852u}, {472u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 472u}},
    {1u, {false, 2852u}, {470u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 470u}},
    {1u, {false, 2852u}, {468u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 468u}},
    {1u, {false, 2852u}, {466u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 466u}},
    {1u, {false, 2852u}, {464u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 464u}},
    {1u, {false, 2852u}, {462u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 462u}},
    {1u, {false, 2852u}, {460u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 460u}},
    {1u, {false, 2852u}, {458u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 458u}},
    {1u, {false, 2852u}, {456u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 456u}},
    {1u, {false, 2852u}, {454u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 454u}},
    {1u, {false, 2852u}, {452u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 452u}},
    {1u, {false, 2852u}, {450u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 450u}},
    {1u, {false, 2852u}, {448u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 448u}},
    {1u, {false, 2852u}, {446u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 446u}},
    {1u, {false, 2852u}, {444u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 444u}},
    {1u, {false, 2852u}, {442u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 442u}},
    {1u, {false, 2852u}, {440u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 440u}},
    {1u, {false, 2852u}, {438u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 438u}},
    {1u, {false, 2852u}, {436u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 436u}},
    {1u, {false, 2852u}, {434u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 434u}},
    {1u, {false, 2852u}, {432u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 432u}},
    {1u, {false, 2852u}, {430u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 430u}},
    {1u, {false, 2852u}, {428u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 428u}},
    {1u, {false, 2852u}, {426u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 426u}},
    {1u, {false, 2852u}, {424u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 424u}},
    {1u, {false, 2852u}, {422u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 422u}},
    {1u, {false, 2852u}, {420u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 420u}},
    {1u, {false, 2852u}, {418u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 418u}},
    {1u, {false, 2852u}, {416u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 416u}},
    {1u, {false, 2852u}, {414u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 414u}},
    {1u, {false, 2852u}, {412u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 412u}},
    {1u, {false, 2852u}, {410u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 410u}},
    {1u, {false, 2852u}, {408u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 408u}},
    {1u, {false, 2852u}, {406u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 406u}},
    {1u, {false, 2852u}, {404u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 404u}},
    {1u, {false, 2852u}, {402u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 402u}},
    {1u, {false, 2852u}, {400u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 400u}},
    {1u, {false, 2852u}, {398u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 398u}},
    {1u, {false, 2852u}, {396u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 396u}},
    {1u, {false, 2852u}, {394u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 394u}},
    {1u, {false, 2852u}, {392u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 392u}},
    {1u, {false, 2852u}, {390u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 390u}},
    {1u, {false, 2852u}, {388u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 388u}},
    {1u, {false, 2852u}, {386u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 386u}},
    {1u, {false, 2852u}, {384u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 384u}},
    {1u, {false, 2852u}, {382u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 382u}},
    {1u, {false, 2852u}, {380u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 380u}},
    {1u, {false, 2852u}, {378u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 378u}},
    {1u, {false, 2852u}, {376u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 376u}},
    {1u, {false, 2852u}, {374u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 374u}},
    {1u, {false, 2852u}, {372u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 372u}},
    {1u, {false, 2852u}, {370u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 370u}},
    {1u, {false, 2852u}, {368u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 368u}},
    {1u, {false, 2852u}, {366u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 366u}},
    {1u, {false, 2852u}, {364u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 364u}},
    {1u, {false, 2852u}, {362u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 362u}},
    {1u, {false, 2852u}, {360u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 360u}},
    {1u, {false, 2852u}, {358u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 358u}},
    {1u, {false, 2852u}, {356u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 356u}},
    {1u, {false, 2852u}, {354u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 354u}},
    {1u, {false, 2852u}, {352u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 352u}},
    {1u, {false, 2852u}, {350u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 350u}},
    {1u, {false, 2852u}, {348u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 348u}},
    {1u, {false, 2852u}, {346u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 346u}},
    {1u, {false, 2852u}, {344u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 344u}},
    {1u, {false, 2852u}, {342u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 342u}},
    {1u, {false, 2852u}, {340u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 340u}},
    {1u, {false, 2852u}, {338u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 338u}},
    {1u, {false, 2852u}, {336u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 336u}},
    {1u, {false, 2852u}, {334u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 334u}},
    {1u, {false, 2852u}, {332u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 332u}},
    {1u, {false, 2852u}, {330u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 330u}},
    {1u, {false, 2852u}, {328u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 328u}},
    {1u, {false, 2852u}, {326u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 326u}},
    {1u, {false, 2852u}, {324u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 324u}},
    {1u, {false, 2852u}, {322u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 322u}},
    {1u, {false, 2852u}, {320u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 320u}},
    {1u, {false, 2852u}, {318u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 318u}},
    {1u, {false, 2852u}, {316u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 316u}},
    {1u, {false, 2852u}, {314u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 314u}},
    {1u, {false, 2852u}, {312u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 312u}},
    {1u, {false, 2852u}, {310u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 310u}},
    {1u, {false, 2852u}, {308u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 308u}},
    {1u, {false, 2852u}, {306u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 306u}},
    {1u, {false, 2852u}, {304u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 304u}},
    {1u, {false, 2852u}, {302u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 302u}},
    {1u, {false, 2852u}, {300u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 300u}},
    {1u, {false, 2852u}, {298u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 298u}},
    {1u, {false, 2852u}, {296u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 296u}},
    {1u, {false, 2852u}, {294u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 294u}},
    {1u, {false, 2852u}, {292u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 292u}},
    {1u, {false, 2852u}, {290u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 290u}},
    {1u, {false, 2852u}, {288u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 288u}},
    {1u, {false, 2852u}, {286u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 286u}},
    {1u, {false, 2852u}, {284u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 284u}},
    {1u, {false, 2852u}, {282u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 282u}},
    {1u, {false, 2852u}, {280u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 280u}},
    {1u, {false, 2852u}, {278u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 278u}},
    {1u, {false, 2852u}, {276u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 276u}},
    {1u, {false, 2852u}, {274u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 274u}},
    {1u, {false, 2852u}, {272u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 272u}},
    {1u, {false, 2852u}, {270u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 270u}},
    {1u, {false, 2852u}, {268u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 268u}},
    {1u, {false, 2852u}, {266u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 266u}},
    {1u, {false, 2852u}, {264u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 264u}},
    {1u, {false, 2852u}, {262u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 262u}},
    {1u, {false, 2852u}, {260u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 260u}},
    {1u, {false, 2852u}, {258u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 258u}},
    {1u, {false, 2852u}, {256u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 256u}},
    {1u, {false, 2852u}, {254u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 254u}},
    {1u, {false, 2852u}, {252u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 252u}},
    {1u, {false, 2852u}, {250u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 250u}},
    {1u, {false, 2852u}, {248u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 248u}},
    {1u, {false, 2852u}, {246u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 246u}},
    {1u, {false, 2852u}, {244u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 244u}},
    {1u, {false, 2852u}, {242u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 242u}},
    {1u, {false, 2852u}, {240u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 240u}},
    {1u, {false, 2852u}, {238u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 238u}},
    {1u, {false, 2852u}, {236u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 236u}},
    {1u, {false, 2852u}, {234u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 234u}},
    {1u, {false, 2852u}, {232u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 232u}},
    {1u, {false, 2852u}, {230u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 230u}},
    {1u, {false, 2852u}, {228u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 228u}},
    {1u, {false, 2852u}, {226u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 226u}},
    {1u, {false, 2852u}, {224u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 224u}},
    {1u, {false, 2852u}, {222u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 222u}},
    {1u, {false, 2852u}, {220u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 220u}},
    {1u, {false, 2852u}, {218u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 218u}},
    {1u, {false, 2852u}, {216u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 216u}},
    {1u, {false, 2852u}, {214u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 214u}},
    {1u, {false, 2852u}, {212u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 212u}},
    {1u, {false, 2852u}, {210u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 210u}},
    {1u, {false, 2852u}, {208u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 208u}},
    {1u, {false, 2852u}, {206u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 206u}},
    {1u, {false, 2852u}, {204u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 204u}},
    {1u, {false, 2852u}, {202u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 202u}},
    {1u, {false, 2852u}, {200u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 200u}},
    {1u, {false, 2852u}, {198u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 198u}},
    {1u, {false, 2852u}, {196u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 196u}},
    {1u, {false, 2852u}, {194u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 194u}},
    {1u, {false, 2852u}, {192u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 192u}},
    {1u, {false, 2852u}, {190u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 190u}},
    {1u, {false, 2852u}, {188u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 188u}},
    {1u, {false, 2852u}, {186u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 186u}},
    {1u, {false, 2852u}, {184u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 184u}},
    {1u, {false, 2852u}, {182u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 182u}},
    {1u, {false, 2852u}, {180u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 180u}},
    {1u, {false, 2852u}, {178u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 178u}},
    {1u, {false, 2852u}, {176u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 176u}},
    {1u, {false, 2852u}, {174u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 174u}},
    {1u, {false, 2852u}, {172u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 172u}},
    {1u, {false, 2852u}, {170u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 170u}},
    {1u, {false, 2852u}, {168u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 168u}},
    {1u, {false, 2852u}, {166u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 166u}},
    {1u, {false, 2852u}, {164u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 164u}},
    {1u, {false, 2852u}, {162u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 162u}},
    {1u, {false, 2852u}, {160u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 160u}},
    {1u, {false, 2852u}, {158u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 158u}},
    {1u, {false, 2852u}, {156u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 156u}},
    {1u, {false, 2852u}, {154u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 154u}},
    {1u, {false, 2852u}, {152u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 152u}},
    {1u, {false, 2852u}, {150u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 150u}},
    {1u, {false, 2852u}, {148u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 148u}},
    {1u, {false, 2852u}, {146u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 146u}},
    {1u, {false, 2852u}, {144u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 144u}},
    {1u, {false, 2852u}, {142u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 142u}},
    {1u, {false, 2852u}, {140u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 140u}},
    {1u, {false, 2852u}, {138u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 138u}},
    {1u, {false, 2852u}, {136u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 136u}},
    {1u, {false, 2852u}, {134u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 134u}},
    {1u, {false, 2852u}, {132u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 132u}},
    {1u, {false, 2852u}, {130u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 130u}},
    {1u, {false, 2852u}, {128u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 128u}},
    {1u, {false, 2852u}, {126u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 126u}},
    {1u, {false, 2852u}, {124u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 124u}},
    {1u, {false, 2852u}, {122u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 122u}},
    {1u, {false, 2852u}, {120u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 120u}},
    {1u, {false, 2852u}, {118u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 118u}},
    {1u, {false, 2852u}, {116u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 116u}},
    {1u, {false, 2852u}, {114u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 114u}},
    {1u, {false, 2852u}, {112u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 112u}},
    {1u, {false, 2852u}, {110u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 110u}},
    {1u, {false, 2852u}, {108u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 108u}},
    {1u, {false, 2852u}, {106u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 106u}},
    {1u, {false, 2852u}, {104u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 104u}},
    {1u, {false, 2852u}, {102u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 102u}},
    {1u, {false, 2852u}, {100u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 100u}},
    {1u, {false, 2852u}, {98u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 98u}},
    {1u, {false, 2852u}, {96u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 96u}},
    {1u, {false, 2852u}, {94u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 94u}},
    {1u, {false, 2852u}, {92u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 92u}},
    {1u, {false, 2852u}, {90u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 90u}},
    {1u, {false, 2852u}, {88u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 88u}},
    {1u, {false, 2852u}, {86u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 86u}},
    {1u, {false, 2852u}, {84u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 84u}},
    {1u, {false, 2852u}, {82u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 82u}},
    {1u, {false, 2852u}, {80u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 80u}},
    {1u, {false, 2852u}, {78u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 78u}},
    {1u, {false, 2852u}, {76u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 76u}},
    {1u, {false, 2852u}, {74u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 74u}},
    {1u, {false, 2852u}, {72u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 72u}},
    {1u, {false, 2852u}, {70u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 70u}},
    {1u, {false, 2852u}, {68u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 68u}},
    {1u, {false, 2852u}, {66u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 66u}},
    {1u, {false, 2852u}, {64u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 64u}},
    {1u, {false, 2852u}, {62u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 62u}},
    {1u, {false, 2852u}, {60u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 60u}},
    {1u, {false, 2852u}, {58u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 58u}},
    {1u, {false, 2852u}, {56u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 56u}},
    {1u, {false, 2852u}, {54u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 54u}},
    {1u, {false, 2852u}, {52u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 52u}},
    {1u, {false, 2852u}, {50u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 50u}},
    {1u, {false, 2852u}, {48u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 48u}},
    {1u, {false, 2852u}, {46u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 46u}},
    {1u, {false, 2852u}, {44u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 44u}},
    {1u, {false, 2852u}, {42u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 42u}},
    {1u, {false, 2852u}, {40u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 40u}},
    {1u, {false, 2852u}, {38u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 38u}},
    {1u, {false, 2852u}, {36u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 36u}},
    {1u, {false, 2852u}, {34u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 34u}},
    {1u, {false, 2852u}, {32u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 32u}},
    {1u, {false, 2852u}, {30u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 30u}},
    {1u, {false, 2852u}, {28u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 28u}},
    {1u, {false, 2852u}, {26u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 26u}},
    {1u, {false, 2852u}, {24u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 24u}},
    {1u, {false, 2852u}, {22u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 22u}},
    {1u, {false, 2852u}, {20u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 20u}},
    {1u, {false, 2852u}, {18u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 18u}},
    {1u, {false, 2852u}, {16u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 16u}},
    {1u, {false, 2852u}, {14u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 14u}},
    {1u, {false, 2852u}, {12u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 12u}},
    {1u, {false, 2852u}, {10u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 10u}},
    {1u, {false, 2852u}, {8u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 8u}},
    {1u, {false, 2852u}, {6u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 6u}},
    {1u, {false, 2852u}, {4u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 4u}},
    {1u, {false, 2852u}, {2u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 2u}},
    {1u, {false, 2852u}, {0u, 0u}, {100u, 1u, 30u, 2852u, 2852u, 0u, 0u}},
    {1u, {false, 1870u}, {0u, 0u}, {100u, 1u, 30u, 1870u, 2852u, 0u, 0u}},
    {1u, {false, 1870u}, {2u, 0u}, {100u, 1u, 30u, 1870u, 1870u, 1000u, 2u}},
    {1u, {false, 2275u}, {4u, 0u}, {100u, 1u, 30u, 2275u, 1870u, 1000u, 4u}},
    {1u, {false, 2274u}, {6u, 0u}, {100u, 1u, 30u, 2274u, 2275u, 162u, 6u}},
    {1u, {false, 804u}, {8u, 0u}, {100u, 1u, 30u, 804u, 2274u, 162u, 8u}},
    {1u, {false, 2309u}, {10u, 0u}, {100u, 1u, 30u, 2309u, 804u, 162u, 10u}},
    {1u, {false, 2309u}, {12u, 0u}, {100u, 1u, 30u, 2309u, 2309u, 78u, 12u}},
    {1u, {false, 2375u}, {14u, 0u}, {100u, 1u, 30u, 2375u, 2309u, 78u, 14u}},
    {1u, {false, 2310u}, {12u, 0u}, {100u, 1u, 30u, 2310u, 2375u, 0u, 12u}},
    {1u, {false, 2310u}, {10u, 0u}, {100u, 1u, 30u, 2310u, 2310u, 0u, 10u}},
    {1u, {true, 2309u}, {8u, 0u}, {100u, 1u, 30u, 2309u, 2310u, 0u, 8u}},
    {1u, {true, 2308u}, {6u, 0u}, {100u, 1u, 30u, 2308u, 2309u, 0u, 6u}},
    {1u, {true, 2307u}, {4u, 0u}, {100u, 1u, 30u, 2307u, 2308u, 0u, 4u}},
    {1u, {true, 2277u}, {2u, 0u}, {100u, 1u, 30u, 2277u, 2307u, 0u, 2u}},
    {2u, {true, 2277u}, {1u, 0u}, {100u, 1u, 30u, 2277u, 2277u, 1u, 1u}},
    {1u, {true, 2276u}, {1u, 0u}, {100u, 1u, 30u, 2276u, 2277u, 1u, 1u}},
    {1u, {true, 4080u}, {1u, 0u}, {100u, 1u, 30u, 4080u, 2276u, 1u, 1u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct genset1_remembered record;
};

static const struct vector vectors[] = {
    {0u, 225u, false, {0u}},
    {225u, 231u, false, {0u}},
    {231u, 232u, false, {0u}},
    {232u, 234u, false, {0u}},
    {234u, 238u, false, {0u}},
    {238u, 809u, false, {0u}},
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
