import { type OurRules } from './rule';

/** Windows, yearly work, own rules, putting off and reminders. */
export const planRules = {
  window: {
    text: 'Window: the coating season that holds the date, else the next if it opens within 60 days, else the one before; at most 60 days past the date, at least two weeks long; in a season of over half a year from three months before the date; without a season 30 days around it; never in a season that had begun when the film was put on',
    because: 'Two months are little of a coat’s life and much of a season; a coat that has to last a winter longer should be renewed before it.',
    where: ['lib/care/window.ts', 'lib/care/film-work.ts'],
  },
  found: {
    text: 'A film found due is due from that day, one found past due is overdue; one found sound is not due within half a year',
    because: 'Who stood at the wall knows more than the model; the next walkaround is half a year off.',
    where: ['lib/care/film-work.ts'],
  },
  'carried over': {
    text: 'Work whose window passed without it moves to the season that comes, and stays overdue; where there is no season, by 90 days at a time',
    because: 'The wall still needs it; a plan that forgets missed work helps nobody.',
    where: ['lib/care/carry-over.ts', 'lib/care/state.ts'],
  },
  'put off': {
    text: 'Work that was put off is not asked for before the season that it was put off to; where there is no season, half a year later',
    because: 'The owner decides; the film’s own date stays, so that the price of waiting stays in sight.',
    where: ['lib/care/put-off.ts'],
  },
  'caulk with the coat': {
    text: 'A recaulk due within 18 months of the wall’s restain joins it, if the caulk is not left more than 60 days past its life',
    because: 'Caulk goes on before stain, by common practice; 18 months are a fifth of a usual caulk’s life, less than what a second set-up of ladders costs.',
    where: ['lib/care/with-restain.ts'],
  },
  'wash with the coat': {
    text: 'A restain begins with a wash, so the wash of that year is part of it; either one in a year settles that year’s wash',
    because: 'A coat is put on clean wood in any case.',
    where: ['lib/care/with-restain.ts', 'lib/care/yearly-work.ts'],
  },
  'wash month': {
    text: 'The yearly wash falls in the first month of the coating season where that is in spring, else in April (south of the equator in October); a walkaround up to 30 days early counts',
    because: 'Washed before the season, a wall is dry when work on it begins.',
    where: ['lib/care/yearly-work.ts'],
  },
  'first look': {
    text: 'A wall whose dates nobody knows is looked at first, within 30 days',
    because: 'Not known is an answer; a look settles it better than a guess.',
    where: ['lib/care/first-look.ts', 'lib/care/yearly-work.ts'],
  },
  'own rules': {
    text: 'A rule of your own falls at most once in 28 days, starts within 50 years of today, and must fall on some day whenever logged work restarts it; a start at the end of a long month falls on the last day of a short one',
    because: 'Rules restart with logged work, whatever its day; RFC 5545 would skip months that lack the day.',
    where: ['lib/care/rule-preview.ts', 'lib/care/rule-build.ts', 'lib/care/own-rule.ts', 'lib/schemas/own-rule.ts'],
  },
  reminders: {
    text: 'When a reminder goes out: 120 days before to book, 28 days before to buy, on the opening day, and 14, 45 and 105 days after a chance has passed; after 400 days being overdue alone is no reason to write. Nobody is written to before seven in the morning at the home. Work is due soon 60 days ahead',
    because: 'Crews fill up a season ahead, material takes weeks; growing gaps keep a reminder from becoming noise.',
    where: ['lib/care/stages.ts', 'lib/care/state.ts', 'db/queries/reminders.ts'],
  },
  'mail tries': {
    text: 'A mail that could not be sent is tried again after a minute, then twice as long each time, at most six hours apart, for about three days',
    because: 'Mail servers ask for patience; about three days is how long they usually keep trying themselves, from memory.',
    where: ['lib/mail/back-off.ts'],
  },
  bounces: {
    text: 'Five passing bounces of an address within 14 days count as one for good; a full mailbox and trouble on the way count as passing even where the server says otherwise',
    because: 'RFC 3463 and RFC 3464 say what is permanent and what is not; how long to believe a mailbox that is always full they leave open.',
    where: ['lib/mail/bounce-rules.ts', 'lib/mail/delivery-status.ts'],
  },
  limits: {
    text: 'How often a sign-in or an account mail may be tried, and how long a mailed link works',
    because: 'Enough for a person with cold fingers, too little for guessing.',
    where: ['app/_server/attempts.ts', 'db/queries/account-tokens.ts', 'db/queries/mail-links.ts'],
  },
  'usual coat': {
    text: 'A new wall starts as most log-look siding is: oil semitransparent stain on smooth wood, acrylic latex in the joints',
    because: 'A start that the owner corrects; nobody counted.',
    where: ['components/home/coat-fields.tsx'],
  },
  'data kept': {
    text: 'A removed home can be brought back for 30 days; of the daily backups the last of 7 days, 4 weeks and 6 months is kept',
    because: 'A mistake is noticed within a month; damage that creeps in is found by a backup from before it.',
    where: ['db/queries/removed-homes.ts', 'lib/backup-rotation.ts'],
  },
} satisfies OurRules;
