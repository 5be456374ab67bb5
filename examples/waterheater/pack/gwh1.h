/* gwh1.h: control program, what a caller needs
 *
 * Equipment: Gas water heater, boat house
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 52a2fa594aacaa95bd253c6298389f618d93b844be1d85baca786c2236c28846
 *
 * Stays hard-wired, and must:
 * - tank_stat: rod stat of the appliance's own valve
 * - flame_guard: thermocouple flame supervision of the pilot
 * - cutoff: energy cut-off in the tank, one shot, opens the thermocouple's loop
 *
 * This helps to plan; it decides nothing. Local codes, the equipment's listing or approval, and a
 * licensed person decide.
 * Independent hardware limits stay in place, hard-wired, and are tested before anything else is
 * touched.
 * Isolate, lock off and prove dead before working on the equipment.
 * The C is a skeleton to start from. It has not been certified for any purpose; no claim of
 * compliance is made for it.
 * Software cannot see what it has no input for. A finding of grade stop is ended only by changing
 * the design.
 * Open findings: 1 earth_fault_bypasses_limit (act, gwh1); 2 overshoot_not_determined (act,
 * cutoff/boiling). Not judged, for want of a figure: 1; risks.md says which.
 */
#ifndef GWH1_H
#define GWH1_H

#include <stdbool.h>
#include <stdint.h>

#define GWH1_STEP_MS 1000u /* ms from one call of gwh1_step to the next */

/* Bits of fault in struct gwh1_out; 0 means none. */
/* across the thermocouple with an amplifier of high input resistance: not believed */
#define GWH1_FAULT_COUPLE 0x0001u
/* thermocouple flame supervision of the pilot: the thermocouple gives little; it will shut down
 * without cause before long
 */
#define GWH1_FAULT_FLAME_GUARD_WEAK 0x0002u
/* thermocouple flame supervision of the pilot: no flame is seen */
#define GWH1_FAULT_FLAME_GUARD_FLAME_OUT 0x0004u
/* thermocouple flame supervision of the pilot: has not been seen to act for as long as it may go
 * unproved
 */
#define GWH1_FAULT_FLAME_GUARD_PROOF_DUE 0x0008u
/* energy cut-off in the tank, one shot, opens the thermocouple's loop: is seen tripped */
#define GWH1_FAULT_CUTOFF_TRIPPED 0x0010u

/* across the thermocouple with an amplifier of high input resistance: is it believed? */
enum gwh1_couple_state {
    GWH1_COUPLE_STATE_PROVING = 0, /* has not proved itself since the start */
    GWH1_COUPLE_STATE_GOOD = 1, /* believed */
    GWH1_COUPLE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    GWH1_COUPLE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* thermocouple flame supervision of the pilot: the flame by its voltage */
enum gwh1_flame_guard_flame {
    GWH1_FLAME_GUARD_FLAME_OUT = 0, /* no flame is seen */
    GWH1_FLAME_GUARD_FLAME_WARMING = 1, /* lit, not judged yet */
    GWH1_FLAME_GUARD_FLAME_SETTLED = 2 /* has burnt long enough to be judged */
};

/* What the board hands over at every step. */
struct gwh1_in {
    bool cutoff_open; /* spare contact of the energy cut-off */
    bool pilot_lit; /* pilot seen by the fitter's lamp at the sight glass */
    /* across the thermocouple with an amplifier of high input resistance, raw counts */
    uint16_t couple;
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: gwh1_port.c does the rest.
 */
struct gwh1_out {
    /* thermocouple flame supervision of the pilot: days since it was last seen to act */
    uint16_t flame_guard_days;
    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: trips seen */
    uint16_t cutoff_trips;
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct gwh1_remembered {
    /* thermocouple flame supervision of the pilot: days since it was last seen to act */
    uint16_t flame_guard_days_gone;
    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: trips seen */
    uint16_t cutoff_trips_seen;
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct gwh1 {
    uint8_t couple_good_for; /* good samples in a row */
    /* enum gwh1_couple_state: across the thermocouple with an amplifier of high input resistance:
     * is it believed?
     */
    uint8_t couple_state;
    uint8_t couple_state_for; /* steps in this state */
    /* across the thermocouple with an amplifier of high input resistance: last believable sample */
    uint16_t couple_last;
    /* across the thermocouple with an amplifier of high input resistance: the believable sample
     * before that
     */
    uint16_t couple_before;
    /* enum gwh1_flame_guard_flame: thermocouple flame supervision of the pilot: the flame by its
     * voltage
     */
    uint8_t flame_guard_flame;
    uint8_t flame_guard_flame_for; /* steps in this state */
    uint8_t flame_guard_weak_time; /* steps with a settled flame and little voltage */
    /* thermocouple flame supervision of the pilot: a flame was seen in the step before */
    bool flame_guard_was_lit;
    uint32_t flame_guard_day_at; /* steps of this day */
    /* thermocouple flame supervision of the pilot: days since it was last seen to act */
    uint16_t flame_guard_days_gone;
    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: was seen tripped in the
     * step before
     */
    bool cutoff_was_tripped;
    /* energy cut-off in the tank, one shot, opens the thermocouple's loop: trips seen */
    uint16_t cutoff_trips_seen;
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void gwh1_start(struct gwh1 *m, const struct gwh1_remembered *r);

/* Once every GWH1_STEP_MS. The times of the program are counts of these calls. */
void gwh1_step(struct gwh1 *m, const struct gwh1_in *in, struct gwh1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool gwh1_remember(const struct gwh1 *m, struct gwh1_remembered *r);

#endif
