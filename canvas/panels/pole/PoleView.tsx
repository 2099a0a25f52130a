import { useEffect, useMemo, useRef, useState } from 'react';
import { ScrollView, View } from 'react-native';
import type { Drawing } from '../../../model/drawing/schema';
import { poleFigure, usualGap } from '../../../model/figures/pole';
import type { Ticks } from '../../../model/length/ticks';
import type { PoleMark, PoleMarks } from '../../../model/marks/types';
import { FigureView } from '../../figures/FigureView';
import { labelScale } from '../../figures/labelScale';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { MarkRow } from './MarkRow';

export interface PoleViewProps {
  readonly drawing: Drawing;
  readonly marks: PoleMarks;
  /** Height of the selected mark, above the high point. */
  readonly selectedHeight: Ticks | null;
  readonly onPick: (mark: PoleMark) => void;
}

const ROW = 48;
const STRIP = 104;
/** Left of the steel, px. */
const INSET = 22;
/** From this width on the table has room for the distance from the foot. */
const FULL_WIDTH = 500;

/**
 * A pole and its marks as one thing: the strip of steel at the left, each mark led to its row of the table, both
 * scrolling together. The strip's scale makes a usual course as high as a row, so that leaders hardly bend.
 */
export function PoleView({ drawing, marks, selectedHeight, onPick }: PoleViewProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const scroll = useRef<ScrollView>(null);
  const [box, setBox] = useState({ width: 0, height: 0 });
  const tape = useMemo(() => ({ units: drawing.units, step: drawing.tapeStep }), [drawing.units, drawing.tapeStep]);
  const gap = usualGap(marks);
  const scale = ROW / gap;
  const { figure, rows } = useMemo(
    () =>
      poleFigure(drawing, marks, {
        scale: labelScale(scale),
        rowGap: ROW / scale,
        tableAt: (STRIP - INSET) / scale,
        selectedHeight,
        mostAbove: gap * 1.2,
      }),
    [drawing, marks, scale, selectedHeight, gap],
  );
  const top = (rows[0]?.y ?? marks.head) * scale + ROW * 1.5;
  const bottom = Math.min(marks.foot, marks.foundation) * scale - 12;
  const height = Math.max(1, top - bottom);
  const selectedY = rows.find((row) => row.mark.height === selectedHeight)?.y;

  useEffect(() => {
    if (selectedY === undefined || box.height === 0) return;
    scroll.current?.scrollTo({ y: Math.max(0, top - selectedY * scale - box.height / 2), animated: true });
  }, [selectedY, top, scale, box.height]);

  const full = box.width >= FULL_WIDTH;
  const camera = {
    x: (STRIP / 2 - INSET) / scale,
    y: (top - height / 2) / scale,
    scale,
  };
  return (
    <View
      style={{ flex: 1, minHeight: 0, backgroundColor: colours.surface }}
      onLayout={(event) => {
        const { width, height: tall } = event.nativeEvent.layout;
        setBox({ width, height: tall });
      }}
    >
      <View
        style={{
          flexDirection: 'row',
          gap: space.xs,
          paddingVertical: space.s,
          paddingHorizontal: space.s,
          paddingLeft: STRIP + space.s,
          borderBottomWidth: strokes.hair,
          borderColor: colours.rule,
        }}
      >
        <Txt size="small" tone="soft" style={{ flex: 1 }}>
          {t('poles.course')}
        </Txt>
        <Txt size="small" tone="soft" align="right" style={{ width: 104 }}>
          {t('poles.fromLine')}
        </Txt>
        {full ? (
          <Txt size="small" tone="soft" align="right" style={{ width: 96 }}>
            {t('poles.fromFoot')}
          </Txt>
        ) : null}
        <Txt size="small" tone="soft" align="right" style={{ width: full ? 130 : 84 }}>
          {full ? t('poles.aboveFoundation') : t('poles.aboveShort')}
        </Txt>
      </View>
      {rows.length === 0 ? (
        <Txt tone="soft" style={{ padding: space.l }}>
          {t('poles.noMarks')}
        </Txt>
      ) : null}
      <ScrollView ref={scroll} style={{ flex: 1 }}>
        <View
          role="group"
          aria-label={t('poles.tableLabel', { letter: marks.letter, lift: marks.lift })}
          style={{ height, backgroundColor: colours.surface }}
        >
          <View
            style={{
              position: 'absolute',
              left: 0,
              top: 0,
              bottom: 0,
              width: STRIP,
              backgroundColor: colours.selected,
            }}
          >
            <FigureView figure={figure} camera={camera} size={{ width: STRIP, height }} />
          </View>
          {rows.map(({ mark, y }) => (
            <View
              key={mark.height}
              style={{ position: 'absolute', left: STRIP, right: 0, top: top - y * scale - ROW / 2, height: ROW }}
            >
              <MarkRow
                mark={mark}
                tape={tape}
                full={full}
                height={ROW}
                selected={mark.height === selectedHeight}
                onPress={() => onPick(mark)}
              />
            </View>
          ))}
        </View>
      </ScrollView>
    </View>
  );
}
