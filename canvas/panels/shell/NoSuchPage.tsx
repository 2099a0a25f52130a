import { useRouter } from 'expo-router';
import { Button } from '../../ui/Button';
import { Empty } from '../../ui/States';
import { useWords } from '../../ui/words';
import { PageTitle } from './PageTitle';
import { Paper } from './Paper';

export function NoSuchPage() {
  const t = useWords();
  const router = useRouter();
  return (
    <Paper>
      <PageTitle title={t('common.notFound.title')} />
      <Empty
        icon="plan"
        title={t('common.notFound.title')}
        text={t('common.notFound.text')}
        action={<Button kind="filled" label={t('common.notFound.home')} onPress={() => router.replace('/')} />}
      />
    </Paper>
  );
}
