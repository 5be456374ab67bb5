// Package codegen turns a specification into the files of a pack, in memory,
// and writes them so that a folder holds either the old pack or the new one,
// whole.
package codegen

import (
	"bytes"
	"crypto/sha256"
	"encoding/hex"
	"encoding/json"
	"fmt"

	"makebreak/codegen/csource"
	"makebreak/codegen/sheets"
	"makebreak/translate"
	"makebreak/translate/faults"
	"makebreak/translate/prove"
	"makebreak/translate/risk"
)

// File is one file of a pack.
type File struct {
	Name string
	Data []byte
	// Yours: written once to start from, then the user's; never overwritten.
	Yours bool
	// Withheld: must not be in the folder, because a stop is open.
	Withheld bool
}

// Job is everything that a pack is made of.
type Job struct {
	Spec      *translate.Specification
	Risks     *risk.Assessment
	Functions []faults.Row
	Tour      prove.Tour // what _check.c replays
	Proof     bool       // with the harness for a model checker
}

// C gives the files of C, or none where a stop is open or no program came out.
func C(j Job) []File {
	if j.Spec.Program == nil || j.Risks.Stopped() {
		return nil
	}
	src := csource.Source{Program: j.Spec.Program, Facts: Facts(j.Spec, sheets.CautionsFor(j.Risks))}
	id := j.Spec.Program.ID
	files := []File{
		{Name: id + ".h", Data: []byte(src.Header())},
		{Name: id + ".c", Data: []byte(src.Body())},
		{Name: id + "_port.h", Data: []byte(src.PortHeader())},
		{Name: id + "_port.c", Data: []byte(src.PortBody()), Yours: true},
		{Name: id + "_check.c", Data: []byte(Check(src, j.Tour))},
	}
	if j.Proof {
		files = append(files, File{Name: id + "_proof.c", Data: []byte(src.Proof())})
	}
	return files
}

// Check prints <id>_check.c from the inputs that a tour through the program
// recorded.
func Check(src csource.Source, t prove.Tour) string { return src.Check(vectors(t), missed(t)) }

func vectors(t prove.Tour) []csource.Vector {
	var out []csource.Vector
	for _, v := range t.Vectors {
		c := csource.Vector{Start: v.Start}
		for _, r := range v.Rows {
			c.Rows = append(c.Rows, csource.Row(r))
		}
		out = append(out, c)
	}
	return out
}

// missed lists the states and transitions that the search did not reach.
func missed(t prove.Tour) []string {
	var all []string
	for _, g := range t.Missed {
		if g.Kind == prove.TransitionGoal || g.Kind == prove.StateGoal {
			all = append(all, "- "+g.Text)
		}
	}
	return all
}

// OnlyC gives the files of C with a list of them, so that a later run knows
// which of them are still as they were written; none where C gives none.
func OnlyC(j Job) ([]File, error) {
	files := C(j)
	if len(files) == 0 {
		return nil, nil
	}
	m, err := manifest(j.Spec.Survey.Hash, files)
	return append(files, File{Name: ManifestName, Data: m}), err
}

// withheld names the files of C that must not be left over from an earlier
// run. The user's own is not among them.
func withheld(id string) []File {
	var files []File
	for _, end := range []string{".h", ".c", "_port.h", "_check.c", "_proof.c"} {
		files = append(files, File{Name: id + end, Withheld: true})
	}
	return files
}

// Pack gives every file of a pack. Its manifest comes last.
func Pack(j Job) ([]File, error) {
	spec, err := sheets.Specification(j.Spec, j.Risks, j.Functions)
	if err != nil {
		return nil, err
	}
	files := C(j)
	if len(files) == 0 {
		files = withheld(j.Spec.Survey.Equipment.ID.V)
	}
	files = append(files,
		File{Name: "risks.csv", Data: []byte(sheets.CSV(sheets.RiskColumns, sheets.RiskRows(j.Risks.Findings)))},
		File{Name: riskTable, Data: []byte(sheets.Risks(j.Spec.Survey.Equipment.Title.V, j.Risks))},
		File{Name: "functions.csv", Data: []byte(sheets.CSV(sheets.FunctionColumns, sheets.FunctionRows(j.Functions)))},
		File{Name: "commissioning.md", Data: []byte(sheets.Commissioning(j.Spec, j.Risks))},
		File{Name: "specification.json", Data: spec},
	)
	m, err := manifest(j.Spec.Survey.Hash, files)
	if err != nil {
		return nil, err
	}
	return append(files, File{Name: ManifestName, Data: m}), nil
}

// ManifestName is the file that lists a pack.
const ManifestName = "pack.json"

const programName = "makebreak"

// Manifest is pack.json: what a pack was made from and what it holds.
type Manifest struct {
	Format  int               `json:"format"`
	Program string            `json:"program"`
	Version string            `json:"version"`
	Sheet   string            `json:"sheet_sha256"`
	Files   map[string]string `json:"files_sha256"`
	Yours   []string          `json:"yours"` // written once, not checked
}

func manifest(sheet string, files []File) ([]byte, error) {
	m := Manifest{Format: 1, Program: programName, Version: Version, Sheet: sheet, Files: map[string]string{}, Yours: []string{}}
	for _, f := range files {
		if f.Withheld {
			continue
		}
		if f.Yours {
			m.Yours = append(m.Yours, f.Name)
			continue
		}
		m.Files[f.Name] = digest(f.Data)
	}
	var b bytes.Buffer
	e := json.NewEncoder(&b)
	e.SetIndent("", "  ")
	if err := e.Encode(m); err != nil {
		return nil, fmt.Errorf("%s: %w", ManifestName, err)
	}
	return b.Bytes(), nil
}

func digest(data []byte) string {
	sum := sha256.Sum256(data)
	return hex.EncodeToString(sum[:])
}
