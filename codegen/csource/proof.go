package csource

import (
	"fmt"
	"slices"
	"strings"

	"makebreak/translate/logic"
)

// view is how a proof looks at a program: from behind a step.
type view struct {
	after   bool                // what was stands in *before, what is in *m
	watched map[*logic.Var]bool // variables that a property keeps for itself
	drawn   map[string]bool     // types of which an arbitrary value is asked for
}

// Proof prints <id>_proof.c: a harness for a bounded model checker (CBMC) and
// for a value analysis (Frama-C Eva) of <id>.c. It claims, for every state in
// which each variable lies in the range that logic.Check has worked out for it,
// and for all inputs of their types, that one step leaves each variable in its
// range and no property of the program broken, and that every start gives such
// a state. What cannot be put as a claim is named in the file.
//
// Every block of a program is the one writer of its variables, so that seen
// from behind a step a Use is the variable as it is, a Prev the variable as it
// was, and what lived for one step only can be worked out once more. The
// properties are printed like that, apart from the step that they speak of.
func (s Source) Proof() string {
	w := s.printer()
	w.proof = view{after: true, watched: map[*logic.Var]bool{}, drawn: map[string]bool{}}
	properties, unable := provable(s.Program)
	w.order = slices.Clone(w.p.Order)
	for _, p := range properties {
		w.order = append(append(w.order, p.Watch...), &logic.Define{As: p.Bad})
	}
	w.proofNames(properties)

	w.watchStruct(properties)
	w.arbitrary(properties)
	w.invariant()
	for i, p := range properties {
		w.property(i+1, p)
	}
	w.step1(properties)
	w.base(properties)
	w.same()
	w.analysis()
	w.proofMain()
	body := w.String()

	w.Reset()
	w.banner(s.Facts, w.lo+"_proof.c", "what is claimed of "+w.lo+".c, for a model checker and a value analysis")
	w.proofNotes(unable)
	w.line("#include \"%s.h\"\n\n#include <stddef.h>\n", w.lo)
	w.tools()
	w.proofConstants()
	w.used.helpersUsed, w.used.tablesUsed = w.helpersUsed, w.tablesUsed
	w.tableFunctions()
	w.helpers()
	return w.String() + body
}

// Unproven lists the properties that Proof makes no claim about, each with its
// reason.
func (s Source) Unproven() []string {
	_, unable := provable(s.Program)
	return unable
}

// provable parts the properties into those that can be put as claims and the
// names of the others.
func provable(p *logic.Checked) (able []*logic.Property, unable []string) {
	for _, prop := range p.Never {
		why := ""
		for _, b := range prop.Watch {
			switch b.(type) {
			case *logic.Define, *logic.Set, *logic.Timer:
			default:
				why = "it watches by states or flags of its own"
			}
		}
		if why != "" {
			unable = append(unable, prop.Name+": "+why)
			continue
		}
		able = append(able, prop)
	}
	return able, unable
}

// parts are the conditions that have to meet for a property to be broken.
func parts(p *logic.Property) []*logic.Expr {
	if p.Bad.Op == logic.OpAnd {
		return p.Bad.Args
	}
	return []*logic.Expr{p.Bad}
}

// proofNames names what the harness has in its functions, so that nothing
// stands for two things.
func (w *printer) proofNames(properties []*logic.Property) {
	taken := newScope(languageWords + " m in out before watch without")
	most := 0
	for _, p := range properties {
		most = max(most, len(parts(p)))
	}
	for i := range most {
		taken.take(fmt.Sprintf("part_%d", i+1))
	}
	for _, v := range w.p.Locals {
		if !w.isOutput(v) {
			w.vars[v] = taken.take(v.Name)
		}
	}
	for out := range w.gathered {
		if !w.isOutput(out) {
			w.gathered[out] = w.vars[out]
		}
	}
	members := newScope(languageWords)
	for _, p := range properties {
		for _, v := range p.Kept {
			w.vars[v] = members.take(v.Name)
			w.proof.watched[v] = true
		}
	}
}

