package main

import (
	"fmt"
	"io"

	"github.com/spf13/cobra"

	"makebreak/codegen/sheets"
	"makebreak/translate"
)

func newTranslate(out, errw io.Writer) *cobra.Command {
	var o options
	cmd := &cobra.Command{
		Use:   "translate SHEET",
		Short: "The specification, each figure with where it came from and how it was worked out",
		Args:  cobra.ExactArgs(1),
		RunE: func(cmd *cobra.Command, args []string) error {
			w, err := o.assess(args[0], errw)
			if err != nil {
				return err
			}
			if err := w.printSpecification(out, o.as); err != nil {
				return exit{exitOutside, err}
			}
			return nil
		},
	}
	o.bind(cmd)
	return cmd
}

func (w *work) printSpecification(out io.Writer, as string) error {
	if as == "json" {
		data, err := sheets.Specification(w.spec, w.risks, w.functions)
		if err == nil {
			_, err = out.Write(data)
		}
		return err
	}
	if err := printTable(out, as, []string{"about", "figure", "value", "from", "working"}, figureRows(w.spec.Figures)); err != nil {
		return err
	}
	for _, b := range w.spec.Budgets {
		fmt.Fprintf(out, "\nError budget of %s at the %s of %s, %.4g degC: worst case %.3g K, root sum of squares %.3g K\n", visible(b.Sensor), b.Edge, visible(b.Control), b.At, b.WorstCase, b.RSS)
		var rows [][]string
		for _, l := range b.Lines {
			rows = append(rows, []string{l.Name, fmt.Sprintf("%.3g K", l.Kelvin), fmt.Sprintf("%.0f %%", 100*l.Share), l.Working})
		}
		if err := printTable(out, as, []string{"cause", "error", "share", "working"}, rows); err != nil {
			return err
		}
	}
	if err := w.printFailures(out, as); err != nil {
		return err
	}
	if err := w.printStages(out, as); err != nil {
		return err
	}
	if err := w.printConversions(out, as); err != nil {
		return err
	}
	if err := w.printTunings(out, as); err != nil {
		return err
	}
	if w.spec.Program == nil {
		return nil
	}
	var rows [][]string
	for _, c := range w.spec.Program.Consts {
		rows = append(rows, []string{c.Name, fmt.Sprint(c.Value), c.Unit, c.Means, c.Origin})
	}
	fmt.Fprintln(out, "\nConstants of the program")
	return printTable(out, as, []string{"constant", "value", "unit", "means", "from"}, rows)
}

func figureRows(fs translate.Figures) [][]string {
	var rows [][]string
	for _, f := range fs {
		value := "not determined"
		if f.Value != nil {
			value = fmt.Sprintf("%.6g %s", *f.Value, f.Unit)
		}
		rows = append(rows, []string{f.About, f.Name, value, f.From, f.Working})
	}
	return rows
}

// printFailures prints what the converter reads when each sensor's circuit breaks.
func (w *work) printFailures(out io.Writer, as string) error {
	var rows [][]string
	for _, f := range w.spec.SensorFailures() {
		rows = append(rows, []string{f.Sensor, f.What, f.CountText(), f.Seen(), f.Working})
	}
	if len(rows) == 0 {
		return nil
	}
	fmt.Fprintln(out, "\nBroken circuits: what the converter then reads")
	return printTable(out, as, []string{"sensor", "failure", "count", "seen by the program", "working"}, rows)
}

// printStages prints what was asked of each output stage.
func (w *work) printStages(out io.Writer, as string) error {
	var rows [][]string
	for _, s := range w.spec.Stages {
		for _, c := range s.Checks {
			rows = append(rows, []string{s.Load, s.Kind, c.Name, translate.Verdict(c), c.Working})
		}
	}
	if len(rows) == 0 {
		return nil
	}
	fmt.Fprintln(out, "\nOutput stages")
	return printTable(out, as, []string{"load", "output", "question", "answer", "working"}, rows)
}

// printConversions prints the tables that turn counts into temperatures.
func (w *work) printConversions(out io.Writer, as string) error {
	var rows [][]string
	for _, c := range w.spec.Conversions {
		rows = append(rows, []string{c.Sensor, translate.Degrees(c.From) + " to " + translate.Degrees(c.To), fmt.Sprint(c.Pieces), fmt.Sprint(c.Bytes), fmt.Sprintf("%.3g K", c.Worst), c.Working})
	}
	if len(rows) == 0 {
		return nil
	}
	fmt.Fprintln(out, "\nConversion tables")
	return printTable(out, as, []string{"sensor", "span", "pieces", "bytes", "worst error", "working"}, rows)
}

// printTunings prints the rules for a continuous control side by side.
func (w *work) printTunings(out io.Writer, as string) error {
	for _, t := range w.spec.Tunings {
		var rows [][]string
		for _, r := range t.Rules {
			if r.Refused != "" {
				rows = append(rows, []string{r.Name, "-", "-", "-", "-", "-", "-", "-", r.Refused})
				continue
			}
			s := r.Settings.Parallel()
			name := r.Name
			if name == t.Chosen.Name {
				name += " (taken)"
			}
			rows = append(rows, []string{name, fmt.Sprintf("%.4g /K", s.Kc), translate.Span(s.Ti), translate.Span(s.Td),
				fmt.Sprintf("%.3g", r.Margins.Gain), fmt.Sprintf("%.3g°", r.Margins.Phase), fmt.Sprintf("%.3g", r.Margins.Sensitivity),
				fmt.Sprintf("%.0f %%", 100*r.Response.Overshoot), translate.Span(r.Response.Settling)})
		}
		fmt.Fprintf(out, "\nSettings of a continuous control in place of %s: %s\n", visible(t.Control), t.Because)
		if err := printTable(out, as, []string{"rule", "gain", "integral", "derivative", "gain margin", "phase margin", "Ms", "overshoot", "settling"}, rows); err != nil {
			return err
		}
		for i, r := range t.Rules {
			if i == 0 || r.Source != t.Rules[i-1].Source {
				fmt.Fprintf(out, "%s: %s\n", r.Name, r.Source)
			}
		}
	}
	return nil
}
