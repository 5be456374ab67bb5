/* lorry2.h: control program, what a caller needs
 *
 * Equipment: Direction indicators, works lorry 2
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 9b57bd1b3ccf44e7bb4451caf8de9eeb2e1e5406a9c8380d4f38058c2a8bb2be
 *
 * Replaces:
 * - flasher: thermal flasher behind the panel
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
 * Open findings: 1 danger_without_barrier (act, unseen_turn/left_lamps); 2 damp_dust_washdown (act,
 * lorry2); 3 approval_lapses (act, lorry2); 4 output_doubtful (act, left_lamps); 5 output_doubtful
 * (act, right_lamps). Not judged, for want of a figure: 4; risks.md says which.
 */
#ifndef LORRY2_H
#define LORRY2_H

#include <stdbool.h>
#include <stdint.h>

#define LORRY2_STEP_MS 20u /* ms from one call of lorry2_step to the next */

/* Bits of fault in struct lorry2_out; 0 means none. */
#define LORRY2_FAULT_SHUNT 0x0001u /* shunt in the common feed with its amplifier: not believed */
#define LORRY2_FAULT_FLASHER_LAMP_OUT 0x0002u /* thermal flasher behind the panel: a lamp is out */

/* shunt in the common feed with its amplifier: is it believed? */
enum lorry2_shunt_state {
    LORRY2_SHUNT_STATE_PROVING = 0, /* has not proved itself since the start */
    LORRY2_SHUNT_STATE_GOOD = 1, /* believed */
    LORRY2_SHUNT_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    LORRY2_SHUNT_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* left lamps, front and rear */
enum lorry2_left_lamps {
    LORRY2_LEFT_LAMPS_OFF = 0, /* off */
    LORRY2_LEFT_LAMPS_ON = 1 /* on */
};

/* right lamps, front and rear */
enum lorry2_right_lamps {
    LORRY2_RIGHT_LAMPS_OFF = 0, /* off */
    LORRY2_RIGHT_LAMPS_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct lorry2_in {
    bool stalk_left; /* indicator stalk, left */
    bool stalk_right; /* indicator stalk, right */
    uint16_t shunt; /* shunt in the common feed with its amplifier, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: lorry2_port.c does the rest.
 */
struct lorry2_out {
    bool left_lamps; /* left lamps, front and rear; rests off, safe off */
    bool right_lamps; /* right lamps, front and rear; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct lorry2_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct lorry2 {
    uint8_t shunt_good_for; /* good samples in a row */
    /* enum lorry2_shunt_state: shunt in the common feed with its amplifier: is it believed? */
    uint8_t shunt_state;
    uint8_t shunt_state_for; /* steps in this state */
    uint16_t shunt_last; /* shunt in the common feed with its amplifier: last believable sample */
    /* shunt in the common feed with its amplifier: the believable sample before that */
    uint16_t shunt_before;
    bool flasher_lamp_out; /* thermal flasher behind the panel: the lamps draw too little */
    uint8_t flasher_at; /* thermal flasher behind the panel: steps since it made */
    bool flasher_dim; /* thermal flasher behind the panel: the last flash drew too little */
    uint8_t left_lamps; /* enum lorry2_left_lamps: left lamps, front and rear */
    uint8_t right_lamps; /* enum lorry2_right_lamps: right lamps, front and rear */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void lorry2_start(struct lorry2 *m, const struct lorry2_remembered *r);

/* Once every LORRY2_STEP_MS. The times of the program are counts of these calls. */
void lorry2_step(struct lorry2 *m, const struct lorry2_in *in, struct lorry2_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool lorry2_remember(const struct lorry2 *m, struct lorry2_remembered *r);

#endif
