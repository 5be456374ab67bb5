package thermal

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"
)

func near(t *testing.T, what string, got, want, relative float64) {
	t.Helper()
	if math.Abs(got-want) > relative*math.Max(1, math.Abs(want)) {
		t.Errorf("%s: %.10g, want %.10g", what, got, want)
	}
}

// Six cases worked out independently (closed form against an event-driven
// simulation that is not this one).
func TestSixCases(t *testing.T) {
	for _, c := range []struct {
		name                            string
		on, off, onAt, offAt, tau, dead float64
		tOn, tOff, peak, valley, duty   float64
	}{
		{"room", 35, 10, 20.5, 21.5, 3600, 120, 461.717817, 583.446465, 21.942583, 20.155769, 0.441766},
		{"tank", 120, 20, 58, 62, 5400, 60, 456.580791, 682.226866, 62.640877, 57.580115, 0.400929},
		{"oven", 320, 22, 172, 188, 900, 20, 142.796020, 126.809603, 190.900981, 168.703431, 0.529648},
		{"no differential", 100, 0, 50, 50, 100, 10, 19.090283, 19.090283, 54.758129, 45.241871, 0.5},
		{"high load", 100, 0, 78, 82, 100, 10, 59.139409, 17.068458, 83.712926, 70.577319, 0.776028},
		{"dead time as long as the time constant", 1, -1, -0.1, 0.1, 1, 1, 1.617530, 1.617530, 0.668909, -0.668909, 0.5},
	} {
		got, err := Steady(Process{c.on, c.off, c.tau, c.dead}, Switch{c.onAt, c.offAt, 0})
		if err != nil {
			t.Fatal(err)
		}
		near(t, c.name+": on", got.On, c.tOn, 1e-6)
		near(t, c.name+": off", got.Off, c.tOff, 1e-6)
		near(t, c.name+": peak", got.High, c.peak, 1e-6)
		near(t, c.name+": valley", got.Low, c.valley, 1e-6)
		near(t, c.name+": duty", got.Duty(), c.duty, 1e-6)
		near(t, c.name+": mean", got.Mean, c.off+(c.on-c.off)*c.duty, 1e-4)
	}
}

// A heated vessel without and with a sensing lag, worked out independently.
func TestVessel(t *testing.T) {
	p := Process{140, 18, 12600, 40}
	c, err := Steady(p, Switch{54, 60, 0})
	if err != nil {
		t.Fatal(err)
	}
	near(t, "on", c.On, 967.947, 1e-6)
	near(t, "off", c.Off, 2058.140, 1e-6)
	near(t, "high", c.High, 60.2536, 1e-6)
	near(t, "low", c.Low, 53.8859, 1e-6)
	c, err = Steady(p, Switch{54, 60, 45})
	if err != nil {
		t.Fatal(err)
	}
	near(t, "on with lag", c.On, 1031.77, 1e-5)
	near(t, "off with lag", c.Off, 2187.86, 1e-5)
	near(t, "high with lag", c.High, 60.5384, 1e-5)
	near(t, "low with lag", c.Low, 53.7577, 1e-5)
}

// Wang, Hang and Zou (1997), from memory: a relay of μ0 ± μ with hysteresis ±ε
// on a gain K, time constant T, dead time L.
func TestWangHangZou(t *testing.T) {
	const K, T, L, mu, mu0, eps = 2.0, 10.0, 3.0, 1.0, 0.2, 0.1
	c, err := Steady(Process{(mu0 + mu) * K, (mu0 - mu) * K, T, L}, Switch{-eps, eps, 0})
	if err != nil {
		t.Fatal(err)
	}
	e := math.Exp(L / T)
	near(t, "Tu1", c.On, T*math.Log((2*mu*K*e+mu0*K-mu*K+eps)/(mu*K+mu0*K-eps)), 1e-12)
	near(t, "Tu2", c.Off, T*math.Log((2*mu*K*e-mu*K-mu0*K+eps)/(mu*K-mu0*K-eps)), 1e-12)
	near(t, "Au", c.High, (mu0+mu)*K*(1-1/e)+eps/e, 1e-12)
	near(t, "Ad", c.Low, (mu0-mu)*K*(1-1/e)-eps/e, 1e-12)
}

