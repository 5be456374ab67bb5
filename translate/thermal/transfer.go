package thermal

import (
	"math"
	"math/cmplx"
)

// Transfer is a linear process in factors,
//
//	G(s) = Gain · Π(z·s + 1) / (s^Integrators · Π(l·s + 1)) · e^(−Dead·s).
//
// Gain is in K for the whole range of the output (0 to 1), or in K/s with one
// integrator. A zero z may be negative (the answer first goes the wrong way).
type Transfer struct {
	Gain        float64
	Zeros, Lags []float64 // s
	Integrators int
	Dead        float64 // s
}

// Transfer is the process as a new control sees it, from output to reading:
// the medium, the lag of the new probe and of a filter. The lag of the old
// element must not be in the dead time; Observed and Known take it out.
func (p Process) Transfer(s Sensing) Transfer {
	t := Transfer{Gain: p.Gain(), Lags: []float64{p.Tau}, Dead: p.Dead}
	for _, lag := range [2]float64{s.Lag, s.Filter} {
		if lag > 0 {
			t.Lags = append(t.Lags, lag)
		}
	}
	return t
}

// Integrating is the process as far as a cycle fixes it: a rate per unit of
// output in K/s (rate with the load on less rate with it off) and a dead time.
func Integrating(rate, dead float64, s Sensing) Transfer {
	t := Transfer{Gain: rate, Integrators: 1, Dead: dead}
	for _, lag := range [2]float64{s.Lag, s.Filter} {
		if lag > 0 {
			t.Lags = append(t.Lags, lag)
		}
	}
	return t
}

// Transfer is what the identified process is for tuning: first order where
// SettlesOn is known, integrating otherwise.
func (d Identified) Transfer(s Sensing) Transfer {
	if d.SettlesOn.Known {
		return d.Process.Transfer(s)
	}
	return Integrating(d.RateOn.or()-d.RateOff.or(), math.Max(0, d.Process.Dead), s)
}

// Validate reports the first figure that cannot be, as *InputError.
func (t Transfer) Validate() error {
	err := firstError(finite("gain", t.Gain), notNegative("dead time", t.Dead), apart("gain", t.Gain, 0, "it must differ from 0"))
	for _, z := range t.Zeros {
		err = firstError(err, finite("a zero", z))
	}
	for _, l := range t.Lags {
		err = firstError(err, positive("a lag", l))
	}
	if err == nil && (t.Integrators < 0 || t.Integrators > 3) {
		err = &InputError{"number of integrators", float64(t.Integrators), "0 to 3 fit"}
	}
	return err
}

// at is the magnitude and the phase at a frequency in rad/s. The phase is
// continuous from frequency 0 on, in rad, of the gain's magnitude: whether
// process heats or cools is the controller's to know.
func (t Transfer) at(w float64) (magnitude, phase float64) {
	magnitude = math.Abs(t.Gain) / math.Pow(w, float64(t.Integrators))
	phase = -w*t.Dead - float64(t.Integrators)*math.Pi/2
	for _, z := range t.Zeros {
		magnitude *= math.Hypot(1, z*w)
		phase += math.Atan(z * w)
	}
	for _, l := range t.Lags {
		magnitude /= math.Hypot(1, l*w)
		phase -= math.Atan(l * w)
	}
	return magnitude, phase
}

// span is the range of frequencies in which anything happens, rad/s.
func (t Transfer) span() (low, high float64) {
	shortest, longest := math.Inf(1), 0.0
	see := func(v float64) {
		if v = math.Abs(v); v > 0 {
			shortest, longest = math.Min(shortest, v), math.Max(longest, v)
		}
	}
	see(t.Dead)
	for _, v := range t.Zeros {
		see(v)
	}
	for _, v := range t.Lags {
		see(v)
	}
	if longest == 0 {
		shortest, longest = 1, 1
	}
	return 1e-4 / longest, 100 / shortest
}

