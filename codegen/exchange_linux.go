package codegen

import (
	"errors"
	"os"

	"golang.org/x/sys/unix"
)

// exchange makes two folders change places in one step.
func exchange(a, b string) error {
	return unix.Renameat2(unix.AT_FDCWD, a, unix.AT_FDCWD, b, unix.RENAME_EXCHANGE)
}

// lock keeps other runs out of a folder while a pack is written into it: one
// must not tidy away what the other has not finished. It waits, leaves no file
// behind, and ends with the program, however that ends. A file system without
// locks does without.
func lock(dir string) (unlock func(), err error) {
	f, err := os.Open(dir)
	if err != nil {
		return nil, err
	}
	for {
		if err = unix.Flock(int(f.Fd()), unix.LOCK_EX); !errors.Is(err, unix.EINTR) {
			return func() { f.Close() }, nil
		}
	}
}
