import { useQuery } from '@tanstack/react-query';
import { QueryView } from '#client/components/query-view.tsx';
import { buttonClass } from '#client/components/ui/button.tsx';
import type { AccountDto } from '#shared/schemas/account.ts';
import type { ChosenUnits } from '#shared/format/units.ts';
import type { Theme } from '#shared/schemas/preferences.ts';
import { AddressPart } from './address-part.tsx';
import { BrowsersPart } from './browsers-part.tsx';
import { DeletionPart, type DeletionLinks } from './deletion-part.tsx';
import { NamePart } from './name-part.tsx';
import { NumberRules } from './number-rules.tsx';
import { Part } from './part.tsx';
import { PasswordPart } from './password-part.tsx';
import { accountQuery, EXPORT_HREF } from './queries.ts';
import { ThemeForm } from './theme-form.tsx';
import { UnitsForm } from './units-form.tsx';

interface AccountPlaceProps extends DeletionLinks {
  units: ChosenUnits;
  onUnits: (units: ChosenUnits) => void;
  theme: Theme;
  onTheme: (theme: Theme) => void;
  /** this browser is signed in no longer */
  onSignedOut: () => void;
}

/** Everything about the reader's own account. */
export function AccountPlace(props: AccountPlaceProps) {
  const query = useQuery(accountQuery);
  return <QueryView query={query}>{(account) => <Account {...props} account={account} />}</QueryView>;
}

function Account({ account, ...props }: AccountPlaceProps & { account: AccountDto }) {
  const { units, onUnits, theme, onTheme, onSignedOut, ...links } = props;
  return (
    <div className="max-w-5xl">
      <header className="mb-2">
        <h1 className="text-figure font-semibold">{account.name}’s account</h1>
        <p className="mt-1 text-graphite">{benchSentence(account)}</p>
      </header>
      <NamePart account={account} />
      <AddressPart account={account} />
      <Part title="Units" note="A choice shows at once, on every page, in print and in files.">
        <UnitsForm units={units} onUnits={onUnits} />
        <details className="mt-3">
          <summary className="opens">How numbers are written</summary>
          <div className="mt-2 max-w-2xl">
            <NumberRules />
          </div>
        </details>
      </Part>
      <Part title="Paper" note="Light, dark, or as the system has it.">
        <ThemeForm theme={theme} onTheme={onTheme} />
      </Part>
      <PasswordPart />
      <BrowsersPart onSignedOut={onSignedOut} />
      <Part
        title="Take everything with you"
        note="One JSON file: your gliders with every saved state and sheet, your materials, your choices. Each plan in it can be imported again."
      >
        <a href={EXPORT_HREF} download className={buttonClass('quiet')}>
          Download everything
        </a>
      </Part>
      <DeletionPart account={account} {...links} onDeleted={onSignedOut} />
    </div>
  );
}

function benchSentence({ gliders: { owned, shared } }: AccountDto): string {
  const own = owned === 1 ? '1 glider of your own' : `${owned} gliders of your own`;
  return shared === 0 ? `${own} on the bench.` : `${own} and ${shared} of others on the bench.`;
}
