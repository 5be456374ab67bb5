package sheets

import "makebreak/translate/faults"

// FunctionColumns are the columns of functions.csv.
var FunctionColumns = []string{"function", "about", "cause", "old_outcome", "new_alone", "new_with_hardware", "verdict", "evidence"}

// FunctionRows gives one row for each function and cause.
func FunctionRows(rows []faults.Row) [][]string {
	var out [][]string
	for _, r := range rows {
		out = append(out, []string{r.Function, r.About, r.Cause, r.OldOutcome, r.NewAlone, r.NewWithHardware, string(r.Verdict), r.Evidence})
	}
	return out
}
