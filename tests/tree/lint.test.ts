import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';

/** A file that breaks one import direction, and where it would stand. */
const BREACHES = [
  ['model/coursing/try.ts', "import { buildApp } from '../../server/app';\nbuildApp();\n"],
  ['model/coursing/try.ts', "import { useState } from 'react';\nuseState(0);\n"],
  ['model/coursing/try.ts', "import { z } from 'zod';\nz.string();\n"],
  ['model/drawing/try.ts', "import pg from 'pg';\npg.defaults;\n"],
  ['db/queries/try.ts', "import { buildApp } from '../../server/app';\nbuildApp();\n"],
  ['server/sites/try.ts', "import { themes } from '../../canvas/ui/tokens';\nthemes.light;\n"],
  ['canvas/ui/try.ts', "import { connect } from '../../db/connect';\nconnect();\n"],
  ['canvas/store/try.ts', "import { View } from 'react-native';\nView.name;\n"],
  ['canvas/tools/try.ts', "import { themes } from '../ui/tokens';\nthemes.light;\n"],
  ['canvas/actions/try.ts', "import { buildApp } from '../../server/app';\nbuildApp();\n"],
  ['app/try.ts', "import { solve } from '../model/setOut';\nexport default solve;\n"],
  ['app/try.ts', "import { connect } from '../db/connect';\nexport default connect;\n"],
] as const;

const DIRECTION_RULES = ['no-restricted-imports', 'import/no-restricted-paths'];

describe('the lint rules', () => {
  const eslint = new ESLint();

  it.each(BREACHES)('refuse in %s: %s', async (filePath, text) => {
    const [result] = await eslint.lintText(text, { filePath });
    expect(result?.messages.map((message) => message.ruleId)).toEqual(
      expect.arrayContaining([expect.toSatisfy((id: string) => DIRECTION_RULES.includes(id))]),
    );
  });

  it('let zod into the schemas', async () => {
    const [result] = await eslint.lintText("import { z } from 'zod';\n\nz.string();\n", {
      filePath: 'model/drawing/try.ts',
    });
    expect(result?.messages.filter((message) => DIRECTION_RULES.includes(message.ruleId ?? ''))).toEqual([]);
  });

  it('find nothing wrong in the whole tree', { timeout: 240_000 }, async () => {
    const results = await eslint.lintFiles(['.']);
    const errors = results.flatMap((result) =>
      result.messages
        .filter((message) => message.severity === 2)
        .map((message) => `${result.filePath}:${message.line} ${message.ruleId} ${message.message}`),
    );
    expect(errors).toEqual([]);
  });
});
