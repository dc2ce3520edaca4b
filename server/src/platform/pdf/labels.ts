import pdfmake from 'pdfmake';
import './paper.js';

const pointsPerMillimetre = 72 / 25.4;

/**
 * Draws labels, one to a page of their own size.
 *
 * @param labels SVG documents of that size
 * @param size in millimetres
 * @param madeAt stands in the file's properties, so that the same labels are the same file
 */
export async function drawLabels(
  title: string,
  labels: readonly string[],
  size: { readonly width: number; readonly height: number },
  madeAt: Date,
): Promise<Buffer> {
  const [width, height] = [size.width * pointsPerMillimetre, size.height * pointsPerMillimetre];
  const definition = {
    info: { title, creationDate: madeAt, modDate: madeAt },
    lang: 'en',
    pageSize: { width, height },
    pageMargins: 0,
    defaultStyle: { font: 'Roboto' },
    content: labels.map((svg, index) => ({
      svg,
      width,
      absolutePosition: { x: 0, y: 0 },
      ...(index > 0 && { pageBreak: 'before' }),
    })),
  };
  return pdfmake.createPdf(definition).getBuffer();
}
