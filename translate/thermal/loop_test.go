package thermal

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"
)

// Source: testdata/reference.json, relay_cycles.
func TestLoopMeetsTheSixCases(t *testing.T) {
	cases := readReference(t).Cycles.Cases
	if len(cases) != 6 {
		t.Fatalf("%d cases", len(cases))
	}
	for _, c := range cases {
		f := steady(t, Loop{Process{c.SettleOn, c.SettleOff, c.Tau, c.Dead}, Sensing{}, Switching{Make: c.Make, Break: c.Break}})
		e := c.Expected
		agrees(t, c.Name+" on", f.On, e.On, 1e-6)
		agrees(t, c.Name+" off", f.Off, e.Off, 1e-6)
		agrees(t, c.Name+" period", f.Period(), e.Period, 1e-6)
		isNear(t, c.Name+" duty", f.Duty(), e.Duty, 1e-6)
		agrees(t, c.Name+" high", f.High, e.Peak, 1e-6)
		agrees(t, c.Name+" low", f.Low, e.Valley, 1e-6)
		isNear(t, c.Name+" mean", f.Mean, e.Mean, 1e-6)
		agrees(t, c.Name+" swing", f.Swing(), e.Swing, 1e-6)
		if !f.ClosedForm {
			t.Errorf("%s: not by the closed form", c.Name)
		}
	}
}

// The closed form is a special case of the general solution.
func TestGeneralSolutionMeetsTheClosedForm(t *testing.T) {
	for _, c := range readReference(t).Cycles.Cases {
		r := newRelay(Loop{Process{c.SettleOn, c.SettleOff, c.Tau, c.Dead}, Sensing{}, Switching{Make: c.Make, Break: c.Break}})
		p, no := r.periodic()
		if no != nil {
			t.Fatal(no)
		}
		f := p.figures()
		agrees(t, c.Name+" on", f.On, c.Expected.On, 1e-6)
		agrees(t, c.Name+" off", f.Off, c.Expected.Off, 1e-6)
		agrees(t, c.Name+" high", f.High, c.Expected.Peak, 1e-6)
		agrees(t, c.Name+" low", f.Low, c.Expected.Valley, 1e-6)
	}
}

// Source: the worked example of the heated vessel, figures worked out
// independently of this program.
func TestLoopMeetsTheVessel(t *testing.T) {
	f := steady(t, tank(0))
	isNear(t, "on", f.On, 967.947, 5e-4)
	isNear(t, "off", f.Off, 2058.140, 5e-4)
	isNear(t, "high", f.High, 60.2536, 5e-5)
	isNear(t, "low", f.Low, 53.8859, 5e-5)
	isNear(t, "operations a year", f.OperationsPerYear, 10400, 50)
	f = steady(t, tank(45))
	isNear(t, "on with lag", f.On, 1031.77, 5e-3)
	isNear(t, "off with lag", f.Off, 2187.86, 5.1e-3)
	isNear(t, "high with lag", f.High, 60.5384, 5e-5)
	isNear(t, "low with lag", f.Low, 53.7577, 5e-5)
}

// Source: Wang, Hang and Zou 1997, expressions from memory; the numbers in
// testdata/reference.json, relay_published_form.
func TestLoopMeetsThePublishedForm(t *testing.T) {
	c := readReference(t).Published.Check
	f := steady(t, Loop{Process{(c.Mu0 + c.Mu) * c.K, (c.Mu0 - c.Mu) * c.K, c.T, c.L}, Sensing{}, Switching{Make: -c.Eps, Break: c.Eps}})
	agrees(t, "Tu1", f.On, c.Tu1, 1e-6)
	agrees(t, "Tu2", f.Off, c.Tu2, 1e-6)
	agrees(t, "Au", f.High, c.Au, 1e-6)
	agrees(t, "Ad", f.Low, c.Ad, 1e-6)
}

