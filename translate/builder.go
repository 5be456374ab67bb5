package translate

import (
	"fmt"
	"math"
	"strings"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// builder puts a program together. Names are chosen here, once, and are unique
// from then on.
type builder struct {
	survey *survey.Survey
	spec   *Specification
	prog   *logic.Program
	plan   *Plan
	step   float64 // seconds
	taken  map[string]bool
	diags  survey.Diagnostics
	flags  []logic.Flag

	log        *logFile // what process.log names, where it was handed in
	model      *Model   // nil: noModel says why
	noModel    string
	oldLag     float64 // s, of the old element as the observed cycle allows it
	oldLagFrom string
}

func newBuilder(spec *Specification) *builder {
	s := spec.Survey
	b := &builder{
		survey: s,
		spec:   spec,
		step:   s.Electronics.CalledEvery.V,
		taken:  map[string]bool{},
		prog: &logic.Program{
			ID:     s.Equipment.ID.V,
			Title:  s.Equipment.Title.V,
			StepMS: int64(math.Round(s.Electronics.CalledEvery.V * 1000)),
		},
		plan: &Plan{
			Sensors:     map[string]*Probe{},
			Contacts:    map[string]*Contact{},
			Regulators:  map[string]*Regulator{},
			Valves:      map[string]*Valve{},
			Indications: map[string]*Indication{},
			Pulsers:     map[string]*Pulser{},
			Monitors:    map[string]*Monitored{},
			Loads:       map[string]*Switched{},
			Signals:     map[string]*logic.Var{},
			Timers:      map[string]*logic.Var{},
		},
	}
	// Parameters of the C functions, and names that the sheet fixes.
	for _, n := range []string{"m", "in", "out", "r", "fault", "check"} {
		b.taken[n] = true
	}
	for _, x := range s.Signals {
		b.taken[x.ID.V] = true
	}
	for _, x := range s.Loads {
		b.taken[x.ID.V], b.taken[x.ID.V+"_seen"], b.taken[x.ID.V+"_drive"] = true, true, true
	}
	for _, x := range s.Controls {
		b.taken[x.ID.V], b.taken[x.ID.V+"_reset"] = true, true
	}
	for _, x := range s.Electronics.Sensors {
		b.taken[x.ID.V] = true
	}
	for _, x := range s.Timers {
		b.taken[x.ID.V] = true
	}
	return b
}

// name gives a name that nothing else has.
func (b *builder) name(parts ...string) string {
	base := strings.Join(parts, "_")
	name := base
	for n := 2; b.taken[strings.ToLower(name)]; n++ {
		name = fmt.Sprintf("%s_%d", base, n)
	}
	b.taken[strings.ToLower(name)] = true
	return name
}

func (b *builder) add(blocks ...logic.Block) { b.prog.Order = append(b.prog.Order, blocks...) }

// constant declares a named number.
func (b *builder) constant(c logic.Const) *logic.Const {
	c.Name = strings.ToUpper(b.name("k", c.Name)[2:])
	b.prog.Consts = append(b.prog.Consts, &c)
	return &c
}

// longest is the longest time that a counter of steps may hold, in steps: it
// saturates there and can never wrap.
const longest = 1<<31 - 2

// steps declares a time as a number of steps, at least one, rounded up so that
// a stated least time is never shortened.
func (b *builder) steps(name string, seconds float64, from survey.Source, what string) *logic.Const {
	n := max(int64(math.Ceil(seconds/b.step-1e-9)), 1)
	if n > longest {
		b.fail(from, "time too long for the step", fmt.Sprintf("%s is %d steps of %s", from.Text, n, Span(b.step)), fmt.Sprintf("at most %d steps: a longer called_every or a shorter time", longest))
		n = longest
	}
	return b.constant(logic.Const{
		Name:    name,
		Value:   n,
		Unit:    "steps",
		Means:   what + " " + Span(seconds),
		Origin:  origin(from),
		Working: fmt.Sprintf("%s / %s a step, rounded up", Span(seconds), Span(b.step)),
	})
}

// state declares a variable that lives from step to step.
func (b *builder) state(v logic.Var) *logic.Var {
	b.prog.State = append(b.prog.State, &v)
	return &v
}

func (b *builder) truth(name, what string, start bool) *logic.Var {
	v := logic.Var{Name: name, What: what, Kind: logic.Bool, Range: logic.Truth}
	if start {
		v.Start = 1
	}
	return b.state(v)
}

// counter declares a variable that counts steps up to a limit.
func (b *builder) counter(name, what string, limit *logic.Const, start int64) *logic.Var {
	return b.state(logic.Var{Name: name, What: what, Kind: logic.Int, Range: logic.Range{Lo: 0, Hi: limit.Value}, Start: start})
}

// machine declares the variable of a machine.
func (b *builder) machine(name, what string, start int, words ...logic.EnumWord) *logic.Var {
	for _, w := range words {
		b.taken["k_"+name+"_"+w.Name] = true // becomes a constant in C
	}
	return b.state(logic.Var{
		Name: name, What: what, Kind: logic.Word,
		Enum: &logic.Enum{Words: words}, Range: logic.Range{Lo: 0, Hi: int64(len(words)) - 1}, Start: int64(start),
	})
}

// local declares a truth value that lives for one step and is worked out now.
func (b *builder) local(name, what string, as *logic.Expr) *logic.Var {
	v := &logic.Var{Name: name, What: what, Kind: as.Kind, Range: logic.Truth, Enum: as.Enum}
	b.add(&logic.Define{Var: v, As: as})
	return v
}

func (b *builder) input(v logic.Var) *logic.Var {
	b.prog.Inputs = append(b.prog.Inputs, &v)
	return &v
}

func (b *builder) fail(at survey.Source, summary, found, fits string) {
	b.diags = append(b.diags, survey.Diagnostic{
		Severity: survey.Error, File: b.survey.File, Line: at.Line, Col: at.Col, Path: at.Path,
		Summary: summary, Found: found, Fits: fits,
	})
}

// origin says in words where a value came from.
func origin(s survey.Source) string {
	switch {
	case s.Assumed != "" && s.Path != "":
		return "assumed for " + s.Path + ": " + s.Assumed
	case s.Assumed != "":
		return "assumed: " + s.Assumed
	case s.Line > 0:
		return fmt.Sprintf("%s, line %d", s.Path, s.Line)
	}
	return s.Path
}
