import { describe, expect, it } from 'vitest';
import { welcome } from '../../server/bin/lib/welcome.mjs';

const demo = {
  organisation: 'Northgate Trade School',
  password: 'open-sesame',
  accounts: [{ email: 'ada@northgate.example', name: 'Ada Brandt', role: 'administrator' }],
};
const about = { address: 'http://127.0.0.1:4310', time: '1.2 s', demo, isOwnDatabase: false };

describe('what is said when Coldbench is ready', () => {
  it('tells the address, the accounts and how to stop', () => {
    const text = welcome(about).join('\n');
    expect(text).toContain('http://127.0.0.1:4310');
    expect(text).toMatch(/administrator +Ada Brandt +ada@northgate\.example/);
    expect(text).toContain('password open-sesame:');
    expect(text).toContain('Stop with Ctrl-C.');
  });

  it('promises no accounts when none are made', () => {
    expect(welcome({ ...about, demo: null }).join('\n')).not.toContain('northgate');
  });

  it("promises them in somebody's own database only if that was empty", () => {
    expect(welcome({ ...about, isOwnDatabase: true }).join('\n')).toContain(
      'if the database was empty at first',
    );
  });
});
