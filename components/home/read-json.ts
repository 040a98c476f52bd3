/** Reads JSON for SWR; a problem answer becomes an error with its title. */
export async function readJson<T>(address: string): Promise<T> {
  const response = await fetch(address, { headers: { accept: 'application/json' } });
  if (!response.ok) {
    const problem = (await response.json().catch(() => ({}))) as { title?: string };
    throw new Error(problem.title ?? `No answer (${response.status})`);
  }
  return (await response.json()) as T;
}
