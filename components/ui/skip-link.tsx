/** First thing a keyboard reaches: past the rail, to the content. Shown while it has the focus. */
export function SkipLink({ to }: { to: string }) {
  return (
    <a href={`#${to}`} data-skip-link="">
      To the content
    </a>
  );
}
