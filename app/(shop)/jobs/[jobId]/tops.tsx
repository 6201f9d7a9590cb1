import { TopsScreen } from '@/components/tops/TopsScreen';

export default function Tops() {
  return <TopsScreen />;
}
