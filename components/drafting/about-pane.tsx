import { useState } from 'react';
import { uploadPhoto } from '../../shared/api/media';
import { limits } from '../../shared/api/limits';
import { upload } from '../data/api-client';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Checkbox } from '../ui/checkbox';
import { FilePick } from '../ui/file-pick';
import { Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { LimitedField } from './fields/limited-field';
import { type DraftEditor } from './use-draft-editor';

const categories = ['jig', 'bench-aid', 'storage', 'furniture', 'toy', 'garden', 'other'] as const;
const skills = [
  { value: 'first', label: 'a first build' },
  { value: 'some', label: 'some practice' },
  { value: 'practised', label: 'practised hands' },
] as const;

/** Title, summary, cover, licence. */
export function AboutPane({ editor: { document, change } }: { editor: DraftEditor }) {
  const [fault, setFault] = useState<string | undefined>();
  const set = (part: Partial<typeof document>) => change((d) => ({ ...d, ...part }));
  const licence = (part: Partial<typeof document.licence>) =>
    set({ licence: { ...document.licence, ...part } });
  const cover = async (file: File | undefined) => {
    if (!file) return;
    setFault(undefined);
    try {
      const { media } = await upload(uploadPhoto, file);
      set({ cover: media.hash });
    } catch (error) {
      setFault(tell(error).text);
    }
  };
  return (
    <Stack gap={16} style={{ maxWidth: 560, paddingTop: 16 }}>
      {fault ? <Banner kind="fails">{fault}</Banner> : null}
      <LimitedField
        label="Title"
        most={limits.title}
        value={document.title}
        onChange={(title) => set({ title })}
      />
      <LimitedField
        area
        label="What it is, in a few sentences"
        most={limits.summary}
        value={document.summary}
        onChange={(summary) => set({ summary })}
      />
      <Select
        label="Kind"
        options={categories.map((value) => ({ value, label: value.replace('-', ' ') }))}
        value={document.category}
        onChange={(category) => set({ category })}
      />
      <Select
        label="For"
        options={skills}
        value={document.skill}
        onChange={(skill) => set({ skill })}
      />
      <FilePick
        label="Cover picture"
        accept="image/*"
        maxBytes={limits.photoBytes}
        onFiles={(files) => void cover(files[0])}
      />
      <LimitedField
        label="What the cover shows, for those who cannot see it"
        most={limits.note}
        value={document.coverAlt}
        onChange={(coverAlt) => set({ coverAlt })}
      />
      <Checkbox
        label="Others may build it for themselves"
        value={document.licence.build}
        onChange={(build) => licence({ build })}
      />
      <Checkbox
        label="Others may sell what they build"
        value={document.licence.sell}
        onChange={(sell) => licence({ sell })}
      />
      <Checkbox
        label="Others may use it in a class"
        value={document.licence.teach}
        onChange={(teach) => licence({ teach })}
      />
    </Stack>
  );
}
