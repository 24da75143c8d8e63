import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { shopCardSchema } from '../../shared/api/bench';
import { useSaveShopCard, useShopCard } from '../bench/bench-queries';
import { tell } from '../data/problems';
import { toast } from '../ui/announcer';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { type Units, type Values } from './form-values';
import { type FromCard } from './screen';

interface SetUpsProps {
  aid: string;
  units: Units;
  values: Values;
  /** What the aid says now; nothing can be kept while it says nothing. */
  said: string | null;
  fromCard?: FromCard;
  onTake: (values: Values) => void;
}

/** Set-ups of this aid on the shop card: keep this one, start from an earlier one. */
export function SetUps({ aid, units, values, said, fromCard, onTake }: SetUpsProps) {
  const card = useShopCard();
  const save = useSaveShopCard();
  const [machine, setMachine] = useState('');
  if (!card.data) return null;
  const { version } = card.data;
  // A card kept on the device from before has no set-ups yet.
  const whole = shopCardSchema.parse(card.data.card);
  const own = whole.setups.filter((each) => each.aid === aid && each.units === units);
  const onCard = fromCard?.take(whole);
  const keep = () => {
    if (said === null) return;
    const entry = {
      id: uuid(),
      aid,
      units,
      machine: machine.trim(),
      on: new Date().toISOString().slice(0, 10),
      values: { ...values },
      said,
    };
    save.mutate(
      { version, card: { ...whole, setups: [...whole.setups, entry].slice(-200) } },
      { onSuccess: () => toast({ text: 'Kept on the shop card.' }) },
    );
  };
  return (
    <Section>
      <Heading level={2} note={String(own.length)}>
        On the shop card
      </Heading>
      {save.isError ? <Banner kind="fails">{tell(save.error).text}</Banner> : null}
      {fromCard && onCard ? (
        <Row>
          <Button label={fromCard.label} onPress={() => onTake({ ...values, ...onCard })} />
        </Row>
      ) : null}
      {[...own].reverse().map((each) => (
        <Stack key={each.id} gap={8}>
          <Text weight={600}>{[each.on, each.machine].filter(Boolean).join(', ')}</Text>
          <Text tone="ink2">{each.said}</Text>
          <Row>
            <Button
              size="small"
              label={`Start from ${[each.on, each.machine].filter(Boolean).join(', ')}`}
              onPress={() => onTake(each.values)}
            />
          </Row>
          <Rule />
        </Stack>
      ))}
      <Row gap={12} align="flex-end" wrap>
        <TextField
          label="Machine or job"
          optional
          value={machine}
          onChange={setMachine}
          maxLength={120}
        />
        <Button
          label="Keep this set-up"
          onPress={keep}
          disabled={said === null}
          busy={save.isPending}
          busyLabel="Keeping it"
        />
      </Row>
    </Section>
  );
}
