import { describe, expect, it } from 'vitest';
import { lastWords } from '../../server/bin/lib/log-file.mjs';

describe('the last words of a program', () => {
  it('are the last line when nothing looks like an error', () => {
    expect(lastWords('one\ntwo\n')).toBe('two');
  });

  it('are nothing when it said nothing', () => {
    expect(lastWords('\n')).toBe('');
  });

  it('are the error, not the trace and the fields that Node prints after it', () => {
    const text = [
      'error: password authentication failed for user "tom"',
      '    at parseErrorMessage (parser.ts:395:9) {',
      "  code: '28P01',",
      "  routine: 'auth_failed'",
      '}',
      '',
      'Node.js v20.19.0',
    ].join('\n');
    expect(lastWords(text)).toBe('error: password authentication failed for user "tom"');
  });

  it('are the message of a line of JSON, with that of its error', () => {
    const text = [
      '{"level":30,"msg":"starting"}',
      '{"level":60,"err":{"message":"relation missing"},"msg":"cannot migrate"}',
    ].join('\n');
    expect(lastWords(text)).toBe('cannot migrate: relation missing');
  });

  it.each([
    'initdb: error: invalid locale name "x"\ninitdb: removing data directory',
    '2026-01-01 10:00:00 UTC [7] FATAL:  lock file is empty\n2026-01-01 10:00:00 UTC [7] LOG:  down',
  ])('are what PostgreSQL gave up over: %j', (text) => {
    expect(lastWords(text)).toBe(text.split('\n')[0]);
  });

  it('are a line that only begins like JSON, as it is', () => {
    expect(lastWords('{"level":30,')).toBe('{"level":30,');
  });
});
