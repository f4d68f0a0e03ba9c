export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger';
export type ButtonSize = 'normal' | 'small';

const variants: Record<ButtonVariant, string> = {
  primary: 'bg-chaff-fill text-chaff-fill-ink hover:opacity-90 border-transparent font-medium',
  secondary: 'bg-panel border-field hover:border-ink font-medium',
  quiet: 'border-transparent hover:bg-line/50 underline decoration-chaff underline-offset-4',
  danger: 'bg-panel border-danger text-danger hover:bg-danger-soft font-medium',
};

const sizes: Record<ButtonSize, string> = { normal: 'min-h-10 px-4 py-2', small: 'min-h-8 px-2.5 py-1 text-sm' };

export const buttonClass = (variant: ButtonVariant, size: ButtonSize): string =>
  `inline-flex items-center justify-center gap-2 rounded-md border transition-colors disabled:cursor-not-allowed disabled:opacity-55 ${variants[variant]} ${sizes[size]}`;
