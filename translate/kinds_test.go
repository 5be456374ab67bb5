package translate

import (
	"math"
	"os"
	"testing"

	"makebreak/survey"
	"makebreak/translate/logic"
)

func example(t *testing.T, name string) *Specification {
	t.Helper()
	data, err := os.ReadFile("../examples/" + name + "/sheet.yaml")
	if err != nil {
		t.Fatal(err)
	}
	s, diags := survey.Read("sheet.yaml", data)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	spec, diags := Translate(s)
	if diags.HasErrors() || spec.Program == nil {
		t.Fatalf("no program: %v", diags)
	}
	return spec
}

func figure(t *testing.T, spec *Specification, about, name string) float64 {
	t.Helper()
	v, ok := spec.Figures.Value(about, name)
	if !ok {
		t.Fatalf("no figure %s about %s", name, about)
	}
	return v
}

// 90 ± 30 flashes a minute, light within 1 s: UN Regulation 53, and 48 in the
// same sense. A flasher goes faster when a lamp fails: common practice.
func TestFlasherOfARoadVehicle(t *testing.T) {
	spec := example(t, "flasher")
	if r := figure(t, spec, "flasher", "rate"); r < 60 || r > 120 {
		t.Errorf("%.1f flashes a minute", r)
	}
	if s := figure(t, spec, "flasher", "first_light"); s > 1 {
		t.Errorf("first light after %g s", s)
	}
	// The running program, counted: as a fitter would over half a minute.
	g := spec.Plan.Pulsers["flasher"]
	run := spec.Program.NewRun()
	run.Start(nil)
	in := make([]int64, len(spec.Program.Inputs))
	lamps := spec.Plan.Loads["left_lamps"].Out
	count := func(current, steps int64) (makes int) {
		was := run.Get(lamps)
		for range steps {
			for i, v := range spec.Program.Inputs {
				switch v.Name {
				case "stalk_left":
					in[i] = 1
				case "shunt":
					in[i] = 0
					if run.Get(lamps) != 0 {
						in[i] = current // no current flows while it is dark
					}
				}
			}
			run.Step(in)
			if now := run.Get(lamps); now != was {
				was = now
				if now != 0 {
					makes++
				}
			}
		}
		return makes
	}
	halfMinute := int64(30 / spec.Survey.Electronics.CalledEvery.V)
	whole := count(g.Threshold+20, halfMinute)
	if whole < 30 || whole > 60 {
		t.Errorf("%d flashes in half a minute", whole)
	}
	count(g.Threshold-20, halfMinute/10)
	if out := count(g.Threshold-20, halfMinute); out < whole*3/2 {
		t.Errorf("with a lamp out %d flashes in half a minute, with all of them %d: no driver would notice", out, whole)
	}
}

// A wax element of an engine begins to open at 82 to 91 degC and is open 10 to
// 15 K further on: common practice; the range is from memory.
func TestCoolantWaxIsOrdinary(t *testing.T) {
	c := example(t, "coolant").Survey.Controls[0]
	if c.StartsAt.V < 82 || c.StartsAt.V > 91 {
		t.Errorf("begins to open at %g degC", c.StartsAt.V)
	}
	if d := c.FullAt.V - c.StartsAt.V; d < 10 || d > 15 {
		t.Errorf("opens over %g K", d)
	}
}

// The offset of a proportional valve against a process that is integrated here
// in small steps until it rests: the closed form must meet it.
func TestProportionalOffsetAgainstIntegration(t *testing.T) {
	for _, x := range []struct {
		on, off, low, high float64
		cools              bool
	}{
		{45, 5, 19, 23, false}, {70, 24, 38, 46, false}, {55, 180, 83, 95, true}, {82, 220, 83, 95, true},
	} {
		temp := x.off
		const step, tau = 0.01, 100.0
		for range 400_000 {
			u := (x.high - temp) / (x.high - x.low)
			if x.cools {
				u = (temp - x.low) / (x.high - x.low)
			}
			u = math.Min(math.Max(u, 0), 1)
			temp += step / tau * (x.off + (x.on-x.off)*u - temp)
		}
		got, _ := rest(x.on, x.off, x.low, x.high, x.cools)
		if math.Abs(got-temp) > 1e-6 {
			t.Errorf("%+v: closed form %.6f, integrated %.6f degC", x, got, temp)
		}
	}
}

// The thermal image in the program against the exponential that it stands for:
// m²(1 − exp(−t/τ)), first-order thermal image.
func TestThermalImageAgainstTheExponential(t *testing.T) {
	spec := example(t, "motor")
	image := spec.Plan.Monitors["protector"].Image
	tau := figure(t, spec, "protector", "image_lag")
	if want := 40 / math.Log(4.0/3); math.Abs(tau-want) > 1e-9 {
		t.Fatalf("time constant %g s, want %g", tau, want)
	}
	run := spec.Program.NewRun()
	run.Start(nil)
	in := make([]int64, len(spec.Program.Inputs))
	rated := spec.Program.Consts
	var counts int64
	for _, k := range rated {
		if k.Name == "PROTECTOR_RATED" {
			counts = k.Value
		}
	}
	step := spec.Survey.Electronics.CalledEvery.V
	set := func(current int64) {
		for i, v := range spec.Program.Inputs {
			if v.Name == "line_current" {
				in[i] = current
			}
		}
	}
	set(0)
	for range 80 { // the input proves itself with nothing flowing
		run.Step(in)
	}
	set(2 * counts)
	for n := 1; n <= int(200/step); n++ {
		run.Step(in)
		seen := math.Max(float64(n)-1, 0) * step // the median is a step behind
		want := 4 * (1 - math.Exp(-seen/tau))
		got := float64(run.Get(image.Heat)) / float64(image.Scale) / 1000
		if math.Abs(got-want) > 0.02 {
			t.Fatalf("after %.1f s the image has %.3f, the exponential %.3f", seen, got, want)
		}
		if warns := run.Get(image.Warns) != 0; warns != (got >= 0.9) {
			t.Fatalf("at %.3f of the trip it warns: %v", got, warns)
		}
	}
}

// Nothing that only watches can reach an output that moves something: without
// a load of its own the program has no such output, whatever its inputs.
func TestWatchedGasHasNoOutput(t *testing.T) {
	spec := example(t, "waterheater")
	if len(spec.Plan.Loads)+len(spec.Plan.Valves) != 0 {
		t.Fatalf("%d loads and %d valves in a program that only looks on", len(spec.Plan.Loads), len(spec.Plan.Valves))
	}
	for _, out := range spec.Program.Outputs {
		if out.Kind == logic.Bool {
			t.Errorf("output %s can switch something", out.Name)
		}
	}
}

// A switch below the current of its load is refused; one that is merely not
// known in full is not.
func TestStageBelowItsLoadIsRefused(t *testing.T) {
	enough := specOf(t, "pid")
	if n := figure(t, enough, "heater", "stage_refused"); n != 0 {
		t.Errorf("%g refusals of a switch of 25 A for 8 A", n)
	}
	if n := figure(t, enough, "heater", "stage_unsettled"); n == 0 {
		t.Error("nothing is open about a switch of which only the current is known")
	}
	if n := figure(t, specOf(t, "pid", "rated_current: 25 A", "rated_current: 5 A"), "heater", "stage_refused"); n != 1 {
		t.Errorf("%g refusals of a switch of 5 A for 8 A, want 1", n)
	}
}
