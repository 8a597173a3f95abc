import { endpoints, type PriceBook } from "@cleatwork/contracts";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { PriceItem } from "@cleatwork/calc";
import { unitPriceText } from "../../lib/format/money.ts";
import { api } from "../../lib/http.ts";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { priceQueries } from "./prices.queries.ts";

/** Saves one price, shows it at once, and offers to put the old one back. */
export function useSavePrice() {
  const { slug, company } = useSession();
  const cache = useQueryClient();
  const { queryKey } = priceQueries.book(slug);
  const put = (item: PriceItem) =>
    api(endpoints.putPriceItem, { params: { company: slug, itemKey: item.key }, body: item });
  const replace = (key: string, item: PriceItem | null) =>
    cache.setQueryData(queryKey, (book: PriceBook | undefined) => {
      if (!book) return book;
      const others = book.items.filter((one) => one.key !== key);
      return { ...book, items: item ? [...others, item] : others };
    });

  const save = useMutation({
    mutationFn: ({ item }: { item: PriceItem; before: PriceItem | null }) => put(item),
    onMutate: ({ item }) => {
      replace(item.key, item);
    },
    onSuccess: (saved, { before }) =>
      notify(`${saved.description} is ${unitPriceText(saved.unitPrice_micro, company.currency)} now.`, {
        severity: "good",
        ...(before ? { undo: () => save.mutate({ item: before, before: saved }) } : {}),
      }),
    onError: (error, { item, before }) => {
      replace(item.key, before);
      notify(`${item.description} keeps its price. ${error.message}`, { severity: "stop" });
    },
    onSettled: () => cache.invalidateQueries({ queryKey }),
  });

  const remove = useMutation({
    mutationFn: (item: PriceItem) => api(endpoints.deletePriceItem, { params: { company: slug, itemKey: item.key } }),
    onMutate: (item) => {
      replace(item.key, null);
    },
    onSuccess: (_, item) =>
      notify(`${item.description} is taken out.`, {
        severity: "good",
        undo: () => save.mutate({ item, before: null }),
      }),
    onError: (error, item) => {
      replace(item.key, item);
      notify(`${item.description} stays. ${error.message}`, { severity: "stop" });
    },
    onSettled: () => cache.invalidateQueries({ queryKey }),
  });
  return { save, remove, put };
}
