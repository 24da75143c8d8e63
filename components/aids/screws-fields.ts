import { woodScrews } from '../../shared/trade/screws.data';
import { type AidField, type Values } from './form-values';

/** Series and gauge: a number for the two inch series, a diameter for metric screws. */
export const screwParts = (values: Values): AidField[] => [
  {
    key: 'series',
    label: 'Series',
    kind: 'choice',
    options: [
      { value: 'us', label: 'American numbers' },
      { value: 'british', label: 'British numbers' },
      { value: 'metric', label: 'Metric, by diameter' },
    ],
    help: 'The two number series differ but for No. 8',
  },
  values.series === 'metric'
    ? { key: 'gauge', label: 'Diameter', kind: 'number', unit: 'mm' }
    : {
        key: 'gauge',
        label: 'Number',
        kind: 'number',
        help: `Made: ${woodScrews.map(({ number }) => number).join(' ')}`,
      },
];
