package translate

import (
	"fmt"
	"math"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// States of a probe. Only a good one lets anything leave its safe state.
const (
	probeProving = iota
	probeGood
	probeSuspect
	probeFaulty
)

// Probe is a sensor in the program: how its readings are believed.
type Probe struct {
	Sensor          *survey.Sensor
	Raw             *logic.Var // the input
	Bad             *logic.Var // this raw sample is outside what can be believed
	State           *logic.Var // proving, good, suspect, faulty
	Proven          *logic.Var // has been good since the last start
	Value           *logic.Var // median of the last three believable samples
	Low             int64      // lowest and highest believable count
	High            int64
	lowest, highest *logic.Expr // the same, as the program has them

	Cold    *Probe   // measures its cold junction, or nil
	reading *Reading // its temperature, once something has asked for it
}

// good is true in a step in which the probe is believed.
func (p *Probe) good() *logic.Expr { return logic.And(p.each((*Probe).itsGood)...) }

func (p *Probe) itsGood() *logic.Expr { return logic.Is(p.State, probeGood) }

// each asks the probe, and the one at its cold junction.
func (p *Probe) each(ask func(*Probe) *logic.Expr) []*logic.Expr {
	if p.Cold == nil {
		return []*logic.Expr{ask(p)}
	}
	return []*logic.Expr{ask(p), ask(p.Cold)}
}

func (p *Probe) proving() *logic.Expr {
	return logic.Or(p.each(func(p *Probe) *logic.Expr { return logic.Is(p.State, probeProving) })...)
}

func (p *Probe) faulty() *logic.Expr {
	return logic.Or(p.each(func(p *Probe) *logic.Expr { return logic.Is(p.State, probeFaulty) })...)
}

// failed is true where the safe state is called for: the probe has not proved
// itself yet, or has been bad for too long.
func (p *Probe) failed() *logic.Expr {
	return logic.Or(p.proving(), p.faulty())
}

// shortestRun is the least number of good samples in a row that ends a doubt.
// Three fill the median; one more, so that a probe that is bad in one sample
// out of four is still found.
const shortestRun = 4

// probe builds the blocks of one sensor.
//
// Bad samples are counted raw, before the median could hide them. A single one
// makes the probe suspect; it is good again only after a run of good samples
// half as long as fault_after. Whatever the mixture of open, short and good
// samples: if no such run comes within fault_after, the probe is faulty, and
// stays so until it has been good for all of clear_after.
func (b *builder) probe(s *survey.Sensor) *Probe {
	id := s.ID.V
	chain := b.spec.Chains[id]
	p := &Probe{Sensor: s}
	p.Low, p.High = chain.Believable()
	junction := b.spec.Junctions[id]
	if junction != nil {
		p.Low, p.High = junction.low, junction.high
	}
	what := describe(s.What.V, "sensor "+id)

	raw := logic.Var{Name: id, What: what + ", raw counts", Kind: logic.Int, Range: logic.Count}
	if chain.Signed() {
		raw.Range, raw.Signed = logic.Int16, true
	}
	p.Raw = b.input(raw)
	p.lowest, p.highest = logic.Lit(p.Low), b.edge(id+"_highest", p.High, s, "highest believable count")
	beyond := logic.Gt(logic.Use(p.Raw), p.highest)
	if p.Low > p.Raw.Range.Lo { // an input for V or A reads 0 in ordinary service
		p.lowest = b.edge(id+"_lowest", p.Low, s, "lowest believable count")
		beyond = logic.Or(logic.Lt(logic.Use(p.Raw), p.lowest), beyond)
	}
	p.Bad = b.local(b.name(id, "bad"), what+": this sample cannot be believed", beyond)

	after := b.steps(id+"_fault_after", s.FaultAfter.V, s.FaultAfter.Source, "not good for")
	run := b.constant(logic.Const{
		Name:  id + "_good_run",
		Value: max((after.Value+1)/2, shortestRun), Unit: "steps", Means: "good samples in a row that end a doubt",
		Origin:  origin(s.FaultAfter.Source),
		Working: fmt.Sprintf("half of %s, at least %d: bad samples oftener than one in so many are found", after.Name, shortestRun),
	})
	clear := b.steps(id+"_clear_after", math.Max(s.ClearAfter.V, float64(run.Value)*b.step), s.ClearAfter.Source, "good for")
	prove := b.constant(logic.Const{
		Name: id + "_prove_within", Value: after.Value + run.Value, Unit: "steps", Means: "time to prove itself after a start",
		Origin: origin(s.FaultAfter.Source), Working: after.Name + " + " + run.Name,
	})

	goodFor := b.counter(b.name(id, "good_for"), "good samples in a row", clear, 0)
	b.add(&logic.Timer{Var: goodFor, Limit: clear, Restart: logic.Use(p.Bad), Why: "a bad sample starts the count again"})

	p.State = b.machine(b.name(id, "state"), what+": is it believed?", probeProving,
		logic.EnumWord{Name: "proving", What: "has not proved itself since the start"},
		logic.EnumWord{Name: "good", What: "believed"},
		logic.EnumWord{Name: "suspect", What: "has given bad samples; nothing new may be started"},
		logic.EnumWord{Name: "faulty", What: "not believed; its loads are in their safe state"})
	age := b.counter(b.name(id, "state_for"), "steps in this state", prove, 0)
	inState := logic.Use(age)
	b.add(&logic.Machine{
		Var: p.State, What: what + ": is it believed?", Timer: age, Limit: prove, Safe: probeFaulty,
		At: []*logic.State{
			{Is: probeProving, Goes: []*logic.Transition{
				{To: probeGood, When: logic.Ge(logic.Use(goodFor), logic.C(run)), Why: "proved itself"},
				{To: probeFaulty, When: logic.Ge(inState, logic.C(prove)), Why: "did not prove itself in time"},
			}},
			{Is: probeGood, Goes: []*logic.Transition{
				{To: probeSuspect, When: logic.Use(p.Bad), Why: "a bad sample"},
			}},
			{Is: probeSuspect, Goes: []*logic.Transition{
				{To: probeGood, When: logic.Ge(logic.Use(goodFor), logic.C(run)), Why: "a run of good samples"},
				{To: probeFaulty, When: logic.Ge(inState, logic.C(after)), Why: "not good for too long, in whatever mixture"},
			}},
			{Is: probeFaulty, Goes: []*logic.Transition{
				{To: probeGood, When: logic.Ge(logic.Use(goodFor), logic.C(clear)), Why: "good for long enough"},
			}},
		},
	})
	p.Value = b.median(id, what, p)
	if junction != nil {
		b.compensate(p, junction)
	}
	return p
}

// median keeps the last two believable samples and takes the middle one of
// them and the present one, so that a single wrong sample inside the
// believable range moves nothing. A bad sample counts as the last believable
// one.
func (b *builder) median(id, what string, p *Probe) *logic.Var {
	counts := p.Raw.Range
	kept := func(name, what string) *logic.Var {
		return b.state(logic.Var{Name: b.name(id, name), What: what, Kind: logic.Int, Range: counts, Start: 0})
	}
	local := func(name, what string, as *logic.Expr) *logic.Var {
		v := &logic.Var{Name: b.name(id, name), What: what, Kind: logic.Int, Range: counts}
		b.add(&logic.Define{Var: v, As: as})
		return v
	}
	last, before := kept("last", what+": last believable sample"), kept("before", what+": the believable sample before that")
	falling := logic.Lt(logic.Prev(last), logic.Prev(before))

	now := local("now", "this sample, or the last believable one", logic.Select(logic.Use(p.Bad), logic.Prev(last), logic.Use(p.Raw)))
	less := local("less", "the smaller of the two before", logic.Select(falling, logic.Prev(last), logic.Prev(before)))
	more := local("more", "the larger of the two before", logic.Select(falling, logic.Prev(before), logic.Prev(last)))
	value := local("counts", what+": median of three believable samples", logic.Clamp(logic.Use(now), logic.Use(less), logic.Use(more)))
	good := logic.Not(logic.Use(p.Bad))
	b.add(
		&logic.Set{Var: before, When: good, To: logic.Prev(last)},
		&logic.Set{Var: last, To: logic.Use(now)}, // for a bad sample it is the last one already
	)
	return value
}

func describe(what, otherwise string) string {
	if what != "" {
		return what
	}
	return otherwise
}
