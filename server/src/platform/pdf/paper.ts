import pdfmake from 'pdfmake';
import Roboto from 'pdfmake/fonts/Roboto.js';

const fontFiles = new Set(Object.values(Roboto).flatMap((faces) => Object.values(faces)));
pdfmake.setFonts(Roboto);
// A paper is drawn from its own words alone: nothing is fetched, and no file but the fonts is read.
pdfmake.setUrlAccessPolicy(() => false);
pdfmake.setLocalAccessPolicy((path) => fontFiles.has(path));

/** The colours of the product's light look, for paper. */
export const paperColours = {
  ink: '#18211e',
  inkSoft: '#55625c',
  line: '#d5dbd6',
  board: '#0e5b47',
  copper: '#a4551e',
  tape: '#8a5a00',
  tapeGround: '#ffe9b8',
} as const;

/** A piece of a paper, in pdfmake's own form. */
export type PaperPart = string | { readonly [property: string]: unknown } | readonly PaperPart[];

export interface Paper {
  /** Stands in the file's properties and on top of the paper. */
  readonly title: string;
  /** Who writes: stands at the top left of each page. */
  readonly from: string;
  readonly parts: readonly PaperPart[];
  /** Stands at the bottom of each page, before its number. */
  readonly foot: string;
  /** The day it was made on; it decides nothing but the file's properties, so that the same paper is the same file. */
  readonly madeAt: Date;
}

/** Draws an A4 paper in the identity of the shop's papers. */
export async function drawPaper(paper: Paper): Promise<Buffer> {
  return pdfmake.createPdf(definitionOf(paper)).getBuffer();
}

function definitionOf({ title, from, parts, foot, madeAt }: Paper): object {
  return {
    info: { title, author: from, creationDate: madeAt, modDate: madeAt },
    lang: 'en',
    pageSize: 'A4',
    pageMargins: [56, 72, 56, 64],
    defaultStyle: { font: 'Roboto', fontSize: 9.5, lineHeight: 1.25, color: paperColours.ink },
    header: {
      margin: [56, 32, 56, 0],
      columns: [
        { text: from, bold: true, fontSize: 11, color: paperColours.board },
        { text: title, alignment: 'right', color: paperColours.inkSoft },
      ],
    },
    footer: (page: number, pages: number) => ({
      margin: [56, 16, 56, 0],
      columns: [
        { text: foot, fontSize: 8, color: paperColours.inkSoft, width: '*' },
        { text: `${page} of ${pages}`, fontSize: 8, alignment: 'right', color: paperColours.inkSoft, width: 50 },
      ],
    }),
    content: [{ text: title, fontSize: 20, bold: true, margin: [0, 0, 0, 14] }, ...parts],
  };
}

export interface PaperColumn {
  readonly head: string;
  readonly width: string | number;
  readonly right?: boolean;
}

/** Rows under heads, with thin lines between them. */
export function paperTable(columns: readonly PaperColumn[], rows: readonly (readonly string[])[]): PaperPart {
  const cell = (text: string, index: number, more: object) => ({
    text,
    alignment: columns[index]?.right ? 'right' : 'left',
    ...more,
  });
  return {
    margin: [0, 6, 0, 10],
    layout: {
      hLineWidth: (line: number) => (line === 1 ? 1 : 0.5),
      vLineWidth: () => 0,
      hLineColor: () => paperColours.line,
      paddingLeft: () => 0,
      paddingRight: (index: number) => (index === columns.length - 1 ? 0 : 10),
      paddingTop: () => 4,
      paddingBottom: () => 3,
    },
    table: {
      headerRows: 1,
      widths: columns.map(({ width }) => width),
      body: [
        columns.map(({ head }, index) => cell(head, index, { bold: true, color: paperColours.inkSoft, fontSize: 8.5 })),
        ...rows.map((row) => row.map((text, index) => cell(text, index, {}))),
      ],
    },
  };
}

/** Named values, one under the other. */
export function paperFacts(facts: readonly (readonly [label: string, value: string])[]): PaperPart {
  return facts.map(([label, value]) => ({
    columns: [
      { text: label, color: paperColours.inkSoft, width: 62 },
      { text: value, width: '*' },
    ],
  }));
}

/** A caution, as it stands on screens: amber ground, the word before the sentence. */
export function paperCaution(sentence: string): PaperPart {
  return {
    margin: [0, 10, 0, 4],
    layout: {
      hLineWidth: () => 0,
      vLineWidth: () => 0,
      fillColor: () => paperColours.tapeGround,
      paddingLeft: () => 8,
      paddingRight: () => 8,
      paddingTop: () => 5,
      paddingBottom: () => 4,
    },
    table: {
      widths: ['*'],
      body: [[{ text: [{ text: 'Caution  ', bold: true }, sentence], color: paperColours.tape }]],
    },
  };
}
