/** Invented: no such town, workshop or person is meant. */
export interface Place {
  name: string;
  town: string;
  timeZone: string;
  currency: string;
  domain: string;
  owner: string;
  desk: string;
  mechanics: readonly [string, string];
}

export const PLACES: readonly [Place, Place] = [
  {
    name: 'Quillbeck Cycle Workshop',
    town: 'Quillbeck',
    timeZone: 'Europe/London',
    currency: 'GBP',
    domain: 'quillbeck.example',
    owner: 'Hester Marlowby',
    desk: 'Ines Tarrowfield',
    mechanics: ['Joss Pennarrow', 'Tamsin Oakrill'],
  },
  {
    name: 'The Lower Yard',
    town: 'Sandrigg',
    timeZone: 'Europe/London',
    currency: 'GBP',
    domain: 'loweryard.example',
    owner: 'Odette Fernbarrow',
    desk: 'Bram Hollowick',
    mechanics: ['Kit Wrenlake', 'Maud Stellbrook'],
  },
];

const GIVEN = [
  'Ada', 'Bea', 'Cassius', 'Dorrit', 'Edda', 'Felix', 'Greta', 'Hugo', 'Isla', 'Jonas', 'Kaya', 'Linus', 'Mira',
  'Nils', 'Orla', 'Pia', 'Quentin', 'Runa', 'Silas', 'Thea', 'Una', 'Vera', 'Wilf', 'Yara', 'Zeno', 'Anouk',
  'Basil', 'Clio', 'Della', 'Emrys', 'Fenna',
]; // prettier-ignore
const FAMILY = [
  'Ashgrave', 'Birchmoor', 'Cobbledene', 'Dunnarch', 'Elderquist', 'Fallowmere', 'Gorsewick', 'Hazelrow', 'Inkerdale',
  'Juniperell', 'Kestrelby', 'Larkenshaw', 'Mossigrave', 'Nettlebar', 'Osierholm', 'Plumgarth', 'Quarrendale',
  'Rushavell', 'Sedgeworthy', 'Thistlemoss', 'Umberlow', 'Vetchcombe', 'Willowarch', 'Yarrowgate', 'Alderfen',
  'Brackenbale', 'Cloverstead', 'Damsonley', 'Eyebrighter',
]; // prettier-ignore

/** The n-th rider's invented name: 899 different ones, then numbered. */
export function riderName(n: number): string {
  const name = `${GIVEN[n % GIVEN.length]} ${FAMILY[n % FAMILY.length]}`;
  const round = Math.floor(n / (GIVEN.length * FAMILY.length));
  return round === 0 ? name : `${name} ${round + 1}`;
}

/** Everyone of the scenario has an address that leads nowhere (RFC 2606). */
export const addressOf = (name: string, { domain }: Place): string =>
  `${name.toLowerCase().replaceAll(' ', '.')}@${domain}`;
