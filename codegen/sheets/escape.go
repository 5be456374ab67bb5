// Package sheets prints the pack's papers: risks, functions, commissioning and
// the machine-readable specification. Text of the survey sheet is hostile; it
// is defused here for each form that it reaches.
package sheets

import (
	"fmt"
	"strconv"
	"strings"
	"unicode"
	"unicode/utf8"

	"makebreak/survey"
)

// Visible shows hidden characters as escapes, so that text cannot move a
// terminal's cursor, change its colours or write backwards.
func Visible(s string) string {
	var b strings.Builder
	for _, r := range s {
		switch {
		case r == '\n':
			b.WriteByte(' ')
		case r == '\t':
			b.WriteByte(' ')
		case survey.Hidden(r):
			fmt.Fprintf(&b, "<U+%04X>", r)
		default:
			b.WriteRune(r)
		}
	}
	return b.String()
}

// Markdown makes text stand for itself in Markdown, also in a table cell. A
// single underscore inside a word is left alone: there it means nothing
// (CommonMark 0.31, 6.2).
func Markdown(s string) string {
	var b strings.Builder
	runes := []rune(strings.ReplaceAll(s, "\r\n", "\n"))
	for i, r := range runes {
		switch {
		case r == '_' && i > 0 && i+1 < len(runes) && wordRune(runes[i-1]) && wordRune(runes[i+1]):
			b.WriteRune(r)
		case r == '\n':
			b.WriteString("<br>")
		case r == '\t':
			b.WriteByte(' ')
		case survey.Hidden(r):
			fmt.Fprintf(&b, "U+%04X", r)
		case r == '<':
			b.WriteString("&lt;")
		case r == '>':
			b.WriteString("&gt;")
		case r == '&':
			b.WriteString("&amp;")
		case strings.ContainsRune("\\`*_[]|~#!$", r):
			b.WriteByte('\\')
			b.WriteRune(r)
		default:
			b.WriteRune(r)
		}
	}
	return b.String()
}

func wordRune(r rune) bool {
	return r >= '0' && r <= '9' || r >= 'a' && r <= 'z' || r >= 'A' && r <= 'Z'
}

// CSV prints rows by RFC 4180. A text that a spreadsheet would take for a
// formula gets an apostrophe in front.
func CSV(header []string, rows [][]string) string {
	var b strings.Builder
	line := func(cells []string) {
		for i, c := range cells {
			if i > 0 {
				b.WriteByte(',')
			}
			b.WriteString(cell(c))
		}
		b.WriteString("\r\n")
	}
	line(header)
	for _, r := range rows {
		line(r)
	}
	return b.String()
}

func cell(s string) string {
	if formula(s) {
		s = "'" + s
	}
	s = strings.Map(func(r rune) rune {
		if survey.Hidden(r) && r != '\n' {
			return ' '
		}
		return r
	}, s)
	if strings.ContainsAny(s, ",\"\n") || strings.TrimSpace(s) != s {
		return `"` + strings.ReplaceAll(s, `"`, `""`) + `"`
	}
	return s
}

// formula reports text that a spreadsheet may work out instead of showing it:
// it begins with one of = + - @, in common or full width, or with a tab or a
// carriage return (OWASP, CSV Injection). Blanks and hidden characters in
// front do not count, for some programs drop them. A number is no formula.
func formula(s string) bool {
	if s != "" && (s[0] == '\t' || s[0] == '\r') {
		return true
	}
	s = strings.TrimLeftFunc(s, func(r rune) bool { return unicode.IsSpace(r) || survey.Hidden(r) })
	first, _ := utf8.DecodeRuneInString(s)
	return s != "" && strings.ContainsRune("=+-@＝＋－＠", first) && !numeric(s)
}

// numeric reports a plain decimal number, with sign and exponent or without.
func numeric(s string) bool {
	if strings.Trim(s, "0123456789.eE+-") != "" {
		return false
	}
	_, err := strconv.ParseFloat(s, 64)
	return err == nil
}
