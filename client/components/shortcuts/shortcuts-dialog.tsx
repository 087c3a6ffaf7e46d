import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { Dialog } from '#client/components/ui/dialog.tsx';
import { shortcutBook, useSingleKeys, type ShortcutGroup } from './shortcut-book.ts';

const EVERYWHERE: ShortcutGroup = {
  title: 'Everywhere',
  shortcuts: [
    { keys: '?', what: 'This list' },
    { keys: 'Ctrl+Z', what: 'Undo, on a glider; on a Mac ⌘Z' },
    { keys: 'Ctrl+Shift+Z', what: 'Redo' },
    { keys: '↑ ↓', what: 'In a number field: one step more or less; with Shift ten' },
    { keys: 'Esc', what: 'Closes what is open' },
  ],
};

/** What the keys do here. */
export function ShortcutsDialog() {
  const on = useSingleKeys();
  const groups = [...shortcutBook.all(), EVERYWHERE].filter(({ shortcuts }) => shortcuts.length > 0);
  return (
    <Dialog open onOpenChange={shortcutBook.setOpen} title="Keys" wide>
      <div className="grid gap-x-8 gap-y-4 sm:grid-cols-2">
        {groups.map(({ title, shortcuts }) => (
          <section key={title} aria-label={title}>
            <h3 className="caption border-b border-rule pb-1">{title}</h3>
            <dl>
              {shortcuts.map(({ keys, what }) => (
                <div key={keys} className="flex items-baseline gap-x-3 border-b border-rule py-1.5">
                  <dt className="w-24 shrink-0">
                    <Keys keys={keys} />
                  </dt>
                  <dd className="min-w-0">{what}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
      <div className="mt-4">
        <Checkbox
          label="Single keys, such as ?, act"
          hint="Off, they do nothing; this list is then opened by its button."
          checked={on}
          onValue={shortcutBook.setOn}
        />
      </div>
    </Dialog>
  );
}

function Keys({ keys }: { keys: string }) {
  return (
    <span className="flex flex-wrap gap-1">
      {keys.split(/(?<=.)\+(?=.)|\s/).map((key) => (
        <kbd
          key={key}
          className="min-w-6 rounded-sm border border-strong-rule px-1.5 text-center font-sans text-note font-semibold"
        >
          {key.length === 1 ? key.toUpperCase() : key}
        </kbd>
      ))}
    </span>
  );
}
