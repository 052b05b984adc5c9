type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json }

/**
 * Gives schemas that occur again and again a name and a place of their own, as readers and code generators expect:
 * every part of `document` that equals one of `named` becomes a reference to it.
 */
export function hoistNamed(document: Json, named: Readonly<Record<string, Json>>): Json {
  const nameByText = new Map(Object.entries(named).map(([name, schema]) => [JSON.stringify(schema), name]))

  function replaceInside(node: Json, itself?: string): Json {
    if (typeof node !== 'object' || node === null) return node
    const name = nameByText.get(JSON.stringify(node))
    if (name !== undefined && name !== itself) return { $ref: `#/components/schemas/${name}` }
    if (Array.isArray(node)) return node.map((entry: Json) => replaceInside(entry))
    return Object.fromEntries(Object.entries(node).map(([key, value]) => [key, replaceInside(value)]))
  }

  const schemas = Object.entries(named).map(([name, schema]) => [name, replaceInside(schema, name)])
  const hoisted = replaceInside(document) as Record<string, Json>
  const components = (hoisted.components ?? {}) as Record<string, Json>
  return { ...hoisted, components: { ...components, schemas: Object.fromEntries(schemas) as Json } }
}
