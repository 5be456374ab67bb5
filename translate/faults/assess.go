package faults

import (
	"fmt"

	"makebreak/survey"
	"makebreak/survey/catalogue"
	"makebreak/translate"
	"makebreak/translate/logic"
	"makebreak/translate/risk"
)

// Assess works out every row of the function table. Without a program only
// the hardware that stays is told of. The view tells which hardware counts
// against which danger.
func Assess(spec *translate.Specification, view *risk.View) []Row {
	a := &assessor{spec: spec, view: view, found: map[string]*bench{}}
	if spec.Program != nil {
		a.run = spec.Program.NewRun()
		for _, l := range spec.Survey.Loads {
			if s := spec.Plan.Loads[l.ID.V]; s != nil {
				a.load(s)
			}
			if v := spec.Plan.Valves[l.ID.V]; v != nil {
				a.valve(v)
			}
		}
		for _, c := range spec.Survey.Controls {
			if m := spec.Plan.Monitors[c.ID.V]; m != nil {
				a.monitored(m)
			}
			if n := spec.Plan.Indications[c.ID.V]; n != nil {
				a.indication(n)
			}
		}
	}
	for _, r := range spec.Refused {
		a.add("what "+r.About+" did", r.About, "it is not translated", end{works, "as the old part works"}, end{unsure, "not in the program: " + r.Why}, end{unsure, "unknown"}, "translation")
		a.close()
	}
	for _, c := range spec.Survey.Controls {
		if stays(c) {
			a.hardware(c)
		}
	}
	return a.rows
}

type assessor struct {
	spec  *translate.Specification
	view  *risk.View
	run   *logic.Run        // never stepped; forks of it are
	found map[string]*bench // by load and state, nil where it was not found
	rows  []Row
	open  []Row // rows of the function at hand
}

// add notes a row. The hardware that stays has stood behind the old part too.
func (a *assessor) add(function, about, cause string, before, now, with end, evidence string) {
	v, remark := verdict(before, with)
	if remark != "" {
		evidence += "; " + remark
	}
	a.open = append(a.open, Row{function, about, cause, before.text, now.text, with.text, v, evidence})
}

// close ends a function with the verdict over all of its causes.
func (a *assessor) close() {
	if len(a.open) > 1 {
		var vs []Verdict
		for _, r := range a.open {
			vs = append(vs, r.Verdict)
		}
		first := a.open[0]
		a.rows = append(a.rows, Row{first.Function, first.About, "all causes below", "see below", "see below", "see below", worst(vs), "the worst of the rows below"})
	}
	a.rows = append(a.rows, a.open...)
	a.open = nil
}

// load tells of every function that a load has by the parts in its line.
func (a *assessor) load(l *translate.Switched) {
	for _, n := range l.Load.RunsWhen.V.Tree.Names() {
		if k := a.spec.Plan.Contacts[n]; k != nil {
			a.contact(l, k)
		}
		if g := a.spec.Plan.Pulsers[n]; g != nil {
			a.pulser(l, g)
		}
	}
	for _, g := range a.spec.Survey.Signals {
		if named(l.Load.RunsWhen.V.Tree, g.ID.V) {
			a.signal(l, g)
		}
	}
	a.supply(l)
}

func named(c *survey.Cond, name string) bool {
	for _, n := range c.Names() {
		if n == name {
			return true
		}
	}
	return false
}

// contact puts the faults of one control into its load.
func (a *assessor) contact(l *translate.Switched, k *translate.Contact) {
	c := k.Control
	function := fmt.Sprintf("switches %s with temperature", l.Load.ID.V)
	if k.Latches || c.Duty.V != survey.Operating {
		function = fmt.Sprintf("limits %s: acts at %s", l.Load.ID.V, translate.Degrees(actsAt(k)))
		if k.Latches {
			function += " and stays so"
		}
	}
	for _, f := range sensorFaults(a.spec, k.Probe) {
		now, how := a.inject(l, k, f)
		with := a.withHardware(l, now, false)
		before := a.withHardware(l, f.old(a, l, k), false)
		a.add(function, c.ID.V, f.cause, before, now, with, how)
	}
	if k.Dial != nil {
		a.dial(l, k, function)
	}
	a.output(l, k, function)
	if k.Latches {
		a.memory(l, k, function)
	}
	a.close()
}

