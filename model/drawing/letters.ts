/** Corner letters: A to Z, then AA, AB … as columns of a table are lettered. */

/** The letter at a place counted from 0: 0 is A, 25 is Z, 26 is AA. */
export function letterAt(place: number): string {
  let letters = '';
  for (let rest = place + 1; rest > 0; rest = Math.floor((rest - 1) / 26))
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  return letters;
}

/** The first letter that no corner has. */
export function nextLetter(corners: readonly { readonly letter: string }[]): string {
  const taken = new Set(corners.map((corner) => corner.letter));
  let place = 0;
  while (taken.has(letterAt(place))) place++;
  return letterAt(place);
}
