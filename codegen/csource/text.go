package csource

import (
	"fmt"
	"strings"
	"unicode/utf8"
)

// Comment makes a text harmless inside a C comment: no comment mark, no line
// break, no backslash before a line break, no trigraph, no control character
// and nothing that turns the direction of writing.
func Comment(s string) string {
	s = harmless(s)
	s = strings.ReplaceAll(s, "*/", "* /")
	s = strings.ReplaceAll(s, "/*", "/ *")
	s = strings.ReplaceAll(s, "//", "/ /")
	s = strings.ReplaceAll(s, "??", "? ?")
	s = strings.ReplaceAll(s, "??", "? ?")
	return strings.ReplaceAll(s, `\`, "/")
}

// harmless replaces control characters, line breaks, invalid bytes and
// characters that are invisible or turn the direction of writing.
func harmless(s string) string {
	return strings.Map(func(r rune) rune {
		switch {
		case r == '\n' || r == '\r' || r == '\t' || r == 0x2028 || r == 0x2029 || r == 0x85:
			return ' '
		case r < 0x20, r >= 0x7f && r < 0xa0, r == 0xad, r == 0x61c, r >= 0x200b && r <= 0x200f,
			r >= 0x202a && r <= 0x202e, r >= 0x2060 && r <= 0x206f, r == 0xfeff, r == utf8.RuneError:
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
