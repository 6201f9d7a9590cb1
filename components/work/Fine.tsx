import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Fact } from './Fact';

interface FineProps {
  readonly label: string;
  readonly inches: number;
  readonly from?: string;
  readonly note?: string;
}

/** A length that the seasons make: to the 1/32. */
export function Fine({ label, inches, from, note }: FineProps) {
  const { layout } = useOpenJob();
  const step = layout.step.endsWith('mm') ? '0.5 mm' : '1/32';
  return <Fact label={label} value={<Fraction inches={inches} step={step} bold />} from={from} note={note} />;
}
