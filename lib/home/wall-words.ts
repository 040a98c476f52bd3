type Named = { id: string; name: string };

/** First letter upper case: begins a sentence. */
export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** 'Front', 'Front and Back', 'Front, Left side and Back', 'all walls'. */
export function wallWords(chosen: readonly Named[], all: number): string {
  if (chosen.length > 1 && chosen.length === all) return all === 2 ? 'both walls' : `all ${all} walls`;
  const names = chosen.map(({ name }) => name);
  const last = names.pop() ?? '';
  return names.length > 0 ? `${names.join(', ')} and ${last}` : last;
}
