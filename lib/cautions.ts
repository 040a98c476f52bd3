import { type Sealant, type StainBase, type WorkKind } from '@/lib/schemas/vocabulary';

/** Where people get hurt by this work. `status` says whether the authority was read for this project or is cited from memory. */
export type Caution = {
  id: string;
  hazard: string;
  text: string;
  authority: string;
  status: 'read' | 'from memory';
  kinds: readonly WorkKind[];
};

/** Ends every list of cautions. */
export const cautionsDefer =
  'The label of the product, your local code and a licensed tradesperson decide; where they differ from this, follow them.';

export const cautions = [
  {
    id: 'oil-rags',
    hazard: 'Rags wet with oil stain',
    text: 'Cloths wet with oil stain can catch fire by themselves within hours. Put them into a metal can filled with water and close its lid tightly, or spread them flat outdoors. Never leave them in a pile.',
    authority: 'USDA Wood Handbook, FPL-GTR-190, p. 16-20; NFPA',
    status: 'read',
    kinds: ['restain'],
  },
  {
    id: 'lead',
    hazard: 'Lead in paint from before 1978',
    text: 'Paint on a home built before 1978 may hold lead: have it tested before anybody sands, scrapes, strips or blasts. Paid work that disturbs more than 20 ft² (1.9 m²) of painted outside surface, all sides together, needs a certified firm.',
    authority: 'US EPA renovation rule, 40 CFR 745.83',
    status: 'read',
    kinds: ['restain', 'recaulk'],
  },
  {
    id: 'ladder',
    hazard: 'Ladders',
    text: 'Set the foot 1 ft out for every 4 ft up, on level, dry ground. Let the rails stand 3 ft above where you step off, and keep 10 ft away from power lines.',
    authority: 'OSHA 29 CFR 1926.1053',
    status: 'from memory',
    kinds: ['restain', 'recaulk', 'wash', 'walkaround'],
  },
  {
    id: 'falls',
    hazard: 'Falls',
    text: 'From 6 ft up, construction work needs protection against falls: guardrails, a net or a harness.',
    authority: 'OSHA 29 CFR 1926.501',
    status: 'from memory',
    kinds: ['restain', 'recaulk'],
  },
  {
    id: 'isocyanates',
    hazard: 'Polyurethane sealant',
    text: 'It gives off isocyanates, which can make a person allergic for life. Wear gloves, have moving air, and keep it off the skin.',
    authority: 'NIOSH Alert 2006-149',
    status: 'from memory',
    kinds: ['recaulk'],
  },
  {
    id: 'strippers',
    hazard: 'Strippers, cleaners and brighteners',
    text: 'They are caustic or acid and burn: protect eyes and skin, rinse well, cover plants. Never mix two products, and never bring bleach together with an acid or ammonia.',
    authority: 'OSHA 29 CFR 1910.1000; CDC',
    status: 'from memory',
    kinds: ['restain', 'wash'],
  },
  {
    id: 'dust',
    hazard: 'Sanding and blasting',
    text: 'Wood dust and silica harm the lungs: wear a respirator that fits.',
    authority: 'OSHA 29 CFR 1926.1153',
    status: 'from memory',
    kinds: ['restain'],
  },
  {
    id: 'pressure',
    hazard: 'Pressure washing',
    text: 'A hard jet tears the wood fiber and drives water behind the siding. Keep the pressure low and point down, never up under a course.',
    authority: 'USDA Wood Handbook, FPL-GTR-190, ch. 16',
    status: 'from memory',
    kinds: ['wash', 'restain'],
  },
  {
    id: 'wash-water',
    hazard: 'Wash water',
    text: 'Keep it out of storm drains: they lead to streams untreated.',
    authority: 'Clean Water Act, 40 CFR 122.26',
    status: 'from memory',
    kinds: ['wash', 'restain'],
  },
  {
    id: 'solvents',
    hazard: 'Solvent vapour',
    text: 'What may be sold and used differs by state: read the label, and keep flames away.',
    authority: '40 CFR 59 subpart D',
    status: 'from memory',
    kinds: ['restain'],
  },
  {
    id: 'preservatives',
    hazard: 'Preservatives and fungicides in stain',
    text: 'They are poisonous to people and plants. The label is the law.',
    authority: 'USDA Wood Handbook, FPL-GTR-190, p. 16-18; FIFRA',
    status: 'read',
    kinds: ['restain'],
  },
] as const satisfies readonly Caution[];

/** What is known of the home and the work; what is not known counts as the worse case. */
export type CautionFacts = {
  kinds: readonly WorkKind[];
  yearBuilt: number | null;
  stainBases?: readonly StainBase[] | undefined;
  sealants?: readonly Sealant[] | undefined;
};

/** The cautions that apply to this work, in the order of the list. */
export function cautionsFor(facts: CautionFacts): Caution[] {
  const ruledOut: Record<string, boolean> = {
    lead: facts.yearBuilt !== null && facts.yearBuilt >= 1978,
    'oil-rags': facts.stainBases !== undefined && !facts.stainBases.includes('oil'),
    isocyanates: facts.sealants !== undefined && !facts.sealants.includes('polyurethane'),
  };
  return cautions.filter((caution) => !ruledOut[caution.id] && caution.kinds.some((kind) => facts.kinds.includes(kind)));
}