// Source: J. Berner, PhD thesis, Lund 2017: on-time of an asymmetric relay,
// t_on = T ln[(δ/k − d2 + e^(L/T)(d1+d2))/(d1 − δ/k)], hysteresis ±δ, levels d1
// above and d2 below, gain k.
func TestLoopMeetsTheAsymmetricRelay(t *testing.T) {
	const k, T, L, d1, d2, delta = 2.0, 30.0, 7.0, 1.5, 0.5, 0.1
	f := steady(t, Loop{Process{k * d1, -k * d2, T, L}, Sensing{}, Switching{Make: -delta, Break: delta}})
	agrees(t, "on", f.On, T*math.Log((delta/k-d2+math.Exp(L/T)*(d1+d2))/(d1-delta/k)), 1e-12)
}

// Source: testdata/reference.json, cycle_rate_parabola.
func TestCycleRateParabola(t *testing.T) {
	e := readReference(t).Parabola.Example
	for x, n := range map[float64]float64{0.1: e.XN["0.1"], 0.5: e.XN["0.5"], 0.9: e.XN["0.9"]} {
		middle := e.Tlo + x*(e.Thi-e.Tlo)
		l := Loop{Process{e.Thi, e.Tlo, e.Tau, 0}, Sensing{}, Switching{Make: middle - e.D/2, Break: middle + e.D/2}}
		f := steady(t, l)
		agrees(t, "cycles an hour", 3600/f.Period(), n, 1e-5)
		isNear(t, "against the parabola", 3600/f.Period(), 4*e.Nmax*x*(1-x), 0.01)
		busiest, err := l.Busiest()
		if err != nil {
			t.Fatal(err)
		}
		isNear(t, "busiest demand", busiest.Demand, 0.5, 1e-3)
		agrees(t, "busiest rate", busiest.Operations/(365*24), e.Nmax, 1e-4)
	}
}

// The other implementation in this package, by bisection and plain iteration of
// the return map, is independent of Loop's.
func TestLoopAgainstPlainIteration(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		draw := func(what string, low, high float64) float64 { return rapid.Float64Range(low, high).Draw(rt, what) }
		off := draw("off", -20, 40)
		on := off + draw("gain", 20, 400)
		middle := off + draw("demand", 0.1, 0.9)*(on-off)
		half := draw("half differential", 0.001, 0.04) * (on - off)
		p := Process{on, off, draw("tau", 20, 20000), draw("dead", 0, 300)}
		lag := draw("lag", 0.1, 300)
		want, err := plainSteady(p, plainSwitch{OnAt: middle - half, OffAt: middle + half, Lag: lag})
		if err != nil {
			rt.Skip(err)
		}
		got, err := Loop{p, Sensing{Lag: lag}, Switching{Make: middle - half, Break: middle + half}}.Steady()
		if err != nil {
			rt.Fatal(err)
		}
		for _, v := range [][2]float64{{got.On, want.On}, {got.Off, want.Off}} {
			if math.Abs(v[0]-v[1]) > 1e-7*v[1] {
				rt.Fatalf("%+v against %+v", got, want)
			}
		}
		if math.Abs(got.High-want.High) > 1e-7*(on-off) || math.Abs(got.Low-want.Low) > 1e-7*(on-off) {
			rt.Fatalf("%+v against %+v", got, want)
		}
	})
}

