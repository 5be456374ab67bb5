// Package survey reads the sheet that an engineer wrote in the plant room.
//
// Read turns YAML into a Survey in which every value remembers where it stood
// and how it was written, so that everything derived from it can say where it
// came from. Whatever is wrong with the sheet is reported in one go, as
// Diagnostics, each with file, line, column, key path, what was found and what
// would fit.
//
// The struct tags below are the format: the loader, the JSON Schema and
// `survey show` are all driven by them, so a key exists in one place only.
//
//	sheet:"key[,required]"   the key in the sheet
//	unit:"temperature"       what a quantity measures (see units.go); the stored
//	                         value is in the SI-based unit named there
//	oneof:"a b c"            the words that are allowed
//	for:"kind=a,b"           only where the key kind of the same section says a
//	                         or b; also for:"switching", for:"modulating"
//	usual:"value|source"     what is assumed when the key is absent, and why
//	about:"…"                one line for the schema and `survey show`
package survey

// Field is one value of a sheet together with its origin. Where the sheet says
// `unknown`, a usual value is assumed if the key has one; otherwise Set is false
// while Written is true.
type Field[T any] struct {
	V   T    // the value, in the unit that the key's tag names
	Set bool // V may be used: it was written, or a stated default was assumed
	Source
}

// Source says where a value came from.
type Source struct {
	Path    string // key path in the sheet, such as controls[0].set_point
	Line    int    // 1-based; 0 when the value does not stand in the sheet
	Col     int    // 1-based, counted in characters
	Text    string // as written in the sheet
	Assumed string // why V has this value although the sheet does not give it
}

// Written reports whether the sheet itself holds the value, be it `unknown`.
func (s Source) Written() bool { return s.Line > 0 }

// Words of the sheet. Each is a trade word or one of an open standard.
type (
	Action     string // what a control does as its element warms
	Duty       string // what a control is there for
	Plan       string // what becomes of an old part
	Reset      string // how a control that has acted is made ready again
	State      string // what a load does: on/off, open/closed
	LoadKind   string
	SensorKind string
)

// Actions. The four switching words of the sheet are two actions: the loader
// stores makes_on_fall as BreaksOnRise and breaks_on_fall as MakesOnRise.
const (
	BreaksOnRise  Action = "breaks_on_rise"
	MakesOnRise   Action = "makes_on_rise"
	ClosesOnRise  Action = "closes_on_rise"
	OpensOnRise   Action = "opens_on_rise"
	Pulses        Action = "pulses"
	HoldsWhileHot Action = "holds_while_hot"
	Indicates     Action = "indicates"
)

const (
	Operating  Duty = "operating"
	Limiting   Duty = "limiting"
	Protective Duty = "protective"
)

const (
	Replace Plan = "replace"
	Keep    Plan = "keep"
	Monitor Plan = "monitor"
	Renew   Plan = "renew"
	Add     Plan = "add"
)

const (
	ResetAutomatic  Reset = "automatic"
	ResetManual     Reset = "manual"
	ResetAtPowerOff Reset = "at_power_off"
	ResetOneShot    Reset = "one_shot"
)

const (
	On     State = "on"
	Off    State = "off"
	Open   State = "open"
	Closed State = "closed"
)

// Energised reports whether the state is the one in which the output of the
// new control is true: on, or open.
func (s State) Energised() bool { return s == On || s == Open }

// Survey is one sheet, read and checked. Temperatures are in degC,
// temperature differences in K, times in s, the rest in SI base units
// (V, A, ohm, W, m), shares and tolerances as fractions of one.
type Survey struct {
	File        string      `json:"-"` // name of the sheet as given to Read
	Hash        string      `json:"-"` // SHA-256 of the sheet's bytes, hex
	Format      Field[int]  `sheet:"format,required" oneof:"1" about:"format of this sheet"`
	Equipment   Equipment   `sheet:"equipment,required" about:"the piece of plant"`
	Process     Process     `sheet:"process" about:"how the temperature behaves"`
	Dangers     []*Danger   `sheet:"dangers" about:"what must never be reached"`
	Signals     []*Signal   `sheet:"signals" about:"two-state inputs other than temperatures"`
	Timers      []*Timer    `sheet:"timers" about:"clocks that are part of the old function"`
	Loads       []*Load     `sheet:"loads,required" about:"what is switched"`
	Controls    []*Control  `sheet:"controls,required" about:"one entry for each mechanical part"`
	Electronics Electronics `sheet:"electronics" about:"the board that takes over"`
	Must        []*Must     `sheet:"must" about:"safety properties of this plant"`
	Answers     []*Answer   `sheet:"answers" about:"what the responsible person decided on a finding"`
}

