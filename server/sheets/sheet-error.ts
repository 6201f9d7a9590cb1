/** Why a sheet cannot be made, in a sentence for the person who asked for it. */
export class SheetError extends Error {
  override readonly name = 'SheetError';
  readonly code: 'no_slab_plan' | 'no_pages';

  constructor(code: SheetError['code'], message: string) {
    super(message);
    this.code = code;
  }
}
