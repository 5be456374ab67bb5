package codegen

import (
	"encoding/json"
	"errors"
	"fmt"
	"io/fs"
	"os"
	"path/filepath"
)

// riskTable is the file without which the C of a pack must not be left.
const riskTable = "risks.md"

// carryOver brings the user's files into the new folder, and gives the files
// of the pack that are still to be written.
func carryOver(d disk, old, fresh string, files []File) ([]File, error) {
	was, err := readManifest(old)
	if err != nil {
		return nil, err
	}
	now := byName(files)
	if _, ours := was.Files[riskTable]; ours && now[riskTable] == nil {
		return nil, fmt.Errorf("%s holds a whole pack; C alone would take its risk table away: give another folder, or renew the whole pack", old)
	}
	entries, err := os.ReadDir(old)
	if err != nil {
		return nil, err
	}
	free := names{taken: map[string]bool{}}
	for name := range now {
		free.taken[name] = true
	}
	for _, e := range entries {
		free.taken[e.Name()] = true
	}
	kept := map[string]bool{}
	for _, e := range entries {
		from := filepath.Join(old, e.Name())
		to, err := carriedAs(from, was, now[e.Name()], free)
		if err != nil {
			return nil, err
		}
		if to == "" {
			continue
		}
		if err := d.carry(from, filepath.Join(fresh, to)); err != nil {
			return nil, err
		}
		kept[to] = true
	}
	var rest []File
	for _, f := range files {
		if !f.Withheld && !(f.Yours && kept[f.Name]) {
			rest = append(rest, f)
		}
	}
	return rest, nil
}

// carriedAs says under what name a file of the old folder goes into the new
// one; empty where it is of the old pack and goes with it. new is the file of
// that name in the new pack, or nil.
func carriedAs(from string, was Manifest, new *File, free names) (string, error) {
	name := filepath.Base(from)
	if name == ManifestName && was.Program != "" {
		return "", nil
	}
	if sum := was.Files[name]; sum != "" {
		same, err := holds(from, sum)
		if err != nil {
			return "", err
		}
		if same {
			return "", nil
		}
		return free.aside(name), nil // generated, and changed by the user since
	}
	if new == nil || new.Yours {
		return name, nil
	}
	// Not of a pack that we know, but where the new pack has its own file or
	// withholds one.
	if !new.Withheld {
		same, err := holds(from, digest(new.Data))
		if err != nil {
			return "", err
		}
		if same {
			return "", nil
		}
	}
	return free.aside(name), nil
}

// holds reports whether a path is a file with this SHA-256.
func holds(path, sum string) (bool, error) {
	info, err := os.Lstat(path)
	if err != nil {
		return false, err
	}
	if !info.Mode().IsRegular() {
		return false, nil
	}
	data, err := os.ReadFile(path)
	return err == nil && digest(data) == sum, err
}

// names are the names of a folder.
type names struct{ taken map[string]bool }

// aside gives a free name for a file that has to make room: its own with
// ".yours" behind it, and a number from the second on.
func (n names) aside(name string) string {
	to := name + ".yours"
	for i := 2; n.taken[to]; i++ {
		to = fmt.Sprintf("%s.yours%d", name, i)
	}
	n.taken[to] = true
	return to
}

func byName(files []File) map[string]*File {
	all := map[string]*File{}
	for i := range files {
		all[files[i].Name] = &files[i]
	}
	return all
}

// readManifest reads the list of an earlier pack; it is empty where there is
// none, or one that is not ours.
func readManifest(dir string) (Manifest, error) {
	data, err := os.ReadFile(filepath.Join(dir, ManifestName))
	if errors.Is(err, fs.ErrNotExist) {
		return Manifest{}, nil
	}
	if err != nil {
		return Manifest{}, err
	}
	var m Manifest
	if json.Unmarshal(data, &m) != nil || m.Program != programName {
		return Manifest{}, nil
	}
	return m, nil
}
