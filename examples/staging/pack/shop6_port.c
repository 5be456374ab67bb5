/* shop6_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "shop6_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    shop6_port_drive_heat_one(false); /* heat_one then rests off */
    shop6_port_drive_heat_two(false); /* heat_two then rests off */
    shop6_port_drive_cooling(false); /* cooling then rests off */
    shop6_port_drive_supply_fan(false); /* supply_fan then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct shop6_out *out)
{
    /* 6 kW duct heater, first stage, through its contactor: rests off with no supply. Current where
     * the program wants it.
     */
    shop6_port_drive_heat_one(out->heat_one);
    /* 6 kW duct heater, second stage, through its contactor: rests off with no supply. Current
     * where the program wants it.
     */
    shop6_port_drive_heat_two(out->heat_two);
    /* compressor of the cooling coil, through its contactor: rests off with no supply. Current
     * where the program wants it.
     */
    shop6_port_drive_cooling(out->cooling);
    /* supply fan: rests off with no supply. Current where the program wants it. */
    shop6_port_drive_supply_fan(out->supply_fan);
    shop6_port_show(out->fault);
}

static void sense(struct shop6_in *in)
{
    in->airflow = shop6_port_read_airflow();
    in->occupied = shop6_port_read_occupied();
    in->room_probe = shop6_port_read_room_probe();
    in->heat_one_seen = shop6_port_read_heat_one_seen();
    in->heat_two_seen = shop6_port_read_heat_two_seen();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct shop6 m;
    static struct shop6_remembered kept;
    struct shop6_in in;
    struct shop6_out out;
    bool recalled;

    rest();
    recalled = shop6_port_recall(&kept);
    shop6_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = shop6_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            shop6_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (shop6_remember(&m, &kept)) {
            shop6_port_keep(&kept);
        }
        shop6_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t shop6_port_wait(void)
{
    /* YOURS: wait for a hardware timer of SHOP6_STEP_MS ms */
    return 0u; /* no clock */
}

bool shop6_port_read_airflow(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool shop6_port_read_occupied(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t shop6_port_read_room_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool shop6_port_read_heat_one_seen(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool shop6_port_read_heat_two_seen(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void shop6_port_drive_heat_one(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void shop6_port_drive_heat_two(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void shop6_port_drive_cooling(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void shop6_port_drive_supply_fan(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void shop6_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool shop6_port_recall(struct shop6_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void shop6_port_keep(const struct shop6_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void shop6_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
