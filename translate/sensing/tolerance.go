package sensing

import (
	"fmt"
	"math"
)

// A tolerance class: ± the larger of fixed and share·|t|, or for platinum their
// sum, from low to high degC.
type class struct {
	fixed, share float64
	low, high    float64
}

// platinumClasses are ±(a + b·|t|) K (IEC 60751:2008, table of classes). The
// range is that of wire-wound elements, the wider one; thin films end earlier
// (AA 0 to 150, A −30 to 300, B −50 to 500, C −50 to 600 degC). Both ranges are
// from memory.
var platinumClasses = map[string]class{
	"AA": {0.10, 0.0017, -50, 250},
	"A":  {0.15, 0.002, -100, 450},
	"B":  {0.30, 0.005, -196, 600},
	"C":  {0.60, 0.01, -196, 600},
}

// thermocoupleClasses are ± the larger of K and share·|t| (IEC 60584-1:2013).
var thermocoupleClasses = map[string]map[string]class{
	"type_k": {"1": {1.5, 0.004, -40, 1000}, "2": {2.5, 0.0075, -40, 1200}},
	"type_j": {"1": {1.5, 0.004, -40, 750}, "2": {2.5, 0.0075, -40, 750}},
	"type_t": {"1": {0.5, 0.004, -40, 350}, "2": {1.0, 0.0075, -40, 350}},
}

// Tolerance is the tolerance in K of a class at t degC: AA, A, B, C of
// IEC 60751 for pt100 and pt1000, 1 and 2 of IEC 60584-1 for type_k, type_j and
// type_t. ok is false for any other. Whether the class holds at t is for
// ClassRange to say.
func Tolerance(kind, name string, t float64) (kelvin float64, ok bool) {
	if c, ok := platinumClass(kind, name); ok {
		return c.fixed + c.share*math.Abs(t), true
	}
	c, ok := thermocoupleClasses[kind][name]
	return math.Max(c.fixed, c.share*math.Abs(t)), ok
}

// ClassRange gives the temperatures in degC for which the standard defines a
// tolerance class; for platinum those of wire-wound elements.
func ClassRange(kind, name string) (low, high float64, ok bool) {
	c, ok := platinumClass(kind, name)
	if !ok {
		c, ok = thermocoupleClasses[kind][name]
	}
	return c.low, c.high, ok
}

func platinumClass(kind, name string) (class, bool) {
	if kind != "pt100" && kind != "pt1000" {
		return class{}, false
	}
	c, ok := platinumClasses[name]
	return c, ok
}

// byClass adds the tolerance class of a platinum sensor or thermocouple.
func (b *tally) byClass(kind, name string, stated bool) {
	t, assumed := b.At, ""
	if !stated {
		name, assumed = "2", ", assumed for want of one"
		if kind == "pt100" || kind == "pt1000" {
			name = "B"
		}
	}
	k, ok := Tolerance(kind, name, t)
	if !ok {
		b.missing("tolerance class %s of %s is not known", name, kind)
		return
	}
	if low, high, _ := ClassRange(kind, name); t < low || t > high {
		b.missing("class %s is defined from %g to %g degC only: its figure is carried on beyond", name, low, high)
	}
	b.add("sensor: tolerance class", k, "class %s at %.4g degC%s", name, t, assumed)
}

// missing notes a cause for which there is no figure.
func (b *tally) missing(format string, args ...any) {
	b.Missing = append(b.Missing, fmt.Sprintf(format, args...))
}
