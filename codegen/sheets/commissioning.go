package sheets

import (
	"fmt"
	"math"
	"slices"
	"strings"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
	"makebreak/translate/risk"
	"makebreak/translate/sensing"
)

// A check is one row of the commissioning sheet.
type check struct {
	part, do, expect string
}

// Commissioning prints commissioning.md: what to test on site, with expected
// figures and a place for the reading. The limit that stays comes first, then
// isolation, then hardware that is new, then the program. Where a stop is open
// there is no program to test.
func Commissioning(spec *translate.Specification, a *risk.Assessment) string {
	s := spec.Survey
	var b strings.Builder
	fmt.Fprintf(&b, "# Commissioning: %s\n\n", Markdown(s.Equipment.Title.V))
	if s.Equipment.Change.V != "" {
		fmt.Fprintf(&b, "Change: %s\n\n", Markdown(s.Equipment.Change.V))
	}
	cautions(&b, a)
	b.WriteString("Readings are written down by the person who took them, with name and date. A row that does not come out stops the work.\n\n")
	b.WriteString("| no | part | do | expect | reading | by, date |\n|---|---|---|---|---|---|\n")
	for i, c := range checks(spec, a) {
		fmt.Fprintf(&b, "| %d | %s | %s | %s | | |\n", i+1, Markdown(c.part), Markdown(c.do), Markdown(c.expect))
	}
	for _, line := range []string{
		"Reference thermometer (number, calibrated until)",
		"Tested by (role, name, date)",
		"Accepted by (role, name, date)",
	} {
		fmt.Fprintf(&b, "\n%s: ____________________\n", line)
	}
	return b.String()
}

func checks(spec *translate.Specification, a *risk.Assessment) []check {
	cs := stays(spec.Survey)
	cs = append(cs, check{"isolation", "isolate, lock off, prove dead; then change the parts", "no voltage at the terminals; the lock is on"})
	cs = append(cs, fitted(spec.Survey)...)
	switch {
	case a.Stopped():
		return append(cs, check{"program", "nothing is tested: a stop is open, and the C is withheld", "another design; see risks.md"})
	case spec.Plan == nil:
		return append(cs, check{"program", "nothing can be tested: no program came out of the sheet", "see risks.md"})
	}
	cs = append(cs, sensors(spec)...)
	cs = append(cs, contacts(spec)...)
	cs = append(cs, regulators(spec)...)
	cs = append(cs, indications(spec)...)
	cs = append(cs, pulsers(spec)...)
	cs = append(cs, monitors(spec)...)
	cs = append(cs, loads(spec)...)
	cs = append(cs, runs(spec)...)
	return append(cs, clocks(spec)...)
}

// atHand goes before a test that runs a load without its control.
const atHand = "with the isolator at hand, "

func sensors(spec *translate.Specification) []check {
	var cs []check
	for _, x := range spec.Survey.Electronics.Sensors {
		p := spec.Plan.Sensors[x.ID.V]
		if p == nil {
			continue
		}
		chain := spec.Chains[x.ID.V]
		for _, t := range []float64{0, 25, 100} {
			if count, err := chain.Count(t); err == nil && count > p.Low && count < p.High {
				cs = append(cs, check{x.ID.V, fmt.Sprintf("put it, or a substitute for it, at %s", degrees(t)), fmt.Sprintf("%d%s counts", count, spread(chain, t))})
			}
		}
		cs = append(cs, check{x.ID.V, "pull one wire off", wireOff(spec, x, chain)},
			check{x.ID.V, "short it", "the same, unless a short reads inside the range of this sensor: then write down what it reads"})
	}
	return cs
}

// wireOff is what the program makes of a sensor's broken wire.
func wireOff(spec *translate.Specification, x *survey.Sensor, chain *sensing.Chain) string {
	for _, f := range chain.Failures() {
		if (f.What == "open" || f.What == "wire off") && !f.Known {
			return "not determined by its front end: write down what it reads"
		}
	}
	return fmt.Sprintf("fault %s within %s (%s and two steps); its loads go to their safe state; they come back no sooner than %s after the wire is on again",
		x.ID.V, span(x.FaultAfter.V+steps(spec, 2)), span(x.FaultAfter.V), span(x.ClearAfter.V))
}

// spread is by how many counts a sound chain may differ at a temperature: its
// worst error over the width of a count, rounded up.
func spread(chain *sensing.Chain, t float64) string {
	b, err := chain.Budget(t)
	width := math.Abs(chain.CountWidth(t))
	if err != nil || width == 0 || math.IsInf(b.WorstCase/width, 0) || math.IsNaN(b.WorstCase/width) {
		return ""
	}
	return fmt.Sprintf(" ± %.0f", math.Ceil(b.WorstCase/width))
}

// steps is the time of some steps of the program, in seconds.
func steps(spec *translate.Specification, n int64) float64 {
	return float64(n*spec.Program.StepMS) / 1000
}

