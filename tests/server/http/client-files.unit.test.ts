import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { serveClient } from '../../../server/http/client-files.ts';

const app = express();
let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldbench-client-'));
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<title>Coldbench</title>');
  writeFileSync(join(folder, 'assets', 'bench-1a2b.js'), 'export {};');
  writeFileSync(join(folder, 'favicon.svg'), '<svg/>');
  serveClient(app, folder);
});

afterAll(() => rmSync(folder, { recursive: true }));

test.each(['/', '/jobs', '/bench/7a1fc0de', '/attempts/x?at=7'])(
  '%s is a page of the client, asked for anew each time',
  async (path) => {
    const response = await request(app).get(path);
    expect(response.status).toBe(200);
    expect(response.text).toContain('<title>Coldbench</title>');
    expect(response.get('Cache-Control')).toBe('no-cache');
  },
);

test('what carries a hash in its name is kept for a year', async () => {
  const response = await request(app).get('/assets/bench-1a2b.js');
  expect(response.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
  expect(response.type).toBe('text/javascript');
});

test('an old script is missing rather than a page', async () => {
  const response = await request(app).get('/assets/bench-0000.js');
  expect(response.status).toBe(404);
  expect(response.type).toBe('text/plain');
});

test('no file outside the folder is served', async () => {
  for (const path of [
    '/../package.json',
    '/assets/..%2f..%2fpackage.json',
    '/%2e%2e/package.json',
  ]) {
    const response = await request(app).get(path);
    expect(response.text).not.toContain('"dependencies"');
  }
});
