import { create } from 'qrcode';
import type { ReactElement } from 'react';
import { fontMono, fontText } from '../../lib/fonts';
import { hasOutline, tagEdges, tagWords, type TagKind } from './tag-kinds';

export interface LabelText {
  kind: TagKind;
  code: string;
  story?: string;
}

/** In the tag's own units: its height of 26 is 20 mm on paper. */
const width = 88;
const height = 26;
const codeSide = 22;
const textLeft = 18;
const textWidth = width - codeSide - 5 - textLeft;

/** The modules of a QR code (ISO/IEC 18004) as one path of unit squares. */
export function qrPath(text: string): { path: string; size: number } {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const dark = Array.from({ length: modules.size * modules.size }, (_, place) => place).filter(
    (place) => modules.data[place],
  );
  const path = dark.map((place) => `M${place % modules.size} ${Math.floor(place / modules.size)}h1v1h-1z`).join('');
  return { path, size: modules.size };
}

/** A fixed-width letter is 0.6 of its size wide. */
function fittingSize(code: string): number {
  return Math.min(6, textWidth / (0.6 * code.length));
}

function twoLines(story: string): readonly string[] {
  const lines: string[] = [''];
  for (const word of story.split(' ')) {
    const last = lines.at(-1) ?? '';
    if (last.length + word.length < 32) lines[lines.length - 1] = last ? `${last} ${word}` : word;
    else lines.push(word);
  }
  return lines.slice(0, 2);
}

/** The tag as it is printed: the same outline, the code in large, and the code to scan. */
export function PrintedLabel({ kind, code, story = '' }: LabelText): ReactElement {
  const qr = qrPath(code);
  const edge = hasOutline(kind) ? tagEdges[kind] : tagEdges.part;
  const scale = codeSide / qr.size;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      style={{ width: '67.7mm', height: '20mm' }}
      fill="none"
      stroke="#000"
      strokeWidth="0.6"
    >
      <path d={edge} />
      <path d={`M14 .5H${width - 3.5}a3 3 0 0 1 3 3v19a3 3 0 0 1 -3 3H14`} />
      <g fill="#000" stroke="none">
        <text x={textLeft} y="7" fontFamily={fontText} fontSize="3">
          {tagWords[kind]}
        </text>
        <text x={textLeft} y="14.5" fontFamily={fontMono} fontWeight="500" fontSize={fittingSize(code)}>
          {code}
        </text>
        {twoLines(story).map((line, place) => (
          <text key={line} x={textLeft} y={19 + place * 3.4} fontFamily={fontText} fontSize="2.8">
            {line}
          </text>
        ))}
        <path transform={`translate(${width - codeSide - 3} 2) scale(${scale})`} d={qr.path} />
      </g>
    </svg>
  );
}