// stepped is an independent integration in small steps (Euler), in this test
// only: the last of many cycles.
func stepped(p Process, s Switch, dt float64) Cycle {
	medium, element := s.OnAt, s.OnAt
	command := true
	delay := make([]bool, int(math.Round(p.Dead/dt))+1)
	for i := range delay {
		delay[i] = true
	}
	var c, last Cycle
	high, low := math.Inf(-1), math.Inf(1)
	for n, since, cycles := 0, 0, 0; cycles < 12; n++ {
		delay[n%len(delay)] = command
		applied := delay[(n+1)%len(delay)]
		to := p.Off
		if applied {
			to = p.On
		}
		medium += dt * (to - medium) / p.Tau
		if s.Lag > 0 {
			element += dt * (medium - element) / s.Lag
		} else {
			element = medium
		}
		high, low = math.Max(high, medium), math.Min(low, medium)
		since++
		switch {
		case command && element >= s.OffAt:
			c.On, command, since = float64(since)*dt, false, 0
		case !command && element <= s.OnAt:
			c.Off, command, since = float64(since)*dt, true, 0
			c.High, c.Low = high, low
			high, low = math.Inf(-1), math.Inf(1)
			last = c
			cycles++
		}
	}
	return last
}

func TestAgainstSmallSteps(t *testing.T) {
	for _, c := range []struct {
		p Process
		s Switch
	}{
		{Process{140, 18, 1200, 40}, Switch{54, 60, 45}},
		{Process{320, 22, 900, 20}, Switch{172, 188, 60}},
		{Process{60, 0, 300, 30}, Switch{29.9, 30, 20}},
	} {
		exact, err := Steady(c.p, c.s)
		if err != nil {
			t.Fatal(err)
		}
		rough := stepped(c.p, c.s, 0.01)
		near(t, "on", exact.On, rough.On, 1e-3)
		near(t, "off", exact.Off, rough.Off, 1e-3)
		near(t, "high", exact.High, rough.High, 1e-3)
		near(t, "low", exact.Low, rough.Low, 1e-3)
	}
}

func TestNoCycle(t *testing.T) {
	for name, c := range map[string]struct {
		p Process
		s Switch
	}{
		"never reaches break": {Process{55, 18, 100, 1}, Switch{50, 60, 0}},
		"never falls to make": {Process{100, 52, 100, 1}, Switch{50, 60, 0}},
		"edges turned":        {Process{100, 0, 100, 1}, Switch{60, 50, 0}},
		"chatters":            {Process{100, 0, 100, 0}, Switch{50, 50, 0}},
		"no time constant":    {Process{100, 0, math.NaN(), 0}, Switch{50, 60, 0}},
	} {
		if _, err := Steady(c.p, c.s); !errors.As(err, new(ErrNoCycle)) {
			t.Errorf("%s: %v", name, err)
		}
	}
}

// Cooling is heating upside down.
func TestCoolingMirrorsHeating(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p := Process{rapid.Float64Range(70, 300).Draw(rt, "on"), rapid.Float64Range(-20, 40).Draw(rt, "off"), rapid.Float64Range(50, 5000).Draw(rt, "tau"), rapid.Float64Range(0, 200).Draw(rt, "dead")}
		s := Switch{rapid.Float64Range(45, 54).Draw(rt, "onAt"), rapid.Float64Range(55, 65).Draw(rt, "offAt"), rapid.SampledFrom([]float64{0, 5, 60}).Draw(rt, "lag")}
		h, err := Steady(p, s)
		if err != nil {
			rt.Fatal(err)
		}
		c, err := Steady(Process{-p.On, -p.Off, p.Tau, p.Dead}, Switch{-s.OnAt, -s.OffAt, s.Lag})
		if err != nil || math.Abs(h.On-c.On) > 1e-9*h.On || math.Abs(h.High+c.Low) > 1e-9 {
			rt.Fatalf("%+v %+v %v", h, c, err)
		}
		if h.High < s.OffAt-1e-9 || h.Low > s.OnAt+1e-9 {
			rt.Fatalf("the medium swings less than the differential: %+v", h)
		}
	})
}

func BenchmarkSteadyWithLag(b *testing.B) {
	for b.Loop() {
		if _, err := Steady(Process{140, 18, 12600, 40}, Switch{54, 60, 45}); err != nil {
			b.Fatal(err)
		}
	}
}
