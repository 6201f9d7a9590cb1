import { ConnectorsCard } from './ConnectorsCard';
import { DrillTable } from './DrillTable';
import { Cards } from './Part';
import { ScrewsCard } from './ScrewsCard';
import { SupportCard } from './SupportCard';

/** Screws, connectors, drawbolts, and what carries the tops. */
export function HardwarePart() {
  return (
    <Cards>
      <ScrewsCard />
      <ConnectorsCard />
      <SupportCard />
      <DrillTable />
    </Cards>
  );
}
