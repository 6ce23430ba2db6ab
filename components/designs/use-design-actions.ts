"use client";

import { useQueryClient, type InfiniteData } from "@tanstack/react-query";
import { showToast } from "@/components/ui/toasts";
import type { DesignPage, SavedDesign } from "@/lib/designs/contract";
import { designsKey } from "@/lib/designs/query-options";
import { deleteDesign, duplicateDesign, renameDesign, restoreDesign } from "@/lib/designs/requests";

type Pages = InfiniteData<DesignPage, string | null>;

const reasonOf = (error: unknown) =>
  error instanceof Error ? error.message : "The server did not answer.";

/** What can be done with a saved design in the list; shown at once, taken back where it fails. */
export function useDesignActions() {
  const client = useQueryClient();
  const put = (change: (designs: SavedDesign[]) => SavedDesign[]) =>
    client.setQueryData<Pages>(
      designsKey,
      (data) =>
        data && {
          ...data,
          pages: data.pages.map((page) => ({ ...page, designs: change(page.designs) })),
        },
    );
  const refresh = () => client.invalidateQueries({ queryKey: designsKey });

  const attempt = async (fault: string, act: () => Promise<unknown>) => {
    await client.cancelQueries({ queryKey: designsKey });
    const before = client.getQueryData<Pages>(designsKey);
    try {
      await act();
    } catch (error) {
      client.setQueryData(designsKey, before);
      showToast({ message: `${fault} ${reasonOf(error)}`, fault: true });
    }
    await refresh();
  };

  return {
    rename: ({ id, name: old }: SavedDesign, name: string) =>
      attempt(`“${old}” keeps its name.`, async () => {
        put((designs) => designs.map((one) => (one.id === id ? { ...one, name } : one)));
        await renameDesign(id, name);
      }),
    duplicate: ({ id, name }: SavedDesign) =>
      attempt(`“${name}” was not copied.`, async () => {
        const copy = await duplicateDesign(id);
        showToast({ message: `Copied as “${copy.name}”.` });
      }),
    remove: ({ id, name }: SavedDesign) =>
      attempt(`“${name}” was not deleted.`, async () => {
        put((designs) => designs.filter((one) => one.id !== id));
        await deleteDesign(id);
        showToast({
          message: `“${name}” deleted.`,
          undo: () => void attempt(`“${name}” was not brought back.`, () => restoreDesign(id)),
        });
      }),
  };
}

export type DesignActions = ReturnType<typeof useDesignActions>;
