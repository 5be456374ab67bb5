package sheets

import (
	"strconv"

	"makebreak/translate"
)

func degrees(v float64) string { return strconv.FormatFloat(v, 'f', 1, 64) + " degC" }
func kelvins(v float64) string { return strconv.FormatFloat(v, 'f', 1, 64) + " K" }

// span prints seconds as a person would say them.
func span(seconds float64) string { return translate.Span(seconds) }
