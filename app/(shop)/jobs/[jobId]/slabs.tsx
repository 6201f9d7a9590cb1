import { SlabsScreen } from '@/components/slabs/SlabsScreen';

export default function Slabs() {
  return <SlabsScreen />;
}
