package codegen

import (
	"errors"
	"fmt"
	"io/fs"
	"os"
	"path/filepath"
)

// disk is every change to the file system that writing a pack makes. Tests
// let each of them fail, or end the program there.
type disk struct {
	// before is asked ahead of each operation; its error is the operation's.
	before func(op, path string) error
	// noExchange: behave like a system that cannot exchange two folders.
	noExchange bool
}

func (d disk) ask(op, path string) error {
	if d.before == nil {
		return nil
	}
	return d.before(op, path)
}

func (d disk) mkdir(path string, perm fs.FileMode) error {
	if err := d.ask("mkdir", path); err != nil {
		return err
	}
	return os.Mkdir(path, perm)
}

func (d disk) mkdirAll(path string) error {
	if err := d.ask("mkdir all", path); err != nil {
		return err
	}
	return os.MkdirAll(path, 0o777)
}

func (d disk) rename(from, to string) error {
	if err := d.ask("rename", to); err != nil {
		return err
	}
	return os.Rename(from, to)
}

func (d disk) exchange(a, b string) error {
	if d.noExchange {
		return errors.ErrUnsupported
	}
	if err := d.ask("exchange", b); err != nil {
		return err
	}
	return exchange(a, b)
}

func (d disk) removeAll(path string) error {
	if err := d.ask("remove", path); err != nil {
		return err
	}
	return os.RemoveAll(path)
}

func (d disk) chmod(path string, perm fs.FileMode) error {
	if err := d.ask("chmod", path); err != nil {
		return err
	}
	return os.Chmod(path, perm)
}

// write makes a new file and brings it to the disk. A failure half way leaves
// half a file, as a full disk does.
func (d disk) write(path string, data []byte, perm fs.FileMode) error {
	if err := d.ask("create", path); err != nil {
		return err
	}
	f, err := os.OpenFile(path, os.O_WRONLY|os.O_CREATE|os.O_EXCL, perm)
	if err != nil {
		return err
	}
	if err := d.ask("write", path); err != nil {
		_, half := f.Write(data[:len(data)/2])
		return errors.Join(err, half, f.Close())
	}
	if _, err := f.Write(data); err != nil {
		return errors.Join(err, f.Close())
	}
	return d.flush(f)
}

// flush brings a file or a folder to the disk and closes it.
func (d disk) flush(f *os.File) error {
	if err := d.ask("sync", f.Name()); err != nil {
		return errors.Join(err, f.Close())
	}
	return errors.Join(f.Sync(), f.Close())
}

func (d disk) syncFolder(dir string) error {
	f, err := os.Open(dir)
	if err != nil {
		return err
	}
	return d.flush(f)
}

// carry brings what lies at one path to another one on the same disk: a file
// as a second name for the same file where the system allows it, so that an
// editor that has it open goes on writing to the right one; as a copy
// otherwise.
func (d disk) carry(from, to string) error {
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
		if err := d.ask("symlink", to); err != nil {
			return err
		}
		return os.Symlink(target, to)
	case info.IsDir():
		return d.carryFolder(from, to, info.Mode().Perm())
	case !info.Mode().IsRegular():
		return fmt.Errorf("%s is neither a file nor a folder and cannot be carried over: move it elsewhere", from)
	}
	if err := d.ask("link", to); err != nil {
		return err
	}
	if os.Link(from, to) == nil {
		return nil
	}
	return d.copy(from, to, info)
}

func (d disk) carryFolder(from, to string, perm fs.FileMode) error {
	if err := d.mkdir(to, 0o700); err != nil {
		return err
	}
	entries, err := os.ReadDir(from)
	if err != nil {
		return err
	}
	for _, e := range entries {
		if err := d.carry(filepath.Join(from, e.Name()), filepath.Join(to, e.Name())); err != nil {
			return err
		}
	}
	if err := d.chmod(to, perm); err != nil {
		return err
	}
	return d.syncFolder(to)
}

func (d disk) copy(from, to string, info fs.FileInfo) error {
	data, err := os.ReadFile(from)
	if err != nil {
		return err
	}
	if err := d.write(to, data, info.Mode().Perm()); err != nil {
		return err
	}
	if err := d.chmod(to, info.Mode().Perm()); err != nil { // whatever the umask took
		return err
	}
	return os.Chtimes(to, info.ModTime(), info.ModTime())
}