type Equipment struct {
	Source
	ID          Field[string] `sheet:"id,required" unit:"identifier" about:"short name; becomes the C prefix"`
	Title       Field[string] `sheet:"title,required" about:"what it is and where"`
	Site        Field[string] `sheet:"site" about:"the plant"`
	Medium      Field[string] `sheet:"medium" oneof:"water air steam oil coolant refrigerant product surface other" usual:"other|nothing is stated about the medium" about:"what is held at temperature"`
	Enclosure   Enclosure     `sheet:"enclosure" about:"where the electronics would sit"`
	Conditions  Field[string] `sheet:"conditions" oneof:"dry damp dusty washed_down unknown" usual:"unknown|not stated" about:"surroundings of the electronics"`
	Pressure    Field[string] `sheet:"pressure" oneof:"vented closed steam none unknown" usual:"unknown|not stated" about:"is the medium under pressure"`
	BuiltTo     Field[string] `sheet:"built_to" usual:"unknown|not stated" about:"approval or standard on the plate"`
	InspectedBy Field[string] `sheet:"inspected_by" usual:"unknown|not stated" about:"authority, insurer"`
	Change      Field[string] `sheet:"change" about:"the plant's own change number"`
}

type Enclosure struct {
	Source
	Temperature Field[[2]float64] `sheet:"temperature" unit:"temperature" about:"lowest and highest temperature around the electronics"`
	Area        Field[string]     `sheet:"area" oneof:"non_hazardous zone_0 zone_1 zone_2 zone_20 zone_21 zone_22 unknown" usual:"unknown|not stated" about:"hazardous area classification"`
}

// Process is how the temperature behaves: (a) figures, (b) a log, or
// (c) nothing here and `observed` on a control.
type Process struct {
	Source
	DrivenBy     Names          `sheet:"driven_by" about:"the load, or loads, that move the temperature"`
	Ambient      Field[float64] `sheet:"ambient" unit:"temperature" about:"surroundings of the process"`
	SettlesOn    Field[float64] `sheet:"settles_on" unit:"temperature" about:"where it would settle with the load left on"`
	SettlesOff   Field[float64] `sheet:"settles_off" unit:"temperature" about:"where it settles with the load off; the ambient otherwise"`
	TimeConstant Field[float64] `sheet:"time_constant" unit:"time" about:"time constant of the first-order process"`
	DeadTime     Field[float64] `sheet:"dead_time" unit:"time" about:"time before the medium begins to answer"`
	Worst        Worst          `sheet:"worst" about:"least load, hottest day: used for time to danger"`
	Log          Field[string]  `sheet:"log" about:"data-logger file beside the sheet: time_s,temperature_c,state"`
}

type Worst struct {
	Source
	SettlesOn  Field[float64] `sheet:"settles_on" unit:"temperature" about:"where it would settle at worst with the load left on"`
	SettlesOff Field[float64] `sheet:"settles_off" unit:"temperature" about:"where it would settle at worst with the load off"`
}

// Danger is what must never be reached, in the words of the ISO 13849-1 risk
// graph. One of Above, Below and When is given.
type Danger struct {
	Source
	ID        Field[string]     `sheet:"id,required" unit:"identifier" about:"short name"`
	Above     Field[float64]    `sheet:"above" unit:"temperature" about:"dangerous above this temperature"`
	Below     Field[float64]    `sheet:"below" unit:"temperature" about:"dangerous below this temperature"`
	When      Field[Expression] `sheet:"when" unit:"expression" about:"or: a dangerous state"`
	For       Field[float64]    `sheet:"for" unit:"time" usual:"0 s|counts at once" about:"only counts after this long"`
	What      Field[string]     `sheet:"what,required" about:"what happens then"`
	Harm      Field[string]     `sheet:"harm,required" oneof:"slight serious" about:"S1, S2"`
	Exposure  Field[string]     `sheet:"exposure" oneof:"seldom frequent" usual:"frequent|the worse word, until stated" about:"F1, F2"`
	Avoidance Field[string]     `sheet:"avoidance" oneof:"possible scarcely" usual:"scarcely|the worse word, until stated" about:"P1, P2"`
}

