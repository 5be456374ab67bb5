/* room4.h: control program, what a caller needs
 *
 * Equipment: Room control, caretaker's flat
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: d3cb2df54b043c85a55b36ae17d55a520d1b44a8f6e6363d94d5ab1013700b13
 *
 * Replaces:
 * - room_stat: room control with a mercury bottle, in the hall
 *
 * Stays hard-wired, and must:
 * - boiler_limit: limit of the boiler, part of its burner control
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
 * Open findings: 1 earth_fault_bypasses_limit (act, room4); 2 contact_life (act, boiler); 3
 * mercury_asbestos_refrigerant (act, room_stat); 4 approval_lapses (act, room4); 5
 * probe_sees_the_room (act, room_stat); 6 danger_not_judged (act, cold_flat). Not judged, for want
 * of a figure: 1; risks.md says which.
 */
#ifndef ROOM4_H
#define ROOM4_H

#include <stdbool.h>
#include <stdint.h>

#define ROOM4_STEP_MS 1000u /* ms from one call of room4_step to the next */

/* Bits of fault in struct room4_out; 0 means none. */
/* at the height of the old control, in moving air, away from the board: not believed */
#define ROOM4_FAULT_ROOM_PROBE 0x0001u
/* dial of room control with a mercury bottle, in the hall: wiper, track or wire broken; the set
 * point of the sheet holds
 */
#define ROOM4_FAULT_ROOM_STAT_DIAL 0x0002u
/* call for heat to the boiler's own burner control: on for long without effect on room_probe */
#define ROOM4_FAULT_BOILER_NO_EFFECT 0x0004u

/* at the height of the old control, in moving air, away from the board: is it believed? */
enum room4_room_probe_state {
    ROOM4_ROOM_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    ROOM4_ROOM_PROBE_STATE_GOOD = 1, /* believed */
    ROOM4_ROOM_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    ROOM4_ROOM_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* room control with a mercury bottle, in the hall */
enum room4_room_stat {
    ROOM4_ROOM_STAT_OPEN = 0, /* contact open */
    ROOM4_ROOM_STAT_MADE = 1 /* contact made */
};

/* call for heat to the boiler's own burner control */
enum room4_boiler {
    ROOM4_BOILER_OFF = 0, /* off */
    ROOM4_BOILER_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct room4_in {
    /* at the height of the old control, in moving air, away from the board, raw counts */
    uint16_t room_probe;
    /* dial of room control with a mercury bottle, in the hall, raw counts */
    uint16_t room_stat_dial;
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: room4_port.c does the rest.
 */
struct room4_out {
    bool boiler; /* call for heat to the boiler's own burner control; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct room4_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct room4 {
    uint8_t room_probe_good_for; /* good samples in a row */
    /* enum room4_room_probe_state: at the height of the old control, in moving air, away from the
     * board: is it believed?
     */
    uint8_t room_probe_state;
    uint8_t room_probe_state_for; /* steps in this state */
    /* at the height of the old control, in moving air, away from the board: last believable sample
     */
    uint16_t room_probe_last;
    /* at the height of the old control, in moving air, away from the board: the believable sample
     * before that
     */
    uint16_t room_probe_before;
    uint8_t room_stat; /* enum room4_room_stat: room control with a mercury bottle, in the hall */
    uint8_t room_stat_dial_lost_for; /* steps since the dial was last believed */
    uint16_t room_stat_set_point; /* set point by the dial, in steps of 0.01 K */
    uint32_t room_stat_warmth; /* what the anticipator adds, × ROOM_STAT_HEAT_SCALE */
    uint8_t boiler; /* enum room4_boiler: call for heat to the boiler's own burner control */
    uint16_t boiler_effect_from; /* reading furthest back since boiler came on */
    uint16_t boiler_effect_for; /* steps on without an effect */
    bool boiler_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void room4_start(struct room4 *m, const struct room4_remembered *r);

/* Once every ROOM4_STEP_MS. The times of the program are counts of these calls. */
void room4_step(struct room4 *m, const struct room4_in *in, struct room4_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool room4_remember(const struct room4 *m, struct room4_remembered *r);

#endif
