/** The columns of a list of customers and jobs: written by the export, understood by the import. */

export const jobColumns = [
  'customer',
  'phone',
  'email',
  'language',
  'street',
  'town',
  'postcode',
  'latitude',
  'longitude',
  'wayIn',
  'floorsUp',
  'hasLift',
  'yearBuilt',
  'title',
  'roomCount',
  'unitCount',
  'wallsReady',
  'siteReadyOn',
  'notes',
] as const;
export type JobColumn = (typeof jobColumns)[number];

/** As the export heads them and the screen names them. */
export const jobColumnWords: Record<JobColumn, string> = {
  customer: 'Customer',
  phone: 'Phone',
  email: 'E-mail',
  language: 'Language',
  street: 'Street',
  town: 'Town',
  postcode: 'Postcode',
  latitude: 'Latitude',
  longitude: 'Longitude',
  wayIn: 'Way in',
  floorsUp: 'Floors up',
  hasLift: 'Lift',
  yearBuilt: 'Year built',
  title: 'Job',
  roomCount: 'Rooms',
  unitCount: 'Units',
  wallsReady: 'Walls',
  siteReadyOn: 'Site ready on',
  notes: 'Notes',
};

/** What others call them, letters and figures only. */
const otherWords: Record<JobColumn, readonly string[]> = {
  customer: [
    'name',
    'customername',
    'client',
    'clientname',
    'fullname',
    'contact',
    'cliente',
    'nombre',
  ],
  phone: ['tel', 'telephone', 'mobile', 'cell', 'cellphone', 'phonenumber', 'telefono'],
  email: ['mail', 'emailaddress', 'correo'],
  language: ['lang', 'idioma'],
  street: [
    'address',
    'address1',
    'addressline1',
    'streetaddress',
    'siteaddress',
    'site',
    'direccion',
    'calle',
  ],
  town: ['city', 'suburb', 'ciudad', 'locality'],
  postcode: ['zip', 'zipcode', 'postalcode', 'codigopostal'],
  latitude: ['lat'],
  longitude: ['lon', 'lng', 'long'],
  wayIn: ['access', 'accessnotes', 'entry'],
  floorsUp: ['floor', 'storey'],
  hasLift: ['elevator'],
  yearBuilt: ['built', 'year'],
  title: ['jobtitle', 'jobname', 'project', 'description', 'work', 'trabajo'],
  roomCount: ['roomcount', 'numberofrooms'],
  unitCount: ['cabinets', 'boxes', 'unitcount', 'numberofunits'],
  wallsReady: ['wallsready'],
  siteReadyOn: ['siteready', 'readyon', 'readydate'],
  notes: ['note', 'comments', 'comment', 'remarks', 'notas'],
};

/**
 * Which column each heading means; null where none is known, and each column once, the first heading that
 * means it. Example: "Client name", "ZIP" are the customer and the postcode.
 */
export function guessColumns(headings: readonly string[]): (JobColumn | null)[] {
  const taken = new Set<JobColumn>();
  return headings.map((heading) => {
    const plain = plainWord(heading);
    const column = jobColumns.find(
      (one) =>
        !taken.has(one) &&
        (plainWord(jobColumnWords[one]) === plain || otherWords[one].includes(plain)),
    );
    if (column) taken.add(column);
    return column ?? null;
  });
}

function plainWord(text: string): string {
  return text
    .normalize('NFD')
    .replace(/[^\p{L}\p{N}]/gu, '')
    .toLowerCase();
}
