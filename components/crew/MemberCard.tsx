import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { CrewMember } from '@/shared/contracts/crew';
import { ROLE_NAMES } from '@/shared/roles/roles';
import { useChangeRole, useRemoveMember } from '../api/use-crew';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Dialog } from '../ui/Dialog';
import { IconButton } from '../ui/IconButton';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';
import { ROLE_CHOICES } from './role-choices';

export interface MemberCardProps {
  readonly member: CrewMember;
  /** The person who looks at it. */
  readonly self: boolean;
  readonly mayEdit: boolean;
}

/** One person of the crew; owners give another role or take somebody out. */
export function MemberCard({ member, self, mayEdit }: MemberCardProps) {
  const [leaving, setLeaving] = useState(false);
  const change = useChangeRole();
  const remove = useRemoveMember();
  const toast = useToast();
  const give = (role: CrewMember['role'], undo?: CrewMember['role']) =>
    change.mutate(
      { personId: member.personId, role },
      {
        onSuccess: () =>
          toast({
            text: `${member.name} is now ${ROLE_NAMES[role].toLowerCase()}`,
            ...(undo && { action: { label: 'Undo', onPress: () => give(undo) } }),
          }),
      },
    );
  return (
    <Card>
      <View style={styles.row}>
        <View style={styles.words}>
          <Text kind="rowTitle" level={2}>
            {self ? `${member.name} (you)` : member.name}
          </Text>
          <Text kind="second">{member.email}</Text>
          {!mayEdit && <Text kind="second">{ROLE_NAMES[member.role]}</Text>}
        </View>
        {mayEdit && (
          <View style={styles.role}>
            <Select
              label={`Role of ${member.name}`}
              labelHidden
              options={ROLE_CHOICES}
              value={member.role}
              error={change.error?.message}
              onChange={(role) => give(role, member.role)}
            />
          </View>
        )}
        {mayEdit && (
          <IconButton icon="bin" label={`Take ${member.name} out of the crew`} onPress={() => setLeaving(true)} />
        )}
      </View>
      <Dialog
        open={leaving}
        title={`Take ${member.name} out of the crew?`}
        onClose={() => setLeaving(false)}
        actions={
          <>
            <Button label="Keep" onPress={() => setLeaving(false)} />
            <Button
              label="Take out"
              look="primary"
              busy={remove.isPending}
              onPress={() => remove.mutate(member.personId, { onSuccess: () => setLeaving(false) })}
            />
          </>
        }
      >
        <Text>
          {remove.error?.message ??
            'They are signed out everywhere at once. What they measured, drew and signed stays under their name.'}
        </Text>
      </Dialog>
    </Card>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.m },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 200, minWidth: 0 },
  role: { flexGrow: 1, flexBasis: 150, maxWidth: 220 },
});
