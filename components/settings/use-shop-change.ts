import type { BodyOf } from '@/shared/contracts/contract';
import type { updateShop } from '@/shared/contracts/shop';
import { useUpdateShop } from '../api/use-shop';
import { useToast } from '../ui/ToastProvider';

export type ShopChange = BodyOf<typeof updateShop>;

/**
 * Sends one change of the shop at a time and says what became of it; each can be undone from its message.
 *
 * @returns a function of what is now, what was before and the words for it
 */
export function useShopChange(): (now: ShopChange, before: ShopChange, words: string) => void {
  const { mutateAsync } = useUpdateShop();
  const toast = useToast();
  return (now, before, words) => {
    const send = (change: ShopChange, said: string, undo?: () => void) =>
      mutateAsync(change).then(
        () => toast({ text: said, ...(undo && { action: { label: 'Undo', onPress: undo } }) }),
        (error: Error) =>
          toast({
            text: `${words} was not stored. ${error.message}`,
            tone: 'failure',
            action: { label: 'Try again', onPress: () => void send(change, said, undo) },
          }),
      );
    void send(now, `${words} is stored`, () => void send(before, `Undid ${words}`));
  };
}
