package catalogue

import "testing"

// The table of failure directions that the trade teaches: loss of charge
// (liquid, gas, wax, vapour above atmospheric pressure) reads as if cold.
// Common practice; the high limit's line is what the EN 14597 type words for a
// fail-safe limiter (opens on sensor break) exist for.
func TestLossOfCharge(t *testing.T) {
	for _, c := range []struct {
		part, action string
		then         string // what the contact or valve does
		safeEnergise bool   // the side of the load that is safe
		safe         bool   // side of the table
	}{
		{"heating control, breaks on rise: stays made", "breaks_on_rise", Makes, false, false},
		{"high limit without trip on loss of charge: never trips", "breaks_on_rise", Makes, false, false},
		{"fan control, makes on rise: fan never starts", "makes_on_rise", Breaks, true, false},
		{"high alarm, makes on rise: never alarms", "makes_on_rise", Breaks, true, false},
		{"cooling control, makes on rise: no cooling, plant safe", "makes_on_rise", Breaks, false, true},
		{"frost limit that trips plant, breaks on fall: trips", "breaks_on_fall", Breaks, false, true},
		{"frost heater control: heater stays on, safe for frost", "makes_on_fall", Makes, true, true},
		{"heating valve, closes on rise: full open", "closes_on_rise", Opens, false, false},
		{"cooling valve, opens on rise: shut", "opens_on_rise", Closes, true, false},
		{"mixing valve: full hot, scald", "closes_on_rise", Opens, false, false},
	} {
		for _, element := range []string{"liquid_bulb", "gas_bulb", "wax", "vapour_bulb"} {
			reading := readingOf(t, element, "charge_lost")
			then := Reads(c.action, reading)
			if then != c.then {
				t.Errorf("%s, %s: %s, want %s", c.part, element, then, c.then)
			}
			on, known := Energises(then)
			if !known || (on == c.safeEnergise) != c.safe {
				t.Errorf("%s, %s: side on=%v known=%v", c.part, element, on, known)
			}
		}
	}
}

func readingOf(t *testing.T, element, failure string) string {
	t.Helper()
	list, ok := mustLoad(t).FailuresOf(element, "breaks_on_rise")
	if !ok {
		t.Fatalf("no element %s", element)
	}
	for _, f := range list {
		if f.ID == failure {
			return f.Reads
		}
	}
	t.Fatalf("%s has no failure %s", element, failure)
	return ""
}

// Common practice: what stands below the table.
func TestOtherDirections(t *testing.T) {
	for _, c := range []struct{ element, failure, reads string }{
		{"vapour_bulb", "charge_lost_below_atmosphere", "hot"},
		{"vapour_bulb", "coldest_point", "cold"},
		{"rod_tube", "rod_or_tube_broken", "hot"},
		{"wax", "charge_lost", "cold"},
		{"bimetal_coil_mercury", "out_of_level", "position"},
		{"fusible_link", "does_not_open", "stays"},
		{"fusible_link", "bridged", "makes"},
		{"bimetal_disc", "contact_welded", "makes"},
	} {
		if got := readingOf(t, c.element, c.failure); got != c.reads {
			t.Errorf("%s %s reads %s, want %s", c.element, c.failure, got, c.reads)
		}
	}
}

// Contacts weld, whatever the element; a valve has none.
func TestContactsWeldWhateverTheElement(t *testing.T) {
	c := mustLoad(t)
	has := func(element, action string) bool {
		list, _ := c.FailuresOf(element, action)
		for _, f := range list {
			if f.ID == "contact_welded" {
				return true
			}
		}
		return false
	}
	for _, e := range c.Elements {
		if !has(e.ID, "makes_on_rise") {
			t.Errorf("%s: no welded contact", e.ID)
		}
		if has(e.ID, "closes_on_rise") {
			t.Errorf("%s: a valve with a welded contact", e.ID)
		}
	}
	if got := Reads("breaks_on_rise", "makes"); got != Makes {
		t.Errorf("a welded contact %s", got)
	}
	if got := Reads("closes_on_rise", "makes"); got != Unknown {
		t.Errorf("a valve with a welded contact %s", got)
	}
}

// Unknown stays unknown: no action invents a direction.
func TestUnknownStaysUnknown(t *testing.T) {
	for _, action := range []string{"breaks_on_rise", "makes_on_rise", "closes_on_rise", "opens_on_rise", "pulses", "holds_while_hot", "indicates", "no such"} {
		for _, reading := range []string{"unknown", "position", "no such"} {
			if got := Reads(action, reading); got != Unknown {
				t.Errorf("%s, %s: %s", action, reading, got)
			}
		}
	}
	for _, outcome := range []string{Stays, Unknown} {
		if _, known := Energises(outcome); known {
			t.Errorf("%s has a side", outcome)
		}
	}
}

// Common practice: NTC open = cold, short = hot, wet = hot; platinum open =
// hot, short = cold, wet = cold, two-wire lead = hot; thermocouple shorted in
// the cable = a place inside the valid range, reversed = falls as it heats.
func TestDirectionsOfNewSensors(t *testing.T) {
	c := mustLoad(t)
	for _, want := range []struct{ kind, failure, reads, found string }{
		{"ntc", "open", "cold", "yes"}, {"ntc", "short", "hot", "yes"}, {"ntc", "wet", "hot", "no"},
		{"pt100", "open", "hot", "yes"}, {"pt100", "short", "cold", "yes"}, {"pt100", "wet", "cold", "no"},
		{"pt100", "lead_resistance", "hot", "no"}, {"pt1000", "lead_resistance", "hot", "no"},
		{"pt1000", "open", "hot", "yes"}, {"pt1000", "short", "cold", "yes"}, {"pt1000", "wet", "cold", "no"},
		{"type_k", "open", "unknown", "depends"}, {"type_k", "shorted_in_cable", "in_range", "no"},
		{"type_j", "shorted_in_cable", "in_range", "no"}, {"type_t", "reversed", "cold", "no"},
		{"digital", "stale", "in_range", "no"},
		{"ntc", "out_of_pocket", "in_range", "no"},
	} {
		list, ok := c.SensorFailuresOf(want.kind)
		if !ok {
			t.Fatalf("no sensor %s", want.kind)
		}
		seen := false
		for _, f := range list {
			if f.ID == want.failure {
				seen = true
				if f.Reads != want.reads || f.Found != want.found {
					t.Errorf("%s %s: %s, %s", want.kind, f.ID, f.Reads, f.Found)
				}
			}
		}
		if !seen {
			t.Errorf("%s has no failure %s", want.kind, want.failure)
		}
	}
}