type Signal struct {
	Source
	ID                 Field[string] `sheet:"id,required" unit:"identifier" about:"short name"`
	What               Field[string] `sheet:"what,required" about:"what gives the signal"`
	BrokenWire         Field[string] `sheet:"broken_wire" oneof:"true false unknown" usual:"unknown|not stated" about:"what a broken wire reads as"`
	SeenOffBeforeStart Field[bool]   `sheet:"seen_off_before_start" usual:"false|not stated" about:"must be seen false once before each start of a load it permits"`
}

// Timer is a clock of the old control: periodic (Every), after something went
// off (After), or from the moment something came on (Starts).
type Timer struct {
	Source
	ID            Field[string]     `sheet:"id,required" unit:"identifier" about:"short name"`
	What          Field[string]     `sheet:"what" about:"what the clock is for"`
	Every         Field[float64]    `sheet:"every" unit:"time" about:"true once in this time …"`
	After         Field[string]     `sheet:"after" unit:"name" about:"true once this has gone off …"`
	Starts        Field[string]     `sheet:"starts" unit:"name" about:"true once this has come on …"`
	Lasts         Field[float64]    `sheet:"lasts,required" unit:"time" about:"… for this long"`
	EndsOn        Field[Expression] `sheet:"ends_on" unit:"expression" about:"ends early when this is true"`
	AfterPowerCut Field[string]     `sheet:"after_power_cut" oneof:"restart resume run" usual:"restart|common practice: a motor-driven clock loses its place at the worst moment" about:"what a power cut does to it: begins anew, goes on where it was, or runs at once"`
}

type Load struct {
	Source
	ID        Field[string]     `sheet:"id,required" unit:"identifier" about:"short name; the output in C"`
	What      Field[string]     `sheet:"what,required" about:"what it is"`
	Kind      Field[LoadKind]   `sheet:"kind,required" oneof:"heater contactor solenoid_valve gas_valve motor compressor pump fan damper lamp alarm modulating_valve control_input" about:"kind of load"`
	Supply    Field[float64]    `sheet:"supply" unit:"voltage" about:"voltage switched"`
	SupplyIs  Field[string]     `sheet:"supply_is" oneof:"ac dc unknown" usual:"unknown|not stated" about:"alternating or direct"`
	Current   Field[float64]    `sheet:"current" unit:"current" about:"current that the new output must switch"`
	Inrush    Field[float64]    `sheet:"inrush" unit:"current" about:"peak at switching on"`
	SafeState Field[State]      `sheet:"safe_state,required" oneof:"off on closed open" about:"the side that hurts nobody"`
	Rest      Field[State]      `sheet:"rest" oneof:"off on closed open" about:"what the load does with no supply to the new output"`
	RunsWhen  Field[Expression] `sheet:"runs_when" unit:"expression" about:"the old wiring: series contacts are and, parallel ones or"`
	Area      Field[string]     `sheet:"area" oneof:"non_hazardous zone_0 zone_1 zone_2 zone_20 zone_21 zone_22 unknown" usual:"unknown|not stated" about:"hazardous area classification at the load"`
	LitBy     Field[string]     `sheet:"lit_by" for:"kind=gas_valve" oneof:"standing_pilot each_start none unknown" usual:"unknown|not stated" about:"gas_valve: what lights the flame"`
	LowFire   Field[float64]    `sheet:"low_fire" for:"kind=gas_valve" unit:"share" usual:"0 %|no by-pass flame stated" about:"gas_valve: the by-pass flame that the old part left burning"`
	Follows   Field[string]     `sheet:"follows" for:"kind=modulating_valve" unit:"name" about:"modulating_valve: the control it follows"`
	Actuator  Actuator          `sheet:"actuator" for:"kind=modulating_valve" about:"modulating_valve: the new actuator"`
}

