package main

import (
	"errors"
	"fmt"
	"io"
	"io/fs"
	"os"
	"path/filepath"

	"makebreak/survey"
	"makebreak/translate"
)

// mostLogBytes is more than a month of seconds takes in a logger file.
const mostLogBytes = 128 << 20

// evidence reads what the sheet names besides itself: the logger file of the
// process, which lies beside the sheet or below.
func evidence(sheet string, s *survey.Survey) ([]translate.Option, survey.Diagnostics) {
	log := s.Process.Log
	if !log.Set {
		return nil, nil
	}
	wrong := func(summary, fits string) ([]translate.Option, survey.Diagnostics) {
		return nil, survey.Diagnostics{{
			Severity: survey.Error, File: s.File, Line: log.Line, Col: log.Col, Path: log.Path,
			Summary: summary, Found: log.V, Fits: fits,
		}}
	}
	data, err := readBelow(filepath.Dir(sheet), filepath.FromSlash(log.V))
	switch {
	case errors.Is(err, errTooLarge):
		return wrong(err.Error(), "a log thinned out to fewer rows")
	case err != nil:
		return wrong("the log cannot be read: "+reasonOf(err), "a logger file with the columns time_s, temperature_c and state")
	}
	return []translate.Option{translate.WithLog(log.V, data)}, nil
}

var errTooLarge = fmt.Errorf("the log is larger than %d MiB", mostLogBytes>>20)

// readBelow reads a file that lies in a folder or below it; links that lead out
// of it are not followed.
func readBelow(dir, name string) ([]byte, error) {
	root, err := os.OpenRoot(dir)
	if err != nil {
		return nil, err
	}
	defer root.Close()
	info, err := root.Stat(name) // before it is opened: a pipe would wait for ever
	if err == nil && !info.Mode().IsRegular() {
		err = errors.New("it is no file")
	}
	if err != nil {
		return nil, err
	}
	f, err := root.Open(name)
	if err != nil {
		return nil, err
	}
	defer f.Close()
	data, err := io.ReadAll(io.LimitReader(f, mostLogBytes+1))
	if err == nil && len(data) > mostLogBytes {
		return nil, errTooLarge
	}
	return data, err
}

// reasonOf is what went wrong, without the path, which is said already.
func reasonOf(err error) string {
	var pe *fs.PathError
	if errors.As(err, &pe) {
		return pe.Err.Error()
	}
	return err.Error()
}
