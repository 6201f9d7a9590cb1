import { FontDisplay, useFonts } from 'expo-font';
import { Slot } from 'expo-router';

import { QueryProvider } from '@/components/api/QueryProvider';
import { useSession } from '@/components/api/use-session';
import { ErrorBoundary } from '@/components/ui/ErrorBoundary';
import { ThemeProvider } from '@/components/ui/ThemeProvider';
import { ToastProvider } from '@/components/ui/ToastProvider';
import { font } from '@/components/ui/tokens';

/** Words show at once in a fallback face and change when their font is there. */
const face = (source: number) => ({ uri: source, display: FontDisplay.SWAP });

const FONTS = {
  [font.label600]: face(require('@/assets/fonts/BarlowCondensed-SemiBold.ttf')),
  [font.label700]: face(require('@/assets/fonts/BarlowCondensed-Bold.ttf')),
  [font.label800]: face(require('@/assets/fonts/BarlowCondensed-ExtraBold.ttf')),
  [font.body400]: face(require('@/assets/fonts/AtkinsonHyperlegibleNext-Regular.ttf')),
  [font.body700]: face(require('@/assets/fonts/AtkinsonHyperlegibleNext-Bold.ttf')),
};

export default function RootLayout() {
  useFonts(FONTS);
  const { me } = useSession();
  return (
    <ThemeProvider personId={me?.personId}>
      <ErrorBoundary>
        <QueryProvider>
          <ToastProvider>
            <Slot />
          </ToastProvider>
        </QueryProvider>
      </ErrorBoundary>
    </ThemeProvider>
  );
}
