package main

import (
	"errors"
	"fmt"
	"io"
	"io/fs"
	"os"
	"path/filepath"
	"strings"

	"github.com/spf13/cobra"

	"makebreak/codegen"
	"makebreak/codegen/sheets"
	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/faults"
	"makebreak/translate/prove"
	"makebreak/translate/risk"
)

// options are the flags that several commands have in common.
type options struct {
	as    string
	rules string
}

func (o *options) bind(cmd *cobra.Command) {
	cmd.Flags().StringVar(&o.as, "as", "table", "form of tables: "+strings.Join(forms, ", "))
	o.bindRules(cmd)
}

func (o *options) bindRules(cmd *cobra.Command) {
	cmd.Flags().StringVar(&o.rules, "rules", "", "file with a site's own finding rules; they are added to those of the program")
}

// work is one sheet on its way through the program.
type work struct {
	spec      *translate.Specification
	risks     *risk.Assessment
	functions []faults.Row
	tour      prove.Tour // through the program, where there is one
}

// readSheet loads a sheet; everything that is wrong with it has been said.
func readSheet(file string, errw io.Writer) (*survey.Survey, error) {
	data, err := readLimited(file)
	if err != nil {
		return nil, exit{exitWrong, err}
	}
	s, diags := survey.Read(filepath.Base(file), data)
	return s, say(diags, errw)
}

// mostBytes is more than any sheet or rules file needs; what is larger is not
// read to its end.
const mostBytes = 2 << 20

func readLimited(file string) ([]byte, error) {
	f, err := os.Open(file)
	if err != nil {
		var pe *fs.PathError
		if errors.As(err, &pe) {
			return nil, fmt.Errorf("%s: %w", file, pe.Err)
		}
		return nil, err
	}
	defer f.Close()
	data, err := io.ReadAll(io.LimitReader(f, mostBytes))
	if err != nil {
		return nil, fmt.Errorf("%s: %w", file, err)
	}
	return data, nil
}

// say prints diagnostics, one a line, and is an error where one of them is.
func say(diags survey.Diagnostics, errw io.Writer) error {
	for _, d := range diags {
		fmt.Fprintln(errw, visible(d.String()))
	}
	if diags.HasErrors() {
		return exit{exitWrong, nil}
	}
	return nil
}

// translateSheet loads a sheet and translates it.
func translateSheet(file string, errw io.Writer) (*translate.Specification, error) {
	s, err := readSheet(file, errw)
	if err != nil {
		return nil, err
	}
	with, diags := evidence(file, s)
	if err := say(diags, errw); err != nil {
		return nil, err
	}
	spec, diags := translate.Translate(s, with...)
	return spec, say(diags, errw)
}

// assess takes a sheet all the way to findings and functions.
func (o *options) assess(file string, errw io.Writer) (*work, error) {
	if err := o.checkForm(); err != nil {
		return nil, err
	}
	rules, err := o.loadRules(errw)
	if err != nil {
		return nil, err
	}
	spec, err := translateSheet(file, errw)
	if err != nil {
		return nil, err
	}
	w := &work{spec: spec}
	before, err := risk.NewView(spec.Survey, w.computed())
	if err != nil {
		return nil, exit{exitWrong, err}
	}
	// The two long walks through the program only read it; they go side by side.
	functions := make(chan []faults.Row)
	go func() { functions <- faults.Assess(spec, before) }()
	if spec.Program != nil {
		w.tour = prove.Visit(spec.Program, prove.Budget{Steps: tourSteps})
	}
	w.functions = <-functions
	view, err := risk.NewView(spec.Survey, w.computed())
	if err == nil {
		w.risks, err = rules.Assess(view)
	}
	if err != nil {
		return nil, exit{exitWrong, err}
	}
	return w, nil
}

func (o *options) loadRules(errw io.Writer) (*risk.Rules, error) {
	rules, err := risk.Builtin()
	if err != nil {
		return nil, exit{exitOutside, err}
	}
	if o.rules == "" {
		return rules, nil
	}
	data, err := readLimited(o.rules)
	if err != nil {
		return nil, exit{exitWrong, err}
	}
	rules, diags := rules.Merge(data, filepath.Base(o.rules))
	return rules, say(diags, errw)
}

