#pragma once

namespace host_lib {

/// A number as a host may bring it: made from a double, and nothing of the standard library fits
/// it. Its functions are found only by argument-dependent lookup.
class number {
 public:
  number() = default;
  number(double x) : x_(x) {}
  explicit operator double() const { return x_; }

  friend number operator+(const number& a, const number& b) { return a.x_ + b.x_; }
  friend number operator-(const number& a, const number& b) { return a.x_ - b.x_; }
  friend number operator*(const number& a, const number& b) { return a.x_ * b.x_; }
  friend number operator/(const number& a, const number& b) { return a.x_ / b.x_; }
  friend number operator-(const number& a) { return -a.x_; }
  friend bool operator<(const number& a, const number& b) { return a.x_ < b.x_; }
  friend bool operator>(const number& a, const number& b) { return a.x_ > b.x_; }
  friend bool operator<=(const number& a, const number& b) { return a.x_ <= b.x_; }
  friend bool operator>=(const number& a, const number& b) { return a.x_ >= b.x_; }

  friend number sqrt(const number& a) { return __builtin_sqrt(a.x_); }
  friend number cbrt(const number& a) { return __builtin_cbrt(a.x_); }
  friend number exp(const number& a) { return __builtin_exp(a.x_); }
  friend number log(const number& a) { return __builtin_log(a.x_); }
  friend number pow(const number& a, const number& b) { return __builtin_pow(a.x_, b.x_); }

 private:
  double x_;
};

/// The same without comparisons.
struct unordered {
  explicit unordered(double);
  friend unordered operator+(const unordered&, const unordered&);
  friend unordered operator-(const unordered&, const unordered&);
  friend unordered operator*(const unordered&, const unordered&);
  friend unordered operator/(const unordered&, const unordered&);
  friend unordered operator-(const unordered&);
};

}  // namespace host_lib
