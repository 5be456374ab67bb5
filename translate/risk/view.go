package risk

// A View is what a rule sees: the sheet, its fields named as the sheet's keys,
// and what was derived from it. In a rule
//
//   - a quantity that the sheet does not give is NaN: every comparison with it
//     is false, and known(…) tells;
//   - a word that the sheet does not give is "unknown", and a yes or no is one
//     of the words "true", "false", "unknown";
//   - a list that the sheet does not give is empty.
//
// Units are those of package survey: degC, K, s, A, V, W, fractions of one.
type View struct {
	Equipment   *Equipment   `expr:"equipment"`
	Process     *Process     `expr:"process"`
	Electronics *Electronics `expr:"electronics"`
	Plant       *Plant       `expr:"plant"`

	Dangers  []*Danger  `expr:"dangers"`
	Loads    []*Load    `expr:"loads"`
	Controls []*Control `expr:"controls"`
	Sensors  []*Sensor  `expr:"sensors"`
	Outputs  []*Output  `expr:"outputs"`
	Signals  []*Signal  `expr:"signals"`
	Timers   []*Timer   `expr:"timers"`
	Paths    []*Path    `expr:"paths"`
	Guards   []*Guard   `expr:"guards"`
	Places   []*Place   `expr:"places"`

	computed Computed
	answers  []answer
}

// Equipment is the piece of plant.
type Equipment struct {
	ID          string    `expr:"id"`
	Title       string    `expr:"title"`
	Site        string    `expr:"site"`
	Medium      string    `expr:"medium"`
	Enclosure   Enclosure `expr:"enclosure"`
	Conditions  string    `expr:"conditions"`
	Pressure    string    `expr:"pressure"`
	BuiltTo     string    `expr:"built_to"`
	InspectedBy string    `expr:"inspected_by"`
	Change      string    `expr:"change"`
}

// Enclosure is where the electronics would sit.
type Enclosure struct {
	Temperature []float64 `expr:"temperature"`
	Area        string    `expr:"area"`
}

// Process is how the temperature behaves.
type Process struct {
	DrivenBy     []string `expr:"driven_by"`
	Ambient      float64  `expr:"ambient"`
	SettlesOn    float64  `expr:"settles_on"`
	SettlesOff   float64  `expr:"settles_off"`
	TimeConstant float64  `expr:"time_constant"`
	DeadTime     float64  `expr:"dead_time"`
	Worst        Worst    `expr:"worst"`
	Log          string   `expr:"log"`
}

// Worst is the process on its worst day.
type Worst struct {
	SettlesOn  float64 `expr:"settles_on"`
	SettlesOff float64 `expr:"settles_off"`
}

// Plant is what can be said of the sheet as a whole.
type Plant struct {
	Replaced            []string `expr:"replaced"`             // controls with plan replace
	ProtectiveTouched   bool     `expr:"protective_touched"`   // a protective part is replaced or renewed
	SeriousDanger       bool     `expr:"serious_danger"`       // some danger does serious harm
	DangerBelow         bool     `expr:"danger_below"`         // some danger lies below a temperature
	DangerAbove         bool     `expr:"danger_above"`         // some danger lies above one
	HardLimits          []string `expr:"hard_limits"`          // hardware parts that are not operating controls
	AreasNotStated      []string `expr:"areas_not_stated"`     // places whose area is unknown
	PaperMissing        []string `expr:"paper_missing"`        // of change, inspector, rollback, spares, training, label
	NewestDate          string   `expr:"newest_date"`          // newest date in the sheet; nothing here reads a clock
	SupervisionPossible bool     `expr:"supervision_possible"` // heating without effect can be worked out
	SeriousLevelDriven  []string `expr:"serious_level_driven"` // loads that a stopped program may leave driving at a serious danger
	Observed            bool     `expr:"observed"`             // the old part's cycle was taken
}

// Danger is what must never be reached.
type Danger struct {
	ID        string  `expr:"id"`
	Above     float64 `expr:"above"`
	Below     float64 `expr:"below"`
	When      string  `expr:"when"` // as written
	For       float64 `expr:"for"`
	What      string  `expr:"what"`
	Harm      string  `expr:"harm"`
	Exposure  string  `expr:"exposure"`
	Avoidance string  `expr:"avoidance"`

	WordsAssumed bool     `expr:"words_assumed"` // exposure or avoidance does not stand in the sheet
	PLr          string   `expr:"plr"`           // required performance level, a to e, by the risk graph
	InProgram    bool     `expr:"in_program"`    // the function against it sits in the new program
	Judged       bool     `expr:"judged"`        // some load is known to drive there
	UnclearLoads []string `expr:"unclear_loads"` // loads of which the sheet does not say which way they drive
}

