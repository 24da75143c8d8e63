import { useEffect } from 'react';
import { announce } from '../ui/announcer';

/** The first page is read by the screen reader itself; only later ones need help. */
let arrivedOnce = false;

const isVisible = (element: HTMLElement) => element.getClientRects().length > 0;

function pageHeading(): HTMLElement | undefined {
  return [...document.querySelectorAll<HTMLElement>('[data-page-heading]')].find(isVisible);
}

/** Focus may be taken while nobody is using it: on the page, the frame or the link that led here. */
function focusIsIdle(): boolean {
  const active = document.activeElement;
  return (
    !active ||
    active === document.body ||
    active.getAttribute('role') === 'main' ||
    active.tagName === 'MAIN' ||
    active.closest('nav') !== null ||
    active.hasAttribute('data-page-heading') ||
    !document.contains(active)
  );
}

/**
 * After a navigation in the client: reads the title out and puts the focus on the page's h1, so
 * the keyboard and the screen reader are where the eye is. A title that comes later (after
 * loading) is read then.
 */
export function useArrival(title: string): void {
  useEffect(() => {
    if (!arrivedOnce) {
      arrivedOnce = true;
      return;
    }
    announce(title);
    if (!focusIsIdle()) return;
    const target = pageHeading() ?? document.querySelector<HTMLElement>('main');
    target?.focus({ preventScroll: true });
  }, [title]);

  useEffect(() => {
    // A page reached by Back keeps the place the browser restores.
    const cameByLink = window.history.state !== null;
    if (arrivedOnce && cameByLink && !window.location.hash) window.scrollTo(0, 0);
  }, []);
}
