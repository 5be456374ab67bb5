package thermal

import (
	"fmt"
	"math"
)

// VentedWater is the temperature in degC that water in a vented vessel does
// not pass at sea level.
const VentedWater = 100.0

// secondsPerYear is a year of 365 days.
const secondsPerYear = 365 * 24 * 3600.0

// Anticipator warms the element of a heating control while the load is on. In
// a cooling control it warms the element while the load is off, which shortens
// the cycle in the same way (common practice of room controls).
type Anticipator struct {
	Rise float64 // K, how far it warms the element in the end; 0: none
	Lag  float64 // s, above 0 where there is a rise: how fast it does
}

// Sensing is what stands between the medium and the contact.
type Sensing struct {
	Lag         float64 // s, first-order lag of element or probe; 0: none
	Filter      float64 // s, first-order lag in the program behind it; 0: none
	Anticipator Anticipator
}

// Switching is a two-position control with minimum times. A heating control
// makes as the sensed temperature falls to Make and breaks as it rises to
// Break; a cooling control makes as it rises to Make and breaks as it falls to
// Break.
type Switching struct {
	Make, Break   float64 // degC
	MinOn, MinOff float64 // s, the command is held at least so long; 0: not held
}

// Loop is a process under two-position control.
type Loop struct {
	Process   Process
	Sensing   Sensing
	Switching Switching
}

// InputError is a figure with which nothing can be worked out.
type InputError struct {
	Figure string  // which, in words
	Value  float64 // what was given
	Need   string  // what would fit
}

func (e *InputError) Error() string {
	return fmt.Sprintf("%s is %g, but %s", e.Figure, e.Value, e.Need)
}

// Cooling reports whether the load cools.
func (p Process) Cooling() bool { return p.On < p.Off }

// Gain is how far the load moves the medium in the end, in K, negative where
// it cools.
func (p Process) Gain() float64 { return p.On - p.Off }

// Validate reports the first figure that cannot be, as *InputError.
func (p Process) Validate() error {
	return firstError(
		finite("settles_on", p.On),
		finite("settles_off", p.Off),
		positive("time_constant", p.Tau),
		notNegative("dead_time", p.Dead),
		apart("settles_on", p.On, p.Off, "it must differ from settles_off: a load that moves nothing controls nothing"),
	)
}

// Validate reports the first figure that cannot be, as *InputError.
func (s Sensing) Validate() error {
	err := firstError(
		notNegative("sensing lag", s.Lag),
		notNegative("software lag", s.Filter),
		notNegative("anticipator rise", s.Anticipator.Rise),
		notNegative("anticipator lag", s.Anticipator.Lag),
	)
	if err == nil && s.Anticipator.Rise > 0 {
		err = positive("anticipator lag", s.Anticipator.Lag)
	}
	return err
}

// Validate reports the first figure that cannot be, as *InputError, among them
// edges that are the wrong way round for the process.
func (l Loop) Validate() error {
	s := l.Switching
	err := firstError(
		l.Process.Validate(),
		l.Sensing.Validate(),
		finite("make", s.Make),
		finite("break", s.Break),
		notNegative("min_on", s.MinOn),
		notNegative("min_off", s.MinOff),
	)
	if err != nil {
		return err
	}
	if !l.Process.Cooling() && s.Make > s.Break {
		return &InputError{"make", s.Make, fmt.Sprintf("a load that heats makes below its break (%g)", s.Break)}
	}
	if l.Process.Cooling() && s.Make < s.Break {
		return &InputError{"make", s.Make, fmt.Sprintf("a load that cools makes above its break (%g)", s.Break)}
	}
	return nil
}

func firstError(errs ...error) error {
	for _, err := range errs {
		if err != nil {
			return err
		}
	}
	return nil
}

func finite(what string, v float64) error {
	if math.IsNaN(v) || math.IsInf(v, 0) {
		return &InputError{what, v, "a number is needed"}
	}
	return nil
}

func positive(what string, v float64) error {
	if !(v > 0) || math.IsInf(v, 0) {
		return &InputError{what, v, "it must be above 0"}
	}
	return nil
}

func notNegative(what string, v float64) error {
	if !(v >= 0) || math.IsInf(v, 0) {
		return &InputError{what, v, "it must be 0 or more"}
	}
	return nil
}

func apart(what string, a, b float64, need string) error {
	if a == b {
		return &InputError{what, a, need}
	}
	return nil
}
