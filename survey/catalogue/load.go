package catalogue

import (
	"embed"
	"errors"
	"fmt"
	"io/fs"
	"math"
	"slices"

	"go.yaml.in/yaml/v4"
)

//go:embed elements.yaml sensors.yaml outputs.yaml
var files embed.FS

// read reads and checks the three files of a catalogue.
func read(fsys fs.FS) (*Catalogue, error) {
	var elements struct {
		Any      []Failure  `yaml:"any"`
		Contact  []Failure  `yaml:"contact"`
		Elements []*Element `yaml:"elements"`
		Refused  []*Refused `yaml:"refused"`
	}
	var sensors struct {
		Any     []SensorFailure `yaml:"any"`
		Sensors []*Sensor       `yaml:"sensors"`
	}
	var outputs struct {
		Outputs []*Output   `yaml:"outputs"`
		Loads   []*LoadKind `yaml:"loads"`
	}
	err := errors.Join(
		decode(fsys, "elements.yaml", &elements),
		decode(fsys, "sensors.yaml", &sensors),
		decode(fsys, "outputs.yaml", &outputs),
	)
	if err != nil {
		return nil, err
	}
	c := &Catalogue{
		Elements: elements.Elements, Any: elements.Any, Contact: elements.Contact, Refused: elements.Refused,
		Sensors: sensors.Sensors, AnySensor: sensors.Any,
		Outputs: outputs.Outputs, Loads: outputs.Loads,
	}
	if err := errors.Join(c.check()...); err != nil {
		return nil, err
	}
	return c, nil
}

func decode(fsys fs.FS, name string, into any) error {
	data, err := fs.ReadFile(fsys, name)
	if err != nil {
		return err
	}
	if err := yaml.Load(data, into, yaml.WithKnownFields(), yaml.WithUniqueKeys()); err != nil {
		return fmt.Errorf("%s: %w", name, err)
	}
	return nil
}

// UnmarshalYAML reads a source: the words `common practice`, or a name with
// its status.
func (s *Source) UnmarshalYAML(node *yaml.Node) error {
	if node.Kind == yaml.ScalarNode {
		if node.Value != string(CommonPractice) {
			return fmt.Errorf("line %d: source %q has no status; write {name: …, status: …}", node.Line, node.Value)
		}
		*s = Source{Name: node.Value, Status: CommonPractice}
		return nil
	}
	if node.Kind != yaml.MappingNode {
		return fmt.Errorf("line %d: a source is a word or {name: …, status: …}", node.Line)
	}
	for i := 0; i+1 < len(node.Content); i += 2 {
		switch key, value := node.Content[i].Value, node.Content[i+1].Value; key {
		case "name":
			s.Name = value
		case "status":
			s.Status = Status(value)
		default:
			return fmt.Errorf("line %d: source has no key %q", node.Content[i].Line, key)
		}
	}
	return nil
}

// checker collects what is wrong, each with the place it is wrong at.
type checker struct {
	at   string
	errs []error
}

func (c *checker) fault(format string, args ...any) {
	c.errs = append(c.errs, fmt.Errorf("%s: %s", c.at, fmt.Sprintf(format, args...)))
}

func (c *checker) text(key, value string) {
	if value == "" {
		c.fault("%s is missing", key)
	}
}

func (c *checker) word(key, value string, allowed ...string) {
	if !slices.Contains(allowed, value) {
		c.fault("%s is %q, not one of %v", key, value, allowed)
	}
}

func (c *checker) source(key string, s Source) {
	c.text(key+" source", s.Name)
	c.word(key+" status", string(s.Status), string(Sure), string(SecondHand), string(FromMemory), string(CommonPractice))
}

func (c *checker) figure(key string, f *Figure, least float64) {
	if f == nil {
		return
	}
	c.source(key, f.Source)
	if !finite(f.Usual, f.From, f.To) || f.From < least || f.Usual < f.From || f.To < f.Usual {
		c.fault("%s: %g is not between %g and %g", key, f.Usual, f.From, f.To)
	}
}

func (c *checker) span(key string, s Span) {
	c.source(key, s.Source)
	if !finite(s.From, s.To) || s.From >= s.To || s.From < -273.15 {
		c.fault("%s: %g to %g is no range", key, s.From, s.To)
	}
}

func finite(values ...float64) bool {
	return !slices.ContainsFunc(values, func(v float64) bool { return math.IsNaN(v) || math.IsInf(v, 0) })
}

func (c *checker) unique(kind string, ids []string) {
	seen := map[string]bool{}
	for _, id := range ids {
		if seen[id] {
			c.fault("%s %q stands there twice", kind, id)
		}
		seen[id] = true
	}
	if len(ids) == 0 {
		c.fault("no %s at all", kind)
	}
}

