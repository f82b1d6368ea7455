import request from 'supertest';
import { startApplication, type StartedApplication } from './support/application';

/** A 1206 / 3216M thick-film chip: 0.25 W, 200 V, common practice. */
const chip = {
  technology: 'thick-film',
  resistance: 4700,
  tolerance: 0.01,
  tcr: 100e-6,
  ratedDissipation: 0.25,
  derating: {
    axis: 'ambient',
    points: [
      [70, 1],
      [155, 0],
    ],
  },
  limitingElementVoltage: 200,
  category: { min: -55, max: 155 },
  maxElementTemperature: 155,
};
const duty = {
  window: { lower: 4500, upper: 4900 },
  load: { voltage: { min: 0, max: 24 } },
  ambient: { min: -20, max: 70 },
};
const parallel = { match: {}, powerRatio: 0.6, reading: 'parallel', voltageRatio: 0.8, from: 70, zero: 118 };

let application: StartedApplication;
let bearer: string;

beforeAll(async () => {
  application = await startApplication();
  bearer = (await application.people.signIn('designer')).accessToken;
});

afterAll(() => application.stop());

interface Answer {
  status: number;
  body: Record<string, unknown> & {
    checks: {
      check: string;
      demand: number;
      allowance: number;
      margin: number;
      status: string;
      basis: { inputs: { name: string }[] };
    }[];
    errors: { pointer: string }[];
  };
}

async function post(path: string, body: object | string): Promise<Answer> {
  const answer = await request(application.server)
    .post(path)
    .set('Authorization', `Bearer ${bearer}`)
    .set('Content-Type', 'application/json')
    .send(body);
  return { status: answer.status, body: answer.body as Answer['body'] };
}
const assess = (changes: object): Promise<Answer> =>
  post('/api/assessments', { ratings: chip, duty, policy: 'none', ...changes });
const pointers = (answer: Answer): string[] => answer.body.errors.map(({ pointer }) => pointer);

describe('POST /api/assessments', () => {
  it('holds a datasheet on the desk against a duty', async () => {
    const { status, body } = await assess({});
    expect(status).toBe(200);
    expect(body).toMatchObject({ verdict: 'met', policy: 'none' });
    expect(body.checks.map(({ check }) => check)).toEqual([
      'value',
      'dissipation',
      'element-temperature',
      'voltage',
      'category-temperature',
    ]);
    // arithmetic: 200 V / 24 V − 1
    expect(body.checks.find(({ check }) => check === 'voltage')?.margin).toBeCloseTo(200 / 24 - 1, 9);
  });

  it('takes one policy entry inline and says so: RM at 85 °C leaves 0.4125 (NASA EEE-INST-002, section R2, Table 4)', async () => {
    const curve = {
      axis: 'ambient',
      points: [
        [70, 1],
        [150, 0],
      ],
    };
    const { body } = await assess({
      ratings: { ...chip, derating: curve },
      duty: { ...duty, ambient: { min: -20, max: 85 } },
      policy: parallel,
    });
    expect(body['policy']).toBe('inline');
    expect(body.checks.find(({ check }) => check === 'dissipation')?.allowance).toBeCloseTo(
      0.25 * 0.4125,
      12,
    );
  });

  it('names the entry in force in the basis', async () => {
    const { body } = await assess({ policy: parallel });
    const names = body.checks
      .find(({ check }) => check === 'dissipation')
      ?.basis.inputs.map(({ name }) => name);
    expect(names).toEqual(
      expect.arrayContaining(['power ratio of the policy', 'reading of the policy', 'policy line zero at']),
    );
  });

  it('without a published company policy says which choice is open', async () => {
    const { status, body } = await assess({ policy: undefined });
    expect(status).toBe(422);
    expect(body.errors[0]?.pointer).toBe('/policy');
  });

  it.each<[string, object, number, string]>([
    ['an unknown field', { extra: 1 }, 400, '/extra'],
    ['an unknown field inside', { ratings: { ...chip, colour: 'red' } }, 400, '/ratings/colour'],
    ['null', { duty: { ambient: null } }, 400, '/duty/ambient'],
    ['text for a number', { ratings: { ...chip, tolerance: '1 %' } }, 400, '/ratings/tolerance'],
    ['a negative tolerance', { ratings: { ...chip, tolerance: -0.01 } }, 400, '/ratings/tolerance'],
    [
      'an absurd dissipation',
      { ratings: { ...chip, ratedDissipation: 1e30 } },
      400,
      '/ratings/ratedDissipation',
    ],
    [
      'a curve that falls back in temperature',
      {
        ratings: {
          ...chip,
          derating: {
            axis: 'ambient',
            points: [
              [70, 1],
              [60, 0],
            ],
          },
        },
      },
      422,
      '/ratings/derating/points',
    ],
    [
      'a curve of one number',
      { ratings: { ...chip, derating: { axis: 'ambient', points: [[70]] } } },
      400,
      '/ratings/derating/points',
    ],
    ['a policy that is none', { policy: 'generous' }, 400, '/policy'],
    [
      'an inline policy with an unknown field',
      { policy: { ...parallel, mood: 'good' } },
      400,
      '/policy/mood',
    ],
    ['a list for an object', { duty: [] }, 400, '/duty'],
  ])('refuses %s', async (_name, changes, status, pointer) => {
    const answer = await assess(changes);
    expect(answer.status).toBe(status);
    expect(pointers(answer)).toContain(pointer);
  });

  it.each(['1e999', '-1e999'])('refuses %s, which no number can hold', async (text) => {
    const body = JSON.stringify({ ratings: chip, duty, policy: 'none' }).replace('4500', text);
    const answer = await post('/api/assessments', body);
    expect(answer.status).toBe(400);
    expect(pointers(answer)).toContain('/duty/window/lower');
  });
});

