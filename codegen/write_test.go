package codegen

import (
	"errors"
	"fmt"
	"io/fs"
	"maps"
	"os"
	"os/exec"
	"path/filepath"
	"runtime"
	"strconv"
	"strings"
	"sync"
	"testing"
	"time"
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

// before is an earlier pack with files of the user in it, and what has to be
// in the folder after the next one.
func before(t *testing.T, dir string) (fresh []File, want map[string]string) {
	t.Helper()
	if err := Write(dir, pack(t, text("a.c", "old a"), text("b.c", "old b"), File{Name: "a_port.c", Data: []byte("start"), Yours: true})); err != nil {
		t.Fatal(err)
	}
	put(t, dir, map[string]string{"a_port.c": "mine", "b.c": "edited", "notes.txt": "keep", "sub/x": "deep"})
	if err := os.Symlink("notes.txt", filepath.Join(dir, "link")); err != nil {
		t.Fatal(err)
	}
	fresh = pack(t, text("a.c", "new a"), text("b.c", "new b"), text("c.c", "new c"), File{Name: "a_port.c", Data: []byte("start"), Yours: true})
	want = map[string]string{"a.c": "new a", "b.c": "new b", "c.c": "new c", "b.c.yours": "edited",
		"a_port.c": "mine", "notes.txt": "keep", "link": "keep", "sub": "folder", ManifestName: string(fresh[4].Data)}
	return fresh, want
}

func put(t *testing.T, dir string, files map[string]string) {
	t.Helper()
	for name, data := range files {
		path := filepath.Join(dir, name)
		if err := os.MkdirAll(filepath.Dir(path), 0o777); err != nil {
			t.Fatal(err)
		}
		if err := os.WriteFile(path, []byte(data), 0o666); err != nil {
			t.Fatal(err)
		}
	}
}

// leftBeside lists what a run has left in the parent folder.
func leftBeside(t *testing.T, dir string) []string {
	t.Helper()
	left, err := filepath.Glob(filepath.Join(filepath.Dir(dir), ".out*"))
	if err != nil {
		t.Fatal(err)
	}
	return left
}

// Whatever operation fails: the folder holds the old pack or the new one,
// whole, and the next run ends with the new one and nothing left over. With
// and without a system that can exchange two folders.
func TestWriteIsOldOrNew(t *testing.T) {
	full := errors.New("no space left on device")
	for _, noExchange := range []bool{false, true} {
		failed := map[string]bool{}
		for n := 1; ; n++ {
			dir := filepath.Join(t.TempDir(), "out")
			fresh, want := before(t, dir)
			was := contents(t, dir)
			count, at := 0, ""
			err := write(disk{noExchange: noExchange, before: func(op, path string) error {
				if count++; count != n {
					return nil
				}
				at, failed[op] = op+" "+filepath.Base(path), true
				return full
			}}, dir, fresh)
			if at == "" { // every operation has had its turn
				if err != nil || n < 20 {
					t.Fatalf("%d operations: %v", n, err)
				}
				break
			}
			// Where one way to swap fails the other one may still do it.
			if err != nil && !errors.Is(err, full) {
				t.Fatalf("%s: %v", at, err)
			}
			if err == nil && !strings.HasPrefix(at, "exchange") {
				t.Errorf("%s failed and nobody was told", at)
			}
			now := contents(t, dir)
			if !maps.Equal(now, was) && !maps.Equal(now, want) {
				t.Errorf("%s failed and leaves %v", at, now)
			}
			if err := Write(dir, fresh); err != nil {
				t.Fatalf("after a failed %s: %v", at, err)
			}
			if now := contents(t, dir); !maps.Equal(now, want) {
				t.Errorf("after a failed %s the next run leaves %v", at, now)
			}
			if left := leftBeside(t, dir); len(left) > 0 {
				t.Errorf("after a failed %s: %v left behind", at, left)
			}
		}
		for _, op := range []string{"mkdir all", "mkdir", "link", "symlink", "create", "write", "sync", "chmod", "remove"} {
			if !failed[op] {
				t.Errorf("%s was never made to fail", op)
			}
		}
	}
}

// killAt tells the child of TestWriteKilled at which operation to die.
const killAt = "MAKEBREAK_TEST_KILL_AT"

// A run that is killed (SIGKILL, so nothing can be cleaned up) at any of its
// operations leaves the old pack or the new one, whole; the next run finishes
// the job and tidies.
func TestWriteKilled(t *testing.T) {
	if runtime.GOOS != "linux" {
		t.Skip("SKIPPED: elsewhere two folders cannot be exchanged in one step, and a kill can leave the old pack moved aside until the next run")
	}
	for n := 1; ; n++ {
		dir := filepath.Join(t.TempDir(), "out")
		fresh, want := before(t, dir)
		was := contents(t, dir)
		child := exec.Command(os.Args[0], "-test.run=^TestWriteChild$")
		child.Env = append(os.Environ(), fmt.Sprintf("%s=%d", killAt, n), killAt+"_DIR="+dir)
		out, err := child.CombinedOutput()
		var died *exec.ExitError
		if err != nil && !errors.As(err, &died) {
			t.Fatal(err)
		}
		if err != nil && died.ExitCode() != -1 {
			t.Fatalf("the child was to die by a signal: %v\n%s", err, out)
		}
		now := contents(t, dir)
		if !maps.Equal(now, was) && !maps.Equal(now, want) {
			t.Errorf("killed at operation %d: %v", n, now)
		}
		if err := Write(dir, fresh); err != nil {
			t.Fatalf("after a kill at operation %d: %v", n, err)
		}
		if now := contents(t, dir); !maps.Equal(now, want) {
			t.Errorf("after a kill at operation %d the next run leaves %v", n, now)
		}
		if left := leftBeside(t, dir); len(left) > 0 {
			t.Errorf("after a kill at operation %d: %v left behind", n, left)
		}
		if err == nil && died == nil {
			if n < 20 {
				t.Fatalf("only %d operations", n)
			}
			return
		}
	}
}

// TestWriteChild is the program that TestWriteKilled kills.
func TestWriteChild(t *testing.T) {
	n, err := strconv.Atoi(os.Getenv(killAt))
	if err != nil {
		t.Skip("runs only as the child of TestWriteKilled")
	}
	fresh := pack(t, text("a.c", "new a"), text("b.c", "new b"), text("c.c", "new c"), File{Name: "a_port.c", Data: []byte("start"), Yours: true})
	count := 0
	err = write(disk{before: func(string, string) error {
		if count++; count < n {
			return nil
		}
		self, err := os.FindProcess(os.Getpid())
		if err == nil {
			err = self.Kill()
		}
		time.Sleep(time.Minute)
		return err
	}}, os.Getenv(killAt+"_DIR"), fresh)
	if err != nil {
		t.Fatal(err)
	}
}

// The user changes a generated file again and again: nothing of his is lost,
// and nothing stands in the way of the next run.
func TestWriteKeepsEveryEdit(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "out")
	want := map[string]string{"b.c": "generated"}
	for i, edit := range []string{"", "first", "second", "third"} {
		if edit != "" {
			put(t, dir, map[string]string{"b.c": edit})
			name := "b.c.yours"
			if i > 1 {
				name = fmt.Sprintf("b.c.yours%d", i)
			}
			want[name] = edit
		}
		files := pack(t, text("b.c", "generated"))
		want[ManifestName] = string(files[1].Data)
		if err := Write(dir, files); err != nil {
			t.Fatal(err)
		}
		if got := contents(t, dir); !maps.Equal(got, want) {
			t.Fatalf("after edit %d: %v, want %v", i, got, want)
		}
	}
}

