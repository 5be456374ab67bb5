package survey

import (
	"bytes"
	"flag"
	"fmt"
	"os"
	"path/filepath"
	"regexp"
	"strings"
	"testing"

	"github.com/google/go-cmp/cmp"
	"pgregory.net/rapid"
)

var update = flag.Bool("update", false, "rewrite the golden files")

// Each folder of testdata/bad holds a sheet and what has to be said about it.
func TestBadSheets(t *testing.T) {
	sheets, err := filepath.Glob("testdata/bad/*/sheet.yaml")
	if err != nil || len(sheets) < 200 {
		t.Fatalf("%d cases found: %v", len(sheets), err)
	}
	for _, sheet := range sheets {
		t.Run(filepath.Base(filepath.Dir(sheet)), func(t *testing.T) {
			data, err := os.ReadFile(sheet)
			if err != nil {
				t.Fatal(err)
			}
			_, diags := Read("sheet.yaml", data)
			if !diags.HasErrors() {
				t.Fatal("nothing was found wrong")
			}
			var lines []string
			for _, d := range diags {
				if d.Line < 1 || d.Fits == "" {
					t.Errorf("%v: has no place or does not say what would fit", d)
				}
				lines = append(lines, d.String())
			}
			golden(t, filepath.Join(filepath.Dir(sheet), "errors.txt"), strings.Join(lines, "\n")+"\n")
		})
	}
}

func golden(t *testing.T, file, got string) {
	t.Helper()
	if *update {
		if err := os.WriteFile(file, []byte(got), 0o666); err != nil {
			t.Fatal(err)
		}
	}
	want, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	if diff := cmp.Diff(string(want), got); diff != "" {
		t.Errorf("%s (- wanted, + got):\n%s", file, diff)
	}
}

func goodSheets(t *testing.T) map[string][]byte {
	t.Helper()
	all := map[string][]byte{"template": Template()}
	for _, pattern := range []string{"../examples/*/sheet.yaml", "../translate/testdata/scenarios/*/sheet.yaml", "testdata/good/*.yaml"} {
		files, err := filepath.Glob(pattern)
		if err != nil {
			t.Fatal(err)
		}
		for _, f := range files {
			data, err := os.ReadFile(f)
			if err != nil {
				t.Fatal(err)
			}
			all[f] = data
		}
	}
	if len(all) < 10 {
		t.Fatalf("only %d sheets found", len(all))
	}
	return all
}

func TestGoodSheets(t *testing.T) {
	for name, data := range goodSheets(t) {
		if _, diags := Read(name, data); len(diags) > 0 {
			t.Errorf("%s:\n%v", name, diags)
		}
	}
}

func nested(depth int) string {
	var b strings.Builder
	for i := 0; i < depth && b.Len() < 900_000; i++ {
		b.WriteString(strings.Repeat(" ", i) + "a:\n")
	}
	return b.String()
}

// Whatever is cut out of or put into a sheet: the reader says what is wrong,
// with a place, or takes it; it never fails otherwise.
func TestReadNeverFails(t *testing.T) {
	sheets := goodSheets(t)
	names := sortedKeys(sheets)
	rapid.Check(t, func(rt *rapid.T) {
		sheet := string(sheets[rapid.SampledFrom(names).Draw(rt, "sheet")])
		from := rapid.IntRange(0, len(sheet)).Draw(rt, "from")
		to := rapid.IntRange(from, min(from+40, len(sheet))).Draw(rt, "to")
		put := rapid.StringN(0, 12, 40).Draw(rt, "put")
		placed(rt, []byte(sheet[:from]+put+sheet[to:]))
	})
}

// One value of a good sheet in the place of another, and odd ones anywhere: what
// the reader takes reads back from its full form.
func TestValuesChangePlaces(t *testing.T) {
	sheets := goodSheets(t)
	names := sortedKeys(sheets)
	value := regexp.MustCompile(`: ([^{}\[\],#\n]+)`)
	odd := []string{"unknown", "0", "-1", "0 s", "1e9 s", "0 K", "100 %", "[1 K, 2 K]", "[]", "{}", "~", `""`, "true", "off", "open", "2x", "0 degC", "3000 degC", "1 ohm", "0.001 V", "9 A"}
	rapid.Check(t, func(rt *rapid.T) {
		sheet := string(sheets[rapid.SampledFrom(names).Draw(rt, "sheet")])
		places := value.FindAllStringSubmatchIndex(sheet, -1)
		at := places[rapid.IntRange(0, len(places)-1).Draw(rt, "place")]
		other := places[rapid.IntRange(0, len(places)-1).Draw(rt, "other")]
		put := rapid.SampledFrom(append(odd, sheet[other[2]:other[3]])).Draw(rt, "value")
		data := []byte(sheet[:at[2]] + put + sheet[at[3]:])
		s := placed(rt, data)
		if s == nil {
			return
		}
		if _, diags := Read("sheet.yaml", []byte(inFull(s))); diags.HasErrors() {
			rt.Fatalf("in full it does not read:\n%v\n%s", diags, inFull(s))
		}
	})
}

// placed reads a sheet and wants every message to have a place and to stay text;
// it gives the survey where there is no error.
func placed(rt *rapid.T, data []byte) *Survey {
	s, diags := Read("sheet.yaml", data)
	for _, d := range diags {
		if (d.Line < 1 || d.Col < 1) && !strings.HasPrefix(d.Summary, "and ") || d.Severity != Error || strings.ContainsAny(d.String(), "\x1b\x00\n") {
			rt.Fatalf("%q", d.String())
		}
	}
	if diags.HasErrors() {
		return nil
	}
	return s
}

