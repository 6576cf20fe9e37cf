import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawCommand } from '../../../server/headless/draw-command';
import { drawResult } from '../../../shared/api/contract';

interface Run {
  code: number;
  stdout: string;
  stderr: string;
}

async function draw(...words: string[]): Promise<Run> {
  const run: Run = { code: -1, stdout: '', stderr: '' };
  run.code = await drawCommand(words, {
    print: (text) => (run.stdout += text),
    complain: (text) => (run.stderr += text),
  });
  return run;
}

/** The command as a person starts it. */
function npmRunDraw(...words: string[]): Promise<Run> {
  return new Promise((resolve) => {
    execFile(
      'npm',
      ['run', '--silent', 'draw', '--', ...words],
      { maxBuffer: 64e6 },
      (error, stdout, stderr) =>
        resolve({ code: typeof error?.code === 'number' ? error.code : 0, stdout, stderr }),
    );
  });
}

describe('npm run draw', () => {
  let folder = '';
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'benchleaf-draw-'));
  });
  afterAll(() => rm(folder, { recursive: true, force: true }));

  it('lists families and parameters', async () => {
    const run = await draw('--templates');
    expect(run.code).toBe(0);
    const listed = JSON.parse(run.stdout) as { id: string; parameters: { id: string }[] }[];
    expect(listed.map(({ id }) => id)).toEqual(expect.arrayContaining(['stepped-shaft', 'tapered-handle']));
    expect(listed.find(({ id }) => id === 'tapered-handle')?.parameters.map(({ id }) => id)).toContain(
      'taperEndDiameter',
    );
  });

  it('draws a tapered handle from values on the line, with all three files', async () => {
    const files = { svg: join(folder, 'a.svg'), pdf: join(folder, 'a.pdf'), json: join(folder, 'a.json') };
    const run = await draw(
      'tapered-handle',
      'gripLength=42',
      '--svg',
      files.svg,
      '--pdf',
      files.pdf,
      '--json',
      files.json,
    );
    expect(run.stderr).toBe('');
    expect(run.code).toBe(0);
    const json = drawResult.parse(JSON.parse(await readFile(files.json, 'utf8')));
    expect(json.parameters['gripLength']).toBeCloseTo(42, 9);
    expect(await readFile(files.svg, 'utf8')).toContain('data-view="axis"');
    expect((await readFile(files.pdf)).subarray(0, 5).toString()).toBe('%PDF-');
  });

  it('draws a stepped shaft from a file of numbers in inches', async () => {
    const params = join(folder, 'shaft.json');
    await writeFile(
      params,
      JSON.stringify({
        steps: [
          { diameter: 0.5, length: 1 },
          { diameter: '3/4', length: 2.25 },
        ],
        title: 'Paddle-gear shaft',
      }),
    );
    const run = await draw('stepped-shaft', '--params', params, '--unit', 'in', '--quantity', '3');
    expect(run.stderr).toBe('');
    const json = drawResult.parse(JSON.parse(run.stdout));
    expect(json.sheet).toMatchObject({ unit: 'in', style: 'asme' });
    expect(json.part.length).toBeCloseTo(82.55, 9);
    expect(json.part.maxDiameter).toBeCloseTo(19.05, 9);
    expect(json.parameters['quantity']).toBe(3);
  });

  it.each([
    [['no-such-part'], /^template: "no-such-part" is not a template/],
    [['stepped-shaft', 'colour=red'], /^colour: /],
    [['stepped-shaft', '--depth', '3'], /^--depth: This option is not known/],
    [['stepped-shaft', '--scale', 'big'], /^--scale: "big" is not a scale/],
    [['stepped-shaft', '--sheet', 'B5'], /^--sheet: /],
    [['stepped-shaft', 'steps=[{"diameter":"20","length":"-4"}]'], /^steps\[0\]\.length: /],
    [['tapered-handle', 'grip=hex', 'acrossFlats=26'], /^acrossFlats: /],
    [
      ['stepped-shaft', '--params', '/nowhere/at/all.json'],
      /^--params: The file \/nowhere\/at\/all\.json cannot be read/,
    ],
  ])('refuses %j with exit code 2 and a line for each problem', async (words, expected) => {
    const run = await draw(...words);
    expect(run.code).toBe(2);
    expect(run.stdout).toBe('');
    for (const line of run.stderr.trimEnd().split('\n')) expect(line).toMatch(/^[^:]+: .+\.$/);
    expect(run.stderr).toMatch(expected);
  });

  it('answers 1 when the fault is its own', async () => {
    const run: Run = { code: -1, stdout: '', stderr: '' };
    run.code = await drawCommand(['--templates'], {
      print: () => {
        throw new Error('the line is cut');
      },
      complain: (text) => (run.stderr += text),
    });
    expect(run).toEqual({
      code: 1,
      stdout: '',
      stderr: 'A fault of the program, not of the sizes: the line is cut\n',
    });
  });

  it('says the same as a process: exit codes, and nothing but JSON on standard output', async () => {
    const good = await npmRunDraw('tapered-handle');
    expect([good.code, good.stderr]).toEqual([0, '']);
    expect(good.stdout).toBe((await draw('tapered-handle')).stdout);
    const bad = await npmRunDraw('tapered-handle', 'gripLength=far');
    expect([bad.code, bad.stdout]).toEqual([2, '']);
    expect(bad.stderr).toMatch(/^gripLength: /);
  });
});
