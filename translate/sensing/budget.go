package sensing

import (
	"fmt"
	"math"
)

// Contribution is one cause of error at one temperature.
type Contribution struct {
	Name    string
	Kelvin  float64 // ±
	Share   float64 // of the worst case
	Working string
}

// Budget is how far the reading may be from the truth at one temperature.
type Budget struct {
	At        float64 // degC
	Lines     []Contribution
	WorstCase float64  // K: all at their worst, the same way
	RSS       float64  // K: root sum of squares, for independent causes
	Missing   []string // causes for which the sheet gives no figure
}

// resistorDrift is the temperature coefficient taken for a divider's resistor,
// common practice for metal film.
const resistorDrift = 50e-6 // /K

// leadMismatch is the part of one lead's resistance by which the leads of a
// three-wire connection are taken to differ; common practice.
const leadMismatch = 0.05

// Budget adds up every cause of error at t degC.
func (c *Chain) Budget(t float64) (Budget, error) {
	q, err := c.Curve.At(t)
	if err != nil {
		return Budget{}, err
	}
	b := Budget{At: t}
	add := func(name string, k float64, format string, args ...any) {
		if k > 0 {
			b.Lines = append(b.Lines, Contribution{Name: name, Kelvin: k, Working: fmt.Sprintf(format, args...)})
		}
	}
	c.sensorError(t, q, add, &b)
	c.frontError(t, q, add)
	if !c.digital {
		c.converterError(t, add)
	} else {
		add("half a count", 0.5*c.CountWidth(t), "half of %.3g K", c.CountWidth(t))
	}
	squares := 0.0
	for _, l := range b.Lines {
		b.WorstCase += l.Kelvin
		squares += l.Kelvin * l.Kelvin
	}
	b.RSS = math.Sqrt(squares)
	for i := range b.Lines {
		b.Lines[i].Share = b.Lines[i].Kelvin / b.WorstCase
	}
	return b, nil
}

type adder func(name string, kelvin float64, format string, args ...any)

// platinumClass gives a and b of ±(a + b·|t|) K (IEC 60751).
var platinumClass = map[string][2]float64{"AA": {0.10, 0.0017}, "A": {0.15, 0.002}, "B": {0.30, 0.005}, "C": {0.60, 0.01}}

// thermocoupleClass gives the larger of K and fraction·|t| (IEC 60584-1:2013).
var thermocoupleClass = map[string]map[string][2]float64{
	"type_k": {"1": {1.5, 0.004}, "2": {2.5, 0.0075}},
	"type_j": {"1": {1.5, 0.004}, "2": {2.5, 0.0075}},
	"type_t": {"1": {0.5, 0.004}, "2": {1.0, 0.0075}},
}

// Tolerance is the tolerance in K of a class at t degC: AA, A, B, C of
// IEC 60751 for pt100 and pt1000, 1 and 2 of IEC 60584-1 for thermocouples.
func Tolerance(kind, class string, t float64) (float64, bool) {
	switch kind {
	case "pt100", "pt1000":
		ab, ok := platinumClass[class]
		return ab[0] + ab[1]*math.Abs(t), ok
	}
	kf, ok := thermocoupleClass[kind][class]
	return math.Max(kf[0], kf[1]*math.Abs(t)), ok
}

