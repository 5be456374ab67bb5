/* prover2_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "prover2_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    prover2_port_drive_heater(false); /* heater then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct prover2_out *out)
{
    /* 1.2 kW heating mat: rests off with no supply. Current where the program wants it. */
    prover2_port_drive_heater(out->heater);
    prover2_port_show(out->fault);
}

static void sense(struct prover2_in *in)
{
    in->cabinet_probe = prover2_port_read_cabinet_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct prover2 m;
    static struct prover2_remembered kept;
    struct prover2_in in;
    struct prover2_out out;
    bool recalled;

    rest();
    recalled = prover2_port_recall(&kept);
    prover2_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = prover2_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            prover2_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (prover2_remember(&m, &kept)) {
            prover2_port_keep(&kept);
        }
        prover2_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t prover2_port_wait(void)
{
    /* YOURS: wait for a hardware timer of PROVER2_STEP_MS ms */
    return 0u; /* no clock */
}

uint16_t prover2_port_read_cabinet_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void prover2_port_drive_heater(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void prover2_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool prover2_port_recall(struct prover2_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void prover2_port_keep(const struct prover2_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void prover2_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
