package codegen

import (
	"encoding/json"
	"errors"
	"fmt"
	"io/fs"
	"os"
	"path/filepath"
	"strings"
)

// Write puts a pack into a folder. Everything is written to a new folder
// beside it first; then the two change places in one step. An interruption or
// a full disk leaves the old pack or the new one, whole.
//
// What the user has in the old folder is carried over: the files of his own,
// the ones of the pack that are his from the start, and a generated file that
// he has changed since, under its name with ".yours" behind it. Generated
// files of the old pack that the new one no longer has are gone: a risk table
// with a stop must not lie beside yesterday's C.
func Write(dir string, files []File) error { return write(disk{}, dir, files) }

// disk is what writing needs of a file system; tests let it fail.
type disk struct{ fail func(op, path string) error }

func (d disk) check(op, path string) error {
	if d.fail == nil {
		return nil
	}
	return d.fail(op, path)
}

const (
	freshMark = ".makebreak-new-"
	oldMark   = ".makebreak-old"
)

func write(d disk, dir string, files []File) (err error) {
	dir, err = filepath.Abs(dir)
	if err != nil {
		return err
	}
	if real, err := filepath.EvalSymlinks(dir); err == nil {
		dir = real
	}
	parent := filepath.Dir(dir)
	if err := os.MkdirAll(parent, 0o777); err != nil {
		return err
	}
	if err := tidy(dir); err != nil {
		return err
	}
	exists, err := folder(dir)
	if err != nil {
		return err
	}
	if err := d.check("mkdir", parent); err != nil {
		return err
	}
	fresh := filepath.Join(parent, fmt.Sprintf(".%s%s%d", filepath.Base(dir), freshMark, os.Getpid()))
	if err := os.Mkdir(fresh, 0o777); err != nil {
		return err
	}
	defer func() {
		if err != nil {
			os.RemoveAll(fresh)
		}
	}()
	if exists {
		if files, err = carryOver(d, dir, fresh, files); err != nil {
			return err
		}
	}
	for _, f := range files {
		if err := writeFile(d, filepath.Join(fresh, f.Name), f.Data); err != nil {
			return err
		}
	}
	if err := syncFolder(d, fresh); err != nil {
		return err
	}
	return swap(d, fresh, dir, exists)
}

// folder reports whether the target is there, and refuses what is no folder.
func folder(dir string) (bool, error) {
	switch info, err := os.Stat(dir); {
	case errors.Is(err, fs.ErrNotExist):
		return false, nil
	case err != nil:
		return false, err
	case !info.IsDir():
		return false, fmt.Errorf("%s is a file; a folder is needed for the pack", dir)
	}
	return true, nil
}

// tidy ends what a run that was killed left behind: an old pack that was moved
// aside goes back where the new one had not taken its place, and half a new
// one goes away.
func tidy(dir string) error {
	aside := filepath.Join(filepath.Dir(dir), "."+filepath.Base(dir)+oldMark)
	if _, err := os.Stat(aside); err == nil {
		mend := func() error { return os.RemoveAll(aside) }
		if _, err := os.Stat(dir); errors.Is(err, fs.ErrNotExist) {
			mend = func() error { return os.Rename(aside, dir) }
		}
		if err := mend(); err != nil {
			return err
		}
	}
	left, err := filepath.Glob(filepath.Join(filepath.Dir(dir), "."+globSafe(filepath.Base(dir))+freshMark+"*"))
	if err != nil {
		return err
	}
	for _, l := range left {
		if err := os.RemoveAll(l); err != nil {
			return err
		}
	}
	return nil
}

