package translate

import (
	"fmt"
	"math"
	"slices"

	"makebreak/survey"
	"makebreak/translate/logic"
	"makebreak/translate/sensing"
)

// Junction is a thermocouple whose cold junction another sensor measures. A
// raw count of it gives no fixed temperature, so the program adds what the
// couple lacks, E(cold) in counts, out of a table over the counts of the other
// sensor. From then on everything is as behind an amplifier that compensates.
type Junction struct {
	Cold      string  // the sensor at the cold junction
	From, To  float64 // degC, what the cold junction is expected to be
	Worst     float64 // counts, the largest error of the table over every count of the other sensor
	low, high int64   // believable raw counts of the couple
	table     *logic.Table
}

// What a cold junction is taken to be where the enclosure's temperatures are
// not stated, how far beyond it may go, and the spacing of the table's points.
const (
	coldFrom, coldTo = 0.0, 50.0 // degC, common practice
	coldRoom         = 10.0      // K
	coldSpacing      = 10.0      // K
)

// junctions works out the chains of the couples whose cold junction is
// measured. The chains of the other sensors have been built.
func (b *builder) junctions() {
	for _, s := range b.survey.Electronics.Sensors {
		cold := b.spec.Chains[s.ColdJunction.V]
		if !s.ColdJunction.Set || cold == nil {
			continue
		}
		couple, err := sensing.NewJunction(s, b.survey.Electronics.ADC, b.survey.Equipment.Enclosure)
		if err != nil {
			b.fail(s.Source, "the measuring chain of "+s.ID.V+" does not work", err.Error(), "another front end or another sensor")
			continue
		}
		j, err := b.junction(s, couple, cold)
		if err != nil {
			b.fail(s.ColdJunction.Source, "the cold junction of "+s.ID.V+" cannot be taken into account", err.Error(), "a sensor that sees the temperatures of the enclosure")
			continue
		}
		b.spec.Chains[s.ID.V], b.spec.Junctions[s.ID.V] = couple.Compensated, j
	}
}

func (b *builder) junction(s *survey.Sensor, couple *sensing.Junction, cold *sensing.Chain) (*Junction, error) {
	j := &Junction{Cold: cold.Sensor.ID.V, From: coldFrom, To: coldTo}
	if box := b.survey.Equipment.Enclosure.Temperature; box.Set {
		j.From, j.To = box.V[0], box.V[1]
	}
	low, high := cold.Valid()
	j.From, j.To = math.Max(j.From-coldRoom, low), math.Min(j.To+coldRoom, high)
	if !(j.From < j.To) {
		return nil, fmt.Errorf("%s is believed from %s to %s only", j.Cold, Degrees(low), Degrees(high))
	}
	if err := j.tabulate(couple, cold); err != nil {
		return nil, err
	}
	var err error
	if j.low, j.high, err = couple.Believable(j.From, j.To); err != nil {
		return nil, err
	}
	c := couple.Compensated
	if budget, err := cold.Budget(25); err == nil && !s.ColdJunctionError.Written() {
		c.JunctionError = sensing.Contribution{Kelvin: budget.WorstCase, Working: "worst case of " + j.Cold + " at 25 degC"}
	}
	c.Counts = sensing.Contribution{Name: "cold junction: table", Kelvin: j.Worst, Working: "whole counts, and straight lines between points"}
	b.spec.Figures.add(s.ID.V, "junction_table_error", j.Worst, "counts", s.ColdJunction.Path, "largest error over every count of "+j.Cold+" from "+Degrees(j.From)+" to "+Degrees(j.To))
	return j, nil
}

// tabulate lays the table over the counts of the other sensor, and goes
// through every one of them.
func (j *Junction) tabulate(couple *sensing.Junction, cold *sensing.Chain) error {
	type point struct{ x, y int64 }
	var ps []point
	n := int(math.Ceil((j.To - j.From) / coldSpacing))
	for i := 0; i <= n; i++ {
		t := j.From + (j.To-j.From)*float64(i)/float64(n)
		x, err := cold.Count(t)
		if err != nil {
			return err
		}
		low, high := cold.Temperature(x)
		shift, err := couple.Shift((low + high) / 2)
		if err != nil {
			return err
		}
		ps = append(ps, point{x, int64(math.Round(shift))})
	}
	slices.SortFunc(ps, func(a, b point) int { return int(a.x - b.x) })
	j.table = &logic.Table{Name: couple.Compensated.Sensor.ID.V + "_cold", Unit: "counts",
		What: "what the couple lacks at its cold junction, over the counts of " + j.Cold}
	for i, p := range ps {
		if i > 0 && p.x == ps[i-1].x {
			continue
		}
		j.table.X, j.table.Y = append(j.table.X, p.x), append(j.table.Y, p.y)
	}
	if len(j.table.X) < 2 {
		return fmt.Errorf("%s does not tell %s from %s", j.Cold, Degrees(j.From), Degrees(j.To))
	}
	for x := j.table.X[0]; x <= j.table.X[len(j.table.X)-1]; x++ {
		low, high := cold.Temperature(x)
		exact, err := couple.Shift((low + high) / 2)
		if err != nil {
			return err
		}
		j.Worst = math.Max(j.Worst, math.Abs(exact-float64(j.table.At(x))))
	}
	j.table.Working = fmt.Sprintf("E(cold) × gain in counts every %g K; worst error %.3g counts", coldSpacing, j.Worst)
	return nil
}

// compensate adds what the couple lacks to the median of its samples.
func (b *builder) compensate(p *Probe, j *Junction) {
	id := p.Sensor.ID.V
	p.Cold = b.plan.Sensors[j.Cold]
	j.table.Name = b.name(j.table.Name)
	b.prog.Tables = append(b.prog.Tables, j.table)
	v := &logic.Var{Name: b.name(id, "compensated"), What: "counts of " + id + " as with its cold junction at 0 degC", Kind: logic.Int, Range: logic.Count}
	b.add(&logic.Define{Var: v, As: logic.Clamp(
		logic.Add(logic.Use(p.Value), logic.Lookup(j.table, logic.Use(p.Cold.Value))), logic.Lit(logic.Count.Lo), logic.Lit(logic.Count.Hi))})
	p.Value = v
}

// restingCold is the cold junction's temperature where nothing else is said,
// degC.
const restingCold = 20.0

// Count is what the converter reads of a sensor at t degC; of a couple whose
// cold junction is measured, with that at 20 degC.
func (s *Specification) Count(sensor string, t float64) (int64, error) {
	n, err := s.Chains[sensor].Count(t)
	j := s.Junctions[sensor]
	if err != nil || j == nil {
		return n, err
	}
	cold, err := s.Chains[j.Cold].Count(math.Min(math.Max(restingCold, j.From), j.To))
	return max(n-j.table.At(cold), 0), err
}