func (w *printer) proofNotes(unable []string) {
	w.comment("", "One step: any state inside the invariant, any inputs. Nothing undefined happens, the invariant holds again and no property is broken:",
		"- cbmc "+w.lo+"_proof.c "+w.lo+".c "+ModelChecks)
	w.comment("", "With more on the command line:",
		"-DBASE: every start, with any record or none, gives a state inside the invariant.",
		"-DSTEPS=n: the property is only asked for after n steps without a breach of it (for one that a single step does not carry); with -DBASE the first n - 1 steps from a start.",
		"-DFALSE_PROPERTY: claims that are false on purpose. Each has to FAIL, or the others would say nothing: the end of a step is never reached, and every property with one of its conditions left out.",
		"-DSAME: another file holds the program under names that begin with "+w.lo+"_other_ (start, step, remember); both do the same, step by step. With -DSTEPS=n: in the first n - 1 steps from a start, and from any state that n - 1 steps lead to from one inside the invariant.",
		"Add --16 (with a stdint.h for it), --32, --64: an int of that width.")
	w.comment("", "Value analysis, from any start, inputs that change for ever: frama-c -eva -eva-precision 3 -machdep x86_16 -warn-signed-downcast -warn-unsigned-downcast "+w.lo+"_proof.c "+w.lo+".c")
	if len(unable) > 0 {
		lines := []string{"NOT CLAIMED here, and not proven by it:"}
		for _, u := range unable {
			lines = append(lines, "- "+u)
		}
		w.comment("", lines...)
	}
}

// ModelChecks are the options under which the model checker looks for what is
// undefined in C. A loop that is cut short is a failure.
const ModelChecks = "--unwind 17 --unwinding-assertions --bounds-check --pointer-check --div-by-zero-check --signed-overflow-check --conversion-check --undefined-shift-check"

// tools prints what the tools call an assumption, a claim and any value.
func (w *printer) tools() {
	w.line("#ifndef STEPS\n#define STEPS 1u\n#endif\n")
	w.line("#if defined(__FRAMAC__)\n#include \"__fc_builtin.h\"\n#define ASSUME(c) ((void)(c))\n#define CLAIM(c, what) ((void)(c))")
	for _, d := range draws {
		if w.proof.drawn[d.typ] {
			w.line("static %s %s(void)\n{\n    return (%s)%s;\n}", d.typ, d.name, d.typ, d.interval)
		}
	}
	w.line("#elif defined(__CPROVER__)\n#define ASSUME(c) __CPROVER_assume(c)\n#define CLAIM(c, what) __CPROVER_assert((c), what)")
	for _, d := range draws {
		if w.proof.drawn[d.typ] {
			w.line("%s %s(void);", d.typ, d.name)
		}
	}
	w.line("#else\n#error \"for a model checker or a value analysis, not to be run\"\n#endif\n")
}

var draws = []struct{ typ, name, interval string }{
	{"uint8_t", "nondet_u8", "Frama_C_unsigned_int_interval(0u, 255u)"},
	{"int8_t", "nondet_i8", "Frama_C_interval(-128, 127)"},
	{"uint16_t", "nondet_u16", "Frama_C_unsigned_int_interval(0u, 65535u)"},
	{"int16_t", "nondet_i16", "Frama_C_interval(-32767 - 1, 32767)"},
	{"uint32_t", "nondet_u32", "Frama_C_unsigned_long_interval(0ul, 0xFFFFFFFFul)"},
	{"int32_t", "nondet_i32", "Frama_C_long_interval(-2147483647L - 1L, 2147483647L)"},
}

// any is an arbitrary value of a type; a truth value is 0 or 1.
func (w *printer) any(typ string) string {
	if typ == "bool" {
		w.proof.drawn["uint8_t"] = true
		return "nondet_u8() != 0u"
	}
	w.proof.drawn[typ] = true
	for _, d := range draws {
		if d.typ == typ {
			return d.name + "()"
		}
	}
	return ""
}

