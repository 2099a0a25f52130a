import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { Drawing } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import type { SetOut } from '../../../model/setOut';
import { IconButton } from '../../ui/IconButton';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';

export interface RunLedgerProps {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly runId: string;
  readonly selectedCourse: number | null;
  readonly onStep: (step: 1 | -1) => void;
  readonly onStepCourse: (step: 1 | -1) => void;
}

/** One fact of a ledger: its name, and its number at the right. */
export function Fact({ name, children }: { name: string; children: ReactNode }) {
  const { colours, strokes } = useTheme();
  return (
    <View
      style={{
        flexDirection: 'row',
        alignItems: 'baseline',
        justifyContent: 'space-between',
        gap: space.m,
        paddingVertical: space.s,
        borderTopWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <Txt tone="soft" style={{ flexShrink: 1 }}>
        {name}
      </Txt>
      {children}
    </View>
  );
}

/** The wall that is shown in numbers: its length, and what the bond makes of it; or the selected course's height. */
export function RunLedger({ drawing, setOut, runId, selectedCourse, onStep, onStepCourse }: RunLedgerProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const run = setOut.walls.runById.get(runId);
  const bond = setOut.bond.byRun.get(runId);
  const course = setOut.coursing.courses.find((each) => each.number === selectedCourse);
  if (!run) return null;
  const length = (value: Ticks, form: 'feet' | 'inches' = 'feet') => (
    <Measurement length={value} units={drawing.units} step={drawing.tapeStep} size="table" form={form} />
  );
  const pieces = course ? bond?.patterns[bond.patternByCourse[course.number - 1] ?? -1]?.pieces : undefined;
  const cut = pieces?.filter((piece) => piece.kind === 'closer').length ?? 0;
  return (
    <View
      style={{
        backgroundColor: colours.surface,
        borderTopWidth: strokes.hair,
        borderColor: colours.rule,
        paddingHorizontal: space.l,
        paddingTop: space.m,
        paddingBottom: space.s,
      }}
    >
      <Txt tone="soft">
        {course
          ? t('walls.courseTop', { number: course.number })
          : `${t('walls.run', { name: run.name })} · ${t('walls.length')}`}
      </Txt>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.s, paddingVertical: space.s }}>
        <View style={{ flex: 1 }}>
          <Measurement
            length={course ? course.top : run.length}
            units={drawing.units}
            step={drawing.tapeStep}
            size="ledger"
            form={course ? 'inches' : 'feet'}
          />
        </View>
        <IconButton icon="down" kind="outline" label={t('walls.courseDown')} onPress={() => onStepCourse(-1)} />
        <IconButton icon="up" kind="outline" label={t('walls.courseUp')} onPress={() => onStepCourse(1)} />
        <View style={{ width: space.s }} />
        <IconButton icon="back" kind="outline" label={t('walls.previous')} onPress={() => onStep(-1)} />
        <IconButton icon="forward" kind="outline" label={t('walls.next')} onPress={() => onStep(1)} />
      </View>
      {course ? (
        <>
          <Fact name={t('walls.joint')}>{length(course.joint, 'inches')}</Fact>
          <Fact name={t('walls.unitsInCourse')}>
            <Txt numeric size="table" weight="semibold">
              {(pieces?.length ?? 0) - cut}
            </Txt>
          </Fact>
          <Fact name={t('walls.closersInCourse')}>
            <Txt numeric size="table" weight="semibold">
              {cut}
            </Txt>
          </Fact>
        </>
      ) : (
        <>
          <Fact name={t('walls.courses')}>
            <Txt numeric size="table" weight="semibold">
              {setOut.coursing.courses.length}
            </Txt>
          </Fact>
          {bond ? (
            <>
              <Fact name={t('walls.lap')}>{length(bond.lap, 'inches')}</Fact>
              <NoCut run={run.length} closers={bond.closersPerCoursePair} noCut={bond.noCut} length={length} />
            </>
          ) : null}
        </>
      )}
    </View>
  );
}

interface NoCutProps {
  readonly run: Ticks;
  readonly closers: number;
  readonly noCut: { readonly below: Ticks | null; readonly above: Ticks | null };
  readonly length: (value: Ticks) => ReactNode;
}

/** Whether this length needs closers, and the nearest lengths that would not. */
function NoCut({ run, closers, noCut, length }: NoCutProps) {
  const t = useWords();
  if (noCut.below === run || noCut.above === run)
    return (
      <Fact name={t('walls.needsNoCut')}>
        <Txt numeric size="table" weight="semibold">
          {closers}
        </Txt>
      </Fact>
    );
  return (
    <>
      <Fact name={t('walls.closersPerPair')}>
        <Txt numeric size="table" weight="semibold">
          {closers}
        </Txt>
      </Fact>
      {noCut.below === null && noCut.above === null ? (
        <Fact name={t('walls.noCutNone')}>{null}</Fact>
      ) : (
        <Fact name={t('walls.noCut')}>
          <View style={{ flexDirection: 'row', alignItems: 'baseline', gap: space.s }}>
            {noCut.below === null ? null : length(noCut.below)}
            {noCut.below === null || noCut.above === null ? null : <Txt tone="soft">{t('walls.or')}</Txt>}
            {noCut.above === null ? null : length(noCut.above)}
          </View>
        </Fact>
      )}
    </>
  );
}
