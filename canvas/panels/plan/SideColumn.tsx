import { ScrollView, View } from 'react-native';
import { Choice } from '../../ui/Choice';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { BuildingFields } from '../inspector/BuildingFields';
import { Inspector } from '../inspector/Inspector';
import { ReasonsPanel } from './ReasonsPanel';
import { PoleBeside, WallBeside } from './SideViews';

export type SideTab = 'wall' | 'pole' | 'details' | 'building' | 'reasons';

export interface SideColumnProps {
  readonly tab: SideTab;
  readonly onTab: (tab: SideTab) => void;
}

/** Beside the plan: on a wide screen the wall over whatever else is chosen, on a tablet one of them at a time. */
export function SideColumn({ tab, onTab }: SideColumnProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const wide = useLayout().name === 'wide';
  const shown = wide && tab === 'wall' ? 'pole' : tab;
  const options = [
    ...(wide ? [] : [{ value: 'wall' as const, label: t('plan.elevation') }]),
    { value: 'pole' as const, label: t('plan.poleTab') },
    { value: 'details' as const, label: t('plan.sizes') },
    ...(wide ? [{ value: 'building' as const, label: t('plan.building') }] : []),
    { value: 'reasons' as const, label: t('plan.fits') },
  ];
  return (
    <View
      role="complementary"
      aria-label={t('plan.side')}
      style={{
        width: wide ? '42%' : 360,
        maxWidth: 640,
        borderLeftWidth: strokes.hair,
        borderColor: colours.rule,
        backgroundColor: colours.surface,
      }}
    >
      {wide ? (
        <View
          style={{
            height: '45%',
            backgroundColor: colours.ground,
            borderBottomWidth: strokes.hair,
            borderColor: colours.rule,
          }}
        >
          <WallBeside />
        </View>
      ) : null}
      <View style={{ padding: space.s }}>
        <Choice label={t('plan.side')} hideLabel options={options} value={shown} onChange={onTab} />
      </View>
      <View style={{ flex: 1, minHeight: 0 }}>
        {shown === 'wall' ? <WallBeside /> : null}
        {shown === 'pole' ? <PoleBeside /> : null}
        {shown === 'details' ? (
          <Scrolled>
            <Inspector />
          </Scrolled>
        ) : null}
        {shown === 'building' ? (
          <Scrolled>
            <BuildingFields />
          </Scrolled>
        ) : null}
        {shown === 'reasons' ? (
          <Scrolled>
            <ReasonsPanel />
          </Scrolled>
        ) : null}
      </View>
    </View>
  );
}

function Scrolled({ children }: { children: React.ReactNode }) {
  return (
    <ScrollView style={{ flex: 1 }} contentContainerStyle={{ padding: space.l, gap: space.l }}>
      {children}
    </ScrollView>
  );
}
