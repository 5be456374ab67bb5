package sensing

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"
)

func dial(t testing.TB, bits int, stops [2]float64) Dial {
	t.Helper()
	d, err := NewDial(stops, converter(bits), 0.05, 0.2)
	if err != nil {
		t.Fatal(err)
	}
	return d
}

// Every count is a fault, a stop or a setting between the stops; marks come
// back within half a count; both directions.
func TestDialEveryCount(t *testing.T) {
	for _, bits := range []int{8, 10, 12, 16} {
		for _, stops := range [][2]float64{{40, 70}, {70, 40}, {-30, 5}} {
			d := dial(t, bits, stops)
			table, err := d.Table(0.01)
			if err != nil {
				t.Fatal(err)
			}
			last := math.NaN()
			for n := int64(0); n < int64(d.full); n++ {
				sp, err := d.SetPoint(n)
				if faulty := n < d.FaultBelow || n > d.FaultAbove; faulty != errors.As(err, new(WiperFault)) {
					t.Fatalf("%d bits, count %d: %v", bits, n, err)
				}
				if err != nil {
					continue
				}
				if sp < min(stops[0], stops[1])-1e-9 || sp > max(stops[0], stops[1])+1e-9 {
					t.Fatalf("count %d sets %g, beyond the stops", n, sp)
				}
				if !math.IsNaN(last) && (sp-last)*(stops[1]-stops[0]) < 0 {
					t.Fatalf("count %d sets %g after %g", n, sp, last)
				}
				last = sp
				near(t, "table of the dial", 0.01*float64(table.At(uint16(n))), sp, 0.0101)
			}
		}
	}
}

// The rails, which open and shorted wires read, are faults; the stops are not,
// even with a track 20 % off.
func TestDialFaults(t *testing.T) {
	d := dial(t, 10, [2]float64{40, 70})
	for _, n := range []int64{0, 1, 1022, 1023} {
		if _, err := d.SetPoint(n); err == nil {
			t.Errorf("count %d is taken for a setting", n)
		}
	}
	r := EndResistor(10000, 0.05)
	for _, track := range []float64{8000, 10000, 12000} {
		bottom := int64(1024 * r / (track + 2*r))
		for n, want := range map[int64]float64{bottom: 40, 1023 - bottom: 70} {
			sp, err := d.SetPoint(n)
			if err != nil || math.Abs(sp-want) > 0.5 {
				t.Errorf("track of %g ohm: stop at count %d sets %g (%v), want %g", track, n, sp, err, want)
			}
		}
	}
}

func TestDialMarks(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		d := dial(t, rapid.IntRange(8, 16).Draw(rt, "bits"), [2]float64{40, 70})
		mark := rapid.Float64Range(40, 70).Draw(rt, "mark")
		n, err := d.Mark(mark)
		if err != nil {
			rt.Fatal(err)
		}
		sp, err := d.SetPoint(n)
		if err != nil || math.Abs(sp-mark) > d.Width()/2+1e-9 {
			rt.Fatalf("mark %g reads %g (%v), one count is %g", mark, sp, err, d.Width())
		}
	})
	if _, err := dial(t, 10, [2]float64{40, 70}).Mark(71); !errors.As(err, new(RangeError)) {
		t.Errorf("71 degC: %v", err)
	}
}

// Loading of a potentiometer, textbook result: the greatest error is 4/27 of
// track over load, at two thirds of the travel, where the load is much larger.
func TestPullError(t *testing.T) {
	near(t, "loading error", PullError(10e3, 10e6), 4.0/27*1e-3, 1e-7)
	if e := PullError(10e3, 1e6); e > 0.0015 || e < 0.0014 {
		t.Errorf("1 Mohm on a 10 kohm track: %g", e)
	}
}

func TestDialRefuses(t *testing.T) {
	for _, x := range []struct {
		stops       [2]float64
		bits        int
		dead, track float64
	}{
		{[2]float64{40, 40}, 10, 0.05, 0.2}, {[2]float64{40, math.NaN()}, 10, 0.05, 0.2},
		{[2]float64{40, 70}, 7, 0.05, 0.2}, {[2]float64{40, 70}, 10, 0.001, 0.2}, {[2]float64{40, 70}, 10, 0.3, 0.2}, {[2]float64{40, 70}, 10, 0.05, 1},
	} {
		if d, err := NewDial(x.stops, converter(x.bits), x.dead, x.track); err == nil {
			t.Errorf("%+v gives %+v", x, d)
		}
	}
	if _, err := dial(t, 10, [2]float64{40, 400}).Table(0.01); err == nil {
		t.Error("400 degC in steps of 0.01 K is no int16")
	}
}
