import { describe, expect, it } from 'vitest';
import { withoutMainCluster } from '../../server/bin/lib/debian.mjs';

describe("Debian's settings for new clusters", () => {
  it('are made when there are none', () => {
    expect(withoutMainCluster('')).toBe('create_main_cluster = false\n');
  });

  it('keep every other line', () => {
    const text = "#create_main_cluster = true\nssl = on\ncluster_name = '%v/%c'\n";
    expect(withoutMainCluster(text)).toBe(`${text}create_main_cluster = false\n`);
  });

  it('give up an earlier answer', () => {
    const text = 'create_main_cluster = true\nssl = on';
    expect(withoutMainCluster(text)).toBe('ssl = on\ncreate_main_cluster = false\n');
  });

  it('stay as they are when it is said already', () => {
    const once = withoutMainCluster('ssl = on\n');
    expect(withoutMainCluster(once)).toBe(once);
  });
});
