package thermal

import (
	"fmt"
	"math"
)

// periodic is a steady cycle of a relay: its times and the exact state at the
// moment of make.
type periodic struct {
	*relay
	onTime, offTime float64
	heldOn, heldOff bool
	crowd           int

	sensedHigh, sensedLow float64
	start                 run // at the moment of make, before the command goes on
}

const (
	settleCycles = 4000 // event-by-event cycles before a loop is said not to settle
	samePeriod   = 1e-9 // relative, at which a cycle counts as repeated
)

// periodic finds the steady cycle: first by solving for it directly, and where
// that does not stand up, by running the loop from rest until it repeats.
func (r *relay) periodic() (*periodic, *NoCycle) {
	if r.chain.warmerRate == 0 && (r.make < r.brk || r.dead > 0) {
		lags := 0.0
		for i := 1; i < r.chain.n; i++ {
			lags += 1 / r.chain.rate[i]
		}
		on, off := r.closedForm(r.dead + lags)
		p := &periodic{relay: r, onTime: on, offTime: off, heldOn: on < r.minOn, heldOff: off < r.minOff}
		if p.solve() && p.stands() && p.attracts() {
			return p, nil
		}
	}
	return r.settle()
}

// settle runs the loop from rest until it repeats, and sharpens the result.
func (r *relay) settle() (*periodic, *NoCycle) {
	s := run{relay: r, state: settled(drive{medium: r.make})}
	s.toggle()
	var past []Cycle // times of the last cycles, latest last
	for i := range settleCycles {
		made := s.since
		if !s.toSwitch() {
			return nil, r.stuck(true)
		}
		heldOn, broke := s.held, s.now
		if !s.toSwitch() {
			return nil, r.stuck(false)
		}
		heldOff := s.held
		if len(s.changes) > maxInFlight {
			return nil, r.waves(fmt.Sprintf("more than %d", maxInFlight), float64(i+1)/s.now)
		}
		on, off := broke-made, s.now-broke
		past = append(past, Cycle{On: on, Off: off})
		if len(past) > mostTurns+1 {
			past = past[1:]
		}
		turns := repeating(past)
		if turns > 1 && i > 4*mostTurns {
			return nil, alternates(past[len(past)-turns:])
		}
		if turns == 1 || i%8 == 7 && i < 80 || i%400 == 399 {
			p := &periodic{relay: r, onTime: on, offTime: off, heldOn: heldOn, heldOff: heldOff}
			if p.solve() && p.stands() && p.attracts() {
				return p, nil
			}
		}
	}
	if s.crowd > 1 {
		return nil, r.waves(fmt.Sprintf("up to %d", s.crowd), settleCycles/s.now)
	}
	return nil, &NoCycle{Reason: DoesNotSettle, OperationsPerYear: secondsPerYear * settleCycles / s.now, Working: fmt.Sprintf("after %d cycles from rest the times still change", settleCycles)}
}

// mostTurns is how many different cycles in turn are recognised.
const mostTurns = 4

// repeating is after how many cycles the times come back, or 0.
func repeating(past []Cycle) int {
	now := past[len(past)-1]
	for turns := 1; turns < len(past); turns++ {
		then := past[len(past)-1-turns]
		if math.Abs(now.On-then.On) < samePeriod*now.On && math.Abs(now.Off-then.Off) < samePeriod*now.Off {
			return turns
		}
	}
	return 0
}

// alternates is said where different cycles come in turn for good.
func alternates(turns []Cycle) *NoCycle {
	sum, times := 0.0, ""
	for i, c := range turns {
		sum += c.Period()
		if i > 0 {
			times += ", then "
		}
		times += fmt.Sprintf("on %.6g s and off %.6g s", c.On, c.Off)
	}
	return &NoCycle{
		Reason: Alternates, Turns: append([]Cycle(nil), turns...), OperationsPerYear: secondsPerYear * float64(len(turns)) / sum,
		Working: "a minimum time is held in some cycles only, and different ones come in turn: " + times,
	}
}

// waves is said where the control switches again before the medium has
// answered the last time, and no single cycle comes of it.
func (r *relay) waves(how string, rate float64) *NoCycle {
	return &NoCycle{Reason: TooManyWaves, OperationsPerYear: secondsPerYear * rate, Working: fmt.Sprintf(
		"%s switchings are on their way at once within one dead time of %.4g s, and they do not settle to one repeated cycle", how, r.dead)}
}

// attracts reports whether the loop comes back to the cycle when the medium is
// moved a little off it. A loop that answers before its last switching is felt,
// or that a minimum time holds, may have a cycle that no real plant stays on.
func (p *periodic) attracts() bool {
	if p.crowd <= 1 && p.chain.warmerRate == 0 && p.minOn == 0 && p.minOff == 0 {
		return true
	}
	s := p.start
	s.changes = append([]float64(nil), p.start.changes...)
	push := 1e-4 * (p.relay.on - p.relay.off)
	s.state.stage[0] += push
	s.toggle()
	enough := 3/p.chain.rate[0] + 5*p.dead
	for s.now < enough {
		for range 2 { // off and on again
			if !s.toSwitch() {
				return false
			}
		}
		if len(s.changes) > maxInFlight {
			return false
		}
	}
	return math.Abs(s.state.stage[0]-p.start.state.stage[0]) < push/4
}

