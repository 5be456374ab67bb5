package main

import (
	"errors"
	"fmt"
	"io"
	"math"
	"os"
	"path/filepath"
	"strconv"
	"strings"

	"github.com/guptarohit/asciigraph"
	"github.com/spf13/cobra"

	"makebreak/codegen/sheets"
	"makebreak/translate"
	"makebreak/translate/thermal"
)

func newCycle(out, errw io.Writer) *cobra.Command {
	var o options
	var plot string
	cmd := &cobra.Command{
		Use:   "cycle SHEET",
		Short: "How the old control cycles and how the new one will: swing, rate, contact operations a year, plot",
		Args:  cobra.ExactArgs(1),
		RunE: func(cmd *cobra.Command, args []string) error {
			if err := o.checkForm(); err != nil {
				return err
			}
			draw, err := plotter(plot)
			if err != nil {
				return err
			}
			spec, err := translateSheet(args[0], errw)
			if err != nil {
				return err
			}
			if err := printCycles(out, o.as, spec); err != nil {
				return exit{exitOutside, err}
			}
			if len(spec.Cycles) == 0 {
				fmt.Fprintln(errw, "No operating two-position control is on this sheet: nothing cycles.")
			}
			if draw == nil {
				return nil
			}
			return writePlots(spec, plot, draw, errw)
		},
	}
	cmd.Flags().StringVar(&o.as, "as", "table", "form of tables: "+strings.Join(forms, ", "))
	cmd.Flags().StringVar(&plot, "plot", "", "draw the cycles into this file, .svg or .png")
	return cmd
}

// A cycleFigure is one row of the table: a figure of one side of a control.
type cycleFigure struct {
	name, key, unit string
	of              func(s translate.Side) float64
}

// cycleFigures are the figures of the medium and of the contact, those whose
// keys scripts hold on to first.
var cycleFigures = []cycleFigure{
	{"on", "on_s", "s", func(s translate.Side) float64 { return s.Figures.On }},
	{"off", "off_s", "s", func(s translate.Side) float64 { return s.Figures.Off }},
	{"period", "period_s", "s", func(s translate.Side) float64 { return s.Figures.Period() }},
	{"high", "high_degc", "degC", func(s translate.Side) float64 { return s.Figures.High }},
	{"low", "low_degc", "degC", func(s translate.Side) float64 { return s.Figures.Low }},
	{"swing", "swing_k", "K", func(s translate.Side) float64 { return s.Figures.Swing() }},
	{"mean", "mean_degc", "degC", func(s translate.Side) float64 { return s.Figures.Mean }},
	{"operations a year", "operations_per_year", "", func(s translate.Side) float64 { return s.Figures.OperationsPerYear }},
	{"operations a year, busiest", "operations_per_year_busiest", "", func(s translate.Side) float64 { return s.Busiest.Operations }},
	{"mean, busiest", "mean_degc_busiest", "degC", func(s translate.Side) float64 { return s.Busiest.Mean }},
	{"hours on a year", "hours_on_per_year", "h", func(s translate.Side) float64 { return 8760 * s.Figures.Duty() }},
	{"hours on a year, busiest", "hours_on_per_year_busiest", "h", func(s translate.Side) float64 { return s.Busiest.HoursOn }},
	{"energy share", "energy_share", "", func(s translate.Side) float64 { return s.Figures.Duty() }},
	{"energy share, busiest", "energy_share_busiest", "", func(s translate.Side) float64 { return s.Busiest.EnergyShare }},
}

// value is a figure of a side, and whether there is one.
func (f cycleFigure) value(s translate.Side) (float64, bool) {
	if s.Why != "" {
		return 0, false
	}
	v := f.of(s)
	return v, !math.IsNaN(v) && !math.IsInf(v, 0) && (s.Busiest.Operations > 0 || !strings.HasSuffix(f.key, "_busiest"))
}

func (f cycleFigure) text(s translate.Side) string {
	v, ok := f.value(s)
	switch {
	case !ok:
		return "not determined"
	case f.unit == "s":
		return translate.Span(v)
	case f.unit == "degC":
		return translate.Degrees(v)
	case f.unit == "K":
		return translate.Kelvins(v)
	case f.unit == "h":
		return fmt.Sprintf("%.0f h", v)
	case strings.HasPrefix(f.key, "energy"):
		return fmt.Sprintf("%.1f %%", 100*v)
	}
	return fmt.Sprintf("%.0f", v)
}