func TestLoopAgainstFixedSteps(t *testing.T) {
	for name, c := range map[string]struct {
		loop         Loop
		step         float64
		cycles       int
		time, kelvin float64
	}{
		"lag":                     {tank(45), 2, 12, 1e-4, 1e-4},
		"lag and filter":          {Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 8, Filter: 60}, Switching{Make: 54, Break: 60}}, 0.5, 12, 1e-4, 1e-4},
		"equal lags":              {Loop{Process{320, 22, 900, 20}, Sensing{Lag: 30, Filter: 30}, Switching{Make: 172, Break: 188}}, 0.5, 20, 1e-4, 1e-3},
		"lag as slow as process":  {Loop{Process{100, 0, 100, 5}, Sensing{Lag: 100}, Switching{Make: 48, Break: 52}}, 0.25, 60, 1e-4, 1e-3},
		"anticipator":             {Loop{Process{35, 10, 18000, 300}, Sensing{Lag: 90, Anticipator: Anticipator{1.5, 180}}, Switching{Make: 20.5, Break: 21.5}}, 1, 400, 1e-4, 1e-4},
		"cooling":                 {Loop{Process{-30, 25, 3600, 30}, Sensing{Lag: 30}, Switching{Make: -16, Break: -20}}, 0.5, 20, 1e-4, 1e-4},
		"cooling, anticipator":    {Loop{Process{5, 35, 7200, 120}, Sensing{Lag: 60, Anticipator: Anticipator{1, 200}}, Switching{Make: 24.5, Break: 23.5}}, 1, 400, 1e-4, 1e-4},
		"minimum on":              {Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 45}, Switching{Make: 54, Break: 60, MinOn: 1200}}, 2, 12, 1e-4, 1e-4},
		"minimum off":             {Loop{Process{140, 18, 12600, 40}, Sensing{Lag: 45}, Switching{Make: 54, Break: 60, MinOff: 2700}}, 2, 12, 1e-4, 1e-4},
		"minimum off without lag": {Loop{Process{140, 18, 12600, 40}, Sensing{}, Switching{Make: 54, Break: 60, MinOff: 2700}}, 2, 12, 1e-4, 1e-4},
		"equal edges":             {Loop{Process{100, 0, 100, 10}, Sensing{Lag: 20}, Switching{Make: 50, Break: 50}}, 0.1, 30, 1e-4, 1e-3},
		"equal edges, minimum on": {Loop{Process{100, 0, 1000, 0}, Sensing{Lag: 20}, Switching{Make: 50, Break: 50, MinOn: 60}}, 0.2, 60, 1e-4, 1e-3},
	} {
		got, want := steady(t, c.loop), integrated(c.loop, c.step, c.cycles)
		agrees(t, name+": on", got.On, want.On, c.time)
		agrees(t, name+": off", got.Off, want.Off, c.time)
		isNear(t, name+": high", got.High, want.High, c.kelvin)
		isNear(t, name+": low", got.Low, want.Low, c.kelvin)
		isNear(t, name+": sensed high", got.SensedHigh, want.SensedHigh, 20*c.kelvin)
		isNear(t, name+": sensed low", got.SensedLow, want.SensedLow, 20*c.kelvin)
	}
}

// Several switchings on their way within one dead time: a quick anticipator in
// a room with a long dead time. Its mean is a proportional control of a band of
// about the rise; where that is stable there is one cycle, otherwise none.
func TestManySwitchingsInFlight(t *testing.T) {
	l := Loop{Process{35, 10, 18000, 900}, Sensing{Lag: 30, Anticipator: Anticipator{3, 150}}, Switching{Make: 20.5, Break: 21}}
	f := steady(t, l)
	if f.InFlight < 4 {
		t.Errorf("%d in flight", f.InFlight)
	}
	want := integrated(l, 0.5, 2500)
	agrees(t, "on", f.On, want.On, 1e-4)
	agrees(t, "off", f.Off, want.Off, 1e-4)
	isNear(t, "high", f.High, want.High, 1e-4)
	isNear(t, "low", f.Low, want.Low, 1e-4)

	l.Process.Tau = 3600
	_, err := l.Steady()
	var no *NoCycle
	if !errors.As(err, &no) || no.Reason != TooManyWaves {
		t.Errorf("%v", err)
	}
	a, b := integrated(l, 0.5, 1500), integrated(l, 0.5, 1507)
	if math.Abs(a.On-b.On) < 1 {
		t.Errorf("fixed steps say that it does repeat: %+v, %+v", a, b)
	}
}

// A minimum time that is held in every second cycle only: the fixed steps show
// the same two cycles in turn.
func TestCyclesInTurn(t *testing.T) {
	l := Loop{Process{21, 1, 399.875, 1}, Sensing{Lag: 200}, Switching{Make: 15.921875, Break: 16.078125, MinOn: 300}}
	_, err := l.Steady()
	var no *NoCycle
	if !errors.As(err, &no) || no.Reason != Alternates || len(no.Turns) != 2 {
		t.Fatalf("%v", err)
	}
	a, b := integrated(l, 0.2, 40), integrated(l, 0.2, 41)
	if math.Abs(no.Turns[0].On-a.On) > 1 {
		a, b = b, a
	}
	agrees(t, "on", no.Turns[0].On, a.On, 1e-6)
	agrees(t, "off", no.Turns[0].Off, a.Off, 1e-6)
	agrees(t, "then on", no.Turns[1].On, b.On, 1e-6)
	agrees(t, "then off", no.Turns[1].Off, b.Off, 1e-6)
	agrees(t, "operations a year", no.OperationsPerYear, 2*365*24*3600/(a.Period()+b.Period()), 1e-6)
}

