/* cal2_port.c: main loop and board, to start from. This file is yours: it was written once and is
 * never overwritten. The functions of the board below do nothing yet; they leave every coil without
 * current. Fill in each of them, then take the line with CAL2_BOARD_IS_FILLED_IN out.
 */
#include "cal2_port.h"

#include <stddef.h>

/* Coils without current: what the loads do with no supply. */
static void rest(void)
{
    cal2_port_drive_heater(false);
}

static void drive(const struct cal2_out *out)
{
    /* 9 kW immersion heater through its contactor: rests off. */
    cal2_port_drive_heater(out->heater);
    cal2_port_show(out->fault);
}

static void sense(struct cal2_in *in)
{
    in->flow_proven = cal2_port_flow_proven();
    in->limit_open = cal2_port_limit_open();
    in->tank_probe = cal2_port_tank_probe();
    in->heater_seen = cal2_port_heater_seen();
}

/* A step that comes late by one is made up for; more of them mean that the times of the program are
 * wrong, so the coils go without current and the watchdog is left to start the board anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct cal2 m;
    static struct cal2_remembered kept;
    struct cal2_in in;
    struct cal2_out out;
    bool recalled;

    rest();
    recalled = cal2_port_recall(&kept);
    cal2_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = cal2_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            cal2_step(&m, &in, &out);
            due--;
        }
        drive(&out);
        if (cal2_remember(&m, &kept)) {
            cal2_port_keep(&kept);
        }
        cal2_port_alive();
    }
}

/* The board. Nothing below is done yet. */
#define CAL2_BOARD_IS_FILLED_IN 0 /* 1 once every function below does its work */

uint16_t cal2_port_wait(void)
{
    /* wait for a hardware timer of CAL2_STEP_MS ms */
    return (uint16_t)CAL2_BOARD_IS_FILLED_IN;
}

bool cal2_port_flow_proven(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool cal2_port_limit_open(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t cal2_port_tank_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool cal2_port_heater_seen(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void cal2_port_drive_heater(bool driven)
{
    (void)driven; /* set the pin */
}

void cal2_port_show(uint16_t fault)
{
    (void)fault; /* show it */
}

bool cal2_port_recall(struct cal2_remembered *r)
{
    (void)r; /* read it from the memory that survives */
    return false;
}

void cal2_port_keep(const struct cal2_remembered *r)
{
    (void)r; /* write it to the memory that survives */
}

void cal2_port_alive(void)
{
    /* toggle the pin of the external watchdog */
}