// Load is what is switched.
type Load struct {
	ID        string   `expr:"id"`
	What      string   `expr:"what"`
	Kind      string   `expr:"kind"`
	Supply    float64  `expr:"supply"`
	SupplyIs  string   `expr:"supply_is"`
	Current   float64  `expr:"current"`
	Inrush    float64  `expr:"inrush"`
	SafeState string   `expr:"safe_state"`
	Rest      string   `expr:"rest"`
	RunsWhen  string   `expr:"runs_when"` // as written
	Area      string   `expr:"area"`
	LitBy     string   `expr:"lit_by"`
	LowFire   float64  `expr:"low_fire"`
	Follows   string   `expr:"follows"`
	Actuator  Actuator `expr:"actuator"`

	Output         *Output  `expr:"output"`          // its output stage; kind "unknown" where none is given
	Effect         string   `expr:"effect"`          // heats cools none unknown: what switching it on does
	Heats          bool     `expr:"heats"`           // effect is heats
	Driven         bool     `expr:"driven"`          // the new program switches it
	SafeOn         bool     `expr:"safe_on"`         // its safe state is on or open
	RestsOn        bool     `expr:"rests_on"`        // it rests on or open
	Controls       []string `expr:"controls"`        // controls in its runs_when, directly or through a timer
	Stats          []string `expr:"stats"`           // of these, the ones that work every cycle
	Proving        []string `expr:"proving"`         // signals that its runs_when wants true
	ThermalStart   bool     `expr:"thermal_start"`   // starts on a rising temperature by itself
	Excludes       []string `expr:"excludes"`        // loads whose wiring keeps them off while this one is on
	RunsOn         bool     `expr:"runs_on"`         // goes on after a heating load: by a timer or by its own control
	HighLimit      bool     `expr:"high_limit"`      // hardware that breaks on rise cuts it
	FlameGuard     bool     `expr:"flame_guard"`     // hardware flame supervision cuts it
	BurnerControl  bool     `expr:"burner_control"`  // of these, a new approved burner control
	SupplySideCut  bool     `expr:"supply_side_cut"` // independent hardware breaks it without the new output
	MinOff         float64  `expr:"min_off"`         // longest minimum off time of its controls
	DrivesWhenOn   bool     `expr:"drives_when_on"`  // on, it can reach a danger
	Drives         bool     `expr:"drives"`          // on or off, it can reach a danger
	Serious        bool     `expr:"serious"`         // and that danger does serious harm
	DrivesBelow    bool     `expr:"drives_below"`    // off or on, it can reach a danger below
	StateSerious   bool     `expr:"state_serious"`   // a dangerous state names it and does serious harm
	Redundant      []string `expr:"redundant"`       // sensors that guard it beside each other on one converter
	RestartsItself bool     `expr:"restarts_itself"` // a limiting or protective control of it resets automatically
}

// Actuator is the new actuator of a modulating valve.
type Actuator struct {
	Travel      float64 `expr:"travel"`
	OnPowerLoss string  `expr:"on_power_loss"`
	Drive       string  `expr:"drive"`
}