func TestNoCycleSaysWhy(t *testing.T) {
	for name, c := range map[string]struct {
		loop   Loop
		reason Reason
	}{
		"weak load":           {Loop{Process{55, 18, 100, 1}, Sensing{}, Switching{Make: 50, Break: 60}}, NeverBreaks},
		"warm surroundings":   {Loop{Process{100, 52, 100, 1}, Sensing{Lag: 3}, Switching{Make: 50, Break: 60}}, NeverMakes},
		"weak cooling":        {Loop{Process{-15, 25, 100, 1}, Sensing{}, Switching{Make: -16, Break: -20}}, NeverBreaks},
		"chatters":            {Loop{Process{100, 0, 100, 0}, Sensing{Lag: 5}, Switching{Make: 50, Break: 50}}, NoInterval},
		"anticipated chatter": {Loop{Process{100, 0, 100, 5}, Sensing{Anticipator: Anticipator{2, 60}}, Switching{Make: 50, Break: 50}}, NoInterval},
		"too many waves":      {Loop{Process{35, 10, 3600, 90000}, Sensing{Anticipator: Anticipator{3, 15}}, Switching{Make: 20.5, Break: 20.6}}, TooManyWaves},
	} {
		_, err := c.loop.Steady()
		var no *NoCycle
		if !errors.As(err, &no) || no.Reason != c.reason || no.Working == "" {
			t.Errorf("%s: %v", name, err)
		}
	}
}

// An anticipator lets a control cycle whose medium never reaches break.
func TestAnticipatorBreaksBelow(t *testing.T) {
	l := Loop{Process{20.9, 10, 3600, 30}, Sensing{Lag: 20, Anticipator: Anticipator{2, 180}}, Switching{Make: 20, Break: 21}}
	if f := steady(t, l); f.High >= 21 {
		t.Errorf("%+v", f)
	}
	l.Sensing.Anticipator.Rise = 0
	if _, err := l.Steady(); err == nil {
		t.Error("cycles without the anticipator")
	}
}

func TestBadFiguresAreNamed(t *testing.T) {
	good := tank(45)
	for figure, spoil := range map[string]func(*Loop){
		"settles_on":       func(l *Loop) { l.Process.On = l.Process.Off },
		"settles_off":      func(l *Loop) { l.Process.Off = math.NaN() },
		"time_constant":    func(l *Loop) { l.Process.Tau = 0 },
		"dead_time":        func(l *Loop) { l.Process.Dead = -1 },
		"sensing lag":      func(l *Loop) { l.Sensing.Lag = math.Inf(1) },
		"software lag":     func(l *Loop) { l.Sensing.Filter = -1 },
		"anticipator rise": func(l *Loop) { l.Sensing.Anticipator.Rise = -1 },
		"anticipator lag":  func(l *Loop) { l.Sensing.Anticipator.Rise = 1 },
		"make":             func(l *Loop) { l.Switching.Make = 61 },
		"min_on":           func(l *Loop) { l.Switching.MinOn = -1 },
		"min_off":          func(l *Loop) { l.Switching.MinOff = math.NaN() },
	} {
		l := good
		spoil(&l)
		_, err := l.Steady()
		var input *InputError
		if !errors.As(err, &input) || input.Figure != figure {
			t.Errorf("%s: %v", figure, err)
		}
	}
}

