import { type Metadata } from 'next';
import { exampleDay, exampleFade, exampleMonths, examplePlace, exampleWalls } from './example';
import { Opening } from './opening';
import { WhatItDoes } from './what-it-does';
import { FadeStrip } from '@/components/drawings/fade-strip';
import { SunSlider } from '@/components/drawings/sun-slider';
import { YearBand } from '@/components/drawings/year-band';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';

export const metadata: Metadata = { title: { absolute: 'Eavewright: every wall on its own clock' } };

export default function FirstPage() {
  return (
    <>
      <Opening />
      <Course heading="Where the sun works" aside="The house plan: your home from above, north up. Move the sun and see which walls it strikes.">
        <SunSlider walls={exampleWalls.map((wall) => wall.plan)} place={examplePlace} day={exampleDay} label="House plan of the example, from above, north up" />
      </Course>
      <Course heading="Which wall is next" aside="The fade strip: each coat from its own color to weathered gray.">
        <FadeStrip today={exampleDay} walls={exampleFade} />
      </Course>
      <Course heading="When a coat can cure" aside="The year band: from the climate normals of the nearest station.">
        <YearBand months={exampleMonths} />
      </Course>
      <Course heading="What it takes off your mind">
        <WhatItDoes />
      </Course>
      <Course tone="roof" as="div">
        <div className="flex flex-wrap items-center justify-between gap-6">
          <p className="figures max-w-xl text-2xl">A postal code, a compass turn and four walls: about five minutes.</p>
          <LinkButton href="/register" look="quiet">
            Set up your home
          </LinkButton>
        </div>
      </Course>
    </>
  );
}