func actsAt(k *translate.Contact) float64 {
	if k.Acts {
		return k.Control.MakesAt.V
	}
	return k.Control.BreaksAt.V
}

// oldElement is how the old control ends when its element fails: what the
// sheet says, else what the catalogue says of such elements.
func (a *assessor) oldElement(l *translate.Switched, k *translate.Contact) end {
	c := k.Control
	what, why := c.OnElementFailure.V, "sheet"
	if what == "unknown" || what == "" {
		element, ok := a.spec.Catalogue.Element(c.Element.V)
		if !ok || len(element.Failures) == 0 {
			return end{unsure, "unknown: neither the sheet nor the catalogue says what " + c.Element.V + " does when it fails"}
		}
		usual := ""
		for i, f := range element.Failures {
			does := catalogue.Reads(string(c.Action.V), f.Reads)
			if i == 0 {
				usual = does
			}
			if does != usual {
				return end{unsure, "unknown: such an element fails either way (catalogue)"}
			}
		}
		what, why = usual, "catalogue"
	}
	made := what == "makes"
	switch what {
	case "breaks", "makes":
		on := made == positive(l.Load.RunsWhen.V.Tree, c.ID.V, true)
		e := staysIn(l, on, fmt.Sprintf(" (contact %s, %s)", map[bool]string{true: "makes", false: "breaks"}[made], why))
		return e
	case "stays":
		return end{wrong, "contact stays as it was (" + why + "); nothing ends it"}
	}
	return end{unsure, "unknown (" + why + ")"}
}

// positive reports whether a name stands in a condition so that its being true
// helps the load on.
func positive(c *survey.Cond, name string, sign bool) bool {
	if c == nil {
		return sign
	}
	if c.Op == survey.CondName && c.Name == name {
		return sign
	}
	for _, x := range c.Args {
		if named(x, name) {
			if c.Op == survey.CondNot {
				return positive(x, name, !sign)
			}
			return positive(x, name, sign)
		}
	}
	return sign
}

// output tells of what lies behind the program: contact, processor, supply.
func (a *assessor) output(l *translate.Switched, k *translate.Contact, function string) {
	id := k.Control.ID.V
	danger := !l.Load.SafeState.V.Energised()
	weld := weldedEnd(l, danger)
	before := staysIn(l, true, " (the old contact welds too; common practice)")
	if k.Latches || k.Control.Duty.V != survey.Operating {
		before = end{bounded, "the old limit breaks the circuit through its own contact, whatever the operating contact does"}
		if k.Control.SamePartAs.V != "" {
			before = end{wrong, "one part with " + k.Control.SamePartAs.V + ": fails with it"}
		}
	}
	a.add(function, id, "contact of the new output welds, or its switch shorts", a.withHardware(l, before, true), weld, a.withHardware(l, weld, true), "sheet: kind of output, read_back")

	stop := a.stopped(l)
	a.add(function, id, "program stops with the output on", end{works, "there was no program to stop"}, stop, a.withHardware(l, stop, false), "sheet: watchdog and drive of the output")

	flip, how := a.flipped(l, k)
	a.add(function, id, "a bit of the program's memory flips", end{works, "there was no memory to upset"}, flip, a.withHardware(l, flip, false), how)
}

func weldedEnd(l *translate.Switched, danger bool) end {
	if !danger {
		return end{safe, "stays " + stateWord(l, true) + ", its safe state"}
	}
	text := "stays " + stateWord(l, true) + "; the program cannot open it"
	if l.Seen != nil {
		return end{wrong, text + ", but sees it and reports it within 1 s"}
	}
	return end{wrong, text + " and does not see it"}
}