func (w *printer) proofConstants() {
	some := false
	for _, c := range w.p.Consts {
		if !w.signedUse[c] && !w.unsignedUse[c] {
			continue
		}
		value := natural(c.Value)
		if w.signed(c) {
			value = literal(c.Value, narrow)
		}
		w.definition(w.consts[c], value, c.Unit+", as in "+w.lo+".c")
		some = true
	}
	if some {
		w.line("")
	}
}

func (w *printer) watchStruct(properties []*logic.Property) {
	if len(w.proof.watched) == 0 {
		return
	}
	w.comment("", "What properties keep for themselves from step to step.")
	w.line("struct %s {", w.watchTag())
	for _, p := range properties {
		for _, v := range p.Kept {
			w.member(w.typeOf(v), w.vars[v], v.What)
		}
	}
	w.line("};\n")
}

func (w *printer) watchTag() string { return w.lo + "__watch" }

// arbitrary prints functions that fill a struct with anything.
func (w *printer) arbitrary(properties []*logic.Property) {
	fill := func(tag string, vs []*logic.Var, typ func(*logic.Var) string, name map[*logic.Var]string, more string) {
		end := strings.TrimPrefix(strings.TrimPrefix(tag, w.lo), "_")
		if end == "" {
			end = "state"
		}
		w.line("static void any_%s(struct %s *s)\n{", strings.Trim(end, "_"), tag)
		for _, v := range vs {
			w.line("    s->%s = %s;", name[v], w.any(typ(v)))
		}
		switch {
		case more != "":
			w.line("    s->%s = %s;", more, w.any("uint16_t"))
		case len(vs) == 0:
			w.line("    s->nothing = %s;", w.any("uint8_t"))
		}
		w.line("}\n")
	}
	fill(w.lo, w.p.State, w.typeOf, w.vars, "")
	fill(w.lo+"_in", w.p.Inputs, w.typeOf, w.vars, "")
	fill(w.lo+"_out", w.p.Outputs, w.typeOf, w.vars, "")
	fill(w.lo+"_remembered", w.p.Survivors(), keptType, w.kept, "check")
	if len(w.proof.watched) > 0 {
		var vs []*logic.Var
		for _, p := range properties {
			vs = append(vs, p.Kept...)
		}
		fill(w.watchTag(), vs, w.typeOf, w.vars, "")
	}
}

// invariant prints the ranges of all variables, as an assumption and as claims.
func (w *printer) invariant() {
	w.comment("", "The invariant: each variable lies in the range that was worked out for it.")
	for _, claim := range []bool{false, true} {
		name := "assume_invariant"
		if claim {
			name = "claim_invariant"
		}
		w.line("static void %s(const struct %s *m)\n{", name, w.lo)
		n := 0
		for _, v := range w.p.State {
			for _, c := range w.inside(v, "m->") {
				n++
				if claim {
					w.statement("    ", "", call("CLAIM", atom(c), atom(String("invariant: "+v.Name))), ";")
				} else {
					w.line("    ASSUME(%s);", c)
				}
			}
		}
		if n == 0 {
			w.line("    (void)m; /* every value of its type lies in its range */")
		}
		w.line("}\n")
	}
}

// inside says in C that a variable lies in its range, as far as its type does
// not say so already.
func (w *printer) inside(v *logic.Var, where string) []string {
	typ := w.typeOf(v)
	var all []string
	if typ == "bool" {
		return nil
	}
	if v.Range.Lo > holds(typ).Lo {
		all = append(all, where+w.vars[v]+" >= "+numeral(v.Range.Lo, typ))
	}
	if v.Range.Hi < holds(typ).Hi {
		all = append(all, where+w.vars[v]+" <= "+numeral(v.Range.Hi, typ))
	}
	return all
}

func badName(n int) string { return fmt.Sprintf("broken_%d", n) }

