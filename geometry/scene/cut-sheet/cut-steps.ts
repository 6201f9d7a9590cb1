import type { NestCrosscut, NestRip } from '../../nest/types';
import type { DisplayStep } from '../../tape/format-length';
import type { TextRun } from '../display-list';
import { styles } from '../paper/page-builder';
import { isSquare, isTrim, keptSides, lineOf, madeEnd, offSquareDeg, pieceAt, piecesAtRip } from '../slab/cut-marks';
import type { PlacedPiece, PlacedSlab } from '../slab/placed-slab';

/** One row of the table: what to do, and how to set the saw, each `set` on a line of its own. */
export interface CutStep {
  /** Null for a row that is no cut. */
  readonly n: number | null;
  readonly doThis: readonly TextRun[];
  readonly set: readonly (readonly TextRun[])[];
}

/**
 * The rows of a slab's table: every cut in sawing order, then the letters, then each offcut to keep.
 *
 * @param offcutLabels - name for the rack of each offcut to keep, in the plan's order
 * @param bothSides - shared angled cuts name the marks of both sides of the kerf, where the drawing has no room for them
 */
export function cutSteps(
  slab: PlacedSlab,
  step: DisplayStep,
  offcutLabels: readonly string[],
  bothSides: boolean,
): CutStep[] {
  const words = new CutWords(slab, step, bothSides);
  return [
    ...slab.cuts.map((cut) => (cut.kind === 'rip' ? words.rip(cut) : words.crosscut(cut))),
    words.letters(),
    ...words.offcuts(offcutLabels),
  ];
}

class CutWords {
  constructor(
    private readonly slab: PlacedSlab,
    private readonly step: DisplayStep,
    private readonly bothSides: boolean,
  ) {}

  private length(inches: number, unit = false): TextRun {
    return { inches, step: this.step, unit, style: styles.number };
  }

  crosscut(cut: NestCrosscut): CutStep {
    return {
      n: cut.n,
      doThis: isSquare(cut) ? this.square(cut) : this.angled(cut),
      set: isSquare(cut) ? [[{ text: '90°' }]] : this.angleSet(cut),
    };
  }

  private square(cut: NestCrosscut): TextRun[] {
    const { left, right } = this.ends(cut);
    const at = this.length(lineOf(cut, keptSides(this.slab, cut)[0]).top);
    if (left && right) {
      const far = this.length(lineOf(cut, 'right').top);
      const other = left.letter === right.letter ? `the next ${right.letter}` : right.letter;
      return [
        { text: `Crosscut between ${left.letter} and ${other}, ` },
        at,
        { text: ' and ' },
        far,
        { text: '. One pass makes both ends.' },
      ];
    }
    if (isTrim(this.slab, cut)) {
      return [{ text: 'Trim the left end square. Takes ' }, this.length(lineOf(cut, 'right').top, true), { text: '.' }];
    }
    const piece = left ?? right;
    if (!piece) return [{ text: 'Crosscut at ' }, at, { text: this.roughWords(cut) }];
    return [{ text: `Crosscut ${piece.letter} at ` }, at, { text: `. ${this.kerfWords(cut)}` }];
  }

  private angled(cut: NestCrosscut): TextRun[] {
    const { left, right } = this.ends(cut);
    const [side] = left && right && cut.kerfSide === 'left' ? (['right'] as const) : keptSides(this.slab, cut);
    const line = lineOf(cut, side);
    const word = isMiter(left, 'right') || isMiter(right, 'left') ? 'Miter' : 'Angled cut';
    const name = left && right ? word : `${word} ${(left ?? right)?.letter ?? ''}`.trimEnd();
    return [
      { text: `${name}, top ` },
      this.length(line.top),
      { text: ' to bottom ' },
      this.length(line.bottom),
      { text: this.angledTail(cut, left, right) },
      ...(left && right && this.bothSides ? this.otherSide(cut, side) : []),
    ];
  }

  private angledTail(cut: NestCrosscut, left: PlacedPiece | null, right: PlacedPiece | null): string {
    if (left && right) {
      const away = cut.kerfSide === 'right' ? right : left;
      return `. Kerf falls on the ${away.letter} side. One pass makes both ends.`;
    }
    return left || right ? `. ${this.kerfWords(cut)}` : this.roughWords(cut);
  }

