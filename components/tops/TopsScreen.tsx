import { useRouter } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { inches as say } from '@/geometry/top/sentence';
import type { TopsLayers } from '@/geometry/scene/tops/tops-scene';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { Button } from '../ui/Button';
import { Inspector } from '../ui/Inspector';
import { MoreMenu } from '../ui/Menu';
import { Sheet } from '../ui/Sheet';
import type { SheetPosition } from '../ui/sheet-drag';
import { space } from '../ui/tokens';
import { useShortcuts } from '../ui/use-shortcuts';
import { useWide } from '../ui/use-wide';
import { HeldSignOff } from './HeldSignOff';
import { NoTops } from './NoTops';
import { PictureView } from './PictureView';
import { topsOf } from './tops-choice';
import { TopsPadProvider } from './tops-pad';
import { TopsCanvas } from './TopsCanvas';
import { TopsSidePanel } from './TopsSidePanel';
import { TopsTools } from './TopsTools';
import { useTopsView, type TopsView } from './use-tops-view';
import { VisibleSeam, WoodBar } from './WoodBar';

const LAYER_NAMES: Readonly<Record<keyof TopsLayers, string>> = {
  grain: 'Grain',
  sizes: 'Sizes',
  hardware: 'Hardware',
  walls: 'Walls',
};

/** px of the sheet that holds the pad. */
const PAD_HEIGHT = 492;

/** Job > Tops: the tops as they will lie in the room. */
export function TopsScreen() {
  const wide = useWide();
  const { layout, plan, mayEdit } = useOpenJob();
  const view = useTopsView();
  const [covered, setCovered] = useState(0);
  const begun = topsOf(layout).length > 0 || view.side === 'add';
  const typing = view.typing !== null;
  useShortcuts({ Escape: () => view.choose(null) }, view.choice !== null && !typing);
  const next = <ToSlabs wide={!wide} />;
  const { species, thickness } = layout.material;
  const name = `${species.charAt(0).toUpperCase()}${species.slice(1)}`;
  return (
    <TopsPadProvider value={view.type}>
      <JobFrame
        subtitle={`${name}, ${say(thickness, layout.step)}, ${plan.pieces.length} ${plan.pieces.length === 1 ? 'piece' : 'pieces'}`}
        fill
        barHidden={!wide && typing}
        primary={next}
        actions={<Layers view={view} />}
        inspector={
          begun ? (
            <Inspector
              label={view.choice ? 'Selected' : 'Findings, pieces and tops'}
              flush
              foot={<HeldSignOff onShow={view.zoom} />}
            >
              <TopsSidePanel view={view} />
            </Inspector>
          ) : undefined
        }
      >
        <View style={styles.fill}>
          {begun ? (
            <TopsArea view={view} covered={wide ? 0 : covered} />
          ) : (
            <NoTops onAdd={mayEdit ? () => view.show('add') : undefined} />
          )}
        </View>
        {!wide && begun && <TopsSheet view={view} onCovers={setCovered} foot={next} />}
      </JobFrame>
    </TopsPadProvider>
  );
}

/** The drawing or the picture, and on wide screens the bars that lie on it. */
function TopsArea({ view, covered }: { readonly view: TopsView; readonly covered: number }) {
  const wide = useWide();
  return (
    <>
      {wide && (
        <View style={styles.tools}>
          <TopsTools view={view} floating />
        </View>
      )}
      {view.picture && !view.before ? (
        <PictureView covered={covered} />
      ) : (
        <TopsCanvas
          selected={view.name}
          onSelect={view.choose}
          lit={view.lit}
          focus={view.focus}
          layers={view.layers}
          covered={covered}
          before={view.before}
          onDigit={view.onDigit}
        />
      )}
      {wide && (
        <View style={styles.wood}>
          <WoodBar />
          <VisibleSeam />
        </View>
      )}
    </>
  );
}

function Layers({ view }: { readonly view: TopsView }) {
  return (
    <MoreMenu
      label="Layers"
      icon="lay"
      items={(Object.keys(LAYER_NAMES) as (keyof TopsLayers)[]).map((layer) => ({
        key: layer,
        icon: view.layers[layer] ? 'check' : 'minus',
        label: `${view.layers[layer] ? 'Hide' : 'Show'} ${LAYER_NAMES[layer].toLowerCase()}`,
        onPress: () => view.toggle(layer),
      }))}
    />
  );
}

function ToSlabs({ wide }: { readonly wide: boolean }) {
  const router = useRouter();
  const { job, plan } = useOpenJob();
  const laid = plan.pieces.length > 0;
  return (
    <Button
      label="To the slabs"
      look={laid ? 'primary' : 'secondary'}
      iconAfter="next"
      wide={wide}
      height={wide ? 56 : 48}
      disabled={!laid}
      onPress={() => router.navigate(`/jobs/${job.id}/slabs` as never)}
    />
  );
}

interface TopsSheetProps {
  readonly view: TopsView;
  readonly onCovers: (px: number) => void;
  readonly foot: ReactNode;
}

function TopsSheet({ view, onCovers, foot }: TopsSheetProps) {
  const [position, setPosition] = useState<SheetPosition>('half');
  if (view.typing)
    return (
      <Sheet
        key="pad"
        label="Type a length"
        position="half"
        half={PAD_HEIGHT}
        onPosition={(next) => next === 'peek' && view.type(null)}
        onClose={() => view.type(null)}
        onCovers={onCovers}
      >
        <TopsSidePanel view={view} />
      </Sheet>
    );
  const apart = view.choice !== null || view.side !== 'lists';
  return (
    <Sheet
      key={apart ? 'apart' : 'lists'}
      label={view.choice ? 'Selected' : 'Findings, pieces and tops'}
      position={position}
      onPosition={setPosition}
      onClose={apart ? () => view.show('lists') : undefined}
      onCovers={onCovers}
      foot={apart ? undefined : <View style={styles.foot}>{foot}</View>}
    >
      {!apart && (
        <View style={styles.sheetTools}>
          <TopsTools view={view} />
        </View>
      )}
      <TopsSidePanel view={view} />
      {!apart && (
        <View style={styles.sheetTools}>
          <WoodBar />
          <VisibleSeam />
        </View>
      )}
    </Sheet>
  );
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0 },
  foot: { paddingVertical: 0 },
  tools: { position: 'absolute', top: 16, left: 20, right: 20, zIndex: 2, pointerEvents: 'box-none' },
  wood: {
    position: 'absolute',
    left: 184,
    right: 20,
    bottom: 20,
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'flex-end',
    gap: space.s,
    pointerEvents: 'box-none',
  },
  sheetTools: { gap: space.s, paddingVertical: space.s },
});