// Control is one mechanical part of the old control.
type Control struct {
	ID               string      `expr:"id"`
	What             string      `expr:"what"`
	Duty             string      `expr:"duty"`
	Element          string      `expr:"element"`
	Action           string      `expr:"action"`
	Senses           string      `expr:"senses"`
	SetPoint         float64     `expr:"set_point"`
	Marks            string      `expr:"marks"`
	Differential     float64     `expr:"differential"`
	BreaksAt         float64     `expr:"breaks_at"`
	MakesAt          float64     `expr:"makes_at"`
	Tolerance        float64     `expr:"tolerance"`
	Dial             []float64   `expr:"dial"`
	Reset            string      `expr:"reset"`
	TripFree         string      `expr:"trip_free"`
	OnElementFailure string      `expr:"on_element_failure"`
	Lag              float64     `expr:"lag"`
	MinOn            float64     `expr:"min_on"`
	MinOff           float64     `expr:"min_off"`
	Observed         Observed    `expr:"observed"`
	Match            string      `expr:"match"`
	Plan             string      `expr:"plan"`
	Sensor           string      `expr:"sensor"`
	Cuts             []string    `expr:"cuts"`
	CutsBy           string      `expr:"cuts_by"`
	Shares           []string    `expr:"shares"`
	ReadBy           string      `expr:"read_by"`
	SamePartAs       string      `expr:"same_part_as"`
	LastProved       string      `expr:"last_proved"`
	ProveEvery       float64     `expr:"prove_every"`
	Want             string      `expr:"want"`
	StartsAt         float64     `expr:"starts_at"`
	FullAt           float64     `expr:"full_at"`
	Hysteresis       float64     `expr:"hysteresis"`
	Stroke           float64     `expr:"stroke"`
	Rate             float64     `expr:"rate"`
	OnShare          float64     `expr:"on_share"`
	Period           float64     `expr:"period"`
	Lamps            Lamps       `expr:"lamps"`
	FirstOnWithin    float64     `expr:"first_on_within"`
	RoadVehicle      string      `expr:"road_vehicle"`
	Supervises       string      `expr:"supervises"`
	HoldsFrom        float64     `expr:"holds_from"`
	ReleasesAt       float64     `expr:"releases_at"`
	HoldsWithin      float64     `expr:"holds_within"`
	ShutsWithin      float64     `expr:"shuts_within"`
	Anticipator      Anticipator `expr:"anticipator"`
	RatedCurrent     float64     `expr:"rated_current"`

	Breaks          float64  `expr:"breaks"`            // degC, however the sheet gives it
	Makes           float64  `expr:"makes"`             // degC, however the sheet gives it
	Band            float64  `expr:"band"`              // K between the two
	Hardware        bool     `expr:"hardware"`          // stays or becomes hardware: keep, monitor, renew, add
	ProtectivePart  bool     `expr:"protective_part"`   // protective whatever the sheet calls it
	Switching       bool     `expr:"switching"`         // breaks_on_rise or makes_on_rise
	SelfActing      bool     `expr:"self_acting"`       // works with no supply of its own and moves a valve
	ActsOn          []string `expr:"acts_on"`           // loads it cuts or whose runs_when names it
	GuardsSerious   bool     `expr:"guards_serious"`    // a load it acts on can reach a danger of serious harm
	GuardsScarcely  bool     `expr:"guards_scarcely"`   // … that is scarcely avoidable as well
	GuardsBelow     bool     `expr:"guards_below"`      // … a danger below a temperature
	SoleInDirection bool     `expr:"sole_in_direction"` // nothing but it stands in the way of a danger of serious harm
	CutsDriven      bool     `expr:"cuts_driven"`       // it cuts a load that the new program switches
	SecondElement   bool     `expr:"second_element"`    // other hardware cuts the same loads through its own element
	SupplyLossSafe  bool     `expr:"supply_loss_safe"`  // with no supply every load it acts on rests in its safe state
	Heats           bool     `expr:"heats"`             // it acts on a load that heats
	MediumLimit     bool     `expr:"medium_limit"`      // hardware that senses the medium still guards its heating loads
	Mains           bool     `expr:"mains"`             // the board switches mains (50 V or more)
	UsualFailure    string   `expr:"usual_failure"`     // what the catalogue says of its element, with source
	Contains        []string `expr:"contains"`          // from the catalogue: what, where, what to do, source
	Refused         string   `expr:"refused"`           // title of a control that is refused by name, or ""
	RefusedWhy      string   `expr:"refused_why"`
	NotTranslated   string   `expr:"not_translated"` // why the translator made nothing of it, or ""
	DialStays       bool     `expr:"dial_stays"`     // its dial goes on as a potentiometer
	ProofDue        string   `expr:"proof_due"`      // YYYY-MM-DD, or unknown
	ProofOverdue    bool     `expr:"proof_overdue"`  // due before the newest date in the sheet
	SensorWhat      string   `expr:"sensor_what"`
}

// Observed is the old part's cycle by stopwatch and thermometer.
type Observed struct {
	On   float64 `expr:"on"`
	Off  float64 `expr:"off"`
	High float64 `expr:"high"`
	Low  float64 `expr:"low"`
}

