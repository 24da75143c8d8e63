import { useId, useState, type DragEvent } from 'react';
import { Button } from './button';
import { FieldError } from './field';
import { Text } from './text';
import { colour, line } from './tokens';

export interface FilePickProps {
  /** The button's words: `Choose a clip`. */
  label: string;
  onFiles: (files: File[]) => void;
  /** As of the file input: `.vtt,.srt` or `image/*`. */
  accept?: string;
  multiple?: boolean;
  /** Largest size in bytes of one file. */
  maxBytes?: number;
  /** What may come and how large, below. */
  help?: string;
  error?: string;
  disabled?: boolean;
  /** A dashed field files can be dropped on, as well as the button. */
  drop?: boolean;
}

/** `.vtt` or `image/*` or `image/png`, as the browser's own picker reads them. */
export function accepts(file: Pick<File, 'name' | 'type'>, accept: string | undefined): boolean {
  if (!accept) return true;
  return accept.split(',').some((raw) => {
    const want = raw.trim().toLowerCase();
    if (want.startsWith('.')) return file.name.toLowerCase().endsWith(want);
    if (want.endsWith('/*')) return file.type.startsWith(want.slice(0, -1));
    return file.type === want;
  });
}

const megabytes = (bytes: number) => `${Math.round(bytes / 1024 / 1024)} MB`;

/** The reason why files can't be taken, or undefined. Nothing is taken when one of them is wrong. */
export function refusal(
  files: File[],
  p: Pick<FilePickProps, 'accept' | 'maxBytes' | 'multiple'>,
): string | undefined {
  const odd = files.find((f) => !accepts(f, p.accept));
  if (odd)
    return `${odd.name} is not a file of that kind. Nothing was taken. Choose ${p.accept ?? 'another'}.`;
  const big = files.find((f) => p.maxBytes !== undefined && f.size > p.maxBytes);
  if (big) {
    return `${big.name} has ${megabytes(big.size)}; the most is ${megabytes(p.maxBytes ?? 0)}. Nothing was taken.`;
  }
  if (!p.multiple && files.length > 1) return 'One file at a time. Nothing was taken.';
  return undefined;
}

/** Takes files by a button and, with `drop`, from a drag. Wrong ones are refused with the reason. */
export function FilePick(props: FilePickProps) {
  const id = useId();
  const [over, setOver] = useState(false);
  const [refused, setRefused] = useState<string>();
  const take = (list: FileList | null) => {
    const files = [...(list ?? [])];
    if (files.length === 0) return;
    const reason = refusal(files, props);
    setRefused(reason);
    if (!reason) props.onFiles(files);
  };
  const dropHandlers = props.drop && !props.disabled ? dragHandlers(setOver, take) : {};
  const error = props.error ?? refused;
  return (
    <div
      {...dropHandlers}
      style={{ ...(props.drop ? dropField : plain), ...(over ? overField : {}) }}
    >
      <input
        id={id}
        type="file"
        hidden
        accept={props.accept}
        multiple={props.multiple}
        disabled={props.disabled}
        onChange={(event) => {
          take(event.currentTarget.files);
          event.currentTarget.value = '';
        }}
      />
      <Button
        label={props.label}
        icon="upload"
        disabled={props.disabled}
        describedBy={error ? `${id}-error` : undefined}
        onPress={() => document.getElementById(id)?.click()}
      />
      {props.drop ? (
        <Text size="note" tone="ink2">
          {over ? 'Let go to take it' : 'or drop it here'}
        </Text>
      ) : null}
      {props.help ? (
        <Text size="small" tone="ink2">
          {props.help}
        </Text>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}

function dragHandlers(setOver: (over: boolean) => void, take: (files: FileList) => void) {
  return {
    onDragOver: (event: DragEvent) => {
      event.preventDefault();
      setOver(true);
    },
    onDragLeave: () => setOver(false),
    onDrop: (event: DragEvent) => {
      event.preventDefault();
      setOver(false);
      take(event.dataTransfer.files);
    },
  };
}

const plain = { display: 'flex', flexDirection: 'column', gap: 6 } as const;
const dropField = {
  ...plain,
  padding: 16,
  border: `${line.medium}px dashed ${colour.rule}`,
} as const;
const overField = { borderColor: colour.blue, background: colour.blueWash } as const;
