package csource

import (
	"fmt"
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
	w.checkTypes()
	w.rows(vectors)
	w.comparisons()
	w.records()
	w.upset()
	w.checkMain(vectors)
	return w.String()
}

func (w *printer) checkTypes() {
	w.comment("", "Inputs held for so many steps; the outputs after each odd and each even step of them; the state after the last.")
	w.line("struct row {\n    uint32_t steps;\n    struct %s_in in;\n    struct %s_out odd;\n    struct %s_out even;\n    struct %s after;\n};\n", w.lo, w.lo, w.lo, w.lo)
	w.line("static unsigned long passed;\nstatic unsigned long failed;\n")
	w.line("static void verdict(bool good, const char *what, unsigned long vector, unsigned long row, unsigned long step)\n{")
	w.line("    if (good) {\n        passed++;\n        return;\n    }\n    failed++;")
	w.line("    if (failed <= 20ul) {\n        (void)printf(\"vector %%lu row %%lu step %%lu: %%s differs\\n\", vector, row, step, what);\n    }\n}\n")
}

// constant prints a value of a variable for a table.
func (w *printer) constant(v *logic.Var, value int64, typ string) string {
	if typ == "bool" {
		return map[bool]string{true: "true", false: "false"}[value != 0]
	}
	return w.numeral(value, typ)
}

func (w *printer) list(vs []*logic.Var, values []int64, typ func(*logic.Var) string) string {
	var parts []string
	for i, v := range vs {
		parts = append(parts, w.constant(v, values[i], typ(v)))
	}
	if len(parts) == 0 {
		return "{false}"
	}
	return "{" + strings.Join(parts, ", ") + "}"
}

func (w *printer) rows(vectors []Vector) {
	w.line("static const struct row rows[] = {")
	for i, v := range vectors {
		w.line("    /* vector %d */", i+1)
		for _, r := range v.Rows {
			even := r.Then
			if even == nil {
				even = r.Outputs
			}
			w.line("    {%du, %s, %s, %s,", r.Steps, w.list(w.p.Inputs, r.Inputs, inputType), w.list(w.p.Outputs, r.Outputs, typeOf), w.list(w.p.Outputs, even, typeOf))
			w.line("     %s},", w.list(w.p.State, r.State, typeOf))
		}
	}
	w.line("};\n")
	w.comment("", "Where each vector begins and ends in the rows, and the record that it starts with.")
	w.line("struct vector {\n    uint32_t first;\n    uint32_t end;\n    bool has_record;\n    struct %s_remembered record;\n};\n", w.lo)
	w.line("static const struct vector vectors[] = {")
	at := 0
	for _, v := range vectors {
		record := "false, " + w.record(nil)
		if v.Start != nil {
			record = "true, " + w.record(v.Start)
		}
		w.line("    {%du, %du, %s},", at, at+len(v.Rows), record)
		at += len(v.Rows)
	}
	w.line("};\n")
}

// record prints a remembered record; nil stands for one that is not used.
func (w *printer) record(r *logic.Record) string {
	var parts []string
	for i, v := range w.p.Survivors() {
		value := int64(0)
		if r != nil {
			value = r.Values[i]
		}
		parts = append(parts, w.numeral(value, storage(v.Range)))
	}
	check := uint16(0)
	if r != nil {
		check = r.Check
	}
	return "{" + strings.Join(append(parts, fmt.Sprintf("%du", check)), ", ") + "}"
}

func (w *printer) comparisons() {
	compare := func(name, typ string, vs []*logic.Var) {
		w.line("static bool %s(const struct %s *a, const struct %s *b)\n{", name, typ, typ)
		if len(vs) == 0 {
			w.line("    (void)a;\n    (void)b;\n    return true;\n}\n")
			return
		}
		var parts []string
		for _, v := range vs {
			parts = append(parts, fmt.Sprintf("(a->%s == b->%s)", v.Name, v.Name))
		}
		w.line("    return %s;\n}\n", strings.Join(parts, " &&\n           "))
	}
	compare("same_out", w.lo+"_out", w.p.Outputs)
	compare("same_state", w.lo, w.p.State)
	w.line("static void run(const struct vector *v, unsigned long number)\n{\n    struct %s m;\n    struct %s_out out;\n    uint32_t i;\n    uint32_t n;\n", w.lo, w.lo)
	w.line("    (void)memset(&m, 0xA5, sizeof m); /* nothing may rest on zeroed memory */\n    (void)memset(&out, 0, sizeof out);")
	w.line("    %s_start(&m, v->has_record ? &v->record : NULL);", w.lo)
	w.line("    for (i = v->first; i < v->end; i++) {\n        for (n = 0u; n < rows[i].steps; n++) {\n            %s_step(&m, &rows[i].in, &out);", w.lo)
	w.line("            verdict(same_out(&out, ((n & 1u) == 0u) ? &rows[i].odd : &rows[i].even), \"output\", number, (unsigned long)(i - v->first), (unsigned long)n);\n        }")
	w.line("        verdict(same_state(&m, &rows[i].after), \"state\", number, (unsigned long)(i - v->first), (unsigned long)n);\n    }\n}\n")
}

