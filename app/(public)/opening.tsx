import { exampleColor, type ExampleWall, exampleWalls } from './example';
import { WallElevation } from '@/components/drawings/wall-elevation';
import { LinkButton } from '@/components/ui/button';
import { StateMark } from '@/components/ui/state-mark';

/** The claim, and the four walls of one house five years after one coat. */
export function Opening() {
  return (
    <div className="course">
      <div className="within pt-8 pb-8 md:pt-14 md:pb-12">
        <h1 className="max-w-4xl text-[clamp(2.3rem,1.2rem+5vw,4.4rem)]!">Every wall on its own clock</h1>
        <p className="mt-4 max-w-2xl text-lg text-pretty md:text-xl">
          A log-look home does not age evenly. Eavewright works out from the sun and the rain on each wall when it needs stain, when it needs caulk, and reminds you a season ahead.
        </p>
        <div className="mt-6 flex flex-wrap gap-3">
          <LinkButton href="/register">Set up your home</LinkButton>
          <LinkButton href="/sign-in" look="quiet">
            Sign in
          </LinkButton>
        </div>
        <figure className="mt-10">
          <ol className="grid grid-cols-[127fr_97fr] gap-x-5 gap-y-7 lg:grid-cols-[127fr_97fr_127fr_97fr] lg:gap-x-8">
            {exampleWalls.map((wall) => (
              <WallAfterFiveYears key={wall.plan.id} wall={wall} />
            ))}
          </ol>
          <figcaption className="mt-5 text-quiet">One house, stained all around on the same day, five years on. An invented example with round figures.</figcaption>
        </figure>
      </div>
    </div>
  );
}

function WallAfterFiveYears({ wall }: { wall: ExampleWall }) {
  const { plan } = wall;
  return (
    <li className="grid min-w-0 content-start gap-2">
      <WallElevation
        name={plan.name}
        widthM={plan.widthM}
        heightM={2.9}
        gableHeightM={wall.gableHeightM}
        eaveDepthM={plan.eaveDepthM}
        roofRiseM={2.2}
        courseM={0.24}
        openings={wall.openings}
        colorHex={exampleColor}
        used={wall.used}
        words={`${plan.name} wall from the front, ${Math.round(wall.used * 100)} percent faded`}
      />
      <div>
        <p className="flex flex-wrap items-center justify-between gap-x-3">
          <b>{plan.name}</b> {plan.state ? <StateMark state={plan.state} /> : null}
        </p>
        <p className="text-quiet">{wall.left}</p>
      </div>
    </li>
  );
}
