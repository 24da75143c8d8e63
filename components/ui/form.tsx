import { createContext, useContext, useMemo, useRef, type ReactNode } from 'react';
import { type CSSProperties } from 'react';

const SubmitContext = createContext<() => void>(() => undefined);

/** Sends the form around; a `Button submit` calls it. */
export const useFormSubmit = () => useContext(SubmitContext);

export interface FormProps {
  /** Accessible name of the form, e.g. `Sign in`. */
  label: string;
  onSubmit: () => void;
  children: ReactNode;
  style?: CSSProperties;
}

/**
 * A real form: Enter in a field sends it and password managers know it. Checking is the caller's
 * (react-hook-form with the zod contract), so the browser's own bubbles stay out.
 */
export function Form({ label, onSubmit, children, style }: FormProps) {
  const form = useRef<HTMLFormElement>(null);
  const submit = useMemo(() => () => form.current?.requestSubmit(), []);
  return (
    <SubmitContext.Provider value={submit}>
      <form
        ref={form}
        aria-label={label}
        noValidate
        style={{ display: 'flex', flexDirection: 'column', gap: 16, margin: 0, ...style }}
        onSubmit={(event) => {
          event.preventDefault();
          onSubmit();
        }}
      >
        {children}
        {/* Enter in one of several fields only sends a form that has a submit control. */}
        <input type="submit" hidden tabIndex={-1} value={label} />
      </form>
    </SubmitContext.Provider>
  );
}
