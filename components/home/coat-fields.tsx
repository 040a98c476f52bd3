import { ColorField } from '@/components/home/color-field';
import { Field, SelectField } from '@/components/ui/field';
import { finishes, sealants, stainBases, textures } from '@/lib/schemas/vocabulary';

export type CoatValues = { finish: string; stainBase: string; colorHex: string; colorName: string; texture: string; sealant: string };

/** The coat most log-look siding has; a start that the owner corrects. Our rule. */
export const usualCoat: CoatValues = { finish: 'semitransparent', stainBase: 'oil', colorHex: '#8A5A32', colorName: '', texture: 'smooth', sealant: 'acrylic-latex' };

/** What is on the wood and in the joints. */
export function CoatFields({ values = usualCoat }: { values?: CoatValues }) {
  return (
    <div className="grid items-end gap-5 sm:grid-cols-2">
      <SelectField label="Finish on the wood" name="finish" options={finishes} defaultValue={values.finish} />
      <SelectField label="Oil or waterborne" name="stainBase" options={stainBases} defaultValue={values.stainBase} />
      <ColorField name="colorHex" label="Color of the fresh coat" defaultValue={values.colorHex} />
      <Field label="Name of the color" name="colorName" optional maxLength={60} placeholder="As on the can" defaultValue={values.colorName} />
      <SelectField label="Surface" name="texture" hint="A rough surface takes more stain and holds it longer." options={textures} defaultValue={values.texture} />
      <SelectField label="Caulk in the joints" name="sealant" options={sealants} defaultValue={values.sealant} />
    </div>
  );
}
