/** Colours of the light scheme; the dark scheme must name the same ones. */
const light = {
  page: '#FBF9F4',
  raised: '#F1EDE4',
  rule: '#D8D0C0',
  edge: '#877F6E',
  stone: '#E9E2D4',
  water: '#CFE1E1',
  wash: '#E2EBE8',
  ink: '#1D2529',
  inkSoft: '#4C585D',
  well: '#0B5563',
  onWell: '#FBF9F4',
  clay: '#A8461F',
  good: '#3F6B2A',
  warn: '#7A5200',
  bad: '#A3262A',
  goodWash: '#E9EEDD',
  warnWash: '#F4EAD2',
  badWash: '#F6E3DE',
  shadow: 'rgba(29,37,41,.16)',
};

export type Colours = Readonly<Record<keyof typeof light, string>>;

const dark: Colours = {
  page: '#0F1719',
  raised: '#172226',
  rule: '#2B3A3F',
  edge: '#71858B',
  stone: '#222E32',
  water: '#163843',
  wash: '#15303A',
  ink: '#EEF2EF',
  inkSoft: '#A9B7B8',
  well: '#6CC3CF',
  onWell: '#0F1719',
  clay: '#E79A6E',
  good: '#9CCB7F',
  warn: '#E3B85C',
  bad: '#F08C86',
  goodWash: '#1C2A20',
  warnWash: '#2C2819',
  badWash: '#2F2021',
  shadow: 'rgba(0,0,0,.5)',
};

/** Both schemes; base.css, index.html and the icons repeat some of them. */
export const colours = { light, dark } as const;
