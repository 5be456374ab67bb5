package thermal

import "math"

// maxInFlight is how many switchings may be on their way through the dead time
// before a run is given up.
const maxInFlight = 64

// relay is a loop turned so that the load always heats: a cooling process is
// mirrored, and the warm side of its anticipator goes into the thresholds.
type relay struct {
	chain         chain
	on, off       float64 // where the medium settles
	dead          float64
	rise          float64 // of the anticipator while on
	make, brk     float64
	minOn, minOff float64
	sign          float64 // 1 heating, -1 cooling
	shift         float64 // sensed temperature as mirrored = sign·real + shift
	tolerance     float64 // K, below which two temperatures are the same
}

func newRelay(l Loop) relay {
	p, s := l.Process, l.Switching
	r := relay{
		chain: newChain(p, l.Sensing), sign: 1, dead: p.Dead, rise: l.Sensing.Anticipator.Rise,
		minOn: s.MinOn, minOff: s.MinOff,
	}
	if p.Cooling() {
		r.sign, r.shift = -1, r.rise
	}
	r.on, r.off = r.sign*p.On, r.sign*p.Off
	r.make, r.brk = r.sign*s.Make+r.shift, r.sign*s.Break+r.shift
	if r.dead < 1e-12*p.Tau { // nothing that could be told from none
		r.dead = 0
	}
	r.tolerance = 1e-12 * (math.Abs(r.on) + math.Abs(r.off) + r.rise)
	return r
}

// drive is the chain's input for a command as the medium feels it (late) and
// as the anticipator does (at once).
func (r *relay) drive(medium, warmer bool) drive {
	d := drive{medium: r.off}
	if medium {
		d.medium = r.on
	}
	if warmer {
		d.warmer = r.rise
	}
	return d
}

// run is a relay at one moment of its life.
type run struct {
	*relay
	now     float64 // s since the run began
	state   temperatures
	command bool      // what the control asks for
	felt    bool      // what the medium feels
	changes []float64 // times at which the medium will feel a change, in order
	since   float64   // time of the last change of the command
	held    bool      // the last change waited for a minimum time
	crowd   int       // most changes that were on their way at once
	seen    func(r *run, until float64)
}

// toggle changes the command.
func (r *run) toggle() {
	r.command = !r.command
	r.since = r.now
	if r.dead == 0 {
		r.felt = r.command
		return
	}
	r.changes = append(r.changes, r.now+r.dead)
	r.crowd = max(r.crowd, len(r.changes))
}

// step carries the run to the given time or to the next change that the medium
// feels, whichever is sooner.
func (r *run) step(until float64) {
	change := len(r.changes) > 0 && r.changes[0] <= until
	if change {
		until = r.changes[0]
	}
	if r.seen != nil {
		r.seen(r, until)
	}
	r.state = r.chain.advance(r.state, r.drive(r.felt, r.command), until-r.now)
	r.now = until
	if change {
		r.changes = append(r.changes[:0], r.changes[1:]...)
		r.felt = !r.felt
	}
}

// ages is a time after which every part of the chain has settled as far as
// double precision can tell.
func (r *relay) ages() float64 {
	slowest := r.chain.rate[0]
	for i := 1; i < r.chain.n; i++ {
		slowest = math.Min(slowest, r.chain.rate[i])
	}
	if r.chain.warmerRate > 0 {
		slowest = math.Min(slowest, r.chain.warmerRate)
	}
	return 50 / slowest
}

// toSwitch carries the run to the next change of the command and makes it. It
// reports false where the command would never change.
func (r *run) toSwitch() bool {
	threshold, rising, hold := r.make, false, r.minOff
	if r.command {
		threshold, rising, hold = r.brk, true, r.minOn
	}
	ready := r.since + hold
	for r.now < ready {
		r.step(ready)
	}
	r.held = hold > 0
	for first := true; ; first = false {
		until, change := r.now+r.ages(), false
		if len(r.changes) > 0 {
			until, change = r.changes[0], true
		}
		course := newCourse(&r.chain, r.state, r.drive(r.felt, r.command), threshold)
		t, found := course.first(rising, until-r.now, r.tolerance)
		if found {
			r.held = r.held && first && t == 0
			r.step(r.now + t)
			r.toggle()
			return true
		}
		if !change {
			return false
		}
		r.step(until)
	}
}
