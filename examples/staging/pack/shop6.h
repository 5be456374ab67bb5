/* shop6.h: control program, what a caller needs
 *
 * Equipment: Air unit, shop 6
 * Site: Ferry House
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 32f7d1ef79301c6ede0455790c8aceb65249c467c20e6eea1a29094717386ee2
 *
 * Replaces:
 * - stage_one: sequence control, first contact
 * - stage_two: sequence control, second contact
 * - cool_stage: sequence control, third contact
 *
 * Stays hard-wired, and must:
 * - duct_limit: capillary limit across the duct heater, manual reset
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
 * Open findings: 1 restarts_by_itself (act, cooling); 2 restarts_by_itself (act, supply_fan); 3
 * safe_on_but_rests_off (act, supply_fan); 4 proving_switch_not_checked_open (act, occupied); 5
 * welded_output (act, cooling); 6 welded_output (act, supply_fan); 7 earth_fault_bypasses_limit
 * (act, shop6); 8 moisture_direction (act, room_probe); 9 contact_life (act, heat_one); 10
 * mercury_asbestos_refrigerant (act, cool_stage); 11 mercury_asbestos_refrigerant (act, stage_one);
 * 12 mercury_asbestos_refrigerant (act, stage_two); 13 approval_lapses (act, shop6); 14
 * load_effect_unknown (act, supply_fan); 15 output_doubtful (act, supply_fan). Not judged, for want
 * of a figure: 3; risks.md says which.
 */
#ifndef SHOP6_H
#define SHOP6_H

#include <stdbool.h>
#include <stdint.h>

#define SHOP6_STEP_MS 500u /* ms from one call of shop6_step to the next */

/* Bits of fault in struct shop6_out; 0 means none. */
#define SHOP6_FAULT_ROOM_PROBE 0x0001u /* return air grille, where the old bulb was: not believed */
/* 6 kW duct heater, first stage, through its contactor: the contact did not open */
#define SHOP6_FAULT_HEAT_ONE_WELDED 0x0002u
/* 6 kW duct heater, first stage, through its contactor: the contact did not make */
#define SHOP6_FAULT_HEAT_ONE_NOT_MADE 0x0004u
/* 6 kW duct heater, first stage, through its contactor: on for long without effect on room_probe */
#define SHOP6_FAULT_HEAT_ONE_NO_EFFECT 0x0008u
/* 6 kW duct heater, second stage, through its contactor: the contact did not open */
#define SHOP6_FAULT_HEAT_TWO_WELDED 0x0010u
/* 6 kW duct heater, second stage, through its contactor: the contact did not make */
#define SHOP6_FAULT_HEAT_TWO_NOT_MADE 0x0020u

