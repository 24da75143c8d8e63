import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { giveRuling, type rulingActs, siteRules, type CaseView } from '../../shared/api/cases';
import { limits } from '../../shared/api/limits';
import { ApiProblem, tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { RadioGroup } from '../ui/radio-group';
import { Select } from '../ui/select';
import { TextArea, TextField } from '../ui/text-field';
import { useGiveRuling } from './case-queries';

type Act = (typeof rulingActs)[number];

const acts: { value: Act; label: string; help: string }[] = [
  { value: 'no-action', label: 'No action', help: 'it stays as it is' },
  { value: 'hide', label: 'Hide', help: 'only the writer sees it' },
  { value: 'remove', label: 'Remove', help: 'gone for everyone' },
  { value: 'suspend', label: 'Suspend', help: 'the account is closed for a while' },
];

/** Rule, act and statement of reasons; the person concerned reads it. */
export function RulingForm({ view, person }: { view: CaseView; person: string }) {
  const give = useGiveRuling(view.id);
  const [id] = useState(() => uuid());
  const [rule, setRule] = useState('');
  const [act, setAct] = useState<Act | null>(null);
  const [reasons, setReasons] = useState('');
  const [days, setDays] = useState('30');
  const [faults, setFaults] = useState<Record<string, string>>({});
  const send = () => {
    const body = {
      id,
      act: act ?? 'no-action',
      rule: rule || null,
      reasons,
      ...(act === 'suspend' && days.trim() !== '' ? { days: Number(days) } : {}),
    };
    const found: Record<string, string> = Object.fromEntries(
      (giveRuling.body?.safeParse(body).error?.issues ?? []).map((i) => [
        String(i.path[0]),
        i.message,
      ]),
    );
    if (!act) found.act = 'Choose what is done.';
    if (act && act !== 'no-action' && !rule) found.rule = 'Name the rule that was broken.';
    setFaults(found);
    if (Object.keys(found).length > 0) return;
    give.mutate(body, {
      onError: (error) => {
        if (error instanceof ApiProblem)
          setFaults(Object.fromEntries(error.issues.map((i) => [String(i.path[0]), i.message])));
      },
    });
  };
  return (
    <Form label="Ruling" onSubmit={send}>
      <Heading level={2}>Ruling</Heading>
      {give.isError ? <Banner kind="fails">{tell(give.error).text}</Banner> : null}
      <Select
        label="Rule broken"
        placeholder="Choose a rule"
        options={siteRules.map((r) => ({
          value: r.code,
          label: `${r.code}. ${r.title}`,
        }))}
        value={rule}
        onChange={setRule}
        error={faults.rule}
      />
      <RadioGroup
        label="What is done"
        options={acts}
        value={act}
        onChange={setAct}
        error={faults.act}
      />
      {act === 'suspend' ? (
        <TextField
          label="For how many days"
          inputMode="numeric"
          value={days}
          onChange={setDays}
          error={faults.days}
          help="Empty for good."
        />
      ) : null}
      <TextArea
        label={`Statement of reasons, sent to ${person}`}
        value={reasons}
        onChange={setReasons}
        limit={limits.reason}
        error={faults.reasons}
        help="Says which rule, which facts, and that an appeal is open for six months; another moderator decides it."
      />
      <Button
        kind="primary"
        label="Give the ruling"
        submit
        busy={give.isPending}
        busyLabel="Giving it"
        wide
      />
    </Form>
  );
}
