//go:build deep

package thermal

import (
	"fmt"
	"math"
	"os"
	"os/exec"
	"path/filepath"
	"slices"
	"strconv"
	"strings"
	"testing"
	"time"
)

// octave runs a script of GNU Octave with its control package and returns what
// it printed. Where it is not here the test is skipped aloud, and fails in CI.
func octave(t *testing.T, script string) string {
	t.Helper()
	missing := func(why string) {
		if os.Getenv("CI") != "" {
			t.Fatal(why)
		}
		t.Skip("SKIPPED: " + why)
	}
	if _, err := exec.LookPath("octave"); err != nil {
		missing("octave is not here")
	}
	if out, err := exec.Command("octave", "--no-gui", "--norc", "--eval", "pkg load control; disp('loaded')").CombinedOutput(); err != nil && !strings.Contains(string(out), "loaded") {
		missing("octave has no package control")
	}
	file := filepath.Join(t.TempDir(), "check.m")
	if err := os.WriteFile(file, []byte(script), 0o666); err != nil {
		t.Fatal(err)
	}
	cmd := exec.Command("octave", "--no-gui", "--norc", file)
	var said strings.Builder
	cmd.Stderr = &said
	out, err := cmd.Output()
	if !strings.HasSuffix(string(out), "done\n") { // its exit code depends on the screen it was built for
		t.Fatalf("octave: %v\n%s%s", err, out, said.String())
	}
	return strings.TrimSuffix(string(out), "done\n")
}

// polynomial is Π(c·s + 1) as Octave writes it, highest power first, in time
// units of the given length.
func polynomial(times []float64, unit float64) string {
	p := []float64{1}
	for _, c := range times {
		next := make([]float64, len(p)+1)
		for i, v := range p {
			next[i] += v * c / unit
			next[i+1] += v
		}
		p = next
	}
	return strings.ReplaceAll(fmt.Sprintf("%.17g", p), " ", ", ")
}

// Margins and peak sensitivity against the control package of GNU Octave,
// which works with polynomials: dead time as a Padé quotient of order 10, margins by the
// roots, sensitivity by a dense sweep sharpened by fminbnd. Every published
// rule on every example plant that it takes, and on the vessel.
func TestMarginsAgainstOctave(t *testing.T) {
	plants := map[string]Transfer{
		"vessel, new probe":      Process{140, 18, 12600, 40}.Transfer(Sensing{Lag: 8}),
		"vessel, probe and lag":  Process{140, 18, 12600, 40}.Transfer(Sensing{Lag: 8, Filter: 60}),
		"cabinet as integrating": Integrating(2.12/60, 11, Sensing{Lag: 12}),
	}
	for id, p := range examplePlants {
		plants[id] = p
	}
	var names []string
	for n := range plants {
		names = append(names, n)
	}
	slices.Sort(names)
	var script strings.Builder
	script.WriteString(`pkg load control
function check(num, den, dead, kc, ti, td)
  pn = 1; pd = 1;
  if dead > 0, [pn, pd] = padecoef(dead, 10); end
  s = tf('s');
  C = kc * (1 + td * s);
  if ti > 0, C = kc * (1 + 1 / (ti * s) + td * s); end
  L = minreal(C * tf(num, den) * tf(pn, pd), 1e-12);
  [gm, pm, wg, wp] = margin(L);
  value = @(w) abs(1 ./ (1 + squeeze(freqresp(L, w))));
  top = 1e2; if dead > 0, top = 8 / dead; end
  w = logspace(-4, log10(top), 4000);
  [m, i] = max(value(w));
  lo = w(max(i - 1, 1)); hi = w(min(i + 1, numel(w)));
  [x, v] = fminbnd(@(w) -value(w), lo, hi, optimset('TolX', 1e-12));
  printf("%.12g %.12g %.12g\n", gm, pm, max(m, -v));
end
`)
	type row struct {
		name string
		want Margins
	}
	var rows []row
	for _, n := range names {
		p := plants[n]
		tuned, err := p.Tune(0)
		if err != nil {
			continue // no rule takes this plant
		}
		unit := p.Dead
		if unit == 0 && len(p.Lags) > 0 {
			unit = slices.Max(p.Lags)
		}
		if unit == 0 {
			unit = 1
		}
		for _, r := range tuned {
			s := r.Settings.Parallel()
			// an ideal derivative on a plant of first order leaves a loop that never
			// falls off; where its peak lies is then a matter of the range looked at
			if r.Refused != "" || s.Kc == 0 || s.Td > 0 && len(p.Lags)+p.Integrators < 2+len(p.Zeros) {
				continue
			}
			integrators := strings.Repeat(", 0", p.Integrators)
			den := strings.TrimSuffix(polynomial(p.Lags, unit), "]") + integrators + "]"
			gain := math.Abs(p.Gain) * math.Pow(unit, float64(p.Integrators))
			fmt.Fprintf(&script, "check(%.17g * %s, %s, %.17g, %.17g, %.17g, %.17g);\n", gain, polynomial(p.Zeros, unit), den, p.Dead/unit, s.Kc, s.Ti/unit, s.Td/unit)
			rows = append(rows, row{n + " " + r.Name, r.Margins})
		}
	}
	script.WriteString("printf(\"done\\n\");\n")
	lines := strings.Split(strings.TrimSpace(octave(t, script.String())), "\n")
	if len(lines) != len(rows) || len(rows) < 40 {
		t.Fatalf("%d lines for %d loops:\n%s", len(lines), len(rows), strings.Join(lines, "\n"))
	}
	worst := 0.0
	for i, line := range lines {
		var got [3]float64
		for j, f := range strings.Fields(line) {
			v, err := strconv.ParseFloat(f, 64)
			if err != nil {
				t.Fatalf("%s: %v", line, err)
			}
			got[j] = v
		}
		m := rows[i].want
		if !m.Stable {
			continue // margins of a loop that is not stable have no agreed sign
		}
		for _, c := range []struct {
			what       string
			ours, them float64
		}{{"gain margin", m.Gain, got[0]}, {"phase margin", m.Phase, got[1]}, {"sensitivity", m.Sensitivity, got[2]}} {
			if math.IsInf(c.ours, 1) && (math.IsInf(c.them, 1) || c.them > 1e6) || math.IsNaN(c.ours) && (math.IsNaN(c.them) || math.IsInf(c.them, 1)) {
				continue
			}
			off := math.Abs(c.ours/c.them - 1)
			worst = math.Max(worst, off)
			if !(off < 1e-4) {
				t.Errorf("%s: %s %.9g, octave has %.9g", rows[i].name, c.what, c.ours, c.them)
			}
		}
	}
	t.Logf("%d loops, largest relative difference %.2g", len(rows), worst)
}

