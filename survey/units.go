package survey

import (
	"fmt"
	"math"
	"strconv"
	"strings"
	"unicode/utf8"
)

// A dimension says which units a quantity may carry, and what it is stored in.
type dimension struct {
	stored  string // unit of the stored value
	units   []unit // from the largest, as they follow each other in a compound
	example string
	signed  bool // negative values make sense
}

// A unit is times/over of the stored unit. Kept apart, the two give the nearest
// value that a float64 has: 0.75 % is 0.0075, where 0.75 × 0.01 is not.
type unit struct {
	name        string
	times, over float64
}

// Signs that keyboards and documents give in two forms each (Unicode, NFKC).
const (
	micro   = "\u00b5" // micro sign
	mu      = "\u03bc" // Greek small letter mu
	omega   = "\u03a9" // Greek capital letter omega
	ohmSign = "\u2126" // ohm sign
)

var dimensions = map[string]dimension{
	"temperature":        {stored: "degC", units: []unit{{"degC", 1, 1}, {"°C", 1, 1}, {"degF", 5, 9}, {"°F", 5, 9}, {"K", 1, 1}}, example: "60 degC", signed: true},
	"interval":           {stored: "K", units: []unit{{"K", 1, 1}, {"degC", 1, 1}, {"°C", 1, 1}, {"degF", 5, 9}, {"°F", 5, 9}}, example: "6 K"},
	"time":               {stored: "s", units: timeUnits, example: "9 min 30 s"},
	"voltage":            {stored: "V", units: []unit{{"kV", 1000, 1}, {"V", 1, 1}, {"mV", 1, 1e3}, {"uV", 1, 1e6}, {micro + "V", 1, 1e6}, {mu + "V", 1, 1e6}}, example: "230 V", signed: true},
	"current":            {stored: "A", units: []unit{{"A", 1, 1}, {"mA", 1, 1e3}, {"uA", 1, 1e6}, {micro + "A", 1, 1e6}, {mu + "A", 1, 1e6}}, example: "10 A"},
	"power":              {stored: "W", units: []unit{{"kW", 1000, 1}, {"W", 1, 1}, {"mW", 1, 1e3}}, example: "9 kW"},
	"resistance":         {stored: "ohm", units: []unit{{"Mohm", 1e6, 1}, {"M" + omega, 1e6, 1}, {"M" + ohmSign, 1e6, 1}, {"kohm", 1000, 1}, {"k" + omega, 1000, 1}, {"k" + ohmSign, 1000, 1}, {"ohm", 1, 1}, {omega, 1, 1}, {ohmSign, 1, 1}, {"mohm", 1, 1e3}}, example: "10 kohm"},
	"share":              {stored: "", units: []unit{{"%", 1, 100}}, example: "5 %"},
	"rate":               {stored: "/s", units: []unit{{"/s", 1, 1}, {"/min", 1, 60}, {"/h", 1, 3600}}, example: "90 /min"},
	"length":             {stored: "m", units: []unit{{"m", 1, 1}, {"cm", 1, 100}, {"mm", 1, 1e3}}, example: "8 mm"},
	"voltage_per_kelvin": {stored: "V/K", units: []unit{{"V/K", 1, 1}, {"mV/K", 1, 1e3}, {"uV/K", 1, 1e6}, {micro + "V/K", 1, 1e6}, {mu + "V/K", 1, 1e6}}, example: "-2 mV/K", signed: true},
	"dissipation":        {stored: "W/K", units: []unit{{"W/K", 1, 1}, {"mW/K", 1, 1e3}}, example: "2 mW/K"},
	"thermal_resistance": {stored: "K/W", units: []unit{{"K/W", 1, 1}}, example: "12 K/W"},
}

// timeUnits: a month and a year are the mean ones of the Julian calendar,
// 30.4375 and 365.25 days.
var timeUnits = []unit{
	{"year", 31557600, 1}, {"years", 31557600, 1}, {"month", 2629800, 1}, {"months", 2629800, 1}, {"week", 604800, 1}, {"weeks", 604800, 1},
	{"day", 86400, 1}, {"days", 86400, 1}, {"d", 86400, 1}, {"h", 3600, 1}, {"min", 60, 1}, {"s", 1, 1}, {"ms", 1, 1e3},
}

