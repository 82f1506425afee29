import { LoadingPage } from '@/components/ui/loading';

export default function Loading() {
  return <LoadingPage />;
}
