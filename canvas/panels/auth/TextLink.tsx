import { Link, type Href } from 'expo-router';
import { fonts, textSize, touch } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';

/** A link in words, tall enough to be touched. */
export function TextLink({ href, label }: { href: Href; label: string }) {
  const { colours } = useTheme();
  return (
    <Link
      href={href}
      style={{
        minHeight: touch,
        lineHeight: touch,
        color: colours.earthDeep,
        fontFamily: fonts.text,
        fontSize: textSize.large,
        fontWeight: '500',
        textDecorationLine: 'underline',
      }}
    >
      {label}
    </Link>
  );
}
