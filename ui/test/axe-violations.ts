import axe from 'axe-core';

/** What axe finds in a drawn element, as readable lines; jsdom has no layout, so contrast is judged in the browser tests. */
export async function axeViolations(element: Element): Promise<string[]> {
  const { violations } = await axe.run(element, {
    rules: { 'color-contrast': { enabled: false }, region: { enabled: false } },
  });
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' | ')}`);
}