/* return air grille, where the old bulb was: is it believed? */
enum shop6_room_probe_state {
    SHOP6_ROOM_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    SHOP6_ROOM_PROBE_STATE_GOOD = 1, /* believed */
    SHOP6_ROOM_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    SHOP6_ROOM_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* sequence control, first contact */
enum shop6_stage_one {
    SHOP6_STAGE_ONE_OPEN = 0, /* contact open */
    SHOP6_STAGE_ONE_MADE = 1 /* contact made */
};

/* sequence control, second contact */
enum shop6_stage_two {
    SHOP6_STAGE_TWO_OPEN = 0, /* contact open */
    SHOP6_STAGE_TWO_MADE = 1 /* contact made */
};

/* sequence control, third contact */
enum shop6_cool_stage {
    SHOP6_COOL_STAGE_OPEN = 0, /* contact open */
    SHOP6_COOL_STAGE_MADE = 1 /* contact made */
};

/* 6 kW duct heater, first stage, through its contactor */
enum shop6_heat_one {
    SHOP6_HEAT_ONE_OFF = 0, /* off */
    SHOP6_HEAT_ONE_ON = 1 /* on */
};

/* the second stage waits for the first */
enum shop6_second_waits {
    SHOP6_SECOND_WAITS_IDLE = 0, /* nothing to do */
    SHOP6_SECOND_WAITS_RUNNING = 1, /* running */
    SHOP6_SECOND_WAITS_DONE = 2 /* has run; waits for its cause to go off */
};

/* the fan runs on */
enum shop6_run_on {
    SHOP6_RUN_ON_IDLE = 0, /* nothing to do */
    SHOP6_RUN_ON_RUNNING = 1, /* running */
    SHOP6_RUN_ON_ARMED = 2 /* its cause is on */
};

/* 6 kW duct heater, second stage, through its contactor */
enum shop6_heat_two {
    SHOP6_HEAT_TWO_OFF = 0, /* off */
    SHOP6_HEAT_TWO_ON = 1 /* on */
};

/* compressor of the cooling coil, through its contactor */
enum shop6_cooling {
    SHOP6_COOLING_OFF = 0, /* off */
    SHOP6_COOLING_ON = 1 /* on */
};

/* supply fan */
enum shop6_supply_fan {
    SHOP6_SUPPLY_FAN_OFF = 0, /* off */
    SHOP6_SUPPLY_FAN_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct shop6_in {
    bool airflow; /* air flow switch behind the fan */
    bool occupied; /* time switch of the shop */
    uint16_t room_probe; /* return air grille, where the old bulb was, raw counts */
    /* read-back contact of 6 kW duct heater, first stage, through its contactor */
    bool heat_one_seen;
    /* read-back contact of 6 kW duct heater, second stage, through its contactor */
    bool heat_two_seen;
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: shop6_port.c does the rest.
 */
struct shop6_out {
    bool heat_one; /* 6 kW duct heater, first stage, through its contactor; rests off, safe off */
    bool heat_two; /* 6 kW duct heater, second stage, through its contactor; rests off, safe off */
    bool cooling; /* compressor of the cooling coil, through its contactor; rests off, safe off */
    bool supply_fan; /* supply fan; rests off, safe on */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct shop6_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct shop6 {
    uint8_t room_probe_good_for; /* good samples in a row */
    /* enum shop6_room_probe_state: return air grille, where the old bulb was: is it believed? */
    uint8_t room_probe_state;
    uint8_t room_probe_state_for; /* steps in this state */
    /* return air grille, where the old bulb was: last believable sample */
    uint16_t room_probe_last;
    /* return air grille, where the old bulb was: the believable sample before that */
    uint16_t room_probe_before;
    uint8_t stage_one; /* enum shop6_stage_one: sequence control, first contact */
    uint8_t stage_two; /* enum shop6_stage_two: sequence control, second contact */
    uint8_t cool_stage; /* enum shop6_cool_stage: sequence control, third contact */
    /* enum shop6_heat_one: 6 kW duct heater, first stage, through its contactor */
    uint8_t heat_one;
    uint8_t heat_one_for; /* steps since it last switched */
    bool heat_one_airflow_seen_off; /* airflow was seen off since heat_one last ran */
    uint8_t heat_one_apart_for; /* steps that contact and command have differed */
    bool heat_one_welded; /* the contact did not open when told to */
    uint16_t heat_one_effect_from; /* reading furthest back since heat_one came on */
    uint16_t heat_one_effect_for; /* steps on without an effect */
    bool heat_one_no_effect; /* was on for long without an effect */
    uint8_t second_waits; /* enum shop6_second_waits: the second stage waits for the first */
    uint16_t second_waits_for; /* steps in this state */
    uint8_t run_on; /* enum shop6_run_on: the fan runs on */
    uint16_t run_on_for; /* steps in this state */
    /* enum shop6_heat_two: 6 kW duct heater, second stage, through its contactor */
    uint8_t heat_two;
    bool heat_two_airflow_seen_off; /* airflow was seen off since heat_two last ran */
    uint8_t heat_two_apart_for; /* steps that contact and command have differed */
    bool heat_two_welded; /* the contact did not open when told to */
    uint8_t cooling; /* enum shop6_cooling: compressor of the cooling coil, through its contactor */
    uint16_t cooling_for; /* steps since it last switched */
    bool cooling_airflow_seen_off; /* airflow was seen off since cooling last ran */
    uint8_t supply_fan; /* enum shop6_supply_fan: supply fan */
    bool supply_fan_airflow_seen_off; /* airflow was seen off since supply_fan last ran */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void shop6_start(struct shop6 *m, const struct shop6_remembered *r);

/* Once every SHOP6_STEP_MS. The times of the program are counts of these calls. */
void shop6_step(struct shop6 *m, const struct shop6_in *in, struct shop6_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool shop6_remember(const struct shop6 *m, struct shop6_remembered *r);

#endif
