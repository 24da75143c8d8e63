import { View } from 'react-native';
import { mendOf, type Mend } from '../../shared/plan/advice';
import { describeCheck, type CheckState } from '../../shared/plan/model';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { VerdictShape, verdictKind, verdictLook } from '../ui/verdict';
import { draftPreference } from './dimensions/facts';
import { type DraftEditor } from './use-draft-editor';
import { replacedDimension } from './with-dimension';

/** How a check stands, in words, and what would make it hold as a press each. */
export function CheckSaid({ state, editor }: { state: CheckState; editor: DraftEditor }) {
  const { model, document, change } = editor;
  const kind = state.error ? 'fails' : verdictKind(state.verdict);
  const mends = state.advice.flatMap((advice) => mendOf(model, state.id, advice) ?? []);
  const make = ({ dimension, label }: Mend) => {
    const before = document.dimensions.find((d) => d.id === dimension.id);
    change((d) => replacedDimension(d, dimension));
    toast({
      text: `Done: ${label.toLowerCase()}.`,
      ...(before && {
        action: {
          label: 'Put it back',
          onPress: () => change((d) => replacedDimension(d, before)),
        },
      }),
    });
  };
  return (
    <Stack gap={8}>
      <Row gap={12} align="flex-start">
        <View style={{ paddingTop: 4 }}>
          <VerdictShape kind={kind} label={verdictLook[kind].word} />
        </View>
        <Text size="note" style={{ flexShrink: 1 }}>
          {describeCheck(model, state, draftPreference(document.units))}
        </Text>
      </Row>
      {mends.length > 0 ? (
        <Row gap={8} wrap>
          {mends.map((mend) => (
            <Button key={mend.label} size="small" label={mend.label} onPress={() => make(mend)} />
          ))}
        </Row>
      ) : null}
    </Stack>
  );
}
