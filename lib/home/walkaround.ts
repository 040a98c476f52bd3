import { type FilmState } from '@/lib/schemas/vocabulary';

/** What is looked at on a walkaround, and what one may see.. */
export const waterAnswers = { beads: 'Beads and runs off', soaks: 'Darkens the wood' } as const;
export const colorAnswers = { holds: 'Even, as it was', faded: 'Paler, or wood begins to show', gray: 'Gray, bare wood' } as const;
export const filmAnswers = { whole: 'Whole', peeling: 'Peels or flakes' } as const;
export const caulkAnswers = { holds: 'Holds on both sides', parts: 'Has let go in places', gone: 'Has let go widely, or is missing' } as const;
export const alsoAnswers = {
  checks: 'Cracks that face up, 1/4 in or wider',
  mildew: 'Mildew or dark spots',
  insects: 'Insect holes or sawdust',
  splash: 'Splash marks on the lowest courses',
} as const;

export type WalkaroundAnswers = {
  water?: keyof typeof waterAnswers | undefined;
  color?: keyof typeof colorAnswers | undefined;
  film?: keyof typeof filmAnswers | undefined;
  caulk?: keyof typeof caulkAnswers | undefined;
  also: (keyof typeof alsoAnswers)[];
};

/**
 * How the coat stands by what was seen; null when nothing was said of it. The worst sign counts.
 * Wood shows or water soaks in: due (Wood Handbook FPL-GTR-190, p. 16-20: refinish when wood begins to show, before all pigment is lost;
 * the water test is common practice, no source). Gray or peeling: past due (our rule, on the same page).
 */
export function coatFound({ water, color, film }: WalkaroundAnswers): FilmState | null {
  if (color === 'gray' || film === 'peeling') return 'past due';
  if (water === 'soaks' || color === 'faded') return 'due';
  return water ?? color ?? film ? 'sound' : null;
}

/** How the caulk stands: let go in places is due, widely is past due. Our rule, after common practice. */
export const sealFound = ({ caulk }: WalkaroundAnswers): FilmState | null => (caulk ? ({ holds: 'sound', parts: 'due', gone: 'past due' } as const)[caulk] : null);