// Ultimate is the point at which a proportional control alone oscillates.
type Ultimate struct {
	Gain   float64 // output (0 to 1) per K
	Period float64 // s
}

// Ultimate finds the lowest frequency at which the phase is −180°. It reports
// false where there is none: a process that proportional control alone never
// makes oscillate.
func (t Transfer) Ultimate() (Ultimate, bool, error) {
	if err := t.Validate(); err != nil {
		return Ultimate{}, false, err
	}
	low, high := t.span()
	lag := func(w float64) float64 { _, p := t.at(w); return p + math.Pi }
	w, found := firstFall(lag, low, high)
	if !found {
		return Ultimate{}, false, nil
	}
	m, _ := t.at(w)
	return Ultimate{Gain: 1 / m, Period: 2 * math.Pi / w}, true, nil
}

// perDecade is how many frequencies a decade is searched at before a result is
// sharpened.
const perDecade = 400

// firstFall finds the lowest frequency at which f falls through 0.
func firstFall(f func(float64) float64, low, high float64) (float64, bool) {
	step := math.Pow(10, 1.0/perDecade)
	before := f(low)
	for w := low * step; w <= high; w *= step {
		v := f(w)
		if before > 0 && v <= 0 {
			return bisect(f, w/step, w), true
		}
		before = v
	}
	return 0, false
}

// bisect sharpens a crossing to the last bits.
func bisect(f func(float64) float64, a, b float64) float64 {
	side := math.Signbit(f(a))
	for range 100 {
		middle := (a + b) / 2
		if middle == a || middle == b {
			break
		}
		if math.Signbit(f(middle)) == side {
			a = middle
		} else {
			b = middle
		}
	}
	return b
}

// Form is the way in which a PID control's three actions are put together.
type Form string

const (
	Parallel Form = "parallel" // Kc(1 + 1/(Ti·s) + Td·s): what the textbooks call ideal
	Series   Form = "series"   // Kc(1 + 1/(Ti·s))(1 + Td·s)
)

// Settings of a control. A P control has Ti 0, a PI control Td 0. With Kc 0
// and Ki above 0 it is a pure integrator.
type Settings struct {
	Kc   float64 // output (0 to 1) per K
	Ti   float64 // s; 0: no integral action
	Td   float64 // s; 0: no derivative action
	Ki   float64 // 1/(K·s), only with Kc 0
	Form Form    // Parallel where empty
}

// Parallel is the same control in parallel form.
func (s Settings) Parallel() Settings {
	if s.Form != Series || s.Ti == 0 || s.Td == 0 {
		s.Form = Parallel
		return s
	}
	f := 1 + s.Td/s.Ti
	return Settings{Kc: s.Kc * f, Ti: s.Ti * f, Td: s.Td / f, Form: Parallel}
}

// at is the control's own answer at a frequency.
func (s Settings) at(w float64) complex128 {
	if s.Kc == 0 {
		return complex(0, -s.Ki/w)
	}
	s = s.Parallel()
	imag := s.Td * w
	if s.Ti > 0 {
		imag -= 1 / (s.Ti * w)
	}
	return complex(s.Kc, s.Kc*imag)
}

// Margins of a closed loop.
type Margins struct {
	Gain        float64 // factor by which the gain may rise until it oscillates; +Inf where none does it
	Phase       float64 // degrees; NaN where the loop gain never is 1
	Sensitivity float64 // Ms, highest of |1/(1+L)|: 1.4 careful, 1.7 usual, 2 lively
	Stable      bool    // by the Nyquist count of the encirclements of −1
}

// openLoop is process and control in a row.
type openLoop struct {
	process Transfer
	control Settings
}

// at is the loop's answer at a frequency: itself, its magnitude, and its
// continuous phase.
func (o openLoop) at(w float64) (complex128, float64, float64) {
	m, p := o.process.at(w)
	c := o.control.at(w)
	m, p = m*cmplx.Abs(c), p+cmplx.Phase(c)
	return cmplx.Rect(m, p), m, p
}

