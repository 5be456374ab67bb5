package sheets

import (
	"fmt"
	"strings"

	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/logic"
)

// A check is one row of the commissioning sheet.
type check struct {
	part, do, expect string
}

// Commissioning prints commissioning.md: what to test on site, with expected
// figures and a place for the reading. The limit that stays comes first.
func Commissioning(spec *translate.Specification) string {
	s := spec.Survey
	var b strings.Builder
	fmt.Fprintf(&b, "# Commissioning: %s\n\n", Markdown(s.Equipment.Title.V))
	if s.Equipment.Change.V != "" {
		fmt.Fprintf(&b, "Change: %s\n\n", Markdown(s.Equipment.Change.V))
	}
	cautions(&b)
	b.WriteString("Readings are written down by the person who took them, with name and date. A row that does not come out stops the work.\n\n")
	b.WriteString("| no | part | do | expect | reading | by, date |\n|---|---|---|---|---|---|\n")
	for i, c := range checks(spec) {
		fmt.Fprintf(&b, "| %d | %s | %s | %s | | |\n", i+1, Markdown(c.part), Markdown(c.do), Markdown(c.expect))
	}
	b.WriteString("\nAccepted by (role, name, date): ____________________\n")
	return b.String()
}

func checks(spec *translate.Specification) []check {
	var cs []check
	cs = append(cs, hardware(spec.Survey)...)
	cs = append(cs, check{"isolation", "isolate, lock off, prove dead; then change the parts", "no voltage at the terminals; the lock is on"})
	if spec.Plan == nil {
		return append(cs, check{"program", "nothing can be tested: no program came out of the sheet", "see risks.md"})
	}
	cs = append(cs, sensors(spec)...)
	cs = append(cs, contacts(spec)...)
	cs = append(cs, loads(spec)...)
	return append(cs, clocks(spec)...)
}

// hardware comes before anything is touched: the limits that stay.
func hardware(s *survey.Survey) []check {
	var cs []check
	for _, c := range s.Controls {
		if c.Plan.V != survey.Keep && c.Plan.V != survey.Add && c.Plan.V != survey.Renew && c.Plan.V != survey.Monitor {
			continue
		}
		when := "before anything is touched: "
		if c.Plan.V == survey.Add || c.Plan.V == survey.Renew {
			when = "once fitted, before the program runs: "
		}
		edge, word := c.BreaksAt, "warm its element slowly"
		if c.Action.V == survey.MakesOnRise {
			word = "cool its element slowly"
		}
		expect := fmt.Sprintf("it cuts %s by itself", names(c.Cuts))
		if edge.Set {
			expect += fmt.Sprintf(" at %s", degrees(edge.V))
			if c.Tolerance.Set {
				expect += fmt.Sprintf(" ± %s", kelvins(c.Tolerance.V))
			}
		} else {
			expect += "; at what temperature is not on the sheet: write it down"
		}
		if c.Reset.V == survey.ResetManual {
			expect += ", and stays so until its button is pressed"
		}
		cs = append(cs, check{c.ID.V, when + word + " and watch the load", expect})
	}
	if len(cs) == 0 {
		cs = append(cs, check{"hardware limits", "before anything is touched: look for hardware that limits this plant", "the sheet names none; if there is any, it stays and is proved first"})
	}
	return cs
}

func names(ns survey.Names) string {
	var parts []string
	for _, n := range ns {
		parts = append(parts, n.V)
	}
	if len(parts) == 0 {
		return "its load (the sheet does not say which)"
	}
	return strings.Join(parts, " and ")
}

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
				cs = append(cs, check{x.ID.V, fmt.Sprintf("put it, or a substitute for it, at %s", degrees(t)), fmt.Sprintf("%d counts", count)})
			}
		}
		after, clear := span(x.FaultAfter.V), span(x.ClearAfter.V)
		cs = append(cs,
			check{x.ID.V, "pull one wire off", fmt.Sprintf("fault %s within %s; its loads go to their safe state; they come back no sooner than %s after the wire is on again", x.ID.V, after, clear)},
			check{x.ID.V, "short it", "the same, unless a short reads inside the range of this sensor: then write down what it reads"})
	}
	return cs
}

func contacts(spec *translate.Specification) []check {
	var cs []check
	for _, c := range spec.Survey.Controls {
		k := spec.Plan.Contacts[c.ID.V]
		t, ok := spec.Thresholds[c.ID.V]
		if k == nil || !ok {
			continue
		}
		on, off := "warm", "cool"
		if c.Action.V == survey.BreaksOnRise {
			on, off = off, on
		}
		expect := func(h string, at float64, counts int64) string {
			return fmt.Sprintf("%s at %s (%d counts)", h, degrees(at), counts)
		}
		cs = append(cs,
			check{c.ID.V, off + " the probe slowly, in a bath, beside a reference thermometer", expect("breaks", t.Break.SwitchesAt, t.Break.Counts)},
			check{c.ID.V, on + " it slowly", expect("makes", t.Make.SwitchesAt, t.Make.Counts)})
		if k.Latches {
			cs = append(cs, latches(spec, c, k)...)
		}
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
		s := spec.Plan.Loads[l.ID.V]
		if s == nil {
			continue
		}
		cs = append(cs,
			check{l.ID.V, "take the supply of the electronics away while it runs", fmt.Sprintf("goes %s, as its wiring rests", l.Rest.V)},
			check{l.ID.V, "stop the program (hold the processor in reset)", stopped(spec, s)})
		for _, g := range spec.Survey.Signals {
			if uses(l.RunsWhen.V.Tree, g.ID.V) {
				cs = append(cs, check{l.ID.V, "pull the wire of " + g.ID.V + " off while it runs", broken(g, l)})
			}
		}
		cs = append(cs, minimums(spec, l.ID.V)...)
		if s.Seen != nil {
			cs = append(cs, check{l.ID.V, "bridge its contact while it is told to be off", "fault " + l.ID.V + "_welded within 1 s; no new start until the supply has been off"})
		}
		if s.NoEffect != nil {
			if c := constant(spec, l.ID.V+"_effect_within"); c != nil {
				cs = append(cs, check{l.ID.V, "take the probe out of its pocket while the load runs", fmt.Sprintf("fault %s_no_effect no later than %s after the reading has stopped moving", l.ID.V, span(float64(c.Value*spec.Program.StepMS)/1000))})
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

func broken(g *survey.Signal, l *survey.Load) string {
	switch g.BrokenWire.V {
	case "false":
		return "reads false: " + l.ID.V + " goes off at once"
	case "true":
		return "reads true: " + l.ID.V + " does not notice (see risks.md)"
	}
	return "not on the sheet: write down what it reads"
}

func uses(c *survey.Cond, name string) bool {
	for _, n := range c.Names() {
		if n == name {
			return true
		}
	}
	return false
}

func minimums(spec *translate.Specification, load string) []check {
	var cs []check
	for _, m := range []struct{ name, do, expect string }{
		{"_min_off", "let it go off and call for it again at once; then the same with the supply", "stays off for at least "},
		{"_min_on", "let its control open right after it came on", "stays on for at least "},
	} {
		if c := constant(spec, load+m.name); c != nil {
			cs = append(cs, check{load, m.do, m.expect + span(float64(c.Value*spec.Program.StepMS)/1000)})
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
