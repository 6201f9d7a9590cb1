import { SheetsScreen } from '@/components/sheets/SheetsScreen';

export default function Sheets() {
  return <SheetsScreen />;
}
