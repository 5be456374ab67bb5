/* oven1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "oven1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    oven1_port_drive_elements(false); /* elements then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct oven1_out *out)
{
    /* 12 kW of top and bottom elements through a contactor: rests off with no supply. Current where
     * the program wants it.
     */
    oven1_port_drive_elements(out->elements);
    oven1_port_show(out->fault);
}

static void sense(struct oven1_in *in)
{
    in->door_shut = oven1_port_read_door_shut();
    in->chamber_probe = oven1_port_read_chamber_probe();
    in->elements_seen = oven1_port_read_elements_seen();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct oven1 m;
    static struct oven1_remembered kept;
    struct oven1_in in;
    struct oven1_out out;
    bool recalled;

    rest();
    recalled = oven1_port_recall(&kept);
    oven1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = oven1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            oven1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (oven1_remember(&m, &kept)) {
            oven1_port_keep(&kept);
        }
        oven1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t oven1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of OVEN1_STEP_MS ms */
    return 0u; /* no clock */
}

bool oven1_port_read_door_shut(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t oven1_port_read_chamber_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool oven1_port_read_elements_seen(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void oven1_port_drive_elements(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void oven1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool oven1_port_recall(struct oven1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void oven1_port_keep(const struct oven1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void oven1_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