// C of a run that left no list, or whose list is spoilt, does not stay beside
// a stop under names that compile.
func TestWriteWithholds(t *testing.T) {
	for name, list := range map[string]string{"no list": "", "a spoilt list": "{", "a list of something else": `{"program":"other","files_sha256":{"a.c":"0"}}`} {
		dir := filepath.Join(t.TempDir(), "out")
		put(t, dir, map[string]string{"a.c": "old", "a_port.c": "mine"})
		if list != "" {
			put(t, dir, map[string]string{ManifestName: list})
		}
		if err := Write(dir, pack(t, append(withheld("a"), text(riskTable, "stop"))...)); err != nil {
			t.Fatal(err)
		}
		got := contents(t, dir)
		if _, there := got["a.c"]; there || got["a.c.yours"] != "old" || got["a_port.c"] != "mine" || got[riskTable] != "stop" {
			t.Errorf("%s: %v", name, got)
		}
		if list != "" && got[ManifestName+".yours"] != list {
			t.Errorf("%s: the list is lost: %v", name, got)
		}
	}
}

// C alone takes no risk table away.
func TestWriteLeavesNoCWithoutItsRisks(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "out")
	if err := Write(dir, pack(t, text("a.c", "c"), text(riskTable, "risks"))); err != nil {
		t.Fatal(err)
	}
	was := contents(t, dir)
	if err := Write(dir, pack(t, text("a.c", "other"))); err == nil || !strings.Contains(err.Error(), "risk table") {
		t.Errorf("%v", err)
	}
	if now := contents(t, dir); !maps.Equal(now, was) {
		t.Errorf("%v", now)
	}
}

