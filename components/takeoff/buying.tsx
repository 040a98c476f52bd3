'use client';

import { useState } from 'react';
import { CaulkCalculator, type CaulkCalculatorProps } from '@/components/takeoff/caulk-calculator';
import { ShoppingList } from '@/components/takeoff/shopping-list';
import { StainCalculator, type StainCalculatorProps } from '@/components/takeoff/stain-calculator';
import { Course } from '@/components/ui/course';

/** Stain, caulk and rod for a home, and the list of all three. */
export function Buying({ stain, caulk }: { stain: StainCalculatorProps; caulk: CaulkCalculatorProps }) {
  const [stainAnswer, setStain] = useState(stain.first);
  const [caulkAnswer, setCaulk] = useState(caulk.first);
  return (
    <>
      <Course as="div" className="no-print">
        <StainCalculator {...stain} onAnswer={setStain} />
      </Course>
      <Course className="no-print" heading="Caulk and backer rod" aside="Not the seams between courses: they drain">
        <CaulkCalculator {...caulk} onAnswer={setCaulk} />
      </Course>
      <Course heading="Shopping list">
        <ShoppingList stain={stainAnswer} caulk={caulkAnswer} units={caulk.ask.units} />
      </Course>
    </>
  );
}
