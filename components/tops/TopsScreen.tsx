import { useRouter } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { TopsLayers } from '@/geometry/scene/tops/tops-scene';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { Button } from '../ui/Button';
import { Inspector } from '../ui/Inspector';
import { MoreMenu } from '../ui/Menu';
import { Sheet } from '../ui/Sheet';
import type { SheetPosition } from '../ui/sheet-drag';
import { StateCard } from '../ui/StateCard';
import { Tabs } from '../ui/Tabs';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { ChoicePanel } from './ChoicePanel';
import { FindingsList, placeOf } from './FindingsList';
import { PieceList } from './PieceList';
import { TopsCanvas } from './TopsCanvas';
import { choiceOf } from './tops-targets';
import { WoodBar } from './WoodBar';

const LAYERS: TopsLayers = { grain: true, sizes: false, hardware: false, walls: true };
const LAYER_NAMES: Readonly<Record<keyof TopsLayers, string>> = {
  grain: 'Grain',
  sizes: 'Sizes',
  hardware: 'Hardware',
  walls: 'Walls',
};

/** Job > Tops: the tops as they will lie in the room. */
export function TopsScreen() {
  const router = useRouter();
  const wide = useWide();
  const { job, layout, plan } = useOpenJob();
  const [name, setName] = useState<string | null>(null);
  const [layers, setLayers] = useState(LAYERS);
  const [covered, setCovered] = useState(0);
  const choice = choiceOf(plan, name);
  const laid = plan.pieces.length > 0;
  const next = (
    <Button
      label="To the slabs"
      look={laid ? 'primary' : 'secondary'}
      iconAfter="next"
      wide={!wide}
      height={wide ? 48 : 56}
      disabled={!laid}
      onPress={() => router.navigate(`/jobs/${job.id}/slabs` as never)}
    />
  );
  const side = choice ? <ChoicePanel choice={choice} onClose={() => setName(null)} /> : <Lists onSelect={setName} />;
  return (
    <JobFrame
      subtitle={`${layout.material.species}, ${plan.pieces.length} pieces`}
      fill
      primary={next}
      actions={
        <MoreMenu
          label="Layers"
          icon="lay"
          items={(Object.keys(LAYER_NAMES) as (keyof TopsLayers)[]).map((layer) => ({
            key: layer,
            label: `${layers[layer] ? 'Hide' : 'Show'} ${LAYER_NAMES[layer].toLowerCase()}`,
            onPress: () => setLayers((now) => ({ ...now, [layer]: !now[layer] })),
          }))}
        />
      }
      inspector={
        laid ? (
          <Inspector label={choice ? 'Selected' : 'Findings and pieces'}>
            <View style={styles.side}>{side}</View>
          </Inspector>
        ) : undefined
      }
    >
      <View style={styles.fill}>
        {laid ? (
          <>
            <TopsCanvas selected={name} onSelect={setName} layers={layers} covered={wide ? 0 : covered} />
            {wide && (
              <View style={styles.wood}>
                <WoodBar />
              </View>
            )}
          </>
        ) : (
          <NoTops />
        )}
      </View>
      {!wide && laid && (
        <TopsSheet
          key={choice ? 'choice' : 'lists'}
          chosen={choice !== null}
          onClose={() => setName(null)}
          onCovers={setCovered}
          foot={next}
        >
          {side}
          {!choice && <WoodBar />}
        </TopsSheet>
      )}
    </JobFrame>
  );
}

function TopsSheet(props: {
  readonly chosen: boolean;
  readonly onClose: () => void;
  readonly onCovers: (px: number) => void;
  readonly foot: React.ReactNode;
  readonly children: React.ReactNode;
}) {
  const [position, setPosition] = useState<SheetPosition>('half');
  return (
    <Sheet
      label={props.chosen ? 'Selected' : 'Findings and pieces'}
      position={position}
      onPosition={setPosition}
      onClose={props.chosen ? props.onClose : undefined}
      onCovers={props.onCovers}
      foot={<View style={styles.foot}>{props.foot}</View>}
    >
      <View style={styles.padded}>{props.children}</View>
    </Sheet>
  );
}

function Lists({ onSelect }: { readonly onSelect: (name: string | null) => void }) {
  const { plan } = useOpenJob();
  const [tab, setTab] = useState<'findings' | 'pieces'>('findings');
  return (
    <View style={styles.lists}>
      <Tabs
        label="Findings and pieces"
        tabs={[
          { value: 'findings', label: 'Findings', count: plan.findings.length },
          { value: 'pieces', label: 'Pieces', count: plan.pieces.length },
        ]}
        value={tab}
        onChange={setTab}
      />
      {tab === 'findings' ? (
        <FindingsList onZoom={(finding) => onSelect(placeOf(finding))} />
      ) : (
        <PieceList onSelect={(letter) => onSelect(`piece ${letter}`)} />
      )}
      <Text kind="small">
        Strength and movement figures are advice, not an engineer’s approval. Local codes and makers’ instructions come
        first.
      </Text>
    </View>
  );
}

function NoTops() {
  const router = useRouter();
  const { job, plan } = useOpenJob();
  return (
    <View style={styles.state}>
      <StateCard
        icon="tops"
        title="No tops yet"
        body={
          plan.room
            ? 'Lay the first tops from the room screen; every one can be changed afterwards.'
            : 'Tops need a measured room.'
        }
        actions={
          <Button label="To the room" look="primary" onPress={() => router.navigate(`/jobs/${job.id}/room` as never)} />
        }
      />
    </View>
  );
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0 },
  side: { padding: space.l },
  padded: { paddingHorizontal: space.l, paddingBottom: space.m, gap: space.m },
  foot: { padding: space.m },
  lists: { gap: space.m },
  wood: { position: 'absolute', left: 220, bottom: 20 },
  state: { padding: space.l },
});