func globSafe(name string) string {
	return strings.NewReplacer(`\`, `\\`, "*", `\*`, "?", `\?`, "[", `\[`).Replace(name)
}

// carryOver links or copies the user's files into the new folder, and gives
// the files of the pack that are still to be written.
func carryOver(d disk, old, fresh string, files []File) ([]File, error) {
	was := readManifest(old)
	generated := map[string]bool{}
	for _, f := range files {
		generated[f.Name] = true
	}
	entries, err := os.ReadDir(old)
	if err != nil {
		return nil, err
	}
	kept := map[string]bool{}
	for _, e := range entries {
		name := e.Name()
		if name == ManifestName && was != nil {
			continue
		}
		from, to := filepath.Join(old, name), name
		if was != nil && was.Files[name] != "" {
			data, err := os.ReadFile(from)
			if err != nil {
				return nil, err
			}
			if digest(data) == was.Files[name] {
				continue // generated and untouched: the new pack's business
			}
			to = name + ".yours"
		} else if generated[name] && !yours(files, name) {
			to = name + ".yours" // not of a pack of ours, but in its place
		}
		if err := d.check("carry", from); err != nil {
			return nil, err
		}
		if err := copyTree(from, filepath.Join(fresh, to)); err != nil {
			return nil, err
		}
		kept[to] = true
	}
	var rest []File
	for _, f := range files {
		if !f.Yours || !kept[f.Name] {
			rest = append(rest, f)
		}
	}
	return rest, nil
}

func yours(files []File, name string) bool {
	for _, f := range files {
		if f.Name == name {
			return f.Yours
		}
	}
	return false
}

func readManifest(dir string) *Manifest {
	data, err := os.ReadFile(filepath.Join(dir, ManifestName))
	if err != nil {
		return nil
	}
	var m Manifest
	if json.Unmarshal(data, &m) != nil || m.Program != "makebreak" {
		return nil
	}
	return &m
}

// copyTree copies a file, a link or a folder with what is in it.
func copyTree(from, to string) error {
	info, err := os.Lstat(from)
	if err != nil {
		return err
	}
	switch {
	case info.Mode()&fs.ModeSymlink != 0:
		target, err := os.Readlink(from)
		if err != nil {
			return err
		}
		return os.Symlink(target, to)
	case info.IsDir():
		if err := os.Mkdir(to, info.Mode().Perm()); err != nil {
			return err
		}
		entries, err := os.ReadDir(from)
		if err != nil {
			return err
		}
		for _, e := range entries {
			if err := copyTree(filepath.Join(from, e.Name()), filepath.Join(to, e.Name())); err != nil {
				return err
			}
		}
		return nil
	}
	data, err := os.ReadFile(from)
	if err != nil {
		return err
	}
	if err := writeFile(disk{}, to, data); err != nil {
		return err
	}
	if err := os.Chmod(to, info.Mode().Perm()); err != nil {
		return err
	}
	return os.Chtimes(to, info.ModTime(), info.ModTime())
}

func writeFile(d disk, path string, data []byte) error {
	if err := d.check("write", path); err != nil {
		return err
	}
	f, err := os.OpenFile(path, os.O_WRONLY|os.O_CREATE|os.O_EXCL, 0o666)
	if err != nil {
		return err
	}
	_, err = f.Write(data)
	if err == nil {
		err = f.Sync()
	}
	return errors.Join(err, f.Close())
}

func syncFolder(d disk, dir string) error {
	if err := d.check("sync", dir); err != nil {
		return err
	}
	f, err := os.Open(dir)
	if err != nil {
		return err
	}
	return errors.Join(f.Sync(), f.Close())
}

// swap puts the new folder in the place of the old one.
func swap(d disk, fresh, dir string, exists bool) error {
	if err := d.check("swap", dir); err != nil {
		return err
	}
	if !exists {
		return os.Rename(fresh, dir)
	}
	if err := exchange(fresh, dir); err == nil {
		return os.RemoveAll(fresh) // now the old one
	}
	// Where the system cannot exchange two folders in one step, the old one is
	// moved aside for a moment; tidy brings it back after an interruption.
	aside := filepath.Join(filepath.Dir(dir), "."+filepath.Base(dir)+oldMark)
	if err := os.Rename(dir, aside); err != nil {
		return err
	}
	if err := os.Rename(fresh, dir); err != nil {
		return errors.Join(err, os.Rename(aside, dir))
	}
	return os.RemoveAll(aside)
}