// Opens reports whether the load is one that opens and closes (a valve or a
// damper) rather than one that goes on and off.
func (k LoadKind) Opens() bool {
	switch k {
	case "solenoid_valve", "gas_valve", "damper", "modulating_valve":
		return true
	}
	return false
}

type Actuator struct {
	Source
	Travel      Field[float64] `sheet:"travel" unit:"time" about:"time from shut to full open"`
	OnPowerLoss Field[string]  `sheet:"on_power_loss" oneof:"closes opens stays unknown" usual:"unknown|not stated" about:"where it goes with no supply"`
	Drive       Field[string]  `sheet:"drive" oneof:"position three_point time_proportioned" usual:"position|not stated" about:"how it is driven"`
}

// Control is one mechanical part of the old control.
type Control struct {
	Source
	ID               Field[string]     `sheet:"id,required" unit:"identifier" about:"short name"`
	What             Field[string]     `sheet:"what,required" about:"what the part is and where it sits"`
	Duty             Field[Duty]       `sheet:"duty,required" oneof:"operating limiting protective" about:"what it is there for"`
	Element          Field[string]     `sheet:"element,required" oneof:"bimetal_disc bimetal_strip bimetal_coil_mercury bimetal_coil rod_tube liquid_bulb vapour_bulb gas_bulb wax heated_bimetal fusible_link thermocouple_valve curie_magnet" about:"the sensing element, as in the catalogue"`
	Action           Field[Action]     `sheet:"action,required" oneof:"breaks_on_rise makes_on_fall makes_on_rise breaks_on_fall closes_on_rise opens_on_rise pulses holds_while_hot indicates" about:"what it does as the element warms"`
	Senses           Field[string]     `sheet:"senses" oneof:"point average coldest warmest" usual:"point|the element is taken as one point" about:"what the element feels"`
	SetPoint         Field[float64]    `sheet:"set_point" for:"switching modulating" unit:"temperature" about:"what the dial says"`
	Marks            Field[string]     `sheet:"marks" for:"switching" oneof:"break make middle" about:"which edge the dial marks"`
	Differential     Field[float64]    `sheet:"differential" for:"switching" unit:"interval" about:"between make and break"`
	BreaksAt         Field[float64]    `sheet:"breaks_at" for:"switching" unit:"temperature" about:"contact opens, as measured"`
	MakesAt          Field[float64]    `sheet:"makes_at" for:"switching" unit:"temperature" about:"contact closes, as measured; with a manual reset: from here the button works"`
	Tolerance        Field[float64]    `sheet:"tolerance" unit:"interval" about:"plus or minus"`
	Dial             Field[[2]float64] `sheet:"dial" unit:"temperature" about:"stops of a dial that the user keeps"`
	Reset            Field[Reset]      `sheet:"reset" oneof:"automatic manual at_power_off one_shot" usual:"automatic|not stated" about:"how it becomes ready again"`
	TripFree         Field[bool]       `sheet:"trip_free" about:"manual reset: it cannot be held in"`
	OnElementFailure Field[string]     `sheet:"on_element_failure" oneof:"breaks makes opens closes stays unknown" usual:"unknown|not stated" about:"what the contact or valve does when the element fails"`
	Lag              Field[float64]    `sheet:"lag" unit:"time" about:"sensing lag of the old element"`
	MinOn            Field[float64]    `sheet:"min_on" for:"switching" unit:"time" usual:"0 s|the old part had none" about:"least time on"`
	MinOff           Field[float64]    `sheet:"min_off" for:"switching" unit:"time" usual:"0 s|the old part had none" about:"least time off"`
	Observed         Observed          `sheet:"observed" about:"the old part's cycle by stopwatch and thermometer"`
	Match            Field[string]     `sheet:"match" oneof:"thresholds swing cycle_rate" usual:"thresholds|like for like" about:"what the new control keeps"`
	Plan             Field[Plan]       `sheet:"plan,required" oneof:"replace keep monitor renew add" about:"what becomes of the part"`
	Sensor           Field[string]     `sheet:"sensor" unit:"name" about:"replace and monitor: the new sensor"`
	Cuts             Names             `sheet:"cuts" about:"keep, monitor, renew, add: the loads it breaks by itself"`
	CutsBy           Field[string]     `sheet:"cuts_by" oneof:"own_contactor own_valve direct same_coil unknown" usual:"unknown|not stated" about:"through what it breaks them"`
	Shares           Words             `sheet:"shares" oneof:"sensor supply pocket converter" about:"what it shares with the new electronics"`
	ReadBy           Field[string]     `sheet:"read_by" unit:"name" about:"the signal by which the program sees that it has tripped"`
	SamePartAs       Field[string]     `sheet:"same_part_as" unit:"name" about:"two contacts of one part: the other control"`
	LastProved       Field[string]     `sheet:"last_proved" unit:"date" about:"when it was last proved, YYYY-MM-DD"`
	ProveEvery       Field[float64]    `sheet:"prove_every" unit:"time" about:"how often it must be proved"`
	Want             Field[string]     `sheet:"want" oneof:"two_position proportional pid" about:"kind of control wanted; two-position or like for like otherwise"`

	// Modulating valves.
	StartsAt   Field[float64] `sheet:"starts_at" for:"modulating" unit:"temperature" about:"where movement begins"`
	FullAt     Field[float64] `sheet:"full_at" for:"modulating" unit:"temperature" about:"where movement is complete"`
	Hysteresis Field[float64] `sheet:"hysteresis" for:"modulating" unit:"interval" about:"between opening and closing curve"`
	Stroke     Field[float64] `sheet:"stroke" for:"modulating" unit:"length" about:"travel of the valve"`

	// Pulsing devices.
	Rate          Field[float64]      `sheet:"rate" for:"action=pulses" unit:"rate" about:"flashes or cycles, stored per second"`
	OnShare       Field[float64]      `sheet:"on_share" for:"action=pulses" unit:"share" about:"share of the period that is on"`
	Period        Field[float64]      `sheet:"period" for:"action=pulses" unit:"time" about:"energy regulator: period"`
	DialShares    Field[[][2]float64] `sheet:"dial_shares" for:"action=pulses" unit:"dial_share" about:"energy regulator: dial mark and share on"`
	Lamps         Lamps               `sheet:"lamps" for:"action=pulses" about:"flasher: the lamps it drives"`
	FirstOnWithin Field[float64]      `sheet:"first_on_within" for:"action=pulses" unit:"time" about:"flasher: first light"`
	RoadVehicle   Field[bool]         `sheet:"road_vehicle" for:"action=pulses" usual:"false|not stated" about:"flasher of a road vehicle"`

	// Flame supervision.
	Supervises  Field[string]  `sheet:"supervises" for:"action=holds_while_hot" oneof:"pilot main" about:"which flame"`
	HoldsFrom   Field[float64] `sheet:"holds_from" for:"action=holds_while_hot" unit:"voltage" about:"thermocouple voltage from which it holds"`
	ReleasesAt  Field[float64] `sheet:"releases_at" for:"action=holds_while_hot" unit:"voltage" about:"voltage at which it lets go"`
	HoldsWithin Field[float64] `sheet:"holds_within" for:"action=holds_while_hot" unit:"time" about:"holds this long after lighting"`
	ShutsWithin Field[float64] `sheet:"shuts_within" for:"action=holds_while_hot" unit:"time" about:"shuts this long after the flame is lost"`

	Anticipator  Anticipator         `sheet:"anticipator" for:"switching" about:"heater that warms the element while the load is on"`
	RatedCurrent Field[float64]      `sheet:"rated_current" for:"element=heated_bimetal" unit:"current" about:"motor protector: rated current"`
	TripsAfter   Field[[][2]float64] `sheet:"trips_after" for:"element=heated_bimetal" unit:"multiple_time" about:"motor protector: multiple of rated current and time to trip"`
}

