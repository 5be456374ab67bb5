package survey

import (
	"fmt"
	"strconv"
	"strings"
	"unicode"
	"unicode/utf8"
)

// Hidden reports whether a character shows nothing of its own, moves a cursor,
// or turns the direction of writing (Unicode categories Cc and Cf, the line and
// paragraph separators, the variation selectors), or is no character at all: in
// such a text a reader does not see what it says (Boucher and Anderson, Trojan
// Source, 2021). Every form that text of a sheet reaches asks this one question.
func Hidden(r rune) bool {
	return r == utf8.RuneError || unicode.In(r, unicode.Cc, unicode.Cf, unicode.Zl, unicode.Zp, unicode.Variation_Selector) ||
		r >= 0xe0000 && r <= 0xe0fff // tags, assigned or not
}

// invisible is Hidden but for the breaks that a text of several lines has.
func invisible(r rune) bool { return r != '\n' && r != '\t' && Hidden(r) }

// misleading reports whether a character makes a sheet look other than a
// YAML reader sees it, comments included: control characters, lines that only
// some programs end, and turned writing.
func misleading(r rune) bool {
	switch {
	case r == '\n' || r == '\t' || r == '\r':
		return false
	case r < 0x20, r >= 0x7f && r < 0xa0, r == 0x2028, r == 0x2029:
		return true
	}
	return r == 0x61c || r == 0x200e || r == 0x200f || r >= 0x202a && r <= 0x202e || r >= 0x2066 && r <= 0x2069
}

// printable shows invisible characters as escapes, so that a text can do nothing
// to a file or a terminal.
func printable(s string) string {
	if strings.IndexFunc(s, invisible) < 0 {
		return s
	}
	var b strings.Builder
	for _, r := range s {
		switch {
		case !invisible(r):
			b.WriteRune(r)
		case r < 0x100:
			fmt.Fprintf(&b, `\x%02x`, r)
		case r <= 0xffff:
			fmt.Fprintf(&b, `\u%04x`, r)
		default:
			fmt.Fprintf(&b, `\U%08x`, r)
		}
	}
	return b.String()
}

// oneLine is printable without line breaks and tabs.
func oneLine(s string) string {
	return strings.NewReplacer("\n", " ", "\t", " ").Replace(printable(s))
}

// quote shows a text of the sheet in a message: in quotes, cut to a readable
// length, control and invisible characters as escapes.
func quote(s string) string { return strconv.Quote(clip(s, 60)) }

// clip cuts a text to n characters.
func clip(s string, n int) string {
	if r := []rune(s); len(r) > n {
		return string(r[:n]) + "…"
	}
	return s
}
