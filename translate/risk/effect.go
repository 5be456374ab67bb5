package risk

import (
	"slices"

	"makebreak/survey"
)

// What switching a load on does to the temperature.
const (
	heats    = "heats"
	cools    = "cools"
	noEffect = "none"
)

// effectOf decides what switching the load on does to the temperature: from
// the process where the sheet says which load drives it, then from the
// controls in its old wiring, then from its kind.
func effectOf(s *survey.Survey, l *survey.Load) string {
	switch l.Kind.V {
	case "alarm", "lamp":
		return noEffect
	}
	if e := effectByProcess(s, l); e != unknown {
		return e
	}
	if e := effectByControls(s, l, true); e != unknown {
		return e
	}
	if e := effectByControls(s, l, false); e != unknown {
		return e
	}
	switch l.Kind.V {
	case "heater", "gas_valve":
		return heats
	case "compressor":
		return cools
	}
	return unknown
}

func effectByProcess(s *survey.Survey, l *survey.Load) string {
	p := &s.Process
	if !p.DrivenBy.Has(l.ID.V) || !p.SettlesOn.Set {
		return unknown
	}
	off := p.SettlesOff
	if !off.Set {
		off = p.Ambient
	}
	switch {
	case !off.Set || p.SettlesOn.V == off.V:
		return unknown
	case p.SettlesOn.V > off.V:
		return heats
	}
	return cools
}

// effectByControls reads the direction of the controls in the load's wiring:
// a contact in series that breaks on rise belongs to a load that heats. With
// operating set, only the controls that work every cycle are asked. Controls
// that disagree give no answer.
func effectByControls(s *survey.Survey, l *survey.Load, operating bool) string {
	answer := unknown
	for name, positive := range polarity(l) {
		c := controlOf(s, name)
		if c == nil || operating && c.Duty.V != survey.Operating {
			continue
		}
		e := effectByAction(c.Action.V)
		if e == unknown {
			continue
		}
		if positive < 0 {
			e = opposite(e)
		}
		if positive == 0 || answer != unknown && answer != e {
			return unknown
		}
		answer = e
	}
	return answer
}

func effectByAction(a survey.Action) string {
	switch a {
	case survey.BreaksOnRise, survey.ClosesOnRise:
		return heats
	case survey.MakesOnRise, survey.OpensOnRise:
		return cools
	case survey.HoldsWhileHot:
		return heats
	}
	return unknown
}

func opposite(effect string) string {
	switch effect {
	case heats:
		return cools
	case cools:
		return heats
	}
	return effect
}

// polarity tells for every name of the load's wiring whether the load wants it
// true (1), false (-1) or either (0). The control that a valve follows counts
// as wanted true.
func polarity(l *survey.Load) map[string]int {
	signs := map[string]int{}
	if l.RunsWhen.Set {
		collectSigns(l.RunsWhen.V.Tree, 1, signs)
	}
	if l.Follows.V != "" {
		signs[l.Follows.V] = 1
	}
	return signs
}

func collectSigns(c *survey.Cond, sign int, signs map[string]int) {
	if c == nil {
		return
	}
	switch c.Op {
	case survey.CondName:
		if old, seen := signs[c.Name]; seen && old != sign {
			signs[c.Name] = 0
		} else {
			signs[c.Name] = sign
		}
	case survey.CondNot:
		sign = -sign
	}
	for _, a := range c.Args {
		collectSigns(a, sign, signs)
	}
}

// wanted lists the names that the load's wiring wants true, in the order of
// the wiring.
func wanted(l *survey.Load) []string {
	signs := polarity(l)
	var names []string
	for _, n := range namesOf(l) {
		if signs[n] >= 0 {
			names = append(names, n)
		}
	}
	return names
}

// namesOf lists the names in the load's wiring, in its order.
func namesOf(l *survey.Load) []string {
	var names []string
	if l.RunsWhen.Set {
		names = l.RunsWhen.V.Tree.Names()
	}
	if l.Follows.V != "" && !slices.Contains(names, l.Follows.V) {
		names = append(names, l.Follows.V)
	}
	return names
}

// controlsOf lists the controls in the load's wiring, those that start, stop
// or end one of its timers included.
func controlsOf(s *survey.Survey, l *survey.Load) []string {
	var ids []string
	add := func(name string) {
		if controlOf(s, name) != nil && !slices.Contains(ids, name) {
			ids = append(ids, name)
		}
	}
	for _, name := range namesOf(l) {
		add(name)
		t := timerOf(s, name)
		if t == nil {
			continue
		}
		add(t.After.V)
		add(t.Starts.V)
		if t.EndsOn.Set {
			for _, n := range t.EndsOn.V.Tree.Names() {
				add(n)
			}
		}
	}
	return ids
}

func controlOf(s *survey.Survey, id string) *survey.Control {
	return find(s.Controls, func(c *survey.Control) bool { return c.ID.V == id })
}

func loadOf(s *survey.Survey, id string) *survey.Load {
	return find(s.Loads, func(l *survey.Load) bool { return l.ID.V == id })
}

func timerOf(s *survey.Survey, id string) *survey.Timer {
	return find(s.Timers, func(t *survey.Timer) bool { return t.ID.V == id })
}

func find[T any](list []*T, is func(*T) bool) *T {
	for _, item := range list {
		if is(item) {
			return item
		}
	}
	return nil
}

// excludes lists the loads that cannot be on while this one is: something that
// this load's line needs is something that their line must not have, in series.
func (b *builder) excludes(l *survey.Load) []string {
	needs, _ := inSeries(l.RunsWhen.V.Tree)
	needs = append(needs, l.ID.V)
	var ids []string
	for _, other := range b.s.Loads {
		_, bars := inSeries(other.RunsWhen.V.Tree)
		if slices.ContainsFunc(needs, func(n string) bool { return slices.Contains(bars, n) }) {
			ids = append(ids, other.ID.V)
		}
	}
	return ids
}

// inSeries lists the names that stand in series in a line: those that it needs
// and those that bar it.
func inSeries(c *survey.Cond) (needs, bars []string) {
	switch {
	case c == nil:
	case c.Op == survey.CondName:
		needs = append(needs, c.Name)
	case c.Op == survey.CondNot && c.Args[0].Op == survey.CondName:
		bars = append(bars, c.Args[0].Name)
	case c.Op == survey.CondAnd:
		for _, a := range c.Args {
			n, x := inSeries(a)
			needs, bars = append(needs, n...), append(bars, x...)
		}
	}
	return needs, bars
}
