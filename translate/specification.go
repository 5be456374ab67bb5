// Package translate turns what was found in the plant room into what the new
// control must do: a Specification with every figure and its working, and a
// control program in whole numbers.
//
// One file holds one kind of part: probe.go the new sensors, contact.go the
// two-position controls, latch.go the limits that remember, clock.go the
// timers, load.go what is switched. Each builds its blocks out of package
// logic; nothing here knows how a program is run or printed.
package translate

import (
	"makebreak/survey"
	"makebreak/survey/catalogue"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Specification is everything that was worked out from one sheet.
type Specification struct {
	Survey    *survey.Survey
	Catalogue *catalogue.Catalogue
	Figures   Figures
	Program   *logic.Checked            // nil where no program could be made
	Plan      *Plan                     // what in the program belongs to which part; nil with Program
	Chains    map[string]*sensing.Chain // by sensor
	Budgets   []ErrorBudget
	// Thresholds of the translated controls, by control.
	Thresholds map[string]Thresholds
	Refused    []Refusal
	// Conversions are the tables of the sensors of which a temperature is needed.
	Conversions []*Conversion
	// Tunings are the rules for a continuous control, by control.
	Tunings []Tuning
	// Stages are the output stages and what was asked of each.
	Stages []Stage
	// Junctions are the thermocouples whose cold junction is measured, by sensor.
	Junctions map[string]*Junction
	Model     *Model           // how the process behaves; nil where nothing tells
	Matches   map[string]Match // how translated operating controls were matched, by control
	Cycles    []*ControlCycle  // of the operating two-position controls, in the order of the sheet
}

// ErrorBudget is the error of a sensor at one edge of one control.
type ErrorBudget struct {
	Control, Sensor, Edge string
	sensing.Budget
}

// Refusal is a part of the sheet that was not translated, and why.
type Refusal struct {
	About  string // id of the control
	Why    string
	Source survey.Source
}

// Plan says which variable of the program stands for which part of the sheet,
// for those who put faults into it or print it.
type Plan struct {
	Sensors     map[string]*Probe      // by sensor
	Contacts    map[string]*Contact    // by control
	Regulators  map[string]*Regulator  // by control: what gives an output between none and all
	Valves      map[string]*Valve      // by load: what takes one
	Loads       map[string]*Switched   // by load
	Pulsers     map[string]*Pulser     // by control
	Monitors    map[string]*Monitored  // by control: what stays and is watched
	Indications map[string]*Indication // by control
	Signals     map[string]*logic.Var
	Timers      map[string]*logic.Var
	Fault       *logic.Var
	Bits        []logic.Flag
}

// Figure is one derived value with its history.
type Figure struct {
	About   string   `json:"about"`
	Name    string   `json:"name"`
	Value   *float64 `json:"value"` // nil where it is not determined
	Unit    string   `json:"unit"`
	From    string   `json:"from"`
	Working string   `json:"working"` // where Value is nil: the reason
}

// Figures is a list in the order of working out.
type Figures []Figure

// Get finds a figure.
func (fs Figures) Get(about, name string) (Figure, bool) {
	for _, f := range fs {
		if f.About == about && f.Name == name {
			return f, true
		}
	}
	return Figure{}, false
}

// Value gives a figure's value where it is determined.
func (fs Figures) Value(about, name string) (float64, bool) {
	f, ok := fs.Get(about, name)
	if !ok || f.Value == nil {
		return 0, false
	}
	return *f.Value, true
}

func (fs *Figures) add(about, name string, value float64, unit, from, working string) {
	*fs = append(*fs, Figure{about, name, &value, unit, from, working})
}

func (fs *Figures) open(about, name, unit, from, reason string) {
	*fs = append(*fs, Figure{about, name, nil, unit, from, reason})
}
