package codegen

import (
	"errors"
	"os"
	"path/filepath"
	"strings"
	"testing"
)

// pack makes a small pack with its manifest.
func pack(t *testing.T, files ...File) []File {
	t.Helper()
	m, err := manifest("hash", files)
	if err != nil {
		t.Fatal(err)
	}
	return append(files, File{Name: ManifestName, Data: m})
}

func text(name, data string) File { return File{Name: name, Data: []byte(data)} }

// contents reads a folder; nil where there is none.
func contents(t *testing.T, dir string) map[string]string {
	t.Helper()
	entries, err := os.ReadDir(dir)
	if errors.Is(err, os.ErrNotExist) {
		return nil
	}
	if err != nil {
		t.Fatal(err)
	}
	all := map[string]string{}
	for _, e := range entries {
		if e.IsDir() {
			all[e.Name()] = "folder"
			continue
		}
		data, err := os.ReadFile(filepath.Join(dir, e.Name()))
		if err != nil {
			t.Fatal(err)
		}
		all[e.Name()] = string(data)
	}
	return all
}

func TestWriteKeepsWhatIsTheUsers(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "new", "out")
	first := pack(t, text("a.c", "one"), text("b.c", "two"), File{Name: "a_port.c", Data: []byte("start"), Yours: true})
	if err := Write(dir, first); err != nil {
		t.Fatal(err)
	}
	for name, data := range map[string]string{"a_port.c": "mine", "b.c": "edited", "notes.txt": "keep", "sub/x": "deep"} {
		path := filepath.Join(dir, name)
		if err := os.MkdirAll(filepath.Dir(path), 0o777); err != nil {
			t.Fatal(err)
		}
		if err := os.WriteFile(path, []byte(data), 0o666); err != nil {
			t.Fatal(err)
		}
	}
	// The next pack has a stop: it holds no C.
	if err := Write(dir, pack(t, text("risks.md", "stop"))); err != nil {
		t.Fatal(err)
	}
	got := contents(t, dir)
	for name, want := range map[string]string{"a_port.c": "mine", "b.c.yours": "edited", "notes.txt": "keep", "sub": "folder", "risks.md": "stop"} {
		if got[name] != want {
			t.Errorf("%s: %q, want %q", name, got[name], want)
		}
	}
	for _, gone := range []string{"a.c", "b.c"} {
		if _, there := got[gone]; there {
			t.Errorf("%s of the old pack lies beside the new risk table", gone)
		}
	}
	if left, _ := filepath.Glob(filepath.Join(filepath.Dir(dir), ".out*")); len(left) > 0 {
		t.Errorf("left behind: %v", left)
	}
}

// Whatever fails, and whenever: the folder holds the old pack or the new one, whole.
func TestWriteIsOldOrNew(t *testing.T) {
	old := pack(t, text("a.c", "old a"), text("b.c", "old b"))
	fresh := pack(t, text("a.c", "new a"), text("c.c", "new c"))
	for n := 0; ; n++ {
		dir := filepath.Join(t.TempDir(), "out")
		if err := Write(dir, old); err != nil {
			t.Fatal(err)
		}
		was := contents(t, dir)
		count := 0
		full := errors.New("no space left on device")
		err := write(disk{fail: func(op, path string) error {
			count++
			if count == n+1 {
				return full
			}
			return nil
		}}, dir, fresh)
		now := contents(t, dir)
		if err == nil {
			if n < 5 || now["a.c"] != "new a" || now["c.c"] != "new c" || now["b.c"] != "" {
				t.Fatalf("after %d operations: %v", n, now)
			}
			return
		}
		if !errors.Is(err, full) {
			t.Fatal(err)
		}
		if len(now) != len(was) || now["a.c"] != "old a" || now["b.c"] != "old b" || now[ManifestName] != was[ManifestName] {
			t.Fatalf("failure %d leaves %v", n, now)
		}
		if left, _ := filepath.Glob(filepath.Join(filepath.Dir(dir), ".out*")); len(left) > 0 {
			t.Fatalf("failure %d leaves %v behind", n, left)
		}
	}
}

// A run that was killed leaves half a pack beside the folder, or the old pack
// moved aside; the next run mends both.
func TestWriteTidiesAfterAKill(t *testing.T) {
	parent := t.TempDir()
	dir := filepath.Join(parent, "out")
	if err := os.MkdirAll(filepath.Join(parent, ".out"+freshMark+"1"), 0o777); err != nil {
		t.Fatal(err)
	}
	aside := filepath.Join(parent, ".out"+oldMark)
	if err := Write(aside, pack(t, text("a.c", "old"))); err != nil {
		t.Fatal(err)
	}
	if err := os.WriteFile(filepath.Join(aside, "notes.txt"), []byte("keep"), 0o666); err != nil {
		t.Fatal(err)
	}
	if err := Write(dir, pack(t, text("a.c", "new"))); err != nil {
		t.Fatal(err)
	}
	got := contents(t, dir)
	if got["a.c"] != "new" || got["notes.txt"] != "keep" {
		t.Errorf("%v", got)
	}
	if left, _ := filepath.Glob(filepath.Join(parent, ".out*")); len(left) > 0 {
		t.Errorf("left behind: %v", left)
	}
}

func TestWriteRefusesAFile(t *testing.T) {
	file := filepath.Join(t.TempDir(), "out")
	if err := os.WriteFile(file, nil, 0o666); err != nil {
		t.Fatal(err)
	}
	if err := Write(file, pack(t, text("a", ""))); err == nil || !strings.Contains(err.Error(), "is a file") {
		t.Errorf("%v", err)
	}
}
