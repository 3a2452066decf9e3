// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <memory>
#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// A number that stands for a symbol in a Formula. Angles are in degrees. A formula over quantities of
/// several kinds is evaluated in N, mm and their products; each number is then written in a unit of its own.
struct NumberPutIn {
  std::string symbol; ///< as the formula names it: "σ_{x}"
  double value = 0;   ///< in the unit in which the formula is evaluated
  int decimals = 3;   ///< with which it is written
  bool isAngle = false;
  std::string unit = {}; ///< written behind it: "kN·m"; none where the step's unit says it
  double scale = 1;      ///< of one `unit`, in the unit of `value`: 1e6 for kN·m and N·mm
  bool operator==(const NumberPutIn&) const = default;
};
using NumbersPutIn = std::vector<NumberPutIn>;

/// A formula as a tree: it evaluates itself against numbers put in, and whoever sets it in type walks the
/// same tree. Immutable; copies share their nodes.
class Formula {
public:
  enum class Operation {
    number,
    angle, ///< a constant in degrees
    symbol,
    negative,
    sum,
    difference,
    product,
    quotient,
    power,      ///< first part to the second
    root,       ///< square root
    hypotenuse, ///< sqrt(a^2 + b^2) without overflow on the way
    cosine,     ///< of degrees
    sine,
    tangent,
    absolute,   ///< size without its sign
    arcTangent, ///< atan2(y, x) in degrees, (-180, 180]
    greatest,
    least
  };

  Formula(double number);
  static Formula degrees(double angle);
  static Formula symbol(std::string_view name);
  static Formula of(Operation operation, std::vector<Formula> parts);

  Operation operation() const;
  /// Of `number` and `angle`.
  double number() const;
  /// Of `symbol`.
  const std::string& symbol() const;
  const std::vector<Formula>& parts() const;

  /// The value; every symbol must be among `numbers`.
  double valueWith(const NumbersPutIn& numbers) const;

  bool operator==(const Formula& other) const;

private:
  struct Node;
  explicit Formula(Node node);
  std::shared_ptr<const Node> m_node;
};

/// Those of the numbers whose symbols the formula names, in their order.
NumbersPutIn namedBy(const Formula& formula, NumbersPutIn numbers);

Formula operator-(const Formula& a);
Formula operator+(const Formula& a, const Formula& b);
Formula operator-(const Formula& a, const Formula& b);
Formula operator*(const Formula& a, const Formula& b);
Formula operator/(const Formula& a, const Formula& b);
Formula power(const Formula& base, const Formula& exponent);
Formula root(const Formula& a);
Formula hypotenuse(const Formula& a, const Formula& b);
Formula cosine(const Formula& degrees);
Formula sine(const Formula& degrees);
Formula tangent(const Formula& degrees);
Formula absolute(const Formula& a);
Formula arcTangent(const Formula& y, const Formula& x);
Formula greatest(std::vector<Formula> parts);
Formula least(std::vector<Formula> parts);

} // namespace planewright
