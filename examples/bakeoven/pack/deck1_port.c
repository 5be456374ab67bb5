/* deck1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "deck1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    deck1_port_drive_elements(false); /* elements then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct deck1_out *out)
{
    /* 3.2 kW elements of the upper deck: rests off with no supply. Current where the program wants
     * it.
     */
    deck1_port_drive_elements(out->elements);
    deck1_port_show(out->fault);
}

static void sense(struct deck1_in *in)
{
    in->limit_open = deck1_port_read_limit_open();
    in->roof_probe = deck1_port_read_roof_probe();
    in->oven_stat_dial = deck1_port_read_oven_stat_dial();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct deck1 m;
    static struct deck1_remembered kept;
    struct deck1_in in;
    struct deck1_out out;
    bool recalled;

    rest();
    recalled = deck1_port_recall(&kept);
    deck1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = deck1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            deck1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (deck1_remember(&m, &kept)) {
            deck1_port_keep(&kept);
        }
        deck1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t deck1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of DECK1_STEP_MS ms */
    return 0u; /* no clock */
}

bool deck1_port_read_limit_open(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

uint16_t deck1_port_read_roof_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

uint16_t deck1_port_read_oven_stat_dial(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

void deck1_port_drive_elements(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void deck1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool deck1_port_recall(struct deck1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void deck1_port_keep(const struct deck1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void deck1_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
