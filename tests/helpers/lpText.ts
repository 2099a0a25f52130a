/** A linear program as the text that HiGHS reads (the LP format); variables are zero or more. */
export class LpText {
  private readonly rows: string[] = [];
  private readonly wholes = new Set<string>();
  private readonly binaries = new Set<string>();

  row(terms: readonly (readonly [number, string])[], relation: '<=' | '>=' | '=', bound: number): void {
    this.rows.push(` c${this.rows.length}: ${sum(terms)} ${relation} ${plain(bound)}`);
  }

  whole(name: string): void {
    this.wholes.add(name);
  }

  binary(name: string): void {
    this.binaries.add(name);
  }

  minimise(terms: readonly (readonly [number, string])[]): string {
    const section = (title: string, names: ReadonlySet<string>): string =>
      names.size > 0 ? `${title}\n ${[...names].join(' ')}\n` : '';
    return `Minimize\n obj: ${sum(terms)}\nSubject To\n${this.rows.join('\n')}\n${section('General', this.wholes)}${section('Binary', this.binaries)}End\n`;
  }
}

function sum(terms: readonly (readonly [number, string])[]): string {
  return terms.map(([factor, name]) => `${factor < 0 ? '-' : '+'} ${plain(Math.abs(factor))} ${name}`).join(' ');
}

/** A number without an exponent. */
function plain(value: number): string {
  return Number.isInteger(value) ? String(value) : value.toFixed(9);
}
