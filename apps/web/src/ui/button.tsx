import { chakra, type HTMLChakraProps, type RecipeVariantProps } from '@chakra-ui/react';
import type { ComponentType, ReactNode } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { buttonRecipe } from './button-recipe';

type Variants = NonNullable<RecipeVariantProps<typeof buttonRecipe>>;
type Icon = ComponentType<{ size?: number; 'aria-hidden'?: boolean }>;

const Base = chakra('button', buttonRecipe);
const LinkBase = chakra(Link, buttonRecipe);

const iconSize = { answer: 30, field: 22, office: 20 } as const;

function Face({
  icon: Mark,
  size,
  children,
}: {
  icon?: Icon;
  size: Variants['size'];
  children: ReactNode;
}) {
  const pixels = iconSize[typeof size === 'string' ? size : 'field'];
  return (
    <>
      {Mark && <Mark size={pixels} aria-hidden />}
      {children}
    </>
  );
}

export interface ButtonProps extends HTMLChakraProps<'button'> {
  look?: Variants['look'];
  size?: Variants['size'];
  /** As wide as what holds it. */
  wide?: boolean;
  icon?: Icon;
  /** Says that the work is under way; the button takes no second tap and keeps its place. */
  busy?: boolean;
}

export function Button({
  icon,
  busy = false,
  children,
  size = 'field',
  disabled,
  ...rest
}: ButtonProps) {
  return (
    <Base
      type="button"
      size={size}
      aria-busy={busy || undefined}
      disabled={disabled || busy}
      {...rest}
    >
      <Face size={size} {...(icon ? { icon } : {})}>
        {children}
      </Face>
    </Base>
  );
}

export interface LinkButtonProps extends Omit<LinkProps, 'color'> {
  look?: Variants['look'];
  size?: Variants['size'];
  wide?: boolean;
  icon?: Icon;
}

/** Looks like a button and is a link: it goes somewhere and changes nothing. */
export function LinkButton({ icon, children, size = 'field', ...rest }: LinkButtonProps) {
  return (
    <LinkBase size={size} {...rest}>
      <Face size={size} {...(icon ? { icon } : {})}>
        {children}
      </Face>
    </LinkBase>
  );
}

export interface IconButtonProps extends Omit<ButtonProps, 'icon' | 'children' | 'aria-label'> {
  icon: Icon;
  /** What the button does, for those who do not see the picture. */
  label: string;
}

export function IconButton({ label, look = 'quiet', ...rest }: IconButtonProps) {
  return <Button aria-label={label} title={label} look={look} px="2.5" {...rest} />;
}
