import { beforeEach, describe, expect, it } from 'vitest';
import { homeView } from '@/db/queries/home-view';
import { changeHome } from '@/db/queries/replan';
import { logWork } from '@/db/queries/work';
import { wallWhatIf } from '@/db/queries/what-if';
import { type Actor, Refused } from '@/lib/permissions';
import { actorOf, insertFourWalls, insertHome, insertUser } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

useFreshDatabase();

const now = new Date('2026-12-01T18:00:00Z');
let owner: Actor;
let homeId: string;
let southId: string;

beforeEach(() => {
  owner = actorOf(insertUser());
  // Bozeman Gallatin Field.
  homeId = insertHome({ stationId: 'USW00024132', wood: 'pine-fir-spruce' }, owner).id;
  southId = insertFourWalls({ id: homeId })[2]?.id ?? '';
  changeHome(homeId, now, () => logWork(owner, { homeId, submissionKey: crypto.randomUUID(), kind: 'restain', doneOn: '2025-06-01', wallIds: [southId], finish: 'solid-color' }));
});

describe('what a change to a wall would do', () => {
  it('starts from what the plan says of the wall, with the finish of its latest coat', () => {
    const { facts, variants } = wallWhatIf(owner, homeId, southId, now);
    expect(facts.now.life.months).toBe(homeView(owner, homeId).walls.find(({ wall }) => wall.id === southId)?.coat.lifeMonths);
    expect(facts.pricesSet).toBe(false);
    expect(variants.map(({ change }) => (change.kind === 'finish' ? change.finish : change.kind))).toEqual(['eave', 'eave', 'water-repellent', 'tinted-clear', 'semitransparent', 'texture']);
  });

  it('is for whoever may see the home, and for nobody else', () => {
    expect(() => wallWhatIf(actorOf(insertUser()), homeId, southId, now)).toThrow(Refused);
    expect(() => wallWhatIf(owner, homeId, 'no-such-wall', now)).toThrow(Refused);
  });
});
