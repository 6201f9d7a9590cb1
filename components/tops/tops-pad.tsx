import { createContext, useContext } from 'react';

import { FractionPad } from '../measure/FractionPad';
import { useOpenJob } from '../editor/JobProvider';
import { inches as say } from '@/geometry/top/sentence';

/** A length to be typed. */
export interface PadRequest {
  /** "Depth", "Sink, from the front edge". */
  readonly title: string;
  /** Inches it has now. */
  readonly now: number | null;
  /** Says why a length cannot be, or null. */
  readonly check?: (inches: number) => string | null;
  readonly onLength: (inches: number) => void;
  /** The key that opened the pad. */
  readonly firstKey?: string;
}

const PadContext = createContext<(request: PadRequest) => void>(() => undefined);

export const TopsPadProvider = PadContext.Provider;

/** Opens the pad for a length. */
export const useTopsPad = (): ((request: PadRequest) => void) => useContext(PadContext);

/** The pad for one length of the tops; it closes when the length is stored. */
export function TopsPad({ request, onClose }: { readonly request: PadRequest; readonly onClose: () => void }) {
  const { layout } = useOpenJob();
  return (
    <FractionPad
      key={request.title}
      title={request.title}
      hint={request.now === null ? undefined : `now ${say(request.now, layout.step)}`}
      next={{ label: 'Done', icon: 'check' }}
      firstKey={request.firstKey}
      check={request.check}
      onNext={({ value }) => {
        onClose();
        if (value !== request.now) request.onLength(value);
      }}
      onCancel={onClose}
    />
  );
}
