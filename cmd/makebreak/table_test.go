package main

import (
	"bytes"
	"encoding/csv"
	"encoding/json"
	"strings"
	"testing"
	"unicode/utf8"

	"github.com/clipperhouse/displaywidth"
	"pgregory.net/rapid"
)

var (
	tableColumns = []string{"no", "finding", "old_outcome"}
	tableRows    = [][]string{
		{"1", "limit_shares_pocket", "What cools, scales or empties the pocket deceives both."},
		{"2", "a|b", "=1+1 <b>bold</b>\nsecond line"},
		{"3", "ünï 温度", "\x1b[31mred\x1b[0m \u202egnp.exe"},
	}
)

// The grid as a reviewer reads it: headers as they are, words whole, nothing cut.
const grid = `┌────┬─────────────────────┬──────────────────────────────┐
│ no │ finding             │ old_outcome                  │
├────┼─────────────────────┼──────────────────────────────┤
│ 1  │ limit_shares_pocket │ What cools, scales or        │
│    │                     │ empties the pocket deceives  │
│    │                     │ both.                        │
├────┼─────────────────────┼──────────────────────────────┤
│ 2  │ a|b                 │ =1+1 <b>bold</b> second line │
├────┼─────────────────────┼──────────────────────────────┤
│ 3  │ ünï 温度            │ <U+001B>[31mred<U+001B>[0m   │
│    │                     │ <U+202E>gnp.exe              │
└────┴─────────────────────┴──────────────────────────────┘
`

func TestGrid(t *testing.T) {
	var b bytes.Buffer
	if err := printGrid(&b, tableColumns, tableRows, 59); err != nil {
		t.Fatal(err)
	}
	if b.String() != grid {
		t.Errorf("got\n%s\nwant\n%s", b.String(), grid)
	}
}

// Long names are broken behind a stroke before anything sticks out.
func TestGridOnANarrowScreen(t *testing.T) {
	const want = `┌────┬─────────────┬─────────────┐
│ no │ finding     │ needed      │
├────┼─────────────┼─────────────┤
│ 1  │ proving_    │ seen_off_   │
│    │ switch_not_ │ before_     │
│    │ checked_    │ start: true │
│    │ open        │             │
└────┴─────────────┴─────────────┘
`
	var b bytes.Buffer
	if err := printGrid(&b, []string{"no", "finding", "needed"}, [][]string{{"1", "proving_switch_not_checked_open", "seen_off_before_start: true"}}, 34); err != nil {
		t.Fatal(err)
	}
	if b.String() != want {
		t.Errorf("got\n%s\nwant\n%s", b.String(), want)
	}
}

// Whatever the text and the width: no line is wider than the screen, every
// character of every cell is there, and nothing is left that moves a terminal.
func TestGridProperties(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		columns := []string{"a", "b_c"}
		width := rapid.IntRange(24, 200).Draw(rt, "width")
		row := []string{rapid.String().Draw(rt, "a"), rapid.StringMatching(`([a-z_/-]{1,60} ?){0,8}`).Draw(rt, "b")}
		var b bytes.Buffer
		if err := printGrid(&b, columns, [][]string{row}, width); err != nil {
			rt.Fatal(err)
		}
		if !utf8.Valid(b.Bytes()) || strings.ContainsAny(b.String(), "\x1b\r\t\u202e") {
			rt.Fatalf("%q reaches the terminal", b.String())
		}
		var cells [2]string
		for i, line := range strings.Split(strings.TrimSuffix(b.String(), "\n"), "\n") {
			if w := displaywidth.String(line); w > width {
				rt.Fatalf("%d columns wide, not %d: %s", w, width, line)
			}
			if i >= 3 && !strings.Contains(row[0], "│") && strings.HasPrefix(line, "│") {
				for j, c := range strings.Split(strings.Trim(line, "│"), "│") {
					cells[j] += c
				}
			}
		}
		for j, c := range row {
			if j == 0 && strings.Contains(c, "│") {
				return
			}
			if got, want := squeezed(cells[j]), squeezed(visible(c)); got != want {
				rt.Fatalf("cell %d: %q, want %q", j, got, want)
			}
		}
	})
}

func squeezed(s string) string { return strings.Join(strings.Fields(s), "") }

func TestTableForms(t *testing.T) {
	form := func(as string) string {
		var b bytes.Buffer
		if err := printTable(&b, as, tableColumns, tableRows); err != nil {
			t.Fatal(err)
		}
		return b.String()
	}

	var list []map[string]string
	if err := json.Unmarshal([]byte(form("json")), &list); err != nil || len(list) != 3 {
		t.Fatalf("%v: %v", err, list)
	}
	for i, r := range tableRows {
		for j, c := range tableColumns {
			if list[i][c] != r[j] {
				t.Errorf("json: %q, want %q", list[i][c], r[j])
			}
		}
	}
	if strings.ContainsAny(form("json"), "\x1b\u202e") {
		t.Error("json: a hidden character reaches the terminal as it is")
	}

	rows, err := csv.NewReader(strings.NewReader(form("csv"))).ReadAll()
	if err != nil || len(rows) != 4 || rows[0][2] != "old_outcome" || rows[2][2] != "'"+tableRows[1][2] {
		t.Errorf("csv: %v %q", err, rows)
	}

	const markdown = `| no | finding | old_outcome |
| --- | --- | --- |
| 1 | limit_shares_pocket | What cools, scales or empties the pocket deceives both. |
| 2 | a\|b | =1+1 &lt;b&gt;bold&lt;/b&gt;<br>second line |
| 3 | ünï 温度 | U+001B\[31mredU+001B\[0m U+202Egnp.exe |
`
	if got := form("markdown"); got != markdown {
		t.Errorf("got\n%s\nwant\n%s", got, markdown)
	}
}

// No form has colours, so there is nothing that NO_COLOR would have to take away.
func TestNoColour(t *testing.T) {
	for _, set := range []string{"", "1"} {
		t.Setenv("NO_COLOR", set)
		for _, as := range forms {
			var b bytes.Buffer
			if err := printTable(&b, as, tableColumns, tableRows); err != nil {
				t.Fatal(err)
			}
			if strings.Contains(b.String(), "\x1b") {
				t.Errorf("NO_COLOR=%q: %s holds an escape", set, as)
			}
		}
	}
}

// An empty table is a table: a list without entries, a header without rows.
func TestEmptyTable(t *testing.T) {
	for as, want := range map[string]string{"json": "[]\n", "csv": "a,b\r\n", "markdown": "| a | b |\n| --- | --- |\n"} {
		var b bytes.Buffer
		if err := printTable(&b, as, []string{"a", "b"}, nil); err != nil || b.String() != want {
			t.Errorf("%s: %v %q", as, err, b.String())
		}
	}
}