// A misfit is why a text is not the value that its key wants.
type misfit struct{ found, fits string }

const (
	absoluteZero = -273.15 // degC
	hottest      = 3500.0  // degC, about the melting point of tungsten
	largest      = 1e15    // of any stored unit
)

func (d dimension) find(name string) (unit, bool) {
	for _, u := range d.units {
		if u.name == name {
			return u, true
		}
	}
	return unit{}, false
}

func (d dimension) unitNames() []string {
	var names []string
	for _, u := range d.units {
		names = append(names, u.name)
	}
	return names
}

// listed names the units for a message: of two signs that look the same, one.
func (d dimension) listed() string {
	var names []string
	for _, n := range d.unitNames() {
		if !strings.ContainsAny(n, mu+ohmSign) {
			names = append(names, n)
		}
	}
	return strings.Join(names, ", ")
}

// mixed are the keys that take a quantity of more than one dimension; which one
// fits is for the key's section to say.
var mixed = map[string][]string{
	"volt_or_ampere": {"voltage", "current"},
	"reading_error":  {"voltage", "current", "interval"},
}

// quantity reads a number with its unit in a dimension and gives it in the
// dimension's stored unit. A time may have several parts, the larger first.
func quantity(text, dim string) (float64, *misfit) {
	if parts, ok := mixed[dim]; ok {
		for _, p := range parts[:len(parts)-1] {
			if v, m := quantity(text, p); m == nil {
				return v, nil
			}
		}
		return quantity(text, parts[len(parts)-1])
	}
	d := dimensions[dim]
	terms, m := d.terms(text)
	switch {
	case m != nil:
		return 0, m
	case len(terms) > 1 && dim != "time":
		return 0, &misfit{quote(text), "one quantity, such as " + d.example}
	case dim == "temperature":
		return onScale(text, terms[0])
	}
	total := 0.0
	for i, t := range terms {
		if i > 0 && t.times/t.over >= terms[i-1].times/terms[i-1].over {
			return 0, &misfit{quote(text), "the larger unit first and each one once, such as " + d.example}
		}
		if math.Signbit(t.n) && !d.signed {
			return 0, &misfit{quote(text), "not less than nothing"}
		}
		total += t.n * t.times / t.over
	}
	switch {
	case dim == "share" && total > 1:
		return 0, &misfit{quote(text), "0 % to 100 %"}
	case math.Abs(total) > largest:
		return 0, &misfit{quote(text), "a size that occurs in a plant"}
	}
	return total, nil
}

// onScale gives a point on a temperature scale in degC. 140 degF is exactly 60 degC.
func onScale(text string, t term) (float64, *misfit) {
	v := t.n
	switch t.name {
	case "degF", "°F":
		v = (t.n - 32) * 5 / 9
	case "K":
		v = t.n + absoluteZero
	}
	if v < absoluteZero-1e-9 || v > hottest {
		return 0, &misfit{quote(text), fmt.Sprintf("a temperature above absolute zero and below %g degC", hottest)}
	}
	return v, nil
}

// A term is one number with its unit.
type term struct {
	n float64
	unit
}

// terms reads all numbers and units of a quantity: one, or more for a time.
func (d dimension) terms(text string) ([]term, *misfit) {
	var ts []term
	for rest := strings.Trim(text, " "); rest != ""; {
		n, after, m := number(rest, text, d.example)
		if m != nil {
			return nil, m
		}
		rest = strings.TrimLeft(after, " ")
		name, tail, _ := strings.Cut(rest, " ")
		u, ok := d.find(name)
		if !ok {
			return nil, d.noUnit(text, name, rest)
		}
		ts, rest = append(ts, term{n, u}), strings.TrimLeft(tail, " ")
	}
	if len(ts) == 0 {
		return nil, &misfit{"nothing", "a quantity with its unit, such as " + d.example}
	}
	return ts, nil
}

