import {
  badgeRecipe,
  checkboxSlotRecipe,
  checkmarkRecipe,
  dialogSlotRecipe,
  listSlotRecipe,
  menuSlotRecipe,
  nativeSelectSlotRecipe,
  progressSlotRecipe,
  switchSlotRecipe,
  tableSlotRecipe,
  textareaRecipe,
  toastSlotRecipe,
} from '@chakra-ui/react/theme';

/** What the first page does without; comes with the pages that use it. */
export const moreRecipes = { badge: badgeRecipe, checkmark: checkmarkRecipe, textarea: textareaRecipe };
export const moreSlotRecipes = {
  checkbox: checkboxSlotRecipe,
  dialog: dialogSlotRecipe,
  list: listSlotRecipe,
  menu: menuSlotRecipe,
  nativeSelect: nativeSelectSlotRecipe,
  progress: progressSlotRecipe,
  switch: switchSlotRecipe,
  table: tableSlotRecipe,
  toast: toastSlotRecipe,
};
