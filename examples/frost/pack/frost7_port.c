/* frost7_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "frost7_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    frost7_port_drive_tape(false); /* tape then rests on */
}

/* From what the program wants to current in the coils. */
static void drive(const struct frost7_out *out)
{
    /* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it: rests on
     * with no supply, so it is current in the coil that takes it the other way. Current where the
     * program does not want it.
     */
    frost7_port_drive_tape(!out->tape);
    frost7_port_show(out->fault);
}

static void sense(struct frost7_in *in)
{
    in->line_probe = frost7_port_read_line_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct frost7 m;
    static struct frost7_remembered kept;
    struct frost7_in in;
    struct frost7_out out;
    bool recalled;

    rest();
    recalled = frost7_port_recall(&kept);
    frost7_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = frost7_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            frost7_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (frost7_remember(&m, &kept)) {
            frost7_port_keep(&kept);
        }
        frost7_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t frost7_port_wait(void)
{
    /* YOURS: wait for a hardware timer of FROST7_STEP_MS ms */
    return 0u; /* no clock */
}

uint16_t frost7_port_read_line_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void frost7_port_drive_tape(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void frost7_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool frost7_port_recall(struct frost7_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void frost7_port_keep(const struct frost7_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void frost7_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