// The exact cycle against ode45 of GNU Octave, a general-purpose integrator
// with event location, the event sharpened by fzero over its last step, at a tight tolerance: from rest to
// the periodic cycle through delayed switchings, as one would with such a
// tool. It checks the figures, and states how many exact cycles fit into one
// of the other in the same run. Octave is an interpreter and pays for that;
// BenchmarkAgainstGeneralIntegrator sets a compiled one beside it.
func TestCycleAgainstOctaveODE(t *testing.T) {
	l := tank(45)
	const script = `
function [v, stop, way] = reaches(x, at, way)
  v = x(2) - at; stop = 1;
end
function [t, x] = phase(x, to, other, dead, at, way, tol)
  o = odeset('RelTol', tol, 'AbsTol', tol, 'InitialStep', 1, 'Refine', 1);
  x = after(x, other, dead, o);
  e = odeset(o, 'Events', @(t, x) reaches(x, at, way));
  [tt, xx, te, xe] = ode45(@(t, x) [(to - x(1)) / 12600; (x(1) - x(2)) / 45], [0, 20000], x, e);
  t0 = tt(end - 1); x0 = xx(end - 1, :)'; % the last step that was not cut by the event
  rest = fzero(@(h) [0, 1] * after(x0, to, h, o) - at, te(end) - t0 + [-1, 1] * 1e-2 * (te(end) - t0), optimset('TolX', 1e-13));
  t = dead + t0 + rest; x = after(x0, to, rest, o);
end
function x = after(x, to, h, o)
  [tt, xx] = ode45(@(t, x) [(to - x(1)) / 12600; (x(1) - x(2)) / 45], [0, h], x, o);
  x = xx(end, :)';
end
tol = 1e-13;
for pass = 1:2
  tic; x = [54; 54]; last = 0;
  for i = 1:20
    [on, x] = phase(x, 140, 18, 40, 60, 1, tol);
    [off, x] = phase(x, 18, 140, 40, 54, -1, tol);
    if abs(on - last) < 1e-9 * on, break, end
    last = on;
  end
  took = toc;
end
printf("%.15g %.15g %.9g %d\n", on, off, took, i);
printf("done\n");
`
	var on, off, took float64
	var cycles int
	if _, err := fmt.Sscan(octave(t, script), &on, &off, &took, &cycles); err != nil {
		t.Fatal(err)
	}
	f, err := l.Steady()
	if err != nil {
		t.Fatal(err)
	}
	agrees(t, "on", f.On, on, 1e-11)
	agrees(t, "off", f.Off, off, 1e-11)
	const repeats = 2000
	began := time.Now()
	for range repeats {
		if _, err := l.Steady(); err != nil {
			t.Fatal(err)
		}
	}
	exact := time.Since(began).Seconds() / repeats
	t.Logf("octave's ode45: %d cycles from rest in %.3g s, off by %.1g and %.1g; exact: %.3g s; ratio %.0f", cycles, took, math.Abs(on/f.On-1), math.Abs(off/f.Off-1), exact, took/exact)
	if took < 1000*exact {
		t.Errorf("only %.0f exact cycles in the time of one of the other, and 1000 are aimed at", took/exact)
	}
}
