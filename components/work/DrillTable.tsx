import { useMemo } from 'react';

import { fastenersOfTops, type Fastener } from '@/geometry/wood/fasteners';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Table } from '../ui/Table';
import { Text } from '../ui/Text';
import { Section } from './Part';
import { useWalls } from './use-walls';

/** Every hole of the underside with its place on its piece: the front line is drilled before the top is set. */
export function DrillTable() {
  const { plan, layout, settings } = useOpenJob();
  const walls = useWalls();
  const holes = useMemo(
    () => fastenersOfTops(plan.tops, layout.bases, walls, settings.screws, plan.movement.slot),
    [plan.tops, layout.bases, walls, settings.screws, plan.movement.slot],
  );
  if (holes.length === 0) return null;
  const { step } = layout;
  const front = holes.filter((hole) => hole.row === 'front').length;
  return (
    <Section title="Pre-drill map" broad>
      <Text kind="second">
        {`${front} round holes in the front line, ${holes.length - front} slots behind. Mark the underside: lengths run from the left end as seen from the room, depths from the front edge. The layer Hardware on the tops shows the same.`}
      </Text>
      <Table
        label="Holes"
        rows={holes}
        rowKey={(hole) => `${hole.letter} ${hole.row} ${hole.x.toFixed(3)}`}
        rowLabel={(hole) => `${hole.letter}, ${hole.row} line`}
        rowHeight={44}
        minWidth={480}
        columns={[
          { key: 'piece', title: 'Piece', width: 70, cell: (hole) => <Text kind="strong">{hole.letter}</Text> },
          {
            key: 'x',
            title: 'From the left',
            align: 'right',
            cell: (hole) => <Fraction inches={hole.x} step={step} />,
          },
          {
            key: 'y',
            title: 'From the front',
            align: 'right',
            cell: (hole) => <Fraction inches={hole.y} step={step} />,
          },
          { key: 'kind', title: 'Hole', cell: (hole) => <Text>{hole.row === 'front' ? 'round' : 'slot'}</Text> },
          { key: 'base', title: 'Through', cell: (hole) => <Text>{baseName(hole, layout.bases)}</Text> },
        ]}
      />
    </Section>
  );
}

function baseName(
  hole: Fastener,
  bases: readonly { readonly id: string; readonly label?: string; readonly kind: string }[],
) {
  const base = bases.find((one) => one.id === hole.base);
  return base ? (base.label ?? base.kind) : 'rail';
}
