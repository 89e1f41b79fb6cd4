import { useEffect } from "react";
import { useRevalidator } from "react-router";

const INTERVAL_MS = 1000;

/** Asks the server again about once a second while something is under way, and only while the page is looked at. */
export function usePoll(underWay: boolean): void {
  const { state, revalidate } = useRevalidator();
  useEffect(() => {
    if (!underWay || state !== "idle") return;
    const timer = setTimeout(() => {
      if (document.visibilityState === "visible") void revalidate();
    }, INTERVAL_MS);
    const onVisible = () => document.visibilityState === "visible" && void revalidate();
    document.addEventListener("visibilitychange", onVisible);
    return () => {
      clearTimeout(timer);
      document.removeEventListener("visibilitychange", onVisible);
    };
  }, [underWay, state, revalidate]);
}
