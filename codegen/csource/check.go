package csource

import (
	"strings"

	"makebreak/translate/logic"
)

// Row is a stretch of steps on the same inputs, during which no output changes,
// or, with a pulsed drive, the outputs alternate.
type Row struct {
	Inputs  []int64 // in the order of Program.Inputs
	Steps   int
	Outputs []int64 // after each of the steps, in the order of Program.Outputs
	Then    []int64 // nil, or the outputs after the second, fourth … step
	State   []int64 // after the last one, in the order of Program.State
}

// Vector is a sequence of rows from a start.
type Vector struct {
	Start *logic.Record // nil: without a record
	Rows  []Row
}

// Check prints <id>_check.c: the recorded inputs through the C, every output
// compared at every step, the whole state at the end of every row.
// Missed are the transitions that the recorded inputs do not make; the file
// names them.
func (s Source) Check(vectors []Vector, missed []string) string {
	w := s.printer()
	w.banner(s.Facts, w.lo+"_check.c", "recorded inputs through the program; runs on any host")
	if len(missed) > 0 {
		w.comment("", append([]string{"Transitions that the recorded inputs do not make; no way to them was found:"}, missed...)...)
	} else {
		w.comment("", "The recorded inputs visit every state and make every transition.")
	}
	w.line("#include \"%s.h\"\n\n#include <stdio.h>\n#include <string.h>\n", w.lo)
	w.verdicts(count(vectors) > 0 || len(machinesOf(w.p)) > 0)
	if rows := count(vectors); rows > 0 {
		w.rows(vectors)
		w.runner(alternates(vectors))
	}
	w.records()
	w.upset()
	w.checkMain(count(vectors) > 0)
	return w.String()
}

func count(vectors []Vector) int {
	n := 0
	for _, v := range vectors {
		n += len(v.Rows)
	}
	return n
}

// alternates reports whether an output changes within a row anywhere.
func alternates(vectors []Vector) bool {
	for _, v := range vectors {
		for _, r := range v.Rows {
			if r.Then != nil {
				return true
			}
		}
	}
	return false
}

// verdicts prints how a difference is found, shown and counted.
func (w *printer) verdicts(outputs bool) {
	w.comment("", "What has been compared, and where the comparison stands.")
	w.line(`static unsigned long passed;
static unsigned long failed;
static const char *doing = "";
static unsigned long vector_now;
static unsigned long row_now;
static unsigned long step_now;

#define MOST_SHOWN 20ul

static bool bad;

static void compare(const char *what, long got, long wanted)
{
    if (got == wanted) {
        return;
    }
    bad = true;
    if (failed < MOST_SHOWN) {
        (void)printf("%%s, vector %%lu row %%lu step %%lu: %%s is %%ld, wanted %%ld\n", doing, vector_now,
                     row_now, step_now, what, got, wanted);
    }
}

static void verdict(void)
{
    if (bad) {
        failed++;
    } else {
        passed++;
    }
    bad = false;
}
`)
	if outputs {
		w.comparator("compare_out", w.lo+"_out", w.p.Outputs)
	}
	w.comparator("compare_state", w.lo, w.p.State)
}

// comparator prints the function that compares two structs, member by member.
func (w *printer) comparator(name, typ string, vs []*logic.Var) {
	w.statement("", "static void ", call(name, atom("const struct "+typ+" *got"), atom("const struct "+typ+" *wanted")), "")
	w.line("{")
	for _, v := range vs {
		m := w.vars[v]
		w.statement("    ", "", call("compare", atom(String(v.Name)), atom("(long)got->"+m), atom("(long)wanted->"+m)), ";")
	}
	if len(vs) == 0 {
		w.line("    (void)got;\n    (void)wanted;")
	}
	w.line("    verdict();\n}\n")
}

