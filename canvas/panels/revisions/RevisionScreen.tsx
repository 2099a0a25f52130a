import { useRouter } from 'expo-router';
import { View } from 'react-native';
import { sheetsAddress } from '../../client/revisions';
import { Banner, Empty } from '../../ui/States';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { useWords } from '../../ui/words';
import { PlanScreen } from '../plan/PlanScreen';
import { PageTitle } from '../shell/PageTitle';
import { RevisionProvider } from '../workspace/RevisionProvider';

/** A revision as it was saved, to be read: the plan's own screen over a drawing that nothing can change. */
export function RevisionScreen({ siteId, number }: { siteId: string; number: number }) {
  const t = useWords();
  const router = useRouter();
  if (!Number.isInteger(number) || number < 1) return <Empty icon="revisions" title={t('common.notFound.title')} />;
  return (
    <View style={{ flex: 1 }}>
      <PageTitle title={t('revisions.view.title', { number })} />
      <Banner
        icon="lock"
        text={t('revisions.view.title', { number })}
        action={
          <View style={{ flexDirection: 'row', gap: space.s }}>
            <Button
              kind="quiet"
              size="body"
              icon="print"
              label={t('revisions.view.sheets')}
              onPress={() => globalThis.open?.(sheetsAddress(siteId, number), '_blank', 'noopener')}
            />
            <Button
              size="body"
              label={t('common.close')}
              onPress={() => router.replace({ pathname: '/sites/[siteId]/revisions', params: { siteId } })}
            />
          </View>
        }
      />
      <RevisionProvider siteId={siteId} number={number}>
        <PlanScreen siteId={siteId} />
      </RevisionProvider>
    </View>
  );
}
