/**
 * Stands in, on the web, for the parts of zod that nothing of ours calls: JSON Schema both ways, and compiling schemas to code,
 * which our content security policy forbids anyway. zod itself asks only for these two while it builds a schema.
 */
function none(): undefined {
  return undefined;
}

export function createToJSONSchemaMethod(): typeof none {
  return none;
}

export function createStandardJSONSchemaMethod(): typeof none {
  return none;
}