// records checks that only a good record is believed.
func (w *printer) records() {
	first := make([]int64, len(w.p.State))
	for i, v := range w.p.State {
		first[i] = v.Start
	}
	w.line("static const struct %s first = %s;\n", w.lo, w.list(w.p.State, first, typeOf))
	w.line("static void records(void)\n{\n    struct %s fresh;\n    struct %s m;\n    struct %s_remembered r;\n", w.lo, w.lo, w.lo)
	w.line("    (void)memset(&m, 0x5A, sizeof m);\n    (void)memset(&fresh, 0xA5, sizeof fresh);\n    %s_start(&fresh, NULL);", w.lo)
	w.line("    verdict(same_state(&fresh, &first), \"start without a record\", 0ul, 0ul, 0ul);\n")
	blank := func(fill, what string) {
		w.line("    (void)memset(&r, %s, sizeof r);\n    %s_start(&m, &r);\n    verdict(same_state(&m, &fresh), \"start with %s\", 0ul, 0ul, 0ul);", fill, w.lo, what)
	}
	blank("0x00", "a blank record")
	blank("0xFF", "an erased record")
	values := make([]int64, len(w.p.Survivors()))
	for i, v := range w.p.Survivors() {
		values[i] = v.Range.Lo
		if v.Start == v.Range.Lo {
			values[i] = v.Range.Hi
		}
	}
	if len(values) > 0 {
		good := &logic.Record{Values: values, Check: w.p.CheckWord(values)}
		run := w.p.NewRun()
		run.Start(good)
		var state []int64
		for _, v := range w.p.State {
			state = append(state, run.Get(v))
		}
		w.line("    {\n        static const struct %s_remembered good = %s;", w.lo, w.record(good))
		w.line("        static const struct %s after = %s;\n", w.lo, w.list(w.p.State, state, typeOf))
		w.line("        %s_start(&m, &good);\n        verdict(same_state(&m, &after), \"start with a good record\", 0ul, 0ul, 0ul);", w.lo)
		w.line("        r = good;\n        r.check++;\n        %s_start(&m, &r);\n        verdict(same_state(&m, &fresh), \"start with a wrong check word\", 0ul, 0ul, 0ul);", w.lo)
		for _, v := range w.p.Survivors() {
			w.line("        r = good;\n        r.%s ^= 1u;\n        %s_start(&m, &r);\n        verdict(same_state(&m, &fresh), \"start with a flipped bit\", 0ul, 0ul, 0ul);", v.Name, w.lo)
		}
		w.line("        %s_start(&m, &good);\n        (void)memset(&r, 0, sizeof r);", w.lo)
		w.line("        (void)%s_remember(&m, &r);", w.lo)
		w.line("        verdict(r.check == good.check, \"check word\", 0ul, 0ul, 0ul);\n    }")
	}
	w.line("    (void)memset(&r, 0, sizeof r);")
	w.line("    verdict(%s_remember(&fresh, &r), \"a new record to write\", 0ul, 0ul, 0ul);", w.lo)
	w.line("    verdict(!%s_remember(&fresh, &r), \"no record to write\", 0ul, 0ul, 0ul);", w.lo)
	w.line("}\n")
}

// upset checks where a machine goes from a value that is no state.
func (w *printer) upset() {
	w.line("static void upset(void)\n{\n    struct %s m;\n    struct %s_in in;\n    struct %s_out out;\n", w.lo, w.lo, w.lo)
	w.line("    (void)memset(&in, 0, sizeof in);")
	for _, b := range w.p.Order {
		m, ok := b.(*logic.Machine)
		if !ok {
			continue
		}
		index := -1
		for i, v := range w.p.State {
			if v == m.Var {
				index = i
			}
		}
		run := w.p.NewRun()
		run.Start(nil)
		snap := run.Snapshot(nil)
		snap[index] = 255
		run.Restore(snap)
		run.Step(make([]int64, len(w.p.Inputs)))
		w.line("    %s_start(&m, NULL);\n    m.%s = 255u;\n    %s_step(&m, &in, &out);", w.lo, m.Var.Name, w.lo)
		w.line("    verdict(m.%s == (uint8_t)%s, \"%s after an upset\", 0ul, 0ul, 0ul);", m.Var.Name, w.word(m.Var, run.Get(m.Var)), m.Var.Name)
	}
	w.line("    (void)m;\n    (void)in;\n    (void)out;\n}\n")
}

func (w *printer) checkMain(vectors []Vector) {
	w.line("int main(void)\n{\n    unsigned long i;\n")
	if len(vectors) > 0 {
		w.line("    for (i = 0ul; i < (unsigned long)(sizeof vectors / sizeof vectors[0]); i++) {\n        run(&vectors[i], i + 1ul);\n    }")
	} else {
		w.line("    (void)i;")
	}
	w.line("    records();\n    upset();\n    (void)printf(\"%%lu passed, %%lu failed\\n\", passed, failed);\n    return (failed == 0ul) ? 0 : 1;\n}")
}
