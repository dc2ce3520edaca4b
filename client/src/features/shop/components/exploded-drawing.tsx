import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';

const Drawing = styled('svg')(({ theme }) => ({
  display: 'block',
  width: '100%',
  height: 'auto',
  fill: 'none',
  stroke: theme.vars.palette.tone.copper,
  strokeWidth: 1.7,
  strokeLinejoin: 'round',
  strokeLinecap: 'round',
  '& .mark': { fill: theme.vars.palette.tone.canvas },
  '& text': { fill: theme.vars.palette.tone.copper, stroke: 'none', fontSize: 14, fontWeight: 500 },
}));

/** Where each numbered circle stands, and the line from it to its part. */
const positions = [
  { mark: '1', x: 70, y: 180, line: 'M90 236L70 180' },
  { mark: '2', x: 193, y: 180, line: 'M193 222L193 180' },
  { mark: '3', x: 308, y: 146, line: 'M308 182L308 146' },
  { mark: '4', x: 414, y: 146, line: 'M414 214L414 146' },
  { mark: '5', x: 512, y: 330, line: 'M530 294L512 330' },
  { mark: '6', x: 640, y: 150, line: 'M606 160L640 150' },
  { mark: '7', x: 718, y: 330, line: 'M718 292L718 330' },
  { mark: '8', x: 880, y: 330, line: 'M858 290L880 330' },
  { mark: '9', x: 140, y: 90, line: 'M186 104L140 90' },
] as const;

interface ExplodedDrawingProps {
  /** What is drawn, for those who cannot see it. */
  label: string;
  /** Cells of the pack: three in the smaller iron, four in the bigger one. */
  cells: 3 | 4;
}

/** An iron pulled apart along its axis; the numbers are those of the list beside it and of its bill. */
export function ExplodedDrawing({ label, cells }: ExplodedDrawingProps): ReactElement {
  const pitch = cells === 3 ? 50 : 38;
  return (
    // oxlint-disable-next-line jsx-a11y/prefer-tag-over-role -- an inline drawing follows the theme, a picture would not
    <Drawing viewBox="0 60 920 380" role="img" aria-label={label}>
      <g>
        <path d="M20 250H900" strokeDasharray="2 7" strokeWidth={1} />
        <path d="M46 250c0-6 5-9 12-9.500l46-4 8-5h46M46 250c0 6 5 9 12 9.500l46 4 8 5h46M60 250l44-3.500 9-5.500h45M60 250l44 3.500 9 5.500h45" />
        <path d="M176 222h34v22h-34zM182 222v22M204 222v22" />
        <circle cx="193" cy="233" r="4" />
        <path d="M176 256h34v22h-34zM182 256v22M204 256v22" />
        <circle cx="193" cy="267" r="4" />
        <path d="M232 228h44v-46h64v36M232 272h44v46h64v-36M232 240h56v-46h40M232 260h56v46h40" />
        <path d="M366 186h26v128h-26v-24h10v-22h-10v-36h10v-22h-10zM462 186h-26v128h26v-24h-10v-22h10v-36h-10v-22h10z" />
        <path d="M402 214h24v72h-24z" />
        {windings(cells === 3 ? 9 : 7).map((y) => (
          <path key={y} d={`M402 ${y}c8 4 16 4 24 0`} strokeWidth={1} />
        ))}
        <path d="M498 206h118v88H498z" />
        <path d="M512 222h22v34h-22zM512 230h-5M512 238h-5M512 246h-5M534 230h5M534 238h5M534 246h5" />
        <path d="M556 172h52v34M556 172v34M564 172v-22M574 172v-22M584 172v-22M594 172v-22M602 172v-22M560 150h46" />
        <path d="M562 214h16v22h-16zM586 214h16v22h-16z" />
        <circle cx="570" cy="219" r="2.500" />
        <circle cx="594" cy="219" r="2.500" />
        <path d="M520 274h16M548 274h10M572 270h22v10h-22z" strokeWidth={1.2} />
        {Array.from({ length: cells }, (_, place) => place * pitch - (cells === 3 ? 0 : 8)).map((shift) => (
          <Cell key={shift} shift={shift} />
        ))}
        <path d="M820 206h30c14 0 22 18 22 44s-8 44-22 44h-30z" />
        <path d="M838 240h16v20h-16z" />
        <path d="M180 96h600c44 0 80 10 96 34H226c-24 0-46-14-46-34zM300 96c30-30 120-34 160-34h300c60 0 96 20 112 60" />
        <path d="M180 404h600c44 0 80-10 96-34H226c-24 0-46 14-46 34zM420 404c14 10 30 14 60 14h220c30 0 44-4 56-14" />
        <circle cx="520" cy="84" r="11" />
        <path d="M505 84h-7M542 84h-7" />
      </g>
      {positions.map(({ mark, x, y, line }) => (
        <g key={mark}>
          <path d={line} strokeWidth={1} />
          <circle className="mark" cx={x} cy={y} r={13} />
          <text x={x} y={y + 5} textAnchor="middle">
            {mark}
          </text>
        </g>
      ))}
    </Drawing>
  );
}

/** Heights of the turns on the bobbin. */
function windings(turns: number): readonly number[] {
  const gap = 64 / (turns - 1);
  return Array.from({ length: turns }, (_, turn) => Math.round(220 + turn * gap));
}

function Cell({ shift }: { shift: number }): ReactElement {
  return (
    <g transform={`translate(${shift} 0)`}>
      <path d="M650 216v68c0 5 9 8 18 8s18-3 18-8v-68" />
      <ellipse cx={668} cy={216} rx={18} ry={7} />
      <path d="M662 213c0-3 12-3 12 0v3" strokeWidth={1.2} />
      <path d="M650 236c0 5 9 8 18 8s18-3 18-8" strokeWidth={1} />
    </g>
  );
}
