import type { Tokens } from './tokens';
import '@mui/x-data-grid/themeAugmentation';

/** The palette's own group, `tone`, holds every token under its own name: `sx={{ borderColor: 'tone.edge' }}`. */
declare module '@mui/material/styles' {
  interface Palette {
    tone: Tokens;
  }
  interface PaletteOptions {
    tone?: Tokens;
  }
  interface CssThemeVariables {
    enabled: true;
  }
  interface TypographyVariants {
    poster: React.CSSProperties;
    mono: React.CSSProperties;
  }
  interface TypographyVariantsOptions {
    poster?: React.CSSProperties;
    mono?: React.CSSProperties;
  }
}

declare module '@mui/material/Typography' {
  interface TypographyPropsVariantOverrides {
    poster: true;
    mono: true;
    h4: false;
    h5: false;
    h6: false;
  }
}
