package survey

import (
	"fmt"
	"math"
	"strconv"
	"strings"
)

// A dimension says which units a quantity may carry, and what it is stored in.
type dimension struct {
	stored  string             // unit of the stored value
	units   map[string]float64 // unit → factor to the stored one
	example string
	signed  bool // negative values make sense
}

// Temperatures are points on a scale and have functions instead of factors.
var dimensions = map[string]dimension{
	"interval":           {"K", map[string]float64{"K": 1, "degC": 1, "°C": 1, "degF": 5.0 / 9, "°F": 5.0 / 9}, "6 K", false},
	"time":               {"s", timeUnits, "9 min 30 s", false},
	"voltage":            {"V", map[string]float64{"V": 1, "mV": 1e-3, "uV": 1e-6, "µV": 1e-6, "kV": 1e3}, "230 V", true},
	"current":            {"A", map[string]float64{"A": 1, "mA": 1e-3, "uA": 1e-6, "µA": 1e-6}, "10 A", false},
	"power":              {"W", map[string]float64{"W": 1, "kW": 1e3, "mW": 1e-3}, "9 kW", false},
	"resistance":         {"ohm", map[string]float64{"ohm": 1, "Ω": 1, "kohm": 1e3, "kΩ": 1e3, "Mohm": 1e6, "MΩ": 1e6, "mohm": 1e-3}, "10 kohm", false},
	"share":              {"", map[string]float64{"%": 0.01}, "5 %", false},
	"rate":               {"/s", map[string]float64{"/s": 1, "/min": 1.0 / 60, "/h": 1.0 / 3600}, "90 /min", false},
	"length":             {"m", map[string]float64{"mm": 1e-3, "cm": 1e-2, "m": 1}, "8 mm", false},
	"voltage_per_kelvin": {"V/K", map[string]float64{"mV/K": 1e-3, "V/K": 1, "uV/K": 1e-6, "µV/K": 1e-6}, "-2 mV/K", true},
	"dissipation":        {"W/K", map[string]float64{"mW/K": 1e-3, "W/K": 1}, "2 mW/K", false},
	"thermal_resistance": {"K/W", map[string]float64{"K/W": 1}, "12 K/W", false},
}

var timeUnits = map[string]float64{
	"ms": 1e-3, "s": 1, "min": 60, "h": 3600, "d": 86400, "day": 86400, "days": 86400,
	"week": 604800, "weeks": 604800, "month": 2629800, "months": 2629800, "year": 31557600, "years": 31557600,
}

// A misfit is why a text is not the value that its key wants.
type misfit struct{ found, fits string }

// absoluteZero in degC.
const absoluteZero = -273.15

// quantity reads a number with its unit in a dimension.
func quantity(text, dim string) (float64, *misfit) {
	if dim == "temperature" {
		return temperature(text)
	}
	if dim == "volt_or_ampere" {
		if v, m := quantity(text, "voltage"); m == nil {
			return v, nil
		}
		return quantity(text, "current")
	}
	d := dimensions[dim]
	total, parts := 0.0, 0
	rest := strings.TrimSpace(text)
	for rest != "" {
		n, unit, after, m := term(rest, d.example)
		if m != nil {
			return 0, m
		}
		factor, ok := d.units[unit]
		if !ok {
			return 0, unitMisfit(text, unit, d)
		}
		total += n * factor
		parts++
		rest = after
	}
	switch {
	case parts == 0:
		return 0, &misfit{"nothing", "a quantity with its unit, such as " + d.example}
	case parts > 1 && dim != "time":
		return 0, &misfit{quote(text), "one quantity, such as " + d.example}
	case total < 0 && !d.signed:
		return 0, &misfit{quote(text), "not less than nothing"}
	case dim == "share" && total > 1:
		return 0, &misfit{quote(text), "0 % to 100 %"}
	case total > 1e15:
		return 0, &misfit{quote(text), "a size that occurs in a plant"}
	}
	return total, nil
}

// term reads one number and the unit behind it from the front of a text.
func term(text, example string) (n float64, unit, rest string, m *misfit) {
	end := 0
	for end < len(text) && strings.ContainsRune("+-0123456789.eE", rune(text[end])) {
		// an e is part of the number only before a digit or a sign
		if (text[end] == 'e' || text[end] == 'E') && (end+1 >= len(text) || !strings.ContainsRune("+-0123456789", rune(text[end+1]))) {
			break
		}
		end++
	}
	if end < len(text) && text[end] == ',' {
		return 0, "", "", &misfit{quote(text), "a decimal point instead of the comma"}
	}
	n, err := strconv.ParseFloat(text[:end], 64)
	if err != nil || math.IsInf(n, 0) || math.IsNaN(n) {
		return 0, "", "", &misfit{quote(text), "a quantity with its unit, such as " + example}
	}
	rest = strings.TrimLeft(text[end:], " ")
	stop := strings.IndexByte(rest, ' ')
	if stop < 0 {
		stop = len(rest)
	}
	unit, rest = rest[:stop], strings.TrimSpace(rest[stop:])
	return n, unit, rest, nil
}

func unitMisfit(text, unit string, d dimension) *misfit {
	fits := "one of the units " + strings.Join(sortedKeys(d.units), ", ") + "; such as " + d.example
	if unit == "" {
		return &misfit{quote(text) + " without a unit", fits}
	}
	return &misfit{"the unit " + quote(unit), fits}
}

// temperature reads a point on a scale into degC. 140 degF is exactly 60 degC.
func temperature(text string) (float64, *misfit) {
	n, unit, rest, m := term(strings.TrimSpace(text), "60 degC")
	if m != nil {
		return 0, m
	}
	var v float64
	switch {
	case rest != "":
		return 0, &misfit{quote(text), "one temperature, such as 60 degC"}
	case unit == "degC" || unit == "°C":
		v = n
	case unit == "degF" || unit == "°F":
		v = (n - 32) * 5 / 9
	case unit == "K":
		v = n + absoluteZero
	case unit == "":
		return 0, &misfit{quote(text) + " without a unit", "degC, °C, degF, °F or K; such as 60 degC"}
	case unit == "C" || unit == "F":
		return 0, &misfit{"the unit " + quote(unit), "did you mean deg" + unit + "?"}
	default:
		return 0, &misfit{"the unit " + quote(unit), "degC, °C, degF, °F or K; such as 60 degC"}
	}
	if v < absoluteZero-1e-9 || v > 3500 {
		return 0, &misfit{quote(text), "a temperature above absolute zero and below 3500 degC"}
	}
	return v, nil
}

func quote(s string) string {
	if len(s) > 60 {
		s = s[:60] + "…"
	}
	return fmt.Sprintf("%q", s)
}
