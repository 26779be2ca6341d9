import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** The levels that every screen meets; a default run of axe leaves the size of targets out. */
const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** Fails with the rule, the place and the reason of every finding on the screen as it stands. */
export async function expectAccessible(page: Page, screen: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  const findings = violations.flatMap(({ id, nodes }) =>
    nodes.map((node) => `${id} at ${node.target.join(' ')}: ${node.failureSummary ?? ''}`),
  );
  expect(findings, `what axe finds on ${screen}`).toEqual([]);
}
