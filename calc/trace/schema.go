package trace

import _ "embed"

// Schema is the JSON Schema of the record.
//
//go:embed trace.schema.json
var Schema []byte