func (a *assessor) stopped(l *translate.Switched) end {
	e := a.spec.Survey.Electronics
	on := true
	if l.Output != nil && l.Output.Drive.V == "pulsed" {
		return staysIn(l, l.Load.Rest.V.Energised(), ": the pulses stop and the drive lets go at once")
	}
	if l.Load.SafeState.V.Energised() {
		on = false // the harmful side of this load
	}
	switch e.Watchdog.V {
	case "external", "internal":
		return end{bounded, fmt.Sprintf("stays as it is until the %s watchdog starts the board anew; its time is not on the sheet", e.Watchdog.V)}
	case "none":
		return end{wrong, "stays " + stateWord(l, on) + "; no watchdog ends it"}
	}
	return end{unsure, "unknown: the sheet does not say whether there is a watchdog"}
}

// supply tells what a power cut and its end do.
func (a *assessor) supply(l *translate.Switched) {
	id := l.Load.ID.V
	rests := l.Load.Rest.V.Energised()
	now := staysIn(l, rests, ": what it rests in with no supply to the new output")
	a.add("goes safe without supply: "+id, id, "supply of the electronics is lost", end{works, "the old control needed no supply of its own"}, now, a.withHardware(l, now, false), "sheet: rest and safe_state")
	if len(l.Probes) > 0 {
		n, ok := a.restarts(l)
		text := fmt.Sprintf("comes on by itself %s after the supply returned, where it is called for", translate.Span(a.seconds(n)))
		e := end{works, text}
		if !ok {
			e = end{safe, "does not come on by itself after the supply returned"}
		}
		a.add("goes safe without supply: "+id, id, "supply is lost and returns", end{works, "came on at once where it was called for"}, e, e, fmt.Sprintf("program run from a start with its record, %d steps", n))
	}
	a.close()
}

func (a *assessor) seconds(steps int) float64 {
	return float64(steps) * float64(a.spec.Program.StepMS) / 1000
}

func (a *assessor) restarts(l *translate.Switched) (int, bool) {
	b, ok := a.brought(l.Load.ID.V, true)
	if !ok {
		return 0, false
	}
	rec := b.run.Remember()
	if a.spec.Survey.Electronics.Nonvolatile.V == "true" {
		b.run.Start(&rec)
	} else {
		b.run.Start(nil)
	}
	return b.until(l.Load.ID.V, true, settling(a.spec))
}

// signal tells of an interlock that was a contact in series and is now an input.
func (a *assessor) signal(l *translate.Switched, g *survey.Signal) {
	id := l.Load.ID.V
	function := fmt.Sprintf("no %s without %s", id, g.ID.V)
	if !positive(l.Load.RunsWhen.V.Tree, g.ID.V, true) {
		function = fmt.Sprintf("no %s with %s", id, g.ID.V)
	}
	b, ok := a.brought(id, true)
	if !ok {
		e := end{unsure, "unknown: the program could not be brought to switch it on"}
		a.add(function, g.ID.V, "the signal goes away", end{works, id + " goes off at once: the contact was in series"}, e, e, "program run")
		a.close()
		return
	}
	denied := int64(0)
	if !positive(l.Load.RunsWhen.V.Tree, g.ID.V, true) {
		denied = 1
	}
	lost := b.fork()
	lost.set(g.ID.V, denied)
	a.add(function, g.ID.V, "the signal goes away", end{works, "the contact in series opened the circuit at once"}, a.offAfter(l, lost, works), a.offAfter(l, lost.fork(), works), "program run with the signal taken away")

	wire := b.fork()
	var now end
	switch g.BrokenWire.V {
	case "true", "false":
		wire.set(g.ID.V, map[string]int64{"true": 1, "false": 0}[g.BrokenWire.V])
		now = a.offAfter(l, wire, safe)
	default:
		now = end{unsure, "unknown: the sheet does not say what a broken wire reads as"}
	}
	a.add(function, g.ID.V, "its wire breaks", end{safe, "a broken wire in series opened the circuit"}, now, a.withHardware(l, now, false), "program run with the input as the broken wire reads")

	welded := end{wrong, id + " runs without it"}
	if g.SeenOffBeforeStart.V {
		welded = end{bounded, id + " runs on until it next goes off, and does not start again: the signal was not seen off"}
	}
	a.add(function, g.ID.V, "its contact welds or is bridged", a.withHardware(l, end{wrong, id + " ran without it"}, false), welded, a.withHardware(l, welded, false), "sheet: seen_off_before_start")

	stop := a.stopped(l)
	a.add(function, g.ID.V, "program stops with the output on", end{works, "the contact in series needed no program"}, stop, a.withHardware(l, stop, false), "sheet: watchdog and drive of the output")
	weld := weldedEnd(l, !l.Load.SafeState.V.Energised())
	a.add(function, g.ID.V, "contact of the new output welds, or its switch shorts", end{works, "the contact in series opened the circuit all the same"}, weld, a.withHardware(l, weld, true), "sheet: kind of output")
	a.close()
}

