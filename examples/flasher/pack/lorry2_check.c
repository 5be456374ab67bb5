/* lorry2_check.c: recorded inputs through the program; runs on any host
 *
 * Equipment: Direction indicators, works lorry 2
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9b57bd1b3ccf44e7bb4451caf8de9eeb2e1e5406a9c8380d4f38058c2a8bb2be
 *
 * Replaces:
 * - flasher: thermal flasher behind the panel
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
 * Open findings: 1 danger_without_barrier (act, unseen_turn/left_lamps); 2 damp_dust_washdown (act,
 * lorry2); 3 approval_lapses (act, lorry2); 4 output_doubtful (act, left_lamps); 5 output_doubtful
 * (act, right_lamps). Not judged, for want of a figure: 4; risks.md says which.
 */
/* The recorded inputs visit every state and make every transition. */
#include "lorry2.h"

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

static void compare_out(const struct lorry2_out *got, const struct lorry2_out *wanted)
{
    compare("left_lamps", (long)got->left_lamps, (long)wanted->left_lamps);
    compare("right_lamps", (long)got->right_lamps, (long)wanted->right_lamps);
    compare("fault", (long)got->fault, (long)wanted->fault);
    verdict();
}

static void compare_state(const struct lorry2 *got, const struct lorry2 *wanted)
{
    compare("shunt_good_for", (long)got->shunt_good_for, (long)wanted->shunt_good_for);
    compare("shunt_state", (long)got->shunt_state, (long)wanted->shunt_state);
    compare("shunt_state_for", (long)got->shunt_state_for, (long)wanted->shunt_state_for);
    compare("shunt_last", (long)got->shunt_last, (long)wanted->shunt_last);
    compare("shunt_before", (long)got->shunt_before, (long)wanted->shunt_before);
    compare("flasher_lamp_out", (long)got->flasher_lamp_out, (long)wanted->flasher_lamp_out);
    compare("flasher_at", (long)got->flasher_at, (long)wanted->flasher_at);
    compare("flasher_dim", (long)got->flasher_dim, (long)wanted->flasher_dim);
    compare("left_lamps", (long)got->left_lamps, (long)wanted->left_lamps);
    compare("right_lamps", (long)got->right_lamps, (long)wanted->right_lamps);
    verdict();
}

/* Inputs held for so many steps; the outputs after each of them; the state after the last. */
struct row {
    uint32_t steps;
    struct lorry2_in in;
    struct lorry2_out out;
    struct lorry2 after;
};

