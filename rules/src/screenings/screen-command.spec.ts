import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { aLine, aRequest } from '../testing';
import { screenCommand } from './screen-command';
import { Screening } from './screening.schema';

describe('the screen command', () => {
  it('prints a screening that its schema accepts', () => {
    const { exitCode, stdout, stderr } = screenCommand(JSON.stringify(aRequest()));
    expect([exitCode, stderr]).toEqual([0, '']);
    expect(v.safeParse(Screening, JSON.parse(stdout)).success).toBe(true);
  });

  it('refuses empty input', () => {
    const { exitCode, stdout, stderr } = screenCommand(' \n');
    expect([exitCode, stdout]).toEqual([2, '']);
    expect(stderr).toMatch(/^request: Nothing came/);
  });

  it('refuses what is not JSON on one line', () => {
    const { exitCode, stderr } = screenCommand('{"cattle":\n}');
    expect(exitCode).toBe(2);
    expect(stderr).toMatch(/^request: This is not JSON: .*\n$/);
    expect(stderr.trim().split('\n')).toHaveLength(1);
  });

  it('names every faulty field with its full path, one line each', () => {
    const request = aRequest({ lines: [aLine('grain', 100, { sulfurPctDm: -1, fatPctDm: 400 })] });
    const { exitCode, stderr } = screenCommand(JSON.stringify({ ...request, surprise: 1 }));
    const lines = stderr.trim().split('\n');
    expect(exitCode).toBe(2);
    expect(lines.map((line) => line.split(':')[0]).sort()).toEqual([
      'lines.0.composition.fatPctDm',
      'lines.0.composition.sulfurPctDm',
      'surprise',
    ]);
  });

  it.each(['[]', 'null', '1', '"corn"'])('refuses %s', (text) => {
    expect(screenCommand(text).exitCode).toBe(2);
  });
});
