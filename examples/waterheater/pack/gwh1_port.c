/* gwh1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "gwh1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    gwh1_port_drive_flame_guard_days(0u); /* flame_guard_days then rests */
    gwh1_port_drive_cutoff_trips(0u); /* cutoff_trips then rests */
}

/* From what the program wants to current in the coils. */
static void drive(const struct gwh1_out *out)
{
    /* thermocouple flame supervision of the pilot: days since it was last seen to act: goes out as
     * it is.
     */
    gwh1_port_drive_flame_guard_days(out->flame_guard_days);
    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: trips seen: goes out as
     * it is.
     */
    gwh1_port_drive_cutoff_trips(out->cutoff_trips);
    gwh1_port_show(out->fault);
}

static void sense(struct gwh1_in *in)
{
    in->cutoff_open = gwh1_port_read_cutoff_open();
    in->pilot_lit = gwh1_port_read_pilot_lit();
    in->couple = gwh1_port_read_couple();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct gwh1 m;
    static struct gwh1_remembered kept;
    struct gwh1_in in;
    struct gwh1_out out;
    bool recalled;

    rest();
    recalled = gwh1_port_recall(&kept);
    gwh1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = gwh1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            gwh1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (gwh1_remember(&m, &kept)) {
            gwh1_port_keep(&kept);
        }
        gwh1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t gwh1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of GWH1_STEP_MS ms */
    return 0u; /* no clock */
}

bool gwh1_port_read_cutoff_open(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool gwh1_port_read_pilot_lit(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t gwh1_port_read_couple(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void gwh1_port_drive_flame_guard_days(uint16_t value)
{
    /* YOURS: set the converter */
    (void)value;
}

void gwh1_port_drive_cutoff_trips(uint16_t value)
{
    /* YOURS: set the converter */
    (void)value;
}

void gwh1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool gwh1_port_recall(struct gwh1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void gwh1_port_keep(const struct gwh1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void gwh1_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