// computed hands the figures of a specification to the rules, and whether the
// program was found to break a property that must hold.
func (w *work) computed() risk.Computed {
	spec := w.spec
	c := risk.Computed{Figures: map[risk.Key]risk.Figure{}, NotTranslated: map[string]string{}}
	for _, f := range spec.Figures {
		c.Figures[risk.Key{About: f.About, Name: f.Name}] = risk.Figure{Value: f.Value, Reason: f.Working}
	}
	for _, r := range spec.Refused {
		c.NotTranslated[r.About] = r.Why
	}
	if spec.Program != nil {
		broken, why := 0.0, "not broken by any of the recorded inputs"
		if w.tour.Broken != nil {
			p := w.tour.Broken.Property
			broken, why = 1, fmt.Sprintf("The program was brought to break %s: %s.", p.Name, p.Why)
		}
		c.Figures[risk.Key{About: spec.Survey.Equipment.ID.V, Name: "must_broken"}] = risk.Figure{Value: &broken, Reason: why}
	}
	return c
}

// tourSteps is how many steps the search for recorded inputs may run. Fewer
// leave some thresholds of the examples without a row just beside them.
const tourSteps = 80_000

func (w *work) job() codegen.Job {
	return codegen.Job{Spec: w.spec, Risks: w.risks, Functions: w.functions, Tour: w.tour}
}

func (w *work) writePack(dir string) error {
	files, err := codegen.Pack(w.job())
	if err == nil {
		err = codegen.Write(dir, files)
	}
	if err != nil {
		return exit{exitOutside, err}
	}
	return nil
}

func (w *work) writeC(dir string, proof bool) error {
	job := w.job()
	job.Proof = proof
	files, err := codegen.OnlyC(job)
	if err != nil {
		return exit{exitOutside, err}
	}
	if len(files) == 0 {
		return exit{exitWrong, errors.New("nothing in this sheet becomes a program")}
	}
	if err := codegen.Write(dir, files); err != nil {
		return exit{exitOutside, err}
	}
	return nil
}

// stopped is the exit where a stop is open.
func (w *work) stopped() error {
	if w.risks.Stopped() {
		return exit{exitStopOpen, nil}
	}
	return nil
}

// verdict says in a few lines where the design stands.
func (w *work) verdict(dir string) string {
	var b strings.Builder
	fmt.Fprintf(&b, "%s: %s.\n", visible(w.spec.Survey.Equipment.Title.V), sheets.Summary(w.risks.Findings))
	switch {
	case w.risks.Stopped():
		b.WriteString("A stop is open: the C is withheld. Only another design ends a stop.\n")
	case w.spec.Program == nil:
		b.WriteString("Nothing in this sheet becomes a program.\n")
	}
	if dir != "" {
		fmt.Fprintf(&b, "The pack is in %s.\n", visible(dir))
	}
	for _, c := range sheets.CautionsFor(w.risks) {
		fmt.Fprintf(&b, "- %s\n", visible(c))
	}
	return strings.TrimRight(b.String(), "\n")
}

func visible(s string) string { return sheets.Visible(s) }

func (w *work) printFindings(out io.Writer, as string) error {
	columns := []string{"no", "grade", "finding", "about", "becomes", "needed"}
	var rows [][]string
	for _, f := range w.risks.Findings {
		rows = append(rows, []string{fmt.Sprint(f.No), string(f.Grade), f.ID, f.About, f.Becomes, f.Needed})
	}
	if as != "table" {
		columns, rows = sheets.RiskColumns, sheets.RiskRows(w.risks.Findings)
	}
	return printTable(out, as, columns, rows)
}

func (w *work) printRisks(out io.Writer, as string) error {
	if as == "json" {
		data, err := sheets.Specification(w.spec, w.risks, w.functions)
		if err == nil {
			_, err = out.Write(data)
		}
		return err
	}
	if err := w.printFindings(out, as); err != nil {
		return err
	}
	fmt.Fprintln(out)
	columns, rows := sheets.FunctionColumns, sheets.FunctionRows(w.functions)
	if as == "table" {
		columns, rows = columns[1:7], cut(rows, 1, 7)
	}
	return printTable(out, as, columns, rows)
}

func cut(rows [][]string, from, to int) [][]string {
	out := make([][]string, len(rows))
	for i, r := range rows {
		out[i] = r[from:to]
	}
	return out
}