type Observed struct {
	Source
	On   Field[float64] `sheet:"on,required" unit:"time" about:"time on"`
	Off  Field[float64] `sheet:"off,required" unit:"time" about:"time off"`
	High Field[float64] `sheet:"high" unit:"temperature" about:"highest temperature of the medium"`
	Low  Field[float64] `sheet:"low" unit:"temperature" about:"lowest temperature of the medium"`
}

type Lamps struct {
	Source
	Count   Field[int]        `sheet:"count,required" about:"lamps on one circuit"`
	Each    Field[float64]    `sheet:"each,required" unit:"power" about:"power of one lamp"`
	Supply  Field[[2]float64] `sheet:"supply,required" unit:"voltage" about:"lowest and highest supply"`
	OutRate Field[float64]    `sheet:"out_rate" unit:"rate" about:"rate with one lamp out, stored per second"`
}

type Anticipator struct {
	Source
	Rise Field[float64] `sheet:"rise,required" unit:"interval" about:"how far it warms the element"`
	Lag  Field[float64] `sheet:"lag,required" unit:"time" about:"how fast it does"`
}

type Electronics struct {
	Source
	Word        Field[int]     `sheet:"word" oneof:"8 16 32" usual:"8|the smallest, so that the program fits any" about:"word of the controller in bits"`
	CalledEvery Field[float64] `sheet:"called_every" unit:"time" usual:"250 ms|common practice for temperature" about:"how often the program is called"`
	ADC         ADC            `sheet:"adc" about:"analogue-to-digital converter"`
	Sensors     []*Sensor      `sheet:"sensors" about:"new sensors"`
	Outputs     []*Output      `sheet:"outputs" about:"new output stages"`
	Watchdog    Field[string]  `sheet:"watchdog" oneof:"none internal external unknown" usual:"unknown|not stated" about:"what notices that the program has stopped"`
	BrownOut    Field[string]  `sheet:"brown_out" oneof:"true false unknown" usual:"unknown|not stated" about:"reset on low supply"`
	Nonvolatile Field[string]  `sheet:"nonvolatile" oneof:"true false unknown" usual:"unknown|not stated" about:"memory that survives a power cut"`
}