// Lamps is what a flasher drives.
type Lamps struct {
	Count   float64   `expr:"count"`
	Each    float64   `expr:"each"`
	Supply  []float64 `expr:"supply"`
	OutRate float64   `expr:"out_rate"`
}

// Anticipator warms the element while the load is on.
type Anticipator struct {
	Rise float64 `expr:"rise"`
	Lag  float64 `expr:"lag"`
}

// Electronics is the board that takes over.
type Electronics struct {
	Word        float64 `expr:"word"`
	CalledEvery float64 `expr:"called_every"`
	ADC         ADC     `expr:"adc"`
	Watchdog    string  `expr:"watchdog"`
	BrownOut    string  `expr:"brown_out"`
	Nonvolatile string  `expr:"nonvolatile"`
}

// ADC is the analogue-to-digital converter.
type ADC struct {
	Bits               float64 `expr:"bits"`
	Reference          float64 `expr:"reference"`
	ReferenceTolerance float64 `expr:"reference_tolerance"`
	INL                float64 `expr:"inl"`
	Offset             float64 `expr:"offset"`
	Gain               float64 `expr:"gain"`
}

// Sensor is a new sensor.
type Sensor struct {
	ID                string    `expr:"id"`
	What              string    `expr:"what"`
	Kind              string    `expr:"kind"`
	Lag               float64   `expr:"lag"`
	Area              string    `expr:"area"`
	Valid             []float64 `expr:"valid"`
	FaultAfter        float64   `expr:"fault_after"`
	ClearAfter        float64   `expr:"clear_after"`
	Insulation        string    `expr:"insulation"`
	R25               float64   `expr:"r25"`
	R25Tolerance      float64   `expr:"r25_tolerance"`
	Beta              float64   `expr:"beta"`
	BetaTolerance     float64   `expr:"beta_tolerance"`
	PullUp            float64   `expr:"pull_up"`
	PullDown          float64   `expr:"pull_down"`
	PullTolerance     float64   `expr:"pull_up_tolerance"`
	Excitation        float64   `expr:"excitation"`
	ExcitationTol     float64   `expr:"excitation_tolerance"`
	SelfHeating       float64   `expr:"self_heating"`
	Class             string    `expr:"class"`
	Wires             float64   `expr:"wires"`
	Lead              float64   `expr:"lead"`
	Current           float64   `expr:"current"`
	Gain              float64   `expr:"gain"`
	Offset            float64   `expr:"offset"`
	ColdJunction      string    `expr:"cold_junction"`
	ColdJunctionError float64   `expr:"cold_junction_error"`
	OpenReads         string    `expr:"open_reads"`
	Error             float64   `expr:"error"`
	At25              float64   `expr:"at_25"`
	Slope             float64   `expr:"slope"`
	CountsPerKelvin   float64   `expr:"counts_per_kelvin"`
	StaleAfter        float64   `expr:"stale_after"`
	FullScale         float64   `expr:"full_scale"`

	Controls    []string `expr:"controls"`     // controls that use it, replaced or monitored
	Replaces    []string `expr:"replaces"`     // of these, the replaced ones
	Mains       bool     `expr:"mains"`        // the board switches mains (50 V or more)
	GuardsAbove bool     `expr:"guards_above"` // a danger above lies on the way of a load it works on
	GuardsBelow bool     `expr:"guards_below"` // a danger below does
	Serious     bool     `expr:"serious"`      // a load it works on can reach a danger of serious harm
	Cools       bool     `expr:"cools"`        // it works on a cooling load
}

// Output is a new output stage.
type Output struct {
	Load           string  `expr:"load"`
	Kind           string  `expr:"kind"`
	RatedCurrent   float64 `expr:"rated_current"`
	RatedVoltage   float64 `expr:"rated_voltage"`
	MinCurrent     float64 `expr:"min_current"`
	Endurance      float64 `expr:"endurance"`
	MechanicalLife float64 `expr:"mechanical_life"`
	B10d           float64 `expr:"b10d"`
	Leakage        float64 `expr:"leakage"`
	OnDrop         float64 `expr:"on_drop"`
	ThermalRes     float64 `expr:"thermal_resistance"`
	MaxJunction    float64 `expr:"max_temperature"`
	DropOut        float64 `expr:"drop_out"`
	Drive          string  `expr:"drive"`
	ReadBack       string  `expr:"read_back"`
	Window         float64 `expr:"window"`
	MinPulse       float64 `expr:"min_pulse"`

	Of *Load `expr:"of"` // the load it drives
}

