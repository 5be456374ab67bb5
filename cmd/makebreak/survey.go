package main

import (
	"errors"
	"fmt"
	"io"
	"os"

	"github.com/spf13/cobra"

	"makebreak/survey"
	"makebreak/survey/catalogue"
)

func newSurvey(out, errw io.Writer) *cobra.Command {
	cmd := &cobra.Command{
		Use:   "survey",
		Short: "Start a sheet, check one, print it in full, schema for an editor",
		Args:  cobra.NoArgs,
		RunE:  func(cmd *cobra.Command, _ []string) error { return cmd.Help() },
	}
	cmd.AddCommand(newSurveyNew(out), newSurveyCheck(errw), newSurveyShow(out, errw), newSurveySchema(out))
	return cmd
}

func newSurveyNew(out io.Writer) *cobra.Command {
	var file string
	cmd := &cobra.Command{
		Use:   "new",
		Short: "A commented sheet to start from",
		Args:  cobra.NoArgs,
		RunE: func(*cobra.Command, []string) error {
			if file == "" {
				_, err := out.Write(survey.Template())
				return err
			}
			f, err := os.OpenFile(file, os.O_WRONLY|os.O_CREATE|os.O_EXCL, 0o666)
			if errors.Is(err, os.ErrExist) {
				return exit{exitWrong, fmt.Errorf("%s is there already; it is left as it is", file)}
			}
			if err != nil {
				return exit{exitOutside, err}
			}
			_, err = f.Write(survey.Template())
			if err = errors.Join(err, f.Close()); err != nil {
				return exit{exitOutside, err}
			}
			return nil
		},
	}
	cmd.Flags().StringVarP(&file, "output", "o", "", "file to write; standard output otherwise")
	return cmd
}

func newSurveyCheck(errw io.Writer) *cobra.Command {
	return &cobra.Command{
		Use:   "check SHEET",
		Short: "Everything that is wrong with a sheet, at once",
		Args:  cobra.ExactArgs(1),
		RunE: func(_ *cobra.Command, args []string) error {
			spec, err := translateSheet(args[0], errw)
			if err != nil {
				return err
			}
			fmt.Fprintf(errw, "%s: %d controls, %d loads, nothing wrong with the sheet. What the design lacks is said by makebreak risks.\n",
				visible(args[0]), len(spec.Survey.Controls), len(spec.Survey.Loads))
			return nil
		},
	}
}

func newSurveySchema(out io.Writer) *cobra.Command {
	return &cobra.Command{
		Use:   "schema",
		Short: "JSON Schema of the sheet, for an editor",
		Args:  cobra.NoArgs,
		RunE: func(*cobra.Command, []string) error {
			s, err := survey.Schema()
			if err != nil {
				return err
			}
			_, err = fmt.Fprintf(out, "%s\n", s)
			return err
		},
	}
}

func newSurveyShow(out, errw io.Writer) *cobra.Command {
	return &cobra.Command{
		Use:   "show SHEET",
		Short: "A sheet in full, with what is assumed marked and its source named",
		Args:  cobra.ExactArgs(1),
		RunE: func(_ *cobra.Command, args []string) error {
			s, err := readSheet(args[0], errw)
			if err != nil {
				return err
			}
			for _, e := range s.Entries() {
				fmt.Fprintln(out, visibleLine(e.String()))
			}
			return showElements(out, s)
		},
	}
}

// showElements adds what the catalogue knows of the old elements.
func showElements(out io.Writer, s *survey.Survey) error {
	cat, err := catalogue.Load()
	if err != nil {
		return exit{exitOutside, err}
	}
	fmt.Fprintln(out, "\n# What is usual for the elements, where the sheet does not say:")
	for _, c := range s.Controls {
		e, ok := cat.Element(c.Element.V)
		if !ok {
			continue
		}
		fmt.Fprintf(out, "# %s: %s\n", visible(c.ID.V), e.Title)
		if lag, ok := e.Lag(s.Equipment.Medium.V); ok && !c.Lag.Set {
			fmt.Fprintf(out, "#   lag %.4g s (%.4g to %.4g s): %s\n", lag.Usual, lag.From, lag.To, lag.Source)
		}
		if t := e.Tolerance; t != nil && !c.Tolerance.Set {
			fmt.Fprintf(out, "#   tolerance %.4g K (%.4g to %.4g K): %s\n", t.Usual, t.From, t.To, t.Source)
		}
		for _, f := range e.Failures {
			fmt.Fprintf(out, "#   fails: %s; then %s: %s\n", f.What, catalogue.Reads(string(c.Action.V), f.Reads), f.Source)
		}
	}
	return nil
}

// visibleLine defuses a line but keeps its indent.
func visibleLine(s string) string {
	n := 0
	for n < len(s) && s[n] == ' ' {
		n++
	}
	return s[:n] + visible(s[n:])
}
