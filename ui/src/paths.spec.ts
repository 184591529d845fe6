import { matchRoutes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { paths } from './paths';
import { routes } from './routes';

const matchedPath = (address: string) => matchRoutes(routes, address)?.at(-1)?.route.path;

const addresses: readonly [name: keyof typeof paths, address: string, route: string][] = [
  ['signIn', paths.signIn(), '/sign-in'],
  ['work', paths.work(), '/'],
  ['rations', paths.rations(), '/rations'],
  ['newRation', paths.newRation(), '/rations/new'],
  ['ration', paths.ration('r1'), '/rations/:rationId'],
  ['rationRelease', paths.rationRelease('r1'), '/rations/:rationId/release'],
  ['screening', paths.screening('s1'), '/screenings/:screeningId'],
  ['feedstuffs', paths.feedstuffs(), '/feedstuffs'],
  ['newFeedstuff', paths.newFeedstuff(), '/feedstuffs/new'],
  ['feedstuff', paths.feedstuff('corn-silage'), '/feedstuffs/:feedstuffId'],
  ['water', paths.water(), '/water'],
  ['reviewDesk', paths.reviewDesk(), '/review-desk'],
  ['review', paths.review('v1'), '/review-desk/:reviewId'],
  ['advisories', paths.advisories(), '/advisories'],
  ['advisory', paths.advisory('a1'), '/advisories/:advisoryId'],
  ['lots', paths.lots(), '/lots'],
  ['newLot', paths.newLot(), '/lots/new'],
  ['lot', paths.lot('l1'), '/lots/:lotId'],
  ['ledger', paths.ledger({ yard: 'y1', from: '2026-01-01', to: '2026-06-30' }), '/ledger'],
  ['yards', paths.yards(), '/yards'],
  ['yard', paths.yard('y1'), '/yards/:yardId'],
  ['people', paths.people(), '/people'],
  ['audit', paths.audit(), '/audit'],
  ['sources', paths.sources(), '/sources'],
];

describe('paths', () => {
  it.each(addresses)('%s leads to its route', (_name, address, route) => {
    // matchRoutes takes the path alone; a query would be part of the location's search.
    expect(matchedPath(address.replace(/\?.*$/, ''))).toBe(route);
  });

  it('are all listed here', () => {
    expect(addresses.map(([name]) => name).toSorted()).toEqual(Object.keys(paths).toSorted());
  });

  it('lead to every page of the route table', () => {
    const pagePaths = (list: typeof routes): string[] =>
      list.flatMap((route) => [...(route.path ? [route.path] : []), ...pagePaths(route.children ?? [])]);
    const reached = new Set(addresses.map(([, , route]) => route));
    expect(pagePaths(routes).filter((path) => path !== '*' && !reached.has(path))).toEqual([]);
  });

  it('send what leads nowhere to the page that says so', () => {
    expect(matchedPath('/no/such/page')).toBe('*');
  });
});