// stuck is what is left when a threshold is not reached from a cycle in
// progress.
func (r *relay) stuck(on bool) *NoCycle {
	if on {
		return &NoCycle{Reason: NeverBreaks, StaysOn: true, SettlesAt: r.real(r.on), Working: "the sensed temperature does not reach break; the load stays on"}
	}
	return &NoCycle{Reason: NeverMakes, SettlesAt: r.real(r.off), Working: "the sensed temperature does not come back to make; the load stays off"}
}

// orbit is the exact periodic answer of the chain to a square wave of given on
// and off times: the stages as the medium feels the load go on, and off.
type orbit struct {
	atOn, atOff temperatures
}

// orbit solves (I − E(on+off)) y = E(off)(I − E(on)) 1·ΔT for the stages y
// above the off temperature at which the medium feels the load go on; E is the
// chain's transition. All matrices are lower triangular and commute.
func (p *periodic) orbit() orbit {
	c, span := &p.chain, p.on-p.off
	eOn, eOff, eAll := c.over(p.onTime), c.over(p.offTime), c.over(p.onTime+p.offTime)
	// from rest at the off temperature through one on time and one off time
	once := eOn.after(temperatures{}, drive{medium: span})
	once = eOff.after(once, drive{})
	var y [stages]float64
	for i := range c.n {
		b := once.stage[i]
		switch i {
		case 1:
			b += eAll.e21 * y[0]
		case 2:
			b += eAll.e31*y[0] + eAll.e32*y[1]
		}
		y[i] = b / -math.Expm1(-c.rate[i]*(p.onTime+p.offTime))
	}
	o := orbit{atOn: temperatures{stage: y}}
	o.atOff = eOn.after(o.atOn, drive{medium: span})
	for i := range stages {
		o.atOn.stage[i] += p.off
		o.atOff.stage[i] += p.off
	}
	return o
}

// at is the chain's state at a phase of the medium's own square wave, which
// begins when the medium feels the load go on.
func (p *periodic) at(o *orbit, phase float64) temperatures {
	if phase < p.onTime {
		return p.chain.advance(o.atOn, drive{medium: p.on}, phase)
	}
	return p.chain.advance(o.atOff, drive{medium: p.off}, phase-p.onTime)
}

// warmers is how far the anticipator has warmed the element at make and break.
func (p *periodic) warmers() (atMake, atBreak float64) {
	k := p.chain.warmerRate
	if k == 0 {
		return 0, 0
	}
	peak := p.rise * math.Expm1(-k*p.onTime) / math.Expm1(-k*(p.onTime+p.offTime))
	return peak * math.Exp(-k*p.offTime), peak
}

// phases are those of the medium's square wave at the moments of make and
// break.
func (p *periodic) phases() (atMake, atBreak float64) {
	period := p.onTime + p.offTime
	late := p.dead
	if late >= period {
		late = math.Mod(late, period)
	}
	atMake = period - late
	if atMake >= period {
		atMake -= period
	}
	atBreak = atMake + p.onTime
	if atBreak >= period {
		atBreak -= period
	}
	return atMake, atBreak
}

// misses are the sensed temperatures at make and break less their thresholds.
func (p *periodic) misses() (atMake, atBreak float64) {
	o := p.orbit()
	m, b := p.phases()
	wm, wb := p.warmers()
	last := p.chain.n - 1
	return p.at(&o, m).stage[last] + wm - p.make, p.at(&o, b).stage[last] + wb - p.brk
}

// solve finds the on and off times at which the periodic answer meets the
// thresholds: Newton's method with the derivatives taken once by differences
// and then kept up by C. G. Broyden's update (1965). A time that is held at its
// minimum is not moved.
func (p *periodic) solve() bool {
	if p.heldOn {
		p.onTime = p.minOn
	}
	if p.heldOff {
		p.offTime = p.minOff
	}
	if p.heldOn && p.heldOff {
		return true
	}
	f, g := p.wrong()
	j := p.derivatives(f, g)
	last := math.Inf(1)
	for i := range 60 {
		off := math.Max(math.Abs(f), math.Abs(g))
		if off <= p.tolerance*1e-2 || off <= p.tolerance*10 && off >= last {
			return true
		}
		if off >= last && i%2 == 1 {
			j = p.derivatives(f, g)
		}
		last = off
		det := j[0][0]*j[1][1] - j[0][1]*j[1][0]
		dOn, dOff := (j[0][1]*g-j[1][1]*f)/det, (j[1][0]*f-j[0][0]*g)/det
		if sum := dOn + dOff; math.IsNaN(sum) || math.IsInf(sum, 0) {
			return false
		}
		on, off2 := p.onTime, p.offTime
		p.onTime, p.offTime = limited(on, dOn), limited(off2, dOff)
		dOn, dOff = p.onTime-on, p.offTime-off2
		f, g = p.wrong()
		if square := dOn*dOn + dOff*dOff; square > 0 {
			// after a full step the old derivatives foresaw 0
			j[0][0] += f * dOn / square
			j[0][1] += f * dOff / square
			j[1][0] += g * dOn / square
			j[1][1] += g * dOff / square
		}
	}
	return false
}

