import QRCode from 'qrcode';

/** A text as a QR code (ISO/IEC 18004, level L): 0 and 1 for each row from the top. */
export function qrRows(text: string): readonly string[] {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'L' });
  return Array.from({ length: modules.size }, (_, row) =>
    Array.from({ length: modules.size }, (__, column) => (modules.get(row, column) ? '1' : '0')).join(''),
  );
}
