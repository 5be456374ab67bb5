package thermal

import (
	"fmt"
	"math"
	"slices"
)

// FirstOrder is a process reduced to what the step rules want: gain, one time
// constant, perhaps a second, and dead time. With Integrating, Gain is in K/s
// and Tau has no meaning.
type FirstOrder struct {
	Gain        float64
	Tau, Tau2   float64
	Dead        float64
	Integrating bool
}

// Reduced is the process by the half rule: of the lags that are left out, half
// of the largest goes to the last one kept, the other half and all the rest
// into the dead time, as do zeros that make the answer go the wrong way first
// (S. Skogestad, "Simple analytic rules for model reduction and PID controller
// tuning", Journal of Process Control 13 (2003) 291-309, section 2). It is
// worked out for order 1 or 2, and refused for other zeros.
func (t Transfer) Reduced(order int) (FirstOrder, error) {
	if err := t.Validate(); err != nil {
		return FirstOrder{}, err
	}
	if order != 1 && order != 2 {
		return FirstOrder{}, &InputError{"order", float64(order), "1 or 2 fit"}
	}
	r := FirstOrder{Gain: math.Abs(t.Gain), Dead: t.Dead, Integrating: t.Integrators == 1}
	if t.Integrators > 1 {
		return FirstOrder{}, &InputError{"number of integrators", float64(t.Integrators), "the half rule takes one at most"}
	}
	for _, z := range t.Zeros {
		if z > 0 {
			return FirstOrder{}, &InputError{"a zero", z, "the half rule here takes none above 0"}
		}
		r.Dead -= z
	}
	lags := slices.Clone(t.Lags)
	slices.Sort(lags)
	slices.Reverse(lags)
	keep := order
	if r.Integrating {
		keep-- // the integrator is the first
	}
	var kept [2]float64
	for i, l := range lags {
		switch {
		case i < keep:
			kept[i] = l
		case i == keep:
			r.Dead += l / 2
			if keep > 0 { // an integrator takes the other half without a trace
				kept[keep-1] += l / 2
			}
		default:
			r.Dead += l
		}
	}
	r.Tau, r.Tau2 = math.Max(kept[0], kept[1]), math.Min(kept[0], kept[1])
	if r.Integrating {
		r.Tau, r.Tau2 = 0, kept[0]
	}
	return r, nil
}

// Rule is a published way to settings.
type Rule struct {
	Name     string // "SIMC PI" and so on
	Settings Settings
	Source   string
	Working  string
	Refused  string // why the rule gives nothing here; empty where it does
}

const (
	sourceSIMC  = "S. Skogestad, Journal of Process Control 13 (2003) 291-309"
	sourceAMIGO = "K. J. Åström and T. Hägglund, Advanced PID Control, ISA 2006, ch. 7"
	sourceTL    = "B. D. Tyreus and W. L. Luyben, Ind. Eng. Chem. Res. 31 (1992) 2625-2628"
	sourceZN    = "J. G. Ziegler and N. B. Nichols, Trans. ASME 64 (1942) 759-768"
)

// SIMC is Skogestad's rule with the closed-loop time constant tauC in s, of a
// process of one or two lags: Kc = τ1/(k(τc+θ)), τI = min(τ1, 4(τc+θ)),
// τD = τ2, in series form; for an integrating process Kc = 1/(k'(τc+θ)).
func (f FirstOrder) SIMC(tauC float64) Settings {
	closed := tauC + f.Dead
	s := Settings{Td: f.Tau2, Form: Series}
	switch {
	case f.Integrating:
		s.Kc, s.Ti = 1/(f.Gain*closed), 4*closed
	case f.Tau == 0: // a pure dead time: an integrator alone
		return Settings{Ki: 1 / (f.Gain * closed)}
	default:
		s.Kc, s.Ti = f.Tau/(f.Gain*closed), math.Min(f.Tau, 4*closed)
	}
	return s
}

// AMIGO gives the PI and the PID settings of the rule of that name for a
// process with one lag (Tau2 is not used), in parallel form. For an integrating
// process they are what the formulas tend to as the lag grows with Gain/Tau
// held: PI 0.35/(k'L), 13.35 L; PID 0.45/(k'L), 8 L, 0.5 L. Dead must be above 0.
func (f FirstOrder) AMIGO() (pi, pid Settings) {
	t, l, k := f.Tau, f.Dead, f.Gain
	if f.Integrating {
		pi = Settings{Kc: 0.35 / (k * l), Ti: 13.35 * l, Form: Parallel}
		pid = Settings{Kc: 0.45 / (k * l), Ti: 8 * l, Td: 0.5 * l, Form: Parallel}
		return pi, pid
	}
	pi = Settings{
		Kc:   (0.15 + (0.35-l*t/((l+t)*(l+t)))*t/l) / k,
		Ti:   0.35*l + 13*l*t*t/(t*t+12*l*t+7*l*l),
		Form: Parallel,
	}
	pid = Settings{
		Kc:   (0.2 + 0.45*t/l) / k,
		Ti:   l * (0.4*l + 0.8*t) / (l + 0.1*t),
		Td:   0.5 * l * t / (0.3*l + t),
		Form: Parallel,
	}
	return pi, pid
}