// offAfter runs until the load is in its safe state.
func (a *assessor) offAfter(l *translate.Switched, b *bench, good grade) end {
	id := l.Load.ID.V
	want := l.Load.SafeState.V.Energised()
	b.step()
	if b.on(id) == want {
		return end{good, fmt.Sprintf("goes %s in the same step", stateWord(l, want))}
	}
	n, ok := b.until(id, want, settling(a.spec))
	if ok {
		return end{bounded, fmt.Sprintf("goes %s after %s", stateWord(l, want), translate.Span(a.seconds(n+1)))}
	}
	return staysIn(l, b.on(id), "")
}

// hardware tells of a part that stays: it is what it was, but for what it
// shares with the new electronics.
func (a *assessor) hardware(c *survey.Control) {
	function := fmt.Sprintf("cuts %s by itself", listed(c.Cuts))
	if c.BreaksAt.Set {
		function += " at " + translate.Degrees(c.BreaksAt.V)
	}
	before, same := end{works, "as before"}, end{works, "as before: it stays hard-wired"}
	switch c.Plan.V {
	case survey.Renew:
		same = end{works, "a new approved part does it, hard-wired, once it has been proved"}
	case survey.Add:
		before, same = end{wrong, "there was no such part"}, end{works, "a part that is new does it, hard-wired, once it has been proved"}
	}
	a.add(function, c.ID.V, "any failure of the new electronics", before, same, same, "sheet: plan "+string(c.Plan.V))
	for _, s := range c.Shares {
		switch s.V {
		case "sensor":
			a.add(function, c.ID.V, "the shared sensor fails", same, end{wrong, "fails together with the new control"}, end{wrong, "fails together with the new control"}, "sheet: shares sensor")
		case "converter":
			a.add(function, c.ID.V, "the shared converter fails", same, end{wrong, "fails together with the new control"}, end{wrong, "fails together with the new control"}, "sheet: shares converter")
		case "pocket":
			e := end{unsure, "unknown: whether both elements are held where they belong"}
			a.add(function, c.ID.V, "its element is pushed out of the shared pocket", same, e, e, "sheet: shares pocket")
		case "supply":
			e := a.sharedSupply(c)
			a.add(function, c.ID.V, "the shared supply is lost", same, e, e, "sheet: rest of its loads")
		}
	}
	if c.CutsBy.V == "same_coil" {
		e := end{wrong, "opens only the coil of the contact that has welded"}
		a.add(function, c.ID.V, "the contactor that both open welds", e, e, e, "sheet: cuts_by same_coil")
	}
	a.close()
}

func (a *assessor) sharedSupply(c *survey.Control) end {
	for _, n := range c.Cuts {
		for _, l := range a.spec.Survey.Loads {
			if l.ID.V == n.V && l.Rest.V != l.SafeState.V {
				return end{wrong, n.V + " rests " + string(l.Rest.V) + ", not in its safe state"}
			}
		}
	}
	return end{safe, "everything drops out with it: safe"}
}

func listed(ns survey.Names) string {
	text := ""
	for i, n := range ns {
		if i > 0 {
			text += ", "
		}
		text += n.V
	}
	if text == "" {
		return "its load"
	}
	return text
}
