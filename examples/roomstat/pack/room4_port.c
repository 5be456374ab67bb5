/* room4_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "room4_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    room4_port_drive_boiler(false); /* boiler then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct room4_out *out)
{
    /* call for heat to the boiler's own burner control: rests off with no supply. Current where the
     * program wants it.
     */
    room4_port_drive_boiler(out->boiler);
    room4_port_show(out->fault);
}

static void sense(struct room4_in *in)
{
    in->room_probe = room4_port_read_room_probe();
    in->room_stat_dial = room4_port_read_room_stat_dial();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct room4 m;
    static struct room4_remembered kept;
    struct room4_in in;
    struct room4_out out;
    bool recalled;

    rest();
    recalled = room4_port_recall(&kept);
    room4_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = room4_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            room4_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (room4_remember(&m, &kept)) {
            room4_port_keep(&kept);
        }
        room4_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t room4_port_wait(void)
{
    /* YOURS: wait for a hardware timer of ROOM4_STEP_MS ms */
    return 0u; /* no clock */
}

uint16_t room4_port_read_room_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

uint16_t room4_port_read_room_stat_dial(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void room4_port_drive_boiler(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void room4_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool room4_port_recall(struct room4_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void room4_port_keep(const struct room4_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void room4_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
