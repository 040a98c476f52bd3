'use client';

import { useState } from 'react';
import { CompassDial } from '@/components/drawings/compass-dial';
import { ActionForm } from '@/components/ui/action-form';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';
import { directionWord } from '@/lib/home/direction';

type TurnFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  homeId: string;
  compassDeg: number;
  walls: readonly { name: string; azimuthDeg: number }[];
};

/** Turns every wall by the same angle and says, before it is saved, where each will face. */
export function TurnForm({ action, homeId, compassDeg, walls }: TurnFormProps) {
  const [degrees, setDegrees] = useState(Math.round(compassDeg));
  const by = degrees - Math.round(compassDeg);
  return (
    <ActionForm action={action}>
      <input type="hidden" name="homeId" value={homeId} />
      <CompassDial name="compassDeg" defaultValue={Math.round(compassDeg)} onTurn={setDegrees} />
      <ul aria-live="polite" className="grid gap-1">
        {walls.map((wall) => (
          <li key={wall.name}>
            <strong>{wall.name}</strong> {by === 0 ? 'faces' : 'will face'} {directionWord(wall.azimuthDeg + by)}
          </li>
        ))}
      </ul>
      <div>
        <SubmitButton pendingLabel="Working out the sun…">Turn the house</SubmitButton>
      </div>
    </ActionForm>
  );
}
