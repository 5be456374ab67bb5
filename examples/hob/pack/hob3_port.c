/* hob3_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "hob3_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    hob3_port_drive_plate(false); /* plate then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct hob3_out *out)
{
    /* 1.8 kW cast plate: rests off with no supply. Current where the program wants it. */
    hob3_port_drive_plate(out->plate);
    hob3_port_show(out->fault);
}

static void sense(struct hob3_in *in)
{
    in->regulator_dial = hob3_port_read_regulator_dial();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct hob3 m;
    static struct hob3_remembered kept;
    struct hob3_in in;
    struct hob3_out out;
    bool recalled;

    rest();
    recalled = hob3_port_recall(&kept);
    hob3_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = hob3_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            hob3_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (hob3_remember(&m, &kept)) {
            hob3_port_keep(&kept);
        }
        hob3_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t hob3_port_wait(void)
{
    /* YOURS: wait for a hardware timer of HOB3_STEP_MS ms */
    return 0u; /* no clock */
}

uint16_t hob3_port_read_regulator_dial(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void hob3_port_drive_plate(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void hob3_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool hob3_port_recall(struct hob3_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void hob3_port_keep(const struct hob3_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void hob3_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
