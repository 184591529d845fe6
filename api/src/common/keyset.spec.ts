import { Op } from 'sequelize';
import { afterCursor, decodeCursor, encodeCursor, pageOf } from './keyset';

const faultOf = (act: () => unknown): unknown => {
  try {
    return act();
  } catch (fault) {
    return fault;
  }
};

describe('a cursor', () => {
  const position = { at: '2026-12-01T10:00:00.123Z', id: 7 };

  it('comes back as it went out', () => {
    expect(decodeCursor(encodeCursor(position))).toEqual(position);
  });

  it.each([
    '',
    'nonsense',
    Buffer.from('[1,2]').toString('base64url'),
    Buffer.from('["2026",1.5]').toString('base64url'),
  ])('that is not ours (%j) is refused with the field’s name', (cursor) => {
    expect(faultOf(() => decodeCursor(cursor))).toMatchObject({ status: 422, errors: [{ path: 'cursor' }] });
  });

  it('with a moment that is none is refused', () => {
    const cursor = encodeCursor({ at: 'yesterday', id: 1 });
    expect(faultOf(() => afterCursor(cursor, { column: 'at', direction: 'DESC' }))).toMatchObject({ status: 422 });
  });

  it('continues after its row, also among rows of the same moment', () => {
    const at = new Date(position.at);
    expect(afterCursor(encodeCursor(position), { column: 'savedAt', direction: 'DESC' })).toEqual({
      [Op.or]: [{ savedAt: { [Op.lt]: at } }, { savedAt: at, id: { [Op.lt]: 7 } }],
    });
  });
});

describe('a page', () => {
  const parts = { toItem: (id: number) => id, position: (id: number) => ({ at: String(id), id }) };

  it('ends the list when there are no more rows than asked for', () => {
    expect(pageOf([1, 2], 2, parts)).toEqual({ items: [1, 2], nextCursor: null });
  });

  it('leaves the row too many for the next page and points after its last', () => {
    const page = pageOf([1, 2, 3], 2, parts);
    expect(page.items).toEqual([1, 2]);
    expect(decodeCursor(page.nextCursor ?? '')).toEqual({ at: '2', id: 2 });
  });
});
