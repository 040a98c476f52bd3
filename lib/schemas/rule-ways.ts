/** Two ways to say a care rule. */
export const ruleWays = { simple: 'Every so many years or months', written: 'A rule I write myself' } as const;
export type RuleWay = keyof typeof ruleWays;

export const ruleUnits = { years: 'years', months: 'months' } as const;
export type RuleUnit = keyof typeof ruleUnits;
