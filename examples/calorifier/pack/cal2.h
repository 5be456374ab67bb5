/* cal2.h: control program, what a caller needs
 *
 * Equipment: Calorifier 2, east plant room
 * Site: Harbour Lane Laundry
 * Printed by makebreak 0.1.0 from sheet.yaml
 * Sheet SHA-256: 2ab43e817eac8807b18bdd14c38c5efd2bd324b5d3f4009e33bafa75cbb44596
 *
 * Replaces:
 * - tank_stat: rod immersion stat in the top boss
 *
 * Stays hard-wired, and must:
 * - high_limit: capillary limit in the same boss, manual reset
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
 * Open findings: 2 proving_switch_not_checked_open (act, flow_proven); 3 earth_fault_bypasses_limit
 * (act, cal2); 4 insulation_of_new_probe (act, tank_probe); 5 contact_life (act, heater); 6
 * scald_and_storage (act, tank_stat); 7 model_beyond_evidence (act, cal2); 8
 * mercury_asbestos_refrigerant (act, tank_stat); 9 approval_lapses (act, cal2). Not judged, for
 * want of a figure: 1; risks.md says which.
 */
#ifndef CAL2_H
#define CAL2_H

#include <stdbool.h>
#include <stdint.h>

#define CAL2_STEP_MS 250u /* ms from one call of cal2_step to the next */

/* Bits of fault in struct cal2_out; 0 means none. */
/* thermistor in the pocket of the old rod stat: not believed */
#define CAL2_FAULT_TANK_PROBE 0x0001u
/* 9 kW immersion heater through its contactor: the contact did not open */
#define CAL2_FAULT_HEATER_WELDED 0x0002u
/* 9 kW immersion heater through its contactor: the contact did not make */
#define CAL2_FAULT_HEATER_NOT_MADE 0x0004u
/* 9 kW immersion heater through its contactor: on for long without effect on tank_probe */
#define CAL2_FAULT_HEATER_NO_EFFECT 0x0008u

/* thermistor in the pocket of the old rod stat: is it believed? */
enum cal2_tank_probe_state {
    CAL2_TANK_PROBE_STATE_PROVING = 0, /* has not proved itself since the start */
    CAL2_TANK_PROBE_STATE_GOOD = 1, /* believed */
    CAL2_TANK_PROBE_STATE_SUSPECT = 2, /* has given bad samples; nothing new may be started */
    CAL2_TANK_PROBE_STATE_FAULTY = 3 /* not believed; its loads are in their safe state */
};

/* rod immersion stat in the top boss */
enum cal2_tank_stat {
    CAL2_TANK_STAT_OPEN = 0, /* contact open */
    CAL2_TANK_STAT_MADE = 1 /* contact made */
};

/* 9 kW immersion heater through its contactor */
enum cal2_heater {
    CAL2_HEATER_OFF = 0, /* off */
    CAL2_HEATER_ON = 1 /* on */
};

/* What the board hands over at every step. */
struct cal2_in {
    bool flow_proven; /* flow switch on the primary pump */
    bool limit_open; /* auxiliary contact of the limit's own contactor */
    uint16_t tank_probe; /* thermistor in the pocket of the old rod stat, raw counts */
    bool heater_seen; /* read-back contact of 9 kW immersion heater through its contactor */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: cal2_port.c does the rest.
 */
struct cal2_out {
    bool heater; /* 9 kW immersion heater through its contactor; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct cal2_remembered {
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct cal2 {
    uint8_t tank_probe_good_for; /* good samples in a row */
    /* enum cal2_tank_probe_state: thermistor in the pocket of the old rod stat: is it believed? */
    uint8_t tank_probe_state;
    uint8_t tank_probe_state_for; /* steps in this state */
    /* thermistor in the pocket of the old rod stat: last believable sample */
    uint16_t tank_probe_last;
    /* thermistor in the pocket of the old rod stat: the believable sample before that */
    uint16_t tank_probe_before;
    uint8_t tank_stat; /* enum cal2_tank_stat: rod immersion stat in the top boss */
    uint8_t heater; /* enum cal2_heater: 9 kW immersion heater through its contactor */
    uint8_t heater_for; /* steps since it last switched */
    uint8_t heater_apart_for; /* steps that contact and command have differed */
    bool heater_welded; /* the contact did not open when told to */
    uint16_t heater_effect_from; /* reading furthest back since heater came on */
    uint16_t heater_effect_for; /* steps on without an effect */
    bool heater_no_effect; /* was on for long without an effect */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void cal2_start(struct cal2 *m, const struct cal2_remembered *r);

/* Once every CAL2_STEP_MS. The times of the program are counts of these calls. */
void cal2_step(struct cal2 *m, const struct cal2_in *in, struct cal2_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool cal2_remember(const struct cal2 *m, struct cal2_remembered *r);

#endif
