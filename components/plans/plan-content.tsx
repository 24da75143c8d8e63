import { useMemo, useState } from 'react';
import { Image, StyleSheet } from 'react-native';
import { mediaPath } from '../../shared/api/media';
import { type PlanPage } from '../../shared/api/plans';
import { type StickStep } from '../../shared/plan/stick/types';
import { useOwnFigures } from '../data/own-figures';
import { usePreferences } from '../data/preferences';
import { PageHead } from '../shell/page-head';
import { PlanStick } from '../story-stick/plan-stick';
import { StoryStick } from '../story-stick/story-stick';
import { TalkPanel } from '../talk/talk-panel';
import { Banner } from '../ui/banner';
import { Heading } from '../ui/heading';
import { Page, Panes, Row, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { CheckList } from './check-list';
import { ClipPlayer } from './clip-player';
import { changedFrom, OwnMachine, readingsOf } from './own-machine';
import { PartsTable } from './parts-table';
import { PlanAside } from './plan-aside';
import { PlanLists } from './plan-lists';
import { usePlanValues } from './plan-model';
import { stickOf } from './plan-stick-input';
import { StepBody } from './step-body';

/** The plan's figures as the maker built it, and with the reader's own readings. */
function useOwnValues({ id, document }: PlanPage) {
  const { typed } = useOwnFigures(id);
  const [{ units }] = usePreferences();
  const readings = useMemo(() => readingsOf(document, typed, units), [document, typed, units]);
  const maker = usePlanValues(document);
  const values = usePlanValues(document, readings);
  const changed = useMemo(() => changedFrom(values, maker), [values, maker]);
  return { maker, values, changed };
}

/** A published plan, laid out as the drawing it is. */
export function PlanContent({ page }: { page: PlanPage }) {
  const { document } = page;
  const { maker, values, changed } = useOwnValues(page);
  const stick = useMemo(
    () => stickOf(document, page.talk.bySteps, undefined, values.model),
    [document, page.talk.bySteps, values.model],
  );
  const [seek, setSeek] = useState<{ seconds: number } | null>(null);
  const [now, setNow] = useState<number | null>(null);
  const goTo = (id: string) => {
    const step = stick.steps.find((s) => s.id === id);
    if (step) setSeek({ seconds: step.start });
  };
  return (
    <Panes asideLabel="Plan at a glance" aside={<PlanAside page={page} values={values} />}>
      <PageHead title={document.title} back="/" description={document.summary} />
      <Page>
        <State page={page} />
        <Row gap={24} align="flex-start" wrap>
          <Stack gap={12} style={styles.words}>
            <Text tone="ink2">
              {page.maker.displayName}
              {page.maker.shopName ? `, ${page.maker.shopName}` : ''}. Rev {page.revision.letter},{' '}
              {new Date(page.revision.publishedAt).toLocaleDateString(undefined, {
                day: 'numeric',
                month: 'long',
              })}
            </Text>
            <Text size="lead">{document.summary}</Text>
          </Stack>
          {document.cover ? (
            <Image
              source={{ uri: mediaPath(document.cover, 'large') }}
              style={styles.cover}
              alt={document.coverAlt}
              resizeMode="contain"
            />
          ) : null}
        </Row>
        <Section>
          <Heading level={2} note={`${document.steps.length} steps`}>
            Steps on the story stick
          </Heading>
          <StoryStick
            input={stick}
            label={`Story stick of ${document.title}`}
            now={now}
            onStep={goTo}
            onSeek={(seconds) => setSeek({ seconds })}
          />
          <ClipPlayer
            clip={document.clip}
            seek={seek}
            onTime={setNow}
            label={`Clip of ${document.title}`}
            cover={document.cover}
          />
          <PlanStick
            steps={stick.steps}
            label="Steps"
            headingLevel={3}
            renderBody={(step: StickStep) => (
              <StepBody
                step={document.steps[step.number - 1]!}
                document={document}
                values={values}
                changed={changed}
              />
            )}
          />
        </Section>
        <OwnMachine planId={page.id} document={document} values={values} changed={changed.size} />
        <Section>
          <Heading level={2} note={`${document.parts.length}`}>
            Cut list
          </Heading>
          <PartsTable document={document} values={values} maker={maker} />
        </Section>
        {document.checks.length > 0 ? (
          <Section>
            <Heading level={2}>Checks</Heading>
            <CheckList checks={document.checks} values={values} />
          </Section>
        ) : null}
        <PlanLists document={document} values={values} />
        <Section>
          <Heading level={2} note={`${page.talk.critiques + page.talk.questions}`}>
            Talk
          </Heading>
          <TalkPanel planId={page.id} document={document} />
        </Section>
      </Page>
    </Panes>
  );
}

function State({ page }: { page: PlanPage }) {
  const newest = page.revisions[0];
  return (
    <>
      {page.state !== 'published' ? (
        <Banner kind="risk">
          {page.state === 'unpublished'
            ? 'Off the lists: only you and bench copies see it.'
            : 'Taken down by a moderator.'}
        </Banner>
      ) : null}
      {newest && newest.letter !== page.revision.letter ? (
        <Banner kind="note">
          You look at rev {page.revision.letter}.{' '}
          <Link href={`/plans/${page.slug}`}>Rev {newest.letter} is the newest</Link>
        </Banner>
      ) : null}
      {page.revision.overrides.map((o) => (
        <Banner key={`${o.rule}${o.elementId ?? ''}`} kind="fails" announce={false}>
          {o.message} The maker published it all the same: {o.reason}
        </Banner>
      ))}
    </>
  );
}

const styles = StyleSheet.create({
  words: { flex: 1, minWidth: 240, alignSelf: 'auto' },
  cover: { width: 260, height: 130, borderWidth: line.thin, borderColor: colour.ruleThin },
});
