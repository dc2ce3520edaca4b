import { create } from 'qrcode';

/** In millimetres, as it is printed. */
export const unitLabelSize = { width: 70, height: 24 } as const;

/** The left edge of a unit's tag, as on screen: a punched hole. In a box of 14 by 26. */
const unitEdge = 'M14 .5H8L.5 8v10L8 25.5h6M9.6 13a2.1 2.1 0 1 1-4.2 0 2.1 2.1 0 0 1 4.2 0';

/** Four modules stay white around the code. In the tag's own units; its height of 26 is the height of the label. */
const width = (26 * unitLabelSize.width) / unitLabelSize.height;
const codeSide = 20;

/**
 * A unit's label: its tag's outline, the serial number to read, and a QR code (ISO/IEC 18004, level M) to scan.
 *
 * @param address what the code opens
 * @returns an SVG document
 */
export function unitLabel(unit: { readonly serial: string; readonly name: string; readonly address: string }): string {
  const { modules } = create(unit.address, { errorCorrectionLevel: 'M' });
  const scale = codeSide / modules.size;
  const squares = Array.from({ length: modules.size * modules.size }, (_, place) => place)
    .filter((place) => modules.data[place])
    .map((place) => `M${place % modules.size} ${Math.floor(place / modules.size)}h1v1h-1z`)
    .join('');
  const left = width - codeSide - 3.2;
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${unitLabelSize.width}mm" height="${unitLabelSize.height}mm" viewBox="0 0 ${width} 26">`,
    `<path d="${unitEdge}" fill="none" stroke="#000" stroke-width="0.5"/>`,
    `<path d="M14 .5H${width - 0.5}v25H14" fill="none" stroke="#000" stroke-width="0.5"/>`,
    `<text x="12" y="10" font-family="Roboto" font-size="4" font-weight="bold">${escaped(unit.serial)}</text>`,
    `<text x="12" y="16" font-family="Roboto" font-size="3.4">${escaped(unit.name.slice(0, 26))}</text>`,
    `<text x="12" y="21" font-family="Roboto" font-size="2.6">Scan for its measurements</text>`,
    `<path transform="translate(${left} 3) scale(${scale})" d="${squares}" fill="#000"/>`,
    '</svg>',
  ].join('');
}

function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}
