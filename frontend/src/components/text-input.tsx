import { chakra } from '@chakra-ui/react';
import { inputRecipe, textareaRecipe } from '../theme/recipes/input';

export const TextInput = chakra('input', inputRecipe);
export const TextArea = chakra('textarea', textareaRecipe);
export const NativeSelect = chakra('select', inputRecipe);