// property prints a function that tells whether a property is broken. A part
// that is left out counts as true.
func (w *printer) property(n int, p *logic.Property) {
	w.comment("", p.Name+": "+p.Why)
	ps := []piece{
		atom("const struct " + w.lo + " *before"), atom("const struct " + w.lo + " *m"),
		atom("const struct " + w.lo + "_in *in"), atom("const struct " + w.lo + "_out *out"),
	}
	if len(p.Kept) > 0 {
		ps = append(ps, atom("struct "+w.watchTag()+" *watch"))
	}
	w.statement("", "static bool ", call(badName(n), append(ps, atom("uint8_t without"))...), "")
	w.line("{")
	for _, b := range w.needed(p) {
		switch b := b.(type) {
		case *logic.Define:
			w.define(b)
		case *logic.Flags:
			w.gather(b)
		}
	}
	for _, b := range p.Watch {
		switch b := b.(type) {
		case *logic.Define:
			w.define(b)
		case *logic.Set:
			w.sets("    ", []*logic.Set{b})
		case *logic.Timer:
			w.timer(b)
		}
	}
	var met []piece
	for i, e := range parts(p) {
		name := fmt.Sprintf("part_%d", i+1)
		w.statement("    ", "const bool "+name+" = ", w.boolean(e), ";")
		met = append(met, atom(fmt.Sprintf("(%s || (without == %du))", name, i+1)))
	}
	w.line("\n    (void)before;\n    (void)m;\n    (void)in;\n    (void)out;")
	if len(met) == 1 {
		w.line("    return %s;\n}\n", strings.TrimSuffix(strings.TrimPrefix(met[0].text, "("), ")"))
		return
	}
	w.statement("    ", "return ", chain("&&", met...), ";")
	w.line("}\n")
}

// needed lists what a property reads of what lived for one step only, in the
// order of the step.
func (w *printer) needed(p *logic.Property) []logic.Block {
	want := map[*logic.Var]bool{}
	note := func(e *logic.Expr) {
		e.Walk(func(n *logic.Expr) {
			if n.Var != nil {
				want[n.Var] = true
			}
		})
	}
	note(p.Bad)
	for _, b := range p.Watch {
		logic.Expressions(b, note)
	}
	var found []logic.Block
	for i := len(w.p.Order) - 1; i >= 0; i-- {
		var v *logic.Var
		switch b := w.p.Order[i].(type) {
		case *logic.Define:
			v = b.Var
		case *logic.Flags:
			v = b.Out
		}
		if v != nil && want[v] && w.isLocal(v) {
			found = append(found, w.p.Order[i])
			logic.Expressions(w.p.Order[i], note)
		}
	}
	slices.Reverse(found)
	return found
}

// judge prints the verdict on every property after a step.
func (w *printer) judge(properties []*logic.Property) {
	w.line("static void %s", "judge(const struct "+w.lo+" *before, const struct "+w.lo+" *m,")
	w.line("                  const struct %s_in *in, const struct %s_out *out,", w.lo, w.lo)
	if len(w.proof.watched) > 0 {
		w.line("                  struct %s *watch,", w.watchTag())
	}
	w.line("                  bool claim)\n{")
	args := func(p *logic.Property, watch string, without int) []piece {
		ps := []piece{atom("before"), atom("m"), atom("in"), atom("out")}
		if len(p.Kept) > 0 {
			ps = append(ps, atom(watch))
		}
		return append(ps, atom(fmt.Sprintf("%du", without)))
	}
	w.line("#ifdef FALSE_PROPERTY\n    if (claim) {")
	if len(w.proof.watched) > 0 {
		w.line("        struct %s kept;\n", w.watchTag())
	}
	w.line("        CLAIM(false, \"false on purpose: the end of a step is never reached\");")
	for i, p := range properties {
		for part := range parts(p) {
			if len(p.Kept) > 0 {
				w.line("        kept = *watch;")
			}
			w.statement("        ", "", call("CLAIM", call(badName(i+1), args(p, "&kept", part+1)...).prefixed("!"),
				atom(String(fmt.Sprintf("false on purpose: %s without its condition %d", p.Name, part+1)))), ";")
		}
	}
	w.line("    }\n#endif")
	for i, p := range properties {
		w.line("    {")
		w.statement("        ", "const bool broken = ", call(badName(i+1), args(p, "watch", 0)...), ";\n")
		w.line("        if (claim) {")
		w.statement("            ", "", call("CLAIM", atom("!broken"), atom(String("property: "+p.Name))), ";")
		w.line("        } else {\n            ASSUME(!broken);\n        }\n    }")
	}
	w.line("    (void)before;\n    (void)m;\n    (void)in;\n    (void)out;\n    (void)claim;\n}\n")
}

