/* wah1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "wah1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    wah1_port_drive_burner_call(false); /* burner_call then rests off */
    wah1_port_drive_fan(false); /* fan then rests on */
}

/* From what the program wants to current in the coils. */
static void drive(const struct wah1_out *out)
{
    /* call to the approved automatic burner control: rests off with no supply. Current where the
     * program wants it.
     */
    wah1_port_drive_burner_call(out->burner_call);
    /* 0.75 kW fan through its contactor: rests on with no supply, so it is current in the coil that
     * takes it the other way. Current where the program does not want it.
     */
    wah1_port_drive_fan(!out->fan);
    wah1_port_show(out->fault);
}

static void sense(struct wah1_in *in)
{
    in->room_calls = wah1_port_read_room_calls();
    in->air_proven = wah1_port_read_air_proven();
    in->exchanger_probe = wah1_port_read_exchanger_probe();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
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
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (wah1_remember(&m, &kept)) {
            wah1_port_keep(&kept);
        }
        wah1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t wah1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of WAH1_STEP_MS ms */
    return 0u; /* no clock */
}

bool wah1_port_read_room_calls(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

bool wah1_port_read_air_proven(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t wah1_port_read_exchanger_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void wah1_port_drive_burner_call(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void wah1_port_drive_fan(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void wah1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool wah1_port_recall(struct wah1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void wah1_port_keep(const struct wah1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void wah1_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
