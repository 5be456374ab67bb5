package thermal

import (
	"math"
	"slices"
)

// Sample is one moment of a cycle.
type Sample struct {
	Time   float64 // s after make
	Medium float64 // degC
	Sensed float64 // degC, what the contact acts on
	On     bool    // the command; at make and break, the one that follows
}

// Trace follows one cycle from make to the next make: about n exact samples at
// even distance, and those at every switching and every extreme of medium and
// sensed temperature besides. Errors are those of Cycle.
func (l Loop) Trace(n int) ([]Sample, error) {
	if err := l.Validate(); err != nil {
		return nil, err
	}
	if n < 2 {
		return nil, &InputError{"number of samples", float64(n), "at least 2 are needed"}
	}
	r := newRelay(l)
	if no := r.impossible(); no != nil {
		return nil, no
	}
	p, no := r.periodic()
	if no != nil {
		return nil, no
	}
	return p.trace(n), nil
}

func (p *periodic) trace(n int) []Sample {
	period := p.onTime + p.offTime
	var out []Sample
	p.through(func(s *run, until float64) {
		d := s.drive(s.felt, s.command)
		times := []float64{s.now}
		course := newCourse(&s.chain, s.state, d, 0)
		for _, t := range course.zeros(1, until-s.now, nil) {
			times = append(times, s.now+t)
		}
		for i := math.Ceil(s.now / period * float64(n)); ; i++ {
			t := i * period / float64(n)
			if t >= until {
				break
			}
			times = append(times, t)
		}
		if until >= period*(1-1e-12) {
			times = append(times, until)
		}
		slices.Sort(times)
		for _, t := range slices.Compact(times) {
			x := s.chain.advance(s.state, d, t-s.now)
			out = append(out, Sample{Time: t, Medium: p.real(x.stage[0]), Sensed: p.sensedReal(s.chain.sensed(x)), On: s.command && t < p.onTime})
		}
	})
	out[len(out)-1].On = true // the next make
	return out
}