// printCycles prints old beside new, how both were worked out, and on the
// screen a plot.
func printCycles(out io.Writer, as string, spec *translate.Specification) error {
	switch as {
	case "json":
		return printCyclesJSON(out, spec)
	case "csv":
		return printCyclesCSV(out, spec)
	}
	var rows [][]string
	for _, c := range spec.Cycles {
		for _, f := range cycleFigures {
			rows = append(rows, []string{c.Control.ID.V, f.name, f.text(c.Old), f.text(c.New), change(f, c)})
		}
	}
	if err := printTable(out, as, []string{"control", "figure", "old", "new", "change"}, rows); err != nil {
		return err
	}
	escape := visible
	if as == "markdown" {
		escape = sheets.Markdown
	}
	for _, c := range spec.Cycles {
		for _, line := range cycleWorking(spec, c) {
			fmt.Fprintf(out, "\n%s\n", escape(line))
		}
		if as == "table" {
			for _, s := range []struct {
				name string
				side translate.Side
			}{{"old", c.Old}, {"new", c.New}} {
				if text := textPlot(c.Control.ID.V+", "+s.name, s.side); text != "" {
					fmt.Fprintf(out, "\n%s\n", text)
				}
			}
		}
	}
	return nil
}

// change is what the new figure is more or less than the old one.
func change(f cycleFigure, c *translate.ControlCycle) string {
	a, ok := f.value(c.Old)
	b, also := f.value(c.New)
	switch {
	case !ok || !also:
		return ""
	case f.unit == "degC" || f.unit == "K":
		return fmt.Sprintf("%+.2f K", b-a)
	case a == 0:
		return ""
	}
	return fmt.Sprintf("%+.1f %%", 100*(b/a-1))
}

// cycleWorking says how the figures were worked out, or why there are none.
func cycleWorking(spec *translate.Specification, c *translate.ControlCycle) []string {
	id := c.Control.ID.V
	var lines []string
	side := func(name string, s translate.Side) {
		if s.Why != "" {
			lines = append(lines, fmt.Sprintf("%s, %s: %s.", id, name, s.Why))
		} else {
			lines = append(lines, fmt.Sprintf("%s, %s: %s.", id, name, s.Working))
		}
	}
	if spec.Model != nil {
		lines = append(lines, "process: "+spec.Model.Text+".")
	}
	side("old", c.Old)
	side("new", c.New)
	if m, ok := spec.Matches[id]; ok {
		lines = append(lines, fmt.Sprintf("%s, kept: %s: %s.", id, m.Keep, m.Working))
	}
	if f, ok := spec.Figures.Get(id, "nearest_software_lag"); ok {
		lines = append(lines, fmt.Sprintf("%s, contact life: %s.", id, f.Working))
	}
	return lines
}

// printCyclesCSV prints plain numbers, so that a spreadsheet can go on with
// them. Where there is none, the cell is empty and why says the reason.
func printCyclesCSV(out io.Writer, spec *translate.Specification) error {
	var rows [][]string
	cell := func(f cycleFigure, s translate.Side) string {
		if v, ok := f.value(s); ok {
			return strconv.FormatFloat(v, 'g', 10, 64)
		}
		return ""
	}
	for _, c := range spec.Cycles {
		for _, f := range cycleFigures {
			why := c.Old.Why
			if why == "" {
				why = c.New.Why
			}
			rows = append(rows, []string{c.Control.ID.V, f.key, cell(f, c.Old), cell(f, c.New), why})
		}
	}
	return printTable(out, "csv", []string{"control", "figure", "old", "new", "why"}, rows)
}

type cyclesJSON struct {
	Controls []cycleJSON `json:"controls"`
}

type cycleJSON struct {
	About string         `json:"about"`
	Old   map[string]any `json:"old"`
	New   map[string]any `json:"new"`
	Match string         `json:"match,omitempty"`
}

