// Package sheets prints the pack's papers: risks, functions, commissioning and
// the machine-readable specification. Text of the survey sheet is hostile; it
// is defused here for each form that it reaches.
package sheets

import (
	"fmt"
	"strings"
	"unicode/utf8"
)

// hidden reports characters that a reader cannot see or that turn the
// direction of writing, and bytes that are no character.
func hidden(r rune) bool {
	switch {
	case r < 0x20, r >= 0x7f && r < 0xa0, r == 0xad, r == 0x61c, r >= 0x200b && r <= 0x200f,
		r >= 0x2028 && r <= 0x202e, r >= 0x2060 && r <= 0x206f, r == 0xfeff, r == utf8.RuneError:
		return true
	}
	return false
}

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
		case hidden(r):
			fmt.Fprintf(&b, "<U+%04X>", r)
		default:
			b.WriteRune(r)
		}
	}
	return b.String()
}

// Markdown makes text stand for itself in Markdown, also in a table cell. An
// underscore inside a word is left alone: there it means nothing (CommonMark
// 0.31, 6.2).
func Markdown(s string) string {
	var b strings.Builder
	runes := []rune(s)
	for i, r := range runes {
		switch {
		case r == '_' && i > 0 && i+1 < len(runes) && wordRune(runes[i-1]) && wordRune(runes[i+1]):
			b.WriteRune(r)
		case r == '\n':
			b.WriteString("<br>")
		case r == '\t':
			b.WriteByte(' ')
		case hidden(r):
			fmt.Fprintf(&b, "U+%04X", r)
		case r == '<':
			b.WriteString("&lt;")
		case r == '>':
			b.WriteString("&gt;")
		case r == '&':
			b.WriteString("&amp;")
		case strings.ContainsRune("\\`*_[]|~#!", r):
			b.WriteByte('\\')
			b.WriteRune(r)
		default:
			b.WriteRune(r)
		}
	}
	return b.String()
}

func wordRune(r rune) bool {
	return r == '_' || r >= '0' && r <= '9' || r >= 'a' && r <= 'z' || r >= 'A' && r <= 'Z'
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
	if s != "" && strings.ContainsRune("=+-@\t\r", rune(s[0])) && !numeric(s) {
		s = "'" + s
	}
	s = strings.Map(func(r rune) rune {
		if hidden(r) && r != '\n' {
			return ' '
		}
		return r
	}, s)
	if strings.ContainsAny(s, ",\"\n") || strings.TrimSpace(s) != s {
		return `"` + strings.ReplaceAll(s, `"`, `""`) + `"`
	}
	return s
}

// numeric reports a plain number, which may begin with a sign.
func numeric(s string) bool {
	digits, points := 0, 0
	for i := 0; i < len(s); i++ {
		switch c := s[i]; {
		case c >= '0' && c <= '9':
			digits++
		case c == '.':
			points++
		case (c == '-' || c == '+') && i == 0:
		default:
			return false
		}
	}
	return digits > 0 && points <= 1
}
