package sensing

import (
	"errors"
	"math"
	"slices"
	"strings"
	"testing"

	"makebreak/survey"
)

func budget(t *testing.T, s *survey.Sensor, bits int, temp float64) Budget {
	t.Helper()
	b, err := chain(t, s, bits).Budget(temp)
	if err != nil {
		t.Fatal(err)
	}
	return b
}

// lineOf gives a contribution, 0 where there is none.
func lineOf(b Budget, name string) float64 {
	for _, l := range b.Lines {
		if l.Name == name {
			return l.Kelvin
		}
	}
	return 0
}

func misses(b Budget, word string) bool {
	return slices.ContainsFunc(b.Missing, func(m string) bool { return strings.Contains(m, word) })
}

// IEC 60751 and IEC 60584-1:2013 tolerance classes, with their crossovers.
func TestToleranceClasses(t *testing.T) {
	r := published(t)
	for _, x := range r.PlatinumTolerance.Kelvin {
		for _, kind := range []string{"pt100", "pt1000"} {
			got, ok := Tolerance(kind, x.class, x.t)
			if !ok {
				t.Errorf("no class %s", x.class)
			}
			near(t, kind+" class "+x.class, got, x.kelvin, 1e-9)
		}
	}
	for _, x := range r.Crossovers.DegC {
		below, _ := Tolerance(x.kind, x.class, x.t-10)
		here, ok := Tolerance(x.kind, x.class, x.t)
		above, _ := Tolerance(x.kind, x.class, x.t+10)
		if !ok || below != x.kelvin || above <= x.kelvin {
			t.Errorf("%s class %s: %g, %g, %g K about %g degC, want %g and then more", x.kind, x.class, below, here, above, x.t, x.kelvin)
		}
		near(t, x.kind+" class "+x.class, here, x.kelvin, 1e-9)
	}
	for _, x := range [][2]string{{"pt100", "1"}, {"type_k", "A"}, {"ntc", "1"}, {"pt100", ""}} {
		if _, ok := Tolerance(x[0], x[1], 0); ok {
			t.Errorf("%v is taken for a class", x)
		}
	}
}

// Outside the range of its class the figure is carried on, and said to be.
func TestClassRange(t *testing.T) {
	b := budget(t, couple(), 12, 1100)
	near(t, "carried on", lineOf(b, "sensor: tolerance class"), 4.4, 1e-9)
	if !misses(b, "-40 to 1000") {
		t.Errorf("missing: %v", b.Missing)
	}
	if b := budget(t, couple(), 12, 900); misses(b, "defined") {
		t.Errorf("missing: %v", b.Missing)
	}
}

// Two-wire Pt100, 1 ohm a lead, at 100 degC; three wires leave 5 % of one
// lead (common practice), four nothing.
func TestLeads(t *testing.T) {
	r := published(t).TwoWire
	s := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Class: f("B"), Lead: f(r.Loop / 2), PullUp: f(1000.0)}
	for wires, want := range map[int]float64{0: r.Kelvin, 2: r.Kelvin, 3: 0.05 / 2 * r.Kelvin, 4: 0} {
		s.Wires = survey.Field[int]{V: wires, Set: wires > 0}
		near(t, "leads", lineOf(budget(t, s, 16, r.At), "leads"), want, 0.0005)
	}
}

// I²R over the dissipation constant: 1 mA in 100 ohm is 0.1 mW (derived), 0.05 K
// at 2 mW/K. A divider of equal parts on 5 V: 2.5 V² / 10 kohm = 0.625 mW.
func TestSelfHeating(t *testing.T) {
	s := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Current: f(0.001), Gain: f(20.0), SelfHeating: f(0.002)}
	near(t, "Pt100", lineOf(budget(t, s, 12, 0), "self-heating"), 0.05, 1e-9)
	for _, up := range []bool{true, false} {
		n := thermistor(12, up)
		n.SelfHeating = f(0.0025)
		near(t, "thermistor", lineOf(budget(t, n, 12, 25), "self-heating"), 0.25, 1e-9)
	}
	if b := budget(t, thermistor(12, true), 12, 25); !misses(b, "self-heating") {
		t.Errorf("missing: %v", b.Missing)
	}
	if b := budget(t, couple(), 12, 25); misses(b, "self-heating") {
		t.Errorf("a thermocouple carries no current: %v", b.Missing)
	}
}

