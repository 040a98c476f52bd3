const jobs = [
  ['A date with its reason', 'Restain, recaulk, wash and walkaround for every wall. Open any figure to see its inputs, its formula and who published it.'],
  ['One mail for each home', 'A season ahead to book, weeks ahead to buy, on the day the season opens, and when a chance has passed. Each item leads straight to the log.'],
  ['The right amount', 'Stain from the area, the rounded face and the texture; caulk and backer rod from the joints; the cheapest mix of containers.'],
  ['The right day', 'The months in which a coat can cure in your climate; on the day the temperature, dew point, rain and wood moisture, and the order of walls that keeps you in the shade.'],
  ['A log that takes a minute', 'Beside the wall, on a phone, one hand. The clock of those walls starts again at once.'],
  ['Or a contractor', 'Share the home with the crew you trust: they see what is coming, season by season, with areas and gallons, and log what they did.'],
] as const;

export function WhatItDoes() {
  return (
    <dl className="grid gap-x-12 md:grid-cols-2">
      {jobs.map(([title, text]) => (
        <div key={title} className="border-t-2 border-line py-4">
          <dt className="font-display text-lg font-bold">{title}</dt>
          <dd className="mt-1 text-pretty">{text}</dd>
        </div>
      ))}
    </dl>
  );
}
