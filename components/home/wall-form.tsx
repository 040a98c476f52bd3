import { CoatFields, type CoatValues } from '@/components/home/coat-fields';
import { CoverFields } from '@/components/home/cover-fields';
import { LastDoneFields } from '@/components/home/last-done-fields';
import { LengthField } from '@/components/home/length-field';
import { OpeningsFields, type OpeningValues } from '@/components/home/openings-fields';
import { ShadeFields } from '@/components/home/shade-fields';
import { DirectionField } from '@/components/home/direction-field';
import { eavePresets } from '@/components/home/eave-presets';
import { ActionForm } from '@/components/ui/action-form';
import { CheckField } from '@/components/ui/check-field';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { Stepper } from '@/components/ui/stepper';
import { SubmitButton } from '@/components/ui/submit-button';
import { type CalendarDay } from '@/lib/calendar';
import { type CoverValues } from '@/lib/home/form-values';
import { type ActionState } from '@/lib/schemas/action-state';
import { type Shade, type UnitSystem } from '@/lib/schemas/vocabulary';

export type WallFormValues = {
  name: string;
  azimuthDeg: number;
  width: string;
  height: string;
  gableHeight: string;
  eaveDepth: string;
  eaveDrop: string;
  shade: Shade;
  shadeHeightDeg: number;
  cover: CoverValues;
  corners: number;
  pipes: number;
  weatherSide: boolean;
  openings: OpeningValues[];
  coat: CoatValues;
  stained: CalendarDay | null | undefined;
  caulked: CalendarDay | null | undefined;
  logged?: { restain?: CalendarDay | undefined; recaulk?: CalendarDay | undefined };
};

type WallFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  target: Record<string, string>;
  units: UnitSystem;
  today: CalendarDay;
  values: WallFormValues;
  submit: string;
};

/** Everything about one wall, a course a subject. */
export function WallForm({ action, target, units, today, values, submit }: WallFormProps) {
  const length = (label: string, name: 'width' | 'height' | 'gableHeight', hint?: string) => <LengthField label={label} name={name} units={units} defaultValue={values[name]} {...(hint ? { hint } : {})} />;
  return (
    <ActionForm action={action} className="grid">
      {Object.entries({ ...target, units }).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <Course heading="Name and direction" aside="Walls keep their order around the house.">
        <div className="grid max-w-2xl gap-6">
          <Field label="Name" name="name" maxLength={40} hint="What you call this side: Front, West end, Lake side." defaultValue={values.name} />
          <DirectionField defaultValue={values.azimuthDeg} />
        </div>
      </Course>
      <Course heading="Size" aside={units === 'us' ? 'Feet and inches as you say them: 30, or 30 ft 6 in.' : 'Meters, or centimeters with their unit: 9.1, or 910 cm.'}>
        <div className="grid max-w-3xl gap-6">
          <div className="grid items-start gap-5 sm:grid-cols-3">
            {length('Width', 'width')}
            {length('Height', 'height')}
            {length('Gable height', 'gableHeight')}
          </div>
          <OpeningsFields units={units} values={values.openings} />
        </div>
      </Course>
      <Course heading="Eave, porch and shade" aside="An eave keeps sun and rain off the upper courses; a porch roof keeps them off what is under it.">
        <div className="grid max-w-3xl gap-6">
          <div className="grid items-start gap-5 sm:grid-cols-2">
            <LengthField label="Depth of the eave" name="eaveDepth" units={units} defaultValue={values.eaveDepth} hint="From the wall out to the drip edge." presets={eavePresets(units)} />
            <LengthField label="Eave above the wall’s top" name="eaveDrop" units={units} defaultValue={values.eaveDrop} hint="0 where the soffit meets the wall." />
          </div>
          <CoverFields values={values.cover} units={units} />
          <ShadeFields shade={values.shade} heightDeg={values.shadeHeightDeg} />
          <CheckField label="Weather side" name="weatherSide" hint="Wind drives most of the rain against this wall." defaultChecked={values.weatherSide} />
        </div>
      </Course>
      <Course heading="Wood and joints">
        <div className="grid max-w-3xl gap-6">
          <CoatFields values={values.coat} />
          <div className="grid items-start gap-5 sm:grid-cols-2">
            <Stepper label="Log-end corners" name="corners" min={0} max={2} defaultValue={values.corners} hint="Where log ends cross at this wall’s ends. Their joints are caulked." />
            <Stepper label="Pipes and fittings" name="pipes" min={0} max={100} defaultValue={values.pipes} hint="Pipes, vents, lamps and sockets through the wall: a joint around each." />
          </div>
        </div>
      </Course>
      <Course heading="Last time" aside="As you remember it.">
        <LastDoneFields today={today} stained={values.stained} caulked={values.caulked} {...(values.logged ? { logged: values.logged } : {})} />
      </Course>
      <Course as="div" tone="quiet">
        <SubmitButton>{submit}</SubmitButton>
      </Course>
    </ActionForm>
  );
}
