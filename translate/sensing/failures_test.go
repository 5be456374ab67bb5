package sensing

import (
	"testing"

	"makebreak/survey"
)

func failure(t *testing.T, c *Chain, what string) Failure {
	t.Helper()
	for _, f := range c.Failures() {
		if f.What == what {
			return f
		}
	}
	t.Fatalf("no failure %q in %+v", what, c.Failures())
	return Failure{}
}

// Directions of failure as every handbook of the trade has them (common
// practice): an open thermistor reads cold and a shorted one hot, on either
// side of its divider; platinum the other way round.
func TestDirectionsOfFailure(t *testing.T) {
	platinum := func(up bool) *survey.Sensor {
		s := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt1000"))}
		if up {
			s.PullUp = f(2200.0)
		} else {
			s.PullDown = f(2200.0)
		}
		return s
	}
	source := &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Current: f(0.001), Gain: f(12.0)}
	for name, x := range map[string]struct {
		s           *survey.Sensor
		open, short string
	}{
		"ntc above ground":     {thermistor(12, true), "cold", "hot"},
		"ntc below reference":  {thermistor(12, false), "cold", "hot"},
		"pt above ground":      {platinum(true), "hot", "cold"},
		"pt below reference":   {platinum(false), "hot", "cold"},
		"pt on current source": {source, "hot", "cold"},
	} {
		c := chain(t, x.s, 12)
		open, short := failure(t, c, "open"), failure(t, c, "short")
		if open.Reads != x.open || open.Inside || !open.Known {
			t.Errorf("%s: open is %+v, want %s", name, open, x.open)
		}
		wet := failure(t, c, "wet")
		if wet.Reads != x.short || !wet.Inside || wet.Known {
			t.Errorf("%s: wet is %+v, want %s", name, wet, x.short)
		}
		if short.Reads != x.short || short.Inside || !short.Known {
			t.Errorf("%s: short is %+v, want %s", name, short, x.short)
		}
	}
}

// A divider on a supply below the reference: the open sensor reads that supply,
// in the middle of the converter, and must still be outside.
func TestOpenBelowTheReference(t *testing.T) {
	s := thermistor(12, true)
	s.Excitation = f(3.3)
	s.Valid = f([2]float64{-55, 125})
	c := chain(t, s, 12)
	open := failure(t, c, "open")
	if open.Inside || open.Count != 2703 { // floor(4096 · 3.3/5)
		t.Errorf("%+v", open)
	}
}

// With its own errors of offset, gain and linearity the converter must not
// bring an open or shorted probe into the believable range.
func TestRailsAllowForTheConverter(t *testing.T) {
	adc := converter(10)
	adc.Offset, adc.INL, adc.Gain = f(2.0), f(2.0), f(0.002)
	s := thermistor(10, true)
	s.Beta = f(8000.0) // reaches both rails within its range
	c, err := New(s, adc, survey.Enclosure{})
	if err != nil {
		t.Fatal(err)
	}
	low, high := c.Believable()
	if worst := int64(2 + 2); low <= worst {
		t.Errorf("believes %d, a short may read %d", low, worst)
	}
	if worst := 1023*(1-0.002) - 2 - 2; float64(high) >= worst {
		t.Errorf("believes %d, an open circuit may read %g", high, worst)
	}
}

// A thermocouple's cable shorted reads the place of the short: believable. What
// an open one reads is the amplifier's affair.
func TestThermocoupleFailures(t *testing.T) {
	couple := func(open string) *Chain {
		return chain(t, &survey.Sensor{ID: f("k"), Kind: f(survey.SensorKind("type_k")), Gain: f(60.0), Offset: f(0.2), OpenReads: f(open), Valid: f([2]float64{0, 600})}, 12)
	}
	if x := failure(t, couple("high"), "open"); x.Inside || x.Reads != "hot" || x.Count != 4095 {
		t.Errorf("%+v", x)
	}
	if x := failure(t, couple("low"), "open"); x.Inside || x.Reads != "cold" || x.Count != 0 {
		t.Errorf("%+v", x)
	}
	if x := failure(t, couple("floats"), "open"); x.Known || !x.Inside {
		t.Errorf("%+v", x)
	}
	if x := failure(t, couple("high"), "short in the cable"); x.Known || !x.Inside {
		t.Errorf("%+v", x)
	}
}

// A live zero tells a broken loop from the bottom of the range, 0 V does not
// but for the count at the rail.
func TestLinearTransmitterOff(t *testing.T) {
	at := func(v0, v1 float64) *Chain {
		return chain(t, &survey.Sensor{ID: f("l"), Kind: f(survey.SensorKind("linear")), At: f([][2]float64{{0, v0}, {100, v1}})}, 10)
	}
	for _, c := range []*Chain{at(0.4, 2), at(0, 1)} {
		if x := failure(t, c, "wire off"); x.Inside || x.Reads != "cold" {
			t.Errorf("%+v", x)
		}
	}
	low, _ := at(0.4, 2).Believable()
	if low != 81 { // floor(1024 · 0.4/5)
		t.Errorf("believes from count %d", low)
	}
}

// A load's current is nothing in ordinary service: 0 is believed, and a short
// cannot be told from it.
func TestNoCurrentIsBelieved(t *testing.T) {
	c := chain(t, &survey.Sensor{ID: f("lamps"), Kind: f(survey.SensorKind("current")), FullScale: f(10.0)}, 10)
	if low, _ := c.Believable(); low != 0 {
		t.Errorf("believes from %d", low)
	}
	if x := failure(t, c, "short"); !x.Inside {
		t.Errorf("%+v", x)
	}
	n, err := c.Count(5)
	if err != nil || n != 512 {
		t.Errorf("5 A of 10 A reads %d (%v)", n, err)
	}
}

// 1 Mohm of water across 10 kohm at 25 degC leaves 9901 ohm: 0.99 % at
// −β/T² = −4.474 %/K is 0.222 K hot. Across Pt100 at 0 degC, 100 kohm takes
// 0.1 ohm: 0.256 K cold.
func TestWithLeak(t *testing.T) {
	reads, err := chain(t, thermistor(12, true), 12).WithLeak(25, 1e6)
	if err != nil {
		t.Fatal(err)
	}
	near(t, "wet thermistor", reads, 25.222, 0.001)
	pt := chain(t, &survey.Sensor{ID: f("p"), Kind: f(survey.SensorKind("pt100")), Current: f(0.001), Gain: f(12.0)}, 12)
	if reads, err = pt.WithLeak(0, 1e5); err != nil {
		t.Fatal(err)
	}
	near(t, "wet platinum", reads, -0.256, 0.001)
	for _, c := range []*Chain{pt, chain(t, couple(), 12)} {
		if _, err := c.WithLeak(0, 0); err == nil {
			t.Error("a leak of nothing is a short")
		}
	}
	if _, err := chain(t, couple(), 12).WithLeak(100, 1e6); err == nil {
		t.Error("a thermocouple is no resistor")
	}
}
