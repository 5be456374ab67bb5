package thermal

import (
	"math"
)

// Response is how a closed loop answers.
type Response struct {
	Overshoot float64 // share of a step of the set point that the reading goes beyond it
	Settling  float64 // s until the reading stays within 5 % of the step; +Inf where it does not within the time looked at
	Disturbed float64 // K, furthest off after the load's output is off by a tenth of its range
}

const (
	stepsPerScale = 40    // control steps in the shortest time that matters
	mostSteps     = 40000 // of one simulation
	settledWithin = 0.05
)

// Response simulates a step of the set point, and one of the load, on the
// process and its lags. The control runs in steps of a fortieth of the
// shortest time that matters (stretched where the slowest would need more than
// 40 000 of them), with derivative on the measurement and without limits of
// the output; between the steps the process is carried on exactly. Dead times
// are rounded to whole steps. It is meant for comparing settings, not for
// times to a second; zeros are refused.
func (t Transfer) Response(s Settings) (Response, error) {
	if err := t.Validate(); err != nil {
		return Response{}, err
	}
	if len(t.Zeros) > 0 || t.Integrators+len(t.Lags) > stages || t.Integrators > 1 || t.Integrators+len(t.Lags) == 0 {
		return Response{}, &InputError{"number of lags", float64(len(t.Lags)), "one to three lags, one of them perhaps an integrator, and no zeros are simulated"}
	}
	if !(s.Kc > 0) {
		return Response{}, &InputError{"control gain", s.Kc, "it must be above 0"}
	}
	p := newPlant(t, s)
	step := p.simulate(1, 0)
	load := p.simulate(0, 0.1)
	r := Response{Settling: 0}
	for i, y := range step {
		r.Overshoot = math.Max(r.Overshoot, y-1)
		if math.Abs(y-1) > settledWithin {
			r.Settling = float64(i+1) * p.h
		}
	}
	if len(step) == 0 || math.Abs(step[len(step)-1]-1) > settledWithin {
		r.Settling = math.Inf(1)
	}
	for _, y := range load {
		r.Disturbed = math.Max(r.Disturbed, math.Abs(y))
	}
	return r, nil
}

// plant is a process made ready for stepping.
type plant struct {
	gain       float64
	integrates bool
	h          float64 // s
	late       int     // dead time in steps
	steps      int
	lags       chain
	move       transition
	settings   Settings
}

func newPlant(t Transfer, s Settings) plant {
	shortest, longest := math.Inf(1), 0.0
	for _, v := range append([]float64{t.Dead, s.Ti, s.Td}, t.Lags...) {
		if v > 0 {
			shortest, longest = math.Min(shortest, v), math.Max(longest, v)
		}
	}
	horizon := 15 * (t.Dead + s.Ti)
	gain := s.Parallel().Kc * math.Abs(t.Gain)
	if t.Integrators == 1 {
		horizon += 10 / gain
	} else {
		horizon += 10 * s.Ti / gain
	}
	for _, l := range t.Lags {
		horizon += 10 * l / (1 + gain)
	}
	p := plant{gain: math.Abs(t.Gain), integrates: t.Integrators == 1, settings: s.Parallel()}
	p.h = math.Max(shortest/stepsPerScale, horizon/mostSteps)
	p.steps = int(horizon / p.h)
	p.late = int(math.Round(t.Dead / p.h))
	p.lags.n = len(t.Lags)
	for i, l := range t.Lags {
		p.lags.rate[i] = 1 / l
	}
	p.move = p.lags.over(p.h)
	return p
}

// simulate returns the reading after each step, with the set point at r and
// the load's output off by d.
func (p *plant) simulate(r, d float64) []float64 {
	out := make([]float64, 0, p.steps)
	queue := make([]float64, p.late+1)
	var x temperatures
	var level, sum, last float64 // of the integrator; of the control's integral; last reading
	for i := range p.steps {
		y := level
		if p.lags.n > 0 {
			y = x.stage[p.lags.n-1]
		}
		e := r - y
		c := p.settings
		u := c.Kc * (e - c.Td*(y-last)/p.h)
		if c.Ti > 0 {
			sum += c.Kc * e * p.h / c.Ti
			u += sum
		}
		last = y
		queue[i%len(queue)] = u + d
		felt := queue[(i+1)%len(queue)]
		if i < p.late {
			felt = 0
		}
		if p.integrates {
			level += p.gain * felt * p.h // the lags behind it then see its middle
			x = p.move.after(x, drive{medium: level - p.gain*felt*p.h/2})
		} else {
			x = p.move.after(x, drive{medium: p.gain * felt})
		}
		out = append(out, y)
		if math.Abs(y) > 1e6 {
			break
		}
	}
	return out
}
