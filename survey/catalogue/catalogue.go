// Package catalogue holds what is known of sensing elements, new sensors,
// output stages and loads before a sheet is read: usual tolerance, differential
// and lag, every way each of them fails and in which direction, what it
// contains, and what else it did that people forget.
//
// The data are three YAML files beside this one, embedded and read strictly:
// an unknown key, a word that is not in its list, a figure outside its own
// range or a line without a source is an error. Words (elements, kinds,
// actions) are plain strings, spelt as in the survey sheet.
package catalogue

import "sync"

// Status says how well a source is known.
type Status string

const (
	Sure           Status = "sure"            // seen in public material
	SecondHand     Status = "second-hand"     // seen only in copies
	FromMemory     Status = "from memory"     // not looked up
	CommonPractice Status = "common practice" // no source; what the trade does
)

// Source is where a line comes from. Name is "common practice" where there is
// no published source.
type Source struct {
	Name   string
	Status Status
}

// String gives the source as it is printed beside a line.
func (s Source) String() string {
	if s.Status == CommonPractice {
		return s.Name
	}
	return s.Name + " (" + string(s.Status) + ")"
}

// Figure is a usual value and the range in which such parts are found. Its
// unit is named by the field that holds it.
type Figure struct {
	Usual  float64 `yaml:"usual"`
	From   float64 `yaml:"from"`
	To     float64 `yaml:"to"`
	Source Source  `yaml:"source"`
}

// Span is a lowest and a highest value.
type Span struct {
	From   float64 `yaml:"from"`
	To     float64 `yaml:"to"`
	Source Source  `yaml:"source"`
}

// Element is a sensing element of a mechanical control.
type Element struct {
	ID           string      `yaml:"id"`
	Title        string      `yaml:"title"`
	Works        string      `yaml:"works"` // how it works, one sentence
	Source       Source      `yaml:"source"`
	Tolerance    *Figure     `yaml:"tolerance"`    // K, plus or minus; nil: it has no threshold of its own
	Differential *Figure     `yaml:"differential"` // K; nil: it does not go back
	LagLiquid    *Figure     `yaml:"lag_liquid"`   // s, in a liquid or clamped to metal; nil: not used so
	LagAir       *Figure     `yaml:"lag_air"`      // s, in air
	Range        Span        `yaml:"range"`        // degC in which such elements are made
	Failures     []Failure   `yaml:"failures"`     // of the element itself; see Catalogue.FailuresOf
	Contains     []Substance `yaml:"contains"`
	Forgot       []Remark    `yaml:"forgot"` // what else it did, or needed, that people forget
}

// Failure is one way in which an element or its contact fails.
type Failure struct {
	ID      string `yaml:"id"`
	What    string `yaml:"what"`
	Reads   string `yaml:"reads"` // cold hot stays makes breaks position unknown
	Silent  bool   `yaml:"silent"`
	Depends string `yaml:"depends"` // what of the construction decides; may be empty
	Source  Source `yaml:"source"`
}

// Substance is something in the old part that needs care.
type Substance struct {
	What   string `yaml:"what"`
	Where  string `yaml:"where"`
	Do     string `yaml:"do"`
	Source Source `yaml:"source"`
}

// Remark is a property of the old part that a replacement loses or changes.
type Remark struct {
	ID     string `yaml:"id"`
	What   string `yaml:"what"`
	Source Source `yaml:"source"`
}

// Sensor is a kind of new sensor.
type Sensor struct {
	Kind      string          `yaml:"kind"`
	Title     string          `yaml:"title"`
	LagLiquid *Figure         `yaml:"lag_liquid"` // s
	LagAir    *Figure         `yaml:"lag_air"`    // s
	Range     Span            `yaml:"range"`      // degC
	Source    Source          `yaml:"source"`
	Failures  []SensorFailure `yaml:"failures"` // of the kind itself; see Catalogue.SensorFailuresOf
}

// SensorFailure is one way in which a new sensor fails.
type SensorFailure struct {
	ID     string `yaml:"id"`
	What   string `yaml:"what"`
	Reads  string `yaml:"reads"` // cold hot in_range end_of_scale unknown
	Found  string `yaml:"found"` // by a check against the believable range: yes no depends
	Note   string `yaml:"note"`
	Source Source `yaml:"source"`
}

// Output is a kind of output stage.
type Output struct {
	Kind     string          `yaml:"kind"`
	Title    string          `yaml:"title"`
	Source   Source          `yaml:"source"`
	Failures []OutputFailure `yaml:"failures"`
}

