import { expect, it } from 'vitest';
import { describeError, describeText } from '#src/server/describeError.ts';
import { captureConsole, createLog } from '#src/server/log.ts';

function collect() {
  const lines: string[] = [];
  return { lines, log: createLog('debug', { write: (line: string) => void lines.push(line) }) };
}

it('writes one JSON object a line, in UTC, whatever the text holds', () => {
  const { lines, log } = collect();
  log.info({ route: '/x\n{"level":"fatal"}' }, 'line one\r\nline two');
  expect(lines).toHaveLength(1);
  expect(lines[0]!.trimEnd()).not.toMatch(/[\r\n]/);
  const entry = JSON.parse(lines[0]!);
  expect(entry.level).toBe('info');
  expect(entry.time).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/);
});

it('describes a database error by code and constraint, never by what it quotes', () => {
  const error = Object.assign(new Error('Key (email)=(amara@example.org) already exists'), {
    code: '23505',
    constraint: 'person_email_key',
    table: 'person',
    detail: 'Key (email)=(amara@example.org)',
  });
  const described = describeError(error);
  expect(described).toMatchObject({ name: 'Error', code: '23505', constraint: 'person_email_key', table: 'person' });
  expect(described.at.length).toBeGreaterThan(0);
  expect(JSON.stringify(described)).not.toContain('amara');
});

it('describes what is no error', () => expect(describeError('Amara Novak')).toEqual({ name: 'string', at: [] }));

it('cleans ids, addresses and queries out of a text', () => {
  const text = describeText(
    'Could not render /athletes/0198c1f2-7a7b-7000-8000-000000000001?pain=7 for a@b.example\nx',
  );
  expect(text).toBe('Could not render /athletes/:id for :address x');
});

it('brings the console into the log under the same rules, and gives it back', () => {
  const { lines, log } = collect();
  const before = console.error;
  const giveBack = captureConsole(log);
  console.error('failed for a@b.example', new TypeError('x is not a function'));
  giveBack();
  expect(console.error).toBe(before);
  const entry = JSON.parse(lines[0]!);
  expect(entry).toMatchObject({ level: 'error', msg: 'console: failed for :address' });
  expect(entry.errors[0]).toMatchObject({ name: 'TypeError', message: 'x is not a function' });
});
