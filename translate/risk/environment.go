package risk

import (
	"errors"
	"fmt"
	"maps"
	"math"
	"reflect"
	"strings"
	"sync"

	"github.com/expr-lang/expr"
	"github.com/expr-lang/expr/ast"
	"github.com/expr-lang/expr/checker"
	"github.com/expr-lang/expr/compiler"
	"github.com/expr-lang/expr/conf"
	"github.com/expr-lang/expr/file"
	"github.com/expr-lang/expr/vm"
)

// Bounds on one expression of a rule, so that a site's own file cannot take
// the program down.
const (
	longestExpression = 2000
	mostNodes         = 400
	memoryBudget      = 100_000
)

// names are the things and functions that every rule may use. The pointers
// are those of the view; the types are what expressions are checked against.
func names(v *View, figures *lookup) map[string]any {
	return map[string]any{
		"equipment": v.Equipment, "process": v.Process, "electronics": v.Electronics, "plant": v.Plant,
		"dangers": v.Dangers, "loads": v.Loads, "controls": v.Controls, "sensors": v.Sensors, "outputs": v.Outputs,
		"signals": v.Signals, "timers": v.Timers, "paths": v.Paths, "guards": v.Guards,
		"known": func(x float64) bool { return !math.IsNaN(x) },
		"has":   func(word string) bool { return word != "" && word != unknown },
		"list":  joined, "degc": Celsius, "kelvin": Kelvin, "amps": Amps, "percent": Percent, "years": Years,
		"duration": Duration, "num": func(x float64) string { return number(x, 3) },
		"whole": func(x float64) string { return number(x, 0) },
		"fig":   figures.value, "fig_reason": figures.reason, "has_fig": figures.has,
	}
}

// things names what `each` may say, with a typed nothing for checking.
func things() map[string]any {
	return map[string]any{
		"equipment": (*Equipment)(nil), "danger": (*Danger)(nil), "load": (*Load)(nil), "control": (*Control)(nil),
		"sensor": (*Sensor)(nil), "output": (*Output)(nil), "signal": (*Signal)(nil), "timer": (*Timer)(nil),
		"path": (*Path)(nil), "guard": (*Guard)(nil), "place": (*Place)(nil),
	}
}

// lookup finds figures for one evaluation and remembers what was not there.
type lookup struct {
	figures      map[Key]Figure
	missing      map[string]bool   // names of figures that nobody has worked out
	undetermined map[string]string // name: why it is not determined
}

func newLookup(figures map[Key]Figure) *lookup {
	return &lookup{figures: figures, missing: map[string]bool{}, undetermined: map[string]string{}}
}

// value is the figure of this name about the first of the things that has
// one; NaN where it is missing or not determined.
func (l *lookup) value(name string, abouts ...string) float64 {
	f, ok := l.find(name, abouts)
	switch {
	case !ok:
		l.missing[name] = true
		return math.NaN()
	case f.Value == nil:
		l.undetermined[name] = f.Reason
		return math.NaN()
	}
	return *f.Value
}

// has reports whether there is a figure with a value; a rule that asks so does
// without it otherwise, and does not wait.
func (l *lookup) has(name string, abouts ...string) bool {
	f, ok := l.find(name, abouts)
	return ok && f.Value != nil
}

// reason says why the figure is not determined, or is empty.
func (l *lookup) reason(name string, abouts ...string) string {
	f, _ := l.find(name, abouts)
	return f.Reason
}

func (l *lookup) find(name string, abouts []string) (Figure, bool) {
	for _, about := range abouts {
		if f, ok := l.figures[Key{about, name}]; ok {
			return f, true
		}
	}
	return Figure{}, false
}

// wants is the type that an expression has to give.
type wants int

const (
	aCondition wants = iota + 1
	aText            // a text or a number
)

// expression is a compiled expression of a rule.
type expression struct {
	text    string
	program *vm.Program
	figures []string // names of the figures that it asks for
}

// fault is something wrong in an expression, offset runes from its start.
type fault struct {
	offset  int
	message string
}

