package codegen

// Version is the version of the program. It stands in every pack, so a pack
// changes with it.
const Version = "0.1.0"
