export const product = 'Emberlot';
