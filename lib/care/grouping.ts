/** How walls' work is gathered into trips: the months that fit the home best, and what each choice would cost a year. */
export type Grouping = {
  /** A wall due within so many months of a visit may join it; 0–24. */
  months: number;
  choices: { months: number; yearlyCents: number; trips: number }[];
};
