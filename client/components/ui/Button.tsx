import type { ButtonHTMLAttributes } from 'react';

type Look = 'plain' | 'primary' | 'text';

const looks: Readonly<Record<Look, string>> = {
  plain: 'gw-button',
  primary: 'gw-button gw-button-primary',
  text: 'gw-button gw-button-text',
};

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** at most one primary button on a page */
  readonly look?: Look;
}

export function Button({ look = 'plain', type = 'button', className = '', ...rest }: ButtonProps) {
  return <button type={type} className={`${looks[look]} ${className}`} {...rest} />;
}
