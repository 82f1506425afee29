export { LoadingPage as default } from '@/components/ui/loading';
