import { createTheme, type Shadows, type TypographyVariantsOptions } from '@mui/material/styles';
import './augment';
import { controls } from './controls';
import { gridLook } from './grid-look';
import { surfaces } from './surfaces';
import { fontHeading, fontMono, fontText } from '../../lib/fonts';
import { darkTokens, lightTokens, typeScale, type Tokens } from './tokens';

const rem = (pixels: number): string => `${pixels / 16}rem`;

function palette(tokens: Tokens) {
  return {
    primary: { main: tokens.board, contrastText: tokens.onBoard },
    secondary: { main: tokens.copper, contrastText: tokens.onCopper },
    error: { main: tokens.hot, contrastText: tokens.onHot },
    warning: { main: tokens.tape, contrastText: tokens.onTape },
    success: { main: tokens.sound, contrastText: tokens.onSound },
    info: { main: tokens.cool, contrastText: tokens.onCool },
    background: { default: tokens.canvas, paper: tokens.sheet },
    text: { primary: tokens.ink, secondary: tokens.inkSoft, disabled: tokens.inkSoft },
    divider: tokens.line,
    DataGrid: { bg: tokens.sheet, headerBg: tokens.sheet, pinnedBg: tokens.sheet },
    tone: tokens,
  };
}

function heading(pixels: number, lineHeight: number) {
  return { fontFamily: fontHeading, fontWeight: 600, fontSize: rem(pixels), lineHeight };
}

const typography: TypographyVariantsOptions = {
  fontFamily: fontText,
  h1: { ...heading(typeScale.page, 1.15), letterSpacing: '-0.01em' },
  h2: heading(typeScale.lead, 1.3),
  h3: heading(typeScale.text, 1.4),
  poster: { ...heading(typeScale.poster, 1.08), letterSpacing: '-0.01em', display: 'block' },
  subtitle1: { fontSize: rem(typeScale.lead), lineHeight: 1.5 },
  body1: { fontSize: rem(typeScale.text), lineHeight: 1.5 },
  body2: { fontSize: rem(typeScale.small), lineHeight: 1.5 },
  caption: { fontSize: rem(typeScale.small), lineHeight: 1.4 },
  mono: { fontFamily: fontMono, fontSize: rem(typeScale.text), lineHeight: 1.5 },
  button: { fontSize: rem(typeScale.text), fontWeight: 500, lineHeight: 1.5, textTransform: 'none' },
};

const noShadows = Array.from({ length: 25 }, () => 'none') as Shadows;

export const theme = createTheme({
  cssVariables: { cssVarPrefix: 'em', colorSchemeSelector: 'data-scheme' },
  colorSchemes: { light: { palette: palette(lightTokens) }, dark: { palette: palette(darkTokens) } },
  typography,
  shape: { borderRadius: 3 },
  shadows: noShadows,
  // Nothing moves for decoration: not for those who ask for it, and not for anybody else.
  motion: { reducedMotion: 'always' },
  transitions: { create: () => 'none' },
  breakpoints: { values: { xs: 0, sm: 600, md: 900, lg: 1180, xl: 1440 } },
  components: { ...surfaces, ...controls, ...gridLook },
});