  private ends(cut: NestCrosscut): { readonly left: PlacedPiece | null; readonly right: PlacedPiece | null } {
    return { left: madeEnd(this.slab, cut, 'left'), right: madeEnd(this.slab, cut, 'right') };
  }

  /** A cut that is no piece's end: it only parts the slab, beside a piece or between sections. */
  private roughWords(cut: NestCrosscut): string {
    const beside = pieceAt(this.slab, cut.left) ?? pieceAt(this.slab, cut.right);
    return `${beside ? `, clear of ${beside.letter}` : ' to free a section'}. ${this.kerfWords(cut)}`;
  }

  private otherSide(cut: NestCrosscut, side: 'left' | 'right'): TextRun[] {
    const line = lineOf(cut, side === 'left' ? 'right' : 'left');
    return [
      { text: ' The other side of the kerf: top ' },
      this.length(line.top),
      { text: ', bottom ' },
      this.length(line.bottom),
      { text: '.' },
    ];
  }

  private kerfWords(cut: NestCrosscut): string {
    return `Kerf to the ${keptSides(this.slab, cut)[0] === 'left' ? 'right' : 'left'}.`;
  }

  /** The angle, and the same as two marks for those who set the saw by a square. */
  private angleSet(cut: NestCrosscut): TextRun[][] {
    return [
      [{ text: `${offSquareDeg(cut).toFixed(2)}°`, style: styles.strong }, { text: ' off square' }],
      [
        this.length(cut.yBack - cut.yFront),
        { text: ' across, ' },
        this.length(Math.abs(cut.back - cut.front)),
        { text: ' along' },
      ],
    ];
  }

  rip(cut: NestRip): CutStep {
    const { below, above } = piecesAtRip(this.slab, cut);
    const names = [...new Set([...below, ...above].map((piece) => piece.letter))];
    const keepFront = below.length > 0 || (above.length === 0 && cut.kerfSide === 'right');
    const width = (below[0] ?? above[0])?.piece.depth;
    return {
      n: cut.n,
      doThis: [
        { text: `Rip ${listed(names) || 'the section'}, ` },
        this.length(keepFront ? cut.across : cut.acrossFar),
        { text: ' up from the bottom edge, between ' },
        this.length(cut.from),
        { text: ' and ' },
        this.length(cut.to),
        { text: `. Kerf ${keepFront ? 'above' : 'below'}.` },
      ],
      set: width === undefined ? [] : [[{ text: 'Fence ' }, this.length(width)]],
    };
  }

  letters(): CutStep {
    const names = (down: boolean) => [
      ...new Set(this.slab.pieces.filter((piece) => piece.faceDown === down).map((piece) => piece.letter)),
    ];
    const [up, down] = [names(false), names(true)];
    const sentences = [
      ...(up.length > 0 ? [`Letter ${listed(up)} on top.`] : []),
      ...(down.length > 0 ? [`Turn ${listed(down)} over, letter the other face.`] : []),
      ...(this.slab.pieces.some((piece) => piece.wallEdge) ? ['Arrow to the wall edge.'] : []),
    ];
    return { n: null, doThis: [{ text: sentences.join(' ') }], set: [] };
  }

  offcuts(labels: readonly string[]): CutStep[] {
    return this.slab.offcuts
      .filter((offcut) => offcut.keep)
      .map((offcut, i) => ({
        n: null,
        doThis: [
          { text: 'Keep the offcut, ' },
          this.length(offcut.length),
          { text: ' × ' },
          this.length(offcut.depth),
          { text: `. To the rack as ${labels[i] ?? ''}.` },
        ],
        set: [],
      }));
  }
}

/** Whether the piece's end that this cut makes is a joint with another run. */
function isMiter(piece: PlacedPiece | null, end: 'left' | 'right'): boolean {
  if (!piece) return false;
  const own = piece.turned ? (end === 'left' ? 'right' : 'left') : end;
  return piece.piece[own].kind === 'joint';
}

/** "P", "P and Q", "P, Q and R". */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}
