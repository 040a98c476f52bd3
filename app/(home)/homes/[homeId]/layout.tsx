import { type ReactNode } from 'react';
import { pageHome } from '@/app/_server/page-data';

type Props = { children: ReactNode; params: Promise<{ homeId: string }> };

/** A home out of the reader's scope is not found, before anything of the page is sent. */
export default async function HomeLayout({ children, params }: Props) {
  await pageHome((await params).homeId);
  return children;
}