// compilers gives, for each kind of thing, what expressions are checked and
// compiled against. Reading the types of the view is most of the work, so it
// is done once for each kind and not for each expression.
var compilers = sync.OnceValue(func() map[string]*compilerOf {
	all := map[string]*compilerOf{}
	for each, thing := range things() {
		env := maps.Clone(names(&View{}, newLookup(nil)))
		env[each] = thing
		c := conf.New(env)
		for _, option := range []expr.Option{
			expr.DisableAllBuiltins(), expr.EnableBuiltin("len"), expr.Optimize(false), expr.MaxNodes(mostNodes),
		} {
			option(c)
		}
		for name := range c.Disabled {
			delete(c.Builtins, name)
		}
		c.Check()
		all[each] = &compilerOf{config: c}
	}
	return all
})

// compilerOf is one of them; the types in it are looked up through a cache,
// which one compilation at a time may use.
type compilerOf struct {
	sync.Mutex
	config *conf.Config
}

func (c *compilerOf) compile(text string) (*vm.Program, error) {
	c.Lock()
	defer c.Unlock()
	tree, err := checker.ParseCheck(text, c.config)
	if err != nil {
		return nil, err
	}
	return compiler.Compile(tree, c.config)
}

// compile checks an expression against the names that a rule for each such
// thing may use.
func compile(text, each string, want wants) (*expression, *fault) {
	if len(text) > longestExpression {
		return nil, &fault{0, fmt.Sprintf("longer than %d characters", longestExpression)}
	}
	c, ok := compilers()[each]
	if !ok {
		return nil, &fault{0, "nothing to judge: " + each}
	}
	program, err := c.compile(text)
	if err != nil {
		return nil, faultOf(err)
	}
	if f := checkType(program.Node().Type(), want); f != nil {
		return nil, f
	}
	e := &expression{text: text, program: program}
	asked := figureNames{}
	node := program.Node()
	ast.Walk(&node, &asked)
	if asked.fault != nil {
		return nil, asked.fault
	}
	e.figures = asked.names
	return e, nil
}

func faultOf(err error) *fault {
	var fe *file.Error
	if !errors.As(err, &fe) {
		return &fault{0, err.Error()}
	}
	return &fault{fe.From, plainWords(fe.Message)}
}

// plainWords takes the names of Go types out of a message.
func plainWords(message string) string {
	for _, r := range [][2]string{
		{"type *risk.", "a "}, {"type risk.", "a "}, {"*risk.", ""}, {"risk.", ""},
		{"has no field", "has no key"}, {"float64", "number"}, {"[]string", "list of words"}, {"string", "text"},
	} {
		message = strings.ReplaceAll(message, r[0], r[1])
	}
	return message
}

func checkType(t reflect.Type, want wants) *fault {
	kind := reflect.Invalid
	if t != nil {
		kind = t.Kind()
	}
	switch {
	case want == aCondition && kind != reflect.Bool:
		return &fault{0, "a condition must be true or false"}
	case want == aText && kind != reflect.String && kind != reflect.Float64 && kind != reflect.Int:
		return &fault{0, "must give a text or a number"}
	}
	return nil
}

// figureNames collects the figures that an expression asks for. Their names
// have to stand there in quotes, so that a rule can be known to wait.
type figureNames struct {
	names []string
	fault *fault
}

// Visit implements ast.Visitor.
func (f *figureNames) Visit(node *ast.Node) {
	call, ok := (*node).(*ast.CallNode)
	if !ok {
		return
	}
	callee, ok := call.Callee.(*ast.IdentifierNode)
	if !ok || callee.Value != "fig" {
		return
	}
	if len(call.Arguments) > 0 {
		if name, ok := call.Arguments[0].(*ast.StringNode); ok {
			f.names = addOnce(f.names, name.Value)
			return
		}
	}
	f.fault = &fault{call.Location().From, "the name of a figure must stand in quotes"}
}

func (e *expression) run(env map[string]any) (any, error) {
	machine := vm.VM{MemoryBudget: memoryBudget}
	return machine.Run(e.program, env)
}
