/** One channel of an sRGB colour, linearised. Source: W3C, WCAG 2.2 (2023), definition of "relative luminance". */
function linear(channel: number): number {
  const c = channel / 255;
  return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
}

/**
 * Relative luminance of a colour.
 * @param hex `#RRGGBB`
 * @returns 0 (black) to 1 (white)
 * Source: W3C, WCAG 2.2 (2023), definition of "relative luminance".
 */
export function relativeLuminance(hex: string): number {
  const value = Number.parseInt(hex.slice(1), 16);
  const [red, green, blue] = [value >> 16, (value >> 8) & 255, value & 255];
  return 0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue);
}

/**
 * Contrast ratio of two colours, 1 to 21.
 * Source: W3C, WCAG 2.2 (2023), definition of "contrast ratio".
 */
export function contrastRatio(one: string, other: string): number {
  const [a, b] = [relativeLuminance(one), relativeLuminance(other)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}
