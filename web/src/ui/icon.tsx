import styled from 'styled-components';
import sprite from './icons.svg?raw';

export type IconName =
  | 'search' | 'down' | 'up' | 'sort' | 'pin' | 'out' | 'upl' | 'doc' | 'ok' | 'warn' | 'clock' | 'need' | 'over' | 'lock'
  | 'must' | 'plus' | 'x' | 'more' | 'print' | 'right' | 'left' | 'help' | 'play' | 'stop' | 'note' | 'back' | 'mail' | 'rod' | 'list' | 'limit' | 'score'
  | 'frontier' | 'menu' | 'person' | 'site'; // prettier-ignore

interface IconProps {
  name: IconName;
  /** Edge in px; 16 unless told. */
  size?: number;
  /** Spoken name. Leave out where words stand beside the icon. */
  label?: string;
}

/** One of our own icons, drawn in the colour of the text around it. Needs `<IconSprite>` once on the page. */
export function Icon({ name, size = 16, label }: IconProps) {
  return (
    <Svg
      width={size}
      height={size}
      role={label ? 'img' : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      <use href={`#mw-${name}`} />
    </Svg>
  );
}

/** Holds the drawings that `<Icon>` points at. */
export function IconSprite() {
  return <Store aria-hidden dangerouslySetInnerHTML={{ __html: sprite }} />;
}

const Svg = styled.svg`
  flex: none;
  display: inline-block;
  vertical-align: -0.15em;
`;

const Store = styled.div`
  position: absolute;
  width: 0;
  height: 0;
  overflow: hidden;
`;
