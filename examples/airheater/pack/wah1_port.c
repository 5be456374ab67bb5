/* wah1_port.c: main loop and board, to start from. This file is yours: it was written once and is
 * never overwritten. The functions of the board below do nothing yet; they leave every coil without
 * current. Fill in each of them, then take the line with WAH1_BOARD_IS_FILLED_IN out.
 */
#include "wah1_port.h"

#include <stddef.h>

/* Coils without current: what the loads do with no supply. */
static void rest(void)
{
    wah1_port_drive_burner_call(false);
    wah1_port_drive_fan(false);
}

static void drive(const struct wah1_out *out)
{
    /* call to the approved automatic burner control: rests off. */
    wah1_port_drive_burner_call(out->burner_call);
    /* 0.75 kW fan through its contactor: rests on, so current in the coil takes it the other way.
     */
    wah1_port_drive_fan(!out->fan);
    wah1_port_show(out->fault);
}

static void sense(struct wah1_in *in)
{
    in->room_calls = wah1_port_room_calls();
    in->air_proven = wah1_port_air_proven();
    in->exchanger_probe = wah1_port_exchanger_probe();
}

/* A step that comes late by one is made up for; more of them mean that the times of the program are
 * wrong, so the coils go without current and the watchdog is left to start the board anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct wah1 m;
    static struct wah1_remembered kept;
    struct wah1_in in;
    struct wah1_out out;
    bool recalled;

    rest();
    recalled = wah1_port_recall(&kept);
    wah1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = wah1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            wah1_step(&m, &in, &out);
            due--;
        }
        drive(&out);
        if (wah1_remember(&m, &kept)) {
            wah1_port_keep(&kept);
        }
        wah1_port_alive();
    }
}

/* The board. Nothing below is done yet. */
#define WAH1_BOARD_IS_FILLED_IN 0 /* 1 once every function below does its work */

uint16_t wah1_port_wait(void)
{
    /* wait for a hardware timer of WAH1_STEP_MS ms */
    return (uint16_t)WAH1_BOARD_IS_FILLED_IN;
}

bool wah1_port_room_calls(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool wah1_port_air_proven(void)
{
    /* read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t wah1_port_exchanger_probe(void)
{
    /* read the converter; 0 counts as a broken sensor */
    return 0u;
}

void wah1_port_drive_burner_call(bool driven)
{
    (void)driven; /* set the pin */
}

void wah1_port_drive_fan(bool driven)
{
    (void)driven; /* set the pin */
}

void wah1_port_show(uint16_t fault)
{
    (void)fault; /* show it */
}

bool wah1_port_recall(struct wah1_remembered *r)
{
    (void)r; /* read it from the memory that survives */
    return false;
}

void wah1_port_keep(const struct wah1_remembered *r)
{
    (void)r; /* write it to the memory that survives */
}

void wah1_port_alive(void)
{
    /* toggle the pin of the external watchdog */
}
