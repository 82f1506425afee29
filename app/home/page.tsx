import { redirect } from 'next/navigation';
import { requireViewer } from '@/lib/auth/viewer';
import { homeOf } from '../_components/navigation';

/** Leads each person to where their work begins. */
export default async function HomePage() {
  redirect(homeOf(await requireViewer()));
}
