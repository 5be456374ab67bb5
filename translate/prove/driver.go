package prove

import "makebreak/translate/logic"

// driver runs a program with inputs held, and leaps where only counters move.
type driver struct {
	run    *logic.Run
	leaper *leaper

	after   []int64 // state now
	before  []int64 // state before the last step
	earlier []int64 // state before the step before that
	known   int     // how many of these are of consecutive steps
}

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
	d.earlier, d.before, d.after = d.before, d.after, d.earlier
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
	for period := shortest; period <= 2 && period <= d.known; period++ {
		since := d.before
		if period == 2 {
			since = d.earlier
		}
		rounds, same := d.leaper.leap(since, d.after, int64(period))
		if same {
			return most - most%period, true
		}
		if rounds = min(rounds, int64(most/period)); rounds > 0 {
			carry(since, d.after, rounds)
			d.run.Restore(d.after)
			d.known = 0
			return int(rounds) * period, false
		}
	}
	return 0, false
}
