import { learnedWords } from '@/lib/care/learned-words';
import { type FilmLife } from '@/lib/care/types';

type Learned = { wall: { id: string; name: string }; coat: FilmLife; seal: FilmLife };

/** What walls have newly taught: one sentence a wall and film whose factor moved. 'Front: this wall’s coat has worn 18 % faster than the model since 2021.' */
export function learnedChange(before: readonly Learned[], after: readonly Learned[]): string[] {
  return after.flatMap((now) => {
    const then = before.find(({ wall }) => wall.id === now.wall.id);
    return (['coat', 'seal'] as const).flatMap((film) => {
      const words = learnedWords(now[film]);
      return words && then?.[film].factor !== now[film].factor ? [`${now.wall.name}: ${words.charAt(0).toLowerCase()}${words.slice(1)}`] : [];
    });
  });
}
