import { useRouter } from 'expo-router';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { writeLength } from '../../../model/length/write';
import type { Ticks } from '../../../model/length/ticks';
import { Button } from '../../ui/Button';
import { Header } from '../../ui/Header';
import { Measurement } from '../../ui/Measurement';
import { Empty } from '../../ui/States';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { Page, Rows } from '../shell/Page';
import { PageTitle } from '../shell/PageTitle';
import { Section } from '../shell/Section';
import { useSolved, useWorkspace } from '../workspace/workspace';
import { useDraftLine } from '../workspace/useDraftLine';
import { wordVolume } from './volume';

/** One line of the takeoff. The first of a list is the one to order by, and is set larger. */
function Line(props: { name: string; note?: string; main?: boolean; children: ReactNode }) {
  const { colours, strokes } = useTheme();
  const { name, note, main = false, children } = props;
  return (
    <View
      role="listitem"
      style={{
        flexDirection: 'row',
        alignItems: 'center',
        justifyContent: 'space-between',
        gap: space.l,
        minHeight: 48,
        paddingHorizontal: space.l,
        paddingVertical: space.s,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <View style={{ flexShrink: 1 }}>
        <Txt size={main ? 'large' : 'body'} weight={main ? 'semibold' : 'regular'}>
          {name}
        </Txt>
        {note ? <Txt tone="soft">{note}</Txt> : null}
      </View>
      {children}
    </View>
  );
}

function Count({ value, main = false }: { value: number | string; main?: boolean }) {
  return (
    <Txt
      numeric
      size={main ? 'row' : 'table'}
      weight={main ? 'semibold' : 'medium'}
      align="right"
      style={{ flexShrink: 0 }}
    >
      {value}
    </Txt>
  );
}

/** Lengths cut alike, with how many of them: 2 × 10′ 0″. */
function alike(cuts: readonly Ticks[]): [Ticks, number][] {
  const counts = new Map<Ticks, number>();
  for (const cut of cuts) counts.set(cut, (counts.get(cut) ?? 0) + 1);
  return [...counts];
}

/** Everything to order, counted from the drawing. */
export function TakeoffScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const router = useRouter();
  const { colours } = useTheme();
  const { siteName } = useWorkspace();
  const line = useDraftLine();
  const { drawing, setOut } = useSolved();
  const { takeoff } = setOut;
  const { units } = drawing;
  const write = (length: Ticks) => writeLength(length, { units, step: drawing.tapeStep });
  const writeSize = (length: Ticks) =>
    writeLength(length, { units, step: drawing.tapeStep, style: units === 'imperial' ? 'inches' : 'mm' });
  const type = drawing.wallTypes[0];
  const heading = (
    <>
      <PageTitle title={`${t('takeoff.title')} · ${siteName}`} />
      <Header title={t('takeoff.title')} subtitle={line} />
    </>
  );
  if (takeoff.units.total === 0 || !type)
    return (
      <View style={{ flex: 1, backgroundColor: colours.ground }}>
        {heading}
        <Empty
          icon="takeoff"
          title={t('takeoff.empty')}
          text={t('takeoff.emptyText')}
          action={
            <Button
              label={t('common.nav.plan')}
              onPress={() => router.push({ pathname: '/sites/[siteId]/plan', params: { siteId } })}
            />
          }
        />
      </View>
    );
  const { mortar, poles } = takeoff;
  const volume = (cubic: number) => wordVolume(cubic, units, t);
  const length = (value: Ticks) => (
    <Measurement length={value} units={units} step={drawing.tapeStep} size="table" weight="medium" form="feet" />
  );
  const laid = (whole: number, cut: number) => t('takeoff.laid', { whole, cut });
  const beamName = new Map(drawing.bondBeams.map((beam) => [beam.id, beam.name]));
  const stock = new Map<string, { count: number; cuts: readonly Ticks[]; left: Ticks }>();
  for (const { cuts, left } of poles.stock) {
    const key = `${cuts.join(' ')} ${left}`;
    stock.set(key, { count: (stock.get(key)?.count ?? 0) + 1, cuts, left });
  }
  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      {heading}
      <Page>
        <Section
          title={t('takeoff.units')}
          text={t('takeoff.unitsText', {
            unit: type.unitName,
            length: writeSize(type.unit.length),
            width: writeSize(type.unit.width),
            height: writeSize(type.unit.height),
          })}
        >
          <Rows label={t('takeoff.units')}>
            <Line name={t('takeoff.total')} note={t('takeoff.noWaste')} main>
              <Count value={takeoff.units.total} main />
            </Line>
            <Line name={t('takeoff.whole')}>
              <Count value={takeoff.units.whole} />
            </Line>
            <Line name={t('takeoff.closers')}>
              <Count value={takeoff.units.closers} />
            </Line>
            <Line name={t('takeoff.cutFrom')}>
              <Count value={takeoff.units.cutFrom} />
            </Line>
          </Rows>
        </Section>
        {takeoff.unitsByLift.length > 1 ? (
          <Section title={t('takeoff.byLift')}>
            <Rows label={t('takeoff.byLift')}>
              {takeoff.unitsByLift.map(({ lift, count }) => (
                <Line key={lift} name={t('takeoff.lift', { number: lift })} note={laid(count.whole, count.closers)}>
                  <Count value={count.total} />
                </Line>
              ))}
            </Rows>
          </Section>
        ) : null}
        <Section title={t('takeoff.byWall')}>
          <Rows label={t('takeoff.byWall')}>
            {takeoff.unitsByRun.map(({ runId, count }) => (
              <Line
                key={runId}
                name={t('takeoff.wall', { name: setOut.walls.runById.get(runId)?.name ?? '' })}
                note={laid(count.whole, count.closers)}
              >
                <Count value={count.total} />
              </Line>
            ))}
          </Rows>
        </Section>
        <Section title={t('takeoff.mortar')} text={t('takeoff.mortarText', { mortar: type.mortarName })}>
          <Rows label={t('takeoff.mortar')}>
            <Line name={t('takeoff.bedding')}>
              <Count value={volume(mortar.bedding)} />
            </Line>
            <Line name={t('takeoff.bed')}>
              <Count value={volume(mortar.bed)} />
            </Line>
            <Line name={t('takeoff.head')}>
              <Count value={volume(mortar.head)} />
            </Line>
          </Rows>
        </Section>
        {takeoff.beams.length > 0 ? (
          <Section title={t('takeoff.beams')}>
            <Rows label={t('takeoff.beams')}>
              {takeoff.beams.flatMap((beam) => [
                <Line
                  key={`${beam.beamId} length`}
                  name={beamName.get(beam.beamId) ?? ''}
                  note={t('takeoff.beamLength')}
                  main
                >
                  {length(beam.length)}
                </Line>,
                <Line key={`${beam.beamId} concrete`} name={t('takeoff.concrete')}>
                  <Count value={volume(beam.concrete)} />
                </Line>,
                <Line key={`${beam.beamId} bar`} name={t('takeoff.bar')}>
                  {length(beam.bar)}
                </Line>,
              ])}
            </Rows>
          </Section>
        ) : null}
        <Section title={t('takeoff.lintels')} text={takeoff.lintels.length === 0 ? t('takeoff.noLintels') : undefined}>
          <Rows label={t('takeoff.lintels')}>
            {takeoff.lintels.map((lintel) => (
              <Line
                key={`${lintel.length} ${lintel.depth}`}
                name={t('takeoff.lintel', {
                  count: lintel.count,
                  length: write(lintel.length),
                  depth: writeSize(lintel.depth),
                })}
              >
                <Count value={lintel.count} />
              </Line>
            ))}
          </Rows>
        </Section>
        <Section title={t('takeoff.poles')}>
          <Rows label={t('takeoff.poles')}>
            {[...stock.values()].map((bars) => (
              <Line
                key={`${bars.cuts.join(' ')} ${bars.left}`}
                name={t('takeoff.stock', { length: write(drawing.poleKit.stockLength) })}
                note={t('takeoff.cuts', {
                  cuts: alike(bars.cuts)
                    .map(([cut, count]) => `${count} × ${write(cut)}`)
                    .join(', '),
                  left: write(bars.left),
                })}
                main
              >
                <Count value={t('takeoff.stockCount', { count: bars.count })} />
              </Line>
            ))}
            <Line name={t('takeoff.poleCount')}>
              <Count value={poles.count} />
            </Line>
            <Line name={t('takeoff.braces')}>
              <Count value={poles.braces} />
            </Line>
            <Line name={t('takeoff.lineBlocks')}>
              <Count value={poles.lineBlocks} />
            </Line>
            <Line name={t('takeoff.line')}>{length(poles.line)}</Line>
          </Rows>
        </Section>
      </Page>
    </View>
  );
}