// list prints the values of some variables as the initialiser of a struct.
func (w *printer) list(vs []*logic.Var, values []int64) string {
	var parts []string
	for i, v := range vs {
		parts = append(parts, numeral(values[i], w.typeOf(v)))
	}
	if len(parts) == 0 {
		return "{0u}"
	}
	return "{" + strings.Join(parts, ", ") + "}"
}

// entry prints an initialiser that consists of several, within the width.
func (w *printer) entry(parts ...string) {
	line := "   "
	for i, p := range parts {
		if i < len(parts)-1 {
			p += ","
		}
		for _, word := range strings.SplitAfter(p, ", ") {
			if len(line)+1+len(strings.TrimRight(word, " ")) > lineWidth {
				w.line("%s", line)
				line = "    "
			}
			line += " " + strings.TrimRight(word, " ")
		}
	}
	w.line("%s", line)
}

func (w *printer) rows(vectors []Vector) {
	then := alternates(vectors)
	if then {
		w.comment("", "Inputs held for so many steps; the outputs after each odd and each even step of them; the state after the last.")
	} else {
		w.comment("", "Inputs held for so many steps; the outputs after each of them; the state after the last.")
	}
	w.line("struct row {\n    uint32_t steps;\n    struct %s_in in;\n    struct %s_out out;", w.lo, w.lo)
	if then {
		w.line("    struct %s_out even;", w.lo)
	}
	w.line("    struct %s after;\n};\n", w.lo)
	w.line("static const struct row rows[] = {")
	for i, v := range vectors {
		w.line("    /* vector %d */", i+1)
		for _, r := range v.Rows {
			parts := []string{"{" + natural(int64(r.Steps)), w.list(w.p.Inputs, r.Inputs), w.list(w.p.Outputs, r.Outputs)}
			if then {
				even := r.Then
				if even == nil {
					even = r.Outputs
				}
				parts = append(parts, w.list(w.p.Outputs, even))
			}
			w.entry(append(parts, w.list(w.p.State, r.State)+"},")...)
		}
	}
	w.line("};\n")
	w.comment("", "Where each vector begins and ends in the rows, and the record that it starts with.")
	w.line("struct vector {\n    uint32_t first;\n    uint32_t end;\n    bool has_record;\n    struct %s_remembered record;\n};\n", w.lo)
	w.line("static const struct vector vectors[] = {")
	at := int64(0)
	for _, v := range vectors {
		end := at + int64(len(v.Rows))
		w.entry("{"+natural(at), natural(end), numeral(bit(v.Start != nil), "bool"), w.record(v.Start)+"},")
		at = end
	}
	w.line("};\n")
}

func bit(b bool) int64 {
	if b {
		return 1
	}
	return 0
}

// record prints a remembered record; nil stands for one that is not used.
func (w *printer) record(r *logic.Record) string {
	var parts []string
	for i, v := range w.p.Survivors() {
		value := int64(0)
		if r != nil {
			value = r.Values[i]
		}
		parts = append(parts, numeral(value, keptType(v)))
	}
	check := uint16(0)
	if r != nil {
		check = r.Check
	}
	return "{" + strings.Join(append(parts, natural(int64(check))), ", ") + "}"
}

func (w *printer) runner(then bool) {
	out := "&rows[i].out"
	if then {
		out = "((n & 1u) == 0u) ? &rows[i].out : &rows[i].even"
	}
	w.line("static void run(const struct vector *v)\n{\n    struct %s m;\n    struct %s_out out;\n    uint32_t i;\n    uint32_t n;\n", w.lo, w.lo)
	w.line("    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */\n    (void)memset(&out, 0, sizeof out);")
	w.line("    %s_start(&m, v->has_record ? &v->record : NULL);", w.lo)
	w.line("    for (i = v->first; i < v->end; i++) {\n        row_now = (unsigned long)(i - v->first) + 1ul;\n        for (n = 0u; n < rows[i].steps; n++) {")
	w.line("            step_now = (unsigned long)n + 1ul;\n            %s_step(&m, &rows[i].in, &out);\n            compare_out(&out, %s);\n        }", w.lo, out)
	w.line("        compare_state(&m, &rows[i].after);\n    }\n}\n")
}