type ADC struct {
	Source
	Bits               Field[int]     `sheet:"bits" usual:"10|common practice on small controllers" about:"resolution, 8 to 16"`
	Reference          Field[float64] `sheet:"reference" unit:"voltage" usual:"5 V|common practice on small controllers" about:"reference voltage"`
	ReferenceTolerance Field[float64] `sheet:"reference_tolerance" unit:"share" usual:"2 %|common practice for a supply used as reference" about:"plus or minus"`
	INL                Field[float64] `sheet:"inl" usual:"2|common practice, counts" about:"integral non-linearity in counts"`
	Offset             Field[float64] `sheet:"offset" usual:"2|common practice, counts" about:"offset error in counts"`
	Gain               Field[float64] `sheet:"gain" unit:"share" usual:"0.2 %|common practice" about:"gain error"`
}

type Sensor struct {
	Source
	ID         Field[string]     `sheet:"id,required" unit:"identifier" about:"short name; the input in C"`
	What       Field[string]     `sheet:"what" about:"what it is and where it sits"`
	Kind       Field[SensorKind] `sheet:"kind,required" oneof:"ntc pt100 pt1000 type_k type_j type_t linear diode digital millivolt current" about:"kind of sensor"`
	Lag        Field[float64]    `sheet:"lag" unit:"time" about:"sensing lag"`
	Area       Field[string]     `sheet:"area" oneof:"non_hazardous zone_0 zone_1 zone_2 zone_20 zone_21 zone_22 unknown" usual:"unknown|not stated" about:"hazardous area classification at the probe"`
	Valid      Field[[2]float64] `sheet:"valid" unit:"temperature" about:"believable range; outside it is a fault"`
	FaultAfter Field[float64]    `sheet:"fault_after" unit:"time" usual:"2 s|common practice" about:"not good for this long is a fault"`
	ClearAfter Field[float64]    `sheet:"clear_after" unit:"time" usual:"10 s|common practice" about:"good for this long ends a fault"`
	Insulation Field[string]     `sheet:"insulation" oneof:"reinforced basic earthed none unknown" usual:"unknown|not stated" about:"what keeps the probe's circuit from the mains"`

	R25           Field[float64]      `sheet:"r25" for:"kind=ntc" unit:"resistance" about:"ntc: resistance at 25 degC"`
	R25Tolerance  Field[float64]      `sheet:"r25_tolerance" for:"kind=ntc" unit:"share" usual:"5 %|common practice where none is stated" about:"plus or minus"`
	Beta          Field[float64]      `sheet:"beta" for:"kind=ntc" unit:"interval" about:"ntc: beta"`
	BetaTolerance Field[float64]      `sheet:"beta_tolerance" for:"kind=ntc" unit:"share" usual:"3 %|common practice where none is stated" about:"plus or minus"`
	SteinhartHart Field[[3]float64]   `sheet:"steinhart_hart" for:"kind=ntc" about:"ntc: A, B, C of 1/T = A + B ln R + C (ln R)^3"`
	Table         Field[[][2]float64] `sheet:"table" for:"kind=ntc" unit:"temperature_resistance" about:"ntc: pairs of temperature and resistance"`
	PullUp        Field[float64]      `sheet:"pull_up" for:"kind=ntc,pt100,pt1000" unit:"resistance" about:"resistor to the reference, sensor to ground"`
	PullDown      Field[float64]      `sheet:"pull_down" for:"kind=ntc,pt100,pt1000" unit:"resistance" about:"sensor to the reference, resistor to ground"`
	PullTolerance Field[float64]      `sheet:"pull_up_tolerance" for:"kind=ntc,pt100,pt1000" unit:"share" usual:"1 %|common practice where none is stated" about:"tolerance of the divider's resistor"`
	Excitation    Field[float64]      `sheet:"excitation" for:"kind=ntc,pt100,pt1000" unit:"voltage" about:"supply of the divider where it is not the converter's reference"`
	ExcitationTol Field[float64]      `sheet:"excitation_tolerance" for:"kind=ntc,pt100,pt1000" unit:"share" usual:"2 %|common practice where none is stated" about:"plus or minus"`
	SelfHeating   Field[float64]      `sheet:"self_heating" for:"kind=ntc,pt100,pt1000" unit:"dissipation" about:"dissipation constant, W/K"`

	Class   Field[string]  `sheet:"class" for:"kind=pt100,pt1000,type_k,type_j,type_t" oneof:"AA A B C 1 2" about:"tolerance class: AA A B C (IEC 60751) or 1 2 (IEC 60584-1)"`
	Wires   Field[int]     `sheet:"wires" for:"kind=pt100,pt1000" oneof:"2 3 4" about:"pt100, pt1000: wires to the sensor"`
	Lead    Field[float64] `sheet:"lead" for:"kind=ntc,pt100,pt1000" unit:"resistance" usual:"0 ohm|not stated" about:"resistance of one lead"`
	Current Field[float64] `sheet:"current" for:"kind=pt100,pt1000" unit:"current" about:"pt100, pt1000: measuring current"`
	Gain    Field[float64] `sheet:"gain" for:"kind=pt100,pt1000,type_k,type_j,type_t,millivolt" about:"gain of the amplifier"`

	Offset            Field[float64] `sheet:"offset" for:"kind=type_k,type_j,type_t" unit:"voltage" usual:"0 V|not stated" about:"output of the amplifier at no input"`
	ColdJunction      Field[string]  `sheet:"cold_junction" for:"kind=type_k,type_j,type_t" unit:"name" about:"thermocouple: sensor at the cold junction"`
	ColdJunctionError Field[float64] `sheet:"cold_junction_error" for:"kind=type_k,type_j,type_t" unit:"interval" usual:"2 K|common practice where none is stated" about:"plus or minus"`
	OpenReads         Field[string]  `sheet:"open_reads" for:"kind=type_k,type_j,type_t" oneof:"high low floats unknown" usual:"unknown|not stated" about:"thermocouple: what an open circuit reads"`

	At              Field[[][2]float64] `sheet:"at" for:"kind=linear" unit:"temperature_voltage" about:"linear: pairs of temperature and voltage"`
	Error           Field[float64]      `sheet:"error" for:"kind=linear,diode,digital,millivolt,current" unit:"reading_error" about:"error of the sensor, in what it measures: K, V or A"`
	At25            Field[float64]      `sheet:"at_25" for:"kind=diode" unit:"voltage" about:"diode: voltage at 25 degC"`
	Slope           Field[float64]      `sheet:"slope" for:"kind=diode" unit:"voltage_per_kelvin" about:"diode: change with temperature"`
	CountsPerKelvin Field[float64]      `sheet:"counts_per_kelvin" for:"kind=digital" about:"digital: counts for one kelvin"`
	StaleAfter      Field[float64]      `sheet:"stale_after" for:"kind=digital" unit:"time" about:"digital: no new reading for this long is a fault"`
	FullScale       Field[float64]      `sheet:"full_scale" for:"kind=millivolt,current" unit:"volt_or_ampere" about:"millivolt, current: input at the highest count"`
}

