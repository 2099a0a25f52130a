/** What changed of everything that is not a wall or an opening: areas, heights, beams, kit, rules, units, survey. */
import type { BondBeam, ControlHeight, Drawing, KeepClear } from '../drawing/schema';
import type { Survey } from '../drawing/surveySchema';
import { RULE_IDS } from '../rules/ids';
import { RULES, ruleValue } from '../rules/registry';
import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import { matchById, sameData } from './matching';
import type { Change } from './types';

const SITE: ThingRef = { kind: 'site', id: 'site' };

function plain(code: Change['code'], thing: ThingRef, names: Record<string, string> = {}): Change {
  return { code, thing, names, before: null, after: null };
}

function compareAreas(before: Drawing, after: Drawing): Change[] {
  const matched = matchById(before.keepClears, after.keepClears);
  const ref = (area: KeepClear): ThingRef => ({ kind: 'keepClear', id: area.id });
  const changes = [
    ...matched.removed.map((area) => plain('keepClearRemoved', ref(area), { name: area.name })),
    ...matched.added.map((area) => plain('keepClearAdded', ref(area), { name: area.name })),
    ...matched.both.flatMap(([was, now]) =>
      sameData(was, now) ? [] : [plain('keepClearChanged', ref(now), { name: now.name })],
    ),
  ];
  if (!sameData(before.boundary, after.boundary)) {
    const state = !before.boundary ? 'added' : !after.boundary ? 'removed' : 'changed';
    changes.push(plain('boundary', { kind: 'boundary', id: 'boundary' }, { state }));
  }
  return changes;
}

function compareHeights(before: Drawing, after: Drawing): Change[] {
  const controls = matchById(before.controlHeights, after.controlHeights);
  const beams = matchById(before.bondBeams, after.bondBeams);
  const control = (code: Change['code'], was: ControlHeight | null, now: ControlHeight | null): Change => {
    const either = now ?? was;
    const names = { name: either?.name ?? '', kind: either?.kind ?? 'named' };
    const thing: ThingRef = { kind: 'controlHeight', id: either?.id ?? '' };
    return { code, thing, names, before: was?.height ?? null, after: now?.height ?? null };
  };
  const beam = (code: Change['code'], was: BondBeam | null, now: BondBeam | null): Change => {
    const either = now ?? was;
    const part = was && now && was.soffit === now.soffit ? 'other' : 'soffit';
    const thing: ThingRef = { kind: 'bondBeam', id: either?.id ?? '' };
    return {
      code,
      thing,
      names: { name: either?.name ?? '', part },
      before: was?.soffit ?? null,
      after: now?.soffit ?? null,
    };
  };
  return [
    ...controls.removed.map((was) => control('controlRemoved', was, null)),
    ...controls.added.map((now) => control('controlAdded', null, now)),
    ...controls.both.flatMap(([was, now]) => (sameData(was, now) ? [] : [control('controlHeight', was, now)])),
    ...beams.removed.map((was) => beam('beamRemoved', was, null)),
    ...beams.added.map((now) => beam('beamAdded', null, now)),
    ...beams.both.flatMap(([was, now]) => (sameData(was, now) ? [] : [beam('beamChanged', was, now)])),
  ];
}

function compareRules(before: Drawing, after: Drawing): Change[] {
  return RULE_IDS.flatMap((id): Change[] => {
    const was = ruleValue(before, id);
    const now = ruleValue(after, id);
    if (was === now) return [];
    const length = RULES[id].unit === 'ticks';
    return [
      {
        code: 'rule',
        thing: SITE,
        names: { rule: id, was: String(was), now: String(now) },
        before: length ? (was as Ticks) : null,
        after: length ? (now as Ticks) : null,
      },
    ];
  });
}

export function compareSettings(before: Drawing, after: Drawing): Change[] {
  const types = matchById(before.wallTypes, after.wallTypes);
  const changes = [...compareAreas(before, after), ...compareHeights(before, after)];
  for (const [was, now] of types.both)
    if (!sameData(was, now))
      changes.push(plain('wallType', { kind: 'wallType', id: now.id }, { name: now.name, part: 'type' }));
  if (!sameData(before.poleKit, after.poleKit)) changes.push(plain('poleKit', SITE));
  changes.push(...compareRules(before, after));
  if (before.units !== after.units) changes.push(plain('units', SITE, { units: after.units }));
  if (before.tapeStep !== after.tapeStep)
    changes.push({ code: 'tapeStep', thing: SITE, names: {}, before: before.tapeStep, after: after.tapeStep });
  return changes;
}

export function compareSurveys(before: Survey, after: Survey): Change[] {
  const matched = matchById<{ readonly id: string }>(before.readings, after.readings);
  const changed = matched.both.filter(([was, now]) => !sameData(was, now)).length;
  // What is not a reading (the method, the benchmark, the closing) counts as one change.
  const otherwise = sameData({ ...before, readings: [] }, { ...after, readings: [] }) ? 0 : 1;
  const count = matched.added.length + matched.removed.length + changed + otherwise;
  return count === 0 ? [] : [plain('survey', SITE, { count: String(count) })];
}
