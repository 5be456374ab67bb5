package sensing

import "testing"

// A thermistor, −40 to 125 degC, within 0.05 K in steps of 0.01 K.
func BenchmarkFit16Bit(b *testing.B) {
	s := thermistor(16, true)
	s.Valid = f([2]float64{-40, 125})
	c := chain(b, s, 16)
	for b.Loop() {
		if _, err := c.Fit(0.05, 0.01); err != nil {
			b.Fatal(err)
		}
	}
}

func BenchmarkBudget(b *testing.B) {
	c := chain(b, thermistor(12, true), 12)
	for b.Loop() {
		if _, err := c.Budget(60); err != nil {
			b.Fatal(err)
		}
	}
}
