import { View } from 'react-native';
import { ROLES, type Role } from '../../../model/contracts/common';
import type { Member } from '../../../model/contracts/sites';
import { useChangeRole } from '../../client/crew';
import { IconButton } from '../../ui/IconButton';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { sayDate } from '../../ui/when';
import { useWords } from '../../ui/words';
import { crewErrorWords } from './crewErrorWords';
import { PersonRow } from './PersonRow';

interface MemberRowProps {
  readonly siteId: string;
  readonly member: Member;
  readonly me: boolean;
  readonly manages: boolean;
  readonly onRemove: () => void;
}

/** One of the crew: a lead may change the role or remove them, and everyone may leave. */
export function MemberRow({ siteId, member, me, manages, onRemove }: MemberRowProps) {
  const t = useWords();
  const change = useChangeRole(siteId);

  async function giveRole(role: Role) {
    try {
      await change.mutateAsync({ userId: member.userId, role });
      toast(t('crew.roleChanged', { name: member.name, role: t(`common.roles.${role}`).toLowerCase() }));
    } catch (error) {
      toast(crewErrorWords(t, error), { tone: 'caution' });
    }
  }

  const role = change.isPending ? change.variables.role : member.role;
  return (
    <PersonRow
      name={me ? t('crew.you', { name: member.name }) : member.name}
      detail={member.email}
      more={t('crew.joined', { when: sayDate(member.joinedAt) })}
      end={
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.xs }}>
          {manages ? (
            <Picker
              label={t('crew.roleOf', { name: member.name })}
              hideLabel
              value={role}
              disabled={change.isPending}
              options={ROLES.map((value) => ({ value, label: t(`common.roles.${value}`) }))}
              onChange={(value) => void giveRole(value)}
            />
          ) : (
            <Txt weight="medium">{t(`common.roles.${member.role}`)}</Txt>
          )}
          {me ? (
            <IconButton icon="signOut" label={t('crew.leave')} onPress={onRemove} />
          ) : manages ? (
            <IconButton icon="close" label={t('crew.removeSpoken', { name: member.name })} onPress={onRemove} />
          ) : null}
        </View>
      }
    />
  );
}
