import { type Metadata } from 'next';
import { RegisterForm } from '@/components/account/register-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { register } from './actions';

export const metadata: Metadata = { title: 'Register' };

export default function RegisterPage() {
  return (
    <>
      <PageHead title="Make an account" lead="You get one mail to confirm the address. After that, mail comes only when a wall needs something." />
      <Course>
        <RegisterForm action={register} />
      </Course>
      <Course heading="You have an account?" tone="quiet">
        <LinkButton href="/sign-in" look="quiet">Sign in</LinkButton>
      </Course>
    </>
  );
}
