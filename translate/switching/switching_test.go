package switching

import (
	"math"
	"testing"
)

func near(t *testing.T, what string, r Result, want, within float64) {
	t.Helper()
	if !r.Determined || math.Abs(r.Value-want) > within {
		t.Errorf("%s: %+v, want %.6g", what, r, want)
	}
}

// ISO 13849-1 Annex C, worked example (inputs and printed figures from memory):
// B10d 60e6, 220 days of 16 hours, a cycle of 5 s: 2.53e6 operations a year,
// T10d 23.7 years, MTTFd 237 years.
func TestAnnexC(t *testing.T) {
	n := OperationsPerYear(5, 220.0*16/(365*24))
	near(t, "operations a year", n, 2.53e6, 0.005e6)
	mttfd, t10d := MTTFd(60e6, n)
	near(t, "T10d", t10d, 23.7, 0.05)
	near(t, "MTTFd", mttfd, 237, 0.5)
}

func TestEnduranceIsNotB10d(t *testing.T) {
	if mttfd, t10d := MTTFd(0, OperationsPerYear(60, 1)); mttfd.Determined || t10d.Determined {
		t.Errorf("%+v %+v", mttfd, t10d)
	}
}

// Exponents of RL-TR-92-197: half the current gives 2^1.14 = 2.204 times the
// operations on AC and 2^1.3 = 2.462 times on DC.
func TestLife(t *testing.T) {
	near(t, "AC", Life(1e5, 10, 5, 0, AC), 2.2038e5, 10)
	near(t, "DC", Life(1e5, 10, 5, 0, DC), 2.4623e5, 10)
	near(t, "mechanical", Life(1e5, 10, 0.01, 0, AC), 1e6, 1e-6)
	near(t, "stated mechanical life", Life(1e5, 10, 0.01, 3e5, AC), 3e5, 1e-6)
	near(t, "not stated which", Life(1e5, 10, 5, 0, "unknown"), 1e5, 1e-6)
	if r := Life(1e5, 10, 12, 0, AC); r.Determined {
		t.Errorf("above its rating: %+v", r)
	}
	if r := Life(0, 10, 5, 0, AC); r.Determined {
		t.Errorf("without an endurance: %+v", r)
	}
}

// MIL 39016/13: 1e5 operations at 1 A and 28 V DC, 1e6 at 10 to 50 mA. The
// estimate must not promise more than the mechanical life in that range.
func TestLifeAgainstMIL39016(t *testing.T) {
	for _, a := range []float64{0.01, 0.05} {
		near(t, "low current", Life(1e5, 1, a, 0, DC), 1e6, 1e-6)
	}
}

func TestHeat(t *testing.T) {
	h := Heat(1.2, 5)
	near(t, "heat", h, 6, 1e-12)
	near(t, "hottest", Hottest(h, 8, 45), 93, 1e-12)
	if r := Hottest(h, 0, 45); r.Determined {
		t.Errorf("%+v", r)
	}
}
