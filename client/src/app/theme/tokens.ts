/** Every colour the product may use, by what it is for; the names are those of the style guide. */
export interface Tokens {
  canvas: string;
  sheet: string;
  line: string;
  edge: string;
  ink: string;
  inkSoft: string;
  board: string;
  boardSoft: string;
  onBoard: string;
  copper: string;
  copperSoft: string;
  onCopper: string;
  tape: string;
  tapeSoft: string;
  onTape: string;
  hot: string;
  hotSoft: string;
  onHot: string;
  cool: string;
  coolSoft: string;
  onCool: string;
  sound: string;
  soundSoft: string;
  onSound: string;
}

export const lightTokens: Tokens = {
  canvas: '#F4F6F3',
  sheet: '#FFFFFF',
  line: '#D5DBD6',
  edge: '#76837C',
  ink: '#18211E',
  inkSoft: '#55625C',
  board: '#0E5B47',
  boardSoft: '#DDEBE4',
  onBoard: '#FFFFFF',
  copper: '#A4551E',
  copperSoft: '#FAEEE4',
  onCopper: '#FFFFFF',
  tape: '#8A5A00',
  tapeSoft: '#FFE9B8',
  onTape: '#FFFFFF',
  hot: '#A3211B',
  hotSoft: '#FBE1DD',
  onHot: '#FFFFFF',
  cool: '#2F4B7C',
  coolSoft: '#E1E8F5',
  onCool: '#FFFFFF',
  sound: '#1F6B2E',
  soundSoft: '#DFF0E1',
  onSound: '#FFFFFF',
};

export const darkTokens: Tokens = {
  canvas: '#101614',
  sheet: '#18201D',
  line: '#2B3632',
  edge: '#6F7F78',
  ink: '#E6ECE8',
  inkSoft: '#9DAAA4',
  board: '#5FC3A0',
  boardSoft: '#17322A',
  onBoard: '#06130E',
  copper: '#E39A63',
  copperSoft: '#33231A',
  onCopper: '#1C0F05',
  tape: '#F2C35B',
  tapeSoft: '#3A2C0B',
  onTape: '#1C1403',
  hot: '#FF8A80',
  hotSoft: '#3B1714',
  onHot: '#1D0503',
  cool: '#9DB7EA',
  coolSoft: '#1A2438',
  onCool: '#080E1A',
  sound: '#86D495',
  soundSoft: '#14301B',
  onSound: '#061208',
};

/** The whole type scale in pixels; the last is for the storefront and the bench only. */
export const typeScale = { small: 13, text: 15, lead: 18, title: 24, page: 34, poster: 52 } as const;