func (w *printer) watchArgument() string {
	if len(w.proof.watched) > 0 {
		return "&watch, "
	}
	return ""
}

// step1 prints the inductive step.
func (w *printer) step1(properties []*logic.Property) {
	w.judge(properties)
	w.line("static void inductive(void)\n{\n    struct %s m;\n    struct %s before;\n    struct %s_in in;\n    struct %s_out out;", w.lo, w.lo, w.lo, w.lo)
	if len(w.proof.watched) > 0 {
		w.line("    struct %s watch;", w.watchTag())
	}
	w.line("    uint8_t i;\n")
	w.line("    any_state(&m);\n    assume_invariant(&m);\n    any_out(&out);")
	if len(w.proof.watched) > 0 {
		w.line("    any_watch(&watch);")
		for _, p := range properties {
			for _, v := range p.Kept {
				for _, c := range w.inside(v, "watch.") {
					w.line("    ASSUME(%s);", c)
				}
			}
		}
	}
	w.line("    for (i = 1u; i <= STEPS; i++) {\n        before = m;\n        any_in(&in);\n        %s_step(&m, &in, &out);\n        claim_invariant(&m);", w.lo)
	for _, v := range w.p.Outputs {
		for _, c := range w.inside(v, "out.") {
			w.statement("        ", "", call("CLAIM", atom(c), atom(String("range of output: "+v.Name))), ";")
		}
	}
	w.line("        judge(&before, &m, &in, &out, %si == STEPS);\n    }", w.watchArgument())
	w.remembering()
	w.line("}\n")
}

// remembering claims that what is remembered after the step is believed at the
// next start, and that the record is then up to date.
func (w *printer) remembering() {
	w.line("    {\n        struct %s_remembered r;\n        struct %s again;\n", w.lo, w.lo)
	w.line("        any_remembered(&r);\n        (void)%s_remember(&m, &r);", w.lo)
	w.line("        CLAIM(!%s_remember(&m, &r), \"record: up to date once it has been brought up to date\");", w.lo)
	w.line("        any_state(&again);\n        %s_start(&again, &r);", w.lo)
	for _, v := range w.p.Survivors() {
		w.statement("        ", "", call("CLAIM", atom("again."+w.vars[v]+" == m."+w.vars[v]),
			atom(String("record: "+v.Name+" comes back as it was"))), ";")
	}
	w.line("    }")
}

// base prints the base case.
func (w *printer) base(properties []*logic.Property) {
	w.line("static void base(void)\n{\n    struct %s m;\n    struct %s_remembered r;\n    struct %s before;\n    struct %s_in in;\n    struct %s_out out;", w.lo, w.lo, w.lo, w.lo, w.lo)
	if len(w.proof.watched) > 0 {
		w.line("    struct %s watch;", w.watchTag())
	}
	w.line("    uint8_t i;\n\n    any_state(&m);\n    any_remembered(&r);\n    %s_start(&m, (nondet_u8() == 0u) ? NULL : &r);\n    claim_invariant(&m);", w.lo)
	w.any("uint8_t")
	for _, p := range properties {
		for _, v := range p.Kept {
			w.line("    watch.%s = %s;", w.vars[v], numeral(v.Start, w.typeOf(v)))
		}
	}
	w.line("    any_out(&out);")
	w.line("    for (i = 1u; i < STEPS; i++) {\n        before = m;\n        any_in(&in);\n        %s_step(&m, &in, &out);\n        claim_invariant(&m);\n        judge(&before, &m, &in, &out, %strue);\n    }", w.lo, w.watchArgument())
	w.line("#ifdef FALSE_PROPERTY\n    CLAIM(false, \"false on purpose: the end of a start is never reached\");\n#endif\n}\n")
}

