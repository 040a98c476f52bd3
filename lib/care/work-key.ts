import { type WorkKind } from '@/lib/schemas/vocabulary';
import { type WorkItem } from './types';

const films: WorkKind[] = ['restain', 'recaulk'];

/** What makes a piece of work itself: film work is the same until its film is renewed, however its date moves; yearly work is that of its day. */
export const workKey = ({ wallId, kind, startOn, dueOn }: Pick<WorkItem, 'wallId' | 'kind' | 'startOn' | 'dueOn'>): string =>
  [wallId, kind, (films.includes(kind) ? startOn : null) ?? dueOn].join(':');
