package thermal

import (
	"fmt"
	"math"
)

// Tuned is one rule's settings with what they are worth on the process.
type Tuned struct {
	Rule
	Margins  Margins
	Response Response
}

// Tune puts the published rules side by side on one process: settings, gain and
// phase margin, peak sensitivity, overshoot and settling. TauC as in Rules.
func (t Transfer) Tune(tauC float64) ([]Tuned, error) {
	rules, err := t.Rules(tauC)
	if err != nil {
		return nil, err
	}
	var out []Tuned
	for _, r := range rules {
		tuned := Tuned{Rule: r}
		if r.Refused == "" {
			if tuned.Margins, err = t.Margins(r.Settings); err != nil {
				return nil, err
			}
			if r.Settings.Kc > 0 {
				if tuned.Response, err = t.Response(r.Settings); err != nil {
					return nil, err
				}
			}
		}
		out = append(out, tuned)
	}
	return out, nil
}

// Describing is the estimate of the ultimate gain out of a relay's cycle by
// the describing function, Ku ≈ 4d/(π·√(a² − ε²)), beside the exact one.
type Describing struct {
	Valid      bool
	Gain       float64 // output (0 to 1) per K, shown even where not valid so that the difference can be
	Exact      float64 // of the process
	Difference float64 // Gain/Exact − 1
	Ratio      float64 // ε/a
	Duty       float64
	Because    string // why it is not valid, or the working
}

const (
	mostRatio             = 0.3 // ε/a above which the describing function is not shown
	leastDuty, mostDuty   = 0.35, 0.65
	relayAmplitude        = 0.5 // half of the output's range from 0 to 1
	describingLimitsBasis = "valid only for ε/a below 0.3 and a duty between 0.35 and 0.65, with amplitude and hysteresis of the same signal"
)

// Describing works out the describing-function estimate from the steady cycle,
// with amplitude a and hysteresis ε both of the sensed temperature, and the
// exact ultimate gain of the same process and sensing (K. J. Åström and T.
// Hägglund, 1984). Errors are those of Steady.
func (l Loop) Describing() (Describing, error) {
	f, err := l.Steady()
	if err != nil {
		return Describing{}, err
	}
	a := (f.SensedHigh - f.SensedLow) / 2
	e := math.Abs(l.Switching.Break-l.Switching.Make) / 2
	d := Describing{Ratio: e / a, Duty: f.Duty()}
	d.Gain = 4 * relayAmplitude / (math.Pi * math.Sqrt(a*a-e*e))
	u, found, err := l.Process.Transfer(l.Sensing).Ultimate()
	if err != nil {
		return Describing{}, err
	}
	if !found || !(a > e) {
		d.Gain, d.Exact, d.Difference = math.NaN(), math.NaN(), math.NaN()
		d.Because = "the process has no ultimate point, or the sensed temperature does not go beyond its thresholds"
		return d, nil
	}
	d.Exact = u.Gain
	d.Difference = d.Gain/u.Gain - 1
	d.Valid = d.Ratio < mostRatio && d.Duty > leastDuty && d.Duty < mostDuty && l.Sensing.Anticipator.Rise == 0
	d.Because = fmt.Sprintf("ε/a = %.3g, duty %.3g; %s", d.Ratio, d.Duty, describingLimitsBasis)
	return d, nil
}

// Practical is what settings mean on real hardware.
type Practical struct {
	Band              float64 // K of deviation for the whole output
	OutputPerCount    float64 // share of the output that one count of the converter moves by the proportional action
	OperationsPerYear float64 // of a contact that is time-proportioned over the window
	TauC              float64 // s, least closed-loop time constant: no less than dead time and window
	OnRate            float64 // K/s at the set point with the output full, as a magnitude
	OffRate           float64 // K/s with the output at none: what the plant does by itself; no control makes it faster
}

// Practical works out what settings mean: with the width of one count in K and
// the time-proportioning window in s (0: none, a permille output). The rates
// are those of the process at a set point in degC.
func (p Process) Practical(s Settings, countWidth, window, setPoint float64) (Practical, error) {
	err := firstError(p.Validate(), positive("control gain", s.Kc), notNegative("count width", countWidth), notNegative("window", window), finite("set point", setPoint))
	if err != nil {
		return Practical{}, err
	}
	q := Practical{
		Band: 1 / s.Kc, OutputPerCount: s.Kc * countWidth, TauC: math.Max(p.Dead, window),
		OnRate: math.Abs(p.On-setPoint) / p.Tau, OffRate: math.Abs(p.Off-setPoint) / p.Tau,
	}
	if window > 0 {
		q.OperationsPerYear = secondsPerYear / window
	}
	return q, nil
}
