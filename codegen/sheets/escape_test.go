package sheets

import (
	"encoding/csv"
	"encoding/json"
	"strings"
	"testing"

	"pgregory.net/rapid"

	"makebreak/survey"
)

var hostile = []string{
	"=1+1", "+1", "-2+3", "@SUM(A1)", "\tx", "\rx", "a,b", `a"b`, "a\nb", " leading", "| cell | <script>alert(1)</script>",
	"\x1b[31mred\x1b[0m", "\u202egnp.exe", "`code`", "[a](javascript:x)", "# heading", "~~~", "a\x00b", "caf\xe9", "_word_", "a_b_c",
	"\x00=1+1", " =1+1", "\u200b-cmd", "＝1+1", "\U000e0041tag", "__x__ y", "-1+1", "$x$", "\x9b31m", "a\r\nb",
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
	for _, n := range []string{"-1.5", "+3", "42", "-1e-7", "0.5", "-40"} {
		if got := CSV(nil, [][]string{{n}}); got != "\r\n"+n+"\r\n" {
			t.Errorf("the number %s comes out as %q", n, got)
		}
	}
}

// Text that a spreadsheet would work out has an apostrophe in front, whatever
// the program drops before it looks (OWASP, CSV Injection: = + - @ tab and
// carriage return, in full width too).
func TestCSVFormulas(t *testing.T) {
	for in, want := range map[string]string{
		"=1+1": "'=1+1", "+1+1": "'+1+1", "-1+1": "'-1+1", "@SUM(1)": "'@SUM(1)", "\tx": "' x", "\rx": "' x",
		"\x00=1+1": "' =1+1", " =1+1": "' =1+1", "＝1+1": "'＝1+1", "\u200b-cmd": "' -cmd", "-1.5": "-1.5", "a=b": "a=b", "": "",
	} {
		rows, err := csv.NewReader(strings.NewReader(CSV([]string{"a", "b"}, [][]string{{in, "x"}}))).ReadAll()
		if err != nil || rows[1][0] != want {
			t.Errorf("%q comes out as %q, want %q (%v)", in, rows[1][0], want, err)
		}
	}
}

// Every cell comes back from a CSV reader as it was, but for hidden characters,
// which are blanks, and the apostrophe.
func TestCSVRoundTrip(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		row := rapid.SliceOfN(rapid.OneOf(rapid.String(), rapid.SampledFrom(hostile)), 2, 4).Draw(rt, "row")
		rows, err := csv.NewReader(strings.NewReader(CSV(row, [][]string{row}))).ReadAll()
		if err != nil || len(rows) != 2 {
			rt.Fatalf("%v: %q", err, rows)
		}
		for i, c := range row {
			want := strings.Map(func(r rune) rune {
				if survey.Hidden(r) && r != '\n' {
					return ' '
				}
				return r
			}, c)
			if got := rows[1][i]; got != want && got != "'"+want {
				rt.Fatalf("%q comes back as %q", c, got)
			}
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
		"a\r\nb":              "a<br>b",
		"$x$":                 `\$x\$`,
		// With the inner underscores left alone cmark 0.30.2 makes this emphasis.
		"__x__ y": `\_\_x\_\_ y`,
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
				if survey.Hidden(r) {
					rt.Fatalf("%s: %q still holds %U", name, got, r)
				}
			}
		}
		if strings.ContainsAny(Markdown(s), "<>") && !strings.Contains(strings.ReplaceAll(Markdown(s), "<br>", ""), "&") && strings.ContainsAny(strings.ReplaceAll(Markdown(s), "<br>", ""), "<>") {
			rt.Fatalf("%q holds a tag", Markdown(s))
		}
	})
}

// A reader of JSON gets every text back; what is hidden never stands there as
// it is.
func TestJSONRoundTrip(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		in := map[string]string{"text": strings.ToValidUTF8(rapid.String().Draw(rt, "text")+rapid.SampledFrom(hostile).Draw(rt, "hostile"), "?")}
		data, err := JSON(in)
		if err != nil {
			rt.Fatal(err)
		}
		for _, r := range string(data) {
			if r != '\n' && survey.Hidden(r) {
				rt.Fatalf("%q holds %U", data, r)
			}
		}
		var out map[string]string
		if err := json.Unmarshal(data, &out); err != nil || out["text"] != in["text"] {
			rt.Fatalf("%v: %q comes back as %q", err, in["text"], out["text"])
		}
	})
}

// Escaping for the terminal leaves ordinary text alone.
func TestVisible(t *testing.T) {
	for in, want := range map[string]string{
		"60 °C, ± 3 K, 温度":      "60 °C, ± 3 K, 温度",
		"\x1b[2Jgone":           "<U+001B>[2Jgone",
		"\x9b31m":               "<U+FFFD>31m", // no character: a lone byte
		"\u009b31m":             "<U+009B>31m",
		"\u202egnp.exe\u2066":   "<U+202E>gnp.exe<U+2066>",
		"two\nlines\tand\rmore": "two lines and<U+000D>more",
		"\U000e0041":            "<U+E0041>",
	} {
		if got := Visible(in); got != want {
			t.Errorf("%q comes out as %q, want %q", in, got, want)
		}
	}
}
