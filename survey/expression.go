package survey

// Expression is a line of the old wiring or a condition over the plant's
// states, parsed, checked against the names of the sheet and reduced to a tree
// of the few things that such a line may say.
type Expression struct {
	Text string // as written
	Tree *Cond
}

// CondOp says what a node of a Cond is.
type CondOp int

const (
	CondName    CondOp = iota + 1 // a control, signal, timer or load is true
	CondNot                       // not Args[0]
	CondAnd                       // all of Args
	CondOr                        // any of Args
	CondLiteral                   // the word true or false
	CondCompare                   // Name (a sensor) compared with Limit
)

// Cond is a node of an expression's tree.
type Cond struct {
	Op        CondOp
	Name      string  // CondName, CondCompare
	Value     bool    // CondLiteral
	Cmp       string  // CondCompare: < <= > >=, sensor on the left
	Limit     float64 // CondCompare: degC
	LimitText string  // CondCompare: as written
	Args      []*Cond
}

// Names lists every name in the tree once, in order of first appearance.
func (c *Cond) Names() []string {
	var names []string
	seen := map[string]bool{}
	var walk func(*Cond)
	walk = func(n *Cond) {
		if n == nil {
			return
		}
		if n.Name != "" && !seen[n.Name] {
			seen[n.Name] = true
			names = append(names, n.Name)
		}
		for _, a := range n.Args {
			walk(a)
		}
	}
	walk(c)
	return names
}