// FuzzRead: whatever the bytes, there is a survey and messages that stay text;
// and a sheet without an error, printed in full, is a sheet without an error.
func FuzzRead(f *testing.F) {
	f.Add(Template())
	for _, pattern := range []string{"testdata/bad/*/sheet.yaml", "testdata/good/*.yaml"} {
		sheets, err := filepath.Glob(pattern)
		if err != nil {
			f.Fatal(err)
		}
		for _, s := range sheets {
			data, err := os.ReadFile(s)
			if err != nil {
				f.Fatal(err)
			}
			f.Add(data)
		}
	}
	f.Fuzz(func(t *testing.T, data []byte) {
		s, diags := Read("sheet.yaml", data)
		if s == nil {
			t.Fatal("no survey")
		}
		for _, d := range diags {
			if strings.ContainsAny(d.String(), "\x1b\x00\r\n\u202e") {
				t.Fatalf("a message could move the cursor: %q", d.String())
			}
		}
		if diags.HasErrors() {
			return
		}
		shown := inFull(s)
		if _, diags := Read("sheet.yaml", []byte(shown)); diags.HasErrors() {
			t.Fatalf("in full it does not read:\n%v\n%s", diags, shown)
		}
	})
}

func BenchmarkRead(b *testing.B) {
	data, err := os.ReadFile("../examples/calorifier/sheet.yaml")
	if err != nil {
		b.Fatal(err)
	}
	for b.Loop() {
		if _, diags := Read("sheet.yaml", data); diags.HasErrors() {
			b.Fatal(diags)
		}
	}
}

// A sheet with more slips than anybody reads says how many there are.
func TestManySlips(t *testing.T) {
	var b strings.Builder
	b.WriteString("format: 1\n")
	for i := range 300 {
		fmt.Fprintf(&b, "key%d: 1\n", i)
	}
	_, diags := Read("sheet.yaml", []byte(b.String()))
	last := diags[len(diags)-1]
	if len(diags) != mostDiagnostics+1 || last.Summary != "and 203 more" { // 300 keys, and three sections that are missing
		t.Errorf("%d diagnostics, the last one: %v", len(diags), last)
	}
}

// No text of a sheet, and no file name, moves a cursor or turns a line of a message.
func TestMessagesStayText(t *testing.T) {
	for text, want := range map[string]string{
		"\x1b[2J":    `\x1b[2J`,
		"\u202e":     `\u202e`,
		"\u009b":     `\x9b`,
		"\u2028":     `\u2028`,
		"\U000e0041": `\U000e0041`,
		"\ufeff":     `\ufeff`,
		"a\nb\tc":    `a b c`,
		"a\rb":       `a\x0db`,
		"Größe °F":   `Größe °F`,
	} {
		d := Diagnostic{Severity: Error, File: text, Line: 1, Col: 2, Path: text, Summary: text, Found: text, Fits: text}
		if got := d.String(); got != fmt.Sprintf("%[1]s:1:2: %[1]s: %[1]s: found %[1]s; fits %[1]s", want) {
			t.Errorf("%q: %q", text, got)
		}
	}
}

// hostile are files that are no sheets, each of its own kind.
func hostile() map[string][]byte {
	bomb := "a: &a [x,x,x,x,x,x,x,x]\n"
	for c := 'b'; c < 'z'; c++ {
		p := string(c - 1)
		bomb += string(c) + ": &" + string(c) + " [*" + strings.TrimSuffix(strings.Repeat(p+",*", 8), ",*") + "]\n"
	}
	var keys strings.Builder
	for i := range 100_000 {
		fmt.Fprintf(&keys, "k%d: 1\n", i)
	}
	return map[string][]byte{
		"50 MB":            bytes.Repeat([]byte("# much\n"), 50<<20/7),
		"alias bomb":       []byte(bomb),
		"brackets":         []byte("format: 1\nx: " + strings.Repeat("[", 200_000)),
		"brackets in text": []byte("format: 1\nloads:\n  - runs_when: \"" + strings.Repeat("(", 200_000) + "\"\n"),
		"nots in text":     []byte("format: 1\nloads:\n  - runs_when: \"" + strings.Repeat("not ", 50_000) + "x\"\n"),
		"indent":           []byte(nested(10_000)),
		"dashes":           []byte(strings.Repeat("- ", 200_000)),
		"one line":         []byte("format: " + strings.Repeat("1", 900_000)),
		"one key":          []byte(strings.Repeat("k", 900_000) + ": 1\n"),
		"many keys":        []byte(keys.String()),
		"turned lines":     bytes.Repeat([]byte("# \u202e\n"), 100_000),
	}
}

func TestHostileSizes(t *testing.T) {
	for name, data := range hostile() {
		_, diags := Read("sheet.yaml", data)
		if !diags.HasErrors() {
			t.Errorf("%s: nothing was said", name)
		}
		for _, d := range diags {
			if len(d.String()) > 1000 {
				t.Errorf("%s: a message of %d bytes", name, len(d.String()))
			}
		}
	}
}

func BenchmarkHostile(b *testing.B) {
	files := hostile()
	for _, name := range sortedKeys(files) {
		b.Run(name, func(b *testing.B) {
			for b.Loop() {
				Read("sheet.yaml", files[name])
			}
		})
	}
}
