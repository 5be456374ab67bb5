package thermal

import (
	"encoding/json"
	"math"
	"os"
	"testing"
)

// reference is testdata/reference.json.
type reference struct {
	Cycles struct {
		Cases []struct {
			Name      string  `json:"name"`
			SettleOn  float64 `json:"T_on_asymptote"`
			SettleOff float64 `json:"T_off_asymptote"`
			Make      float64 `json:"T_on"`
			Break     float64 `json:"T_off"`
			Tau       float64 `json:"tau"`
			Dead      float64 `json:"L"`
			Expected  struct {
				On     float64 `json:"t_on"`
				Off    float64 `json:"t_off"`
				Period float64 `json:"period"`
				Duty   float64 `json:"duty"`
				Peak   float64 `json:"peak"`
				Valley float64 `json:"valley"`
				Mean   float64 `json:"mean"`
				Swing  float64 `json:"swing"`
			} `json:"expected"`
		} `json:"cases"`
	} `json:"relay_cycles"`
	Published struct {
		Check struct{ K, T, L, Mu, Mu0, Eps, Tu1, Tu2, Au, Ad float64 } `json:"check"`
	} `json:"relay_published_form"`
	Describing struct {
		Rows []struct {
			Ratio     float64 `json:"L_over_tau"`
			Period    float64 `json:"exact_period_over_tau"`
			Amplitude float64 `json:"exact_amplitude_over_Kd"`
			Naive     float64 `json:"Ku_K_from_4d_over_pi_a"`
			Ku        float64 `json:"true_Ku_K"`
			Pu        float64 `json:"true_Pu_over_tau"`
		} `json:"rows"`
	} `json:"describing_function"`
	Parabola struct {
		Example struct {
			Thi, Tlo, Tau, D float64
			Nmax             float64            `json:"Nmax_per_h"`
			XN               map[string]float64 `json:"X_N"`
		} `json:"example"`
	} `json:"cycle_rate_parabola"`
	SIMC struct {
		Rows []struct {
			ID, Type   string
			Kc         *float64
			TauI, TauD *float64
			Ms         float64
		} `json:"rows"`
		Margins map[string]struct {
			GM    float64 `json:"GM"`
			PM    float64 `json:"PM_deg"`
			Ms    float64 `json:"Ms"`
			Mtmax float64 `json:"Mt"`
		} `json:"margins_tauc_eq_theta"`
	} `json:"simc"`
	AMIGO struct {
		Examples []struct {
			Kp, T, L float64
			PI, PID  []float64
		} `json:"examples"`
	} `json:"amigo"`
	Ultimate struct {
		Examples []struct {
			Plant  string
			Ku, Pu float64
			PID    []float64
			TLPI   []float64 `json:"TL_PI"`
		} `json:"examples"`
	} `json:"ultimate"`
}

func readReference(t *testing.T) reference {
	t.Helper()
	data, err := os.ReadFile("testdata/reference.json")
	if err != nil {
		t.Fatal(err)
	}
	var r reference
	if err := json.Unmarshal(data, &r); err != nil {
		t.Fatal(err)
	}
	return r
}

// agrees compares with a relative tolerance.
func agrees(t testing.TB, what string, got, want, relative float64) {
	t.Helper()
	if !(math.Abs(got-want) <= relative*math.Abs(want)) {
		t.Errorf("%s: %.10g, want %.10g within %g", what, got, want, relative)
	}
}

// isNear compares with an absolute tolerance.
func isNear(t testing.TB, what string, got, want, tolerance float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tolerance) {
		t.Errorf("%s: %.10g, want %.10g ± %g", what, got, want, tolerance)
	}
}

// tank is the worked example of a heated vessel: settles at 140 and 18 degC,
// 12 600 s, dead time 40 s, make 54, break 60 degC.
func tank(lag float64) Loop {
	return Loop{Process{140, 18, 12600, 40}, Sensing{Lag: lag}, Switching{Make: 54, Break: 60}}
}

func steady(t testing.TB, l Loop) Figures {
	t.Helper()
	f, err := l.Steady()
	if err != nil {
		t.Fatalf("%+v: %v", l, err)
	}
	return f
}
