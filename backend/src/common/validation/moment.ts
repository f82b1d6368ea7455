import { registerDecorator, type ValidationArguments } from 'class-validator';

const FORM = /^(\d{4})-(\d{2})-(\d{2})(T\d{2}:\d{2}(:\d{2}(\.\d{1,3})?)?(Z|[+-]\d{2}:\d{2}))?$/;

/** A day, or a day with time and zone, as ISO 8601 text: `2026-12-01`, `2026-12-01T08:30:00Z`. */
export function Moment(): PropertyDecorator {
  return (target: object, property: string | symbol) => {
    registerDecorator({
      name: 'moment',
      target: target.constructor,
      propertyName: String(property),
      validator: {
        validate: isMoment,
        defaultMessage: (fault?: ValidationArguments) =>
          `${fault?.property ?? ''} must be a day or a moment such as 2026-12-01 or 2026-12-01T08:30:00Z`,
      },
    });
  };
}

function isMoment(value: unknown): boolean {
  const parts = typeof value === 'string' ? FORM.exec(value) : null;
  if (!parts || Number.isNaN(Date.parse(parts[0]))) return false;
  // JavaScript takes 30 February for 2 March.
  const day = new Date(`${parts[1]}-${parts[2]}-${parts[3]}T00:00:00Z`);
  return day.getUTCDate() === Number(parts[3]);
}