func contacts(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		k := spec.Plan.Contacts[c.ID.V]
		t, ok := spec.Thresholds[c.ID.V]
		if k == nil || !ok || k.PID != nil {
			continue
		}
		on, off := "warm", "cool"
		if c.Action.V == survey.BreaksOnRise {
			on, off = off, on
		}
		expect := func(edge, does string, at float64, counts int64) string {
			return fmt.Sprintf("%s at %s%s (%d counts)", does, degrees(at), budgeted(spec, c.ID.V, edge), counts)
		}
		slowly := " the probe slowly, in a bath, beside a reference thermometer"
		if lag := spec.Matches[c.ID.V].Filter.Lag; lag > 0 {
			slowly += fmt.Sprintf(" and behind a software lag of %s: wait %s at each step", span(lag), span(5*lag))
		}
		cs = append(cs,
			check{c.ID.V, off + slowly, expect("break", "breaks", t.Break.SwitchesAt, t.Break.Counts)},
			check{c.ID.V, on + " it slowly", expect("make", "makes", t.Make.SwitchesAt, t.Make.Counts)})
		if k.Latches {
			cs = append(cs, latches(spec, c, k)...)
		}
		if k.Dial != nil {
			cs = append(cs, dialled(c, k.Dial, fmt.Sprintf("makes at %s and breaks at %s, the set point of the sheet", degrees(c.MakesAt.V), degrees(c.BreaksAt.V)))...)
		}
	}
	return cs
}

// budgeted is the worst error of the new chain at an edge of a control.
func budgeted(spec *translate.Specification, control, edge string) string {
	for _, b := range spec.Budgets {
		if b.Control == control && b.Edge == edge {
			return " ± " + kelvins(b.WorstCase)
		}
	}
	return ""
}

// runs says how the plant has to cycle once the program is in charge.
func runs(spec *translate.Specification) []check {
	var cs []check
	for _, k := range spec.Cycles {
		id := k.Control.ID.V
		if c := spec.Plan.Contacts[id]; c == nil || c.PID != nil {
			continue
		}
		const do = "let the plant settle, then take two cycles or more with a stopwatch, and a reference thermometer in the medium"
		if k.New.Why != "" {
			cs = append(cs, check{id, do, "write down on, off, high and low; no cycle was predicted: " + k.New.Why})
			continue
		}
		f := k.New.Figures
		give := func(name string, print func(float64) string) string {
			if v, ok := spec.Figures.Value(id, name); ok {
				return " ± " + print(v)
			}
			return ""
		}
		cs = append(cs, check{id, do, fmt.Sprintf("on %s%s, off %s%s, period %s; high %s%s, low %s%s. At the demand of the sheet: another ambient or a draw-off changes on and off, and hardly the swing",
			span(f.On), give("on_s_tolerance", span), span(f.Off), give("off_s_tolerance", span), span(f.Period()),
			degrees(f.High), give("high_tolerance", kelvins), degrees(f.Low), give("low_tolerance", kelvins))})
	}
	return cs
}

func latches(spec *translate.Specification, c *survey.Control, k *translate.Contact) []check {
	cs := []check{
		{c.ID.V, "let it trip, then take the supply away and give it back", "still tripped"},
		{c.ID.V, "with a blank memory, give the supply", "comes up tripped"},
	}
	if k.Reset != nil {
		cs = append(cs,
			check{c.ID.V, "hold the button in and let it trip", "it trips all the same; letting go and pressing again resets it only beyond the reset threshold"},
			check{c.ID.V, "press the button before the temperature is back", "stays tripped"})
	}
	return cs
}

func loads(spec *translate.Specification) []check {
	var cs []check
	for _, l := range spec.Survey.Loads {
		if v := spec.Plan.Valves[l.ID.V]; v != nil {
			cs = append(cs, valves(spec, v)...)
		}
		s := spec.Plan.Loads[l.ID.V]
		if s == nil {
			continue
		}
		cs = append(cs,
			check{l.ID.V, "take the supply of the electronics away while it runs", fmt.Sprintf("goes %s, as its wiring rests", l.Rest.V)},
			check{l.ID.V, "give the supply back", fmt.Sprintf("comes up %s; leaves that by itself once its probes are believed and it is called for: nobody may be hurt by that", l.SafeState.V)},
			check{l.ID.V, atHand + "stop the program (hold the processor in reset)", stopped(spec, s)})
		for _, g := range spec.Survey.Signals {
			if slices.Contains(l.RunsWhen.V.Tree.Names(), g.ID.V) {
				cs = append(cs, check{l.ID.V, "pull the wire of " + g.ID.V + " off while it runs", broken(g, l)})
			}
		}
		cs = append(cs, minimums(spec, l.ID.V)...)
		if s.Seen != nil {
			cs = append(cs, check{l.ID.V, atHand + "bridge its contact while it is told to be off", fmt.Sprintf("fault %s_welded%s; no new start until the supply has been off", l.ID.V, settled(spec, l.ID.V))})
		}
		if s.NoEffect != nil {
			if c := constant(spec, l.ID.V+"_effect_within"); c != nil {
				cs = append(cs, check{l.ID.V, atHand + "take the probe out of its pocket while the load runs", fmt.Sprintf("fault %s_no_effect no later than %s after the reading has stopped moving", l.ID.V, span(steps(spec, c.Value)))})
			}
		}
	}
	return cs
}

