/* genset1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "genset1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    genset1_port_drive_radiator_valve(0u); /* radiator_valve then rests */
}

/* From what the program wants to current in the coils. */
static void drive(const struct genset1_out *out)
{
    /* three-way valve to the radiator with a spring-return actuator: goes out as it is. */
    genset1_port_drive_radiator_valve(out->radiator_valve);
    genset1_port_show(out->fault);
}

static void sense(struct genset1_in *in)
{
    in->overheat_open = genset1_port_read_overheat_open();
    in->outlet_probe = genset1_port_read_outlet_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct genset1 m;
    static struct genset1_remembered kept;
    struct genset1_in in;
    struct genset1_out out;
    bool recalled;

    rest();
    recalled = genset1_port_recall(&kept);
    genset1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = genset1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            genset1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (genset1_remember(&m, &kept)) {
            genset1_port_keep(&kept);
        }
        genset1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t genset1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of GENSET1_STEP_MS ms */
    return 0u; /* no clock */
}

bool genset1_port_read_overheat_open(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t genset1_port_read_outlet_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void genset1_port_drive_radiator_valve(uint16_t value)
{
    /* YOURS: set the converter */
    (void)value;
}

void genset1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool genset1_port_recall(struct genset1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void genset1_port_keep(const struct genset1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void genset1_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
