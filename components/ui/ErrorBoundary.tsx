import { Component, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Button } from './Button';
import { ErrorState } from './StateCard';
import { color, space } from './tokens';

export interface ErrorBoundaryProps {
  readonly children: ReactNode;
  /** Tells whoever keeps the log. */
  readonly onError?: (error: Error) => void;
}

interface State {
  readonly error: Error | null;
}

/** When a screen breaks: says so, says that what was typed is kept, and offers to try again. */
export class ErrorBoundary extends Component<ErrorBoundaryProps, State> {
  override state: State = { error: null };

  static getDerivedStateFromError(error: Error): State {
    return { error };
  }

  override componentDidCatch(error: Error): void {
    this.props.onError?.(error);
  }

  override render(): ReactNode {
    if (this.state.error === null) return this.props.children;
    return (
      <View style={styles.page}>
        <ErrorState
          title="This screen stopped working"
          body="What you typed is kept on this device. Try again, or load the page afresh."
          actions={
            <>
              <Button label="Load afresh" onPress={() => window.location.reload()} />
              <Button label="Try again" look="primary" onPress={() => this.setState({ error: null })} />
            </>
          }
        />
      </View>
    );
  }
}

const styles = StyleSheet.create({
  page: { flex: 1, alignItems: 'center', justifyContent: 'center', padding: space.l, backgroundColor: color.paper },
});