// Whatever the loop, the medium swings at least as far as a lagging element,
// the mean lies between the settling temperatures, and the return map brings
// the state back.
func TestLoopProperties(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		draw := func(what string, low, high float64) float64 { return rapid.Float64Range(low, high).Draw(rt, what) }
		off := draw("off", -20, 40)
		on := off + draw("gain", 20, 400)
		middle := off + draw("demand", 0.15, 0.85)*(on-off)
		half := draw("half differential", 0.002, 0.04) * (on - off)
		l := Loop{
			Process{on, off, draw("tau", 60, 20000), draw("dead", 0, 200)},
			Sensing{Lag: draw("lag", 0, 200), Filter: rapid.SampledFrom([]float64{0, 30, 90}).Draw(rt, "filter")},
			Switching{
				Make: middle - half, Break: middle + half,
				MinOn: rapid.SampledFrom([]float64{0, 0, 60, 300}).Draw(rt, "min on"), MinOff: rapid.SampledFrom([]float64{0, 0, 60, 300}).Draw(rt, "min off"),
			},
		}
		f, err := l.Steady()
		var no *NoCycle
		if errors.As(err, &no) && (no.Reason == Alternates || no.Reason == DoesNotSettle) && l.Switching.MinOn+l.Switching.MinOff > 0 && no.OperationsPerYear > 0 {
			rt.Skip(err)
		}
		if err != nil {
			rt.Fatalf("%+v: %v", l, err)
		}
		if f.On < l.Switching.MinOn*(1-1e-9) || f.Off < l.Switching.MinOff*(1-1e-9) {
			rt.Fatalf("minimum times: %+v", f)
		}
		if f.SensedHigh > f.High+1e-6 || f.SensedLow < f.Low-1e-6 || f.Mean < off || f.Mean > on {
			rt.Fatalf("%+v", f)
		}
		// the return map, by the event-by-event run
		r := newRelay(l)
		p, none := r.periodic()
		if none != nil {
			rt.Fatal(none)
		}
		s := p.start
		s.changes = append([]float64(nil), p.start.changes...)
		s.toggle()
		if !s.toSwitch() || math.Abs(s.now-p.onTime) > 1e-7*p.onTime {
			rt.Fatalf("on for %g, not %g", s.now, p.onTime)
		}
		if !s.toSwitch() || math.Abs(s.now-p.onTime-p.offTime) > 1e-7*(p.onTime+p.offTime) {
			rt.Fatalf("period %g, not %g", s.now, p.onTime+p.offTime)
		}
		if math.Abs(s.state.stage[0]-p.start.state.stage[0]) > 1e-7*(on-off) {
			rt.Fatalf("the medium comes back to %g, not %g", s.state.stage[0], p.start.state.stage[0])
		}
	})
}

func TestTrace(t *testing.T) {
	l := tank(45)
	f := steady(t, l)
	samples, err := l.Trace(50)
	if err != nil {
		t.Fatal(err)
	}
	high, low, turns := math.Inf(-1), math.Inf(1), 0
	for i, s := range samples {
		high, low = math.Max(high, s.Medium), math.Min(low, s.Medium)
		if i > 0 && s.Time <= samples[i-1].Time {
			t.Errorf("time %g after %g", s.Time, samples[i-1].Time)
		}
		if i > 0 && s.On != samples[i-1].On {
			turns++
		}
	}
	last := samples[len(samples)-1]
	isNear(t, "high", high, f.High, 1e-9)
	isNear(t, "low", low, f.Low, 1e-9)
	isNear(t, "end", last.Time, f.Period(), 1e-6)
	isNear(t, "comes back", last.Medium, samples[0].Medium, 1e-8)
	if turns != 2 || !samples[0].On {
		t.Errorf("%d turns, first %v", turns, samples[0])
	}
	if _, err := l.Trace(1); err == nil {
		t.Error("one sample is no trace")
	}
}

// Divided differences against their limits and against high-order sums.
func TestChainWithNearlyEqualLags(t *testing.T) {
	for _, lag := range []float64{100, 100 * (1 + 1e-12), 100 * (1 + 1e-6), 100.5, 130} {
		c := newChain(Process{1, 0, 100, 0}, Sensing{Lag: lag, Filter: 100})
		got := c.advance(temperatures{}, drive{medium: 1}, 150)
		// independent: many small exact first-order steps, Richardson-free
		x := [3]float64{}
		const n = 300000
		h := 150.0 / n
		for range n {
			d := [3]float64{(1 - x[0]) / 100, (x[0] - x[1]) / lag, (x[1] - x[2]) / 100}
			m := [3]float64{x[0] + h/2*d[0], x[1] + h/2*d[1], x[2] + h/2*d[2]}
			x = [3]float64{x[0] + h*(1-m[0])/100, x[1] + h*(m[0]-m[1])/lag, x[2] + h*(m[1]-m[2])/100}
		}
		for i := range x {
			isNear(t, "stage", got.stage[i], x[i], 1e-9)
		}
	}
}
