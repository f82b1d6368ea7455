import { countOfRows, rowAtPlace } from './unfolded-rows';

describe('rows with some of them unfolded', () => {
  // Item 1 shows two sources, item 3 one: 0, 1, 1a, 1b, 2, 3, 3a, 4.
  const unfolded = new Map([
    [3, 1],
    [1, 2],
  ]);

  it.each([
    [0, { item: 0 }],
    [1, { item: 1 }],
    [2, { item: 1, source: 0 }],
    [3, { item: 1, source: 1 }],
    [4, { item: 2 }],
    [5, { item: 3 }],
    [6, { item: 3, source: 0 }],
    [7, { item: 4 }],
  ])('stand in order: place %i is %j', (place, row) => {
    expect(rowAtPlace(place, unfolded)).toEqual(row);
  });

  it('are counted with what they unfold to', () => {
    expect(countOfRows(5, unfolded)).toBe(8);
    expect(countOfRows(5, new Map())).toBe(5);
  });
});
