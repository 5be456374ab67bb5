package sensing

import (
	"fmt"
	"math"

	"makebreak/survey"
)

// frontEnd is what stands between sensor and converter: share is the
// converter's input as a part of its reference for a quantity of the sensor,
// and open and short are the shares that the circuit gives without a sensor and
// with its terminals joined (not yet cut off at the ends of the converter).
type frontEnd struct {
	share       func(q float64) float64
	open, short float64
	ratiometric bool
	signed      bool // a count, not a share
}

// newFrontEnd chooses by what the sheet gives: a divider (with or without its
// own excitation, with or without an amplifier behind it), a measuring current
// and an amplifier, a thermocouple amplifier, or a plain voltage.
func newFrontEnd(s *survey.Sensor, ref float64) (frontEnd, error) {
	gain := 1.0
	if s.Gain.Set {
		gain = s.Gain.V
	}
	top := 1.0
	if s.Excitation.Set {
		top = s.Excitation.V / ref
	}
	kind := s.Kind.V
	switch {
	case kind == "digital":
		return frontEnd{share: func(q float64) float64 { return q }, signed: true}, nil
	case s.PullUp.Set:
		r := s.PullUp.V
		return frontEnd{share: func(q float64) float64 { return gain * top * q / (q + r) }, open: gain * top, ratiometric: !s.Excitation.Set}, nil
	case s.PullDown.Set:
		r := s.PullDown.V
		return frontEnd{share: func(q float64) float64 { return gain * top * r / (q + r) }, short: gain * top, ratiometric: !s.Excitation.Set}, nil
	case s.Current.Set && isPlatinum(kind):
		k := s.Current.V * gain / ref
		return frontEnd{share: func(q float64) float64 { return k * q }, open: math.Inf(1)}, nil
	case isThermocouple(kind):
		return frontEnd{share: func(q float64) float64 { return (s.Offset.V + gain*q) / ref }, open: math.NaN(), short: math.NaN()}, nil
	case kind == "millivolt" || kind == "current":
		return frontEnd{share: func(q float64) float64 { return q / s.FullScale.V }, open: math.NaN()}, nil
	case kind == "diode":
		return frontEnd{share: func(q float64) float64 { return q / ref }, open: math.Inf(1)}, nil
	case kind == "linear":
		return frontEnd{share: func(q float64) float64 { return q / ref }, open: math.NaN()}, nil
	}
	return frontEnd{}, fmt.Errorf("no front end: pull_up, pull_down, or current with gain")
}

func isPlatinum(k survey.SensorKind) bool { return k == "pt100" || k == "pt1000" }

func isThermocouple(k survey.SensorKind) bool { return k == "type_k" || k == "type_j" || k == "type_t" }

// isThermometer is false for the inputs that measure V or A: their "temperature"
// is that quantity.
func isThermometer(k survey.SensorKind) bool { return k != "millivolt" && k != "current" }

// curveOf gives the curve of a sensor of the sheet.
func curveOf(s *survey.Sensor) (Curve, error) {
	switch s.Kind.V {
	case "ntc":
		return thermistorOf(s)
	case "pt100":
		return Platinum(100), nil
	case "pt1000":
		return Platinum(1000), nil
	case "type_k", "type_j", "type_t":
		c, _ := Thermocouple(s.Kind.V[len(s.Kind.V)-1])
		return c, nil
	case "linear":
		return Points("linear transmitter", "V", s.At.V, false)
	case "diode":
		if !s.At25.Set || !s.Slope.Set || s.Slope.V == 0 {
			return Curve{}, fmt.Errorf("no curve: at_25 and slope")
		}
		return Straight("diode", "V", s.At25.V-25*s.Slope.V, s.Slope.V, -55, 150), nil
	case "digital":
		if !s.CountsPerKelvin.Set {
			return Curve{}, fmt.Errorf("no curve: counts_per_kelvin")
		}
		top := 32767 / s.CountsPerKelvin.V
		return Straight("digital", "counts", 0, s.CountsPerKelvin.V, math.Max(-top, -273), math.Min(top, 1000)), nil
	case "millivolt", "current":
		if !s.FullScale.Set {
			return Curve{}, fmt.Errorf("no curve: full_scale")
		}
		unit := map[survey.SensorKind]string{"millivolt": "V", "current": "A"}[s.Kind.V]
		return Straight(string(s.Kind.V)+" input", unit, 0, 1, 0, s.FullScale.V), nil
	}
	return Curve{}, fmt.Errorf("kind %q is not known", s.Kind.V)
}

func thermistorOf(s *survey.Sensor) (Curve, error) {
	switch {
	case s.Beta.Set && s.R25.Set:
		return Beta(s.R25.V, s.Beta.V), nil
	case s.SteinhartHart.Set:
		k := s.SteinhartHart.V
		if !(k[1] > 0) || !(k[2] > 0) {
			return Curve{}, fmt.Errorf("steinhart_hart: B and C must be positive")
		}
		return SteinhartHart(k[0], k[1], k[2]), nil
	case s.Table.Set:
		return Points("thermistor (table)", "ohm", s.Table.V, true)
	}
	return Curve{}, fmt.Errorf("no curve: r25 and beta, steinhart_hart or table")
}
