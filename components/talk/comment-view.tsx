import { useState } from 'react';
import { View } from 'react-native';
import { type Comment } from '../../shared/api/talk';
import { IconButton } from '../ui/icon-button';
import { Row, Stack } from '../ui/layout';
import { Menu, type MenuItem } from '../ui/menu';
import { Prose } from '../ui/prose';
import { Tag } from '../ui/tag';
import { Text } from '../ui/text';
import { TextForm } from './text-form';

const day = (at: string) =>
  new Date(at).toLocaleDateString(undefined, { day: 'numeric', month: 'long', year: 'numeric' });

/** What stands in place of words that are gone. */
const absence = {
  deleted: 'Taken back by its writer.',
  hidden: 'Hidden by a moderator.',
  removed: 'Removed by a moderator.',
} as const;

export interface CommentViewProps {
  comment: Comment;
  /** Words for the anchor, e.g. `step 4`. */
  where?: string;
  settled?: boolean;
  onEdit: (text: string) => Promise<unknown>;
  onDelete: () => void;
  onReport: () => void;
  /** More actions, e.g. settling. */
  more?: readonly MenuItem[];
}

/** One comment: kind, place, words, reason, who, and what can be done with it. */
export function CommentView({
  comment,
  where,
  settled,
  onEdit,
  onDelete,
  onReport,
  more = [],
}: CommentViewProps) {
  const [editing, setEditing] = useState(false);
  const { abilities } = comment;
  const items: MenuItem[] = [
    ...more,
    ...(abilities.edit ? [{ label: 'Change my words', onPress: () => setEditing(true) }] : []),
    ...(abilities.report ? [{ label: 'Report it', onPress: onReport }] : []),
    ...(abilities.delete ? [{ label: 'Take it back', onPress: onDelete, danger: true }] : []),
  ];
  const gone = comment.state !== 'shown' && comment.text === '';
  return (
    <Stack gap={8}>
      <Row gap={8} wrap justify="space-between">
        <Row gap={8} wrap>
          {comment.kind === 'critique' ? (
            <Tag
              kind={comment.stance === 'change' ? 'on' : 'plain'}
              icon={comment.stance === 'change' ? 'edit' : 'tick'}
              label={comment.stance ?? 'critique'}
            />
          ) : null}
          {comment.kind === 'question' ? <Tag icon="question" label="question" /> : null}
          {where ? <Tag kind="reference" label={where} /> : null}
          {comment.state !== 'shown' && !gone ? <Tag kind="absent" label={comment.state} /> : null}
        </Row>
        {items.length > 0 ? (
          <Menu
            label="What to do with it"
            items={items}
            trigger={(t) => (
              <IconButton
                icon="more"
                label={`More about ${comment.author.displayName}’s words`}
                {...t}
              />
            )}
          />
        ) : null}
      </Row>
      {settled ? (
        <Text size="note" weight={600} tone="holdsText">
          settled
        </Text>
      ) : null}
      {editing ? (
        <TextForm
          label="Change my words"
          fieldLabel="Your words"
          sendLabel="Keep"
          start={comment.text}
          submit={onEdit}
          onDone={() => setEditing(false)}
        />
      ) : gone ? (
        <Text tone="ink3" italic>
          {absence[comment.state as keyof typeof absence]}
        </Text>
      ) : (
        <View>
          <Prose>{comment.text}</Prose>
          {comment.why ? <Text tone="ink2">Why: {comment.why}</Text> : null}
        </View>
      )}
      <Row gap={8} align="baseline" wrap>
        <Text size="note" weight={600}>
          {comment.author.displayName}
        </Text>
        <Text size="note" tone="ink2">
          {comment.byMaker ? 'maker, ' : ''}
          {day(comment.createdAt)}, rev {comment.letter}
          {comment.editedAt ? ', changed' : ''}
        </Text>
      </Row>
    </Stack>
  );
}
