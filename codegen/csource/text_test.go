package csource_test

import (
	"strings"
	"testing"
	"unicode"
	"unicode/utf8"

	"pgregory.net/rapid"

	"makebreak/codegen/csource"
)

// hostile are texts that try to leave a comment or a string.
var hostile = []string{
	"*/ #error out /*", "*\\\n/ int broken;", `*\ int broken;`, "ends in a backslash \\", "/* again", "// line\nint broken;",
	"??/", "??/\nint broken;", "*??/\n/ int broken;", "???/", "\"; int broken; \"", `\"; int broken;`, "%s %n %d", "\x00zero", "\r\n#error",
	"\u202e reversed \u2066", "\u2028#error", "\xff\xfe", "Ω 60 °C", "\x1b[31mred", "a\u200bb", "*\u200b/", "*\x00/", `\??/`, `*?/\/`,
}

// texts draws texts that are rich in what C might misread.
func texts() *rapid.Generator[string] {
	return rapid.Map(rapid.SliceOf(rapid.SampledFrom([]string{
		"*", "/", `\`, "?", "\n", "\r", "\t", `"`, "'", "%", " ", "=", "(", "a", "7", "\x00", "\x7f", "\xff", "\u2028", "\u202e", "\u200b", "é", "\U0001F525",
	})), func(parts []string) string { return strings.Join(parts, "") })
}

// closesNothing reports what a C compiler could see in a comment's text.
func closesNothing(s string) string {
	for _, bad := range []string{"*/", "/*", "//", "??", `\`, "\n", "\r", "\x00"} {
		if strings.Contains(s, bad) {
			return bad
		}
	}
	return ""
}

func TestCommentIsHarmless(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) { commentIsHarmless(t, texts().Draw(t, "text")) })
}

func FuzzComment(f *testing.F) {
	for _, h := range hostile {
		f.Add(h)
	}
	f.Fuzz(func(t *testing.T, s string) { commentIsHarmless(t, s) })
}

type failer interface {
	Errorf(format string, args ...any)
}

func commentIsHarmless(t failer, s string) {
	got := csource.Comment(s)
	if bad := closesNothing(got); bad != "" {
		t.Errorf("Comment(%q) = %q holds %q", s, got, bad)
	}
	if csource.Comment(got) != got {
		t.Errorf("Comment(%q) = %q changes when done again: %q", s, got, csource.Comment(got))
	}
	for _, r := range got {
		if !unicode.IsPrint(r) || r == utf8.RuneError {
			t.Errorf("Comment(%q) holds %U", s, r)
		}
	}
}

func TestStringIsHarmless(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) { stringIsHarmless(t, texts().Draw(t, "text")) })
}

func FuzzString(f *testing.F) {
	for _, h := range hostile {
		f.Add(h)
	}
	f.Fuzz(func(t *testing.T, s string) { stringIsHarmless(t, s) })
}

// stringIsHarmless reads the literal back by the rules of C (ISO/IEC 9899:1999,
// 6.4.4.4: simple and octal escapes; 5.2.1.1: trigraphs come first).
func stringIsHarmless(t failer, s string) {
	lit := csource.String(s)
	if strings.Contains(lit, "??") {
		t.Errorf("String(%q) = %s holds a trigraph's beginning", s, lit)
	}
	var back strings.Builder
	body := lit[1 : len(lit)-1]
	for i := 0; i < len(body); i++ {
		c := body[i]
		switch {
		case c < 0x20 || c > 0x7e || c == '"':
			t.Errorf("String(%q) = %s: byte %#x as it stands", s, lit, c)
		case c != '\\':
			back.WriteByte(c)
		case body[i+1] >= '0' && body[i+1] <= '7':
			back.WriteByte((body[i+1]-'0')<<6 | (body[i+2]-'0')<<3 | (body[i+3] - '0'))
			i += 3
		default:
			back.WriteByte(body[i+1])
			i++
		}
	}
	plain := true
	for _, r := range s {
		plain = plain && r != utf8.RuneError && unicode.IsPrint(r) && (r == ' ' || !unicode.IsSpace(r))
	}
	if plain && back.String() != s {
		t.Errorf("String(%q) = %s means %q", s, lit, back.String())
	}
	if !utf8.ValidString(back.String()) {
		t.Errorf("String(%q) means %q: not UTF-8", s, back.String())
	}
}
