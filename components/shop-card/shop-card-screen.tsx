import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { type ShopCard } from '../../shared/api/bench';
import { machineClasses } from '../../shared/plan/document';
import { machineName } from '../../shared/trade/machines';
import { SignedIn } from '../account/signed-in';
import { useSaveShopCard, useShopCard } from '../bench/bench-queries';
import { tell } from '../data/problems';
import { usePreferences } from '../data/preferences';
import { PageHead } from '../shell/page-head';
import { toast } from '../ui/announcer';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { Page, Row, Rule, Section, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';

/** What a person's shop has. */
export function ShopCardScreen() {
  return (
    <SignedIn title="Shop card" what="Your machines, stock and kerf, used by every bench copy.">
      {() => <Loaded />}
    </SignedIn>
  );
}

function Loaded() {
  const card = useShopCard();
  return (
    <>
      <PageHead title="Shop card" />
      <Page>
        {card.data ? (
          <CardForm key={card.data.version} version={card.data.version} start={card.data.card} />
        ) : card.isError ? (
          <ErrorState
            title="The shop card did not come"
            happened={tell(card.error).text}
            code={tell(card.error).code}
            onRetry={() => void card.refetch()}
          />
        ) : (
          <LoadingLines label="Loading your shop card" />
        )}
      </Page>
    </>
  );
}

function CardForm({ version, start }: { version: number; start: ShopCard }) {
  const [card, setCard] = useState(start);
  const save = useSaveShopCard();
  const keep = () =>
    save.mutate({ version, card }, { onSuccess: () => toast({ text: 'Shop card kept.' }) });
  return (
    <Form label="Shop card" onSubmit={keep}>
      {save.isError ? <Banner kind="fails">{tell(save.error).text}</Banner> : null}
      <TextField
        label="Kerf of your saw, as measured"
        value={card.kerf}
        onChange={(kerf) => setCard({ ...card, kerf })}
        help="As 1/8 in or 2.6 mm"
      />
      <TextField
        label="Drills on hand"
        value={card.drills}
        onChange={(drills) => setCard({ ...card, drills })}
        help="As 1/16 in, 5/64 in, 3 mm; the aid for screw holes picks from them"
      />
      <Machines card={card} setCard={setCard} />
      <UsualStock card={card} setCard={setCard} />
      <Button
        kind="primary"
        label="Keep the shop card"
        submit
        busy={save.isPending}
        busyLabel="Keeping it"
      />
    </Form>
  );
}

interface ListProps {
  card: ShopCard;
  setCard: (card: ShopCard) => void;
}

function Machines({ card, setCard }: ListProps) {
  const [{ terms }] = usePreferences();
  const nameOf = (machine: string) =>
    machineClasses.some((m) => m === machine)
      ? machineName(machine as (typeof machineClasses)[number], terms)
      : machine;
  const [machine, setMachine] = useState<(typeof machineClasses)[number]>('table-saw');
  const [name, setName] = useState('');
  return (
    <Section>
      <Heading level={2} note={String(card.machines.length)}>
        Machines
      </Heading>
      {card.machines.map((m) => (
        <Line
          key={m.id}
          words={`${nameOf(m.machine)}: ${m.name}`}
          onDrop={() => setCard({ ...card, machines: card.machines.filter((x) => x.id !== m.id) })}
        />
      ))}
      <Row gap={12} align="flex-end" wrap>
        <Select
          label="Machine"
          options={machineClasses.map((value) => ({ value, label: machineName(value, terms) }))}
          value={machine}
          onChange={setMachine}
        />
        <TextField label="Your name for it" value={name} onChange={setName} />
        <Button
          label="Add the machine"
          onPress={() => {
            if (name.trim() === '') return;
            setCard({
              ...card,
              machines: [
                ...card.machines,
                { id: uuid(), machine, name: name.trim(), limits: {}, dadoHead: false, note: '' },
              ],
            });
            setName('');
          }}
        />
      </Row>
    </Section>
  );
}

function UsualStock({ card, setCard }: ListProps) {
  const [stock, setStock] = useState({ name: '', thickness: '' });
  return (
    <Section>
      <Heading level={2} note={String(card.stock.length)}>
        Usual stock
      </Heading>
      {card.stock.map((s) => (
        <Line
          key={s.id}
          words={`${s.name}, ${s.thickness}`}
          onDrop={() => setCard({ ...card, stock: card.stock.filter((x) => x.id !== s.id) })}
        />
      ))}
      <Row gap={12} align="flex-end" wrap>
        <TextField
          label="Stock"
          value={stock.name}
          onChange={(value) => setStock({ ...stock, name: value })}
        />
        <TextField
          label="Thickness as measured"
          value={stock.thickness}
          onChange={(thickness) => setStock({ ...stock, thickness })}
        />
        <Button
          label="Add the stock"
          onPress={() => {
            if (stock.name.trim() === '') return;
            setCard({
              ...card,
              stock: [
                ...card.stock,
                {
                  id: uuid(),
                  name: stock.name.trim(),
                  form: 'sheet',
                  thickness: stock.thickness,
                  length: '',
                  width: '',
                  quantity: 1,
                  offcut: false,
                },
              ],
            });
            setStock({ name: '', thickness: '' });
          }}
        />
      </Row>
    </Section>
  );
}

function Line({ words, onDrop }: { words: string; onDrop: () => void }) {
  return (
    <Stack gap={8}>
      <Row justify="space-between" gap={12}>
        <Text style={{ flex: 1 }}>{words}</Text>
        <Button size="small" label={`Take ${words} off the card`} onPress={onDrop}>
          Take off
        </Button>
      </Row>
      <Rule />
    </Stack>
  );
}
