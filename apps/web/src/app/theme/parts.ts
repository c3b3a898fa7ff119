import {
  badgeRecipe,
  buttonRecipe,
  containerRecipe,
  fieldSlotRecipe,
  fieldsetSlotRecipe,
  headingRecipe,
  iconRecipe,
  inputRecipe,
  linkRecipe,
  nativeSelectSlotRecipe,
  separatorRecipe,
  skeletonRecipe,
  spinnerRecipe,
  textareaRecipe,
} from '@chakra-ui/react/theme';

/** Only the parts that are used are given their styles: each one more costs on the first page. */
export const recipes = {
  badge: badgeRecipe,
  button: buttonRecipe,
  container: containerRecipe,
  heading: headingRecipe,
  icon: iconRecipe,
  input: inputRecipe,
  link: linkRecipe,
  separator: separatorRecipe,
  skeleton: skeletonRecipe,
  spinner: spinnerRecipe,
  textarea: textareaRecipe,
};

export const slotRecipes = {
  field: fieldSlotRecipe,
  fieldset: fieldsetSlotRecipe,
  nativeSelect: nativeSelectSlotRecipe,
};
