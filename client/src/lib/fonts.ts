export const fontText = 'Roboto, "Helvetica Neue", Arial, sans-serif';
export const fontHeading = '"Roboto Condensed", Roboto, "Arial Narrow", Arial, sans-serif';
export const fontMono = '"Roboto Mono", ui-monospace, "DejaVu Sans Mono", monospace';
