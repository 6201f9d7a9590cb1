import { ScrollView, StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { LoadingState } from '../ui/StateCard';
import { Tabs } from '../ui/Tabs';
import { space } from '../ui/tokens';
import { FinishPart } from './FinishPart';
import { FromPart } from './FromPart';
import { HardwarePart } from './HardwarePart';
import { StepsPart } from './StepsPart';
import { useTicks } from './use-ticks';
import { WoodPart } from './WoodPart';
import { useWorkPart, WORK_PARTS } from './work-part';

/** Job > Work: the order of work, and what wood, hardware and finish ask for. */
export function WorkScreen() {
  const { job } = useOpenJob();
  const ticks = useTicks(job.id);
  const { part, show } = useWorkPart();
  return (
    <JobFrame subtitle={WORK_PARTS.find((one) => one.value === part)!.subtitle}>
      <View style={styles.page}>
        <ScrollView horizontal style={styles.tabs} contentContainerStyle={styles.stretch}>
          <Tabs label="Parts of the work" tabs={WORK_PARTS} value={part} onChange={show} />
        </ScrollView>
        {part === 'steps' && (ticks ? <StepsPart ticks={ticks} /> : <LoadingState title="Fetching what is ticked" />)}
        {part === 'wood' && <WoodPart />}
        {part === 'hardware' && <HardwarePart />}
        {part === 'finish' && <FinishPart />}
        {part === 'from' && <FromPart />}
      </View>
    </JobFrame>
  );
}

const styles = StyleSheet.create({
  page: { gap: space.l },
  tabs: { flexGrow: 0, marginHorizontal: -space.m },
  stretch: { flexGrow: 1 },
});