func stopped(spec *translate.Specification, s *translate.Switched) string {
	switch {
	case s.Output != nil && s.Output.Drive.V == "pulsed":
		return "its drive lets go at once: goes " + string(s.Load.Rest.V)
	case spec.Survey.Electronics.Watchdog.V == "internal" || spec.Survey.Electronics.Watchdog.V == "external":
		return "the watchdog starts the board anew; write down after what time, and that the load goes " + string(s.Load.SafeState.V)
	}
	return "nothing on the sheet ends it: write down what the load does"
}

// settled is the time after which a contact that does not follow is a fault.
func settled(spec *translate.Specification, load string) string {
	c := constant(spec, load+"_contact_settles")
	if c == nil {
		return ""
	}
	return " within " + span(steps(spec, c.Value+2))
}

// broken is what a load does when the wire of a signal comes off, as far as
// its own line tells.
func broken(g *survey.Signal, l *survey.Load) string {
	if g.BrokenWire.V != "true" && g.BrokenWire.V != "false" {
		return "not on the sheet: write down what it reads"
	}
	reads := g.BrokenWire.V == "true"
	text := "reads " + g.BrokenWire.V + ": "
	on, off := "on", "off"
	if l.Kind.V.Opens() {
		on, off = "open", "closed"
	}
	tree := l.RunsWhen.V.Tree
	switch {
	case closes(tree, g.ID.V, reads) == no && l.SafeState.V.Energised():
		return text + fmt.Sprintf("%s goes %s once any minimum time has passed", l.ID.V, off)
	case closes(tree, g.ID.V, reads) == no:
		return text + fmt.Sprintf("%s goes %s at once", l.ID.V, off)
	case closes(tree, g.ID.V, reads) == yes:
		return text + fmt.Sprintf("%s is called %s, whatever else is the case (see risks.md)", l.ID.V, on)
	case closes(tree, g.ID.V, !reads) == no:
		return text + l.ID.V + " does not notice (see risks.md)"
	}
	return text + "the rest of its line decides; write down what " + l.ID.V + " does"
}

// An answer is what can be told about a line when one signal is known.
type answer int

const (
	perhaps answer = iota
	yes
	no
)

// closes says whether a line is closed when one signal has a value and nothing
// is known of the rest (Kleene's three-valued logic, 1952).
func closes(c *survey.Cond, signal string, value bool) answer {
	if c == nil {
		return no
	}
	switch c.Op {
	case survey.CondName:
		if c.Name == signal {
			return told(value)
		}
	case survey.CondLiteral:
		return told(c.Value)
	case survey.CondNot:
		return opposite(closes(c.Args[0], signal, value))
	case survey.CondAnd:
		return all(c.Args, signal, value, no)
	case survey.CondOr:
		return all(c.Args, signal, value, yes)
	}
	return perhaps
}

// all joins the parts of a line: one that decides is enough; otherwise every
// part has to be known.
func all(parts []*survey.Cond, signal string, value bool, decides answer) answer {
	known := opposite(decides)
	for _, p := range parts {
		switch closes(p, signal, value) {
		case decides:
			return decides
		case perhaps:
			known = perhaps
		}
	}
	return known
}

func told(value bool) answer {
	if value {
		return yes
	}
	return no
}

func opposite(a answer) answer {
	switch a {
	case yes:
		return no
	case no:
		return yes
	}
	return perhaps
}

func minimums(spec *translate.Specification, load string) []check {
	var cs []check
	for _, m := range []struct{ name, do, expect string }{
		{"_min_off", "let it go off and call for it again at once; then the same with the supply", "stays off for at least "},
		{"_min_on", "let its control open right after it came on", "stays on for at least "},
	} {
		if c := constant(spec, load+m.name); c != nil {
			cs = append(cs, check{load, m.do, m.expect + span(steps(spec, c.Value))})
		}
	}
	return cs
}

func clocks(spec *translate.Specification) []check {
	var cs []check
	for _, t := range spec.Survey.Timers {
		if spec.Plan.Timers[t.ID.V] == nil {
			continue
		}
		after := map[string]string{"restart": "begins anew", "resume": "goes on where it was, to a part", "run": "runs at once"}[t.AfterPowerCut.V]
		cs = append(cs, check{t.ID.V, "let it run with a stopwatch, then cut the supply in the middle", fmt.Sprintf("runs for %s; after the cut it %s", span(t.Lasts.V), after)})
	}
	return cs
}

func constant(spec *translate.Specification, name string) *logic.Const {
	for _, c := range spec.Program.Consts {
		if strings.EqualFold(c.Name, name) {
			return c
		}
	}
	return nil
}
