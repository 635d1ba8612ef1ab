using System.Text.Json;

namespace BladeLog.Records.Writing;

internal static class SaveSettingHandler
{
    public static async Task Handle(WriteSession w, SaveSetting c)
    {
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Key), "Key", "Say which setting.");
        w.RefuseUnless(c.Value is null || double.IsFinite(c.Value.Value), "Value", "That is not a number.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(SaveSetting), w.Now);
        w.AnswerPath = "/setup";
        var setting = await w.Db.Settings.FindAsync(c.Key);
        w.Db.ThingHistories.Add(new ThingHistory
        {
            Thing = nameof(Setting),
            Version = 1,
            EditedUtc = w.Now,
            PersonId = w.Sent.PersonId,
            Before = JsonSerializer.Serialize(setting ?? (object)new { c.Key, Value = (double?)null }),
        });
        if (c.Value is not { } value)
        {
            if (setting is not null)
            {
                w.Db.Settings.Remove(setting);
            }
        }
        else if (setting is null)
        {
            w.Db.Settings.Add(new Setting { Key = c.Key, Value = value, Typed = c.Typed });
        }
        else
        {
            (setting.Value, setting.Typed) = (value, c.Typed);
        }
    }
}
