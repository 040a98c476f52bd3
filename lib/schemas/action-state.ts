/** What a form gets back from its action. `values` are the strings that were sent. */
export type FormValue = string | string[] | { [key: string]: FormValue } | FormValue[];
export type FormValues = { [key: string]: FormValue };

export type ActionState =
  | { ok: true; message: string | null; errors?: undefined; values?: undefined }
  | { ok: false; message: string | null; errors?: Record<string, string>; values?: FormValues };

export const untouched: ActionState = { ok: true, message: null };
