import { type PlanDocument } from '../../shared/plan/document';
import { Figure } from '../ui/figure';
import { Heading } from '../ui/heading';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Tag } from '../ui/tag';
import { Text } from '../ui/text';
import { type PlanValues } from './plan-model';

const disclosures = {
  none: 'earns the maker nothing',
  affiliate: 'affiliate: the maker earns on it',
  sponsored: 'sponsored',
  'own-product': 'the maker’s own product',
} as const;

/** Stock, hardware, tools, links and credits. */
export function PlanLists({ document, values }: { document: PlanDocument; values: PlanValues }) {
  return (
    <>
      <Section>
        <Heading level={2}>What you need</Heading>
        {document.stock.map((stock) => (
          <Line
            key={stock.id}
            count={stock.quantity}
            name={stock.name}
            note={stock.note || stock.material}
          />
        ))}
        {document.hardware.map((item) => (
          <Line key={item.id} count={item.quantity} name={item.name} note={item.note} />
        ))}
        {document.consumables.map((item) => (
          <Line key={item.id} name={item.name} note={item.note} />
        ))}
      </Section>
      <Section>
        <Heading level={2}>Tools</Heading>
        {document.tools.map((tool) => (
          <Line
            key={tool.id}
            name={tool.name}
            note={tool.instead ? `Or: ${tool.instead}` : tool.needed ? '' : 'helps, not needed'}
          />
        ))}
      </Section>
      {document.links.length > 0 ? (
        <Section>
          <Heading level={2}>Links</Heading>
          {document.links.map((link) => (
            <Row key={link.id} gap={12} wrap align="baseline">
              <Link href={link.url}>{link.title}</Link>
              <Tag label={disclosures[link.disclosure ?? 'none']} />
            </Row>
          ))}
        </Section>
      ) : null}
      {document.credits.length > 0 ? (
        <Section>
          <Heading level={2}>Builds on</Heading>
          {document.credits.map((credit) => (
            <Text key={credit.id}>
              {credit.url ? <Link href={credit.url}>{credit.text}</Link> : credit.text}
            </Text>
          ))}
        </Section>
      ) : null}
      <Text size="small" tone="ink2">
        Figures in {values.preference.system === 'mm' ? 'millimetres' : 'inches'}; change them under
        You.
      </Text>
    </>
  );
}

function Line({ count, name, note }: { count?: number; name: string; note?: string }) {
  return (
    <Stack gap={4}>
      <Row gap={8} align="baseline">
        {count === undefined ? null : <Figure figure={{ whole: count }} weight={600} />}
        <Text>{name}</Text>
      </Row>
      {note ? (
        <Text size="note" tone="ink2">
          {note}
        </Text>
      ) : null}
      <Rule />
    </Stack>
  );
}
