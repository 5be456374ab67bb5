package translate

import (
	"makebreak/survey"
	"makebreak/translate/logic"
)

// States of a contact that resets itself.
const (
	contactOpen = iota
	contactMade
)

// Contact is a replaced two-position control in the program.
type Contact struct {
	Control     *survey.Control
	Probe       *Probe
	State       *logic.Var
	Made        *logic.Expr // the contact is made, in this step
	Acts        bool        // what the contact does when it acts: false opens, true makes
	Latches     bool        // it remembers that it has acted
	Tripped     *logic.Expr // it has acted and waits for its reset; nil unless it latches
	Reset       *logic.Var  // the button; nil unless it latches and has one
	Make        *edge
	Break       *edge
	Dial        *Dial        // nil without one
	Anticipator *Anticipator // nil without one
	// PID is set where the contact is that of a time-proportioned control.
	PID *Regulator

	smoothed *logic.Var  // the reading behind its software lag
	mark     *logic.Expr // the set point in steps of the reading
}

// edge is a threshold of a contact, in counts.
type edge struct {
	Const   *logic.Const
	AtLeast bool    // reached when the count is at least Const, else at most
	At      float64 // degC at which the program really switches
}

// reached is true where the temperature is at or beyond the edge.
func (e *edge) reached(p *Probe) *logic.Expr { return e.reachedBy(p.Value) }

// reachedBy is the same for a reading that is in the units of Const.
func (e *edge) reachedBy(reading *logic.Var) *logic.Expr {
	if e.AtLeast {
		return logic.Ge(logic.Use(reading), logic.C(e.Const))
	}
	return logic.Le(logic.Use(reading), logic.C(e.Const))
}

// acts says which way a control's contact goes when it protects: false where
// it opens, true where it makes. That follows from the old wiring: the value
// that drives a load to its safe state.
func acts(s *survey.Survey, control string) bool {
	opens, makes := 0, 0
	var walk func(c *survey.Cond, positive, safeOn bool, depth int)
	walk = func(c *survey.Cond, positive, safeOn bool, depth int) {
		if c == nil || depth > len(s.Loads) {
			return
		}
		switch {
		case c.Op == survey.CondName && c.Name == control:
			if positive == safeOn {
				makes++
			} else {
				opens++
			}
		case c.Op == survey.CondName:
			if l := load(s, c.Name); l != nil {
				walk(l.RunsWhen.V.Tree, positive, safeOn, depth+1)
			}
		case c.Op == survey.CondNot:
			walk(c.Args[0], !positive, safeOn, depth)
		default:
			for _, a := range c.Args {
				walk(a, positive, safeOn, depth)
			}
		}
	}
	for _, l := range s.Loads {
		walk(l.RunsWhen.V.Tree, true, l.SafeState.V.Energised(), 0)
	}
	return makes > opens
}

func load(s *survey.Survey, id string) *survey.Load {
	for _, l := range s.Loads {
		if l.ID.V == id {
			return l
		}
	}
	return nil
}

// contact builds a two-position control that resets itself.
func (b *builder) contact(c *survey.Control, p *Probe) *Contact {
	k := &Contact{Control: c, Probe: p, Acts: acts(b.survey, c.ID.V)}
	reads, scale := b.smoothed(c, p)
	k.Make, k.Break = b.edges(c, p, k.Acts, scale)
	start := contactOpen
	if k.Acts {
		start = contactMade
	}
	k.State = b.machine(c.ID.V, c.What.V, start,
		logic.EnumWord{Name: "open", What: "contact open"},
		logic.EnumWord{Name: "made", What: "contact made"})

	// Towards the side that the contact protects, any reading will do and a
	// failed probe forces it; away from it, only a good probe counts.
	k.Dial, k.Anticipator = b.dial(c, p), b.anticipator(c, p, k.State)
	makes, breaks := b.wanted(c)
	at, rising := c.DialMark().V, c.Action.V == survey.BreaksOnRise
	toMade := b.reached(k, reads, scale, k.Make, "make", makes-at, !rising)
	toOpen := b.reached(k, reads, scale, k.Break, "break", breaks-at, rising)
	whyMade, whyOpen := "temperature has reached the make", "temperature has reached the break"
	if k.Acts {
		toMade = logic.Or(p.failed(), toMade)
		toOpen = logic.And(p.good(), toOpen)
		whyMade += ", or the probe is not to be believed"
	} else {
		toMade = logic.And(p.good(), toMade)
		toOpen = logic.Or(p.failed(), toOpen)
		whyOpen += ", or the probe is not to be believed"
	}
	b.add(&logic.Machine{
		Var: k.State, What: c.What.V, Safe: start,
		At: []*logic.State{
			{Is: contactOpen, Goes: []*logic.Transition{{To: contactMade, When: toMade, Why: whyMade}}},
			{Is: contactMade, Goes: []*logic.Transition{{To: contactOpen, When: toOpen, Why: whyOpen}}},
		},
	})
	k.Made = logic.Is(k.State, contactMade)
	if c.Duty.V != survey.Operating {
		k.Made = k.atOnce(k.Made)
	}
	return k
}

// atOnce makes a protective contact act in the very step in which its probe
// becomes suspect.
func (k *Contact) atOnce(made *logic.Expr) *logic.Expr {
	if k.Acts {
		return logic.Or(made, logic.Not(k.Probe.good()))
	}
	return logic.And(made, k.Probe.good())
}
