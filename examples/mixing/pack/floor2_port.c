/* floor2_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "floor2_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    floor2_port_drive_mixer(0u); /* mixer then rests */
    floor2_port_drive_mixer_opens(false); /* mixer_opens then rests */
    floor2_port_drive_mixer_closes(false); /* mixer_closes then rests */
}

/* From what the program wants to current in the coils. */
static void drive(const struct floor2_out *out)
{
    /* three-way mixing valve with its three-point actuator: goes out as it is. */
    floor2_port_drive_mixer(out->mixer);
    /* three-way mixing valve with its three-point actuator: run open: which way it rests is not
     * stated; true puts current into the coil.
     */
    floor2_port_drive_mixer_opens(out->mixer_opens);
    /* three-way mixing valve with its three-point actuator: run shut: which way it rests is not
     * stated; true puts current into the coil.
     */
    floor2_port_drive_mixer_closes(out->mixer_closes);
    floor2_port_show(out->fault);
}

static void sense(struct floor2_in *in)
{
    in->pump_runs = floor2_port_read_pump_runs();
    in->flow_probe = floor2_port_read_flow_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct floor2 m;
    static struct floor2_remembered kept;
    struct floor2_in in;
    struct floor2_out out;
    bool recalled;

    rest();
    recalled = floor2_port_recall(&kept);
    floor2_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = floor2_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            floor2_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (floor2_remember(&m, &kept)) {
            floor2_port_keep(&kept);
        }
        floor2_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t floor2_port_wait(void)
{
    /* YOURS: wait for a hardware timer of FLOOR2_STEP_MS ms */
    return 0u; /* no clock */
}

bool floor2_port_read_pump_runs(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t floor2_port_read_flow_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void floor2_port_drive_mixer(uint16_t value)
{
    /* YOURS: set the converter */
    (void)value;
}

void floor2_port_drive_mixer_opens(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void floor2_port_drive_mixer_closes(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void floor2_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool floor2_port_recall(struct floor2_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void floor2_port_keep(const struct floor2_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void floor2_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
