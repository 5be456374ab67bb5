package sheets

import (
	"encoding/csv"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

var hostile = []string{
	"=1+1", "+1", "-2+3", "@SUM(A1)", "\tx", "\rx", "a,b", `a"b`, "a\nb", " leading", "| cell | <script>alert(1)</script>",
	"\x1b[31mred\x1b[0m", "\u202egnp.exe", "`code`", "[a](javascript:x)", "# heading", "~~~", "a\x00b", "caf\xe9", "_word_", "a_b_c",
}

// What a CSV reader (encoding/csv, RFC 4180) gets back is the text, with an
// apostrophe in front of what a spreadsheet would take for a formula, and
// without characters that nobody sees.
func TestCSV(t *testing.T) {
	for _, h := range hostile {
		rows, err := csv.NewReader(strings.NewReader(CSV([]string{"a", "b"}, [][]string{{h, "x"}}))).ReadAll()
		if err != nil || len(rows) != 2 || len(rows[1]) != 2 || rows[1][1] != "x" {
			t.Fatalf("%q: %v %v", h, rows, err)
		}
		if got := rows[1][0]; got != "" && strings.ContainsRune("=+-@\t\r", rune(got[0])) && !numeric(got) {
			t.Errorf("%q comes out as the formula %q", h, got)
		}
	}
	for _, n := range []string{"-1.5", "+3", "42"} {
		if got := CSV(nil, [][]string{{n}}); got != "\r\n"+n+"\r\n" {
			t.Errorf("the number %s comes out as %q", n, got)
		}
	}
}

func TestCSVRoundTrip(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		cells := rapid.SliceOfN(rapid.String(), 1, 4).Draw(rt, "cells")
		rows, err := csv.NewReader(strings.NewReader(CSV(cells, [][]string{cells}))).ReadAll()
		if err != nil {
			rt.Fatal(err)
		}
		if len(rows) != 2 && !(len(cells) == 1 && len(rows) == 0) { // a reader skips lines that are empty
			rt.Fatalf("%d rows", len(rows))
		}
	})
}

func TestMarkdown(t *testing.T) {
	for in, want := range map[string]string{
		"a|b":                 `a\|b`,
		"<b>&":                "&lt;b&gt;&amp;",
		"limit_shares_pocket": "limit_shares_pocket",
		"_emphasis_":          `\_emphasis\_`,
		"two\nlines":          "two<br>lines",
		"`x` *y* [z](u)":      "\\`x\\` \\*y\\* \\[z\\](u)",
		"\u202eabc":           "U+202Eabc",
	} {
		if got := Markdown(in); got != want {
			t.Errorf("%q comes out as %q, want %q", in, got, want)
		}
	}
}

func TestNothingHiddenIsLeft(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		s := rapid.String().Draw(rt, "text") + rapid.SampledFrom(hostile).Draw(rt, "hostile")
		for name, got := range map[string]string{"terminal": Visible(s), "Markdown": Markdown(s)} {
			for _, r := range got {
				if hidden(r) {
					rt.Fatalf("%s: %q still holds %U", name, got, r)
				}
			}
		}
		if strings.ContainsAny(Markdown(s), "<>") && !strings.Contains(strings.ReplaceAll(Markdown(s), "<br>", ""), "&") && strings.ContainsAny(strings.ReplaceAll(Markdown(s), "<br>", ""), "<>") {
			rt.Fatalf("%q holds a tag", Markdown(s))
		}
	})
}
