import { DropdownMenu } from 'radix-ui';
import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

interface MenuProps {
  /** A button; it opens the menu. */
  trigger: ReactNode;
  align?: 'start' | 'end';
  /** Open from the first. */
  defaultOpen?: boolean;
  children: ReactNode;
}

/** A list of commands that opens from a button. */
export function Menu({ trigger, align = 'end', defaultOpen = false, children }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false} defaultOpen={defaultOpen}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      {/* Inside the page's main part, so that no landmark is left when it opens. */}
      <DropdownMenu.Portal container={document.getElementById('main')}>
        <DropdownMenu.Content
          align={align}
          sideOffset={4}
          collisionPadding={8}
          className="z-50 max-h-(--radix-dropdown-menu-content-available-height) min-w-48 overflow-y-auto rounded-md border border-strong-rule bg-sheet py-1 shadow-float"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

const ITEM =
  'flex min-h-row cursor-pointer items-center gap-2 px-3 text-left outline-none select-none ' +
  'data-[highlighted]:bg-ink-wash data-[highlighted]:text-ink data-[disabled]:cursor-default data-[disabled]:text-graphite';

interface MenuItemProps {
  onSelect: () => void;
  danger?: boolean;
  disabled?: boolean;
  children: ReactNode;
}

export function MenuItem({ onSelect, danger = false, disabled = false, children }: MenuItemProps) {
  return (
    <DropdownMenu.Item disabled={disabled} onSelect={onSelect} className={cn(ITEM, danger && 'text-red')}>
      {children}
    </DropdownMenu.Item>
  );
}

interface MenuChoiceProps<T extends string> {
  label: string;
  value: T;
  options: readonly { value: T; label: string }[];
  onValue: (value: T) => void;
}

/** One of several, ticked. */
export function MenuChoice<T extends string>({ label, value, options, onValue }: MenuChoiceProps<T>) {
  return (
    <DropdownMenu.RadioGroup
      value={value}
      onValueChange={(next) => {
        const option = options.find((o) => o.value === next);
        if (option) onValue(option.value);
      }}
    >
      <DropdownMenu.Label className="caption px-3 pt-1.5 pb-1">{label}</DropdownMenu.Label>
      {options.map((option) => (
        <DropdownMenu.RadioItem key={option.value} value={option.value} className={ITEM}>
          <span aria-hidden="true" className="w-4">
            <DropdownMenu.ItemIndicator>✓</DropdownMenu.ItemIndicator>
          </span>
          {option.label}
        </DropdownMenu.RadioItem>
      ))}
    </DropdownMenu.RadioGroup>
  );
}

export function MenuLine() {
  return <DropdownMenu.Separator className="my-1 border-t border-rule" />;
}
