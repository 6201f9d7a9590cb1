import { RoomScreen } from '@/components/room/RoomScreen';

export default function Room() {
  return <RoomScreen />;
}
