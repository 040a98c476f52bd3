import { type FormValue, type FormValues } from '@/lib/schemas/action-state';

/**
 * FormData as plain values. 'walls.0.name' nests; 'wallIds[]' is always a list; a repeated plain name keeps the last.
 * Files and framework fields are left out.
 */
export function readForm(form: FormData): FormValues {
  const root: FormValues = {};
  for (const [key, value] of form.entries()) {
    if (key.startsWith('$ACTION') || typeof value !== 'string') continue;
    if (key.endsWith('[]')) {
      const name = key.slice(0, -2);
      root[name] = [...((root[name] as string[] | undefined) ?? []), value];
    } else {
      put(root, key.split('.'), value);
    }
  }
  return root;
}

export type QueryValues = Record<string, string | string[] | undefined>;

/** The query string of a page as the form that was sent with it. */
export function queryForm(query: QueryValues): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(query)) for (const one of [value].flat()) if (one !== undefined) form.append(name, one);
  return form;
}

function put(target: FormValues, path: string[], value: string) {
  const [head, ...rest] = path;
  if (head === undefined || head === '__proto__' || head === 'constructor' || head === 'prototype') return;
  if (rest.length === 0) {
    target[head] = value;
    return;
  }
  const existing = target[head];
  const child: FormValues = typeof existing === 'object' && !Array.isArray(existing) ? (existing as FormValues) : {};
  target[head] = child as FormValue;
  put(child, rest, value);
}
