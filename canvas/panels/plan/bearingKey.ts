const KEYS = ['e', 'ne', 'n', 'nw', 'w', 'sw', 's', 'se'] as const;

/** Which way on the sheet a bearing points, of eight: degrees counter-clockwise from the right. */
export function bearingKey(degrees: number): (typeof KEYS)[number] {
  const eighth = ((Math.round(degrees / 45) % 8) + 8) % 8;
  return KEYS[eighth] ?? 'e';
}