func (c *Chain) sensorError(t, q float64, add adder, b *Budget) {
	s, slope := c.Sensor, math.Abs(c.Curve.slope(t))
	kind := string(s.Kind.V)
	switch kind {
	case "ntc":
		add("sensor: resistance at 25 degC", s.R25Tolerance.V*q/slope, "%.3g %% of %.4g ohm over %.4g ohm/K", 100*s.R25Tolerance.V, q, slope)
		if s.Beta.Set {
			d := s.Beta.V * s.BetaTolerance.V * math.Abs(1/(t+Kelvin)-1/298.15) * q
			add("sensor: beta", d/slope, "%.3g %% of beta, away from 25 degC: %.4g ohm over %.4g ohm/K", 100*s.BetaTolerance.V, d, slope)
		} else {
			b.Missing = append(b.Missing, "tolerance of the thermistor's curve away from 25 degC")
		}
	case "pt100", "pt1000", "type_k", "type_j", "type_t":
		class, assumed := s.Class.V, ""
		if !s.Class.Set {
			class, assumed = map[bool]string{true: "B", false: "2"}[kind == "pt100" || kind == "pt1000"], ", assumed for want of one"
		}
		tol, ok := Tolerance(kind, class, t)
		if ok {
			add("sensor: tolerance class", tol, "class %s at %.4g degC%s", class, t, assumed)
		}
	default:
		if s.Error.Set {
			add("sensor: stated error", s.Error.V, "as stated")
		} else {
			b.Missing = append(b.Missing, "error of the sensor")
		}
	}
	if s.SelfHeating.Set && s.SelfHeating.V > 0 {
		power := c.power(q)
		add("self-heating", power/s.SelfHeating.V, "%.3g mW over %.3g mW/K", 1000*power, 1000*s.SelfHeating.V)
	}
	if kind == "type_k" || kind == "type_j" || kind == "type_t" {
		at25 := c.Curve.slope(25)
		add("cold junction", s.ColdJunctionError.V*at25/slope, "%.3g K at the junction × %.3g µV/K there over %.3g µV/K here", s.ColdJunctionError.V, 1e6*at25, 1e6*slope)
	}
}

// power is what the sensor dissipates, in W.
func (c *Chain) power(q float64) float64 {
	s := c.Sensor
	supply := c.ADC.Reference.V
	if s.Excitation.Set {
		supply = s.Excitation.V
	}
	switch {
	case s.PullUp.Set:
		i := supply / (q + s.PullUp.V)
		return i * i * q
	case s.PullDown.Set:
		i := supply / (q + s.PullDown.V)
		return i * i * q
	case s.Current.Set:
		return s.Current.V * s.Current.V * q
	}
	return 0
}

func (c *Chain) frontError(t, q float64, add adder) {
	s, slope, full, width := c.Sensor, math.Abs(c.Curve.slope(t)), c.full(), c.CountWidth(t)
	share := c.front(q)
	pull := s.PullUp.V
	if s.PullDown.Set {
		pull = s.PullDown.V
	}
	if pull > 0 {
		// A resistor wrong by a part p looks like a sensor wrong by the same part.
		add("divider resistor", s.PullTolerance.V*q/slope, "%.3g %% of the ratio to %.4g ohm", 100*s.PullTolerance.V, pull)
		if r := c.Box.Temperature; r.Set {
			away := math.Max(math.Abs(r.V[1]-25), math.Abs(r.V[0]-25))
			add("divider resistor: drift", resistorDrift*away*q/slope, "50 ppm/K (common practice) over %.3g K of enclosure", away)
		}
	}
	if s.Lead.V > 0 {
		switch s.Wires.V {
		case 3:
			add("leads", leadMismatch*s.Lead.V/slope, "three wires: 5 %% of %.3g ohm (common practice) over %.4g ohm/K", s.Lead.V, slope)
		case 4:
		default:
			add("leads", 2*s.Lead.V/slope, "two wires of %.3g ohm over %.4g ohm/K", s.Lead.V, slope)
		}
	}
	if c.digital {
		return
	}
	if !c.Ratiometric() {
		add("reference", share*c.ADC.ReferenceTolerance.V*full*width, "%.3g %% of %.4g counts; it does not cancel", 100*c.ADC.ReferenceTolerance.V, share*full)
	}
	if s.Excitation.Set {
		add("excitation", share*s.ExcitationTol.V*full*width, "%.3g %% of %.4g counts", 100*s.ExcitationTol.V, share*full)
	}
}

func (c *Chain) converterError(t float64, add adder) {
	a, width := c.ADC, c.CountWidth(t)
	counts := c.coordinate(t)
	add("converter: offset", a.Offset.V*width, "%.3g counts of %.3g K", a.Offset.V, width)
	add("converter: gain", a.Gain.V*counts*width, "%.3g %% of %.4g counts", 100*a.Gain.V, counts)
	add("converter: non-linearity", a.INL.V*width, "%.3g counts of %.3g K", a.INL.V, width)
	add("converter: half a count", 0.5*width, "half of %.3g K", width)
}
