import { useRouter } from 'expo-router';
import { ScrollView, View } from 'react-native';
import type { LocalMessage } from '../../../model/contracts/mail';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useMailbox } from '../../client/mailbox';
import { Header } from '../../ui/Header';
import { Empty, Failed, Loading } from '../../ui/States';
import { space, textSize, fonts } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { Paper } from '../shell/Paper';
import { partsOf } from './partsOf';

/** The mail that a local server caught instead of sending: open to anyone at that computer, signed in or not. */
export function MailboxScreen() {
  const t = useWords();
  const router = useRouter();
  const mailbox = useMailbox();
  const off = mailbox.error instanceof ApiError && mailbox.error.code === 'notFound';

  function back() {
    if (router.canGoBack()) router.back();
    else router.replace('/');
  }

  return (
    <Paper>
      <PageTitle title={t('auth.mail.title')} />
      <Header
        title={t('auth.mail.title')}
        subtitle={t('auth.mail.text')}
        onBack={back}
        backLabel={t('auth.mail.back')}
      />
      {off ? (
        <Empty icon="mail" title={t('auth.mail.off')} text={t('auth.mail.offText')} />
      ) : mailbox.data ? (
        <ScrollView role="main" contentContainerStyle={{ alignItems: 'center' }}>
          {mailbox.data.length === 0 ? (
            <Empty icon="mail" title={t('auth.mail.empty')} text={t('auth.mail.emptyText')} />
          ) : (
            mailbox.data.map((message) => <Message key={message.id} message={message} />)
          )}
        </ScrollView>
      ) : mailbox.isError ? (
        <Failed text={errorWords(t, mailbox.error)} onRetry={() => void mailbox.refetch()} />
      ) : (
        <Loading />
      )}
    </Paper>
  );
}

function Message({ message }: { message: LocalMessage }) {
  const t = useWords();
  const now = useNow();
  const { colours, strokes } = useTheme();
  return (
    <View
      style={{
        width: '100%',
        maxWidth: 760,
        padding: space.xl,
        gap: space.s,
        backgroundColor: colours.surface,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <Txt size="title" weight="semibold" role="heading" level={2}>
        {message.subject}
      </Txt>
      <Txt tone="soft">
        {t('auth.mail.to', { to: message.to })} · {sayWhen(t, message.at, now)}
      </Txt>
      <Txt size="large" style={{ marginTop: space.s }}>
        {partsOf(message.text, message.links).map((part, index) =>
          part.link ? (
            <a
              key={index}
              href={part.text}
              style={{
                color: colours.earthDeep,
                fontFamily: fonts.text,
                fontSize: textSize.large,
                overflowWrap: 'anywhere',
              }}
            >
              {part.text}
            </a>
          ) : (
            part.text
          ),
        )}
      </Txt>
    </View>
  );
}
