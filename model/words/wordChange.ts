/** Changes between two states of a site in words: what it is about, and what became of it. */
import type { Change, PoleToRemark } from '../compare/types';
import type { Drawing } from '../drawing/schema';
import type { Ticks } from '../length/ticks';
import { nameThing } from './naming';
import type { Say } from './say';
import type { WriteLength } from './wordReason';

export interface WordedChange {
  /** “Door in A–B”. */
  readonly about: string;
  /** “moved 16 in toward B”. */
  readonly what: string;
}

/** Things that are gone are named from the drawing that had them. */
const GONE_AFTER: ReadonlySet<Change['code']> = new Set([
  'runRemoved',
  'cornerRemoved',
  'openingRemoved',
  'keepClearRemoved',
  'controlRemoved',
  'beamRemoved',
]);

const JOINT_GOALS: Readonly<Record<string, string>> = { sill: 'jointSill', head: 'jointHead' };

function aboutOf(change: Change, before: Drawing, after: Drawing, say: Say): string {
  const drawing = GONE_AFTER.has(change.code) ? before : after;
  switch (change.code) {
    case 'poleKit':
    case 'units':
    case 'tapeStep':
    case 'survey':
      return say(`revisions.about.${change.code}`);
    case 'rule':
      return say(`rules.${change.names['rule'] ?? ''}.name`);
    case 'jointChanged': {
      const thing = nameThing(change.thing, drawing, say, { form: 'running' });
      const opening = change.thing.kind === 'opening' ? JOINT_GOALS[change.names['goal'] ?? ''] : undefined;
      return say(`revisions.about.${opening ?? (change.thing.kind === 'lift' ? 'jointTop' : 'joint')}`, { thing });
    }
    default:
      return nameThing(change.thing, drawing, say);
  }
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** The key of what became of it: some codes have one wording for each way they can go. */
export function changeKey(change: Change): string {
  const { code, names, before, after } = change;
  const was = before ?? 0;
  const now = after ?? 0;
  switch (code) {
    case 'openingWidth':
      return now > was ? 'openingWider' : 'openingNarrower';
    case 'lintel':
      return names['part'] === 'bearing' ? 'lintelBearing' : 'lintelDepth';
    case 'doorOpens':
      return names['opens'] === 'out' ? 'doorOpensOut' : 'doorOpensIn';
    case 'doorWay':
      return `doorWay${capital(names['use'] ?? 'size')}`;
    case 'boundary':
      return `boundary${capital(names['state'] ?? 'changed')}`;
    case 'controlHeight':
      return was === now ? 'controlHold' : 'controlHeight';
    case 'beamChanged':
      return names['part'] === 'soffit' ? 'beamSoffit' : 'beamOther';
    case 'wallType':
      return names['part'] === 'run' ? 'wallTypeRun' : 'wallTypeType';
    case 'rule':
      return before === null ? 'ruleNumber' : 'ruleLength';
    case 'units':
      return `units${capital(names['units'] ?? 'imperial')}`;
    case 'poleSetOff':
      return now === 0 ? 'poleSetBack' : 'poleSetOff';
    default:
      return code;
  }
}

/** One change in words. Lengths are written by `write`; `before` and `after` name what each of them still has. */
export function wordChange(
  change: Change,
  before: Drawing,
  after: Drawing,
  say: Say,
  write: WriteLength,
): WordedChange {
  const written = (length: Ticks | null) => (length === null ? '' : write(length));
  const by = Math.abs((change.after ?? 0) - (change.before ?? 0)) as Ticks;
  const count = Number(change.names['count'] ?? 0);
  const params = {
    ...change.names,
    count,
    before: written(change.before),
    after: written(change.after),
    by: write(by),
  };
  return { about: aboutOf(change, before, after, say), what: say(`revisions.change.${changeKey(change)}`, params) };
}

export interface WordedRemark {
  readonly courses: string;
  readonly by: string;
}

/** One pole to mark again: which courses, and by how much. */
export function wordRemark(pole: PoleToRemark, say: Say, write: WriteLength): WordedRemark {
  const { firstCourse: first, lastCourse: last, most, added, removed } = pole;
  const courses =
    first === null || last === null
      ? say('revisions.remark.noCourse')
      : say(`revisions.remark.${first === last ? 'course' : 'courses'}`, { first, last });
  const parts: string[] = [];
  if (most !== 0)
    parts.push(say(`revisions.remark.${most > 0 ? 'higher' : 'lower'}`, { by: write(Math.abs(most) as Ticks) }));
  if (added > 0) parts.push(say('revisions.remark.added', { count: added }));
  if (removed > 0) parts.push(say('revisions.remark.removed', { count: removed }));
  if (parts.length === 0) parts.push(say('revisions.remark.renamed'));
  const by = parts.reduce((firstPart, second) => say('revisions.remark.and', { first: firstPart, second }));
  return { courses, by };
}
