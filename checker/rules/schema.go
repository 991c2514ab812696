package rules

import (
	"strings"

	"boardproof/checker/facts"
)

// InputSchema is the JSON Schema (draft-07) of what a rule sees: an array of closed objects for each
// kind of subject, and the limits. The engine checks rules against it; an editor can too. Arrays and
// fixed keys are used because the engine's type checker is blind behind maps with free keys.
func InputSchema(v *facts.Vocabulary) map[string]any {
	properties := map[string]any{}
	for _, kind := range v.Kinds() {
		object := closed()
		object["properties"].(map[string]any)["id"] = map[string]any{"type": "string"}
		fill(object, v, kind)
		properties[string(kind)] = map[string]any{"type": "array", "items": object}
	}
	limits := closed()
	fill(limits, v, facts.Limits)
	properties[string(facts.Limits)] = limits
	return map[string]any{
		"$schema":              "http://json-schema.org/draft-07/schema#",
		"type":                 "object",
		"properties":           properties,
		"additionalProperties": false,
	}
}

func closed() map[string]any {
	return map[string]any{"type": "object", "properties": map[string]any{}, "additionalProperties": false}
}

// fill adds the terms of one kind, nested by the dots of their names.
func fill(object map[string]any, v *facts.Vocabulary, kind facts.Kind) {
	for _, t := range v.Terms() {
		if t.Kind != kind {
			continue
		}
		steps := strings.Split(t.ID, ".")
		into := object["properties"].(map[string]any)
		for _, step := range steps[:len(steps)-1] {
			next, ok := into[step].(map[string]any)
			if !ok {
				next = closed()
				into[step] = next
			}
			into = next["properties"].(map[string]any)
		}
		into[steps[len(steps)-1]] = valueSchema(t)
	}
}

func valueSchema(t *facts.Term) map[string]any {
	switch t.Value {
	case facts.Word:
		return map[string]any{"type": "string", "enum": anyOf(t.Words), "description": t.Label}
	case facts.Ordered:
		object := closed()
		object["description"] = t.Label
		object["properties"] = map[string]any{
			"word": map[string]any{"type": "string", "enum": anyOf(t.Words)},
			"rank": map[string]any{"type": "number"},
		}
		return object
	}
	return map[string]any{"type": "number", "description": t.Label}
}

func anyOf(words []string) []any {
	list := make([]any, len(words))
	for i, w := range words {
		list[i] = w
	}
	return list
}
