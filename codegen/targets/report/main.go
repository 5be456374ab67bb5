// Command report runs every example on every target that is here and prints
// one table in Markdown: flash, state, cycles, checksum. It takes some minutes.
//
//	go run ./codegen/targets/report [FILE]
//
// Without FILE the table goes to standard output. Proof times are taken from
// proofs.json beside FILE, where the checks of package proofs have left it.
package main

import (
	"encoding/json"
	"fmt"
	"io"
	"os"
	"path/filepath"
	"strings"

	"makebreak/codegen/targets"
)

func main() { os.Exit(run(os.Args[1:], os.Stdout, os.Stderr)) }

func run(args []string, out, errw io.Writer) int {
	pieces, err := targets.Examples(".")
	if err != nil {
		fmt.Fprintln(errw, err)
		return 1
	}
	var b strings.Builder
	b.WriteString("| example | target | flash B | state B | cycles, average | cycles, most | stack B | steps | checksum | proof s |\n|---|---|---|---|---|---|---|---|---|---|\n")
	times := proofs(args)
	failed := false
	for _, t := range targets.All() {
		if missing := t.Missing(); len(missing) > 0 {
			fmt.Fprintf(errw, "SKIPPED %s: not here: %v\n", t.Name, missing)
			continue
		}
		for _, p := range pieces {
			row, err := one(t, p, times)
			if err != nil {
				fmt.Fprintf(errw, "%s on %s: %v\n", p.Name, t.Name, err)
				failed = true
				continue
			}
			b.WriteString(row)
		}
		fmt.Fprintf(errw, "%s done\n", t.Name)
	}
	if len(args) == 0 {
		fmt.Fprint(out, b.String())
	} else if err := os.WriteFile(args[0], []byte(b.String()), 0o666); err != nil {
		fmt.Fprintln(errw, err)
		failed = true
	}
	if failed {
		return 1
	}
	return 0
}

func one(t targets.Target, p *targets.Piece, times map[string]float64) (string, error) {
	dir, err := os.MkdirTemp("", "target")
	if err != nil {
		return "", err
	}
	defer os.RemoveAll(dir)
	r, err := p.On(t, dir)
	if err != nil {
		return "", err
	}
	number := func(n int) string {
		if n == 0 {
			return ""
		}
		return fmt.Sprint(n)
	}
	sum, average, most := "compiled only", "", ""
	if !t.Compiled {
		sum = r.Sum
		if want := p.Want(r.Steps); sum != want {
			return "", fmt.Errorf("checksum %s, the interpreter has %s", sum, want)
		}
	}
	if r.Average > 0 {
		average, most = fmt.Sprintf("%.0f", r.Average), fmt.Sprintf("%.0f", r.Most)
	}
	proof := ""
	if s, ok := times[p.Name]; ok {
		proof = fmt.Sprintf("%.1f", s)
	}
	return fmt.Sprintf("| %s | %s | %s | %s | %s | %s | %s | %s | %s | %s |\n", p.Name, t.Name, number(r.Flash), number(r.State), average, most, number(r.Stack), number(r.Steps), sum, proof), nil
}

// proofs reads how long the model checker took for each example, s.
func proofs(args []string) map[string]float64 {
	times := map[string]float64{}
	if len(args) == 0 {
		return times
	}
	data, err := os.ReadFile(filepath.Join(filepath.Dir(args[0]), "proofs.json"))
	if err == nil {
		err = json.Unmarshal(data, &times)
	}
	if err != nil {
		return map[string]float64{}
	}
	return times
}
