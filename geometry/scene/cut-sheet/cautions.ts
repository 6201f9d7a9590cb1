import type { Layout } from '../../core/layout';
import type { TextRun } from '../display-list';
import { styles } from '../paper/page-builder';
import type { SheetHead } from '../paper/sheet-head';
import type { PlacedSlab } from '../slab/placed-slab';
import { listed } from './cut-steps';

/** What has to be known before the saw starts, a paragraph each, the dearest mistakes first. */
export function cutCautions(slab: PlacedSlab, layout: Layout, head: SheetHead): TextRun[][] {
  const step = layout.step;
  const down = [...new Set(slab.pieces.filter((piece) => piece.faceDown).map((piece) => piece.letter))];
  const faces: TextRun[] =
    down.length > 0
      ? [
          { text: `${listed(down)} ${down.length > 1 ? 'lie' : 'lies'} ` },
          { text: 'face down', style: styles.strong },
          { text: ': show face underneath. Never turn the slab.' },
        ]
      : [{ text: 'Good faces up. Never turn the slab.' }];
  return [
    faces,
    [
      { text: 'Kerf ' },
      { inches: layout.stock.kerf, step: kerfStep(layout), unit: true, style: styles.number },
      { text: ', already in the marks.' },
    ],
    [
      { text: 'Slab not ' },
      { inches: slab.depth, step, style: styles.number },
      { text: ` all along? Stop, tell ${head.signedBy ?? (head.drawnBy || 'the designer')}.` },
    ],
    ...(slab.defects.length > 0 ? [[{ text: 'Keep every piece clear of the crossed defect.' }]] : []),
    [{ text: 'Guard on. Cover eyes, ears, mouth: saw dust.' }],
  ];
}

/** A kerf is finer than a tape mark: 1/8 and 3/32 have to show as they are. */
function kerfStep({ step }: Layout): '1/64' | '0.5 mm' {
  return step === '1 mm' || step === '0.5 mm' ? '0.5 mm' : '1/64';
}
