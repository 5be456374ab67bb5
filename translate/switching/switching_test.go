package switching

import (
	"encoding/json"
	"math"
	"os"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

func near(t *testing.T, what string, r Result, want, within float64) {
	t.Helper()
	if !r.Determined || !(math.Abs(r.Value-want) <= within) {
		t.Errorf("%s: %+v, want %.6g ± %.3g", what, r, want, within)
	}
}

// reasoned wants a result that is not determined and says once why.
func reasoned(t *testing.T, what string, r Result) {
	t.Helper()
	if r.Determined || r.Value != 0 || strings.Count(r.Working, notDetermined) != 1 || r.reason() == "" {
		t.Errorf("%s: %+v, want one reason", what, r)
	}
}

type reference struct {
	AnnexC struct {
		B10d, Days, Hours float64
		Cycle             float64 `json:"cycle_s"`
		Printed           struct {
			Operations float64 `json:"operations_per_year"`
			T10d       float64 `json:"t10d_years"`
			MTTFd      float64 `json:"mttfd_years"`
		}
	} `json:"annex_c"`
	Exponent struct {
		AC, DC float64
	} `json:"life_exponent"`
	MIL struct {
		Points [][2]float64
	} `json:"mil_39016"`
	Mechanical struct {
		Factor float64
	}
	Flickermeter struct {
		Points [][2]float64
	}
	PowerFactor struct {
		Rated, Coil float64
		LowestPart  float64 `json:"lowest_part"`
	} `json:"power_factor"`
}

func published(t *testing.T) reference {
	t.Helper()
	data, err := os.ReadFile("testdata/reference.json")
	if err != nil {
		t.Fatal(err)
	}
	var r reference
	if err := json.Unmarshal(data, &r); err != nil {
		t.Fatal(err)
	}
	if r.AnnexC.B10d == 0 || len(r.MIL.Points) < 3 || len(r.Flickermeter.Points) < 4 || r.Exponent.AC == 0 || r.PowerFactor.Coil == 0 {
		t.Fatalf("the reference values are not all there: %+v", r)
	}
	return r
}

// ISO 13849-1 Annex C, worked example.
func TestAnnexC(t *testing.T) {
	x := published(t).AnnexC
	n := OperationsByDays(x.Days, x.Hours, x.Cycle)
	near(t, "operations a year", n, x.Printed.Operations, 0.005e6)
	near(t, "operations a year, as a share", OperationsPerYear(x.Cycle, x.Days*x.Hours/(365*24)), n.Value, 1e-6)
	mttfd, t10d := MTTFd(x.B10d, n)
	near(t, "T10d", t10d, x.Printed.T10d, 0.05)
	near(t, "MTTFd", mttfd, x.Printed.MTTFd, 0.5)
}

func TestEnduranceIsNotB10d(t *testing.T) {
	mttfd, t10d := MTTFd(0, OperationsPerYear(60, 1))
	reasoned(t, "MTTFd without a B10d", mttfd)
	reasoned(t, "T10d without a B10d", t10d)
	if !strings.Contains(mttfd.Working, "endurance is not B10d") {
		t.Error(mttfd.Working)
	}
	mttfd, t10d = MTTFd(1e6, OperationsPerYear(0, 1))
	reasoned(t, "MTTFd without a cycle", mttfd)
	reasoned(t, "T10d without a cycle", t10d)
}

// Exponents of RL-TR-92-197: half and a fifth of the current.
func TestLife(t *testing.T) {
	r := published(t)
	for kind, p := range map[string]float64{AC: r.Exponent.AC, DC: r.Exponent.DC} {
		near(t, kind+" half", Life(1e5, 10, 5, 0, kind), 1e5*math.Pow(2, p), 1)
		near(t, kind+" a fifth", Life(1e5, 10, 2, 0, kind), 1e5*math.Pow(5, p), 1)
	}
	near(t, "by hand, AC", Life(1e5, 10, 5, 0, AC), 2.2038e5, 10)
	near(t, "by hand, DC", Life(1e5, 10, 5, 0, DC), 2.4623e5, 10)
	near(t, "mechanical", Life(1e5, 10, 0.01, 0, AC), r.Mechanical.Factor*1e5, 1e-6)
	near(t, "stated mechanical life", Life(1e5, 10, 0.01, 3e5, AC), 3e5, 1e-6)
	near(t, "at its rating", Life(1e5, 10, 10, 0, AC), 1e5, 1e-6)
	near(t, "not stated which", Life(1e5, 10, 5, 0, "unknown"), 1e5, 1e-6)
	near(t, "current not stated", Life(1e5, 10, 0, 0, AC), 1e5, 1e-6)
	reasoned(t, "above its rating", Life(1e5, 10, 12, 0, AC))
	reasoned(t, "without an endurance", Life(0, 10, 5, 0, AC))
}

// MIL 39016/13: 1e5 operations at 1 A, 1e6 at 10 to 50 mA. The estimate must not
// promise more than was measured, nor less than a half of it.
func TestLifeAgainstMIL39016(t *testing.T) {
	for _, p := range published(t).MIL.Points {
		r := Life(1e5, 1, p[0], 0, DC)
		if !r.Determined || r.Value > p[1]*(1+1e-9) || r.Value < p[1]/2 {
			t.Errorf("%g A: %+v, measured %g", p[0], r, p[1])
		}
	}
}

// More current never means more operations; never past the mechanical life.
func TestLifeFalls(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		kind := rapid.SampledFrom([]string{AC, DC, "unknown"}).Draw(rt, "kind")
		a := rapid.Float64Range(0.001, 10).Draw(rt, "a")
		b := rapid.Float64Range(0.001, 10).Draw(rt, "b")
		if a > b {
			a, b = b, a
		}
		la, lb := Life(1e5, 10, a, 0, kind), Life(1e5, 10, b, 0, kind)
		if !la.Determined || !lb.Determined || la.Value < lb.Value || la.Value > 1e6 || lb.Value < 1e5 {
			rt.Fatalf("%g A: %+v, %g A: %+v", a, la, b, lb)
		}
	})
}

