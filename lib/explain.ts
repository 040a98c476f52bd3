/** How a computed figure came about, as data: what a person sees who opens the figure. */

/** Where a step's authority comes from. 'published' was read in the source; 'memory' was not; 'our rule' is our own judgement. */
export type Ground = 'published' | 'memory' | 'common practice' | 'our rule';

/** A ground as a reader sees it. */
export const groundWords: Record<Ground, string> = {
  published: 'published',
  memory: 'from memory, not read again',
  'common practice': 'common practice, no source',
  'our rule': 'our rule',
};

export type Source = {
  /** Author, title, edition and table, equation or page. */
  text: string;
  ground: Ground;
};

export type ExplainedInput = {
  label: string;
  /** With its unit, as a person reads it. */
  value: string;
};

export type Explanation = {
  /** The name of the figure: 'Coat life of this wall'. */
  figure: string;
  /** The figure with its unit: '4 years 7 months'. */
  value: string;
  /** In words and symbols: 'high − severity × (high − low)'. */
  formula: string;
  inputs: ExplainedInput[];
  sources: Source[];
};