func printCyclesJSON(out io.Writer, spec *translate.Specification) error {
	list := cyclesJSON{Controls: []cycleJSON{}}
	for _, c := range spec.Cycles {
		j := cycleJSON{About: c.Control.ID.V, Old: sideJSON(c.Old), New: sideJSON(c.New)}
		if m, ok := spec.Matches[c.Control.ID.V]; ok {
			j.Match = string(m.Keep) + ": " + m.Working
		}
		list.Controls = append(list.Controls, j)
	}
	data, err := sheets.JSON(list)
	if err == nil {
		_, err = out.Write(data)
	}
	return err
}

func sideJSON(s translate.Side) map[string]any {
	m := map[string]any{}
	for _, f := range cycleFigures {
		if v, ok := f.value(s); ok {
			m[f.key] = v
		} else {
			m[f.key] = nil
		}
	}
	if s.Why != "" {
		m["why"] = s.Why
	} else {
		m["working"] = s.Working
	}
	return m
}

// traced is how many points a cycle is followed at, besides its extremes.
const traced = 400

// Size of a plot on the screen, in characters.
const textWidth, textHeight = 72, 14

// textPlot draws one cycle with characters, or nothing where there is none.
// Each column holds the least and the greatest of its stretch of time, one
// after the other, so that no peak falls between two columns.
func textPlot(name string, s translate.Side) string {
	if s.Why != "" {
		return ""
	}
	samples, err := s.Loop.Trace(traced)
	if err != nil {
		return ""
	}
	period := s.Figures.Period()
	bins := textWidth / 2
	low, high := make([]float64, bins), make([]float64, bins)
	for i := range bins {
		low[i], high[i] = math.Inf(1), math.Inf(-1)
	}
	for _, p := range samples {
		i := min(int(p.Time/period*float64(bins)), bins-1)
		low[i], high[i] = math.Min(low[i], p.Medium), math.Max(high[i], p.Medium)
	}
	medium, makes, breaks := make([]float64, 0, 2*bins), make([]float64, 2*bins), make([]float64, 2*bins)
	for i := range bins {
		a, b := low[i], high[i]
		if i > 0 && math.Abs(b-medium[2*i-1]) < math.Abs(a-medium[2*i-1]) {
			a, b = b, a
		}
		medium = append(medium, a, b)
	}
	for i := range makes {
		makes[i], breaks[i] = s.Loop.Switching.Make, s.Loop.Switching.Break
	}
	// In units of rows, so that rounding puts nothing on the row beside its own.
	rows, floor, step := thresholdRows(s)
	for _, curve := range [][]float64{makes, breaks, medium} {
		for i, v := range curve {
			curve[i] = (v - floor) / step
		}
	}
	graph := asciigraph.PlotMany([][]float64{makes, breaks, medium}, asciigraph.Height(rows),
		asciigraph.LowerBound(0), asciigraph.UpperBound(float64(rows)),
		asciigraph.YAxisValueFormatter(func(v float64) string { return fmt.Sprintf("%.2f", floor+step*v) }),
		asciigraph.SeriesChars(asciigraph.CreateCharSet("-"), asciigraph.CreateCharSet("-"), asciigraph.DefaultCharSet))
	return fmt.Sprintf("%s: medium in degC over one cycle of %s from make; - - make %s, break %s; on for the first %s\n%s",
		visible(name), translate.Span(period), translate.Degrees(s.Loop.Switching.Make), translate.Degrees(s.Loop.Switching.Break), translate.Span(s.Figures.On), graph)
}

// thresholdRows chooses rows so that make and break lie on one each, and the
// whole swing between the lowest and the highest.
func thresholdRows(s translate.Side) (rows int, floor, step float64) {
	f := s.Figures
	lower, upper := min(s.Loop.Switching.Make, s.Loop.Switching.Break), max(s.Loop.Switching.Make, s.Loop.Switching.Break)
	for between := textHeight; between >= 1; between-- {
		step := (upper - lower) / float64(between)
		if !(step > 0) {
			break
		}
		below, above := math.Ceil(max(0, lower-f.Low)/step), math.Ceil(max(0, f.High-upper)/step)
		if rows := between + int(below+above); rows <= textHeight {
			return rows, lower - below*step, step
		}
	}
	floor = min(f.Low, lower)
	return textHeight, floor, (max(f.High, upper) - floor) / textHeight
}

