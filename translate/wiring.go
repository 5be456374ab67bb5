package translate

import (
	"fmt"
	"sort"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// wiring lowers expressions of the sheet to expressions of the program. What
// an expression may say was settled when the sheet was read; this is where its
// names get their meaning.
type wiring struct {
	b     *builder
	known map[string]*logic.Expr // contacts, signals, timers and loads worked out so far
	held  map[string]bool        // controls taken as made, whatever their contact does
}

func (b *builder) wiring() *wiring { return &wiring{b: b, known: map[string]*logic.Expr{}} }

// holding is the same wiring with some contacts taken as made.
func (w *wiring) holding(controls []string) *wiring {
	h := &wiring{b: w.b, known: w.known, held: map[string]bool{}}
	for _, c := range controls {
		h.held[c] = true
	}
	return h
}

// condition lowers a tree; nil is never true.
func (w *wiring) condition(c *survey.Cond, at survey.Source) *logic.Expr {
	if c == nil {
		return logic.False()
	}
	return w.lower(c, at, true)
}

func (w *wiring) lower(c *survey.Cond, at survey.Source, positive bool) *logic.Expr {
	switch c.Op {
	case survey.CondName:
		return w.sided(c.Name, at, positive)
	case survey.CondLiteral:
		if c.Value {
			return logic.True()
		}
		return logic.False()
	case survey.CondNot:
		return logic.Not(w.lower(c.Args[0], at, !positive))
	case survey.CondAnd:
		return logic.And(w.all(c.Args, at, positive)...)
	case survey.CondOr:
		return logic.Or(w.all(c.Args, at, positive)...)
	case survey.CondCompare:
		return w.compare(c, at)
	}
	w.b.fail(at, "cannot be translated", fmt.Sprintf("%v", c.Op), "names joined by and, or, not")
	return logic.False()
}

func (w *wiring) all(cs []*survey.Cond, at survey.Source, positive bool) []*logic.Expr {
	var es []*logic.Expr
	for _, c := range cs {
		es = append(es, w.lower(c, at, positive))
	}
	return es
}

func (w *wiring) name(id string, at survey.Source) *logic.Expr { return w.sided(id, at, true) }

// sided gives the meaning of a name. A part that stays hard-wired is not seen
// by the program unless a signal reads it: in series it breaks its load by
// itself and counts as made; anywhere else the program would be guessing.
func (w *wiring) sided(id string, at survey.Source, positive bool) *logic.Expr {
	if w.held[id] {
		return logic.True()
	}
	if e, ok := w.known[id]; ok {
		return e
	}
	c := control(w.b.survey, id)
	if c == nil {
		return logic.False() // said already, where it was refused
	}
	if b := w.b; b.plan.Regulators[id] != nil {
		b.fail(at, id+" gives a position and no contact", id, "a load that follows it, or want: two_position")
		return logic.False()
	}
	if c.ReadBy.V != "" {
		return logic.Not(w.name(c.ReadBy.V, c.ReadBy.Source))
	}
	if !positive {
		w.b.fail(at, id+" stays hard-wired and the program does not see it", "not "+id, "name the signal that shows its trip under read_by of "+id)
	}
	return logic.True()
}

func (w *wiring) compare(c *survey.Cond, at survey.Source) *logic.Expr {
	p := w.b.plan.Sensors[c.Name]
	if p == nil {
		w.b.fail(at, "sensor "+c.Name+" cannot be compared", c.Name, "a sensor whose reading is a fixed count for a temperature")
		return logic.False()
	}
	return w.b.comparison(p, c.Cmp, c.Limit, c.LimitText, at)
}

func control(s *survey.Survey, id string) *survey.Control {
	for _, c := range s.Controls {
		if c.ID.V == id {
			return c
		}
	}
	return nil
}

// reach lists all that a condition depends on, through loads and timers.
func reach(s *survey.Survey, c *survey.Cond) []string {
	seen := map[string]bool{}
	var visit func(c *survey.Cond)
	follow := func(name string) {
		if name == "" || seen[name] {
			return
		}
		seen[name] = true
		if l := load(s, name); l != nil {
			visit(l.RunsWhen.V.Tree)
		}
		if t := timer(s, name); t != nil {
			visit(t.EndsOn.V.Tree)
			for _, n := range []string{t.After.V, t.Starts.V} {
				if n != "" {
					visit(&survey.Cond{Op: survey.CondName, Name: n})
				}
			}
		}
	}
	visit = func(c *survey.Cond) {
		for _, n := range c.Names() {
			follow(n)
		}
	}
	visit(c)
	names := make([]string, 0, len(seen))
	for n := range seen {
		names = append(names, n)
	}
	sort.Strings(names)
	return names
}

func timer(s *survey.Survey, id string) *survey.Timer {
	for _, t := range s.Timers {
		if t.ID.V == id {
			return t
		}
	}
	return nil
}
