package prove

import (
	"slices"

	"makebreak/translate/logic"
)

// driver runs a program with inputs held, and leaps where only counters move.
type driver struct {
	run    *logic.Run
	leaper *leaper

	after  []int64            // state now
	before []int64            // state before the last step
	past   [pastSteps][]int64 // states before the last steps, the latest first
	known  int                // how many of these are of consecutive steps with like inputs
}

// pastSteps is how many steps back a leap has to look: twice the longest period.
const pastSteps = 2 * longestPeriod

// longestPeriod is after how many steps, at the most, a program that alternates
// is seen to repeat itself.
const longestPeriod = 2

// set puts the program into a state.
func (d *driver) set(state []int64) {
	d.run.Restore(state)
	d.after = append(d.after[:0], state...)
	d.known = 0
}

// begin takes over the state that the run has been started in.
func (d *driver) begin() {
	d.after = d.run.Snapshot(d.after)
	d.known = 0
}

func (d *driver) step(inputs []int64) {
	oldest := d.past[pastSteps-1]
	copy(d.past[1:], d.past[:])
	d.past[0], d.after = d.after, oldest
	d.before = d.past[0]
	d.run.Step(inputs)
	d.after = d.run.Snapshot(d.after)
	d.known++
}

// turn is called where the inputs change: steps before and after it are not
// alike.
func (d *driver) turn() { d.known = 0 }

// leap carries the program on over steps, at most so many, that are all like
// the last one or, shortest 2, like the last two in turn: only counters move.
// still is true where nothing will ever move again with these inputs.
func (d *driver) leap(most, shortest int) (steps int, still bool) {
	for period := shortest; period <= longestPeriod && period <= d.known; period++ {
		last := d.past[period-1]
		if slices.Equal(last, d.after) {
			return most - most%period, true
		}
		if 2*period > d.known {
			continue
		}
		rounds := min(d.leaper.rounds(d.past[2*period-1], last, d.after, int64(period)), int64(most/period))
		if rounds > 0 {
			carry(last, d.after, rounds)
			d.run.Restore(d.after)
			d.known = 0
			return int(rounds) * period, false
		}
	}
	return 0, false
}
