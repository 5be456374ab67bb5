package main

import (
	"bytes"
	"fmt"
	"io"
	"os"
	"slices"
	"strconv"
	"strings"

	"github.com/clipperhouse/displaywidth"
	"github.com/olekukonko/tablewriter"
	"github.com/olekukonko/tablewriter/pkg/twwidth"
	"github.com/olekukonko/tablewriter/renderer"
	"github.com/olekukonko/tablewriter/tw"
	"golang.org/x/term"

	"makebreak/codegen/sheets"
)

// forms are the ways in which a table can be printed.
var forms = []string{"table", "markdown", "csv", "json"}

func (o *options) checkForm() error {
	if o.as == "" {
		o.as = "table"
	}
	if !slices.Contains(forms, o.as) {
		return exit{exitWrong, fmt.Errorf("--as %q is not known; it is one of %s", o.as, strings.Join(forms, ", "))}
	}
	return nil
}

// printTable prints rows in one of the forms. Text from a sheet is defused for
// each of them.
func printTable(out io.Writer, as string, columns []string, rows [][]string) error {
	switch as {
	case "json":
		return printJSON(out, columns, rows)
	case "csv":
		_, err := io.WriteString(out, sheets.CSV(columns, rows))
		return err
	case "markdown":
		return printMarkdown(out, columns, rows)
	}
	return printGrid(out, columns, rows, screenWidth(out))
}

func printJSON(out io.Writer, columns []string, rows [][]string) error {
	list := make([]map[string]string, 0, len(rows))
	for _, r := range rows {
		m := map[string]string{}
		for i, c := range columns {
			m[c] = r[i]
		}
		list = append(list, m)
	}
	data, err := sheets.JSON(list)
	if err == nil {
		_, err = out.Write(data)
	}
	return err
}

func printMarkdown(out io.Writer, columns []string, rows [][]string) error {
	var b bytes.Buffer
	line := func(cells []string, escape func(string) string) {
		for _, c := range cells {
			b.WriteString("| " + escape(c) + " ")
		}
		b.WriteString("|\n")
	}
	line(columns, sheets.Markdown)
	line(columns, func(string) string { return "---" })
	for _, r := range rows {
		line(r, sheets.Markdown)
	}
	_, err := out.Write(b.Bytes())
	return err
}

// usualWidth is the width of a table that goes to no screen.
const usualWidth = 120

func screenWidth(out io.Writer) int {
	if n, err := strconv.Atoi(os.Getenv("COLUMNS")); err == nil && n >= 40 && n <= 1000 {
		return n
	}
	if f, ok := out.(*os.File); ok {
		if n, _, err := term.GetSize(int(f.Fd())); err == nil && n >= 40 {
			return n
		}
	}
	return usualWidth
}

// printGrid prints a table for the screen. Cells are wrapped here, word by
// word, to widths that fit: nothing is cut off.
func printGrid(out io.Writer, columns []string, rows [][]string, width int) error {
	plain := make([][]string, len(rows))
	for i, r := range rows {
		for _, c := range r {
			plain[i] = append(plain[i], visible(c))
		}
	}
	widths := columnWidths(columns, plain, width-3*len(columns)-1)
	t := tablewriter.NewTable(out,
		tablewriter.WithRenderer(renderer.NewBlueprint(tw.Rendition{
			Symbols:  tw.NewSymbols(tw.StyleLight),
			Settings: tw.Settings{Separators: tw.Separators{BetweenRows: tw.On}},
		})),
		tablewriter.WithRowAutoWrap(tw.WrapNone),
		tablewriter.WithHeaderAutoWrap(tw.WrapNone),
		tablewriter.WithHeaderAutoFormat(tw.Off),
		tablewriter.WithHeaderAlignment(tw.AlignLeft),
		tablewriter.WithRowAlignment(tw.AlignLeft),
	)
	t.Header(wrapCells(columns, widths))
	for _, r := range plain {
		if err := t.Append(wrapCells(r, widths)); err != nil {
			return err
		}
	}
	return t.Render()
}

func wrapCells(cells []string, widths []int) []string {
	out := make([]string, len(cells))
	for i, c := range cells {
		out[i] = strings.Join(wrapText(c, widths[i]), "\n")
	}
	return out
}

// columnWidths shares the room: columns that need little get what they need,
// the widest give way to the others. Words stay whole where that fits; on a
// narrow screen long ones are broken, first behind their strokes, then anywhere.
func columnWidths(columns []string, rows [][]string, room int) []int {
	widths, words, pieces := make([]int, len(columns)), make([]int, len(columns)), make([]int, len(columns))
	look := func(i int, s string) {
		widths[i] = max(widths[i], twwidth.Width(s))
		for _, w := range strings.Fields(s) {
			words[i] = max(words[i], twwidth.Width(w))
			for _, p := range brokenWord(w) {
				pieces[i] = max(pieces[i], twwidth.Width(p))
			}
		}
	}
	for i, c := range columns {
		look(i, c)
		for _, r := range rows {
			look(i, r[i])
		}
	}
	for _, least := range [][]int{words, pieces, slices.Repeat([]int{2}, len(columns))} {
		narrow(widths, least, room)
	}
	return widths
}

// narrow takes from the widest column until all fit, or none may give more.
func narrow(widths, least []int, room int) {
	for total(widths) > room {
		widest := -1
		for i := range widths {
			if widths[i] > least[i] && (widest < 0 || widths[i] > widths[widest]) {
				widest = i
			}
		}
		if widest < 0 {
			return
		}
		widths[widest]--
	}
}

// brokenWord gives the pieces into which a long word may be broken: each ends
// with a stroke.
func brokenWord(word string) []string {
	var pieces []string
	for {
		i := strings.IndexAny(word, "_/-")
		if i < 0 || i == len(word)-1 {
			return append(pieces, word)
		}
		pieces, word = append(pieces, word[:i+1]), word[i+1:]
	}
}

func total(ns []int) int {
	sum := 0
	for _, n := range ns {
		sum += n
	}
	return sum
}

// wrapText breaks a text at blanks; a word that is too long is broken.
func wrapText(s string, width int) []string {
	width = max(width, 1)
	var lines []string
	line := ""
	for _, word := range strings.Fields(s) {
		for twwidth.Width(word) > width {
			if line != "" {
				lines, line = append(lines, line), ""
			}
			n := fitting(word, width)
			lines, word = append(lines, word[:n]), word[n:]
		}
		switch {
		case line == "":
			line = word
		case twwidth.Width(line)+1+twwidth.Width(word) <= width:
			line += " " + word
		default:
			lines, line = append(lines, line), word
		}
	}
	return append(lines, line)
}

// fitting is how many bytes of a word fit into a width, at least one
// character: up to the last stroke where there is one, to the last character
// otherwise.
func fitting(word string, width int) int {
	whole := 0
	for _, p := range brokenWord(word) {
		if twwidth.Width(word[:whole+len(p)]) > width {
			break
		}
		whole += len(p)
	}
	if whole > 0 {
		return whole
	}
	end := 0
	g := displaywidth.StringGraphemes(word)
	for g.Next() {
		next := end + len(g.Value())
		if end > 0 && twwidth.Width(word[:next]) > width {
			break
		}
		end = next
	}
	return end
}
