package thermal

import (
	"math"
	"testing"
	"time"
)

// BenchmarkExactCycle is one steady cycle: cycles/s is what it comes to.
func BenchmarkExactCycle(b *testing.B) {
	for name, l := range map[string]Loop{
		"closed form":    tank(0),
		"lag":            tank(45),
		"lag and filter": {Process{140, 18, 12600, 40}, Sensing{Lag: 8, Filter: 60}, Switching{Make: 54, Break: 60}},
		"minimum off":    {Process{140, 18, 12600, 40}, Sensing{Lag: 45}, Switching{Make: 54, Break: 60, MinOff: 2700}},
		"anticipator":    {Process{35, 10, 18000, 300}, Sensing{Lag: 90, Anticipator: Anticipator{1.5, 180}}, Switching{Make: 20.5, Break: 21.5}},
	} {
		b.Run(name, func(b *testing.B) {
			for b.Loop() {
				if _, err := l.Steady(); err != nil {
					b.Fatal(err)
				}
			}
			b.ReportMetric(float64(b.N)/b.Elapsed().Seconds(), "cycles/s")
		})
	}
}

// BenchmarkMatchedControl is what one control of a sheet costs: old cycle, the
// three ways to match, overshoot, time to danger and the busiest year.
func BenchmarkMatchedControl(b *testing.B) {
	l := tank(45)
	for b.Loop() {
		for _, keep := range []Keep{KeepThresholds, KeepSwing, KeepCycleRate} {
			if _, err := Match(MatchRequest{Old: l, Keep: keep, NewLag: 8, MostOperations: 20000, MinDifferential: 0.4}); err != nil {
				b.Fatal(err)
			}
		}
		if _, err := (Cut{Process: l.Process, Sensing: l.Sensing, Trip: 85, From: 18, Vented: true}).Overshoot(); err != nil {
			b.Fatal(err)
		}
		if _, err := l.Process.TimeToDanger(60, 95, true, true); err != nil {
			b.Fatal(err)
		}
		if _, err := l.Busiest(); err != nil {
			b.Fatal(err)
		}
	}
}

func BenchmarkIdentifyLog(b *testing.B) {
	rows := synthetic(tank(45), 10, 0.1, 0.05, 10, 1)
	for b.Loop() {
		if _, err := Identify(rows, Known{SettlesOff: Given(18)}); err != nil {
			b.Fatal(err)
		}
	}
	b.ReportMetric(float64(len(rows)), "rows")
}

func BenchmarkTuneSideBySide(b *testing.B) {
	g := Process{140, 18, 12600, 40}.Transfer(Sensing{Lag: 8})
	for b.Loop() {
		if _, err := g.Tune(0); err != nil {
			b.Fatal(err)
		}
	}
}

// BenchmarkAgainstGeneralIntegrator sets the exact cycle against the adaptive
// integrator of this test, in one run on one machine. The exact cycle's error
// is that of double precision; the integrator is given the loosest tolerance
// at which its own error is no more than 1e-11 of the on time, which favours
// it. "ratio" is how many exact cycles fit into one of the other.
func BenchmarkAgainstGeneralIntegrator(b *testing.B) {
	for name, l := range map[string]Loop{"closed form": tank(0), "lag": tank(45)} {
		b.Run(name, func(b *testing.B) {
			want, err := l.Steady()
			if err != nil {
				b.Fatal(err)
			}
			const equal = 1e-11
			tolerance, off := 1e-6, math.Inf(1)
			for ; tolerance > 1e-15; tolerance /= 2 {
				got, _ := generalCycle(l, tolerance)
				if off = math.Abs(got.On/want.On - 1); off <= equal {
					break
				}
			}
			if off > equal {
				b.Fatalf("the integrator does not get within %g, only %g", equal, off)
			}
			var evaluations int
			began := time.Now()
			const repeats = 20
			for range repeats {
				_, evaluations = generalCycle(l, tolerance)
			}
			general := time.Since(began).Seconds() / repeats
			for b.Loop() {
				if _, err := l.Steady(); err != nil {
					b.Fatal(err)
				}
			}
			exact := b.Elapsed().Seconds() / float64(b.N)
			b.ReportMetric(general/exact, "ratio")
			b.ReportMetric(general*1e9, "ns/integrated-cycle")
			b.ReportMetric(float64(evaluations), "slopes/integrated-cycle")
			b.ReportMetric(tolerance, "tolerance")
		})
	}
}
