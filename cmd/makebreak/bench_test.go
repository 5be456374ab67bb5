package main

import (
	"io"
	"os"
	"path/filepath"
	"testing"

	"makebreak/codegen"
	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/faults"
	"makebreak/translate/prove"
	"makebreak/translate/risk"
)

// BenchmarkStages shows where the time of one sheet goes, stage by stage, and
// all of it without and with the disk.
func BenchmarkStages(b *testing.B) {
	const sheet = "../../examples/calorifier/sheet.yaml"
	data, err := os.ReadFile(sheet)
	if err != nil {
		b.Fatal(err)
	}
	s, _ := survey.Read("sheet.yaml", data)
	spec, _ := translate.Translate(s)
	var o options
	w, err := o.assess(sheet, io.Discard)
	if err != nil {
		b.Fatal(err)
	}
	view, err := risk.NewView(s, w.computed())
	if err != nil {
		b.Fatal(err)
	}
	job := w.job()
	files, err := codegen.Pack(job)
	if err != nil {
		b.Fatal(err)
	}
	rules, err := risk.Builtin()
	if err != nil {
		b.Fatal(err)
	}
	dir := filepath.Join(b.TempDir(), "out")
	for _, stage := range []struct {
		name string
		run  func() error
	}{
		{"read", func() error { survey.Read("sheet.yaml", data); return nil }},
		{"translate", func() error { translate.Translate(s); return nil }},
		{"faults", func() error { faults.Assess(spec, view); return nil }},
		{"risks", func() error {
			v, err := risk.NewView(s, w.computed())
			if err == nil {
				_, err = rules.Assess(v)
			}
			return err
		}},
		{"tour", func() error { prove.Visit(spec.Program, prove.Budget{Steps: tourSteps}); return nil }},
		{"pack", func() error { _, err := codegen.Pack(job); return err }},
		{"all-in-memory", func() error {
			w, err := o.assess(sheet, io.Discard)
			if err == nil {
				_, err = codegen.Pack(w.job())
			}
			return err
		}},
		{"write", func() error { return codegen.Write(dir, files) }},
	} {
		b.Run(stage.name, func(b *testing.B) {
			for b.Loop() {
				if err := stage.run(); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}
