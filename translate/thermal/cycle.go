// Package thermal works out how a process under two-position control cycles:
// exactly, between events, without stepping through time.
package thermal

// Process is a first-order process with dead time: with the load on the medium
// settles at On, with it off at Off, in degC; time constant Tau and dead time
// Dead in s. On above Off heats, below it cools.
type Process struct {
	On, Off   float64
	Tau, Dead float64
}

// Cycle is the steady cycle. Temperatures are those of the medium, degC.
type Cycle struct {
	On, Off   float64 // s that the command is on and off
	High, Low float64
	Mean      float64 // over time; exact for this process: Off + (On − Off)·duty
}

// Period of the cycle, s.
func (c Cycle) Period() float64 { return c.On + c.Off }

// Duty is the share of the period that the command is on.
func (c Cycle) Duty() float64 { return c.On / c.Period() }

// Swing of the medium, K.
func (c Cycle) Swing() float64 { return c.High - c.Low }
