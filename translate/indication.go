package translate

import (
	"fmt"

	"makebreak/survey"
	"makebreak/translate/logic"
)

// Indication is a dial thermometer in the program: a temperature for a display.
type Indication struct {
	Control *survey.Control
	Probe   *Probe
	Out     *logic.Var
	Unit    float64 // K for one whole step
}

// nothingToShow is what an indication gives while its probe is not believed: no
// reading at all, rather than the last one.
const nothingToShow = -32768

// indication builds the temperature output of a dial thermometer.
func (b *builder) indication(c *survey.Control, p *Probe) *Indication {
	r := b.reading(p)
	none := b.constant(logic.Const{Name: c.ID.V + "_none", Value: nothingToShow, Unit: fmt.Sprintf("%g K", r.Unit), Means: "no reading: the probe is not believed",
		Origin: origin(c.Sensor.Source), Working: "below every temperature; a display shows bars"})
	out := &logic.Var{Name: c.ID.V, What: fmt.Sprintf("%s: temperature in steps of %g K; %d: no reading", c.What.V, r.Unit, nothingToShow), Kind: logic.Int,
		Range: logic.Range{Lo: nothingToShow, Hi: r.High}}
	b.prog.Outputs = append(b.prog.Outputs, out)
	b.add(&logic.Define{Var: out, As: logic.Select(p.good(), logic.Use(r.Value), logic.C(none))})
	return &Indication{Control: c, Probe: p, Out: out, Unit: r.Unit}
}
