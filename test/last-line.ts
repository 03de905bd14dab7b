import type { Reporter, TestModule } from 'vitest/node';

/** Prints `N passed, N failed` as the very last line, after vitest's own summary. */
export default class LastLine implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], errors: readonly unknown[]): void {
    const tests = modules.flatMap((module) => [...module.children.allTests()]);
    const count = (state: string): number => tests.filter((test) => test.result().state === state).length;
    const broken = modules.filter(
      (module) => module.state() === 'failed' && [...module.children.allTests()].every((test) => test.result().state !== 'failed'),
    ).length;
    const skipped = count('skipped');
    const line = `${count('passed')} passed, ${count('failed') + broken + errors.length} failed${skipped > 0 ? `, ${skipped} skipped` : ''}\n`;
    process.once('exit', () => process.stdout.write(line));
  }
}
