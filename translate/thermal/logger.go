package thermal

import (
	"encoding/csv"
	"errors"
	"fmt"
	"io"
	"math"
	"slices"
	"strconv"
	"strings"
)

// Row is one line of a data logger.
type Row struct {
	Time        float64 // s
	Temperature float64 // degC
	On          bool    // the load's contact
}

// LogError is one thing wrong with a logger file.
type LogError struct {
	Line int // 1-based line of the file; 0 where it concerns the whole
	Col  int // 1-based column of the line, in bytes; 0 where it concerns all of it
	What string
}

func (e *LogError) Error() string {
	if e.Line == 0 {
		return e.What
	}
	return fmt.Sprintf("line %d: %s", e.Line, e.What)
}

// maxLogErrors is how many errors of one file are listed before reading stops.
const maxLogErrors = 20

// maxRows bounds the memory that a file can claim: a month of seconds.
const maxRows = 31 * 24 * 3600

// logColumns are the columns that a logger file has to have, in any order;
// others are not read.
var logColumns = [3]string{"time_s", "temperature_c", "state"}

// ReadLog reads a logger file: comma-separated, a header with the columns
// time_s, temperature_c and state (0 or 1), then one row a sample, times
// rising. Everything that is wrong is reported in one error, made of *LogError
// joined, up to the twentieth; no rows are returned then.
func ReadLog(r io.Reader) ([]Row, error) {
	in := csv.NewReader(r)
	in.FieldsPerRecord = -1
	in.ReuseRecord = true
	in.TrimLeadingSpace = true
	header, err := in.Read()
	if err == io.EOF {
		return nil, &LogError{What: "the file is empty"}
	}
	if err != nil {
		return nil, readFailure(err)
	}
	where, err := columns(header)
	if err != nil {
		return nil, err
	}
	var rows []Row
	var wrong []error
	width := len(header)
	for len(wrong) < maxLogErrors && len(rows) < maxRows {
		fields, err := in.Read()
		if err == io.EOF {
			break
		}
		if err != nil {
			wrong = append(wrong, readFailure(err))
			break
		}
		line, _ := in.FieldPos(0)
		row, field, err := parseRow(fields, where, width)
		if err == nil && len(rows) > 0 && row.Time <= rows[len(rows)-1].Time {
			field = where[0]
			err = fmt.Errorf("time_s is %g, not after %g in the row before", row.Time, rows[len(rows)-1].Time)
		}
		if err != nil {
			col := 0
			if field >= 0 {
				_, col = in.FieldPos(field)
			}
			wrong = append(wrong, &LogError{line, col, err.Error()})
			continue
		}
		rows = append(rows, row)
	}
	switch {
	case len(wrong) == maxLogErrors:
		wrong = append(wrong, &LogError{What: "and perhaps more: reading stopped here"})
	case len(wrong) == 0 && len(rows) == maxRows:
		wrong = append(wrong, &LogError{What: fmt.Sprintf("more than %d rows; thin the log out", maxRows)})
	case len(wrong) == 0 && len(rows) == 0:
		wrong = append(wrong, &LogError{What: "there is a header but no row"})
	}
	if len(wrong) > 0 {
		return nil, errors.Join(wrong...)
	}
	return rows, nil
}

func readFailure(err error) error {
	var parse *csv.ParseError
	if errors.As(err, &parse) {
		return &LogError{parse.Line, parse.Column, parse.Err.Error()}
	}
	return err
}

// columns finds the place of each column that is needed.
func columns(header []string) ([3]int, error) {
	names := make([]string, len(header))
	for i, h := range header {
		names[i] = strings.ToLower(strings.TrimSpace(strings.TrimPrefix(h, "\ufeff")))
	}
	var where [3]int
	var wrong []error
	for i, want := range logColumns {
		where[i] = slices.Index(names, want)
		if where[i] < 0 {
			wrong = append(wrong, &LogError{1, 1, fmt.Sprintf("no column %s; the header has %q", want, shortened(header))})
		}
	}
	if len(names) == 1 && strings.ContainsAny(names[0], ";\t") {
		wrong = append(wrong, &LogError{1, 1, "columns are separated by commas here, and numbers written with a point"})
	}
	return where, errors.Join(wrong...)
}

// shortened is a header fit for a message.
func shortened(header []string) string {
	s := []rune(strings.Join(header, ","))
	if len(s) > 80 {
		return string(s[:80]) + "…"
	}
	return string(s)
}

// parseRow reads one row; where it cannot, field is the one to blame, or -1.
func parseRow(fields []string, where [3]int, width int) (row Row, field int, err error) {
	if len(fields) != width {
		return Row{}, -1, fmt.Errorf("%d fields, but the header has %d", len(fields), width)
	}
	var v [3]float64
	for i, at := range where {
		text := strings.TrimSpace(fields[at])
		x, err := strconv.ParseFloat(text, 64)
		if err != nil || math.IsNaN(x) || math.IsInf(x, 0) {
			return Row{}, at, fmt.Errorf("%s is %q, but a number is needed", logColumns[i], shortened([]string{text}))
		}
		v[i] = x
	}
	if v[2] != 0 && v[2] != 1 {
		return Row{}, where[2], fmt.Errorf("state is %g, but 0 (off) or 1 (on) is needed", v[2])
	}
	if v[1] < -273.15 || v[1] > 5000 {
		return Row{}, where[1], fmt.Errorf("temperature_c is %g, which no thermometer shows", v[1])
	}
	return Row{Time: v[0], Temperature: v[1], On: v[2] == 1}, 0, nil
}
