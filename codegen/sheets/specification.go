package sheets

import (
	"fmt"
	"math"

	"makebreak/translate"
	"makebreak/translate/faults"
	"makebreak/translate/logic"
	"makebreak/translate/risk"
)

// Specification prints specification.json: everything that was worked out, for
// other programs to read.
func Specification(spec *translate.Specification, a *risk.Assessment, functions []faults.Row) ([]byte, error) {
	return JSON(specification{
		Format:    1,
		Equipment: map[string]string{"id": spec.Survey.Equipment.ID.V, "title": spec.Survey.Equipment.Title.V, "site": spec.Survey.Equipment.Site.V},
		Figures:   figures(spec.Figures),
		Findings:  keyed(RiskColumns, RiskRows(a.Findings)),
		Functions: keyed(FunctionColumns, FunctionRows(functions)),
		Program:   program(spec),
		Budgets:   budgets(spec),
		Failures:  failures(spec),
		Stages:    stages(spec),
		Tables:    tables(spec),
		Tunings:   tunings(spec),
	})
}

type specification struct {
	Format    int                 `json:"format"`
	Equipment map[string]string   `json:"equipment"`
	Figures   translate.Figures   `json:"figures"`
	Findings  []map[string]string `json:"findings"`
	Functions []map[string]string `json:"functions"`
	Program   *programJSON        `json:"program"` // null where none could be made
	Budgets   []budgetJSON        `json:"error_budgets"`
	Failures  []failureJSON       `json:"sensor_failures"`
	Stages    []stageJSON         `json:"output_stages"`
	Tables    []tableJSON         `json:"conversion_tables"`
	Tunings   []tuningJSON        `json:"tunings"`
}

// figures leaves out no figure: what is no number becomes null, with the
// reason in its working.
func figures(fs translate.Figures) translate.Figures {
	out := translate.Figures{}
	for _, f := range fs {
		if f.Value != nil && (math.IsInf(*f.Value, 0) || math.IsNaN(*f.Value)) {
			f.Working = fmt.Sprintf("not determined: the working gives %v: %s", *f.Value, f.Working)
			f.Value = nil
		}
		out = append(out, f)
	}
	return out
}

type programJSON struct {
	ID         string         `json:"id"`
	StepMS     int64          `json:"step_ms"`
	Constants  []constJSON    `json:"constants"`
	Inputs     []varJSON      `json:"inputs"`
	State      []varJSON      `json:"state"`
	Outputs    []varJSON      `json:"outputs"`
	Steps      []string       `json:"steps"`
	Machines   []machineJSON  `json:"machines"`
	Properties []propertyJSON `json:"never"`
}

type constJSON struct {
	Name    string `json:"name"`
	Value   int64  `json:"value"`
	Unit    string `json:"unit"`
	Means   string `json:"means"`
	From    string `json:"from"`
	Working string `json:"working"`
}

type varJSON struct {
	Name     string `json:"name"`
	What     string `json:"what"`
	Low      int64  `json:"low"`
	High     int64  `json:"high"`
	Start    int64  `json:"start"`
	Survives bool   `json:"survives_power_cut"`
}

type machineJSON struct {
	Name        string           `json:"name"`
	What        string           `json:"what"`
	States      []string         `json:"states"`
	Safe        string           `json:"safe"`
	Transitions []transitionJSON `json:"transitions"`
}

type transitionJSON struct {
	From string `json:"from"`
	To   string `json:"to"`
	When string `json:"when"`
	Why  string `json:"why"`
}

type propertyJSON struct {
	Name  string `json:"name"`
	Never string `json:"never"`
	Why   string `json:"why"`
}

type budgetJSON struct {
	Control string             `json:"control"`
	Sensor  string             `json:"sensor"`
	Edge    string             `json:"edge"`
	At      float64            `json:"at_degc"`
	Worst   float64            `json:"worst_k"`
	RSS     float64            `json:"rss_k"`
	Lines   []contributionJSON `json:"contributions"`
	Missing []string           `json:"missing"`
}

type contributionJSON struct {
	Name    string  `json:"name"`
	Kelvin  float64 `json:"k"`
	Share   float64 `json:"share"`
	Working string  `json:"working"`
}

func program(spec *translate.Specification) *programJSON {
	p := spec.Program
	if p == nil {
		return nil
	}
	out := &programJSON{ID: p.ID, StepMS: p.StepMS, Inputs: vars(p.Inputs), State: vars(p.State), Outputs: vars(p.Outputs),
		Constants: []constJSON{}, Steps: []string{}, Machines: []machineJSON{}, Properties: []propertyJSON{}}
	for _, c := range p.Consts {
		out.Constants = append(out.Constants, constJSON{c.Name, c.Value, c.Unit, c.Means, c.Origin, c.Working})
	}
	for _, b := range p.Order {
		out.Steps = append(out.Steps, block(b))
		if m, ok := b.(*logic.Machine); ok {
			out.Machines = append(out.Machines, machine(m))
		}
	}
	for _, n := range p.Never {
		out.Properties = append(out.Properties, propertyJSON{n.Name, n.Bad.String(), n.Why})
	}
	return out
}

func vars(vs []*logic.Var) []varJSON {
	out := []varJSON{}
	for _, v := range vs {
		out = append(out, varJSON{v.Name, v.What, v.Range.Lo, v.Range.Hi, v.Start, v.Survives})
	}
	return out
}

func machine(m *logic.Machine) machineJSON {
	words := m.Var.Enum.Words
	out := machineJSON{Name: m.Var.Name, What: m.What, Safe: words[m.Safe].Name, States: []string{}, Transitions: []transitionJSON{}}
	for i, s := range m.At {
		out.States = append(out.States, words[i].Name)
		for _, t := range s.Goes {
			out.Transitions = append(out.Transitions, transitionJSON{words[i].Name, words[t.To].Name, t.When.String(), t.Why})
		}
	}
	return out
}

