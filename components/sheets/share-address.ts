/** Shares an address the way the device does it; where it cannot, copies it. */
export async function shareAddress(url: string, title: string): Promise<'shared' | 'copied' | 'failed'> {
  try {
    if (typeof navigator.share === 'function') {
      await navigator.share({ title, url });
      return 'shared';
    }
    await navigator.clipboard.writeText(url);
    return 'copied';
  } catch (error) {
    // Somebody closed the device's own sheet: nothing went wrong.
    return error instanceof DOMException && error.name === 'AbortError' ? 'shared' : 'failed';
  }
}
