/** A column's header: the name, and the unit in brackets behind it. */
export interface Header {
  readonly name: string;
  readonly unit?: string;
}

/** Reads a header such as `spacing [mm]`, `spacing (mm)` or `fixed`. */
export function readHeader(text: string): Header {
  const match = /^(.*?)\s*(?:\[([^\]]*)\]|\(([^)]*)\))$/.exec(text.trim());
  if (match === null) return { name: text.trim() };
  return { name: match[1], unit: (match[2] ?? match[3]).trim() };
}
