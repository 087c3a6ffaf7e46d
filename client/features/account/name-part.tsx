import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useSmallForm } from '#client/hooks/use-small-form.ts';
import { signUp } from '#shared/schemas/session.ts';
import type { AccountDto } from '#shared/schemas/account.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { Part } from './part.tsx';
import { useChangeAccount } from './queries.ts';

const nameOnly = signUp.pick({ name: true });

export function NamePart({ account }: { account: AccountDto }) {
  const change = useChangeAccount();
  const say = useToast();
  const { form, field, root, pending } = useSmallForm<{ name: string }>({
    names: ['name'],
    schema: () => Promise.resolve(nameOnly),
    send: async (body) => {
      const { name } = await change.mutateAsync(body);
      say(`You are called ${name} now.`);
    },
  });
  return (
    <Part
      title="Name"
      note="Stands on balance sheets and in the log. Sheets keep the name they were made with."
    >
      <form {...form} className="flex flex-wrap items-start gap-x-4">
        <div className="min-w-[min(14rem,100%)] max-w-sm flex-1">
          <TextField
            {...field('name')}
            label="Name"
            hideLabel
            autoComplete="name"
            maxLength={LIMITS.name.max}
            defaultValue={account.name}
          />
        </div>
        <Button type="submit" pending={pending} pendingText="Saving …">
          Change the name
        </Button>
        {root && (
          <Notice tone="red" live className="w-full">
            {root}
          </Notice>
        )}
      </form>
    </Part>
  );
}