// wrong is what is wrong at make and at break; nothing where a time is held.
func (p *periodic) wrong() (atMake, atBreak float64) {
	atMake, atBreak = p.misses()
	if p.heldOff {
		atMake = 0
	}
	if p.heldOn {
		atBreak = 0
	}
	return atMake, atBreak
}

// derivatives of what is wrong at make (row 0) and break (row 1) by on time
// and off time. The row of a held time keeps it where it is.
func (p *periodic) derivatives(f, g float64) [2][2]float64 {
	const nudge = 1e-7
	q := periodic{relay: p.relay, onTime: p.onTime * (1 + nudge), offTime: p.offTime, heldOn: p.heldOn, heldOff: p.heldOff}
	fOn, gOn := q.wrong()
	q.onTime, q.offTime = p.onTime, p.offTime*(1+nudge)
	fOff, gOff := q.wrong()
	on, off := p.onTime*nudge, p.offTime*nudge
	j := [2][2]float64{{(fOn - f) / on, (fOff - f) / off}, {(gOn - g) / on, (gOff - g) / off}}
	if p.heldOff {
		j[0] = [2]float64{0, 1}
	}
	if p.heldOn {
		j[1] = [2]float64{1, 0}
	}
	return j
}

// limited moves a positive time, never past half or double.
func limited(t, d float64) float64 {
	return math.Min(2*t, math.Max(t/2, t+d))
}

// stands follows the cycle once, from the periodic state, and reports whether
// each threshold is met when it should be and not before, so that the return
// map brings the state back to itself. It notes the extremes of the sensed
// temperature on the way.
func (p *periodic) stands() bool {
	p.start = p.begin()
	p.sensedHigh, p.sensedLow = math.Inf(-1), math.Inf(1)
	close := 1e3 * p.tolerance
	good := p.onTime >= p.minOn*(1-1e-12) && p.offTime >= p.minOff*(1-1e-12)
	s := p.through(func(s *run, until float64) {
		course := newCourse(&s.chain, s.state, s.drive(s.felt, s.command), 0)
		var buffer [maxModes + 2]float64
		times := append(course.zeros(1, until-s.now, buffer[:0]), 0, until-s.now)
		for _, t := range times {
			v := course.at(0, t)
			p.sensedHigh, p.sensedLow = math.Max(p.sensedHigh, v), math.Min(p.sensedLow, v)
			switch age := s.now + t - s.since; {
			case s.command && age >= p.minOn && !p.heldOn && v > p.brk+close:
				good = false
			case !s.command && age >= p.minOff && !p.heldOff && v < p.make-close:
				good = false
			}
		}
	})
	p.crowd = s.crowd
	return good && p.metHeld()
}

// metHeld reports whether a command that a minimum time holds was really
// waiting at its end.
func (p *periodic) metHeld() bool {
	if !p.heldOn && !p.heldOff {
		return true
	}
	atMake, atBreak := p.misses()
	return (!p.heldOff || atMake <= p.tolerance) && (!p.heldOn || atBreak >= -p.tolerance)
}

// begin is the run at the moment of make, with the changes of earlier cycles
// that are still on their way.
func (p *periodic) begin() run {
	period := p.onTime + p.offTime
	o := p.orbit()
	m, _ := p.phases()
	st := p.at(&o, m)
	st.warmer, _ = p.warmers()
	s := run{relay: p.relay, state: st, changes: make([]float64, 0, 4)}
	for k := math.Ceil(p.dead/period) + 1; k >= 1; k-- {
		for i, t := range [2]float64{-k * period, -k*period + p.onTime} {
			if at := t + p.dead; at > 0 {
				s.changes = append(s.changes, at)
			} else {
				s.felt = i == 0
			}
		}
	}
	return s
}

// figures gathers the results.
func (p *periodic) figures() Figures {
	o := p.orbit()
	f := p.turned(p.onTime, p.offTime, o.atOff.stage[0], o.atOn.stage[0], p.sensedHigh, p.sensedLow)
	f.HeldOn, f.HeldOff, f.InFlight = p.heldOn, p.heldOff, p.crowd
	return f
}

// through runs the cycle once, shows every stretch of time in which no input
// changes, and returns the end.
func (p *periodic) through(seen func(s *run, until float64)) run {
	s := p.start
	s.changes = append(make([]float64, 0, len(p.start.changes)+2), p.start.changes...)
	s.seen = seen
	s.toggle()
	for s.now < p.onTime {
		s.step(p.onTime)
	}
	s.toggle()
	for s.now < p.onTime+p.offTime {
		s.step(p.onTime + p.offTime)
	}
	return s
}