describe('POST /api/requirements', () => {
  it('gives what follows from a duty', async () => {
    const { status, body } = await post('/api/requirements', { duty });
    expect(status).toBe(200);
    // arithmetic: 24² / 4500 = 0.128 W, 24 / 4500 = 5.333 mA
    expect(body).toMatchObject({
      window: { lower: 4500, upper: 4900 },
      voltage: { min: 0, max: 24 },
      dissipation: 0.128,
    });
    expect(body['current']).toMatchObject({ max: expect.closeTo(24 / 4500, 12) as number });
  });

  it('names both fields of a clash', async () => {
    const answer = await post('/api/requirements', { duty: { window: { lower: 5, upper: 4 } } });
    expect(answer.status).toBe(422);
    expect(pointers(answer)).toEqual(['/duty/window/lower', '/duty/window/upper']);
  });
});

describe('notation, preferred values and marking', () => {
  const get = async (path: string): Promise<{ status: number; body: Record<string, unknown> }> => {
    const answer = await request(application.server).get(path).set('Authorization', `Bearer ${bearer}`);
    return { status: answer.status, body: answer.body as Record<string, unknown> };
  };

  it('reads 4k7', async () => {
    expect((await get('/api/notation?text=4k7&quantity=resistance')).body).toEqual({
      value: 4700,
      text: '4.7 kΩ',
    });
  });

  it('shows both readings of what is ambiguous', async () => {
    const { status, body } = await get(
      `/api/notation?text=${encodeURIComponent('4,700')}&quantity=resistance`,
    );
    expect(status).toBe(422);
    expect(body['detail']).toMatch(/4\.7.*4700|4700.*4\.7|4\.7 k/);
  });

  it('lists E24 between 1 kΩ and 2 kΩ (IEC 60063)', async () => {
    expect((await get('/api/preferred-values?series=E24&from=1000&to=2000')).body).toEqual({
      values: [1000, 1100, 1200, 1300, 1500, 1600, 1800, 2000],
    });
  });

  it('reads 68X: position 68 of E96 is 499, X is 10⁻¹ (IEC 60062)', async () => {
    const { body } = await get('/api/marking?text=68X');
    expect(body['readings']).toContainEqual(expect.objectContaining({ resistance: 49.9 }));
  });

  it('refuses a text that nothing can be read from, and a span without end', async () => {
    expect((await get('/api/marking?text=%3F%3F')).status).toBe(422);
    expect((await get('/api/preferred-values?series=E24&from=-1&to=2')).status).toBe(422);
  });
});
