import { chakra } from '@chakra-ui/react';
import type { ComponentProps } from 'react';
import { Link } from 'react-router-dom';
import { buttonRecipe } from '../theme/recipes/button';

const PlainButton = chakra('button', buttonRecipe);

/** A button that never submits a form by accident: say `type="submit"` where it shall. */
export function Button(props: ComponentProps<typeof PlainButton>) {
  return <PlainButton type="button" {...props} />;
}

/** A place to go, looking like a button. */
export const LinkButton = chakra(Link, buttonRecipe);