type Output struct {
	Source
	Load           Field[string]  `sheet:"load,required" unit:"name" about:"the load it drives"`
	Kind           Field[string]  `sheet:"kind,required" oneof:"relay ssr triac transistor analogue" about:"kind of output stage"`
	RatedCurrent   Field[float64] `sheet:"rated_current" unit:"current" about:"rated current"`
	RatedVoltage   Field[float64] `sheet:"rated_voltage" unit:"voltage" about:"rated voltage"`
	MinCurrent     Field[float64] `sheet:"min_current" unit:"current" about:"least current that it switches reliably"`
	Endurance      Field[float64] `sheet:"endurance" about:"operations at rated current, from the part's own data"`
	MechanicalLife Field[float64] `sheet:"mechanical_life" about:"operations without load"`
	B10d           Field[float64] `sheet:"b10d" about:"operations until 10 % have failed dangerously; endurance is not B10d"`
	Leakage        Field[float64] `sheet:"leakage" unit:"current" about:"ssr, triac: current when off"`
	OnDrop         Field[float64] `sheet:"on_drop" unit:"voltage" about:"ssr, triac: voltage across it when on"`
	ThermalRes     Field[float64] `sheet:"thermal_resistance" unit:"thermal_resistance" about:"ssr, triac: junction or case to air, K/W"`
	MaxJunction    Field[float64] `sheet:"max_temperature" unit:"temperature" about:"ssr, triac: highest temperature that the figure above is for"`
	DropOut        Field[float64] `sheet:"drop_out" unit:"current" about:"current below which the load lets go"`
	Drive          Field[string]  `sheet:"drive" oneof:"level pulsed" usual:"level|the plain way" about:"a pulsed drive drops the load when the program stops"`
	ReadBack       Field[bool]    `sheet:"read_back" usual:"false|not stated" about:"a feedback contact that the program can see"`
	Window         Field[float64] `sheet:"window" unit:"time" about:"time-proportioning window"`
	MinPulse       Field[float64] `sheet:"min_pulse" unit:"time" about:"shortest pulse of a window"`
}

type Must struct {
	Source
	Never Field[Expression] `sheet:"never,required" unit:"expression" about:"what must never be true after a step"`
	Why   Field[string]     `sheet:"why" about:"why"`
}

type Answer struct {
	Source
	Finding Field[string] `sheet:"finding,required" about:"id of the finding"`
	About   Field[string] `sheet:"about" about:"what the finding is about"`
	Answer  Field[string] `sheet:"answer,required" about:"what was decided"`
	Role    Field[string] `sheet:"role,required" about:"who decided, as a role"`
	Date    Field[string] `sheet:"date,required" unit:"date" about:"YYYY-MM-DD"`
	Figure  Field[string] `sheet:"figure" about:"the figure that the answer was written about, as the risk table printed it"`
}

// Names is a list of references; Words a list of words. A single one may be
// written without brackets.
type (
	Names []Field[string]
	Words []Field[string]
)

// Has reports whether the word is in the list.
func (w Words) Has(word string) bool { return has(w, word) }

// Has reports whether the name is in the list.
func (n Names) Has(name string) bool { return has(n, name) }

func has(list []Field[string], s string) bool {
	for _, f := range list {
		if f.V == s {
			return true
		}
	}
	return false
}
