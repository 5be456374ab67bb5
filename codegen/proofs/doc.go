// Package proofs holds the deeper checks of the C that csource prints: a model
// checker, a value analysis, a linter, mutants and branch coverage. It has
// tests alone, behind the build tag deep:
//
//	go test -tags deep ./codegen/proofs/...
//
// A check whose tool is missing skips aloud, and fails where CI is set. Where
// MAKEBREAK_PROOFS names a folder, the figures go into proofs.json in it.
package proofs
