import { CAUTIONS } from './cautions';
import { finishSetting, FINISHES } from './finish';
import { finishQuarts } from './quantities';
import { BETWEEN_GRIT } from './sanding';
import { chooseScrew } from './screws';
import { assembledSections } from './sections';
import { cutOpenings } from './shop-steps';
import { EFFORT, GLUE_OPEN_MINUTES } from './work-effort';
import type { Draft, Job, Stage } from './work-job';

export function setOnSite(job: Job): readonly Stage[] {
  const { layout, tops, letters } = job;
  const clear: Draft = {
    step: 'Clear and level the cabinets',
    part: 'site',
    hours: (EFFORT.clearPerBase.value + EFFORT.levelPerBase.value) * layout.bases.length,
    pieces: [],
    tools: ['long level', 'straight-edge', 'drill'],
    consumables: ['shims'],
    caution: `Drawers out, old fixings pulled. ${CAUTIONS.trades.text}`,
  };
  const set: Draft = {
    step: 'Carry in and set',
    part: 'site',
    hours: EFFORT.setPerSection.value * assembledSections(tops).length,
    pieces: letters,
    tools: ['carrying handles', 'blankets'],
    caution: CAUTIONS.lifting.text,
  };
  return [[clear], [set], scribe(job), [fasten(job)]];
}

function scribe({ tops }: Job): Stage {
  if (tops.runs.length === 0) return [];
  return [
    {
      step: 'Scribe to the walls',
      part: 'site',
      hours: EFFORT.scribePerRun.value * tops.runs.length,
      pieces: tops.pieces.filter((p) => p.kind === 'run').map((p) => p.letter),
      tools: ['scribe', 'plane or belt sander'],
      caution: 'Leave the back gap: the top needs it in damp weather. Seal every edge you cut.',
    },
  ];
}

function fasten({ layout, settings, tops, siteJoints, size }: Job): Draft {
  const screw = chooseScrew(layout.fixing, layout.material.thickness, settings);
  const loose = siteJoints.length + tops.seams.length > 0 ? ' Leave the screws beside a site joint or seam loose.' : '';
  return {
    step: 'Fasten from below',
    part: 'site',
    hours: EFFORT.fastenPerRun.value * Math.max(1, tops.runs.length),
    pieces: tops.pieces.filter((p) => p.kind === 'run' || p.kind === 'island').map((p) => p.letter),
    tools: ['drill', 'stop collar'],
    consumables: [screw ? `wood screws ${size(screw.length)}, washers` : 'wood screws, washers'],
    caution: screw
      ? `Set the stop: ${size(screw.left)} of wood is left above the point. Front line fixed, slots behind, no adhesive over the whole base.${loose}`
      : 'No stock screw both bites and stays clear of the face: settle the length first.',
  };
}

/** Site joints and seams are drawn together, cure, and only then are the openings on them cut. */
export function closeOnSite({ settings, tops, siteJoints, cutLater }: Job): readonly Stage[] {
  const { cureHours } = settings.times;
  const places = [
    ...siteJoints.map(({ letters }) => ({ letters, tools: ['drawbolts', 'wrench'], how: 'Drawbolts from below.' })),
    ...tops.seams.map(({ letters, inCutout }) =>
      inCutout
        ? { letters, tools: ['cleats', 'clamps'], how: 'Cleats only in the waste of the opening.' }
        : { letters, tools: ['drawbolts or clamps'], how: 'Drawbolts or clamps.' },
    ),
  ];
  const closes = places.map(({ letters, tools, how }): Draft => ({
    step: `Close ${letters[0]} to ${letters[1]} on site`,
    part: 'site',
    hours: EFFORT.siteJoint.value,
    waitHours: cureHours,
    pieces: letters,
    tools: [...tools, 'straight-edge', 'clock'],
    consumables: ['wood glue'],
    clock: { openMinutes: GLUE_OPEN_MINUTES.value, cureHours },
    caution: `${how} Flush the faces first, then draw tight. ${cureHours} h before any load or cut.`,
  }));
  return [closes, cutLater.length > 0 ? [cutOpenings(cutLater, 'site')] : []];
}

export function finishOnSite({ layout, settings, letters, sqFt }: Job): readonly Stage[] {
  const setting = finishSetting(layout.finish, settings);
  const finish = FINISHES[layout.finish.kind];
  const faces = sqFt / 2;
  const later = setting ? Array.from({ length: Math.max(0, setting.coats - 1) }, (_, i) => i + 2) : [];
  const coats = later.map((coat): Stage => {
    const { recoatHours, sqFtPerQuart } = setting!;
    const quarts = finishQuarts(faces * 144, 1, sqFtPerQuart);
    return [
      {
        step: `Finish coat ${coat}`,
        part: 'site',
        hours: EFFORT.coatPerSqFt.value * faces,
        waitHours: recoatHours,
        pieces: letters,
        tools: ['brush', 'rags'],
        consumables: [
          `${finish.name.toLowerCase()}, about ${quarts.toFixed(1)} qt`,
          ...(layout.finish.kind === 'oil' ? [`grit ${BETWEEN_GRIT.value}`] : []),
        ],
        ...(finish.oilyRags && { caution: CAUTIONS.rags.text }),
      },
    ];
  });
  const handOver: Draft = {
    step: 'Clean up and hand over',
    part: 'site',
    hours: EFFORT.handOver.value,
    waitHours: setting?.cureHours ?? 0,
    pieces: letters,
    tools: ['vacuum'],
    consumables: ['care sheet'],
    ...(setting && {
      caution: `Light use only for the first ${Math.ceil(setting.cureHours / 24)} days, until it has cured.`,
    }),
  };
  return [...coats, [handOver]];
}