// Against the exact chain, one cause at a time: a reference, an excitation, a
// cold junction that is wrong moves the reading by what the budget says.
func TestSupplyAndJunctionAgainstTheExactChain(t *testing.T) {
	// Ratiometric: the reference cancels.
	if l := lineOf(budget(t, thermistor(12, true), 12, 60), "reference"); l != 0 {
		t.Errorf("a ratiometric divider has %g K from its reference", l)
	}
	excited := thermistor(12, true)
	excited.Excitation, excited.ExcitationTol = f(3.3), f(0.02)
	b := budget(t, excited, 12, 60)
	r := 10000 * math.Exp(3977*(1/(60+Kelvin)-1/298.15))
	reads := func(ratio float64) float64 { // of the nominal 3.3/5
		x := ratio / 0.66
		return back(t, Beta(10000, 3977), 10000*x/(1-x))
	}
	near(t, "reference", lineOf(b, "reference"), math.Abs(reads(0.66*r/(r+10000)/1.005)-60), 0.02*lineOf(b, "reference"))
	near(t, "excitation", lineOf(b, "excitation"), math.Abs(reads(0.66*r/(r+10000)*1.02)-60), 0.04*lineOf(b, "excitation"))

	k, _ := Thermocouple('k')
	b = budget(t, couple(), 12, 400)
	seen := at(t, k, 400) + at(t, k, 26) - at(t, k, 25)
	near(t, "cold junction", lineOf(b, "cold junction"), back(t, k, seen)-400, 0.002)
	// 40.5 µV/K at 25 degC (IEC 60584-1, derived) over 42.2 µV/K at 400 degC.
	near(t, "slope at 25 degC", 1e6*k.slope(25), 40.5, 0.05)
	if !misses(b, "amplifier") {
		t.Errorf("missing: %v", b.Missing)
	}
}

// Offset, gain and linearity of the converter in counts, by moving the reading.
func TestConverterAgainstTheExactChain(t *testing.T) {
	adc := converter(12)
	adc.Offset, adc.Gain, adc.INL = f(-3.0), f(0.002), f(2.0)
	c, err := New(thermistor(12, true), adc, survey.Enclosure{})
	if err != nil {
		t.Fatal(err)
	}
	b, err := c.Budget(60)
	if err != nil {
		t.Fatal(err)
	}
	x := c.coordinate(60)
	moved := func(to float64) float64 { return math.Abs(c.whereIs(to, c.Curve.Low, c.Curve.High) - 60) }
	near(t, "offset", lineOf(b, "converter: offset"), moved(x-3), 0.001)
	near(t, "gain", lineOf(b, "converter: gain"), moved(x*1.002), 0.001)
	near(t, "non-linearity", lineOf(b, "converter: non-linearity"), moved(x+2), 0.001)
	near(t, "half a count", lineOf(b, "converter: half a count"), moved(x+0.5), 0.0005)
}

// Sums and shares.
func TestBudgetAdds(t *testing.T) {
	for name, s := range sensors() {
		b := budget(t, s, 12, 60)
		sum, squares, shares := 0.0, 0.0, 0.0
		for _, l := range b.Lines {
			sum, squares, shares = sum+l.Kelvin, squares+l.Kelvin*l.Kelvin, shares+l.Share
			if l.Working == "" || l.Kelvin <= 0 {
				t.Errorf("%s: %+v", name, l)
			}
		}
		near(t, name+": worst case", b.WorstCase, sum, 1e-12)
		near(t, name+": root sum of squares", b.RSS, math.Sqrt(squares), 1e-12)
		near(t, name+": shares", shares, 1, 1e-12)
	}
	if _, err := chain(t, thermistor(12, true), 12).Budget(301); !errors.As(err, new(RangeError)) {
		t.Errorf("outside the curve: %v", err)
	}
}

// Over the enclosure the divider's resistor drifts: 50 ppm/K (common practice)
// times 40 K is 0.2 % of the ratio.
func TestDriftOverTheEnclosure(t *testing.T) {
	c, err := New(thermistor(12, true), converter(12), survey.Enclosure{Temperature: f([2]float64{5, 65})})
	if err != nil {
		t.Fatal(err)
	}
	b, err := c.Budget(60)
	if err != nil {
		t.Fatal(err)
	}
	// The same part of the ratio as 0.2 % of the resistor; that one is 0.1 %.
	near(t, "drift", lineOf(b, "divider resistor: drift"), 2*lineOf(b, "divider resistor"), 1e-9)
	if misses(b, "drift") {
		t.Errorf("missing: %v", b.Missing)
	}
	if b := budget(t, thermistor(12, true), 12, 60); !misses(b, "drift") {
		t.Errorf("missing: %v", b.Missing)
	}
}

// The budget of a thermistor against the exact curve: every cause pushed to its
// worst one at a time must move the reading by what the budget says, to the
// first order.
func TestBudgetAgainstTheExactCurve(t *testing.T) {
	c := chain(t, thermistor(12, true), 12)
	const temp = 60.0
	b, err := c.Budget(temp)
	if err != nil {
		t.Fatal(err)
	}
	reads := func(r25, beta, pull float64) float64 {
		r := r25 * math.Exp(beta*(1/(temp+Kelvin)-1/298.15))
		seen := 10000 * r / pull // what the nominal divider takes it for
		got, err := Beta(10000, 3977).Inverse(seen)
		if err != nil {
			t.Fatal(err)
		}
		return math.Abs(got - temp)
	}
	for _, l := range b.Lines {
		switch l.Name {
		case "sensor: resistance at 25 degC":
			near(t, l.Name, l.Kelvin, reads(10100, 3977, 10000), 0.01*l.Kelvin)
		case "sensor: beta":
			near(t, l.Name, l.Kelvin, reads(10000, 3977*1.0075, 10000), 0.02*l.Kelvin)
		case "divider resistor":
			near(t, l.Name, l.Kelvin, reads(10000, 3977, 10010), 0.01*l.Kelvin)
		}
	}
}
