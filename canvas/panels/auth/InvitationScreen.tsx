import { useRouter } from 'expo-router';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useAcceptInvitation, useInvitation } from '../../client/invitations';
import { signOut, useSession } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Failed, Loading } from '../../ui/States';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { rememberWhereTo } from './whereTo';

/** Where an invitation's link leads: who asks, to which site, as what; and how to accept, signed in or not. */
export function InvitationScreen({ token }: { token: string }) {
  const t = useWords();
  const router = useRouter();
  const { session } = useSession();
  const invitation = useInvitation(token);
  const accept = useAcceptInvitation(token);
  const toSites = <Button label={t('auth.invitation.toSites')} onPress={() => router.replace('/')} />;

  if (invitation.isPending)
    return (
      <AuthFrame title="">
        <Loading />
      </AuthFrame>
    );
  if (invitation.isError) {
    const unknown = invitation.error instanceof ApiError && invitation.error.code === 'notFound';
    return (
      <AuthFrame title={unknown ? t('auth.invitation.unknownTitle') : ''}>
        {unknown ? (
          <Txt size="large">{t('auth.invitation.unknown')}</Txt>
        ) : (
          <Failed text={errorWords(t, invitation.error)} onRetry={() => void invitation.refetch()} />
        )}
        {toSites}
      </AuthFrame>
    );
  }

  const { siteName, role, invitedBy, email, state } = invitation.data;
  const user = typeof session === 'object' ? session.in : null;
  const other = user !== null && user.email.toLowerCase() !== email.toLowerCase();

  function goAndComeBack(to: '/sign-in' | '/sign-up') {
    rememberWhereTo(`/invitation/${encodeURIComponent(token)}`);
    router.push(to);
  }

  async function join() {
    try {
      const { siteId } = await accept.mutateAsync();
      toast(t('auth.invitation.joined', { site: siteName }));
      router.replace({ pathname: '/sites/[siteId]/plan', params: { siteId } });
    } catch {
      // Shown below, from the mutation.
    }
  }

  async function switchPerson() {
    rememberWhereTo(`/invitation/${encodeURIComponent(token)}`);
    await signOut();
    router.replace('/sign-in');
  }

  const actions =
    state !== 'open' ? (
      <>
        <Caution
          weight="note"
          text={state === 'accepted' ? t('auth.invitation.accepted') : t('auth.invitation.expired')}
        />
        {toSites}
      </>
    ) : user === null ? (
      <>
        <Button kind="filled" label={t('auth.invitation.signUpFirst')} onPress={() => goAndComeBack('/sign-up')} />
        <Button label={t('auth.invitation.signInFirst')} onPress={() => goAndComeBack('/sign-in')} />
      </>
    ) : other ? (
      <>
        <Caution text={t('auth.invitation.otherEmail', { email: user.email, invited: email })} />
        <Button kind="filled" label={t('auth.invitation.switch')} onPress={() => void switchPerson()} />
        {toSites}
      </>
    ) : (
      <Button kind="filled" label={t('auth.invitation.accept')} busy={accept.isPending} onPress={() => void join()} />
    );

  return (
    <AuthFrame title={t('auth.invitation.title', { site: siteName })}>
      <Txt size="large">
        {t('auth.invitation.text', { by: invitedBy, role: t(`common.roles.${role}`).toLowerCase() })}
      </Txt>
      <Txt tone="soft">{t(`common.roleTells.${role}`)}</Txt>
      {user === null ? <Txt tone="soft">{t('auth.invitation.forEmail', { email })}</Txt> : null}
      {accept.isError ? <Caution text={errorWords(t, accept.error)} /> : null}
      {actions}
    </AuthFrame>
  );
}
