package thermal

import "math"

// rungeKutta is an independent integration in fixed steps (classical fourth
// order), with the step cut at delayed switchings and at thresholds, in this
// test only. It runs many cycles and returns the last.
type rungeKutta struct {
	l                  Loop
	step               float64
	medium, a, b, warm float64
	now                float64
	command            bool
	felt               bool
	changes            []float64
	high, low          float64
	sensedHigh         float64
	sensedLow          float64
	record             func(now, medium float64, on bool)
}

func (k *rungeKutta) slopes(x [4]float64) [4]float64 {
	p, s := k.l.Process, k.l.Sensing
	to := p.Off
	if k.felt {
		to = p.On
	}
	d := [4]float64{(to - x[0]) / p.Tau}
	if s.Lag > 0 {
		d[1] = (x[0] - x[1]) / s.Lag
	}
	if s.Filter > 0 {
		source := x[0]
		if s.Lag > 0 {
			source = x[1]
		}
		d[2] = (source - x[2]) / s.Filter
	}
	if s.Anticipator.Rise > 0 {
		warm := k.command != p.Cooling() // heats the element while heating, or while not cooling
		target := 0.0
		if warm {
			target = s.Anticipator.Rise
		}
		d[3] = (target - x[3]) / s.Anticipator.Lag
	}
	return d
}

func (k *rungeKutta) moved(h float64) [4]float64 {
	x := [4]float64{k.medium, k.a, k.b, k.warm}
	add := func(d [4]float64, f float64) [4]float64 {
		var y [4]float64
		for i := range y {
			y[i] = x[i] + f*d[i]
		}
		return y
	}
	d1 := k.slopes(x)
	d2 := k.slopes(add(d1, h/2))
	d3 := k.slopes(add(d2, h/2))
	d4 := k.slopes(add(d3, h))
	for i := range x {
		x[i] += h / 6 * (d1[i] + 2*d2[i] + 2*d3[i] + d4[i])
	}
	return x
}

func (k *rungeKutta) sensed(x [4]float64) float64 {
	switch s := k.l.Sensing; {
	case s.Filter > 0:
		return x[2] + x[3]
	case s.Lag > 0:
		return x[1] + x[3]
	}
	return x[0] + x[3]
}

// past reports whether the sensed temperature calls for the other command.
func (k *rungeKutta) past(x [4]float64) bool {
	s, v := k.l.Switching, k.sensed(x)
	if k.command == k.l.Process.Cooling() { // waits for the lower edge
		if k.command {
			return v <= s.Break
		}
		return v <= s.Make
	}
	if k.command {
		return v >= s.Break
	}
	return v >= s.Make
}

func (k *rungeKutta) take(x [4]float64, h float64) {
	k.medium, k.a, k.b, k.warm = x[0], x[1], x[2], x[3]
	k.now += h
	if k.record != nil {
		k.record(k.now, x[0], k.command)
	}
	k.high, k.low = math.Max(k.high, x[0]), math.Min(k.low, x[0])
	k.sensedHigh, k.sensedLow = math.Max(k.sensedHigh, k.sensed(x)), math.Min(k.sensedLow, k.sensed(x))
}

// phase runs to the next change of the command and returns how long it took.
func (k *rungeKutta) phase() float64 {
	began := k.now
	k.command = !k.command
	k.changes = append(k.changes, k.now+k.l.Process.Dead)
	hold := k.l.Switching.MinOff
	if k.command {
		hold = k.l.Switching.MinOn
	}
	for {
		for len(k.changes) > 0 && k.changes[0] <= k.now {
			k.felt = !k.felt
			k.changes = k.changes[1:]
		}
		h := k.step
		if len(k.changes) > 0 {
			h = math.Min(h, k.changes[0]-k.now)
		}
		held := k.now < began+hold
		if held {
			h = math.Min(h, began+hold-k.now)
		}
		if !held && k.past([4]float64{k.medium, k.a, k.b, k.warm}) && k.now > began {
			return k.now - began
		}
		x := k.moved(h)
		if !held && k.past(x) {
			low, high := 0.0, h
			for range 60 {
				middle := (low + high) / 2
				if k.past(k.moved(middle)) {
					high = middle
				} else {
					low = middle
				}
			}
			k.take(k.moved(high), high)
			return k.now - began
		}
		k.take(x, h)
		if len(k.changes) > 0 && math.Abs(k.changes[0]-k.now) < 1e-9 {
			k.now = k.changes[0]
		}
	}
}

func integrated(l Loop, step float64, cycles int) Figures {
	k := rungeKutta{l: l, step: step, medium: l.Switching.Make, a: l.Switching.Make, b: l.Switching.Make}
	var f Figures
	for range cycles {
		k.high, k.low, k.sensedHigh, k.sensedLow = math.Inf(-1), math.Inf(1), math.Inf(-1), math.Inf(1)
		f.On = k.phase()
		f.Off = k.phase()
	}
	f.High, f.Low, f.SensedHigh, f.SensedLow = k.high, k.low, k.sensedHigh, k.sensedLow
	return f
}
