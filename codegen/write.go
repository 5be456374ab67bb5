package codegen

import (
	"errors"
	"fmt"
	"io/fs"
	"os"
	"path/filepath"
	"strings"
	"syscall"
)

// Write puts a pack into a folder. Everything is written to a new folder
// beside it first; then the two change places in one step. An interruption or
// a full disk leaves the old pack or the new one, whole.
//
// What the user has in the old folder is carried over: the files of his own,
// the ones of the pack that are his from the start, and a generated file that
// he has changed since, under its name with ".yours" behind it (".yours2" and
// so on where that is taken). Generated files of the old pack that the new one
// no longer has are gone: a risk table with a stop must not lie beside
// yesterday's C.
//
// Where the system cannot exchange two folders in one step, the old one is
// moved aside for a moment; an interruption in that moment leaves it under the
// name .<folder>.makebreak-old, and the next run brings it back.
//
// A link to a folder is followed. An error says what is in the way: the target
// is a file, a link to nothing, a mounted folder, or not to be written.
func Write(dir string, files []File) error { return write(disk{}, dir, files) }

const (
	freshMark = ".makebreak-new-"
	oldMark   = ".makebreak-old"
)

func write(d disk, dir string, files []File) error {
	dir, err := target(dir)
	if err != nil {
		return err
	}
	parent := filepath.Dir(dir)
	if err := d.mkdirAll(parent); err != nil {
		return err
	}
	unlock, err := lock(parent)
	if err != nil {
		return err
	}
	defer unlock()
	if err := tidy(d, dir); err != nil {
		return err
	}
	exists, err := folder(dir)
	if err != nil {
		return err
	}
	fresh := beside(dir, fmt.Sprintf("%s%d", freshMark, os.Getpid()))
	err = fill(d, dir, fresh, files, exists)
	if err == nil {
		err = swap(d, fresh, dir, exists)
	}
	if err != nil {
		return errors.Join(err, os.RemoveAll(fresh))
	}
	if err := d.syncFolder(parent); err != nil {
		return err
	}
	// Whatever is beside the folder now is the old pack.
	if err := errors.Join(d.removeAll(fresh), d.removeAll(beside(dir, oldMark))); err != nil {
		return fmt.Errorf("the new pack is in its place, but the old one beside it could not be removed: %w", err)
	}
	return nil
}

func beside(dir, mark string) string {
	return filepath.Join(filepath.Dir(dir), "."+filepath.Base(dir)+mark)
}

// target gives the folder that a path means, links followed.
func target(dir string) (string, error) {
	dir, err := filepath.Abs(dir)
	if err != nil {
		return "", err
	}
	if filepath.Dir(dir) == dir {
		return "", fmt.Errorf("%s is the root of the file system; a folder below it is needed for the pack", dir)
	}
	real, err := filepath.EvalSymlinks(dir)
	if err == nil {
		return real, nil
	}
	if info, missing := os.Lstat(dir); missing == nil && info.Mode()&fs.ModeSymlink != 0 {
		return "", fmt.Errorf("%s is a link that leads nowhere (%w): remove it, or make the folder that it names", dir, err)
	}
	return dir, nil
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
func tidy(d disk, dir string) error {
	aside := beside(dir, oldMark)
	if _, err := os.Lstat(aside); err == nil {
		if _, err := os.Lstat(dir); errors.Is(err, fs.ErrNotExist) {
			err = d.rename(aside, dir)
			if err != nil {
				return err
			}
		} else if err := d.removeAll(aside); err != nil {
			return err
		}
	}
	entries, err := os.ReadDir(filepath.Dir(dir))
	if err != nil {
		return err
	}
	for _, e := range entries {
		if strings.HasPrefix(e.Name(), filepath.Base(beside(dir, freshMark))) {
			if err := d.removeAll(filepath.Join(filepath.Dir(dir), e.Name())); err != nil {
				return err
			}
		}
	}
	return nil
}

// fill makes the new folder with all that it has to hold, on the disk.
func fill(d disk, dir, fresh string, files []File, exists bool) error {
	if err := d.mkdir(fresh, 0o777); err != nil {
		return err
	}
	rest := written(files)
	if exists {
		var err error
		if rest, err = carryOver(d, dir, fresh, files); err != nil {
			return err
		}
	}
	for _, f := range rest {
		if err := d.write(filepath.Join(fresh, f.Name), f.Data, 0o666); err != nil {
			return err
		}
	}
	if exists { // as the old folder was
		info, err := os.Stat(dir)
		if err != nil {
			return err
		}
		if err := d.chmod(fresh, info.Mode().Perm()); err != nil {
			return err
		}
	}
	return d.syncFolder(fresh)
}

func written(files []File) []File {
	var all []File
	for _, f := range files {
		if !f.Withheld {
			all = append(all, f)
		}
	}
	return all
}

// swap puts the new folder in the place of the old one.
func swap(d disk, fresh, dir string, exists bool) error {
	if !exists {
		return d.rename(fresh, dir)
	}
	if d.exchange(fresh, dir) == nil {
		return nil
	}
	aside := beside(dir, oldMark)
	if err := d.rename(dir, aside); err != nil {
		return inTheWay(dir, err)
	}
	if err := d.rename(fresh, dir); err != nil {
		return errors.Join(inTheWay(dir, err), os.Rename(aside, dir))
	}
	return nil
}

// inTheWay adds what helps where a folder is where another disk is mounted.
func inTheWay(dir string, err error) error {
	if errors.Is(err, syscall.EBUSY) || errors.Is(err, syscall.EXDEV) {
		return fmt.Errorf("%w: a mounted folder cannot change places; give a folder inside %s", err, dir)
	}
	return err
}
