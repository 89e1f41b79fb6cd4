import { notFound } from "~/services/guard.server";

/** An address that is nothing, whatever is asked of it. */
export function loader() {
  notFound();
}

export function action() {
  notFound();
}

export default function NotFound() {
  return null;
}
