package prove

import "slices"

// recorded runs a sequence on the program as it was given and writes down what
// it does, a new row wherever the inputs, or the outputs, change.
func (s *search) recorded(d *draft) Vector {
	r := &recorder{d: &driver{run: s.c.NewRun(), leaper: s.given}, outs: newReader(s.c), state: len(s.c.State)}
	r.d.run.Start(d.record)
	r.d.begin()
	v := Vector{Start: d.record, Why: d.why}
	for _, l := range d.legs {
		v.Rows = append(v.Rows, r.leg(l)...)
	}
	return v
}

type recorder struct {
	d     *driver
	outs  *outputs
	state int // how many variables a state has
}

// leg records one leg.
func (r *recorder) leg(l leg) []Row {
	var rows []Row
	row := Row{Inputs: l.inputs}
	end := func(state []int64) {
		row.State = slices.Clone(state[:r.state])
		rows = append(rows, row)
		row = Row{Inputs: l.inputs}
	}
	r.d.turn()
	for n := 0; n < l.steps; n++ {
		r.d.step(l.inputs)
		out := r.outs.read(r.d.run)
		switch {
		case row.takes(out):
		case turns(rows, row, out):
			row = Row{Inputs: l.inputs, Steps: 3, Outputs: rows[len(rows)-1].Outputs, Then: row.Outputs}
			rows = rows[:len(rows)-1]
		default:
			end(r.d.before)
			row.takes(out)
		}
		if row.Steps >= 2 {
			leapt, _ := r.d.leap(l.steps-n-1, row.period())
			row.Steps += leapt
			n += leapt
		}
	}
	end(r.d.after)
	return rows
}

// period is after how many steps the outputs of a row come again.
func (r *Row) period() int {
	if r.Then != nil {
		return 2
	}
	return 1
}

// takes lengthens the row by one step if the outputs go on as they were.
func (r *Row) takes(out []int64) bool {
	if r.Steps == 0 {
		r.Outputs = slices.Clone(out)
	} else if !slices.Equal(out, r.due(r.Steps)) {
		return false
	}
	r.Steps++
	return true
}

// due gives the outputs after the n-th step of the row, counted from 0.
func (r *Row) due(n int) []int64 {
	if n%2 == 1 && r.Then != nil {
		return r.Then
	}
	return r.Outputs
}

// turns reports whether the outputs of the last row, the present one and now
// go to and fro step by step.
func turns(rows []Row, row Row, out []int64) bool {
	if len(rows) == 0 || row.Steps != 1 || row.Then != nil {
		return false
	}
	last := rows[len(rows)-1]
	return last.Steps == 1 && last.Then == nil && slices.Equal(last.Outputs, out)
}
