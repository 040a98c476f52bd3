'use client';

import { useState } from 'react';
import { CaulkCalculator, type CaulkCalculatorProps } from '@/components/takeoff/caulk-calculator';
import { CleanerCalculator, type CleanerCalculatorProps } from '@/components/takeoff/cleaner-calculator';
import { ShoppingList } from '@/components/takeoff/shopping-list';
import { StainCalculator, type StainCalculatorProps } from '@/components/takeoff/stain-calculator';
import { CautionList } from '@/components/ui/caution-list';
import { Course } from '@/components/ui/course';
import { cautions } from '@/lib/cautions';
import { answerCleaner } from '@/lib/schemas/cleaner-form';

/** What burns: said where the cleaner is bought. */
const cleanerCautions = cautions.filter(({ id }) => id === 'strippers');

type BuyingProps = { stain: StainCalculatorProps; caulk: CaulkCalculatorProps; cleaner: CleanerCalculatorProps };

/** Stain, caulk, rod and cleaner for a home, and the list of them all. */
export function Buying({ stain, caulk, cleaner }: BuyingProps) {
  const [stainAnswer, setStain] = useState(stain.first);
  const [caulkAnswer, setCaulk] = useState(caulk.first);
  const [cleanerValues, setCleaner] = useState(cleaner.start);
  return (
    <>
      <Course as="div" className="no-print">
        <StainCalculator {...stain} onAnswer={setStain} />
      </Course>
      <Course className="no-print" heading="Caulk and backer rod" aside="Not the seams between courses: they drain">
        <CaulkCalculator {...caulk} onAnswer={setCaulk} />
      </Course>
      <Course className="no-print" heading="Cleaner for the wash">
        <CleanerCalculator {...cleaner} onValues={setCleaner} />
        <div className="mt-6">
          <CautionList cautions={cleanerCautions} />
        </div>
      </Course>
      <Course heading="Shopping list">
        <ShoppingList stain={stainAnswer} caulk={caulkAnswer} cleaner={answerCleaner(cleanerValues, cleaner.ask)} units={caulk.ask.units} />
      </Course>
    </>
  );
}
