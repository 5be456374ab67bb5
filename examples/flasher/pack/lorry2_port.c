/* lorry2_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "lorry2_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    lorry2_port_drive_left_lamps(false); /* left_lamps then rests off */
    lorry2_port_drive_right_lamps(false); /* right_lamps then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct lorry2_out *out)
{
    /* left lamps, front and rear: rests off with no supply. Current where the program wants it. */
    lorry2_port_drive_left_lamps(out->left_lamps);
    /* right lamps, front and rear: rests off with no supply. Current where the program wants it. */
    lorry2_port_drive_right_lamps(out->right_lamps);
    lorry2_port_show(out->fault);
}

static void sense(struct lorry2_in *in)
{
    in->stalk_left = lorry2_port_read_stalk_left();
    in->stalk_right = lorry2_port_read_stalk_right();
    in->shunt = lorry2_port_read_shunt();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct lorry2 m;
    static struct lorry2_remembered kept;
    struct lorry2_in in;
    struct lorry2_out out;
    bool recalled;

    rest();
    recalled = lorry2_port_recall(&kept);
    lorry2_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = lorry2_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            lorry2_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (lorry2_remember(&m, &kept)) {
            lorry2_port_keep(&kept);
        }
        lorry2_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t lorry2_port_wait(void)
{
    /* YOURS: wait for a hardware timer of LORRY2_STEP_MS ms */
    return 0u; /* no clock */
}

bool lorry2_port_read_stalk_left(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool lorry2_port_read_stalk_right(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t lorry2_port_read_shunt(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void lorry2_port_drive_left_lamps(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void lorry2_port_drive_right_lamps(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void lorry2_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool lorry2_port_recall(struct lorry2_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void lorry2_port_keep(const struct lorry2_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void lorry2_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