// OutputFailure is one way in which an output stage fails.
type OutputFailure struct {
	ID       string `yaml:"id"`
	What     string `yaml:"what"`
	Leaves   string `yaml:"leaves"`   // the load: on off half in_between stays
	Dominant bool   `yaml:"dominant"` // the usual way; exactly one an output
	Source   Source `yaml:"source"`
}

// Dominant is the usual way in which the stage fails.
func (o *Output) Dominant() OutputFailure {
	for _, f := range o.Failures {
		if f.Dominant {
			return f
		}
	}
	return OutputFailure{}
}

// LoadKind is a kind of load.
type LoadKind struct {
	Kind   string `yaml:"kind"`
	Title  string `yaml:"title"`
	Inrush Figure `yaml:"inrush"` // peak at switching on over the steady current
}

// Refused is a control that is recognised by its description and not translated.
type Refused struct {
	ID      string   `yaml:"id"`
	Title   string   `yaml:"title"`
	Phrases []string `yaml:"phrases"`
	Why     string   `yaml:"why"`
	Source  Source   `yaml:"source"`
}

// Catalogue is the whole of it, in the order of its files.
type Catalogue struct {
	Elements  []*Element
	Sensors   []*Sensor
	Outputs   []*Output
	Loads     []*LoadKind
	Refused   []*Refused
	Any       []Failure       // failures that any element may have
	Contact   []Failure       // failures of the contact, whatever the element
	AnySensor []SensorFailure // failures that any new sensor may have
}

var load = sync.OnceValues(func() (*Catalogue, error) { return read(files) })

// Load reads the embedded catalogue; it is read once and must not be changed.
// An error means that the program was built from broken data.
func Load() (*Catalogue, error) { return load() }

// Element finds an element by its word in the sheet.
func (c *Catalogue) Element(id string) (*Element, bool) {
	return find(c.Elements, func(e *Element) bool { return e.ID == id })
}

// Sensor finds a kind of sensor by its word in the sheet.
func (c *Catalogue) Sensor(kind string) (*Sensor, bool) {
	return find(c.Sensors, func(s *Sensor) bool { return s.Kind == kind })
}

// Output finds a kind of output stage by its word in the sheet.
func (c *Catalogue) Output(kind string) (*Output, bool) {
	return find(c.Outputs, func(o *Output) bool { return o.Kind == kind })
}

// Load finds a kind of load by its word in the sheet.
func (c *Catalogue) Load(kind string) (*LoadKind, bool) {
	return find(c.Loads, func(l *LoadKind) bool { return l.Kind == kind })
}

func find[T any](list []*T, is func(*T) bool) (*T, bool) {
	for _, item := range list {
		if is(item) {
			return item, true
		}
	}
	return nil, false
}

// FailuresOf lists every way in which a control with this element and action
// fails: the element's own, those that any element has, and the contact's
// where the action is one that switches a contact.
func (c *Catalogue) FailuresOf(element, action string) ([]Failure, bool) {
	e, ok := c.Element(element)
	if !ok {
		return nil, false
	}
	list := append([]Failure(nil), e.Failures...)
	if !isOneShot(e) {
		list = append(list, c.Any...)
	}
	if switches(action) {
		list = append(list, c.Contact...)
	}
	return list, true
}

// A link has no setting and no pocket; its own list is complete.
func isOneShot(e *Element) bool { return e.Differential == nil && e.Tolerance != nil }

// SensorFailuresOf lists every way in which a new sensor of this kind fails.
func (c *Catalogue) SensorFailuresOf(kind string) ([]SensorFailure, bool) {
	s, ok := c.Sensor(kind)
	if !ok {
		return nil, false
	}
	return append(append([]SensorFailure(nil), s.Failures...), c.AnySensor...), true
}

// Lag is the usual sensing lag in s of the element in a medium of the sheet.
func (e *Element) Lag(medium string) (Figure, bool) { return lag(medium, e.LagLiquid, e.LagAir) }

// Lag is the usual sensing lag in s of a new sensor in a medium of the sheet.
func (s *Sensor) Lag(medium string) (Figure, bool) { return lag(medium, s.LagLiquid, s.LagAir) }

// lag takes the figure for air where the medium is air, or is not stated; and
// the only one there is where there is only one.
func lag(medium string, liquid, air *Figure) (Figure, bool) {
	first, second := air, liquid
	switch medium {
	case "water", "steam", "oil", "coolant", "refrigerant", "product", "surface":
		first, second = liquid, air
	}
	if first == nil {
		first = second
	}
	if first == nil {
		return Figure{}, false
	}
	return *first, true
}
