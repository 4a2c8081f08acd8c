export { Loading as default } from '@/components/layout/loading';