static const struct row rows[] = {
    /* vector 1 */
    {1u, {false, false, 1014u}, {false, false, 0u}, {1u, 0u, 1u, 1014u, 0u, false, 32u, false, 0u,
     0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {2u, 0u, 2u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {22u, {false, false, 1014u}, {false, false, 0u}, {24u, 0u, 24u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {25u, 1u, 0u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {26u, 1u, 1u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {24u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 25u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 26u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {49u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 75u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 75u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {true, false, 1014u}, {true, false, 0u}, {50u, 1u, 75u, 1014u, 1014u, false, 0u, false, 1u,
     0u}},
    /* vector 2 */
    {1u, {true, false, 1014u}, {true, false, 0u}, {1u, 0u, 1u, 1014u, 0u, false, 0u, false, 1u,
     0u}},
    {1u, {true, false, 1014u}, {true, false, 0u}, {2u, 0u, 2u, 1014u, 1014u, false, 1u, false, 1u,
     0u}},
    {8u, {true, false, 1014u}, {true, false, 0u}, {10u, 0u, 10u, 1014u, 1014u, false, 9u, false, 1u,
     0u}},
    {7u, {true, false, 1014u}, {true, false, 0u}, {17u, 0u, 17u, 1014u, 1014u, false, 16u, false,
     1u, 0u}},
    {1u, {true, false, 1014u}, {false, false, 0u}, {18u, 0u, 18u, 1014u, 1014u, false, 17u, false,
     0u, 0u}},
    {1u, {true, false, 1014u}, {false, false, 0u}, {19u, 0u, 19u, 1014u, 1014u, false, 18u, false,
     0u, 0u}},
    {1u, {false, true, 1014u}, {false, false, 0u}, {20u, 0u, 20u, 1014u, 1014u, false, 19u, false,
     0u, 0u}},
    /* vector 3 */
    {1u, {false, true, 1014u}, {false, true, 0u}, {1u, 0u, 1u, 1014u, 0u, false, 0u, false, 0u,
     1u}},
    {1u, {false, true, 1014u}, {false, true, 0u}, {2u, 0u, 2u, 1014u, 1014u, false, 1u, false, 0u,
     1u}},
    {15u, {false, true, 1014u}, {false, true, 0u}, {17u, 0u, 17u, 1014u, 1014u, false, 16u, false,
     0u, 1u}},
    {1u, {false, true, 1014u}, {false, false, 0u}, {18u, 0u, 18u, 1014u, 1014u, false, 17u, false,
     0u, 0u}},
    {1u, {false, false, 1015u}, {false, false, 0u}, {19u, 0u, 19u, 1015u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1016u}, {false, false, 0u}, {0u, 0u, 20u, 1015u, 1014u, false, 32u, false,
     0u, 0u}},
    /* vector 4 */
    {1u, {false, false, 1016u}, {false, false, 0u}, {0u, 0u, 1u, 0u, 0u, false, 32u, false, 0u,
     0u}},
    {73u, {false, false, 1016u}, {false, false, 0u}, {0u, 0u, 74u, 0u, 0u, false, 32u, false, 0u,
     0u}},
    {1u, {false, false, 1016u}, {false, false, 1u}, {0u, 3u, 0u, 0u, 0u, false, 32u, false, 0u,
     0u}},
    {1u, {false, false, 1016u}, {false, false, 1u}, {0u, 3u, 1u, 0u, 0u, false, 32u, false, 0u,
     0u}},
    {1u, {false, false, 1014u}, {false, false, 1u}, {1u, 3u, 2u, 1014u, 0u, false, 32u, false, 0u,
     0u}},
    {2u, {false, true, 0u}, {false, true, 1u}, {3u, 3u, 4u, 0u, 0u, false, 1u, false, 0u, 1u}},
    {46u, {false, false, 1014u}, {false, false, 1u}, {49u, 3u, 50u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 0u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {17u, {false, false, 1014u}, {false, false, 0u}, {50u, 1u, 17u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {2u, {false, true, 0u}, {false, true, 0u}, {50u, 1u, 19u, 0u, 0u, false, 1u, false, 0u, 1u}},
    {1u, {false, true, 65535u}, {false, true, 0u}, {0u, 2u, 0u, 0u, 0u, false, 2u, false, 0u, 1u}},
    {1u, {false, true, 65535u}, {false, true, 0u}, {0u, 2u, 1u, 0u, 0u, false, 3u, false, 0u, 1u}},
    {13u, {false, true, 233u}, {false, true, 0u}, {13u, 2u, 14u, 233u, 233u, false, 16u, false, 0u,
     1u}},
    {11u, {false, true, 233u}, {false, false, 0u}, {24u, 2u, 25u, 233u, 233u, false, 27u, false, 0u,
     0u}},
    {1u, {false, false, 1015u}, {false, false, 0u}, {25u, 1u, 0u, 1015u, 233u, false, 32u, false,
     0u, 0u}},
    {26u, {false, false, 234u}, {false, false, 0u}, {50u, 1u, 26u, 234u, 234u, false, 32u, false,
     0u, 0u}},
    {2u, {false, true, 65535u}, {false, true, 0u}, {0u, 2u, 1u, 234u, 234u, false, 1u, false, 0u,
     1u}},
    {1u, {false, true, 1015u}, {false, true, 0u}, {1u, 2u, 2u, 1015u, 234u, false, 2u, false, 0u,
     1u}},
    {5u, {false, true, 233u}, {false, true, 0u}, {6u, 2u, 7u, 233u, 233u, false, 7u, false, 0u,
     1u}},
    {1u, {false, false, 233u}, {false, false, 0u}, {7u, 2u, 8u, 233u, 233u, false, 32u, false, 0u,
     0u}},
    {3u, {false, false, 1016u}, {false, false, 0u}, {0u, 2u, 11u, 233u, 233u, false, 32u, false, 0u,
     0u}},
    {2u, {false, false, 232u}, {false, false, 0u}, {2u, 2u, 13u, 232u, 232u, false, 32u, false, 0u,
     0u}},
    {36u, {false, false, 65535u}, {false, false, 0u}, {0u, 2u, 49u, 232u, 232u, false, 32u, false,
     0u, 0u}},
    {1u, {false, false, 1014u}, {false, false, 1u}, {1u, 3u, 0u, 1014u, 232u, false, 32u, false, 0u,
     0u}},
    /* vector 5 */
    {1u, {false, false, 1014u}, {false, false, 0u}, {1u, 0u, 1u, 1014u, 0u, false, 32u, false, 0u,
     0u}},
    {1u, {true, true, 1014u}, {true, true, 0u}, {2u, 0u, 2u, 1014u, 1014u, false, 0u, false, 1u,
     1u}},
    {2u, {true, true, 233u}, {true, true, 0u}, {4u, 0u, 4u, 233u, 233u, false, 2u, false, 1u, 1u}},
    {14u, {true, true, 0u}, {true, true, 0u}, {18u, 0u, 18u, 0u, 0u, false, 16u, false, 1u, 1u}},
    {16u, {true, true, 232u}, {false, false, 0u}, {34u, 1u, 9u, 232u, 232u, false, 32u, false, 0u,
     0u}},
    {9u, {true, true, 233u}, {true, true, 0u}, {43u, 1u, 18u, 233u, 233u, false, 8u, false, 1u,
     1u}},
    {7u, {true, true, 233u}, {true, true, 0u}, {50u, 1u, 25u, 233u, 233u, false, 15u, false, 1u,
     1u}},
    {2u, {false, false, 234u}, {false, false, 0u}, {50u, 1u, 27u, 234u, 234u, false, 32u, false, 0u,
     0u}},
    {17u, {true, false, 234u}, {true, false, 0u}, {50u, 1u, 44u, 234u, 234u, false, 16u, false, 1u,
     0u}},
    {16u, {true, true, 1014u}, {false, false, 0u}, {50u, 1u, 60u, 1014u, 1014u, false, 32u, false,
     0u, 0u}},
    {15u, {false, true, 234u}, {false, true, 0u}, {50u, 1u, 75u, 234u, 234u, false, 14u, false, 0u,
     1u}},
    {2u, {false, true, 233u}, {false, true, 0u}, {50u, 1u, 75u, 233u, 233u, false, 16u, true, 0u,
     1u}},
    {1u, {true, false, 0u}, {false, false, 0u}, {50u, 1u, 75u, 0u, 233u, false, 17u, true, 0u, 0u}},
    {1u, {false, false, 0u}, {false, false, 0u}, {50u, 1u, 75u, 0u, 0u, false, 32u, false, 0u, 0u}},
    {3u, {false, true, 233u}, {false, true, 0u}, {50u, 1u, 75u, 233u, 233u, false, 2u, false, 0u,
     1u}},
    {2u, {true, true, 233u}, {true, true, 0u}, {50u, 1u, 75u, 233u, 233u, false, 4u, false, 1u,
     1u}},
    {6u, {true, true, 0u}, {true, true, 0u}, {50u, 1u, 75u, 0u, 0u, false, 10u, false, 1u, 1u}},
    {5u, {true, false, 0u}, {true, false, 0u}, {50u, 1u, 75u, 0u, 0u, false, 15u, false, 1u, 0u}},
    {1u, {true, true, 0u}, {true, true, 0u}, {50u, 1u, 75u, 0u, 0u, false, 16u, true, 1u, 1u}},
    {5u, {true, true, 0u}, {false, false, 0u}, {50u, 1u, 75u, 0u, 0u, false, 21u, true, 0u, 0u}},
    {11u, {true, false, 0u}, {false, false, 0u}, {50u, 1u, 75u, 0u, 0u, false, 32u, true, 0u, 0u}},
    {1u, {true, false, 0u}, {true, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 0u, true, 1u, 0u}},
    {1u, {true, false, 0u}, {true, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 1u, true, 1u, 0u}},
    {7u, {true, false, 0u}, {true, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 8u, true, 1u, 0u}},
    {1u, {true, false, 0u}, {false, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 9u, true, 0u, 0u}},
    {7u, {true, false, 0u}, {false, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 16u, true, 0u, 0u}},
    {1u, {true, false, 0u}, {true, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 0u, true, 1u, 0u}},
    {1u, {false, false, 232u}, {false, false, 0u}, {50u, 1u, 75u, 232u, 0u, false, 32u, false, 0u,
     0u}},
    {2u, {true, false, 1u}, {true, false, 0u}, {50u, 1u, 75u, 1u, 1u, false, 1u, false, 1u, 0u}},
    {2u, {true, true, 1u}, {true, true, 0u}, {50u, 1u, 75u, 1u, 1u, false, 3u, false, 1u, 1u}},
    {12u, {true, true, 0u}, {true, true, 0u}, {50u, 1u, 75u, 0u, 0u, false, 15u, false, 1u, 1u}},
    {1u, {true, true, 233u}, {true, true, 0u}, {50u, 1u, 75u, 233u, 0u, false, 16u, true, 1u, 1u}},
    {16u, {false, true, 1015u}, {false, false, 0u}, {50u, 1u, 75u, 1015u, 1015u, false, 32u, true,
     0u, 0u}},
    {1u, {false, true, 1015u}, {false, true, 2u}, {50u, 1u, 75u, 1015u, 1015u, true, 0u, true, 0u,
     1u}},
    {7u, {true, true, 1015u}, {true, true, 2u}, {50u, 1u, 75u, 1015u, 1015u, true, 7u, true, 1u,
     1u}},
    {1u, {false, true, 0u}, {false, true, 2u}, {50u, 1u, 75u, 0u, 1015u, true, 8u, false, 0u, 1u}},
    {6u, {true, false, 0u}, {false, false, 2u}, {50u, 1u, 75u, 0u, 0u, true, 14u, false, 0u, 0u}},
    {2u, {false, false, 1u}, {false, false, 0u}, {50u, 1u, 75u, 1u, 1u, false, 32u, false, 0u, 0u}},
    {2u, {true, false, 1u}, {true, false, 0u}, {50u, 1u, 75u, 1u, 1u, false, 1u, false, 1u, 0u}},
    {2u, {true, true, 1u}, {true, true, 0u}, {50u, 1u, 75u, 1u, 1u, false, 3u, false, 1u, 1u}},
    {12u, {true, true, 0u}, {true, true, 0u}, {50u, 1u, 75u, 0u, 0u, false, 15u, false, 1u, 1u}},
    {1u, {true, true, 233u}, {true, true, 0u}, {50u, 1u, 75u, 233u, 0u, false, 16u, true, 1u, 1u}},
    {16u, {false, true, 1015u}, {false, false, 0u}, {50u, 1u, 75u, 1015u, 1015u, false, 32u, true,
     0u, 0u}},
    {1u, {false, true, 1015u}, {false, true, 2u}, {50u, 1u, 75u, 1015u, 1015u, true, 0u, true, 0u,
     1u}},
    {1u, {true, true, 1015u}, {true, true, 2u}, {50u, 1u, 75u, 1015u, 1015u, true, 1u, true, 1u,
     1u}},
    {1u, {true, false, 1015u}, {true, false, 2u}, {50u, 1u, 75u, 1015u, 1015u, true, 2u, true, 1u,
     0u}},
    {2u, {true, true, 233u}, {true, true, 2u}, {50u, 1u, 75u, 233u, 233u, true, 4u, true, 1u, 1u}},
    {4u, {true, false, 232u}, {true, false, 2u}, {50u, 1u, 75u, 232u, 232u, true, 8u, true, 1u,
     0u}},
    {8u, {true, false, 232u}, {false, false, 2u}, {50u, 1u, 75u, 232u, 232u, true, 16u, true, 0u,
     0u}},
    {8u, {true, false, 232u}, {true, false, 2u}, {50u, 1u, 75u, 232u, 232u, true, 7u, true, 1u,
     0u}},
    {1u, {true, false, 1015u}, {true, false, 2u}, {50u, 1u, 75u, 1015u, 232u, true, 8u, true, 1u,
     0u}},
};

/* Where each vector begins and ends in the rows, and the record that it starts with. */
struct vector {
    uint32_t first;
    uint32_t end;
    bool has_record;
    struct lorry2_remembered record;
};

static const struct vector vectors[] = {
    {0u, 10u, false, {0u}},
    {10u, 17u, false, {0u}},
    {17u, 23u, false, {0u}},
    {23u, 47u, false, {0u}},
    {47u, 98u, false, {0u}},
};

static void run(const struct vector *v)
{
    struct lorry2 m;
    struct lorry2_out out;
    uint32_t i;
    uint32_t n;

    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */
    (void)memset(&out, 0, sizeof out);
    lorry2_start(&m, v->has_record ? &v->record : NULL);
    for (i = v->first; i < v->end; i++) {
        row_now = (unsigned long)(i - v->first) + 1ul;
        for (n = 0u; n < rows[i].steps; n++) {
            step_now = (unsigned long)n + 1ul;
            lorry2_step(&m, &rows[i].in, &out);
            compare_out(&out, &rows[i].out);
        }
        compare_state(&m, &rows[i].after);
    }
}

static const struct lorry2 fresh =
    {0u, 0u, 0u, 0u, 0u, false, 32u, false, 0u, 0u};

static void start_and_compare(const char *what, const struct lorry2_remembered *r,
                              const struct lorry2 *wanted)
{
    struct lorry2 m;

    doing = what;
    (void)memset(&m, 0x5A, sizeof m);
    lorry2_start(&m, r);
    compare_state(&m, wanted);
}

static void records(void)
{
    struct lorry2 m;
    struct lorry2_remembered r;

    start_and_compare("start without a record", NULL, &fresh);
    (void)memset(&r, 0x00, sizeof r);
    start_and_compare("start with a blank record", &r, &fresh);
    (void)memset(&r, 0xFF, sizeof r);
    start_and_compare("start with an erased record", &r, &fresh);

    doing = "record";
    m = fresh;
    (void)memset(&r, 0x00, sizeof r);
    compare("changed", lorry2_remember(&m, &r) ? 1l : 0l, 1l);
    verdict();
    compare("changed", lorry2_remember(&m, &r) ? 1l : 0l, 0l);
    verdict();
    start_and_compare("start with its own record", &r, &fresh);
}

static void upset(void)
{
    struct lorry2 m;
    struct lorry2_in in;
    struct lorry2_out out;

    (void)memset(&in, 0, sizeof in);
    (void)memset(&out, 0, sizeof out);
    {
        static const struct lorry2 after =
           {1u, 3u, 0u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 1u};

        doing = "shunt_state upset";
        lorry2_start(&m, NULL);
        m.shunt_state = 4u;
        lorry2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct lorry2 after =
           {1u, 3u, 0u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 1u};

        doing = "shunt_state upset";
        lorry2_start(&m, NULL);
        m.shunt_state = 255u;
        lorry2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct lorry2 after =
           {1u, 0u, 1u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 0u};

        doing = "left_lamps upset";
        lorry2_start(&m, NULL);
        m.left_lamps = 2u;
        lorry2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct lorry2 after =
           {1u, 0u, 1u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 0u};

        doing = "left_lamps upset";
        lorry2_start(&m, NULL);
        m.left_lamps = 255u;
        lorry2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct lorry2 after =
           {1u, 0u, 1u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 0u};

        doing = "right_lamps upset";
        lorry2_start(&m, NULL);
        m.right_lamps = 2u;
        lorry2_step(&m, &in, &out);
        compare_out(&out, &wanted);
        compare_state(&m, &after);
    }
    {
        static const struct lorry2 after =
           {1u, 0u, 1u, 0u, 0u, false, 32u, false, 0u, 0u};
        static const struct lorry2_out wanted =
           {false, false, 0u};

        doing = "right_lamps upset";
        lorry2_start(&m, NULL);
        m.right_lamps = 255u;
        lorry2_step(&m, &in, &out);
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
