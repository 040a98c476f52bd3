import { type CalendarDay } from '@/lib/calendar';
import { type WalkaroundAnswers } from '@/lib/home/walkaround';
import { type FilmState, type Finish, type Sealant, type StainBase, type WorkKind } from '@/lib/schemas/vocabulary';

/** A piece of work as the record shows it. */
export type ShownRecord = {
  id: string;
  kind: WorkKind;
  doneOn: CalendarDay;
  origin: 'logged' | 'recalled';
  wallIds: readonly string[];
  product: string | null;
  amountL: number | null;
  costCents: number | null;
  note: string | null;
  finish: Finish | null;
  stainBase: StainBase | null;
  colorHex: string | null;
  sealant: Sealant | null;
  byName: string | null;
  /** How the walls were found with this work. */
  findings: readonly { wallId: string; coat: FilmState | null; seal: FilmState | null; answers: WalkaroundAnswers | null }[];
};
