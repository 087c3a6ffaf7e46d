import { useEffect, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';

/** The first page is there before anything is kept for later, ms. */
const SETTLED = 2_000;

/** Says that a newer version is here; until it is taken, all goes on as before. */
export function NewerNotice() {
  const [take, setTake] = useState<(() => void) | null>(null);
  useEffect(() => {
    if (import.meta.env.DEV) return;
    const timer = setTimeout(() => {
      import('#client/lib/offline/newer-version.ts')
        .then(({ keepOnDevice }) => keepOnDevice((how) => setTake(() => how)))
        // Without it the product works as long as there is a connection.
        .catch(() => undefined);
    }, SETTLED);
    return () => clearTimeout(timer);
  }, []);
  if (!take) return null;
  return (
    <Notice
      tone="ink"
      word="Newer version:"
      live
      className="no-print mb-3"
      actions={
        <Button variant="primary" onClick={take}>
          Take it now
        </Button>
      }
    >
      What waits on this device stays and is sent as before.
    </Notice>
  );
}
