import { useEffect, type ReactNode } from 'react';

interface FormBoxProps {
  id: string;
  onClose: () => void;
  children: ReactNode;
}

/** A form under its row; Escape closes it from anywhere that has no Escape of its own. */
export function FormBox({ id, onClose, children }: FormBoxProps) {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key !== 'Escape' || event.defaultPrevented) return;
      if (document.querySelector('[role="dialog"], [role="alertdialog"], [role="menu"]')) return;
      onClose();
    };
    addEventListener('keydown', onKeyDown);
    return () => removeEventListener('keydown', onKeyDown);
  }, [onClose]);
  return (
    <div id={id} data-form="" className="mb-3 border border-ink p-3">
      {children}
    </div>
  );
}
