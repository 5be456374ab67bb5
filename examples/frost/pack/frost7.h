/* frost7.h: control program, what a caller needs
 *
 * Equipment: Trace heating, fire-water line 7
 * Site: North Yard
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9ff22083946199f7a373bb91fa9f7e5e0217856b9845d445052e08402ec051f5
 *
 * Replaces:
 * - line_stat: capillary stat strapped to the line
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
 * Open findings: 1 danger_without_barrier (act, freezing/tape); 2 frost_load_safe_on (act, tape); 3
 * welded_output (act, tape); 4 probe_out_of_pocket (act, line_stat); 5 moisture_direction (act,
 * line_probe); 6 insulation_of_new_probe (act, line_probe); 7 contact_life (act, tape); 8
 * mercury_asbestos_refrigerant (act, line_stat); 9 approval_lapses (act, frost7). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#ifndef FROST7_H
#define FROST7_H

#include <stdbool.h>
#include <stdint.h>

#define FROST7_STEP_MS 500u /* ms from one call of frost7_step to the next */

/* Bits of fault in struct frost7_out; 0 means none. */
#define FROST7_FAULT_LINE_PROBE 0x0001u /* strapped to the line under the lagging: not believed */
/* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it: on for long
 * without effect on line_probe
 */
#define FROST7_FAULT_TAPE_NO_EFFECT 0x0002u

/* strapped to the line under the lagging: is it believed? */
enum frost7_line_probe_state {
    FROST7_LINE_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    FROST7_LINE_PROBE_STATE_GOOD = 1, /* believed */
    FROST7_LINE_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    FROST7_LINE_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* capillary stat strapped to the line */
enum frost7_line_stat {
    FROST7_LINE_STAT_OPEN = 0, /* contact open */
    FROST7_LINE_STAT_MADE = 1 /* contact made */
};

/* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it */
enum frost7_tape {
    FROST7_TAPE_OFF = 0, /* off */
    FROST7_TAPE_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct frost7_in {
    uint16_t line_probe; /* strapped to the line under the lagging, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: frost7_port.c does the rest.
 */
struct frost7_out {
    /* self-limiting trace heating tape, 900 W, through a contactor whose coil opens it; rests on,
     * safe on
     */
    bool tape;
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct frost7_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct frost7 {
    uint8_t line_probe_good_for; /* good samples in a row */
    /* enum frost7_line_probe_state: strapped to the line under the lagging: is it believed? */
    uint8_t line_probe_state;
    uint8_t line_probe_state_for; /* steps in this state */
    uint16_t line_probe_last; /* strapped to the line under the lagging: last believable sample */
    /* strapped to the line under the lagging: the believable sample before that */
    uint16_t line_probe_before;
    uint8_t line_stat; /* enum frost7_line_stat: capillary stat strapped to the line */
    /* enum frost7_tape: self-limiting trace heating tape, 900 W, through a contactor whose coil
     * opens it
     */
    uint8_t tape;
    uint8_t tape_for; /* steps since it last switched */
    uint16_t tape_effect_from; /* reading furthest back since tape came on */
    uint16_t tape_effect_for; /* steps on without an effect */
    bool tape_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void frost7_start(struct frost7 *m, const struct frost7_remembered *r);

/* Once every FROST7_STEP_MS. The times of the program are counts of these calls. */
void frost7_step(struct frost7 *m, const struct frost7_in *in, struct frost7_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool frost7_remember(const struct frost7 *m, struct frost7_remembered *r);

#endif