// records checks that only a good record is believed, and that the program
// believes its own.
func (w *printer) records() {
	fresh := w.p.NewRun()
	fresh.Start(nil)
	w.line("static const struct %s fresh =", w.lo)
	w.entry(w.list(w.p.State, w.stateOf(fresh)) + ";")
	w.line("\nstatic void start_and_compare(const char *what, const struct %s_remembered *r,", w.lo)
	w.line("                              const struct %s *wanted)\n{\n    struct %s m;\n", w.lo, w.lo)
	w.line("    doing = what;\n    (void)memset(&m, 0x5A, sizeof m);\n    %s_start(&m, r);\n    compare_state(&m, wanted);\n}\n", w.lo)
	w.line("static void records(void)\n{\n    struct %s m;\n    struct %s_remembered r;\n", w.lo, w.lo)
	w.line("    start_and_compare(\"start without a record\", NULL, &fresh);")
	w.line("    (void)memset(&r, 0x00, sizeof r);\n    start_and_compare(\"start with a blank record\", &r, &fresh);")
	w.line("    (void)memset(&r, 0xFF, sizeof r);\n    start_and_compare(\"start with an erased record\", &r, &fresh);")
	if len(w.p.Survivors()) > 0 {
		w.goodRecord()
	}
	w.line("\n    doing = \"record\";\n    m = fresh;\n    (void)memset(&r, 0x00, sizeof r);")
	w.line("    compare(\"changed\", %s_remember(&m, &r) ? 1l : 0l, 1l);\n    verdict();", w.lo)
	w.line("    compare(\"changed\", %s_remember(&m, &r) ? 1l : 0l, 0l);\n    verdict();", w.lo)
	w.line("    start_and_compare(\"start with its own record\", &r, &fresh);\n}\n")
}

func (w *printer) goodRecord() {
	survivors := w.p.Survivors()
	values := make([]int64, len(survivors))
	for i, v := range survivors {
		values[i] = v.Range.Lo
		if v.Start == v.Range.Lo {
			values[i] = v.Range.Hi
		}
	}
	good := &logic.Record{Values: values, Check: w.p.CheckWord(values)}
	run := w.p.NewRun()
	run.Start(good)
	w.line("    {\n        static const struct %s_remembered good =", w.lo)
	w.entry("       " + w.record(good) + ";")
	w.line("        static const struct %s after =", w.lo)
	w.entry("       " + w.list(w.p.State, w.stateOf(run)) + ";")
	w.line("\n        start_and_compare(\"start with a good record\", &good, &after);")
	w.line("        r = good;\n        r.check++;\n        start_and_compare(\"start with a wrong check word\", &r, &fresh);")
	for i, v := range survivors {
		m, t := w.kept[v], keptType(v)
		w.line("        r = good;\n        r.%s = %s; /* a flipped bit */", m, numeral(flipped(values[i], t), t))
		w.line("        start_and_compare(\"start with a flipped bit\", &r, &fresh);")
		for _, value := range outside(v) {
			bad := append([]int64(nil), values...)
			bad[i] = value
			w.line("        r = good;\n        r.%s = %s; /* out of its range, under a good check word */", m, numeral(value, t))
			w.line("        r.check = %s;\n        start_and_compare(\"start with a value out of range\", &r, &fresh);", natural(int64(w.p.CheckWord(bad))))
		}
		other := &logic.Record{Values: append([]int64(nil), values...)}
		other.Values[i] = v.Start
		other.Check = w.p.CheckWord(other.Values)
		if v.Start != values[i] {
			w.line("        m = after;\n        r = good;\n        m.%s = %s;\n        doing = \"record\";", w.vars[v], w.initial(v))
			w.line("        compare(%s, %s_remember(&m, &r) ? 1l : 0l, 1l);\n        verdict();", String(v.Name+" changed"), w.lo)
			w.line("        compare(\"check word\", (long)r.check, %dl);\n        verdict();", other.Check)
		}
	}
	w.line("    }")
}

