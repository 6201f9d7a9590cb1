import { StyleSheet, View } from 'react-native';

import { color } from './tokens';

export interface ProgressProps {
  readonly label: string;
  /** 0 to 1; unknown when left out. */
  readonly done?: number;
}

/** How far a piece of work is: a box that fills like a drawn bar. It does not move by itself. */
export function Progress({ label, done }: ProgressProps) {
  const share = done === undefined ? 0 : Math.min(1, Math.max(0, done));
  return (
    <View
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={done === undefined ? undefined : Math.round(share * 100)}
      style={styles.box}
    >
      <View style={[styles.dashes, styles.whole]} />
      {share > 0 && <View style={[styles.fill, { width: `${share * 100}%` }]} />}
    </View>
  );
}

/** A plain bar of a share, for comparing plans on one scale; only for the eye. */
export function ShareBar({ share, tone = 'chalk' }: { readonly share: number; readonly tone?: 'chalk' | 'ink2' }) {
  return (
    <View style={styles.track} aria-hidden>
      <View style={{ height: 11, width: `${Math.min(1, Math.max(0, share)) * 100}%`, backgroundColor: color[tone] }} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: { height: 27, justifyContent: 'center' },
  dashes: { borderWidth: 1.5, borderStyle: 'dashed', borderColor: color.edge },
  whole: { ...StyleSheet.absoluteFill },
  fill: { height: '100%', borderWidth: 2, borderColor: color.chalk, backgroundColor: color.chalkT },
  track: { height: 11, backgroundColor: color.paper, alignSelf: 'stretch' },
});