// block says in one line what a block of a step does.
func block(b logic.Block) string {
	switch b := b.(type) {
	case *logic.Define:
		return fmt.Sprintf("%s is %s", b.Var.Name, b.As)
	case *logic.Set:
		if b.When == nil {
			return fmt.Sprintf("%s becomes %s", b.Var.Name, b.To)
		}
		return fmt.Sprintf("%s becomes %s when %s", b.Var.Name, b.To, b.When)
	case *logic.Timer:
		text := fmt.Sprintf("%s counts steps up to %s; from 0 when %s", b.Var.Name, b.Limit.Name, b.Restart)
		if b.Hold != nil {
			text += fmt.Sprintf("; stands still while %s", b.Hold)
		}
		return text
	case *logic.Machine:
		return fmt.Sprintf("machine %s: %s", b.Var.Name, b.What)
	case *logic.Flags:
		return fmt.Sprintf("%s gathers %d faults", b.Out.Name, len(b.Bits))
	}
	return ""
}

func budgets(spec *translate.Specification) []budgetJSON {
	out := []budgetJSON{}
	for _, b := range spec.Budgets {
		j := budgetJSON{Control: b.Control, Sensor: b.Sensor, Edge: b.Edge, At: b.At, Worst: b.WorstCase, RSS: b.RSS, Missing: append([]string{}, b.Missing...), Lines: []contributionJSON{}}
		for _, l := range b.Lines {
			j.Lines = append(j.Lines, contributionJSON{l.Name, l.Kelvin, l.Share, l.Working})
		}
		out = append(out, j)
	}
	return out
}

func keyed(columns []string, rows [][]string) []map[string]string {
	out := []map[string]string{}
	for _, r := range rows {
		m := map[string]string{}
		for i, c := range columns {
			m[c] = r[i]
		}
		out = append(out, m)
	}
	return out
}

type failureJSON struct {
	Sensor  string `json:"sensor"`
	What    string `json:"failure"`
	Count   *int64 `json:"count"` // null where it cannot be said
	Inside  bool   `json:"may_read_as_a_temperature"`
	Working string `json:"working"`
}

func failures(spec *translate.Specification) []failureJSON {
	out := []failureJSON{}
	for _, f := range spec.SensorFailures() {
		j := failureJSON{Sensor: f.Sensor, What: f.What, Inside: f.Inside, Working: f.Working}
		if f.Known {
			j.Count = &f.Count
		}
		out = append(out, j)
	}
	return out
}

type stageJSON struct {
	Load    string `json:"load"`
	Output  string `json:"output"`
	Check   string `json:"question"`
	Holds   *bool  `json:"holds"` // null where it is not determined
	Working string `json:"working"`
}

func stages(spec *translate.Specification) []stageJSON {
	out := []stageJSON{}
	for _, s := range spec.Stages {
		for _, c := range s.Checks {
			j := stageJSON{Load: s.Load, Output: s.Kind, Check: c.Name, Working: c.Working}
			if c.Determined {
				j.Holds = &c.Holds
			}
			out = append(out, j)
		}
	}
	return out
}

type tableJSON struct {
	Sensor  string  `json:"sensor"`
	From    float64 `json:"from_degc"`
	To      float64 `json:"to_degc"`
	Unit    float64 `json:"unit_k"`
	Bound   float64 `json:"bound_k"`
	Worst   float64 `json:"worst_k"`
	Pieces  int     `json:"pieces"`
	Bytes   int     `json:"bytes"`
	Working string  `json:"working"`
}

func tables(spec *translate.Specification) []tableJSON {
	out := []tableJSON{}
	for _, c := range spec.Conversions {
		out = append(out, tableJSON{c.Sensor, c.From, c.To, c.Unit, c.Bound, c.Worst, c.Pieces, c.Bytes, c.Working})
	}
	return out
}

type tuningJSON struct {
	Control     string   `json:"control"`
	Rule        string   `json:"rule"`
	Taken       bool     `json:"taken"`
	Gain        *float64 `json:"gain_per_k"` // null where the rule gives nothing, or the figure is no number
	Integral    *float64 `json:"integral_time_s"`
	Derivative  *float64 `json:"derivative_time_s"`
	GainMargin  *float64 `json:"gain_margin"`
	PhaseMargin *float64 `json:"phase_margin_deg"`
	Sensitivity *float64 `json:"peak_sensitivity"`
	Overshoot   *float64 `json:"overshoot"`
	Settling    *float64 `json:"settling_s"`
	Source      string   `json:"source"`
	Refused     string   `json:"refused,omitempty"`
}

func tunings(spec *translate.Specification) []tuningJSON {
	out := []tuningJSON{}
	for _, t := range spec.Tunings {
		for _, r := range t.Rules {
			j := tuningJSON{Control: t.Control, Rule: r.Name, Taken: r.Name == t.Chosen.Name, Source: r.Source, Refused: r.Refused}
			if r.Refused == "" {
				s := r.Settings.Parallel()
				j.Gain, j.Integral, j.Derivative = finite(s.Kc), finite(s.Ti), finite(s.Td)
				j.GainMargin, j.PhaseMargin, j.Sensitivity = finite(r.Margins.Gain), finite(r.Margins.Phase), finite(r.Margins.Sensitivity)
				j.Overshoot, j.Settling = finite(r.Response.Overshoot), finite(r.Response.Settling)
			}
			out = append(out, j)
		}
	}
	return out
}

// finite is a number that JSON can hold, or null.
func finite(v float64) *float64 {
	if math.IsInf(v, 0) || math.IsNaN(v) {
		return nil
	}
	return &v
}
