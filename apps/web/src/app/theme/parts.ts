import {
  buttonRecipe,
  containerRecipe,
  fieldSlotRecipe,
  fieldsetSlotRecipe,
  headingRecipe,
  iconRecipe,
  inputRecipe,
  linkRecipe,
  separatorRecipe,
  skeletonRecipe,
  spinnerRecipe,
} from '@chakra-ui/react/theme';

/** Only the parts that are used are given their styles: each one more costs on the first page. */
export const recipes = {
  button: buttonRecipe,
  container: containerRecipe,
  heading: headingRecipe,
  icon: iconRecipe,
  input: inputRecipe,
  link: linkRecipe,
  separator: separatorRecipe,
  skeleton: skeletonRecipe,
  spinner: spinnerRecipe,
};

export const slotRecipes = {
  field: fieldSlotRecipe,
  fieldset: fieldsetSlotRecipe,
};
