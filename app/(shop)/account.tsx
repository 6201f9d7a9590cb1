import { AccountScreen } from '@/components/account/AccountScreen';

export default function Account() {
  return <AccountScreen />;
}
