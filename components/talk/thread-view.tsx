import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { v7 as uuid } from 'uuid';
import { type Comment, type Thread } from '../../shared/api/talk';
import { tell } from '../data/problems';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Rule, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { CommentView } from './comment-view';
import { type ReportSubject } from './report-dialog';
import { TextForm } from './text-form';
import { useDeleteComment, useEditComment, usePostComment, useSettle } from './talk-queries';

export interface ThreadViewProps {
  thread: Thread;
  where: string;
  canTalk: boolean;
  onReport: (subject: ReportSubject) => void;
}

/** A critique or question with its answers, the settling one first. */
export function ThreadView({ thread, where, canTalk, onReport }: ThreadViewProps) {
  const [answering, setAnswering] = useState(false);
  const [taking, setTaking] = useState<Comment | null>(null);
  const post = usePostComment(thread.planId);
  const edit = useEditComment(thread.planId);
  const remove = useDeleteComment(thread.planId);
  const settle = useSettle(thread.planId);
  const failed = { onError: (error: unknown) => toast({ text: tell(error).text }) };
  const common = (comment: Comment) => ({
    comment,
    onEdit: (text: string) => edit.mutateAsync({ commentId: comment.id, text }),
    onDelete: () => setTaking(comment),
    onReport: () => onReport({ kind: 'comment', id: comment.id, what: 'this comment' }),
  });
  const answers = [...thread.answers].sort(
    (a, b) => Number(b.id === thread.settledBy) - Number(a.id === thread.settledBy),
  );
  return (
    <Stack gap={12}>
      <CommentView {...common(thread)} where={where} settled={thread.settledBy !== null} />
      {answers.map((answer) => (
        <View
          key={answer.id}
          style={[styles.answer, answer.id === thread.settledBy && styles.settled]}
        >
          <CommentView
            {...common(answer)}
            settled={answer.id === thread.settledBy}
            more={
              thread.abilities.settle
                ? [
                    answer.id === thread.settledBy
                      ? {
                          label: 'Open it again',
                          onPress: () =>
                            settle.mutate({ commentId: thread.id, answerId: null }, failed),
                        }
                      : {
                          label: 'This settles it',
                          onPress: () =>
                            settle.mutate({ commentId: thread.id, answerId: answer.id }, failed),
                        },
                  ]
                : []
            }
          />
        </View>
      ))}
      {answering ? (
        <TextForm
          label="Answer"
          fieldLabel="Your answer"
          sendLabel="Answer"
          submit={(text) =>
            post.mutateAsync({ id: uuid(), kind: 'answer', parentId: thread.id, text })
          }
          onDone={() => setAnswering(false)}
        />
      ) : canTalk ? (
        <Button size="small" label="Answer" onPress={() => setAnswering(true)} />
      ) : null}
      <Rule />
      <Dialog
        open={taking !== null}
        title="Take your words back?"
        onClose={() => setTaking(null)}
        keep="Leave them"
        action={{
          label: 'Take them back',
          danger: true,
          onPress: () => {
            if (taking) remove.mutate(taking.id, failed);
            setTaking(null);
          },
        }}
      >
        <Text>They are gone for readers. A trace stays for those who answered.</Text>
      </Dialog>
    </Stack>
  );
}

const styles = StyleSheet.create({
  answer: {
    marginLeft: 12,
    paddingLeft: 12,
    borderLeftWidth: line.thin,
    borderLeftColor: colour.rule,
  },
  settled: { borderLeftWidth: line.thick, borderLeftColor: colour.holds },
});
