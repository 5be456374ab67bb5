package codegen

import (
	"encoding/json"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"makebreak/codegen/sheets"
	"makebreak/survey"
	"makebreak/translate"
	"makebreak/translate/risk"
)

func job(t *testing.T, findings ...risk.Finding) Job {
	t.Helper()
	data, err := os.ReadFile("sheets/testdata/plant.yaml")
	if err != nil {
		t.Fatal(err)
	}
	s, diags := survey.Read("plant.yaml", data)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	spec, diags := translate.Translate(s)
	if diags.HasErrors() {
		t.Fatal(diags)
	}
	return Job{Spec: spec, Risks: &risk.Assessment{Findings: findings}}
}

var openStop = risk.Finding{No: 1, ID: "no_barrier", Grade: risk.Stop, About: "heater"}

// The list of a pack has the SHA-256 of every file in it but the user's own,
// and no time.
func TestManifest(t *testing.T) {
	files, err := Pack(job(t))
	if err != nil {
		t.Fatal(err)
	}
	var m Manifest
	last := files[len(files)-1]
	if err := json.Unmarshal(last.Data, &m); err != nil || last.Name != ManifestName {
		t.Fatalf("%s: %v", last.Name, err)
	}
	for _, f := range files[:len(files)-1] {
		if sum, listed := m.Files[f.Name]; listed == f.Yours || listed && sum != digest(f.Data) {
			t.Errorf("%s: yours %v, listed as %q", f.Name, f.Yours, sum)
		}
	}
	if len(m.Yours) != 1 || m.Yours[0] != "plant_port.c" || m.Version != Version || len(m.Sheet) != 64 {
		t.Errorf("%+v", m)
	}
	// printf abc | sha256sum: FIPS 180-4, the example of one block.
	if got := digest([]byte("abc")); got != "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad" {
		t.Error(got)
	}
}

// Every file of C that the program itself owns carries every caution, and what is open.
func TestCCarriesTheCautions(t *testing.T) {
	j := job(t, risk.Finding{No: 1, ID: "contact_life", Grade: risk.Act, About: "heater"})
	files := C(j)
	if len(files) != 5 {
		t.Fatalf("%d files of C", len(files))
	}
	for _, f := range files {
		if f.Yours {
			continue // written once: what is open today would be stale in it
		}
		text := strings.Join(strings.Fields(strings.ReplaceAll(string(f.Data), "\n *", " ")), " ")
		for _, c := range sheets.CautionsFor(j.Risks) {
			if !strings.Contains(text, c) {
				t.Errorf("%s lacks %q", f.Name, c)
			}
		}
	}
}

// C written alone, then a stop: nothing that compiles lies beside the risk table.
func TestStopAfterCAlone(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "out")
	for range 3 { // again and again, and the user's files stay out of it
		files, err := OnlyC(job(t))
		if err != nil {
			t.Fatal(err)
		}
		if err := Write(dir, files); err != nil {
			t.Fatal(err)
		}
		for name := range contents(t, dir) {
			if strings.Contains(name, ".yours") {
				t.Fatalf("%s: nobody has changed anything", name)
			}
		}
	}
	files, err := Pack(job(t, openStop))
	if err != nil {
		t.Fatal(err)
	}
	if err := Write(dir, files); err != nil {
		t.Fatal(err)
	}
	got := contents(t, dir)
	for name := range got {
		if ext := filepath.Ext(name); (ext == ".c" || ext == ".h") && name != "plant_port.c" {
			t.Errorf("%s lies beside the stop", name)
		}
	}
	if got["plant_port.c"] == "" || got[riskTable] == "" {
		t.Errorf("%v", got)
	}
}