// same prints the comparison with another program.
func (w *printer) same() {
	other := w.lo + "_other_"
	w.line("#ifdef SAME")
	w.line("void %sstart(struct %s *m, const struct %s_remembered *r);", other, w.lo, w.lo)
	w.statement("", "void ", call(other+"step", atom("struct "+w.lo+" *m"), atom("const struct "+w.lo+"_in *in"), atom("struct "+w.lo+"_out *out")), ";")
	w.line("bool %sremember(const struct %s *m, struct %s_remembered *r);\n", other, w.lo, w.lo)
	w.line("static void same_state(const struct %s *a, const struct %s *b)\n{", w.lo, w.lo)
	for _, v := range w.p.State {
		w.statement("    ", "", call("CLAIM", atom("a->"+w.vars[v]+" == b->"+w.vars[v]), atom(String("same: "+v.Name))), ";")
	}
	w.line("    (void)a;\n    (void)b;\n}\n")
	w.line("static void same_step(struct %s *m, struct %s_out *out)\n{\n    struct %s n = *m;\n    struct %s_out other = *out;\n    struct %s_in in;\n", w.lo, w.lo, w.lo, w.lo, w.lo)
	w.line("    any_in(&in);\n    %s_step(m, &in, out);\n    %sstep(&n, &in, &other);\n    same_state(m, &n);", w.lo, other)
	for _, v := range w.p.Outputs {
		w.statement("    ", "", call("CLAIM", atom("out->"+w.vars[v]+" == other."+w.vars[v]), atom(String("same: output "+v.Name))), ";")
	}
	w.line("}\n")
	w.line("static void same(void)\n{\n    struct %s m;\n    struct %s n;\n    struct %s_in in;\n    struct %s_out out;\n    struct %s_remembered r;\n    struct %s_remembered s;\n    uint8_t i;\n    bool changed;\n",
		w.lo, w.lo, w.lo, w.lo, w.lo, w.lo)
	w.line("    any_state(&m);\n    any_state(&n);\n    any_remembered(&r);\n    any_out(&out);\n    if (nondet_u8() == 0u) {\n        %s_start(&m, NULL);\n        %sstart(&n, NULL);\n    } else {\n        %s_start(&m, &r);\n        %sstart(&n, &r);\n    }\n    same_state(&m, &n);", w.lo, other, w.lo, other)
	w.line("    for (i = 1u; i < STEPS; i++) {\n        same_step(&m, &out);\n    }\n")
	w.line("    any_state(&m);\n    assume_invariant(&m);\n    for (i = 1u; i < STEPS; i++) {\n        any_in(&in);\n        %s_step(&m, &in, &out);\n    }\n    same_step(&m, &out);\n", w.lo)
	w.line("    any_remembered(&r);\n    s = r;\n    changed = %s_remember(&m, &r);\n    CLAIM(changed == %sremember(&m, &s), \"same: record changed\");", w.lo, other)
	for _, v := range w.p.Survivors() {
		w.statement("    ", "", call("CLAIM", atom("r."+w.kept[v]+" == s."+w.kept[v]), atom(String("same: record of "+v.Name))), ";")
	}
	w.line("    CLAIM(r.check == s.check, \"same: check word\");\n}\n#endif\n")
}

// analysis prints the loop for the value analysis.
func (w *printer) analysis() {
	w.line("#if defined(__FRAMAC__)\nstatic void for_ever(void)\n{\n    struct %s m;\n    struct %s_remembered r;\n    struct %s_in in;\n    struct %s_out out;\n", w.lo, w.lo, w.lo, w.lo)
	w.line("    any_remembered(&r);\n    %s_start(&m, (nondet_u8() == 0u) ? NULL : &r);\n    while (nondet_u8() != 0u) {\n        any_in(&in);\n        %s_step(&m, &in, &out);\n        (void)%s_remember(&m, &r);\n    }\n}\n#endif\n", w.lo, w.lo, w.lo)
}

func (w *printer) proofMain() {
	w.line("int main(void)\n{\n#if defined(__FRAMAC__)\n    for_ever();\n#elif defined(SAME)\n    same();\n#elif defined(BASE)\n    base();\n#else\n    inductive();\n#endif\n    return 0;\n}")
}
