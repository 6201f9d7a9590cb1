import { View } from 'react-native';
import Svg, { G } from 'react-native-svg';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { makePlan } from '@/geometry/plan/make-plan';
import { thumbnailScene } from '@/geometry/scene/tops/thumbnail-scene';
import { turnPlan, viewTurn } from '@/geometry/scene/turn-plan';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { PaintSvg } from '../canvas/paint-svg';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';

/** What a file holds, or every place where it is wrong. */
export type FileReading =
  | {
      readonly ok: true;
      readonly json: unknown;
      readonly parsed: Extract<ReturnType<typeof parseJobFile>, { ok: true }>;
    }
  | { readonly ok: false; readonly problems: readonly string[] };

/** Reads a job file's text; nothing is stored. */
export function readJobFile(text: string): FileReading {
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    return { ok: false, problems: ['This is no JSON text. A job file comes from "Job file" under Sheets.'] };
  }
  const parsed = parseJobFile(json);
  if (parsed.ok) return { ok: true, json, parsed };
  return {
    ok: false,
    problems: parsed.errors.slice(0, 12).map(({ path, message }) => (path ? `${path}: ${message}` : message)),
  };
}

const WIDTH = 300;
const HEIGHT = 180;

/** The job of a file as it would be opened: drawn, and counted. */
export function JobFilePreview({ reading }: { readonly reading: Extract<FileReading, { ok: true }> }) {
  const { name, layout } = reading.parsed;
  const plan = makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });
  const scene = thumbnailScene(turnPlan(plan, viewTurn(layout.room)), layout);
  const { minX, minY, maxX, maxY } = scene.bounds;
  const scale = Math.min(WIDTH / Math.max(maxX - minX, 1), HEIGHT / Math.max(maxY - minY, 1));
  const count = (number: number, one: string) => `${number} ${one}${number === 1 ? '' : 's'}`;
  return (
    <View style={{ gap: space.m }}>
      <Text kind="rowTitle" level={3}>
        {name}
      </Text>
      <View aria-hidden>
        <Svg width={WIDTH} height={HEIGHT}>
          <G transform={`translate(${-minX * scale} ${maxY * scale})`}>
            <PaintSvg scene={scene} pxPerInch={scale} />
          </G>
        </Svg>
      </View>
      <Text>
        {[
          count(layout.room.walls.length, 'wall'),
          count(layout.runs.length, 'run'),
          count(layout.islands.length, 'island'),
          count(layout.cutouts.length, 'cutout'),
          count(plan.pieces.length, 'piece'),
        ].join(', ')}
      </Text>
      {plan.roomError && (
        <Text kind="strong" tone="red">
          {plan.roomError.message}
        </Text>
      )}
      {plan.tops.problems.map((problem) => (
        <Text key={problem.message} kind="second" tone="red">
          {problem.message}
        </Text>
      ))}
      <Text kind="second">
        {layout.stock.slabs.length > 0
          ? `With ${count(layout.stock.slabs.length, 'slab size')} of its own.`
          : "The file names no slabs: the shop's stock is taken."}{' '}
        What else it leaves out is filled with the shop’s usual.
      </Text>
    </View>
  );
}
