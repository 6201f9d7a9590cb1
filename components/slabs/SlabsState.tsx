import { useRouter } from 'expo-router';

import { useMay } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import type { NestSearch } from '../editor/use-nest';
import { Button } from '../ui/Button';
import { StateCard } from '../ui/StateCard';
import { money } from './slab-words';

/** What stands over the slabs: nothing to cut yet, the search at work, or why there is no plan. */
export function SlabsState() {
  const router = useRouter();
  const { job, layout, plan, nest } = useOpenJob();
  const seesPrices = useMay('price.see');
  const to = (step: string) => () => router.navigate(`/jobs/${job.id}/${step}` as never);
  if (plan.untaped.length > 0)
    return (
      <StateCard
        icon="room"
        title="The room is not taped yet"
        body="Slabs are planned once every wall has its reading."
        actions={<Button label="To the room" look="primary" onPress={to('room')} />}
      />
    );
  if (plan.instance.parts.length === 0)
    return (
      <StateCard
        icon="tops"
        title="No pieces yet"
        body="Lay the tops first; their pieces are then put on slabs."
        actions={<Button label="To the tops" look="primary" onPress={to('tops')} />}
      />
    );
  if (nest.error)
    return (
      <StateCard
        icon="warn"
        tone="red"
        title="These pieces cannot be cut"
        body={nest.error.message}
        announce="alert"
        actions={<Button label="To the tops" onPress={to('tops')} />}
      />
    );
  if (nest.searching)
    return (
      <StateCard
        icon="slabs"
        title="Trying plans"
        announce="status"
        body={searchWords(nest, seesPrices ? (nest.plan?.cost ?? null) : null)}
        actions={nest.plan ? <Button label="Stop and use best" onPress={nest.stop} /> : undefined}
      />
    );
  if (layout.stock.slabs.length === 0 && layout.stock.rack.length === 0)
    return (
      <StateCard
        icon="stock"
        title="No slabs in stock"
        body={`Nothing of ${layout.material.species} is listed that these pieces could be cut from.`}
      />
    );
  return null;
}

const searchWords = ({ tried, found }: NestSearch, best: number | null): string => {
  if (found === 0) return 'Looking for the first plan.';
  const counts = `${tried.toLocaleString('en-US')} layouts tried, ${found} better ${found === 1 ? 'plan' : 'plans'} found.`;
  return best === null ? counts : `${counts} Best so far ${money(best)}.`;
};
