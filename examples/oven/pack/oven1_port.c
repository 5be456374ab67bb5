/* oven1_port.c: main loop and board, to start from. This file is yours: it was written once and is
 * never overwritten. The functions of the board below do nothing yet; they leave every coil without
 * current. Fill in each of them, then take the line with OVEN1_BOARD_IS_FILLED_IN out.
 */
#include "oven1_port.h"

#include <stddef.h>

/* Coils without current: what the loads do with no supply. */
static void rest(void)
{
    oven1_port_drive_elements(false);
}

static void drive(const struct oven1_out *out)
{
    /* 12 kW of top and bottom elements through a contactor: rests off. */
    oven1_port_drive_elements(out->elements);
    oven1_port_show(out->fault);
}

static void sense(struct oven1_in *in)
{
    in->door_shut = oven1_port_door_shut();
    in->chamber_probe = oven1_port_chamber_probe();
    in->elements_seen = oven1_port_elements_seen();
}

/* A step that comes late by one is made up for; more of them mean that the times of the program are
 * wrong, so the coils go without current and the watchdog is left to start the board anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct oven1 m;
    static struct oven1_remembered kept;
    struct oven1_in in;
    struct oven1_out out;
    bool recalled;

    rest();
    recalled = oven1_port_recall(&kept);
    oven1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = oven1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            oven1_step(&m, &in, &out);
            due--;
        }
        drive(&out);
        if (oven1_remember(&m, &kept)) {
            oven1_port_keep(&kept);
        }
        oven1_port_alive();
    }
}

/* The board. Nothing below is done yet. */
#define OVEN1_BOARD_IS_FILLED_IN 0 /* 1 once every function below does its work */

uint16_t oven1_port_wait(void)
{
    /* wait for a hardware timer of OVEN1_STEP_MS ms */
    return (uint16_t)OVEN1_BOARD_IS_FILLED_IN;
}

bool oven1_port_door_shut(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t oven1_port_chamber_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool oven1_port_elements_seen(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void oven1_port_drive_elements(bool driven)
{
    (void)driven; /* set the pin */
}

void oven1_port_show(uint16_t fault)
{
    (void)fault; /* show it */
}

bool oven1_port_recall(struct oven1_remembered *r)
{
    (void)r; /* read it from the memory that survives */
    return false;
}

void oven1_port_keep(const struct oven1_remembered *r)
{
    (void)r; /* write it to the memory that survives */
}

void oven1_port_alive(void)
{
    /* toggle the pin of the external watchdog */
}