func TestYears(t *testing.T) {
	near(t, "years", Years(Life(1e5, 10, 10, 0, AC), OperationsPerYear(SecondsAYear/1e4, 1)), 10, 1e-9)
	reasoned(t, "no life", Years(Life(0, 0, 0, 0, AC), OperationsPerYear(60, 1)))
	reasoned(t, "no cycle", Years(Life(1e5, 10, 10, 0, AC), OperationsPerYear(0, 1)))
	for _, r := range []Result{OperationsPerYear(60, 0), OperationsPerYear(60, 1.1), OperationsPerYear(math.NaN(), 1), OperationsByDays(367, 24, 1), OperationsByDays(1, 25, 1), OperationsByDays(1, 1, 0)} {
		reasoned(t, "operations", r)
	}
}

func TestHeat(t *testing.T) {
	h := Heat(1.2, 5)
	near(t, "heat", h, 6, 1e-12)
	near(t, "hottest", Hottest(h, 8, 45), 93, 1e-12)
	reasoned(t, "no thermal resistance", Hottest(h, 0, 45))
	reasoned(t, "no drop", Hottest(Heat(0, 5), 8, 45))
	reasoned(t, "no current", Heat(1.2, 0))
}

func TestInrush(t *testing.T) {
	near(t, "as stated", Inrush(2.5, 0.3, 15, "common practice"), 2.5, 0)
	near(t, "usual", Inrush(0, 0.3, 15, "common practice"), 4.5, 1e-12)
	reasoned(t, "nothing known", Inrush(0, 0, 15, "common practice"))
	reasoned(t, "no multiple", Inrush(0, 0.3, 0, "common practice"))
}

// Steps that give Pst = 1 on the flickermeter of IEC 61000-4-15: the analytical
// method of IEC 61000-3-3 must agree within its usual 5 %, as long as there is a
// second from change to change.
func TestSeverityAgainstTheFlickermeter(t *testing.T) {
	for _, p := range published(t).Flickermeter.Points {
		window := 120 / p[0] // two changes
		current := p[1] / 100 * 230 / 0.4
		r := Severity(window, current, 230)
		near(t, r.Working, r, 1, 0.05)
		w := ShortestWindow(current, 230)
		near(t, "at the shortest window", Severity(math.Max(w.Value, 2), current, 230), 1, 1e-9)
	}
}

func TestSeverityWhereItApplies(t *testing.T) {
	near(t, "13 A", Step(13, 230), 100*13*0.4/230, 1e-12)
	reasoned(t, "above 16 A", Severity(20, 17, 230))
	reasoned(t, "another supply", Severity(20, 10, 120))
	reasoned(t, "faster than a second", Severity(1, 10, 230))
	reasoned(t, "no window", Severity(0, 10, 230))
	reasoned(t, "not a number", Severity(math.NaN(), 10, 230))
	reasoned(t, "no current", ShortestWindow(0, 230))
	near(t, "a small load", ShortestWindow(1, 230), 2, 0)
	if s := Flicker(20, 17); !strings.Contains(s, "61000-3-11") {
		t.Error(s)
	}
	if s := Flicker(20, 13); !strings.Contains(s, "61000-3-3") {
		t.Error(s)
	}
}

// One half cycle of 50 Hz is 10 ms: a thousandth of 10 s.
func TestGrain(t *testing.T) {
	near(t, "grain", Grain(10, 50), 0.001, 1e-15)
	reasoned(t, "no window", Grain(0, 50))
}
