import { useRouter } from 'expo-router';
import { View } from 'react-native';

import { equilibriumMoisture } from '@/geometry/wood/moisture';
import { useOpenJob } from '../editor/JobProvider';
import { LinkRow } from './LinkRow';

/** Ways from the job's settings to what is chosen on the page of the work. */
export function WoodLinks() {
  const router = useRouter();
  const { job, layout, plan } = useOpenJob();
  const to = (part: string) => () => router.navigate(`/jobs/${job.id}/work?part=${part}` as never);
  const { make, summer, winter } = layout.climate;
  const [made, wet, dry] = [make, summer, winter].map((air) => equilibriumMoisture(air).toFixed(1));
  return (
    <View>
      <LinkRow
        title="Climate and movement"
        value={`${made} % made, ${wet} and ${dry} % in the house`}
        onPress={to('wood')}
      />
      <LinkRow title="Screws, connectors and support" value={`${plan.joints.length} joints`} onPress={to('hardware')} />
      <LinkRow title="Finish and care" value={layout.finish.kind} onPress={to('finish')} />
    </View>
  );
}