// flipped is a value of a type with its lowest bit changed.
func flipped(v int64, typ string) int64 {
	if f := v ^ 1; holds(typ).Holds(f) {
		return f
	}
	return v
}

// outside gives the values next to the range of a variable that its type in
// the record can hold.
func outside(v *logic.Var) []int64 {
	var vs []int64
	for _, n := range []int64{v.Range.Lo - 1, v.Range.Hi + 1} {
		if holds(keptType(v)).Holds(n) && n <= logic.Int32.Hi {
			vs = append(vs, n)
		}
	}
	return vs
}

func (w *printer) stateOf(run *logic.Run) []int64 {
	var values []int64
	for _, v := range w.p.State {
		values = append(values, run.Get(v))
	}
	return values
}

// upset checks where the program goes from values that are no states.
func (w *printer) upset() {
	any := false
	for i, v := range w.p.State {
		m := w.machineOf(v)
		if m == nil {
			continue
		}
		if !any {
			any = true
			w.line("static void upset(void)\n{\n    struct %s m;\n    struct %s_in in;\n    struct %s_out out;\n", w.lo, w.lo, w.lo)
			w.line("    (void)memset(&in, 0, sizeof in);\n    (void)memset(&out, 0, sizeof out);")
		}
		for _, value := range []int64{int64(len(m.At)), 255} {
			run := w.p.NewRun()
			run.Start(nil)
			snap := run.Snapshot(nil)
			snap[i] = value
			run.Restore(snap)
			run.Step(make([]int64, len(w.p.Inputs)))
			var outputs []int64
			for _, o := range w.p.Outputs {
				outputs = append(outputs, run.Get(o))
			}
			w.line("    {\n        static const struct %s after =", w.lo)
			w.entry("       " + w.list(w.p.State, w.stateOf(run)) + ";")
			w.line("        static const struct %s_out wanted =", w.lo)
			w.entry("       " + w.list(w.p.Outputs, outputs) + ";")
			w.line("\n        doing = %s;\n        %s_start(&m, NULL);\n        m.%s = %s;\n        %s_step(&m, &in, &out);", String(v.Name+" upset"), w.lo, w.vars[v], natural(value), w.lo)
			w.line("        compare_out(&out, &wanted);\n        compare_state(&m, &after);\n    }")
		}
	}
	if any {
		w.line("}\n")
	}
}

func (w *printer) machineOf(v *logic.Var) *logic.Machine {
	for _, b := range w.p.Order {
		if m, ok := b.(*logic.Machine); ok && m.Var == v {
			return m
		}
	}
	return nil
}

func (w *printer) checkMain(rows bool) {
	w.line("int main(void)\n{")
	if rows {
		w.line("    uint32_t i;\n\n    doing = \"recorded inputs\";")
		w.line("    for (i = 0u; i < (uint32_t)(sizeof vectors / sizeof vectors[0]); i++) {\n        vector_now = (unsigned long)i + 1ul;\n        run(&vectors[i]);\n    }")
		w.line("    vector_now = 0ul;\n    row_now = 0ul;\n    step_now = 0ul;")
	}
	w.line("    records();")
	if len(machinesOf(w.p)) > 0 {
		w.line("    upset();")
	}
	w.line("    (void)printf(\"%%lu passed, %%lu failed\\n\", passed, failed);\n    return (failed == 0ul) ? 0 : 1;\n}")
}

func machinesOf(p *logic.Checked) []*logic.Machine {
	var ms []*logic.Machine
	for _, b := range p.Order {
		if m, ok := b.(*logic.Machine); ok {
			ms = append(ms, m)
		}
	}
	return ms
}