// Signal is a two-state input.
type Signal struct {
	ID                 string `expr:"id"`
	What               string `expr:"what"`
	BrokenWire         string `expr:"broken_wire"`
	SeenOffBeforeStart string `expr:"seen_off_before_start"`

	Permits []string `expr:"permits"` // loads whose runs_when wants it true
	Proves  []string `expr:"proves"`  // of these, the heating ones
	Serious bool     `expr:"serious"` // one of them can reach a danger of serious harm
}

// Timer is a clock of the old control.
type Timer struct {
	ID            string  `expr:"id"`
	What          string  `expr:"what"`
	Every         float64 `expr:"every"`
	After         string  `expr:"after"`
	Starts        string  `expr:"starts"`
	Lasts         float64 `expr:"lasts"`
	EndsOn        string  `expr:"ends_on"`
	AfterPowerCut string  `expr:"after_power_cut"`
}

// Path is one way to a danger: a load and the state of it that leads there.
type Path struct {
	Danger   *Danger `expr:"danger"`
	Load     *Load   `expr:"load"`
	State    string  `expr:"state"`    // the state that leads there: on off open closed, or a dangerous state
	Open     bool    `expr:"open"`     // no hardware barrier is left on it
	Touched  bool    `expr:"touched"`  // the new program switches the load
	Away     bool    `expr:"away"`     // safe_state and rest both lead away from the danger
	Warned   bool    `expr:"warned"`   // an independent alarm tells of it
	Barriers string  `expr:"barriers"` // those that count, in words
	Rejected string  `expr:"rejected"` // those that do not, each with its reason
	Why      string  `expr:"why"`      // how the load leads there
}

// Guard is a hardware part that points against a danger and cuts a load that
// can reach it.
type Guard struct {
	Danger      *Danger  `expr:"danger"`
	Control     *Control `expr:"control"`
	Counts      bool     `expr:"counts"`       // it is a barrier on some path
	Covered     bool     `expr:"covered"`      // every path it stands on has a barrier, with or without it
	TripsAt     float64  `expr:"trips_at"`     // degC, where it breaks, the far stop of its dial included
	Tolerance   float64  `expr:"tolerance"`    // K, of the sheet or usual for the element
	ToleranceIs string   `expr:"tolerance_is"` // where that tolerance comes from
	Overshoot   float64  `expr:"overshoot"`    // K, predicted after the cut; NaN: not determined
	NoOvershoot string   `expr:"no_overshoot"` // why it is not
	Worst       float64  `expr:"worst"`        // degC, trip with tolerance, and overshoot where known, towards the danger
	Limit       float64  `expr:"limit"`        // degC, the danger
	Beyond      bool     `expr:"beyond"`       // worst is not on the safe side of the danger
	Stat        string   `expr:"stat"`         // the control that works every cycle on the same load, or unknown
	StatTol     float64  `expr:"stat_tolerance"`
	StatDial    float64  `expr:"stat_dial"` // K by which its dial can be turned towards the guard
}

// Place is a probe or a load and where it stands.
type Place struct {
	ID   string `expr:"id"`
	Is   string `expr:"is"` // probe or load
	What string `expr:"what"`
	Area string `expr:"area"`
}

// Key names a derived figure, as specification.json does.
type Key struct {
	About string
	Name  string
}

// Figure is a derived value. Value is nil where it was looked for and is not
// determined, because of Reason.
type Figure struct {
	Value  *float64
	Reason string
}

// Computed is what was worked out from the sheet elsewhere. A figure that is
// not in it makes the rules that need it wait.
type Computed struct {
	Figures       map[Key]Figure
	NotTranslated map[string]string // control: why the translator made nothing of it
}

// Names of figures that the judgement of dangers itself uses.
const (
	// OvershootAfterCut, about a hardware control: K by which the medium goes on
	// after that control has cut the load, towards the danger, at worst.
	OvershootAfterCut   = "overshoot_after_cut"
	OvershootAsMeasured = "overshoot_as_measured"
)

// answer is what the responsible person decided on a finding.
type answer struct {
	finding, about, text, role, date, figure string
	path                                     string
}
