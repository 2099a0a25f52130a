import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import type { RevisionSummary } from '../../../model/contracts/drawings';
import { Button } from '../../ui/Button';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';

/** Two states to lay side by side: revisions, and as the later one also the draft. */
export function ComparePick({ siteId, revisions }: { siteId: string; revisions: readonly RevisionSummary[] }) {
  const t = useWords();
  const router = useRouter();
  const phone = useLayout().name === 'phone';
  const [before, setBefore] = useState(String(revisions[0]?.number ?? ''));
  const [after, setAfter] = useState('draft');
  const numbered = revisions.map(({ number }) => ({
    value: String(number),
    label: t('revisions.revision', { number }),
  }));
  return (
    <View
      style={{
        flexDirection: phone ? 'column' : 'row',
        gap: space.l,
        alignItems: phone ? 'stretch' : 'flex-end',
        paddingHorizontal: phone ? space.l : 0,
      }}
    >
      <View style={{ flexDirection: 'row', gap: space.l, flex: phone ? undefined : 1 }}>
        <View style={{ flex: 1 }}>
          <Picker label={t('revisions.compare.before')} options={numbered} value={before} onChange={setBefore} />
        </View>
        <View style={{ flex: 1 }}>
          <Picker
            label={t('revisions.compare.after')}
            options={[{ value: 'draft', label: t('revisions.draft') }, ...numbered]}
            value={after}
            onChange={setAfter}
          />
        </View>
      </View>
      <Button
        label={t('revisions.compare.action')}
        disabled={before === after}
        onPress={() =>
          router.push({ pathname: '/sites/[siteId]/revisions/compare', params: { siteId, before, after } })
        }
      />
    </View>
  );
}
