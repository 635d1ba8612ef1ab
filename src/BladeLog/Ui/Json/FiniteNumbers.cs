using System.Text.Json;
using System.Text.Json.Serialization;

namespace BladeLog.Ui.Json;

/// <summary>No answer carries a NaN or an Infinity: what has no finite value is null.</summary>
internal sealed class FiniteNumbers : JsonConverter<double>
{
    public override double Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) => reader.GetDouble();

    public override void Write(Utf8JsonWriter writer, double value, JsonSerializerOptions options)
    {
        if (double.IsFinite(value))
        {
            writer.WriteNumberValue(value);
        }
        else
        {
            writer.WriteNullValue();
        }
    }
}