// plotter chooses the form of a drawing by the name of its file.
func plotter(file string) (func(sheets.Plot) ([]byte, error), error) {
	switch strings.ToLower(filepath.Ext(file)) {
	case ".svg":
		return func(p sheets.Plot) ([]byte, error) { return p.SVG(), nil }, nil
	case ".png":
		return sheets.Plot.PNG, nil
	}
	if file == "" {
		return nil, nil
	}
	return nil, exit{exitWrong, fmt.Errorf("--plot %s: a drawing is .svg or .png", file)}
}

// writePlots draws every control that cycles: the first into the file named,
// each further one into a file beside it with the control's id.
func writePlots(spec *translate.Specification, file string, draw func(sheets.Plot) ([]byte, error), errw io.Writer) error {
	drawn := 0
	for _, c := range spec.Cycles {
		p, ok := cyclePlot(spec, c)
		if !ok {
			continue
		}
		name := file
		if drawn > 0 {
			ext := filepath.Ext(file)
			name = strings.TrimSuffix(file, ext) + "-" + c.Control.ID.V + ext
		}
		data, err := draw(p)
		if err == nil {
			err = os.WriteFile(name, data, 0o666)
		}
		if err != nil {
			return exit{exitOutside, err}
		}
		fmt.Fprintln(errw, "The cycle of", c.Control.ID.V, "is drawn in", visible(name)+".")
		drawn++
	}
	if drawn == 0 {
		return exit{exitOutside, errors.New("nothing is drawn: no control cycles")}
	}
	return nil
}

// plottedCycles is how many cycles a drawing shows.
const plottedCycles = 2

func cyclePlot(spec *translate.Specification, c *translate.ControlCycle) (sheets.Plot, bool) {
	p := sheets.Plot{
		Title:  spec.Survey.Equipment.Title.V + ": " + c.Control.ID.V,
		XLabel: "time from make, min", YLabel: "medium, degC", BandName: "load on, new control",
	}
	var told []string
	for _, s := range []struct {
		name string
		side translate.Side
	}{{"old", c.Old}, {"new", c.New}} {
		if s.side.Why != "" {
			continue
		}
		samples, err := s.side.Loop.Trace(traced)
		if err != nil {
			continue
		}
		curve := sheets.Curve{Name: s.name}
		period := s.side.Figures.Period()
		for i := range plottedCycles {
			for _, x := range samples {
				curve.X = append(curve.X, (x.Time+float64(i)*period)/60)
				curve.Y = append(curve.Y, x.Medium)
			}
			if s.name == "new" {
				p.Bands = append(p.Bands, sheets.Band{From: float64(i) * period / 60, To: (float64(i)*period + s.side.Figures.On) / 60})
			}
		}
		p.Curves = append(p.Curves, curve)
		w, f := s.side.Loop.Switching, s.side.Figures
		told = append(told, fmt.Sprintf("%s: on %s, off %s, between %s and %s", s.name, translate.Span(f.On), translate.Span(f.Off), translate.Degrees(f.Low), translate.Degrees(f.High)))
		p.Levels = append(p.Levels, levels(s.name, w)...)
	}
	p.Levels = together(p.Levels)
	p.About = "Temperature of the medium over " + fmt.Sprint(plottedCycles) + " cycles. " + strings.Join(told, "; ") + "."
	return p, len(p.Curves) > 0
}

func levels(name string, w thermal.Switching) []sheets.Level {
	return []sheets.Level{
		{Name: name + " break " + translate.Degrees(w.Break), At: w.Break},
		{Name: name + " make " + translate.Degrees(w.Make), At: w.Make},
	}
}

// together gives two levels that read the same one line.
func together(levels []sheets.Level) []sheets.Level {
	var out []sheets.Level
	for _, l := range levels {
		merged := false
		for i := range out {
			a, b := strings.TrimPrefix(out[i].Name, "old "), strings.TrimPrefix(l.Name, "new ")
			if a == b {
				out[i].Name, merged = a, true
			}
		}
		if !merged {
			out = append(out, l)
		}
	}
	return out
}
