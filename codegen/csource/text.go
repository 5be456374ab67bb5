package csource

import (
	"fmt"
	"strings"
	"unicode"

	"makebreak/survey"
)

// Comment makes a text harmless inside a C comment: no comment mark, no line
// break, no backslash before a line break, no trigraph, no control character
// and nothing that is invisible or turns the direction of writing. A backslash
// becomes a slash, and the two characters of a mark are put apart.
func Comment(s string) string {
	var b strings.Builder
	before := rune(0)
	for _, r := range harmless(s) {
		if r == '\\' {
			r = '/'
		}
		if apart(before, r) {
			b.WriteByte(' ')
		}
		b.WriteRune(r)
		before = r
	}
	return b.String()
}

// apart reports whether two characters beside each other mean something in C
// inside a comment: an end, another beginning, half a trigraph.
func apart(a, b rune) bool {
	return a == '*' && b == '/' || a == '/' && (b == '*' || b == '/') || a == '?' && b == '?'
}

// harmless replaces control characters, line breaks, invalid bytes and
// characters that are invisible or turn the direction of writing.
func harmless(s string) string {
	return strings.Map(func(r rune) rune {
		switch {
		case r == '\n' || r == '\r' || r == '\t' || r == '\v' || r == '\f' || r == 0x85 || unicode.Is(unicode.Z, r):
			return ' '
		case survey.Hidden(r) || !unicode.IsPrint(r):
			return '?'
		}
		return r
	}, s)
}

// String gives a text as a C string literal, quotes included. Whatever is not
// plain ASCII becomes octal escapes of its UTF-8 bytes, which end by
// themselves after three digits.
func String(s string) string {
	var b strings.Builder
	b.WriteByte('"')
	s = harmless(s)
	for i := 0; i < len(s); i++ {
		switch c := s[i]; {
		case c == '"' || c == '\\':
			b.WriteByte('\\')
			b.WriteByte(c)
		case c == '?': // no trigraph
			b.WriteString(`\?`)
		case c < 0x20 || c >= 0x7f:
			fmt.Fprintf(&b, `\%03o`, c)
		default:
			b.WriteByte(c)
		}
	}
	b.WriteByte('"')
	return b.String()
}
