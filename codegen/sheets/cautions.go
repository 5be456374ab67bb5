package sheets

// Cautions stand in every paper of a pack. There is no way to leave them out.
var Cautions = []string{
	"This helps to plan; it decides nothing. Local codes, the equipment's listing or approval, and a licensed person decide.",
	"Independent hardware limits stay in place, hard-wired, and are tested before anything else is touched.",
	"Isolate, lock off and prove dead before working on the equipment.",
	"The C is a skeleton to start from. It has not been certified for any purpose; no claim of compliance is made for it.",
	"Software cannot see what it has no input for. A finding of grade stop is ended only by changing the design.",
}
