/* ext5.h: control program, what a caller needs
 *
 * Equipment: Extract fan 5, press room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 54d9ac13d9eb912fbd316f24f482063aa393d6dff5a3975ab977bd52380134f8
 *
 * Replaces:
 * - room_stat: room stat by the presses
 *
 * Stays hard-wired, and must:
 * - protector: motor protector in the winding, resets by itself
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
 * Open findings: 1 restarts_by_itself (act, fan); 2 earth_fault_bypasses_limit (act, ext5); 3
 * moisture_direction (act, room_probe); 4 damp_dust_washdown (act, ext5); 5 approval_lapses (act,
 * ext5); 6 limit_threshold_unknown (act, protector). Not judged, for want of a figure: 2; risks.md
 * says which.
 */
#ifndef EXT5_H
#define EXT5_H

#include <stdbool.h>
#include <stdint.h>

#define EXT5_STEP_MS 250u /* ms from one call of ext5_step to the next */

/* Bits of fault in struct ext5_out; 0 means none. */
#define EXT5_FAULT_ROOM_PROBE 0x0001u /* on the wall by the old stat: not believed */
/* current transformer in one phase with a rectifier: not believed */
#define EXT5_FAULT_LINE_CURRENT 0x0002u
/* motor protector in the winding, resets by itself: the motor has drawn so much that it is about to
 * act
 */
#define EXT5_FAULT_PROTECTOR_HOT 0x0004u
/* 0.55 kW extract fan, switched by the board: the contact did not open */
#define EXT5_FAULT_FAN_WELDED 0x0008u
/* 0.55 kW extract fan, switched by the board: the contact did not make */
#define EXT5_FAULT_FAN_NOT_MADE 0x0010u

/* on the wall by the old stat: is it believed? */
enum ext5_room_probe_state {
    EXT5_ROOM_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    EXT5_ROOM_PROBE_STATE_GOOD = 1, /* believed */
    EXT5_ROOM_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    EXT5_ROOM_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* current transformer in one phase with a rectifier: is it believed? */
enum ext5_line_current_state {
    EXT5_LINE_CURRENT_STATE_PROVING = 0, /* has not proved itself since the start */
    EXT5_LINE_CURRENT_STATE_GOOD = 1, /* believed */
    EXT5_LINE_CURRENT_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    EXT5_LINE_CURRENT_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* room stat by the presses */
enum ext5_room_stat {
    EXT5_ROOM_STAT_OPEN = 0, /* contact open */
    EXT5_ROOM_STAT_MADE = 1 /* contact made */
};

/* 0.55 kW extract fan, switched by the board */
enum ext5_fan {
    EXT5_FAN_OFF = 0, /* off */
    EXT5_FAN_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct ext5_in {
    bool guard_open; /* switch on the inspection cover */
    uint16_t room_probe; /* on the wall by the old stat, raw counts */
    uint16_t line_current; /* current transformer in one phase with a rectifier, raw counts */
    bool fan_seen; /* read-back contact of 0.55 kW extract fan, switched by the board */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: ext5_port.c does the rest.
 */
struct ext5_out {
    bool fan; /* 0.55 kW extract fan, switched by the board; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct ext5_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct ext5 {
    uint8_t room_probe_good_for; /* good samples in a row */
    /* enum ext5_room_probe_state: on the wall by the old stat: is it believed? */
    uint8_t room_probe_state;
    uint8_t room_probe_state_for; /* steps in this state */
    uint16_t room_probe_last; /* on the wall by the old stat: last believable sample */
    uint16_t room_probe_before; /* on the wall by the old stat: the believable sample before that */
    uint8_t line_current_good_for; /* good samples in a row */
    /* enum ext5_line_current_state: current transformer in one phase with a rectifier: is it
     * believed?
     */
    uint8_t line_current_state;
    uint8_t line_current_state_for; /* steps in this state */
    /* current transformer in one phase with a rectifier: last believable sample */
    uint16_t line_current_last;
    /* current transformer in one phase with a rectifier: the believable sample before that */
    uint16_t line_current_before;
    uint8_t room_stat; /* enum ext5_room_stat: room stat by the presses */
    /* motor protector in the winding, resets by itself: heat in permille of what trips it, ×
     * PROTECTOR_HEAT_SCALE
     */
    uint32_t protector_heat;
    uint8_t fan; /* enum ext5_fan: 0.55 kW extract fan, switched by the board */
    uint16_t fan_for; /* steps since it last switched */
    uint8_t fan_apart_for; /* steps that contact and command have differed */
    bool fan_welded; /* the contact did not open when told to */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void ext5_start(struct ext5 *m, const struct ext5_remembered *r);

/* Once every EXT5_STEP_MS. The times of the program are counts of these calls. */
void ext5_step(struct ext5 *m, const struct ext5_in *in, struct ext5_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool ext5_remember(const struct ext5 *m, struct ext5_remembered *r);

#endif
