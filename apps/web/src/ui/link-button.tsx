import { Link, type LinkProps } from "react-router-dom";
import { buttonLook, type ButtonLook } from "./button.tsx";

export function LinkButton({ rank = "plain", size = "normal", className, ...rest }: ButtonLook & LinkProps) {
  return <Link {...rest} className={buttonLook(rank, size, className)} />;
}
