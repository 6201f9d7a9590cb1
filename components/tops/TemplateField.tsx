import { useRef, useState, type ChangeEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Point, Polygon } from '@/geometry/core/point';
import { boundingBox } from '@/geometry/core/polygon';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { outlineToText, parseOutline } from './outline-text';

export interface TemplateFieldProps {
  readonly label: string;
  readonly hint: string;
  readonly outline: Polygon | undefined;
  /** Null takes the outline away. */
  readonly onOutline: (outline: Polygon | null, what: string) => void;
  /** Offers a maker's file, and to do without an outline. */
  readonly template?: boolean;
}

/** An outline typed a corner a line, or read from a maker's DXF file. */
export function TemplateField({ label, hint, outline, onOutline, template }: TemplateFieldProps) {
  const { layout } = useOpenJob();
  const written = outline ? outlineToText(outline, layout.step) : '';
  const [draft, setDraft] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  const input = useRef<HTMLInputElement>(null);
  const take = (text: string) => {
    if (text.trim() === '' && !outline) return setError(undefined);
    const typed = parseOutline(text, layout.step);
    if (!typed.ok) return setError(typed.message);
    setError(undefined);
    setDraft(null);
    onOutline(typed.outline, `outline with ${typed.outline.length} corners`);
  };
  const read = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = '';
    if (!file) return;
    // Few jobs bring a template: what reads one is fetched when one does.
    const { outlineFromDxf } = await import('./dxf-outline');
    const result = outlineFromDxf(await file.text());
    if (!result.ok) return setError(`${file.name}: ${result.message}`);
    setError(undefined);
    setDraft(null);
    onOutline(result.outline, `template ${file.name}`);
  };
  const box = outline && boundingBox(outline);
  const turned = outline?.map(([x, y]): Point => [-y, x]);
  return (
    <View style={styles.field}>
      <Field
        label={label}
        value={draft ?? written}
        onChange={setDraft}
        onBlur={() => draft !== null && take(draft)}
        rowCount={4}
        autoComplete="off"
        error={error}
        hint={hint}
      />
      {template && (
        <>
          {box && (
            <Text kind="small">{`${outline.length} corners. The typed size is not used while there is a template.`}</Text>
          )}
          <View style={styles.buttons}>
            <Button label="From a DXF file" icon="download" onPress={() => input.current?.click()} />
            {turned && <Button label="Turn a quarter" onPress={() => onOutline(centred(turned), 'template turned')} />}
            {outline && (
              <Button label="Do without" look="danger" onPress={() => onOutline(null, 'without a template')} />
            )}
          </View>
          <input
            ref={input}
            type="file"
            accept=".dxf"
            aria-label="DXF file of the maker’s template"
            tabIndex={-1}
            style={{ display: 'none' }}
            onChange={(event) => void read(event)}
          />
        </>
      )}
    </View>
  );
}

/** Centred on x = 0, with its front side at y = 0: how a cutout wants its template. */
function centred(outline: Polygon): Polygon {
  const box = boundingBox(outline);
  const middle = (box.minX + box.maxX) / 2;
  return outline.map(([x, y]): Point => [x - middle, y - box.minY]);
}

const styles = StyleSheet.create({
  field: { gap: space.s },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
});
