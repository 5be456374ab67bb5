/* ext5_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "ext5_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    ext5_port_drive_fan(false); /* fan then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct ext5_out *out)
{
    /* 0.55 kW extract fan, switched by the board: rests off with no supply. Current where the
     * program wants it.
     */
    ext5_port_drive_fan(out->fan);
    ext5_port_show(out->fault);
}

static void sense(struct ext5_in *in)
{
    in->guard_open = ext5_port_read_guard_open();
    in->room_probe = ext5_port_read_room_probe();
    in->line_current = ext5_port_read_line_current();
    in->fan_seen = ext5_port_read_fan_seen();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct ext5 m;
    static struct ext5_remembered kept;
    struct ext5_in in;
    struct ext5_out out;
    bool recalled;

    rest();
    recalled = ext5_port_recall(&kept);
    ext5_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = ext5_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            ext5_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (ext5_remember(&m, &kept)) {
            ext5_port_keep(&kept);
        }
        ext5_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t ext5_port_wait(void)
{
    /* YOURS: wait for a hardware timer of EXT5_STEP_MS ms */
    return 0u; /* no clock */
}

bool ext5_port_read_guard_open(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t ext5_port_read_room_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

uint16_t ext5_port_read_line_current(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool ext5_port_read_fan_seen(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void ext5_port_drive_fan(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void ext5_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool ext5_port_recall(struct ext5_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void ext5_port_keep(const struct ext5_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void ext5_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
