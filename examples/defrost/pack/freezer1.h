/* freezer1.h: control program, what a caller needs
 *
 * Equipment: Freezer room 1
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 1f8c58c041d92eadc6dae97188ff3a72f4678da398d9ac747ea86898351923fb
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - fan_delay: disc on the coil, holds the fans back while the coil is warm
 *
 * Stays hard-wired, and must:
 * - heater_disc: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, thaw/coil_fan); 2 danger_without_barrier (act,
 * thaw/compressor); 3 danger_without_barrier (act, thaw/defrost_heater); 4 restarts_by_itself (act,
 * coil_fan); 5 restarts_by_itself (act, compressor); 6 fan_stopped_on_fault (act, coil_fan); 7
 * welded_output (act, coil_fan); 8 welded_output (act, compressor); 9 earth_fault_bypasses_limit
 * (act, freezer1); 10 probe_out_of_pocket (act, fan_delay); 11 moisture_direction (act,
 * room_probe); 12 mercury_asbestos_refrigerant (act, fan_delay); 13 mercury_asbestos_refrigerant
 * (act, room_stat); 14 approval_lapses (act, freezer1); 15 limit_trips_late (act,
 * heater_disc/thaw); 16 heat_flow_not_proved (act, coil_fan). Not judged, for want of a figure: 3;
 * risks.md says which.
 */
#ifndef FREEZER1_H
#define FREEZER1_H

#include <stdbool.h>
#include <stdint.h>

#define FREEZER1_STEP_MS 500u /* ms from one call of freezer1_step to the next */

/* Bits of fault in struct freezer1_out; 0 means none. */
#define FREEZER1_FAULT_ROOM_PROBE 0x0001u /* return air: not believed */
/* on the coil, at the last row, where the old discs were: not believed */
#define FREEZER1_FAULT_COIL_PROBE 0x0002u
/* 3 kW compressor through its contactor: on for long without effect on room_probe */
#define FREEZER1_FAULT_COMPRESSOR_NO_EFFECT 0x0004u

/* return air: is it believed? */
enum freezer1_room_probe_state {
    FREEZER1_ROOM_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    FREEZER1_ROOM_PROBE_STATE_GOOD = 1, /* believed */
    FREEZER1_ROOM_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    FREEZER1_ROOM_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* on the coil, at the last row, where the old discs were: is it believed? */
enum freezer1_coil_probe_state {
    FREEZER1_COIL_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    FREEZER1_COIL_PROBE_STATE_GOOD = 1, /* believed */
    FREEZER1_COIL_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    FREEZER1_COIL_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* vapour-bulb control in the return air */
enum freezer1_room_stat {
    FREEZER1_ROOM_STAT_OPEN = 0, /* contact open */
    FREEZER1_ROOM_STAT_MADE = 1 /* contact made */
};

/* disc on the coil, holds the fans back while the coil is warm */
enum freezer1_fan_delay {
    FREEZER1_FAN_DELAY_OPEN = 0, /* contact open */
    FREEZER1_FAN_DELAY_MADE = 1 /* contact made */
};

/* defrost, at most 25 min */
enum freezer1_defrost {
    FREEZER1_DEFROST_IDLE = 0, /* waits for its time */
    FREEZER1_DEFROST_RUNNING = 1 /* running */
};

/* 1.8 kW defrost heater in coil and tray */
enum freezer1_defrost_heater {
    FREEZER1_DEFROST_HEATER_OFF = 0, /* off */
    FREEZER1_DEFROST_HEATER_ON = 1 /* on */
};

/* drip time */
enum freezer1_drip {
    FREEZER1_DRIP_IDLE = 0, /* nothing to do */
    FREEZER1_DRIP_RUNNING = 1, /* running */
    FREEZER1_DRIP_ARMED = 2 /* its cause is on */
};

/* 3 kW compressor through its contactor */
enum freezer1_compressor {
    FREEZER1_COMPRESSOR_OFF = 0, /* off */
    FREEZER1_COMPRESSOR_ON = 1 /* on */
};

/* two fans on the coil */
enum freezer1_coil_fan {
    FREEZER1_COIL_FAN_OFF = 0, /* off */
    FREEZER1_COIL_FAN_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct freezer1_in {
    bool hp_switch; /* high-pressure switch of the compressor, healthy when closed */
    uint16_t room_probe; /* return air, raw counts */
    uint16_t coil_probe; /* on the coil, at the last row, where the old discs were, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: freezer1_port.c does the rest.
 */
struct freezer1_out {
    bool defrost_heater; /* 1.8 kW defrost heater in coil and tray; rests off, safe off */
    bool compressor; /* 3 kW compressor through its contactor; rests off, safe off */
    bool coil_fan; /* two fans on the coil; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct freezer1_remembered {
    uint8_t defrost_place; /* parts of the period gone by */
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct freezer1 {
    uint8_t room_probe_good_for; /* good samples in a row */
    uint8_t room_probe_state; /* enum freezer1_room_probe_state: return air: is it believed? */
    uint8_t room_probe_state_for; /* steps in this state */
    uint16_t room_probe_last; /* return air: last believable sample */
    uint16_t room_probe_before; /* return air: the believable sample before that */
    uint8_t coil_probe_good_for; /* good samples in a row */
    /* enum freezer1_coil_probe_state: on the coil, at the last row, where the old discs were: is it
     * believed?
     */
    uint8_t coil_probe_state;
    uint8_t coil_probe_state_for; /* steps in this state */
    /* on the coil, at the last row, where the old discs were: last believable sample */
    uint16_t coil_probe_last;
    /* on the coil, at the last row, where the old discs were: the believable sample before that */
    uint16_t coil_probe_before;
    uint8_t room_stat; /* enum freezer1_room_stat: vapour-bulb control in the return air */
    /* enum freezer1_fan_delay: disc on the coil, holds the fans back while the coil is warm */
    uint8_t fan_delay;
    uint16_t defrost_at; /* steps since the period began */
    uint8_t defrost_place; /* parts of the period gone by */
    bool defrost_awake; /* the place has been found again after the start */
    uint8_t defrost; /* enum freezer1_defrost: defrost, at most 25 min */
    /* enum freezer1_defrost_heater: 1.8 kW defrost heater in coil and tray */
    uint8_t defrost_heater;
    uint8_t drip; /* enum freezer1_drip: drip time */
    uint16_t drip_for; /* steps in this state */
    uint8_t compressor; /* enum freezer1_compressor: 3 kW compressor through its contactor */
    uint16_t compressor_for; /* steps since it last switched */
    uint16_t compressor_effect_from; /* reading furthest back since compressor came on */
    uint16_t compressor_effect_for; /* steps on without an effect */
    bool compressor_no_effect; /* was on for long without an effect */
    uint8_t coil_fan; /* enum freezer1_coil_fan: two fans on the coil */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void freezer1_start(struct freezer1 *m, const struct freezer1_remembered *r);

/* Once every FREEZER1_STEP_MS. The times of the program are counts of these calls. */
void freezer1_step(struct freezer1 *m, const struct freezer1_in *in, struct freezer1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool freezer1_remember(const struct freezer1 *m, struct freezer1_remembered *r);

#endif
