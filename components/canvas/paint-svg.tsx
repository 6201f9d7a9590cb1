import { memo, useId, useMemo } from 'react';
import { ClipPath, Defs, G, Path, Text as SvgText } from 'react-native-svg';

import type { DrawItem, Ink, Scene } from '@/geometry/scene/display-list';
import type {
  ClipPrimitive,
  Paint,
  PathPrimitive,
  Primitive,
  TextPrimitive,
  View,
} from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';
import { fontOf, type FontName } from '@/geometry/scene/text-width';
import { color, font, fontStack, palettes } from '@/components/ui/tokens';

import { pathData } from './path-data';

/** px; on screen no figure of a fraction is smaller. On paper it is 14. */
const SMALLEST = { screen: 11, paper: 14 } as const;
const PX_PER_INCH_OF_PAPER = 96;
/** px. */
const HOLLOW_LINE = 1.2;

const FAMILIES: Readonly<Record<FontName, string>> = {
  labelSemibold: fontStack(font.label600),
  labelBold: fontStack(font.label700),
  labelExtrabold: fontStack(font.label800),
  bodyRegular: fontStack(font.body400),
  bodyBold: fontStack(font.body700),
};

export type InkColors = Readonly<Record<Ink, string>>;

export interface PaintSvgProps {
  readonly scene: Scene;
  /** Screen px for an inch of the drawing. */
  readonly pxPerInch: number;
  /** What each ink looks like; the theme's colours when left out, black on white for a page of paper. */
  readonly colors?: InkColors;
}

/**
 * Paints a drawing inside an `Svg`, and decides nothing. px (0, 0) is the drawing's origin, y of the drawing going up; of
 * a page of paper it is the top left corner, and the page's px scale with it. Strokes and text of other drawings keep
 * their px size, so `pxPerInch` is the zoom at rest; during a gesture the parent scales the group.
 *
 * An item is painted again only when it is another object or the zoom changes: see `useStableScene`.
 */
export const PaintSvg = memo(function PaintSvg({ scene, pxPerInch, colors }: PaintSvgProps) {
  const paper = scene.paper?.height;
  const inks = colors ?? (paper === undefined ? color : palettes.print);
  const view = useMemo(() => viewOf(pxPerInch, paper), [pxPerInch, paper]);
  return (
    <G>
      {keyed(scene.items).map(([key, item]) => (
        <DrawnItem key={key} item={item} view={view} colors={inks} />
      ))}
    </G>
  );
});

function viewOf(pxPerInch: number, paperHeight: number | undefined): View {
  const onPaper = paperHeight !== undefined;
  return {
    pxPerInch,
    pixel: onPaper ? pxPerInch / PX_PER_INCH_OF_PAPER : 1,
    origin: [0, paperHeight ?? 0],
    smallest: onPaper ? SMALLEST.paper : SMALLEST.screen,
    wood: onPaper ? 'lines' : 'colour',
  };
}

/** Items of one thing keep their keys when items of another thing come or go. */
function keyed(items: readonly DrawItem[]): (readonly [string, DrawItem])[] {
  const counts = new Map<string, number>();
  return items.map((item) => {
    const name = `${item.layer}/${item.id ?? ''}/${item.kind}`;
    const count = counts.get(name) ?? 0;
    counts.set(name, count + 1);
    return [`${name}/${count}`, item];
  });
}

interface DrawnItemProps {
  readonly item: DrawItem;
  readonly view: View;
  readonly colors: InkColors;
}

const DrawnItem = memo(function DrawnItem({ item, view, colors }: DrawnItemProps) {
  const primitives = toPrimitives(item, view);
  const drawn = primitives.map((primitive, i) => <Painted key={i} primitive={primitive} colors={colors} />);
  return item.id === undefined ? <>{drawn}</> : <G testID={`${item.layer}/${item.id}`}>{drawn}</G>;
});

function Painted({ primitive, colors }: { readonly primitive: Primitive; readonly colors: InkColors }) {
  switch (primitive.kind) {
    case 'path':
      return <PaintedPath primitive={primitive} colors={colors} />;
    case 'text':
      return <PaintedText primitive={primitive} colors={colors} />;
    case 'clip':
      return <Clipped primitive={primitive} colors={colors} />;
    case 'span':
      return (
        <>
          {primitive.children.map((child, i) => (
            <Painted key={i} primitive={child} colors={colors} />
          ))}
        </>
      );
  }
}

const toColor = (paint: Paint, colors: InkColors): string => (typeof paint === 'string' ? colors[paint] : paint.hex);

function PaintedPath({ primitive, colors }: { readonly primitive: PathPrimitive; readonly colors: InkColors }) {
  const { path, fill, line, evenOdd } = primitive;
  if (path.length === 0) return null;
  return (
    <Path
      d={pathData(path)}
      fill={fill ? toColor(fill, colors) : 'none'}
      {...(evenOdd ? { fillRule: 'evenodd' } : {})}
      {...(line
        ? {
            stroke: toColor(line.paint, colors),
            strokeWidth: round(line.width),
            ...(line.dash ? { strokeDasharray: line.dash.map(round).join(' ') } : {}),
            ...(line.round ? { strokeLinecap: 'round', strokeLinejoin: 'round' } : {}),
          }
        : {})}
    />
  );
}

function PaintedText({ primitive, colors }: { readonly primitive: TextPrimitive; readonly colors: InkColors }) {
  const { x, y, text, size, anchor, turn, hollow } = primitive;
  const ink = toColor(primitive.paint, colors);
  const [left, base] = [round(x), round(y)];
  return (
    <SvgText
      x={left}
      y={base}
      fontFamily={FAMILIES[fontOf(primitive)]}
      fontSize={round(size)}
      fill={hollow ? 'none' : ink}
      {...(hollow ? { stroke: ink, strokeWidth: HOLLOW_LINE, strokeDasharray: '2 4' } : {})}
      {...(anchor === 'start' ? {} : { textAnchor: anchor })}
      {...(turn ? { transform: `rotate(${round((-turn * 180) / Math.PI)} ${left} ${base})` } : {})}
      {...(primitive.face === 'body' ? { style: TABULAR } : {})}
    >
      {text}
    </SvgText>
  );
}

/** Figures of the reading face stand in columns; the label face has none that are read one under the other. */
const TABULAR = { fontVariant: ['tabular-nums'] } as never;

function Clipped({ primitive, colors }: { readonly primitive: ClipPrimitive; readonly colors: InkColors }) {
  const id = `clip-${useId().replace(/\W/g, '')}`;
  return (
    <>
      <Defs>
        <ClipPath id={id}>
          <Path d={pathData(primitive.path)} {...(primitive.evenOdd ? { clipRule: 'evenodd' } : {})} />
        </ClipPath>
      </Defs>
      <G clipPath={`url(#${id})`}>
        {primitive.children.map((child, i) => (
          <Painted key={i} primitive={child} colors={colors} />
        ))}
      </G>
    </>
  );
}

const round = (value: number): number => Math.round(value * 100) / 100;
