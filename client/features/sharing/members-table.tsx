import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { memberRole, type MemberDto } from '#shared/schemas/sharing.ts';
import { useChangeRole, useRemoveMember } from './mutations.ts';
import { Part } from './part.tsx';
import { ROLE_OPTIONS, roleMay, roleName } from './role-words.ts';

interface MembersTableProps {
  glider: GliderDto;
  members: readonly MemberDto[];
}

/** The owner first, then everybody else with what they may do. */
export function MembersTable({ glider, members }: MembersTableProps) {
  const [removing, setRemoving] = useState<MemberDto | null>(null);
  const changeRole = useChangeRole(glider.id);
  const say = useToast();
  const { share } = glider.can;
  const change = (member: MemberDto, value: string) => {
    const role = memberRole.safeParse(value);
    if (!role.success) return;
    void changeRole.mutateAsync({ userId: member.userId, role: role.data }).then(
      () => say(`${member.name} is now a ${role.data}.`),
      (error: Error) => say(error.message),
    );
  };
  return (
    <Part title="Members">
      <Table caption={`Members of ${glider.name}`}>
        <thead>
          <tr>
            <Th>Name</Th>
            <Th>Role</Th>
            <Th className="max-sm:hidden">since</Th>
            {share && (
              <Th>
                <span className="sr-only">Actions</span>
              </Th>
            )}
          </tr>
        </thead>
        <tbody>
          {members.map((member) => (
            <tr key={member.userId}>
              <RowTh className="py-1.5">
                <span className="font-semibold">{member.name}</span>
                {member.you && <span className="text-graphite"> (you)</span>}
                {member.email && <span className="block text-note text-graphite">{member.email}</span>}
              </RowTh>
              <Td className="py-1.5">
                {share && member.role !== 'owner' ? (
                  <div className="w-32">
                    <Select
                      label={`Role of ${member.name}`}
                      hideLabel
                      keepRoom={false}
                      value={member.role}
                      options={ROLE_OPTIONS}
                      disabled={changeRole.isPending}
                      onValue={(value) => change(member, value)}
                    />
                  </div>
                ) : (
                  roleName(member.role)
                )}
                <span className="block text-note text-graphite max-sm:hidden">{roleMay(member.role)}</span>
              </Td>
              <Td className="whitespace-nowrap text-graphite max-sm:hidden">
                <time dateTime={member.joinedAt}>{formatMoment(member.joinedAt)}</time>
              </Td>
              {share && (
                <Td className="text-right">
                  {member.role !== 'owner' && (
                    <Button
                      variant="plain"
                      aria-label={`Remove ${member.name}`}
                      onClick={() => setRemoving(member)}
                    >
                      Remove
                    </Button>
                  )}
                </Td>
              )}
            </tr>
          ))}
        </tbody>
      </Table>
      {removing && <RemoveDialog glider={glider} member={removing} onClose={() => setRemoving(null)} />}
    </Part>
  );
}

interface RemoveDialogProps {
  glider: GliderDto;
  member: MemberDto;
  onClose: () => void;
}

function RemoveDialog({ glider, member, onClose }: RemoveDialogProps) {
  const remove = useRemoveMember(glider.id);
  const say = useToast();
  const confirm = () =>
    void remove.mutateAsync(member.userId).then(
      () => {
        onClose();
        say(`${member.name} no longer sees ${glider.name}.`);
      },
      () => undefined,
    );
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Remove ${member.name}?`}
      description={`What ${member.name} drew stays, with the name in the log. You may invite them again.`}
    >
      {remove.error && (
        <Notice tone="red" live>
          {remove.error.message}
        </Notice>
      )}
      <DialogActions>
        <Button onClick={onClose}>Keep</Button>
        <Button variant="danger" onClick={confirm} pending={remove.isPending} pendingText="Removing …">
          Remove {member.name}
        </Button>
      </DialogActions>
    </Dialog>
  );
}
