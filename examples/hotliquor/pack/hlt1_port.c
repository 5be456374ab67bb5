/* hlt1_port.c: main loop and board, to start from.
 *
 * This file is yours: it was written once and is never overwritten. The functions of the board,
 * below the loop, do nothing yet. As they stand no coil gets current, and the loop stops at its
 * first turn, because there is no clock.
 *
 * Still to be supplied: every function marked YOURS, the start of clock, pins and converter before
 * the loop, the watchdog's own setting, and what the C library of the board needs.
 */
#include "hlt1_port.h"

#include <stddef.h>

/* No current anywhere: what the loads do with no supply. */
static void rest(void)
{
    hlt1_port_drive_elements(false); /* elements then rests off */
}

/* From what the program wants to current in the coils. */
static void drive(const struct hlt1_out *out)
{
    /* 12 kW of immersion elements through a contactor: rests off with no supply. Current where the
     * program wants it.
     */
    hlt1_port_drive_elements(out->elements);
    hlt1_port_show(out->fault);
}

static void sense(struct hlt1_in *in)
{
    in->liquor_probe = hlt1_port_read_liquor_probe();
    in->elements_seen = hlt1_port_read_elements_seen();
}

/* One step that comes late is made up for. More of them, or no clock, mean that the times of the
 * program are wrong: the coils go without current, and the watchdog is left to start the board
 * anew.
 */
#define MOST_STEPS_AT_ONCE 2u

int main(void)
{
    static struct hlt1 m;
    static struct hlt1_remembered kept;
    struct hlt1_in in;
    struct hlt1_out out;
    bool recalled;

    rest();
    recalled = hlt1_port_recall(&kept);
    hlt1_start(&m, recalled ? &kept : NULL);

    for (;;) {
        uint16_t due = hlt1_port_wait();

        if ((due == 0u) || (due > MOST_STEPS_AT_ONCE)) {
            rest();
            for (;;) {
                /* the watchdog ends this */
            }
        }
        while (due > 0u) {
            sense(&in);
            hlt1_step(&m, &in, &out);
            drive(&out);
            due--;
        }
        /* The loads first: a memory may take its time. */
        if (hlt1_remember(&m, &kept)) {
            hlt1_port_keep(&kept);
        }
        hlt1_port_alive();
    }
}

/* The board. Nothing below is done yet. */

uint16_t hlt1_port_wait(void)
{
    /* YOURS: wait for a hardware timer of HLT1_STEP_MS ms */
    return 0u; /* no clock */
}

uint16_t hlt1_port_read_liquor_probe(void)
{
    /* YOURS: read the converter; 0 counts as a broken sensor */
    return 0u;
}

bool hlt1_port_read_elements_seen(void)
{
    /* YOURS: read the pin; which level a broken wire gives is said in the sheet */
    return false;
}

void hlt1_port_drive_elements(bool current)
{
    /* YOURS: set the pin; it must be without current before the program starts, too */
    (void)current;
}

void hlt1_port_show(uint16_t fault)
{
    /* YOURS: show it */
    (void)fault;
}

bool hlt1_port_recall(struct hlt1_remembered *r)
{
    /* YOURS: read it from the memory that survives */
    (void)r;
    return false;
}

void hlt1_port_keep(const struct hlt1_remembered *r)
{
    /* YOURS: write it to the memory that survives */
    (void)r;
}

void hlt1_port_alive(void)
{
    /* YOURS: toggle the pin of the external watchdog */
}
