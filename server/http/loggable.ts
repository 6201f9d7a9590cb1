/**
 * What of a failure may stand in a log: its kind, place and code. A database error also carries the values it met
 * (`Key (email)=(…) already exists`), and those stay out.
 */
export function loggable(failure: unknown): Readonly<Record<string, unknown>> {
  if (!(failure instanceof Error)) return { type: typeof failure };
  const { code, constraint, table } = failure as { code?: unknown; constraint?: unknown; table?: unknown };
  return {
    type: failure.name,
    message: failure.message,
    stack: failure.stack,
    ...(code === undefined ? {} : { code }),
    ...(constraint === undefined ? {} : { constraint }),
    ...(table === undefined ? {} : { table }),
  };
}
