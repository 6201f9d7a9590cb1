import type { PlacedCutout, TopJoint } from '../top/types';
import { CAUTIONS } from './cautions';
import { connectorsAlong } from './connectors';
import { finishSetting, FINISHES } from './finish';
import { equilibriumMoisture } from './moisture';
import { finishQuarts, glueArea, glueOunces } from './quantities';
import { sandingGrits } from './sanding';
import type { Step } from './types';
import { CHECK_MOISTURE, CLAMPS_APART, EFFORT, GLUE_OPEN_MINUTES, STOP_SHORT } from './work-effort';
import type { Draft, Job, Stage } from './work-job';

export function prepareSlabs({ layout, settings, letters }: Job): readonly Stage[] {
  const shop = equilibriumMoisture(layout.climate.make);
  const receive: Draft = {
    step: 'Receive and check the slabs',
    part: 'shop',
    hours: EFFORT.receivePerSlab.value * letters.length,
    pieces: letters,
    tools: ['tape', 'square', 'straight-edge', 'moisture meter'],
    caution: `Square the factory corners before you trust them. Send back a slab that reads more than ${CHECK_MOISTURE.value} % off the shop's ${shop.toFixed(1)} %.`,
  };
  const settle: Draft = {
    step: 'Let the slabs settle in the shop',
    part: 'shop',
    hours: 0.25,
    waitHours: settings.times.acclimatiseHours,
    pieces: letters,
    tools: ['stickers', 'moisture meter'],
    caution: 'On stickers, air on both faces, nothing leaning.',
  };
  return [[receive], [settle]];
}

export function makePieces(job: Job): readonly Stage[] {
  const { letters, tops, cutNow } = job;
  const cut: Draft = {
    step: 'Cut the pieces',
    part: 'shop',
    hours: EFFORT.cutPerPiece.value * letters.length,
    pieces: letters,
    tools: ['track saw or table saw', 'square', 'protractor'],
    caution: `${CAUTIONS.saw.text} ${CAUTIONS.dust.text}`,
  };
  return [
    [cut],
    tops.joints.length + tops.seams.length > 0 ? [dryFit(job)] : [],
    job.shopJoints.map((joint) => glueUp(job, joint)),
    cutNow.length > 0 ? [cutOpenings(cutNow, 'shop')] : [],
  ];
}

function dryFit({ tops, settings }: Job): Draft {
  const connectors = tops.joints.reduce((sum, j) => sum + connectorsAlong(j, settings.connectors).length, 0);
  const fits = tops.joints.length + tops.seams.length;
  return {
    step: 'Mortise the joints and dry fit',
    part: 'shop',
    hours: EFFORT.mortisePerConnector.value * connectors + EFFORT.dryFitPerJoint.value * fits,
    pieces: [...new Set([...tops.joints, ...tops.seams].flatMap((j) => j.letters))],
    tools: ['mortiser', 'clamps', 'straight-edge'],
    consumables: connectors > 0 ? [`${settings.connectors.kind} x ${connectors}`] : [],
    caution: 'Close every joint dry on a flat bench before glue is opened.',
  };
}

function glueUp({ settings, layout }: Job, joint: TopJoint): Draft {
  const { clampHours, cureHours } = settings.times;
  const ounces = glueOunces(glueArea([joint], [], layout.material.thickness), settings.spread.glueSqFtPerGallon);
  const clamps = Math.ceil(joint.length / CLAMPS_APART.value) + 1;
  return {
    step: `Glue up ${joint.letters[0]} to ${joint.letters[1]}`,
    part: 'shop',
    hours: EFFORT.gluePerJoint.value,
    waitHours: clampHours,
    pieces: joint.letters,
    tools: [`${clamps} clamps`, 'clamping blocks', 'clock'],
    consumables: [`wood glue, about ${ounces.toFixed(1)} fl oz`],
    clock: { openMinutes: GLUE_OPEN_MINUTES.value, cureHours },
    caution: `${GLUE_OPEN_MINUTES.value} minutes from the first glue to the last clamp. ${clampHours} h in clamps, no load for ${cureHours} h.`,
  };
}

/** Openings cut in the shop, or after a seam through them has cured. */
export function cutOpenings(cutouts: readonly PlacedCutout[], part: Step['part']): Draft {
  return {
    step: part === 'shop' ? 'Cut the openings' : 'Cut the openings that a seam runs through',
    part,
    hours: EFFORT.cutoutEach.value * cutouts.length,
    pieces: [...new Set(cutouts.flatMap((c) => c.letters))],
    tools: ['jigsaw or router', 'template', 'drill'],
    caution: `Hold the waste up so that it does not tear out. ${CAUTIONS.cooktop.text}`,
  };
}

export function surface(job: Job): readonly Stage[] {
  const { letters } = job;
  const load: Draft = {
    step: 'Load',
    part: 'shop',
    hours: EFFORT.load.value,
    pieces: letters,
    tools: ['blankets', 'straps', 'carrying handles'],
    caution: CAUTIONS.lifting.text,
  };
  return [profileEdges(job), [sand(job)], sealAllFaces(job), [load]];
}

function profileEdges({ layout, tops, siteJoints, size }: Job): Stage {
  const edged = tops.pieces.filter((p) => p.finishedEdges.length > 0);
  if (edged.length === 0) return [];
  const feet = edged.reduce((sum, p) => sum + (p.finishedEdges.includes('front') ? p.front : 0), 0) / 12;
  const { profile, size: edge } = layout.edges;
  const site = siteJoints.length + tops.seams.length > 0;
  return [
    {
      step: 'Profile the edges',
      part: 'shop',
      hours: EFFORT.edgePerFoot.value * feet,
      pieces: edged.map((p) => p.letter),
      tools: profile === 'square' ? ['block plane'] : ['router', `${profile} bit ${size(edge)}`],
      ...(site && { caution: `Stop ${size(STOP_SHORT.value)} short of a site seam or site joint; finish it there.` }),
    },
  ];
}

function sand({ layout, letters, sqFt }: Job): Draft {
  const grits = sandingGrits(layout.finish);
  return {
    step: 'Sand',
    part: 'shop',
    hours: (EFFORT.sandPerSqFt.value * sqFt) / 2,
    pieces: letters,
    tools: ['random orbit sander', 'dust extractor'],
    consumables: grits.map((grit) => `grit ${grit}`),
    caution: `Once and last, along the grain: ${grits.join(', ')}. ${CAUTIONS.dust.text}`,
  };
}

function sealAllFaces({ layout, settings, letters, sqFt }: Job): Stage {
  const setting = finishSetting(layout.finish, settings);
  if (!setting) return [];
  const finish = FINISHES[layout.finish.kind];
  const quarts = finishQuarts(sqFt * 144, 1, setting.sqFtPerQuart);
  return [
    {
      step: 'Seal all faces',
      part: 'shop',
      hours: EFFORT.coatPerSqFt.value * sqFt,
      waitHours: setting.recoatHours,
      pieces: letters,
      tools: ['brush', 'rags'],
      consumables: [`${finish.name.toLowerCase()}, about ${quarts.toFixed(1)} qt`],
      caution: `Top, underside, ends and cutouts alike, or the top cups.${finish.oilyRags ? ` ${CAUTIONS.rags.text}` : ''}`,
    },
  ];
}
