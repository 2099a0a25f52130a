import { MailboxScreen } from '../../canvas/panels/mailbox/MailboxScreen';

export default function MailRoute() {
  return <MailboxScreen />;
}
