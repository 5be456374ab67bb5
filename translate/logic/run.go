package logic

// Run is a program at work: the definition of what a Program means.
type Run struct {
	prog   *Checked
	code   *compiled
	m      []int64 // variables, constants, intermediate results
	inputs int
	kept   int // inputs and variables that live on end here

	// Probe, where set on a run made by NewProbed, is called at every decision
	// with the outcome of each atom (bit 0: the first) and, for comparisons of
	// numbers, how near the operands were: bit i of equal where they were the
	// same, of close where they differed by one.
	Probe func(d int, outcome bool, atoms, equal, close uint64)
}

// NewRun makes a run of the program. It must be started before its first step.
func (c *Checked) NewRun() *Run { return c.newRun(false) }

// NewProbed makes a slower run that reports its decisions.
func (c *Checked) NewProbed() *Run { return c.newRun(true) }

func (c *Checked) newRun(probes bool) *Run {
	r := &Run{prog: c, code: c.compile(probes, true)}
	r.m = make([]int64, r.code.size)
	copy(r.m[len(c.slots):], r.code.presets)
	r.inputs = len(c.Inputs)
	r.kept = r.inputs + len(c.State)
	for _, p := range c.Never {
		r.kept += len(p.Kept)
	}
	return r
}

// Fork is a second run of the same program in the same state. The two share
// nothing that changes.
func (r *Run) Fork() *Run {
	f := *r
	f.m = append([]int64(nil), r.m...)
	return &f
}

// Decisions lists the decision points of a run made by NewProbed, in the
// numbering that Probe uses.
func (r *Run) Decisions() []*Decision { return r.code.decisions }

// Start puts every variable to its start value, and the surviving ones to what
// the record holds. No record, a wrong check word or a value outside its range
// leaves them all at their start values.
func (r *Run) Start(rec *Record) {
	for _, v := range r.prog.State {
		r.m[r.prog.slots[v]] = v.Start
	}
	for _, p := range r.prog.Never {
		for _, v := range p.Kept {
			r.m[r.prog.slots[v]] = v.Start
		}
	}
	for _, v := range r.prog.Outputs {
		r.m[r.prog.slots[v]] = 0
	}
	survivors := r.prog.Survivors()
	if rec == nil || len(rec.Values) != len(survivors) || r.prog.CheckWord(rec.Values) != rec.Check {
		return
	}
	for i, v := range survivors {
		if !v.Range.Holds(rec.Values[i]) {
			return
		}
	}
	for i, v := range survivors {
		r.m[r.prog.slots[v]] = rec.Values[i]
	}
}

// Remember gives the record that would survive a power cut now.
func (r *Run) Remember() Record {
	var rec Record
	for _, v := range r.prog.Survivors() {
		rec.Values = append(rec.Values, r.m[r.prog.slots[v]])
	}
	rec.Check = r.prog.CheckWord(rec.Values)
	return rec
}

// Step runs one step on the inputs, given in the order of Program.Inputs.
func (r *Run) Step(inputs []int64) {
	copy(r.m[:r.inputs], inputs)
	r.run()
}

// Get reads a variable or an output as it was after the last step.
func (r *Run) Get(v *Var) int64 { return r.m[r.prog.slots[v]] }

// Violated gives the first property that the last step broke, or nil.
func (r *Run) Violated() *Property {
	for i, at := range r.code.bad {
		if r.m[at] != 0 {
			return r.prog.Never[i]
		}
	}
	return nil
}

// Snapshot copies what lives from step to step (into buf where it is long enough).
func (r *Run) Snapshot(buf []int64) []int64 {
	return append(buf[:0], r.m[r.inputs:r.kept]...)
}

// Restore goes back to a snapshot.
func (r *Run) Restore(s []int64) { copy(r.m[r.inputs:r.kept], s) }

func (r *Run) run() {
	m, code := r.m, r.code.code
	for pc := 0; pc < len(code); {
		in := &code[pc]
		pc++
		switch in.op {
		case cMove:
			m[in.d] = m[in.a]
		case cAdd:
			m[in.d] = m[in.a] + m[in.b]
		case cSub:
			m[in.d] = m[in.a] - m[in.b]
		case cMul:
			m[in.d] = m[in.a] * m[in.b]
		case cDiv:
			m[in.d] = m[in.a] / m[in.b]
		case cEq:
			m[in.d] = bit(m[in.a] == m[in.b])
		case cNe:
			m[in.d] = bit(m[in.a] != m[in.b])
		case cLt:
			m[in.d] = bit(m[in.a] < m[in.b])
		case cLe:
			m[in.d] = bit(m[in.a] <= m[in.b])
		case cGt:
			m[in.d] = bit(m[in.a] > m[in.b])
		case cGe:
			m[in.d] = bit(m[in.a] >= m[in.b])
		case cNot:
			m[in.d] = m[in.a] ^ 1
		case cAnd:
			m[in.d] = m[in.a] & m[in.b]
		case cOr:
			m[in.d] = m[in.a] | m[in.b]
		case cSelect:
			if m[in.a] != 0 {
				m[in.d] = m[in.b]
			} else {
				m[in.d] = m[in.c]
			}
		case cClamp:
			m[in.d] = clamp(m[in.a], m[in.b], m[in.c])
		case cToward:
			m[in.d] = m[in.a] + (m[in.b]-m[in.a])/m[in.c]
		case cLookup:
			m[in.d] = r.code.tables[in.c].At(m[in.a])
		case cTick:
			if m[in.d] < m[in.a] {
				m[in.d]++
			}
		case cJump:
			pc = int(in.c)
		case cJumpIf0:
			if m[in.a] == 0 {
				pc = int(in.c)
			}
		case cSwitch:
			t := r.code.targets[in.c]
			if s := m[in.a]; s >= 0 && s < int64(len(t)-1) {
				pc = int(t[s])
			} else {
				pc = int(t[len(t)-1])
			}
		case cFlag:
			m[in.d] |= m[in.a] << in.c
		case cProbe:
			r.report(int(in.c))
		}
	}
}

func (r *Run) report(n int) {
	if r.Probe == nil {
		return
	}
	d := r.code.decisions[n]
	var atoms, equal, close uint64
	for i, at := range d.atoms {
		atoms |= uint64(r.m[at]) << i
		if s := d.sides[i]; s[0] >= 0 {
			switch r.m[s[0]] - r.m[s[1]] {
			case 0:
				equal |= 1 << i
			case 1, -1:
				close |= 1 << i
			}
		}
	}
	r.Probe(n, r.m[d.slot] != 0, atoms, equal, close)
}

// At is the table's value at x.
func (t *Table) At(x int64) int64 {
	last := len(t.X) - 1
	if x <= t.X[0] {
		return t.Y[0]
	}
	if x >= t.X[last] {
		return t.Y[last]
	}
	i := 1
	for x > t.X[i] {
		i++
	}
	return t.Y[i-1] + (t.Y[i]-t.Y[i-1])*(x-t.X[i-1])/(t.X[i]-t.X[i-1])
}

func bit(b bool) int64 {
	if b {
		return 1
	}
	return 0
}
