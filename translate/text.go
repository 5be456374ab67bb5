package translate

import (
	"fmt"
	"math"
	"strconv"
	"strings"
)

// number prints a value with at most the given decimals and no idle zeros.
func number(v float64, decimals int) string {
	s := strconv.FormatFloat(v, 'f', decimals, 64)
	if strings.Contains(s, ".") {
		s = strings.TrimRight(strings.TrimRight(s, "0"), ".")
	}
	if s == "-0" {
		return "0"
	}
	return s
}

// Degrees prints a temperature, Kelvins a difference.
func Degrees(v float64) string { return number(v, 2) + " degC" }
func Kelvins(v float64) string { return number(v, 2) + " K" }

// Span prints a time in the units a person would say it in.
func Span(seconds float64) string {
	switch {
	case math.IsInf(seconds, 1):
		return "for ever"
	case seconds < 0:
		return "-" + Span(-seconds)
	case seconds < 1:
		return number(seconds*1000, 1) + " ms"
	case seconds < 120:
		return number(seconds, 1) + " s"
	}
	total := int64(math.Round(seconds))
	var parts []string
	for _, u := range []struct {
		length int64
		name   string
	}{{86400, "d"}, {3600, "h"}, {60, "min"}, {1, "s"}} {
		if n := total / u.length; n > 0 {
			parts = append(parts, fmt.Sprintf("%d %s", n, u.name))
			total -= n * u.length
		}
		if len(parts) == 2 {
			break
		}
	}
	return strings.Join(parts, " ")
}
