import { describe, expect, it } from 'vitest';
import { runFacts } from '@/lib/export/run-facts';
import { fitRoom } from '@/lib/measure/fit-room';
import { crookedKitchen } from '../../help/crooked-kitchen';
import { releasedSheet } from '../../help/released-sheet';

const { fit, rules } = releasedSheet();
const factsOf = (name: string) => {
  const run = fit.runs.find((one) => one.name === name);
  return run ? runFacts(run, rules) : [];
};

describe('runFacts', () => {
  it('says what a run meets at its ends', () => {
    expect(factsOf('Sink wall')[0]).toBe('Left meets wall D; right meets wall B.');
    expect(factsOf('Tall wall')[0]).toMatch(
      /^Left ends free, 62 .*" to its limit; right meets wall D\.$/,
    );
  });

  it('gives the largest plumb block, what governs it, and the slack, each with its ±', () => {
    expect(factsOf('Sink wall')[1]).toMatch(
      /^Largest plumb block 141 \d+\/\d+" ± \d+\/\d+": left decides .+; right .+\. Slack .+ ± .+\.$/,
    );
  });

  it('tells of the gap behind, and asks for shims where a run rocks', () => {
    const behind = factsOf('Tall wall').find((words) => words.startsWith('Largest gap behind'));
    expect(behind).toContain('it touches one place only: shim the ends');
  });

  it('says that a wall nobody read is taken as straight', () => {
    const { wallBook, runs } = crookedKitchen();
    const readings = wallBook.readings.filter(({ kind }) => kind !== 'face');
    const [run] = fitRoom({ ...wallBook, readings }, runs, rules).runs;
    if (!run) throw new Error('the kitchen has no run');
    expect(runFacts(run, rules)).toContain(
      'The wall behind was not read: taken as straight from corner to corner.',
    );
  });

  it('leaves out what is not known', () => {
    const { wallBook, runs } = crookedKitchen();
    const [run] = fitRoom({ ...wallBook, readings: [] }, runs, rules).runs;
    if (!run) throw new Error('the kitchen has no run');
    const facts = runFacts(run, rules).join(' ');
    expect(facts).not.toMatch(/NaN|undefined|null|plumb block/);
  });
});
