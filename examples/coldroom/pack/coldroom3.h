/* coldroom3.h: control program, what a caller needs
 *
 * Equipment: Cold room 3, dispatch
 * Site: Upper Mill Dairy
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 7ef342085c70459e6cb29baab250da8c6628f10255a6c73c759f4bacb45db0bc
 *
 * Replaces:
 * - room_stat: vapour-bulb control in the return air
 * - warm_stat: second vapour-bulb control, rings at the gatehouse
 *
 * Stays hard-wired, and must:
 * - defrost_limit: disc on the coil, opens the defrost heater by itself
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
 * Open findings: 1 danger_without_barrier (act, spoilage/compressor); 2 danger_without_barrier
 * (act, spoilage/defrost_heater); 3 restarts_by_itself (act, compressor); 4 welded_output (act,
 * compressor); 5 welded_output (act, warm_alarm); 6 earth_fault_bypasses_limit (act, coldroom3); 7
 * moisture_direction (act, room_probe); 8 damp_dust_washdown (act, coldroom3); 9
 * mercury_asbestos_refrigerant (act, room_stat); 10 mercury_asbestos_refrigerant (act, warm_stat);
 * 11 approval_lapses (act, coldroom3); 12 limit_trips_late (act, defrost_limit/spoilage). Not
 * judged, for want of a figure: 3; risks.md says which.
 */
#ifndef COLDROOM3_H
#define COLDROOM3_H

#include <stdbool.h>
#include <stdint.h>

#define COLDROOM3_STEP_MS 500u /* ms from one call of coldroom3_step to the next */

/* Bits of fault in struct coldroom3_out; 0 means none. */
#define COLDROOM3_FAULT_ROOM_PROBE 0x0001u /* return air: not believed */
#define COLDROOM3_FAULT_COIL_PROBE 0x0002u /* on the coil, at the last row: not believed */
/* 2.2 kW compressor through its contactor: on for long without effect on room_probe */
#define COLDROOM3_FAULT_COMPRESSOR_NO_EFFECT 0x0004u

/* return air: is it believed? */
enum coldroom3_room_probe_state {
    COLDROOM3_ROOM_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    COLDROOM3_ROOM_PROBE_STATE_GOOD = 1, /* believed */
    COLDROOM3_ROOM_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    COLDROOM3_ROOM_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* on the coil, at the last row: is it believed? */
enum coldroom3_coil_probe_state {
    COLDROOM3_COIL_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    COLDROOM3_COIL_PROBE_STATE_GOOD = 1, /* believed */
    COLDROOM3_COIL_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    COLDROOM3_COIL_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* vapour-bulb control in the return air */
enum coldroom3_room_stat {
    COLDROOM3_ROOM_STAT_OPEN = 0, /* contact open */
    COLDROOM3_ROOM_STAT_MADE = 1 /* contact made */
};

/* second vapour-bulb control, rings at the gatehouse */
enum coldroom3_warm_stat {
    COLDROOM3_WARM_STAT_OPEN = 0, /* contact open */
    COLDROOM3_WARM_STAT_MADE = 1 /* contact made */
};

/* defrost clock */
enum coldroom3_defrost {
    COLDROOM3_DEFROST_IDLE = 0, /* waits for its time */
    COLDROOM3_DEFROST_RUNNING = 1 /* running */
};

/* 2.2 kW compressor through its contactor */
enum coldroom3_compressor {
    COLDROOM3_COMPRESSOR_OFF = 0, /* off */
    COLDROOM3_COMPRESSOR_ON = 1 /* on */
};

/* 1.2 kW defrost heater in the coil */
enum coldroom3_defrost_heater {
    COLDROOM3_DEFROST_HEATER_OFF = 0, /* off */
    COLDROOM3_DEFROST_HEATER_ON = 1 /* on */
};

/* sounder at the gatehouse */
enum coldroom3_warm_alarm {
    COLDROOM3_WARM_ALARM_OFF = 0, /* off */
    COLDROOM3_WARM_ALARM_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct coldroom3_in {
    bool hp_switch; /* high-pressure switch of the compressor, healthy when closed */
    uint16_t room_probe; /* return air, raw counts */
    uint16_t coil_probe; /* on the coil, at the last row, raw counts */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: coldroom3_port.c does the rest.
 */
struct coldroom3_out {
    bool compressor; /* 2.2 kW compressor through its contactor; rests off, safe off */
    bool defrost_heater; /* 1.2 kW defrost heater in the coil; rests off, safe off */
    bool warm_alarm; /* sounder at the gatehouse; rests on, safe on */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct coldroom3_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct coldroom3 {
    uint8_t room_probe_good_for; /* good samples in a row */
    uint8_t room_probe_state; /* enum coldroom3_room_probe_state: return air: is it believed? */
    uint8_t room_probe_state_for; /* steps in this state */
    uint16_t room_probe_last; /* return air: last believable sample */
    uint16_t room_probe_before; /* return air: the believable sample before that */
    uint8_t coil_probe_good_for; /* good samples in a row */
    /* enum coldroom3_coil_probe_state: on the coil, at the last row: is it believed? */
    uint8_t coil_probe_state;
    uint8_t coil_probe_state_for; /* steps in this state */
    uint16_t coil_probe_last; /* on the coil, at the last row: last believable sample */
    /* on the coil, at the last row: the believable sample before that */
    uint16_t coil_probe_before;
    uint8_t room_stat; /* enum coldroom3_room_stat: vapour-bulb control in the return air */
    /* enum coldroom3_warm_stat: second vapour-bulb control, rings at the gatehouse */
    uint8_t warm_stat;
    uint16_t defrost_at; /* steps since the period began */
    uint8_t defrost; /* enum coldroom3_defrost: defrost clock */
    uint8_t compressor; /* enum coldroom3_compressor: 2.2 kW compressor through its contactor */
    uint16_t compressor_for; /* steps since it last switched */
    uint16_t compressor_effect_from; /* reading furthest back since compressor came on */
    uint16_t compressor_effect_for; /* steps on without an effect */
    bool compressor_no_effect; /* was on for long without an effect */
    uint8_t defrost_heater; /* enum coldroom3_defrost_heater: 1.2 kW defrost heater in the coil */
    uint8_t warm_alarm; /* enum coldroom3_warm_alarm: sounder at the gatehouse */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void coldroom3_start(struct coldroom3 *m, const struct coldroom3_remembered *r);

/* Once every COLDROOM3_STEP_MS. The times of the program are counts of these calls. */
void coldroom3_step(struct coldroom3 *m, const struct coldroom3_in *in, struct coldroom3_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool coldroom3_remember(const struct coldroom3 *m, struct coldroom3_remembered *r);

#endif
