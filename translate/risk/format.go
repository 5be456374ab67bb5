package risk

import (
	"math"
	"strconv"
	"strings"
)

// number prints a value with at most so many decimals, and no more than it
// needs; unknown where it is not a number.
func number(v float64, decimals int) string {
	if math.IsNaN(v) || math.IsInf(v, 0) {
		return unknown
	}
	text := strconv.FormatFloat(v, 'f', decimals, 64)
	if strings.Contains(text, ".") {
		text = strings.TrimRight(strings.TrimRight(text, "0"), ".")
	}
	if text == "-0" {
		return "0"
	}
	return text
}

func withUnit(v float64, decimals int, unit string) string {
	if text := number(v, decimals); text != unknown {
		return text + " " + unit
	}
	return unknown
}

// Celsius prints a temperature in degC.
func Celsius(v float64) string { return withUnit(v, 2, "degC") }

// Kelvin prints a temperature difference in K.
func Kelvin(v float64) string { return withUnit(v, 2, "K") }

// Amps prints a current in A, or mA where it is small.
func Amps(v float64) string {
	if math.Abs(v) < 0.1 && v != 0 {
		return withUnit(v*1000, 2, "mA")
	}
	return withUnit(v, 2, "A")
}

// Percent prints a fraction of one as a share of a hundred.
func Percent(v float64) string { return withUnit(v*100, 1, "%") }

// Years prints a number of years.
func Years(v float64) string { return withUnit(v, 1, "years") }

// Duration prints a time in s as one writes it on a sheet: 9 min 30 s.
func Duration(v float64) string {
	if math.IsNaN(v) || math.IsInf(v, 0) {
		return unknown
	}
	if v < 0 {
		return "-" + Duration(-v)
	}
	if v < 1 && v > 0 {
		return withUnit(v*1000, 0, "ms")
	}
	if v < 60 {
		return withUnit(v, 1, "s")
	}
	rest := int64(math.Round(v))
	var parts []string
	for _, u := range []struct {
		seconds int64
		unit    string
	}{{86400, "d"}, {3600, "h"}, {60, "min"}, {1, "s"}} {
		if n := rest / u.seconds; n > 0 {
			parts = append(parts, strconv.FormatInt(n, 10)+" "+u.unit)
			rest -= n * u.seconds
		}
	}
	return strings.Join(parts, " ")
}

// joined prints a list of words as one says it.
func joined(list []string) string {
	if len(list) == 0 {
		return "none"
	}
	return strings.Join(list, ", ")
}
