import { type Deps } from '../../deps';
import { type PageHead } from '../../http/web';
import { frozenRevision } from './frozen';
import { findPlanBySlug } from './plans.repository';

/** Title, description and schema.org HowTo of a published plan's page. */
export async function headFor(deps: Deps, path: string): Promise<PageHead | null> {
  const slug = /^\/plans\/([^/]+)$/.exec(path)?.[1];
  if (!slug) return null;
  const plan = await findPlanBySlug(deps.db, slug);
  if (!plan || plan.state !== 'published' || !plan.currentRevisionId) return null;
  const revision = await frozenRevision(deps.db, plan.currentRevisionId);
  if (!revision) return null;
  const { document, facts } = revision;
  return {
    title: `${document.title} · Scantling`,
    description: document.summary,
    jsonLd: {
      '@context': 'https://schema.org',
      '@type': 'HowTo',
      name: document.title,
      description: document.summary,
      totalTime: `PT${Math.round(facts.elapsed)}M`,
      tool: document.tools.map((tool) => ({ '@type': 'HowToTool', name: tool.name })),
      supply: document.stock.map((stock) => ({ '@type': 'HowToSupply', name: stock.name })),
      step: document.steps.map((step, i) => ({
        '@type': 'HowToStep',
        position: i + 1,
        name: step.title,
      })),
    },
  };
}
