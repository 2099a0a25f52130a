import { useState } from 'react';
import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import type { Invitation, Member } from '../../../model/contracts/sites';
import { useCrew } from '../../client/crew';
import { errorWords } from '../../client/errorWords';
import { useSession } from '../../client/session';
import { useSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Header } from '../../ui/Header';
import { Failed, Loading } from '../../ui/States';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { Page, Rows } from '../shell/Page';
import { PageTitle } from '../shell/PageTitle';
import { Section } from '../shell/Section';
import { InvitationRow } from './InvitationRow';
import { InviteDialog } from './InviteDialog';
import { MemberRow } from './MemberRow';
import { RemoveDialog } from './RemoveDialog';
import { RevokeDialog } from './RevokeDialog';

type Open =
  | { readonly kind: 'invite' }
  | { readonly kind: 'remove'; readonly member: Member }
  | { readonly kind: 'revoke'; readonly invitation: Invitation };

/** Who belongs to the site and as what. Leads invite, give roles and remove; everyone may leave. */
export function CrewScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const crew = useCrew(siteId);
  const site = useSite(siteId).data;
  const { session } = useSession();
  const { colours } = useTheme();
  const phone = useLayout().name === 'phone';
  const [open, setOpen] = useState<Open | null>(null);
  const close = () => setOpen(null);
  const manages = site !== undefined && may(site.role, 'manageCrew');
  const userId = typeof session === 'object' ? session.in.id : null;

  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('crew.title')} · ${site?.name ?? ''}`} />
      <Header
        title={t('crew.title')}
        subtitle={
          site && crew.data ? `${site.name} · ${t('crew.subtitle', { count: crew.data.members.length })}` : site?.name
        }
        actions={
          manages ? (
            <Button kind="filled" label={t('crew.invite')} onPress={() => setOpen({ kind: 'invite' })} />
          ) : undefined
        }
      />
      {crew.data ? (
        <Page>
          <Section title={t('crew.members')}>
            {manages ? null : (
              <View style={{ paddingHorizontal: phone ? space.l : 0 }}>
                <Caution weight="note" text={t('crew.onlyLeads')} />
              </View>
            )}
            <Rows label={t('crew.members')}>
              {crew.data.members.map((member) => (
                <MemberRow
                  key={member.userId}
                  siteId={siteId}
                  member={member}
                  me={member.userId === userId}
                  manages={manages}
                  onRemove={() => setOpen({ kind: 'remove', member })}
                />
              ))}
            </Rows>
          </Section>
          {manages ? (
            <Section title={t('crew.invited')}>
              {crew.data.invitations.length === 0 ? (
                <Txt tone="soft" style={{ paddingHorizontal: phone ? space.l : 0 }}>
                  {t('crew.noneInvited')}
                </Txt>
              ) : (
                <Rows label={t('crew.invited')}>
                  {crew.data.invitations.map((invitation) => (
                    <InvitationRow
                      key={invitation.id}
                      invitation={invitation}
                      onRevoke={() => setOpen({ kind: 'revoke', invitation })}
                    />
                  ))}
                </Rows>
              )}
            </Section>
          ) : null}
        </Page>
      ) : crew.isError ? (
        <Failed text={errorWords(t, crew.error)} onRetry={() => void crew.refetch()} />
      ) : (
        <Loading />
      )}
      {open?.kind === 'invite' ? <InviteDialog siteId={siteId} onClose={close} /> : null}
      {open?.kind === 'remove' ? (
        <RemoveDialog
          siteId={siteId}
          siteName={site?.name ?? ''}
          member={open.member}
          me={open.member.userId === userId}
          onClose={close}
        />
      ) : null}
      {open?.kind === 'revoke' ? <RevokeDialog siteId={siteId} invitation={open.invitation} onClose={close} /> : null}
    </View>
  );
}
