import type { ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { CONTENT_ID, useBarAway } from './AppShell';
import { BottomBar } from './BottomBar';
import { IconButton } from './IconButton';
import { JobSteps } from './JobSteps';
import { Logo } from './Logo';
import type { NavItem } from './nav-item';
import { Text } from './Text';
import { color, gutter, space } from './tokens';
import { useWide } from './use-wide';

export interface PageFrameProps {
  readonly title: string;
  /** Second line: "Job 0142, measured by Renn". */
  readonly subtitle?: string;
  /** Steps of the job this page belongs to; they stand across the top (wide) or at the foot (phone). */
  readonly steps?: readonly NavItem[];
  /** Where the back arrow of a phone goes; no arrow when left out. */
  readonly back?: { readonly label: string; readonly href: string };
  /** Top right: undo, redo, the one primary act on wide screens. */
  readonly actions?: ReactNode;
  /** Under the header: offline, changed since revision 2, draft. */
  readonly notice?: ReactNode;
  /** Right column, wide screens only; on a phone the same content goes into a Sheet. */
  readonly inspector?: ReactNode;
  /** The content fills the page and does not scroll (a canvas). */
  readonly fill?: boolean;
  /** Takes the bar at the foot away: the pad is open. */
  readonly barHidden?: boolean;
  /** Stays at the foot of a phone over the content: the primary act. */
  readonly footer?: ReactNode;
  readonly onNavigate: (href: string) => void;
  readonly children: ReactNode;
}

/** One page: header, content, inspector, steps. */
export function PageFrame(props: PageFrameProps) {
  const wide = useWide();
  const { steps, barHidden = false, fill = false } = props;
  useBarAway(barHidden || steps !== undefined);
  return (
    <View style={styles.page}>
      {wide && steps ? <JobHeader {...props} steps={steps} /> : <PlainHeader {...props} wide={wide} />}
      {props.notice}
      <View style={[styles.middle, wide && styles.row]}>
        {fill ? (
          <View id={CONTENT_ID} role="main" tabIndex={-1} dataSet={{ ring: 'none' }} style={styles.fill}>
            {props.children}
          </View>
        ) : (
          <ScrollView style={styles.fill} contentContainerStyle={styles.grow}>
            <View
              id={CONTENT_ID}
              role="main"
              tabIndex={-1}
              dataSet={{ ring: 'none' }}
              style={[styles.scrolled, wide ? styles.wideGutter : styles.phoneGutter]}
            >
              {props.children}
            </View>
          </ScrollView>
        )}
        {wide && props.inspector}
      </View>
      {props.footer}
      {!wide && steps && !barHidden && (
        <BottomBar items={steps} label="Steps of this job" onNavigate={props.onNavigate} />
      )}
    </View>
  );
}

function JobHeader(props: PageFrameProps & { readonly steps: readonly NavItem[] }) {
  return (
    <View role="banner" style={styles.jobHeader}>
      <View style={styles.jobNames}>
        <Text kind="rowTitle" level={1} lines={1}>
          {props.title}
        </Text>
        {props.subtitle && (
          <Text kind="small" lines={1}>
            {props.subtitle}
          </Text>
        )}
      </View>
      <JobSteps items={props.steps} onNavigate={props.onNavigate} />
      <View style={styles.spring} />
      {props.actions && <View style={styles.actions}>{props.actions}</View>}
    </View>
  );
}

function PlainHeader(props: PageFrameProps & { readonly wide: boolean }) {
  const { back, wide, steps } = props;
  const tight = !wide && (steps !== undefined || back !== undefined);
  return (
    <View role="banner" style={[styles.header, wide ? styles.wideGutter : tight ? styles.tight : styles.phoneGutter]}>
      {back && !wide && (
        <IconButton icon="back" label={back.label} href={back.href} onPress={() => props.onNavigate(back.href)} />
      )}
      {!back && !wide && <Logo size={34} />}
      <View style={styles.names}>
        <Text kind={tight ? 'rowTitle' : 'screenTitle'} level={1}>
          {props.title}
        </Text>
        {props.subtitle && <Text kind={tight ? 'small' : 'second'}>{props.subtitle}</Text>}
      </View>
      {props.actions && <View style={[styles.actions, tight && styles.close]}>{props.actions}</View>}
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  middle: { flex: 1, minHeight: 0, minWidth: 0 },
  row: { flexDirection: 'row' },
  fill: { flex: 1, minWidth: 0, minHeight: 0 },
  grow: { flexGrow: 1 },
  scrolled: { flexGrow: 1, paddingTop: space.s, paddingBottom: space.xxl },
  phoneGutter: { paddingHorizontal: gutter.phone },
  wideGutter: { paddingHorizontal: gutter.wide },
  tight: { paddingHorizontal: 4, columnGap: space.xs },
  jobHeader: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: 64,
    gap: space.l,
    paddingLeft: 22,
    paddingRight: space.l,
    backgroundColor: color.card,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
    // Tooltips of the header lie over the canvas.
    zIndex: 5,
  },
  jobNames: { width: 248, flexShrink: 1 },
  spring: { flex: 1 },
  header: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: 10,
    rowGap: space.s,
    paddingVertical: 10,
    minHeight: 64,
    zIndex: 5,
  },
  names: { flexGrow: 1, flexShrink: 1, flexBasis: 120, minWidth: 0 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.s, flexShrink: 1 },
  close: { gap: 2 },
});
