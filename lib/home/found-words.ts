import { alsoAnswers, type WalkaroundAnswers } from '@/lib/home/walkaround';
import { filmStates, type FilmState } from '@/lib/schemas/vocabulary';

/** 'coat due, caulk sound; mildew or dark spots'. */
export function foundWords({ coat, seal, answers }: { coat: FilmState | null; seal: FilmState | null; answers: WalkaroundAnswers | null }): string {
  const films = [coat && `coat ${filmStates[coat].toLowerCase()}`, seal && `caulk ${filmStates[seal].toLowerCase()}`].filter(Boolean).join(', ');
  const also = (answers?.also ?? []).map((one) => alsoAnswers[one].charAt(0).toLowerCase() + alsoAnswers[one].slice(1)).join(', ');
  return [films, also].filter(Boolean).join('; ');
}
