package switching

import (
	"fmt"
	"math"
)

// Figures of IEC 61000-3-3, for a single-phase load on a public 50 Hz supply.
const (
	flickerCurrent   = 16.0  // A: the standard ends here
	referenceOhm     = 0.4   // resistance of its reference impedance, 0.4 + j0.25 ohm
	lowestSupply     = 220.0 // V, line to neutral
	highestSupply    = 250.0
	fewestSeconds    = 1.0 // between two changes: below, its analytical method does not hold
	severityExponent = 3.2
	severityFactor   = 2.3 // t_f = 2.3·d^3.2 s for a step of d %
	largestStep      = 4.0 // %, d_max without further conditions
	flickerBasis     = "IEC 61000-3-3, analytical method, from memory; a measurement decides"
)

// Flicker says what applies where a load is switched often on a public supply
// in time-proportioning: a window in s and a current in A.
func Flicker(window, current float64) string {
	if current > flickerCurrent {
		return "above 16 A: IEC 61000-3-11 or -3-12 applies, ask the network operator"
	}
	return fmt.Sprintf("IEC 61000-3-3 applies (up to 16 A): at one change in %.3g s the permitted dip depends on how often; switch at zero crossing and measure", window/2)
}

// Severity estimates the short-term flicker severity Pst of a resistive load of
// current A, switched on and off once in a window of s, on a supply of V. Each
// change of d % leaves an impression of 2.3·d^3.2 s, and
// Pst = (their sum over the time)^(1/3.2). Up to 1 is allowed. Below a change a
// second, above 16 A and on other supplies nothing is determined.
func Severity(window, current, supply float64) Result {
	d := Step(current, supply)
	switch {
	case !d.Determined:
		return open("Pst", "%s", d.reason())
	case !(window/2 >= fewestSeconds):
		return open("Pst", "at less than a second from change to change the method does not hold: measure")
	}
	changes := 2 / window
	p := math.Pow(severityFactor*math.Pow(d.Value, severityExponent)*changes, 1/severityExponent)
	return found(p, "Pst", "2 steps of %.3g %% in %.4g s: (2.3 × %.3g^3.2 × 2/%.4g)^(1/3.2); up to 1 is allowed (%s)", d.Value, window, d.Value, window, flickerBasis)
}

// ShortestWindow is the shortest time-proportioning window in s that keeps
// Severity at 1: 2 · 2.3 · d^3.2, and no less than the two seconds for which the
// method holds.
func ShortestWindow(current, supply float64) Result {
	d := Step(current, supply)
	if !d.Determined {
		return open("s", "%s", d.reason())
	}
	w := 2 * severityFactor * math.Pow(d.Value, severityExponent)
	if least := 2 * fewestSeconds; w < least {
		return found(least, "s", "Pst 1 would allow %.3g s; the method holds from %g s (%s)", w, least, flickerBasis)
	}
	return found(w, "s", "2 × 2.3 × %.3g^3.2 for Pst 1 (%s)", d.Value, flickerBasis)
}

// Step is the change of the supply in % when a resistive load of current A is
// switched, over the resistance of the reference impedance of IEC 61000-3-3.
func Step(current, supply float64) Result {
	switch {
	case !(current > 0) || !(supply > 0):
		return open("%", "the current or the supply of the load is not stated")
	case current > flickerCurrent:
		return open("%", "above 16 A IEC 61000-3-3 does not apply: IEC 61000-3-11 or -3-12, ask the network operator")
	case supply < lowestSupply || supply > highestSupply:
		return open("%", "IEC 61000-3-3 is for 220 to 250 V line to neutral at 50 Hz, not for %.4g V", supply)
	}
	d := 100 * current * referenceOhm / supply
	return found(d, "%", "%.4g A × %.2g ohm / %.4g V; up to %.2g %% is allowed for any one step", current, referenceOhm, supply, largestStep)
}

// Grain is the smallest change of output of a switch that works at zero
// crossing, as a share of a window in s: one half cycle of a supply of hertz.
func Grain(window, hertz float64) Result {
	if !(window > 0) || !(hertz > 0) {
		return open("share", "the window or the frequency of the supply is not stated")
	}
	return found(1/(2*hertz*window), "share", "one half cycle of %.4g Hz in %.4g s", hertz, window)
}
