/** What a shop decides once: tape, seam limits, gaps, hardware. Lengths inches, angles degrees, times hours. */
export interface ShopSettings {
  readonly tapeSd: { readonly fixed: number; readonly perInch: number };
  readonly backGap: number;
  readonly wallClearance: number;
  readonly openOverhang: number;
  readonly openRadius: number;
  readonly seams: SeamLimits;
  readonly screws: ScrewSettings;
  readonly connectors: ConnectorSettings;
  readonly spread: SpreadRates;
  readonly times: WorkTimes;
  /** What differs from the shop's usual finish figures, by kind of finish. */
  readonly finishes: Readonly<Partial<Record<'oil' | 'hard wax' | 'film', FinishSetting>>>;
}

export interface SeamLimits {
  /** Clear of the cutout's corner radius when inside a cutout. */
  readonly insideCutout: number;
  readonly fromCutoutCorner: number;
  readonly fromJoint: number;
  readonly fromOpenEnd: number;
  readonly shortestPiece: number;
  /** An opening has to be supported within this distance of a seam. */
  readonly support: number;
  /** Narrowest strip beside a cutout. */
  readonly strip: number;
}

export interface ScrewSettings {
  readonly lengths: readonly number[];
  readonly shank: number;
  /** Wood left above the point, at least. */
  readonly leftAbove: number;
  readonly spacing: number;
  /** Screws of the fixed front line stand this far behind the top's front edge. */
  readonly frontLine: number;
  /** The rearmost, slotted screws stand this far before the top's back edge. */
  readonly backLine: number;
  /** A screw that bites less into the top does not hold it. */
  readonly leastBite: number;
  /** Clear of a piece's end, of a cutout and of a joint, at least. */
  readonly edgeDistance: number;
}

export interface ConnectorSettings {
  readonly kind: 'loose tenon' | 'dowel' | 'biscuit';
  readonly width: number;
  readonly depth: number;
  readonly spacing: number;
  readonly firstFromEnd: number;
  /** Wood left between a mortise and the piece's edge, at least. */
  readonly cover: number;
  /** Clear of screws and drawbolts, at least. */
  readonly fromHardware: number;
}

export interface SpreadRates {
  /** Square feet a gallon of glue joint covers, and of finish per coat. */
  readonly glueSqFtPerGallon: number;
  readonly finishSqFtPerQuart: number;
}

export interface WorkTimes {
  readonly acclimatiseHours: number;
  readonly clampHours: number;
  readonly cureHours: number;
  readonly recoatHours: number;
  readonly finishCureHours: number;
}

export interface FinishSetting {
  readonly coats: number;
  readonly sqFtPerQuart: number;
  readonly recoatHours: number;
  readonly cureHours: number;
}

/** Common practice, or from memory where no published figure was found; every one can be changed by the shop. */
export const DEFAULT_SETTINGS: ShopSettings = {
  tapeSd: { fixed: 1 / 32, perInch: 1 / 64 / 60 },
  backGap: 0.25,
  wallClearance: 0.25,
  openOverhang: 1,
  openRadius: 1,
  seams: {
    insideCutout: 1,
    fromCutoutCorner: 6,
    fromJoint: 6,
    fromOpenEnd: 12,
    shortestPiece: 12,
    support: 3,
    strip: 2,
  },
  screws: {
    lengths: [1, 1.25, 1.5, 1.625, 1.75, 2, 2.25, 2.5, 2.75, 3],
    shank: 0.19,
    leftAbove: 0.375,
    spacing: 16,
    frontLine: 2.5,
    backLine: 1.5,
    leastBite: 0.625,
    edgeDistance: 1.5,
  },
  connectors: {
    kind: 'loose tenon',
    width: 0.9375,
    depth: 1.1875,
    spacing: 6,
    firstFromEnd: 3,
    cover: 0.25,
    fromHardware: 1.5,
  },
  spread: { glueSqFtPerGallon: 200, finishSqFtPerQuart: 100 },
  times: { acclimatiseHours: 72, clampHours: 2, cureHours: 24, recoatHours: 12, finishCureHours: 168 },
  finishes: {
    oil: { coats: 3, sqFtPerQuart: 100, recoatHours: 24, cureHours: 720 },
    'hard wax': { coats: 2, sqFtPerQuart: 250, recoatHours: 12, cureHours: 240 },
    film: { coats: 3, sqFtPerQuart: 125, recoatHours: 4, cureHours: 168 },
  },
};
