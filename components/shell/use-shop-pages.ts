import { latePart } from './late-part';

/** The pages of the shop beside its jobs; `useShopPages` waits for them under a Suspense. */
export const { usePart: useShopPages } = latePart(() => import('./shop-pages'));
