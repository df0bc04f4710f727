/** The product's colours as they are on white paper. */
export const ink = {
  ink: '#1d2327',
  pencil: '#555e63',
  rule: '#d9d2c3',
  copper: '#9a4a22',
  brass: '#8a6414',
  sound: '#276457',
  serviceable: '#5e6b2a',
  attention: '#8f5500',
  unfit: '#9b2c23',
  slate: '#4a5a70',
} as const;
export type Ink = keyof typeof ink;
