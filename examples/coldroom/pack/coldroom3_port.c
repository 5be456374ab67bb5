/* coldroom3_port.c: main loop and board, to start from. This file is yours: it was written once and
 * is never overwritten. The functions of the board below do nothing yet; they leave every coil
 * without current. Fill in each of them, then take the line with COLDROOM3_BOARD_IS_FILLED_IN out.
 */
#include "coldroom3_port.h"

#include <stddef.h>

/* Coils without current: what the loads do with no supply. */
static void rest(void)
{
    coldroom3_port_drive_compressor(false);
    coldroom3_port_drive_defrost_heater(false);
    coldroom3_port_drive_warm_alarm(false);
}

static void drive(const struct coldroom3_out *out)
{
    /* 2.2 kW compressor through its contactor: rests off. */
    coldroom3_port_drive_compressor(out->compressor);
    /* 1.2 kW defrost heater in the coil: rests off. */
    coldroom3_port_drive_defrost_heater(out->defrost_heater);
    /* sounder at the gatehouse: rests on, so current in the coil takes it the other way. */
    coldroom3_port_drive_warm_alarm(!out->warm_alarm);
    coldroom3_port_show(out->fault);
}

static void sense(struct coldroom3_in *in)
{
    in->hp_switch = coldroom3_port_hp_switch();
    in->room_probe = coldroom3_port_room_probe();
    in->coil_probe = coldroom3_port_coil_probe();
}

/* A step that comes late by one is made up for; more of them mean that the times of the program are
 * wrong, so the coils go without current and the watchdog is left to start the board anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct coldroom3 m;
    static struct coldroom3_remembered kept;
    struct coldroom3_in in;
    struct coldroom3_out out;
    bool recalled;

    rest();
    recalled = coldroom3_port_recall(&kept);
    coldroom3_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = coldroom3_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            coldroom3_step(&m, &in, &out);
            due--;
        }
        drive(&out);
        if (coldroom3_remember(&m, &kept)) {
            coldroom3_port_keep(&kept);
        }
        coldroom3_port_alive();
    }
}

/* The board. Nothing below is done yet. */
#define COLDROOM3_BOARD_IS_FILLED_IN 0 /* 1 once every function below does its work */

uint16_t coldroom3_port_wait(void)
{
    /* wait for a hardware timer of COLDROOM3_STEP_MS ms */
    return (uint16_t)COLDROOM3_BOARD_IS_FILLED_IN;
}

bool coldroom3_port_hp_switch(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t coldroom3_port_room_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

uint16_t coldroom3_port_coil_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

void coldroom3_port_drive_compressor(bool driven)
{
    (void)driven; /* set the pin */
}

void coldroom3_port_drive_defrost_heater(bool driven)
{
    (void)driven; /* set the pin */
}

void coldroom3_port_drive_warm_alarm(bool driven)
{
    (void)driven; /* set the pin */
}

void coldroom3_port_show(uint16_t fault)
{
    (void)fault; /* show it */
}

bool coldroom3_port_recall(struct coldroom3_remembered *r)
{
    (void)r; /* read it from the memory that survives */
    return false;
}

void coldroom3_port_keep(const struct coldroom3_remembered *r)
{
    (void)r; /* write it to the memory that survives */
}

void coldroom3_port_alive(void)
{
    /* reload the watchdog of the controller */
}
