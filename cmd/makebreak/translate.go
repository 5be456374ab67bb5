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
