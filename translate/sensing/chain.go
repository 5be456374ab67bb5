package sensing

import (
	"fmt"
	"math"

	"makebreak/survey"
)

// Chain is a sensor with its front end and converter: temperature in, count out.
//
// An ideal converter of N bits reads floor(2^N · ratio), at most 2^N − 1, of
// its input as a share of its reference. A digital sensor reads the nearest
// count. Either way the count changes at an edge: coordinate(t) is the
// temperature expressed in counts such that count ≥ k begins where the
// coordinate reaches k.
type Chain struct {
	Sensor *survey.Sensor
	ADC    survey.ADC
	Curve  Curve
	Box    survey.Enclosure // where resistors and reference drift

	low, high float64 // believable temperatures, degC
	lowWhy    string
	front     func(q float64) float64 // quantity → share of the reference
	digital   bool
}

// ErrNotFixed says that a count does not stand for one temperature.
type ErrNotFixed struct{ Why string }

func (e ErrNotFixed) Error() string { return "no fixed count for a temperature: " + e.Why }

// New builds the chain of a sensor. The errors name what is missing or does
// not work together.
func New(s *survey.Sensor, adc survey.ADC, box survey.Enclosure) (*Chain, error) {
	c := &Chain{Sensor: s, ADC: adc, Box: box}
	if err := c.curve(); err != nil {
		return nil, err
	}
	if err := c.frontEnd(); err != nil {
		return nil, err
	}
	c.low, c.high = c.Curve.Low, c.Curve.High
	c.lowWhy = "the range of the curve"
	if own, ok := usual[s.Kind.V]; ok {
		c.low, c.high = math.Max(c.low, own[0]), math.Min(c.high, own[1])
	}
	if s.Valid.Set {
		c.low, c.high = math.Max(s.Valid.V[0], c.Curve.Low), math.Min(s.Valid.V[1], c.Curve.High)
	}
	lo, hi := c.Believable()
	if lo >= hi {
		return nil, fmt.Errorf("between %.4g and %.4g degC the converter reads only %d to %d counts", c.low, c.high, lo, hi)
	}
	return c, nil
}

// usual is the believable range of kinds whose curve reaches further than what
// is common practice for the part.
var usual = map[survey.SensorKind][2]float64{
	"ntc":     {-55, 150},
	"diode":   {-40, 125},
	"digital": {-55, 125},
}

func (c *Chain) curve() error {
	s := c.Sensor
	switch s.Kind.V {
	case "ntc":
		switch {
		case s.Beta.Set:
			c.Curve = Beta(s.R25.V, s.Beta.V)
		case s.SteinhartHart.Set:
			k := s.SteinhartHart.V
			if k[2] <= 0 || k[1] <= 0 {
				return fmt.Errorf("steinhart_hart: B and C must be positive")
			}
			c.Curve = SteinhartHart(k[0], k[1], k[2])
		case s.Table.Set:
			c.Curve = Points("thermistor (table)", "ohm", s.Table.V, true)
		default:
			return fmt.Errorf("no curve: beta, steinhart_hart or table")
		}
	case "pt100":
		c.Curve = Platinum(100)
	case "pt1000":
		c.Curve = Platinum(1000)
	case "type_k", "type_j", "type_t":
		c.Curve, _ = Thermocouple(s.Kind.V[len(s.Kind.V)-1])
	case "linear":
		c.Curve = Points("linear transmitter", "V", s.At.V, false)
	case "diode":
		c.Curve = Straight("diode", "V", s.At25.V-25*s.Slope.V, s.Slope.V, -55, 150)
	case "digital":
		top := 32767 / s.CountsPerKelvin.V
		c.Curve = Straight("digital", "counts", 0, s.CountsPerKelvin.V, math.Max(-top, -273), math.Min(top, 1000))
		c.digital = true
	case "millivolt":
		c.Curve = Straight("millivolt input", "V", 0, 1, 0, s.FullScale.V)
	case "current":
		c.Curve = Straight("current input", "A", 0, 1, 0, s.FullScale.V)
	default:
		return fmt.Errorf("kind %q is not known", s.Kind.V)
	}
	return nil
}