// span is the range of frequencies to look at. Where there is a dead time the
// loop goes on turning for ever, and is followed until it has turned 60 times.
func (o openLoop) span() (low, high float64) {
	low, high = o.process.span()
	for _, v := range [2]float64{o.control.Ti, o.control.Td} {
		if v > 0 {
			low, high = math.Min(low, 1e-4/v), math.Max(high, 100/v)
		}
	}
	if o.process.Dead > 0 {
		high = math.Min(high, 400/o.process.Dead)
	}
	return low, high
}

// Margins works out gain margin, phase margin and peak sensitivity from the
// frequency response of process and control, dead time included exactly. It
// returns *InputError for figures that cannot be.
func (t Transfer) Margins(s Settings) (Margins, error) {
	if err := t.Validate(); err != nil {
		return Margins{}, err
	}
	if !(s.Kc > 0 || s.Kc == 0 && s.Ki > 0) || s.Ti < 0 || s.Td < 0 {
		return Margins{}, &InputError{"control gain", s.Kc, "it must be above 0, and its times 0 or more"}
	}
	o := openLoop{t, s}
	low, high := o.span()
	r := Margins{Gain: math.Inf(1), Phase: math.NaN()}
	step := math.Pow(10, 1.0/perDecade)
	w := low
	l, m, p := o.at(w)
	var peak, peakAt, turn float64
	least := math.Inf(1) // of the gains that bring the loop to the edge, whichever side of 1
	for w < high {
		next := w * step
		if t.Dead > 0 {
			next = math.Min(next, w+0.05/t.Dead)
		}
		lNext, mNext, pNext := o.at(next)
		turn += cmplx.Phase((1 + lNext) / (1 + l))
		if v := 1 / cmplx.Abs(1+lNext); v > peak {
			peak, peakAt = v, next
		}
		if passesHalfTurn(p, pNext) {
			at := bisect(func(x float64) float64 { _, _, q := o.at(x); return math.Sin(q) }, w, next)
			_, there, _ := o.at(at)
			least = math.Min(least, 1/there)
			if 1/there > 1 {
				r.Gain = math.Min(r.Gain, 1/there)
			}
		}
		if (m < 1) != (mNext < 1) {
			at := bisect(func(x float64) float64 { _, q, _ := o.at(x); return q - 1 }, w, next)
			_, _, there := o.at(at)
			margin := math.Remainder(there+math.Pi, 2*math.Pi) * 180 / math.Pi
			if math.IsNaN(r.Phase) || math.Abs(margin) < math.Abs(r.Phase) {
				r.Phase = margin
			}
		}
		w, l, m, p = next, lNext, mNext, pNext
	}
	sensitivity := func(x float64) float64 { v, _, _ := o.at(math.Exp(x)); return 1 / cmplx.Abs(1+v) }
	r.Sensitivity = math.Max(peak, sensitivity(highest(sensitivity, math.Log(peakAt/step), math.Log(peakAt*step))))
	r.Stable = math.Abs(turn-o.quarterTurns()) < math.Pi
	if !r.Stable {
		r.Gain = least
	}
	return r, nil
}

// quarterTurns is the angle that 1 + L of a stable loop sweeps from low to high
// frequencies: a quarter turn for each pole at 0. A loop that encircles −1
// misses it by a whole turn (H. Nyquist, 1932).
func (o openLoop) quarterTurns() float64 {
	poles := o.process.Integrators
	if o.control.Kc == 0 || o.control.Ti > 0 {
		poles++
	}
	return float64(poles) * math.Pi / 2
}

// passesHalfTurn reports whether a phase passes −180°, or that and whole turns,
// between two neighbouring frequencies.
func passesHalfTurn(a, b float64) bool {
	return math.Floor((a-math.Pi)/(2*math.Pi)) != math.Floor((b-math.Pi)/(2*math.Pi))
}
