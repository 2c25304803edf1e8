import TextField from '@mui/material/TextField';
import { Controller, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

interface Props<T extends FieldValues> {
  control: Control<T>;
  name: FieldPath<T>;
  label: string;
  /** What to say when it is empty; without it the field may stay empty. */
  required?: string;
  minLength?: { value: number; message: string };
  maxLength?: number;
  multiline?: boolean;
  type?: 'text' | 'email' | 'password';
  autoComplete?: string;
}

/** A text field of a form; what is wrong stands under the field, and what was typed stays. */
export function FormTextField<T extends FieldValues>(props: Props<T>) {
  const {
    control,
    name,
    label,
    required,
    minLength,
    maxLength = 1_000,
    multiline,
    type = 'text',
    autoComplete,
  } = props;
  return (
    <Controller
      control={control}
      name={name}
      rules={{
        validate: (value: unknown) => {
          const text = typeof value === 'string' ? value.trim() : '';
          if (required && text === '') return required;
          if (minLength && text.length < minLength.value) return minLength.message;
          return true;
        },
      }}
      render={({ field, fieldState }) => (
        <TextField
          {...field}
          fullWidth
          type={type}
          label={label}
          multiline={multiline}
          minRows={multiline ? 2 : undefined}
          autoComplete={autoComplete}
          error={fieldState.invalid}
          helperText={fieldState.error?.message}
          slotProps={{ htmlInput: { maxLength } }}
        />
      )}
    />
  );
}
