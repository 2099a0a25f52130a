import { useId } from 'react';
import { View } from 'react-native';
import type { Role } from '../../../model/contracts/common';
import { radius, space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';

interface RoleListProps {
  readonly label: string;
  readonly roles: readonly Role[];
  readonly value: Role;
  readonly onChange: (role: Role) => void;
}

/** The roles with what each may do, one to be chosen: the browser's own radio buttons. */
export function RoleList({ label, roles, value, onChange }: RoleListProps) {
  const t = useWords();
  const name = useId();
  const { colours } = useTheme();
  return (
    <View role="radiogroup" aria-label={label} style={{ gap: space.s }}>
      <Txt weight="medium">{label}</Txt>
      <View style={{ borderWidth: 1, borderColor: colours.edge, borderRadius: radius, overflow: 'hidden' }}>
        {roles.map((role, index) => (
          <label
            key={role}
            style={{
              display: 'flex',
              gap: space.m,
              alignItems: 'flex-start',
              padding: space.m,
              cursor: 'pointer',
              borderTop: index === 0 ? 'none' : `1px solid ${colours.rule}`,
              backgroundColor: role === value ? colours.selected : colours.surface,
            }}
          >
            <input
              type="radio"
              name={name}
              checked={role === value}
              onChange={() => onChange(role)}
              style={{ width: 20, height: 20, margin: '2px 0 0', accentColor: colours.earthDeep, flexShrink: 0 }}
            />
            <View style={{ flexShrink: 1 }}>
              <Txt weight="semibold">{t(`common.roles.${role}`)}</Txt>
              <Txt tone="soft">{t(`common.roleTells.${role}`)}</Txt>
            </View>
          </label>
        ))}
      </View>
    </View>
  );
}
