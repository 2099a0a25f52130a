import { View } from 'react-native';
import type { Invitation } from '../../../model/contracts/sites';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { sayDate, sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';
import { PersonRow } from './PersonRow';

/** Someone who was asked and has not come yet. */
export function InvitationRow({ invitation, onRevoke }: { invitation: Invitation; onRevoke: () => void }) {
  const t = useWords();
  const now = useNow();
  const old = Date.parse(invitation.expiresAt) <= now;
  return (
    <PersonRow
      name={invitation.email}
      detail={t('crew.invitedBy', { by: invitation.invitedBy, when: sayWhen(t, invitation.createdAt, now) })}
      more={old ? t('crew.expired') : t('crew.expires', { when: sayDate(invitation.expiresAt) })}
      end={
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.m }}>
          <Txt weight="medium">{t(`common.roles.${invitation.role}`)}</Txt>
          <Button
            kind="quiet"
            size="body"
            label={t('crew.revoke')}
            spoken={t('crew.revokeSpoken', { email: invitation.email })}
            onPress={onRevoke}
          />
        </View>
      }
    />
  );
}
