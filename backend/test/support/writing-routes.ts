import type { Role } from '../../src/permissions/roles';

export interface WritingRoute {
  method: 'post' | 'put' | 'delete';
  /** As the controllers declare it. */
  path: string;
  /** A role that may call it; absent where it is for everybody, signed in or not. */
  role?: Role;
  /** A body that is taken as it is, apart from what it refers to; absent where the route takes none. */
  body?: object;
  /** The status of that body where the places below are filled in. */
  ok: number;
  /** Value of the path's parameter. */
  parameter?: (places: Places) => string | number;
}

/** What the bodies refer to in the test's catalogue. */
export interface Places {
  part: number;
  offer: number;
  user: number;
  invitation: string;
  session: string;
}

const interval = { min: -1, max: 24 };

const duty = {
  window: { lower: 4500, upper: 4900, nominal: 4700 },
  load: { voltage: interval, current: { min: 0, max: 0.01 }, power: { max: 0.1 } },
  pulses: [{ shape: 'rectangular', power: 1, duration: 0.001, count: 100 }],
  ambient: { min: -20, max: 70, enclosureRise: 5, terminal: 80, case: 75, altitude: 500 },
  life: { hours: 87600 },
  deviation: 'worst-case',
  noise: { from: 10, to: 1000, limit: 1e-6, bias: 5 },
  frequency: { at: 1e6, within: 0.1 },
  insulation: { voltage: 100 },
  mounting: 'surface',
  body: { length: 0.01, width: 0.01, height: 0.01 },
  features: ['automotive'],
  safety: { mains: false, function: false },
  secondSource: true,
  approvals: ['approved', 'preferred'],
  supply: ['active'],
};

/** The whole duty is spoilt field by field where only its requirement is asked; elsewhere it is the same class. */
const shortDuty = { window: duty.window, load: { voltage: duty.load.voltage }, ambient: duty.ambient };

const shortPolicy = { match: {}, powerRatio: 0.5, reading: 'multiplied', voltageRatio: 0.8 };

const policy = {
  match: { technology: ['thick-film'], mounting: 'surface', style: 'RM', tolerance: 0.01 },
  powerRatio: 0.6,
  reading: 'parallel',
  from: 70,
  zero: 120,
  voltageRatio: 0.8,
  pulseRatio: 0.7,
  maxTemperature: 125,
  reserve: 10,
  altitude: [
    [0, 1],
    [5000, 0.88],
  ],
};

const ratings = {
  technology: 'thick-film',
  resistance: 4700,
  tolerance: 0.01,
  tcr: 1e-4,
  referenceTemperature: 25,
  ratedDissipation: 0.25,
  derating: {
    axis: 'ambient',
    points: [
      [70, 1],
      [155, 0],
    ],
  },
  limitingElementVoltage: 200,
  overloadVoltage: 400,
  insulationVoltage: 300,
  category: { min: -55, max: 155 },
  maxElementTemperature: 155,
  thermalResistance: 200,
  voltageCoefficient: 1e-5,
  noiseIndex: -10,
  inductance: 1e-9,
  capacitance: 5e-14,
  pulses: {
    single: [[0.001, 3]],
    singleCount: 1000,
    continuous: [[0.001, 1]],
    voltage: 400,
    energy: 1,
    shift: 0.01,
  },
  drift: { fraction: 0.01, hours: 1000, temperature: 155, law: { exponent: 0.333, doubling: 30 } },
  solderShift: 0.005,
  humidityShift: 0.01,
  body: { length: 0.0032, width: 0.0016, height: 0.0005 },
  mounting: 'surface',
  features: ['automotive'],
  certificates: ['IEC 60115-8 N-1'],
  failureRateStyle: 'RM',
};

const filters = {
  text: 'SKUA',
  manufacturers: [1],
  families: [1],
  technologies: ['thick-film'],
  sizes: ['0603'],
  series: ['E24'],
  tolerances: [0.01],
  tcrs: [1e-4],
  certificate: false,
  approvals: ['approved'],
  supply: ['active'],
  companyPartNumber: false,
};

const terms = {
  supplierId: 1,
  packaging: 'T5',
  minimumOrder: 100,
  orderMultiple: 100,
  leadTimeDays: 14,
  validFrom: '2026-01-01',
  validUntil: '2099-12-31',
  priceBreaks: [{ quantity: 100, unitPrice: 0.0092 }],
  reason: 'Quotation 4711',
};

const decision = { reason: 'Moved to another site', version: 1 };
const credentials = { email: 'nobody@brackwater.example.com', password: 'river-gauge-42' };

