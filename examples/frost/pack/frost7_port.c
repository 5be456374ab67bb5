/* frost7_port.c: main loop and board, to start from. This file is yours: it was written once and is
 * never overwritten. The functions of the board below do nothing yet; they leave every coil without
 * current. Fill in each of them, then take the line with FROST7_BOARD_IS_FILLED_IN out.
 */
#include "frost7_port.h"

#include <stddef.h>

/* Coils without current: what the loads do with no supply. */
static void rest(void)
{
    frost7_port_drive_tape(false);
}

static void drive(const struct frost7_out *out)
{
    /* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it: rests on,
     * so current in the coil takes it the other way.
     */
    frost7_port_drive_tape(!out->tape);
    frost7_port_show(out->fault);
}

static void sense(struct frost7_in *in)
{
    in->line_probe = frost7_port_line_probe();
}

/* A step that comes late by one is made up for; more of them mean that the times of the program are
 * wrong, so the coils go without current and the watchdog is left to start the board anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct frost7 m;
    static struct frost7_remembered kept;
    struct frost7_in in;
    struct frost7_out out;
    bool recalled;

    rest();
    recalled = frost7_port_recall(&kept);
    frost7_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = frost7_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            frost7_step(&m, &in, &out);
            due--;
        }
        drive(&out);
        if (frost7_remember(&m, &kept)) {
            frost7_port_keep(&kept);
        }
        frost7_port_alive();
    }
}

/* The board. Nothing below is done yet. */
#define FROST7_BOARD_IS_FILLED_IN 0 /* 1 once every function below does its work */

uint16_t frost7_port_wait(void)
{
    /* wait for a hardware timer of FROST7_STEP_MS ms */
    return (uint16_t)FROST7_BOARD_IS_FILLED_IN;
}

uint16_t frost7_port_line_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

void frost7_port_drive_tape(bool driven)
{
    (void)driven; /* set the pin */
}

void frost7_port_show(uint16_t fault)
{
    (void)fault; /* show it */
}

bool frost7_port_recall(struct frost7_remembered *r)
{
    (void)r; /* read it from the memory that survives */
    return false;
}

void frost7_port_keep(const struct frost7_remembered *r)
{
    (void)r; /* write it to the memory that survives */
}

void frost7_port_alive(void)
{
    /* toggle the pin of the external watchdog */
}
