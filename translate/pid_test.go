package translate

import (
	"math"
	"math/rand"
	"os"
	"strings"
	"testing"

	"makebreak/survey"
	"makebreak/translate/thermal"
)

func specOf(t *testing.T, sheet string, changes ...string) *Specification {
	t.Helper()
	data, err := os.ReadFile("testdata/scenarios/" + sheet + "/sheet.yaml")
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	for i := 0; i+1 < len(changes); i += 2 {
		if !strings.Contains(text, changes[i]) {
			t.Fatalf("%s has no %q", sheet, changes[i])
		}
		text = strings.Replace(text, changes[i], changes[i+1], 1)
	}
	s, diags := survey.Read("sheet.yaml", []byte(text))
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	spec, diags := Translate(s)
	if diags.HasErrors() || spec.Program == nil {
		t.Fatalf("no program: %v", diags)
	}
	return spec
}

// lively makes the second lag longer than the dead time, so that derivative is taken.
var lively = []string{"dead_time: 30 s", "dead_time: 3 s", "lag: 6 s", "lag: 25 s"}

// The blocks of the program are the plan of package thermal, bit for bit: on
// readings that jump at random, over many samples.
func TestPIDIsItsPlan(t *testing.T) {
	for name, changes := range map[string][]string{"PI": nil, "PID": lively} {
		t.Run(name, func(t *testing.T) {
			spec := specOf(t, "pid", changes...)
			g := spec.Plan.Regulators["stat"]
			if (g.Plan.D.Mul != 0) != (name == "PID") {
				t.Fatalf("derivative %v in the case %s", g.Plan.D, name)
			}
			run := spec.Program.NewRun()
			run.Start(nil)
			rnd := rand.New(rand.NewSource(1))
			low, high := g.Probe.Low, g.Probe.High
			var m thermal.PIDState
			in := make([]int64, len(spec.Program.Inputs))
			count, age, compared := (low+high)/2, int64(-1), 0
			for n := range 400_000 {
				if n%17 == 0 {
					count = min(max(count+rnd.Int63n(61)-30, low), high)
				}
				for i, v := range spec.Program.Inputs {
					in[i] = 0
					if v == g.Probe.Raw {
						in[i] = count
					}
					if v == g.Dial.Raw {
						in[i] = g.Dial.Marked
					}
				}
				run.Step(in)
				if run.Get(g.Probe.State) != probeGood {
					continue
				}
				if age++; age%g.Sample.Value != 0 {
					continue
				}
				reading := int32(run.Get(g.Probe.reading.Value))
				deviation := int32(run.Get(g.Dial.SetPoint)) - reading
				if !m.Started {
					m = g.Plan.Start(0, deviation, reading)
				}
				want := g.Plan.Next(&m, deviation, reading)
				if got := run.Get(g.Permille); got != int64(want) {
					t.Fatalf("step %d: program %d, plan %d", n, got, want)
				}
				compared++
			}
			if compared < 5000 {
				t.Fatalf("only %d outputs were compared", compared)
			}
		})
	}
}

// On its own process, stepped exactly here, the program brings the oven to the
// set point and holds it there, through a converter of 12 bits and a window.
func TestPIDHoldsTheOven(t *testing.T) {
	for name, changes := range map[string][]string{"PI": nil, "PID": lively} {
		t.Run(name, func(t *testing.T) {
			spec := specOf(t, "pid", changes...)
			p := spec.Survey.Process
			probe := spec.Survey.Electronics.Sensors[0]
			step := spec.Survey.Electronics.CalledEvery.V
			g := spec.Plan.Regulators["stat"]
			chain := spec.Chains["probe"]
			run := spec.Program.NewRun()
			run.Start(nil)
			delayed := make([]float64, int(p.DeadTime.V/step))
			medium, sensed := p.SettlesOff.V, p.SettlesOff.V
			near, far := math.Exp(-step/p.TimeConstant.V), math.Exp(-step/probe.Lag.V)
			in := make([]int64, len(spec.Program.Inputs))
			highest, worst, switched, was := 0.0, 0.0, 0, int64(0)
			for n := range int(3 * 3600 / step) {
				count, err := chain.Count(sensed)
				if err != nil {
					t.Fatal(err)
				}
				for i, v := range spec.Program.Inputs {
					switch v {
					case g.Probe.Raw:
						in[i] = count
					case g.Dial.Raw:
						in[i] = g.Dial.Marked
					default:
						in[i] = 1 // the door is shut
					}
				}
				run.Step(in)
				on := run.Get(spec.Plan.Loads["heater"].Out)
				if on != was {
					switched++
				}
				was = on
				to := p.SettlesOff.V
				if delayed[0] > 0 {
					to = p.SettlesOn.V
				}
				delayed = append(delayed[1:], float64(on))
				medium = to + (medium-to)*near
				sensed = medium + (sensed-medium)*far
				highest = max(highest, medium)
				if float64(n)*step > 2*3600 {
					worst = max(worst, math.Abs(medium-180))
				}
			}
			// The set point is 180 degC. One count is about 0.3 K, and the dial's
			// mark is good to half a count of its own.
			if worst > 1.0 {
				t.Errorf("%.2f K off in the third hour", worst)
			}
			if highest > 180+0.1*160 {
				t.Errorf("overshoots to %.1f degC", highest)
			}
			if switched < 1000 {
				t.Errorf("only %d switchings: the window is not worked", switched)
			}
			t.Logf("highest %.2f degC, at most %.2f K off in the third hour, %d switchings", highest, worst, switched)
		})
	}
}
