package csource

import (
	"makebreak/translate/logic"
)

// step prints the function that runs the program once.
func (w *printer) step() {
	w.statement("", "void ", w.stepHead(), "")
	w.line("{")
	w.unusedParameters()
	blocks := w.order
	done := 0
	for i, b := range blocks {
		if i < done {
			continue
		}
		if i > 0 && !w.together(blocks[i-1], b) {
			w.line("")
		}
		done = i + 1
		switch b := b.(type) {
		case *logic.Define:
			w.define(b)
		case *logic.Set:
			sets := alike(blocks[i:])
			done = i + len(sets)
			w.sets("    ", sets)
		case *logic.Timer:
			w.timer(b)
		case *logic.Machine:
			w.line("    %s;", w.machineCall(b))
		case *logic.Flags:
			w.gather(b)
		}
	}
	w.line("}")
}

// unusedParameters keeps a compiler quiet about what a program does not need.
func (w *printer) unusedParameters() {
	needs := map[string]bool{"m": len(w.p.State) > 0, "in": false, "out": len(w.p.Outputs) > 0}
	for _, b := range w.order {
		logic.Expressions(b, func(e *logic.Expr) {
			e.Walk(func(n *logic.Expr) {
				if n.Var != nil && w.isInput(n.Var) {
					needs["in"] = true
				}
			})
		})
	}
	for _, name := range []string{"m", "in", "out"} {
		if !needs[name] {
			w.line("    (void)%s;", name)
		}
	}
}

// together reports whether two blocks stand without an empty line between
// them: definitions of locals that follow each other, and single lines.
func (w *printer) together(a, b logic.Block) bool {
	k := w.looks(a)
	return k != block && k == w.looks(b)
}

type look int

const (
	block look = iota
	local
	line
)

func (w *printer) looks(b logic.Block) look {
	switch b := b.(type) {
	case *logic.Define:
		if w.isLocal(b.Var) {
			return local
		}
		return line
	case *logic.Machine:
		return line
	case *logic.Set:
		if always(b.When) && b.Why == "" {
			return line
		}
	}
	return block
}

func (w *printer) define(d *logic.Define) {
	typ := w.typeOf(d.Var)
	if !w.isLocal(d.Var) {
		w.assign("    ", w.read(d.Var), d.As, typ)
		return
	}
	if d.Var.What != "" {
		w.comment("    ", d.Var.What)
	}
	w.assign("    ", "const "+typ+" "+w.vars[d.Var], d.As, typ)
}

func (w *printer) assign(indent, to string, e *logic.Expr, typ string) {
	w.statement(indent, to+" = ", w.value(e, typ), ";")
}

// alike gives the settings at the head of some blocks that hang on the same
// condition: as many as can be made under one if, because none of them changes
// what the condition reads.
func alike(blocks []logic.Block) []*logic.Set {
	var sets []*logic.Set
	written := map[*logic.Var]bool{}
	for _, b := range blocks {
		s, ok := b.(*logic.Set)
		if !ok || (len(sets) > 0 && (always(s.When) || !same(s.When, sets[0].When))) {
			return sets
		}
		changed := false
		s.When.Walk(func(n *logic.Expr) { changed = changed || written[n.Var] })
		if changed {
			return sets
		}
		sets = append(sets, s)
		if always(s.When) {
			return sets
		}
		written[s.Var] = true
	}
	return sets
}

// same reports whether two expressions read the same.
func same(a, b *logic.Expr) bool {
	if a == nil || b == nil {
		return a == b
	}
	if a.Op != b.Op || a.Kind != b.Kind || a.Var != b.Var || a.Const != b.Const || a.Table != b.Table ||
		a.Value != b.Value || a.Enum != b.Enum || len(a.Args) != len(b.Args) {
		return false
	}
	for i := range a.Args {
		if !same(a.Args[i], b.Args[i]) {
			return false
		}
	}
	return true
}

// sets prints settings that hang on one condition.
func (w *printer) sets(indent string, sets []*logic.Set) {
	inner := indent
	if !always(sets[0].When) {
		w.guard(indent, "if ", sets[0].When)
		inner += "    "
	}
	why := ""
	for _, s := range sets {
		if s.Why != "" && s.Why != why {
			w.comment(inner, s.Why)
			why = s.Why
		}
		w.assign(inner, w.read(s.Var), s.To, w.typeOf(s.Var))
	}
	if inner != indent {
		w.line("%s}", indent)
	}
}

// guard prints the head of an if.
func (w *printer) guard(indent, word string, e *logic.Expr) {
	w.condition(indent, word, w.boolean(e))
}

func (w *printer) condition(indent, word string, p piece) {
	p.open, p.close = "("+p.open, p.close+")"
	if p.text != "" {
		p = atom("(" + p.text + ")")
	}
	w.statement(indent, word, p, " {")
}

// timer prints a counter of steps.
func (w *printer) timer(t *logic.Timer) {
	v := w.read(t.Var)
	tick := chain("<", atom(v), atom(w.asUnsigned(t.Limit)))
	if t.Hold != nil {
		tick = chain("&&", w.boolean(logic.Not(t.Hold)).bracketed(), tick.bracketed())
	}
	if never(t.Restart) {
		w.condition("    ", "if ", tick)
		w.line("        %s++;\n    }", v)
		return
	}
	w.guard("    ", "if ", t.Restart)
	if t.Why != "" {
		w.comment("        ", t.Why)
	}
	w.line("        %s = 0u;", v)
	w.condition("    ", "} else if ", tick)
	w.line("        %s++;\n    } else {\n        /* stays */\n    }", v)
}

// gather prints the conditions that make up one number.
func (w *printer) gather(f *logic.Flags) {
	to := w.gathered[f.Out]
	if w.isLocal(f.Out) && f.Out.What != "" {
		w.comment("    ", f.Out.What)
	}
	w.line("    uint16_t %s = 0u;\n", to)
	for i, bit := range f.Bits {
		if never(bit.When) {
			continue
		}
		set := to + " = (uint16_t)(" + to + " | " + w.flags[f.Out][i] + ");"
		if always(bit.When) {
			w.line("    %s", set)
			continue
		}
		w.guard("    ", "if ", bit.When)
		w.line("        %s\n    }", set)
	}
	if w.isOutput(f.Out) {
		w.line("    %s = %s;", w.read(f.Out), to)
	}
}
