/* prover2_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Proving cabinet 2, bakehouse
 * Site: Corner Street Bakery
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 7623973e50583a795a5345b85802ca57bccc8dfe797083b1f42b0105bf0a05bb
 *
 * Replaces:
 * - cabinet_stat: snap disc behind the back panel
 *
 * Stays hard-wired, and must:
 * - cabinet_limit: second snap disc on the same panel, manual reset
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
 * Open findings: 1 limit_nuisance (act, cabinet_limit/overheating); 2 earth_fault_bypasses_limit
 * (act, prover2); 3 probe_out_of_pocket (act, cabinet_stat); 4 limit_error_budget (act,
 * cabinet_stat); 5 contact_life (act, heater); 6 model_beyond_evidence (act, prover2); 7
 * mercury_asbestos_refrigerant (act, cabinet_stat); 8 approval_lapses (act, prover2); 9
 * overshoot_not_determined (act, cabinet_limit/overheating). Not judged, for want of a figure: 1;
 * risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "prover2.h"

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

static void compare_out(const struct prover2_out *got, const struct prover2_out *wanted)
{
    compare("heater", (long)got->heater, (long)wanted->heater);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct prover2 *got, const struct prover2 *wanted)
{
    compare("cabinet_probe_good_for",
            (long)got->cabinet_probe_good_for,
            (long)wanted->cabinet_probe_good_for);
    compare("cabinet_probe_state",
            (long)got->cabinet_probe_state,
            (long)wanted->cabinet_probe_state);
    compare("cabinet_probe_state_for",
            (long)got->cabinet_probe_state_for,
            (long)wanted->cabinet_probe_state_for);
    compare("cabinet_probe_last", (long)got->cabinet_probe_last, (long)wanted->cabinet_probe_last);
    compare("cabinet_probe_before",
            (long)got->cabinet_probe_before,
            (long)wanted->cabinet_probe_before);
    compare("cabinet_stat_smoothed",
            (long)got->cabinet_stat_smoothed,
            (long)wanted->cabinet_stat_smoothed);
    compare("cabinet_stat", (long)got->cabinet_stat, (long)wanted->cabinet_stat);
    compare("heater", (long)got->heater, (long)wanted->heater);
    compare("heater_effect_from", (long)got->heater_effect_from, (long)wanted->heater_effect_from);
    compare("heater_effect_for", (long)got->heater_effect_for, (long)wanted->heater_effect_for);
    compare("heater_no_effect", (long)got->heater_no_effect, (long)wanted->heater_no_effect);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct prover2_in in;
    struct prover2_out out;
    struct prover2 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {0u}, {false, 0u}, {0u, 0u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {10u, {0u}, {false, 0u}, {0u, 0u, 11u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u}, {false, 1u}, {0u, 3u, 0u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u}, {false, 1u}, {0u, 3u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {11u, {0u}, {false, 1u}, {0u, 3u, 12u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {0u}, {false, 1u}, {0u, 3u, 12u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {30u}, {false, 1u}, {0u, 3u, 12u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {31u}, {false, 1u}, {1u, 3u, 12u, 31u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    /* vector 2 */
    {1u, {31u}, {false, 0u}, {1u, 0u, 1u, 31u, 0u, 63488u, 0u, 0u, 0u, 0u, false}},
    {1u, {31u}, {false, 0u}, {2u, 0u, 2u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {1u, {31u}, {false, 0u}, {3u, 0u, 3u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {1u, {31u}, {false, 0u}, {4u, 1u, 0u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {1u, {31u}, {false, 0u}, {5u, 1u, 1u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {35u, {31u}, {false, 0u}, {40u, 1u, 12u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {1u, {31u}, {false, 0u}, {40u, 1u, 12u, 31u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    {1u, {32u}, {false, 0u}, {40u, 1u, 12u, 32u, 31u, 63488u, 0u, 0u, 31u, 0u, false}},
    /* vector 3 */
    {2u, {32u}, {false, 0u}, {2u, 0u, 2u, 32u, 32u, UINT32_C(65536), 0u, 0u, 32u, 0u, false}},
    /* vector 4 */
    {2u, {515u}, {false, 0u}, {2u, 0u, 2u, 515u, 515u, UINT32_C(1054720), 0u, 0u, 515u, 0u, false}},
    {1u, {515u}, {false, 0u}, {3u, 0u, 3u, 515u, 515u, UINT32_C(1054720), 0u, 0u, 515u, 0u, false}},
    {1u, {515u}, {true, 0u}, {4u, 1u, 0u, 515u, 515u, UINT32_C(1054720), 1u, 1u, 515u, 0u, false}},
    {1u, {515u}, {true, 0u}, {5u, 1u, 1u, 515u, 515u, UINT32_C(1054720), 1u, 1u, 515u, 1u, false}},
    {736u, {515u}, {true, 0u}, {40u, 1u, 12u, 515u, 515u, UINT32_C(1054720), 1u, 1u, 515u, 737u,
     false}},
    {1u, {515u}, {false, 2u}, {40u, 1u, 12u, 515u, 515u, UINT32_C(1054720), 1u, 0u, 515u, 738u,
     true}},
    {1u, {515u}, {false, 2u}, {40u, 1u, 12u, 515u, 515u, UINT32_C(1054720), 1u, 0u, 515u, 0u,
     true}},
    {1u, {1015u}, {false, 2u}, {40u, 1u, 12u, 1015u, 515u, UINT32_C(1054720), 1u, 0u, 515u, 0u,
     true}},
    {1u, {1015u}, {false, 2u}, {40u, 1u, 12u, 1015u, 1015u, UINT32_C(1059250), 1u, 0u, 1015u, 0u,
     true}},
    {1u, {1016u}, {false, 2u}, {0u, 2u, 0u, 1015u, 1015u, UINT32_C(1063760), 1u, 0u, 1015u, 0u,
     true}},
    {1u, {0u}, {false, 2u}, {0u, 2u, 1u, 1015u, 1015u, UINT32_C(1068250), 1u, 0u, 1015u, 0u, true}},
    {1u, {882u}, {false, 2u}, {1u, 2u, 2u, 882u, 1015u, UINT32_C(1072721), 1u, 0u, 1015u, 0u,
     true}},
    {1u, {65535u}, {false, 2u}, {0u, 2u, 3u, 882u, 1015u, UINT32_C(1075967), 1u, 0u, 882u, 0u,
     true}},
    {1u, {1016u}, {false, 2u}, {0u, 2u, 4u, 882u, 1015u, UINT32_C(1079198), 1u, 0u, 882u, 0u,
     true}},
    {3u, {32u}, {false, 2u}, {3u, 2u, 7u, 32u, 32u, UINT32_C(1073437), 1u, 0u, 32u, 0u, true}},
    {1u, {1016u}, {false, 3u}, {0u, 3u, 0u, 32u, 32u, UINT32_C(65536), 0u, 0u, 32u, 0u, true}},
    {1u, {892u}, {false, 3u}, {1u, 3u, 1u, 892u, 32u, UINT32_C(65536), 0u, 0u, 32u, 0u, true}},
    {3u, {0u}, {false, 3u}, {0u, 3u, 4u, 892u, 32u, UINT32_C(1826816), 0u, 0u, 892u, 0u, true}},
    {1u, {882u}, {false, 3u}, {1u, 3u, 5u, 882u, 892u, UINT32_C(1806336), 0u, 0u, 882u, 0u, true}},
    {1u, {65535u}, {false, 3u}, {0u, 3u, 6u, 882u, 892u, UINT32_C(1806336), 0u, 0u, 882u, 0u,
     true}},
    {1u, {1016u}, {false, 3u}, {0u, 3u, 7u, 882u, 892u, UINT32_C(1806336), 0u, 0u, 882u, 0u, true}},
    {1u, {892u}, {false, 3u}, {1u, 3u, 8u, 892u, 882u, UINT32_C(1826816), 0u, 0u, 892u, 0u, true}},
    {38u, {892u}, {false, 3u}, {39u, 3u, 12u, 892u, 892u, UINT32_C(1826816), 0u, 0u, 892u, 0u,
     true}},
    {1u, {892u}, {false, 2u}, {40u, 1u, 0u, 892u, 892u, UINT32_C(1826816), 1u, 0u, 892u, 0u, true}},
    {25u, {892u}, {false, 2u}, {40u, 1u, 12u, 892u, 892u, UINT32_C(1826816), 1u, 0u, 892u, 0u,
     true}},
    {3u, {0u}, {false, 2u}, {0u, 2u, 2u, 892u, 892u, UINT32_C(1826816), 1u, 0u, 892u, 0u, true}},
    {1u, {882u}, {false, 2u}, {1u, 2u, 3u, 882u, 892u, UINT32_C(1826816), 1u, 0u, 892u, 0u, true}},
    {1u, {65535u}, {false, 2u}, {0u, 2u, 4u, 882u, 892u, UINT32_C(1826726), 1u, 0u, 882u, 0u,
     true}},
    {1u, {1016u}, {false, 2u}, {0u, 2u, 5u, 882u, 892u, UINT32_C(1826636), 1u, 0u, 882u, 0u, true}},
    {2u, {892u}, {false, 2u}, {2u, 2u, 7u, 892u, 892u, UINT32_C(1826636), 1u, 0u, 892u, 0u, true}},
    {1u, {892u}, {false, 3u}, {3u, 3u, 0u, 892u, 892u, UINT32_C(1826816), 0u, 0u, 892u, 0u, true}},
    /* vector 5 */
    {2u, {493u}, {false, 0u}, {2u, 0u, 2u, 493u, 493u, UINT32_C(1009664), 0u, 0u, 493u, 0u, false}},
    {35u, {646u}, {false, 0u}, {37u, 1u, 12u, 646u, 646u, UINT32_C(1053508), 0u, 0u, 646u, 0u,
     false}},
    {29u, {646u}, {true, 0u}, {40u, 1u, 12u, 646u, 646u, UINT32_C(1086015), 1u, 1u, 646u, 28u,
     false}},
    {1u, {637u}, {true, 0u}, {40u, 1u, 12u, 637u, 646u, UINT32_C(1087063), 1u, 1u, 646u, 29u,
     false}},
    {1u, {628u}, {true, 0u}, {40u, 1u, 12u, 628u, 637u, UINT32_C(1088025), 1u, 1u, 646u, 30u,
     false}},
    {1u, {0u}, {true, 0u}, {0u, 2u, 0u, 628u, 637u, UINT32_C(1088901), 1u, 1u, 628u, 0u, false}},
    {1u, {1014u}, {true, 0u}, {1u, 2u, 1u, 1014u, 628u, UINT32_C(1089855), 1u, 1u, 637u, 1u,
     false}},
    {3u, {769u}, {true, 0u}, {4u, 1u, 0u, 769u, 769u, UINT32_C(1096264), 1u, 1u, 769u, 4u, false}},
    {1u, {759u}, {true, 0u}, {5u, 1u, 1u, 759u, 769u, UINT32_C(1098381), 1u, 1u, 769u, 5u, false}},
    {1u, {493u}, {true, 0u}, {6u, 1u, 2u, 493u, 759u, UINT32_C(1100398), 1u, 1u, 759u, 0u, false}},
    {512u, {515u}, {true, 0u}, {40u, 1u, 12u, 515u, 515u, UINT32_C(1059539), 1u, 1u, 515u, 511u,
     false}},
    {54u, {399u}, {true, 0u}, {40u, 1u, 12u, 399u, 399u, UINT32_C(1008775), 1u, 1u, 399u, 52u,
     false}},
    {1u, {399u}, {false, 0u}, {40u, 1u, 12u, 399u, 399u, UINT32_C(1007928), 0u, 0u, 399u, 53u,
     false}},
    {11u, {1014u}, {false, 0u}, {40u, 1u, 12u, 1014u, 1014u, UINT32_C(1053474), 0u, 0u, 1014u, 0u,
     false}},
    {1u, {1025u}, {false, 0u}, {0u, 2u, 0u, 1014u, 1014u, UINT32_C(1058001), 0u, 0u, 1014u, 0u,
     false}},
    {1u, {1014u}, {false, 0u}, {1u, 2u, 1u, 1014u, 1014u, UINT32_C(1062508), 0u, 0u, 1014u, 0u,
     false}},
    {1u, {492u}, {false, 0u}, {2u, 2u, 2u, 492u, 1014u, UINT32_C(1066995), 0u, 0u, 1014u, 0u,
     false}},
    {1u, {1014u}, {false, 0u}, {3u, 2u, 3u, 1014u, 492u, UINT32_C(1071462), 0u, 0u, 1014u, 0u,
     false}},
    {1u, {1004u}, {true, 0u}, {4u, 1u, 0u, 1004u, 1014u, UINT32_C(1075819), 1u, 1u, 1004u, 0u,
     false}},
    {1u, {1012u}, {true, 0u}, {5u, 1u, 1u, 1012u, 1004u, UINT32_C(1080229), 1u, 1u, 1012u, 1u,
     false}},
    {2u, {1013u}, {true, 0u}, {7u, 1u, 3u, 1013u, 1013u, UINT32_C(1088999), 1u, 1u, 1013u, 3u,
     false}},
    {3u, {915u}, {true, 0u}, {10u, 1u, 6u, 915u, 915u, UINT32_C(1100251), 1u, 1u, 915u, 1u, false}},
    {1u, {923u}, {true, 0u}, {11u, 1u, 7u, 923u, 915u, UINT32_C(1103674), 1u, 1u, 915u, 2u, false}},
    {1u, {0u}, {true, 0u}, {0u, 2u, 0u, 923u, 915u, UINT32_C(1107154), 1u, 1u, 923u, 3u, false}},
    {7u, {65535u}, {true, 0u}, {0u, 2u, 7u, 923u, 915u, UINT32_C(1131088), 1u, 1u, 923u, 10u,
     false}},
    {14u, {65535u}, {false, 1u}, {0u, 3u, 12u, 923u, 915u, UINT32_C(1890304), 0u, 0u, 923u, 0u,
     false}},
    {1u, {922u}, {false, 1u}, {1u, 3u, 12u, 922u, 923u, UINT32_C(1888256), 0u, 0u, 922u, 0u,
     false}},
    {1u, {276u}, {false, 1u}, {2u, 3u, 12u, 276u, 922u, UINT32_C(1888256), 0u, 0u, 922u, 0u,
     false}},
    {1u, {515u}, {false, 1u}, {3u, 3u, 12u, 515u, 276u, UINT32_C(1054720), 0u, 0u, 515u, 0u,
     false}},
    {1u, {514u}, {false, 1u}, {4u, 3u, 12u, 514u, 515u, UINT32_C(1052672), 0u, 0u, 514u, 0u,
     false}},
    {1u, {522u}, {false, 1u}, {5u, 3u, 12u, 522u, 514u, UINT32_C(1054720), 0u, 0u, 515u, 0u,
     false}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct prover2_remembered record;
};

static const struct vector vectors[] = {
    {0u, 8u, false, {0u}},
    {8u, 16u, false, {0u}},
    {16u, 17u, false, {0u}},
    {17u, 48u, false, {0u}},
    {48u, 79u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct prover2 m;
    struct prover2_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    prover2_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            prover2_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct prover2 fresh =
    {0u, 0u, 0u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};

static void start_and_compare(const char *what, const struct prover2_remembered *r,
                              const struct prover2 *wanted)
{
    struct prover2 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    prover2_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct prover2 m;
    struct prover2_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", prover2_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", prover2_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct prover2 m;
    struct prover2_in in;
    struct prover2_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct prover2 after =
           {0u, 3u, 0u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 1u};

        doing = "cabinet_probe_state upset";
        prover2_start(&m, NULL);
        m.cabinet_probe_state = 4u;
        prover2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct prover2 after =
           {0u, 3u, 0u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 1u};

        doing = "cabinet_probe_state upset";
        prover2_start(&m, NULL);
        m.cabinet_probe_state = 255u;
        prover2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct prover2 after =
           {0u, 0u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 0u};

        doing = "cabinet_stat upset";
        prover2_start(&m, NULL);
        m.cabinet_stat = 2u;
        prover2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct prover2 after =
           {0u, 0u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 0u};

        doing = "cabinet_stat upset";
        prover2_start(&m, NULL);
        m.cabinet_stat = 255u;
        prover2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct prover2 after =
           {0u, 0u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 0u};

        doing = "heater upset";
        prover2_start(&m, NULL);
        m.heater = 2u;
        prover2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct prover2 after =
           {0u, 0u, 1u, 0u, 0u, 63488u, 0u, 0u, 0u, 0u, false};
        static const struct prover2_out wanted =
           {false, 0u};

        doing = "heater upset";
        prover2_start(&m, NULL);
        m.heater = 255u;
        prover2_step(&m, &in, &out);
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
