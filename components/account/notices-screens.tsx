import { siteRules } from '../../shared/api/cases';
import { PageHead } from '../shell/page-head';
import { Heading } from '../ui/heading';
import { Page, Section, Stack } from '../ui/layout';
import { Text } from '../ui/text';

/** The usual notice about machines, in full. */
export function SafetyScreen() {
  return (
    <>
      <PageHead title="Safety notice" back="/you" />
      <Page>
        <Stack gap={16}>
          <Text>
            Workshop machines maim. A plan here is one person’s way of doing a thing; you answer for
            your own hands.
          </Text>
          <Text>
            Follow your machine’s manual first, then local codes, then licensed practice. Where a
            plan says otherwise, they win.
          </Text>
          <Text>
            Keep guards on. Where a cut cannot pass the guard, use the cover, hold-down or jig that
            replaces it, and put the guard back before the next cut.
          </Text>
          <Text>
            Isolate the power before your hands go near a blade or bit. Let it stop by itself before
            you reach past it.
          </Text>
          <Text>
            No gloves, loose sleeves, jewellery or loose hair near anything that turns. Eyes, ears
            and lungs covered.
          </Text>
          <Text>Do not touch this screen while a blade turns.</Text>
          <Text weight={600}>A check that holds is not a promise of safety.</Text>
        </Stack>
      </Page>
    </>
  );
}

/** The site's rules, as rulings name them. */
export function RulesScreen() {
  return (
    <>
      <PageHead title="Rules of the place" back="/you" />
      <Page>
        <Text>
          Anyone can report a plan, a comment or a person. A moderator looks, decides and says why;
          the person concerned may answer.
        </Text>
        {siteRules.map((rule) => (
          <Section key={rule.code}>
            <Heading level={2} note={rule.code}>
              {rule.title}
            </Heading>
            <Text>{rule.text}</Text>
          </Section>
        ))}
      </Page>
    </>
  );
}

export function TermsScreen() {
  return (
    <>
      <PageHead title="Terms" back="/you" />
      <Page>
        <Stack gap={16}>
          <Text>
            What you publish stays yours. You let us show it, and let builders use it as the plan’s
            own licence says.
          </Text>
          <Text>
            Your e-mail is used to confirm it is yours and to tell you what concerns you. It is not
            shown to others.
          </Text>
          <Text>Your readings, ticks and notes at the bench are yours alone.</Text>
          <Text>
            We may take down what breaks the rules of the place, with reasons, and you may answer.
          </Text>
          <Text>
            Plans come with no promise that they suit your shop. The safety notice applies to all of
            them.
          </Text>
        </Stack>
      </Page>
    </>
  );
}
