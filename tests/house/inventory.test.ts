import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { actions } from '@/lib/permissions';

/**
 * Every door goes through a wrapper. Read as text: a file is judged by what it exports, so a handler
 * written by hand fails here whatever it imports.
 */
const root = path.resolve(import.meta.dirname, '../..');
const files = readdirSync(path.join(root, 'app'), { recursive: true, encoding: 'utf8' }).map((file) =>
  path.join('app', file),
);
const routes = files.filter((file) => file.endsWith('route.ts') && !file.includes('[...nextauth]'));
const actionFiles = files.filter((file) => file.endsWith('actions.ts'));

function exportsOf(file: string): { name: string; value: string }[] {
  const text = readFileSync(path.join(root, file), 'utf8');
  expect(text, `${file} exports by name only`).not.toMatch(/^export (?:\{|\*|default)/m);
  return [...text.matchAll(/^export (?:async )?(?:const|function) (\w+)\s*(?:=\s*)?([^\n]*)/gm)].map((match) => ({
    name: match[1] ?? '',
    value: match[2] ?? '',
  }));
}

describe('doors', () => {
  it('finds the routes and actions', () => {
    expect(routes.length).toBeGreaterThanOrEqual(3);
    expect(actionFiles.length).toBeGreaterThanOrEqual(1);
  });

  for (const file of routes) {
    it(`${file}: every method is made by handle`, () => {
      const methods = exportsOf(file).filter(({ name }) => /^(GET|POST|PUT|PATCH|DELETE|HEAD|OPTIONS)$/.test(name));
      expect(methods.length).toBeGreaterThan(0);
      for (const { name, value } of methods) expect(`${name} ${value}`).toMatch(/^\w+ handle(?:<[^>]*>)?\(/);
    });
  }

  for (const file of actionFiles) {
    it(`${file}: every action is made by action`, () => {
      const text = readFileSync(path.join(root, file), 'utf8');
      expect(text.startsWith("'use server';")).toBe(true);
      const made = exportsOf(file);
      expect(made.length).toBeGreaterThan(0);
      for (const { name, value } of made) expect(`${name} ${value}`).toMatch(/^\w+ action(?:<[^>]*>)?\(/);
    });
  }

  it('every page of the office and the cab asks who may see it', () => {
    const pages = files.filter(
      (file) => /app\/\((ops|cab)\)\/.*page\.tsx$/.test(file) && !file.includes('not-allowed'),
    );
    const unguarded = pages.filter((file) => !readFileSync(path.join(root, file), 'utf8').includes('requirePage('));
    expect(unguarded).toEqual([]);
  });

  it('names only actions of the permission table', () => {
    const named = [...routes, ...actionFiles].flatMap((file) =>
      [...readFileSync(path.join(root, file), 'utf8').matchAll(/^\s*(?:\{ )?action: '([\w.-]+)'/gm)].map(
        (match) => match[1] ?? '',
      ),
    );
    expect(named.filter((name) => name !== 'public' && !(actions as string[]).includes(name))).toEqual([]);
  });
});
