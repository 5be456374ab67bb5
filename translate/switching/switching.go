// Package switching answers what an output stage carries, and for how long:
// rating against load and inrush, operations a year against endurance, mean
// time to dangerous failure where the figure for it is given, and what a
// semiconductor leaks and heats.
package switching

import (
	"fmt"
	"math"
	"strings"
)

// Result is a value with its working, or the reason why it is not determined.
type Result struct {
	Value      float64
	Unit       string
	Determined bool
	Working    string // or the reason
}

func found(v float64, unit, format string, args ...any) Result {
	return Result{v, unit, true, fmt.Sprintf(format, args...)}
}

const notDetermined = "not determined: "

func open(unit, format string, args ...any) Result {
	return Result{Unit: unit, Working: notDetermined + fmt.Sprintf(format, args...)}
}

// reason is why a result is not determined.
func (r Result) reason() string { return strings.TrimPrefix(r.Working, notDetermined) }

// SecondsAYear is a year of 365 days, as ISO 13849-1 counts operating days.
const SecondsAYear = 365 * 24 * 3600

// OperationsPerYear is how often a contact operates: one operation is on and
// off once. period is that of the cycle in s; share is the part of the year
// that the plant runs, 0 to 1.
func OperationsPerYear(period, share float64) Result {
	if !(period > 0) || !(share > 0 && share <= 1) {
		return open("1/year", "the cycle is not known")
	}
	return found(share*SecondsAYear/period, "1/year", "%.4g of a year / %.4g s a cycle", share, period)
}

// OperationsByDays is n_op of ISO 13849-1 Annex C: days of operation a year
// times hours a day times 3600 over the time of one cycle in s.
func OperationsByDays(days, hours, cycle float64) Result {
	if !(days > 0 && days <= 366) || !(hours > 0 && hours <= 24) || !(cycle > 0) {
		return open("1/year", "days a year, hours a day or the cycle are not known")
	}
	return found(days*hours*3600/cycle, "1/year", "%.4g days × %.4g h × 3600 / %.4g s a cycle", days, hours, cycle)
}

// Current kinds for the exponent of contact life.
const (
	AC = "ac"
	DC = "dc"
)

// exponents of N = N0·(I0/I)^p for resistive loads (RL-TR-92-197).
var exponents = map[string]float64{AC: 1.14, DC: 1.3}

// mechanicalFactor is how much longer a contact lives without load than with
// its rated one; common practice, used where no mechanical life is stated.
const mechanicalFactor = 10

// Life is how many operations a contact lives at a current in A, rated for
// endurance operations at rated A. The derating for a lower current is an
// estimate, for resistive loads, and never goes past the mechanical life
// (0: ten times the endurance). kind is AC or DC; any other word, as for a coil
// or a motor, leaves the endurance as it is. Above the rating nothing is
// determined.
func Life(endurance, rated, current, mechanical float64, kind string) Result {
	p, known := exponents[kind]
	switch {
	case !(endurance > 0):
		return open("operations", "no endurance is stated for the output")
	case !(current > 0) || !(rated > 0):
		return found(endurance, "operations", "endurance at rated current; no derating, for load current or rating is not stated")
	case current > rated:
		return open("operations", "%.4g A is more than the rated %.4g A", current, rated)
	case !known:
		return found(endurance, "operations", "endurance at rated current; no derating, for it is not stated whether the load is AC or DC")
	}
	limit := mechanical
	if !(limit > 0) {
		limit = mechanicalFactor * endurance
	}
	n := math.Min(endurance*math.Pow(rated/current, p), limit)
	return found(n, "operations", "estimate: %.4g × (%.4g A / %.4g A)^%.3g, at most the mechanical life %.4g", endurance, rated, current, p, limit)
}

// Years is how long a life lasts.
func Years(life, perYear Result) Result {
	switch {
	case !life.Determined:
		return open("years", "%s", life.reason())
	case !perYear.Determined:
		return open("years", "%s", perYear.reason())
	}
	return found(life.Value/perYear.Value, "years", "%.4g operations / %.4g a year", life.Value, perYear.Value)
}

// MTTFd is the mean time to dangerous failure, B10d/(0.1·nop), and T10d the
// time after which the part is replaced, B10d/nop (ISO 13849-1, Annex C; from a
// second-hand copy). Rated endurance is not B10d: without a B10d nothing is
// determined.
func MTTFd(b10d float64, perYear Result) (mttfd, t10d Result) {
	switch {
	case !(b10d > 0):
		r := open("years", "no B10d is stated; rated endurance is not B10d")
		return r, r
	case !perYear.Determined:
		r := open("years", "%s", perYear.reason())
		return r, r
	}
	n := perYear.Value
	return found(b10d/(0.1*n), "years", "B10d %.4g / (0.1 × %.4g a year) (ISO 13849-1 Annex C)", b10d, n),
		found(b10d/n, "years", "B10d %.4g / %.4g a year (ISO 13849-1 Annex C)", b10d, n)
}

// Heat is what a semiconductor switch turns into heat, W: its drop in V times
// the load current in A.
func Heat(drop, current float64) Result {
	if !(drop > 0) || !(current > 0) {
		return open("W", "the drop of the switch or the current of the load is not stated")
	}
	return found(drop*current, "W", "%.4g V × %.4g A", drop, current)
}

// Hottest is how warm the switch gets, degC: the warmest surroundings plus heat
// times thermal resistance in K/W.
func Hottest(heat Result, resistance, surroundings float64) Result {
	switch {
	case !heat.Determined:
		return open("degC", "%s", heat.reason())
	case !(resistance > 0):
		return open("degC", "the thermal resistance of the switch is not stated")
	}
	return found(surroundings+heat.Value*resistance, "degC", "%.4g degC + %.4g W × %.4g K/W", surroundings, heat.Value, resistance)
}

// Inrush is the peak current at switching on, A: as stated, or the multiple
// usual for the kind of load.
func Inrush(stated, current, multiple float64, source string) Result {
	switch {
	case stated > 0:
		return found(stated, "A", "as stated")
	case current > 0 && multiple > 0:
		return found(current*multiple, "A", "%.4g A × %.4g, usual for this kind of load (%s)", current, multiple, source)
	}
	return open("A", "the current of the load is not stated")
}
