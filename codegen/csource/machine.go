package csource

import (
	"strings"

	"makebreak/translate/logic"
)

// machineFunctions prints one function a machine. Its parameters are what it reads.
func (w *printer) machineFunctions() {
	for _, b := range w.order {
		if m, ok := b.(*logic.Machine); ok {
			w.machine(m)
		}
	}
}

func (w *printer) machine(m *logic.Machine) {
	if m.What != "" {
		w.comment("", m.What)
	}
	w.statement("", "static void ", w.machineHead(m), "")
	w.line("{")
	v := w.read(m.Var)
	if m.Timer != nil {
		t, limit := w.read(m.Timer), w.asUnsigned(m.Limit)
		w.line("    if (%s < %s) {\n        %s++;\n    }", t, limit, t)
	}
	w.line("    switch ((%s)%s) {", w.tag(m.Var.Enum), v)
	for i, s := range m.At {
		w.line("    case %s:", w.word(m.Var.Enum, int64(i)))
		w.transitions(m, s)
		w.line("        break;")
	}
	w.line("    default: /* not a state: memory was upset */")
	w.enter("        ", m, m.Safe)
	w.line("        break;\n    }\n}\n")
}

// transitions prints the ways out of a state.
func (w *printer) transitions(m *logic.Machine, s *logic.State) {
	if len(s.Goes) == 1 && always(s.Goes[0].When) {
		w.take("        ", m, s.Goes[0])
		return
	}
	complete := false
	for i, t := range s.Goes {
		switch complete = always(t.When); {
		case complete:
			w.line("        } else {")
		case i == 0:
			w.guard("        ", "if ", t.When)
		default:
			w.guard("        ", "} else if ", t.When)
		}
		w.take("            ", m, t)
	}
	if len(s.Goes) > 1 && !complete {
		w.line("        } else {\n            /* stays */")
	}
	if len(s.Goes) > 0 {
		w.line("        }")
	}
}

// take prints what a transition does.
func (w *printer) take(indent string, m *logic.Machine, t *logic.Transition) {
	if t.Why != "" {
		w.comment(indent, t.Why)
	}
	w.enter(indent, m, t.To)
	for _, a := range t.Do {
		w.sets(indent, []*logic.Set{{Var: a.Var, When: a.When, To: a.To}})
	}
}

// enter goes into a state. The timer starts anew before anything else is done.
func (w *printer) enter(indent string, m *logic.Machine, state int) {
	w.line("%s%s = (uint8_t)%s;", indent, w.read(m.Var), w.word(m.Var.Enum, int64(state)))
	if m.Timer != nil {
		w.line("%s%s = 0u;", indent, w.read(m.Timer))
	}
}

func (w *printer) machineHead(m *logic.Machine) piece {
	in, out, locals := w.reads(m)
	ps := []piece{atom("struct " + w.lo + " *m")}
	if in {
		ps = append(ps, atom("const struct "+w.lo+"_in *in"))
	}
	if out {
		ps = append(ps, atom("const struct "+w.lo+"_out *out"))
	}
	for _, v := range locals {
		ps = append(ps, atom(w.typeOf(v)+" "+w.vars[v]))
	}
	return call(w.machines[m.Var], ps...)
}

func (w *printer) machineCall(m *logic.Machine) string {
	in, out, locals := w.reads(m)
	ps := []string{"m"}
	if in {
		ps = append(ps, "in")
	}
	if out {
		ps = append(ps, "out")
	}
	for _, v := range locals {
		ps = append(ps, w.vars[v])
	}
	return w.machines[m.Var] + "(" + strings.Join(ps, ", ") + ")"
}

// reads finds what a machine reads besides the state.
func (w *printer) reads(m *logic.Machine) (in, out bool, locals []*logic.Var) {
	seen := map[*logic.Var]bool{}
	logic.Expressions(m, func(e *logic.Expr) {
		e.Walk(func(n *logic.Expr) {
			switch {
			case n.Var == nil || seen[n.Var]:
			case w.isInput(n.Var):
				in = true
			case w.isOutput(n.Var):
				out = true
			case w.isLocal(n.Var):
				seen[n.Var] = true
				locals = append(locals, n.Var)
			}
		})
	})
	return in, out, locals
}