// ZieglerNichols gives the settings from the ultimate point: P Ku/2; PI Ku/2.2,
// Pu/1.2; PID 0.6 Ku, Pu/2, Pu/8.
func (u Ultimate) ZieglerNichols() (p, pi, pid Settings) {
	return Settings{Kc: u.Gain / 2, Form: Parallel},
		Settings{Kc: u.Gain / 2.2, Ti: u.Period / 1.2, Form: Parallel},
		Settings{Kc: 0.6 * u.Gain, Ti: u.Period / 2, Td: u.Period / 8, Form: Parallel}
}

// TyreusLuyben gives the settings from the ultimate point: PI Ku/3.2, 2.2 Pu;
// PID Ku/2.2, 2.2 Pu, Pu/6.3.
func (u Ultimate) TyreusLuyben() (pi, pid Settings) {
	return Settings{Kc: u.Gain / 3.2, Ti: 2.2 * u.Period, Form: Parallel},
		Settings{Kc: u.Gain / 2.2, Ti: 2.2 * u.Period, Td: u.Period / 6.3, Form: Parallel}
}

// Rules lists the published settings for a process side by side, PI before
// PID, each with its source. TauC is SIMC's closed-loop time constant in s; it
// is raised to the dead time where it is less. Errors: *InputError.
func (t Transfer) Rules(tauC float64) ([]Rule, error) {
	if err := notNegative("closed-loop time constant", tauC); err != nil {
		return nil, err
	}
	first, err := t.Reduced(1)
	if err != nil {
		return nil, err
	}
	second, err := t.Reduced(2)
	if err != nil {
		return nil, err
	}
	rules := []Rule{simc("SIMC PI", first, tauC)}
	if second.Tau2 > 0 {
		rules = append(rules, simc("SIMC PID", second, tauC))
	} else {
		rules = append(rules, Rule{Name: "SIMC PID", Source: sourceSIMC, Refused: "the process has no second lag, and the rule then asks for no derivative"})
	}
	rules = append(rules, amigo(first)...)
	u, found, err := t.Ultimate()
	if err != nil {
		return nil, err
	}
	return append(rules, u.rules(found)...), nil
}

func simc(name string, f FirstOrder, tauC float64) Rule {
	used := math.Max(tauC, f.Dead)
	r := Rule{Name: name, Source: sourceSIMC}
	if used+f.Dead == 0 {
		r.Refused = "neither dead time nor closed-loop time constant bounds the gain"
		return r
	}
	r.Settings = f.SIMC(used)
	r.Working = fmt.Sprintf("half rule: lags %.5g and %.5g s, dead time %.5g s; closed-loop time constant %.5g s", f.Tau, f.Tau2, f.Dead, used)
	return r
}

func amigo(f FirstOrder) []Rule {
	rules := []Rule{{Name: "AMIGO PI", Source: sourceAMIGO}, {Name: "AMIGO PID", Source: sourceAMIGO}}
	switch {
	case f.Dead == 0:
		rules[0].Refused = "the rule divides by the dead time, which is 0"
		rules[1].Refused = rules[0].Refused
	case f.Tau == 0 && !f.Integrating:
		rules[0].Refused = "the process has no lag"
		rules[1].Refused = rules[0].Refused
	default:
		rules[0].Settings, rules[1].Settings = f.AMIGO()
		for i := range rules {
			rules[i].Working = fmt.Sprintf("half rule: lag %.5g s, dead time %.5g s", f.Tau, f.Dead)
		}
	}
	return rules
}

func (u Ultimate) rules(found bool) []Rule {
	rules := []Rule{
		{Name: "Tyreus–Luyben PI", Source: sourceTL}, {Name: "Tyreus–Luyben PID", Source: sourceTL},
		{Name: "Ziegler–Nichols PI", Source: sourceZN}, {Name: "Ziegler–Nichols PID", Source: sourceZN},
	}
	if !found {
		for i := range rules {
			rules[i].Refused = "proportional control alone never makes this process oscillate: there is no ultimate point"
		}
		return rules
	}
	rules[0].Settings, rules[1].Settings = u.TyreusLuyben()
	_, rules[2].Settings, rules[3].Settings = u.ZieglerNichols()
	for i := range rules {
		rules[i].Working = fmt.Sprintf("ultimate gain %.5g /K, ultimate period %.5g s", u.Gain, u.Period)
	}
	return rules
}