// number reads the number at the front of rest.
func number(rest, text, example string) (n float64, after string, m *misfit) {
	end := len(numberForm.FindString(rest))
	if end == 0 {
		return 0, "", &misfit{quote(text), "a quantity with its unit, such as " + example + strangeSign(rest)}
	}
	if end+1 < len(rest) && rest[end] == ',' && isDigit(rest[end+1]) {
		return 0, "", &misfit{quote(text), "a decimal point instead of the comma"}
	}
	if end < len(rest) && (isDigit(rest[end]) || rest[end] == '.') {
		return 0, "", &misfit{quote(text), "a quantity with its unit, such as " + example}
	}
	n, err := strconv.ParseFloat(rest[:end], 64)
	if err != nil || math.IsInf(n, 0) {
		return 0, "", &misfit{quote(text), "a quantity with its unit, such as " + example}
	}
	return n, rest[end:], nil
}

func isDigit(b byte) bool { return b >= '0' && b <= '9' }

// strangeSign names the typographic minus, which looks like a hyphen-minus.
func strangeSign(text string) string {
	if r, _ := utf8.DecodeRuneInString(text); r == '\u2212' || r == '\u2013' || r == '\u2014' {
		return "; with a plain minus sign (-) in front"
	}
	return ""
}

// noUnit says what is wrong with the unit and what was probably meant.
func (d dimension) noUnit(text, name, rest string) *misfit {
	fits := "one of the units " + d.listed() + "; such as " + d.example
	if name == "" {
		return &misfit{quote(text) + " without a unit", fits}
	}
	if near := d.meant(name); near != "" {
		return &misfit{"the unit " + quote(name), "did you mean " + near + "?"}
	}
	if near := d.meant(rest); near != "" {
		return &misfit{"the unit " + quote(rest), "did you mean " + near + "?"}
	}
	return &misfit{"the unit " + quote(name), fits}
}

// folds are the ways in which people write units, in lower case and without
// spaces, and the unit each of them is meant for.
var folds = map[string]string{
	"c": "degC", "celsius": "degC", "degreec": "degC", "degreesc": "degC", "degcelsius": "degC", "℃": "degC",
	"f": "degF", "fahrenheit": "degF", "degreef": "degF", "degreesf": "degF", "degfahrenheit": "degF", "℉": "degF",
	"degk": "K", "kelvin": "K", "kelvins": "K",
	"sec": "s", "secs": "s", "second": "s", "seconds": "s", "minute": "min", "minutes": "min", "mins": "min",
	"hr": "h", "hrs": "h", "hour": "h", "hours": "h", "msec": "ms", "millisecond": "ms", "milliseconds": "ms",
	"mo": "months", "yr": "years", "y": "years", "wk": "weeks",
	"volt": "V", "volts": "V", "amp": "A", "amps": "A", "ampere": "A", "amperes": "A", "watt": "W", "watts": "W",
	"r": "ohm", "ohms": "ohm", "k": "kohm", "kr": "kohm", "meg": "Mohm",
	"percent": "%", "pct": "%", "rpm": "/min", "1/min": "/min", "permin": "/min", "hz": "/s", "1/s": "/s", "1/h": "/h",
}

// meant gives the unit that a word was probably meant for, or nothing.
func (d dimension) meant(word string) string {
	fold := strings.NewReplacer(" ", "", "\u00a0", "", "\u2009", "", "\u202f", "", "º", "deg", "˚", "deg", "°", "deg").Replace(strings.ToLower(word))
	if u, ok := d.find(folds[fold]); ok {
		return u.name
	}
	var found unit
	for _, u := range d.units {
		switch {
		case strings.ReplaceAll(strings.ToLower(u.name), "°", "deg") != fold:
		case found.name == "":
			found = u
		case found.times/found.over != u.times/u.over:
			return "" // mohm or Mohm
		}
	}
	return found.name
}
