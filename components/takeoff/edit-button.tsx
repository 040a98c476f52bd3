import { type ReactNode } from 'react';
import { Button, type ButtonLook } from '@/components/ui/button';

type Props = {
  /** What it does to the form: 'add walls', 'drop walls.1', 'to metric'. */
  edit: string;
  look?: ButtonLook;
  /** Said aloud in place of what it shows. */
  label?: string;
  children: ReactNode;
};

/** Changes the calculator's form; without scripts the page does it, so it is sent like any field. */
export function EditButton({ edit, look = 'quiet', label, children }: Props) {
  return (
    <Button type="submit" name="edit" value={edit} look={look} aria-label={label}>
      {children}
    </Button>
  );
}