func (c *Catalogue) check() []error {
	k := &checker{}
	k.at = "elements"
	k.unique("element", keys(c.Elements, func(e *Element) string { return e.ID }))
	for _, e := range c.Elements {
		k.element(e)
	}
	k.failures("any", c.Any)
	k.failures("contact", c.Contact)
	k.at = "sensors"
	k.unique("sensor", keys(c.Sensors, func(s *Sensor) string { return s.Kind }))
	for _, s := range c.Sensors {
		k.sensor(s)
	}
	k.sensorFailures("any", c.AnySensor)
	k.at = "outputs"
	k.unique("output", keys(c.Outputs, func(o *Output) string { return o.Kind }))
	for _, o := range c.Outputs {
		k.output(o)
	}
	k.at = "loads"
	k.unique("load", keys(c.Loads, func(l *LoadKind) string { return l.Kind }))
	for _, l := range c.Loads {
		k.at = "load " + l.Kind
		k.text("title", l.Title)
		k.figure("inrush", &l.Inrush, 1)
	}
	k.at = "refused"
	k.unique("refused control", keys(c.Refused, func(r *Refused) string { return r.ID }))
	for _, r := range c.Refused {
		k.at = "refused " + r.ID
		k.text("title", r.Title)
		k.text("why", r.Why)
		k.source("why", r.Source)
		k.unique("phrase", r.Phrases)
	}
	return k.errs
}

func keys[T any](list []*T, key func(*T) string) []string {
	ids := make([]string, len(list))
	for i, item := range list {
		ids[i] = key(item)
	}
	return ids
}

func (c *checker) element(e *Element) {
	c.at = "element " + e.ID
	c.text("id", e.ID)
	c.text("title", e.Title)
	c.text("works", e.Works)
	c.source("works", e.Source)
	c.figure("tolerance", e.Tolerance, 0)
	c.figure("differential", e.Differential, 0)
	c.figure("lag_liquid", e.LagLiquid, 0)
	c.figure("lag_air", e.LagAir, 0)
	c.span("range", e.Range)
	c.failures("element "+e.ID, e.Failures)
	for _, s := range e.Contains {
		c.text("contains", s.What)
		c.text("where", s.Where)
		c.text("do", s.Do)
		c.source("contains "+s.What, s.Source)
	}
	for _, r := range e.Forgot {
		c.text("forgot id", r.ID)
		c.text("forgot what", r.What)
		c.source("forgot "+r.ID, r.Source)
	}
}

func (c *checker) failures(at string, list []Failure) {
	c.at = at
	ids := make([]string, len(list))
	for i, f := range list {
		ids[i] = f.ID
		c.text("failure id", f.ID)
		c.text("failure what", f.What)
		c.word(f.ID+" reads", f.Reads, "cold", "hot", "stays", "makes", "breaks", "position", "unknown")
		c.source(f.ID, f.Source)
		if f.Depends == "" && (f.Reads == "unknown" || f.Reads == "position") {
			c.fault("%s reads %s and does not say on what it depends", f.ID, f.Reads)
		}
	}
	c.unique("failure", ids)
}

func (c *checker) sensor(s *Sensor) {
	c.at = "sensor " + s.Kind
	c.text("title", s.Title)
	c.source("sensor", s.Source)
	c.figure("lag_liquid", s.LagLiquid, 0)
	c.figure("lag_air", s.LagAir, 0)
	c.span("range", s.Range)
	c.sensorFailures("sensor "+s.Kind, s.Failures)
}

func (c *checker) sensorFailures(at string, list []SensorFailure) {
	c.at = at
	ids := make([]string, len(list))
	for i, f := range list {
		ids[i] = f.ID
		c.text("failure what", f.What)
		c.word(f.ID+" reads", f.Reads, "cold", "hot", "in_range", "end_of_scale", "unknown")
		c.word(f.ID+" found", f.Found, "yes", "no", "depends")
		c.source(f.ID, f.Source)
	}
	c.unique("failure", ids)
}

func (c *checker) output(o *Output) {
	c.at = "output " + o.Kind
	c.text("title", o.Title)
	c.source("output", o.Source)
	ids := make([]string, len(o.Failures))
	dominant := 0
	for i, f := range o.Failures {
		ids[i] = f.ID
		c.text("failure what", f.What)
		c.word(f.ID+" leaves", f.Leaves, "on", "off", "half", "in_between", "stays")
		c.source(f.ID, f.Source)
		if f.Dominant {
			dominant++
		}
	}
	c.unique("failure", ids)
	if dominant != 1 {
		c.fault("%d dominant failures, not one", dominant)
	}
}
