package survey

import (
	"math"
	"strconv"
	"strings"
)

// Patterns of numbers, for the reader and for the schema.
const (
	wholePattern  = `(0|[1-9][0-9]{0,8})`
	plainPattern  = `((0|[1-9][0-9]*)(\.[0-9]*)?|\.[0-9]+)([eE][+-]?[0-9]{1,3})?`
	numberPattern = `([0-9]+(\.[0-9]*)?|\.[0-9]+)([eE][+-]?[0-9]+)?`
)

func numberIn(text, unit string) (float64, *misfit) {
	switch unit {
	case "":
		return plain(text)
	case "multiple":
		return plain(strings.TrimSuffix(text, "x"))
	}
	return quantity(text, unit)
}

// plain reads a number without a unit. What YAML readers take for octal, hexadecimal
// or grouped digits is refused: 0755 would be two numbers to two readers.
func plain(text string) (float64, *misfit) {
	if v, err := strconv.ParseFloat(text, 64); err == nil && plainForm.MatchString(text) && math.Abs(v) <= largest {
		return v, nil
	}
	if v := strings.Replace(text, ",", ".", 1); v != text && plainForm.MatchString(v) {
		return 0, &misfit{quote(text), "a decimal point instead of the comma"}
	}
	return 0, &misfit{quote(text), "a plain number"}
}
