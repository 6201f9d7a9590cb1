/** How well a number is known. Shown beside it wherever a screen says where a figure is from. */
export type Standing =
  | 'published' // read in the document itself, or in a transcription of it
  | 'second hand' // read in a source that quotes the document
  | 'computed' // worked out from published figures by a published formula
  | 'from memory' // not verified
  | 'common practice' // trade custom, no document
  | 'our choice'; // no published figure was found and one had to be chosen

export interface Sourced {
  readonly value: number;
  readonly standing: Standing;
  readonly source: string;
}

/** One constant by name, for the list of where every figure is from. */
export interface SourcedConstant extends Sourced {
  readonly name: string;
  readonly unit: string;
}

export const sourced = (value: number, standing: Standing, source: string): Sourced => ({ value, standing, source });

/** A named constant with its unit, standing and source. */
export const constant = (
  name: string,
  value: number,
  unit: string,
  standing: Standing,
  source: string,
): SourcedConstant => ({ name, value, unit, standing, source });

/**
 * Source as a finding or a screen prints it: a document by its name, everything weaker by its standing first.
 *
 * @returns "NIOSH 94-110, p. 7", "common practice", "common practice: first connector 3 in from the end" or "from memory: …"
 */
export function sourceText({ standing, source }: Sourced): string {
  if (standing === 'published' || standing === 'second hand' || standing === 'computed') return source;
  return source === '' ? standing : `${standing}: ${source}`;
}
