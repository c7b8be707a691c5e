"use client";
import { Component, type ReactNode } from "react";

interface DrawnOnFailureProps { readonly instead: ReactNode; readonly children: ReactNode }

/** Shows the drawn view when the 3D one cannot start. */
export class DrawnOnFailure extends Component<DrawnOnFailureProps, { readonly failed: boolean }> {
  override state = { failed: false };

  static getDerivedStateFromError(): { failed: boolean } {
    return { failed: true };
  }

  override render(): ReactNode {
    return this.state.failed ? this.props.instead : this.props.children;
  }
}
