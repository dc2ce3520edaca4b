/** What we use of pdfmake, which brings no types of its own. */
declare module 'pdfmake' {
  interface Pdf {
    getBuffer(): Promise<Buffer>;
  }
  interface PdfMaker {
    setFonts(fonts: object): void;
    setUrlAccessPolicy(allows: (url: string) => boolean): void;
    setLocalAccessPolicy(allows: (path: string) => boolean): void;
    createPdf(definition: object): Pdf;
  }
  const pdfmake: PdfMaker;
  export default pdfmake;
}

declare module 'pdfmake/fonts/Roboto.js' {
  const fonts: Readonly<Record<string, Readonly<Record<string, string>>>>;
  export default fonts;
}
