/** One of our own rules: chosen by us, not published by anybody. */
export type OurRule = {
  /** What a person reads who opens a figure, and on the page of sources. */
  text: string;
  /** Why we chose it so: what is known nearby, and what is a guess. */
  because: string;
  /** The files that hold it. */
  where: readonly string[];
};
export type OurRules = Record<string, OurRule>;
