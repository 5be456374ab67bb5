//go:build deep

package proofs
import ("testing";"os")
func TestDump(t *testing.T){ for _,m:=range mutants(read(t,"../../examples/calorifier/pack/cal2.c"),read(t,"../../examples/calorifier/pack/cal2.h")){ os.Stdout.WriteString(m.what+"\n")} }