// An editor that has a file of the user open goes on writing to the file that
// is in the folder afterwards.
func TestWriteKeepsOpenFiles(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "out")
	fresh, _ := before(t, dir)
	f, err := os.OpenFile(filepath.Join(dir, "notes.txt"), os.O_WRONLY|os.O_APPEND, 0)
	if err != nil {
		t.Fatal(err)
	}
	defer f.Close()
	if err := Write(dir, fresh); err != nil {
		t.Fatal(err)
	}
	if _, err := f.WriteString(" this too"); err != nil {
		t.Fatal(err)
	}
	if got := contents(t, dir)["notes.txt"]; got != "keep this too" {
		t.Errorf("%q", got)
	}
}

// Several runs at once into one place: each is whole, one after the other.
func TestWriteAtOnce(t *testing.T) {
	dir := filepath.Join(t.TempDir(), "out")
	fresh, want := before(t, dir)
	var wg sync.WaitGroup
	for range 8 {
		wg.Go(func() {
			if err := Write(dir, fresh); err != nil {
				t.Error(err)
			}
		})
	}
	wg.Wait()
	if got := contents(t, dir); !maps.Equal(got, want) {
		t.Errorf("%v", got)
	}
	if left := leftBeside(t, dir); len(left) > 0 {
		t.Errorf("left behind: %v", left)
	}
}

// A link to a folder is followed and stays a link.
func TestWriteFollowsALink(t *testing.T) {
	parent := t.TempDir()
	link := filepath.Join(parent, "link")
	if err := os.Mkdir(filepath.Join(parent, "real"), 0o750); err != nil {
		t.Fatal(err)
	}
	if err := os.Symlink("real", link); err != nil {
		t.Fatal(err)
	}
	if err := Write(link, pack(t, text("a.c", "new"))); err != nil {
		t.Fatal(err)
	}
	info, err := os.Lstat(link)
	if err != nil || info.Mode()&fs.ModeSymlink == 0 || contents(t, link)["a.c"] != "new" {
		t.Errorf("%v %v %v", info, err, contents(t, link))
	}
	if real, err := os.Stat(link); err != nil || real.Mode().Perm() != 0o750 {
		t.Errorf("the folder's permissions: %v %v", real, err)
	}
}

func TestWriteRefuses(t *testing.T) {
	parent := t.TempDir()
	put(t, parent, map[string]string{"file": "", "sub/x": ""})
	if err := os.Symlink("nothing", filepath.Join(parent, "nowhere")); err != nil {
		t.Fatal(err)
	}
	for dir, says := range map[string]string{
		filepath.Join(parent, "file"):        "is a file",
		filepath.Join(parent, "file", "sub"): "not a directory",
		filepath.Join(parent, "nowhere"):     "leads nowhere",
		string(filepath.Separator):           "root of the file system",
	} {
		if err := Write(dir, pack(t, text("a", ""))); err == nil || !strings.Contains(err.Error(), says) {
			t.Errorf("%s: %v, want %q", dir, err, says)
		}
	}
	if os.Geteuid() == 0 {
		t.Log("SKIPPED: a folder that is not to be written, because root may write everywhere")
		return
	}
	locked := filepath.Join(parent, "locked")
	if err := os.Mkdir(locked, 0o555); err != nil {
		t.Fatal(err)
	}
	if err := Write(filepath.Join(locked, "out"), pack(t, text("a", ""))); !errors.Is(err, fs.ErrPermission) {
		t.Errorf("%v", err)
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
