/* freezer1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "freezer1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    freezer1_port_drive_defrost_heater(false); /* defrost_heater then rests off */
    freezer1_port_drive_compressor(false); /* compressor then rests off */
    freezer1_port_drive_coil_fan(false); /* coil_fan then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct freezer1_out *out)
{
    /* 1.8 kW defrost heater in coil and tray: rests off with no supply. Current where the program
     * wants it.
     */
    freezer1_port_drive_defrost_heater(out->defrost_heater);
    /* 3 kW compressor through its contactor: rests off with no supply. Current where the program
     * wants it.
     */
    freezer1_port_drive_compressor(out->compressor);
    /* two fans on the coil: rests off with no supply. Current where the program wants it. */
    freezer1_port_drive_coil_fan(out->coil_fan);
    freezer1_port_show(out->fault);
}

static void sense(struct freezer1_in *in)
{
    in->hp_switch = freezer1_port_read_hp_switch();
    in->room_probe = freezer1_port_read_room_probe();
    in->coil_probe = freezer1_port_read_coil_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct freezer1 m;
    static struct freezer1_remembered kept;
    struct freezer1_in in;
    struct freezer1_out out;
    bool recalled;

    rest();
    recalled = freezer1_port_recall(&kept);
    freezer1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = freezer1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            freezer1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (freezer1_remember(&m, &kept)) {
            freezer1_port_keep(&kept);
        }
        freezer1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t freezer1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of FREEZER1_STEP_MS ms */
    return 0u; /* no clock */
}

bool freezer1_port_read_hp_switch(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t freezer1_port_read_room_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

uint16_t freezer1_port_read_coil_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void freezer1_port_drive_defrost_heater(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void freezer1_port_drive_compressor(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void freezer1_port_drive_coil_fan(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void freezer1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool freezer1_port_recall(struct freezer1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void freezer1_port_keep(const struct freezer1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void freezer1_port_alive(void)
{
    /* YOURS: reload the watchdog of the controller */
}
