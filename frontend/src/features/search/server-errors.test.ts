import { Problem } from '../../api/problem';
import { withServerErrors } from './server-errors';

const clash = (...fields: [string, string][]): Problem =>
  new Problem(
    'clash',
    422,
    'The request contradicts itself',
    undefined,
    undefined,
    fields.map(([pointer, message]) => ({ pointer, message })),
    undefined,
  );

describe('what the server refused', () => {
  const read = { duty: undefined, errors: {}, pulseErrors: [{}, {}] };

  it('stands at the entry it names, both ends of an interval at the one entry', () => {
    const { errors } = withServerErrors(
      read,
      clash(
        ['/duty/load/voltage/min', 'The smallest is above the largest.'],
        ['/duty/window/upper', 'Too low.'],
      ),
    );
    expect(errors).toEqual({ voltage: 'The smallest is above the largest.', upper: 'Too low.' });
  });

  it('is not put at an entry whose name only begins alike', () => {
    expect(withServerErrors(read, clash(['/duty/ambient/maximum/altitude2', 'No.'])).errors).toEqual({
      ambient: 'No.',
    });
    expect(withServerErrors(read, clash(['/duty/load/voltages', 'No.'])).errors).toEqual({});
  });

  it('stands at the pulse it names', () => {
    const { pulseErrors } = withServerErrors(
      read,
      clash(['/duty/pulses/1/duration', 'Longer than its period.']),
    );
    expect(pulseErrors).toEqual([{}, { duration: 'Longer than its period.' }]);
  });
});
