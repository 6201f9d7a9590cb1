import { useRouter } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Invitation } from '@/shared/contracts/crew';
import { may, ROLE_NAMES } from '@/shared/roles/roles';
import { ApiError } from '../api/api-problem';
import { useCrew, useInvitations, useRevokeInvitation } from '../api/use-crew';
import { useSession } from '../api/use-session';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { PageFrame } from '../ui/PageFrame';
import { ErrorState, LoadingState, OfflineState } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { InviteDialog } from './InviteDialog';
import { MemberCard } from './MemberCard';

/** The people of the shop and who is invited. */
export function CrewScreen() {
  const router = useRouter();
  const { me } = useSession();
  const mayEdit = me !== null && may(me.role, 'crew.edit');
  const [inviting, setInviting] = useState(false);
  return (
    <PageFrame
      title="Crew"
      onNavigate={(href) => router.navigate(href as never)}
      actions={mayEdit && <Button label="Invite" icon="plus" look="primary" onPress={() => setInviting(true)} />}
    >
      <View style={styles.page}>
        <Members self={me?.personId} mayEdit={mayEdit} />
        <Invitations mayEdit={mayEdit} />
      </View>
      <InviteDialog open={inviting} onClose={() => setInviting(false)} />
    </PageFrame>
  );
}

function Members({ self, mayEdit }: { readonly self: string | undefined; readonly mayEdit: boolean }) {
  const { data, error, refetch } = useCrew();
  if (data)
    return data.members.map((member) => (
      <MemberCard key={member.personId} member={member} self={member.personId === self} mayEdit={mayEdit} />
    ));
  if (!error) return <LoadingState title="Fetching the crew" />;
  const again = <Button label="Try now" onPress={() => void refetch()} />;
  return error instanceof ApiError && error.problem.kind === 'offline' ? (
    <OfflineState body="The crew shows when the signal is back." actions={again} />
  ) : (
    <ErrorState title="The crew did not come" body={error.message} actions={again} />
  );
}

function Invitations({ mayEdit }: { readonly mayEdit: boolean }) {
  const { data } = useInvitations(mayEdit);
  if (!data || data.invitations.length === 0) return null;
  return (
    <>
      <Text kind="label" level={2}>
        Invited, not yet joined
      </Text>
      {data.invitations.map((invitation) => (
        <InvitationCard key={invitation.id} invitation={invitation} />
      ))}
    </>
  );
}

function InvitationCard({ invitation }: { readonly invitation: Invitation }) {
  const revoke = useRevokeInvitation();
  return (
    <Card>
      <View style={styles.row}>
        <View style={styles.words}>
          <Text kind="strong">{invitation.email}</Text>
          <Text kind="second">
            {`${ROLE_NAMES[invitation.role]}; the link works until ${new Date(invitation.expiresAt).toLocaleDateString()}`}
          </Text>
          {revoke.error && <Text kind="second">{revoke.error.message}</Text>}
        </View>
        <Button label="Take back" busy={revoke.isPending} onPress={() => revoke.mutate(invitation.id)} />
      </View>
    </Card>
  );
}

const styles = StyleSheet.create({
  page: { gap: space.m, maxWidth: 760 },
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.m },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 200, minWidth: 0 },
});
