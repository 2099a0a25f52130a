export interface TextPart {
  readonly text: string;
  readonly link: boolean;
}

/** A mail's text cut at the links the server found in it, in order. */
export function partsOf(text: string, links: readonly string[]): readonly TextPart[] {
  const parts: TextPart[] = [];
  let rest = text;
  for (const link of links) {
    const at = rest.indexOf(link);
    // Only addresses that a browser opens as a page: never a script.
    if (at < 0 || !/^https?:\/\//.test(link)) continue;
    if (at > 0) parts.push({ text: rest.slice(0, at), link: false });
    parts.push({ text: link, link: true });
    rest = rest.slice(at + link.length);
  }
  if (rest !== '') parts.push({ text: rest, link: false });
  return parts;
}
