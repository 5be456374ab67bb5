/* tank1.h: control program, what a caller needs
 *
 * Equipment: Tank 1, laundry
 * Site: Harbour Lane
 * Printed by makebreak 0.0.0 from sheet.yaml
 * Sheet SHA-256: 0123456789abcdef
 *
 * Replaces:
 * - tank_stat: rod stat
 * - high_limit: capillary limit, manual reset
 *
 * Stays hard-wired, and must:
 * - second_limit: in a pocket of its own, cuts the contactor
 *
 * Independent hardware limits stay in place, hard-wired.
 */
#ifndef TANK1_H
#define TANK1_H

#include <stdbool.h>
#include <stdint.h>

#define TANK1_STEP_MS 250u /* ms from one call of tank1_step to the next */

/* Bits of fault in struct tank1_out; 0 means none. */
#define TANK1_FAULT_TANK_PROBE 0x0001u /* probe not believed */
#define TANK1_FAULT_HIGH_LIMIT 0x0002u /* limit has tripped */

/* capillary limit: latched cut-out */
enum tank1_high_limit {
    TANK1_HIGH_LIMIT_CLOSED = 0, /* is closed */
    TANK1_HIGH_LIMIT_TRIPPED = 1 /* is tripped */
};

/* 9 kW immersion heater */
enum tank1_heater {
    TANK1_HEATER_OFF = 0, /* is off */
    TANK1_HEATER_ON = 1 /* is on */
};

/* What the board hands over at every step. */
struct tank1_in {
    uint16_t tank_probe; /* thermistor in the pocket of the old stat, raw counts (12 bits) */
    bool high_limit_reset; /* reset button of the limit, true while pressed */
};

/* What the program wants. True means that the load is on, or open, whichever way its coil has to be
 * driven for that: tank1_port.c does the rest.
 */
struct tank1_out {
    bool heater; /* 9 kW immersion heater; rests off, safe off */
    uint16_t fault; /* 0: none; one bit for each fault */
};

/* What must survive a power cut. The check word tells a good record from blank, torn or foreign
 * memory.
 */
struct tank1_remembered {
    uint8_t high_limit; /* capillary limit: latched cut-out */
    uint16_t check; /* check word over the rest */
};

/* The state of the program. The caller keeps it and changes nothing in it. */
struct tank1 {
    bool probe_good; /* the probe has been proved */
    uint8_t probe_since; /* samples in a row that say otherwise */
    uint8_t high_limit; /* enum tank1_high_limit: capillary limit: latched cut-out */
    bool reset_before; /* the button as it was; one that is held is no edge */
    uint8_t heater; /* enum tank1_heater: 9 kW immersion heater */
    uint8_t heater_for; /* steps since it last switched */
};

/* Once after every start of the processor, before the first step. Without a record (NULL), or with
 * a blank, wrong or foreign one, everything that remembers a trip comes up tripped.
 */
void tank1_start(struct tank1 *m, const struct tank1_remembered *r);

/* Once every TANK1_STEP_MS. The times of the program are counts of these calls. */
void tank1_step(struct tank1 *m, const struct tank1_in *in, struct tank1_out *out);

/* After every step: brings the record up to date. True when it has changed and must be written to
 * the memory that survives.
 */
bool tank1_remember(const struct tank1 *m, struct tank1_remembered *r);

#endif
