import { lazy, Suspense, useEffect } from 'react';
import { shortcutBook, useShortcutsOpen } from './shortcut-book.ts';

const ShortcutsDialog = lazy(async () => ({
  default: (await import('./shortcuts-dialog.tsx')).ShortcutsDialog,
}));

/** Listens for single keys, and shows what they do when `?` is pressed. Mounted once by the page's frame. */
export function Shortcuts() {
  const open = useShortcutsOpen();
  useEffect(() => {
    addEventListener('keydown', onKeyDown);
    return () => removeEventListener('keydown', onKeyDown);
  }, []);
  return (
    open && (
      <Suspense>
        <ShortcutsDialog />
      </Suspense>
    )
  );
}

function onKeyDown(event: KeyboardEvent): void {
  if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || event.isComposing) return;
  if (!shortcutBook.on() || isBusy(event.target)) return;
  if (event.key === '?') {
    event.preventDefault();
    shortcutBook.setOpen(true);
    return;
  }
  const found = shortcutBook
    .all()
    .flatMap(({ shortcuts }) => shortcuts)
    .find(({ keys, run }) => run && keys.toLowerCase() === event.key.toLowerCase());
  if (!found?.run) return;
  event.preventDefault();
  found.run();
}

/** In a field keys are letters; a dialog or a menu has keys of its own. */
function isBusy(target: EventTarget | null): boolean {
  if (document.querySelector('[role="dialog"], [role="alertdialog"], [role="menu"]')) return true;
  if (!(target instanceof HTMLElement)) return false;
  if (target instanceof HTMLInputElement && target.type === 'range') return false;
  return target.matches('input, textarea, select') || target.isContentEditable;
}
