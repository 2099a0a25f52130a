import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';

describe('the type check', () => {
  it('passes over the whole tree, typed routes included', { timeout: 240_000 }, () => {
    const result = spawnSync('npx', ['--no-install', 'tsc', '--noEmit', '-p', '.'], { encoding: 'utf8' });
    expect(result.stdout).toBe('');
    expect(result.status).toBe(0);
  });

  it('catches a link to a route that is not there', { timeout: 240_000 }, () => {
    const program = [
      "import type { Href } from 'expo-router';",
      "export const right: Href = '/';",
      "export const wrong: Href = '/no-such-place';",
    ].join('\n');
    const check = `
      const ts = require('typescript');
      const config = ts.getParsedCommandLineOfConfigFile('tsconfig.json', { noEmit: true }, { ...ts.sys, onUnRecoverableConfigFileDiagnostic() {} });
      const name = require('node:path').resolve('tests/tree/tryHref.ts');
      const host = ts.createCompilerHost(config.options);
      const read = host.getSourceFile;
      host.getSourceFile = (file, ...rest) => file === name ? ts.createSourceFile(name, ${JSON.stringify(program)}, 99) : read(file, ...rest);
      host.fileExists = (file) => file === name || ts.sys.fileExists(file);
      const types = ts.sys.readDirectory('.expo/types', ['.ts']);
      const made = ts.createProgram([name, 'expo-env.d.ts', ...types], config.options, host);
      const wrong = made.getSemanticDiagnostics(made.getSourceFile(name));
      process.stdout.write(wrong.map((d) => made.getSourceFile(name).getLineAndCharacterOfPosition(d.start).line).join());
    `;
    const result = spawnSync(process.execPath, ['-e', check], { encoding: 'utf8' });
    expect(result.stderr).toBe('');
    expect(result.stdout).toBe('2');
  });
});
