import { describe, expect, it } from 'vitest';
import { RULE_IDS } from '../../../model/rules/ids';
import { RULES, ruleChanged, rulesInForce, ruleValue } from '../../../model/rules/registry';
import { rules as words } from '../../../model/words/en/rules';

describe('the registry of rules', () => {
  it.each(RULE_IDS)('%s has a value, a source and its words', (id) => {
    const rule = RULES[id];
    expect(rule.id).toBe(id);
    expect(rule.value).toBeGreaterThan(0);
    expect(rule.source.length).toBeGreaterThan(10);
    expect(words[id].name).not.toBe('');
    expect(words[id].guards.endsWith('.')).toBe(true);
  });

  it('calls nothing code that is known at second hand or has no source', () => {
    for (const rule of Object.values(RULES)) {
      if (rule.standing === 'code') expect(rule.source).not.toMatch(/secondary|no source/);
      if (rule.source.startsWith('common practice')) expect(rule.standing).toBe('commonPractice');
    }
  });

  it('gives the site’s own value where it has one', () => {
    const drawing = { ruleValues: { liftToThickness: 8 } };
    expect(ruleValue(drawing, 'liftToThickness')).toBe(8);
    expect(ruleValue(drawing, 'braceAngleLeast')).toBe(60);
    expect(ruleChanged(drawing, 'liftToThickness')).toBe(true);
    expect(ruleChanged(drawing, 'braceAngleLeast')).toBe(false);
  });

  it('lists every rule with the number in force and the site’s own, where it has one', () => {
    const listed = rulesInForce({ ruleValues: { liftToThickness: 8, lineMost: RULES.lineMost.value } });
    expect(listed.map(({ id }) => id).sort()).toEqual([...RULE_IDS].sort());
    const byId = new Map(listed.map((rule) => [rule.id, rule]));
    expect(byId.get('liftToThickness')).toMatchObject({ value: 10, own: 8, inForce: 8 });
    // The same number set by the site is still the site's own.
    expect(byId.get('lineMost')).toMatchObject({ own: RULES.lineMost.value });
    expect(byId.get('lineSagMost')).toMatchObject({ own: null, inForce: 1016 });
  });
});
