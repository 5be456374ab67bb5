package sensing

import (
	"encoding/json"
	"os"
	"testing"
)

// reference is testdata/reference.json: published values, each group with its
// source and how sure of it we are.
type reference struct {
	Platinum struct {
		Ohm [][2]float64
	}
	PlatinumTolerance struct {
		Kelvin []toleranceRow
	} `json:"platinum_tolerance"`
	Thermocouples struct {
		MV map[string][][2]float64
	}
	InversePolynomials struct {
		Pieces map[string][]struct {
			MV     [2]float64
			DegC   [2]float64
			Error  [2]float64 `json:"err_degC"`
			Coeffs []float64  `json:"coef"`
		}
	} `json:"inverse_polynomials"`
	Crossovers struct {
		DegC []crossover
	} `json:"thermocouple_crossovers"`
	ThermistorBeta struct {
		R25, Beta float64
		Ohm       [][2]float64
	} `json:"thermistor_beta"`
	SteinhartHart struct {
		ABC [3]float64
		Ohm [][2]float64
	} `json:"thermistor_steinhart_hart"`
	General struct {
		ABC [3]float64
		Ohm [][2]float64
	} `json:"thermistor_general"`
	Slope struct {
		OhmPerKelvin [][2]float64 `json:"ohm_per_kelvin"`
	} `json:"pt100_slope"`
	TwoWire struct {
		At     float64
		Loop   float64 `json:"loop_ohm"`
		Kelvin float64
	} `json:"two_wire_lead"`
}

type toleranceRow struct {
	class     string
	t, kelvin float64
}

func (r *toleranceRow) UnmarshalJSON(b []byte) error {
	return json.Unmarshal(b, &[]any{&r.class, &r.t, &r.kelvin})
}

type crossover struct {
	kind, class string
	t, kelvin   float64
}

func (c *crossover) UnmarshalJSON(b []byte) error {
	return json.Unmarshal(b, &[]any{&c.kind, &c.class, &c.t, &c.kelvin})
}

func published(t *testing.T) reference {
	t.Helper()
	data, err := os.ReadFile("testdata/reference.json")
	if err != nil {
		t.Fatal(err)
	}
	var r reference
	if err := json.Unmarshal(data, &r); err != nil {
		t.Fatal(err)
	}
	if len(r.Platinum.Ohm) < 10 || len(r.Crossovers.DegC) < 6 || len(r.ThermistorBeta.Ohm) < 16 || len(r.InversePolynomials.Pieces) != 3 {
		t.Fatalf("the reference values are not all there: %+v", r)
	}
	return r
}