func (c *Chain) frontEnd() error {
	s, ref := c.Sensor, c.ADC.Reference.V
	supply := ref
	if s.Excitation.Set {
		supply = s.Excitation.V
	}
	switch {
	case c.digital:
		c.front = func(q float64) float64 { return q }
	case s.PullUp.Set:
		c.front = func(q float64) float64 { return supply / ref * q / (q + s.PullUp.V) }
	case s.PullDown.Set:
		c.front = func(q float64) float64 { return supply / ref * s.PullDown.V / (q + s.PullDown.V) }
	case s.Current.Set:
		c.front = func(q float64) float64 { return s.Current.V * q * s.Gain.V / ref }
	case s.Kind.V == "type_k" || s.Kind.V == "type_j" || s.Kind.V == "type_t":
		if s.ColdJunction.Set {
			return ErrNotFixed{"the cold junction is measured by " + s.ColdJunction.V + ", so the count moves with it; let the amplifier compensate"}
		}
		c.front = func(q float64) float64 { return (s.Offset.V + s.Gain.V*q) / ref }
	case s.Kind.V == "millivolt" || s.Kind.V == "current":
		c.front = func(q float64) float64 { return q / s.FullScale.V }
	default:
		c.front = func(q float64) float64 { return q / ref }
	}
	return nil
}

// Signed reports whether the program receives the count as int16_t.
func (c *Chain) Signed() bool { return c.digital }

// Ratiometric reports whether the reference cancels.
func (c *Chain) Ratiometric() bool {
	return (c.Sensor.PullUp.Set || c.Sensor.PullDown.Set) && !c.Sensor.Excitation.Set
}

// full is the number of counts of the converter.
func (c *Chain) full() float64 { return math.Ldexp(1, c.ADC.Bits.V) }

// Rising reports whether the count rises with temperature.
func (c *Chain) Rising() bool {
	return c.coordinate(c.Curve.High) > c.coordinate(c.Curve.Low)
}

// coordinate is the temperature in counts, not yet cut off.
func (c *Chain) coordinate(t float64) float64 {
	share := c.front(c.Curve.at(t))
	if c.digital {
		return share + 0.5
	}
	return share * c.full()
}

// Count is what the converter reads at t degC.
func (c *Chain) Count(t float64) (int64, error) {
	if _, err := c.Curve.At(t); err != nil {
		return 0, err
	}
	n := int64(math.Floor(c.coordinate(t) + 1e-9))
	if c.digital {
		return n, nil
	}
	return max(0, min(n, int64(c.full())-1)), nil
}

// edgeAt is the temperature at which count ≥ k begins to hold, or ceases to.
func (c *Chain) edgeAt(k int64) float64 {
	a, b := c.Curve.Low, c.Curve.High
	rising := c.Rising()
	for b-a > 1e-9 {
		m := (a + b) / 2
		if m == a || m == b {
			break
		}
		if (c.coordinate(m) < float64(k)) == rising {
			a = m
		} else {
			b = m
		}
	}
	return (a + b) / 2
}

// Temperature gives the temperatures in degC, lower first, that a count stands for.
func (c *Chain) Temperature(count int64) (low, high float64) {
	low, high = c.edgeAt(count), c.edgeAt(count+1)
	return math.Min(low, high), math.Max(low, high)
}

// Valid is the believable range in degC.
func (c *Chain) Valid() (low, high float64) { return c.low, c.high }

// Believable gives the lowest and highest count that can be believed: the
// counts of the believable range, and never the two at the rails, which an
// open or shorted analogue circuit reads.
func (c *Chain) Believable() (low, high int64) {
	a, _ := c.Count(c.low)
	b, _ := c.Count(c.high)
	low, high = min(a, b), max(a, b)
	if c.digital {
		return max(low, -32767), min(high, 32766)
	}
	return max(low, 1), min(high, int64(c.full())-2)
}

// CountWidth is how many kelvins one count is at t degC.
func (c *Chain) CountWidth(t float64) float64 {
	const h = 0.01
	a, b := math.Max(t-h, c.Curve.Low), math.Min(t+h, c.Curve.High)
	return math.Abs((b - a) / (c.coordinate(b) - c.coordinate(a)))
}