/** Every route that is not a GET, with what it takes. A test holds the list to the routes there are. */
export const writingRoutes: readonly WritingRoute[] = [
  { method: 'post', path: '/api/auth/sign-in', body: credentials, ok: 401 },
  { method: 'post', path: '/api/auth/refresh', ok: 401 },
  { method: 'post', path: '/api/auth/sign-out', ok: 204 },
  { method: 'post', path: '/api/auth/password-resets', body: { email: credentials.email }, ok: 202 },
  {
    method: 'post',
    path: '/api/auth/password-resets/redeem',
    body: { token: 'no-such-token', password: 'river-gauge-42' },
    ok: 422,
  },
  { method: 'post', path: '/api/invitations/preview', body: { token: 'no-such-token' }, ok: 422 },
  {
    method: 'post',
    path: '/api/invitations/accept',
    body: { token: 'no-such-token', name: 'Kim', password: 'river-gauge-42' },
    ok: 422,
  },
  { method: 'post', path: '/api/requirements', role: 'designer', body: { duty }, ok: 200 },
  {
    method: 'post',
    path: '/api/assessments',
    role: 'designer',
    body: { ratings, duty: shortDuty, policy },
    ok: 200,
  },
  {
    method: 'post',
    path: '/api/parts/:id/assessment',
    role: 'designer',
    body: { duty: shortDuty, policy: shortPolicy },
    ok: 200,
    parameter: ({ part }) => part,
  },
  {
    method: 'post',
    path: '/api/parts/search',
    role: 'designer',
    body: {
      duty: shortDuty,
      policy: shortPolicy,
      filters,
      show: 'met-and-unrated',
      group: 'company',
      sort: '-resistance',
      page: 1,
      pageSize: 10,
    },
    ok: 200,
  },
  {
    method: 'post',
    path: '/api/parts/:id/approval',
    role: 'component-engineer',
    body: { ...decision, to: 'restricted', words: 'Only indoors', scope: 'All' },
    ok: 200,
    parameter: ({ part }) => part,
  },
  {
    method: 'post',
    path: '/api/parts/:id/supply',
    role: 'purchasing',
    body: { reason: 'Vendor notice', version: 2, to: 'last-time-buy', lastOrderDate: '2099-06-30' },
    ok: 200,
    parameter: ({ part }) => part,
  },
  {
    method: 'put',
    path: '/api/offers/:id',
    role: 'purchasing',
    body: { ...terms, version: 1 },
    ok: 200,
    parameter: ({ offer }) => offer,
  },
  {
    method: 'post',
    path: '/api/offers/:id/end',
    role: 'purchasing',
    body: { reason: 'Gone', version: 2 },
    ok: 200,
    parameter: ({ offer }) => offer,
  },
  { method: 'post', path: '/api/offers', role: 'purchasing', body: { ...terms, partId: 1 }, ok: 201 },
  {
    method: 'put',
    path: '/api/users/:id/roles',
    role: 'administrator',
    body: { ...decision, roles: ['designer', 'purchasing'] },
    ok: 200,
    parameter: ({ user }) => user,
  },
  {
    method: 'post',
    path: '/api/users/:id/deactivate',
    role: 'administrator',
    body: { ...decision, version: 2 },
    ok: 200,
    parameter: ({ user }) => user,
  },
  {
    method: 'post',
    path: '/api/users/:id/reactivate',
    role: 'administrator',
    body: { ...decision, version: 3 },
    ok: 200,
    parameter: ({ user }) => user,
  },
  {
    method: 'post',
    path: '/api/invitations',
    role: 'administrator',
    body: { email: 'new@brackwater.example.com', roles: ['designer'] },
    ok: 201,
  },
  {
    method: 'delete',
    path: '/api/invitations/:id',
    role: 'administrator',
    ok: 204,
    parameter: ({ invitation }) => invitation,
  },
  { method: 'post', path: '/api/backups', role: 'administrator', ok: 201 },
  {
    method: 'post',
    path: '/api/backups/:name/check',
    role: 'administrator',
    ok: 404,
    parameter: () => '2026-01-01T00-00-00Z-0000',
  },
  {
    method: 'post',
    path: '/api/outbox/:id/retry',
    role: 'administrator',
    ok: 404,
    parameter: () => '7f9c24e8-3b4e-4b1e-9d52-000000000000',
  },
  { method: 'put', path: '/api/account/name', role: 'librarian', body: { name: 'Kim Example' }, ok: 204 },
  {
    method: 'delete',
    path: '/api/account/sessions/:id',
    role: 'librarian',
    ok: 204,
    parameter: ({ session }) => session,
  },
  {
    method: 'post',
    path: '/api/account/password',
    role: 'librarian',
    body: { currentPassword: 'river-gauge-42', newPassword: 'tidal-gauge-43' },
    ok: 204,
  },
  { method: 'post', path: '/api/auth/sign-out-everywhere', role: 'librarian', ok: 204 },
];
