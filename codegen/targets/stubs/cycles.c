/* Counts the cycles and the stack of one function of an AVR program, from its
 * entry to its return: cycles ELF MCU BYTE-ADDRESS MOST-CALLS
 */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include <simavr/sim_avr.h>
#include <simavr/sim_elf.h>

static void quiet(avr_t *avr, const int level, const char *format, va_list args)
{
    (void)avr;
    if (level <= LOG_ERROR) {
        (void)vfprintf(stderr, format, args);
    }
}

int main(int argc, char **argv)
{
    static elf_firmware_t firmware;
    unsigned long long begun = 0, calls = 0, sum = 0, most = 0, least = ~0ull, wanted;
    unsigned long function;
    unsigned at = 0, deepest = 0;
    int inside = 0;
    avr_t *avr;

    if (argc < 5) {
        return 2;
    }
    avr_global_logger_set(quiet);
    if (elf_read_firmware(argv[1], &firmware) != 0) {
        return 2;
    }
    (void)strncpy(firmware.mmcu, argv[2], sizeof firmware.mmcu - 1);
    firmware.frequency = 16000000;
    avr = avr_make_mcu_by_name(firmware.mmcu);
    if (avr == NULL) {
        return 2;
    }
    (void)avr_init(avr);
    avr_load_firmware(avr, &firmware);
    function = strtoul(argv[3], NULL, 16);
    wanted = strtoull(argv[4], NULL, 10);
    while (calls < wanted) {
        unsigned sp = avr->data[R_SPL] | (unsigned)(avr->data[R_SPH] << 8);
        int state;

        if (!inside && avr->pc == function) {
            inside = 1;
            begun = avr->cycle;
            at = sp;
        } else if (inside && sp > at) {
            unsigned long long took = avr->cycle - begun;

            inside = 0;
            calls++;
            sum += took;
            most = took > most ? took : most;
            least = took < least ? took : least;
        }
        if (inside && at - sp > deepest) {
            deepest = at - sp;
        }
        state = avr_run(avr);
        if (state == cpu_Done || state == cpu_Crashed) {
            break;
        }
    }
    (void)printf("%llu %.1f %llu %llu %u\n", calls, calls > 0 ? (double)sum / (double)calls : 0.0, least, most, deepest);
    return 0;
}
