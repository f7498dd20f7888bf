#ifndef CONVELOPE_FACES_COLUMN_HPP
#define CONVELOPE_FACES_COLUMN_HPP

#include <cstddef>
#include <cstdint>
#include <span>

#include "convelope/kinds/typed.hpp"

// One number per face, where the host keeps it: in an array of its own, or in one member of its
// cells.

namespace convelope {
inline namespace v0 {
namespace faces {

/// One Number per face, `step` Numbers apart; empty if not given. Made from anything a std::span
/// can be made from, or by `member`.
template <class Number>
class column {
 public:
  constexpr column() = default;
  template <class Array>
    requires std::is_constructible_v<std::span<Number>, Array&>
  constexpr column(Array&& a)  // NOLINT: arrays convert
      : column(std::span<Number>(a).data(), std::span<Number>(a).size(), 1) {}
  constexpr column(Number* first, std::size_t size, std::size_t step)
      : first_(first), size_(size), step_(step) {}

  constexpr bool empty() const { return size_ == 0; }
  constexpr std::size_t size() const { return size_; }
  constexpr std::size_t step() const { return step_; }
  constexpr Number* at(std::size_t i) const { return first_ + i * step_; }
  /// `count` faces from face `from` on; nothing stays nothing.
  constexpr column part(std::size_t from, std::size_t count) const {
    return empty() ? column() : column(at(from), count, step_);
  }

 private:
  Number* first_ = nullptr;
  std::size_t size_ = 0;
  std::size_t step_ = 1;
};

namespace detail {
template <class M>
struct number_inside {
  using type = M;
};
template <class K, class T>
struct number_inside<typed<K, T>> {
  using type = T;
};
template <class From, class To>
using as_const_as = std::conditional_t<std::is_const_v<From>, const To, To>;

// A typed number is its number and nothing else, so that an array of them is an array of numbers.
template <class Number, class M>
Number* numbers_at(M* first) {
  using bare = std::remove_const_t<M>;
  static_assert(sizeof(bare) == sizeof(Number) && std::is_standard_layout_v<bare>);
  return reinterpret_cast<Number*>(first);
}
}  // namespace detail

/// One member of an array of cells: `member(std::span(cells), &cell::wall_K)`. A number, or a typed
/// number, whose kind is then in the hands of the caller.
template <class Cell, std::size_t Extent, class M, class Owner>
constexpr auto member(std::span<Cell, Extent> cells, M Owner::*which) {
  using number =
      detail::as_const_as<Cell, typename detail::number_inside<std::remove_const_t<M>>::type>;
  static_assert(sizeof(Cell) % sizeof(number) == 0, "cells a whole number of numbers apart");
  if (cells.empty()) return column<number>();
  return column<number>(detail::numbers_at<number>(&(cells.front().*which)), cells.size(),
                        sizeof(Cell) / sizeof(number));
}

}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
