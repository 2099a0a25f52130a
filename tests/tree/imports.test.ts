/** Walks every import of the tree and holds it against the table of DEVELOPERS.md, by another route than the lint rules. */
import { readFileSync } from 'node:fs';
import { execFileSync } from 'node:child_process';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

/** Folder of the importing file → folders of ours that it may reach. The longest matching folder decides. */
const MAY_REACH: Record<string, readonly string[]> = {
  model: ['model'],
  db: ['db', 'model'],
  server: ['server', 'model', 'db'],
  canvas: ['canvas', 'model', 'assets', 'fonts'],
  'canvas/store': ['canvas/store', 'canvas/tools', 'canvas/input', 'canvas/actions', 'canvas/viewport', 'model'],
  'canvas/tools': ['canvas/store', 'canvas/tools', 'canvas/input', 'canvas/actions', 'canvas/viewport', 'model'],
  'canvas/input': ['canvas/store', 'canvas/tools', 'canvas/input', 'canvas/actions', 'canvas/viewport', 'model'],
  'canvas/actions': ['canvas/store', 'canvas/tools', 'canvas/input', 'canvas/actions', 'canvas/viewport', 'model'],
  app: ['app', 'canvas', 'model/contracts'],
  tests: ['tests', 'model', 'db', 'server', 'canvas', 'app'],
};
/** Outside its launch scripts and entry point the server knows the database through its queries and types only. */
const SERVER_STARTS = ['server/launch/', 'server/index.ts', 'server/app.ts', 'server/auth/'];

const sources = execFileSync('git', ['ls-files', '-co', '--exclude-standard', '--', '*.ts', '*.tsx', '*.mjs'], {
  encoding: 'utf8',
})
  .split('\n')
  .filter((file) => /^(model|db|server|canvas|app|tests)\//.test(file));

function importsOf(file: string): string[] {
  return ts.preProcessFile(readFileSync(file, 'utf8'), true, true).importedFiles.map((each) => each.fileName);
}

function isBelow(file: string, folder: string): boolean {
  return file === folder || file.startsWith(`${folder}/`) || file.startsWith(`${folder}.`);
}

describe('imports', () => {
  it('are read from every source file', () => {
    expect(sources.length).toBeGreaterThan(100);
    expect(sources.flatMap(importsOf).length).toBeGreaterThan(sources.length);
  });

  it('follow the table', () => {
    const wrong: string[] = [];
    for (const file of sources) {
      const from = Object.keys(MAY_REACH)
        .filter((folder) => isBelow(file, folder))
        .sort((a, b) => b.length - a.length)[0]!;
      for (const name of importsOf(file).filter((each) => each.startsWith('.'))) {
        const target = path.normalize(path.join(path.dirname(file), name));
        const allowed = MAY_REACH[from]!.some((folder) => isBelow(target, folder)) || !target.includes('/');
        const onlyQueries =
          from === 'server' && isBelow(target, 'db') && !SERVER_STARTS.some((start) => file.startsWith(start))
            ? isBelow(target, 'db/queries')
            : true;
        if (!allowed || !onlyQueries) wrong.push(`${file} → ${target}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('bring zod into the schemas of the model only', () => {
    const users = sources.filter(
      (file) => file.startsWith('model/') && importsOf(file).some((name) => /^zod(\/|$)/.test(name)),
    );
    expect(users.length).toBeGreaterThan(0);
    expect(users.filter((file) => !/^model\/(drawing|contracts)\//.test(file))).toEqual([]);
  });

  it('leave SQL to db', () => {
    const users = sources.filter(
      (file) => !/^(db|tests)\//.test(file) && importsOf(file).some((name) => /^(drizzle-orm|pg)(\/|$)/.test(name)),
    );
    expect(users.filter((file) => !SERVER_STARTS.some((start) => file.startsWith(start)))).toEqual([]);
  });
});
