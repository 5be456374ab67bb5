package translate

import (
	"slices"
	"strconv"
	"strings"

	"makebreak/survey"
	"makebreak/translate/sensing"
	"makebreak/translate/switching"
)

// Stage is an output stage with everything that was asked of it.
type Stage struct {
	Load, Kind string
	Checks     []switching.Check
	Source     survey.Source
}

// hard are the questions of which a no ends the design: beyond them a stage
// burns, arcs, or does not let go. The others are for somebody to decide.
var hard = []string{"rating", "voltage", "kind of current", "temperature"}

// stage asks an output stage everything that it has to answer for its load.
func (b *builder) stage(l *survey.Load, o *survey.Output, inrush switching.Result) {
	st := Stage{Load: l.ID.V, Kind: o.Kind.V, Source: o.Source}
	box := survey.Field[float64]{}
	if t := b.survey.Equipment.Enclosure.Temperature; t.Set {
		box.V, box.Set = t.V[1], true
	}
	st.Checks = switching.Stage{Output: o, Load: l, Inrush: inrush, Box: box}.Check()
	b.spec.Stages = append(b.spec.Stages, st)

	var refused, doubtful, unsettled []string
	for _, c := range st.Checks {
		text := c.Name + ": " + strings.TrimPrefix(c.Working, "not determined: ")
		switch {
		case !c.Determined:
			unsettled = append(unsettled, text)
		case !c.Holds && slices.Contains(hard, c.Name):
			refused = append(refused, text)
		case !c.Holds:
			doubtful = append(doubtful, text)
		}
	}
	for _, g := range []struct {
		name  string
		texts []string
	}{{"stage_refused", refused}, {"stage_doubtful", doubtful}, {"stage_unsettled", unsettled}} {
		working := "none"
		if len(g.texts) > 0 {
			working = strings.Join(g.texts, "; ")
		}
		b.spec.Figures.add(l.ID.V, g.name, float64(len(g.texts)), "checks", o.Path, working)
	}
}

// flicker says what time-proportioning a heater does to the supply.
func (b *builder) flicker(l *survey.Load, o *survey.Output) {
	if !o.Window.Set || l.Kind.V != "heater" && l.Kind.V != "contactor" {
		return
	}
	fs, at := &b.spec.Figures, o.Window.Path
	if l.Kind.V != "heater" {
		fs.open(l.ID.V, "flicker", "Pst", at, "not determined: the heater behind "+l.ID.V+" draws the current, and it is not on the sheet")
		return
	}
	b.result(l.ID.V, "flicker", switching.Severity(o.Window.V, known(l.Current), known(l.Supply)), at)
	b.result(l.ID.V, "window_least", switching.ShortestWindow(known(l.Current), known(l.Supply)), at)
	b.spec.Figures.add(l.ID.V, "window", o.Window.V, "s", at, switching.Flicker(o.Window.V, known(l.Current)))
}

// failures notes which of the ways in which each new sensor's circuit breaks
// read as if they were a temperature.
func (b *builder) failures() {
	for _, s := range b.survey.Electronics.Sensors {
		chain := b.spec.Chains[s.ID.V]
		if chain == nil || s.Kind.V == "millivolt" || s.Kind.V == "current" {
			continue // nothing at all is an ordinary reading there
		}
		var unseen []string
		for _, f := range chain.Failures() {
			if f.Inside && f.Known {
				unseen = append(unseen, f.What+": "+f.Working)
			}
		}
		working := "none"
		if len(unseen) > 0 {
			working = strings.Join(unseen, "; ")
		}
		b.spec.Figures.add(s.ID.V, "failures_believed", float64(len(unseen)), "failures", s.Path, working)
	}
}

// outputs works out what each output stage has to stand besides switching.
func (b *builder) outputs() {
	for _, l := range b.survey.Loads {
		o := output(b.survey, l.ID.V)
		if o == nil {
			continue
		}
		multiple, source := 0.0, ""
		if k, ok := b.spec.Catalogue.Load(string(l.Kind.V)); ok {
			multiple, source = k.Inrush.Usual, k.Inrush.Source.String()
		}
		inrush := switching.Inrush(known(l.Inrush), known(l.Current), multiple, source)
		b.result(l.ID.V, "inrush", inrush, l.Inrush.Path)
		b.stage(l, o, inrush)
		b.flicker(l, o)
		if o.Kind.V == "ssr" || o.Kind.V == "triac" {
			heat := switching.Heat(known(o.OnDrop), known(l.Current))
			b.result(l.ID.V, "heat", heat, o.OnDrop.Path)
			if box := b.survey.Equipment.Enclosure.Temperature; box.Set {
				b.result(l.ID.V, "hottest", switching.Hottest(heat, known(o.ThermalRes), box.V[1]), o.ThermalRes.Path)
			}
		}
	}
}

// Verdict is the answer to a question about a stage, in a word.
func Verdict(c switching.Check) string {
	switch {
	case !c.Determined:
		return "not determined"
	case c.Holds:
		return "yes"
	}
	return "NO"
}

// SensorFailure is one way in which the circuit of a sensor breaks.
type SensorFailure struct {
	Sensor string
	sensing.Failure
}

// CountText is the count that is then read, where it can be said.
func (f SensorFailure) CountText() string {
	if !f.Known {
		return "not determined"
	}
	return strconv.FormatInt(f.Count, 10)
}

// Seen says whether the program can tell it from a temperature.
func (f SensorFailure) Seen() string {
	switch {
	case !f.Known:
		return "cannot be relied on"
	case f.Inside:
		return "NO: reads as a temperature"
	}
	return "yes"
}

// SensorFailures lists how the circuits of the new sensors break.
func (s *Specification) SensorFailures() []SensorFailure {
	var all []SensorFailure
	for _, x := range s.Survey.Electronics.Sensors {
		if chain := s.Chains[x.ID.V]; chain != nil {
			for _, f := range chain.Failures() {
				all = append(all, SensorFailure{x.ID.V, f})
			}
		}
	}
	return all
}
