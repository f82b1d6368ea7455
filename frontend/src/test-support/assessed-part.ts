import type { AnsweredAssessment } from '../components/assessment/answered-assessment';
import type { SearchPart } from '../features/search/search-part';

/** An invented part of the catalogue: a 4.7 kΩ ±1 % chip of size 1206. */
export function examplePart(rest: Partial<SearchPart> = {}): SearchPart {
  return {
    id: 122,
    manufacturerPartNumber: 'ODF1206-4K70',
    companyPartNumber: { id: 7, number: 'BW-R-00122' },
    manufacturer: { id: 1, code: 'ODM', name: 'Oddmoor' },
    family: { id: 1, code: 'ODF', name: 'ODF' },
    technology: 'thick-film',
    size: { id: 3, code: '1206', metricCode: '3216M' },
    bodyStyle: 'chip',
    body: { length: 3.2e-3, width: 1.6e-3, height: 0.55e-3 },
    resistance: 4700,
    tolerance: 0.01,
    tcr: 1e-4,
    approval: 'preferred',
    supply: 'active',
    unitPrice: 0.006,
    secondSource: true,
    ...rest,
  };
}

/** Its assessment: dissipation is tightest, insulation cannot be told. */
export function exampleAssessment(rest: Partial<AnsweredAssessment> = {}): AnsweredAssessment {
  const basis = { words: '', inputs: [], source: 'IEC 60115-1', notes: [] };
  return {
    verdict: 'unrated',
    checks: [
      {
        check: 'dissipation',
        unit: 'W',
        demand: 0.126,
        allowance: 0.1675,
        margin: 0.1675 / 0.126 - 1,
        status: 'met',
        missing: [],
        basis: {
          ...basis,
          words: 'Highest dissipation against what the policy leaves.',
          formula: 'P = U²/R',
          inputs: [
            {
              name: 'rated dissipation',
              symbol: 'P₇₀',
              value: 0.25,
              unit: 'W',
              from: 'ratings',
              field: 'ratedDissipation',
              citation: { datasheetId: 4, datasheet: 'DS-ODF rev. C', page: 3 },
            },
          ],
        },
      },
      {
        check: 'insulation',
        unit: 'V',
        demand: 250,
        allowance: null,
        margin: null,
        status: 'unrated',
        missing: ['insulationVoltage'],
        basis,
      },
    ],
    budget: [],
    permitted: { dissipation: 0.1675, voltage: 28, current: 0.006 },
    excess: { dissipation: 1.33 },
    cautions: [{ kind: 'hot-surface', title: 'Hot surface.', text: 'About 113 °C.' }],
    policy: { id: 7, version: 3, name: 'Brackwater' },
    notice: 'A calculation for selection.',
    ...rest,
  };
}
